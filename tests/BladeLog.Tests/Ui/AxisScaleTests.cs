using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Tests.Ui;

/// <summary>Scales and ticks of every curve: round, rising, inside, and never one number on another.</summary>
public sealed class AxisScaleTests
{
    [Fact]
    public void Ticks_are_round_rising_inside_and_at_least_one()
    {
        foreach (AxisScale scale in Scales())
        {
            foreach (IReadOnlyList<Tick> ticks in (IReadOnlyList<Tick>[])[scale.Across(), scale.Up(CurveGeometry.Plot)])
            {
                Assert.NotEmpty(ticks);
                Assert.All(ticks, t => Assert.InRange(t.Percent, -1e-6, 100 + 1e-6));
                Assert.All(ticks.Zip(ticks.Skip(1)), pair => Assert.True(pair.First.Percent < pair.Second.Percent));
                Assert.All(ticks, t => Assert.True(IsRound(t.Value, ticks, scale), $"{t.Value} of {scale}"));
                Assert.All(ticks, t => Assert.Equal(t.Value, double.Parse(t.Text, System.Globalization.CultureInfo.InvariantCulture), 1e-9 * Math.Max(1, Math.Abs(t.Value))));
            }
        }
    }

    [Fact]
    public void Numbers_side_by_side_never_meet_on_a_wide_page_nor_those_left_on_a_narrow_one()
    {
        foreach (AxisScale scale in Scales())
        {
            IReadOnlyList<Tick> all = scale.Across();
            Apart(all, AxisScale.Wide);
            Apart([.. all.Where(t => !t.Minor)], AxisScale.Narrow);
            Assert.False(all[0].Minor);
        }

        static void Apart(IReadOnlyList<Tick> ticks, double width) => Assert.All(ticks.Zip(ticks.Skip(1)), pair =>
        {
            double gap = (pair.Second.Percent - pair.First.Percent) / 100 * width;
            Assert.True(gap > (pair.First.Text.Length + pair.Second.Text.Length) / 2.0 * 10, $"{pair.First.Text} and {pair.Second.Text} at {width}");
        });
    }

    [Fact]
    public void Numbers_above_each_other_never_meet()
    {
        foreach (AxisScale scale in Scales())
        {
            IReadOnlyList<Tick> ticks = scale.Up(CurveGeometry.Plot);
            Assert.All(ticks.Zip(ticks.Skip(1)), pair => Assert.True((pair.Second.Percent - pair.First.Percent) / 100 * CurveGeometry.Plot >= 24));
        }
    }

    [Fact]
    public void A_place_on_the_axis_rises_with_the_value_and_leads_back_to_it()
    {
        var random = new Random(3);
        foreach (AxisScale scale in Scales())
        {
            Assert.Equal(0, scale.At(scale.From), 1e-9);
            Assert.Equal(100, scale.At(scale.To), 1e-9);
            double a = 100 * random.NextDouble(), b = 100 * random.NextDouble();
            Assert.Equal(a < b, scale.Value(a) < scale.Value(b));
            Assert.Equal(a, scale.At(scale.Value(a)), 1e-6);
        }
    }

    [Theory]
    [InlineData(0.9, 1)]
    [InlineData(1, 1)]
    [InlineData(1.01, 1.2)]
    [InlineData(318, 400)]
    [InlineData(0.0037, 0.004)]
    [InlineData(9.2e6, 1e7)]
    public void An_axis_from_nought_ends_at_the_next_round_number(double greatest, double end) =>
        Assert.Equal(end, AxisScale.FromNought(greatest).To, 1e-9 * end);

