using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tables;

/// <summary>What a cut goes through, wood or not.</summary>
/// <param name="Key">Short name for records.</param>
/// <param name="Name">Name of the trade.</param>
/// <param name="Kind">Wood, panel or other.</param>
/// <param name="Hardwood">Broad-leaved; panels count as what their faces are.</param>
/// <param name="Stringy">When it leaves strings in the gullet.</param>
/// <param name="Density12">kg/m³ at 12 %, or as used for a panel; null for what is not wood.</param>
/// <param name="WearClass">A1 to A5, P or none.</param>
/// <param name="DefaultMoisture">Moisture where none is given, %.</param>
/// <param name="Provenance">Where the density comes from.</param>
/// <param name="SourceKey">Row of docs/sources.md.</param>
/// <param name="Aliases">Other words people type for it.</param>
public sealed record Material(
    string Key, string Name, MaterialKind Kind, bool Hardwood, StringyWood Stringy, double? Density12, string WearClass, double DefaultMoisture,
    Provenance Provenance, string SourceKey, string[] Aliases)
{
    /// <summary>m_w.</summary>
    public double WearFactor => AbrasivenessTable.Of(WearClass).WearFactor;

    /// <summary>Stringy at this moisture: wet means 20 % and over.</summary>
    public bool IsStringyAt(double moisturePercent) =>
        Stringy == StringyWood.Always || (Stringy == StringyWood.WhenWet && moisturePercent >= 20);

    /// <summary>A wood as a material.</summary>
    /// <remarks>The same row under the name that also covers panels; moisture 10 % where none is given.</remarks>
    /// <source key="derived" where="row of the table of woods"/>
    public static Material Of(WoodSpecies wood)
    {
        ArgumentNullException.ThrowIfNull(wood);
        return new(wood.Key, wood.Name, MaterialKind.Wood, wood.Hardwood, wood.Stringy, wood.Density12, wood.AbrasivenessClass, 10,
            wood.Provenance, wood.SourceKey, wood.Aliases);
    }
}
