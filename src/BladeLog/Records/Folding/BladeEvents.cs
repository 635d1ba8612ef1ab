using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Folding;

/// <summary>Reads a blade's events, of all blades or of some.</summary>
public static class BladeEvents
{
    public static async Task<List<BladeEvent>> Read(ShopDb db, IReadOnlyCollection<int>? blades = null)
    {
        var all = blades is null;
        var some = blades ?? [];
        var events = new List<BladeEvent>();
        events.AddRange(await db.Mounts.AsNoTracking().Where(f => all || some.Contains(f.BladeId))
            .Select(f => new BladeEvent(f.BladeId, f.Entry.AtUtc, f.EntryId, BladeEventKind.Mounted, f.SawId, null, null, Place.OnSaw)).ToListAsync());
        events.AddRange((await db.Dismounts.AsNoTracking().Where(f => all || some.Contains(f.Mount.BladeId))
            .Select(f => new { f.Mount.BladeId, f.Entry.AtUtc, f.EntryId, f.MountId, f.Reason }).ToListAsync())
            .Select(f => new BladeEvent(f.BladeId, f.AtUtc, f.EntryId, BladeEventKind.Dismounted, f.MountId, Place: AfterDismount(f.Reason))));
        events.AddRange(await db.Hangs.AsNoTracking().Where(f => all || some.Contains(f.BladeId))
            .Select(f => new BladeEvent(f.BladeId, f.Entry.AtUtc, f.EntryId, BladeEventKind.Hung, 0, null, f.Hook, f.Place)).ToListAsync());
        events.AddRange(await db.BatchLines.AsNoTracking().Where(f => all || some.Contains(f.BladeId))
            .Select(f => new BladeEvent(f.BladeId, f.Entry.AtUtc, f.EntryId, BladeEventKind.SentAway, f.BatchId, null, null, Place.AtSharpener)).ToListAsync());
        events.AddRange((await db.BatchReturns.AsNoTracking().Where(f => all || some.Contains(f.Line.BladeId))
            .Select(f => new { f.Line.BladeId, f.Entry.AtUtc, f.EntryId, f.LineId, f.Outcome, f.WidthM }).ToListAsync())
            .Select(f => new BladeEvent(
                f.BladeId,
                f.AtUtc,
                f.EntryId,
                f.Outcome == ReturnOutcome.Lost ? BladeEventKind.Lost : BladeEventKind.CameBack,
                f.LineId,
                f.WidthM,
                Place: f.Outcome == ReturnOutcome.Rejected ? Place.Bench : Place.Rack)));
        events.AddRange(await db.Sharpenings.AsNoTracking().Where(f => all || some.Contains(f.BladeId))
            .Select(f => new BladeEvent(f.BladeId, f.Entry.AtUtc, f.EntryId, BladeEventKind.Sharpened, 0, f.WidthM, null, Place.Rack)).ToListAsync());
        events.AddRange(await db.PriorUses.AsNoTracking().Where(f => all || some.Contains(f.BladeId))
            .Select(f => new BladeEvent(f.BladeId, f.Entry.AtUtc, f.EntryId, BladeEventKind.PriorUse, 0, f.WidthM, null, Place.Rack)).ToListAsync());
        events.AddRange(await db.Joints.AsNoTracking().Where(f => all || some.Contains(f.BladeId))
            .Select(f => new BladeEvent(f.BladeId, f.Entry.AtUtc, f.EntryId, BladeEventKind.Joined, 0, f.LoopM, null, Place.Rack)).ToListAsync());
        events.AddRange(await db.Holds.AsNoTracking().Where(f => all || some.Contains(f.BladeId))
            .Select(f => new BladeEvent(f.BladeId, f.Entry.AtUtc, f.EntryId, BladeEventKind.Held, 0, null, null, Place.Rack)).ToListAsync());
        events.AddRange(await db.HoldsCleared.AsNoTracking().Where(f => all || some.Contains(f.Hold.BladeId))
            .Select(f => new BladeEvent(f.Hold.BladeId, f.Entry.AtUtc, f.EntryId, BladeEventKind.Cleared, f.HoldId, null, null, Place.Rack)).ToListAsync());
        events.AddRange(await db.Retirements.AsNoTracking().Where(f => all || some.Contains(f.BladeId))
            .Select(f => new BladeEvent(f.BladeId, f.Entry.AtUtc, f.EntryId, BladeEventKind.Retired, 0, null, null, Place.Gone)).ToListAsync());
        foreach (var split in await db.Splits.AsNoTracking().Where(f => all || some.Contains(f.ParentId) || some.Contains(f.ChildId))
            .Select(f => new { f.ParentId, f.ChildId, f.Entry.AtUtc, f.EntryId, f.WidthM }).ToListAsync())
        {
            events.Add(new BladeEvent(split.ParentId, split.AtUtc, split.EntryId, BladeEventKind.CutDown, split.ChildId));
            events.Add(new BladeEvent(split.ChildId, split.AtUtc, split.EntryId, BladeEventKind.CutFromParent, split.ParentId, split.WidthM));
        }

        return events;
    }

    /// <summary>A blade that broke or may be cracked goes to the bench to be looked at; any other hangs on the rack.</summary>
    private static Place AfterDismount(OffReason reason) =>
        reason is OffReason.Broke or OffReason.CrackOrClicking ? Place.Bench : Place.Rack;
}
