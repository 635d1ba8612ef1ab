using System.Net;
using static BladeLog.Tests.Features.Workings.Bodies;

namespace BladeLog.Tests.Features.Workings;

public sealed class CurveAndWearWorkingTests(EmptyShop shop) : IClassFixture<EmptyShop>
{
    private static Dictionary<string, string> Wear => new()
    {
        ["fresh_radius_um"] = "8",
        ["wear_um_km"] = "2.5",
        ["path_km"] = "5",
        ["feed_m_min"] = "2",
        ["loop_mm"] = "3000",
        ["band_speed_m_s"] = "16",
        ["cut_height_mm"] = "150",
    };

    private static Dictionary<string, string> Curve => new() { ["width_mm"] = "12.7", ["thickness_mm"] = "0.635", ["kerf_mm"] = "0.955" };

    [Theory] // independent program, cutting specification 6.2
    [InlineData(1, 13.9587)]
    [InlineData(5, 24.4998)]
    [InlineData(11.2, 40.0000)]
    public async Task An_edge_rounds_as_the_independent_program_says(double km, double um) =>
        Near(um, (await shop.App.Ask("wear", Wear.With("path_km", km))).Number("edge_radius_um"), 1e-5);

    [Fact]
    public async Task What_is_left_of_an_edge_is_its_path_over_the_path_of_a_square_metre()
    {
        // 16 m/s over 2/60 m/s and 3 m: 160 m of wood per tooth for a square metre; dull at 11.2 km (same program).
        var answer = await shop.App.Ask("wear", Wear.With("wood_factor", 2));
        Near(160, answer.Number("wear_path_m_per_m2"), 1e-9);
        Near(11.2, answer.Number("path_to_dull_km"), 1e-4);
        Near(6.2 * 1000 / 320, answer.Number("area_left_m2"), 2e-4);
        Near(6.2 * 1000 / 320 / 0.150, answer.Number("length_left_m"), 2e-4);
    }

    [Fact]
    public async Task Half_an_inch_turns_the_radius_of_the_published_tables()
    {
        // Two articles and four machine manuals: 2 1/2 in; side play 0.32 mm as the tables imply. The hard bound is w²/(8c) less half the body.
        var answer = await shop.App.Ask("curve", Curve.With("radius_mm", 63.5));
        Near(12.7 * 12.7 / (8 * 0.32) - (0.635 / 2), answer.Number("hard_min_radius_mm"), 1e-9);
        Assert.InRange(answer.Number("table_radius_mm"), 0.85 * 63.5, 1.15 * 63.5);
        Assert.True(answer.Number("widest_blade_mm") < 12.7);
    }

    [Theory]
    [InlineData("curve", "kerf_mm", 0.5)]
    [InlineData("wear", "dull_radius_um", 5)]
    [InlineData("wear", "feed_m_min", 0)]
    public async Task What_cannot_be_is_refused_beside_its_field(string working, string field, double value)
    {
        using var answer = await shop.App.PostText($"/api/v1/workings/{working}", (working == "wear" ? Wear : Curve).With(field, value).Text());
        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
        Assert.Contains(field, await answer.Content.ReadAsStringAsync(), StringComparison.Ordinal);
    }
}
