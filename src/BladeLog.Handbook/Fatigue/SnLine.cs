using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>A straight stress-life line in log-log: Basquin's σ_ar = σ_f′ (2N)^b.</summary>
/// <param name="Coefficient">σ_f′, the fatigue strength coefficient.</param>
/// <param name="Exponent">b, below zero.</param>
public sealed record SnLine(Stress Coefficient, double Exponent)
{
    /// <summary>The amplitude this line stands for N cycles.</summary>
    public Stress AmplitudeAt(double cycles) => new(Coefficient.Pascals * Math.Pow(2 * cycles, Exponent));

    /// <summary>The same line for a surface that is worse than polished: no effect at a half cycle, all of it at the knee.</summary>
    /// <remarks>b′ = b + log₁₀(C_s)/log₁₀(2 N_K). C_s surface factor, above 0 up to 1; N_K cycles at the knee.</remarks>
    public SnLine WithSurface(double surfaceFactor, double kneeCycles)
    {
        double Cs = Require.Positive(surfaceFactor, nameof(surfaceFactor), "surface factor");
        double NK = Require.Positive(kneeCycles, nameof(kneeCycles), "cycles at the knee");
        return this with { Exponent = Exponent + Math.Log10(Cs) / Math.Log10(2 * NK) };
    }
}

/// <summary>The stress-life line with its knee: a flatter line beyond it, and no endurance limit.</summary>
/// <param name="Line">The line up to the knee.</param>
/// <param name="KneeCycles">N_K, cycles at the knee.</param>
public sealed record SnCurve(SnLine Line, double KneeCycles)
{
    /// <summary>The amplitude at the knee.</summary>
    public Stress KneeAmplitude => Line.AmplitudeAt(KneeCycles);

    /// <summary>k = −1/b, the slope of the line up to the knee.</summary>
    public double Slope => -1 / Line.Exponent;

    /// <summary>The median cycles to a crack at this fully reversed amplitude.</summary>
    /// <remarks>
    /// Up to the knee N = ½ (σ_ar/σ_f′)^(1/b); beyond it N = N_K (S_K/σ_ar)^(2k−1) (Haibach's slope). Endless at σ_ar ≤ 0.
    /// Meant for 10⁴ to 10⁹ cycles; the figures outside serve only to say "too short" or "not limiting".
    /// </remarks>
    public double Cycles(Stress amplitude)
    {
        double sar = amplitude.Pascals;
        if (sar <= 0)
        {
            return double.PositiveInfinity;
        }

        double sK = KneeAmplitude.Pascals;
        return sar >= sK
            ? 0.5 * Math.Pow(sar / Line.Coefficient.Pascals, 1 / Line.Exponent)
            : KneeCycles * Math.Pow(sK / sar, 2 * Slope - 1);
    }
}
