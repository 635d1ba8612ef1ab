using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Blades;

public sealed class BladeFormTests
{
    [Fact]
    public async Task A_grind_is_recorded_with_the_width_after_it()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-11/sharpen", ("Kind", "FullProfile"), ("Width", "12.5"))).LeadsTo("/blades/Q-11");
        Assert.Contains("12.5", (await app.GetPage("/blades/Q-11/sharpen")).Body!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_blade_wider_after_a_grind_is_asked_about()
    {
        using var app = await ShopApp.Sample();
        var asked = (await app.Fill("/blades/Q-11/sharpen", ("Kind", "Face"), ("Width", "12.9"))).Refused();
        Assert.Contains("does not make it wider", asked.Beside("Width"), StringComparison.Ordinal);
        (await app.SendForm(asked.Page, "/blades/Q-11/sharpen", ("AsMeasured", "1"))).LeadsTo("/blades/Q-11");
    }

    [Theory]
    [InlineData("sharpen", "Kind", "Say what was ground")]
    [InlineData("inspect", "Found", "Say what was found")]
    [InlineData("hold", "Kind", "Say why")]
    [InlineData("retire", "Reason", "Say why")]
    [InlineData("break", "Site", "Say where it broke")]
    [InlineData("join", "Loop", "how long the loop is")]
    [InlineData("tension", "Tension", "what was measured")]
    [InlineData("hang", "Place", "where it is now")]
    [InlineData("clear", "How", "how it was cleared")]
    public async Task A_form_with_its_answer_missing_says_so_beside_the_field_and_saves_nothing(string verb, string field, string sentence)
    {
        using var app = await ShopApp.Sample();
        var before = await app.EntryCount();
        var answer = (await app.Fill($"/blades/Q-14/{verb}")).Refused();
        Assert.Contains(sentence, answer.Beside(field), StringComparison.Ordinal);
        Assert.Equal(before, await app.EntryCount());
    }

    [Fact]
    public async Task A_crack_found_is_a_hold_at_once()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-11/inspect", ("Found", "Crack"), ("LookedAt", "part"), ("Parts", "Gullets"), ("Place", "Gullet"), ("CrackLength", "1.2"))).LeadsTo("/blades/Q-11");
        Assert.True(await app.IsHeld("Q-11"));
    }

    [Fact]
    public async Task Only_a_person_who_may_clears_a_hold()
    {
        using var app = await ShopApp.Sample();
        await app.Be("JP");
        Assert.Contains("Only these may: MI, OT.", (await app.GetPage("/blades/Q-14/clear")).Body!.TextContent, StringComparison.Ordinal);
        var refused = (await app.Fill("/blades/Q-14/clear", ("How", "ground out"))).Refused();
        Assert.Contains("MI, OT", refused.Text, StringComparison.Ordinal);
        Assert.Equal("ground out", refused.Typed("How"));
        Assert.True(await app.IsHeld("Q-14"));

        (await app.SendForm(refused.Page, "/blades/Q-14/clear", ("Who", "OT"))).LeadsTo("/blades/Q-14");
        Assert.False(await app.IsHeld("Q-14"));
    }

