namespace BladeLog.Handbook.Quantities;

/// <summary>A density, in kilograms per cubic metre. One unit inside; the factories name the unit going in, the properties the one coming out.</summary>
public readonly record struct Density(double KilogramsPerCubicMetre);
