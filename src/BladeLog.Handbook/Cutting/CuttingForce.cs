using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>Force, thrust and power of a cut: the equivalent-thickness form of the fracture model. Uncertainty ×0.70 to ×1.40 until the shop's own readings narrow it.</summary>
public static partial class CuttingForce
{
    /// <summary>K, the stress that turns chip area into force.</summary>
    /// <remarks>K = q·k_ρ·ρ₁₂·K_g·K_MC·K_dir·K_frozen. k_ρ = 97,269.7 Pa per kg/m³ at 20° rake; K_g = (τγ/Q at g)/(τγ/Q at 20°);
    /// K_MC = 1 − 0.375 (clamp(MC, 6, 30) − 12)/18; K_dir 1 rip, 0.7 cross. Rake −5° to 35°, ρ₁₂ 200 to 1,300 kg/m³.</remarks>
    /// <source key="loehnertz-cooz" where="dry to wet force ratio 1.6; density scaling an engineering default"/>
    public static Stress ShearFactor(CutCase c)
    {
        CutChecks.Refuse(c);
        CutModel m = c.Model;
        double rho12 = c.Density12.KilogramsPerCubicMetre;
        double K_g = RakeFactor(c.Rake, m.Friction);
        double K_MC = 1 - m.MoistureDrop * (Math.Clamp(c.MoisturePercent, 6, 30) - 12) / 18;
        double K_dir = c.Direction == CutDirection.Cross ? m.CrossFactor : 1;
        double K_frozen = c.Frozen ? m.FrozenFactor : 1;
        double q = Require.Positive(m.FitFactor, "shop's own force factor");
        return new Stress(q * m.StiffnessPerDensity * rho12 * K_g * K_MC * K_dir * K_frozen);
    }

    /// <summary>K_g, the shear factor at a rake over that at 20°, dimensionless.</summary>
    /// <remarks>K_g = (γ/Q at g)/(γ/Q at 20°), from <see cref="Fracture"/>; 1.457 at 0°, 1 at 20°, 0.839 at 30°.</remarks>
    /// <source key="orlowski-2013" where="τγ/Q as a function of rake (from memory)"/>
    public static double RakeFactor(Angle rake, double friction = 0.6)
    {
        Angle reference = Angle.FromDegrees(20);
        double at_g = Fracture.ShearStrain(rake, friction) / Fracture.FrictionCorrection(rake, friction);
        double at_20 = Fracture.ShearStrain(reference, friction) / Fracture.FrictionCorrection(reference, friction);
        return at_g / at_20;
    }

    /// <summary>h_R, the chip thickness that the work of parting the wood is worth.</summary>
    /// <remarks>h_R = R/(τγ). R = 1,295 J/m², τ = 20.861 MPa (pine); both scale with density, so h_R does not depend on the species. 26.6 µm at 0°, 39.6 µm
    /// at 20°.</remarks>
    /// <source key="orlowski-2013" where="R and τ of Scots pine (from memory)"/>
    public static Length ReferenceThickness(Angle rake, CutModel? model = null)
    {
        CutModel m = model ?? CutModel.Default;
        double gamma = Fracture.ShearStrain(rake, m.Friction);
        return new Length(m.FractureToughness / (m.ShearYield.Pascals * gamma));
    }

    /// <summary>Mean main force on one tooth.</summary>
    /// <remarks>F_t = K·(c·k + φ·(h_R + η·(r − r_s)⁺)·w_e), φ = min(1, c_e/(λr)). K shear factor, Pa; c bite, m; k kerf, m; w_e edge width, m; r edge radius, m.
    /// Zero at zero bite. The peak is 1.4 to 2.1 times the mean. Bites 0.003 to 1.5 mm.</remarks>
    /// <source key="engineering-default" where="edge terms of the equivalent-thickness form; the affine form after orlowski-2013"/>
    public static Force PerTooth(CutCase c, Length bite)
    {
        Terms x = Terms.Of(c);
        double b = Require.NotNegative(bite.Metres, "bite");
        return new Force(x.K * (b * x.k + x.Fade(b) * x.MainEdge * x.w_e));
    }

    /// <summary>Main cutting force of all teeth in the wood.</summary>
    /// <remarks>F_c = z·F_t, z = H/p, bite c = f·p/v.</remarks>
    /// <source key="engineering-default" where="equivalent-thickness form, summed over the teeth in the cut"/>
    public static Force Main(CutCase c, Speed feed)
    {
        double z = Kinematics.TeethInCut(c.CutHeight, c.Pitch);
        return new Force(z * PerTooth(c, Kinematics.BitePerTooth(feed, c.Pitch, c.BandSpeed)).Newtons);
    }

    /// <summary>Thrust: the force with which the wood must be fed, and the band carries on its front edge.</summary>
    /// <remarks>F_f = z·K·[c·k·T + φ·(h_R·T + e_t)·w_e], e_t = e₀ + ξη(r − r_s)⁺, T = tan(β_t − g), β_t = 25°. Negative: the blade pulls the wood in.</remarks>
    /// <source key="woodson-1979" where="mean normal force changes sign between 20° and 30° rake; edge terms engineering defaults"/>
    public static Force Thrust(CutCase c, Speed feed)
    {
        Terms x = Terms.Of(c);
        double b = Kinematics.BitePerTooth(feed, c.Pitch, c.BandSpeed).Metres;
        return new Force(x.z * x.K * (b * x.k * x.T + x.Fade(b) * x.ThrustEdge * x.w_e));
    }

