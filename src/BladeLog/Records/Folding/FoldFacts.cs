using BladeLog.Handbook.Quantities;

namespace BladeLog.Records.Folding;

/// <summary>A saw's setup from a date.</summary>
public readonly record struct SetupFrom(int Id, int SawId, DateTime At, double LoopM);

/// <summary>A blade on a saw: a mount and its dismount, still open where there is none.</summary>
public readonly record struct Spell(int MountId, int SawId, int BladeId, DateTime From, DateTime? Until, int? DismountId)
{
    public DateTime End => Until ?? DateTime.MaxValue;

    /// <summary>A cut's time is when it ended, so a cut that ended as the blade came off was still its own.</summary>
    public bool HoldsCut(DateTime at) => From < at && at <= End;
}

public readonly record struct RunLine(int Id, int SawId, DateTime From, DateTime Until, long Ms, double SpeedMps);

public readonly record struct CutLine(
    int Id, int SawId, DateTime At, string WoodClass, Dirt Dirt, double HeightM, double LengthM, int Pieces, double FeedMps, double SpeedMps)
{
    public long CutMs => CutSums.Milliseconds(LengthM, Pieces, FeedMps);
}

/// <summary>A new loop by a joint; before the first one the specification's.</summary>
public readonly record struct LoopFrom(int BladeId, DateTime At, int Id, double LoopM);

/// <summary>What happened to a blade, as far as it changes where and how it is.</summary>
public enum BladeEventKind
{
    Mounted,
    Dismounted,
    Hung,
    SentAway,
    CameBack,
    Lost,
    Sharpened,
    CutFromParent,
    CutDown,
    PriorUse,
    Joined,
    Held,
    Cleared,
    Retired,
}

/// <summary>One event of a blade. The reference is the saw, mount or hold it speaks of.</summary>
public readonly record struct BladeEvent(
    int BladeId, DateTime At, int Id, BladeEventKind Kind, int Reference = 0, double? Number = null, string? Hook = null, Place Place = Place.Rack);

/// <summary>The blade as a thing: what the fold starts from.</summary>
public readonly record struct BladeStart(int BladeId, double WidthM, double? NewLoopM, bool CutFromAnother = false);
