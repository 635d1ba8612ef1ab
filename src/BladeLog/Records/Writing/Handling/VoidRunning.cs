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
        var own = await w.Db.Runs.AsNoTracking().Where(r => r.ReadingId == entry.Id).ToListAsync();
        own.ForEach(run => Strike(w, run, reason));

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

        if (w.Stands)
        {
            await HoursFromCuts.TakeTheirPlaceAgain(w, saw, entry.Op, reason);
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
        if (run.Source != RunSource.FromCuts && w.Stands)
        {
            await HoursFromCuts.TakeTheirPlaceAgain(w, await w.Db.Saws.SingleAsync(s => s.Id == run.SawId), entry.Op, reason);
        }
    }

    /// <summary>A cut goes with the hours that were taken from it, and is on the list again.</summary>
    public static async Task Cut(WriteSession w, Entry entry, string reason)
    {
        var cut = await w.Db.CutsDone.AsNoTracking().SingleAsync(c => c.EntryId == entry.Id);
        w.Void(entry.Id, reason);
        await HoursFromCuts.GoWith(w, cut, entry, reason);
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

    /// <summary>The reading after the gap counts from the one before it, at the speeds known of the two stretches.</summary>
    private static async Task Bridge(WriteSession w, Saw saw, MeterLine before, MeterLine after, string reason, List<Run> own)
    {
        var next = await w.Db.Runs.AsNoTracking().Where(r => r.ReadingId == after.EntryId).ToListAsync();
        next.ForEach(run => Strike(w, run, reason));
        var setup = await w.SetupAt(saw.Id, after.At);
        var running = (long)Math.Round((after.ReadingMs - before.ReadingMs) * setup.MeterFactor, MidpointRounding.AwayFromZero);
        if (running == 0)
        {
            return;
        }

        var gone = own.Concat(next).Select(r => r.EntryId).ToList();
        foreach (var (speed, ms) in SpeedShares.Of([.. next, .. own], running, setup.UsualSpeedMps))
        {
            var run = new Run
            {
                SawId = saw.Id,
                FromUtc = before.At,
                UntilUtc = after.At,
                RunningMs = ms,
                SpeedMps = speed,
                Grade = HoursGrade.A,
                Source = RunSource.Meter,
                ReadingId = after.EntryId,
            };
            w.Add(run, after.At);
            await RunRules.Check(w, "EntryId", saw, run, gone);
        }

        w.Touched.Window(saw.Id, before.At, after.At);
    }

    public static void Strike(WriteSession w, Run run, string reason)
    {
        w.Void(run.EntryId, reason);
        w.Touched.Window(run.SawId, run.FromUtc, run.UntilUtc);
    }
}
