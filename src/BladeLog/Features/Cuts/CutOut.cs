using System.Text.Json.Serialization;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Features.Cuts;

/// <summary>A cut on the list.</summary>
internal sealed record QueuedCutOut(
    [property: JsonPropertyName("number")] int Number,
    [property: JsonPropertyName("job")] string Job,
    [property: JsonPropertyName("species")] string Species,
    [property: JsonPropertyName("taken_as")] string? TakenAs,
    [property: JsonPropertyName("height_mm")] double Height,
    [property: JsonPropertyName("length_mm")] double Length,
    [property: JsonPropertyName("pieces")] int Pieces,
    [property: JsonPropertyName("tightest_radius_mm")] double? Radius,
    [property: JsonPropertyName("bevel_deg")] double Bevel,
    [property: JsonPropertyName("moisture_pct")] double? Moisture,
    [property: JsonPropertyName("frozen")] bool Frozen,
    [property: JsonPropertyName("dirt")] Dirt Dirt,
    [property: JsonPropertyName("direction")] CutDirection Direction,
    [property: JsonPropertyName("for_class")] bool ForClass,
    [property: JsonPropertyName("kind")] CutKind Kind,
    [property: JsonPropertyName("finish")] Finish Finish,
    [property: JsonPropertyName("nail_chance")] double NailChance,
    [property: JsonPropertyName("timber_value_minor_per_m3")] long? TimberValue,
    [property: JsonPropertyName("due")] DateOnly? Due,
    [property: JsonPropertyName("done")] bool Done)
{
    public static QueuedCutOut Of(QueuedCut cut) => new(
        cut.Number,
        cut.Job,
        cut.SpeciesTyped,
        cut.TakenAs,
        cut.HeightM * 1e3,
        cut.LengthM * 1e3,
        cut.Pieces,
        JsonAnswers.Mm(cut.RadiusM),
        new Angle(cut.BevelRad).Degrees,
        cut.MoisturePct,
        cut.Frozen,
        cut.Dirt,
        cut.Direction,
        cut.ClassWork,
        cut.Kind,
        cut.Finish,
        cut.NailChance,
        cut.TimberMinorPerM3,
        cut.Due,
        cut.DoneEntryId is not null);
}

internal sealed record AddedCut(
    [property: JsonPropertyName("number")] int Number,
    [property: JsonPropertyName("species")] string Species,
    [property: JsonPropertyName("taken_as")] string? TakenAs);

/// <summary>What was put on the list, in the order sent.</summary>
internal sealed record CutsAdded([property: JsonPropertyName("cuts")] IReadOnlyList<AddedCut> Cuts);
