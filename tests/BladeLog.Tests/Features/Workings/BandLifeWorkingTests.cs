using static BladeLog.Tests.Features.Workings.Bodies;

namespace BladeLog.Tests.Features.Workings;

/// <summary>The worked band of the band-life specification, section 8 (independent program), through the interface.</summary>
public sealed class BandLifeWorkingTests(EmptyShop shop) : IClassFixture<EmptyShop>
{
    private const double Printed = 1e-5;

    [Theory]
    [InlineData("bending_mpa.0", 371.467)]
    [InlineData("bending_mpa.1", 371.467)]
    [InlineData("running_tension_mpa", 101.766)]
    [InlineData("bends_per_hour", 2 * 3600 * 15 / 2.36)]
    [InlineData("gullet.equivalent_amplitude_mpa.0", 398.147)]
    [InlineData("gullet.median_bends", 7.21621e6)]
    [InlineData("gullet.median_hours", 157.688)]
    [InlineData("weld.equivalent_amplitude_mpa.0", 351.414)]
    [InlineData("weld.median_bends", 7.44657e6)]
    [InlineData("weld.median_hours", 162.721)]
    [InlineData("blade.median_bends", 5.18216e6)]
    [InlineData("blade.median_hours", 113.240)]
    [InlineData("blade.tenth_percentile_bends", 2.02040e6)]
    public async Task The_worked_band_lives_as_long_as_the_independent_program_says(string path, double expected)
    {
        var answer = await shop.App.Ask("band-life", Of("band-life"));
        Near(expected, answer.Number(path), Printed);
        Assert.Equal("finite", answer.GetProperty("verdict").GetString());
    }

    [Theory]
    [InlineData("gullet.equivalent_amplitude_mpa.0", 359.143)]
    [InlineData("gullet.median_bends", 752_738)]
    [InlineData("gullet.median_hours", 16.4487)]
    [InlineData("weld.equivalent_amplitude_mpa.0", 332.657)]
    [InlineData("weld.median_bends", 1.64951e6)]
    [InlineData("weld.median_hours", 36.0450)]
    [InlineData("blade.median_bends", 684_804)]
    [InlineData("blade.median_hours", 14.9642)]
    [InlineData("blade.tenth_percentile_bends", 266_988)]
    public async Task A_soft_body_lives_as_short_as_the_independent_program_says(string path, double expected)
    {
        var answer = await shop.App.Ask("band-life", Of("band-life").With("body_hrc", 30));
        Near(expected, answer.Number(path), Printed);
    }

    [Fact]
    public async Task Beyond_the_knee_a_band_on_large_wheels_is_not_limited_by_bending()
    {
        var answer = await shop.App.Ask("band-life", Of("band-life")
            .With("thickness_mm", 0.9).With("wheels_mm", "[900,900]").With("band_speed_m_s", 30).With("tension_mpa", 140).With("body_hrc", 44).With("loop_mm", 6000));
        Near(206.793, answer.Number("bending_mpa.0"), Printed);
        Near(252.980, answer.Number("gullet.equivalent_amplitude_mpa.0"), Printed);
        Near(1.34567e10, answer.Number("gullet.median_bends"), Printed);
        Assert.Equal("not_limiting", answer.GetProperty("verdict").GetString());
    }

    [Fact]
    public async Task A_valley_in_the_cut_makes_one_bend_of_the_loop_larger()
    {
        var answer = await shop.App.Ask("band-life", Of("band-life").With("cut_valley_mpa", 40));
        var amplitudes = answer.GetProperty("gullet").GetProperty("equivalent_amplitude_mpa").EnumerateArray().Select(a => a.GetDouble()).Order().ToArray();
        Near(398.147, amplitudes[0], Printed);
        Near(432.829, amplitudes[1], Printed);
        // Two bends a loop, one of each life of the printed trace, summed after Miner.
        Near(2 / (1 / 7.21621e6 + 1 / 3.12327e6), answer.Number("gullet.median_bends"), Printed);
    }

    [Fact]
    public async Task A_locked_saw_gains_no_tension_from_speed()
    {
        var answer = await shop.App.Ask("band-life", Of("band-life").With("tension_system", "\"locked\""));
        Near(100, answer.Number("running_tension_mpa"), 1e-12);
    }

    [Fact]
    public async Task A_doubtful_weld_shortens_the_weld_alone()
    {
        var good = await shop.App.Ask("band-life", Of("band-life"));
        var doubtful = await shop.App.Ask("band-life", Of("band-life").With("weld", "\"doubtful\""));
        Assert.True(doubtful.Number("weld.median_bends") < 0.8 * good.Number("weld.median_bends"));
        Assert.Equal(good.Number("gullet.median_bends"), doubtful.Number("gullet.median_bends"));
    }

    [Fact]
    public async Task A_band_that_takes_a_set_is_said_to()
    {
        // 1.2 mm on 200 mm wheels bends to 1.2/201.2 of strain, 1,235 MPa; with 100 MPa of tension that passes 0.9 of the strength of 40 HRC steel.
        var answer = await shop.App.Ask("band-life", Of("band-life").With("thickness_mm", 1.2).With("wheels_mm", "[200]").With("body_hrc", 40));
        Assert.Contains(answer.GetProperty("cautions").EnumerateArray(), c => c.GetString()!.Contains("set", StringComparison.Ordinal));
    }
}
