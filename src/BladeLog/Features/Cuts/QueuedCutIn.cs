using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui.Json;

namespace BladeLog.Features.Cuts;

/// <summary>Jobs for the list, all of them or none.</summary>
internal sealed record CutsIn
{
    [Field("op", "the op, made once for each sending")]
    public required Guid Op { get; init; }

    [Field("cuts", "the cuts", Longest = 200)]
    public required List<QueuedCutIn> Cuts { get; init; }
}

internal sealed record QueuedCutIn
{
    [Field("job", "what it is for", Longest = 100)]
    public required string Job { get; init; }

    [Field("species", "the wood", Longest = 60)]
    public required string Species { get; init; }

    [Field("height_mm", "the height of the wood along the blade in mm", Over = 0, Most = 5000)]
    public required double Height { get; init; }

    [Field("length_mm", "the length of one cut in mm", Over = 0, Most = 50000)]
    public required double Length { get; init; }

    [Field("pieces", "the number of cuts", Least = 1, Most = 10000)]
    public required int Pieces { get; init; }

    [Field("tightest_radius_mm", "the tightest radius in mm", Over = 0, Most = 100000)]
    public double? Radius { get; init; }

    [Field("bevel_deg", "the bevel in degrees", Least = 0, Most = 60)]
    public double Bevel { get; init; }

    [Field("moisture_pct", "the moisture in per cent of dry weight", Least = 0, Most = 300)]
    public double? Moisture { get; init; }

    [Field("frozen", "whether the wood is frozen")]
    public bool Frozen { get; init; }

    [Field("dirt", "the dirt")]
    public Dirt Dirt { get; init; }

    [Field("direction", "the direction of the cut")]
    public CutDirection Direction { get; init; }

    [Field("for_class", "whether a class cuts it")]
    public bool ForClass { get; init; }

    [Field("kind", "the kind of work")]
    public required CutKind Kind { get; init; }

    [Field("finish", "the finish")]
    public required Finish Finish { get; init; }

    [Field("nail_chance", "the chance of a nail", Least = 0, Most = 1)]
    public double NailChance { get; init; }

    [Field("timber_value_minor_per_m3", "the value of the timber in minor units per m³", Least = 0, Most = 1e12)]
    public double? TimberValue { get; init; }

    [Field("due", "the day it is due")]
    public DateOnly? Due { get; init; }

    /// <summary>The row of the list; null with its sentence said where the wood is not known.</summary>
    public QueuedCut? Queued(Guid uid, string at, BodyReader reader)
    {
        if (Wood.Read(Species, out var wrong) is not { } wood)
        {
            reader.Say($"{at}.species", wrong!);
            return null;
        }

        return new QueuedCut
        {
            Uid = uid,
            Job = Job,
            Material = wood.Kind,
            SpeciesKey = wood.Key,
            SpeciesTyped = wood.Typed,
            TakenAs = wood.TakenAs,
            HeightM = Height / 1e3,
            LengthM = Length / 1e3,
            Pieces = Pieces,
            RadiusM = Radius / 1e3,
            BevelRad = Angle.FromDegrees(Bevel).Radians,
            MoisturePct = Moisture,
            Frozen = Frozen,
            Dirt = Dirt,
            Direction = Direction,
            ClassWork = ForClass,
            Kind = Kind,
            Finish = Finish,
            NailChance = NailChance,
            TimberMinorPerM3 = TimberValue is { } value ? (long)Math.Round(value) : null,
            Due = Due,
        };
    }
}
