using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>The rows a picture of the shop is put together from: a fixed number of queries, whatever the number of blades.</summary>
internal sealed class ShopRows
{
    public required Shop Shop { get; init; }

    public required IReadOnlyDictionary<string, Setting> Settings { get; init; }

    public required IReadOnlyList<Saw> Saws { get; init; }

    public required IReadOnlyDictionary<int, SawSetup> Setups { get; init; }

    public required IReadOnlyList<Blade> Blades { get; init; }

    public required IReadOnlyDictionary<int, BladeNow> Now { get; init; }

    public required IReadOnlyList<QueuedCut> Cuts { get; init; }

    public required IReadOnlyList<SpellRow> Spells { get; init; }

    public required ILookup<int, Exposure> Exposures { get; init; }

    public required ILookup<int, WoodPath> Paths { get; init; }

    public required ILookup<int, Sharpening> Sharpenings { get; init; }

    public required ILookup<int, Joint> Joints { get; init; }

    public required IReadOnlyDictionary<int, Split> SplitsByChild { get; init; }

    public required ILookup<int, TensionRow> Tensions { get; init; }

    public required ILookup<int, DriftRow> Drifts { get; init; }

    public required ILookup<int, KerfReading> Kerfs { get; init; }

    public required IReadOnlyDictionary<int, Hold> Holds { get; init; }

    public required IReadOnlyDictionary<int, PriorUse> PriorUses { get; init; }

    public required IReadOnlyDictionary<int, AwayIn> Away { get; init; }

    public required ILookup<int, Break> Breaks { get; init; }

    public required IReadOnlyDictionary<int, Retirement> Retirements { get; init; }

    public required IReadOnlyDictionary<int, Inspection> LastInspections { get; init; }

    public required IReadOnlyDictionary<int, (long Known, long Unknown)> Running { get; init; }

    public required IReadOnlyDictionary<int, Slack> Slacks { get; init; }

    /// <summary>Looks that said what they saw.</summary>
    public required ILookup<int, Inspection> Marked { get; init; }

    public required IReadOnlyDictionary<int, StartCheck> Checks { get; init; }

    /// <summary>Timers that run, by saw.</summary>
    public required IReadOnlyDictionary<int, TimerStarted> Timers { get; init; }

    public required LoopsThen Loops { get; init; }

