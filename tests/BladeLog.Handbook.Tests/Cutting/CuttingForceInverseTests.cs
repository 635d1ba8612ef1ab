using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using CsCheck;
using static BladeLog.Handbook.Tests.Cutting.Saws;

namespace BladeLog.Handbook.Tests.Cutting;

public sealed class CuttingForceInverseTests
{
    // Feeds from deep in the no-chip range to a hundred times the rubbing feed.
    private static readonly Gen<(CutCase Cut, Speed Feed)> CutAndFeed =
        Gen.Select(Cases.Random, Gen.Double[-3, 2]).Select((c, e) => (c, new Speed(Math.Pow(10, e) * Bite.RubbingFeed(c).MetresPerSecond)));

    [Fact]
    public void The_feed_at_the_power_of_a_feed_is_that_feed() => CutAndFeed.Sample(x =>
    {
        double back = CuttingForce.FeedAtPower(x.Cut, CuttingForce.CuttingPower(x.Cut, x.Feed)).MetresPerSecond;
        Assert.Equal(1, back / x.Feed.MetresPerSecond, 1e-8);
    });

    [Fact]
    public void The_feed_at_the_thrust_of_a_feed_is_that_feed() => CutAndFeed.Sample(x =>
    {
        Speed? back = CuttingForce.FeedAtThrust(x.Cut, CuttingForce.Thrust(x.Cut, x.Feed));
        Assert.NotNull(back);
        // At 23 degrees the chip pushes back by only 3 % of its force: the inverse loses as many digits.
        Assert.Equal(1, back.Value.MetresPerSecond / x.Feed.MetresPerSecond, 1e-6);
    });

    [Fact]
    public void The_edge_radius_at_the_power_of_an_edge_is_that_edge() => CutAndFeed
        .Where(x => x.Cut.EdgeRadius.Micrometres > 10.1 && Bite.RegimeOf(x.Cut, x.Feed) != BiteRegime.NoChip)
        .Sample(x =>
        {
            Length? r = CuttingForce.EdgeRadiusAtPower(x.Cut, x.Feed, CuttingForce.CuttingPower(x.Cut, x.Feed));
            Assert.NotNull(r);
            Assert.Equal(x.Cut.EdgeRadius.Micrometres, r.Value.Micrometres, 1e-4);
        });

    [Fact]
    public void The_edge_radius_at_the_thrust_of_an_edge_is_that_edge() => CutAndFeed
        .Where(x => x.Cut.EdgeRadius.Micrometres > 10.1 && Bite.RegimeOf(x.Cut, x.Feed) != BiteRegime.NoChip)
        .Sample(x =>
        {
            Length? r = CuttingForce.EdgeRadiusAtThrust(x.Cut, x.Feed, CuttingForce.Thrust(x.Cut, x.Feed));
            Assert.NotNull(r);
            Assert.Equal(x.Cut.EdgeRadius.Micrometres, r.Value.Micrometres, 1e-4);
        });

    [Fact]
    public void Whatever_radius_is_given_just_meets_the_limit() => Gen.Select(CutAndFeed, Gen.Double[5, 3000]).Sample((x, watts) =>
    {
        if (CuttingForce.EdgeRadiusAtPower(x.Cut, x.Feed, new Power(watts)) is { Metres: > 0 } r)
        {
            Assert.Equal(1, CuttingForce.CuttingPower(x.Cut.WithEdge(r), x.Feed).Watts / watts, 1e-6);
        }
    });

    [Fact]
    public void Sharpening_radii_of_the_worked_example() // independent program, cutting specification 4.8, first vector
    {
        Printed.Check("35.9026", CuttingForce.EdgeRadiusAtThrust(A(), Feed(2), new Force(100))!.Value.Micrometres);
        Printed.Check("26.5665", CuttingForce.EdgeRadiusAtThrust(A(), Feed(2), new Force(70))!.Value.Micrometres);
        Printed.Check("35.7414", CuttingForce.EdgeRadiusAtPower(A(), Feed(2), new Power(1500))!.Value.Micrometres);
    }

    [Fact]
    public void A_limit_that_a_fresh_edge_breaks_gives_no_radius_to_wait_for()
    {
        Assert.Equal(0, CuttingForce.EdgeRadiusAtPower(A(), Feed(2), new Power(100))!.Value.Metres);
        Assert.Equal(0, CuttingForce.EdgeRadiusAtThrust(A(), Feed(2), new Force(5))!.Value.Metres);
    }

    [Fact]
    public void A_limit_that_rounding_never_reaches_gives_none() =>
        Assert.Null(CuttingForce.EdgeRadiusAtPower(A(), Feed(0.1), new Power(50_000)));

    [Fact]
    public void A_steep_hook_has_no_push_limit_once_the_chip_pulls()
    {
        CutCase steep = A(rake: 30);
        Assert.Null(CuttingForce.FeedAtThrust(steep, new Force(70)));
        Assert.True(CuttingForce.Thrust(steep, Feed(60)).Newtons < CuttingForce.Thrust(steep, Feed(2)).Newtons);
        // A limit under the hump where the chip begins still binds.
        double hump = CuttingForce.Thrust(steep, Bite.NoChipFeed(steep)).Newtons;
        Speed? feed = CuttingForce.FeedAtThrust(steep, new Force(0.5 * hump));
        Assert.NotNull(feed);
        Assert.Equal(0.5 * hump, CuttingForce.Thrust(steep, feed.Value).Newtons, 1e-9);
    }

    [Fact]
    public void Limits_are_refused_when_they_are_no_numbers()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => CuttingForce.FeedAtPower(A(), new Power(double.NaN)));
        Assert.Throws<ArgumentOutOfRangeException>(() => CuttingForce.FeedAtThrust(A(), new Force(-1)));
    }
}
