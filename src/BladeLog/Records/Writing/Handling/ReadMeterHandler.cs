using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>
/// A reading makes the run since the one before it. Where it cannot follow on from that one, it is asked what happened to
/// the meter, and nothing is stored until that is answered.
/// </summary>
internal static class ReadMeterHandler
{
    private const string Question = "A typing error, a new meter, or did it roll over?";

    public static async Task Handle(WriteSession w, ReadMeter c)
    {
        var saw = await w.FindSaw(c.Saw);
        var at = w.At(c.At);
        w.RefuseUnless(c.ReadingMs >= 0, nameof(c.ReadingMs), "The reading must not be below zero.");
        w.RefuseUnless(c.SpeedMps is null or > 0, nameof(c.SpeedMps), "The blade speed must be above zero.");
        w.RefuseUnless(c.OtherSpeedMs >= 0, nameof(c.OtherSpeedMs), "The hours at the other speed must not be below zero.");
        if (saw is null || !w.Stands)
        {
            return;
        }

        w.AnswerPath = $"/saws/{saw.Code}";
        var readings = await MeterLine.Read(w.Db, saw.Id);
        w.RefuseUnless(readings.TrueForAll(r => r.At != at), nameof(c.At), $"There is a reading of {w.Say(at)} already.");
        if (!w.Stands)
        {
            return;
        }

        var before = readings.FindLast(r => r.At < at);
        var after = readings.Find(r => r.At > at);
        if (c.Answer != MeterAnswer.NotAsked)
        {
            await Answered(w, c, saw, at, before, after);
        }
        else if (before is null && after is null)
        {
            var epoch = w.Add(new MeterEpoch { SawId = saw.Id, Reason = EpochReason.First, StartReadingMs = c.ReadingMs }, at);
            await w.Save();
            Reading(w, c, saw, at, epoch.EntryId);
        }
        else
        {
            await FollowsOn(w, c, saw, at, before, after);
        }
    }

    private static async Task FollowsOn(WriteSession w, ReadMeter c, Saw saw, DateTime at, MeterLine? before, MeterLine? after)
    {
        var sameEpoch = before is null || after is null || before.EpochId == after.EpochId;
        if (after is not null && (before is null || sameEpoch) && c.ReadingMs > after.ReadingMs)
        {
            w.Refuse(nameof(c.ReadingMs), $"The meter stood at {RunRules.Hours(after.ReadingMs)} on {w.Say(after.At)}, after this: {RunRules.Hours(c.ReadingMs)} is higher.");
            return;
        }

        if (before is null && after!.Reason != EpochReason.First)
        {
            w.Refuse(nameof(c.At), $"The meter was put in only after {w.Say(at)}.");
            return;
        }

        if (before is not null && c.ReadingMs < before.ReadingMs)
        {
            w.Ask(nameof(c.ReadingMs), $"The meter stood at {RunRules.Hours(before.ReadingMs)} on {w.Say(before.At)}: {RunRules.Hours(c.ReadingMs)} is lower.", Question);
            return;
        }

        var reading = Reading(w, c, saw, at, before?.EpochId ?? after!.EpochId);
        await w.Save();
        var gone = new List<int>();
        if (after is not null && sameEpoch)
        {
            // The run of the next reading began before this one: it is split here.
            var next = await w.Db.Runs.AsNoTracking().Where(r => r.ReadingId == after.EntryId).ToListAsync();
            foreach (var run in next)
            {
                w.Void(run.EntryId, "A reading in between was entered.");
                w.Touched.Window(saw.Id, run.FromUtc, run.UntilUtc);
                gone.Add(run.EntryId);
            }

            await AddRun(w, c, saw, at, after.At, after.ReadingMs - c.ReadingMs, after.EntryId, gone, next);
        }

        if (before is not null)
        {
            await AddRun(w, c, saw, before.At, at, c.ReadingMs - before.ReadingMs, reading.EntryId, gone);
        }
    }

