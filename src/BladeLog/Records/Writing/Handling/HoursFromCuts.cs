using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>Hours taken from cuts when something they gave way to, or the cut they came from, is struck out.</summary>
internal static class HoursFromCuts
{
    /// <summary>Typed or counted hours are struck out: what had given way to them stands again, as far as its cut does and nothing else covers it.</summary>
    public static async Task TakeTheirPlaceAgain(WriteSession w, Saw saw, Guid op, string reason)
    {
        var gave = await w.Db.Runs.IgnoreQueryFilters().AsNoTracking()
            .Where(r => r.SawId == saw.Id && r.Source == RunSource.FromCuts && w.Db.Voids.Any(v => v.VoidedId == r.EntryId && v.Entry.Op == op))
            .OrderBy(r => r.FromUtc).ToListAsync();
        if (gave.Count == 0)
        {
            return;
        }

        foreach (var piece in await w.Db.Runs.AsNoTracking().Where(r => r.Entry.Op == op && r.Source == RunSource.FromCuts).ToListAsync())
        {
            VoidRunning.Strike(w, piece, reason);
        }

        await w.Save();
        foreach (var run in gave)
        {
            if (await Cuts(w, saw.Id, run.FromUtc, run.UntilUtc) is [_, ..])
            {
                await Fill(w, saw, run.FromUtc, run.UntilUtc, run.SpeedMps);
            }
        }
    }

    /// <summary>A cut is struck out: its hours go, and those of other cuts take what they had left to it.</summary>
    public static async Task GoWith(WriteSession w, CutDone cut, Entry entry, string reason)
    {
        var until = entry.AtUtc;
        var from = until.AddMilliseconds(-CutSums.Milliseconds(cut.LengthM, cut.Pieces, cut.FeedMps));
        var inside = await w.Db.Runs.AsNoTracking()
            .Where(r => r.SawId == cut.SawId && r.Source == RunSource.FromCuts && (r.Entry.Op == entry.Op || (r.FromUtc >= from && r.UntilUtc <= until)))
            .ToListAsync();
        if (inside.Count == 0)
        {
            return;
        }

        inside.ForEach(run => VoidRunning.Strike(w, run, reason));
        await w.Save();
        var saw = await w.Db.Saws.SingleAsync(s => s.Id == cut.SawId);
        foreach (var other in await Cuts(w, saw.Id, from, until))
        {
            await Fill(w, saw, other.From > from ? other.From : from, other.Until < until ? other.Until : until, other.SpeedMps);
        }
    }

    private static async Task Fill(WriteSession w, Saw saw, DateTime from, DateTime until, double speed)
    {
        var others = await RunRules.Overlapping(w, saw, from, until, []);
        foreach (var (pieceFrom, pieceUntil) in RunRules.Uncovered(from, until, others.Select(o => (o.FromUtc, o.UntilUtc))))
        {
            RunRules.AddFromCuts(w, saw, pieceFrom, pieceUntil, speed);
        }

        await w.Save();
    }

    /// <summary>Standing cuts whose own time shares some with this, with their windows.</summary>
    private static async Task<List<(DateTime From, DateTime Until, double SpeedMps)>> Cuts(WriteSession w, int sawId, DateTime from, DateTime until)
    {
        var after = await w.Db.CutsDone.AsNoTracking()
            .Where(c => c.SawId == sawId && c.Entry.AtUtc > from)
            .OrderBy(c => c.Entry.AtUtc)
            .Select(c => new { c.Entry.AtUtc, c.LengthM, c.Pieces, c.FeedMps, c.SpeedMps })
            .ToListAsync();
        return
        [
            .. after.Select(c => (From: c.AtUtc.AddMilliseconds(-CutSums.Milliseconds(c.LengthM, c.Pieces, c.FeedMps)), Until: c.AtUtc, c.SpeedMps))
                .Where(c => c.From < until),
        ];
    }
}
