namespace BladeLog.Handbook.Quantities;

/// <summary>An angle, in radians. One unit inside; the factories name the unit going in, the properties the one coming out.</summary>
public readonly record struct Angle(double Radians)
{
    /// <summary>From degrees.</summary>
    public static Angle FromDegrees(double deg) => new(deg * Math.PI / 180);

    /// <summary>In degrees.</summary>
    public double Degrees => Radians * 180 / Math.PI;
}
