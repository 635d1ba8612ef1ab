using BladeLog.Advice;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Prints;

/// <summary>What the audit reads, each kind in one query.</summary>
internal sealed record AuditFacts
{
    public required IReadOnlyList<Blade> Blades { get; init; }

    public required IReadOnlyList<Saw> Saws { get; init; }

    public required IReadOnlyList<Inspection> Looks { get; init; }

    public required IReadOnlyList<Hold> Holds { get; init; }

    public required IReadOnlyList<HoldCleared> Cleared { get; init; }

    public required IReadOnlyList<Break> Breaks { get; init; }

    public required IReadOnlyList<Retirement> Retirements { get; init; }

    public required IReadOnlyList<Trained> Trainings { get; init; }

    public required IReadOnlyList<StartCheck> Checks { get; init; }

    /// <summary>When each cut ended, by saw: with the running it tells on which days a saw ran.</summary>
    public required IReadOnlyList<(int SawId, DateTime AtUtc)> Cuts { get; init; }

    public required IReadOnlyList<(int BladeId, DateTime AtUtc, int SawId)> Mounts { get; init; }

    public required ILookup<int, RunUpTo> Runs { get; init; }

    public required IReadOnlyList<(int SawId, DateTime UntilUtc, long Ms)> SawRuns { get; init; }

    /// <summary>When the record begins: the first mount, look, run or training told of.</summary>
    public DateTime? FirstUtc => new[]
    {
        Mounts.Select(m => m.AtUtc).Append(DateTime.MaxValue).Min(),
        Looks.Select(l => l.Entry.AtUtc).Append(DateTime.MaxValue).Min(),
        SawRuns.Select(r => r.UntilUtc).Append(DateTime.MaxValue).Min(),
        Trainings.Select(t => t.Entry.AtUtc).Append(DateTime.MaxValue).Min(),
    }.Min() is var first && first < DateTime.MaxValue ? first : null;

    /// <summary>Of inspections, holds, their clearing, breaks, trainings and checks.</summary>
    public required IReadOnlyList<DateTime> StruckOut { get; init; }

    public static async Task<AuditFacts> Read(ShopDb db)
    {
        string[] kinds = [nameof(Inspection), nameof(Hold), nameof(HoldCleared), nameof(Break), nameof(Retirement), nameof(Trained), nameof(StartCheck)];
        var shares = await db.RunShares.AsNoTracking()
            .Join(db.Runs, s => s.RunId, r => r.EntryId, (s, r) => new { s.MountId, s.Ms, r.UntilUtc })
            .Join(db.Mounts, s => s.MountId, m => m.EntryId, (s, m) => new { m.BladeId, s.UntilUtc, s.Ms, m.SawId })
            .ToListAsync();
        return new AuditFacts
        {
            Blades = await db.Blades.AsNoTracking().Include(b => b.Spec).ToListAsync(),
            Saws = await db.Saws.AsNoTracking().OrderBy(s => s.Code).ToListAsync(),
            Looks = await Past.Standing(db.Inspections).ToListAsync(),
            Holds = await Past.Standing(db.Holds).ToListAsync(),
            Cleared = await Past.Standing(db.HoldsCleared.Include(c => c.Hold.Entry)).ToListAsync(),
            Breaks = await Past.Standing(db.Breaks).ToListAsync(),
            Retirements = await Past.Standing(db.Retirements).ToListAsync(),
            Checks = await Past.Standing(db.StartChecks).ToListAsync(),
            Cuts = [.. (await db.CutsDone.AsNoTracking().Select(c => new { c.SawId, c.Entry.AtUtc }).ToListAsync()).Select(c => (c.SawId, c.AtUtc))],
            Trainings = await Past.Standing(db.Trainings.Include(t => t.Person).Include(t => t.By)).ToListAsync(),
            Mounts = [.. (await db.Mounts.AsNoTracking().Select(m => new { m.BladeId, m.Entry.AtUtc, m.SawId }).ToListAsync()).Select(m => (m.BladeId, m.AtUtc, m.SawId)).OrderBy(m => m.AtUtc)],
            Runs = shares.ToLookup(s => s.BladeId, s => new RunUpTo(s.UntilUtc, s.Ms, s.SawId)),
            SawRuns = [.. (await db.Runs.AsNoTracking().Select(r => new { r.SawId, r.UntilUtc, r.RunningMs }).ToListAsync()).Select(r => (r.SawId, r.UntilUtc, r.RunningMs))],
            StruckOut = await db.Entries.AsNoTracking().Where(e => e.Void != null && kinds.Contains(e.Kind)).Select(e => e.AtUtc).ToListAsync(),
        };
    }

    /// <summary>Every blade's gaps from the first day on, by the rule as it stands today.</summary>
    public IReadOnlyList<BladeGaps> Gaps() =>
    [
        .. Blades.Select(b => new BladeGaps(b, InspectionGaps.Of(
            b.InspectEveryH,
            b.InspectEachMount,
            Runs[b.Id],
            Mounts.Where(m => m.BladeId == b.Id).Select(m => (m.AtUtc, m.SawId)),
            Looks.Where(l => l.BladeId == b.Id).Select(l => l.Entry.AtUtc)))),
    ];

    /// <summary>The saw a blade was on at that time, or had been on last.</summary>
    public int? SawOf(int bladeId, DateTime at)
    {
        var before = Mounts.Where(m => m.BladeId == bladeId && m.AtUtc <= at).ToList();
        return before.Count > 0 ? before[^1].SawId : Mounts.Where(m => m.BladeId == bladeId).Select(m => (int?)m.SawId).FirstOrDefault();
    }
}
