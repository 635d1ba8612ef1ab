using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tables;

/// <summary>How hard a class of material is on edges.</summary>
/// <param name="Class">A1 to A5 for wood, P for panels, none for what is not wood.</param>
/// <param name="Meaning">In words.</param>
/// <param name="WearFactor">m_w, against a clean medium wood.</param>
/// <param name="Low">Low end of its range.</param>
/// <param name="High">High end of its range.</param>
/// <param name="Provenance">Where the factor comes from.</param>
/// <param name="SourceKey">Row of docs/sources.md.</param>
public sealed record Abrasiveness(string Class, string Meaning, double WearFactor, double Low, double High, Provenance Provenance, string SourceKey);

/// <summary>Classes of abrasiveness and their wear factors.</summary>
public static class AbrasivenessTable
{
    /// <summary>All classes. That silica rules wear and density does not is published; the factors are engineering defaults.</summary>
    public static IReadOnlyList<Abrasiveness> All { get; } =
    [
        new("A1", "clean and light", 0.7, 0.5, 1, Provenance.EngineeringDefault, "engineering-default"),
        new("A2", "clean, medium weight", 1.0, 0.7, 1.4, Provenance.EngineeringDefault, "engineering-default"),
        new("A3", "dense, no silica", 1.5, 1, 2, Provenance.EngineeringDefault, "engineering-default"),
        new("A4", "very dense, or some mineral", 3, 2, 5, Provenance.EngineeringDefault, "engineering-default"),
        new("A5", "silica half a percent or more", 8, 4, 15, Provenance.EngineeringDefault, "engineering-default"),
        new("P", "panels with glue", 4, 3, 6, Provenance.EngineeringDefault, "engineering-default"),
        new("none", "not wood", 1, 1, 1, Provenance.EngineeringDefault, "engineering-default"),
    ];

    /// <summary>The row of a class.</summary>
    /// <remarks>Looked up by the class letter and number, case ignored; an unknown class is refused.</remarks>
    /// <source key="engineering-default" where="classes and factors; silica as the main cause after cristovao-2011"/>
    public static Abrasiveness Of(string abrasivenessClass) =>
        All.FirstOrDefault(a => string.Equals(a.Class, abrasivenessClass, StringComparison.OrdinalIgnoreCase))
        ?? throw new ArgumentOutOfRangeException(nameof(abrasivenessClass), abrasivenessClass, "The wear class must be A1 to A5, P or none.");
}

/// <summary>What dirt does to edges.</summary>
/// <param name="Dirt">Which.</param>
/// <param name="Factor">m_d.</param>
/// <param name="Low">Low end of its range.</param>
/// <param name="High">High end of its range.</param>
/// <param name="Provenance">Where the factor comes from.</param>
/// <param name="SourceKey">Row of docs/sources.md.</param>
public sealed record DirtFactor(Dirt Dirt, double Factor, double Low, double High, Provenance Provenance, string SourceKey);

/// <summary>Dirt factors.</summary>
public static class DirtTable
{
    /// <summary>All rows.</summary>
    public static IReadOnlyList<DirtFactor> All { get; } =
    [
        new(Dirt.Clean, 1, 1, 1, Provenance.EngineeringDefault, "engineering-default"),
        new(Dirt.BarkOn, 2, 1.5, 4, Provenance.EngineeringDefault, "engineering-default"),
        new(Dirt.Reclaimed, 2, 1.5, 4, Provenance.EngineeringDefault, "engineering-default"),
    ];

    /// <summary>The row of a state.</summary>
    /// <remarks>m_d = 1 clean, 2 bark on, 2 reclaimed.</remarks>
    /// <source key="engineering-default" where="dirt factors"/>
    public static DirtFactor Of(Dirt dirt) => All.FirstOrDefault(d => d.Dirt == dirt)
        ?? throw new ArgumentOutOfRangeException(nameof(dirt), dirt, "The wood must be clean, with bark on, or reclaimed.");
}