    public static async Task<ShopRows> Read(ShopDb db)
    {
        var blades = await db.Blades.AsNoTracking().Include(b => b.Spec).OrderBy(b => b.Id).ToListAsync();
        ShareSpecs(blades);
        var looks = await db.Inspections.AsNoTracking().Include(i => i.Entry).ToListAsync();
        var joints = await db.Joints.AsNoTracking().Include(j => j.Entry).ToListAsync();
        var setups = await db.SawSetups.AsNoTracking().Include(s => s.Entry).Include(s => s.Wheels.OrderBy(x => x.Position)).Include(s => s.Speeds.OrderBy(x => x.Position)).AsSplitQuery().ToListAsync();
        return new ShopRows
        {
            Shop = await db.Shops.AsNoTracking().OrderBy(s => s.Id).FirstAsync(),
            Settings = await db.Settings.AsNoTracking().ToDictionaryAsync(s => s.Key),
            Saws = await db.Saws.AsNoTracking().OrderBy(s => s.Code).ToListAsync(),
            Setups = setups.ToDictionary(s => s.EntryId),
            Blades = blades,
            Now = await db.BladesNow.AsNoTracking().ToDictionaryAsync(b => b.BladeId),
            Cuts = await db.QueuedCuts.AsNoTracking().OrderBy(c => c.Order).ThenBy(c => c.Number).ToListAsync(),
            Spells = await ReadSpells(db),
            Exposures = (await db.Exposures.AsNoTracking().OrderBy(e => e.MountId).ThenBy(e => e.SetupId).ThenBy(e => e.SpeedMps).ToListAsync()).ToLookup(e => e.MountId),
            Paths = (await db.WoodPaths.AsNoTracking().ToListAsync()).ToLookup(p => p.MountId),
            Sharpenings = (await db.Sharpenings.AsNoTracking().Include(s => s.Entry).ToListAsync())
                .OrderBy(s => s.Entry.AtUtc).ThenBy(s => s.EntryId).ToLookup(s => s.BladeId),
            Joints = joints.OrderBy(j => j.Entry.AtUtc).ThenBy(j => j.EntryId).ToLookup(j => j.BladeId),
            SplitsByChild = await db.Splits.AsNoTracking().Include(s => s.Entry).ToDictionaryAsync(s => s.ChildId),
            Tensions = (await db.TensionReadings.AsNoTracking().Select(t => new TensionRow(t.BladeId, t.SawId, t.Entry.AtUtc, t.EntryId, t.TensionPa)).ToListAsync())
                .OrderBy(t => t.At).ThenBy(t => t.Id).ToLookup(t => t.BladeId),
            Drifts = (await db.Drifts.AsNoTracking().Select(d => new DriftRow(d.BladeId, d.SawId, d.Entry.AtUtc, d.EntryId, d.AngleRad)).ToListAsync())
                .OrderBy(d => d.At).ThenBy(d => d.Id).ToLookup(d => d.BladeId),
            Kerfs = (await db.KerfReadings.AsNoTracking().Include(k => k.Entry).ToListAsync())
                .OrderBy(k => k.Entry.AtUtc).ThenBy(k => k.EntryId).ToLookup(k => k.BladeId),
            Holds = await db.Holds.AsNoTracking().Include(h => h.Entry).Where(h => db.BladesNow.Any(b => b.HoldId == h.EntryId)).ToDictionaryAsync(h => h.BladeId),
            PriorUses = Last(await db.PriorUses.AsNoTracking().Include(p => p.Entry).ToListAsync(), p => p.BladeId),
            Away = await ReadAway(db),
            Breaks = (await db.Breaks.AsNoTracking().Include(b => b.Entry).ToListAsync()).OrderBy(b => b.LatestUtc).ThenBy(b => b.EntryId).ToLookup(b => b.BladeId),
            Retirements = Last(await db.Retirements.AsNoTracking().Include(r => r.Entry).ToListAsync(), r => r.BladeId),
            LastInspections = Last(looks, i => i.BladeId),
            Marked = looks.Where(i => i.Marks is not null).OrderBy(i => i.Entry.AtUtc).ThenBy(i => i.EntryId).ToLookup(i => i.BladeId),
            Running = await ReadRunning(db),
            Slacks = Last(await db.Slacks.AsNoTracking().Include(s => s.Entry).ToListAsync(), s => s.SawId),
            Checks = Last(await db.StartChecks.AsNoTracking().Include(c => c.Entry).ToListAsync(), c => c.SawId),
            Timers = await RunningTimers(db).ToDictionaryAsync(t => t.SawId),
            Loops = new LoopsThen(
                blades.ToDictionary(b => b.Id, b => b.ParentId is null ? b.Spec.NewLoopM : null),
                joints.Select(j => new LoopFrom(j.BladeId, j.Entry.AtUtc, j.EntryId, j.LoopM))),
        };
    }

    /// <summary>Cuts of the given spells with the time each ended, where a sharpening falls inside a spell.</summary>
    public static async Task<ILookup<int, CutLine>> CutsOf(ShopDb db, IReadOnlyCollection<SpellRow> spells)
    {
        if (spells.Count == 0)
        {
            return Enumerable.Empty<(int, CutLine)>().ToLookup(c => c.Item1, c => c.Item2);
        }

        var ids = spells.Select(s => s.MountId).ToList();
        var rows = await db.Mounts.AsNoTracking().Where(m => ids.Contains(m.EntryId))
            .SelectMany(m => db.CutsDone.Where(c => c.SawId == m.SawId && c.Entry.AtUtc > m.Entry.AtUtc), (m, c) => new
            {
                m.EntryId,
                Cut = new CutLine(c.EntryId, c.SawId, c.Entry.AtUtc, c.WoodClass, c.Dirt, c.HeightM, c.LengthM, c.Pieces, c.FeedMps, c.SpeedMps),
            })
            .ToListAsync();
        return rows.ToLookup(r => r.EntryId, r => r.Cut);
    }

    /// <summary>Shares of the given spells with their runs' windows, where an inspection falls inside a spell.</summary>
    public static async Task<ILookup<int, ShareRow>> SharesOf(ShopDb db, IReadOnlyCollection<SpellRow> spells)
    {
        var ids = spells.Select(s => s.MountId).ToList();
        var rows = ids.Count == 0
            ? []
            : await db.RunShares.AsNoTracking().Where(s => s.MountId != null && ids.Contains(s.MountId.Value))
                .Join(db.Runs, s => s.RunId, r => r.EntryId, (s, r) => new ShareRow(s.MountId!.Value, r.FromUtc, r.UntilUtc, s.Ms))
                .ToListAsync();
        return rows.ToLookup(r => r.MountId);
    }

