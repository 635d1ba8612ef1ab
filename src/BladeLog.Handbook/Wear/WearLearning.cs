using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using MathNet.Numerics;

namespace BladeLog.Handbook.Wear;

/// <summary>One sharpening as evidence of the wear rate.</summary>
/// <param name="PathKm">x, equivalent km since the sharpening before.</param>
/// <param name="WasDull">Dull when taken off; otherwise all that is known is that it had not come so far.</param>
public readonly record struct SharpeningRecord(double PathKm, bool WasDull);

/// <summary>What is known of a wear rate.</summary>
/// <param name="LnMean">μ, mean of ln w.</param>
/// <param name="LnSd">Standard deviation of ln w.</param>
public sealed record WearLevel(double LnMean, double LnSd)
{
    /// <summary>Median wear, µm per equivalent km.</summary>
    public double Median => Math.Exp(LnMean);

    /// <summary>A fractile of the wear, µm per equivalent km.</summary>
    /// <remarks>w_p = exp(μ + s·z_p), z_p the normal fractile; p between 0 and 1.</remarks>
    public double Fractile(double p) =>
        Math.Exp(LnMean + LnSd * Math.Sqrt(2) * SpecialFunctions.ErfInv(2 * Require.Within(p, 1e-9, 1 - 1e-9, "The share must lie between 0 and 1.") - 1));

    /// <summary>The handbook's word: the tabulated rate as median, wide on purpose (ln 2.5; engineering default).</summary>
    public static WearLevel FromTable(double wearPerKm_um) => new(Math.Log(Require.Positive(wearPerKm_um, "wear rate")), Math.Log(2.5));
}

/// <summary>Learns the wear rate from the shop's own sharpenings.</summary>
public static class WearLearning
{
    /// <summary>The wear rate after the shop's records.</summary>
    /// <remarks>y_i = ln((r_dull − r₀ − δr)/x_i), seen with spread s = 0.4. Only dull ones: 1/s_n² = 1/s₀² + n/s², μ_n = s_n²(μ₀/s₀² + Σy_i/s²). Others add
    /// ln Φ((y_i − μ)/s): then the mode by Newton on a concave curve, spread from its second derivative. x_i equivalent km, above zero; r in µm.</remarks>
    /// <source key="derived" where="normal prior with normal and censored data; the spread 0.4 an engineering default"/>
    public static WearLevel Learn(WearLevel prior, IReadOnlyList<SharpeningRecord> records, Length dull, Length fresh, RunIn? runIn = null, double spread = 0.4)
    {
        ArgumentNullException.ThrowIfNull(prior);
        ArgumentNullException.ThrowIfNull(records);
        double s_0 = Require.Positive(prior.LnSd, "spread of the prior");
        double s = Require.Positive(spread, "spread of one record");
        double rise = Require.Positive(dull.Micrometres - fresh.Micrometres - (runIn ?? RunIn.Default).Growth.Micrometres, "rounding between fresh and dull");
        var seen = records.Select(x => (y: Math.Log(rise / Require.Positive(x.PathKm, "wood path")), x.WasDull)).ToList();

        double mu = prior.LnMean, curvature = 1 / (s_0 * s_0);
        for (int i = 0; i < 100; i++)
        {
            double slope = (prior.LnMean - mu) / (s_0 * s_0);
            curvature = 1 / (s_0 * s_0);
            foreach ((double y, bool wasDull) in seen)
            {
                double u = (y - mu) / s;
                if (wasDull)
                {
                    slope += u / s;
                    curvature += 1 / (s * s);
                }
                else
                {
                    double h = InverseMills(u);
                    slope -= h / s;
                    curvature += h * (u + h) / (s * s);
                }
            }

            double step = slope / curvature;
            mu += step;
            if (Math.Abs(step) < 1e-13)
            {
                break;
            }
        }

        return new WearLevel(mu, 1 / Math.Sqrt(curvature));
    }

    /// <summary>Path to dull at a wear rate, without the curve of the run-in, equivalent km.</summary>
    /// <remarks>x = (r_dull − r₀ − δr)/w. r in µm, w in µm per equivalent km; holds past the run-in (x above 2 km).</remarks>
    /// <source key="derived" where="edge law past the run-in"/>
    public static double IntervalKm(double wearPerKm_um, Length dull, Length fresh, RunIn? runIn = null)
    {
        double rise = Require.Positive(dull.Micrometres - fresh.Micrometres - (runIn ?? RunIn.Default).Growth.Micrometres, "rounding between fresh and dull");
        return rise / Require.Positive(wearPerKm_um, "wear rate");
    }

    /// <summary>φ(u)/Φ(u), stable far into the lower tail where both vanish.</summary>
    private static double InverseMills(double u)
    {
        if (u < -30)
        {
            return -u - 1 / u; // two terms of the asymptotic series, good to 1e-4 of itself and better beyond
        }

        double density = Math.Exp(-u * u / 2) / Math.Sqrt(2 * Math.PI);
        return density / (0.5 * SpecialFunctions.Erfc(-u / Math.Sqrt(2)));
    }
}
