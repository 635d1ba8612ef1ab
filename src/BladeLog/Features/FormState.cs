using BladeLog.Ui;
using BladeLog.Ui.Forms;

namespace BladeLog.Features;

/// <summary>What every form sends along: its own op, and who records where the tablet does not know.</summary>
public abstract record PostedForm
{
    public string? Op { get; init; }

    public string? Who { get; init; }
}

/// <summary>What stands against a form that was sent; nothing while it is new.</summary>
/// <param name="Problems">Sentences, each beside its field.</param>
/// <param name="OneMoreTap">The words of the button that records it although; null where that cannot be.</param>
/// <param name="Status">The answer's status.</param>
public sealed record FormState(IReadOnlyList<Problem> Problems, string? OneMoreTap = null, int Status = StatusCodes.Status200OK)
{
    public static FormState New { get; } = new([]);

    /// <summary>The two moments of a time in the double hour of autumn, by field.</summary>
    public IReadOnlyDictionary<string, IReadOnlyList<Moment>> Twice { get; init; } = new Dictionary<string, IReadOnlyList<Moment>>();

    /// <summary>What stands over the sentences; null: how many things are to be put right.</summary>
    public string? Title { get; init; }

    public bool Asks => OneMoreTap is not null;

    public string? Error(string field) => Problems.FirstOrDefault(p => p.Field == field)?.Sentence;

    /// <summary>Any of these fields has something to be put right.</summary>
    public bool Has(params string[] fields) => Problems.Any(p => fields.Contains(p.Field));
}
