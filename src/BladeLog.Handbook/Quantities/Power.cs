namespace BladeLog.Handbook.Quantities;

/// <summary>A power, in watts. One unit inside; the factories name the unit going in, the properties the one coming out.</summary>
public readonly record struct Power(double Watts);
