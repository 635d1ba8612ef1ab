using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>One blade in one cut: all the force model needs to know except the feed.</summary>
public sealed record CutCase
{
    /// <summary>t, of the body.</summary>
    public required Length Thickness { get; init; }

    /// <summary>k, over the set or the tips.</summary>
    public required Length Kerf { get; init; }

    /// <summary>p, the mean of a variable pitch.</summary>
    public required Length Pitch { get; init; }

    /// <summary>d, tip to bottom.</summary>
    public required Length GulletDepth { get; init; }

    /// <summary>Shape of the tooth.</summary>
    public required ToothForm Form { get; init; }

    /// <summary>g, the hook of the tooth face; positive leans forward.</summary>
    public required Angle Rake { get; init; }

    /// <summary>What gives the side clearance.</summary>
    public required TipKind Tip { get; init; }

    /// <summary>r, of the cutting edge as it is now.</summary>
    public required Length EdgeRadius { get; init; }

    /// <summary>v.</summary>
    public required Speed BandSpeed { get; init; }

    /// <summary>H, wood along the blade.</summary>
    public required Length CutHeight { get; init; }

    /// <summary>ρ₁₂, at 12 % moisture.</summary>
    public required Density Density12 { get; init; }

    /// <summary>Moisture, % of oven-dry mass.</summary>
    public required double MoisturePercent { get; init; }

    /// <summary>How the cut runs to the fibres.</summary>
    public CutDirection Direction { get; init; } = CutDirection.Rip;

    /// <summary>The wood is frozen.</summary>
    public bool Frozen { get; init; }

    /// <summary>A_g counted on squared paper, where the shop has done so; takes the place of form, pitch and depth.</summary>
    public Area? MeasuredGulletArea { get; init; }

    /// <summary>The settings of the force model.</summary>
    public CutModel Model { get; init; } = CutModel.Default;

    /// <summary>The same cut with an edge of another radius.</summary>
    public CutCase WithEdge(Length radius) => this with { EdgeRadius = radius };
}
