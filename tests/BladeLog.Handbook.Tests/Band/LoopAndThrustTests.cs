using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tests.Band;

public class LoopAndThrustTests
{
    private static Length Mm(double mm) => Length.FromMillimetres(mm);

    // Arithmetic of 3600 n v / L, worked apart from this program.
    [Theory]
    [InlineData(2, 15.2, 2.667, 41035)]
    [InlineData(2, 7.6, 2.667, 20517)]
    [InlineData(2, 23.5, 5.080, 33307)]
    [InlineData(2, 20.7, 5.690, 26193)]
    [InlineData(3, 12.0, 1.425, 90947)]
    [InlineData(2, 25.0, 4.013, 44854)]
    public void Bends_in_an_hour(int wheels, double v, double loop, double bends) =>
        Printed.Decimals(bends, LoopCycles.BendsPerHour(wheels, new Speed(v), new Length(loop)), 0);

    // Independent program, band-life specification, section 2.
    [Fact]
    public void A_million_bends_on_a_small_saw_is_a_day_of_running()
    {
        Printed.Significant(0.157333, 1 / LoopCycles.LoopsPerSecond(new Speed(15), new Length(2.36)));
        Printed.Significant(45762.7, LoopCycles.BendsPerHour(2, new Speed(15), new Length(2.36)));
        Printed.Significant(21.8519, 1e6 / LoopCycles.BendsPerHour(2, new Speed(15), new Length(2.36)));
        Printed.Significant(56347.8, LoopCycles.BendsPerHour(3, new Speed(12), new Length(2.30)));
    }

    [Fact]
    public void A_band_at_rest_is_not_bent() => Assert.Equal(0, LoopCycles.BendsPerHour(2, new Speed(0), new Length(2.36)));

    // Independent program, band-life specification, section 1.6.
    [Fact]
    public void A_push_of_40_newtons_on_a_narrow_band()
    {
        Force push = new(40);
        double point = FeedThrust.InPlaneStress(push, Mm(150), Mm(0.64), Mm(11.2)).Megapascals;
        double relief = FeedThrust.TensionRelief(Mm(150), Stress.FromMegapascals(100), Mm(11.2), Steel.Carbon.YoungsModulus);
        Printed.Significant(112.105, point);
        Printed.Significant(1382.25 / 1500, relief, 5);
        Printed.Significant(103.305, point * relief);
        Printed.Significant(93.4212, FeedThrust.InPlaneStressSpread(push, Mm(150), Mm(50), Mm(0.64), Mm(11.2)).Megapascals);
    }

    [Fact]
    public void A_push_spread_over_nothing_is_a_push_at_a_point()
    {
        double spread = FeedThrust.InPlaneStressSpread(new Force(40), Mm(150), Mm(1e-6), Mm(0.64), Mm(11.2)).Megapascals;
        Assert.Equal(FeedThrust.InPlaneStress(new Force(40), Mm(150), Mm(0.64), Mm(11.2)).Megapascals, spread, 1e-5);
    }

    [Fact]
    public void A_slack_band_gets_no_relief() =>
        Assert.Equal(1, FeedThrust.TensionRelief(Mm(150), new Stress(0), Mm(11.2), Steel.Carbon.YoungsModulus));

    [Fact]
    public void Wood_higher_than_the_span_is_refused() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => FeedThrust.InPlaneStressSpread(new Force(40), Mm(150), Mm(151), Mm(0.64), Mm(11.2)));
}
