using System.Globalization;
using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Saws;

public sealed record TimerForm : PostedForm
{
    /// <summary>When it was started, as the address carries it.</summary>
    public string? Started { get; init; }

    /// <summary>Asked where it ran on too long.</summary>
    public string? Running { get; init; }

    public string? Speed { get; init; }

    /// <summary>The moment the page was shown with its question; the window ends there.</summary>
    public string? Until { get; init; }
}

/// <summary>Start and stop of a saw without an hour meter. The start stands in the page's address, so that a reload or a closed tablet does not lose it.</summary>
internal static class Timer
{
    public static async Task<IResult> Get(Desk desk, string code, string? started, string? start)
    {
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        return start is null
            ? await Show(desk, code, new TimerForm { Started = started }, FormState.New)
            : Results.Redirect($"/saws/{saw.Saw.Code}/timer?started={Written(desk.Now)}");
    }

    public static async Task<IResult> Post([FromForm] TimerForm? form, Desk desk, string code)
    {
        form ??= new();
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        if (Moment(form.Started, desk.Now) is not { } from)
        {
            read.Refuse(nameof(form.Running), "When it was started is not known any more: start it again, or type the hours.");
            return await Show(desk, code, form with { Started = null }, read.State);
        }

        double? speed = null;
        if (saw.Setup.Speeds.Count > 1)
        {
            var chosen = saw.Setup.Speeds.FirstOrDefault(s => s.Position.ToString(CultureInfo.InvariantCulture) == form.Speed);
            read.RefuseUnless(chosen is not null, nameof(form.Speed), "Say at which speed it ran.");
            speed = chosen?.SpeedMps;
        }

        var until = Moment(form.Until, desk.Now) is { } asked && asked > from ? asked : desk.Now;
        var running = read.Duration(nameof(form.Running), form.Running, Fields.RunHours);
        var cap = TimeSpan.FromHours((await desk.Advice()).Settings[StockSettings.TimerCap]);
        if (read.IsGood && running is null && until - from > cap)
        {
            read.Refuse(nameof(form.Running), $"The timer ran on for {Hours(until - from)}. Write how long the wheels really turned.");
            return await Show(desk, code, form with { Until = Written(until) }, read.State with { Title = "Not recorded yet" });
        }

        return read.IsGood
            ? await desk.Send(
                new RecordHours(saw.Saw.Code, from, until, (long)Math.Round((running ?? (until - from)).TotalMilliseconds), RunSource.Timer) { Grade = HoursGrade.C, SpeedMps = speed, RunningTyped = form.Running?.Trim() },
                form, $"/saws/{saw.Saw.Code}", $"Hours of {saw.Saw.Name}", state => Show(desk, code, form, state))
            : await Show(desk, code, form, read.State);
    }

    /// <summary>"1:25 h" of a time that has passed.</summary>
    public static string Hours(TimeSpan time) => Figures.With($"{Math.Floor(time.TotalHours):0}:{time.Minutes:00}", "h");

    private static async Task<IResult> Show(Desk desk, string code, TimerForm form, FormState state)
    {
        var units = await desk.Units();
        string? hint = Moment(form.Started, desk.Now) is { } from ? $"{Said.When(from, desk.Now, units)}|{Hours(desk.Now - from)}" : null;
        return await SawForm.Show<TimerPage, TimerForm>(desk, code, hint is null ? form with { Started = null } : form, state, hint);
    }

    private static string Written(DateTime utc) => utc.ToString("yyyy-MM-ddTHH:mm:ssZ", CultureInfo.InvariantCulture);

    /// <summary>A moment of the last 30 days; null for any other text.</summary>
    private static DateTime? Moment(string? text, DateTime now) =>
        DateTime.TryParseExact(text, "yyyy-MM-ddTHH:mm:ssZ", CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal | DateTimeStyles.AdjustToUniversal, out var at)
        && at <= now && at > now.AddDays(-30) ? at : null;
}
