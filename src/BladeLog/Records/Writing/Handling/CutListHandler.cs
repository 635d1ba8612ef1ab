using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class CutListHandler
{
    public static async Task Handle(WriteSession w, QueueCut c)
    {
        Check(w, c.Cut);
        w.RefuseUnless(
            c.Cut.Number == 0 || !await w.Db.QueuedCuts.AnyAsync(q => q.Number == c.Cut.Number), "Number", $"There is a cut {c.Cut.Number} on the list already.");
        if (!w.Stands)
        {
            return;
        }

        w.NewEntry(nameof(QueueCut), w.Now);
        c.Cut.Number = c.Cut.Number > 0 ? c.Cut.Number : (await w.Db.QueuedCuts.MaxAsync(q => (int?)q.Number) ?? 0) + 1;
        c.Cut.Order = (await w.Db.QueuedCuts.MaxAsync(q => (int?)q.Order) ?? 0) + 1;
        c.Cut.AddedUtc = w.Now;
        w.Db.QueuedCuts.Add(c.Cut);
        w.AnswerPath = $"/cuts/{c.Cut.Number}";
    }

    public static async Task Handle(WriteSession w, EditCut c)
    {
        Check(w, c.Cut);
        var cut = await Find(w, c.Number);
        if (cut is null || !w.Stands)
        {
            return;
        }

        // What the list itself keeps of a cut is not the form's to change.
        (c.Cut.Number, c.Cut.Order, c.Cut.AddedUtc) = (cut.Number, cut.Order, cut.AddedUtc);
        (c.Cut.DoneEntryId, c.Cut.DroppedUtc) = (cut.DoneEntryId, cut.DroppedUtc);
        if (await Edits.Edit(w, cut, c.Version, c.Cut, $"cut {c.Number}"))
        {
            w.NewEntry(nameof(EditCut), w.Now);
            w.AnswerPath = $"/cuts/{c.Number}";
        }
    }

    public static async Task Handle(WriteSession w, DropCut c)
    {
        var cut = await Find(w, c.Number);
        if (cut is null || !await Edits.Guard(w, cut, c.Version, $"cut {c.Number}"))
        {
            return;
        }

        w.RefuseUnless(cut.DoneEntryId is null, "Number", $"Cut {c.Number} is done.");
        w.NewEntry(nameof(DropCut), w.Now);
        cut.DroppedUtc = w.Now;
        w.AnswerPath = "/cuts";
    }

    public static async Task Handle(WriteSession w, ReorderCuts c)
    {
        var cuts = await w.Db.QueuedCuts.Where(q => c.Numbers.Contains(q.Number)).ToListAsync();
        w.RefuseUnless(
            cuts.Count == c.Numbers.Count && c.Numbers.Distinct().Count() == c.Numbers.Count, "Numbers", "The list has changed: open it again.");
        if (!w.Stands)
        {
            return;
        }

        w.NewEntry(nameof(ReorderCuts), w.Now);
        var places = cuts.Select(q => q.Order).Order().ToList();
        for (var i = 0; i < places.Count; i++)
        {
            // Places already distinct stay the list's own; equal ones are spread.
            places[i] = i > 0 && places[i] <= places[i - 1] ? places[i - 1] + 1 : places[i];
            cuts.Single(q => q.Number == c.Numbers[i]).Order = places[i];
        }

        w.AnswerPath = "/cuts";
    }

    private static async Task<QueuedCut?> Find(WriteSession w, int number)
    {
        var cut = await w.Db.QueuedCuts.SingleOrDefaultAsync(q => q.Number == number);
        w.RefuseUnless(cut is not null, "Number", $"There is no cut {number} on the list.");
        return cut;
    }

    private static void Check(WriteSession w, QueuedCut c)
    {
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.Job), "Job", "Say what it is for.");
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.SpeciesKey), "Species", "Say which wood it is.");
        w.RefuseUnless(c.HeightM > 0 && double.IsFinite(c.HeightM), "Height", "The height must be above zero.");
        w.RefuseUnless(c.LengthM > 0 && double.IsFinite(c.LengthM), "Length", "The length must be above zero.");
        w.RefuseUnless(c.Pieces > 0, "Pieces", "At least one piece is to be cut.");
        w.RefuseUnless(c.RadiusM is null or > 0, "Radius", "The radius must be above zero.");
        w.RefuseUnless(c.BevelRad is >= 0 and < 1.5707, "Bevel", "The bevel must be less than 90 degrees.");
        w.RefuseUnless(c.MoisturePct is null or >= 0, "Moisture", "The moisture must not be below zero.");
        w.RefuseUnless(c.NailChance is >= 0 and <= 1, "NailChance", "The chance of a nail is between 0 and 1.");
    }
}
