using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>Writes the kept state a write touched again, from the facts and by the same folds as the rebuild.</summary>
internal static class Recount
{
    public static async Task Apply(ShopDb db, Touched touched)
    {
        db.ChangeTracker.Clear();
        await OnSaws(db, touched.Mounts);
        foreach (var blade in touched.Loops)
        {
            foreach (var spell in await FactReader.ReadSpells(db, blade: blade))
            {
                touched.Window(spell.SawId, spell.From, spell.End);
            }
        }

        foreach (var (sawId, window) in touched.Windows)
        {
            await Window(db, sawId, window.From, window.Until);
        }

        await db.SaveChangesAsync();
        await Blades(db, touched.Blades);
    }

    /// <summary>Which blade is on which saw.</summary>
    public static async Task OnSaws(ShopDb db, HashSet<int> saws)
    {
        if (saws.Count == 0)
        {
            return;
        }

        // Deleted first and saved by itself: two blades that change places would break the unique key in one go.
        await db.OnSaws.Where(o => saws.Contains(o.SawId)).ExecuteDeleteAsync();
        var open = await db.Mounts.AsNoTracking()
            .Where(m => saws.Contains(m.SawId) && !db.Dismounts.Any(d => d.MountId == m.EntryId))
            .Select(m => new OnSaw { SawId = m.SawId, BladeId = m.BladeId, MountId = m.EntryId })
            .ToListAsync();
        db.OnSaws.AddRange(open);
        await db.SaveChangesAsync();
        db.ChangeTracker.Clear();
    }

    private static async Task Window(ShopDb db, int sawId, DateTime from, DateTime until)
    {
        var setups = await FactReader.Setups(db, sawId);
        var runs = await FactReader.Runs(db, sawId, from, until);
        var allFrom = runs.Select(r => r.From).Append(from).Min();
        var allUntil = runs.Select(r => r.Until).Append(until).Max();
        var spells = await FactReader.ReadSpells(db, sawId, from: allFrom, until: allUntil);

        // Paths are summed by spell, so the cuts of every spell of the window are needed from its beginning to its end.
        var inWindow = spells.Where(s => s.From <= until && s.End >= from).ToList();
        var cutsFrom = inWindow.Select(s => s.From).Append(allFrom).Min();
        var cutsUntil = inWindow.Select(s => s.End).Append(allUntil).Max();
        var saw = new SawFold(sawId, spells, await FactReader.Cuts(db, sawId, cutsFrom, cutsUntil), setups);
        var mounts = await Shares(db, saw, runs, from, until);
        await Exposures(db, mounts);
        await Paths(db, saw, sawId, [.. inWindow.Select(s => s.MountId)], from, until);
    }

    /// <summary>Shares the runs out again; gives every spell that had a share before or has one now.</summary>
    private static async Task<List<int>> Shares(ShopDb db, SawFold saw, List<RunLine> runs, DateTime from, DateTime until)
    {
        // Struck-out runs are found too, to take their shares away.
        var known = await db.Runs.IgnoreQueryFilters().AsNoTracking()
            .Where(r => r.SawId == saw.SawId && r.FromUtc < until && r.UntilUtc > from)
            .Join(db.RunShares, r => r.EntryId, s => s.RunId, (_, s) => s)
            .ToListAsync();
        var shares = runs.SelectMany(r => saw.Divide(r)).ToList();
        var keep = known.Select(s => (s.RunId, s.MountId, s.SetupId, s.Ms)).ToHashSet();
        var want = shares.Select(s => (s.RunId, s.MountId, s.SetupId, s.Ms)).ToHashSet();
        var gone = known.Where(s => !want.Contains((s.RunId, s.MountId, s.SetupId, s.Ms))).ToList();
        var come = shares.Where(s => !keep.Contains((s.RunId, s.MountId, s.SetupId, s.Ms))).ToList();
        db.RunShares.RemoveRange(gone);
        db.RunShares.AddRange(come);
        await db.SaveChangesAsync();
        return [.. gone.Concat(come).Select(s => s.MountId).OfType<int>().Distinct()];
    }

    private static async Task Exposures(ShopDb db, List<int> mounts)
    {
        if (mounts.Count == 0)
        {
            return;
        }

        var sums = await db.RunShares
            .Where(s => s.MountId != null && mounts.Contains(s.MountId.Value))
            .Join(db.Runs.IgnoreQueryFilters(), s => s.RunId, r => r.EntryId, (s, r) => new { MountId = s.MountId!.Value, s.SetupId, r.SpeedMps, s.Ms })
            .GroupBy(s => new { s.MountId, s.SetupId, s.SpeedMps })
            .Select(g => new Exposure { MountId = g.Key.MountId, SetupId = g.Key.SetupId, SpeedMps = g.Key.SpeedMps, RunningMs = g.Sum(s => s.Ms) })
            .ToListAsync();
        await db.Exposures.Where(e => mounts.Contains(e.MountId)).ExecuteDeleteAsync();
        db.Exposures.AddRange(sums);
    }

    private static async Task Paths(ShopDb db, SawFold saw, int sawId, HashSet<int> mounts, DateTime from, DateTime until)
    {
        // A struck-out mount may have kept paths that no spell claims any more.
        var stale = await db.Mounts.IgnoreQueryFilters()
            .Where(m => m.SawId == sawId && m.Entry.Void != null && m.Entry.AtUtc <= until && m.Entry.AtUtc >= from)
            .Join(db.WoodPaths, m => m.EntryId, p => p.MountId, (m, _) => m.EntryId)
            .Distinct()
            .ToListAsync();
        var touched = mounts.Concat(stale).ToList();
        if (touched.Count == 0)
        {
            return;
        }

        var loops = await FactReader.Loops(db, [.. saw.AllSpells.Where(s => mounts.Contains(s.MountId)).Select(s => s.BladeId).Distinct()]);
        var known = await db.WoodPaths.Where(p => touched.Contains(p.MountId)).ToListAsync();
        var paths = KeptState.PathsOf(saw, loops).Where(p => mounts.Contains(p.MountId)).ToList();
        foreach (var path in paths)
        {
            var row = known.Find(k => k.MountId == path.MountId && k.WoodClass == path.WoodClass && k.Dirt == path.Dirt);
            if (row is null)
            {
                db.WoodPaths.Add(path);
                continue;
            }

            (row.PathMm, row.AreaMm2, row.CutMs) = (path.PathMm, path.AreaMm2, path.CutMs);
            known.Remove(row);
        }

        db.WoodPaths.RemoveRange(known);
    }

    /// <summary>Where and how blades are.</summary>
    public static async Task Blades(ShopDb db, HashSet<int> blades)
    {
        if (blades.Count == 0)
        {
            return;
        }

        var events = (await BladeEvents.Read(db, blades)).ToLookup(e => e.BladeId);
        var known = await db.BladesNow.Where(b => blades.Contains(b.BladeId)).ToDictionaryAsync(b => b.BladeId);
        foreach (var start in await FactReader.Starts(db, blades))
        {
            var now = BladeFold.Now(start, events[start.BladeId]);
            if (known.TryGetValue(start.BladeId, out var row))
            {
                db.Entry(row).CurrentValues.SetValues(now);
            }
            else
            {
                db.BladesNow.Add(now);
            }
        }

        await db.SaveChangesAsync();
        db.ChangeTracker.Clear();
    }
}
