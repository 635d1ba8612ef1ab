using System.Globalization;
using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Saws;

public sealed record TimerForm : PostedForm
{
    /// <summary>The entry of the start this form stops.</summary>
    public string? Timer { get; init; }

    /// <summary>Asked where it ran on too long.</summary>
    public string? Running { get; init; }

    public string? Speed { get; init; }

    /// <summary>The moment the page was shown with its question; the window ends there.</summary>
    public string? Until { get; init; }

    /// <summary>floor or saw: the page it was tapped on, which is shown again.</summary>
    public string? Back { get; init; }
}

/// <summary>Start and stop of a saw without an hour meter, a tap each. The start is a fact, so every tablet sees it.</summary>
internal static class Timer
{
    public static Task<IResult> Get(Desk desk, string code) => Show(desk, code, new TimerForm(), FormState.New);

    public static async Task<IResult> Start([FromForm] TimerForm? form, Desk desk, string code)
    {
        form ??= new();
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        double? speed = saw.Setup.Speeds.Count > 1 ? Chosen(saw, form)?.SpeedMps ?? (await LastSpeed(desk, saw))?.SpeedMps : null;
        return await desk.Send(
            new StartTimer(saw.Saw.Code, speed), form, LeadsTo(form, saw, $"/saws/{saw.Saw.Code}/timer"), $"Timer of {saw.Saw.Name}", state => Show(desk, code, form, state));
    }

    public static async Task<IResult> Stop([FromForm] TimerForm? form, Desk desk, string code)
    {
        form ??= new();
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        if (await Started(desk, saw, form) is not { } start)
        {
            read.Refuse(null, $"No timer of {saw.Saw.Name} runs: start it, or type the hours.");
            return await Show(desk, code, form, read.State);
        }

        var from = start.Entry.AtUtc;
        var until = Moment(form.Until, desk.Now) is { } asked && asked > from ? asked : desk.Now;
        var running = read.Duration(nameof(form.Running), form.Running, Fields.RunHours);
        if (read.IsGood && running is null && until - from > await Cap(desk) && saw.Timer?.EntryId == start.EntryId)
        {
            read.Refuse(nameof(form.Running), OnTooLong(until - from));
            return await Show(desk, code, form with { Until = Written(until) }, read.State with { Title = "Not recorded yet" });
        }

        double? speed = saw.Setup.Speeds.Count > 1 ? Chosen(saw, form)?.SpeedMps ?? start.SpeedMps ?? (await LastSpeed(desk, saw))?.SpeedMps : null;
        return read.IsGood
            ? await desk.Send(
                new RecordHours(saw.Saw.Code, from, until, (long)Math.Round((running ?? (until - from)).TotalMilliseconds), RunSource.Timer)
                {
                    Grade = HoursGrade.C,
                    SpeedMps = speed,
                    RunningTyped = form.Running?.Trim(),
                    TimerId = start.EntryId,
                },
                form, LeadsTo(form, saw, $"/saws/{saw.Saw.Code}"), $"Hours of {saw.Saw.Name}", state => Show(desk, code, form, state))
            : await Show(desk, code, form, read.State);
    }

    /// <summary>The wheels never turned: the start is struck out.</summary>
    public static async Task<IResult> Never([FromForm] TimerForm? form, Desk desk, string code)
    {
        form ??= new();
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        if (await Started(desk, saw, form) is not { } start)
        {
            return await Show(desk, code, form, new FormState([new(null, $"No timer of {saw.Saw.Name} runs.")], Status: StatusCodes.Status422UnprocessableEntity));
        }

        return await desk.Send(
            new VoidEntry(start.EntryId, "it never ran"), form, $"/saws/{saw.Saw.Code}", "start struck out", state => Show(desk, code, form, state), canUndo: false);
    }

    public static string OnTooLong(TimeSpan time) => $"It ran on for {Said.Clock(time)}. Write how long the wheels turned.";

    private static async Task<IResult> Show(Desk desk, string code, TimerForm form, FormState state)
    {
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var last = await LastSpeed(desk, saw);
        var speed = Chosen(saw, form) ?? saw.Setup.Speeds.FirstOrDefault(s => s.SpeedMps == saw.Timer?.SpeedMps) ?? last;
        var over = saw.Timer is { } timer && desk.Now - timer.Entry.AtUtc > await Cap(desk);
        var shown = form with
        {
            Speed = speed?.Position.ToString(CultureInfo.InvariantCulture),
            Until = over ? form.Until ?? Written(desk.Now) : null,
        };
        return await SawForm.Show<TimerPage, TimerForm>(desk, code, shown, state, over ? OnTooLong(desk.Now - saw.Timer!.Entry.AtUtc) : null, await Hours.LastRunning(desk, saw));
    }

    private static async Task<TimeSpan> Cap(Desk desk) => TimeSpan.FromHours((await desk.Advice()).Settings[StockSettings.TimerCap]);

    /// <summary>The start the form names, struck out or stopped since or not; the writer tells who was quicker.</summary>
    private static Task<TimerStarted?> Started(Desk desk, SawNow saw, TimerForm form) =>
        int.TryParse(form.Timer, NumberStyles.None, CultureInfo.InvariantCulture, out var id)
            ? desk.Db.TimersStarted.AsNoTracking().IgnoreQueryFilters().Include(t => t.Entry).FirstOrDefaultAsync(t => t.EntryId == id && t.SawId == saw.Saw.Id)
            : Task.FromResult<TimerStarted?>(null);

    private static SetupSpeed? Chosen(SawNow saw, TimerForm form) =>
        saw.Setup.Speeds.FirstOrDefault(s => s.Position.ToString(CultureInfo.InvariantCulture) == form.Speed);

    /// <summary>The speed of the last hours entered; else the usual one.</summary>
    private static async Task<SetupSpeed?> LastSpeed(Desk desk, SawNow saw)
    {
        var last = await desk.Db.Runs.AsNoTracking().Where(r => r.SawId == saw.Saw.Id).OrderByDescending(r => r.UntilUtc).Select(r => (double?)r.SpeedMps).FirstOrDefaultAsync();
        return saw.Setup.Speeds.FirstOrDefault(s => s.SpeedMps == last) ?? saw.Setup.Speeds.FirstOrDefault(s => s.Usual);
    }

    private static string LeadsTo(TimerForm form, SawNow saw, string otherwise) => form.Back switch
    {
        "floor" => "/",
        "saw" => $"/saws/{saw.Saw.Code}",
        _ => otherwise,
    };

    private static string Written(DateTime utc) => utc.ToString("yyyy-MM-ddTHH:mm:ssZ", CultureInfo.InvariantCulture);

    /// <summary>A moment that has come; null for any other text.</summary>
    private static DateTime? Moment(string? text, DateTime now) =>
        DateTime.TryParseExact(text, "yyyy-MM-ddTHH:mm:ssZ", CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal | DateTimeStyles.AdjustToUniversal, out var at)
        && at <= now ? at : null;
}
