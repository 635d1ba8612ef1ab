using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Band;

/// <summary>Refuses what no band can be, in a plain sentence.</summary>
internal static class Require
{
    public static double Positive(double value, string name, string what) =>
        double.IsFinite(value) && value > 0
            ? value
            : throw new ArgumentOutOfRangeException(name, value, $"The {what} must be a number above zero.");

    public static double NotNegative(double value, string name, string what) =>
        double.IsFinite(value) && value >= 0
            ? value
            : throw new ArgumentOutOfRangeException(name, value, $"The {what} must be zero or a number above zero.");

    public static double Between(double value, double low, double high, string name, string what) =>
        value >= low && value <= high
            ? value
            : throw new ArgumentOutOfRangeException(name, value, FormattableString.Invariant($"The {what} must lie between {low} and {high}."));

    public static double Positive(Length value, string name, string what) => Positive(value.Metres, name, what);

    public static double Positive(Stress value, string name, string what) => Positive(value.Pascals, name, what);

    public static double NotNegative(Stress value, string name, string what) => NotNegative(value.Pascals, name, what);

    public static double Positive(Speed value, string name, string what) => Positive(value.MetresPerSecond, name, what);

    public static double NotNegative(Speed value, string name, string what) => NotNegative(value.MetresPerSecond, name, what);

    public static double Positive(Density value, string name, string what) => Positive(value.KilogramsPerCubicMetre, name, what);

    public static double Poisson(double value) =>
        value is >= 0 and < 0.5
            ? value
            : throw new ArgumentOutOfRangeException(nameof(value), value, "Poisson's ratio must lie between 0 and 0.5.");
}
