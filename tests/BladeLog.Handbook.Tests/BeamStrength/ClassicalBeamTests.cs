using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>A very long, very thin band under next to no tension is the narrow rectangular beam of the textbooks:
/// Timoshenko and Gere, Theory of Elastic Stability, chapter 6 (from memory). Loads as P L²/√(E Iy G J).</summary>
public class ClassicalBeamTests
{
    private const double L = 1000, b = 0.01, t = 1e-6, Nu = 0.30, E = 206e9;
    private const double Point = 1e-5;
    private static readonly double EI = E * b * t * t * t / 12;
    private static readonly double GJ = E / (2 * (1 + Nu)) * (b * t * t * t / 3) * (1 - (0.63 * t / b));

    [Theory]
    [InlineData(Point, 16.94, 0.005)]
    [InlineData(1.0, 28.3, 0.05)]
    public void An_untied_beam_buckles_at_the_textbook_load(double heightOverSpan, double published, double printed) =>
        Assert.Equal(published, Load(heightOverSpan, 25), printed);

    // Independent program, band stability specification 7.
    [Theory]
    [InlineData(1, 17.8845, 28.9112)]
    [InlineData(3, 16.9736, 28.3248)]
    [InlineData(5, 16.9495, 28.3166)]
    [InlineData(9, 16.9384, 28.3151)]
    [InlineData(15, 16.9366, 28.3150)]
    [InlineData(25, 16.9362, 28.3150)]
    public void The_series_closes_in_on_it_as_the_reference_does(int terms, double point, double spread)
    {
        Assert.Equal(point, Load(Point, terms), 0.0004);
        Assert.Equal(spread, Load(1, terms), 0.0004);
    }

    // Independent program, band stability specification 7; beside it the first-order rule 16.94 (1 − 1.74 z) (from memory).
    [Theory]
    [InlineData(0.02, 16.3035, 0.005)]
    [InlineData(0.05, 15.3847, 0.01)]
    [InlineData(0.1, 13.9474, 0.01)]
    [InlineData(0.2, 11.4733, 0.05)]
    public void A_load_above_the_axis_buckles_the_beam_sooner(double z, double reference, double secant)
    {
        double e = z * L / Math.Sqrt(EI / GJ);
        double load = Load(Point, 25, e - (b / 2));
        Assert.Equal(reference, load, 0.0004);
        ReferenceBands.Near(16.94 * (1 - (1.74 * z)), load, secant);
    }

    [Fact]
    public void A_uniform_moment_buckles_the_beam_at_pi_over_L_root_EI_GJ()
    {
        // The back carried far beyond the guides makes the moment between them almost even.
        GuidedBand band = Beam(Point, 0) with { BackSupportBelow = new Length(1e7), BackSupportAbove = new Length(1e7) };
        double moment = LateralBuckling.CriticalThrust(band, 1, prebuckling: false).Newtons * FrontEdge.GreatestMoment(band).Metres;
        ReferenceBands.Near(Math.PI / L * Math.Sqrt(EI * GJ), moment, 1e-4);
    }

    [Fact]
    public void An_untied_front_edge_goes_slack_as_a_plain_beam()
    {
        // Mid-span point load, moment P S/4: P₁ = 2σtb²/(3S).
        GuidedBand band = Beam(Point, 0);
        ReferenceBands.Near(L / 4, FrontEdge.GreatestMoment(band).Metres, 2e-5);
        ReferenceBands.Near(2 * band.Tension.Pascals * t * b * b / (3 * L), FrontEdge.SlackThrust(band).Newtons, 2e-5);
        // Clamped at both ends, even load over the whole span: S/24 at the middle, (3S² − 3Sh + h²)/(24S) with h = S.
        ReferenceBands.Near(L / 24, FrontEdge.GreatestMoment(Beam(1, 0) with { BackClamped = true }).Metres, 1e-9);
        ReferenceBands.Near(L / 8, FrontEdge.GreatestMoment(band with { BackClamped = true }).Metres, 1e-4);
    }

    private static double Load(double heightOverSpan, int terms, double gullet = 0) =>
        LateralBuckling.CriticalThrust(Beam(heightOverSpan, gullet), terms, prebuckling: false).Newtons * L * L / Math.Sqrt(EI * GJ);

    private static GuidedBand Beam(double heightOverSpan, double gullet) => new()
    {
        Width = new Length(b + gullet),
        Thickness = new Length(t),
        GulletDepth = new Length(gullet),
        Tension = new Stress(1e-12),
        GuideSpan = new Length(L),
        CutHeight = new Length(L * heightOverSpan),
        CutCentre = new Length(L / 2),
        Steel = ReferenceBands.Steel206,
    };
}
