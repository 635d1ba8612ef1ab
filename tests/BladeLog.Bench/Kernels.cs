using BenchmarkDotNet.Attributes;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Bench;

/// <summary>
/// The formulas asked most often, each with figures of the trade. One answer on a cut asks about 600 blade-and-cut pairs,
/// so a pair may take some 20 µs without the plate step.
/// </summary>
[MemoryDiagnoser]
public class Kernels
{
    private CutCase _cut = null!;
    private GuidedBand _narrow = null!;
    private GuidedBand _wide = null!;
    private BandCase _band = null!;

    [GlobalSetup]
    public void Setup()
    {
        _cut = new CutCase
        {
            Thickness = Length.FromMillimetres(0.9),
            Kerf = Length.FromMillimetres(1.45),
            Pitch = Length.FromMillimetres(12.7),
            GulletDepth = Length.FromMillimetres(5),
            Form = ToothForm.Hook,
            Rake = Angle.FromDegrees(10),
            Tip = TipKind.Set,
            EdgeRadius = Length.FromMicrometres(14.6),
            BandSpeed = new Speed(20.7),
            CutHeight = Length.FromMillimetres(300),
            Density12 = new Density(538),
            MoisturePercent = 18,
        };
        _narrow = Band(35.4, 0.9, 5, 135, 370, 300);
        _wide = Band(100, 1.1, 10, 120, 600, 400);
        _band = new BandCase
        {
            Thickness = Length.FromMillimetres(0.64),
            Wheels = [Length.FromMillimetres(356), Length.FromMillimetres(356)],
            BandSpeed = new Speed(15),
            Loop = Length.FromMillimetres(2360),
            Tension = Stress.FromMegapascals(100),
            BodyHrc = 46,
        };
    }

    /// <summary>All a pair of blade and cut asks of the handbook: thrust limits, six feeds, forces at the feed advised, the curve.</summary>
    [Benchmark(Baseline = true)]
    public double BladeTimesCut()
    {
        ThrustLimits thrust = ThrustLimit.Of(_narrow, PlateUse.WideBandsOnly);
        double chip = Gullet.FeedAtFill(_cut, 0.5).MetresPerSecond;
        double power = CuttingForce.FeedAtPower(_cut, new Power(3740)).MetresPerSecond;
        double feeder = CuttingForce.FeedAtThrust(_cut, new Force(400))?.MetresPerSecond ?? double.PositiveInfinity;
        double beam = CuttingForce.FeedAtThrust(_cut, thrust.Allowed)?.MetresPerSecond ?? double.PositiveInfinity;
        double high = Math.Min(Math.Min(chip, power), Math.Min(feeder, beam)), low = Bite.RubbingFeed(_cut).MetresPerSecond;
        Speed feed = new(Math.Max(low, 0.8 * high));
        Length bite = Kinematics.BitePerTooth(feed, _cut.Pitch, _cut.BandSpeed);
        return Bite.NoChipFeed(_cut).MetresPerSecond
            + CuttingForce.Main(_cut, feed).Newtons
            + CuttingForce.Thrust(_cut, feed).Newtons
            + Gullet.Fill(bite, _cut.CutHeight, Gullet.AreaOf(_cut))
            + CurveRadius.Usual(_narrow.Width, _cut.Kerf, _cut.Thickness).Metres;
    }

    [Benchmark]
    public double FrontEdgeSlack() => FrontEdge.SlackThrust(_narrow).Newtons;

    [Benchmark]
    public double BeamBuckling() => LateralBuckling.CriticalThrust(_narrow, 12).Newtons;

    [Benchmark]
    public double BeamAndPlateBuckling() => ThrustLimit.Of(_wide, PlateUse.Always).Buckling.Newtons;

    [Benchmark]
    public double BandLifeOfABlade() => BandLife.Of(_band).MedianHours;

    private static GuidedBand Band(double width, double thickness, double gullet, double tension, double span, double height) => new()
    {
        Width = Length.FromMillimetres(width),
        Thickness = Length.FromMillimetres(thickness),
        GulletDepth = Length.FromMillimetres(gullet),
        Tension = Stress.FromMegapascals(tension),
        GuideSpan = Length.FromMillimetres(span),
        CutHeight = Length.FromMillimetres(height),
        CutCentre = Length.FromMillimetres(60 + (height / 2)),
    };
}
