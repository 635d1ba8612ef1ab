namespace BladeLog.Records.Writing;

internal static class RecordHoursHandler
{
    public static async Task Handle(WriteSession w, RecordHours c)
    {
        var saw = await w.FindSaw(c.Saw);
        var from = w.At(c.FromUtc, nameof(c.FromUtc));
        var until = w.At(c.UntilUtc, nameof(c.UntilUtc));
        w.RefuseUnless(from < until, nameof(c.UntilUtc), "The end must be after the beginning.");
        w.RefuseUnless(c.RunningMs > 0, nameof(c.RunningMs), "The running hours must be above zero.");
        w.RefuseUnless(c.SpeedMps is null or > 0, nameof(c.SpeedMps), "The blade speed must be above zero.");
        w.RefuseUnless(c.Source is not (RunSource.Meter or RunSource.FromCuts), nameof(c.Source), "A meter is read, and hours from cuts come with the cuts.");
        if (saw is null || !w.Stands)
        {
            return;
        }

        if (c.TimerId is { } timer && !await TimerHandler.StillRuns(w, saw, timer))
        {
            return;
        }

        var setup = await w.SetupAt(saw.Id, until);
        var run = new Run
        {
            SawId = saw.Id,
            FromUtc = from,
            UntilUtc = until,
            RunningMs = c.RunningMs,
            RunningTyped = c.RunningTyped,
            SpeedMps = c.SpeedMps ?? setup.UsualSpeedMps,
            Source = c.Source,
            TimerId = c.TimerId,
            Grade = c.Grade ?? (c.Source == RunSource.Typed ? HoursGrade.D : HoursGrade.B),
        };
        w.Add(run, until);
        var gone = await RunRules.GiveWay(w, saw, from, until);
        await RunRules.Check(w, nameof(c.RunningMs), saw, run, gone);
        w.Touched.Window(saw.Id, from, until);
        w.AnswerPath = $"/saws/{saw.Code}";
    }
}
