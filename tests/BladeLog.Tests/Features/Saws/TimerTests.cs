using System.Net;
using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Saws;

/// <summary>Wren (S3) and Finch (S4) of the sample shop have no hour meter; Wren has two speeds.</summary>
public sealed class TimerTests
{
    [Fact]
    public async Task One_tap_on_the_Floor_starts_a_timer_and_one_tap_stops_it()
    {
        await using var app = await ShopApp.Sample();
        Assert.Equal("Start timer", Button(await app.GetPage("/"), "S3"));
        Assert.Equal("Hours", SampleApp.Text((await app.GetPage("/")).QuerySelector("#saw-S2 .hands .low")));
        (await Tap(app, "/", "S3", "/timer/start")).LeadsTo("/");
        app.Clock.Advance(TimeSpan.FromMinutes(42));
        Assert.Equal("Stop 0:42 h", Button(await app.GetPage("/"), "S3"));
        (await Tap(app, "/", "S3", "/timer")).LeadsTo("/");
        Run run = await Last(app);
        Assert.Equal((42 * 60_000L, HoursGrade.C, RunSource.Timer), (run.RunningMs, run.Grade, run.Source));
        Assert.NotNull(run.TimerId);
        Assert.Equal("Start timer", Button(await app.GetPage("/"), "S3"));
        await app.AssertKept();
    }

    [Fact]
    public async Task Another_tablet_sees_the_timer_run()
    {
        await using var app = await ShopApp.Sample();
        (await Tap(app, "/saws/S3/timer", null, "/saws/S3/timer/start")).LeadsTo("/saws/S3/timer");
        app.Clock.Advance(TimeSpan.FromMinutes(85));
        Assert.Contains("Timer since 10:30, 1:25 h", SampleApp.Text((await app.GetPage("/saws/S3/timer")).Body), StringComparison.Ordinal);
        Assert.Contains("Timer since 10:30.", SampleApp.Text((await app.GetPage("/saws/S3")).Body), StringComparison.Ordinal);
        Assert.Contains("Timer runs: Wren.", (await app.GetPage("/handover")).QuerySelector("textarea")!.TextContent, StringComparison.Ordinal);
        await using var db = app.NewContext();
        var now = await ShopNowReader.Read(db, app.Clock.GetUtcNow().UtcDateTime);
        Assert.Equal(ShopApp.Today.UtcDateTime, now.Saw("S3")!.Timer!.Entry.AtUtc);
        Assert.Null(now.Saw("S4")!.Timer);
    }

    [Fact]
    public async Task It_is_started_and_stopped_from_the_page_of_the_saw_and_hours_are_typed_a_tap_away()
    {
        await using var app = await ShopApp.Sample();
        Assert.NotNull((await app.GetPage("/saws/S3")).QuerySelector("a[href='/saws/S3/hours']"));
        Assert.NotNull((await app.GetPage("/saws/S3/timer")).QuerySelector("a[href='/saws/S3/hours?typed=1']"));
        (await Tap(app, "/saws/S3", null, "/saws/S3/timer/start")).LeadsTo("/saws/S3");
        app.Clock.Advance(TimeSpan.FromMinutes(10));
        (await Tap(app, "/saws/S3", null, "/saws/S3/timer")).LeadsTo("/saws/S3");
        Assert.Equal(10 * 60_000L, (await Last(app)).RunningMs);
        Assert.Null((await app.GetPage("/saws/S2")).QuerySelector("form[action='/saws/S2/timer/start']"));
    }

    [Fact]
    public async Task Of_two_tablets_that_stop_it_one_wins_and_the_other_sees_who_and_when()
    {
        await using var app = await ShopApp.Sample();
        await app.Be("JP");
        (await Tap(app, "/", "S3", "/timer/start")).LeadsTo("/");
        app.Clock.Advance(TimeSpan.FromMinutes(30));
        var first = await app.GetPage("/");
        var second = await app.GetPage("/");
        (await app.SendForm(first, "/saws/S3/timer")).LeadsTo("/");
        app.Clock.Advance(TimeSpan.FromMinutes(1));
        await app.Be("OT");
        var late = await app.SendForm(second, "/saws/S3/timer");
        Assert.Equal(HttpStatusCode.Conflict, late.Status);
        Assert.Contains("JP stopped the timer of Wren at 11:00", late.Text, StringComparison.Ordinal);
        await using var db = app.NewContext();
        Assert.Equal(1, await db.Runs.CountAsync(r => r.TimerId != null));
    }

    [Fact]
    public async Task Of_two_tablets_that_start_it_the_second_is_told_that_it_runs()
    {
        await using var app = await ShopApp.Sample();
        await app.Be("JP");
        var (first, second) = (await app.GetPage("/"), await app.GetPage("/"));
        (await app.SendForm(first, "/saws/S3/timer/start")).LeadsTo("/");
        var late = await app.SendForm(second, "/saws/S3/timer/start");
        Assert.Equal(HttpStatusCode.Conflict, late.Status);
        Assert.Contains("JP started the timer of Wren at 10:30", late.Text, StringComparison.Ordinal);
        await using var db = app.NewContext();
        Assert.Equal(1, await db.TimersStarted.CountAsync());
    }

