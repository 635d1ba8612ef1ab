using System.Globalization;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using CsCheck;
using static BladeLog.Handbook.Tests.Cutting.Saws;

namespace BladeLog.Handbook.Tests.Cutting;

public sealed class CurveRadiusTests
{
    [Fact]
    public void Half_an_inch_wide_in_an_ordinary_kerf() // independent program, cutting specification 7
    {
        Printed.Check("43.0400", CurveRadius.Hard(Mm(12.7), Mm(1.1), Mm(0.635)).Millimetres);
        Printed.Check("62.41", CurveRadius.Usual(Mm(12.7), Mm(1.1), Mm(0.635)).Millimetres);
        Printed.Check("346.426", CurveRadius.RigidlyGuided(Mm(12.7), Mm(1.1), Mm(0.635)).Millimetres);
        Printed.Check("5.739", CurveRadius.Yaw(Mm(12.7), Mm(63.5)).Degrees);
    }

    [Fact]
    public void A_blade_at_the_hard_bound_just_touches_both_walls() // the inner side at mid-width and the outer corners, in plane geometry
    {
        Gen.Select(Gen.Double[3, 40], Gen.Double[0.4, 1.2], Gen.Double[0.15, 1]).Sample((w, t, share) =>
        {
            double k = t * (1 + share);
            double R = CurveRadius.Hard(Mm(w), Mm(k), Mm(t)).Millimetres;
            double corner = Math.Sqrt(Math.Pow(R - k / 2 + t, 2) + w * w / 4);
            Assert.Equal(R + k / 2, corner, 1e-9 * (R + k));
        });
    }

    [Theory] // tables of a how-to article and machine manuals (radius-tables), inches turned into mm; thickness and kerf are the usual ones of such blades
    [InlineData(3.175, 0.5, 0.9, 4.7625, 4.7625)]
    [InlineData(4.7625, 0.635, 1.1, 7.9375, 9.525)]
    [InlineData(6.35, 0.635, 1.1, 15.875, 15.875)]
    [InlineData(9.525, 0.635, 1.1, 34.925, 38.1)]
    [InlineData(12.7, 0.635, 1.1, 63.5, 63.5)]
    [InlineData(15.875, 0.635, 1.1, 95.25, 101.6)]
    [InlineData(19.05, 0.8, 1.35, 139.7, 139.7)]
    [InlineData(25.4, 0.9, 1.5, 177.8, 193.675)]
    public void Published_radii_come_out_within_fifteen_percent(double w, double t, double k, double low, double high)
    {
        double R = CurveRadius.Usual(Mm(w), Mm(k), Mm(t)).Millimetres;
        Assert.InRange(R, 0.85 * low, 1.15 * high);
        // The hard bound stays under every published radius, and the table over it is the range the factor is taken from.
        Assert.InRange(low / CurveRadius.Hard(Mm(w), Mm(k), Mm(t)).Millimetres, 1.30, 1.71);
    }

    [Theory] // same tables; the fitted figures by the independent program
    [InlineData(3.175, 4.7625, "4.69775")]
    [InlineData(4.7625, 7.9375, "9.76707")]
    [InlineData(6.35, 15.875, "16.4172")]
    [InlineData(9.525, 36.5, "34.1329")]
    [InlineData(12.7, 63.5, "57.3732")]
    [InlineData(15.875, 101.6, "85.8317")]
    [InlineData(19.05, 139.7, "119.284")]
    [InlineData(25.4, 185.7, "200.502")]
    [InlineData(31.75, 250.8, "299.956")]
    public void Width_alone_gives_the_published_radius_within_a_quarter(double w, double published, string fit)
    {
        double R = CurveRadius.PowerFit(Mm(w)).Millimetres;
        // The two constants of the fit are printed to six digits, which is 2 in 100,000 at the widest blade.
        Assert.Equal(double.Parse(fit, CultureInfo.InvariantCulture), R, 2e-5 * R);
        Assert.InRange(R / published, 0.75, 1.25);
    }

    [Fact]
    public void The_widest_blade_for_a_curve_just_takes_it()
    {
        Gen.Select(Gen.Double[3, 500], Gen.Double[0.4, 1.2], Gen.Double[0.15, 1], Gen.Double[1.3, 1.65]).Sample((R, t, share, a) =>
        {
            double k = t * (1 + share);
            Length w = CurveRadius.WidestBlade(Mm(R), Mm(k), Mm(t), a);
            Assert.Equal(R, CurveRadius.Usual(w, Mm(k), Mm(t), a).Millimetres, 1e-9 * R);
        });
    }

    [Fact]
    public void As_set_wears_off_curves_get_wider() =>
        Assert.True(CurveRadius.Usual(Mm(13), Mm(0.95), Mm(0.65)).Metres > CurveRadius.Usual(Mm(13), Mm(1.15), Mm(0.65)).Metres);

    [Fact]
    public void A_blade_without_side_play_is_refused() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => CurveRadius.Hard(Mm(13), Mm(0.65), Mm(0.65)));
}
