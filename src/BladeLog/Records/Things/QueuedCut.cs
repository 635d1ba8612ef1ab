using BladeLog.Handbook.Quantities;

namespace BladeLog.Records;

public enum CutKind
{
    Board,
    Resaw,
    Beam,
    Log,
}

/// <summary>A job waiting to be cut. Height is the wood along the blade.</summary>
public sealed class QueuedCut : Thing
{
    public int Number { get; set; }

    public required string Job { get; set; }

    public MaterialKind Material { get; set; }

    /// <summary>Key of the wood or panel in the handbook's table; for other materials the word.</summary>
    public required string SpeciesKey { get; set; }

    public required string SpeciesTyped { get; set; }

    /// <summary>The name it was understood as, where that is not what was typed.</summary>
    public string? TakenAs { get; set; }

    public double HeightM { get; set; }

    public string? HeightTyped { get; set; }

    public double LengthM { get; set; }

    public string? LengthTyped { get; set; }

    public int Pieces { get; set; } = 1;

    public double? RadiusM { get; set; }

    public string? RadiusTyped { get; set; }

    public double BevelRad { get; set; }

    public double? MoisturePct { get; set; }

    public bool Frozen { get; set; }

    public Dirt Dirt { get; set; }

    public CutDirection Direction { get; set; }

    public CutKind Kind { get; set; }

    public Finish Finish { get; set; }

    /// <summary>0 to 1.</summary>
    public double NailChance { get; set; }

    public long? TimberMinorPerM3 { get; set; }

    public bool ClassWork { get; set; }

    public int Order { get; set; }

    public DateOnly? Due { get; set; }

    public int? DoneEntryId { get; set; }

    public DateTime AddedUtc { get; set; }

    /// <summary>Cut off the list without being cut.</summary>
    public DateTime? DroppedUtc { get; set; }
}
