using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class TakeBackHandler
{
    public static async Task Handle(WriteSession w, TakeBack c)
    {
        var at = w.At(c.At);
        var number = c.Number.Trim();
        var batch = await w.Db.Batches.AsNoTracking().Include(b => b.Entry).SingleOrDefaultAsync(b => b.Number == number);
        w.RefuseUnless(batch is not null, nameof(c.Number), $"There is no batch {number}.");
        w.RefuseUnless(c.Lines.Count > 0, nameof(c.Lines), "Say which blades came back.");
        if (batch is null || !w.Stands)
        {
            return;
        }

        w.RefuseUnless(at >= batch.Entry.AtUtc, nameof(c.At), $"Batch {number} was sent on {w.Say(batch.Entry.AtUtc)}, after this.");
        var lines = await w.Db.BatchLines.AsNoTracking().Where(l => l.BatchId == batch.EntryId).ToListAsync();
        var back = await w.Db.BatchReturns.AsNoTracking().Where(r => r.Line.BatchId == batch.EntryId).ToListAsync();
        var seen = new HashSet<int>();
        for (var i = 0; i < c.Lines.Count; i++)
        {
            if (await w.FindBlade(c.Lines[i].Tag, $"Lines[{i}].Tag") is { } blade)
            {
                await One(w, c.Lines[i], blade, lines.Find(l => l.BladeId == blade.Id), back, batch, at, $"Lines[{i}].", seen);
            }
        }

        w.AnswerPath = "/bench";
    }

    private static async Task One(
        WriteSession w, BackLine c, Blade blade, BatchLine? line, List<BatchReturn> back, Batch batch, DateTime at, string field, HashSet<int> seen)
    {
        if (line is null)
        {
            w.Refuse($"{field}Tag", $"{blade.Tag} was not in batch {batch.Number}: it is a stranger in the bundle.");
            return;
        }

        var before = back.Find(r => r.LineId == line.EntryId);
        if ((before is not null && (before.Outcome != ReturnOutcome.Lost || c.Outcome == ReturnOutcome.Lost)) || !seen.Add(blade.Id))
        {
            w.Refuse($"{field}Tag", $"{blade.Tag} is back from batch {batch.Number} already.");
            return;
        }

        await HereAfterAll(w, c, blade, before, batch);
        var now = await w.NowOf(blade);
        var ground = new Ground(c.WidthM, c.GulletM, c.KerfM, c.EdgeAfterM, c.Retire ? null : c.LeastWidthM ?? blade.Spec.LeastWidthM);
        await GrindRules.Refuse(w, blade, now, ground, field);
        if (!w.Stands)
        {
            return;
        }

        if (c.Outcome != ReturnOutcome.Lost && !c.AsMeasured)
        {
            GrindRules.Ask(w, blade, now, ground, field);
        }

        w.Add(new BatchReturn { LineId = line.EntryId, Outcome = c.Outcome, WidthM = c.WidthM }, at);
        if (c.Outcome == ReturnOutcome.Sharpened)
        {
            w.Add(
                new Sharpening
                {
                    BladeId = blade.Id,
                    Kind = c.Kind,
                    SetAgain = c.SetAgain,
                    WidthM = c.WidthM,
                    GulletM = c.GulletM,
                    KerfM = c.KerfM,
                    EdgeAfterM = c.EdgeAfterM,
                    PriceMinor = c.PriceMinor,
                    BatchId = batch.EntryId,
                },
                at);
        }

        if (c.Retire || c.Outcome == ReturnOutcome.Lost)
        {
            w.Add(new Retirement { BladeId = blade.Id, Reason = c.Outcome == ReturnOutcome.Lost ? RetireReason.Lost : RetireReason.Rejected }, at);
        }

        w.Touched.Blades.Add(blade.Id);
    }

    /// <summary>What was lost, or written off while it was away, is in somebody's hand: that it was gone is struck out in the same group.</summary>
    private static async Task HereAfterAll(WriteSession w, BackLine c, Blade blade, BatchReturn? lost, Batch batch)
    {
        if (c.Outcome == ReturnOutcome.Lost)
        {
            return;
        }

        if (lost is not null)
        {
            w.Void(lost.EntryId, "It came back after all.");
        }

        foreach (var off in await w.Db.Retirements.AsNoTracking().Where(r => r.BladeId == blade.Id && r.Entry.AtUtc >= batch.Entry.AtUtc).ToListAsync())
        {
            w.Void(off.EntryId, "It came back after it was written off.");
        }
    }
}
