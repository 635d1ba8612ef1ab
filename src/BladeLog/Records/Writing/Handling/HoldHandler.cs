using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class HoldHandler
{
    public static async Task Handle(WriteSession w, RecordHold c)
    {
        var blade = await w.FindBlade(c.Tag);
        var at = w.At(c.At);
        w.RefuseUnless(c.CrackLengthM is null or >= 0, nameof(c.CrackLengthM), "A length must not be below zero.");
        if (blade is null || !w.Stands)
        {
            return;
        }

        w.Add(new Hold { BladeId = blade.Id, Kind = c.Kind, CrackLengthM = c.CrackLengthM, CrackTyped = c.CrackTyped, Place = c.Place, Note = c.Note }, at);
        w.Touched.Blades.Add(blade.Id);
        w.AnswerPath = $"/b/{blade.Tag}";
    }

    /// <summary>Clears every hold the blade has.</summary>
    public static async Task Handle(WriteSession w, ClearHold c)
    {
        var blade = await w.FindBlade(c.Tag);
        var at = w.At(c.At);
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.How), nameof(c.How), "Say how it was cleared.");
        if (blade is null || !w.Stands)
        {
            return;
        }

        var open = await w.Db.Holds.AsNoTracking().Include(h => h.Entry)
            .Where(h => h.BladeId == blade.Id && !w.Db.HoldsCleared.Any(x => x.HoldId == h.EntryId))
            .ToListAsync();
        w.RefuseUnless(open.Count > 0, nameof(c.Tag), $"{blade.Tag} is not on hold.");
        foreach (var hold in open)
        {
            w.RefuseUnless(hold.Entry.AtUtc <= at, nameof(c.At), $"The hold is of {w.Say(hold.Entry.AtUtc)}, after this.");
            w.Add(new HoldCleared { HoldId = hold.EntryId, How = c.How.Trim() }, at);
        }

        w.Touched.Blades.Add(blade.Id);
        w.AnswerPath = $"/b/{blade.Tag}";
    }
}
