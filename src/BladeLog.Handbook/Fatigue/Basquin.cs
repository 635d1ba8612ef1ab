using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>Estimates of the stress-life line of a steel from what the shop can know of it. The band uses the first.</summary>
public static class Basquin
{
    /// <summary>The line from Brinell hardness.</summary>
    /// <remarks>σ_f′ = 4.25 HB + 225, MPa; b = −0.09. HB 150 to 700 in the data; a hardness of zero or under throws.</remarks>
    /// <source key="roessle-fatemi-2000" where="hardness method: fatigue strength coefficient and exponent"/>
    public static SnLine RoessleFatemi(double brinell)
    {
        double HB = Require.Positive(brinell, nameof(brinell), "Brinell hardness");
        return new SnLine(Stress.FromMegapascals(4.25 * HB + 225), -0.09);
    }

    /// <summary>The line from tensile strength by the uniform material law, unalloyed and low-alloy steel.</summary>
    /// <remarks>σ_f′ = 1.5 S_u; b = −0.087. For comparison: overstates hard steel.</remarks>
    /// <source key="baumel-seeger-1990" where="uniform material law, unalloyed and low-alloy steels"/>
    public static SnLine BaumelSeeger(Stress tensileStrength)
    {
        double Su = Require.Positive(tensileStrength, nameof(tensileStrength), "tensile strength");
        return new SnLine(new Stress(1.5 * Su), -0.087);
    }

    /// <summary>The line from tensile strength by the medians of 724 steels.</summary>
    /// <remarks>σ_f′ = 1.5 S_u; b = −0.09. For comparison.</remarks>
    /// <source key="meggiolaro-castro-2004" where="medians for steels"/>
    public static SnLine MeggiolaroCastro(Stress tensileStrength)
    {
        double Su = Require.Positive(tensileStrength, nameof(tensileStrength), "tensile strength");
        return new SnLine(new Stress(1.5 * Su), -0.09);
    }
}