    private static async Task Answered(WriteSession w, ReadMeter c, Saw saw, DateTime at, MeterLine? before, MeterLine? after)
    {
        w.RefuseUnless(before is not null, nameof(c.Answer), "This is the meter's first reading.");
        w.RefuseUnless(after is null, nameof(c.At), $"There is a later reading, of {w.Say(after?.At ?? at)}: strike it out first.");
        if (before is null || !w.Stands)
        {
            return;
        }

        var (reason, start, from) = c.Answer switch
        {
            MeterAnswer.NewMeter => (EpochReason.NewMeter, c.NewMeterStartMs, c.NewMeterAt is { } put ? w.At(put, nameof(c.NewMeterAt)) : before.At),
            MeterAnswer.RolledOver => (EpochReason.RolledOver, before.ReadingMs - (c.RollsOverAtMs ?? 0), before.At),
            _ => (EpochReason.RolledBack, c.ReadingMs, at),
        };
        w.RefuseUnless(c.Answer != MeterAnswer.RolledOver || c.RollsOverAtMs > before.ReadingMs, nameof(c.RollsOverAtMs), "Say what the meter counts to; it is more than its last reading.");
        w.RefuseUnless(start <= c.ReadingMs, nameof(c.NewMeterStartMs), "The new meter started above this reading.");
        w.RefuseUnless(from >= before.At && from <= at, nameof(c.NewMeterAt), "The new meter was put in between the two readings.");
        if (!w.Stands)
        {
            return;
        }

        var epoch = w.Add(new MeterEpoch { SawId = saw.Id, Reason = reason, StartReadingMs = start }, from);
        await w.Save();
        var reading = Reading(w, c, saw, at, epoch.EntryId);
        await w.Save();
        await AddRun(w, c, saw, from, at, c.ReadingMs - start, reading.EntryId, []);
    }

    private static MeterReading Reading(WriteSession w, ReadMeter c, Saw saw, DateTime at, int epochId) =>
        w.Add(new MeterReading { SawId = saw.Id, EpochId = epochId, ReadingMs = c.ReadingMs, ReadingTyped = c.ReadingTyped }, at);

    private static async Task AddRun(WriteSession w, ReadMeter c, Saw saw, DateTime from, DateTime until, long meteredMs, int readingId, List<int> gone, List<Run>? before = null)
    {
        var setup = await w.SetupAt(saw.Id, until);
        var running = (long)Math.Round(meteredMs * setup.MeterFactor, MidpointRounding.AwayFromZero);
        if (running == 0)
        {
            return;
        }

        w.RefuseUnless(
            before is not null || c.OtherSpeedMs <= running,
            nameof(c.OtherSpeedMs),
            $"That is more than the {RunRules.Hours(running)} it ran in all.");
        var elapsed = RunRules.Milliseconds(from, until);
        if (running > elapsed * (1 + RunRules.MeterTolerance))
        {
            w.Ask(nameof(c.ReadingMs), $"That is {RunRules.Hours(running)} in the {RunRules.Hours(elapsed)} since {w.Say(from)}.", Question);
            return;
        }

        var speed = c.SpeedMps ?? setup.UsualSpeedMps;
        gone.AddRange(await RunRules.GiveWay(w, saw, from, until));
        var shares = before is null ? SpeedShares.Of(speed, running, c.OtherSpeedMps, c.OtherSpeedMs) : SpeedShares.Of(before, running, speed);
        foreach (var (at, ms) in shares)
        {
            var run = new Run
            {
                SawId = saw.Id,
                FromUtc = from,
                UntilUtc = until,
                RunningMs = ms,
                RunningTyped = c.ReadingTyped,
                SpeedMps = at,
                Grade = HoursGrade.A,
                Source = RunSource.Meter,
                ReadingId = readingId,
            };
            w.Add(run, until);
            await RunRules.Check(w, nameof(c.ReadingMs), saw, run, [.. gone, run.EntryId]);
            await w.Save();
            gone.Add(run.EntryId);
        }

        w.Touched.Window(saw.Id, from, until);
    }
}
