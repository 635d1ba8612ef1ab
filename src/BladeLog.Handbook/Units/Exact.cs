namespace BladeLog.Handbook.Units;

/// <summary>Conversion factors that are exact by definition. The only file with conversion numbers.</summary>
public static class Exact
{
    /// <summary>Metres in an inch (international yard and pound agreement, 1959).</summary>
    public const double Inch = 0.0254;

    /// <summary>Metres in a foot.</summary>
    public const double Foot = 12 * Inch;

    /// <summary>Kilograms in a pound avoirdupois.</summary>
    public const double Pound = 0.45359237;

    /// <summary>Standard gravity, m/s².</summary>
    public const double StandardGravity = 9.80665;

    /// <summary>Newtons in a pound-force.</summary>
    public const double PoundForce = Pound * StandardGravity;

    /// <summary>Newtons in a kilogram-force.</summary>
    public const double KilogramForce = StandardGravity;

    /// <summary>Pascals in a pound-force per square inch.</summary>
    public const double Psi = PoundForce / (Inch * Inch);

    /// <summary>Cubic metres in a board foot: 144 cubic inches.</summary>
    public const double BoardFoot = 144 * Inch * Inch * Inch;

    /// <summary>Watts in a mechanical horsepower: 550 foot pound-force per second.</summary>
    public const double Horsepower = 550 * Foot * PoundForce;

    /// <summary>Watts in a metric horsepower: 75 kilogram-force metres per second.</summary>
    public const double MetricHorsepower = 75 * KilogramForce;
}
