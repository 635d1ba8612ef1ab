using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Bench;

/// <summary>What the person at the bench has to do today, and what is away.</summary>
internal static class BenchPages
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/bench", Get);
        app.MapGet("/bench/batches/new", SendOut.Get);
        app.MapPost("/bench/batches/new", SendOut.Post);
        app.MapGet("/bench/batches/{number}", ComeBack.Get);
        app.MapPost("/bench/batches/{number}", ComeBack.Post);
    }

    private static async Task<IResult> Get(Desk desk) =>
        await desk.Page<BenchPage, BenchModel>(BenchModel.Of(await desk.Advice(), await OffAsDull(desk), await desk.Units()));

    /// <summary>Blades that came off as dull and were not ground since.</summary>
    public static async Task<IReadOnlySet<int>> OffAsDull(Desk desk)
    {
        var db = desk.Db;
        var dull = await db.Dismounts.AsNoTracking()
            .Where(d => d.Reason == OffReason.Dull
                && !db.Sharpenings.Any(s => s.BladeId == d.Mount.BladeId && s.Entry.AtUtc >= d.Entry.AtUtc)
                && !db.Mounts.Any(m => m.BladeId == d.Mount.BladeId && m.Entry.AtUtc >= d.Entry.AtUtc))
            .Select(d => d.Mount.BladeId).ToListAsync();
        return dull.ToHashSet();
    }
}
