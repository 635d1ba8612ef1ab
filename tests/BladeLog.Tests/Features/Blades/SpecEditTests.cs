using System.Net;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Blades;

public sealed class SpecEditTests
{
    [Fact]
    public async Task The_page_says_which_blades_it_changes_and_what_is_left_alone_stays_to_the_last_digit()
    {
        using var app = await ShopApp.Sample();
        var before = await Spec(app, "E1");
        var page = await app.GetPage("/specs/E1/edit?blade=Q-32");
        Assert.Contains("This changes the forecasts of 4 blades: Q-32, Q-33, Q-34, Q-35.", SampleApp.Text(page.Body), StringComparison.Ordinal);
        (await app.SendForm(page, "/specs/E1/edit", ("Kerf", "2.05"), ("LeastStock", "3"), ("Who", "MI"))).LeadsTo("/blades/Q-32");
        var after = await Spec(app, "E1");
        Assert.Equal(0.00205, after.KerfM!.Value, 12);
        Assert.Equal((3, before.Version + 1), (after.LeastStock, after.Version));
        Assert.Equal(
            (before.WidthM, before.ThicknessM, before.PitchCoarseM, before.PitchFineM, before.RakeRad, before.GulletDepthM, before.NewLoopM, before.TensionPa, before.LeastWidthM),
            (after.WidthM, after.ThicknessM, after.PitchCoarseM, after.PitchFineM, after.RakeRad, after.GulletDepthM, after.NewLoopM, after.TensionPa, after.LeastWidthM));
        Assert.Equal(
            (before.EdgeFreshM, before.SetPattern, before.PriceMinor, before.SharpeningPriceMinor, before.MostSharpenings, before.BodyHrc, before.Uid),
            (after.EdgeFreshM, after.SetPattern, after.PriceMinor, after.SharpeningPriceMinor, after.MostSharpenings, after.BodyHrc, after.Uid));
        await using var db = app.NewContext();
        var history = await db.ThingHistories.SingleAsync(h => h.Thing == nameof(Spec) && h.ThingId == after.Id);
        Assert.Equal("MI", await db.People.Where(p => p.Id == history.PersonId).Select(p => p.Initials).SingleAsync());
        Assert.Contains("A specification was changed", SampleApp.Text((await app.GetPage("/record")).Body), StringComparison.Ordinal);
        await app.AssertKept();
    }

    [Fact]
    public async Task Three_teeth_to_the_inch_are_not_rounded_by_being_looked_at()
    {
        using var app = await ShopApp.Sample();
        var before = await Spec(app, "A2");
        (await app.Fill("/specs/A2/edit", ("Price", "41.00"), ("Who", "MI"))).LeadsTo("/stock");
        var after = await Spec(app, "A2");
        Assert.Equal(before.PitchCoarseM, after.PitchCoarseM);
        Assert.Equal(4100, after.PriceMinor);
    }

    [Fact]
    public async Task A_changed_thickness_changes_the_forecast_of_its_blades()
    {
        using var app = await ShopApp.Sample();
        async Task<double> Median() => (await app.GetJson("/api/v1/blades/Q-09")).GetProperty("life").GetProperty("median_hours").GetDouble();
        var before = await Median();
        (await app.Fill("/specs/B3/edit", ("Thickness", "1.0"), ("Who", "MI"))).LeadsTo("/stock");

        // A thicker band bends harder over the same wheel and lives shorter.
        Assert.True(await Median() < before);
    }

