using System.Net;
using System.Text.Json;

namespace BladeLog.Tests.Features.ShopJson;

/// <summary>The sample shop's blades by JSON. Figures: independent program, demo-shop specification section 4, to its printed digits.</summary>
public sealed class BladesJsonTests(SampleShopApp shop) : IClassFixture<SampleShopApp>
{
    [Fact]
    public async Task Every_blade_is_there_once()
    {
        var tags = (await shop.App.GetJson("/api/v1/blades")).EnumerateArray().Select(b => b.GetProperty("tag").GetString()).ToArray();
        Assert.Equal(tags.Distinct(StringComparer.OrdinalIgnoreCase), tags);
        Assert.Contains("Q-04b", tags, StringComparer.OrdinalIgnoreCase);
        Assert.Equal(41, tags.Length);
    }

    [Theory]
    [InlineData("Q-01", "on_saw", "S1", "ready", "sharpenings")]
    [InlineData("Q-08", "on_saw", "S2", "ready", "sharpenings")]
    [InlineData("Q-17", "on_saw", "S3", "ready", "fatigue")]
    [InlineData("Q-04b", "rack", null, "look", "welds")]
    [InlineData("Q-06", "rack", null, "look", "unknown_history")]
    [InlineData("Q-14", "rack", null, "hold", null)]
    [InlineData("Q-15", "rack", null, "ready", "new")]
    [InlineData("Q-04", "gone", null, "broken", "sharpenings")]
    [InlineData("Q-33", "at_sharpener", null, "look", "fatigue")]
    [InlineData("Q-38", "gone", null, "retired", "width")]
    public async Task A_blade_stands_where_and_as_the_shop_left_it(string tag, string place, string? saw, string state, string? governs)
    {
        var blade = await shop.App.GetJson($"/api/v1/blades/{tag}");
        Assert.Equal(place, blade.GetProperty("place").GetString());
        Assert.Equal(saw, blade.GetProperty("saw").GetString());
        Assert.Equal(state, blade.GetProperty("state").GetString());
        Assert.Equal(governs, blade.GetProperty("life").ValueKind == JsonValueKind.Null ? null : blade.GetProperty("life").GetProperty("governed_by").GetString());
    }

    [Theory]
    [InlineData("Q-01", 5.553e6, 0.00691, null, null, 14.6, "not_limiting")]
    [InlineData("Q-09", 10.325e6, 0.862, 360.0, 49.7, 18.0, "finite")]
    [InlineData("Q-17", 0.369e6, 0.34, 26.44, 17.4, 12.3, "marginal|finite")]
    [InlineData("Q-32", 0.422e6, 0.591, 15.91, 6.51, 39.2, "finite")]
    [InlineData("Q-40", 0.0, 0.0, 75.08, 75.1, 8.0, "finite")]
    public async Task A_blade_has_the_figures_of_the_independent_program(string tag, double bends, double used, double? median, double? left, double edge, string verdict)
    {
        var blade = await shop.App.GetJson($"/api/v1/blades/{tag}");
        var life = blade.GetProperty("life");
        Near(bends, blade.GetProperty("total_bends"));
        Near(bends, blade.GetProperty("exposures").EnumerateArray().Sum(e => e.GetProperty("bends").GetDouble()));
        Near(used, life.GetProperty("used"));
        Near(median, life.GetProperty("median_hours"));
        Near(left, life.GetProperty("hours_left"));
        Near(edge, blade.GetProperty("sharpness").GetProperty("edge_radius_um"));
        Assert.Contains(life.GetProperty("verdict").GetString(), verdict.Split('|'));
    }

    [Fact]
    public async Task A_held_blade_shows_no_life_and_says_why()
    {
        var blade = await shop.App.GetJson("/api/v1/blades/Q-14");
        Assert.Equal(JsonValueKind.Null, blade.GetProperty("life").ValueKind);
        Assert.Contains(blade.GetProperty("advice").GetProperty("because").EnumerateArray(), b => b.GetString()!.Contains("crack 2.6 mm", StringComparison.Ordinal));
    }

    [Fact]
    public async Task An_unknown_history_shows_its_range()
    {
        var life = (await shop.App.GetJson("/api/v1/blades/Q-06")).GetProperty("life");
        Assert.InRange(life.GetProperty("used_low").GetDouble(), 0.2, 0.201);
        Assert.InRange(life.GetProperty("used_high").GetDouble(), 0.6, 0.601);
    }

    [Fact]
    public async Task A_blade_away_names_its_batch() =>
        Assert.Equal("B-031", (await shop.App.GetJson("/api/v1/blades/Q-07")).GetProperty("batch").GetString());

    [Fact]
    public async Task A_tag_is_read_without_case_and_a_strange_one_is_not_found()
    {
        Assert.Equal("Q-17", (await shop.App.GetJson("/api/v1/blades/q-17")).GetProperty("tag").GetString());
        using var answer = await shop.App.Client.GetAsync("/api/v1/blades/Q-99");
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        Assert.Equal("application/problem+json", answer.Content.Headers.ContentType?.MediaType);
        Assert.Equal("There is no blade Q-99 here.", (await ShopApp.Json(answer)).GetProperty("title").GetString());
    }

    private static void Near(double expected, double actual) => Assert.True(Math.Abs(actual - expected) <= 0.01 * expected, $"{expected} expected, {actual} answered.");

    private static void Near(double? expected, JsonElement actual)
    {
        if (expected is { } figure)
        {
            Near(figure, actual.GetDouble());
        }
        else
        {
            Assert.Equal(JsonValueKind.Null, actual.ValueKind);
        }
    }
}
