using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Workings;

/// <summary>A working as its page shows it: the answer, how it is got, the curves, and the form that can be shared as an address.</summary>
public sealed record WorkingModel
{
    public required string Path { get; init; }

    /// <summary>What this working is called in the list.</summary>
    public required string Name { get; init; }

    /// <summary>The answer as the title; the question while something is missing.</summary>
    public required string Title { get; init; }

    public required IReadOnlyList<AskField> Fields { get; init; }

    /// <summary>Blade, saw and cut to take the figures from.</summary>
    public required IReadOnlyList<AskField> Picks { get; init; }

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

    /// <summary>Other pages that go with the answer, as whole rows.</summary>
    public IReadOnlyList<Worked> Leads { get; init; } = [];

    /// <summary>What every working shares: its form as read, and whose figures stand in it.</summary>
    internal static WorkingModel Of(string path, string name, string title, AskForm form, WorkingCase? from) => new()
    {
        Path = path,
        Name = name,
        Title = title,
        Fields = form.Fields,
        Picks = from?.Picks ?? [],
        Problems = form.Problems,
        Example = form.Example,
        From = from?.Words,
    };
}

/// <summary>A group of formulas in the list.</summary>
public sealed record WorkingGroup(string Path, string Name, string What);