    /// <summary>Chip room is in proportion to the area: capacity of the gullet (gullet-capacity-note).</summary>
    [Fact]
    public async Task A_measured_gullet_and_a_raker_set_go_into_every_answer_of_the_kind()
    {
        using var app = await ShopApp.Sample();
        async Task<(double Room, double Area, string Outer)> At()
        {
            var cut = await app.GetPage("/workings/cut?blade=Q-09&saw=S2&height=150+mm&feed=2+m/min&wood=Scots+pine");
            string Line(string what) => SampleApp.Text(cut.QuerySelectorAll(".work > div").First(d => SampleApp.Text(d.QuerySelector("dt")) == what).QuerySelector("dd b"));
            static double Figure(string text) => double.Parse(text.Split(' ')[0], System.Globalization.CultureInfo.InvariantCulture);
            return (Figure(Line("Chip room")), Figure(Line("Gullet area")), SampleApp.Text(cut.QuerySelectorAll(".work > div").First(d => SampleApp.Text(d.QuerySelector("dt")) == "Bite in the outer lanes of the kerf")));
        }

        var reckoned = await At();
        Assert.Contains("every second tooth", reckoned.Outer, StringComparison.Ordinal);
        (await app.Fill("/specs/B3/edit", ("GulletArea", "12,5"), ("SetPattern", "Raker"), ("Who", "MI"))).LeadsTo("/stock");
        var spec = await Spec(app, "B3");
        Assert.Equal(12.5e-6, spec.GulletAreaM2!.Value, 12);
        Assert.Equal(BladeLog.Handbook.Quantities.SetPattern.Raker, spec.SetPattern);
        var measured = await At();
        Assert.Equal(12.5, measured.Area, 1);
        Assert.Equal(reckoned.Room * 12.5 / reckoned.Area, measured.Room, 0.02 * measured.Room);
        Assert.Contains("every third tooth", measured.Outer, StringComparison.Ordinal);
        Assert.Equal(12.5, (await app.GetJson("/api/v1/blades/Q-09")).GetProperty("gullet_area_mm2").GetDouble(), 6);

        // Opened and saved again it stays, and so does the raker set.
        (await app.Fill("/specs/B3/edit", ("Price", "41.00"), ("Who", "MI"))).LeadsTo("/stock");
        Assert.Equal((spec.GulletAreaM2, spec.SetPattern), ((await Spec(app, "B3")).GulletAreaM2, (await Spec(app, "B3")).SetPattern));
    }

    [Theory]
    [InlineData("Width", "wide", "wide")]
    [InlineData("Width", "", "Write how wide it is.")]
    [InlineData("Kerf", "0.5", "wider than the body is thick")]
    [InlineData("GulletDepth", "40", "less deep than the blade is wide")]
    [InlineData("LeastWidth", "60", "not be more than the width when new")]
    [InlineData("GulletArea", "round", "not a number")]
    [InlineData("GulletArea", "9000", "no area of a gullet")]
    [InlineData("GulletArea", "400", "less area than pitch times its depth")]
    [InlineData("LeastStock", "-2", "number of blades")]
    [InlineData("LeastStock", "a few", "a few")]
    [InlineData("Code", "E2", "There is a specification E2 already.")]
    public async Task A_slip_gets_its_sentence_beside_its_field_and_is_kept(string field, string typed, string sentence)
    {
        using var app = await ShopApp.Sample();
        var before = await app.EntryCount();
        var answer = (await app.Fill("/specs/E1/edit", (field, typed), ("Who", "MI"))).Refused();
        Assert.Contains(sentence, answer.Beside(field), StringComparison.Ordinal);
        Assert.Equal(typed, answer.Typed(field) ?? "");
        Assert.Equal(before, await app.EntryCount());
    }

    [Fact]
    public async Task Two_tablets_that_change_one_kind_clash_and_the_second_keeps_what_it_typed()
    {
        using var app = await ShopApp.Sample();
        var slow = await app.GetPage("/specs/E1/edit");
        (await app.Fill("/specs/E1/edit", ("Price", "35.00"), ("Who", "OT"))).LeadsTo("/stock");
        var answer = await app.SendForm(slow, "/specs/E1/edit", ("LeastStock", "5"), ("Who", "MI"));
        Assert.Equal(HttpStatusCode.Conflict, answer.Status);
        Assert.Contains("OT changed specification E1", answer.Text, StringComparison.Ordinal);
        Assert.Equal("5", answer.Typed("LeastStock"));
        (await app.SendForm(answer.Page, "/specs/E1/edit")).LeadsTo("/stock");
        Assert.Equal(5, (await Spec(app, "E1")).LeastStock);
    }

    [Fact]
    public async Task A_code_with_a_stroke_and_blanks_has_its_page_too()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/specs/E1/edit", ("Code", "32 mm 7/8 in"), ("Who", "MI"))).LeadsTo("/stock");
        var stock = await app.GetPage("/stock");
        var link = stock.QuerySelectorAll("a").Select(a => a.GetAttribute("href")!).Single(h => h.StartsWith("/specs/32", StringComparison.Ordinal));
        Assert.Contains("32 mm 7/8 in", SampleApp.Text((await app.GetPage(link)).QuerySelector("h1")), StringComparison.Ordinal);
        Assert.NotNull((await app.GetPage("/blades/Q-32")).QuerySelector($"a[href='{link}?blade=Q-32']"));
    }

    [Fact]
    public async Task A_kind_nobody_has_heard_of_has_no_page()
    {
        using var app = await ShopApp.Sample();
        using var answer = await app.Client.GetAsync("/specs/Z9/edit");
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
    }

    private static async Task<Spec> Spec(ShopApp app, string code)
    {
        await using var db = app.NewContext();
        return await db.Specs.AsNoTracking().SingleAsync(s => s.Code == code);
    }
}
