using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using CsCheck;
using static BladeLog.Handbook.Tests.Cutting.Saws;

namespace BladeLog.Handbook.Tests.Cutting;

public sealed class GulletTests
{
    [Fact]
    public void Chip_room_of_the_two_worked_examples() // independent program, cutting specification 2.2
    {
        CutCase a = A();
        Printed.Check("16.5143", Gullet.AreaOf(a).SquareMillimetres);
        Printed.Check("0.160846", Gullet.Fill(Kinematics.BitePerTooth(Feed(2), a.Pitch, a.BandSpeed), a.CutHeight, Gullet.AreaOf(a)));
        Printed.Check("6.21714", Gullet.FeedAtFill(a, 0.5).MetresPerMinute);

        CutCase b = MillB(15);
        Printed.Check("80.4571", Gullet.AreaOf(b).SquareMillimetres);
        Printed.Check("1.09375", Gullet.Fill(Kinematics.BitePerTooth(Feed(20), b.Pitch, b.BandSpeed), b.CutHeight, Gullet.AreaOf(b)));
        Printed.Check("10.9714", Gullet.FeedAtFill(b, 0.6).MetresPerMinute);
    }

    [Fact]
    public void A_triangle_tooth_leaves_half_and_a_skip_tooth_three_quarters() // plane geometry
    {
        Assert.Equal(0.5 * 8 * 3, Gullet.AreaOf(ToothForm.Regular, Mm(8), Mm(3)).SquareMillimetres, 1e-9);
        // Pitch times depth less a triangle on half the pitch.
        Assert.Equal(8 * 3 - 0.5 * 4 * 3, Gullet.AreaOf(ToothForm.Skip, Mm(8), Mm(3)).SquareMillimetres, 1e-9);
        // Trade note on gullet capacity: pitch times depth over 1.75.
        Assert.Equal(8 * 3 / 1.75, Gullet.AreaOf(ToothForm.Hook, Mm(8), Mm(3)).SquareMillimetres, 1e-9);
    }

    [Fact]
    public void A_measured_gullet_takes_the_place_of_the_formula()
    {
        CutCase c = A() with { MeasuredGulletArea = new Area(20e-6) };
        Assert.Equal(20, Gullet.AreaOf(c).SquareMillimetres, 1e-9);
    }

    [Fact]
    public void Default_depth_is_a_fifth_of_the_width_or_the_share_of_the_pitch() // workshop rule d = w/5 (Spons); shares are engineering defaults
    {
        Assert.Equal(5.08, Gullet.DefaultDepth(ToothForm.Hook, Mm(25.4 / 2), Mm(38)).Millimetres, 1e-9);
        Assert.Equal(2.6, Gullet.DefaultDepth(ToothForm.Regular, Mm(8), Mm(13)).Millimetres, 1e-9);
        Assert.Equal(1.5875, Gullet.DefaultDepth(ToothForm.Skip, Mm(6.35), Mm(13)).Millimetres, 1e-9);
    }

    [Fact]
    public void Half_the_teeth_at_the_same_depth_have_the_same_room_and_need_less_power()
    {
        Cases.Random.Sample(c =>
        {
            CutCase coarse = c with { Pitch = new Length(2 * c.Pitch.Metres) };
            Assert.Equal(1, Gullet.FeedAtFill(coarse, 0.5).MetresPerSecond / Gullet.FeedAtFill(c, 0.5).MetresPerSecond, 1e-12);
            Assert.True(CuttingForce.CuttingPower(coarse, Feed(3)).Watts <= CuttingForce.CuttingPower(c, Feed(3)).Watts * (1 + 1e-12));
        });
    }

    [Fact]
    public void Half_the_teeth_with_the_gullet_deepened_in_proportion_have_twice_the_room()
    {
        Cases.Random.Sample(c =>
        {
            CutCase coarse = c with { Pitch = new Length(2 * c.Pitch.Metres), GulletDepth = new Length(2 * c.GulletDepth.Metres) };
            Assert.Equal(2, Gullet.FeedAtFill(coarse, 0.5).MetresPerSecond / Gullet.FeedAtFill(c, 0.5).MetresPerSecond, 1e-12);
        });
    }

    [Fact]
    public void The_feed_at_a_fill_fills_the_gullet_just_so()
    {
        Gen.Select(Cases.Random, Gen.Double[0.05, 1]).Sample((c, phi) =>
        {
            Length bite = Kinematics.BitePerTooth(Gullet.FeedAtFill(c, phi), c.Pitch, c.BandSpeed);
            Assert.Equal(phi, Gullet.Fill(bite, c.CutHeight, Gullet.AreaOf(c)), 1e-12);
        });
    }
}
