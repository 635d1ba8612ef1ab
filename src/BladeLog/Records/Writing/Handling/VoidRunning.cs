using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class VoidRunning
{
    /// <summary>A reading goes with its run; the next one's run reaches back over the gap.</summary>
    public static async Task Reading(WriteSession w, Entry entry, string reason)
    {
        var reading = await w.Db.MeterReadings.AsNoTracking().SingleAsync(r => r.EntryId == entry.Id);
        var saw = await w.Db.Saws.SingleAsync(s => s.Id == reading.SawId);
        var line = await MeterLine.Read(w.Db, saw.Id);
        var i = line.FindIndex(l => l.EntryId == entry.Id);
        var before = i > 0 ? line[i - 1] : null;
        var after = i + 1 < line.Count ? line[i + 1] : null;
        if (before?.EpochId != reading.EpochId && after is not null)
        {
            w.Refuse("EntryId", $"Void first: entry {after.EntryId}, the reading of {w.Say(after.At)} that follows on from this one.");
            return;
        }

        w.Void(entry.Id, reason);
        var own = await w.Db.Runs.AsNoTracking().SingleOrDefaultAsync(r => r.ReadingId == entry.Id);
        if (own is not null)
        {
            Strike(w, own, reason);
        }

        if (line.TrueForAll(l => l.EntryId == entry.Id || l.EpochId != reading.EpochId))
        {
            w.Void(reading.EpochId, reason);
        }

        if (before is not null && after is not null && after.EpochId == reading.EpochId)
        {
            await Bridge(w, saw, before, after, reason, own);
        }
        else if (after is not null)
        {
            w.Refuse("EntryId", $"Void first: entry {after.EntryId}, the reading of {w.Say(after.At)} that follows on from this one.");
        }
    }

    public static async Task Epoch(WriteSession w, Entry entry, string reason)
    {
        var inIt = await w.Db.MeterReadings.AsNoTracking().Where(r => r.EpochId == entry.Id).OrderBy(r => r.EntryId).Select(r => r.EntryId).ToListAsync();
        w.RefuseUnless(inIt.Count == 0, "EntryId", $"Void first: entry {string.Join(", ", inIt)}, read from this meter.");
        w.Void(entry.Id, reason);
    }

    public static async Task Run(WriteSession w, Entry entry, string reason)
    {
        var run = await w.Db.Runs.AsNoTracking().SingleAsync(r => r.EntryId == entry.Id);
        w.RefuseUnless(run.ReadingId is null, "EntryId", $"These hours come from the meter: void the reading, entry {run.ReadingId}.");
        Strike(w, run, reason);
    }

    /// <summary>A cut goes with the hours that were taken from it, and is on the list again.</summary>
    public static async Task Cut(WriteSession w, Entry entry, string reason)
    {
        var cut = await w.Db.CutsDone.AsNoTracking().SingleAsync(c => c.EntryId == entry.Id);
        w.Void(entry.Id, reason);
        foreach (var run in await w.Db.Runs.AsNoTracking().Where(r => r.Entry.Op == entry.Op && r.Source == RunSource.FromCuts).ToListAsync())
        {
            Strike(w, run, reason);
        }

        var queued = await w.Db.QueuedCuts.SingleOrDefaultAsync(q => q.DoneEntryId == entry.Id);
        if (queued is not null)
        {
            queued.DoneEntryId = null;
        }

        w.Touched.Window(cut.SawId, entry.AtUtc.AddMilliseconds(-1), entry.AtUtc.AddMilliseconds(1));
    }

    public static async Task Setup(WriteSession w, Entry entry, string reason)
    {
        var setup = await w.Db.SawSetups.AsNoTracking().SingleAsync(s => s.EntryId == entry.Id);
        w.RefuseUnless(
            await w.Db.SawSetups.AnyAsync(s => s.SawId == setup.SawId && s.EntryId != entry.Id),
            "EntryId",
            "It is the saw's only setup: enter the right one in its stead.");
        w.Void(entry.Id, reason);
        Edits.Bump(w, await w.Db.Saws.SingleAsync(s => s.Id == setup.SawId));
        w.Touched.Window(setup.SawId, DateTime.MinValue, DateTime.MaxValue);
    }

    private static async Task Bridge(WriteSession w, Saw saw, MeterLine before, MeterLine after, string reason, Run? own)
    {
        var next = await w.Db.Runs.AsNoTracking().SingleOrDefaultAsync(r => r.ReadingId == after.EntryId);
        if (next is not null)
        {
            Strike(w, next, reason);
        }

        var setup = await w.SetupAt(saw.Id, after.At);
        var running = (long)Math.Round((after.ReadingMs - before.ReadingMs) * setup.MeterFactor, MidpointRounding.AwayFromZero);
        if (running == 0)
        {
            return;
        }

        var run = new Run
        {
            SawId = saw.Id,
            FromUtc = before.At,
            UntilUtc = after.At,
            RunningMs = running,
            SpeedMps = next?.SpeedMps ?? own?.SpeedMps ?? setup.UsualSpeedMps,
            Grade = HoursGrade.A,
            Source = RunSource.Meter,
            ReadingId = after.EntryId,
        };
        w.Add(run, after.At);
        await RunRules.Check(w, "EntryId", saw, run, [next?.EntryId ?? 0, own?.EntryId ?? 0]);
        w.Touched.Window(saw.Id, before.At, after.At);
    }

    private static void Strike(WriteSession w, Run run, string reason)
    {
        w.Void(run.EntryId, reason);
        w.Touched.Window(run.SawId, run.FromUtc, run.UntilUtc);
    }
}
