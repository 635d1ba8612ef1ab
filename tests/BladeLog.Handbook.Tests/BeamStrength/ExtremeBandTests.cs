using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

public class ExtremeBandTests
{
    [Theory]
    [InlineData(3, 0.635, 0.7, 70, 600, 1, 300)]
    [InlineData(3, 0.635, 0.7, 70, 600, 600, 300)]
    [InlineData(1, 0.3, 0.1, 1500, 50000, 5, 3)]
    [InlineData(300, 1.5, 20, 150, 60, 60, 30)]
    [InlineData(25, 0.9, 5, 1e-9, 200, 150, 100)]
    public void No_band_overflows(double w, double t, double g, double sigma, double S, double h, double xc)
    {
        GuidedBand band = Guided(w, t, g, sigma, S, h, xc);
        ThrustLimits limits = ThrustLimit.Of(band, PlateUse.Always);
        double[] figures =
        [
            limits.FrontEdge.Newtons, limits.BeamBuckling.Newtons, limits.PlateBuckling!.Value.Newtons, limits.Allowed.Newtons,
            TipStiffness.AtPoint(band, new Force(0)).NewtonsPerMetre, TipStiffness.OverCut(band, new Force(0)).NewtonsPerMetre,
            BandFrequency.Lateral(band).Hertz, BandFrequency.Torsional(band).Hertz,
        ];
        Assert.All(figures, figure => Assert.True(double.IsFinite(figure) && figure > 0));
    }

    [Fact]
    public void On_a_very_long_band_a_point_load_is_carried_by_the_pull_nearby()
    {
        // tanh(βS/2)/(2β) → 1/(2β), β = √(12σ/E)/b; βS = 1.6e4 here, far beyond what cosh can hold.
        double beta = Math.Sqrt(12 * 1500.0 / 206000) / 0.9;
        Near(1 / (2 * beta), FrontEdge.GreatestMoment(Guided(1, 0.3, 0.1, 1500, 50000, 1e-4, 25000)).Millimetres, 1e-4);
    }

    public static TheoryData<Func<GuidedBand, GuidedBand>, string> Impossible => new()
    {
        { b => b with { CutHeight = new Length(0.201) }, "The cut is higher than the span between the guides." },
        { b => b with { CutCentre = new Length(0.07) }, "The cut must lie between the guides." },
        { b => b with { CutCentre = new Length(0.13) }, "The cut must lie between the guides." },
        { b => b with { CutHeight = new Length(0) }, "The height of the cut must be greater than zero." },
        { b => b with { Width = new Length(double.NaN) }, "The width of the band must be greater than zero." },
        { b => b with { Thickness = new Length(-1) }, "The thickness of the band must be greater than zero." },
        { b => b with { GulletDepth = new Length(0.025) }, "The gullet must be less deep than the band is wide." },
        { b => b with { GulletDepth = new Length(0.0245) }, "The band must be no thicker than its body is wide." },
        { b => b with { Tension = new Stress(0) }, "The tension of the band must be greater than zero." },
        { b => b with { GuideSpan = new Length(double.PositiveInfinity) }, "The span between the guides must be greater than zero." },
        { b => b with { BackSupportBelow = new Length(-0.01) }, "The distance from the lower guide to the back support must not be negative." },
        { b => b with { BandSpeed = new Speed(120), System = TensionSystem.Locked }, "At this speed the band throws off all of its tension." },
    };

    [Theory]
    [MemberData(nameof(Impossible))]
    public void Impossible_bands_are_refused_with_a_sentence(Func<GuidedBand, GuidedBand> spoil, string sentence)
    {
        GuidedBand band = spoil(Guided(25, 0.9, 5, 100, 200, 150, 100));
        var refused = Assert.Throws<ArgumentOutOfRangeException>(() => ThrustLimit.Of(band, PlateUse.Never));
        Assert.StartsWith(sentence, refused.Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => FrontEdge.SlackThrust(band));
        Assert.Throws<ArgumentOutOfRangeException>(() => BandFrequency.Lateral(band));
    }

    [Fact]
    public void Impossible_questions_are_refused_too()
    {
        GuidedBand band = Guided(25, 0.9, 5, 100, 200, 150, 100);
        Assert.Throws<ArgumentOutOfRangeException>(() => LateralBuckling.CriticalThrust(band, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => PlateBuckling.CriticalThrust(band, 8, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => PlateBuckling.CriticalThrust(band, 25));
        Assert.Throws<ArgumentOutOfRangeException>(() => TipStiffness.AtPoint(band, new Force(-1)));
        Assert.Throws<ArgumentOutOfRangeException>(() => BandFrequency.Lateral(band, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => BandFrequency.Lateral(band with { BandSpeed = new Speed(120) }));
        Assert.Throws<ArgumentOutOfRangeException>(() => FrontEdge.SlackThrust(band, Stress.FromMegapascals(-100)));
        Assert.Throws<ArgumentOutOfRangeException>(() => ThrustLimit.Of(band, PlateUse.Never, frontEdgeFactor: 0.9));
        Assert.Throws<ArgumentOutOfRangeException>(() => ThrustLimit.Of(band, PlateUse.Never, bucklingFactor: double.NaN));
    }
}
