namespace BladeLog.Handbook.Quantities;

/// <summary>A stiffness, in newtons per metre. One unit inside; the factories name the unit going in, the properties the one coming out.</summary>
public readonly record struct Stiffness(double NewtonsPerMetre)
{
    /// <summary>In newtons per millimetre.</summary>
    public double NewtonsPerMillimetre => NewtonsPerMetre * 1e-3;
}
