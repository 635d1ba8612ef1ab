using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Blades;

public sealed class LookTests
{
    [Fact]
    public async Task A_look_at_the_whole_loop_takes_two_answers_and_a_save()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-11/inspect", ("Found", "NothingSeen"), ("LookedAt", "whole"))).LeadsTo("/blades/Q-11");
        var look = await Last(app);
        Assert.Equal((LookedAt.WholeLoop, BladeMarks.None), (look.LookedAt, look.Marks));
        Assert.Contains("Inspected: nothing seen; looked at the whole loop", SampleApp.Text((await app.GetPage("/blades/Q-11")).Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Only_part_asks_which_part()
    {
        await using var app = await ShopApp.Sample();
        var asked = (await app.Fill("/blades/Q-11/inspect", ("Found", "NothingSeen"), ("LookedAt", "part"))).Refused();
        Assert.Contains("Tick what was looked at", asked.Beside("LookedAt"), StringComparison.Ordinal);
        using var sent = await app.PostForm("/blades/Q-11/inspect", new() { ["Found"] = "NothingSeen", ["LookedAt"] = "part", ["Parts"] = "Weld" });
        Assert.Equal(LookedAt.Weld, (await Last(app)).LookedAt);
        Assert.Contains("looked at only weld", SampleApp.Text((await app.GetPage("/blades/Q-11")).Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_was_looked_at_is_asked_and_not_taken_for_granted()
    {
        await using var app = await ShopApp.Sample();
        var page = await app.GetPage("/blades/Q-11/inspect");
        Assert.Empty(page.QuerySelectorAll("main input[checked]"));
        Assert.Contains("whole loop", (await app.Fill("/blades/Q-11/inspect", ("Found", "NothingSeen"))).Refused().Beside("LookedAt"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_crack_is_written_at_once_and_was_looked_at_where_it_lies()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-11/inspect", ("Found", "Crack"), ("Place", "Weld"))).LeadsTo("/blades/Q-11");
        var look = await Last(app);
        Assert.Equal((LookedAt.Weld, (BladeMarks?)null), (look.LookedAt, look.Marks));
    }

    [Fact]
    public async Task Each_thing_seen_stands_on_the_blades_page_with_what_it_means()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-09/inspect", ("Found", "Worn"), ("LookedAt", "whole"), ("Marks", "BurnedGullets"), ("TeethMissing", "2"))).LeadsTo("/blades/Q-09");
        var text = SampleApp.Text((await app.GetPage("/blades/Q-09")).Body);
        Assert.Contains("Burned (blue) gullets: cracks start there.", text, StringComparison.Ordinal);
        Assert.Contains("2 teeth are missing", text, StringComparison.Ordinal);
        Assert.DoesNotContain("Rust in the gullets", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Rust_in_the_gullets_shortens_the_life_and_says_by_how_much()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-18/inspect", ("Found", "Worn"), ("LookedAt", "whole"), ("Marks", "Rust"))).LeadsTo("/blades/Q-18");
        var page = await app.GetPage("/blades/Q-18");
        Assert.Matches(@"Rust in the gullets: pits start cracks\. Life ×0\.\d\d, engineering default\.", SampleApp.Text(page.Body));
        Assert.Matches(@"Rust in the gullets: life ?×? ?0\.\d", Work(page));
        (await app.Fill("/blades/Q-18/inspect", ("Found", "NothingSeen"), ("LookedAt", "whole"), ("At", ""))).LeadsTo("/blades/Q-18");
        Assert.DoesNotContain("Rust in the gullets", Work(await app.GetPage("/blades/Q-18")), StringComparison.Ordinal);

        static string Work(IDocument page) => string.Join(' ', page.QuerySelectorAll(".because .work").Select(SampleApp.Text));
    }

    [Fact]
    public async Task Nothing_seen_with_something_ticked_is_asked_about()
    {
        await using var app = await ShopApp.Sample();
        Assert.Contains("Something was seen", (await app.Fill("/blades/Q-18/inspect", ("Found", "NothingSeen"), ("LookedAt", "whole"), ("Marks", "Rust"))).Refused().Beside("Found"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_hold_is_cleared_by_a_choice_and_other_needs_a_note()
    {
        await using var app = await ShopApp.Sample();
        var asked = (await app.Fill("/blades/Q-14/clear", ("How", "other"), ("Who", "OT"))).Refused();
        Assert.Contains("Write how it was cleared", asked.Beside("Note"), StringComparison.Ordinal);
        (await app.SendForm(asked.Page, "/blades/Q-14/clear", ("How", "looked again, no crack found"), ("Who", "OT"), ("Note", "under the lens"))).LeadsTo("/blades/Q-14");
        await using var db = app.NewContext();
        Assert.Equal("looked again, no crack found: under the lens", (await db.HoldsCleared.AsNoTracking().OrderBy(c => c.EntryId).LastAsync()).How);
    }

    [Fact]
    public async Task A_blade_that_is_not_on_hold_says_so_and_offers_its_page()
    {
        await using var app = await ShopApp.Sample();
        var page = await app.GetPage("/blades/Q-08/clear");
        Assert.Equal("Q-08 is not on hold", SampleApp.Text(page.QuerySelector("h1")));
        Assert.Equal("/blades/Q-08", page.QuerySelector("a.main")!.GetAttribute("href"));
        Assert.Null(page.QuerySelector("main form"));
    }

    [Fact]
    public async Task The_page_that_retires_a_blade_tells_the_advice_as_advice()
    {
        await using var app = await ShopApp.Sample();
        Assert.Contains("The advice is still: use it.", SampleApp.Text((await app.GetPage("/blades/Q-11/retire")).Body), StringComparison.Ordinal);
    }

    private static async Task<Inspection> Last(ShopApp app)
    {
        await using var db = app.NewContext();
        return await db.Inspections.AsNoTracking().OrderByDescending(i => i.EntryId).FirstAsync();
    }
}
