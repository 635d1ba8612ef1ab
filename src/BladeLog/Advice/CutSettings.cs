using static BladeLog.Handbook.Quantities.Provenance;

namespace BladeLog.Advice;

/// <summary>The force model, the limits of feed, and the reckoning of a job.</summary>
public static class CutSettings
{
    public static readonly SettingDefinition Lambda = new("force.least_chip", "Least chip an edge lifts", 0.20, "of its radius", 0.05, 0.5, EngineeringDefault, "no-chip feed, force", "son-2005");
    public static readonly SettingDefinition ReferenceRadius = new("force.reference_radius", "Edge radius of the measurements", 10, "µm", 3, 30, EngineeringDefault, "force and thrust");
    public static readonly SettingDefinition Eta = new("force.rounding", "Chip thickness that rounding is worth", 4, "times", 1, 10, EngineeringDefault, "force and thrust");
    public static readonly SettingDefinition Xi = new("force.rounding_thrust", "Thrust of the rounding over its force", 1.5, "times", 0.5, 2.2, EngineeringDefault, "thrust");
    public static readonly SettingDefinition ThrustOffset = new("force.thrust_offset", "Thrust of the reference edge, as a chip", 25, "µm", 0, 100, EngineeringDefault, "thrust");
    public static readonly SettingDefinition ThrustAngle = new("force.thrust_angle", "Hook at which the chip stops pushing", 25, "°", 20, 30, Published, "thrust", "woodson-1979");
    public static readonly SettingDefinition Friction = new("force.friction", "Friction of chip on tooth", 0.6, "", 0.1, 1, Published, "force", "orlowski-2013");
    public static readonly SettingDefinition Toughness = new("force.toughness", "Work of parting the reference pine", 1295, "J/m²", 200, 5000, FromMemory, "force", "orlowski-2013");
    public static readonly SettingDefinition ShearYield = new("force.shear_yield", "Shear yield stress of the reference pine", 20.861, "MPa", 5, 60, FromMemory, "force", "orlowski-2013");
    public static readonly SettingDefinition PerDensity = new("force.per_density", "Shear factor per density at 20° hook", 97269.7, "Pa per kg/m³", 30000, 300000, Derived, "force, power and thrust", "derived");
    public static readonly SettingDefinition MoistureDrop = new("force.moisture_drop", "Share of the dry force lost from 12 to 30 % moisture", 0.375, "", 0, 0.7, Derived, "force in wet wood", "loehnertz-cooz");
    public static readonly SettingDefinition Cross = new("force.cross", "Force of a cross-cut over a rip cut", 0.7, "times", 0.2, 1.2, Derived, "force in cross-cuts", "engineering-default");
    public static readonly SettingDefinition Frozen = new("force.frozen", "Force of frozen wood over thawed", 1.3, "times", 1, 2, EngineeringDefault, "force in frozen wood");
    public static readonly SettingDefinition Fit = new("force.fit", "The shop's own force factor, from ammeter readings", 1, "times", 0.3, 3, EngineeringDefault, "force, power and thrust");
    public static readonly SettingDefinition LeastRadius = new("force.least_radius", "Least edge radius the formulas take", 3, "µm", 1, 10, EngineeringDefault, "force of a very keen edge");
    public static readonly SettingDefinition LowEnd = new("force.low_end", "Low end of the force model's own band (0.87 after five readings)", 0.70, "times", 0.5, 1, EngineeringDefault, "amber ends of motor, push, feeder and stability");

    public static readonly SettingDefinition Drive = new("motor.drive", "Share of the motor's power that reaches the blade", 0.85, "", 0.5, 1, EngineeringDefault, "motor limit");
    public static readonly SettingDefinition Idle = new("motor.idle", "Share of the motor that turns the saw idle", 0.10, "", 0, 0.5, EngineeringDefault, "motor limit, where idle power is not measured");
    public static readonly SettingDefinition LoadGreen = new("motor.load_green", "Motor load of easy work", 0.90, "of its power", 0.3, 1, EngineeringDefault, "motor limit, green");
    public static readonly SettingDefinition LoadAmber = new("motor.load_amber", "Greatest motor load", 1.00, "of its power", 0.5, 1.2, EngineeringDefault, "motor limit, amber");

