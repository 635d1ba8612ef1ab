using static BladeLog.Handbook.Quantities.Provenance;

namespace BladeLog.Advice;

/// <summary>How far the handbook's lives are trusted, the marks of used life, and how edges wear.</summary>
public static class LifeSettings
{
    public static readonly SettingDefinition Shape = new("life.shape", "Scatter between blades of one kind (Weibull shape)", 2.0, "", 1, 6, EngineeringDefault, "used life of gullets and weld together, the 1-in-10 mark");
    public static readonly SettingDefinition Trust = new("life.trust", "The handbook's lives are right within a factor of", 3, "", 1.2, 10, EngineeringDefault, "the band around used life, the chance of a break");
    public static readonly SettingDefinition ShapeSpread = new("life.shape_spread", "How well the scatter is known (spread of its logarithm)", 0.35, "", 0.01, 1, EngineeringDefault, "the chance of a break");
    public static readonly SettingDefinition Spread1 = new("life.group_spread_1", "Spread between kinds of blades, first guess", 0.2, "", 0.01, 2, EngineeringDefault, "the band around used life, the chance of a break");
    public static readonly SettingDefinition Spread2 = new("life.group_spread_2", "Spread between kinds of blades, second guess", 0.4, "", 0.01, 2, EngineeringDefault, "the band around used life, the chance of a break");
    public static readonly SettingDefinition Spread3 = new("life.group_spread_3", "Spread between kinds of blades, third guess", 0.6, "", 0.01, 2, EngineeringDefault, "the band around used life, the chance of a break");
    public static readonly SettingDefinition Spread4 = new("life.group_spread_4", "Spread between kinds of blades, fourth guess", 0.9, "", 0.01, 2, EngineeringDefault, "the band around used life, the chance of a break");
    public static readonly SettingDefinition Weight1 = new("life.group_weight_1", "Weight of the first guess", 0.25, "", 0, 1, EngineeringDefault, "the band around used life, the chance of a break");
    public static readonly SettingDefinition Weight2 = new("life.group_weight_2", "Weight of the second guess", 0.35, "", 0, 1, EngineeringDefault, "the band around used life, the chance of a break");
    public static readonly SettingDefinition Weight3 = new("life.group_weight_3", "Weight of the third guess", 0.25, "", 0, 1, EngineeringDefault, "the band around used life, the chance of a break");
    public static readonly SettingDefinition Weight4 = new("life.group_weight_4", "Weight of the fourth guess", 0.15, "", 0.001, 1, EngineeringDefault, "the band around used life, the chance of a break");
    public static readonly SettingDefinition WatchShare = new("life.watch_share", "Share of such blades broken at the watch mark", 0.10, "", 0.01, 0.4, EngineeringDefault, "from there on a blade is inspected before each mount");
    public static readonly SettingDefinition RetireMark = new("life.retire_mark", "Retire mark: life used (0.39 is 1 in 10 broken by then, 0.64 1 in 4, 0.80 36 in 100)", 0.80, "", 0.1, 1, EngineeringDefault, "no further grind, rough work only, then scrap");
    public static readonly SettingDefinition ChanceHours = new("life.chance_hours", "Hours ahead for the chance of a break", 10, "h", 1, 100, EngineeringDefault, "the chance of a break on a blade's page");

