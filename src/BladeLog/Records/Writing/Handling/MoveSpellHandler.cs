using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class MoveSpellHandler
{
    public static async Task Handle(WriteSession w, MoveSpell c)
    {
        var mount = await w.Db.Mounts.AsNoTracking().Include(m => m.Saw).Include(m => m.Entry).SingleOrDefaultAsync(m => m.EntryId == c.MountEntryId);
        var blade = await w.FindBlade(c.ToTag, nameof(c.ToTag));
        w.RefuseUnless(mount is not null, nameof(c.MountEntryId), $"Entry {c.MountEntryId} is no standing mount.");
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.Reason), nameof(c.Reason), "Say why.");
        if (mount is null || blade is null || !w.Stands)
        {
            return;
        }

        w.RefuseUnless(blade.Id != mount.BladeId, nameof(c.ToTag), $"It is {blade.Tag}'s already.");
        var dismount = await w.Db.Dismounts.AsNoTracking().Include(d => d.Entry).SingleOrDefaultAsync(d => d.MountId == mount.EntryId);
        await SpellRules.RefuseOverlaps(w, nameof(c.ToTag), mount.Saw, blade, mount.Entry.AtUtc, dismount?.Entry.AtUtc, [mount.EntryId]);
        if (!w.Stands)
        {
            return;
        }

        Move(w, mount, dismount, blade, c.Reason);
        blade.Folded = false;
        Edits.Bump(w, await w.Db.Saws.SingleAsync(s => s.Id == mount.SawId));
        w.Touched.Spell(mount.SawId, mount.BladeId, mount.Entry.AtUtc, dismount?.Entry.AtUtc);
        w.Touched.Spell(mount.SawId, blade.Id, mount.Entry.AtUtc, dismount?.Entry.AtUtc);
        w.AnswerPath = $"/b/{blade.Tag}";
    }

    /// <summary>Strikes a spell out and enters it again for another blade, at the same times.</summary>
    public static void Move(WriteSession w, Mount mount, Dismount? dismount, Blade blade, string reason)
    {
        if (dismount is not null)
        {
            w.Void(dismount.EntryId, reason);
        }

        w.Void(mount.EntryId, reason);
        var moved = w.Add(
            new Mount
            {
                SawId = mount.SawId,
                BladeId = blade.Id,
                TensionPa = mount.TensionPa,
                TensionTyped = mount.TensionTyped,
                TensionKnown = mount.TensionKnown,
                InsideOut = mount.InsideOut,
                Although = mount.Although,
            },
            mount.Entry.AtUtc);
        if (dismount is not null)
        {
            w.Add(new Dismount { Mount = moved, Reason = dismount.Reason }, dismount.Entry.AtUtc);
        }
    }
}
