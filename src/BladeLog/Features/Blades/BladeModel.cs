using BladeLog.Handbook.Quantities;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Blades;

public sealed record BladeFact(string Name, string Value, string? Remark = null);

/// <summary>The life of a blade as the page tells it. At most one of band and range; neither where no hours are told.</summary>
public sealed record LifePart(string Title, string? Under, IReadOnlyList<string> Sentences, string Source)
{
    public LifeFigures? Band { get; init; }

    public (double Low, double High, double OneInTen)? Range { get; init; }
}

/// <summary>A limit of a blade and how much of it is used.</summary>
public sealed record LimitPart(string Name, string Words, double Share);

/// <summary>The tip's rounding against the bite of a cut.</summary>
public sealed record BitePart(double RoundingUm, double BiteUm, double HookDegrees, EdgeVerdict Verdict, string At);

public sealed record RunPart(string Saw, string Speed, string Hours, string Bends, string Bending, string Thickness);

public sealed record PathPart(string Wood, string Since, string Whole);

public sealed record BladeAction(string Words, string Href, bool Main = false, bool Alarm = false);

public sealed record BladeCaution(string Sentence, string? Source, bool Stop = false);

/// <summary>Everything the page of one blade shows.</summary>
public sealed record BladeModel
{
    public required string Tag { get; init; }

    public required string Title { get; init; }

    public required IReadOnlyList<string> Lede { get; init; }

    public required string State { get; init; }

    public required ToothSpec Teeth { get; init; }

    /// <summary>What the figures on its drawings are written in.</summary>
    public required Drafting In { get; init; }

    public required double NewWidth { get; init; }

    public required double LeastWidth { get; init; }

    public required double Body { get; init; }

    public required double Kerf { get; init; }

    public required double Depth { get; init; }

    public required TipKind Tip { get; init; }

    public required IReadOnlyList<BladeFact> Facts { get; init; }

    /// <summary>Null: held, so no life is told at all.</summary>
    public LifePart? Life { get; init; }

    /// <summary>Where its life, its edge, its width and the rest are worked out.</summary>
    public IReadOnlyList<Worked> WorkedLife { get; init; } = [];

    public IReadOnlyList<Worked> WorkedEdge { get; init; } = [];

    public IReadOnlyList<Worked> WorkedLimits { get; init; } = [];

    public IReadOnlyList<Worked> Worked { get; init; } = [];

    public required string EdgeTitle { get; init; }

    public required string EdgeWords { get; init; }

    /// <summary>What its measured kerf and set tell.</summary>
    public IReadOnlyList<string> KerfSays { get; init; } = [];

    public BitePart? Bite { get; init; }

    public required string GovernsTitle { get; init; }

    public required IReadOnlyList<LimitPart> Limits { get; init; }

    public required IReadOnlyList<RunPart> Runs { get; init; }

    public required IReadOnlyList<PathPart> Paths { get; init; }

    public required IReadOnlyList<BecauseLine> Because { get; init; }

    public required IReadOnlyList<BladeAction> Actions { get; init; }

    /// <summary>The step that cannot be taken lightly, set apart.</summary>
    public BladeAction? Last { get; init; }

    public required IReadOnlyList<BladeCaution> Cautions { get; init; }

    public IReadOnlyList<StoryLine> Story { get; init; } = [];

    /// <summary>There are entries not shown.</summary>
    public bool More { get; init; }
}

/// <summary>No blade of this tag.</summary>
public sealed record NoBladeModel(string Tag, IReadOnlyList<string> Nearest);
