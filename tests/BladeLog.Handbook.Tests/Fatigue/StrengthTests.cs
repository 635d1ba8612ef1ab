using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tests.Band;
using CsCheck;

namespace BladeLog.Handbook.Tests.Fatigue;

public class StrengthTests
{
    private static Length Mm(double mm) => Length.FromMillimetres(mm);

    private static Stress Mpa(double mpa) => Stress.FromMegapascals(mpa);

    // ASTM E140 (HB, HV) and the tensile column of ASTM A370 / SAE J417, as printed.
    [Theory]
    [InlineData(20, 226, 238, 110)]
    [InlineData(30, 286, 302, 138)]
    [InlineData(40, 371, 392, 182)]
    [InlineData(46, 432, 458, 221)]
    [InlineData(50, 481, 513, 255)]
    [InlineData(58, 615, 653, 338)]
    public void Hardness_rows_as_the_table_prints_them(double hrc, double hb, double hv, double ksi)
    {
        Assert.Equal(hb, Hardness.Brinell(hrc), 9);
        Assert.Equal(hv, Hardness.Vickers(hrc), 9);
        Printed.Significant(ksi * 6.89476, Hardness.TableTensileStrength(hrc).Megapascals);
    }

    [Fact]
    public void Between_rows_hardness_runs_straight() => Assert.Equal((226 + 247) / 2.0, Hardness.Brinell(22), 9);

