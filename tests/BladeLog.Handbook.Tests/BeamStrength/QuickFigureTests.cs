using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using CsCheck;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>The quick figures and what stands beside the tip stiffness (band stability specification 4, 5 and 6).</summary>
public class QuickFigureTests
{
    private static readonly GuidedBand A11 = Guided(25, 0.9, 5, 100, 200, 150, 100);

    public static TheoryData<string> Bands => Ids;

    // Claimed there: within 2 % to r = 0.4 and 5.3 % to r = 0.7 over the 26 reference bands, against the exact solution; half a digit is allowed.
    [Theory]
    [MemberData(nameof(Bands))]
    public void The_stiffness_left_under_thrust_is_near_the_full_solution(string id)
    {
        GuidedBand band = Find(id).Band;
        double Pcr = LateralBuckling.CriticalThrust(band, 24, prebuckling: false).Newtons, s = ThrustSoftening.TwistShare(band);
        double rest = TipStiffness.AtPoint(band, default).NewtonsPerMetre;
        for (int step = 1; step <= 35; step++)
        {
            double r = 0.02 * step, exact = TipStiffness.AtPoint(band, new Force(r * Pcr)).NewtonsPerMetre / rest;
            Near(exact, ThrustSoftening.Left(r, s), step <= 20 ? 0.0205 : 0.0535, id);
        }
    }

    // At half of the buckling thrust 53 to 65 % are left, at a third about 70 to 80 % (specification 0).
    [Theory]
    [MemberData(nameof(Bands))]
    public void At_half_of_the_buckling_thrust_more_than_half_of_the_stiffness_is_left(string id)
    {
        double s = ThrustSoftening.TwistShare(Find(id).Band);
        Assert.InRange(ThrustSoftening.Left(0.5, s), 0.52, 0.66);
        Assert.InRange(ThrustSoftening.Left(1.0 / 3, s), 0.675, 0.805);
        Assert.Equal(1, ThrustSoftening.Left(0, s));
        Assert.Equal(0, ThrustSoftening.Left(1, s));
    }

    // Two bands that differ in tooth height only tell the twist apart by the lever: δ = lateral + e² twist.
    [Theory]
    [MemberData(nameof(Bands))]
    public void The_share_of_the_twist_is_that_of_the_lever(string id)
    {
        GuidedBand band = Find(id).Band;
        var higher = new Length(band.GulletDepth.Metres + 0.004);
        GuidedBand taller = band with { GulletDepth = higher, Width = new Length(band.Width.Metres + 0.004) };
        double Lever(GuidedBand b) => (b.Width.Metres + b.GulletDepth.Metres) / 2;
        double Give(GuidedBand b) => 1 / TipStiffness.AtPoint(b, default).NewtonsPerMetre;
        double twist = (Give(taller) - Give(band)) / (Math.Pow(Lever(taller), 2) - Math.Pow(Lever(band), 2));
        Assert.Equal(twist * Math.Pow(Lever(band), 2) / Give(band), ThrustSoftening.TwistShare(band), 1e-6);
    }

    // Specification 4: with gullets within 2.5 % on table A and slightly high; "worst tried 0.52 against 0.498" off the table.
    // It is meant where the plate would rule. The fit is of cuts at mid-span; the one far off it (A24) is 5 % high.
    [Theory]
    [MemberData(nameof(Bands))]
    public void The_quick_plate_share_is_near_the_plate(string id)
    {
        Row row = Find(id);
        if (row["w"] >= 40 || row["w"] / row["S"] > 0.2)
        {
            Near(row["PcrPlate_N8K4"] / row["PcrBeam_N12"], PlateFit.Share(row.Band), row["xc"] == row["S"] / 2 ? 0.025 : 0.05, id);
        }
    }

