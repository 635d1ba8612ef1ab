namespace BladeLog.Handbook.Quantities;

/// <summary>A force, in newtons. One unit inside; the factories name the unit going in, the properties the one coming out.</summary>
public readonly record struct Force(double Newtons);
