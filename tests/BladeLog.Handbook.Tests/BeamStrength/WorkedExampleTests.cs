using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>Bands of the worked examples (independent program, advice specification 9 and 10; E = 207 GPa) and of the sample shop.</summary>
public class WorkedExampleTests
{
    [Fact]
    public void A_38_mm_blade_in_300_mm_fir_is_stopped_by_buckling()
    {
        ThrustLimits limits = ThrustLimit.Of(Carbon(35.4, 0.9, 5, 135, 370, 300, 210), PlateUse.WhereItMatters);
        Near(388.04, limits.FrontEdge.Newtons, 0.005 / 388);
        Near(318.45, limits.Stop.Newtons, 0.005 / 318);
        Assert.Equal(limits.Stop, limits.Allowed);
        Assert.Equal(ThrustLimiter.Buckling, limits.GovernedBy);
        Assert.Null(limits.PlateBuckling);
    }

    [Fact]
    public void A_3_mm_blade_in_6_mm_maple_is_held_back_by_its_front_edge()
    {
        ThrustLimits limits = ThrustLimit.Of(Carbon(3, 0.635, 0.7, 70, 54, 6, 43), PlateUse.WhereItMatters);
        Near(5.3642, limits.FrontEdge.Newtons, 0.00005 / 5.3);
        Near(95.127, limits.Stop.Newtons, 0.0005 / 95);
        Assert.Equal(limits.FrontEdge, limits.Allowed);
        Assert.Equal(ThrustLimiter.FrontEdge, limits.GovernedBy);
    }

    [Theory]
    [InlineData(0.9, 235)]
    [InlineData(1.07, 290)]
    public void A_thinner_blade_on_the_mill_is_allowed_a_fifth_less(double thickness, double allowed)
    {
        ThrustLimits limits = ThrustLimit.Of(Carbon(32, thickness, 6, 120, 380, 300, 190), PlateUse.WideBandsOnly);
        Assert.Equal(allowed, limits.Allowed.Newtons, 0.5);
    }

    [Fact]
    public void A_guessed_tension_and_a_straighter_cut_take_their_factors_off()
    {
        GuidedBand narrow = Carbon(3, 0.635, 0.7, 70, 54, 6, 43), wide = Carbon(35.4, 0.9, 5, 135, 370, 300, 210);
        Near(5.3642 / 1.25, ThrustLimit.Of(narrow, PlateUse.Never, frontEdgeFactor: 1.25).Allowed.Newtons, 0.00005 / 5.3);
        ThrustLimits straight = ThrustLimit.Of(wide, PlateUse.Never, bucklingFactor: 3);
        Near(318.45 * 2 / 3, straight.Stop.Newtons, 0.005 / 318);
        Near(318.45 * 2, straight.Buckling.Newtons, 0.005 / 318);
    }

    [Theory]
    [InlineData(PlateUse.Never, 100, 600, false, false)]
    [InlineData(PlateUse.WhereItMatters, 25, 200, false, false)]
    [InlineData(PlateUse.WhereItMatters, 25, 100, true, true)]
    [InlineData(PlateUse.WideBandsOnly, 25, 100, false, false)]
    [InlineData(PlateUse.WideBandsOnly, 100, 600, true, true)]
    [InlineData(PlateUse.WhereItMatters, 100, 600, true, true)]
    [InlineData(PlateUse.Always, 38, 300, true, false)]
    public void The_plate_value_is_shown_and_rules_where_it_was_decided(PlateUse use, double w, double S, bool shown, bool rules)
    {
        double t = w >= 100 ? 1.1 : w > 30 ? 1.0 : 0.9;
        ThrustLimits limits = ThrustLimit.Of(Carbon(w, t, w >= 100 ? 10 : 6, 120, S, S / 2, S / 2), use);
        Assert.Equal(shown, limits.PlateBuckling is not null);
        Assert.Equal(rules, limits.Buckling.Newtons < limits.BeamBuckling.Newtons);
        if (rules)
        {
            Assert.Equal(limits.PlateBuckling, limits.Buckling);
        }
    }

    [Fact]
    public void A_short_cut_on_a_wide_thin_blade_is_resolved()
    {
        GuidedBand band = Carbon(80, 0.6, 12, 140, 300, 18, 60);
        double rules = ThrustLimit.Of(band, PlateUse.WhereItMatters).Buckling.Newtons;
        Assert.True(rules < 0.95 * PlateBuckling.CriticalThrust(band).Newtons);
        Near(PlateBuckling.CriticalThrust(band, 24, 6).Newtons, rules, 0.05);
    }

    private static GuidedBand Carbon(double w, double t, double g, double sigma, double S, double h, double xc) =>
        Guided(w, t, g, sigma, S, h, xc) with { Steel = Steel.Carbon };
}
