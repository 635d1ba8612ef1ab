using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using CsCheck;
using static BladeLog.Handbook.Tests.Cutting.Saws;

namespace BladeLog.Handbook.Tests.Cutting;

public sealed class BiteTests
{
    [Fact]
    public void Rubbing_and_no_chip_feed_of_the_worked_example() // independent program, cutting specification 3.3
    {
        Printed.Check("1.23209", Bite.RubbingFeed(A(20)).MetresPerMinute);
        Printed.Check("0.246417", Bite.NoChipFeed(A(20)).MetresPerMinute);
        CutCase tipped = A(20) with { Tip = TipKind.Tipped };
        Printed.Check("2.25882", Bite.RubbingFeed(tipped).MetresPerMinute);
        Printed.Check("0.451765", Bite.NoChipFeed(tipped).MetresPerMinute);
    }

    [Theory] // Son, Lim, Kumar and Rahman 2005 (from memory), figures by the independent program
    [InlineData(0.3, "0.197707")]
    [InlineData(0.466308, "0.156608")]
    [InlineData(0.6, "0.129800")]
    public void The_least_chip_follows_friction(double friction, string share) => Printed.Check(share, Bite.LeastChipShare(friction));

    [Theory] // independent program, cutting specification 3.1
    [InlineData(20, "-6.57959")]
    [InlineData(30, "-24.1874")]
    [InlineData(40, "-33.8687")]
    [InlineData(60, "-44.8183")]
    public void A_thin_chip_meets_a_negative_rake(double radius, string degrees) =>
        Printed.Check(degrees, Bite.RakeAtEdge(Length.FromMicrometres(17.7083333333), Length.FromMicrometres(radius), Angle.FromDegrees(20)).Degrees);

    [Fact]
    public void Over_a_keen_edge_the_ground_rake_rules()
    {
        Assert.Equal(20, Bite.RakeAtEdge(Length.FromMicrometres(17.7), Length.FromMicrometres(10), Angle.FromDegrees(20)).Degrees, 1e-9);
        // Without the ground face in the way the circle alone would give 50.4 degrees (independent program).
        Assert.Equal(50.4, Bite.RakeAtEdge(Length.FromMicrometres(17.7083), Length.FromMicrometres(10), Angle.FromDegrees(89)).Degrees, 0.05);
    }

    [Fact]
    public void The_regime_steps_at_a_fifth_at_one_and_at_two_radii()
    {
        Cases.Random.Sample(c =>
        {
            double f_r = Bite.RubbingFeed(c).MetresPerSecond;
            Assert.Equal(BiteRegime.NoChip, Bite.RegimeOf(c, new Speed(0.199 * f_r)));
            Assert.Equal(BiteRegime.Rubbing, Bite.RegimeOf(c, new Speed(0.201 * f_r)));
            Assert.Equal(BiteRegime.Rubbing, Bite.RegimeOf(c, new Speed(0.999 * f_r)));
            Assert.Equal(BiteRegime.Cutting, Bite.RegimeOf(c, Bite.RubbingFeed(c)));
            Assert.Equal(BiteRegime.Cutting, Bite.RegimeOf(c, new Speed(1.999 * f_r)));
            Assert.Equal(BiteRegime.Free, Bite.RegimeOf(c, new Speed(2.001 * f_r)));
        });
    }

    [Fact]
    public void At_the_rubbing_feed_the_chip_over_the_edge_is_the_edge_radius()
    {
        Cases.Random.Sample(c =>
        {
            Length bite = Kinematics.BitePerTooth(Bite.RubbingFeed(c), c.Pitch, c.BandSpeed);
            Assert.Equal(Bite.RadiusUsed(c).Micrometres, Bite.OverEdge(c, bite).Micrometres, 1e-9);
        });
    }

    [Fact]
    public void The_lanes_of_alternate_set_add_up_to_the_kerf() // (t − 2s)·c + 2s·2c = c·k, so the mean over an edge as wide as the body is c·k/t
    {
        Gen.Select(Gen.Double[0.4, 1.6], Gen.Double[0.05, 0.5], Gen.Double[1, 300]).Sample((t, share, c) =>
        {
            double s = share * t, k = t + 2 * s;
            double outer = Kerf.OuterLaneBite(Length.FromMicrometres(c), SetPattern.Alternate).Micrometres;
            CutCase tooth = A() with { Thickness = Mm(t), Kerf = Mm(k) };
            double mean = ((t - 2 * s) * c + 2 * s * outer) / t;
            Assert.Equal(mean, Bite.OverEdge(tooth, Length.FromMicrometres(c)).Micrometres, 1e-9 * mean);
        });
    }

    [Fact]
    public void An_edge_keener_than_three_micrometres_counts_as_three()
    {
        Assert.Equal(3, Bite.RadiusUsed(A(0.5)).Micrometres, 1e-12);
        Assert.Equal(Bite.RubbingFeed(A(3)), Bite.RubbingFeed(A(0)));
    }
}
