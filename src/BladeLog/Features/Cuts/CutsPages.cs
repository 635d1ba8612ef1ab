using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Cuts;

/// <summary>The "other stock or feed" form out of the address.</summary>
internal sealed record OtherQuery(string? Other, string? Height, string? Feed, string? Guide, string? Pull, string? Width)
{
    public OtherForm Form => new() { Other = Other, Height = Height, Feed = Feed, Guide = Guide, Pull = Pull, Width = Width };
}

public sealed record MoveForm
{
    public string? Op { get; init; }

    public string? Version { get; init; }

    /// <summary>up, down or off.</summary>
    public string? To { get; init; }
}

/// <summary>What waits to be cut, and which blade for it.</summary>
internal static class CutsPages
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/cuts", Queue);
        app.MapGet("/cuts/{number:int}", Choices);
        app.MapPost("/cuts/{number:int}/move", Move);
        CutForms.Map(app);
        CutLog.Map(app);
    }

    internal static async Task<QueuedCut?> Find(Desk desk, int number) => (await desk.Shop()).Cuts.FirstOrDefault(c => c.Number == number);

    private static async Task<IResult> Queue(string? view, string? from, Desk desk)
    {
        QueueView looked = view switch { "saws" => QueueView.Saws, "order" => QueueView.Order, _ => QueueView.Queue };
        return await desk.Page<QueuePage, QueueModel>(QueueModel.Of(looked, await desk.Advice(), await desk.Units(), int.TryParse(from, out int n) ? n : 0));
    }

    private static async Task<IResult> Choices(int number, [AsParameters] OtherQuery query, Desk desk)
    {
        if (await Find(desk, number) is not { } cut)
        {
            return Results.NotFound();
        }

        ShopAdvice advice = await desk.Advice();
        ChoicesModel model = ChoicesModel.Of(cut, advice, await desk.Units(), query.Form);
        return await desk.Page<ChoicesPage, ChoicesModel>(model, model.Other?.Problems.Count > 0 ? StatusCodes.Status422UnprocessableEntity : StatusCodes.Status200OK);
    }

    private static async Task<IResult> Move(int number, [FromForm] MoveForm? form, Desk desk)
    {
        form ??= new();

        // A double tap: the list it would move in is another one by now.
        if (Guid.TryParse(form.Op, out Guid op) && await desk.Db.Entries.AsNoTracking().FirstOrDefaultAsync(e => e.Op == op && e.Part == 0) is { AnswerPath: { } there })
        {
            return Results.Redirect(there);
        }

        List<int> numbers = [.. QueueModel.Waiting(await desk.Shop()).Select(c => c.Number)];
        int at = numbers.IndexOf(number), to = form.To == "up" ? at - 1 : at + 1;
        if (at < 0 || form.To is not ("up" or "down" or "off") || (form.To != "off" && (to < 0 || to >= numbers.Count)))
        {
            // The list has changed meanwhile: show it as it is.
            return Results.Redirect("/cuts?view=order");
        }

        if (form.To != "off")
        {
            (numbers[at], numbers[to]) = (numbers[to], numbers[at]);
        }

        Command command = form.To == "off"
            ? new DropCut(number, int.TryParse(form.Version, out int version) ? version : 0)
            : new ReorderCuts(numbers);
        WriteResult result = await desk.Write(command, form.Op, form.To == "off" ? "/cuts?view=order" : $"/cuts?view=order&from={to / QueueModel.PageSize * QueueModel.PageSize}#cut-{number}");
        return result is WriteResult.Done done
            ? desk.Saved(done, form.To == "off" ? $"cut {number} off the list" : $"cut {number} moved", canUndo: false)
            : await desk.Page<QueuePage, QueueModel>(
                QueueModel.Of(QueueView.Order, await desk.Advice(), await desk.Units(), problems: Unwritten.Of(result, await desk.Units(), _ => null)),
                StatusCodes.Status422UnprocessableEntity);
    }
}
