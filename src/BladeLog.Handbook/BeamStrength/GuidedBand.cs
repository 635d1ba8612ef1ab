using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>One strand of a tensioned band between its two guides, with the cut that pushes on its tooth edge.
/// x runs along the band from the lower guide; y across it, towards the teeth.</summary>
/// <remarks>Straight elastic band under uniform tension; the thrust is spread evenly over the cut; the guides hold the band sideways
/// and against twisting but leave its slope free; the back is carried at the guides unless it is said to be carried further out.
/// Impossible figures are refused by the first formula that is asked.</remarks>
public sealed record GuidedBand
{
    /// <summary>Width over all, back to tooth tip.</summary>
    public required Length Width { get; init; }

    /// <summary>Thickness of the body.</summary>
    public required Length Thickness { get; init; }

    /// <summary>Gullet depth; what is left of the width is the body, which carries the tension.</summary>
    public required Length GulletDepth { get; init; }

    /// <summary>Tension stress on the body section, running.</summary>
    public required Stress Tension { get; init; }

    /// <summary>Free span between the guides.</summary>
    public required Length GuideSpan { get; init; }

    /// <summary>Wood along the band.</summary>
    public required Length CutHeight { get; init; }

    /// <summary>Middle of the cut, above the lower guide.</summary>
    public required Length CutCentre { get; init; }

    /// <summary>Elastic constants and density of the band.</summary>
    public Steel Steel { get; init; } = Steel.Carbon;

    /// <summary>Speed of the band; 0 for a band at rest.</summary>
    public Speed BandSpeed { get; init; }

    /// <summary>Whether the saw keeps its wheel load when the band runs.</summary>
    public TensionSystem System { get; init; } = TensionSystem.Sprung;

    /// <summary>How far below the lower guide the back is carried; 0 when at the guide.</summary>
    public Length BackSupportBelow { get; init; }

    /// <summary>How far above the upper guide the back is carried; 0 when at the guide.</summary>
    public Length BackSupportAbove { get; init; }

    /// <summary>True when the band cannot turn in its own plane where its back is carried, as where it wraps on the wheels.</summary>
    public bool BackClamped { get; init; }
}
