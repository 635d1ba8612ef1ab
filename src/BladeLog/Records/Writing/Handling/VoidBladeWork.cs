using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class VoidBladeWork
{
    /// <summary>A fact nothing rests on.</summary>
    public static Task Free(WriteSession w, Entry entry, string reason)
    {
        w.Void(entry.Id, reason);
        return Task.CompletedTask;
    }

    public static async Task Plain<T>(WriteSession w, Entry entry, string reason, Func<T, int> blade)
        where T : Fact
    {
        var fact = await w.Db.Set<T>().AsNoTracking().SingleAsync(f => f.EntryId == entry.Id);
        w.Void(entry.Id, reason);
        w.Touched.Blades.Add(blade(fact));
    }

    public static async Task Hold(WriteSession w, Entry entry, string reason)
    {
        var hold = await w.Db.Holds.AsNoTracking().SingleAsync(h => h.EntryId == entry.Id);
        var cleared = await w.Db.HoldsCleared.AsNoTracking().FirstOrDefaultAsync(x => x.HoldId == entry.Id);
        w.RefuseUnless(cleared is null, "EntryId", $"Void first: entry {cleared?.EntryId}, which cleared this hold.");
        w.Void(entry.Id, reason);
        w.Touched.Blades.Add(hold.BladeId);
    }

    public static async Task HoldCleared(WriteSession w, Entry entry, string reason)
    {
        var hold = await w.Db.HoldsCleared.AsNoTracking().Where(x => x.EntryId == entry.Id).Select(x => x.Hold.BladeId).SingleAsync();
        w.Void(entry.Id, reason);
        w.Touched.Blades.Add(hold);
    }

    /// <summary>A break cannot go while the joint that mended it, or the blade cut from it, stands.</summary>
    public static async Task Break(WriteSession w, Entry entry, string reason)
    {
        var broke = await w.Db.Breaks.AsNoTracking().SingleAsync(b => b.EntryId == entry.Id);
        var joint = await w.Db.Joints.AsNoTracking().Include(j => j.Entry)
            .Where(j => j.BladeId == broke.BladeId && j.Entry.AtUtc >= broke.LatestUtc).OrderBy(j => j.EntryId).FirstOrDefaultAsync();
        w.RefuseUnless(joint is null, "EntryId", $"Void first: entry {joint?.EntryId}, the joint of {w.Say(joint?.Entry.AtUtc ?? w.Now)}.");
        var split = await w.Db.Splits.AsNoTracking().Include(s => s.Entry)
            .FirstOrDefaultAsync(s => s.ParentId == broke.BladeId && s.Entry.AtUtc >= broke.LatestUtc);
        if (split is not null)
        {
            var child = await w.Db.Blades.Where(b => b.Id == split.ChildId).Select(b => b.Tag).SingleAsync();
            w.Refuse("EntryId", $"Void first: entry {split.EntryId}, the cutting down to {child} with its joint.");
        }

        w.Void(entry.Id, reason);
        w.Touched.Blades.Add(broke.BladeId);
        if (w.Stands)
        {
            await TheDismountOf(w, broke, entry, reason);
        }
    }

    /// <summary>
    /// A break took the blade off its saw, in the form that told of it or in the one this completed: without the break it
    /// is on the saw still. Once another blade has gone on there, or this one elsewhere, that it came off stays true.
    /// </summary>
    private static async Task TheDismountOf(WriteSession w, Break broke, Entry entry, string reason)
    {
        for (Guid? op = entry.Op; op is { } at;)
        {
            var off = await w.Db.Dismounts.AsNoTracking().Include(d => d.Entry).Include(d => d.Mount)
                .FirstOrDefaultAsync(d => d.Entry.Op == at && d.Mount.BladeId == broke.BladeId && d.Reason == OffReason.Broke);
            if (off is not null)
            {
                var since = (await FactReader.ReadSpells(w.Db, off.Mount.SawId, broke.BladeId, off.Entry.AtUtc)).Where(s => s.MountId != off.MountId && s.End > off.Entry.AtUtc);
                if (!since.Any() && await OffTheSawAfter(w, broke.BladeId, off.Entry.AtUtc, broke.EntryId) is null)
                {
                    await VoidSpell.Dismount(w, off.Entry, reason, broke.EntryId);
                }

                return;
            }

            op = await w.Db.Voids.AsNoTracking().Where(v => v.Entry.Op == at && v.Voided.Kind == nameof(Break)).Select(v => (Guid?)v.Voided.Op).FirstOrDefaultAsync();
        }
    }

    public static async Task Joint(WriteSession w, Entry entry, string reason)
    {
        var joint = await w.Db.Joints.AsNoTracking().SingleAsync(j => j.EntryId == entry.Id);
        var split = await w.Db.Splits.AsNoTracking().FirstOrDefaultAsync(s => s.ChildId == joint.BladeId && s.Entry.Op == entry.Op);
        w.RefuseUnless(split is null, "EntryId", $"Void first: entry {split?.EntryId}, the cutting down this joint belongs to.");
        w.Void(entry.Id, reason);
        w.Touched.Loop(joint.BladeId);
    }

    /// <summary>A cutting down goes with its joint, as long as nothing has happened to the child.</summary>
    public static async Task Split(WriteSession w, Entry entry, string reason)
    {
        var split = await w.Db.Splits.AsNoTracking().Include(s => s.Entry).SingleAsync(s => s.EntryId == entry.Id);
        var later = (await BladeEvents.Read(w.Db, [split.ChildId]))
            .Where(e => e.BladeId == split.ChildId && e.Id != split.EntryId)
            .ToList();
        var joint = await w.Db.Joints.AsNoTracking().FirstOrDefaultAsync(j => j.BladeId == split.ChildId && j.Entry.Op == split.Entry.Op);
        var rests = later.Where(e => e.Id != joint?.EntryId).Select(e => e.Id).Order().ToList();
        w.RefuseUnless(rests.Count == 0, "EntryId", $"Void first: entry {string.Join(", ", rests)}, what happened to the blade cut down.");
        if (joint is not null)
        {
            w.Void(joint.EntryId, reason);
        }

        w.Void(split.EntryId, reason);
        w.Touched.Blades.Add(split.ParentId);
        w.Touched.Loop(split.ChildId);
    }

    public static async Task Batch(WriteSession w, Entry entry, string reason)
    {
        var lines = await w.Db.BatchLines.AsNoTracking().Where(l => l.BatchId == entry.Id).ToListAsync();
        var back = await w.Db.BatchReturns.AsNoTracking().Where(r => r.Line.BatchId == entry.Id).Select(r => r.EntryId).ToListAsync();
        w.RefuseUnless(back.Count == 0, "EntryId", $"Void first: entry {string.Join(", ", back.Order())}, blades come back from this batch.");
        foreach (var line in lines)
        {
            w.Void(line.EntryId, reason);
            w.Touched.Blades.Add(line.BladeId);
        }

        w.Void(entry.Id, reason);
    }

    public static async Task BatchLine(WriteSession w, Entry entry, string reason)
    {
        var line = await w.Db.BatchLines.AsNoTracking().SingleAsync(l => l.EntryId == entry.Id);
        var back = await w.Db.BatchReturns.AsNoTracking().FirstOrDefaultAsync(r => r.LineId == entry.Id);
        w.RefuseUnless(back is null, "EntryId", $"Void first: entry {back?.EntryId}, the blade come back.");
        w.Void(entry.Id, reason);
        w.Touched.Blades.Add(line.BladeId);
    }

    /// <summary>A return goes with the sharpening or the retirement it brought.</summary>
    public static async Task BatchReturn(WriteSession w, Entry entry, string reason)
    {
        var blade = await w.Db.BatchReturns.AsNoTracking().Where(r => r.EntryId == entry.Id).Select(r => r.Line.BladeId).SingleAsync();
        var again = await w.Db.BatchLines.AsNoTracking()
            .Where(l => l.BladeId == blade && l.Entry.AtUtc >= entry.AtUtc && l.EntryId > entry.Id).OrderBy(l => l.EntryId).Select(l => l.EntryId).FirstOrDefaultAsync();
        w.RefuseUnless(again == 0, "EntryId", $"Void first: entry {again}, the blade sent away again.");
        var with = await w.Db.Sharpenings.Where(s => s.BladeId == blade && s.Entry.Op == entry.Op).Select(s => s.EntryId)
            .Concat(w.Db.Retirements.Where(r => r.BladeId == blade && r.Entry.Op == entry.Op).Select(r => r.EntryId))
            .ToListAsync();
        with.ForEach(id => w.Void(id, reason));
        w.Void(entry.Id, reason);
        w.Touched.Blades.Add(blade);
    }

    /// <summary>The first fact after a time that could only be while the blade was off the saw, named; null: none.</summary>
    public static async Task<string?> OffTheSawAfter(WriteSession w, int bladeId, DateTime at, int? butBreak = null)
    {
        var joint = await w.Db.Joints.AsNoTracking().Where(j => j.BladeId == bladeId && j.Entry.AtUtc >= at).OrderBy(j => j.EntryId).Select(j => (int?)j.EntryId).FirstOrDefaultAsync();
        if (joint is not null)
        {
            return $"entry {joint}, a joint";
        }

        var split = await w.Db.Splits.AsNoTracking().Where(s => s.ParentId == bladeId && s.Entry.AtUtc >= at).Select(s => (int?)s.EntryId).FirstOrDefaultAsync();
        if (split is not null)
        {
            return $"entry {split}, the cutting down";
        }

        var sent = await w.Db.BatchLines.AsNoTracking().Where(l => l.BladeId == bladeId && l.Entry.AtUtc >= at).OrderBy(l => l.EntryId).Select(l => (int?)l.EntryId).FirstOrDefaultAsync();
        if (sent is not null)
        {
            return $"entry {sent}, a batch it went away in";
        }

        var broke = await w.Db.Breaks.AsNoTracking().Where(b => b.BladeId == bladeId && b.LatestUtc >= at && b.SawId != null && b.EntryId != butBreak).Select(b => (int?)b.EntryId).FirstOrDefaultAsync();
        return broke is null ? null : $"entry {broke}, its break";
    }
}
