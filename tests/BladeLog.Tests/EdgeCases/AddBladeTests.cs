using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Tests.Features;
using BladeLog.Tests.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.EdgeCases;

/// <summary>A blade is added: from the strip printed on it, from a coil, or used by nobody knows whom.</summary>
public sealed class AddBladeTests
{
    /// <summary>An inch is 25.4 mm; 7/8 in are 22.225 mm; 13 ft 2 in are 4013.2 mm.</summary>
    [Theory]
    [InlineData("1/2 x .025 x 3 x 105", 0.0127, 0.000635, 0.0254 / 3, 2.667)]
    [InlineData("1-1/4 x .042 x 7/8 in x 13'2\"", 0.03175, 0.0010668, 0.022225, 4.0132)]
    [InlineData("27 x 0,9 x 8,5 mm x 4013 mm", 0.027, 0.0009, 0.0085, 4.013)]
    public async Task Fractions_and_mixed_units_stand_in_one_line(string print, double width, double thickness, double pitch, double loop)
    {
        using var app = await ShopApp.Empty();
        var spec = await Added(app, print);
        Assert.Equal((width, thickness, loop), (Math.Round(spec.WidthM, 9), Math.Round(spec.ThicknessM, 9), Math.Round(spec.NewLoopM!.Value, 9)));
        Assert.Equal(pitch, spec.PitchCoarseM, 9);
    }

    /// <summary>3 TPI is 8.467 mm, 4 TPI 6.35 mm; 25.4 mm over 3.5 teeth are 7.257 mm.</summary>
    [Fact]
    public async Task Variable_pitch_keeps_its_finest_and_its_coarsest_and_bites_by_the_mean()
    {
        using var app = await ShopApp.Empty();
        var spec = await Added(app, "1/2 x .025 x 3-4 TPI x 105 in");
        Assert.Equal((8.467, 6.35, 7.257), (Math.Round(spec.PitchCoarseM * 1e3, 3), Math.Round(spec.PitchFineM * 1e3, 3), Math.Round(spec.PitchMeanM * 1e3, 3)));
    }

    [Fact]
    public async Task The_loop_length_is_offered_from_the_saws_record()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage("/blades/new");
        Assert.Contains(page.QuerySelectorAll("#f-NewLoop-list option"), o => o.GetAttribute("value")!.Replace(",", "", StringComparison.Ordinal).StartsWith("5080", StringComparison.Ordinal));
        Assert.Contains("Osprey", SampleApp.Text(page.GetElementById("f-NewLoop-hint")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_blade_from_coil_stock_is_born_at_the_weld()
    {
        using var shop = await TempShop.WithSaws();
        var coil = TempShop.Spec("COIL");
        coil.NewLoopM = null;
        await shop.Do(new AddSpec(coil));
        await shop.Do(new AddBlades("COIL", ["C-1"]) { At = TempShop.Day });
        Assert.Null((await Now(shop, "C-1")).LoopM);
        await shop.Do(new RecordJoint("C-1", 4, "4000", BladeLog.Handbook.Quantities.WeldQuality.Good, At: TempShop.Day.AddHours(1)));
        await shop.Do(SwapTests.On("S1", "C-1", 2));
        var file = await Now(shop, "C-1");
        Assert.Equal((4.0, 1), (file.LoopM, file.Welds));
    }

    [Fact]
    public async Task The_welded_length_counts_and_not_the_nominal_one()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordJoint("Q-1", 3.99, "3990", BladeLog.Handbook.Quantities.WeldQuality.Good, At: TempShop.Day));
        await shop.Do(SwapTests.On("S1", "Q-1", 1));
        await shop.Do(RunningTests.Typed(1, 2, 1));
        var file = await Now(shop, "Q-1");

        // Welded here before it ever ran: that is its first weld, not its second.
        Assert.Equal((3.99, 3.99, 1), (file.LoopM, Assert.Single(file.Exposures).LoopM, file.Welds));
    }

    [Fact]
    public async Task A_blade_of_unknown_history_starts_as_a_range_and_never_at_nought()
    {
        using var app = await ShopApp.Sample();
        Assert.Contains("more than 0", (await app.Fill("/blades/new", ("Tags", "U-1"), ("Spec", "B5"), ("UsedLow", "0"), ("UsedHigh", "0"))).Refused().Beside("UsedHigh"), StringComparison.Ordinal);
        (await app.Fill("/blades/new", ("Tags", "U-1"), ("Spec", "B5"), ("Used", "true"))).LeadsTo("/blades/U-1");
        var page = await app.GetPage("/blades/U-1");
        Assert.Contains("it had used 0.20 to 0.60 of a life", SampleApp.Text(page.Body), StringComparison.Ordinal);
        Assert.Empty(page.QuerySelector("svg.life")!.QuerySelectorAll(".used"));
        Assert.Single(page.QuerySelector("svg.life")!.QuerySelectorAll(".hatched"));
    }

    [Fact]
    public async Task It_may_not_even_be_a_wood_blade_so_its_teeth_are_asked_first()
    {
        using var app = await ShopApp.Empty();
        var asked = (await app.Fill("/blades/new", ("Tags", "U-1"), ("Print", "1/2 x .025 x 3 TPI x 105 in"), ("Used", "true"))).Refused();
        Assert.NotNull(asked.Beside("ToothForm"));
        Assert.Equal(0, await app.EntryCount());
    }

    [Fact]
    public async Task A_blade_of_unknown_history_is_left_out_of_what_the_shop_learns()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordPriorUse("Q-1", 0.2, 0.6, At: TempShop.Day));
        await shop.Do(SwapTests.On("S1", "Q-1", 1));
        await shop.Do(SwapTests.On("S2", "Q-2", 1));
        await shop.Do(RunningTests.Typed(1, 2, 1));
        await shop.Do(RunningTests.Typed(1, 2, 1) with { Saw = "S2" });
        var advice = new BladeLog.Advice.ShopAdvice(await shop.Ask(db => ShopNowReader.Read(db, shop.Now)));
        Assert.Equal(["Q-2"], BladeLog.Advice.BreakClusters.Watched(advice.Now.Blades.Select(advice.Of), advice.Settings).Select(w => w.Tag));
    }

    private static async Task<Spec> Added(ShopApp app, string print)
    {
        (await app.Fill("/blades/new", ("Tags", "N-1"), ("Print", print), ("ToothForm", "Hook"), ("TipKind", "Set"), ("TipMaterial", "HardenedCarbon"))).LeadsTo("/blades/N-1");
        await using var db = app.NewContext();
        return await db.Specs.SingleAsync();
    }

    private static async Task<BladeFile> Now(TempShop shop, string tag) => (await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade(tag)!;
}
