using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;

namespace BladeLog.Ui;

/// <summary>
/// Birmingham (Stubs) wire gauge, by which wide band steel is sold. The table is defined in inches; the figures are
/// those of Holtzapffel's measured table as reprinted in building handbooks, and later tables of wire and tube makers
/// agree with it. Other gauges (standard wire gauge, sheet gauges) give other thicknesses for the same number.
/// </summary>
public static class BirminghamGauge
{
    /// <summary>Smallest number taken.</summary>
    public const int Thickest = 10;

    /// <summary>Greatest number taken.</summary>
    public const int Thinnest = 28;

    private static readonly double[] _inches =
    [
        0.134, 0.120, 0.109, 0.095, 0.083, 0.072, 0.065, 0.058, 0.049, 0.042,
        0.035, 0.032, 0.028, 0.025, 0.022, 0.020, 0.018, 0.016, 0.014,
    ];

    /// <summary>The thickness of a gauge number, or null outside the table.</summary>
    public static Length? Thickness(int number)
        => number is >= Thickest and <= Thinnest ? new Length(_inches[number - Thickest] * Exact.Inch) : null;
}
