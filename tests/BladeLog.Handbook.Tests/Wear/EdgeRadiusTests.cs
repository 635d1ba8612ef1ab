using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tables;
using BladeLog.Handbook.Tests.Cutting;
using BladeLog.Handbook.Wear;
using CsCheck;

namespace BladeLog.Handbook.Tests.Wear;

public sealed class EdgeRadiusTests
{
    private static Length Um(double um) => Length.FromMicrometres(um);

    [Theory] // independent program, cutting specification 6.2
    [InlineData(1, "13.9587")]
    [InlineData(2, "16.9267")]
    [InlineData(5, "24.4998")]
    [InlineData(8, "32.0000")]
    [InlineData(11.2, "40.0000")]
    public void An_edge_rounds_with_the_wood_it_has_gone_through(double km, string um) =>
        Printed.Check(um, EdgeRadius.After(Um(8), 2.5, km).Micrometres);

    [Fact]
    public void Plain_steel_dulls_in_the_path_of_a_few_hours_of_log_sawing()
    {
        // Common practice: 2 to 4 h between sharpenings in log sawing, 5 to 11 km a tooth; the table's plain steel must fall in it.
        double km = EdgeRadius.PathTo(Um(40), Um(8), ToothWearTable.Of(TipMaterial.PlainSteel).WearPerKm);
        Assert.InRange(km, 5, 11);
    }

    [Fact]
    public void The_path_to_the_radius_of_a_path_is_that_path()
    {
        Gen.Select(Gen.Double[0.001, 100], Gen.Double[0.1, 8], Gen.Double[3, 15], Gen.Double[0, 8], Gen.Double[0.05, 2]).Sample((x, w, r0, dr, xr) =>
        {
            RunIn run = new(Um(dr), xr);
            Assert.Equal(x, EdgeRadius.PathTo(EdgeRadius.After(Um(r0), w, x, run), Um(r0), w, run), 1e-8 * (1 + x));
        });
    }

    [Fact]
    public void An_edge_already_past_the_radius_has_no_path_left() => Assert.Equal(0, EdgeRadius.PathTo(Um(30), Um(31), 2.5));

    [Fact]
    public void A_fresh_edge_starts_fresh_and_never_grows_keener()
    {
        Assert.Equal(8, EdgeRadius.After(Um(8), 2.5, 0).Micrometres, 1e-12);
        Gen.Select(Gen.Double[0, 50], Gen.Double[0, 5]).Sample((x, more) =>
            Assert.True(EdgeRadius.After(Um(8), 2.5, x + more).Metres >= EdgeRadius.After(Um(8), 2.5, x).Metres));
    }

    [Fact]
    public void Hard_and_dirty_wood_counts_for_more_path() => // 1.5 × 2 × 25.4118 m
        Assert.Equal(0.0762354, EdgeRadius.EquivalentKm(new Length(25.4118), 1.5, 2), 1e-12);

    [Fact]
    public void A_path_or_a_rate_below_zero_is_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => EdgeRadius.After(Um(8), 2.5, -1));
        Assert.Throws<ArgumentOutOfRangeException>(() => EdgeRadius.PathTo(Um(40), Um(8), 0));
    }
}
