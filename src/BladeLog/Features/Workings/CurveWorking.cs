using System.Text.Json.Serialization;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui.Json;

namespace BladeLog.Features.Workings;

internal sealed record CurveIn
{
    [Field("width_mm", "the width over the teeth in mm", Over = 0, Most = 500)]
    public required double Width { get; init; }

    [Field("thickness_mm", "the band's thickness in mm", Over = 0, Most = 5)]
    public required double Thickness { get; init; }

    [Field("kerf_mm", "the kerf in mm", Over = 0, Most = 20)]
    public required double Kerf { get; init; }

    [Field("radius_mm", "the radius wanted in mm", Over = 0, Most = 100000)]
    public double? Radius { get; init; }
}

internal sealed record CurveAnswer(
    [property: JsonPropertyName("min_radius_mm")] double Usual,
    [property: JsonPropertyName("hard_min_radius_mm")] double Hard,
    [property: JsonPropertyName("table_radius_mm")] double Table,
    [property: JsonPropertyName("widest_blade_mm")] double? Widest,
    [property: JsonPropertyName("sources")] IReadOnlyList<string> Sources,
    [property: JsonPropertyName("cautions")] IReadOnlyList<string> Cautions);

internal static class CurveWorking
{
    public static CurveAnswer? Answer(CurveIn body, BodyReader reader)
    {
        if (body.Kerf <= body.Thickness)
        {
            reader.Say("kerf_mm", $"A kerf of {body.Kerf} mm leaves no play beside a body of {body.Thickness} mm: no curve can be cut.");
            return null;
        }

        Length width = Length.FromMillimetres(body.Width), thickness = Length.FromMillimetres(body.Thickness), kerf = Length.FromMillimetres(body.Kerf);
        return new CurveAnswer(
            CurveRadius.Usual(width, kerf, thickness).Millimetres,
            CurveRadius.Hard(width, kerf, thickness).Millimetres,
            CurveRadius.PowerFit(width).Millimetres,
            body.Radius is { } r ? CurveRadius.WidestBlade(Length.FromMillimetres(r), kerf, thickness).Millimetres : null,
            ["derived", "radius-tables"],
            ["Do not back out of a curve with the saw running fast: it pulls the blade off its wheels."]);
    }
}
