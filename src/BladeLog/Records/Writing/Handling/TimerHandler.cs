using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>A saw's timer: one runs at a time, and of two tablets that stop it the first one wins.</summary>
internal static class TimerHandler
{
    public static async Task Handle(WriteSession w, StartTimer c)
    {
        var saw = await w.FindSaw(c.Saw);
        w.RefuseUnless(c.SpeedMps is null or > 0, nameof(c.SpeedMps), "The blade speed must be above zero.");
        if (saw is null || !w.Stands)
        {
            return;
        }

        if (await ShopRows.RunningTimers(w.Db).SingleOrDefaultAsync(t => t.SawId == saw.Id) is { } runs)
        {
            w.ClashWith = new WriteResult.Clash(await w.Who(runs.Entry.PersonId), runs.Entry.AtUtc, $"started the timer of {saw.Name}");
            return;
        }

        w.Add(new TimerStarted { SawId = saw.Id, SpeedMps = c.SpeedMps }, w.Now);
        w.AnswerPath = $"/saws/{saw.Code}/timer";
    }

    /// <summary>False where somebody stopped it or struck it out before: who and when is said.</summary>
    public static async Task<bool> StillRuns(WriteSession w, Saw saw, int timerId)
    {
        if (await ShopRows.RunningTimers(w.Db).AnyAsync(t => t.SawId == saw.Id && t.EntryId == timerId))
        {
            return true;
        }

        var stopped = await w.Db.Runs.AsNoTracking().Include(r => r.Entry).FirstOrDefaultAsync(r => r.TimerId == timerId);
        var struck = await w.Db.Voids.AsNoTracking().Include(v => v.Entry).FirstOrDefaultAsync(v => v.VoidedId == timerId);
        if (stopped?.Entry is { } stop)
        {
            w.ClashWith = new WriteResult.Clash(await w.Who(stop.PersonId), stop.EnteredUtc, $"stopped the timer of {saw.Name}");
        }
        else if (struck?.Entry is { } strike)
        {
            w.ClashWith = new WriteResult.Clash(await w.Who(strike.PersonId), strike.EnteredUtc, $"struck the start of the timer of {saw.Name} out");
        }
        else
        {
            w.Refuse(nameof(RecordHours.TimerId), $"That timer of {saw.Name} does not run any more: type the hours.");
        }

        return false;
    }

    public static async Task Void(WriteSession w, Entry entry, string reason)
    {
        var run = await w.Db.Runs.AsNoTracking().FirstOrDefaultAsync(r => r.TimerId == entry.Id);
        w.RefuseUnless(run is null, "EntryId", $"Void first: entry {run?.EntryId}, the hours it was stopped with.");
        w.Void(entry.Id, reason);
    }
}
