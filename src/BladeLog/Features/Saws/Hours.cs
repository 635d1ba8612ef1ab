using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Saws;

public sealed record HoursForm : PostedForm
{
    /// <summary>meter or typed.</summary>
    public string? Kind { get; init; }

    public string? Reading { get; init; }

    public string? At { get; init; }

    public string? Answer { get; init; }

    public string? NewMeterStart { get; init; }

    public string? NewMeterAt { get; init; }

    public string? RollsOverAt { get; init; }

    public string? Running { get; init; }

    public string? From { get; init; }

    public string? Until { get; init; }

    public string? Source { get; init; }

    public string? Speed { get; init; }

    /// <summary>Of the hours since the last reading, so long at the other speed.</summary>
    public string? OtherSpeed { get; init; }
}

/// <summary>Running hours: read off the meter, else typed. They feed the clock of flexing.</summary>
internal static class Hours
{
    public const string TypingError = "TypingError";

    public static async Task<IResult> Get(Desk desk, string code, string? typed)
    {
        var metered = (await desk.Shop()).Saw(code)?.Saw.HasHourMeter == true && typed is null;
        return await Show(desk, code, new HoursForm { Kind = metered ? "meter" : "typed" }, FormState.New);
    }

    public static async Task<IResult> Post([FromForm] HoursForm? form, Desk desk, string code)
    {
        form ??= new();
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        double? speed = null;
        if (saw.Setup.Speeds.Count > 1)
        {
            var chosen = saw.Setup.Speeds.FirstOrDefault(s => s.Position.ToString(System.Globalization.CultureInfo.InvariantCulture) == form.Speed);
            read.RefuseUnless(chosen is not null, nameof(form.Speed), "Say at which speed it ran.");
            speed = chosen?.SpeedMps;
        }

        var command = form.Kind == "meter" ? Meter(form, read, saw, speed) : Typed(form, read, saw, speed, await LastUntil(desk, saw) ?? saw.MountedSince);
        if (!read.IsGood)
        {
            return await Show(desk, code, form, read.State);
        }

        return await desk.Send(command, form, $"/saws/{saw.Saw.Code}", $"Hours of {saw.Saw.Name}", state => Show(desk, code, form, state));
    }

    private static Command Meter(HoursForm form, FormReading read, SawNow saw, double? speed)
    {
        var reading = read.Duration(nameof(form.Reading), form.Reading, Fields.HourMeter);
        read.Need(nameof(form.Reading), reading, form.Reading, "Write what the meter shows, such as 1842.6.");
        var answer = form.Answer is null or TypingError ? MeterAnswer.NotAsked : read.Choice<MeterAnswer>(nameof(form.Answer), form.Answer, "Say what happened to the meter.") ?? default;
        var start = read.Duration(nameof(form.NewMeterStart), form.NewMeterStart, Fields.HourMeter);
        var put = read.TimeOrDay(nameof(form.NewMeterAt), form.NewMeterAt);
        var top = read.Duration(nameof(form.RollsOverAt), form.RollsOverAt, Fields.HourMeter);
        var other = saw.Setup.Speeds.FirstOrDefault(s => s.SpeedMps != speed);
        var atOther = speed is null || saw.Setup.Speeds.Count != 2 ? null : read.Duration(nameof(form.OtherSpeed), form.OtherSpeed, Fields.RunHours);
        return new ReadMeter(saw.Saw.Code, Ms(reading) ?? 0, form.Reading?.Trim() ?? "")
        {
            At = read.Time(nameof(form.At), form.At),
            Answer = answer,
            NewMeterStartMs = answer == MeterAnswer.NewMeter ? Ms(start) ?? 0 : 0,
            NewMeterAt = answer == MeterAnswer.NewMeter ? put : null,
            RollsOverAtMs = answer == MeterAnswer.RolledOver ? Ms(top) : null,
            SpeedMps = speed,
            OtherSpeedMs = Ms(atOther) ?? 0,
            OtherSpeedMps = atOther is null ? null : other?.SpeedMps,
        };
    }

