using BladeLog.Handbook.Quantities;

namespace BladeLog.Records;

/// <summary>What is printed on the box: shared by all blades of the kind. A null figure is a default of the handbook, and shown as such.</summary>
public sealed class Spec : Thing
{
    public required string Code { get; set; }

    public double WidthM { get; set; }

    public string? WidthTyped { get; set; }

    public double ThicknessM { get; set; }

    public string? ThicknessTyped { get; set; }

    /// <summary>The coarsest pitch: it decides the teeth in the cut.</summary>
    public double PitchCoarseM { get; set; }

    public double PitchFineM { get; set; }

    public string? PitchTyped { get; set; }

    public ToothForm ToothForm { get; set; }

    public double? RakeRad { get; set; }

    public double? GulletDepthM { get; set; }

    /// <summary>Measured; null: reckoned from the tooth form, pitch and depth.</summary>
    public double? GulletAreaM2 { get; set; }

    public double? GulletRadiusM { get; set; }

    public double? KerfM { get; set; }

    public string? KerfTyped { get; set; }

    public SetPattern SetPattern { get; set; }

    public TipKind TipKind { get; set; }

    public TipMaterial TipMaterial { get; set; }

    public BodySteel BodySteel { get; set; }

    public double? BodyHrc { get; set; }

    public double? NewLoopM { get; set; }

    public string? NewLoopTyped { get; set; }

    /// <summary>The shop's own target on the body section.</summary>
    public double? TensionPa { get; set; }

    public string? TensionTyped { get; set; }

    public double? LeastWidthM { get; set; }

    public long? SharpeningPriceMinor { get; set; }

    /// <summary>Null: width alone limits. 0: not worth sharpening.</summary>
    public int? MostSharpenings { get; set; }

    public double? EdgeFreshM { get; set; }

    public long? PriceMinor { get; set; }

    /// <summary>Fewest to have at hand; null: the shop's setting for every kind.</summary>
    public int? LeastStock { get; set; }

    /// <summary>Mean pitch: 25.4 mm over the mean TPI, so the harmonic mean of the two pitches.</summary>
    public double PitchMeanM => 2 / (1 / PitchCoarseM + 1 / PitchFineM);
}

public sealed class Blade : Thing
{
    /// <summary>As painted on the blade. Unique without case, never used again.</summary>
    public required string Tag { get; set; }

    public int SpecId { get; set; }

    public Spec Spec { get; set; } = null!;

    /// <summary>The blade this one was cut from.</summary>
    public int? ParentId { get; set; }

    public Blade? Parent { get; set; }

    public double? MeasuredThicknessM { get; set; }

    public double? MeasuredHrc { get; set; }

    /// <summary>Inspect after so many running hours.</summary>
    public double? InspectEveryH { get; set; }

    public bool InspectEachMount { get; set; }

    /// <summary>Still folded as it came; one stock line with its like until first mounted.</summary>
    public bool Folded { get; set; }

    public DateTime AddedUtc { get; set; }
}

/// <summary>Every tag ever painted. Filled by the database itself, so that a tag is never used again.</summary>
public sealed class TagUsed
{
    public required string Tag { get; set; }

    public int BladeId { get; set; }
}

public sealed class Saw : Thing
{
    /// <summary>Unique without case.</summary>
    public required string Code { get; set; }

    public required string Name { get; set; }

    public bool Active { get; set; } = true;

    public bool HasHourMeter { get; set; }
}
