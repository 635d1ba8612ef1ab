namespace BladeLog.Handbook.Quantities;

/// <summary>An area, in square metres. One unit inside; the factories name the unit going in, the properties the one coming out.</summary>
public readonly record struct Area(double SquareMetres)
{
    /// <summary>In square millimetres.</summary>
    public double SquareMillimetres => SquareMetres * 1e6;
}
