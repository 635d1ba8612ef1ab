using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tables;

public static partial class WoodSpeciesTable
{
    // Gravities and hardness as printed in the handbook for woods grown in the United States; density = 1120 G at 12 %, rounded.
    // key, name, hardwood, stringy, kg/m³ at 12 %, G green, G 12 %, side hardness green and 12 % (lbf), wear class, provenance, source, other names
    private static WoodSpecies[] American() =>
    [
        new("red_alder", "Red alder", true, StringyWood.Never, 459, 0.37, 0.41, 440, 590, "A1", Provenance.Published, "wood-handbook-282", ["western alder"]),
        new("white_ash", "White ash", true, StringyWood.Never, 672, 0.55, 0.60, 960, 1320, "A3", Provenance.Published, "wood-handbook-282", ["american ash", "american white ash"]),
        new("black_ash", "Black ash", true, StringyWood.Never, 549, 0.45, 0.49, 520, 850, "A2", Provenance.Published, "wood-handbook-282", []),
        new("quaking_aspen", "Quaking aspen", true, StringyWood.Always, 426, 0.35, 0.38, 300, 350, "A1", Provenance.Published, "wood-handbook-282", ["aspen", "trembling aspen"]),
        new("american_basswood", "American basswood", true, StringyWood.Never, 414, 0.32, 0.37, 250, 410, "A1", Provenance.Published, "wood-handbook-282", ["basswood"]),
        new("american_beech", "American beech", true, StringyWood.Never, 717, 0.56, 0.64, 850, 1300, "A3", Provenance.Published, "wood-handbook-282", ["us beech"]),
        new("paper_birch", "Paper birch", true, StringyWood.Never, 616, 0.48, 0.55, 560, 910, "A2", Provenance.Published, "wood-handbook-282", ["white birch", "canoe birch"]),
        new("yellow_birch", "Yellow birch", true, StringyWood.Never, 694, 0.55, 0.62, 780, 1260, "A3", Provenance.Published, "wood-handbook-282", []),
        new("butternut", "Butternut", true, StringyWood.Never, 426, 0.36, 0.38, 390, 490, "A1", Provenance.Published, "wood-handbook-282", ["white walnut"]),
        new("black_cherry", "Black cherry", true, StringyWood.Never, 560, 0.47, 0.50, 660, 950, "A2", Provenance.Published, "wood-handbook-282", ["cherry", "american cherry", "wild black cherry"]),
        new("eastern_cottonwood", "Eastern cottonwood", true, StringyWood.Always, 448, 0.37, 0.40, 340, 430, "A1", Provenance.Published, "wood-handbook-282", ["cottonwood", "eastern poplar"]),
        new("american_elm", "American elm", true, StringyWood.Never, 560, 0.46, 0.50, 620, 830, "A2", Provenance.Published, "wood-handbook-282", ["elm", "white elm"]),
        new("hackberry", "Hackberry", true, StringyWood.Never, 594, 0.49, 0.53, 700, 880, "A2", Provenance.Published, "wood-handbook-282", []),
        new("pecan_hickory", "Pecan hickory", true, StringyWood.Never, 739, 0.60, 0.66, 1310, 1820, "A3", Provenance.Published, "wood-handbook-282", ["pecan"]),
        new("shagbark_hickory", "Shagbark hickory", true, StringyWood.Never, 806, 0.64, 0.72, 1460, 1880, "A3", Provenance.Published, "wood-handbook-282", ["hickory"]),
        new("black_locust", "Black locust", true, StringyWood.Never, 773, 0.66, 0.69, 1570, 1700, "A3", Provenance.Published, "wood-handbook-282", ["locust", "robinia", "false acacia"]),
        new("bigleaf_maple", "Bigleaf maple", true, StringyWood.Never, 538, 0.44, 0.48, 620, 850, "A2", Provenance.Published, "wood-handbook-282", ["oregon maple", "pacific maple"]),
        new("red_maple", "Red maple", true, StringyWood.Never, 605, 0.49, 0.54, 700, 950, "A2", Provenance.Published, "wood-handbook-282", ["soft maple"]),
        new("silver_maple", "Silver maple", true, StringyWood.Never, 526, 0.44, 0.47, 590, 700, "A2", Provenance.Published, "wood-handbook-282", []),
        new("sugar_maple", "Sugar maple", true, StringyWood.Never, 706, 0.56, 0.63, 970, 1450, "A3", Provenance.Published, "wood-handbook-282", ["maple", "hard maple", "rock maple"]),
        new("northern_red_oak", "Northern red oak", true, StringyWood.Never, 706, 0.56, 0.63, 1000, 1290, "A3", Provenance.Published, "wood-handbook-282", ["red oak", "american red oak", "northern oak"]),
        new("white_oak", "White oak", true, StringyWood.Never, 762, 0.60, 0.68, 1060, 1360, "A3", Provenance.FromMemory, "from-memory", ["american white oak"]),
        new("swamp_white_oak", "Swamp white oak", true, StringyWood.Never, 806, 0.64, 0.72, 1160, 1620, "A3", Provenance.Published, "wood-handbook-282", []),
        new("sweetgum", "Sweetgum", true, StringyWood.Never, 582, 0.46, 0.52, 600, 850, "A2", Provenance.Published, "wood-handbook-282", ["red gum", "satin walnut"]),
        new("american_sycamore", "American sycamore", true, StringyWood.Never, 549, 0.46, 0.49, 610, 770, "A2", Provenance.Published, "wood-handbook-282", ["american plane", "buttonwood"]),
        new("black_tupelo", "Black tupelo", true, StringyWood.Never, 560, 0.46, 0.50, 640, 810, "A2", Provenance.Published, "wood-handbook-282", ["tupelo", "black gum"]),
        new("black_walnut", "Black walnut", true, StringyWood.Never, 616, 0.51, 0.55, 900, 1010, "A2", Provenance.Published, "wood-handbook-282", ["walnut", "american walnut", "american black walnut"]),
        new("yellow_poplar", "Yellow-poplar", true, StringyWood.Always, 470, 0.40, 0.42, 440, 540, "A1", Provenance.Published, "wood-handbook-282", ["tulipwood", "tulip poplar", "tulip tree", "american whitewood", "yellow poplar wood"]),
        new("baldcypress", "Baldcypress", false, StringyWood.Never, 515, 0.42, 0.46, 390, 510, "A2", Provenance.Published, "wood-handbook-282", ["cypress", "bald cypress", "swamp cypress"]),
        new("western_redcedar", "Western redcedar", false, StringyWood.WhenWet, 358, 0.31, 0.32, 260, 350, "A1", Provenance.Published, "wood-handbook-282", ["cedar", "red cedar", "western red cedar"]),
        new("northern_white_cedar", "Northern white cedar", false, StringyWood.WhenWet, 347, 0.29, 0.31, 230, 320, "A1", Provenance.Published, "wood-handbook-282", ["white cedar", "eastern white cedar", "arborvitae"]),
        new("douglas_fir", "Douglas-fir (coast)", false, StringyWood.Never, 538, 0.45, 0.48, 500, 710, "A2", Provenance.Published, "wood-handbook-282", ["douglas", "doug fir", "oregon pine"]),
        new("balsam_fir", "Balsam fir", false, StringyWood.Never, 392, 0.33, 0.35, 290, 380, "A1", Provenance.Published, "wood-handbook-282", []),
        new("white_fir", "White fir", false, StringyWood.Never, 437, 0.37, 0.39, 340, 480, "A1", Provenance.Published, "wood-handbook-282", ["concolor fir"]),
        new("western_larch", "Western larch", false, StringyWood.Never, 582, 0.48, 0.52, 510, 830, "A2", Provenance.Published, "wood-handbook-282", ["american larch"]),
        new("eastern_white_pine", "Eastern white pine", false, StringyWood.Never, 392, 0.34, 0.35, 290, 380, "A1", Provenance.Published, "wood-handbook-282", ["white pine", "yellow pine of quebec", "weymouth pine"]),
        new("lodgepole_pine", "Lodgepole pine", false, StringyWood.Never, 459, 0.38, 0.41, 330, 480, "A1", Provenance.Published, "wood-handbook-282", []),
        new("loblolly_pine", "Loblolly pine", false, StringyWood.Never, 571, 0.47, 0.51, 450, 690, "A2", Provenance.Published, "wood-handbook-282", ["southern pine", "southern yellow pine", "yellow pine"]),
        new("longleaf_pine", "Longleaf pine", false, StringyWood.Never, 661, 0.54, 0.59, 590, 870, "A2", Provenance.Published, "wood-handbook-282", ["pitch pine"]),
        new("ponderosa_pine", "Ponderosa pine", false, StringyWood.Never, 448, 0.38, 0.40, 320, 460, "A1", Provenance.Published, "wood-handbook-282", ["western yellow pine"]),
        new("red_pine", "Red pine", false, StringyWood.Never, 515, 0.41, 0.46, 340, 560, "A1", Provenance.Published, "wood-handbook-282", ["norway pine"]),
        new("redwood_old_growth", "Redwood (old growth)", false, StringyWood.Never, 448, 0.38, 0.40, 410, 480, "A1", Provenance.Published, "wood-handbook-282", ["redwood", "californian redwood", "coast redwood"]),
        new("engelmann_spruce", "Engelmann spruce", false, StringyWood.Never, 392, 0.33, 0.35, 260, 390, "A1", Provenance.Published, "wood-handbook-282", []),
        new("sitka_spruce", "Sitka spruce", false, StringyWood.Never, 448, 0.37, 0.40, 350, 510, "A1", Provenance.Published, "wood-handbook-282", []),
        new("white_spruce", "White spruce", false, StringyWood.Never, 403, 0.33, 0.36, 270, 410, "A1", Provenance.Published, "wood-handbook-282", []),
        new("tamarack", "Tamarack", false, StringyWood.Never, 594, 0.49, 0.53, 380, 590, "A2", Provenance.Published, "wood-handbook-282", ["eastern larch", "hackmatack"]),
    ];
}
