using BladeLog.Handbook.Units;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Blades;

public sealed class KerfPageTests
{
    [Fact]
    public async Task A_kerf_from_a_test_cut_changes_what_the_blade_is_reckoned_with_and_an_undo_takes_it_back()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-17/kerf", ("How", "TestCut"), ("Kerf", "1.24"))).LeadsTo("/blades/Q-17");
        Assert.Equal(1.24, (await app.GetJson("/api/v1/blades/Q-17")).GetProperty("kerf_mm").GetDouble(), 9);
        var page = await app.GetPage("/blades/Q-17");
        Assert.Contains("in a test cut", SampleApp.Text(page.Body), StringComparison.Ordinal);

        // The sharpening left 1.10 mm over the teeth: the slot is 0.14 mm wider.
        Assert.Contains("it flutters by 0.14 mm", SampleApp.Text(page.Body), StringComparison.Ordinal);
        await using (var db = app.NewContext())
        {
            Assert.Equal("S3", await db.KerfReadings.Where(k => k.KerfTyped == "1.24").Select(k => k.Saw!.Code).SingleAsync());
        }

        (await app.SendForm(page, page.QuerySelector("form.undo")!.GetAttribute("action")!)).LeadsTo("/blades/Q-17");
        Assert.Equal(1.10, (await app.GetJson("/api/v1/blades/Q-17")).GetProperty("kerf_mm").GetDouble(), 9);
        await app.AssertKept();
    }

    [Fact]
    public async Task Set_is_taken_in_thou_of_each_side_or_of_both_together()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-11/kerf", ("How", "DialGauge"), ("SetLeft", "11 thou"), ("SetRight", "8 thou"))).LeadsTo("/blades/Q-11");
        (await app.Fill("/blades/Q-12/kerf", ("How", "DialGauge"), ("SetBoth", "19 thou"))).LeadsTo("/blades/Q-12");
        await using var db = app.NewContext();
        var sides = await db.KerfReadings.SingleAsync(k => k.Blade.Tag == "Q-11");
        Assert.Equal(0.011 * Exact.Inch, sides.SetLeftM!.Value, 12);
        Assert.Equal(0.008 * Exact.Inch, sides.SetRightM!.Value, 12);
        Assert.Equal(0.019 * Exact.Inch, sides.SetBothM!.Value, 12);
        var both = await db.KerfReadings.SingleAsync(k => k.Blade.Tag == "Q-12");
        Assert.Null(both.SetLeftM);
        Assert.Equal(0.019 * Exact.Inch, both.SetBothM!.Value, 12);

        // 3 thou is 0.08 mm.
        string lead = "0.08 mm more on the left, so it leads to the left.";
        Assert.Contains(lead, SampleApp.Text((await app.GetPage("/blades/Q-11")).Body), StringComparison.Ordinal);
        Assert.Contains(lead, SampleApp.Text((await app.GetPage("/blades/Q-11/drift")).Body), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("", "", "", "", "", "How", "Say how it was measured.")]
    [InlineData("TestCut", "", "", "", "", "Kerf", "Write how wide the slot is.")]
    [InlineData("OverTeeth", "wide", "", "", "", "Kerf", "wide")]
    [InlineData("OverTeeth", "0.5", "", "", "", "Kerf", "wider than the body is thick")]
    [InlineData("DialGauge", "", "", "", "", "SetLeft", "Write the set of each side")]
    [InlineData("DialGauge", "1.2", "0.2", "0.2", "", "Kerf", "tells the set")]
    [InlineData("DialGauge", "", "0.2", "", "", "SetRight", "Write this side too")]
    [InlineData("DialGauge", "", "0.2", "0.2", "0.5", "SetBoth", "together are 0.4\u00a0mm")]
    public async Task A_slip_gets_its_sentence_and_keeps_what_was_typed(string how, string kerf, string left, string right, string both, string field, string sentence)
    {
        using var app = await ShopApp.Sample();
        var before = await app.EntryCount();
        var answer = (await app.Fill("/blades/Q-11/kerf", ("How", how), ("Kerf", kerf), ("SetLeft", left), ("SetRight", right), ("SetBoth", both))).Refused();
        Assert.Contains(sentence, answer.Beside(field), StringComparison.Ordinal);
        Assert.Equal((kerf, left, right, both), (answer.Typed("Kerf") ?? "", answer.Typed("SetLeft") ?? "", answer.Typed("SetRight") ?? "", answer.Typed("SetBoth") ?? ""));
        Assert.Equal(before, await app.EntryCount());
    }

    [Fact]
    public async Task A_form_sent_twice_is_one_reading_and_a_far_too_wide_one_asks_first()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage("/blades/Q-11/kerf");
        (string, string?)[] typed = [("How", "OverTeeth"), ("Kerf", "11.2")];
        var asked = (await app.SendForm(page, "/blades/Q-11/kerf", typed)).Refused();
        Assert.Contains("11.2 mm by a body of 0.64 mm", asked.Beside("Kerf"), StringComparison.Ordinal);
        (await app.SendForm(page, "/blades/Q-11/kerf", ("How", "OverTeeth"), ("Kerf", "1.12"))).LeadsTo("/blades/Q-11");
        (await app.SendForm(page, "/blades/Q-11/kerf", ("How", "OverTeeth"), ("Kerf", "1.12"))).LeadsTo("/blades/Q-11");
        await using var db = app.NewContext();
        Assert.Equal(1, await db.KerfReadings.CountAsync(k => k.Blade.Tag == "Q-11"));
    }

    [Fact]
    public async Task The_blade_page_leads_to_the_kerf_and_to_the_label_and_its_story_tells_the_reading()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage("/blades/Q-18?all=1");
        Assert.NotNull(page.QuerySelector("a.btn[href='/blades/Q-18/kerf']"));
        Assert.NotNull(page.QuerySelector("a.btn[href='/labels?tags=Q-18']"));
        Assert.Contains("Measured: set 0.21 mm left, 0.14 mm right, leads when cutting free (OT).", SampleApp.Text(page.Body), StringComparison.Ordinal);
        var labels = await app.GetPage("/labels?tags=Q-18");
        Assert.Contains("Q-18", SampleApp.Text(labels.Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_record_tells_a_reading_in_words_and_strikes_it_out()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-11/kerf", ("How", "OverTeeth"), ("Kerf", "1.2"), ("Note", "after the nail"))).LeadsTo("/blades/Q-11");
        var page = await app.GetPage("/record");
        Assert.Contains("Q-11 measured: kerf 1.2 mm over the teeth, after the nail", SampleApp.Text(page.Body), StringComparison.Ordinal);
    }
}
