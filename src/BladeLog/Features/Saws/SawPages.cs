using BladeLog.Advice;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Saws;

/// <summary>The page of one saw.</summary>
internal static class SawPages
{
    private const int Shown = 10;
    private const int Most = 300;

    public static void Map(WebApplication app) => app.MapGet("/saws/{code}", Get);

    private static async Task<IResult> Get(Desk desk, string code, string? all)
    {
        ShopNow shop = await desk.Shop();
        if (shop.Saw(code) is not { } saw)
        {
            string sought = Tags.Read(code);
            return await desk.Page<NoSawPage, NoSawModel>(
                new NoSawModel(sought.Length > 20 ? sought[..20] + "…" : sought, [.. shop.Saws.Select(s => (s.Saw.Code, s.Saw.Name))]),
                StatusCodes.Status404NotFound);
        }

        PastPage past = await Past.OfSaw(desk.Db, saw.Saw.Id, all is null ? Shown : Most);
        var cuts = await desk.Db.CutsDone.AsNoTracking().Where(c => c.SawId == saw.Saw.Id).Select(c => new { c.LengthM, c.Pieces, c.FeedMps }).ToListAsync();
        IdleShare idle = IdleShare.Of(saw.RunningMs, cuts.Select(c => (c.LengthM, c.Pieces, c.FeedMps)));
        string? checker = saw.LastCheck?.Entry.PersonId is { } id ? await desk.Db.People.Where(p => p.Id == id).Select(p => p.Initials).FirstOrDefaultAsync() : null;
        SawPageModel page = new(saw, await desk.Advice(), await desk.Units(), idle, await Heard(desk.Db, saw.Saw.Id), checker);
        return await desk.Page<SawPage, SawModel>(page.Model(past, await Story.Of(desk), all is null));
    }

    /// <summary>When a logger's run, or anything sent by JSON, last came in for a saw.</summary>
    private static async Task<DateTime?> Heard(ShopDb db, int sawId)
    {
        DateTime? run = await db.Runs.AsNoTracking().Where(r => r.SawId == sawId && (r.Source == RunSource.Logger || r.Entry.Device == Desk.ByJson)).MaxAsync(r => (DateTime?)r.Entry.EnteredUtc);
        DateTime? reading = await db.MeterReadings.AsNoTracking().Where(r => r.SawId == sawId && r.Entry.Device == Desk.ByJson).MaxAsync(r => (DateTime?)r.Entry.EnteredUtc);
        return run is null || reading > run ? reading : run;
    }
}
