using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class RecordPriorUseHandler
{
    public static async Task Handle(WriteSession w, RecordPriorUse c)
    {
        var blade = await w.FindBlade(c.Tag);
        var at = w.At(c.At);
        w.RefuseUnless(c.UsedLow >= 0 && c.UsedLow <= c.UsedHigh && double.IsFinite(c.UsedHigh), nameof(c.UsedHigh), "The range goes from a lower to an upper part of the life, none below zero.");
        w.RefuseUnless(c.Sharpenings is null or >= 0, nameof(c.Sharpenings), "A count must not be below zero.");
        if (blade is null || !w.Stands)
        {
            return;
        }

        w.RefuseUnless(
            !await w.Db.PriorUses.AnyAsync(p => p.BladeId == blade.Id), nameof(c.Tag), $"{blade.Tag} has its earlier use recorded already: strike that out first.");
        w.Add(
            new PriorUse { BladeId = blade.Id, UsedLow = c.UsedLow, UsedHigh = c.UsedHigh, WidthM = c.WidthM, Sharpenings = c.Sharpenings, Source = c.Source },
            at);
        w.Touched.Blades.Add(blade.Id);
        w.AnswerPath = $"/b/{blade.Tag}";
    }
}
