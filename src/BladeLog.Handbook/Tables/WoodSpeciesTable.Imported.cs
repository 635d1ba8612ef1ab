using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tables;

public static partial class WoodSpeciesTable
{
    // The handbook prints the green gravity only; density by way of Simpson 1993, rounded. Merbau: dry hardness at 15 %.
    // key, name, hardwood, stringy, kg/m³ at 12 %, G green, G 12 %, side hardness green and 12 % (lbf), wear class, provenance, source, other names
    private static WoodSpecies[] Imported() =>
    [
        new("radiata_pine", "Radiata pine", false, StringyWood.Never, 504, 0.42, null, 480, 750, "A1", Provenance.Published, "wood-handbook-282", ["monterey pine", "insignis pine"]),
        new("african_mahogany", "African mahogany", true, StringyWood.Never, 504, 0.42, null, 640, 830, "A2", Provenance.Published, "wood-handbook-282", ["khaya"]),
        new("true_mahogany", "True mahogany", true, StringyWood.Never, 543, 0.45, null, 740, 800, "A2", Provenance.Published, "wood-handbook-282", ["mahogany", "honduras mahogany", "american mahogany", "brazilian mahogany"]),
        new("sapele", "Sapele", true, StringyWood.Never, 675, 0.55, null, 1020, 1510, "A3", Provenance.Published, "wood-handbook-282", ["sapelli"]),
        new("iroko", "Iroko", true, StringyWood.Never, 662, 0.54, null, 1080, 1260, "A4", Provenance.Published, "wood-handbook-282", ["kambala"]),
        new("teak", "Teak", true, StringyWood.Never, 675, 0.55, null, 930, 1000, "A5", Provenance.Published, "wood-handbook-282", []),
        new("obeche", "Obeche", true, StringyWood.Never, 353, 0.30, null, 420, 430, "A1", Provenance.Published, "wood-handbook-282", ["ayous", "wawa", "samba"]),
        new("limba", "Limba", true, StringyWood.Never, 453, 0.38, null, 400, 490, "A1", Provenance.Published, "wood-handbook-282", ["korina", "afara"]),
        new("spanish_cedar", "Spanish-cedar", true, StringyWood.Never, 491, 0.41, null, 550, 600, "A1", Provenance.Published, "wood-handbook-282", ["cedro", "cigar box cedar"]),
        new("dark_red_meranti", "Dark red meranti", true, StringyWood.Never, 556, 0.46, null, 700, 780, "A2", Provenance.Published, "wood-handbook-282", ["meranti", "red meranti", "philippine mahogany", "lauan"]),
        new("keruing", "Keruing", true, StringyWood.Never, 868, 0.69, null, 1060, 1270, "A5", Provenance.Published, "wood-handbook-282", ["apitong"]),
        new("kapur", "Kapur", true, StringyWood.Never, 798, 0.64, null, 980, 1230, "A5", Provenance.Published, "wood-handbook-282", []),
        new("mersawa", "Mersawa", true, StringyWood.Never, 635, 0.52, null, 880, 1290, "A5", Provenance.Published, "wood-handbook-282", []),
        new("merbau", "Merbau", true, StringyWood.Never, 798, 0.64, null, 1380, 1500, "A4", Provenance.Published, "wood-handbook-282", ["kwila"]),
        new("purpleheart", "Purpleheart", true, StringyWood.Never, 840, 0.67, null, 1810, 1860, "A4", Provenance.Published, "wood-handbook-282", ["amaranth"]),
        new("ipe", "Ipe", true, StringyWood.Never, 1207, 0.92, null, 3060, 3680, "A4", Provenance.Published, "wood-handbook-282", ["lapacho"]),
        new("jarrah", "Jarrah", true, StringyWood.Never, 840, 0.67, null, 1290, 1910, "A4", Provenance.Published, "wood-handbook-282", []),
        new("karri", "Karri", true, StringyWood.Never, 1056, 0.82, null, 1360, 2040, "A4", Provenance.Published, "wood-handbook-282", []),
        new("greenheart", "Greenheart", true, StringyWood.Never, 1027, 0.80, null, 1880, 2350, "A4", Provenance.Published, "wood-handbook-282", []),
        new("ramin", "Ramin", true, StringyWood.Never, 635, 0.52, null, 640, 1300, "A2", Provenance.Published, "wood-handbook-282", []),
        new("indian_rosewood", "Indian rosewood", true, StringyWood.Never, 954, 0.75, null, 1560, 3170, "A4", Provenance.Published, "wood-handbook-282", ["rosewood", "east indian rosewood", "sonokeling"]),
        new("manbarklak", "Manbarklak", true, StringyWood.Never, 1131, 0.87, null, 2280, 3480, "A5", Provenance.Published, "wood-handbook-282", []),
    ];
}