    public static readonly SettingDefinition Dull = new("edge.dull", "Edge radius of a dull blade, rough work", 40, "µm", 15, 100, EngineeringDefault, "when to sharpen, metres left");
    public static readonly SettingDefinition DullFine = new("edge.dull_fine", "Edge radius too dull for fine and medium work", 30, "µm", 10, 100, EngineeringDefault, "which blades a cut refuses");
    public static readonly SettingDefinition DueShare = new("edge.due_share", "Sharpening is due at this share of dull", 0.95, "", 0.5, 1, EngineeringDefault, "the state sharpen");
    public static readonly SettingDefinition Fresh = new("edge.fresh", "Edge radius of a freshly ground steel tooth", 8, "µm", 3, 30, FromMemory, "sharpness after a grind", "from-memory");
    public static readonly SettingDefinition FreshCarbide = new("edge.fresh_carbide", "Edge radius of a freshly ground carbide tooth", 10, "µm", 3, 30, FromMemory, "sharpness after a grind", "from-memory");
    public static readonly SettingDefinition RunIn = new("edge.run_in", "Rounding gained by running in", 4, "µm", 0, 15, EngineeringDefault, "sharpness");
    public static readonly SettingDefinition RunInPath = new("edge.run_in_path", "Path over which a fresh edge runs in", 0.5, "km", 0.05, 5, EngineeringDefault, "sharpness");
    public static readonly SettingDefinition WearPlain = new("edge.wear_plain", "Wear of plain saw steel", 4, "µm/km", 0.5, 20, EngineeringDefault, "sharpness, metres left");
    public static readonly SettingDefinition WearHardened = new("edge.wear_hardened", "Wear of hardened tips", 2.5, "µm/km", 0.3, 15, EngineeringDefault, "sharpness, metres left");
    public static readonly SettingDefinition WearBimetal = new("edge.wear_bimetal", "Wear of bi-metal teeth", 1.0, "µm/km", 0.1, 8, EngineeringDefault, "sharpness, metres left");
    public static readonly SettingDefinition WearCobalt = new("edge.wear_cobalt", "Wear of cobalt alloy tips", 1.0, "µm/km", 0.1, 8, EngineeringDefault, "sharpness, metres left");
    public static readonly SettingDefinition WearCarbide = new("edge.wear_carbide", "Wear of carbide tips", 0.25, "µm/km", 0.02, 3, EngineeringDefault, "sharpness, metres left");
    public static readonly SettingDefinition ClassA1 = new("edge.class_a1", "How clean light woods wear an edge", 0.7, "times", 0.2, 5, EngineeringDefault, "equivalent path");
    public static readonly SettingDefinition ClassA2 = new("edge.class_a2", "How clean medium woods wear an edge", 1.0, "times", 0.2, 5, EngineeringDefault, "equivalent path");
    public static readonly SettingDefinition ClassA3 = new("edge.class_a3", "How dense woods wear an edge", 1.5, "times", 0.2, 10, EngineeringDefault, "equivalent path");
    public static readonly SettingDefinition ClassA4 = new("edge.class_a4", "How very dense or mineral woods wear an edge", 3, "times", 0.5, 20, EngineeringDefault, "equivalent path");
    public static readonly SettingDefinition ClassA5 = new("edge.class_a5", "How silica woods wear an edge", 8, "times", 1, 40, EngineeringDefault, "equivalent path");
    public static readonly SettingDefinition ClassP = new("edge.class_p", "How glued panels wear an edge", 4, "times", 0.5, 20, EngineeringDefault, "equivalent path");
    public static readonly SettingDefinition BarkOn = new("edge.bark_on", "Bark on, or dragged logs", 2, "times", 1, 10, EngineeringDefault, "equivalent path");
    public static readonly SettingDefinition Reclaimed = new("edge.reclaimed", "Reclaimed timber", 2, "times", 1, 10, EngineeringDefault, "equivalent path");
    public static readonly SettingDefinition ReferenceDepth = new("edge.reference_depth", "Depth for metres left", 100, "mm", 5, 1000, EngineeringDefault, "metres left on a shop saw");
    public static readonly SettingDefinition ReferenceFeed = new("edge.reference_feed", "Feed for metres left", 2, "m/min", 0.1, 50, EngineeringDefault, "metres left on a shop saw");
    public static readonly SettingDefinition ReferenceDepthMill = new("edge.reference_depth_mill", "Depth for metres left on a saw that takes logs", 300, "mm", 5, 1500, EngineeringDefault, "metres left on a mill");
    public static readonly SettingDefinition ReferenceFeedMill = new("edge.reference_feed_mill", "Feed for metres left on a saw that takes logs", 8, "m/min", 0.1, 90, EngineeringDefault, "metres left on a mill");
    public static readonly SettingDefinition MillInterval = new("edge.mill_interval", "Running between sharpenings on a saw that takes logs", 2, "h", 0.25, 40, CommonPractice, "whether another grind pays", "common-practice");

    public static IReadOnlyList<SettingDefinition> All { get; } =
    [
        Shape, Trust, ShapeSpread, Spread1, Spread2, Spread3, Spread4, Weight1, Weight2, Weight3, Weight4, WatchShare, RetireMark, ChanceHours,
        Dull, DullFine, DueShare, Fresh, FreshCarbide, RunIn, RunInPath, WearPlain, WearHardened, WearBimetal, WearCobalt, WearCarbide,
        ClassA1, ClassA2, ClassA3, ClassA4, ClassA5, ClassP, BarkOn, Reclaimed,
        ReferenceDepth, ReferenceFeed, ReferenceDepthMill, ReferenceFeedMill, MillInterval,
    ];
}
