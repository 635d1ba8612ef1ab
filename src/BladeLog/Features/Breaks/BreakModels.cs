using BladeLog.Records;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Breaks;

/// <summary>One break in the list.</summary>
public sealed record BreakRow(int Entry, string Tag, string When, string Saw, string Site, string Hours, string Used, string Bending, string Thickness, string Cost, bool ToComplete, Worked? Worked);

/// <summary>Breaks that gather.</summary>
public sealed record ClusterPart(string Title, string Says, string Tags);

public sealed record BreaksModel(string Title, IReadOnlyList<BreakRow> Rows, IReadOnlyList<ClusterPart> Clusters, IReadOnlyList<BreakRow> ToComplete, string Counted);

public sealed record CompleteForm : PostedForm
{
    public string? Site { get; init; }

    public string? HoursLow { get; init; }

    public string? HoursHigh { get; init; }

    public string? MinutesLost { get; init; }

    public string? Cost { get; init; }

    public string? Note { get; init; }
}

public sealed record BreakFact(string Name, string Value, string? Remark = null);

/// <summary>A fracture with its usual causes; this one's own stands out.</summary>
public sealed record FracturePart(FractureKind Kind, string Looks, IReadOnlyList<string> Causes, bool This);

/// <summary>Why one blade broke.</summary>
public sealed record BreakModel
{
    public required int Entry { get; init; }

    public required string Tag { get; init; }

    public required string Says { get; init; }

    public required string Lede { get; init; }

    public FracturePart? Fracture { get; init; }

    public required IReadOnlyList<FracturePart> Fractures { get; init; }

    public required IReadOnlyList<BreakFact> Facts { get; init; }

    public LifeFigures? Life { get; init; }

    public required string LifeWords { get; init; }

    public required IReadOnlyList<ClusterPart> Clusters { get; init; }

    public required IReadOnlyList<BecauseLine> Because { get; init; }

    public IReadOnlyList<Worked> Worked { get; init; } = [];

    public required CompleteForm Form { get; init; }

    /// <summary>What was told of it before.</summary>
    public CompleteForm Told { get; init; } = new();

    /// <summary>Its run hours by the saws, as they are typed.</summary>
    public string? HoursKnown { get; init; }

    public required FormState State { get; init; }

    public required bool ToComplete { get; init; }

    public string? Who { get; init; }

    public required IReadOnlyList<string> People { get; init; }
}

/// <summary>The record's sites as the pictures draw them.</summary>
internal static class Fractures
{
    public static FractureKind? Kind(BreakSite site) => site switch
    {
        BreakSite.Gullet => FractureKind.StraightFromGullet,
        BreakSite.GulletAngled => FractureKind.AngledFromGullet,
        BreakSite.BackEdge => FractureKind.BackEdge,
        BreakSite.Weld => FractureKind.Weld,
        BreakSite.Body => FractureKind.Body,
        BreakSite.TeethStripped => FractureKind.TeethStripped,
        _ => null,
    };

    public static string Words(BreakSite site) => site switch
    {
        BreakSite.Gullet => "from a gullet, straight",
        BreakSite.GulletAngled => "from a gullet, at an angle",
        BreakSite.BackEdge => "from the back edge",
        BreakSite.Weld => "at the weld",
        BreakSite.Body => "along the body",
        BreakSite.TeethStripped => "teeth stripped",
        _ => "not told how",
    };
}
