using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>How far the gullets raise the stress above that of the plain body.</summary>
public static class GulletNotch
{
    /// <summary>The elastic stress factor of a row of gullets under tension, on the body section.</summary>
    /// <remarks>
    /// K_t = 1 + 0.45 (p/r)^0.64. p pitch, m; r gullet radius, m; fitted to ±5 of 100 over 0.06 ≤ r/p ≤ 0.29 (0.058 and 0.29 unrounded), outside it throws.
    /// The single-notch formula 1 + 2√(h/r) does not apply: neighbouring gullets shield each other.
    /// </remarks>
    /// <source key="derived" where="own plane-stress finite-element series, fitted; isolated notch 3.064 against 3.065 in pilkey"/>
    public static double ElasticFactor(Length pitch, Length gulletRadius)
    {
        double p = Require.Positive(pitch, nameof(pitch), "pitch");
        double r = Require.Positive(gulletRadius, nameof(gulletRadius), "gullet radius");
        return r / p is >= 0.058 and <= 0.29
            ? 1 + 0.45 * Math.Pow(p / r, 0.64)
            : throw new ArgumentOutOfRangeException(nameof(gulletRadius), r, "The gullet radius must lie between 0.06 and 0.29 of the pitch.");
    }

    /// <summary>The elastic stress factor of a row of gullets in a plate free to bend out of its plane.</summary>
    /// <remarks>K_tb = 1 + 0.63 (K_t − 1), K_t from tension; 0.55 to 0.72 in the series. On the wheel the curvature is imposed and the factor is less.</remarks>
    /// <source key="derived" where="own plate finite-element series"/>
    public static double ElasticBendingFactor(double elasticFactor)
    {
        double Kt = Require.Between(elasticFactor, 1, 10, nameof(elasticFactor), "stress factor");
        return 1 + 0.63 * (Kt - 1);
    }

    /// <summary>Peterson's notch sensitivity: the share of the stress rise that fatigue feels, 0 to 1.</summary>
    /// <remarks>q = 1/(1 + a/r), a = 0.0254 (2070/S_u)^1.8 mm. r notch radius, m; S_u in MPa.</remarks>
    /// <source key="peterson" where="notch sensitivity of steels; from memory"/>
    public static double Sensitivity(Length notchRadius, Stress tensileStrength)
    {
        double r = Require.Positive(notchRadius, nameof(notchRadius), "notch radius") * 1e3;
        double Su = Require.Positive(tensileStrength, nameof(tensileStrength), "tensile strength") / 1e6;
        double a = 0.0254 * Math.Pow(2070 / Su, 1.8);
        return 1 / (1 + a / r);
    }

    /// <summary>The gullet's fatigue factor on the tension part, from a known pitch and radius.</summary>
    /// <remarks>K_ft = 1 + 0.8 q (K_t − 1). Without a known radius the default is 2.0 (1.5 to 2.5).</remarks>
    /// <source key="engineering-default" where="0.8 lands on 2.0 at p/r about 5.3; measured 1.53 in prokofev-kovalenko"/>
    public static double TensionFactor(Length pitch, Length gulletRadius, Stress tensileStrength) =>
        1 + 0.8 * Sensitivity(gulletRadius, tensileStrength) * (ElasticFactor(pitch, gulletRadius) - 1);

    /// <summary>The gullet's fatigue factor on the bending part, from a known pitch and radius.</summary>
    /// <remarks>K_fb = 1 + 0.33 q (K_t − 1). Without a known radius the default is 1.4 (1.1 to 1.8).</remarks>
    /// <source key="engineering-default" where="0.33 lands on 1.4 at p/r about 5.3"/>
    public static double BendingFactor(Length pitch, Length gulletRadius, Stress tensileStrength) =>
        1 + 0.33 * Sensitivity(gulletRadius, tensileStrength) * (ElasticFactor(pitch, gulletRadius) - 1);
}
