using System.Text.Json.Serialization;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Wear;
using BladeLog.Ui.Json;

namespace BladeLog.Features.Workings;

internal sealed record WearIn
{
    [Field("fresh_radius_um", "the edge radius after the last grind in µm", Over = 0, Most = 200)]
    public required double Fresh { get; init; }

    [Field("dull_radius_um", "the edge radius that counts as dull in µm", Over = 0, Most = 500)]
    public double Dull { get; init; } = 40;

    [Field("wear_um_km", "the wear in µm for a km of clean medium wood", Over = 0, Most = 100)]
    public required double Wear { get; init; }

    [Field("path_km", "the path of a tooth since the last grind in km", Least = 0, Most = 10000)]
    public required double Path { get; init; }

    [Field("wood_factor", "the wear of the wood against a clean medium one, dirt counted in", Over = 0, Most = 200)]
    public double Factor { get; init; } = 1;

    [Field("feed_m_min", "the feed in m/min", Over = 0, Most = 200)]
    public required double Feed { get; init; }

    [Field("loop_mm", "the length of the loop in mm", Over = 0, Most = 50000)]
    public required double Loop { get; init; }

    [Field("band_speed_m_s", "the band speed in m/s", Over = 0, Most = 100)]
    public required double BandSpeed { get; init; }

    [Field("cut_height_mm", "the height of the wood along the blade in mm", Over = 0, Most = 5000)]
    public required double CutHeight { get; init; }
}

internal sealed record WearOut(
    [property: JsonPropertyName("edge_radius_um")] double EdgeRadius,
    [property: JsonPropertyName("path_to_dull_km")] double PathToDull,
    [property: JsonPropertyName("path_left_km")] double PathLeft,
    [property: JsonPropertyName("wear_path_m_per_m2")] double WearPath,
    [property: JsonPropertyName("area_left_m2")] double AreaLeft,
    [property: JsonPropertyName("length_left_m")] double LengthLeft,
    [property: JsonPropertyName("sources")] IReadOnlyList<string> Sources,
    [property: JsonPropertyName("cautions")] IReadOnlyList<string> Cautions);

internal static class WearWorking
{
    public static WearOut? Answer(WearIn body, BodyReader reader)
    {
        if (body.Dull <= body.Fresh)
        {
            reader.Say("dull_radius_um", $"An edge that counts as dull at {body.Dull} µm is dull when fresh at {body.Fresh} µm.");
            return null;
        }

        Length fresh = Length.FromMicrometres(body.Fresh);
        double toDull = EdgeRadius.PathTo(Length.FromMicrometres(body.Dull), fresh, body.Wear), left = Math.Max(0, toDull - body.Path);
        double each = Kinematics.WoodPathPerTooth(new Area(1), Speed.FromMetresPerMinute(body.Feed), Length.FromMillimetres(body.Loop), new Speed(body.BandSpeed)).Metres;
        double area = left * 1000 / (each * body.Factor);
        return new WearOut(
            EdgeRadius.After(fresh, body.Wear, body.Path).Micrometres, toDull, left, each, area, area / Length.FromMillimetres(body.CutHeight).Metres,
            ["engineering-default", "derived"],
            ["Wear rates are known within a factor of about 2.5 until your own sharpenings teach them. A nail, grit or a burn ends an edge at once."]);
    }
}
