using BladeLog.Handbook.Quantities;

namespace BladeLog.Records;

public enum GrindKind
{
    /// <summary>Tooth faces only.</summary>
    Face,

    /// <summary>Faces, gullets and backs: also grinds out what starts in the gullet.</summary>
    FullProfile,
}

public sealed class Sharpening : Fact
{
    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;

    public GrindKind Kind { get; set; }

    public bool SetAgain { get; set; }

    public double? WidthM { get; set; }

    public string? WidthTyped { get; set; }

    public double? GulletM { get; set; }

    public double? KerfM { get; set; }

    /// <summary>Edge radius after, where somebody measured it.</summary>
    public double? EdgeAfterM { get; set; }

    public long? PriceMinor { get; set; }

    /// <summary>The batch it came back in; null: ground in the shop.</summary>
    public int? BatchId { get; set; }
}

public sealed class Joint : Fact
{
    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;

    public double LoopM { get; set; }

    public string? LoopTyped { get; set; }

    public WeldQuality Quality { get; set; }

    public string? Method { get; set; }
}

/// <summary>A blade cut down becomes a new one with its own tag; the parent is gone.</summary>
public sealed class Split : Fact
{
    public int ParentId { get; set; }

    public int ChildId { get; set; }

    /// <summary>Width of the child as it was cut from its parent.</summary>
    public double? WidthM { get; set; }
}

/// <summary>Use before this record began, as a range of life used.</summary>
public sealed class PriorUse : Fact
{
    public int BladeId { get; set; }

    public double UsedLow { get; set; }

    public double UsedHigh { get; set; }

    public double? WidthM { get; set; }

    public int? Sharpenings { get; set; }

    public string? Source { get; set; }
}

/// <summary>Where a blade was put.</summary>
public sealed class Hang : Fact
{
    public int BladeId { get; set; }

    /// <summary>Rack or bench.</summary>
    public Place Place { get; set; }

    public string? Hook { get; set; }
}

/// <summary>The two tags of a label clash put right.</summary>
public sealed class Retag : Fact
{
    public int BladeId { get; set; }

    public required string OldTag { get; set; }

    public required string NewTag { get; set; }
}

public sealed class Batch : Fact
{
    public required string Number { get; set; }

    public required string Service { get; set; }

    public DateTime? PromisedUtc { get; set; }

    public List<BatchLine> Lines { get; } = [];
}

public sealed class BatchLine : Fact
{
    public int BatchId { get; set; }

    public Batch Batch { get; set; } = null!;

    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;
}

public enum ReturnOutcome
{
    Sharpened,
    Rejected,
    Unsharpened,
    Lost,
}

public sealed class BatchReturn : Fact
{
    public int LineId { get; set; }

    public BatchLine Line { get; set; } = null!;

    public ReturnOutcome Outcome { get; set; }

    public double? WidthM { get; set; }
}

public sealed class TensionReading : Fact
{
    public int SawId { get; set; }

    public int BladeId { get; set; }

    public double TensionPa { get; set; }

    public required string Typed { get; set; }

    public required string How { get; set; }
}

/// <summary>The angle a blade leads at on a saw; good until it is next sharpened.</summary>
public sealed class Drift : Fact
{
    public int SawId { get; set; }

    public int BladeId { get; set; }

    public double AngleRad { get; set; }
}

public enum KerfHow
{
    /// <summary>A cut into waste, and feelers in the slot.</summary>
    TestCut,

    /// <summary>A caliper over the set teeth or the tips.</summary>
    OverTeeth,

    /// <summary>A dial gauge on single teeth, against the body.</summary>
    DialGauge,
}

/// <summary>
/// Kerf and set as measured outside a sharpening. Left and right are those of the blade as it runs, seen from the side
/// its teeth point to, the teeth pointing down. Good until the teeth are set again.
/// </summary>
public sealed class KerfReading : Fact
{
    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;

    /// <summary>Where the test cut was made.</summary>
    public int? SawId { get; set; }

    public Saw? Saw { get; set; }

    public KerfHow How { get; set; }

    public double? KerfM { get; set; }

    public string? KerfTyped { get; set; }

    public double? SetLeftM { get; set; }

    public double? SetRightM { get; set; }

    /// <summary>Both sides together: the sum of the two, or what was measured where the sides were not told apart.</summary>
    public double? SetBothM { get; set; }

    public string? SetTyped { get; set; }

    public string? Note { get; set; }
}

public sealed class StockMove : Fact
{
    public int SpecId { get; set; }

    public int Count { get; set; }

    public required string Reason { get; set; }
}
