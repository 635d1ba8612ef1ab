using System.Runtime.CompilerServices;

namespace BladeLog.Handbook.Cutting;

/// <summary>Refuses input no workshop can have, in a plain sentence.</summary>
internal static class Require
{
    internal static double Positive(double value, string what, [CallerArgumentExpression(nameof(value))] string? name = null) =>
        double.IsFinite(value) && value > 0
            ? value
            : throw new ArgumentOutOfRangeException(name, value, $"The {what} must be a number above zero.");

    internal static double NotNegative(double value, string what, [CallerArgumentExpression(nameof(value))] string? name = null) =>
        double.IsFinite(value) && value >= 0
            ? value
            : throw new ArgumentOutOfRangeException(name, value, $"The {what} must be a number, zero or more.");

    internal static double Within(double value, double low, double high, string sentence, [CallerArgumentExpression(nameof(value))] string? name = null) =>
        value >= low && value <= high
            ? value
            : throw new ArgumentOutOfRangeException(name, value, sentence);
}
