using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Blades;

/// <summary>The blades by JSON.</summary>
internal static class BladesJson
{
    public static void Map(RouteGroupBuilder api)
    {
        var blades = api.MapGroup("/blades").WithTags("Blades");
        blades.MapGet("", All).Produces<List<BladeOut>>().WithSummary("Every blade there is or was, by tag");
        blades.MapGet("/{tag}", One).Produces<BladeOut>().ProducesProblem(StatusCodes.Status404NotFound).WithSummary("One blade");
    }

    private static async Task<IResult> All(Desk desk)
    {
        var advice = await desk.Advice();
        var paths = await WoodPaths(desk.Db);
        return Results.Ok(advice.Now.Blades.OrderBy(b => b.Blade.Tag, StringComparer.OrdinalIgnoreCase).Select(b => BladeOut.Of(advice, b, paths)).ToList());
    }

    private static async Task<IResult> One(string tag, Desk desk)
    {
        var advice = await desk.Advice();
        return advice.Now.Blade(Tags.Read(tag)) is { } blade
            ? Results.Ok(BladeOut.Of(advice, blade, await WoodPaths(desk.Db)))
            : JsonAnswers.NotFound($"There is no blade {tag} here.");
    }

    /// <summary>Raw path of a blade's own teeth on each saw, mm.</summary>
    private static async Task<ILookup<int, (int SawId, long PathMm)>> WoodPaths(ShopDb db)
    {
        var rows = await db.WoodPaths.AsNoTracking()
            .Join(db.Mounts, p => p.MountId, m => m.EntryId, (p, m) => new { m.BladeId, m.SawId, p.PathMm })
            .GroupBy(p => new { p.BladeId, p.SawId })
            .Select(g => new { g.Key.BladeId, g.Key.SawId, PathMm = g.Sum(p => p.PathMm) })
            .ToListAsync();
        return rows.ToLookup(r => r.BladeId, r => (r.SawId, r.PathMm));
    }
}
