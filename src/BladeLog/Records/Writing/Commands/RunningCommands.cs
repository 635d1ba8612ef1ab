using System.Text.Json.Serialization;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Records.Writing;

/// <summary>Off with one blade, on with another, now or at an earlier time. Either may be left out.</summary>
public sealed record Swap(string Saw) : Command
{
    /// <summary>The saw's version as the form saw it: another tablet may have been quicker.</summary>
    public int? SawVersion { get; init; }

    /// <summary>The blade to go on; null: only take off.</summary>
    public string? OnTag { get; init; }

    public OffReason Reason { get; init; }

    public DateTime? At { get; init; }

    /// <summary>For a spell entered late: when it ended.</summary>
    public DateTime? Until { get; init; }

    public OffReason UntilReason { get; init; }

    /// <summary>On the body section.</summary>
    public double? TensionPa { get; init; }

    public string? TensionTyped { get; init; }

    public TensionKnown TensionKnown { get; init; }

    public bool InsideOut { get; init; }

    /// <summary>The reason given with the extra tap where the blade does not fit.</summary>
    public string? Although { get; init; }

    /// <summary>What the advice has against this blade on this saw, in sentences. Not part of what is recorded.</summary>
    [JsonIgnore]
    public IReadOnlyList<string> Unfit { get; init; } = [];
}

/// <summary>A spell that was another blade's: struck out and entered again for that one, in one group.</summary>
public sealed record MoveSpell(int MountEntryId, string ToTag, string Reason) : Command;

/// <summary>What a reading lower than the last, or higher than the clock allows, means.</summary>
public enum MeterAnswer
{
    NotAsked,
    NewMeter,
    RolledOver,
    RolledBack,
}

public sealed record ReadMeter(string Saw, long ReadingMs, string ReadingTyped) : Command
{
    public DateTime? At { get; init; }

    public MeterAnswer Answer { get; init; }

    /// <summary>With a new meter: what it stood at when it was put in, and when that was.</summary>
    public long NewMeterStartMs { get; init; }

    public DateTime? NewMeterAt { get; init; }

    /// <summary>With a rolled over one: what it counts to, 9999.9 h counting to 10,000 h.</summary>
    public long? RollsOverAtMs { get; init; }

    /// <summary>Null: the saw's usual speed.</summary>
    public double? SpeedMps { get; init; }

    /// <summary>Of the hours since the last reading, so many ran at the saw's other speed.</summary>
    [JsonIgnore(Condition = JsonIgnoreCondition.WhenWritingDefault)]
    public long OtherSpeedMs { get; init; }

    [JsonIgnore(Condition = JsonIgnoreCondition.WhenWritingDefault)]
    public double? OtherSpeedMps { get; init; }
}

/// <summary>Hours typed, timed or logged over a window.</summary>
public sealed record RecordHours(string Saw, DateTime FromUtc, DateTime UntilUtc, long RunningMs, RunSource Source) : Command
{
    public string? RunningTyped { get; init; }

    public double? SpeedMps { get; init; }

    /// <summary>Null: by the source.</summary>
    public HoursGrade? Grade { get; init; }

    /// <summary>Stopped from the saw's timer: its start, which must still run.</summary>
    public int? TimerId { get; init; }
}

/// <summary>The wheels start now; the hours come with the stop.</summary>
public sealed record StartTimer(string Saw, double? SpeedMps = null) : Command;

/// <summary>A cut that was made, from the list or not. Its time is when it ended.</summary>
public sealed record RecordCut(string Saw) : Command
{
    public DateTime? At { get; init; }

    public int? CutNumber { get; init; }

    public int? CutVersion { get; init; }

    /// <summary>False where the cut on the list is not finished yet.</summary>
    public bool Finishes { get; init; } = true;

    public MaterialKind Material { get; init; }

    public required string SpeciesKey { get; init; }

    public required string SpeciesTyped { get; init; }

    public required string WoodClass { get; init; }

    public double HeightM { get; init; }

    public string? HeightTyped { get; init; }

    public double LengthM { get; init; }

    public string? LengthTyped { get; init; }

    public int Pieces { get; init; } = 1;

    public double FeedMps { get; init; }

    public FeedGrade FeedGrade { get; init; }

    public double? SpeedMps { get; init; }

    public double? MoisturePct { get; init; }

    public bool Frozen { get; init; }

    public Dirt Dirt { get; init; }

    /// <summary>One more tap: hardly so, and yet cut.</summary>
    public bool AsTyped { get; init; }

    public bool Nail { get; init; }

    /// <summary>The saw's hours come from its cuts: a run is recorded for the part no other run covers.</summary>
    public bool HoursFromCuts { get; init; }
}

public sealed record RecordTension(string Saw, string? Tag, double TensionPa, string Typed, string How, DateTime? At = null) : Command;

/// <summary>The angle the blade leads at, until it is next sharpened.</summary>
public sealed record RecordDrift(string Saw, string? Tag, double AngleRad, DateTime? At = null) : Command;