    /// <summary>T, thrust per main force of the chip alone, dimensionless.</summary>
    /// <remarks>T = tan(β_t − g), β_t = 25°. Zero or negative from 25° hook on: the blade feeds itself.</remarks>
    /// <source key="woodson-1979" where="mean normal force changes sign between 20° and 30° rake"/>
    public static double ThrustSlope(CutCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        return Math.Tan(c.Model.ThrustAngle.Radians - c.Rake.Radians);
    }

    /// <summary>Power at the band.</summary>
    /// <remarks>P = F_c·v. F_c main force, N; v band speed, m/s.</remarks>
    /// <source key="engineering-default" where="equivalent-thickness form; power is force times speed"/>
    public static Power CuttingPower(CutCase c, Speed feed) => new(Main(c, feed).Newtons * c.BandSpeed.MetresPerSecond);

    /// <summary>What the motor gives off.</summary>
    /// <remarks>P_m = P_idle + (F_c·v + ρ·V̇·v²)/ε. P_idle, W; V̇ kerf volume per second, m³/s; ρ density of the wood as it is, kg/m³; ε drive efficiency, 0 to 1,
    /// 0.85 by default. The small term throws the chips.</remarks>
    /// <source key="orlowski-2017" where="kinetic power of the chips (form from memory); 0.85 engineering default"/>
    public static Power MotorLoad(CutCase c, Speed feed, Power idle, double efficiency = 0.85)
    {
        double P_idle = Require.NotNegative(idle.Watts, "idle power");
        double eps = Require.Within(efficiency, double.Epsilon, 1, "The drive efficiency must lie above 0 and not over 1.");
        double P = CuttingPower(c, feed).Watts;
        return new Power(P_idle + (P + ChipPower(c, feed).Watts) / eps);
    }

    /// <summary>Power that throws the chips.</summary>
    /// <remarks>P_a = ρ·V̇·v². ρ density of the wood at its moisture, kg/m³; V̇ = f·H·k, m³/s; v band speed, m/s. Under 2 % of the whole up to 40 m/s.</remarks>
    /// <source key="orlowski-2017" where="kinetic power of the chips (form from memory)"/>
    public static Power ChipPower(CutCase c, Speed feed)
    {
        CutChecks.Refuse(c);
        double v = c.BandSpeed.MetresPerSecond;
        double rho = WoodDensity.AtMoisture(c.Density12, c.MoisturePercent).KilogramsPerCubicMetre;
        return new Power(rho * Kinematics.KerfVolumeRate(feed, c.CutHeight, c.Kerf) * v * v);
    }

    /// <summary>The shop's own force factor from one ammeter reading, dimensionless.</summary>
    /// <remarks>q = (P_measured − P_idle)·ε/P_model. Powers in W; ε drive efficiency; P_model from <see cref="CuttingPower"/> with q = 1. Keep the geometric mean of
    /// the readings.</remarks>
    /// <source key="derived" where="motor load solved for the force factor, the chip-throwing term left out"/>
    public static double FitFactorFrom(Power measured, Power idle, Power modelled, double efficiency = 0.85)
    {
        double P_m = Require.Positive(measured.Watts, "measured power");
        double P_idle = Require.NotNegative(idle.Watts, "idle power");
        double P = Require.Positive(modelled.Watts, "modelled power");
        double eps = Require.Within(efficiency, double.Epsilon, 1, "The drive efficiency must lie above 0 and not over 1.");
        Require.Positive(P_m - P_idle, "measured power less the idle power");
        return (P_m - P_idle) * eps / P;
    }

    /// <summary>Power a motor takes from the supply, from its current.</summary>
    /// <remarks>P = m·U·I·cos φ, m = 1 on one phase, √3 on three (U between two phases). U voltage, V; I current in one line, A; cos φ power factor, above 0 and not
    /// over 1. A motor that idles has a far lower power factor than one under load: its idle power is measured as power.</remarks>
    /// <source key="derived" where="active power of alternating current, one phase and balanced three"/>
    public static Power FromCurrent(double amperes, double volts, double powerFactor, bool threePhase)
    {
        double I = Require.Positive(amperes, "current");
        double U = Require.Positive(volts, "voltage");
        double cos_phi = Require.Within(powerFactor, double.Epsilon, 1, "The power factor must lie above 0 and not over 1.");
        return new Power((threePhase ? Math.Sqrt(3) : 1) * U * I * cos_phi);
    }

    /// <summary>The quantities of the force equation, unwrapped once.</summary>
    private readonly record struct Terms(
        double K, double k, double w_e, double z, double T, double p, double v, double H, double lambda_r, double MainEdge, double ThrustEdge)
    {
        internal static Terms Of(CutCase c)
        {
            CutModel m = c.Model;
            double r = Bite.RadiusUsed(c).Metres;
            double h_R = ReferenceThickness(c.Rake, m).Metres;
            double e_m = m.Eta * Math.Max(0, r - m.ReferenceRadius.Metres);
            double T = ThrustSlope(c);
            return new Terms(
                K: ShearFactor(c).Pascals,
                k: c.Kerf.Metres,
                w_e: Bite.EdgeWidth(c).Metres,
                z: Kinematics.TeethInCut(c.CutHeight, c.Pitch),
                T: T,
                p: c.Pitch.Metres,
                v: c.BandSpeed.MetresPerSecond,
                H: c.CutHeight.Metres,
                lambda_r: m.Lambda * r,
                MainEdge: h_R + e_m,
                ThrustEdge: h_R * T + m.ThrustOffset.Metres + m.Xi * e_m);
        }

        /// <summary>φ: the edge terms fade where no chip forms, so that no feed means no force.</summary>
        internal double Fade(double bite) => Math.Min(1, bite * k / w_e / lambda_r);
    }
}
