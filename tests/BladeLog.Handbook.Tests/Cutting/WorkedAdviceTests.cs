using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Wear;
using static BladeLog.Handbook.Tests.Cutting.Saws;

namespace BladeLog.Handbook.Tests.Cutting;

/// <summary>Two whole cuts, every figure by the independent program (advice specification 9 and 10).</summary>
public sealed class WorkedAdviceTests
{
    private static CutCase Beam => new()
    {
        Thickness = Mm(0.9),
        Kerf = Mm(1.45),
        Pitch = Mm(12.7),
        GulletDepth = Mm(5.0),
        Form = ToothForm.Hook,
        Rake = Angle.FromDegrees(10),
        Tip = TipKind.Set,
        EdgeRadius = EdgeRadius.After(Length.FromMicrometres(8), 2.5, 1.2),
        BandSpeed = new Speed(20.7),
        CutHeight = Mm(300),
        Density12 = new Density(538),
        MoisturePercent = 18,
    };

    private static CutCase Puzzle => new()
    {
        Thickness = Mm(0.635),
        Kerf = Mm(1.05),
        Pitch = Mm(25.4 / 14),
        GulletDepth = Mm(0.7),
        Form = ToothForm.Regular,
        Rake = Angle.FromDegrees(0),
        Tip = TipKind.Set,
        EdgeRadius = EdgeRadius.After(Length.FromMicrometres(8), 2.5, 0.15),
        BandSpeed = new Speed(7.6),
        CutHeight = Mm(6),
        Density12 = new Density(706),
        MoisturePercent = 8,
    };

    [Fact]
    public void Resawing_a_beam_of_Douglas_fir()
    {
        CutCase c = Beam;
        Printed.Check("14.637", c.EdgeRadius.Micrometres);
        Printed.Check("23.622", Kinematics.TeethInCut(c.CutHeight, c.Pitch));
        Printed.Check("54.919", CuttingForce.ShearFactor(c).Pascals / 1e6);
        Printed.Check("32.499", CuttingForce.ReferenceThickness(c.Rake).Micrometres);
        Printed.Check("0.26795", CuttingForce.ThrustSlope(c));
        Printed.Check("36.286", Gullet.AreaOf(c).SquareMillimetres);
        Printed.Check("0.88848", Bite.RubbingFeed(c).MetresPerMinute);
        Printed.Check("0.17770", Bite.NoChipFeed(c).MetresPerMinute);
        Printed.Check("5.9143", Gullet.FeedAtFill(c, 0.50).MetresPerMinute);
        Printed.Check("8.8714", Gullet.FeedAtFill(c, 0.75).MetresPerMinute);
        Printed.Check("6.2945", CuttingForce.FeedAtPower(c, new Power(3740)).MetresPerMinute);
        Printed.Check("11.997", CuttingForce.FeedAtPower(c, new Power(4207.5 / 0.70)).MetresPerMinute);
        Printed.Check("63.671", CuttingForce.FeedAtThrust(c, new Force(400))!.Value.MetresPerMinute);
        Printed.Check("96.932", CuttingForce.FeedAtThrust(c, new Force(400 / 0.70))!.Value.MetresPerMinute);
        Printed.Check("9.7795", Kinematics.FeedForBite(Mm(0.10), c.Pitch, c.BandSpeed).MetresPerMinute);
        // The beam limit is printed to two decimals of a newton, which is two units of the last digit of the feed.
        Assert.Equal(47.848, CuttingForce.FeedAtThrust(c, new Force(318.45))!.Value.MetresPerMinute, 0.002);
        Assert.Equal(74.328, CuttingForce.FeedAtThrust(c, new Force(318.45 / 0.70))!.Value.MetresPerMinute, 0.002);
    }

