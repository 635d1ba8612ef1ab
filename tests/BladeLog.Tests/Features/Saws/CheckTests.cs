using System.Net;
using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Saws;

public sealed class CheckTests
{
    private static readonly (string, string?)[] AllRight = [("Guards", "yes"), ("Tension", "yes"), ("UnderTable", "yes"), ("Quiet", "yes"), ("Brake", "yes"), ("Who", "JP")];

    [Fact]
    public async Task Nothing_is_ticked_beforehand_and_a_row_not_answered_is_asked_for()
    {
        await using var app = await ShopApp.Sample();
        var page = await app.GetPage("/saws/S2/check");
        Assert.Equal(10, page.QuerySelectorAll(".looks .frow input[type=radio]").Count(r => r.GetAttribute("name") != "Who"));
        Assert.Empty(page.QuerySelectorAll(".looks input[checked]"));
        var before = await app.EntryCount();
        var asked = (await app.Fill("/saws/S2/check", Without("Brake"))).Refused();
        Assert.Contains("Brake or run-down", asked.Beside("Brake"), StringComparison.Ordinal);
        Assert.Null(asked.Beside("Guards"));
        Assert.Equal("One row is not answered", SampleApp.Text(asked.Page.QuerySelector(".problems h2")));
        Assert.Equal(before, await app.EntryCount());
        (await app.SendForm(asked.Page, "/saws/S2/check", ("Brake", "yes"))).LeadsTo("/checks");
    }

    [Fact]
    public async Task A_check_says_who_looked()
    {
        await using var app = await ShopApp.Sample();
        Assert.Contains("tap your initials", (await app.Fill("/saws/S2/check", Without("Who"))).Refused().Beside("Who"), StringComparison.Ordinal);
        (await app.Fill("/saws/S2/check", AllRight)).LeadsTo("/checks");
        Assert.Null((await app.GetPage("/saws/S1/check")).QuerySelector("input[name=Who]"));
    }

    [Fact]
    public async Task The_list_of_the_day_offers_the_next_saw_and_tells_who_looked_and_when()
    {
        await using var app = await ShopApp.Sample();
        Assert.Equal("Check Old Heron", SampleApp.Text((await app.GetPage("/checks")).QuerySelector(".btn.main")));
        (await app.Fill("/saws/S1/check", AllRight)).LeadsTo("/checks");
        var list = await app.GetPage("/checks");
        Assert.Equal("/saws/S2/check", list.QuerySelector(".btn.main")!.GetAttribute("href"));
        Assert.Equal("1 of 5 saws looked at today", SampleApp.Text(list.QuerySelector("h1")));
        Assert.Contains("10:30 by JP", Row(list, "S1"), StringComparison.Ordinal);
        Assert.Contains("not yet today", Row(list, "S2"), StringComparison.Ordinal);

        app.Clock.Advance(TimeSpan.FromDays(1));
        Assert.Equal("0 of 5 saws looked at today", SampleApp.Text((await app.GetPage("/checks")).QuerySelector("h1")));
    }

    [Fact]
    public async Task The_list_is_reached_from_More_and_from_a_saw()
    {
        await using var app = await ShopApp.Sample();
        Assert.NotNull((await app.GetPage("/more")).QuerySelector("a[href='/checks']"));
        var saw = await app.GetPage("/saws/S2");
        Assert.NotNull(saw.QuerySelector("a[href='/checks']"));
        Assert.NotNull(saw.QuerySelector("a[href='/saws/S2/check']"));
    }