    [Fact]
    public void Labels_moved_apart_keep_their_order_their_room_and_stay_inside()
    {
        var random = new Random(4);
        for (int i = 0; i < 5_000; i++)
        {
            double[] wished = [.. Enumerable.Range(0, random.Next(1, 7)).Select(_ => (400 * random.NextDouble()) - 50)];
            IReadOnlyList<double> placed = AxisScale.Spread(wished, 24, 0, 300);
            Assert.All(placed, p => Assert.InRange(p, -1e-9, 300 + 1e-9));
            int[] order = [.. Enumerable.Range(0, wished.Length).OrderBy(k => wished[k])];
            for (int k = 1; k < order.Length; k++)
            {
                Assert.True(placed[order[k]] - placed[order[k - 1]] >= 24 - 1e-9);
            }
        }

        Assert.Equal([100, 200], AxisScale.Spread([100, 200], 24, 0, 300));
    }

    [Theory]
    [InlineData(1, 1, false)]
    [InlineData(2, 1, false)]
    [InlineData(0, 1, true)]
    [InlineData(double.NaN, 1, false)]
    public void An_axis_that_runs_nowhere_is_refused(double from, double to, bool log) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => log ? AxisScale.Log(from, to) : AxisScale.Even(from, to));

    [Fact]
    public void A_curve_is_cut_at_the_edges_of_its_plot_and_broken_where_there_is_no_figure()
    {
        CurveFigure figure = new(
            "t", AxisScale.Even(0, 10), "x", AxisScale.Log(1, 100), "y",
            [
                new CurveLine("leaves", [new(0, 10), new(5, 10_000), new(10, 1_000_000)]),
                new CurveLine("gap", [new(0, 10), new(4, 10), new(5, double.NaN), new(6, 10), new(10, 10)]),
                new CurveLine("nought", [new(0, 10), new(10, 0)]),
                new CurveLine("away", [new(0, 1000), new(10, 2000)]),
            ],
            new CurveHere(5, null, "here"));
        CurveGeometry drawn = CurveGeometry.Of(figure);
        Assert.Equal("M0 150L16.67 0", drawn.Paths[0].Data);
        Assert.Equal("M0 150L40 150M60 150L100 150", drawn.Paths[1].Data);
        Assert.DoesNotContain("NaN", drawn.Paths[2].Data, StringComparison.Ordinal);
        Assert.Equal("", drawn.Paths[3].Data);
        Assert.Equal(["2"], drawn.Marks.OfType<Words>().Where(w => w is { X: 100, Dx: 8 }).Select(w => w.Text));
        Assert.Null(drawn.Here);
    }

    private static IEnumerable<AxisScale> Scales()
    {
        var random = new Random(2);
        for (int i = 0; i < 3_000; i++)
        {
            double from = Math.Pow(10, (8 * random.NextDouble()) - 3);
            yield return AxisScale.Even(from, from * (1.05 + (20 * random.NextDouble())));
            yield return AxisScale.Even(0, from);
            yield return AxisScale.Log(from, from * Math.Pow(10, 0.35 + (6 * random.NextDouble())));
        }
    }

    /// <summary>A multiple of 1, 2 or 5 times a power of ten no larger than the step, or such a number itself on a long logarithmic axis.</summary>
    private static bool IsRound(double value, IReadOnlyList<Tick> ticks, AxisScale scale)
    {
        if (scale.Logarithmic && scale.To / scale.From > 16)
        {
            double mantissa = value / Math.Pow(10, Math.Floor(Math.Log10(value) + 1e-9));
            return new[] { 1.0, 2, 3, 5 }.Any(m => Math.Abs(mantissa - m) < 1e-6);
        }

        double step = ticks.Count > 1 ? ticks.Zip(ticks.Skip(1)).Min(p => p.Second.Value - p.First.Value) : Math.Pow(10, Math.Floor(Math.Log10(Math.Max(value, 1e-12))) - 2);
        foreach (double m in (double[])[1, 2, 3, 5])
        {
            double power = m * Math.Pow(10, Math.Floor(Math.Log10(step / m) + 1e-9));
            if (Math.Abs((value / power) - Math.Round(value / power)) < 1e-6)
            {
                return true;
            }
        }

        return false;
    }
}
