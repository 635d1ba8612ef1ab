using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using CsCheck;
using static BladeLog.Handbook.Tests.Cutting.Saws;

namespace BladeLog.Handbook.Tests.Cutting;

public sealed class KinematicsTests
{
    // Figures: independent program, cutting specification, examples A and B.
    [Fact]
    public void The_shop_resaw_takes_the_bites_and_paths_of_the_worked_example()
    {
        var (v, f, p, L) = (new Speed(16), Feed(2), Mm(8.5), Mm(3400));
        Printed.Check("17.7083", Kinematics.BitePerTooth(f, p, v).Micrometres);
        Printed.Check("17.6471", Kinematics.TeethInCut(Mm(150), p));
        Assert.Equal(400, Kinematics.TeethOnBand(L, p));
        Printed.Check("169.412", Kinematics.LoopsInCut(Mm(1200), f, L, v));
        Printed.Check("25.4118", Kinematics.WoodPathPerTooth(new Area(0.18), f, L, v).Metres);
        Printed.Check("35.4167", Kerf.OuterLaneBite(Kinematics.BitePerTooth(f, p, v), SetPattern.Alternate).Micrometres);
        Printed.Check("141.176", Kinematics.WoodPathPerTooth(new Area(1), f, L, v).Metres);
    }

    [Fact]
    public void The_narrow_mill_takes_the_bites_and_paths_of_the_worked_example()
    {
        var (v, f, p, L) = (new Speed(25), Feed(20), Mm(22), Mm(3960));
        Printed.Check("0.293333", Kinematics.BitePerTooth(f, p, v).Millimetres);
        Printed.Check("13.6364", Kinematics.TeethInCut(Mm(300), p));
        Assert.Equal(180, Kinematics.TeethOnBand(L, p));
        Printed.Check("17.0455", Kinematics.WoodPathPerTooth(new Area(0.9), f, L, v).Metres);
        Printed.Check("18.9394", Kinematics.WoodPathPerTooth(new Area(1), f, L, v).Metres);
    }

    [Fact]
    public void Every_tooth_together_removes_just_the_sawn_area() // Z S c = A: the volume each tooth takes, summed
    {
        Gen.Select(Gen.Double[1, 60], Gen.Double[0.1, 60], Gen.Double[1, 40], Gen.Double[1, 12], Gen.Double[0.01, 5]).Sample((v, f, p, L, A) =>
        {
            double S = Kinematics.WoodPathPerTooth(new Area(A), Feed(f), new Length(L), new Speed(v)).Metres;
            double c = Kinematics.BitePerTooth(Feed(f), Mm(p), new Speed(v)).Metres;
            Assert.Equal(A, S * c * (L / (p / 1000)), 1e-9 * A);
        });
    }

    [Fact]
    public void A_tooth_followed_through_every_loop_travels_the_wood_path()
    {
        // One tooth followed in steps through 36 s of cutting, averaged over 40 starting places: it is in the wood for H of every L of band.
        const double v = 16, L = 3.4, H = 0.15, T = 36, dt = 1e-4;
        double sum = 0;
        for (int start = 0; start < 40; start++)
        {
            double at = L * start / 40;
            int inside = 0;
            for (double time = 0; time < T; time += dt)
            {
                inside += (at + v * time) % L < H ? 1 : 0;
            }

            sum += inside * dt * v;
        }

        Assert.Equal(sum / 40, Kinematics.WoodPathPerTooth(new Area(0.18), Feed(2), Mm(3400), new Speed(16)).Metres, 0.02);
    }

    [Fact]
    public void Feed_and_bite_are_each_others_inverse()
    {
        Gen.Select(Gen.Double[1, 60], Gen.Double[0, 60], Gen.Double[1, 40]).Sample((v, f, p) =>
        {
            Length c = Kinematics.BitePerTooth(Feed(f), Mm(p), new Speed(v));
            Assert.Equal(f, Kinematics.FeedForBite(c, Mm(p), new Speed(v)).MetresPerMinute, 1e-9);
        });
    }

    [Fact]
    public void The_area_a_path_stands_for_is_the_area_that_made_it()
    {
        Length S = Kinematics.WoodPathPerTooth(new Area(0.9), Feed(20), Mm(3960), new Speed(25));
        Assert.Equal(0.9, Kinematics.SawnAreaForPath(S, Feed(20), Mm(3960), new Speed(25)).SquareMetres, 1e-12);
    }

    [Fact]
    public void Eleven_point_two_km_are_the_square_metres_and_hours_of_the_worked_example()
    {
        // Independent program, cutting specification 6.2.
        double shop = Kinematics.SawnAreaForPath(new Length(11200), Feed(2), Mm(3400), new Speed(16)).SquareMetres;
        Printed.Check("79.3333", shop);
        Printed.Check("4.40741", shop / 0.15 / 2 / 60);
        double mill = Kinematics.SawnAreaForPath(new Length(11200), Feed(20), Mm(3960), new Speed(25)).SquareMetres;
        Printed.Check("591.36", mill);
        Printed.Check("1.64267", mill / 0.3 / 20 / 60);
    }

    [Fact]
    public void A_band_that_stands_still_is_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Kinematics.BitePerTooth(Feed(2), Mm(8), new Speed(0)));
        Assert.Throws<ArgumentOutOfRangeException>(() => Kinematics.BitePerTooth(Feed(double.NaN), Mm(8), new Speed(16)));
        Assert.Throws<ArgumentOutOfRangeException>(() => Kinematics.WoodPathPerTooth(new Area(1), Feed(0), Mm(3400), new Speed(16)));
    }
}
