using System.Globalization;
using static BladeLog.Tests.Features.Workings.Bodies;

namespace BladeLog.Tests.Features.Workings;

/// <summary>All 26 bands of the band stability specification (independent program, E = 206 GPa) through the interface.</summary>
public sealed class ThrustLimitsWorkingTests(EmptyShop shop) : IClassFixture<EmptyShop>
{
    private static readonly Dictionary<string, Dictionary<string, double>> Rows = Read();

    public static TheoryData<string> Ids => [.. Rows.Keys];

    [Fact]
    public void All_twenty_six_bands_are_there() => Assert.Equal(26, Rows.Count);

    [Theory]
    [MemberData(nameof(Ids))]
    public async Task A_band_stands_the_thrust_of_the_reference(string id)
    {
        var row = Rows[id];
        var still = await shop.App.Ask("thrust-limits", Body(row));
        Near(row["P1_N"], still.Number("front_edge_n"), 1e-3);
        Near(row["PcrBeamPB_N12"], still.Number("buckling_n"), 1e-3);
        Near(row["PcrPlate_N12K6"], still.Number("plate_buckling_n"), 5e-3);
        Near(row["Pallow"], still.Number("allowed_n"), 5e-3);
        Near(row["k0_pt_beam"], still.Number("tip_stiffness_n_per_mm"), 5e-3);
        Near(row["kAllow_pt_beam"], still.Number("tip_stiffness_at_allowed_n_per_mm"), 5e-3);
        Near(row["f_lat0"], still.Number("lateral_hz"), 1e-3);
        Near(row["f_tor0"], still.Number("torsional_hz"), 1e-3);

        var running = await shop.App.Ask("thrust-limits", Body(row).With("band_speed_m_s", row["v"]));
        Near(row["f_latv"], running.Number("lateral_hz"), 1e-3);
        Near(row["f_torv"], running.Number("torsional_hz"), 1e-3);
    }

    [Fact]
    public async Task A_guessed_tension_takes_a_fifth_off_the_green_limit()
    {
        var known = await shop.App.Ask("thrust-limits", Body(Rows["A8"]));
        var guessed = await shop.App.Ask("thrust-limits", Body(Rows["A8"]).With("tension_guessed", "true"));
        Assert.Equal("front_edge", guessed.GetProperty("governed_by").GetString());
        Near(known.Number("front_edge_n") / 1.25, guessed.Number("allowed_n"), 1e-12);
        Near(known.Number("stop_n"), guessed.Number("stop_n"), 1e-12);
    }

    [Fact]
    public async Task The_cut_stands_at_mid_span_unless_said()
    {
        var row = Rows["A12"];
        var middle = await shop.App.Ask("thrust-limits", Body(row).With("cut_centre_mm", null));
        Near(row["P1_N"], middle.Number("front_edge_n"), 1e-3);
    }

    private static Dictionary<string, string> Body(Dictionary<string, double> row) => Of("thrust-limits")
        .With("width_mm", row["w"]).With("thickness_mm", row["t"]).With("gullet_mm", row["g"]).With("tension_mpa", row["sigma"])
        .With("guide_span_mm", row["S"]).With("cut_height_mm", row["h"]).With("cut_centre_mm", row["xc"]).With("youngs_gpa", 206);

    private static Dictionary<string, Dictionary<string, double>> Read()
    {
        var lines = File.ReadAllLines(Path.Combine(AppContext.BaseDirectory, "Cases", "beam-strength.csv"));
        var names = lines[0].Split(',');
        return lines[1..].Where(l => l.Length > 0).Select(l => l.Split(',')).ToDictionary(
            cells => cells[0],
            cells => names.Zip(cells).Skip(1).ToDictionary(c => c.First, c => double.Parse(c.Second, CultureInfo.InvariantCulture)));
    }
}
