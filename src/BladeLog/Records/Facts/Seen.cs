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

/// <summary>What of a blade was looked at.</summary>
[Flags]
public enum LookedAt
{
    Nothing = 0,
    Teeth = 1,
    Gullets = 2,
    Weld = 4,
    Body = 8,
    BackEdge = 16,
    HeatMarks = 32,

    /// <summary>Twist, and whether it lies level.</summary>
    Level = 64,
    WholeLoop = Teeth | Gullets | Weld | Body | BackEdge | HeatMarks | Level,
}

/// <summary>What was seen beside a crack.</summary>
[Flags]
public enum BladeMarks
{
    None = 0,

    /// <summary>Rust in the gullets.</summary>
    Rust = 1,

    /// <summary>Burrs left in the gullets.</summary>
    Burrs = 2,

    /// <summary>Gullets turned blue by the grinding.</summary>
    BurnedGullets = 4,
    KinkOrTwist = 8,
    TeethMissing = 16,
    InGullets = Rust | Burrs | BurnedGullets,
}

public sealed class Inspection : Fact
{
    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;

    public Found Found { get; set; }

    /// <summary>Null: not said, as in entries from before this was asked.</summary>
    public LookedAt? LookedAt { get; set; }

    /// <summary>Null: not said.</summary>
    public BladeMarks? Marks { get; set; }

    public int? TeethMissing { get; set; }

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
