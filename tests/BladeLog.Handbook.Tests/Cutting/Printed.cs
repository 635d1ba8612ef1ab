using System.Globalization;

namespace BladeLog.Handbook.Tests.Cutting;

/// <summary>Holds a result against a figure as it was printed: the tolerance is one unit of its last digit.</summary>
internal static class Printed
{
    internal static void Check(string printed, double actual, string what = "")
    {
        double expected = double.Parse(printed, CultureInfo.InvariantCulture);
        int point = printed.IndexOf('.', StringComparison.Ordinal);
        int decimals = point < 0 ? 0 : printed.Length - point - 1;
        double unit = Math.Pow(10, -decimals);
        Assert.True(Math.Abs(actual - expected) <= unit, $"{what} printed {printed}, computed {actual.ToString("R", CultureInfo.InvariantCulture)}");
    }
}
