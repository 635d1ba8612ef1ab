using System.Net;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Saws;

public sealed class SwapTests
{
    private const string Scanned = "/saws/S2/swap?on=http://shop/b/Q-11";

    [Fact]
    public async Task After_a_scan_one_answer_and_one_button_swap_the_blade()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage(Scanned);
        Assert.Equal("Osprey: Q-08 off, Q-11 on", page.QuerySelector("h1")!.TextContent);
        Assert.Empty(page.QuerySelectorAll("input[name=Reason][checked]"));
        Assert.Equal("Put Q-11 on", page.QuerySelector("button.main")!.TextContent);

        (await app.SendForm(page, "/saws/S2/swap", ("Reason", "StillSharp"))).LeadsTo("/saws/S2");
        Assert.Equal("Q-11", await app.TagOn("S2"));
        Assert.Contains("Q-11 off", (await app.GetPage("/saws/S2/swap")).QuerySelector("h1")!.TextContent, StringComparison.Ordinal);
        await app.AssertKept();
    }

    [Fact]
    public async Task Without_a_scan_blades_that_fit_are_offered_and_one_more_tap_does_it()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage("/saws/S2/swap");
        var offered = page.QuerySelectorAll("input[name=OnTag]").Select(i => i.GetAttribute("value")).ToList();
        Assert.Contains("Q-11", offered);
        Assert.DoesNotContain("Q-14", offered); // on hold
        Assert.DoesNotContain("Q-02", offered); // too long
        Assert.DoesNotContain("Q-08", offered); // on the saw
        (await app.SendForm(page, "/saws/S2/swap", ("Reason", "Dull"), ("OnTag", "Q-11"))).LeadsTo("/saws/S2");
        Assert.Equal("Q-11", await app.TagOn("S2"));
    }

    [Fact]
    public async Task Without_saying_how_it_comes_off_nothing_is_saved_and_what_was_typed_stays()
    {
        using var app = await ShopApp.Sample();
        var before = await app.EntryCount();
        var answer = (await app.Fill(Scanned, ("At", "late"), ("Tension", "120 MPa"))).Refused();
        Assert.Contains("Say how Q-08 comes off", answer.Beside("Reason"), StringComparison.Ordinal);
        Assert.Contains("is not a time", answer.Beside("At"), StringComparison.Ordinal);
        Assert.Equal("late", answer.Typed("At"));
        Assert.Equal("120 MPa", answer.Typed("Tension"));
        Assert.Equal(before, await app.EntryCount());
    }

    [Fact]
    public async Task The_same_form_sent_twice_makes_one_swap()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage(Scanned);
        (await app.SendForm(page, "/saws/S2/swap", ("Reason", "Dull"))).LeadsTo("/saws/S2");
        var after = await app.EntryCount();

        // The second tap carries the op of the first.
        var again = await app.SendForm(page, "/saws/S2/swap", ("Reason", "Dull"));
        again.LeadsTo("/saws/S2");
        Assert.Equal(after, await app.EntryCount());
    }

    [Fact]
    public async Task The_slower_of_two_tablets_is_told_who_did_what_when()
    {
        using var app = await ShopApp.Sample();
        var slow = await app.GetPage("/saws/S2/swap?on=Q-13");
        await app.Be("JP");
        (await app.Fill(Scanned, ("Reason", "Dull"))).LeadsTo("/saws/S2");
        var before = await app.EntryCount();

        var answer = await app.SendForm(slow, "/saws/S2/swap", ("Reason", "StillSharp"), ("Tension", "140"));
        Assert.Equal(HttpStatusCode.Conflict, answer.Status);
        Assert.Contains("JP put Q-11 on Osprey at 10:30", answer.Text, StringComparison.Ordinal);
        Assert.Equal("140", answer.Typed("Tension"));
        Assert.Equal(before, await app.EntryCount());

        // The page shows what stands now, and can be sent.
        app.Clock.Advance(TimeSpan.FromMinutes(1));
        (await app.SendForm(answer.Page, "/saws/S2/swap")).LeadsTo("/saws/S2");
        Assert.Equal("Q-13", await app.TagOn("S2"));
    }

    [Fact]
    public async Task A_swap_dated_back_into_another_spell_names_the_entry_in_the_way()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill(Scanned, ("Reason", "Dull"), ("At", "20 min ago"))).LeadsTo("/saws/S2");
        var before = await app.EntryCount();
        var answer = (await app.Fill("/saws/S2/swap?on=Q-13", ("Reason", "Dull"), ("At", "1 h ago"))).Refused();
        Assert.Matches(@"Q-11 is on Osprey since .* \(entry \d+\)", answer.Text);
        Assert.Equal(before, await app.EntryCount());
    }

    [Fact]
    public async Task A_held_blade_needs_a_reason_and_a_second_tap_and_is_then_written_as_on()
    {
        using var app = await ShopApp.Sample();
        var asked = (await app.Fill("/saws/S2/swap?on=Q-14", ("Reason", "Dull"))).Refused();
        Assert.Contains("Q-14 is on hold", asked.Text, StringComparison.Ordinal);
        Assert.Equal("Q-08", await app.TagOn("S2"));
        Assert.Equal("It is on the saw: record it", asked.Page.QuerySelector("button.alarm")!.TextContent);

        // Nobody has said who they are: asked, not guessed.
        var nobody = (await app.SendForm(asked.Page, "/saws/S2/swap", ("Although", "put on by mistake"))).Refused();
        Assert.Contains("Say who", nobody.Text, StringComparison.Ordinal);
        Assert.Equal("Q-08", await app.TagOn("S2"));

        (await app.SendForm(asked.Page, "/saws/S2/swap", ("Although", "put on by mistake"), ("Who", "JP"))).LeadsTo("/saws/S2");
        Assert.Equal("Q-14", await app.TagOn("S2"));
        Assert.True(await app.IsHeld("Q-14"));
        Assert.Contains("against the advice: put on by mistake", SampleApp.Text((await app.GetPage("/saws/S2")).Body), StringComparison.Ordinal);
        var floor = await app.GetPage("/");
        Assert.Contains(floor.QuerySelectorAll(".tile"), t => t.TextContent.Contains("Osprey", StringComparison.Ordinal) && t.QuerySelector(".s-hold") is not null);
    }

    [Fact]
    public async Task A_blade_too_thick_for_the_wheels_is_asked_about_too()
    {
        using var app = await ShopApp.Sample();
        var asked = (await app.Fill("/saws/S4/swap?on=Q-22", ("Reason", "StillSharp"))).Refused();
        Assert.Contains("It is on the saw: record it", asked.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_blade_that_clicks_comes_off_and_is_on_hold_at_once()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill(Scanned, ("Reason", "CrackOrClicking"))).LeadsTo("/saws/S2");
        Assert.True(await app.IsHeld("Q-08"));
        await app.AssertKept();
    }

    [Fact]
    public async Task Undo_takes_back_both_halves_and_the_hold_with_them()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill(Scanned, ("Reason", "CrackOrClicking"))).LeadsTo("/saws/S2");
        var page = await app.GetPage("/saws/S2/swap");
        var undo = page.QuerySelector("form.undo")!;
        Assert.Contains("Q-11 on Osprey", undo.TextContent, StringComparison.Ordinal);
        var op = undo.QuerySelector("input[name=op]")!.GetAttribute("value");
        (await app.SendForm(page, undo.GetAttribute("action")!)).LeadsTo("/saws/S2");
        Assert.False(string.IsNullOrEmpty(op));
        Assert.Equal("Q-08", await app.TagOn("S2"));
        Assert.False(await app.IsHeld("Q-08"));
        await app.AssertKept();
    }

    [Fact]
    public async Task Only_off_leaves_the_saw_empty()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/swap", ("Reason", "StillSharp"), ("OnlyOff", "1"))).LeadsTo("/saws/S2");
        Assert.Null(await app.TagOn("S2"));
        Assert.Contains("Nothing comes off", (await app.GetPage("/saws/S2/swap")).Body!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_was_never_on_the_saw_is_struck_out_for_what_was()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/swap?found=1&on=Q-11", ("Reason", "Never"))).LeadsTo("/saws/S2");
        Assert.Equal("Q-11", await app.TagOn("S2"));
        await using var db = app.NewContext();
        Assert.Contains(await db.Voids.Select(v => v.Reason).ToListAsync(), r => r.Contains("never Q-08", StringComparison.Ordinal));
        await app.AssertKept();
    }

    [Fact]
    public async Task A_measured_tension_is_kept_as_typed()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill(Scanned, ("Reason", "Dull"), ("Tension", "120"), ("Measured", "true"), ("InsideOut", "true"))).LeadsTo("/saws/S2");
        await using var db = app.NewContext();
        var mount = await db.Mounts.OrderByDescending(m => m.EntryId).FirstAsync();
        Assert.Equal((120e6, "120", TensionKnown.Measured, true), (mount.TensionPa, mount.TensionTyped, mount.TensionKnown, mount.InsideOut));
    }
}
