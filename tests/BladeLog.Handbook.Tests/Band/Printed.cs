using System.Globalization;

namespace BladeLog.Handbook.Tests.Band;

/// <summary>Compares with a printed figure: the tolerance is half a unit of the last digit it was rounded to.</summary>
internal static class Printed
{
    public static void Significant(double printed, double actual, int digits = 6)
    {
        double unit = Math.Pow(10, Math.Floor(Math.Log10(Math.Abs(printed))) - digits + 1);
        Check(printed, actual, unit);
    }

    public static void Decimals(double printed, double actual, int decimals) => Check(printed, actual, Math.Pow(10, -decimals));

    private static void Check(double printed, double actual, double unit)
    {
        // The hundredth over the half leaves room for a figure that falls on the edge of rounding.
        Assert.True(
            Math.Abs(actual - printed) <= 0.51 * unit,
            string.Create(CultureInfo.InvariantCulture, $"expected {printed:R}, got {actual:R}"));
    }
}
