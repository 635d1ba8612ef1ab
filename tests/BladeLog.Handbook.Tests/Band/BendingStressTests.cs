using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;
using CsCheck;

namespace BladeLog.Handbook.Tests.Band;

public class BendingStressTests
{
    private static Length Mm(double mm) => Length.FromMillimetres(mm);

    // Independent program, band-life specification, section 1.1.
    [Theory]
    [InlineData(0.64, 356, 371.467)]
    [InlineData(1, 1000, 206.793)]
    [InlineData(1, 600, 344.426)]
    [InlineData(1, 500, 413.174)]
    public void Bending_over_a_wheel(double t, double wheel, double mpa) =>
        Printed.Significant(mpa, BendingStress.OverWheel(Mm(t), Mm(wheel), Steel.Carbon.YoungsModulus).Megapascals);

    [Fact]
    public void The_short_formula_is_high_by_thickness_over_wheel()
    {
        double exact = BendingStress.OverWheel(Mm(0.64), Mm(356), Steel.Carbon.YoungsModulus).Megapascals;
        double brief = 207000 * 0.64 / 356;
        Assert.Equal(1 + 0.64 / 356, brief / exact, 12);
    }

    // Independent program, band-life specification, section 1.2.
    [Theory]
    [InlineData(11.2, 356, 0.64, 1.10112, 1.00177)]
    [InlineData(27, 483, 1.07, 2.82115, 1.01018)]
    [InlineData(100, 1100, 1.0, 18.1818, 1.06280)]
    [InlineData(250, 1500, 1.47, 56.6893, 1.07846)]
    public void A_wide_band_is_stiffer_than_a_beam(double b, double wheel, double t, double searle, double phi)
    {
        Printed.Significant(searle, BendingStress.SearleNumber(Mm(b), Mm(t), Mm(wheel)));
        Printed.Significant(phi, BendingStress.PlaneStrainFactor(Mm(b), Mm(t), Mm(wheel), 0.3));
    }

    [Fact]
    public void The_stiffening_runs_from_beam_to_plate_without_a_step()
    {
        double Phi(double width) => BendingStress.PlaneStrainFactor(Mm(width), Mm(1), Mm(1000), 0.3);
        Assert.Equal(1, Phi(0.001), 9);
        Assert.InRange(Phi(1e6), 1.0988, 1 / (1 - 0.09));
        // x = 40 and x = 0.001, where the body of the formula is left for its limits.
        double perMm = Math.Pow(3 * 0.91, 0.25) / Math.Sqrt(500);
        Assert.Equal(Phi(39.9999999 / perMm), Phi(40.0000001 / perMm), 9);
        Assert.Equal(Phi(0.000999999 / perMm), Phi(0.001000001 / perMm), 9);
    }

    [Fact]
    public void A_wider_band_is_never_softer() =>
        Gen.Select(Gen.Double[1, 300], Gen.Double[1, 300]).Sample((a, b) =>
            BendingStress.PlaneStrainFactor(Mm(Math.Min(a, b)), Mm(1), Mm(900), 0.3)
            <= BendingStress.PlaneStrainFactor(Mm(Math.Max(a, b)), Mm(1), Mm(900), 0.3) + 1e-9);

    [Theory]
    [InlineData(0, 356)]
    [InlineData(-0.9, 356)]
    [InlineData(0.9, 0)]
    [InlineData(double.NaN, 356)]
    [InlineData(0.9, double.PositiveInfinity)]
    public void An_impossible_band_or_wheel_is_refused(double t, double wheel) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => BendingStress.OverWheel(Mm(t), Mm(wheel), Steel.Carbon.YoungsModulus));
}
