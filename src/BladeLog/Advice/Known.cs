using BladeLog.Handbook.Quantities;

namespace BladeLog.Advice;

/// <summary>A figure in SI with where it comes from, so that a guess never looks like a measurement.</summary>
/// <param name="Value">In SI, or dimensionless.</param>
/// <param name="Provenance">Where it comes from.</param>
/// <param name="From">The same in words: "measured", "specification", "default, not yours".</param>
public readonly record struct Known(double Value, Provenance Provenance, string From)
{
    public bool IsDefault => Provenance != Provenance.Yours;

    public static Known Yours(double value, string from) => new(value, Provenance.Yours, from);
}

/// <summary>One figure of an answer as the "why" and "because" rows show it.</summary>
/// <param name="Name">What it is.</param>
/// <param name="Value">In the unit named.</param>
/// <param name="Unit">As shown behind the value.</param>
/// <param name="How">The formula in words.</param>
/// <param name="Source">Key of docs/sources.md.</param>
/// <param name="Provenance">Where it comes from.</param>
public sealed record Figure(string Name, double Value, string Unit, string How, string Source, Provenance Provenance);
