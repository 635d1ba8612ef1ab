using Microsoft.EntityFrameworkCore;
using static BladeLog.Records.HistoryKinds;

namespace BladeLog.Records;

/// <summary>What the facts of a blade's body, its joints and its batches say.</summary>
internal static class HistoryOfBlades
{
    public static Task<List<FactWords>> Say(ShopDb db, string kind, IReadOnlyCollection<int> ids) => kind switch
    {
        nameof(Sharpening) => Of(db.Sharpenings.Include(f => f.Blade), ids, f => new(
            f.EntryId, f.Blade.Tag, null, Word("grind", f.Kind.ToString()), Flag("set again", f.SetAgain), Length("width", f.WidthM), Length("gullet", f.GulletM), Length("kerf", f.KerfM), Number("price", f.PriceMinor, "minor"))),
        nameof(Joint) => Of(db.Joints.Include(f => f.Blade), ids, f => new(
            f.EntryId, f.Blade.Tag, null, Length("loop", f.LoopM), Word("quality", f.Quality.ToString()), Word("method", f.Method))),
        nameof(Split) => Splits(db, ids),
        nameof(PriorUse) => Both(db, db.PriorUses, ids, f => (f.BladeId, null), f =>
            [Number("used from", f.UsedLow, null), Number("used to", f.UsedHigh, null), Length("width", f.WidthM), Number("sharpenings", f.Sharpenings, null), Word("source", f.Source)]),
        nameof(Hang) => Both(db, db.Hangs, ids, f => (f.BladeId, null), f => [Word("place", f.Place.ToString()), Word("hook", f.Hook)]),
        nameof(Retag) => Both(db, db.Retags, ids, f => (f.BladeId, null), f => [Word("was", f.OldTag), Word("now", f.NewTag)]),
        nameof(Batch) => Of(db.Batches, ids, f => new(f.EntryId, null, null, Word("batch", f.Number), Word("service", f.Service))),
        nameof(BatchLine) => Of(db.BatchLines.Include(f => f.Blade).Include(f => f.Batch), ids, f => new(
            f.EntryId, f.Blade.Tag, null, Word("batch", f.Batch.Number), Word("service", f.Batch.Service))),
        nameof(BatchReturn) => Of(db.BatchReturns.Include(f => f.Line.Blade).Include(f => f.Line.Batch), ids, f => new(
            f.EntryId, f.Line.Blade.Tag, null, Word("batch", f.Line.Batch.Number), Word("outcome", f.Outcome.ToString()), Length("width", f.WidthM))),
        nameof(KerfReading) => Of(db.KerfReadings.Include(f => f.Blade).Include(f => f.Saw), ids, f => new(
            f.EntryId, f.Blade.Tag, f.Saw?.Code, Length("kerf", f.KerfM), Length("set left", f.SetLeftM), Length("set right", f.SetRightM), Length("set, both sides", f.SetBothM), Word("how", f.How.ToString()), Word("note", f.Note))),
        nameof(StockMove) => Stock(db, ids),
        nameof(Hold) => Of(db.Holds.Include(f => f.Blade), ids, f => new(
            f.EntryId, f.Blade.Tag, null, Word("kind", f.Kind.ToString()), Length("crack", f.CrackLengthM), Word("place", f.Place?.ToString()), Word("note", f.Note))),
        nameof(HoldCleared) => Of(db.HoldsCleared.Include(f => f.Hold.Blade), ids, f => new(f.EntryId, f.Hold.Blade.Tag, null, Word("how", f.How))),
        nameof(Inspection) => Of(db.Inspections.Include(f => f.Blade), ids, f => new(
            f.EntryId, f.Blade.Tag, null, Word("found", f.Found.ToString()), Word("looked at", f.LookedAt?.ToString()), Word("seen", f.Marks is null or BladeMarks.None ? null : f.Marks.ToString()),
            Number("teeth missing", f.TeethMissing, null), Length("crack", f.CrackLengthM), Word("place", f.Place?.ToString()), Word("note", f.Note))),
        nameof(Retirement) => Of(db.Retirements.Include(f => f.Blade), ids, f => new(
            f.EntryId, f.Blade.Tag, null, Word("reason", f.Reason.ToString()), Flag("cut up", f.CutUp), Word("note", f.Note))),
        nameof(LabelPrinted) => Of(db.LabelsPrinted.Include(f => f.Blade), ids, f => new(f.EntryId, f.Blade.Tag, null, Word("label", f.Tag))),
        nameof(HandOver) => Of(db.HandOvers, ids, f => new(f.EntryId, null, null, Word("note", f.Text))),
        nameof(HandOverRead) => Of(db.HandOversRead.Include(f => f.HandOver.Entry), ids, f => new(f.EntryId, null, null, Time("note of", f.HandOver.Entry.AtUtc))),
        nameof(Trained) => Of(db.Trainings.Include(f => f.Person).Include(f => f.By).Include(f => f.Saw), ids, f => new(
            f.EntryId, null, f.Saw?.Code, Word("person", f.Person.Initials), Word("task", f.Task.ToString()), Word("trained by", f.By.Initials), Due(f.RefresherUtc))),
        // An edit of a thing is an entry without a fact: its kind says it all.
        _ => Task.FromResult(new List<FactWords>()),
    };

    private static HistoryPart Due(DateTime? refresher) => refresher is { } due ? Time("refresher due", due) : Word("refresher due", null);

    private static async Task<List<FactWords>> Splits(ShopDb db, IReadOnlyCollection<int> ids)
    {
        var children = await db.Splits.IgnoreQueryFilters().Where(s => ids.Contains(s.EntryId))
            .Join(db.Blades, s => s.ChildId, b => b.Id, (s, b) => new { s.EntryId, b.Tag }).ToDictionaryAsync(s => s.EntryId, s => s.Tag);
        return await Both(db, db.Splits, ids, f => (f.ParentId, null), f => [Word("cut down to", children[f.EntryId]), Length("width", f.WidthM)]);
    }

    private static async Task<List<FactWords>> Stock(ShopDb db, IReadOnlyCollection<int> ids)
    {
        var specs = await db.StockMoves.IgnoreQueryFilters().Where(s => ids.Contains(s.EntryId))
            .Join(db.Specs, s => s.SpecId, b => b.Id, (s, b) => new { s.EntryId, b.Code }).ToDictionaryAsync(s => s.EntryId, s => s.Code);
        return await Both(db, db.StockMoves, ids, _ => (null, null), f => [Word("specification", specs[f.EntryId]), Number("count", f.Count, null), Word("reason", f.Reason)]);
    }
}
