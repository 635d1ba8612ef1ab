using static BladeLog.Handbook.Quantities.Provenance;

namespace BladeLog.Advice;

/// <summary>What a blade is taken to be where the shop has not said, and how its steel tires.</summary>
public static class BladeSettings
{
    public static readonly SettingDefinition YoungsModulus = new("steel.youngs_modulus", "Young's modulus of blade steel", 207, "GPa", 180, 230, FromMemory, "bending stress, stretch, stability", "shigley");
    public static readonly SettingDefinition Poisson = new("steel.poisson", "Poisson's ratio of blade steel", 0.30, "", 0.2, 0.4, FromMemory, "bending of wide bands, stability", "shigley");
    public static readonly SettingDefinition Density = new("steel.density", "Density of blade steel", 7850, "kg/m³", 7000, 8500, FromMemory, "tension of a running band", "shigley");

    public static readonly SettingDefinition GulletTension = new("fatigue.gullet_tension", "Gullet's factor on tension", 2.0, "", 1, 4, EngineeringDefault, "life at the gullets");
    public static readonly SettingDefinition GulletBending = new("fatigue.gullet_bending", "Gullet's factor on bending", 1.4, "", 1, 3, EngineeringDefault, "life at the gullets");
    public static readonly SettingDefinition Knee = new("fatigue.knee", "Bends at the knee of the stress-life line", 1e7, "bends", 1e6, 1e8, EngineeringDefault, "life of lightly bent blades");

    public static readonly SettingDefinition HrcFlexible = new("body.hrc_flexible", "Hardness of a flexible back", 30, "HRC", 20, 58, EngineeringDefault, "life, where no hardness is given");
    public static readonly SettingDefinition HrcSpring = new("body.hrc_spring", "Hardness of a spring-tempered back", 46, "HRC", 20, 58, EngineeringDefault, "life, where no hardness is given");
    public static readonly SettingDefinition HrcBimetal = new("body.hrc_bimetal", "Hardness of a bi-metal back", 46, "HRC", 20, 58, EngineeringDefault, "life, where no hardness is given");
    public static readonly SettingDefinition HrcCarbide = new("body.hrc_carbide", "Hardness of the back of a carbide-tipped blade", 46, "HRC", 20, 58, EngineeringDefault, "life, where no hardness is given");
    public static readonly SettingDefinition HrcWide = new("body.hrc_wide", "Hardness of wide strip", 44, "HRC", 20, 58, EngineeringDefault, "life, where no hardness is given");

    public static readonly SettingDefinition TensionFlexible = new("body.tension_flexible", "Tension of a flexible back", 90, "MPa", 20, 300, EngineeringDefault, "life and stability, where no tension is known");
    public static readonly SettingDefinition TensionSpring = new("body.tension_spring", "Tension of a spring-tempered back", 130, "MPa", 20, 300, EngineeringDefault, "life and stability, where no tension is known");
    public static readonly SettingDefinition TensionBimetal = new("body.tension_bimetal", "Tension of a bi-metal back", 150, "MPa", 20, 300, EngineeringDefault, "life and stability, where no tension is known");
    public static readonly SettingDefinition TensionCarbide = new("body.tension_carbide", "Tension of a carbide-tipped blade", 150, "MPa", 20, 300, EngineeringDefault, "life and stability, where no tension is known");
    public static readonly SettingDefinition TensionWide = new("body.tension_wide", "Tension of wide strip", 140, "MPa", 20, 300, EngineeringDefault, "life and stability, where no tension is known");

    public static readonly SettingDefinition KerfSet = new("blade.kerf_set", "Kerf of set teeth over the body", 1.8, "times the body", 1.1, 2.0, EngineeringDefault, "kerf, where none is measured");
    public static readonly SettingDefinition KerfTipped = new("blade.kerf_tipped", "Kerf of swaged and tipped teeth over the body", 2.0, "times the body", 1.1, 3.0, EngineeringDefault, "kerf, where none is measured");
    public static readonly SettingDefinition SetUneven = new("blade.set_uneven", "Set of one side over the other from which a blade is said to lead", 0.05, "mm", 0, 1, EngineeringDefault, "why a blade leads");
    public static readonly SettingDefinition Flutter = new("blade.flutter", "Slot over the set teeth from which a blade is said to flutter", 0.05, "mm", 0, 1, EngineeringDefault, "what a test cut tells");
    public static readonly SettingDefinition GulletShare = new("blade.gullet_share", "Gullet depth of regular and hook teeth", 0.40, "of the pitch", 0.1, 0.7, EngineeringDefault, "gullet depth, where none is given");
    public static readonly SettingDefinition GulletShareSkip = new("blade.gullet_share_skip", "Gullet depth of skip teeth", 0.25, "of the pitch", 0.1, 0.7, EngineeringDefault, "gullet depth, where none is given");
    public static readonly SettingDefinition GulletOfWidth = new("blade.gullet_of_width", "Greatest gullet depth", 0.20, "of the width", 0.1, 0.5, Published, "gullet depth, where none is given", "spons");
    public static readonly SettingDefinition HookRake = new("blade.rake_hook", "Hook of hook teeth", 10, "°", 0, 35, CommonPractice, "force and thrust, where no hook is given", "common-practice");
    public static readonly SettingDefinition LeastWidth = new("blade.least_width", "Least width", 0.75, "of the new width", 0.5, 0.95, CommonPractice, "when width ends a blade", "common-practice");
    public static readonly SettingDefinition Grind = new("blade.grind", "Width lost in one sharpening", 0.20, "mm", 0.01, 2, CommonPractice, "grinds left, where the blade has none of its own", "common-practice");
    public static readonly SettingDefinition MostWelds = new("blade.most_welds", "Welds a loop may have", 2, "welds", 1, 10, CommonPractice, "when welds end a blade", "common-practice");

    public static readonly SettingDefinition FrontEdge = new("stability.front_edge", "Safety against a slack front edge", 1.0, "", 1, 3, EngineeringDefault, "thrust a blade may be given");
    public static readonly SettingDefinition FrontEdgeGuessed = new("stability.front_edge_guessed", "The same with a guessed tension", 1.25, "", 1, 3, EngineeringDefault, "thrust a blade may be given");
    public static readonly SettingDefinition Buckling = new("stability.buckling", "Safety against twisting over", 2.0, "", 1, 5, EngineeringDefault, "thrust a blade may be given");

    public static IReadOnlyList<SettingDefinition> All { get; } =
    [
        YoungsModulus, Poisson, Density, GulletTension, GulletBending, Knee,
        HrcFlexible, HrcSpring, HrcBimetal, HrcCarbide, HrcWide,
        TensionFlexible, TensionSpring, TensionBimetal, TensionCarbide, TensionWide,
        KerfSet, KerfTipped, SetUneven, Flutter, GulletShare, GulletShareSkip, GulletOfWidth, HookRake, LeastWidth, Grind, MostWelds,
        FrontEdge, FrontEdgeGuessed, Buckling,
    ];
}
