using BladeLog.Handbook.Units;

namespace BladeLog.Ui;

/// <summary>What a field on a page asks for: its name with article, and the range (SI) outside which the text is a slip.</summary>
/// <remarks>The ranges are engineering defaults, wide enough that no real band saw falls outside; they catch a wrong unit or a lost decimal mark.</remarks>
public sealed record TypedField(string Name, double Least, double Most)
{
    /// <summary>
    /// "5,690" may mean 5690 or 5.69. Large fields (loops, boards, hour meters) take a comma followed by exactly
    /// three digits as thousands; the others take it as the decimal mark.
    /// </summary>
    public bool Large { get; init; }

    /// <summary>The field takes gauge numbers (BWG).</summary>
    public bool Gauge { get; init; }

    /// <summary>Inches are shown as thousandths, never as 64ths.</summary>
    public bool Thousandths { get; init; }

    /// <summary>Unit of a number typed bare, where it is not the shop's.</summary>
    public string? Bare { get; init; }

    /// <summary>What one tap adds beside the field, in the unit shown there: as fine as the thing is measured. The other keys go ten.</summary>
    public decimal Step { get; init; } = 1;

    /// <summary>The same in an inch shop, where it is another number.</summary>
    public decimal? InchStep { get; init; }

    internal string Plain => Name[(Name.IndexOf(' ', StringComparison.Ordinal) + 1)..];

    internal string Capital => char.ToUpperInvariant(Name[0]) + Name[1..];
}

/// <summary>The fields of the pages.</summary>
public static class Fields
{
    public static TypedField AnyLength { get; } = new("a length", 0, 1000);
    public static TypedField BladeWidth { get; } = new("a blade width", 0.5e-3, 0.6) { Step = 0.1m, InchStep = 0.01m };
    public static TypedField Thickness { get; } = new("a blade thickness", 0.05e-3, 6e-3) { Gauge = true, Thousandths = true, Step = 0.01m, InchStep = 0.001m };
    public static TypedField GulletDepth { get; } = new("a gullet depth", 0.1e-3, 0.1) { Thousandths = true, Step = 0.1m, InchStep = 0.01m };
    public static TypedField GulletRadius { get; } = new("a gullet radius", 0.05e-3, 0.1) { Thousandths = true, Step = 0.1m, InchStep = 0.01m };
    public static TypedField Kerf { get; } = new("a kerf", 0.1e-3, 20e-3) { Thousandths = true, Step = 0.01m, InchStep = 0.001m };
    public static TypedField Set { get; } = new("a set", 0, 5e-3) { Thousandths = true, Step = 0.01m, InchStep = 0.001m };
    public static TypedField Bite { get; } = new("a bite", 1e-6, 10e-3) { Thousandths = true };
    public static TypedField EdgeRadius { get; } = new("an edge radius", 0.1e-6, 1e-3) { Bare = "um", Thousandths = true };
    public static TypedField CrackLength { get; } = new("a crack length", 0, 0.6) { Thousandths = true, Step = 0.1m, InchStep = 0.01m };
    public static TypedField Loop { get; } = new("a loop length", 0.3, 40) { Large = true, InchStep = 0.1m };
    public static TypedField WheelDiameter { get; } = new("a wheel diameter", 0.05, 5) { Large = true };
    public static TypedField TyreThickness { get; } = new("a tyre thickness", 0, 0.05);
    public static TypedField CutHeight { get; } = new("a cut height", 0.1e-3, 4) { InchStep = 0.1m };
    public static TypedField Board { get; } = new("a board length", 1e-3, 100) { Large = true, Step = 10, InchStep = 1 };
    public static TypedField CutLength { get; } = Board with { Name = "the length of one cut" };
    public static TypedField CurveRadius { get; } = new("a curve radius", 0.5e-3, 100) { InchStep = 0.1m };
    public static TypedField Deflection { get; } = new("a deflection", 0, 0.1) { Thousandths = true, Step = 0.01m, InchStep = 0.001m };
    public static TypedField Pitch { get; } = new("a tooth pitch", 0.5e-3, 0.2);

    public static TypedField Stress { get; } = new("a tension", 0, 1e9) { InchStep = 100 };
    public static TypedField Force { get; } = new("a force", 0, 1e6) { Step = 10, InchStep = 1 };
    public static TypedField BandSpeed { get; } = new("a band speed", 0.1, 100);
    public static TypedField Feed { get; } = new("a feed", 1e-5, 5) { Step = 0.1m, InchStep = 0.5m };
    public static TypedField Power { get; } = new("a motor power", 10, 500e3);
    public static TypedField Density { get; } = new("a density", 50, 2500);

    public static TypedField Hook { get; } = new("a hook angle", -45 * Math.PI / 180, 60 * Math.PI / 180);
    public static TypedField Bevel { get; } = new("a bevel", 0, 80 * Math.PI / 180);
    public static TypedField AnyAngle { get; } = new("an angle", -2 * Math.PI, 2 * Math.PI) { Step = 0.1m };

    public static TypedField Percent { get; } = new("a percentage", 0, 100);

    /// <summary>On dry weight, so very wet wood is over 100 %.</summary>
    public static TypedField Moisture { get; } = new("a moisture content", 0, 300);

    public static TypedField RunHours { get; } = new("a running time", 0, 10_000 * 3600.0) { Bare = "h", Step = 0.1m };
    public static TypedField HourMeter { get; } = new("an hour-meter reading", 0, 1e6 * 3600.0) { Bare = "h", Large = true, Step = 0.1m };
    public static TypedField Minutes { get; } = new("a time", 0, 10_000 * 3600.0) { Bare = "min" };
    public static TypedField MinutesLost { get; } = new("the time lost", 0, 6000 * 60.0) { Bare = "min" };
    public static TypedField Seconds { get; } = new("a time", 0, 10_000 * 3600.0) { Bare = "s" };

    public static TypedField Pieces { get; } = new("a number of pieces", 1, 1e6);
    public static TypedField TeethMissing { get; } = new("a number of teeth", 1, 500);
    public static TypedField Count { get; } = new("a whole number", 0, 1e9);
    public static TypedField Stock { get; } = new("a number of blades", 0, 1000);
    public static TypedField Revolutions { get; } = new("a wheel speed", 1, 20_000);

    /// <summary>In minor units.</summary>
    public static TypedField Money { get; } = new("an amount of money", 0, 1e13);

    /// <summary>Longest inch part after feet.</summary>
    internal static double InchesInAFoot => Exact.Foot / Exact.Inch;
}
