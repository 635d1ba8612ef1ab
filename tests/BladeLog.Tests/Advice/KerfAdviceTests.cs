using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Records;

namespace BladeLog.Tests.Advice;

/// <summary>A measured kerf goes into every answer that rests on the kerf.</summary>
public sealed class KerfAdviceTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    private static readonly DateTime Then = DemoShopFixture.Today.AddDays(-2);

    [Fact]
    public void A_measured_kerf_wins_over_body_and_set_these_over_the_box_and_the_box_over_the_default()
    {
        BladeFile file = shop.Blade("Q-17");
        AdviceSettings settings = shop.Advice.Settings;
        BladeFile set = file with { Kerf = new KerfNow(null, null, new MeasuredSet(0.20e-3, 0.22e-3, 0.42e-3, Then)) };
        BladeFile slot = set with { Kerf = set.Kerf with { Slot = new MeasuredLength(1.17e-3, Then) } };
        Assert.Equal((1.17, "measured"), Kerf(BladeBody.Of(slot, settings)));
        Assert.Equal((1.055, "body and set, both measured"), Kerf(BladeBody.Of(set, settings)));
        Assert.Equal((1.10, "specification"), Kerf(BladeBody.Of(file, settings)));
        BladeFile bare = file with { Spec = new Spec { Code = "", WidthM = 0.013, ThicknessM = 0.635e-3, PitchCoarseM = 0.008, PitchFineM = 0.008 } };

        // 1.8 times the body: engineering default.
        Assert.Equal(1.143, Kerf(BladeBody.Of(bare, settings)).Mm, 9);
        Assert.True(BladeBody.Of(bare, settings).Kerf.IsDefault);
    }

    [Fact]
    public void A_wider_slot_lets_a_blade_turn_more_tightly_by_the_chord_in_the_kerf()
    {
        (Choice narrow, Choice wide) = Pair("Q-17", 1, "S3", 1.40e-3);

        // w^2/(8 (k - t)) - t/2 by hand: 12.8 mm wide, body 0.635 mm, kerf 1.10 and 1.40 mm.
        Assert.Equal(43.7, narrow.HardRadiusM!.Value * 1e3, 0.1);
        Assert.Equal(26.5, wide.HardRadiusM!.Value * 1e3, 0.1);
        Assert.True(wide.UsualRadiusM < narrow.UsualRadiusM);
    }

    [Fact]
    public void A_wider_slot_wastes_timber_in_proportion()
    {
        (Choice narrow, Choice wide) = Pair("Q-08", 3, "S2", 1.80e-3);
        Assert.Equal(1.80 / 1.50, wide.Job!.Cost.Timber / narrow.Job!.Cost.Timber, 9);
    }

    [Fact]
    public void A_wider_slot_asks_more_power_and_more_push_so_both_hold_the_feed_down_earlier()
    {
        (Choice narrow, Choice wide) = Pair("Q-08", 2, "S2", 1.80e-3);
        foreach (FeedLimitKind kind in new[] { FeedLimitKind.Power, FeedLimitKind.Feeder, FeedLimitKind.Beam })
        {
            double before = narrow.Gate!.Limits.Single(l => l.Kind == kind).GreenMps, after = wide.Gate!.Limits.Single(l => l.Kind == kind).GreenMps;
            Assert.True(after < before, $"{kind}: {before} and then {after}");
        }
    }

    [Fact]
    public void A_wider_slot_over_the_same_edge_forms_a_chip_at_a_slower_feed()
    {
        // Chip over the edge: bite times kerf over the width of a tooth's edge; set teeth cut with the body's width.
        (Choice narrow, Choice wide) = Pair("Q-17", 1, "S3", 1.40e-3);
        Assert.Equal(1.10 / 1.40, wide.Gate!.NoChipMps / narrow.Gate!.NoChipMps, 9);
    }

    [Theory]
    [InlineData(0.27, 0.21, "Set 0.27 left and 0.21 mm right: 0.06 mm more on the left, so it leads to the left.")]
    [InlineData(0.21, 0.30, "Set 0.21 left and 0.30 mm right: 0.09 mm more on the right, so it leads to the right.")]
    [InlineData(0.22, 0.24, "Set 0.22 left and 0.24 mm right: even, so a lead has another cause.")]
    public void Uneven_set_explains_a_lead_and_to_which_side(double left, double right, string sentence)
    {
        BladeFile file = shop.Blade("Q-17") with { Kerf = new KerfNow(null, null, new MeasuredSet(left * 1e-3, right * 1e-3, (left + right) * 1e-3, Then)) };
        Assert.Equal(sentence, KerfWords.Lead(file, shop.Advice.Settings, new Wording()));
    }

    [Fact]
    public void Set_of_both_sides_together_says_nothing_of_a_lead()
    {
        BladeFile file = shop.Blade("Q-17") with { Kerf = new KerfNow(null, null, new MeasuredSet(null, null, 0.48e-3, Then)) };
        Assert.Null(KerfWords.Lead(file, shop.Advice.Settings, new Wording()));
        Assert.Empty(KerfWords.Of(shop.Blade("Q-17"), shop.Advice.Settings, new Wording()));
    }

    [Fact]
    public void A_slot_wider_than_the_set_teeth_is_flutter()
    {
        // Body 0.635 mm and 0.2325 mm a side: 1.10 mm over the teeth.
        BladeFile file = shop.Blade("Q-17") with { Kerf = new KerfNow(new MeasuredLength(1.20e-3, Then), null, new MeasuredSet(0.2325e-3, 0.2325e-3, 0.465e-3, Then)) };
        Assert.Equal(
            "Its slot is 1.20 mm wide and its teeth only 1.10 mm: it flutters by 0.10 mm. Look at the guides, the tension, the weld and the wheels.",
            KerfWords.Flutter(file, shop.Advice.Settings, new Wording()));
        Assert.Null(KerfWords.Flutter(file with { Kerf = file.Kerf with { Slot = new MeasuredLength(1.13e-3, Then) } }, shop.Advice.Settings, new Wording()));
        Assert.Null(KerfWords.Flutter(file with { Kerf = file.Kerf with { Set = null } }, shop.Advice.Settings, new Wording()));
    }

    private (Choice Narrow, Choice Wide) Pair(string tag, int cut, string saw, double kerfM)
    {
        BladeFile file = shop.Blade(tag), wide = file with { Kerf = new KerfNow(new MeasuredLength(kerfM, Then), null, null) };
        CutWork work = shop.Advice.For(shop.Cut(cut)).Work;
        Choice Try(BladeFile f) => shop.Advice.Try(work, shop.Advice.On(f, shop.Saw(saw)), shop.Saw(saw));
        return (Try(file), Try(wide));
    }

    private static (double Mm, string From) Kerf(BladeBody body) => (Math.Round(body.Kerf.Value * 1e3, 9), body.Kerf.From);
}
