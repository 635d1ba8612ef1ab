using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class VoidSpell
{
    /// <summary>A mount goes with its dismount; runs and cuts stay, and are shared out among what was mounted then.</summary>
    public static async Task Mount(WriteSession w, Entry entry, string reason)
    {
        var mount = await w.Db.Mounts.AsNoTracking().Include(m => m.Entry).SingleAsync(m => m.EntryId == entry.Id);
        var dismount = await w.Db.Dismounts.AsNoTracking().Include(d => d.Entry).SingleOrDefaultAsync(d => d.MountId == entry.Id);

        // A break of this spell that led to a joint or a cutting down rests on it.
        var end = dismount?.Entry.AtUtc ?? DateTime.MaxValue;
        var broke = await w.Db.Breaks.AsNoTracking()
            .FirstOrDefaultAsync(b => b.BladeId == mount.BladeId && b.SawId == mount.SawId && b.LatestUtc > mount.Entry.AtUtc && b.LatestUtc <= end);
        if (broke is not null)
        {
            w.Refuse("EntryId", $"Void first: entry {broke.EntryId}, the break of {w.Say(broke.LatestUtc)} in this spell.");
            return;
        }

        if (dismount is not null)
        {
            w.Void(dismount.EntryId, reason);
        }

        w.Void(entry.Id, reason);
        await Touch(w, mount, mount.Entry.AtUtc, dismount?.Entry.AtUtc);
    }

    /// <summary>Without its dismount the blade is on the saw still, which nothing after it may deny.</summary>
    public static async Task Dismount(WriteSession w, Entry entry, string reason, int? withBreak = null)
    {
        var dismount = await w.Db.Dismounts.AsNoTracking().Include(d => d.Entry).SingleAsync(d => d.EntryId == entry.Id);
        var mount = await w.Db.Mounts.AsNoTracking().Include(m => m.Entry).SingleAsync(m => m.EntryId == dismount.MountId);
        var at = dismount.Entry.AtUtc;
        var later = (await FactReader.ReadSpells(w.Db, mount.SawId, mount.BladeId, at)).Where(s => s.MountId != mount.EntryId && s.End > at).ToList();
        foreach (var spell in later)
        {
            w.Refuse("EntryId", $"Void first: entry {spell.MountId}, {await SpellRules.Words(w, spell)}.");
        }

        if (await VoidBladeWork.OffTheSawAfter(w, mount.BladeId, at, withBreak) is { } rests)
        {
            w.Refuse("EntryId", $"Void first: {rests}, for which the blade had to be off the saw.");
        }

        if (w.Stands)
        {
            w.Void(entry.Id, reason);
            await Touch(w, mount, at, null);
        }
    }

    private static async Task Touch(WriteSession w, Mount mount, DateTime from, DateTime? until)
    {
        Edits.Bump(w, await w.Db.Saws.SingleAsync(s => s.Id == mount.SawId));
        w.Touched.Spell(mount.SawId, mount.BladeId, from, until);
    }
}
