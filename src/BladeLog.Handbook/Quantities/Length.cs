namespace BladeLog.Handbook.Quantities;

/// <summary>A length, in metres. One unit inside; the factories name the unit going in, the properties the one coming out.</summary>
public readonly record struct Length(double Metres)
{
    /// <summary>From millimetres.</summary>
    public static Length FromMillimetres(double mm) => new(mm * 1e-3);

    /// <summary>From micrometres.</summary>
    public static Length FromMicrometres(double um) => new(um * 1e-6);

    /// <summary>In millimetres.</summary>
    public double Millimetres => Metres * 1e3;

    /// <summary>In micrometres.</summary>
    public double Micrometres => Metres * 1e6;
}
