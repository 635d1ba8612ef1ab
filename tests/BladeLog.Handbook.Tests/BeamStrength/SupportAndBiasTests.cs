using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>Tables 2.4, 3.5, 3.7 and 6 of the band stability specification (independent program).</summary>
public class SupportAndBiasTests
{
    private static readonly GuidedBand A11 = Guided(25, 0.9, 5, 100, 200, 150, 100);
    private static readonly GuidedBand A23 = Guided(100, 1.1, 10, 120, 600, 400, 300);

    [Theory]
    [InlineData(0, 0, false, 203.514, 29.4820, 100, 633.947)]
    [InlineData(0, 0, true, 557.847, 10.7556, 100, 866.916)]
    [InlineData(200, 250, false, 64.4889, 93.0393, 103.088, 271.360)]
    [InlineData(200, 250, true, 109.249, 54.9203, 107.405, 418.873)]
    public void The_back_should_be_carried_at_the_guides(double below, double above, bool clamped, double P1, double m, double at, double Pcr)
    {
        GuidedBand band = A11 with
        {
            BackSupportBelow = Length.FromMillimetres(below),
            BackSupportAbove = Length.FromMillimetres(above),
            BackClamped = clamped,
        };
        Near(P1, FrontEdge.SlackThrust(band).Newtons, 1e-5);
        Near(m, FrontEdge.GreatestMoment(band).Millimetres, 1e-5);
        Near(at, FrontEdge.WeakestPoint(band).Millimetres, 1e-5);
        Near(Pcr, LateralBuckling.CriticalThrust(band, 12, prebuckling: false).Newtons, 1e-5);
    }

    [Theory]
    [InlineData(-30, 142.460, 599.737)]
    [InlineData(-15, 172.987, 616.972)]
    [InlineData(0, 203.514, 633.947)]
    [InlineData(15, 234.041, 650.650)]
    [InlineData(30, 264.568, 667.069)]
    public void A_tight_tooth_edge_stiffens_a_narrow_band(double bias, double P1, double Pcr) => Biased(A11, bias, P1, Pcr);

    [Theory]
    [InlineData(-30, 1378.80, 1632.19)]
    [InlineData(-15, 1608.60, 1717.50)]
    [InlineData(0, 1838.40, 1797.53)]
    [InlineData(15, 2068.20, 1871.76)]
    [InlineData(30, 2298.00, 1939.58)]
    public void A_tight_tooth_edge_stiffens_a_wide_band(double bias, double P1, double Pcr) => Biased(A23, bias, P1, Pcr);

    private static void Biased(GuidedBand band, double bias, double P1, double Pcr)
    {
        Stress edge = Stress.FromMegapascals(bias);
        Near(P1, FrontEdge.SlackThrust(band, edge).Newtons, 1e-5);
        Near(Pcr, LateralBuckling.CriticalThrust(band, 12, prebuckling: false, edge).Newtons, 1e-5);
    }

    // 25 m/s takes 4.9 of 100 MPa away from a band of 25 × 0.9, 45 m/s takes 15.9 away from one of 100 × 1.1.
    [Theory]
    [InlineData(25, 0.9, 300, 25, -2.2, 0.051)]
    [InlineData(100, 1.1, 600, 45, -12, 0.51)]
    public void A_locked_saw_loses_buckling_strength_as_it_runs(double w, double t, double S, double speed, double percent, double printed)
    {
        GuidedBand still = Guided(w, t, 0, 100, S, S / 2, S / 2);
        GuidedBand locked = still with { BandSpeed = new Speed(speed), System = TensionSystem.Locked };
        double rest = LateralBuckling.CriticalThrust(still, 12, prebuckling: false).Newtons;
        Assert.Equal(percent, 100 * ((LateralBuckling.CriticalThrust(locked, 12, prebuckling: false).Newtons / rest) - 1), printed);
        Assert.Equal(rest, LateralBuckling.CriticalThrust(locked with { System = TensionSystem.Sprung }, 12, prebuckling: false).Newtons);
        Assert.Equal(FrontEdge.SlackThrust(still), FrontEdge.SlackThrust(locked));
        Assert.True(PlateBuckling.CriticalThrust(locked).Newtons < PlateBuckling.CriticalThrust(still).Newtons);
        Assert.True(TipStiffness.AtPoint(locked, new Force(0)).NewtonsPerMetre < TipStiffness.AtPoint(still, new Force(0)).NewtonsPerMetre);
    }

    [Theory]
    [InlineData(0, 286.966, 103.277)]
    [InlineData(0.25, 282.902, 99.366)]
    [InlineData(0.5, 265.844, 84.213)]
    [InlineData(0.75, 218.326, 60.518)]
    public void Thrust_lowers_the_note_of_the_band(double share, double narrow, double wide)
    {
        Near(narrow, Under(A11, share), 1e-5);
        Near(wide, Under(A23 with { Tension = Stress.FromMegapascals(120) }, share), 1e-5);
    }

    [Fact]
    public void At_the_buckling_thrust_the_band_has_no_note_and_no_stiffness_left()
    {
        Assert.Equal(0, Under(A11, 1.0001));
        var buckled = new Force(LateralBuckling.CriticalThrust(A11, 24, prebuckling: false).Newtons * 1.0001);
        Assert.Equal(0, TipStiffness.AtPoint(A11, buckled).NewtonsPerMetre);
        Assert.Equal(0, TipStiffness.OverCut(A11, new Force(1e9)).NewtonsPerMetre);
    }

    private static double Under(GuidedBand band, double share)
    {
        double P = LateralBuckling.CriticalThrust(band, 12, prebuckling: false).Newtons * share;
        return BandFrequency.UnderThrust(band, new Force(P)).Hertz;
    }
}
