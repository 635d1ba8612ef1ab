namespace BladeLog.Features.Cautions;

/// <summary>The cautions, and why any crack is a hold.</summary>
public sealed record CautionsModel(CrackExample Crack);

/// <summary>Every caution in one place, each with where it is written.</summary>
internal static class CautionPages
{
    public static void Map(WebApplication app) => app.MapGet("/cautions", async (Desk desk) =>
        await desk.Page<CautionsPage, CautionsModel>(new CautionsModel(CrackExample.Of(await desk.Advice(), await desk.Units()))));
}
