namespace BladeLog.Handbook.Quantities;

/// <summary>A stress or a modulus, in pascals. One unit inside; the factories name the unit going in, the properties the one coming out.</summary>
public readonly record struct Stress(double Pascals)
{
    /// <summary>From megapascals.</summary>
    public static Stress FromMegapascals(double mpa) => new(mpa * 1e6);

    /// <summary>In megapascals.</summary>
    public double Megapascals => Pascals * 1e-6;
}
