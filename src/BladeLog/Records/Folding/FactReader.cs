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

    /// <summary>All spells, or those of a saw and of a blade; of these, only the ones that touch a window where one is given.</summary>
    /// <remarks>
    /// Written in SQL: the joins of two filtered facts make SQLite build a table of every dismount for each question,
    /// tens of milliseconds at 20,000 mounts; asked mount by mount it is a few.
    /// </remarks>
    public static async Task<List<Spell>> ReadSpells(ShopDb db, int? saw = null, int? blade = null, DateTime? from = null, DateTime? until = null)
    {
        if (saw is null && blade is null)
        {
            return await AllSpells(db);
        }

        var latest = RecordRules.Store(until ?? DateTime.MaxValue);
        var earliest = RecordRules.Store(from ?? DateTime.MinValue);
        var rows = await db.Database.SqlQuery<SpellFound>($"""
            select m.entry_id as MountId, m.saw_id as SawId, m.blade_id as BladeId, e.at_utc as "From", d.entry_id as DismountId, x.at_utc as "Until"
            from mount m
            join entry e on e.id = m.entry_id
            left join dismount d on d.mount_id = m.entry_id and not exists (select 1 from void where voided_id = d.entry_id)
            left join entry x on x.id = d.entry_id
            where (m.saw_id = {saw ?? 0} or m.blade_id = {blade ?? 0})
              and e.at_utc <= {latest}
              and (x.at_utc is null or x.at_utc >= {earliest})
              and not exists (select 1 from void where voided_id = m.entry_id)
            """).ToListAsync();
        return
        [
            .. rows.Select(m => new Spell(m.MountId, m.SawId, m.BladeId, Utc(m.From), m.Until is { } at ? Utc(at) : null, m.DismountId))
                .OrderBy(s => s.From).ThenBy(s => s.MountId),
        ];
    }

    private static DateTime Utc(DateTime time) => DateTime.SpecifyKind(time, DateTimeKind.Utc);

    private static async Task<List<Spell>> AllSpells(ShopDb db)
    {
        var mounts = await db.Mounts.AsNoTracking().Select(m => new { m.EntryId, m.SawId, m.BladeId, m.Entry.AtUtc }).ToListAsync();
        var dismounts = await db.Dismounts.AsNoTracking().Select(d => new { d.EntryId, d.MountId, d.Entry.AtUtc }).ToListAsync();
        return Spells.Fold(mounts.Select(m => (m.EntryId, m.SawId, m.BladeId, m.AtUtc)), dismounts.Select(d => (d.EntryId, d.MountId, d.AtUtc)));
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

    private sealed class SpellFound
    {
        public int MountId { get; set; }

        public int SawId { get; set; }

        public int BladeId { get; set; }

        public DateTime From { get; set; }

        public int? DismountId { get; set; }

        public DateTime? Until { get; set; }
    }
}
