namespace BladeLog.Records;

public enum HoldKind
{
    Crack,
    Clicking,
    Damage,
    Other,
}

public enum CrackPlace
{
    Gullet,
    Weld,
    BackEdge,
    Body,
}

/// <summary>Do not use until a named person clears it.</summary>
public sealed class Hold : Fact
{
    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;

    public HoldKind Kind { get; set; }

    public double? CrackLengthM { get; set; }

    public string? CrackTyped { get; set; }

    public CrackPlace? Place { get; set; }

    public string? Note { get; set; }
}

public sealed class HoldCleared : Fact
{
    public int HoldId { get; set; }

    public Hold Hold { get; set; } = null!;

    public required string How { get; set; }
}

public enum Found
{
    NothingSeen,
    Crack,
    Worn,
    Other,
}

public sealed class Inspection : Fact
{
    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;

    public Found Found { get; set; }

    public double? CrackLengthM { get; set; }

    public CrackPlace? Place { get; set; }

    public string? Note { get; set; }
}

public enum BreakSite
{
    Unknown,

    /// <summary>Straight across from a gullet.</summary>
    Gullet,

    /// <summary>From a gullet, then on at an angle.</summary>
    GulletAngled,
    Weld,
    BackEdge,
    Body,
    TeethStripped,
}

/// <summary>A break. The running hours at which it happened may be known only as a range.</summary>
public sealed class Break : Fact
{
    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;

    public int? SawId { get; set; }

    public BreakSite Site { get; set; }

    public DateTime EarliestUtc { get; set; }

    public DateTime LatestUtc { get; set; }

    /// <summary>Run hours of the blade, where they are known only between two bounds.</summary>
    public double? HoursLow { get; set; }

    public double? HoursHigh { get; set; }

    public double? MinutesLost { get; set; }

    public long? CostMinor { get; set; }

    public string? Note { get; set; }
}

public enum RetireReason
{
    FatigueMark,
    Crack,
    Broke,
    WidthLimit,
    TooManyJoints,
    TeethStripped,
    BodyDamage,
    UnknownHistory,
    Uneconomic,
    Lost,
    Sold,
    Rejected,
    CutDown,
    Other,
}

public sealed class Retirement : Fact
{
    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;

    public RetireReason Reason { get; set; }

    public bool CutUp { get; set; }

    public string? Note { get; set; }
}
