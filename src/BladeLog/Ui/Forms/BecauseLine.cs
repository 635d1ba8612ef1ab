using BladeLog.Handbook.Quantities;
using Microsoft.AspNetCore.Components;

namespace BladeLog.Ui.Forms;

/// <summary>One line under "because": what, its figure with unit, how it is got, where it is written, what it is worth.</summary>
/// <param name="What">The thing, in the trade's word.</param>
/// <param name="Value">Its figure with its unit.</param>
/// <param name="Formula">How it is got, in words; null when it is simply given.</param>
/// <param name="Source">Where it is written; null when it is the shop's own or follows from the rest.</param>
/// <param name="Provenance">The mark that travels with it.</param>
public sealed record BecauseLine(string What, string Value, string? Formula, string? Source, Provenance Provenance);

/// <summary>One answer to choose from.</summary>
/// <param name="Value">What the form sends.</param>
/// <param name="Label">The answer in words.</param>
/// <param name="Remark">A short second line.</param>
public sealed record Answer(string Value, string Label, string? Remark = null)
{
    /// <summary>A drawing of the answer, above its words.</summary>
    public RenderFragment? Picture { get; init; }
}

/// <summary>Something wrong with what was entered.</summary>
/// <param name="Field">The name of the field, or null when it concerns the whole form.</param>
/// <param name="Sentence">What to do, in one sentence.</param>
public sealed record Problem(string? Field, string Sentence);
