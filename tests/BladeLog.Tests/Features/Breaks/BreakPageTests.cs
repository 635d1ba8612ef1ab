using System.Net;
using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Breaks;

/// <summary>Figures are those of the invented shop's own table, which an independent program made.</summary>
public sealed class BreakPageTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Fact]
    public async Task The_four_breaks_in_the_classes_are_told_as_a_cluster()
    {
        string text = SampleApp.Text((await sample.Page("/breaks")).Body);
        Assert.Contains("4 of 4 breaks on Finch under 1.2 h: thickness to wheel 1/323", text, StringComparison.Ordinal);
        Assert.Contains("Q-26, Q-27, Q-28, Q-29", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Nine_breaks_stand_newest_first()
    {
        IDocument page = await sample.Page("/breaks");
        Assert.Equal(
            ["Q-37", "Q-36", "Q-04", "Q-23", "Q-29", "Q-28", "Q-27", "Q-22", "Q-26"],
            page.QuerySelectorAll("table tbody tr th").Select(SampleApp.Text));
        string first = SampleApp.Text(page.QuerySelectorAll("table tbody tr")[4]);
        Assert.Contains("639 MPa", first, StringComparison.Ordinal);
        Assert.Contains("1/323", first, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_break_off_every_saw_is_told_in_words_and_leaves_no_lone_comma()
    {
        await using ShopApp app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-25/break", ("Site", "Weld"))).LeadsTo("/blades/Q-25");
        string text = SampleApp.Text((await app.GetPage("/breaks")).Body);
        Assert.Contains("no saw known, at the weld", text, StringComparison.Ordinal);
        Assert.DoesNotContain("on not known", text, StringComparison.Ordinal);
        Assert.All((await app.GetPage("/breaks")).QuerySelectorAll("tbody td"), c => Assert.NotEqual(",", SampleApp.Text(c)));
    }

    /// <summary>15.2 to 16.4 h of 15.91 h: used 0.955 to 1.031, divided and multiplied by 4.766.</summary>
    [Fact]
    public async Task Hours_known_between_two_readings_stay_a_range()
    {
        string row = SampleApp.Text((await sample.Page("/breaks")).QuerySelectorAll("table tbody tr")[1]);
        Assert.Contains("15.2 to 16.4 h; half of such by 16 h", row, StringComparison.Ordinal);
        Assert.Contains("0.96 to 1.03 (band 0.20 to 4.91)", row, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_thick_blade_on_the_three_wheel_saw_died_on_time()
    {
        IDocument page = await sample.Page(await Address("Q-27"));
        Assert.Equal("Why did Q-27 break?", SampleApp.Text(page.QuerySelector("h1")));
        string text = SampleApp.Text(page.Body);
        Assert.Contains("It was due: its hours alone explain it.", text, StringComparison.Ordinal);
        Assert.Contains("0.9 (0.19 to 4.3)", text, StringComparison.Ordinal);
        Assert.Contains("639 MPa", text, StringComparison.Ordinal);
        Assert.Contains("over 205 mm", text, StringComparison.Ordinal);
        Assert.Contains("90,947", text, StringComparison.Ordinal);
        // 18.00 for the blade and 20 minutes at 48.00 an hour.
        Assert.Contains("34.00", text, StringComparison.Ordinal);
        Assert.Contains("blade 18.00, 20 min 16.00", text, StringComparison.Ordinal);
        Assert.Contains("Bent too often, or over too small a wheel", text, StringComparison.Ordinal);
        Assert.Contains("Common practice", text, StringComparison.Ordinal);
        Assert.Equal(6, page.QuerySelectorAll(".fractures .fracture").Length);
    }

    [Fact]
    public async Task A_weld_that_broke_with_its_body_hardly_used_is_blamed()
    {
        string text = SampleApp.Text((await sample.Page(await Address("Q-04"))).Body);
        Assert.Contains("Far too early for flexing: blame the weld.", text, StringComparison.Ordinal);
        Assert.Contains("0.0021 (0.00043 to 0.0098)", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_break_from_the_back_edge_is_no_fatigue_break_whatever_its_hours()
    {
        string text = SampleApp.Text((await sample.Page(await Address("Q-37"))).Body);
        Assert.Contains("but not one that began here", text, StringComparison.Ordinal);
        Assert.Contains("Thrust bearing pressed on, or seized", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_break_form_shows_the_six_fractures()
    {
        IDocument page = await sample.Page("/blades/Q-01/break");
        Assert.Equal(6, page.QuerySelectorAll(".opt .fracture").Length);
        Assert.Equal(7, page.QuerySelectorAll("input[name=Site]").Length);
    }

    [Fact]
    public async Task More_leads_to_breaks_and_stock()
    {
        IDocument page = await sample.Page("/more");
        Assert.NotNull(page.QuerySelector("a[href='/breaks']"));
        Assert.NotNull(page.QuerySelector("a[href='/stock']"));
    }

    [Fact]
    public async Task A_break_told_at_the_saw_is_completed_later()
    {
        await using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage told = await app.PostForm("/blades/Q-17/break", new() { ["Site"] = "Unknown", ["Who"] = "JP" });
        Assert.Equal(HttpStatusCode.Redirect, told.StatusCode);
        IDocument list = await app.GetPage("/breaks");
        Assert.Contains("Still to be told: 1", SampleApp.Text(list.Body), StringComparison.Ordinal);
        string address = list.QuerySelector(".list a[href^='/breaks/']")!.GetAttribute("href")!;

        using HttpResponseMessage wrong = await app.PostForm(address, new() { ["Site"] = "GulletAngled", ["MinutesLost"] = "ten" });
        Assert.Equal(HttpStatusCode.UnprocessableEntity, wrong.StatusCode);
        using HttpResponseMessage done = await app.PostForm(address, new() { ["Site"] = "GulletAngled", ["MinutesLost"] = "10", ["HoursLow"] = "8.5", ["HoursHigh"] = "9.5" });
        Assert.Equal(HttpStatusCode.Redirect, done.StatusCode);
        string text = SampleApp.Text((await app.GetPage("/breaks")).Body);
        Assert.DoesNotContain("Still to be told", text, StringComparison.Ordinal);
        Assert.Contains("8.5 to 9.5 h", text, StringComparison.Ordinal);
        await using ShopDb db = app.NewContext();
        Break kept = await db.Breaks.SingleAsync(b => b.Blade.Tag == "Q-17");
        Assert.Equal(BreakSite.GulletAngled, kept.Site);
        Assert.Equal(2, await db.Breaks.IgnoreQueryFilters().CountAsync(b => b.Blade.Tag == "Q-17"));
        using HttpResponseMessage old = await app.Client.GetAsync(address);
        Assert.Equal(HttpStatusCode.NotFound, old.StatusCode);
    }

    private async Task<string> Address(string tag)
    {
        IDocument page = await sample.Page("/breaks");
        return page.QuerySelectorAll("table tbody th a").Single(a => SampleApp.Text(a) == tag).GetAttribute("href")!;
    }
}
