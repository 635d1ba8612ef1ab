using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>One fact of the past with who entered it; a struck-out one stays, with who struck it out and why.</summary>
public sealed record PastFact(Fact Fact)
{
    public DateTime AtUtc => Fact.Entry.AtUtc;

    public string? Who => Fact.Entry.Person?.Initials;

    public bool Struck => Fact.Entry.Void is not null;

    public string? StruckWhy => Fact.Entry.Void?.Reason;

    public string? StruckBy => Fact.Entry.Void?.Entry.Person?.Initials;
}

/// <summary>What happened to a blade or at a saw, newest first, struck-out entries among the rest.</summary>
public static class Past
{
    public static async Task<IReadOnlyList<PastFact>> OfBlade(ShopDb db, int bladeId)
    {
        List<Fact> facts =
        [
            .. await Read(db.Mounts.Include(m => m.Saw).Where(m => m.BladeId == bladeId)),
            .. await Read(db.Dismounts.Include(d => d.Mount.Saw).Where(d => d.Mount.BladeId == bladeId)),
            .. await Read(db.Sharpenings.Where(f => f.BladeId == bladeId)),
            .. await Read(db.Joints.Where(f => f.BladeId == bladeId)),
            .. await Read(db.Splits.Where(f => f.ParentId == bladeId || f.ChildId == bladeId)),
            .. await Read(db.PriorUses.Where(f => f.BladeId == bladeId)),
            .. await Read(db.Hangs.Where(f => f.BladeId == bladeId)),
            .. await Read(db.Retags.Where(f => f.BladeId == bladeId)),
            .. await Read(db.BatchLines.Include(l => l.Batch).Where(f => f.BladeId == bladeId)),
            .. await Read(db.BatchReturns.Include(r => r.Line.Batch).Where(f => f.Line.BladeId == bladeId)),
            .. await Read(db.TensionReadings.Where(f => f.BladeId == bladeId)),
            .. await Read(db.Drifts.Where(f => f.BladeId == bladeId)),
            .. await Read(db.KerfReadings.Where(f => f.BladeId == bladeId)),
            .. await Read(db.Holds.Where(f => f.BladeId == bladeId)),
            .. await Read(db.HoldsCleared.Where(f => f.Hold.BladeId == bladeId)),
            .. await Read(db.Inspections.Where(f => f.BladeId == bladeId)),
            .. await Read(db.Breaks.Where(f => f.BladeId == bladeId)),
            .. await Read(db.Retirements.Where(f => f.BladeId == bladeId)),
        ];
        return Newest(facts);
    }

    /// <summary>The last facts at a saw.</summary>
    public static async Task<IReadOnlyList<PastFact>> OfSaw(ShopDb db, int sawId, int most)
    {
        List<Fact> facts =
        [
            .. await Last(db.SawSetups.Where(f => f.SawId == sawId), most),
            .. await Last(db.Mounts.Include(m => m.Blade).Where(f => f.SawId == sawId), most),
            .. await Last(db.Dismounts.Include(d => d.Mount.Blade).Where(f => f.Mount.SawId == sawId), most),
            .. await Last(db.Slacks.Where(f => f.SawId == sawId), most),
            .. await Last(db.StartChecks.Where(f => f.SawId == sawId), most),
            .. await Last(db.TimersStarted.Where(f => f.SawId == sawId && !db.Runs.Any(r => r.TimerId == f.EntryId)), most),
            .. await Last(db.MeterEpochs.Where(f => f.SawId == sawId), most),
            .. await Last(db.MeterReadings.Where(f => f.SawId == sawId), most),
            .. await Last(db.Runs.Where(f => f.SawId == sawId && f.ReadingId == null), most),
            .. await Last(db.CutsDone.Where(f => f.SawId == sawId), most),
            .. await Last(db.Breaks.Include(b => b.Blade).Where(f => f.SawId == sawId), most),
        ];
        return [.. Newest(facts).Take(most)];
    }

    private static Task<List<T>> Last<T>(IQueryable<T> facts, int most)
        where T : Fact => Read(facts.OrderByDescending(f => f.Entry.AtUtc).ThenByDescending(f => f.EntryId).Take(most));

    private static Task<List<T>> Read<T>(IQueryable<T> facts)
        where T : Fact => facts.AsNoTracking().IgnoreQueryFilters()
            .Include(f => f.Entry.Person)
            .Include(f => f.Entry.Void!.Entry.Person)
            .ToListAsync();

    private static IReadOnlyList<PastFact> Newest(List<Fact> facts) =>
        [.. facts.OrderByDescending(f => f.Entry.AtUtc).ThenByDescending(f => f.EntryId).Select(f => new PastFact(f))];
}
