using static BladeLog.Tests.Features.Workings.Bodies;

namespace BladeLog.Tests.Features.Workings;

/// <summary>The worked cuts of the cutting specification, 3.3 and 4.8 (independent program), through the interface.</summary>
public sealed class CutWorkingTests(EmptyShop shop) : IClassFixture<EmptyShop>
{
    private const double Printed = 1e-5;

    [Theory]
    [InlineData("T1", 520, 20, 12, 10, 50.5802, 39.6209, 2.18768, 38.6061, 16.7665, 617.698, 8.34313, 71.9906)]
    [InlineData("T2", 520, 0, 12, 10, 73.6890, 26.6155, 2.61216, 46.0970, 41.0013, 737.552, 5.76249, 6.91010)]
    [InlineData("T3", 520, 20, 12, 30, 50.5802, 39.6209, 4.61553, 81.4505, 81.0331, 1303.21, 3.41479, 0.324261)]
    [InlineData("T4", 705.6, 10, 12, 15, 82.3174, 32.4991, 4.19643, 74.0546, 63.1098, 1184.87, 3.39206, 3.81750)]
    [InlineData("T5", 705.6, 10, 60, 15, 51.4484, 32.4991, 2.62277, 46.2841, 39.4436, 740.546, 7.36781, 14.8963)]
    [InlineData("T6", 520, 20, 12, 40, 50.5802, 39.6209, 5.82946, 102.873, 113.166, 1645.96, 0.950620, 0.307966)]
    public async Task The_worked_cuts_answer_as_the_independent_program(
        string name, double density, double rake, double moisture, double edge, double K, double hR, double tooth, double main, double thrust, double power, double atPower, double atPush)
    {
        Assert.NotEmpty(name);
        var answer = await shop.App.Ask("cut", Of("cut")
            .With("density12_kg_m3", density).With("rake_deg", rake).With("moisture_pct", moisture).With("edge_radius_um", edge)
            .With("band_power_w", 1500).With("push_limit_n", 70));
        Near(17.7083, answer.Number("bite_um"), Printed);
        Near(K, answer.Number("shear_factor_mpa"), Printed);
        Near(hR, answer.Number("reference_thickness_um"), Printed);
        Near(tooth, answer.Number("tooth_force_n"), Printed);
        Near(main, answer.Number("cutting_force_n"), Printed);
        Near(thrust, answer.Number("thrust_n"), Printed);
        Near(power, answer.Number("cutting_power_w"), Printed);
        Near(atPower, answer.Number("limits.power_m_min"), Printed);
        Near(atPush, answer.Number("limits.push_m_min"), Printed);
    }

    [Fact]
    public async Task Below_the_no_chip_feed_the_edge_only_rides()
    {
        // T7 of the cutting specification.
        var answer = await shop.App.Ask("cut", Of("cut").With("edge_radius_um", 40).With("feed_m_min", 0.451765));
        Near(4, answer.Number("bite_um"), Printed);
        Near(4.66307, answer.Number("tooth_force_n"), Printed);
        Near(82.2894, answer.Number("cutting_force_n"), Printed);
        Near(102.685, answer.Number("thrust_n"), Printed);
        Near(1316.63, answer.Number("cutting_power_w"), Printed);
        Assert.Equal("no_chip", answer.GetProperty("regime").GetString());
    }

    [Theory]
    [InlineData("set", 1.23209, 0.246417)]
    [InlineData("swaged", 2.25882, 0.451765)]
    [InlineData("tipped", 2.25882, 0.451765)]
    public async Task Rubbing_and_no_chip_feeds_are_those_of_the_worked_saw(string tip, double rubbing, double noChip)
    {
        var answer = await shop.App.Ask("cut", Of("cut").With("edge_radius_um", 20).With("tip", $"\"{tip}\""));
        Near(rubbing, answer.Number("limits.rubbing_m_min"), Printed);
        Near(noChip, answer.Number("limits.no_chip_m_min"), Printed);
        Near(rubbing, answer.Number("window.low_m_min"), Printed);
    }

    [Theory]
    [InlineData(10, 15, 37.9155, 13.2517, 180.706, 75.8824, 4517.64)]
    [InlineData(10, 40, 37.9155, 17.3087, 236.028, 158.866, 5900.69)]
    public async Task The_mill_in_green_pine_answers_as_the_independent_program(double feed, double edge, double K, double tooth, double main, double thrust, double power)
    {
        var answer = await shop.App.Ask("cut", Of("cut")
            .With("width_mm", 32).With("thickness_mm", 1.07).With("kerf_mm", 2).With("pitch_mm", 22).With("gullet_mm", 6).With("rake_deg", 10)
            .With("band_speed_m_s", 25).With("cut_height_mm", 300).With("moisture_pct", 60).With("edge_radius_um", edge).With("feed_m_min", feed));
        Near(146.667, answer.Number("bite_um"), Printed);
        Near(K, answer.Number("shear_factor_mpa"), Printed);
        Near(tooth, answer.Number("tooth_force_n"), Printed);
        Near(main, answer.Number("cutting_force_n"), Printed);
        Near(thrust, answer.Number("thrust_n"), Printed);
        Near(power, answer.Number("cutting_power_w"), Printed);
    }

    [Fact]
    public async Task The_least_limit_governs_and_a_closed_window_has_no_ends()
    {
        var open = await shop.App.Ask("cut", Of("cut").With("edge_radius_um", 30).With("band_power_w", 1500).With("push_limit_n", 1000));
        Assert.Equal("power", open.GetProperty("window").GetProperty("governed_by").GetString());
        Near(3.41479, open.Number("window.high_m_min"), Printed);

        // T3's push of 70 N stops at 0.324 m/min, below the feed at which 30 µm edges stop rubbing.
        var shut = await shop.App.Ask("cut", Of("cut").With("edge_radius_um", 30).With("band_power_w", 1500).With("push_limit_n", 70));
        Assert.Equal("push", shut.GetProperty("window").GetProperty("governed_by").GetString());
        Assert.Equal(System.Text.Json.JsonValueKind.Null, shut.GetProperty("window").GetProperty("low_m_min").ValueKind);
        Assert.Equal(System.Text.Json.JsonValueKind.Null, shut.GetProperty("window").GetProperty("high_m_min").ValueKind);
    }

    [Fact]
    public async Task Without_a_feed_only_the_limits_are_answered()
    {
        var answer = await shop.App.Ask("cut", Of("cut").With("feed_m_min", null));
        foreach (var atFeed in new[] { "bite_um", "gullet_fill", "tooth_force_n", "cutting_force_n", "thrust_n", "cutting_power_w", "regime" })
        {
            Assert.Equal(System.Text.Json.JsonValueKind.Null, answer.GetProperty(atFeed).ValueKind);
        }

        Assert.True(answer.Number("limits.gullet_m_min") > 0);
        Assert.True(answer.Number("wear_path_m_per_m2") > 0);
    }

    [Fact]
    public async Task A_wider_blade_turns_a_wider_curve()
    {
        // w²/(8(k − t)) − t/2 by geometry: 20²/(8·0.5) − 0.3.
        var answer = await shop.App.Ask("cut", Of("cut"));
        Near(99.7, answer.Number("curve.hard_min_radius_mm"), 1e-9);
        Near(1.45 * 99.7, answer.Number("curve.min_radius_mm"), 1e-9);
    }
}
