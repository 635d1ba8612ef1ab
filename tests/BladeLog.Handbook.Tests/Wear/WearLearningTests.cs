using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tests.Cutting;
using BladeLog.Handbook.Wear;
using MathNet.Numerics.Distributions;

namespace BladeLog.Handbook.Tests.Wear;

public sealed class WearLearningTests
{
    private static readonly Length Dull = Length.FromMicrometres(40), Fresh = Length.FromMicrometres(8);

    [Fact]
    public void Three_dull_blades_move_the_rate() // independent program, cutting specification 6.3
    {
        WearLevel level = WearLearning.Learn(WearLevel.FromTable(2.5), [new(6.2, true), new(7.5, true), new(5.1, true)], Dull, Fresh);
        Printed.Check("1.47389", level.LnMean);
        Printed.Check("0.223937", level.LnSd);
        Printed.Check("4.36617", level.Median);
        // Printed with the normal fractile rounded to 1.645.
        Assert.Equal(3.02077, level.Fractile(0.05), 1.2e-4);
        Assert.Equal(6.31080, level.Fractile(0.95), 2.4e-4);
        Printed.Check("6.41294", WearLearning.IntervalKm(level.Median, Dull, Fresh));
    }

    [Fact]
    public void The_tables_own_word_is_wide() // independent program, cutting specification 6.2: 90 % within a factor of 4.5
    {
        WearLevel prior = WearLevel.FromTable(2.5);
        Printed.Check("0.916291", prior.LnSd);
        Assert.Equal(4.5, prior.Fractile(0.95) / prior.Median, 0.05);
        WearLevel same = WearLearning.Learn(prior, [], Dull, Fresh);
        Assert.Equal(prior.LnMean, same.LnMean, 1e-12);
        Assert.Equal(prior.LnSd, same.LnSd, 1e-12);
    }

    [Fact]
    public void A_blade_sharpened_before_it_was_dull_only_bounds_the_rate()
    {
        WearLevel prior = WearLevel.FromTable(2.5);
        WearLevel far = WearLearning.Learn(prior, [new(12, false)], Dull, Fresh);
        WearLevel soon = WearLearning.Learn(prior, [new(0.5, false)], Dull, Fresh);
        WearLevel dull = WearLearning.Learn(prior, [new(12, true)], Dull, Fresh);
        // Still sharp after 12 km: it wears less than thought. Taken off after half a km: nothing learned.
        Assert.True(far.Median < prior.Median);
        Assert.InRange(soon.Median / prior.Median, 0.98, 1.0);
        Assert.True(far.LnSd > dull.LnSd && far.LnSd < prior.LnSd);
    }

    [Theory]
    [InlineData(6.0, 3.0)]
    [InlineData(20.0, 60.0)]
    [InlineData(1.0, 0.2)]
    public void The_mode_found_is_the_highest_point_of_the_posterior(double dullKm, double otherKm)
    {
        WearLevel prior = WearLevel.FromTable(2.5);
        WearLevel level = WearLearning.Learn(prior, [new(dullKm, true), new(otherKm, false)], Dull, Fresh);
        double LogPosterior(double mu)
        {
            double y1 = Math.Log(28 / dullKm), y2 = Math.Log(28 / otherKm);
            return Normal.PDFLn(prior.LnMean, prior.LnSd, mu) + Normal.PDFLn(mu, 0.4, y1) + Math.Log(Normal.CDF(mu, 0.4, y2));
        }

        // A scan knows nothing of slopes.
        double best = Enumerable.Range(-40000, 80001).Select(i => prior.LnMean + i * 1e-4).MaxBy(LogPosterior);
        Assert.Equal(best, level.LnMean, 2e-4);
        double h = 1e-3, second = (LogPosterior(best + h) - 2 * LogPosterior(best) + LogPosterior(best - h)) / (h * h);
        Assert.Equal(1 / Math.Sqrt(-second), level.LnSd, 1e-3);
    }

    [Fact]
    public void A_bound_far_out_in_the_tail_still_gives_a_number()
    {
        WearLevel level = WearLearning.Learn(WearLevel.FromTable(2.5), [new(1e8, false)], Dull, Fresh);
        Assert.True(double.IsFinite(level.LnMean) && level.LnSd > 0);
        Assert.True(level.Median < 0.01);
    }

    [Fact]
    public void Grinding_takes_width_until_the_least_width() // independent program, cutting specification 6.5: 34 mm, 0.2 mm each, 0.75: 42
    {
        Length wide = Length.FromMillimetres(34), each = Length.FromMillimetres(0.2);
        Length least = Sharpening.LeastWidth(wide, wideMillBand: false);
        Assert.Equal(42, Sharpening.GrindsLeft(wide, least, each));
        Assert.True(Sharpening.WidthAfter(wide, 42, each).Metres >= least.Metres);
        Assert.True(Sharpening.WidthAfter(wide, 43, each).Metres < least.Metres);
        Assert.Equal(0.65 * 100, Sharpening.LeastWidth(Length.FromMillimetres(100), wideMillBand: true).Millimetres, 1e-9);
        Assert.Equal(0, Sharpening.GrindsLeft(Length.FromMillimetres(24), Length.FromMillimetres(25), each));
    }

    [Fact]
    public void Whole_grinds_are_not_lost_to_rounding() =>
        Assert.Equal(5, Sharpening.GrindsLeft(Length.FromMillimetres(13), Length.FromMillimetres(12), Length.FromMillimetres(0.2)));
}
