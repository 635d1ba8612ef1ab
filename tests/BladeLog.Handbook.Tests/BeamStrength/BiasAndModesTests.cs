using BladeLog.Handbook.Band;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using CsCheck;
using MathNet.Numerics.Integration;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>Tables 3.5 and 6 of the band stability specification (independent program), by the general eigenvalue solver.</summary>
public class BiasAndModesTests
{
    private static readonly GuidedBand A11 = Guided(25, 0.9, 5, 100, 200, 150, 100);
    private static readonly GuidedBand A23 = Guided(100, 1.1, 10, 120, 600, 400, 300);

    private static Stress Mpa(double mpa) => Stress.FromMegapascals(mpa);

    [Theory]
    [InlineData(-30, 599.737, 1632.19)]
    [InlineData(-15, 616.972, 1717.50)]
    [InlineData(0, 633.947, 1797.53)]
    [InlineData(15, 650.650, 1871.76)]
    [InlineData(30, 667.069, 1939.58)]
    public void A_tighter_tooth_edge_buckles_later(double bias, double narrow, double wide)
    {
        Near(narrow, StressBias.CriticalThrust(A11, Mpa(bias)).Newtons, 1e-5);
        Near(wide, StressBias.CriticalThrust(A23, Mpa(bias)).Newtons, 1e-5);
    }

    [Fact]
    public void The_quick_iteration_and_the_general_solver_agree_at_any_bias() =>
        Gen.Select(Gen.Double[-60, 60], Gen.Double[0.2, 0.9], Gen.Int[0, 1]).Sample((bias, share, which) =>
        {
            GuidedBand band = which == 0 ? A11 : A23;
            band = band with { CutHeight = new Length(share * band.GuideSpan.Metres), CutCentre = new Length(band.GuideSpan.Metres / 2) };
            Near(LateralBuckling.CriticalThrust(band, 12, prebuckling: false, Mpa(bias)).Newtons, StressBias.CriticalThrust(band, Mpa(bias)).Newtons, 1e-5);
        });

    [Fact]
    public void A_hot_tooth_edge_costs_thrust()
    {
        Stress hot = Thermal.ToothEdgeChange(20, Steel206.YoungsModulus);
        Assert.True(StressBias.CriticalThrust(A11, hot).Newtons < StressBias.CriticalThrust(A11, default).Newtons);
    }

    // The integral of σ t y² over the width by quadrature, and the balance of the parabola.
    [Fact]
    public void Rolled_in_tension_pulls_and_pushes_alike_and_stiffens_against_twist()
    {
        const double t = 1.1e-3, b = 90e-3, edge = 60e6;
        double Roll(double y) => edge * ((3 * 4 * y * y / (b * b)) - 1) / 2;
        Assert.Equal(0, GaussLegendreRule.Integrate(Roll, -b / 2, b / 2, 12) / (edge * b), 1e-12);
        double stiffening = GaussLegendreRule.Integrate(y => Roll(y) * t * y * y, -b / 2, b / 2, 12);
        Assert.Equal(1, StressBias.RollStiffening(new Stress(edge), new Length(t), new Length(b)) / stiffening, 1e-12);
        double plain = StressBias.CriticalThrust(A23, default).Newtons;
        Assert.True(StressBias.CriticalThrust(A23, default, Mpa(40)).Newtons > plain);
        Assert.True(StressBias.CriticalThrust(A23, default, Mpa(-40)).Newtons < plain);
    }

    [Fact]
    public void A_band_whose_own_stresses_twist_it_bears_no_thrust() =>
        Assert.Equal(0, StressBias.CriticalThrust(Guided(100, 0.5, 5, 100, 900, 400, 450), Mpa(4000)).Newtons);

    [Fact]
    public void A_slack_tooth_edge_and_impossible_rolling_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => StressBias.CriticalThrust(A11, Mpa(-100)));
        Assert.Throws<ArgumentOutOfRangeException>(() => StressBias.CriticalThrust(A11, Mpa(-60), Mpa(-60)));
        Assert.Throws<ArgumentOutOfRangeException>(() => StressBias.CriticalThrust(A11, default, terms: 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => StressBias.RollStiffening(Mpa(double.NaN), new Length(1), new Length(1)));
        Assert.Throws<ArgumentOutOfRangeException>(() => StressBias.RollStiffening(Mpa(1), new Length(0), new Length(1)));
    }

    [Theory]
    [InlineData(0, 286.966, 103.277)]
    [InlineData(0.25, 282.902, 99.366)]
    [InlineData(0.5, 265.844, 84.213)]
    [InlineData(0.75, 218.326, 60.518)]
    public void Thrust_lowers_the_first_mode(double share, double narrow, double wide)
    {
        Near(narrow, Modes(A11, share)[0].Hertz, 1e-5);
        Near(wide, Modes(A23, share)[0].Hertz, 1e-5);
        Assert.Equal(BandFrequency.UnderThrust(A11, Thrust(A11, share)).Hertz, Modes(A11, share)[0].Hertz, 1e-6);
    }

    // Without thrust sideways movement and twist go their own ways, so the modes are those of the single formulas, still band.
    [Fact]
    public void Without_thrust_the_modes_are_the_single_ones()
    {
        double[] single = [.. Enumerable.Range(1, 12).SelectMany(n => new[] { BandFrequency.Lateral(A11, n).Hertz, BandFrequency.Torsional(A11, n).Hertz }).Order().Take(8)];
        double[] coupled = [.. CoupledModes.UnderThrust(A11, default, 8).Select(f => f.Hertz)];
        Assert.All(single.Zip(coupled), f => Near(f.First, f.Second, 1e-9));
    }

    [Fact]
    public void A_buckled_mode_has_no_frequency_left()
    {
        IReadOnlyList<Frequency> modes = Modes(A11, 1.0001);
        Assert.Equal(0, modes[0].Hertz);
        Assert.True(modes[1].Hertz > 0);
        Assert.Throws<ArgumentOutOfRangeException>(() => CoupledModes.UnderThrust(A11, default, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => CoupledModes.UnderThrust(A11, default, 13));
        Assert.Throws<ArgumentOutOfRangeException>(() => CoupledModes.UnderThrust(A11, new Force(-1), 1));
    }

    private static Force Thrust(GuidedBand band, double share) => new(share * LateralBuckling.CriticalThrust(band, 12, prebuckling: false).Newtons);

    private static IReadOnlyList<Frequency> Modes(GuidedBand band, double share) => CoupledModes.UnderThrust(band, Thrust(band, share), 3);
}