    [Fact]
    public async Task Tension_written_as_off_and_found_on_is_written_as_on()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/slack", ("LetOff", "yes"))).LeadsTo("/saws/S2");
        app.Clock.Advance(TimeSpan.FromHours(1));
        (await app.Fill("/saws/S2/check", AllRight)).LeadsTo("/checks");
        Assert.Contains("tension was off, now on", Row(await app.GetPage("/checks"), "S2"), StringComparison.Ordinal);
        Assert.Null((await app.GetPage("/")).QuerySelector("#saw-S2 .s-slack"));
    }

    [Fact]
    public async Task A_blade_that_clicks_is_on_hold_and_the_page_says_what_to_do_now()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/check", With("Quiet", "no"))).LeadsTo("/saws/S2/clicking");
        Assert.True(await app.IsHeld("Q-08"));
        await using var db = app.NewContext();
        Assert.Equal(HoldKind.Clicking, (await db.Holds.AsNoTracking().OrderBy(h => h.EntryId).LastAsync()).Kind);
    }

    [Fact]
    public async Task A_guard_or_brake_not_right_is_told_until_the_next_check_finds_it_right()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/check", [.. With("Guards", "no").Where(f => f.Item1 != "Brake"), ("Brake", "no")])).LeadsTo("/checks");
        Assert.Contains("Not right: guards, brake", await Tile(app), StringComparison.Ordinal);
        Assert.Contains("Found not right, and to be put right: guards or doors, brake or run-down", SampleApp.Text((await app.GetPage("/saws/S2")).Body), StringComparison.Ordinal);
        Assert.Contains("Found not right at the last check: Osprey, guards or doors, brake or run-down.", (await app.GetPage("/handover")).QuerySelector("textarea")!.TextContent, StringComparison.Ordinal);

        app.Clock.Advance(TimeSpan.FromHours(1));
        (await app.Fill("/saws/S2/hours", ("Reading", "0"))).Refused();
        (await app.Fill("/saws/S2/check", AllRight)).LeadsTo("/checks");
        Assert.DoesNotContain("Not right", await Tile(app), StringComparison.Ordinal);
        Assert.DoesNotContain("to be put right", SampleApp.Text((await app.GetPage("/saws/S2")).Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task No_page_of_a_check_says_that_anything_is_safe()
    {
        await using var app = await ShopApp.Sample();
        foreach (var saw in new[] { "S1", "S2", "S3", "S4", "S5" })
        {
            (await app.Fill($"/saws/{saw}/check", AllRight)).LeadsTo("/checks");
        }

        var page = await app.GetPage("/checks");
        Assert.Equal("All 5 saws were looked at today", SampleApp.Text(page.QuerySelector("h1")));
        foreach (var text in new[] { page, await app.GetPage("/saws/S2/check"), await app.GetPage("/saws/S2") })
        {
            Assert.DoesNotMatch(@"(?i)\bsafe", text.Body!.TextContent);
        }
    }

    [Fact]
    public async Task A_saw_without_a_blade_is_not_asked_for_tension_or_clicking()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/swap", ("Reason", "OtherWork"), ("OnlyOff", "1"))).LeadsTo("/saws/S2");
        Assert.Null((await app.GetPage("/saws/S2/check")).QuerySelector("input[name=Tension]"));
        (await app.Fill("/saws/S2/check", ("Guards", "yes"), ("UnderTable", "yes"), ("Brake", "yes"), ("Who", "JP"))).LeadsTo("/checks");
    }

    [Fact]
    public async Task The_cautions_of_a_start_stand_under_the_check_with_their_sources()
    {
        await using var app = await ShopApp.Sample();
        var text = SampleApp.Text((await app.GetPage("/saws/S2/check")).Body);
        Assert.Contains("The guard under the table holds the blade in when it snaps. A worn mouthpiece shows poor upkeep.", text, StringComparison.Ordinal);
        Assert.Contains("WorkSafe New Zealand says within 6 mm", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_audit_counts_the_days_a_saw_was_checked_among_those_it_ran()
    {
        await using var sample = await ShopApp.Sample();
        (await sample.Fill("/saws/S4/check", AllRight)).LeadsTo("/checks");
        (await sample.Fill("/saws/S4/hours?typed=1", ("Running", "0.5"), ("From", "40 min ago"))).LeadsTo("/saws/S4");
        sample.Clock.Advance(TimeSpan.FromDays(1));
        (await sample.Fill("/saws/S4/hours?typed=1", ("Running", "0.5"), ("From", "40 min ago"))).LeadsTo("/saws/S4");
        var audit = SampleApp.Text((await sample.GetPage("/audit?from=2026-12-01&to=2026-12-02")).Body);
        Assert.Contains("checked on 1 of 2 days it ran", audit, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Undo_takes_the_check_back_with_the_hold_it_brought()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/check", With("Quiet", "no"))).LeadsTo("/saws/S2/clicking");
        var page = await app.GetPage("/saws/S2/clicking");
        var undo = await app.SendForm(page, page.QuerySelector("form.undo")!.GetAttribute("action")!);
        Assert.Equal(HttpStatusCode.Redirect, undo.Status);
        Assert.False(await app.IsHeld("Q-08"));
        Assert.Contains("not yet today", Row(await app.GetPage("/checks"), "S2"), StringComparison.Ordinal);
        Assert.Contains("Osprey looked at before starting: not right: it clicks", SampleApp.Text((await app.GetPage("/record")).Body), StringComparison.Ordinal);
        await app.AssertKept();
    }

    private static (string, string?)[] Without(string field) => [.. AllRight.Where(f => f.Item1 != field)];

    private static (string, string?)[] With(string field, string value) => [.. Without(field), (field, value)];

    private static string Row(IDocument list, string saw) => SampleApp.Text(list.QuerySelector($".list a[href='/saws/{saw}/check']"));

    private static async Task<string> Tile(ShopApp app) => SampleApp.Text((await app.GetPage("/")).QuerySelector("#saw-S2"));
}
