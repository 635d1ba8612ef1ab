using BladeLog.Handbook.Quantities;

namespace BladeLog.Records;

/// <summary>How a tension is known.</summary>
public enum TensionKnown
{
    Unknown,

    /// <summary>Set by the saw's own scale or by the specification's target, not measured.</summary>
    Target,
    Measured,
}

/// <summary>A blade goes on a saw. A spell is a mount and its dismount.</summary>
public sealed class Mount : Fact
{
    public int SawId { get; set; }

    public Saw Saw { get; set; } = null!;

    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;

    /// <summary>On the body section.</summary>
    public double? TensionPa { get; set; }

    public string? TensionTyped { get; set; }

    public TensionKnown TensionKnown { get; set; }

    public bool InsideOut { get; set; }

    /// <summary>Recorded although it does not fit: the reason given with the extra tap.</summary>
    public string? Although { get; set; }
}

public enum OffReason
{
    StillSharp,
    Dull,
    CrackOrClicking,
    Broke,
    OtherWork,
    FoundOff,
}

public sealed class Dismount : Fact
{
    public int MountId { get; set; }

    public Mount Mount { get; set; } = null!;

    public OffReason Reason { get; set; }
}

/// <summary>The tension let off at the end of the day, or put on again.</summary>
public sealed class Slack : Fact
{
    public int SawId { get; set; }

    public Saw Saw { get; set; } = null!;

    public bool LetOff { get; set; }
}

public enum EpochReason
{
    First,
    NewMeter,
    RolledOver,
    RolledBack,
}

/// <summary>Readings belong to an epoch; a replaced, rolled over or rolled back meter starts a new one.</summary>
public sealed class MeterEpoch : Fact
{
    public int SawId { get; set; }

    public EpochReason Reason { get; set; }

    /// <summary>What the meter stood at when the epoch began; below zero where it rolled over.</summary>
    public long StartReadingMs { get; set; }
}

public sealed class MeterReading : Fact
{
    public int SawId { get; set; }

    public int EpochId { get; set; }

    public long ReadingMs { get; set; }

    public required string ReadingTyped { get; set; }
}

/// <summary>How good the hours are: A meter, B timer or logger, C start and stop, D typed, E derived from cuts.</summary>
public enum HoursGrade
{
    A,
    B,
    C,
    D,
    E,
}

public enum RunSource
{
    Meter,
    Timer,
    Logger,
    Typed,
    FromCuts,
}

/// <summary>Wheels turned on a saw. It belongs to the saw; which blades it flexed is derived.</summary>
public sealed class Run : Fact
{
    public int SawId { get; set; }

    public Saw Saw { get; set; } = null!;

    public DateTime FromUtc { get; set; }

    public DateTime UntilUtc { get; set; }

    public long RunningMs { get; set; }

    public string? RunningTyped { get; set; }

    public double SpeedMps { get; set; }

    public HoursGrade Grade { get; set; }

    public RunSource Source { get; set; }

    public int? ReadingId { get; set; }

    /// <summary>The start of the timer these hours were stopped from.</summary>
    public int? TimerId { get; set; }
}

public enum FeedGrade
{
    Timed,
    Typed,
    Assumed,
}

/// <summary>
/// A cut that was made. Its time is when it ended; the spell it was cut in is whatever was on the saw then, so a mount
/// entered late or struck out moves the cut with it.
/// </summary>
public sealed class CutDone : Fact
{
    public int SawId { get; set; }

    public Saw Saw { get; set; } = null!;

    public int? QueuedCutId { get; set; }

    public MaterialKind Material { get; set; }

    public required string SpeciesKey { get; set; }

    public required string SpeciesTyped { get; set; }

    /// <summary>Abrasiveness class of the handbook, A1 to A5, or P for panels; the factor is applied when asked.</summary>
    public required string WoodClass { get; set; }

    public double HeightM { get; set; }

    public string? HeightTyped { get; set; }

    public double LengthM { get; set; }

    public string? LengthTyped { get; set; }

    public int Pieces { get; set; } = 1;

    public double FeedMps { get; set; }

    public FeedGrade FeedGrade { get; set; }

    public double SpeedMps { get; set; }

    public double? MoisturePct { get; set; }

    public bool Frozen { get; set; }

    public Dirt Dirt { get; set; }

    public bool Nail { get; set; }
}