    [Theory]
    [InlineData(19.9)]
    [InlineData(58.1)]
    [InlineData(double.NaN)]
    public void A_hardness_the_table_does_not_hold_is_refused(double hrc) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Hardness.Brinell(hrc));

    [Fact]
    public void Strength_from_Brinell_agrees_with_the_table_within_7_of_100_up_to_54()
    {
        static double Ratio(double hrc) => Hardness.TensileStrength(Hardness.Brinell(hrc)).Pascals / Hardness.TableTensileStrength(hrc).Pascals;
        Gen.Double[20, 54].Sample(hrc => Math.Abs(Ratio(hrc) - 1) < 0.07);
        // 3.45 x 615 HB against 338 ksi.
        Assert.Equal(2121.75 / (338 * 6.89476), Ratio(58), 6);
    }

    // Independent program, band-life specification, section 3.3.
    [Theory]
    [InlineData(30, 986.700, 0.684460, 249.493, 262.104, 232.046, 153.619)]
    [InlineData(46, 1490.40, 0.583720, 274.143, 230.125, 215.843, 144.585)]
    public void Mean_stress_rules_on_the_outer_and_inner_face(double hrc, double su, double gamma, double walker, double goodman, double morrow, double inner)
    {
        double hb = Hardness.Brinell(hrc);
        Stress Su = Hardness.TensileStrength(hb);
        double g = MeanStress.WalkerExponent(Su);
        Stress sa = Mpa(185.734);
        Stress sm = Mpa(287.500);
        Printed.Significant(su, Su.Megapascals);
        Printed.Significant(gamma, g);
        // The amplitude itself is printed to six digits only, so five of the answer count.
        Printed.Significant(walker, MeanStress.Walker(Mpa(473.233), sa, g).Megapascals, 5);
        Printed.Significant(296.471, MeanStress.SmithWatsonTopper(Mpa(473.233), sa).Megapascals, 5);
        Printed.Significant(goodman, MeanStress.Goodman(sa, sm, Su).Megapascals, 5);
        Printed.Significant(morrow, MeanStress.Morrow(sa, sm, Basquin.RoessleFatemi(hb).Coefficient).Megapascals, 5);
        Printed.Significant(inner, MeanStress.Walker(Mpa(101.766), sa, g).Megapascals, 5);
    }

    [Fact]
    public void Walker_at_one_half_is_Smith_Watson_Topper() =>
        Gen.Select(Gen.Double[1, 2000], Gen.Double[1, 1000]).Sample((smax, sa) => Assert.Equal(
            MeanStress.SmithWatsonTopper(Mpa(smax), Mpa(sa)).Megapascals, MeanStress.Walker(Mpa(smax), Mpa(sa), 0.5).Megapascals, 1e-6));

    [Fact]
    public void A_fully_reversed_cycle_is_its_own_equivalent() =>
        Gen.Select(Gen.Double[1, 1000], Gen.Double[0.35, 1]).Sample((sa, g) =>
        {
            Assert.Equal(sa, MeanStress.Walker(Mpa(sa), Mpa(sa), g).Megapascals, 1e-6);
            Assert.Equal(sa, MeanStress.Goodman(Mpa(sa), Mpa(0), Mpa(1490)).Megapascals, 1e-6);
            Assert.Equal(sa, MeanStress.Morrow(Mpa(sa), Mpa(0), Mpa(2061)).Megapascals, 1e-6);
        });

    [Fact]
    public void A_cycle_that_never_pulls_does_no_harm() =>
        Assert.Equal(0, MeanStress.Walker(Mpa(-10), Mpa(100), 0.6).Pascals);

    // Independent program, band-life specification, section 4.2.
    [Theory]
    [InlineData(30, 390.320, 418.877, 401.036, 317.264)]
    [InlineData(46, 558.451, 632.710, 605.761, 453.926)]
    public void Three_estimates_of_the_line(double hrc, double rf, double uml, double medians, double rfAtTenMillion)
    {
        double hb = Hardness.Brinell(hrc);
        Stress Su = Hardness.TensileStrength(hb);
        Printed.Significant(rf, Basquin.RoessleFatemi(hb).AmplitudeAt(1e6).Megapascals);
        Printed.Significant(uml, Basquin.BaumelSeeger(Su).AmplitudeAt(1e6).Megapascals);
        Printed.Significant(medians, Basquin.MeggiolaroCastro(Su).AmplitudeAt(1e6).Megapascals);
        Printed.Significant(rfAtTenMillion, Basquin.RoessleFatemi(hb).AmplitudeAt(1e7).Megapascals);
    }

    // Published for a steel of 500 MPa: Metals 15 (2025) 780, table of estimators (866.75 with HB 151, 750, 750).
    [Fact]
    public void The_estimates_for_a_steel_of_500_MPa()
    {
        Assert.Equal(866.75, Basquin.RoessleFatemi(151).Coefficient.Megapascals, 9);
        Assert.Equal(750, Basquin.BaumelSeeger(Mpa(500)).Coefficient.Megapascals, 9);
        Assert.Equal(-0.087, Basquin.BaumelSeeger(Mpa(500)).Exponent);
        Assert.Equal(750, Basquin.MeggiolaroCastro(Mpa(500)).Coefficient.Megapascals, 9);
    }

    // Independent program, band-life specification, section 4.3.
    [Theory]
    [InlineData(30, 0.879329, -0.0976494, 10.2407, 278.979, 349.318)]
    [InlineData(46, 0.849036, -0.0997347, 10.0266, 385.400, 484.894)]
    public void A_ground_surface_takes_its_full_toll_at_the_knee(double hrc, double cs, double b, double k, double atKnee, double atMillion)
    {
        double hb = Hardness.Brinell(hrc);
        double Cs = Surface.Factor(GulletFinish.Ground, Hardness.TensileStrength(hb));
        SnLine smooth = Basquin.RoessleFatemi(hb);
        SnCurve curve = new(smooth.WithSurface(Cs, 1e7), 1e7);
        Printed.Significant(cs, Cs);
        Printed.Significant(b, curve.Line.Exponent);
        Printed.Significant(k, curve.Slope);
        Printed.Significant(atKnee, curve.KneeAmplitude.Megapascals);
        Printed.Significant(atMillion, curve.Line.AmplitudeAt(1e6).Megapascals);
        Assert.Equal(Cs, curve.KneeAmplitude.Pascals / smooth.AmplitudeAt(1e7).Pascals, 9);
    }

    [Fact]
    public void A_punched_gullet_is_weaker_than_a_ground_one_and_rust_takes_three_tenths()
    {
        Stress Su = Mpa(1490.4);
        double ground = Surface.Factor(GulletFinish.Ground, Su);
        // 4.51 x 1490.4^-0.265.
        Printed.Significant(0.650506, Surface.Factor(GulletFinish.Punched, Su));
        Assert.True(Surface.Factor(GulletFinish.Punched, Su) < ground);
        Assert.Equal(0.7, Surface.Factor(GulletFinish.Ground, Su, rusty: true) / ground, 9);
        Assert.Equal(1, Surface.Factor(GulletFinish.Ground, Mpa(100)));
    }

    [Fact]
    public void Life_has_no_step_at_the_knee_and_no_end_beyond_it()
    {
        SnCurve curve = new(Basquin.RoessleFatemi(432), 1e7);
        double sK = curve.KneeAmplitude.Pascals;
        Assert.Equal(1e7, curve.Cycles(new Stress(sK * (1 + 1e-12))), 1e-2);
        Assert.Equal(1e7, curve.Cycles(new Stress(sK * (1 - 1e-12))), 1e-2);
        Assert.True(curve.Cycles(new Stress(sK * 0.8)) is > 1e7 and < double.PositiveInfinity);
        Assert.Equal(double.PositiveInfinity, curve.Cycles(new Stress(0)));
    }

    // Own finite-element series of the band-life specification, section 4.4; the fit is stated to 5 of 100.
    [Theory]
    [InlineData(4.2, 0.4, 3.07)]
    [InlineData(4.2, 0.8, 2.32)]
    [InlineData(4.2, 1.2, 1.99)]
    [InlineData(8.5, 0.5, 3.73)]
    [InlineData(8.5, 1.0, 2.77)]
    [InlineData(8.5, 1.5, 2.36)]
    [InlineData(8.5, 2.2, 2.05)]
    [InlineData(22, 1.5, 3.36)]
    [InlineData(22, 3, 2.54)]
    [InlineData(22, 4.5, 2.17)]
    [InlineData(35, 2.5, 3.48)]
    [InlineData(35, 5, 2.60)]
    [InlineData(35, 8, 2.17)]
    [InlineData(50, 4, 3.36)]
    [InlineData(50, 8, 2.51)]
    [InlineData(50, 12, 2.15)]
    public void The_row_of_gullets_as_computed_with_finite_elements(double pitch, double radius, double kt) =>
        Assert.InRange(GulletNotch.ElasticFactor(Mm(pitch), Mm(radius)) / kt, 0.95, 1.05);

    // Independent program, band-life specification, section 4.4 (Peterson, from memory).
    [Theory]
    [InlineData(987, 0.892518)]
    [InlineData(1490, 0.945734)]
    public void A_hard_steel_feels_more_of_the_notch(double su, double q) =>
        Printed.Significant(q, GulletNotch.Sensitivity(Mm(0.8), Mpa(su)));

    // Engineering default: the measured usual gullet, pitch over radius about 5.3, lands on 2.0 and 1.4.
    [Fact]
    public void The_usual_gullet_gives_the_default_factors()
    {
        Assert.InRange(GulletNotch.TensionFactor(Mm(4.2), Mm(0.8), Mpa(1490.4)), 1.9, 2.1);
        Assert.InRange(GulletNotch.BendingFactor(Mm(4.2), Mm(0.8), Mpa(1490.4)), 1.35, 1.45);
        Assert.InRange(GulletNotch.ElasticBendingFactor(2.32), 1.75, 1.95);
    }

    [Fact]
    public void A_gullet_outside_the_series_is_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => GulletNotch.ElasticFactor(Mm(4.2), Mm(0.2)));
        Assert.Throws<ArgumentOutOfRangeException>(() => GulletNotch.ElasticFactor(Mm(4.2), Mm(1.3)));
    }
}
