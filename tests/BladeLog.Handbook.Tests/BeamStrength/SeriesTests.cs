using BladeLog.Handbook.BeamStrength;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>The parts of the series for band A11, in mm and N (independent program, band stability specification 11).</summary>
public class SeriesTests
{
    private static readonly GuidedBand A11 = Guided(25, 0.9, 5, 100, 200, 150, 100);

    [Fact]
    public void The_section_is_that_of_the_reference()
    {
        BandSection s = BandSection.Of(A11);
        Near(20, s.b * 1e3, 1e-9);
        Near(18, s.A * 1e6, 1e-9);
        Near(1800, s.T, 1e-9);
        Near(600, s.Iz * 1e12, 1e-9);
        Near(0.0038161639, s.beta * 1e-3, 1e-8);
        Near(250290, s.EIy * 1e6, 1e-8);
        Near(374145.05, s.GJ * 1e6, 1e-7);
        Near(8343000, s.EIw * 1e12, 1e-8);
        Near(33.400833, s.r2 * 1e6, 1e-7);
        Near(15, s.e * 1e3, 1e-9);
    }

    [Fact]
    public void The_moment_and_its_integrals_are_those_of_the_reference()
    {
        BandSection s = BandSection.Of(A11);
        var plane = new InPlane(s);
        Near(0.47206185, plane.SlopeLow(), 1e-7);
        Near(-0.47206185, plane.SlopeHigh(), 1e-7);
        Span<double> q = stackalloc double[5], mc = stackalloc double[5];
        RitzTerms.Load(s, q);
        plane.Cosines(q, mc);
        Near(-0.30010544, q[2], 1e-7);
        Near(-0.21220659, q[4], 1e-7);
        Near(3836.839, mc[0] * 1e6, 1e-6);
        Near(-1242.3364, mc[2] * 1e6, 1e-7);
        Near(-291.82538, mc[4] * 1e6, 1e-7);
        Assert.Equal(0, mc[1], 1e-15);
        Assert.Equal(0, mc[3], 1e-15);
    }

    [Fact]
    public void Stiffness_coupling_and_load_are_those_of_the_reference()
    {
        BandSection s = BandSection.Of(A11);
        const int n = 3;
        var ritz = new RitzTerms(s, new InPlane(s), n, prebuckling: false, stackalloc double[RitzTerms.Room(n)]);
        double[] ku = [45.937002, 202.03340, 523.14537], kp = [10765.890, 43673.074, 100550.09];
        for (int i = 0; i < n; i++)
        {
            Near(ku[i], ritz.ku[i] * 1e-3, 1e-7);
            Near(kp[i], ritz.kp[i] * 1e3, 1e-7);
        }

        Near(0.62661815, ritz.C[0], 1e-7);
        Near(-0.11726460, ritz.C[2], 1e-7);
        Near(-1.0553814, ritz.C[6], 1e-7);
        Near(2.0374142, ritz.C[4], 1e-7);
        Near(4.3904656, ritz.C[8], 1e-7);
        Near(0.65005272, ritz.Q[0], 1e-7);
        Near(-0.043949424, ritz.Q[2], 1e-7);
        Near(0.60610330, ritz.Q[4], 1e-7);
        Near(0.55001757, ritz.Q[8], 1e-7);
    }

    [Fact]
    public void A_cut_shrunk_to_a_point_gives_the_point_load()
    {
        foreach (double h in new[] { 1e-3, 1e-6 })
        {
            GuidedBand point = Guided(25, 0.9, 5, 100, 200, h, 100);
            Near(125.770, FrontEdge.SlackThrust(point).Newtons, 2e-5);
            Near(375.729, LateralBuckling.CriticalThrust(point, 12, prebuckling: false).Newtons, 2e-5);
            Near(374.334, LateralBuckling.CriticalThrust(point, 40, prebuckling: false).Newtons, 2e-5);
        }
    }

    // Band stability specification 4 (its number of sine terms is not printed; sixteen are enough for its digits): 25 × 0.9, 100 MPa, S 200, h 100 (no gullet); K = 1 is the beam to 2 %.
    [Fact]
    public void Width_terms_let_the_section_bend_and_settle_quickly()
    {
        double[] reference = [719.01, 711.12, 710.95, 710.35, 710.31, 710.30, 710.30];
        GuidedBand band = Guided(25, 0.9, 0, 100, 200, 100, 100);
        for (int k = 1; k <= 7; k++)
        {
            Near(reference[k - 1], PlateBuckling.CriticalThrust(band, 16, k).Newtons, 1e-5, $"K = {k}");
        }

        double[] shortAndWide = [10388, 6431, 5947, 5744, 5600, 5597, 5596];
        GuidedBand stout = Guided(150, 1.3, 0, 120, 300, 150, 150);
        for (int k = 1; k <= 7; k++)
        {
            Near(shortAndWide[k - 1], PlateBuckling.CriticalThrust(stout, 16, k).Newtons, 1e-4, $"K = {k}");
        }

        Near(481.4, PlateBuckling.CriticalThrust(Guided(25, 0.9, 6, 100, 200, 100, 100), 16, 1).Newtons, 1.1e-4);
        Near(474.3, PlateBuckling.CriticalThrust(Guided(25, 0.9, 6, 100, 200, 100, 100), 16, 3).Newtons, 1.1e-4);
        Near(470.9, LateralBuckling.CriticalThrust(Guided(25, 0.9, 6, 100, 200, 100, 100), 12, prebuckling: false).Newtons, 1.1e-4);
    }
}
