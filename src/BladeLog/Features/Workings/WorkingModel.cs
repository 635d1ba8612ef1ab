using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Workings;

/// <summary>One field of a working: what it is called in the address, what stands in it and where that comes from.</summary>
/// <param name="Name">The query parameter.</param>
/// <param name="Label">In words.</param>
/// <param name="Value">The text in the field.</param>
/// <param name="Hint">Where it comes from, or what was understood.</param>
/// <param name="Error">What is wrong, beside the field.</param>
/// <param name="Choices">One out of these; null: typed.</param>
/// <param name="Empty">Words of the empty choice.</param>
/// <param name="Offers">Offered while typing.</param>
public sealed record WorkingField(
    string Name, string Label, string Value, string? Hint, string? Error, IReadOnlyList<Answer>? Choices = null, string? Empty = null, IReadOnlyList<string>? Offers = null);

/// <summary>A working as its page shows it: the answer, how it is got, the curves, and the form that can be shared as an address.</summary>
public sealed record WorkingModel
{
    public required string Path { get; init; }

    /// <summary>What this working is called in the list.</summary>
    public required string Name { get; init; }

    /// <summary>The answer as the title; the question while something is missing.</summary>
    public required string Title { get; init; }

    public required IReadOnlyList<WorkingField> Fields { get; init; }

    /// <summary>Blade, saw and cut to take the figures from.</summary>
    public required IReadOnlyList<WorkingField> Picks { get; init; }

    public required IReadOnlyList<Problem> Problems { get; init; }

    /// <summary>Nothing was typed and nothing taken from the shop.</summary>
    public required bool Example { get; init; }

    /// <summary>What the figures are taken from: "Q-09 on Osprey, cut 2".</summary>
    public string? From { get; init; }

    public IReadOnlyList<BecauseLine> Lines { get; init; } = [];

    public IReadOnlyList<CurveFigure> Curves { get; init; } = [];

    /// <summary>Where the formulas hold and what is left out.</summary>
    public IReadOnlyList<string> Range { get; init; } = [];

    public IReadOnlyList<string> Cautions { get; init; } = [];

    /// <summary>Why there is no answer at all: a held blade.</summary>
    public string? Stopped { get; init; }
}

/// <summary>A group of formulas in the list.</summary>
public sealed record WorkingGroup(string Path, string Name, string What);
