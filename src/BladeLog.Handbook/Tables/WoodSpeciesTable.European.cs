using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;

namespace BladeLog.Handbook.Tables;

public static partial class WoodSpeciesTable
{
    // Values at the level of European standards, quoted from memory, good to 10 %.
    // key, name, hardwood, stringy, kg/m³ at 12 %, G green, G 12 %, side hardness green and 12 % (lbf), wear class, provenance, source, other names
    private static WoodSpecies[] European() =>
    [
        new("european_oak", "European oak", true, StringyWood.Never, 710, null, null, null, NewtonsAsLbf(5400), "A3", Provenance.FromMemory, "from-memory", ["oak", "english oak", "french oak", "sessile oak", "pedunculate oak"]),
        new("european_beech", "European beech", true, StringyWood.Never, 710, null, null, null, NewtonsAsLbf(6300), "A3", Provenance.FromMemory, "from-memory", ["beech", "steamed beech"]),
        new("european_ash", "European ash", true, StringyWood.Never, 690, null, null, null, NewtonsAsLbf(6000), "A3", Provenance.FromMemory, "from-memory", ["ash"]),
        new("sycamore_maple", "Sycamore maple", true, StringyWood.Never, 630, null, null, null, NewtonsAsLbf(4700), "A2", Provenance.FromMemory, "from-memory", ["sycamore", "european maple", "european sycamore"]),
        new("silver_birch", "Silver birch", true, StringyWood.Never, 650, null, null, null, NewtonsAsLbf(5000), "A3", Provenance.FromMemory, "from-memory", ["birch", "european birch"]),
        new("sweet_chestnut", "Sweet chestnut", true, StringyWood.Never, 560, null, null, null, null, "A2", Provenance.FromMemory, "from-memory", ["chestnut", "spanish chestnut"]),
        new("european_cherry", "European cherry", true, StringyWood.Never, 600, null, null, null, null, "A2", Provenance.FromMemory, "from-memory", ["wild cherry", "gean"]),
        new("european_walnut", "European walnut", true, StringyWood.Never, 650, null, null, null, null, "A2", Provenance.FromMemory, "from-memory", ["english walnut", "french walnut"]),
        new("lime", "Lime", true, StringyWood.Never, 530, null, null, null, null, "A2", Provenance.FromMemory, "from-memory", ["linden", "european lime"]),
        new("common_alder", "Common alder", true, StringyWood.Never, 530, null, null, null, null, "A2", Provenance.FromMemory, "from-memory", ["alder", "black alder", "european alder"]),
        new("poplar", "Poplar", true, StringyWood.Always, 430, null, null, null, null, "A1", Provenance.FromMemory, "from-memory", ["european poplar", "black poplar", "aspen poplar"]),
        new("norway_spruce", "Norway spruce", false, StringyWood.Never, 455, null, null, null, NewtonsAsLbf(1850), "A1", Provenance.FromMemory, "from-memory", ["spruce", "european spruce", "european whitewood"]),
        new("scots_pine", "Scots pine", false, StringyWood.Never, 515, null, null, null, NewtonsAsLbf(2400), "A1", Provenance.FromMemory, "from-memory", ["pine", "european redwood", "scotch pine", "red deal"]),
        new("european_larch", "European larch", false, StringyWood.Never, 590, null, null, null, NewtonsAsLbf(3300), "A2", Provenance.FromMemory, "from-memory", ["larch", "siberian larch"]),
        new("douglas_fir_european", "Douglas-fir (European grown)", false, StringyWood.Never, 530, null, null, null, null, "A2", Provenance.FromMemory, "from-memory", ["european douglas fir"]),
        new("silver_fir", "Silver fir", false, StringyWood.Never, 450, null, null, null, null, "A1", Provenance.FromMemory, "from-memory", ["fir", "european fir"]),
        new("yew", "Yew", false, StringyWood.Never, 670, null, null, null, null, "A3", Provenance.FromMemory, "from-memory", ["european yew"]),
    ];

    private static double NewtonsAsLbf(double newtons) => newtons / Exact.PoundForce;
}