    // Specification 4: 0.41 to 0.50 of the beam at 150 mm on 300 mm, near 1 for a narrow band on a long span.
    [Fact]
    public void A_wide_thin_band_on_a_short_span_loses_half()
    {
        Assert.InRange(PlateFit.Share(Guided(150, 1.3, 0, 120, 300, 150, 150)), 0.45, 0.65);
        Assert.InRange(PlateFit.Share(Guided(6, 0.5, 0, 100, 300, 150, 150)), 0.999, 1);
        Assert.Throws<ArgumentOutOfRangeException>(() => PlateFit.Share(Guided(150, 1.3, 0, 120, 200, 100, 100)));
    }

    // Specification 5.3: about 1320 N/mm at pitch 12, gullet 5, 0.9 thick.
    [Fact]
    public void A_tooth_is_far_stiffer_than_the_band_it_stands_on()
    {
        Stiffness tooth = ToothCompliance.OfTooth(Length.FromMillimetres(12), Length.FromMillimetres(5), Length.FromMillimetres(0.9), Steel206);
        Assert.Equal(1320, tooth.NewtonsPerMillimetre, 5.0);
        Stiffness band = TipStiffness.AtPoint(A11, default), both = ToothCompliance.InSeries(band, tooth);
        Assert.InRange(both.NewtonsPerMetre / band.NewtonsPerMetre, 0.98, 0.99);
        Assert.Equal(0, ToothCompliance.InSeries(default, tooth).NewtonsPerMetre);
    }

    // Specification 5.2: 150 N, 0.05, A11 at its allowed thrust 7.5/27.3 = 0.27 mm, without thrust 7.5/38.0 = 0.20 mm.
    [Fact]
    public void The_worked_wander()
    {
        var allowed = new Force(203.514);
        double with = WanderEstimate.Mean(0.05, new Force(150), TipStiffness.OverCut(A11, allowed)).Millimetres;
        double without = WanderEstimate.Mean(0.05, new Force(150), TipStiffness.OverCut(A11, default)).Millimetres;
        Assert.Equal(0.27, with, 0.0051);
        Assert.Equal(0.20, without, 0.0051);
        Near(7.5 / 27.3039, with, 1e-5);
    }

    [Fact]
    public void A_learnt_share_gives_back_the_wander_it_was_learnt_from() =>
        Gen.Select(Gen.Double[-3e-3, 3e-3], Gen.Double[10, 500], Gen.Double[4e3, 9e4]).Sample((wander, force, k) =>
        {
            double psi = WanderEstimate.LearntShare(new Length(wander), new Force(force), new Stiffness(k));
            if (psi <= 1)
            {
                Assert.Equal(Math.Abs(wander), WanderEstimate.Mean(psi, new Force(force), new Stiffness(k)).Metres, 1e-12);
            }
        });

    [Fact]
    public void Dull_teeth_wander_more_and_a_buckled_band_without_limit()
    {
        Assert.True(WanderEstimate.DullShare > WanderEstimate.SharpShare);
        Assert.Equal(double.PositiveInfinity, WanderEstimate.Mean(0.03, new Force(100), default).Metres);
        Assert.Equal(0, WanderEstimate.Mean(0, new Force(100), default).Metres);
    }

    [Fact]
    public void Impossible_numbers_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => ThrustSoftening.Left(-0.1, 0.5));
        Assert.Throws<ArgumentOutOfRangeException>(() => ThrustSoftening.Left(0.1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => WanderEstimate.Mean(1.1, new Force(1), new Stiffness(1)));
        Assert.Throws<ArgumentOutOfRangeException>(() => WanderEstimate.Mean(0.1, new Force(-1), new Stiffness(1)));
        Assert.Throws<ArgumentOutOfRangeException>(() => WanderEstimate.LearntShare(new Length(1e-3), default, new Stiffness(1)));
        Assert.Throws<ArgumentOutOfRangeException>(() => WanderEstimate.LearntShare(new Length(1e-3), new Force(1), default));
        Assert.Throws<ArgumentOutOfRangeException>(() => ToothCompliance.OfTooth(default, new Length(1), new Length(1), Steel206));
        Assert.Throws<ArgumentOutOfRangeException>(() => ToothCompliance.InSeries(new Stiffness(1), default));
    }
}