    [Fact]
    public async Task A_double_tap_starts_one_timer()
    {
        await using var app = await ShopApp.Sample();
        var page = await app.GetPage("/");
        (await app.SendForm(page, "/saws/S3/timer/start")).LeadsTo("/");
        (await app.SendForm(page, "/saws/S3/timer/start")).LeadsTo("/");
        await using var db = app.NewContext();
        Assert.Equal(1, await db.TimersStarted.CountAsync());
    }

    [Fact]
    public async Task A_timer_left_running_overnight_is_asked_about()
    {
        await using var app = await ShopApp.Sample();
        (await Tap(app, "/", "S3", "/timer/start")).LeadsTo("/");
        app.Clock.Advance(TimeSpan.FromMinutes((14 * 60) + 10));
        var asked = (await Tap(app, "/", "S3", "/timer")).Refused();
        Assert.Contains("It ran on for 14:10 h. Write how long the wheels turned.", SampleApp.Text(asked.Page.Body), StringComparison.Ordinal);
        app.Clock.Advance(TimeSpan.FromMinutes(3));
        (await app.SendForm(asked.Page, "/saws/S3/timer", ("Running", "2.5"))).LeadsTo("/saws/S3");
        var run = await Last(app);
        Assert.Equal((2.5 * 3_600_000, TimeSpan.FromMinutes((14 * 60) + 10)), (run.RunningMs, run.UntilUtc - run.FromUtc));
    }

    [Fact]
    public async Task A_timer_that_never_ran_is_struck_out_in_one_tap()
    {
        await using var app = await ShopApp.Sample();
        (await Tap(app, "/", "S3", "/timer/start")).LeadsTo("/");
        app.Clock.Advance(TimeSpan.FromHours(14));
        var running = await app.GetPage("/saws/S3/timer");
        (await app.SendForm(running, "/saws/S3/timer/never")).LeadsTo("/saws/S3");
        Assert.Equal("Start timer", Button(await app.GetPage("/"), "S3"));
        await using var db = app.NewContext();
        Assert.Equal(0, await db.Runs.CountAsync(r => r.TimerId != null));

        var late = await app.SendForm(running, "/saws/S3/timer");
        Assert.Equal(HttpStatusCode.Conflict, late.Status);
        Assert.Contains("struck the start of the timer of Wren out", late.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_last_speed_used_is_taken_and_can_be_corrected_at_the_stop()
    {
        await using var app = await ShopApp.Sample();
        var speeds = (await app.GetPage("/saws/S3/timer")).QuerySelectorAll("input[name=Speed]").Select(i => i.GetAttribute("value")!).ToList();
        Assert.Equal(2, speeds.Count);
        (await app.Fill("/saws/S3/hours?typed=1", ("Running", "0.2"), ("From", "30 min ago"), ("Speed", speeds[1]))).LeadsTo("/saws/S3");
        double slow = (await Last(app)).SpeedMps;
        (await Tap(app, "/", "S3", "/timer/start")).LeadsTo("/");
        app.Clock.Advance(TimeSpan.FromMinutes(20));
        (await Tap(app, "/", "S3", "/timer")).LeadsTo("/");
        Assert.Equal(slow, (await Last(app)).SpeedMps);

        (await Tap(app, "/", "S3", "/timer/start")).LeadsTo("/");
        app.Clock.Advance(TimeSpan.FromMinutes(20));
        var page = await app.GetPage("/saws/S3/timer");
        Assert.Equal(speeds[1], page.QuerySelector("input[name=Speed][checked]")!.GetAttribute("value"));
        (await app.SendForm(page, "/saws/S3/timer", ("Speed", speeds[0]))).LeadsTo("/saws/S3");
        Assert.NotEqual(slow, (await Last(app)).SpeedMps);
    }

    [Fact]
    public async Task Undo_after_a_stop_lets_the_timer_run_on()
    {
        await using var app = await ShopApp.Sample();
        (await Tap(app, "/", "S3", "/timer/start")).LeadsTo("/");
        app.Clock.Advance(TimeSpan.FromMinutes(42));
        (await Tap(app, "/", "S3", "/timer")).LeadsTo("/");
        var page = await app.GetPage("/saws/S3");
        (await app.SendForm(page, page.QuerySelector("form.undo")!.GetAttribute("action")!)).LeadsTo("/");
        app.Clock.Advance(TimeSpan.FromMinutes(1));
        Assert.Equal("Stop 0:43 h", Button(await app.GetPage("/"), "S3"));
    }

    [Fact]
    public async Task A_stop_without_a_timer_says_so_and_saves_nothing()
    {
        await using var app = await ShopApp.Sample();
        var before = await app.EntryCount();
        using var answer = await app.PostForm("/saws/S3/timer", new() { ["Timer"] = "nonsense" });
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        Assert.Contains("No timer of Wren runs", await answer.Content.ReadAsStringAsync(), StringComparison.Ordinal);
        Assert.Equal(before, await app.EntryCount());
    }

    /// <summary>The button pressed on the Floor (a saw is named) or on another page.</summary>
    private static async Task<Answered> Tap(ShopApp app, string page, string? saw, string action) =>
        await app.SendForm(await app.GetPage(page), saw is null ? action : $"/saws/{saw}{action}");

    private static string Button(IDocument floor, string saw) => SampleApp.Text(floor.QuerySelector($"#saw-{saw} .hands .low"));

    private static async Task<Run> Last(ShopApp app)
    {
        await using ShopDb db = app.NewContext();
        return await db.Runs.AsNoTracking().Where(r => r.Saw.Code == "S3").OrderByDescending(r => r.EntryId).FirstAsync();
    }
}
