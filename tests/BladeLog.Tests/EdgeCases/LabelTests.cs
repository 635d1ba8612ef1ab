using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using BladeLog.Tests.Features;
using BladeLog.Tests.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.EdgeCases;

/// <summary>Labels that two blades wear, that fell off, or that a shortened blade carries on; and where a blade can be.</summary>
public sealed class LabelTests
{
    private static readonly DateTime Day = TempShop.Day;

    [Fact]
    public async Task Two_blades_share_one_label_and_the_history_is_split_from_a_time_on()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Typed(0, 4, 2));
        await shop.Do(RunningTests.Cut(1));
        await shop.Do(new Swap("S1") { At = Day.AddHours(5) });
        await shop.Do(new RecordSharpening("Q-1", GrindKind.Face) { WidthM = 0.0245, At = Day.AddHours(6) });

        // From here on it was the other one.
        await shop.Do(SwapTests.On("S2", "Q-1", 8));
        await shop.Do(RunningTests.Typed(8, 12, 3) with { Saw = "S2" });
        await shop.Do(RunningTests.Cut(9) with { Saw = "S2" });
        await shop.Do(new Swap("S2") { At = Day.AddHours(13) });
        await shop.Do(new RecordInspection("Q-1", Found.NothingSeen) { At = Day.AddHours(14) });
        await shop.Do(new RecordSharpening("Q-1", GrindKind.Face) { WidthM = 0.024, At = Day.AddHours(15) });

        Assert.Contains("choose a time before it went on, or after it came off", await shop.Refused(new SplitLabel("Q-1", "Q-9", Day.AddHours(10), "x") { Spec = "A" }), StringComparison.Ordinal);
        await shop.Do(new SplitLabel("Q-1", "Q-9", Day.AddHours(7), "both were labelled Q-1") { Spec = "A" }, await shop.Person("OT"));

        var now = await shop.Ask(db => ShopNowReader.Read(db, shop.Now));
        Assert.Equal((2.0, 0.0245, 1), (now.Blade("Q-1")!.Hours, now.Blade("Q-1")!.WidthM, now.Blade("Q-1")!.Sharpenings));
        Assert.Equal((3.0, 0.024, 1), (now.Blade("Q-9")!.Hours, now.Blade("Q-9")!.WidthM, now.Blade("Q-9")!.Sharpenings));
        Assert.Null(now.Blade("Q-1")!.LastInspectedUtc);
        Assert.Equal(Day.AddHours(14), now.Blade("Q-9")!.LastInspectedUtc);

        // The audit line: every entry that went over is struck out by name, with the reason.
        var struck = await shop.Ask(db => db.Voids.Include(v => v.Entry.Person).ToListAsync());
        Assert.Equal(4, struck.Count);
        Assert.All(struck, v => Assert.Equal(("OT", "both were labelled Q-1"), (v.Entry.Person!.Initials, v.Reason)));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task What_changed_the_steel_itself_is_put_right_by_hand_before_a_label_is_split()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(new Swap("S1") { At = Day.AddHours(5) });
        var joint = await shop.Do(new RecordJoint("Q-1", 3.99, "3990", BladeLog.Handbook.Quantities.WeldQuality.Good, At: Day.AddHours(6)));
        Assert.Equal($"Void first, and enter again for the blade it happened to: entry {joint}.", await shop.Refused(new SplitLabel("Q-1", "Q-2", Day.AddHours(-1), "x")));
        Assert.Contains("Nothing is written of Q-3", await shop.Refused(new SplitLabel("Q-3", "Q-2", Day.AddHours(1), "x")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_page_for_two_blades_on_one_label_shows_both_and_where_the_label_was()
    {
        using var app = await ShopApp.Sample();
        await app.Be("OT");
        (await app.Fill("/saws/S2/swap?on=Q-13", ("Reason", "StillSharp"))).LeadsTo("/saws/S2");
        app.Clock.Advance(TimeSpan.FromHours(2));
        var edit = await app.GetPage("/blades/Q-13/edit");
        Assert.NotNull(edit.QuerySelector("a[href='/blades/Q-13/two']"));
        var empty = (await app.Fill("/blades/Q-13/two", ("From", ""))).Refused();
        Assert.Contains("Osprey", empty.Text, StringComparison.Ordinal);
        Assert.NotNull(empty.Beside("OtherTag"));
        var known = (await app.Fill("/blades/Q-13/two", ("OtherTag", "Q-11"), ("From", "90 min ago"))).Refused();
        Assert.Contains("choose a time before it went on", known.Beside("From"), StringComparison.Ordinal);
        Assert.Matches("Q-11: .* wide now", known.Text);
        (await app.Fill("/blades/Q-13/two", ("OtherTag", "Q-11"), ("From", "3 h ago"))).LeadsTo("/blades/Q-11");
        Assert.Equal("Q-11", await app.TagOn("S2"));
        await app.AssertKept();
    }

    [Fact]
    public async Task A_label_that_fell_off_is_found_by_saw_and_width_and_teeth()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage("/rack?q=Osprey 38 mm hook");
        Assert.Contains("like Osprey 38 mm hook", SampleApp.Text(page.QuerySelector("h1")), StringComparison.Ordinal);
        Assert.Empty((await app.GetPage("/rack?q=Osprey 99 mm hook")).QuerySelectorAll("main a[href^='/blades/Q-']"));
    }

    [Fact]
    public async Task A_recut_blade_keeps_its_number_with_a_suffix()
    {
        using var app = await ShopApp.Sample();
        Assert.Contains("Such as Q-11B.", SampleApp.Text((await app.GetPage("/blades/Q-11/join")).GetElementById("f-ChildTag-hint")), StringComparison.Ordinal);
        (await app.Fill("/blades/Q-11/join", ("Loop", "2667"), ("Quality", "Good"), ("ChildTag", "Q-11B"))).LeadsTo("/blades/Q-11B");
        Assert.Contains("Such as Q-11C.", SampleApp.Text((await app.GetPage("/blades/Q-11B/join")).GetElementById("f-ChildTag-hint")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_hold_survives_a_label_swap_and_a_restart()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordHold("Q-1", HoldKind.Crack) { At = Day });
        await shop.Do(new RetagBlade("Q-1", "Q-9", Day.AddHours(1)));
        using var second = new ShopWriter(shop);
        var asked = await second.Write(SwapTests.On("S1", "Q-9", 2), new Sent(Guid.NewGuid(), shop.Now, null, "tablet 2"));
        Assert.Contains("Q-9 is on hold", TempShop.Words(asked), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Spare_folded_blades_are_one_line_until_first_mounted_and_then_blades_of_their_own()
    {
        using var app = await ShopApp.Sample();
        static string Line(AngleSharp.Dom.IDocument page) => SampleApp.Text(page.QuerySelectorAll("section").First(s => SampleApp.Text(s.QuerySelector("h2")).StartsWith("E3:", StringComparison.Ordinal)));
        Assert.Contains("1 new spare", Line(await app.GetPage("/stock")), StringComparison.Ordinal);
        await app.Be("JP");
        var asked = await app.Fill("/saws/S5/swap?on=Q-40", ("Reason", "StillSharp"));
        if (asked.Status != System.Net.HttpStatusCode.Redirect)
        {
            (await app.SendForm(asked.Page, "/saws/S5/swap", ("Although", "it is on"))).LeadsTo("/saws/S5");
        }

        var after = Line(await app.GetPage("/stock"));
        Assert.DoesNotContain("new spare", after, StringComparison.Ordinal);
        Assert.Contains("Q-40", after, StringComparison.Ordinal);
    }
}
