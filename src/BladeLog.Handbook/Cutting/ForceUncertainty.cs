using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>What the shop's ammeter has taught of the force factor q.</summary>
/// <param name="Median">q, geometric.</param>
/// <param name="LnSd">Standard deviation of ln q.</param>
public sealed record ForceFit(double Median, double LnSd);

/// <summary>How far the force model can be off.</summary>
public static class ForceUncertainty
{
    /// <summary>Low and high factor of the band that holds the true force 8 times in 10.</summary>
    /// <remarks>×0.70 to ×1.40 until there are five ammeter readings, then ×0.87 to ×1.15. Readings is a count.</remarks>
    /// <source key="engineering-default" where="band of the force model; a published case lies 9 to 42 % over it"/>
    public static (double Low, double High) BandFor(double readings) =>
        Require.NotNegative(readings, "number of readings") >= 5 ? (0.87, 1.15) : (0.70, 1.40);

    /// <summary>The force factor after some readings.</summary>
    /// <remarks>ln q ~ Normal(0, 0.35) before; each reading ln q_i has spread 0.15: 1/s_n² = 1/0.35² + n/0.15², μ_n = s_n²·Σ ln q_i/0.15². q_i of
    /// <see cref="CuttingForce.FitFactorFrom"/>, dimensionless, above zero.</remarks>
    /// <source key="derived" where="normal prior with normal readings; both spreads engineering defaults"/>
    public static ForceFit Learn(IReadOnlyList<double> readings, double priorSd = 0.35, double readingSd = 0.15)
    {
        ArgumentNullException.ThrowIfNull(readings);
        double s_0 = Require.Positive(priorSd, "spread of the prior");
        double s = Require.Positive(readingSd, "spread of one reading");
        double sum = readings.Sum(q => Math.Log(Require.Positive(q, "force factor")));
        double s_n2 = 1 / (1 / (s_0 * s_0) + readings.Count / (s * s));
        return new ForceFit(Math.Exp(s_n2 * sum / (s * s)), Math.Sqrt(s_n2));
    }

    /// <summary>Peak force on a tooth, for the strength of the tooth.</summary>
    /// <remarks>F_peak = 1.8·F_t, range 1.4 to 2.1. F_t mean force on one tooth, N.</remarks>
    /// <source key="loehnertz-cooz" where="peak over mean tooth force"/>
    public static Force PeakPerTooth(Force mean) => new(1.8 * mean.Newtons);
}
