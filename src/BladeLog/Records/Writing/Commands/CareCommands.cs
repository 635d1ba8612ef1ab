using System.Text.Json.Serialization;

namespace BladeLog.Records.Writing;

public sealed record RecordSharpening(string Tag, GrindKind Kind) : Command
{
    public bool SetAgain { get; init; }

    public double? WidthM { get; init; }

    public string? WidthTyped { get; init; }

    public double? GulletM { get; init; }

    public double? KerfM { get; init; }

    public double? EdgeAfterM { get; init; }

    public long? PriceMinor { get; init; }

    public DateTime? At { get; init; }

    /// <summary>One more tap: hardly so, and yet measured.</summary>
    public bool AsMeasured { get; init; }

    /// <summary>What the advice takes as its least width. Not part of what is recorded.</summary>
    [JsonIgnore]
    public double? LeastWidthM { get; init; }
}

/// <summary>Kerf and set as measured outside a sharpening. The set is of both sides, or of both together.</summary>
public sealed record RecordKerf(string Tag, KerfHow How) : Command
{
    public string? Saw { get; init; }

    public double? KerfM { get; init; }

    public string? KerfTyped { get; init; }

    public double? SetLeftM { get; init; }

    public double? SetRightM { get; init; }

    public double? SetBothM { get; init; }

    public string? SetTyped { get; init; }

    public string? Note { get; init; }

    public DateTime? At { get; init; }

    /// <summary>One more tap: far wider than the body, and meant.</summary>
    public bool WideMeant { get; init; }
}

public sealed record SendBatch(string Number, string Service, IReadOnlyList<string> Tags, DateTime? PromisedUtc = null, DateTime? At = null) : Command;

/// <summary>What came back from the sharpener; what is not named stays away.</summary>
public sealed record TakeBack(string Number, IReadOnlyList<BackLine> Lines, DateTime? At = null) : Command;

/// <summary>One blade come back. A rejected one may be retired in the same breath.</summary>
public sealed record BackLine(string Tag, ReturnOutcome Outcome)
{
    public double? WidthM { get; init; }

    public GrindKind Kind { get; init; }

    public bool SetAgain { get; init; }

    public double? GulletM { get; init; }

    public double? KerfM { get; init; }

    public double? EdgeAfterM { get; init; }

    public long? PriceMinor { get; init; }

    public bool Retire { get; init; }

    /// <summary>One more tap: hardly so, and yet measured.</summary>
    [JsonIgnore(Condition = JsonIgnoreCondition.WhenWritingDefault)]
    public bool AsMeasured { get; init; }

    /// <summary>What the advice takes as its least width. Not part of what is recorded.</summary>
    [JsonIgnore]
    public double? LeastWidthM { get; init; }
}

public sealed record RecordHold(string Tag, HoldKind Kind) : Command
{
    public double? CrackLengthM { get; init; }

    public string? CrackTyped { get; init; }

    public CrackPlace? Place { get; init; }

    public string? Note { get; init; }

    public DateTime? At { get; init; }
}

/// <summary>Only by a person who may clear holds.</summary>
public sealed record ClearHold(string Tag, string How, DateTime? At = null) : Command;

/// <summary>A crack found puts the blade on hold in the same group.</summary>
public sealed record RecordInspection(string Tag, Found Found) : Command
{
    /// <summary>Null: not said.</summary>
    public LookedAt? LookedAt { get; init; }

    public BladeMarks? Marks { get; init; }

    public int? TeethMissing { get; init; }

    public double? CrackLengthM { get; init; }

    public string? CrackTyped { get; init; }

    public CrackPlace? Place { get; init; }

    public string? Note { get; init; }

    public DateTime? At { get; init; }
}

public sealed record RecordBreak(string Tag, BreakSite Site) : Command
{
    /// <summary>Null: the same as the latest.</summary>
    public DateTime? EarliestUtc { get; init; }

    /// <summary>Null: now.</summary>
    public DateTime? LatestUtc { get; init; }

    public double? HoursLow { get; init; }

    public double? HoursHigh { get; init; }

    public double? MinutesLost { get; init; }

    public long? CostMinor { get; init; }

    public string? Note { get; init; }
}

/// <summary>What was learned of a break later: the entry is struck out and entered again with it, at its own time.</summary>
public sealed record CompleteBreak(int EntryId, BreakSite Site) : Command
{
    public double? HoursLow { get; init; }

    public double? HoursHigh { get; init; }

    public double? MinutesLost { get; init; }

    public long? CostMinor { get; init; }

    public string? Note { get; init; }
}

public sealed record RecordRetirement(string Tag, RetireReason Reason) : Command
{
    public bool CutUp { get; init; }

    public string? Note { get; init; }

    public DateTime? At { get; init; }

    /// <summary>One more tap: it is on a saw, and comes off with this.</summary>
    public bool TakeOff { get; init; }
}

/// <summary>Strikes an entry out, with what stands or falls with it.</summary>
public sealed record VoidEntry(int EntryId, string Reason) : Command
{
    /// <summary>With everything the same form entered: a swap's two halves go together.</summary>
    public bool Together { get; init; }
}
