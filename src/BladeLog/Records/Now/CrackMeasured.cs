using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>A crack as it was measured at one look.</summary>
public sealed record CrackMeasured(DateTime AtUtc, double LengthM, CrackPlace? Place);

/// <summary>Running of the blade between two looks: a run that reaches over one of them counts for its part.</summary>
public sealed record RunBetween(SawSetup Setup, double SpeedMps, double Hours);

/// <summary>One crack measured at two looks, and what ran between them.</summary>
public sealed record CrackTwice(CrackMeasured Before, CrackMeasured After, IReadOnlyList<RunBetween> Runs)
{
    /// <summary>Ways of clearing a hold after which another crack is another crack.</summary>
    private static readonly string[] Gone = ["ground out", "cut out", "looked again, no crack found", "no crack found"];

    /// <summary>The blade's last two measurements of one crack; null where there are not two, or it was ground or cut out between.</summary>
    public static async Task<CrackTwice?> Read(ShopDb db, int bladeId)
    {
        var looks = await db.Inspections.AsNoTracking().Where(i => i.BladeId == bladeId && i.CrackLengthM > 0)
            .Select(i => new { i.EntryId, i.Entry.Op, i.Entry.AtUtc, Length = i.CrackLengthM!.Value, i.Place }).ToListAsync();
        var holds = await db.Holds.AsNoTracking().Where(h => h.BladeId == bladeId && h.CrackLengthM > 0)
            .Select(h => new { h.EntryId, h.Entry.Op, h.Entry.AtUtc, Length = h.CrackLengthM!.Value, h.Place }).ToListAsync();
        var measured = looks.Concat(holds.Where(h => looks.TrueForAll(l => l.Op != h.Op))).OrderBy(m => m.AtUtc).ThenBy(m => m.EntryId).ToList();
        if (measured.Count < 2)
        {
            return null;
        }

        var last = measured[^1];
        var before = measured[..^1].LastOrDefault(m => m.AtUtc < last.AtUtc && (m.Place is null || last.Place is null || m.Place == last.Place));
        if (before is null || await MendedBetween(db, bladeId, before.AtUtc, last.AtUtc))
        {
            return null;
        }

        return new CrackTwice(
            new(before.AtUtc, before.Length, before.Place), new(last.AtUtc, last.Length, last.Place), await RunningBetween(db, bladeId, before.AtUtc, last.AtUtc));
    }

    private static async Task<bool> MendedBetween(ShopDb db, int bladeId, DateTime from, DateTime until)
    {
        var cleared = await db.HoldsCleared.AsNoTracking().Where(c => c.Hold.BladeId == bladeId && c.Entry.AtUtc >= from && c.Entry.AtUtc <= until).Select(c => c.How).ToListAsync();
        return cleared.Exists(how => Gone.Any(g => how.StartsWith(g, StringComparison.OrdinalIgnoreCase)))
            || await db.Joints.AnyAsync(j => j.BladeId == bladeId && j.Entry.AtUtc >= from && j.Entry.AtUtc <= until)
            || await db.Sharpenings.AnyAsync(s => s.BladeId == bladeId && s.Kind == GrindKind.FullProfile && s.Entry.AtUtc >= from && s.Entry.AtUtc <= until);
    }

    private static async Task<List<RunBetween>> RunningBetween(ShopDb db, int bladeId, DateTime from, DateTime until)
    {
        var shares = await db.RunShares.AsNoTracking()
            .Join(db.Mounts.Where(m => m.BladeId == bladeId), s => s.MountId, m => m.EntryId, (s, _) => s)
            .Join(db.Runs.Where(r => r.FromUtc < until && r.UntilUtc > from), s => s.RunId, r => r.EntryId, (s, r) => new { s.SetupId, s.Ms, r.SpeedMps, r.FromUtc, r.UntilUtc })
            .ToListAsync();
        var ids = shares.Select(s => s.SetupId).Distinct().ToList();
        var setups = await db.SawSetups.AsNoTracking().Include(s => s.Wheels).Where(s => ids.Contains(s.EntryId)).ToDictionaryAsync(s => s.EntryId);
        return
        [
            .. shares.Select(s =>
            {
                var (start, end) = (s.FromUtc > from ? s.FromUtc : from, s.UntilUtc < until ? s.UntilUtc : until);
                return new RunBetween(setups[s.SetupId], s.SpeedMps, s.Ms / 3_600_000.0 * ((end - start) / (s.UntilUtc - s.FromUtc)));
            }),
        ];
    }
}
