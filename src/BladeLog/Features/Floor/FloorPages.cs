using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Floor;

/// <summary>The first page: every saw, what is on it, and the next cut.</summary>
internal static class FloorPages
{
    public static void Map(WebApplication app) => app.MapGet("/", Get);

    private static async Task<IResult> Get(Desk desk, ShopDb db) =>
        await desk.Page<FloorPage, FloorModel>(FloorModel.Of(await desk.Advice(), await desk.Units(), await Slack(db)));

    /// <summary>Saws whose last word is that the tension was let off. A mount since then has put it on again.</summary>
    private static async Task<HashSet<int>> Slack(ShopDb db)
    {
        var said = await db.Slacks.Where(s => s.Entry.Void == null)
            .Select(s => new { s.SawId, s.Entry.AtUtc, s.EntryId, s.LetOff }).ToListAsync();
        var mounts = await db.Mounts.Where(m => m.Entry.Void == null)
            .GroupBy(m => m.SawId).Select(g => new { SawId = g.Key, Last = g.Max(m => m.Entry.AtUtc) }).ToDictionaryAsync(m => m.SawId, m => m.Last);
        return [.. said.GroupBy(s => s.SawId)
            .Select(g => g.OrderBy(s => s.AtUtc).ThenBy(s => s.EntryId).Last())
            .Where(s => s.LetOff && (!mounts.TryGetValue(s.SawId, out DateTime on) || on <= s.AtUtc))
            .Select(s => s.SawId)];
    }
}
