namespace BladeLog.Handbook.Quantities;

/// <summary>The elastic constants of a band.</summary>
/// <param name="YoungsModulus">E, Pa.</param>
/// <param name="Poisson">ν, dimensionless.</param>
/// <param name="Density">ρ, kg/m³.</param>
public sealed record Steel(Stress YoungsModulus, double Poisson, Density Density)
{
    /// <summary>Carbon steel: 207 GPa, 0.30, 7850 kg/m³ (common handbook values, from memory).</summary>
    public static Steel Carbon { get; } = new(new Stress(207e9), 0.30, new Density(7850));

    /// <summary>Shear modulus G = E / (2 (1 + ν)).</summary>
    public Stress ShearModulus => new(YoungsModulus.Pascals / (2 * (1 + Poisson)));
}
