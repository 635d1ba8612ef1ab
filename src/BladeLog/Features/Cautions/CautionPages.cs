namespace BladeLog.Features.Cautions;

public sealed record CautionsModel;

/// <summary>Every caution in one place, each with where it is written.</summary>
internal static class CautionPages
{
    public static void Map(WebApplication app) => app.MapGet("/cautions", (Desk desk) => desk.Page<CautionsPage, CautionsModel>(new CautionsModel()));
}
