using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;

namespace BladeLog.Handbook.Tables;

/// <summary>One kind of wood.</summary>
/// <param name="Key">Short name for records: lower case, underscores.</param>
/// <param name="Name">Name of the trade.</param>
/// <param name="Hardwood">Broad-leaved; otherwise a conifer.</param>
/// <param name="Stringy">Long strings of dust that fill the gullet early: poplars, and cedars when wet.</param>
/// <param name="Density12">ρ₁₂, kg/m³ at 12 % moisture.</param>
/// <param name="GreenGravity">G_b, oven-dry mass on green volume, where tabulated.</param>
/// <param name="Gravity12">G₁₂ as printed; absent where the handbook prints the green value only.</param>
/// <param name="GreenHardnessLbf">Side hardness, green, as printed, lbf.</param>
/// <param name="DryHardnessLbf">Side hardness at 12 %, as printed, lbf.</param>
/// <param name="AbrasivenessClass">A1 to A5.</param>
/// <param name="Provenance">Where density and hardness come from; the class is always an engineering default.</param>
/// <param name="SourceKey">Row of docs/sources.md.</param>
/// <param name="Aliases">Other words people type for it.</param>
public sealed record WoodSpecies(
    string Key, string Name, bool Hardwood, StringyWood Stringy, double Density12, double? GreenGravity, double? Gravity12,
    double? GreenHardnessLbf, double? DryHardnessLbf, string AbrasivenessClass, Provenance Provenance, string SourceKey, string[] Aliases)
{
    /// <summary>ρ₁₂ as a quantity.</summary>
    public Density Density => new(Density12);

    /// <summary>Side hardness green, N.</summary>
    public Force? GreenHardness => GreenHardnessLbf is { } lbf ? new Force(lbf * Exact.PoundForce) : null;

    /// <summary>Side hardness at 12 %, N.</summary>
    public Force? DryHardness => DryHardnessLbf is { } lbf ? new Force(lbf * Exact.PoundForce) : null;

    /// <summary>m_w, how fast it wears an edge against a clean medium wood.</summary>
    public double WearFactor => AbrasivenessTable.Of(AbrasivenessClass).WearFactor;

    /// <summary>Stringy at this moisture: wet means 20 % and over.</summary>
    public bool IsStringyAt(double moisturePercent) =>
        Stringy == StringyWood.Always || (Stringy == StringyWood.WhenWet && moisturePercent >= 20);
}

/// <summary>When a wood leaves strings in the gullet.</summary>
public enum StringyWood
{
    /// <summary>It does not.</summary>
    Never,

    /// <summary>From 20 % moisture up.</summary>
    WhenWet,

    /// <summary>Wet or dry.</summary>
    Always,
}