    /// <summary>Of each saw the newest start, where it has no run.</summary>
    internal static IQueryable<TimerStarted> RunningTimers(ShopDb db) => db.TimersStarted.AsNoTracking().Include(t => t.Entry)
        .Where(t => !db.TimersStarted.Any(o => o.SawId == t.SawId && o.EntryId > t.EntryId) && !db.Runs.Any(r => r.TimerId == t.EntryId));

    private static async Task<List<SpellRow>> ReadSpells(ShopDb db)
    {
        var off = await db.Dismounts.AsNoTracking().Select(d => new { d.MountId, d.Entry.AtUtc, d.Reason }).ToDictionaryAsync(d => d.MountId);
        var rows = await db.Mounts.AsNoTracking()
            .Select(m => new { m.EntryId, m.SawId, m.BladeId, m.Entry.AtUtc, m.TensionPa, m.TensionKnown, m.InsideOut })
            .ToListAsync();
        return
        [
            .. rows
                .Select(m => (On: m, Off: off.GetValueOrDefault(m.EntryId)))
                .Select(m => new SpellRow(
                    m.On.EntryId, m.On.SawId, m.On.BladeId, m.On.AtUtc, m.Off?.AtUtc,
                    m.On.TensionKnown == TensionKnown.Measured ? m.On.TensionPa : null, m.On.InsideOut, m.Off?.Reason))
                .OrderBy(s => s.From).ThenBy(s => s.MountId),
        ];
    }

    private static async Task<Dictionary<int, AwayIn>> ReadAway(ShopDb db)
    {
        var lines = await db.BatchLines.AsNoTracking()
            .Where(l => !db.BatchReturns.Any(r => r.LineId == l.EntryId))
            .Select(l => new { l.BladeId, l.Batch.Number, l.Batch.Service, l.Entry.AtUtc, l.Batch.PromisedUtc })
            .ToListAsync();
        return lines.GroupBy(l => l.BladeId).ToDictionary(
            g => g.Key, g => g.OrderBy(l => l.AtUtc).Select(l => new AwayIn(l.Number, l.Service, l.AtUtc, l.PromisedUtc)).Last());
    }

    private static async Task<Dictionary<int, (long, long)>> ReadRunning(ShopDb db)
    {
        var known = await db.Runs.AsNoTracking().GroupBy(r => r.SawId).Select(g => new { g.Key, Ms = g.Sum(r => r.RunningMs) }).ToDictionaryAsync(g => g.Key, g => g.Ms);
        var unknown = await db.RunShares.AsNoTracking().Where(s => s.MountId == null)
            .Join(db.Runs, s => s.RunId, r => r.EntryId, (s, r) => new { r.SawId, s.Ms })
            .GroupBy(s => s.SawId).Select(g => new { g.Key, Ms = g.Sum(s => s.Ms) }).ToDictionaryAsync(g => g.Key, g => g.Ms);
        return known.ToDictionary(k => k.Key, k => (k.Value, unknown.GetValueOrDefault(k.Key)));
    }

    /// <summary>Untracked rows bring a specification each; one object for each kind is enough.</summary>
    private static void ShareSpecs(List<Blade> blades)
    {
        var specs = new Dictionary<int, Spec>();
        foreach (var blade in blades)
        {
            if (!specs.TryAdd(blade.SpecId, blade.Spec))
            {
                blade.Spec = specs[blade.SpecId];
            }
        }
    }

    private static Dictionary<int, T> Last<T>(IEnumerable<T> facts, Func<T, int> of)
        where T : Fact =>
        facts.OrderBy(f => f.Entry.AtUtc).ThenBy(f => f.EntryId).GroupBy(of).ToDictionary(g => g.Key, g => g.Last());
}

internal readonly record struct SpellRow(int MountId, int SawId, int BladeId, DateTime From, DateTime? Until, double? MeasuredPa, bool InsideOut, OffReason? Off)
{
    public DateTime End => Until ?? DateTime.MaxValue;
}

internal readonly record struct TensionRow(int BladeId, int SawId, DateTime At, int Id, double TensionPa);

internal readonly record struct DriftRow(int BladeId, int SawId, DateTime At, int Id, double AngleRad);

internal readonly record struct ShareRow(int MountId, DateTime From, DateTime Until, long Ms);
