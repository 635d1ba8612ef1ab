using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tables;

/// <summary>What is taken for a band body where the shop has not said.</summary>
/// <param name="Steel">Which.</param>
/// <param name="HardnessHrc">Rockwell C of the body.</param>
/// <param name="Tension">Tension on the body.</param>
/// <param name="Provenance">Where the figures come from.</param>
/// <param name="SourceKey">Row of docs/sources.md.</param>
public sealed record BodySteelDefault(BodySteel Steel, double HardnessHrc, Stress Tension, Provenance Provenance, string SourceKey);

/// <summary>Defaults of band bodies.</summary>
public static class BodySteelTable
{
    /// <summary>All rows.</summary>
    public static IReadOnlyList<BodySteelDefault> All { get; } =
    [
        new(BodySteel.FlexibleBack, 30, new Stress(90e6), Provenance.EngineeringDefault, "engineering-default"),
        new(BodySteel.SpringTempered, 46, new Stress(130e6), Provenance.EngineeringDefault, "engineering-default"),
        new(BodySteel.Bimetal, 46, new Stress(150e6), Provenance.EngineeringDefault, "engineering-default"),
        new(BodySteel.CarbideTipped, 46, new Stress(150e6), Provenance.EngineeringDefault, "engineering-default"),
        new(BodySteel.WideStrip, 44, new Stress(140e6), Provenance.EngineeringDefault, "engineering-default"),
    ];

    /// <summary>The row of a body steel.</summary>
    /// <remarks>HRC and tension, MPa: flexible back 30, 90; spring-tempered 46, 130; bi-metal 46, 150; carbide-tipped 46, 150; wide strip 44, 140.</remarks>
    /// <source key="engineering-default" where="body steel where the shop has not said"/>
    public static BodySteelDefault Of(BodySteel steel) => All.FirstOrDefault(r => r.Steel == steel)
        ?? throw new ArgumentOutOfRangeException(nameof(steel), steel, "The body steel must be one of the five known.");
}
