using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features.Blades;

/// <summary>What a hold and an inspection are both told: the crack, a note, when.</summary>
public abstract record CrackForm : PostedForm
{
    public string? CrackLength { get; init; }

    public string? Place { get; init; }

    public string? Note { get; init; }

    public string? At { get; init; }

    /// <summary>Something stands in the fields of the crack, right or wrong: they must be seen.</summary>
    public bool TellsOfCrack(FormState state) => state.Has(nameof(CrackLength), nameof(Place)) || Place is not null || CrackLength is { Length: > 0 };

    internal CrackSaid Read(FormReading read) => new(
        read.Length(nameof(CrackLength), CrackLength, Fields.CrackLength),
        CrackLength?.Trim(),
        read.Choice<CrackPlace>(nameof(Place), Place, null),
        string.IsNullOrWhiteSpace(Note) ? null : Note.Trim(),
        read.Time(nameof(At), At));
}

internal sealed record CrackSaid(double? LengthM, string? Typed, CrackPlace? Place, string? Note, DateTime? At);
