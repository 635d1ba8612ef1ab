using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Tests.Band;
using CsCheck;

namespace BladeLog.Handbook.Tests.Fatigue;

public class MinerTests
{
    // Independent program, band-life specification, section 5.
    [Fact]
    public void Hours_on_two_saws_add_up() =>
        Printed.Significant(0.238905, Miner.Used([(1.37288e6, 7.21621e6), (7.62353e6, 1.56681e8)]), 5);

    [Fact]
    public void Used_life_adds_up_in_any_split() =>
        Gen.Select(Gen.Double[0, 1e7], Gen.Double[0, 1e7], Gen.Double[1e5, 1e9]).Sample((a, b, N) =>
            Assert.Equal(Miner.Used([(a + b, N)]), Miner.Used([(a, N), (b, N)]), 1e-9 * (1 + (a + b) / N)));

    [Fact]
    public void A_level_without_end_uses_nothing() => Assert.Equal(0, Miner.Used([(1e9, double.PositiveInfinity)]));

    // Independent program, band-life specification, section 5: with the median at U = 1 and shape 2.
    [Theory]
    [InlineData(0.1, 0.00690750)]
    [InlineData(0.3, 0.0604773)]
    [InlineData(0.5, 0.159104)]
    [InlineData(1, 0.5)]
    public void The_share_of_blades_broken(double used, double share) => Printed.Significant(share, Miner.ShareBroken(used, 2));

    // Independent program, band-life specification, section 4.6, and the retire marks of the advice specification.
    [Fact]
    public void Quantiles_at_shape_two()
    {
        Printed.Significant(1.20112, Miner.ScaleFactor(2));
        Printed.Significant(0.324593, Miner.TenthPercentileFactor(2) / Miner.ScaleFactor(2));
        Printed.Significant(0.389876, Miner.TenthPercentileFactor(2));
        Assert.Equal(0.1, Miner.ShareBroken(Miner.TenthPercentileFactor(2), 2), 9);
        Assert.Equal(0.25, Miner.ShareBroken(0.64, 2), 2);
        Assert.Equal(0.36, Miner.ShareBroken(0.80, 2), 2);
    }

    // Independent program, band-life specification, section 4.6.
    [Theory]
    [InlineData(0.15, 3.71336)]
    [InlineData(0.20, 2.78502)]
    [InlineData(0.25, 2.22802)]
    [InlineData(0.30, 1.85668)]
    [InlineData(0.40, 1.39251)]
    public void The_shape_that_goes_with_a_scatter(double s, double beta) => Printed.Significant(beta, Miner.ShapeFromScatter(s));

    [Fact]
    public void The_blade_lives_no_longer_than_its_weaker_place() =>
        Gen.Select(Gen.Double[1e4, 1e9], Gen.Double[1e4, 1e9], Gen.Double[0.5, 5]).Sample((g, w, beta) =>
        {
            double median = Miner.SystemMedian(g, w, beta);
            Assert.True(median <= Math.Min(g, w));
            // Half are broken where the two places together have used one life.
            Assert.Equal(1, Miner.SystemUsed(median / g, median / w, beta), 1e-9);
            Assert.Equal(0.5, 1 - (1 - Miner.ShareBroken(median / g, beta)) * (1 - Miner.ShareBroken(median / w, beta)), 1e-9);
        });

    [Fact]
    public void At_shape_two_the_two_places_add_as_squares()
    {
        Assert.Equal(0.5, Miner.SystemUsed(0.3, 0.4, 2), 12);
        Assert.Equal(0, Miner.SystemUsed(0, 0, 2));
        Assert.Equal(1e6, Miner.SystemMedian(1e6, double.PositiveInfinity, 2), 1e-3);
        Assert.Equal(double.PositiveInfinity, Miner.SystemMedian(double.PositiveInfinity, double.PositiveInfinity, 2));
    }

    [Fact]
    public void Impossible_numbers_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Miner.Used([(-1, 1e6)]));
        Assert.Throws<ArgumentOutOfRangeException>(() => Miner.Used([(1, 0)]));
        Assert.Throws<ArgumentOutOfRangeException>(() => Miner.SystemUsed(0.1, double.NaN, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => Miner.SystemMedian(0, 1e6, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => Miner.TenthPercentileFactor(0));
    }
}
