namespace BladeLog.Handbook.Quantities;

/// <summary>A frequency, in hertz. One unit inside; the factories name the unit going in, the properties the one coming out.</summary>
public readonly record struct Frequency(double Hertz);
