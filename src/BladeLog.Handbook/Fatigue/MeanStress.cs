using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>
/// The fully reversed amplitude that does the same harm as a cycle about a mean stress. Walker is the one the band uses;
/// the others stand beside it for comparison.
/// </summary>
public static class MeanStress
{
    /// <summary>Walker's exponent of a steel: 1 means the mean stress does not matter.</summary>
    /// <remarks>γ = 0.8818 − 0.0002 S_u, S_u tensile strength in MPa, held between 0.35 and 1.</remarks>
    /// <source key="dowling-2009" where="fit for steels; same equation in shigley with −0.0014 for kpsi"/>
    public static double WalkerExponent(Stress tensileStrength)
    {
        double Su = Require.Positive(tensileStrength, nameof(tensileStrength), "tensile strength") / 1e6;
        return Math.Clamp(0.8818 - 0.0002 * Su, 0.35, 1);
    }

    /// <summary>The equivalent fully reversed amplitude after Walker.</summary>
    /// <remarks>σ_ar = σ_max^(1−γ) σ_a^γ. σ_max greatest stress of the cycle, Pa; σ_a amplitude, Pa, zero or above; γ 0 to 1. Zero where σ_max ≤ 0.</remarks>
    /// <source key="dowling-2009" where="Walker equation in stress-life form; Dowling, Mechanical Behavior of Materials 4th ed., eq. 9.20"/>
    public static Stress Walker(Stress greatest, Stress amplitude, double exponent)
    {
        double sa = Require.NotNegative(amplitude, nameof(amplitude), "stress amplitude");
        double g = Require.Between(exponent, 0, 1, nameof(exponent), "Walker exponent");
        double smax = greatest.Pascals;
        return new Stress(smax <= 0 ? 0 : Math.Pow(smax, 1 - g) * Math.Pow(sa, g));
    }

    /// <summary>The equivalent fully reversed amplitude after Smith, Watson and Topper.</summary>
    /// <remarks>σ_ar = √(σ_max σ_a). Symbols as for Walker, whose γ = 0.5 it is. Zero where σ_max ≤ 0.</remarks>
    /// <source key="smith-watson-topper-1970" where="σ_max ε_a parameter, elastic form; from memory"/>
    public static Stress SmithWatsonTopper(Stress greatest, Stress amplitude)
    {
        double sa = Require.NotNegative(amplitude, nameof(amplitude), "stress amplitude");
        double smax = greatest.Pascals;
        return new Stress(smax <= 0 ? 0 : Math.Sqrt(smax * sa));
    }

    /// <summary>The equivalent fully reversed amplitude after Goodman.</summary>
    /// <remarks>σ_ar = σ_a / (1 − σ_m/S_u). σ_m mean stress, Pa, under S_u: at or over it throws. For comparison: ranks hard bands as the less sensitive.</remarks>
    /// <source key="shigley" where="modified Goodman line"/>
    public static Stress Goodman(Stress amplitude, Stress mean, Stress tensileStrength) => Line(amplitude, mean, tensileStrength);

    /// <summary>The equivalent fully reversed amplitude after Morrow.</summary>
    /// <remarks>σ_ar = σ_a / (1 − σ_m/σ_f′). σ_m mean stress, Pa, under the fatigue strength coefficient σ_f′: at or over it throws.</remarks>
    /// <source key="dowling-2009" where="Morrow equation with the fatigue strength coefficient"/>
    public static Stress Morrow(Stress amplitude, Stress mean, Stress fatigueStrengthCoefficient) => Line(amplitude, mean, fatigueStrengthCoefficient);

    private static Stress Line(Stress amplitude, Stress mean, Stress intercept)
    {
        double sa = Require.NotNegative(amplitude, nameof(amplitude), "stress amplitude");
        double end = Require.Positive(intercept, nameof(intercept), "strength");
        double sm = mean.Pascals;
        return sm < end
            ? new Stress(sa / (1 - sm / end))
            : throw new ArgumentOutOfRangeException(nameof(mean), sm, "The mean stress must lie under the strength.");
    }
}