    private static Command Typed(HoursForm form, FormReading read, SawNow saw, double? speed, DateTime? lastUntil)
    {
        var running = read.Duration(nameof(form.Running), form.Running, Fields.RunHours);
        read.Need(nameof(form.Running), running, form.Running, "Write how long the wheels turned, such as 1.5 or 1:30.");
        var from = read.Time(nameof(form.From), form.From);
        var until = read.Time(nameof(form.Until), form.Until);
        if (from is null && string.IsNullOrWhiteSpace(form.From))
        {
            read.RefuseUnless(lastUntil is not null, nameof(form.From), "Say since when, such as 7:15 or yesterday 7:15.");
            from = lastUntil;
        }

        return new RecordHours(saw.Saw.Code, from ?? default, until ?? read.Now, Ms(running) ?? 0, read.Choice<RunSource>(nameof(form.Source), form.Source, null) ?? RunSource.Typed)
        {
            RunningTyped = form.Running?.Trim(),
            SpeedMps = speed,
        };
    }

    private static long? Ms(TimeSpan? time) => time is { } t ? (long)Math.Round(t.TotalMilliseconds) : null;

    private static Task<DateTime?> LastUntil(Desk desk, SawNow saw) =>
        desk.Db.Runs.AsNoTracking().Where(r => r.SawId == saw.Saw.Id).MaxAsync(r => (DateTime?)r.UntilUtc);

    private static async Task<IResult> Show(Desk desk, string code, HoursForm form, FormState state)
    {
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var units = await desk.Units();
        var shown = form;
        if (form.Speed is null && saw.Setup.Speeds.Count > 1)
        {
            var last = await desk.Db.Runs.AsNoTracking().Where(r => r.SawId == saw.Saw.Id).OrderByDescending(r => r.UntilUtc).Select(r => (double?)r.SpeedMps).FirstOrDefaultAsync();
            shown = form with { Speed = saw.Setup.Speeds.FirstOrDefault(s => s.SpeedMps == last)?.Position.ToString(System.Globalization.CultureInfo.InvariantCulture) };
        }

        var (hint, stood) = form.Kind == "meter" ? await LastReading(desk, saw, units) : (await LastRun(desk, saw, units), await LastRunning(desk, saw));
        return await SawForm.Show<HoursPage, HoursForm>(desk, code, shown, state, hint, stood);
    }

    private static async Task<(string Hint, string? Stood)> LastReading(Desk desk, SawNow saw, ShopUnits units)
    {
        var last = await desk.Db.MeterReadings.AsNoTracking().Where(r => r.SawId == saw.Saw.Id)
            .OrderByDescending(r => r.Entry.AtUtc).ThenByDescending(r => r.EntryId).Select(r => new { r.ReadingMs, r.Entry.AtUtc }).FirstOrDefaultAsync();
        return last is null
            ? ("Its first reading.", null)
            : ($"It stood at {Figures.With(Figures.Number(last.ReadingMs / 3_600_000.0, 1), "h")} on {Said.When(last.AtUtc, desk.Now, units)}.",
                Figures.Plain(last.ReadingMs / 3_600_000.0, 3));
    }

    /// <summary>How long it ran the last time that hours were typed or timed.</summary>
    public static async Task<string?> LastRunning(Desk desk, SawNow saw) =>
        await desk.Db.Runs.AsNoTracking().Where(r => r.SawId == saw.Saw.Id && (r.Source == RunSource.Typed || r.Source == RunSource.Timer)).OrderByDescending(r => r.UntilUtc)
            .Select(r => (long?)r.RunningMs).FirstOrDefaultAsync() is { } ms ? Figures.Plain(ms / 3_600_000.0, 1) : null;

    private static async Task<string> LastRun(Desk desk, SawNow saw, ShopUnits units) => await LastUntil(desk, saw) is { } until
        ? $"Empty is since the last hours entered: {Said.When(until, desk.Now, units)}."
        : "Such as 7:15 or yesterday 7:15.";
}
