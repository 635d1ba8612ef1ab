using BladeLog.Handbook.Quantities;

namespace BladeLog.Records.Writing;

public sealed record AddSpec(Spec Spec) : Command;

public sealed record EditSpec(string Code, int Version, Spec Spec) : Command;

/// <summary>One blade or several of a kind, each with its tag.</summary>
public sealed record AddBlades(string Spec, IReadOnlyList<string> Tags) : Command
{
    public bool Folded { get; init; }

    public double? MeasuredThicknessM { get; init; }

    public double? MeasuredHrc { get; init; }

    public double? InspectEveryH { get; init; }

    public bool InspectEachMount { get; init; }

    public DateTime? At { get; init; }
}

public sealed record EditBlade(string Tag, int Version, string Spec) : Command
{
    public bool Folded { get; init; }

    public double? MeasuredThicknessM { get; init; }

    public double? MeasuredHrc { get; init; }

    public double? InspectEveryH { get; init; }

    public bool InspectEachMount { get; init; }
}

/// <summary>A new label on a blade. The old one is kept and never used again.</summary>
public sealed record RetagBlade(string Tag, string NewTag, DateTime? At = null) : Command;

/// <summary>
/// Two blades wore one label: from a time on, what is written of it happened to the other. That one has its own label by
/// now; where it is new to the record, of a specification.
/// </summary>
public sealed record SplitLabel(string Tag, string OtherTag, DateTime FromUtc, string Reason) : Command
{
    public string? Spec { get; init; }
}

/// <summary>Use before this record began, as a range of the life used, 0 to 1.</summary>
public sealed record RecordPriorUse(
    string Tag, double UsedLow, double UsedHigh, double? WidthM = null, int? Sharpenings = null, string? Source = null, DateTime? At = null) : Command;

public sealed record RecordJoint(string Tag, double LoopM, string? LoopTyped, WeldQuality Quality, string? Method = null, DateTime? At = null) : Command
{
    /// <summary>One more tap: no saw here takes it, and yet it is that long.</summary>
    public bool FitsNone { get; init; }
}

/// <summary>A blade shortened for a smaller saw: a new blade with its own tag and joint; the parent is gone.</summary>
public sealed record CutDown(string ParentTag, string ChildTag, double LoopM, string? LoopTyped, WeldQuality Quality) : Command
{
    public string? Method { get; init; }

    /// <summary>Null: as wide as its parent.</summary>
    public double? WidthM { get; init; }

    /// <summary>Null: of the parent's specification.</summary>
    public string? Spec { get; init; }

    public double? InspectEveryH { get; init; }

    public bool InspectEachMount { get; init; }

    public DateTime? At { get; init; }
}

/// <summary>Where a blade was put: a hook of the rack, or the bench.</summary>
public sealed record HangUp(string Tag, Place Place, string? Hook = null, DateTime? At = null) : Command;

public sealed record RecordStock(string Spec, int Count, string Reason, DateTime? At = null) : Command;
