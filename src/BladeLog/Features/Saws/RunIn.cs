using System.Text.Json.Serialization;
using BladeLog.Records;
using BladeLog.Ui.Json;

namespace BladeLog.Features.Saws;

/// <summary>Running of a saw: hours over a window, or what its meter stood at in the end.</summary>
internal sealed record RunIn
{
    [Field("saw", "the saw's code", Longest = 40)]
    public required string Saw { get; init; }

    [Field("op", "the op, made once for each sending")]
    public required Guid Op { get; init; }

    [Field("from", "when the window begins")]
    public DateTimeOffset? From { get; init; }

    [Field("until", "when the window ends")]
    public required DateTimeOffset Until { get; init; }

    [Field("hours", "the running hours", Over = 0, Most = 10000)]
    public double? Hours { get; init; }

    [Field("meter_reading", "the hour meter's reading in hours", Least = 0, Most = 1e6)]
    public double? MeterReading { get; init; }

    [Field("speed_m_s", "the band speed in m/s", Over = 0, Most = 100)]
    public double? Speed { get; init; }

    [Field("source", "the source of the hours")]
    public required RunSource Source { get; init; }
}

internal sealed record RecordedRun(
    [property: JsonPropertyName("from")] DateTime From,
    [property: JsonPropertyName("until")] DateTime Until,
    [property: JsonPropertyName("hours")] double Hours,
    [property: JsonPropertyName("speed_m_s")] double Speed,
    [property: JsonPropertyName("source")] RunSource Source);

/// <summary>What was recorded. The first reading of a meter makes no run yet; a reading between two others makes two.</summary>
internal sealed record RunsOut(
    [property: JsonPropertyName("entry")] int Entry,
    [property: JsonPropertyName("saw")] string Saw,
    [property: JsonPropertyName("runs")] IReadOnlyList<RecordedRun> Runs);