    public static readonly SettingDefinition FillFrozen = new("fill.frozen", "Gullet fill in frozen wood", 0.40, "", 0.1, 0.9, EngineeringDefault, "chip room");
    public static readonly SettingDefinition FillStringy = new("fill.stringy", "Gullet fill in stringy wood", 0.45, "", 0.1, 0.9, EngineeringDefault, "chip room");
    public static readonly SettingDefinition FillDryHand = new("fill.dry_by_hand", "Gullet fill in dry wood, by hand", 0.40, "", 0.1, 0.9, EngineeringDefault, "chip room");
    public static readonly SettingDefinition FillDryFeeder = new("fill.dry_with_feeder", "Gullet fill in dry wood, with a feeder", 0.50, "", 0.1, 0.9, EngineeringDefault, "chip room");
    public static readonly SettingDefinition FillGreenSoftwood = new("fill.green_softwood", "Gullet fill in green softwood", 0.65, "", 0.1, 0.9, EngineeringDefault, "chip room");
    public static readonly SettingDefinition FillGreenHardwood = new("fill.green_hardwood", "Gullet fill in green hardwood", 0.60, "", 0.1, 0.9, EngineeringDefault, "chip room");
    public static readonly SettingDefinition FillAmber = new("fill.amber", "Gullets nearly full", 0.75, "", 0.2, 1, Published, "chip room, amber", "gullet-capacity-note");
    public static readonly SettingDefinition DryBelow = new("fill.dry_below", "Wood counts as dry below", 20, "% moisture", 5, 30, EngineeringDefault, "chip room");

    public static readonly SettingDefinition PushGreen = new("feed.push", "Push of an easy hand feed", 70, "N", 20, 200, EngineeringDefault, "push limit, green");
    public static readonly SettingDefinition PushAmber = new("feed.push_most", "Greatest push by hand", 100, "N", 20, 300, Published, "push limit, amber", "hse-l23");
    public static readonly SettingDefinition FeedByHand = new("feed.by_hand", "Greatest feed by hand, straight", 4, "m/min", 0.5, 20, CommonPractice, "practical feed", "common-practice");
    public static readonly SettingDefinition FeedOnCurve = new("feed.on_curve", "Greatest feed by hand, on a curve", 2, "m/min", 0.2, 10, CommonPractice, "practical feed", "common-practice");
    public static readonly SettingDefinition CurveBelow = new("feed.curve_below", "A cut counts as curved below this radius", 1000, "mm", 100, 10000, EngineeringDefault, "practical feed");
    public static readonly SettingDefinition AdvisedShare = new("feed.advised_share", "Feed advised, of the upper end of the window", 0.8, "", 0.3, 1, EngineeringDefault, "working feed");
    public static readonly SettingDefinition LeastTeeth = new("cut.least_teeth", "Least teeth in the cut", 3, "teeth", 1, 6, CommonPractice, "which blades a cut refuses", "common-practice");
    public static readonly SettingDefinition BiteFine = new("cut.bite_fine", "Greatest bite of a fine finish", 0.03, "mm", 0.005, 0.2, EngineeringDefault, "finish limit");
    public static readonly SettingDefinition BiteMedium = new("cut.bite_medium", "Greatest bite of a medium finish", 0.10, "mm", 0.01, 0.5, EngineeringDefault, "finish limit");
    public static readonly SettingDefinition CurveFactor = new("cut.curve_factor", "Usual tightest curve over the hard bound", 1.45, "times", 1, 2, Published, "relief cuts", "radius-tables");
    public static readonly SettingDefinition ReliefFactor = new("cut.relief", "Sawing time with relief cuts", 1.5, "times", 1, 3, EngineeringDefault, "time and cost of tight curves");
    public static readonly SettingDefinition Moisture = new("cut.moisture", "Moisture of wood where none is given", 10, "%", 4, 200, EngineeringDefault, "force, chip room");
    public static readonly SettingDefinition Handling = new("job.handling", "Handling of one piece", 0.5, "min", 0, 30, EngineeringDefault, "minutes of a job");
    public static readonly SettingDefinition RunningBetween = new("job.running_between", "Running between two cuts", 0.25, "min", 0, 30, EngineeringDefault, "life a job takes");
    public static readonly SettingDefinition Leader = new("job.leader", "Costs count as equal up to", 1.05, "times", 1, 1.5, EngineeringDefault, "which of two near blades leads");

    public static IReadOnlyList<SettingDefinition> All { get; } =
    [
        Lambda, ReferenceRadius, Eta, Xi, ThrustOffset, ThrustAngle, Friction, Toughness, ShearYield, PerDensity, MoistureDrop, Cross, Frozen, Fit, LeastRadius, LowEnd,
        Drive, Idle, LoadGreen, LoadAmber,
        FillFrozen, FillStringy, FillDryHand, FillDryFeeder, FillGreenSoftwood, FillGreenHardwood, FillAmber, DryBelow,
        PushGreen, PushAmber, FeedByHand, FeedOnCurve, CurveBelow, AdvisedShare,
        LeastTeeth, BiteFine, BiteMedium, CurveFactor, ReliefFactor, Moisture, Handling, RunningBetween, Leader,
    ];
}
