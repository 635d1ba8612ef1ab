using BladeLog.Hosting;
using BladeLog.Records;
using BladeLog.Records.Sample;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using Microsoft.AspNetCore.Diagnostics;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Start;

public sealed record StartForm
{
    public string? Begin { get; init; }

    public string? Name { get; init; }

    public string? Zone { get; init; }
}

public sealed record StartModel(StartForm Form, IReadOnlyList<Problem> Problems, string Folder, IReadOnlyList<string> Zones)
{
    public string? Error(string field) => Problems.FirstOrDefault(p => p.Field == field)?.Sentence;
}

public sealed record TroubleModel(string Title, string Sentence, string Reference);

/// <summary>The first start, the health of the shop, and the page that says what is wrong.</summary>
internal static class StartPages
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/start", Get);
        app.MapPost("/start", Post);
        app.MapGet("/health", Health).DisableAntiforgery();
        app.Map("/trouble", Trouble).DisableAntiforgery();
        app.Map("/trouble/{status:int}", Status).DisableAntiforgery();
    }

    private static IResult Get(ShopGate gate) => gate.IsOpen ? Results.Redirect("/") : Page(gate, new StartForm(), []);

    private static async Task<IResult> Post([FromForm] StartForm? form, ShopGate gate)
    {
        form ??= new();
        if (gate.IsOpen)
        {
            return Results.Redirect("/");
        }

        var problems = new List<Problem>();
        if (form.Begin is not ("empty" or "sample"))
        {
            problems.Add(new Problem("Begin", "Choose one: your own shop, or the sample shop to look around in."));
        }

        var name = form.Name?.Trim() ?? "";
        if (form.Begin == "empty" && name.Length is 0 or > 60)
        {
            problems.Add(new Problem("Name", "Give the shop a name of 1 to 60 characters, such as \"Joinery, mill lane\"."));
        }

        if (form.Begin == "empty" && !TimeZoneInfo.TryFindSystemTimeZoneById(form.Zone ?? "", out _))
        {
            problems.Add(new Problem("Zone", $"\"{form.Zone}\" is not a time zone known here. Write one such as Europe/London or UTC."));
        }

        if (problems.Count > 0)
        {
            return Page(gate, form, problems, StatusCodes.Status422UnprocessableEntity);
        }

        try
        {
            await (form.Begin == "sample" ? gate.MakeSample() : gate.Make(async db =>
            {
                db.Shops.Add(new Shop { Uid = Guid.NewGuid(), Name = name, Zone = form.Zone! });
                await db.SaveChangesAsync();
            }));
        }
        catch (SampleFileException e)
        {
            return Page(gate, form, [new Problem("Begin", e.Message)], StatusCodes.Status422UnprocessableEntity);
        }

        return Results.Redirect("/");
    }

    private static async Task<IResult> Health(ShopGate gate, IServiceProvider services)
    {
        if (!gate.IsOpen)
        {
            return Results.Text(gate.Trouble ?? "There is no shop yet.", statusCode: StatusCodes.Status503ServiceUnavailable);
        }

        return await Liveness.CanReadAndWrite(services.GetRequiredService<ShopDb>())
            ? Results.Text("The records can be read and written.")
            : Results.Text("The records cannot be written.", statusCode: StatusCodes.Status503ServiceUnavailable);
    }

    private static IResult Trouble(ShopGate gate, HttpContext context)
    {
        var sentence = gate.Trouble ?? "Something went wrong on this page. What is recorded stands. If you had just sent a form, the record tells whether it was kept, and a wrong entry can be struck out there.";
        if (context.Features.Get<IExceptionHandlerPathFeature>()?.Path is { } asked && IsJson(asked))
        {
            return Results.Problem(title: "Something went wrong here.", detail: $"Reference {context.TraceIdentifier}", statusCode: 500);
        }

        return Html.View<TroublePage, TroubleModel>(new("That did not work", sentence, context.TraceIdentifier), Chrome.Bare, gate.Trouble is null ? 500 : 503);
    }

    private static IResult Status(int status, HttpContext context)
    {
        var (title, sentence) = status switch
        {
            404 => ("There is no such page", "The address may be mistyped, or the blade, saw or cut has another name. Look on the Rack or the Floor."),
            400 => ("That form could not be read", "It may have been open for too long. Go back, open it again and send it once more; the fields keep what you typed."),
            413 => ("That file is too large", "A file may have 10 MB at the most, a form 256 kB."),
            405 => ("Nothing answers there", "This address takes a form, not a visit. Start from the Floor."),
            _ => ("That did not work", "Nothing was saved. Go back and try again."),
        };
        if (context.Features.Get<IStatusCodeReExecuteFeature>()?.OriginalPath is { } asked && IsJson(asked))
        {
            return Results.Problem(title: status == 415 ? "Send JSON, with the content type application/json." : $"{title}.", statusCode: status);
        }

        return Html.View<TroublePage, TroubleModel>(new(title, sentence, context.TraceIdentifier), Chrome.Bare, status);
    }

    private static bool IsJson(string path) => path.StartsWith("/api/", StringComparison.OrdinalIgnoreCase);

    private static IResult Page(ShopGate gate, StartForm form, IReadOnlyList<Problem> problems, int status = 200) =>
        Html.View<StartPage, StartModel>(
            new(form, problems, gate.File.Dir, [.. TimeZoneInfo.GetSystemTimeZones().Select(z => z.Id).Where(z => z.Contains('/')).Order(StringComparer.Ordinal)]),
            Chrome.Bare,
            status);
}
