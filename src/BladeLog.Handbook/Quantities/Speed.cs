namespace BladeLog.Handbook.Quantities;

/// <summary>A speed, in metres per second. One unit inside; the factories name the unit going in, the properties the one coming out.</summary>
public readonly record struct Speed(double MetresPerSecond)
{
    /// <summary>From metres per minute, as feeds are spoken of.</summary>
    public static Speed FromMetresPerMinute(double mpm) => new(mpm / 60);

    /// <summary>In metres per minute.</summary>
    public double MetresPerMinute => MetresPerSecond * 60;
}
