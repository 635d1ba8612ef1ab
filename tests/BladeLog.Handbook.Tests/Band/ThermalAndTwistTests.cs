using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;
using CsCheck;

namespace BladeLog.Handbook.Tests.Band;

/// <summary>Figures from the independent program of the band-life specification, sections 1.5 and 1.7; α from memory.</summary>
public class ThermalAndTwistTests
{
    private static readonly Stress E = Steel.Carbon.YoungsModulus;

    [Theory]
    [InlineData(1, 2.42190)]
    [InlineData(10, 24.2190)]
    public void A_warm_loop_on_a_locked_saw_loses_tension(double kelvin, double lost) =>
        Printed.Significant(lost, Thermal.TensionLost(kelvin, E, Tension.Support(TensionSystem.Locked)).Megapascals);

    [Fact]
    public void A_sprung_saw_takes_up_what_the_warm_loop_gives() =>
        Assert.Equal(0, Thermal.TensionLost(10, E, Tension.Support(TensionSystem.Sprung)).Pascals);

    // The balance written out: the loop wants to grow by α Δϑ L, the wheel follows by d, k d = 2 A Δσ, E (α Δϑ − 2 d/L) = Δσ.
    [Fact]
    public void A_stiff_spring_loses_part_of_it() =>
        Gen.Select(Gen.Double[1e4, 1e7], Gen.Double[1, 40]).Sample((k, kelvin) =>
        {
            const double L = 2.36, t = 0.64e-3, b = 11.2e-3;
            double eta = Tension.Support(new Stiffness(k), new Length(L), new Length(t), new Length(b), E);
            double lost = Thermal.TensionLost(kelvin, E, eta).Pascals;
            double d = 2 * t * b * lost / k;
            Assert.Equal(lost, E.Pascals * (Thermal.CarbonSteelExpansion * kelvin - 2 * d / L), 1e-6 * E.Pascals * 1e-3);
        });

    [Fact]
    public void A_hot_tooth_edge_is_relieved_and_a_cold_loop_gains()
    {
        Printed.Significant(-72.6570, Thermal.ToothEdgeChange(30, E).Megapascals);
        Assert.True(Thermal.TensionLost(-10, E, 0).Pascals < 0);
    }

    [Fact]
    public void Five_degrees_of_twist_can_be_left_out()
    {
        Angle twist = Angle.FromDegrees(5);
        Length over = Length.FromMillimetres(300);
        Printed.Significant(14.8219, GuideTwist.Shear(twist, over, Length.FromMillimetres(0.64), Steel.Carbon).Megapascals);
        Printed.Significant(0.183095, GuideTwist.EdgePull(twist, over, Length.FromMillimetres(11.2), E).Megapascals);
        Assert.Equal(0, GuideTwist.ExtraCycles(twist, 2));
    }

    [Fact]
    public void Tilted_guides_add_a_cycle_at_each_twist()
    {
        Angle twist = Angle.FromDegrees(-45);
        Printed.Significant(48.4815, GuideTwist.EdgePull(twist, Length.FromMillimetres(400), Length.FromMillimetres(27), E).Megapascals);
        Assert.Equal(2, GuideTwist.ExtraCycles(twist, 2));
        Assert.Equal(0, GuideTwist.ExtraCycles(twist, 0));
    }

    [Fact]
    public void Impossible_numbers_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Thermal.TensionLost(double.NaN, E, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Thermal.TensionLost(10, E, 1.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Thermal.ToothEdgeChange(10, new Stress(0)));
        Assert.Throws<ArgumentOutOfRangeException>(() => GuideTwist.Shear(new Angle(1), new Length(0), new Length(1e-3), Steel.Carbon));
        Assert.Throws<ArgumentOutOfRangeException>(() => GuideTwist.EdgePull(new Angle(double.NaN), new Length(1), new Length(1e-2), E));
        Assert.Throws<ArgumentOutOfRangeException>(() => GuideTwist.ExtraCycles(new Angle(1), -1));
    }
}
