using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tables;

/// <summary>Panels, which are sawn like wood, and things that are not wood.</summary>
public static class NonWoods
{
    /// <summary>All rows. Densities are from memory; the wear of panels is an engineering default.</summary>
    public static IReadOnlyList<Material> All { get; } =
    [
        Panel("birch_plywood", "Birch plywood", true, 680, "birch ply", "baltic birch", "baltic birch plywood"),
        Panel("hardwood_plywood", "Hardwood plywood", true, 600, "hardwood ply", "veneered plywood", "marine plywood", "marine ply"),
        Panel("softwood_plywood", "Softwood plywood", false, 520, "softwood ply", "pine plywood", "construction plywood", "plywood", "ply"),
        Panel("mdf", "MDF", false, 740, "medium density fibreboard", "medium density fiberboard", "fibreboard", "fiberboard"),
        Panel("hardboard", "Hardboard", false, 950, "high density fibreboard", "high density fiberboard", "hdf"),
        Panel("particleboard", "Particleboard", false, 660, "chipboard", "melamine board", "faced chipboard"),
        Panel("osb", "OSB", false, 620, "oriented strand board", "strand board"),
        Panel("blockboard", "Blockboard", false, 500, "lumber core", "laminboard"),
        Other("aluminium", "Aluminium", "aluminum", "alu", "aluminium alloy", "aluminum alloy", "alloy"),
        Other("steel", "Steel", "mild steel", "stainless", "stainless steel", "iron", "cast iron"),
        Other("brass", "Brass", "bronze", "gunmetal"),
        Other("copper", "Copper"),
        Other("lead", "Lead", "zinc", "pewter"),
        Other("metal", "Metal (other)", "titanium", "magnesium"),
        Other("plastic", "Plastic", "acrylic", "pvc", "polycarbonate", "nylon", "polyethylene", "polythene", "hdpe", "polystyrene", "epoxy"),
        Other("laminate", "Laminate or solid surface", "phenolic", "phenolic laminate", "solid surface", "circuit board"),
        Other("glass_fibre", "Glass or carbon fibre", "fibreglass", "fiberglass", "glass fiber", "carbon fibre", "carbon fiber", "grp"),
        Other("foam", "Foam", "insulation", "cork", "rubber"),
        Other("stone", "Stone or board with cement", "cement board", "slate", "brick", "plasterboard", "drywall", "tile"),
        Other("bone", "Bone, horn or meat", "antler", "horn", "meat", "frozen meat", "ivory"),
    ];

    private static Material Panel(string key, string name, bool hardwood, double density, params string[] aliases) =>
        new(key, name, MaterialKind.Panel, hardwood, StringyWood.Never, density, "P", 9, Provenance.FromMemory, "from-memory", aliases);

    private static Material Other(string key, string name, params string[] aliases) =>
        new(key, name, MaterialKind.Other, false, StringyWood.Never, null, "none", 0, Provenance.CommonPractice, "common-practice", aliases);
}
