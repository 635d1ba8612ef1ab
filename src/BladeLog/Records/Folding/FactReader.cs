using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Folding;

/// <summary>Reads what the folds need from the facts that stand. Struck-out facts are left out by their filter.</summary>
public static class FactReader
{
    public static async Task<List<SetupFrom>> Setups(ShopDb db, int? sawId = null)
    {
        var rows = db.SawSetups.AsNoTracking();
        rows = sawId is { } saw ? rows.Where(s => s.SawId == saw) : rows;
        return await rows.Select(s => new SetupFrom(s.EntryId, s.SawId, s.Entry.AtUtc, s.LoopM)).ToListAsync();
    }

    /// <summary>All spells, or those of some saws or blades.</summary>
    public static async Task<List<Spell>> ReadSpells(ShopDb db, IReadOnlyCollection<int>? saws = null, IReadOnlyCollection<int>? blades = null)
    {
        var mounts = db.Mounts.AsNoTracking();
        if (saws is not null || blades is not null)
        {
            var ofSaws = saws ?? [];
            var ofBlades = blades ?? [];
            mounts = mounts.Where(m => ofSaws.Contains(m.SawId) || ofBlades.Contains(m.BladeId));
        }

        var rows = await mounts
            .Select(m => new { m.EntryId, m.SawId, m.BladeId, m.Entry.AtUtc })
            .ToListAsync();
        var dismounts = db.Dismounts.AsNoTracking();
        if (saws is not null || blades is not null)
        {
            var ofSaws = saws ?? [];
            var ofBlades = blades ?? [];
            dismounts = dismounts.Where(d => ofSaws.Contains(d.Mount.SawId) || ofBlades.Contains(d.Mount.BladeId));
        }

        var off = await dismounts.Select(d => new { d.EntryId, d.MountId, d.Entry.AtUtc }).ToListAsync();
        return Spells.Fold(rows.Select(m => (m.EntryId, m.SawId, m.BladeId, m.AtUtc)), off.Select(d => (d.EntryId, d.MountId, d.AtUtc)));
    }

    /// <summary>Runs of a saw whose window meets the given one; without a window, all.</summary>
    public static async Task<List<RunLine>> Runs(ShopDb db, int? sawId = null, DateTime? from = null, DateTime? until = null)
    {
        var rows = db.Runs.AsNoTracking();
        rows = sawId is { } saw ? rows.Where(r => r.SawId == saw) : rows;
        rows = from is { } f ? rows.Where(r => r.UntilUtc > f) : rows;
        rows = until is { } u ? rows.Where(r => r.FromUtc < u) : rows;
        return await rows.Select(r => new RunLine(r.EntryId, r.SawId, r.FromUtc, r.UntilUtc, r.RunningMs, r.SpeedMps)).ToListAsync();
    }

    /// <summary>Cuts of a saw that ended after one time and not after another; without them, all.</summary>
    public static async Task<List<CutLine>> Cuts(ShopDb db, int? sawId = null, DateTime? after = null, DateTime? until = null)
    {
        var rows = db.CutsDone.AsNoTracking();
        rows = sawId is { } saw ? rows.Where(c => c.SawId == saw) : rows;
        rows = after is { } a ? rows.Where(c => c.Entry.AtUtc > a) : rows;
        rows = until is { } u ? rows.Where(c => c.Entry.AtUtc <= u) : rows;
        return await rows
            .Select(c => new CutLine(c.EntryId, c.SawId, c.Entry.AtUtc, c.WoodClass, c.Dirt, c.HeightM, c.LengthM, c.Pieces, c.FeedMps, c.SpeedMps))
            .ToListAsync();
    }

    public static async Task<LoopsThen> Loops(ShopDb db, IReadOnlyCollection<int>? blades = null)
    {
        var joints = db.Joints.AsNoTracking();
        var things = db.Blades.AsNoTracking();
        if (blades is not null)
        {
            joints = joints.Where(j => blades.Contains(j.BladeId));
            things = things.Where(b => blades.Contains(b.Id));
        }

        var loops = await joints.Select(j => new LoopFrom(j.BladeId, j.Entry.AtUtc, j.EntryId, j.LoopM)).ToListAsync();
        var starts = await things.Select(b => new { b.Id, b.Spec.NewLoopM, b.ParentId }).ToListAsync();
        return new LoopsThen(starts.ToDictionary(b => b.Id, b => b.ParentId is null ? b.NewLoopM : null), loops);
    }

    public static async Task<List<BladeStart>> Starts(ShopDb db, IReadOnlyCollection<int>? blades = null)
    {
        var things = db.Blades.AsNoTracking();
        things = blades is null ? things : things.Where(b => blades.Contains(b.Id));
        return await things.Select(b => new BladeStart(b.Id, b.Spec.WidthM, b.ParentId == null ? b.Spec.NewLoopM : null, b.ParentId != null)).ToListAsync();
    }
}
