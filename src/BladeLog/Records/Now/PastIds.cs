using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>Which entries tell of a blade, and which of a saw.</summary>
internal static class PastIds
{
    public static IQueryable<int> OfBlade(ShopDb db, int id) => Ids(db.Mounts.Where(f => f.BladeId == id))
        .Concat(Ids(db.Dismounts.Where(f => f.Mount.BladeId == id)))
        .Concat(Ids(db.Sharpenings.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Joints.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Splits.Where(f => f.ParentId == id || f.ChildId == id)))
        .Concat(Ids(db.PriorUses.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Hangs.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Retags.Where(f => f.BladeId == id)))
        .Concat(Ids(db.BatchLines.Where(f => f.BladeId == id)))
        .Concat(Ids(db.BatchReturns.Where(f => f.Line.BladeId == id)))
        .Concat(Ids(db.TensionReadings.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Drifts.Where(f => f.BladeId == id)))
        .Concat(Ids(db.KerfReadings.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Holds.Where(f => f.BladeId == id)))
        .Concat(Ids(db.HoldsCleared.Where(f => f.Hold.BladeId == id)))
        .Concat(Ids(db.Inspections.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Breaks.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Retirements.Where(f => f.BladeId == id)));

    public static IQueryable<int> OfSaw(ShopDb db, int id) => Ids(db.SawSetups.Where(f => f.SawId == id))
        .Concat(Ids(db.Mounts.Where(f => f.SawId == id)))
        .Concat(Ids(db.Dismounts.Where(f => f.Mount.SawId == id)))
        .Concat(Ids(db.Slacks.Where(f => f.SawId == id)))
        .Concat(Ids(db.StartChecks.Where(f => f.SawId == id)))
        .Concat(Ids(db.TimersStarted.Where(f => f.SawId == id && !db.Runs.Any(r => r.TimerId == f.EntryId))))
        .Concat(Ids(db.MeterEpochs.Where(f => f.SawId == id)))
        .Concat(Ids(db.MeterReadings.Where(f => f.SawId == id)))
        .Concat(Ids(db.Runs.Where(f => f.SawId == id && f.ReadingId == null)))
        .Concat(Ids(db.CutsDone.Where(f => f.SawId == id)))
        .Concat(Ids(db.Breaks.Where(f => f.SawId == id)));

    private static IQueryable<int> Ids<T>(IQueryable<T> facts)
        where T : Fact => facts.IgnoreQueryFilters().Select(f => f.EntryId);
}
