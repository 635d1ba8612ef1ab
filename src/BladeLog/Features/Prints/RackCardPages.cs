using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Prints;

internal static class RackCardPages
{
    public static void Map(WebApplication app) => app.MapGet("/rackcard", Get);

    private static async Task<IResult> Get(Desk desk, string? rack)
    {
        var clearers = await desk.Db.People.AsNoTracking()
            .Where(p => p.Active && p.Roles.Any(r => r.Role == Role.ClearHolds && r.FromUtc <= desk.Now && (r.UntilUtc == null || r.UntilUtc > desk.Now)))
            .OrderBy(p => p.Initials).Select(p => p.Initials).ToListAsync();
        return await desk.Page<RackCardPage, RackCardModel>(RackCard.Of(await desk.Advice(), clearers, await desk.Units(), rack));
    }
}
