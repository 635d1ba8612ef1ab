using System.Net;
using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Saws;

public sealed class TimerAndLeadTests
{
    [Fact]
    public async Task A_timer_started_and_stopped_records_its_hours_with_their_grade()
    {
        await using ShopApp app = await ShopApp.Sample();
        Assert.NotNull((await app.GetPage("/saws/S3/hours")).QuerySelector("a[href='/saws/S3/timer']"));
        string running = await Start(app);
        app.Clock.Advance(TimeSpan.FromMinutes(85));
        Assert.Contains("1:25 h ago", SampleApp.Text((await app.GetPage(running)).Body), StringComparison.Ordinal);

        using HttpResponseMessage stopped = await app.PostForm("/saws/S3/timer", new() { ["Started"] = Value(running), ["Speed"] = await Speed(app, running), ["Who"] = "JP" }, running);
        Assert.Equal(HttpStatusCode.Redirect, stopped.StatusCode);
        Run run = await Last(app);
        Assert.Equal((85 * 60_000L, HoursGrade.C, RunSource.Timer), (run.RunningMs, run.Grade, run.Source));
    }

    [Fact]
    public async Task A_timer_left_running_overnight_is_asked_about()
    {
        await using ShopApp app = await ShopApp.Sample();
        string running = await Start(app);
        app.Clock.Advance(TimeSpan.FromHours(14));
        using HttpResponseMessage asked = await app.PostForm("/saws/S3/timer", new() { ["Started"] = Value(running), ["Speed"] = await Speed(app, running) }, running);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, asked.StatusCode);
        IDocument page = ShopApp.Parse(await asked.Content.ReadAsStringAsync());
        Assert.Contains("ran on for 14:00 h", SampleApp.Text(page.Body), StringComparison.Ordinal);
        string until = page.QuerySelector("input[name=Until]")!.GetAttribute("value")!;

        using HttpResponseMessage told = await app.PostForm("/saws/S3/timer", new() { ["Started"] = Value(running), ["Until"] = until, ["Running"] = "2.5", ["Speed"] = await Speed(app, running) }, running);
        Assert.Equal(HttpStatusCode.Redirect, told.StatusCode);
        Assert.Equal(2.5 * 3_600_000, (await Last(app)).RunningMs);
    }

    [Theory]
    [InlineData("nonsense")]
    [InlineData("2031-01-01T00:00:00Z")]
    [InlineData("")]
    public async Task A_start_that_cannot_be_is_a_new_start(string started)
    {
        await using ShopApp app = await ShopApp.Sample();
        IDocument page = await app.GetPage($"/saws/S3/timer?started={started}");
        Assert.Equal("Start", SampleApp.Text(page.QuerySelector("button.main")));
    }

    [Fact]
    public async Task A_lead_is_told_at_the_swap_and_at_the_cut_until_the_blade_is_sharpened()
    {
        await using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage told = await app.PostForm("/blades/Q-08/drift", new() { ["Angle"] = "0.8", ["Side"] = "left", ["Who"] = "JP" });
        Assert.Equal(HttpStatusCode.Redirect, told.StatusCode);
        Assert.Contains("Q-08 leads 0.8° left: set the fence", SampleApp.Text((await app.GetPage("/cuts/2")).Body), StringComparison.Ordinal);
        Assert.Contains("Leads 0.8° left", SampleApp.Text((await app.GetPage("/blades/Q-08")).Body), StringComparison.Ordinal);

        using HttpResponseMessage rack = await app.PostForm("/blades/Q-09/drift", new() { ["Angle"] = "1.2", ["Side"] = "right", ["Saw"] = "S2" });
        Assert.Equal(HttpStatusCode.Redirect, rack.StatusCode);
        Assert.Contains("Leads 1.2° right: set the fence", SampleApp.Text((await app.GetPage("/saws/S2/swap?on=Q-09")).Body), StringComparison.Ordinal);
        app.Clock.Advance(TimeSpan.FromMinutes(5));
        using HttpResponseMessage sharp = await app.PostForm("/blades/Q-09/sharpen", new() { ["Kind"] = "Face", ["Width"] = "20.4", ["Who"] = "OT" });
        Assert.Equal(HttpStatusCode.Redirect, sharp.StatusCode);
        Assert.DoesNotContain("set the fence", SampleApp.Text((await app.GetPage("/saws/S2/swap?on=Q-09")).Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_lead_needs_its_side()
    {
        await using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage wrong = await app.PostForm("/blades/Q-08/drift", new() { ["Angle"] = "0.8" });
        Assert.Equal(HttpStatusCode.UnprocessableEntity, wrong.StatusCode);
    }

    /// <summary>Story of the idle saw.</summary>
    [Fact]
    public async Task The_saw_page_says_how_much_of_its_running_was_cutting()
    {
        await using ShopApp app = await ShopApp.Sample();
        Assert.Contains("883 h run since this record began. The cuts logged account for 41 %.", SampleApp.Text((await app.GetPage("/saws/S2")).Body), StringComparison.Ordinal);
    }

    private static async Task<string> Start(ShopApp app)
    {
        using HttpResponseMessage started = await app.Client.GetAsync("/saws/S3/timer?start=1");
        Assert.Equal(HttpStatusCode.Redirect, started.StatusCode);
        return started.Headers.Location!.OriginalString;
    }

    private static string Value(string address) => address[(address.IndexOf('=', StringComparison.Ordinal) + 1)..];

    private static async Task<string> Speed(ShopApp app, string page) => (await app.GetPage(page)).QuerySelector("input[name=Speed][checked]")!.GetAttribute("value")!;

    private static async Task<Run> Last(ShopApp app)
    {
        await using ShopDb db = app.NewContext();
        return await db.Runs.AsNoTracking().Where(r => r.Saw.Code == "S3").OrderByDescending(r => r.EntryId).FirstAsync();
    }
}
