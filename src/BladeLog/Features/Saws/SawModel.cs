using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Saws;

public sealed record SawFact(string Name, string Value, string? Remark = null);

/// <summary>What is on the saw.</summary>
public sealed record MountedPart(string Tag, ToothSpec Teeth, string State, string Since, string Tension);

/// <summary>The cut that the picture shows, the blade it is made with and the feed.</summary>
public sealed record CaptionPart(string Figures, string Tag, string Feed);

/// <summary>A wheel with what it does to the mounted blade.</summary>
public sealed record WheelPart(string Name, string Diameter, string? Bending, string? Fraction);

public sealed record SpeedPart(string Speed, string BendsAnHour, bool Usual);

public sealed record CutLine(int Number, string Wood, string Use);

/// <summary>A blade that fits, and how long it lasts here.</summary>
public sealed record FittingRow(string Tag, string Section, ToothSpec Teeth, string State, string Where, string Lasts, SmallBand Band, Worked? Worked);

/// <param name="Words">On the button.</param>
/// <param name="Href">Where it leads, or where its form is sent.</param>
/// <param name="Main">What is advised now.</param>
/// <param name="Alarm">In alarm.</param>
/// <param name="Timer">Null: a link. Else a form of one tap, with the start of the timer it stops, 0 to start one.</param>
public sealed record SawAction(string Words, string Href, bool Main = false, bool Alarm = false, int? Timer = null);

/// <summary>Everything the page of one saw shows.</summary>
public sealed record SawModel
{
    public required string Code { get; init; }

    public required string Name { get; init; }

    public required string Title { get; init; }

    public required string State { get; init; }

    public required string Lede { get; init; }

    public required SawShape Shape { get; init; }

    public required SawFigures Figures { get; init; }

    /// <summary>What they are written in.</summary>
    public required Drafting In { get; init; }

    public double? Stock { get; init; }

    /// <summary>What guides and thrust are of; null: no cut waits.</summary>
    public CaptionPart? Caption { get; init; }

    public required IReadOnlyList<SawFact> Facts { get; init; }

    public MountedPart? Mounted { get; init; }

    public required string Hours { get; init; }

    /// <summary>The last check before starting, in words; null: never checked.</summary>
    public string? Checked { get; init; }

    /// <summary>What it found not right, to be put right; null: nothing that was looked at.</summary>
    public string? ToPutRight { get; init; }

    /// <summary>Hours run with no blade known, as a question; null: none.</summary>
    public string? Question { get; init; }

    /// <summary>When a program last sent its running; null: none ever did.</summary>
    public string? Heard { get; init; }

    public required IReadOnlyList<WheelPart> Wheels { get; init; }

    public required IReadOnlyList<SpeedPart> Speeds { get; init; }

    public required IReadOnlyList<CutLine> Cuts { get; init; }

    public required IReadOnlyList<FittingRow> Fitting { get; init; }

    public required IReadOnlyList<BecauseLine> Because { get; init; }

    public required IReadOnlyList<Worked> Worked { get; init; }

    public required IReadOnlyList<SawAction> Actions { get; init; }

    public required IReadOnlyList<StoryLine> Story { get; init; }

    /// <summary>There are entries older than those shown.</summary>
    public bool More { get; init; }
}

/// <summary>No saw of this code.</summary>
public sealed record NoSawModel(string Code, IReadOnlyList<(string Code, string Name)> Saws);
