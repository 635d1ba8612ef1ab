namespace BladeLog.Advice.Cuts;

/// <summary>Why a blade is refused, or fits only with care. In the order in which they are told.</summary>
public enum ReasonKind
{
    Material,
    Hold,
    Away,

    /// <summary>Figures of the blade that cannot be.</summary>
    Figures,

    /// <summary>Ground below its least width.</summary>
    Width,
    WorkKind,
    TooHigh,
    TooLong,
    Bevel,
    ClassWork,
    Unsuitable,
    Teeth,
    Radius,
    Dull,

    /// <summary>Every limit shuts before it cuts.</summary>
    Shut,

    /// <summary>A limit is in its amber range.</summary>
    AmberLimit,
    UnknownHistory,
    Curve,
    DullBeforeEnd,
    Rubbing,
    Life,
    Inspection,
    Weld,

    /// <summary>It fits.</summary>
    Fits,
}

public sealed record CutReason(ReasonKind Kind, string Sentence);

public enum Verdict
{
    Fits,
    WithCare,
    No,
}
