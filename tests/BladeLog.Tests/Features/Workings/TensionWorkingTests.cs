using static BladeLog.Tests.Features.Workings.Bodies;

namespace BladeLog.Tests.Features.Workings;

/// <summary>The worked readings of the band-life specification, 1.3 (independent program), through the interface.</summary>
public sealed class TensionWorkingTests(EmptyShop shop) : IClassFixture<EmptyShop>
{
    private static Dictionary<string, string> Blade => Of("tension").With("wheel_load_n", null);

    [Fact]
    public async Task A_wheel_load_is_shared_by_two_strands()
    {
        var answer = await shop.App.Ask("tension", Blade.With("wheel_load_n", 1434));
        Near(100.028, answer.Number("tension_mpa"), 5e-6);
        Near(717, answer.Number("strand_force_n"), 1e-9);
        Near(0.8 * 100.028, answer.Number("low_mpa"), 1e-5);
        Near(1.2 * 100.028, answer.Number("high_mpa"), 1e-5);
        Assert.Equal("body", answer.GetProperty("section").GetString());
    }

    [Fact]
    public async Task A_pull_is_that_of_one_strand()
    {
        var answer = await shop.App.Ask("tension", Blade.With("force_n", 717));
        Near(100.028, answer.Number("tension_mpa"), 5e-6);
    }

    [Fact]
    public async Task A_stretch_follows_Hooke()
    {
        var answer = await shop.App.Ask("tension", Blade.With("stretch_mm", 0.125).With("gauge_length_mm", 250));
        Near(103.5, answer.Number("tension_mpa"), 1e-9);
    }

    [Fact]
    public async Task A_plucked_note_is_read_four_of_a_hundred_under_the_pinned_span()
    {
        // 98.5757 MPa is the pinned answer at 120 Hz on 450 mm, teeth weighed in; the wheels hold the ends somewhat.
        var answer = await shop.App.Ask("tension", Blade.With("pluck_hz", 120).With("free_span_mm", 450));
        Near(0.96 * 98.5757, answer.Number("tension_mpa"), 1e-5);
        Near(0.92 * 0.96 * 98.5757, answer.Number("low_mpa"), 1e-5);
        Near(1.08 * 0.96 * 98.5757, answer.Number("high_mpa"), 1e-5);
        Assert.Contains("fletcher-rossing", answer.GetProperty("sources").EnumerateArray().Select(s => s.GetString()));
    }
}