    [Fact]
    public async Task A_break_takes_the_blade_off_its_saw()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-08/break", ("Site", "Weld"), ("MinutesLost", "20"))).LeadsTo("/blades/Q-08");
        Assert.Null(await app.TagOn("S2"));
        var page = await app.GetPage("/blades/Q-08/hold");
        (await app.SendForm(page, page.QuerySelector("form.undo")!.GetAttribute("action")!)).LeadsTo("/blades/Q-08");
        Assert.Equal("Q-08", await app.TagOn("S2"));
        await app.AssertKept();
    }

    [Fact]
    public async Task A_blade_on_a_saw_is_retired_by_a_second_tap()
    {
        using var app = await ShopApp.Sample();
        var asked = (await app.Fill("/blades/Q-08/retire", ("Reason", "Uneconomic"), ("CutUp", "true"))).Refused();
        Assert.Equal("Take it off and retire it", asked.Page.QuerySelector("button.alarm")!.TextContent);
        Assert.Equal("Q-08", await app.TagOn("S2"));
        (await app.SendForm(asked.Page, "/blades/Q-08/retire", ("TakeOff", "1"))).LeadsTo("/blades/Q-08");
        Assert.Null(await app.TagOn("S2"));
    }

    [Fact]
    public async Task A_joint_makes_the_loop_shorter_and_never_longer()
    {
        using var app = await ShopApp.Sample();
        Assert.Contains("only makes it shorter", (await app.Fill("/blades/Q-11/join", ("Loop", "6000"), ("Quality", "Good"))).Refused().Beside("Loop"), StringComparison.Ordinal);
        (await app.Fill("/blades/Q-11/join", ("Loop", "2667"), ("Quality", "Good"), ("ChildTag", "Q-11B"))).LeadsTo("/blades/Q-11B");
        await using var db = app.NewContext();
        Assert.Equal(2.667, (await db.BladesNow.SingleAsync(n => db.Blades.Any(b => b.Id == n.BladeId && b.Tag == "Q-11B"))).LoopM!.Value, 9);
        await app.AssertKept();
    }

    [Fact]
    public async Task A_tension_measured_and_a_hook_are_kept()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-08/tension", ("Tension", "132 MPa"), ("How", "gauge"))).LeadsTo("/blades/Q-08");
        (await app.Fill("/blades/Q-11/hang", ("Place", "Rack"), ("Hook", "R1-9"))).LeadsTo("/blades/Q-11");
        Assert.Contains("R1-9", (await app.GetPage("/blades/Q-11/hang")).Body!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_line_printed_on_a_blade_is_enough_to_add_several()
    {
        using var app = await ShopApp.Empty();
        var page = await app.GetPage("/blades/new");
        (string, string?)[] typed = [("Tags", "N-1 n-2"), ("Print", "1/2 x .025 x 3 x 105"), ("ToothForm", "Hook"), ("TipKind", "Set"), ("TipMaterial", "HardenedCarbon")];
        (await app.SendForm(page, "/blades/new", typed)).LeadsTo("/rack?show=new");
        await using var db = app.NewContext();
        var spec = await db.Specs.SingleAsync();

        // 1/2 in, 0.025 in, 25.4/3 mm, 105 in.
        Assert.Equal((0.0127, 0.000635, 2.667), (Math.Round(spec.WidthM, 9), Math.Round(spec.ThicknessM, 9), Math.Round(spec.NewLoopM!.Value, 9)));
        Assert.Equal(0.0254 / 3, spec.PitchCoarseM, 9);
        Assert.Equal(["N-1", "N-2"], await db.Blades.Select(b => b.Tag).Order().ToListAsync());

        // The same form again adds nothing.
        (await app.SendForm(page, "/blades/new", typed)).LeadsTo("/rack?show=new");
        Assert.Equal(2, await db.Blades.CountAsync());
    }

    [Fact]
    public async Task A_used_blade_of_unknown_history_carries_its_range()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/new", ("Tags", "U-1"), ("Spec", "B5"), ("UsedLow", "0.2"), ("UsedHigh", "0,6"))).LeadsTo("/blades/U-1");
        await using var db = app.NewContext();
        var prior = await db.PriorUses.SingleAsync(p => db.Blades.Any(b => b.Id == p.BladeId && b.Tag == "U-1"));
        Assert.Equal((0.2, 0.6), (prior.UsedLow, prior.UsedHigh));
    }

    [Fact]
    public async Task A_tag_used_before_is_refused_and_not_even_its_specification_is_saved()
    {
        using var app = await ShopApp.Sample();
        var before = await app.EntryCount();
        var answer = (await app.Fill(
            "/blades/new", ("Tags", "Q-08"), ("Print", "1/2 x .025 x 3 x 105"), ("ToothForm", "Hook"), ("TipKind", "Set"), ("TipMaterial", "Bimetal"))).Refused();
        Assert.Contains("never used again", answer.Beside("Tags"), StringComparison.Ordinal);
        Assert.Equal(before, await app.EntryCount());
    }

    [Fact]
    public async Task Two_tablets_that_change_one_blade_clash()
    {
        using var app = await ShopApp.Sample();
        var slow = await app.GetPage("/blades/Q-11/edit");
        await app.Be("OT");
        (await app.Fill("/blades/Q-11/edit", ("InspectEvery", "4 h"))).LeadsTo("/blades/Q-11");
        var answer = await app.SendForm(slow, "/blades/Q-11/edit", ("MeasuredHrc", "44"));
        Assert.Equal(System.Net.HttpStatusCode.Conflict, answer.Status);
        Assert.Contains("OT changed Q-11", answer.Text, StringComparison.Ordinal);
        Assert.Equal("44", answer.Typed("MeasuredHrc"));
    }

    [Fact]
    public async Task A_new_label_leads_to_the_blade_under_its_new_name()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-11/edit", ("NewTag", "Q-99"), ("Relabel", "1"))).LeadsTo("/blades/Q-99");
    }
}
