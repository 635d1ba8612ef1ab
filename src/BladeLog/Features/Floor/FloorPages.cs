using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Floor;

/// <summary>The first page: every saw, what is on it, and the next cut.</summary>
internal static class FloorPages
{
    public static void Map(WebApplication app) => app.MapGet("/", Get);

    private static async Task<IResult> Get(Desk desk) =>
        await desk.Page<FloorPage, FloorModel>(FloorModel.Of(
            await desk.Advice(),
            await desk.Units(),
            await desk.Db.People.AsNoTracking().ToDictionaryAsync(p => p.Id, p => p.Initials)));
}
