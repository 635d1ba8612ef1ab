using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Band;

/// <summary>What warmth does to the tension. A caution, not part of the life: no damage is computed from it.</summary>
public static class Thermal
{
    /// <summary>α of carbon steel, lengthening for each kelvin (common handbook value, from memory).</summary>
    public const double CarbonSteelExpansion = 11.7e-6;

    /// <summary>The tension a band loses when all of the loop grows warmer than the saw.</summary>
    /// <remarks>
    /// Δσ = (1 − η) α E Δϑ. Δϑ how much warmer than when it was tightened, K, below zero for a colder band, which gains; α, 1/K, above zero;
    /// E, Pa; η see <see cref="Tension.Support(TensionSystem)"/>, 0 to 1: a locked screw (η = 0) loses all of it, a spring, weight, air or oil (η = 1) nothing.
    /// Elastic, so it holds while the band stays tight.
    /// </remarks>
    /// <source key="derived" where="Hooke's law with the balance of forces at a sprung wheel; α from memory"/>
    public static Stress TensionLost(double warmerKelvin, Stress youngsModulus, double support, double expansion = CarbonSteelExpansion)
    {
        double warming = Finite(warmerKelvin, nameof(warmerKelvin));
        double E = Require.Positive(youngsModulus, nameof(youngsModulus), "Young's modulus");
        double eta = Require.Between(support, 0, 1, nameof(support), "share of the stretch the saw takes up");
        double alpha = Require.Positive(expansion, nameof(expansion), "thermal expansion");
        return new Stress((1 - eta) * alpha * E * warming);
    }

    /// <summary>The change of stress at a tooth edge that is hotter than the band as a whole: below zero, a relief.</summary>
    /// <remarks>
    /// Δσ = −α E Δϑ. Δϑ how much hotter than the mean of the section, K; α, 1/K; E, Pa. The gullet is relieved, and the cutting edge goes slacker:
    /// as a stress bias it lowers what thrust the band carries. Holds for an edge strip that is narrow against the width; elastic.
    /// </remarks>
    /// <source key="derived" where="strain held by the rest of the section; α from memory"/>
    public static Stress ToothEdgeChange(double hotterKelvin, Stress youngsModulus, double expansion = CarbonSteelExpansion)
    {
        double hotter = Finite(hotterKelvin, nameof(hotterKelvin));
        double E = Require.Positive(youngsModulus, nameof(youngsModulus), "Young's modulus");
        double alpha = Require.Positive(expansion, nameof(expansion), "thermal expansion");
        return new Stress(-alpha * E * hotter);
    }

    private static double Finite(double kelvin, string name) =>
        double.IsFinite(kelvin) ? kelvin : throw new ArgumentOutOfRangeException(name, kelvin, "A difference of temperature must be a number.");
}
