using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>The facts behind entries of one kind, whether they stand or not, with the facts they speak of.</summary>
internal static class PastFacts
{
    public static Task<List<Fact>> Read(ShopDb db, string kind, IReadOnlyCollection<int> ids) => kind switch
    {
        nameof(SawSetup) => Of(db.SawSetups, ids),
        nameof(Mount) => Of(db.Mounts, ids),
        nameof(Dismount) => Of(db.Dismounts.Include(f => f.Mount), ids),
        nameof(Slack) => Of(db.Slacks, ids),
        nameof(StartCheck) => Of(db.StartChecks, ids),
        nameof(TimerStarted) => Of(db.TimersStarted, ids),
        nameof(MeterEpoch) => Of(db.MeterEpochs, ids),
        nameof(MeterReading) => Of(db.MeterReadings, ids),
        nameof(Run) => Of(db.Runs, ids),
        nameof(CutDone) => Of(db.CutsDone, ids),
        nameof(Sharpening) => Of(db.Sharpenings, ids),
        nameof(Joint) => Of(db.Joints, ids),
        nameof(Split) => Of(db.Splits, ids),
        nameof(PriorUse) => Of(db.PriorUses, ids),
        nameof(Hang) => Of(db.Hangs, ids),
        nameof(Retag) => Of(db.Retags, ids),
        nameof(Batch) => Of(db.Batches, ids),
        nameof(BatchLine) => Of(db.BatchLines.Include(f => f.Batch), ids),
        nameof(BatchReturn) => Of(db.BatchReturns.Include(f => f.Line.Batch), ids),
        nameof(TensionReading) => Of(db.TensionReadings, ids),
        nameof(Drift) => Of(db.Drifts, ids),
        nameof(KerfReading) => Of(db.KerfReadings, ids),
        nameof(StockMove) => Of(db.StockMoves, ids),
        nameof(Hold) => Of(db.Holds, ids),
        nameof(HoldCleared) => Of(db.HoldsCleared.Include(f => f.Hold), ids),
        nameof(Inspection) => Of(db.Inspections, ids),
        nameof(Break) => Of(db.Breaks, ids),
        nameof(Retirement) => Of(db.Retirements, ids),
        nameof(HandOver) => Of(db.HandOvers, ids),
        nameof(HandOverRead) => Of(db.HandOversRead, ids),
        nameof(Trained) => Of(db.Trainings.Include(f => f.Person).Include(f => f.By), ids),
        nameof(LabelPrinted) => Of(db.LabelsPrinted, ids),
        _ => Task.FromResult(new List<Fact>()),
    };

    private static async Task<List<Fact>> Of<T>(IQueryable<T> facts, IReadOnlyCollection<int> ids)
        where T : Fact => [.. await facts.AsNoTracking().IgnoreQueryFilters().Where(f => ids.Contains(f.EntryId)).ToListAsync()];
}