    [Fact]
    public void Resawing_a_beam_of_Douglas_fir_at_the_working_feed()
    {
        CutCase c = Beam;
        Speed f = new(0.8 * Gullet.FeedAtFill(c, 0.50).MetresPerSecond);
        Length bite = Kinematics.BitePerTooth(f, c.Pitch, c.BandSpeed);
        Printed.Check("4.7314", f.MetresPerMinute);
        Printed.Check("48.381", bite.Micrometres);
        Printed.Check("0.40000", Gullet.Fill(bite, c.CutHeight, Gullet.AreaOf(c)));
        Printed.Check("150.61", CuttingForce.Main(c, f).Newtons);
        Printed.Check("96.227", CuttingForce.Thrust(c, f).Newtons);
        Printed.Check("3117.6", CuttingForce.CuttingPower(c, f).Watts);
        double x = EdgeRadius.EquivalentKm(Kinematics.WoodPathPerTooth(new Area(3.6), f, Mm(5690), c.BandSpeed), 1, 1);
        Printed.Check("0.16608", x);
        Printed.Check("15.155", EdgeRadius.After(Length.FromMicrometres(8), 2.5, 1.2 + x).Micrometres);
        Printed.Check("11.200", EdgeRadius.PathTo(Length.FromMicrometres(40), Length.FromMicrometres(8), 2.5));
    }

    [Fact]
    public void Puzzle_boxes_of_maple_on_the_smallest_blade()
    {
        CutCase c = Puzzle;
        Printed.Check("2.3933", CurveRadius.Hard(Mm(3), c.Kerf, c.Thickness).Millimetres);
        Printed.Check("3.4703", CurveRadius.Usual(Mm(3), c.Kerf, c.Thickness).Millimetres);
        Printed.Check("9.4117", c.EdgeRadius.Micrometres);
        Printed.Check("3.3071", Kinematics.TeethInCut(c.CutHeight, c.Pitch));
        Printed.Check("108.38", CuttingForce.ShearFactor(c).Pascals / 1e6);
        Printed.Check("26.616", CuttingForce.ReferenceThickness(c.Rake).Micrometres);
        Printed.Check("0.46631", CuttingForce.ThrustSlope(c));
        Printed.Check("0.63500", Gullet.AreaOf(c).SquareMillimetres);
        Printed.Check("1.4306", Bite.RubbingFeed(c).MetresPerMinute);
        Printed.Check("0.28612", Bite.NoChipFeed(c).MetresPerMinute);
        Printed.Check("10.640", Gullet.FeedAtFill(c, 0.40).MetresPerMinute);
        Printed.Check("19.950", Gullet.FeedAtFill(c, 0.75).MetresPerMinute);
        Printed.Check("61.682", CuttingForce.FeedAtPower(c, new Power(748)).MetresPerMinute);
        Printed.Check("101.59", CuttingForce.FeedAtPower(c, new Power(841.5 / 0.70)).MetresPerMinute);
        Printed.Check("88.055", CuttingForce.FeedAtThrust(c, new Force(70))!.Value.MetresPerMinute);
        Printed.Check("192.40", CuttingForce.FeedAtThrust(c, new Force(100 / 0.70))!.Value.MetresPerMinute);
        Printed.Check("0.17611", CuttingForce.FeedAtThrust(c, new Force(5.3642))!.Value.MetresPerMinute);
        Printed.Check("182.43", CuttingForce.FeedAtThrust(c, new Force(95.127 / 0.70))!.Value.MetresPerMinute);
        Printed.Check("7.5402", Kinematics.FeedForBite(Mm(0.03), c.Pitch, c.BandSpeed).MetresPerMinute);
    }

    [Fact]
    public void Puzzle_boxes_of_maple_at_the_working_feed()
    {
        CutCase c = Puzzle;
        Length bite = Kinematics.BitePerTooth(Feed(1.6), c.Pitch, c.BandSpeed);
        Printed.Check("6.3659", bite.Micrometres);
        Printed.Check("10.526", Bite.OverEdge(c, bite).Micrometres);
        Printed.Check("8.4537", CuttingForce.Main(c, Feed(1.6)).Newtons);
        Printed.Check("9.6322", CuttingForce.Thrust(c, Feed(1.6)).Newtons);
        Printed.Check("64.248", CuttingForce.CuttingPower(c, Feed(1.6)).Watts);
        double x = EdgeRadius.EquivalentKm(Kinematics.WoodPathPerTooth(new Area(0.096), Feed(1.6), Mm(2667), c.BandSpeed), 1.5, 1);
        Printed.Check("0.015388", x);
        Printed.Check("9.5400", EdgeRadius.After(Length.FromMicrometres(8), 2.5, 0.15 + x).Micrometres);
        // At twice the band speed the same cut rubs.
        Printed.Check("2.8612", Bite.RubbingFeed(c with { BandSpeed = new Speed(15.2) }).MetresPerMinute);
    }
}
