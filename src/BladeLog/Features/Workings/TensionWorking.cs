using System.Text.Json.Serialization;
using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui.Json;

namespace BladeLog.Features.Workings;

internal sealed record TensionIn
{
    [Field("thickness_mm", "the band's thickness in mm", Over = 0, Most = 5)]
    public required double Thickness { get; init; }

    [Field("width_mm", "the width over the teeth in mm", Over = 0, Most = 500)]
    public required double Width { get; init; }

    [Field("gullet_mm", "the gullet depth in mm", Least = 0, Most = 100)]
    public required double Gullet { get; init; }

    [Field("force_n", "the pull in one strand in N", Over = 0, Most = 1e6)]
    public double? Force { get; init; }

    [Field("wheel_load_n", "the load on the movable wheel in N", Over = 0, Most = 2e6)]
    public double? WheelLoad { get; init; }

    [Field("stretch_mm", "the stretch of the gauge length in mm", Over = 0, Most = 50)]
    public double? Stretch { get; init; }

    [Field("gauge_length_mm", "the gauge length in mm", Least = 10, Most = 10000)]
    public double? GaugeLength { get; init; }

    [Field("pluck_hz", "the note of the plucked span in Hz", Over = 0, Most = 20000)]
    public double? Pluck { get; init; }

    [Field("free_span_mm", "the free span between the wheels in mm", Least = 150, Most = 10000)]
    public double? FreeSpan { get; init; }
}

internal sealed record TensionOut(
    [property: JsonPropertyName("tension_mpa")] double Tension,
    [property: JsonPropertyName("low_mpa")] double Low,
    [property: JsonPropertyName("high_mpa")] double High,
    [property: JsonPropertyName("strand_force_n")] double StrandForce,
    [property: JsonPropertyName("section")] string Section,
    [property: JsonPropertyName("sources")] IReadOnlyList<string> Sources,
    [property: JsonPropertyName("cautions")] IReadOnlyList<string> Cautions);

internal static class TensionWorking
{
    public static TensionOut? Answer(TensionIn body, BodyReader reader)
    {
        if (body.Gullet >= body.Width)
        {
            reader.Say("gullet_mm", $"A gullet {body.Gullet} mm deep leaves no body in a blade {body.Width} mm wide.");
        }

        Pair(reader, body.Stretch, "stretch_mm", body.GaugeLength, "gauge_length_mm", "the stretch and the length it was measured over");
        Pair(reader, body.Pluck, "pluck_hz", body.FreeSpan, "free_span_mm", "the note and the free span");
        var given = new[] { body.Force, body.WheelLoad, body.Stretch, body.Pluck }.Count(v => v is not null);
        if (given != 1)
        {
            reader.Say("body", "Give one of: force_n, wheel_load_n, stretch_mm with gauge_length_mm, or pluck_hz with free_span_mm.");
        }

        if (reader.Errors.Count > 0)
        {
            return null;
        }

        Length t = Length.FromMillimetres(body.Thickness), b = Length.FromMillimetres(body.Width - body.Gullet);
        var (tension, method) = body switch
        {
            { Force: { } force } => (Tension.FromStrandForce(new Force(force), t, b), TensionMethod.StrandForce),
            { WheelLoad: { } load } => (Tension.FromWheelLoad(new Force(load), t, b), TensionMethod.WheelLoad),
            { Stretch: { } stretch } => (Tension.FromStretch(Length.FromMillimetres(stretch), Length.FromMillimetres(body.GaugeLength!.Value), Steel.Carbon.YoungsModulus), TensionMethod.Stretch),
            _ => (Tension.FromPluck(new Frequency(body.Pluck!.Value), Length.FromMillimetres(body.FreeSpan!.Value), t, b, Length.FromMillimetres(body.Gullet), Steel.Carbon), TensionMethod.Pluck),
        };
        var reading = TensionReading.Of(tension, method);
        return new TensionOut(
            reading.Value.Megapascals,
            reading.Low.Megapascals,
            reading.High.Megapascals,
            Tension.StrandForce(reading.Value, t, b).Newtons,
            "body",
            method == TensionMethod.Pluck ? ["derived", "fletcher-rossing", "engineering-default"] : ["derived", "engineering-default"],
            ["Do not exceed the tension the saw's maker states."]);
    }

    private static void Pair(BodyReader reader, double? a, string nameA, double? b, string nameB, string both)
    {
        if (a is null != b is null)
        {
            reader.Say(a is null ? nameA : nameB, $"Missing: give both {both}.");
        }
    }
}
