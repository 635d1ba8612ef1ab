using BladeLog.Handbook.Fatigue;
using CsCheck;

namespace BladeLog.Handbook.Tests.Fatigue;

public class RainflowTests
{
    // ASTM E1049-85, example of section 5.4.4: -2, 1, -3, 5, -1, 3, -4, 4, -2.
    private static readonly double[] Example = [-2, 1, -3, 5, -1, 3, -4, 4, -2];

    [Fact]
    public void The_example_of_the_standard_cycle_by_cycle()
    {
        RainflowCycle[] expected =
        [
            new(3, -0.5, 0.5), new(4, -1, 0.5), new(4, 1, 1), new(8, 1, 0.5), new(9, 0.5, 0.5), new(8, 0, 0.5), new(6, 1, 0.5),
        ];
        Assert.Equal(expected, Rainflow.Count(Example));
    }

    [Theory]
    [InlineData(3, 0.5)]
    [InlineData(4, 1.5)]
    [InlineData(6, 0.5)]
    [InlineData(8, 1.0)]
    [InlineData(9, 0.5)]
    public void The_totals_of_the_standard(double range, double count) =>
        Assert.Equal(count, Rainflow.Count(Example).Where(c => c.Range == range).Sum(c => c.Count));

    [Fact]
    public void Points_on_the_way_change_nothing() =>
        Assert.Equal(Rainflow.Count(Example), Rainflow.Count([-2, -1, 1, 1, 0, -3, 2, 5, -1, 3, 3, 0, -4, 4, -2]));

    [Fact]
    public void The_ranges_counted_add_up_to_the_path_of_the_stress() =>
        Gen.Double[-500, 500].Array[2, 60].Sample(history =>
        {
            double path = history.Zip(history.Skip(1), (a, b) => Math.Abs(b - a)).Sum();
            double counted = Rainflow.Count(history).Sum(c => 2 * c.Count * c.Range);
            // Each whole cycle goes there and back.
            Assert.Equal(path, counted, 1e-6);
        });

    [Fact]
    public void A_repeating_history_gives_whole_cycles_wherever_it_starts() =>
        Gen.Select(Gen.Int[-50, 50].Array[2, 30], Gen.Int[0, 29]).Sample((points, start) =>
        {
            double[] history = [.. points.Select(p => (double)p)];
            int at = start % history.Length;
            double[] turned = [.. history.Skip(at), .. history.Take(at)];
            static double[] Ranges(IEnumerable<RainflowCycle> cycles) => [.. cycles.SelectMany(c => Enumerable.Repeat(c.Range, (int)c.Count)).Order()];
            Assert.All(Rainflow.CountLoop(history), c => Assert.Equal(Math.Round(c.Count), c.Count));
            Assert.Equal(Ranges(Rainflow.CountLoop(history)), Ranges(Rainflow.CountLoop(turned)));
        });

    // Independent program, band-life specification, section 3.2: two equal wheels, with and without a valley of 40 MPa.
    [Fact]
    public void A_loop_over_two_wheels()
    {
        const double sT = 101.766;
        const double sb = 371.467;
        RainflowCycle even = Assert.Single(Rainflow.CountLoop([sT, sT + sb, sT, sT + sb]));
        Assert.Equal(2, even.Count);
        Assert.Equal(371.467, even.Range, 1e-6);
        Assert.Equal(287.500, even.Mean, 1e-3);

        RainflowCycle[] cut = [.. Rainflow.CountLoop([sT - 40, sT + sb, sT, sT + sb]).OrderBy(c => c.Range)];
        Assert.Equal([1, 1], cut.Select(c => c.Count));
        Assert.Equal(371.467, cut[0].Range, 1e-6);
        Assert.Equal(411.467, cut[1].Range, 1e-6);
        Assert.Equal(267.500, cut[1].Mean, 1e-3);
    }

    [Fact]
    public void A_history_without_a_turn_has_no_cycle()
    {
        Assert.Empty(Rainflow.Count([5, 5, 5]));
        Assert.Empty(Rainflow.CountLoop([]));
        Assert.Throws<ArgumentOutOfRangeException>(() => Rainflow.Count([1, double.NaN]));
    }
}
