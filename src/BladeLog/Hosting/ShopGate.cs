using BladeLog.Records;

namespace BladeLog.Hosting;

/// <summary>Whether the shop can be served: not yet made, open, or in trouble.</summary>
internal sealed class ShopGate(ShopFile file, TimeProvider clock, IConfiguration configuration)
{
    /// <summary>What keeps the shop shut, in a sentence for the screen.</summary>
    public string? Trouble { get; private set; }

    public bool IsOpen { get; private set; }

    public ShopFile File => file;

    public async Task TryOpen()
    {
        if (!file.Exists)
        {
            return;
        }

        try
        {
            await file.Open(clock.GetUtcNow().UtcDateTime);
            IsOpen = true;
        }
        catch (ShopFileException e)
        {
            Trouble = e.Message;
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            Trouble = $"The folder {file.Dir} cannot be used: {e.Message}";
        }
    }

    /// <summary>Makes the invented shop. The setting names another folder of sample files, for whoever writes new ones.</summary>
    public Task MakeSample() => Make(db => SampleShop.Fill(db, configuration["samplefiles"] ?? SampleShop.Folder, clock.GetUtcNow().UtcDateTime));

    /// <summary>Makes the file and fills it; on any failure nothing of it stays.</summary>
    public async Task Make(Func<ShopDb, Task> fill)
    {
        await file.Create();
        try
        {
            await using var db = file.NewContext();
            await fill(db);
            IsOpen = true;
        }
        catch
        {
            file.Dispose();
            foreach (var part in Directory.EnumerateFiles(file.Dir, "bladelog.db*"))
            {
                System.IO.File.Delete(part);
            }

            throw;
        }
    }
}

internal static class ShopGateRules
{
    /// <summary>Before there is a shop every page leads to the first start; a shop in trouble shows one page that says what is wrong.</summary>
    public static void UseShopGate(this WebApplication app) => app.Use(async (context, next) =>
    {
        var gate = context.RequestServices.GetRequiredService<ShopGate>();
        var path = context.Request.Path;
        if (gate.IsOpen || path.StartsWithSegments("/start") || path.StartsWithSegments("/health") || path.StartsWithSegments("/trouble"))
        {
            await next(context);
        }
        else if (path.StartsWithSegments("/api"))
        {
            context.Response.StatusCode = StatusCodes.Status503ServiceUnavailable;
            await Results.Problem(title: gate.Trouble ?? "There is no shop yet. Open the start page and make one.", statusCode: 503).ExecuteAsync(context);
        }
        else
        {
            context.Response.Redirect(gate.Trouble is null ? "/start" : "/trouble");
        }
    });
}
