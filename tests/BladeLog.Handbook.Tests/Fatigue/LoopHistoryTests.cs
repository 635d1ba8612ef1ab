using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tests.Band;
using CsCheck;
using static BladeLog.Handbook.Tests.Fatigue.BandLifeTests;

namespace BladeLog.Handbook.Tests.Fatigue;

/// <summary>What else is in a turn of the loop than its bends, and what the gullet's shape and surface do.</summary>
public class LoopHistoryTests
{
    private static Stress Mpa(double mpa) => Stress.FromMegapascals(mpa);

    private static KnownGullet Shape(double pitch, double share) => new(Length.FromMillimetres(pitch), Length.FromMillimetres(share * pitch));

    // Band-life specification, section 4.4: by 1.31 in stress and a factor of 15 in life, at a pitch of 8.5 mm and 46 HRC.
    [Fact]
    public void Grinding_the_gullet_sharp_costs_a_factor_of_fifteen_in_life()
    {
        SiteLife round = BandLife.Of(Case() with { Gullet = Shape(8.5, 0.19) }).Gullet;
        SiteLife sharp = BandLife.Of(Case() with { Gullet = Shape(8.5, 0.06) }).Gullet;
        Printed.Decimals(1.31, sharp.EquivalentAmplitude[0].Pascals / round.EquivalentAmplitude[0].Pascals, 2);
        Assert.InRange(round.MedianBends / sharp.MedianBends, 14, 16);
    }

    // Worked by hand: p/r 5.25, K_t 1 + 0.45 · 5.25^0.64 = 2.3006, q 0.94575 at r 0.8 mm and 1490.4 MPa.
    [Fact]
    public void A_known_gullet_stands_in_for_the_default_factors()
    {
        double kt = 1 + 0.45 * Math.Pow(5.25, 0.64), q = 1 / (1 + 0.0254 * Math.Pow(2070 / 1490.4, 1.8) / 0.8);
        BandCase given = Case() with { GulletTensionFactor = 1 + 0.8 * q * (kt - 1), GulletBendingFactor = 1 + 0.33 * q * (kt - 1) };
        BandCase known = Case() with { Gullet = new KnownGullet(Length.FromMillimetres(4.2), Length.FromMillimetres(0.8)) };
        Assert.Equal(1, BandLife.Of(given).MedianBends / BandLife.Of(known).MedianBends, 1e-9);
        Assert.Equal(BandLife.Of(Case()).Weld.MedianBends, BandLife.Of(known).Weld.MedianBends);
        Assert.Throws<ArgumentOutOfRangeException>(() => BandLife.Of(Case() with { Gullet = Shape(4.2, 0.4) }));
    }

    [Fact]
    public void A_rounder_gullet_never_shortens_the_life() =>
        Gen.Select(Gen.Double[0.06, 0.27], Gen.Double[4, 50]).Sample((share, pitch) =>
            BandLife.Of(Case() with { Gullet = Shape(pitch, share + 0.01) }).MedianBends >= BandLife.Of(Case() with { Gullet = Shape(pitch, share) }).MedianBends);

    // By hand from the surface table of shigley (6-2) and the line of Roessle and Fatemi, 46 HRC: C_s 0.849036, 0.650506; with rust 0.7 of it.
    // s_ar is 398.147 MPa whatever the surface; N by both branches of the line.
    [Theory]
    [InlineData(GulletFinish.Ground, false, 0.849036)]
    [InlineData(GulletFinish.Punched, false, 0.650506)]
    [InlineData(GulletFinish.Ground, true, 0.594325)]
    [InlineData(GulletFinish.Punched, true, 0.455354)]
    public void A_worse_surface_shortens_the_life_at_the_same_stress(GulletFinish finish, bool rusty, double cs)
    {
        SiteLife gullet = BandLife.Of(Case() with { Finish = finish, Rusty = rusty }).Gullet;
        Printed.Significant(398.147, gullet.EquivalentAmplitude[0].Megapascals);
        double b = -0.09 + Math.Log10(cs) / Math.Log10(2e7), k = -1 / b, knee = 2061 * Math.Pow(2e7, b);
        double N = 398.147 >= knee ? 0.5 * Math.Pow(398.147 / 2061, -k) : 1e7 * Math.Pow(knee / 398.147, 2 * k - 1);
        Assert.Equal(1, gullet.MedianBends / N, 1e-3);
    }

