using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class RecordBreakHandler
{
    public static async Task Handle(WriteSession w, RecordBreak c)
    {
        var blade = await w.FindBlade(c.Tag);
        var latest = w.At(c.LatestUtc, nameof(c.LatestUtc));
        var earliest = c.EarliestUtc is { } e ? w.At(e, nameof(c.EarliestUtc)) : latest;
        w.RefuseUnless(earliest <= latest, nameof(c.EarliestUtc), "The earliest time must not be after the latest.");
        w.RefuseUnless(c.HoursLow is null || c.HoursHigh is null || c.HoursLow <= c.HoursHigh, nameof(c.HoursHigh), "The upper hours must not be below the lower ones.");
        if (blade is null || !w.Stands)
        {
            return;
        }

        var spells = await FactReader.ReadSpells(w.Db, blade: blade.Id);
        var spell = spells.Cast<Spell?>().LastOrDefault(s => s!.Value.From <= latest && s.Value.End >= earliest);
        w.Add(
            new Break
            {
                BladeId = blade.Id,
                SawId = spell?.SawId,
                Site = c.Site,
                EarliestUtc = earliest,
                LatestUtc = latest,
                HoursLow = c.HoursLow,
                HoursHigh = c.HoursHigh,
                MinutesLost = c.MinutesLost,
                CostMinor = c.CostMinor,
                Note = c.Note,
            },
            latest);
        if (spell is { Until: null } open)
        {
            // It broke on the saw and is on it no longer.
            w.RefuseUnless(open.From < latest, nameof(c.LatestUtc), $"{await SpellRules.Words(w, open)}: it cannot have broken before that.");
            w.Add(new Dismount { MountId = open.MountId, Reason = OffReason.Broke }, latest);
            w.Touched.Spell(open.SawId, blade.Id, latest, null);
            Edits.Bump(w, (await w.Db.Saws.FindAsync(open.SawId))!);
        }

        w.Touched.Blades.Add(blade.Id);
        w.AnswerPath = "/breaks";
    }

    public static async Task Handle(WriteSession w, CompleteBreak c)
    {
        w.RefuseUnless(c.HoursLow is null || c.HoursHigh is null || c.HoursLow <= c.HoursHigh, nameof(c.HoursHigh), "The upper hours must not be below the lower ones.");
        var known = await w.Db.Breaks.AsNoTracking().SingleOrDefaultAsync(b => b.EntryId == c.EntryId);
        w.RefuseUnless(known is not null, nameof(c.EntryId), $"There is no break with the entry {c.EntryId}; it may have been completed already.");
        if (known is null || !w.Stands)
        {
            return;
        }

        w.Void(known.EntryId, "Completed later.");
        w.Add(
            new Break
            {
                BladeId = known.BladeId,
                SawId = known.SawId,
                Site = c.Site,
                EarliestUtc = known.EarliestUtc,
                LatestUtc = known.LatestUtc,
                HoursLow = c.HoursLow,
                HoursHigh = c.HoursHigh,
                MinutesLost = c.MinutesLost,
                CostMinor = c.CostMinor,
                Note = string.IsNullOrWhiteSpace(c.Note) ? null : c.Note.Trim(),
            },
            known.LatestUtc);
        w.Touched.Blades.Add(known.BladeId);
        w.AnswerPath = "/breaks";
    }
}