    [Fact]
    public void A_twist_at_the_guides_adds_its_own_damage_and_leaves_the_bends_alone()
    {
        // 45° over 400 mm on a body of 27 mm: 48.4815 MPa, band-life specification, section 1.7.
        BandCase c = Case(t: 1.07, wheel: 483, v: 24, loop: 4.01, tension: 150);
        SiteLife plain = BandLife.Of(c).Gullet;
        SiteLife twisted = BandLife.Of(c with { TwistPulls = [Mpa(48.4815), Mpa(48.4815)] }).Gullet;
        Assert.Equal(plain.EquivalentAmplitude, twisted.EquivalentAmplitude);
        Assert.Equal(2, twisted.Beside.Count);
        // By hand: amplitude 2 · 48.4815/2 about 2 (154.5216 + 48.4815) at most; γ 0.583720.
        double sar = Math.Pow(2 * (154.5216 + 48.4815), 1 - 0.583720) * Math.Pow(48.4815, 0.583720);
        Assert.All(twisted.Beside, s => Assert.Equal(sar, s.Megapascals, 1e-3 * sar));
        Assert.True(twisted.MedianBends <= plain.MedianBends);
        Assert.Empty(plain.Beside);
    }

    [Fact]
    public void The_same_tension_in_every_span_is_no_difference() =>
        Assert.Equal(BandLife.Of(Case()), BandLife.Of(Case() with { SpanOffsets = [Mpa(0), Mpa(0)] }), (a, b) => a!.MedianBends == b!.MedianBends);

    // By hand, two equal wheels with a tight span 30 MPa up: both peaks stand in the tight span's tension (they meet it on one side of the wheel),
    // one cycle falls to the tight trough, the other to the slack one.
    [Fact]
    public void A_tight_and_a_slack_span()
    {
        BandLifeResult r = BandLife.Of(Case() with { SpanOffsets = [Mpa(30), Mpa(0)], GulletTensionFactor = 1, GulletBendingFactor = 1 });
        const double sT = 101.76625, sb = 371.4667, g = 0.583720;
        double top = sT + 30 + sb;
        double toSlack = Math.Pow(top, 1 - g) * Math.Pow((sb + 30) / 2, g), toTight = Math.Pow(top, 1 - g) * Math.Pow(sb / 2, g);
        double[] actual = [.. r.Gullet.EquivalentAmplitude.Select(s => s.Megapascals).Order()];
        Assert.Equal(toTight, actual[0], 1e-2);
        Assert.Equal(toSlack, actual[1], 1e-2);
        Assert.Empty(r.Gullet.Beside);
        Assert.True(r.Weld.MedianBends < BandLife.Of(Case()).Weld.MedianBends);
    }

    [Fact]
    public void A_wrong_count_of_spans_and_a_pushing_span_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => BandLife.Of(Case() with { SpanOffsets = [Mpa(1)] }));
        Assert.Throws<ArgumentOutOfRangeException>(() => BandLife.Of(Case() with { SpanOffsets = [Mpa(-200), Mpa(0)] }));
        Assert.Throws<ArgumentOutOfRangeException>(() => BandLife.Of(Case() with { TwistPulls = [Mpa(-1)] }));
    }

    // Band-life specification, section 3.3: without gullet factors the inner face has 144.585 MPa, the outer 274.143, at 46 HRC.
    [Fact]
    public void The_two_faces_of_a_loop()
    {
        BandCase plain = Case() with { GulletTensionFactor = 1, GulletBendingFactor = 1 };
        FaceDamage d = Faces.PerLoop(plain);
        SnCurve curve = new(Basquin.RoessleFatemi(432).WithSurface(Surface.Factor(GulletFinish.Ground, Mpa(1490.4)), 1e7), 1e7);
        Assert.Equal(1, d.Outer * curve.Cycles(Mpa(274.143)) / 2, 1e-3);
        Assert.Equal(1, d.Inner * curve.Cycles(Mpa(144.585)) / 2, 1e-3);
    }

    [Fact]
    public void The_outer_face_is_the_one_the_life_is_of_and_the_inner_never_governs() =>
        Gen.Select(Gen.Double[0.4, 1.2], Gen.Double[300, 900], Gen.Double[40, 200], Gen.Double[0, 60]).Sample((t, wheel, tension, valley) =>
        {
            BandCase c = Case(t, wheel, tension: tension) with { CutValley = Mpa(valley) };
            FaceDamage d = Faces.PerLoop(c);
            Assert.Equal(1, d.Outer * BandLife.Of(c).Gullet.MedianBends / 2, 1e-9);
            Assert.True(d.Inner <= d.Outer);
        });

    [Fact]
    public void Turning_a_band_inside_out_shares_the_damage_between_its_faces()
    {
        FaceDamage d = Faces.PerLoop(Case());
        double one = Faces.Used(d, 1e6, 0), turned = Faces.Used(d, 0.5e6, 0.5e6);
        Assert.Equal(one, Faces.Used(d, 0, 1e6));
        Assert.Equal(0.5e6 * (d.Outer + d.Inner), turned, 1e-12);
        Assert.True(turned < one);
        Assert.Throws<ArgumentOutOfRangeException>(() => Faces.Used(d, -1, 0));
    }
}
