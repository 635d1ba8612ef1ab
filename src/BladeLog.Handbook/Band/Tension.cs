using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Band;

/// <summary>
/// The pull in the band as a stress on the body: the section between gullet bottom and back edge. The teeth carry nothing.
/// </summary>
public static class Tension
{
    /// <summary>The tension from the pull in one strand of the band.</summary>
    /// <remarks>σ₀ = T / (t b). T pull in one strand, N, zero or above; t thickness, m; b body width (width less gullet depth), m.</remarks>
    /// <source key="derived" where="force over section"/>
    public static Stress FromStrandForce(Force pull, Length thickness, Length bodyWidth)
    {
        double T = Require.NotNegative(pull.Newtons, nameof(pull), "pull in the strand");
        double t = Require.Positive(thickness, nameof(thickness), "band thickness");
        double b = Require.Positive(bodyWidth, nameof(bodyWidth), "body width");
        return new Stress(T / (t * b));
    }

    /// <summary>The pull in one strand of a band under a tension.</summary>
    /// <remarks>T = σ₀ t b. σ₀ tension on the body, Pa; t, m; b body width, m.</remarks>
    /// <source key="derived" where="stress times section"/>
    public static Force StrandForce(Stress tension, Length thickness, Length bodyWidth)
    {
        double sigma = Require.NotNegative(tension, nameof(tension), "tension");
        double t = Require.Positive(thickness, nameof(thickness), "band thickness");
        double b = Require.Positive(bodyWidth, nameof(bodyWidth), "body width");
        return new Force(sigma * t * b);
    }

    /// <summary>The tension from the load that pulls the movable wheel: two strands share it.</summary>
    /// <remarks>
    /// σ₀ = W / (2 t b). W load on the wheel, N, zero or above; t, m; b body width, m. For two strands that leave the wheel side by side,
    /// as on a saw with two wheels; where they leave at an angle to the load, divide by the cosine of half the angle between them.
    /// </remarks>
    /// <source key="derived" where="balance of forces on the wheel"/>
    public static Stress FromWheelLoad(Force wheelLoad, Length thickness, Length bodyWidth)
    {
        double W = Require.NotNegative(wheelLoad.Newtons, nameof(wheelLoad), "load on the wheel");
        double t = Require.Positive(thickness, nameof(thickness), "band thickness");
        double b = Require.Positive(bodyWidth, nameof(bodyWidth), "body width");
        return new Stress(W / (2 * t * b));
    }

    /// <summary>The tension from the stretch of a measured length of the band.</summary>
    /// <remarks>σ₀ = E ΔL / L. ΔL stretch, m, zero or above; L gauge length, m; E, Pa. Measured on a straight span, from slack to tight.</remarks>
    /// <source key="derived" where="Hooke's law"/>
    public static Stress FromStretch(Length stretch, Length gauge, Stress youngsModulus)
    {
        double dL = Require.NotNegative(stretch.Metres, nameof(stretch), "stretch");
        double L = Require.Positive(gauge, nameof(gauge), "gauge length");
        double E = Require.Positive(youngsModulus, nameof(youngsModulus), "Young's modulus");
        return new Stress(E * dL / L);
    }

    /// <summary>The most the tension can be from how far the wheel has moved since the band was snug.</summary>
    /// <remarks>σ₀ = 2 E d / L. d travel of the wheel, m, zero or above; L loop length, m; E, Pa. An upper bound: the frame gives way too.</remarks>
    /// <source key="derived" where="Hooke's law, both strands lengthened by d"/>
    public static Stress FromWheelTravel(Length travel, Length loop, Stress youngsModulus)
    {
        double d = Require.NotNegative(travel.Metres, nameof(travel), "travel of the wheel");
        double L = Require.Positive(loop, nameof(loop), "loop length");
        double E = Require.Positive(youngsModulus, nameof(youngsModulus), "Young's modulus");
        return new Stress(2 * E * d / L);
    }

    /// <summary>The tension from the note of a plucked free span of the band at rest.</summary>
    /// <remarks>
    /// σ₀ = 0.96 [m ρ (2 l f)² − π² E t²/(12 l²)], m = (b + h/2)/b. f, Hz; l free span, m, 150 mm or more and at least 200 t; t, m; b body width, m;
    /// h gullet depth, m. Wheels hold the ends between pinned and clamped, about 4 of 100 under the pinned answer; the reading is good to ±8 of 100.
    /// </remarks>
    /// <source key="fletcher-rossing" where="ch. 2, stiff string; from memory. The 0.96 is an engineering default"/>
    public static Stress FromPluck(Frequency note, Length freeSpan, Length thickness, Length bodyWidth, Length gulletDepth, Steel steel)
    {
        double m = Pluck.MassRatio(bodyWidth, gulletDepth);
        double pinned = Pluck.PinnedTension(note, freeSpan, thickness, steel, m).Pascals;
        return new Stress(0.96 * pinned);
    }

    /// <summary>How far the true tension may lie from a reading, as a fraction of it.</summary>
    /// <remarks>0.08 for a plucked span, 0.20 for every other method.</remarks>
    /// <source key="engineering-default" where="8 of 100 plucked, 20 of 100 otherwise"/>
    public static double Uncertainty(TensionMethod method) => method switch
    {
        TensionMethod.Pluck => 0.08,
        TensionMethod.StrandForce or TensionMethod.WheelLoad or TensionMethod.Stretch => 0.20,
        _ => throw new ArgumentOutOfRangeException(nameof(method), method, "The tension is found from a force, a wheel load, a stretch or a note."),
    };

    /// <summary>The part of the centrifugal stress that adds to the tension on this kind of saw.</summary>
    /// <remarks>η = 1 where a spring, weight, air or oil holds the load; η = 0 where a rigid screw holds the length. Real saws lie between.</remarks>
    /// <source key="mote-1965" where="κ = 1 − η of the literature; from memory"/>
    public static double Support(TensionSystem system) => system switch
    {
        TensionSystem.Sprung => 1,
        TensionSystem.Locked => 0,
        _ => throw new ArgumentOutOfRangeException(nameof(system), system, "The saw holds its wheel load with a spring or with a locked screw."),
    };

    /// <summary>The part of the centrifugal stress that adds to the tension, from the stiffness behind the movable wheel.</summary>
    /// <remarks>η = 1 / (1 + k L/(4 E A)). k stiffness at the wheel, N/m, zero or above; L loop, m; A = t b section of the body, m²; E, Pa. Two equal wheels.</remarks>
    /// <source key="derived" where="balance of forces of a band on a sprung wheel"/>
    public static double Support(Stiffness wheelMount, Length loop, Length thickness, Length bodyWidth, Stress youngsModulus)
    {
        double k = Require.NotNegative(wheelMount.NewtonsPerMetre, nameof(wheelMount), "stiffness behind the wheel");
        double L = Require.Positive(loop, nameof(loop), "loop length");
        double A = Require.Positive(thickness, nameof(thickness), "band thickness") * Require.Positive(bodyWidth, nameof(bodyWidth), "body width");
        double E = Require.Positive(youngsModulus, nameof(youngsModulus), "Young's modulus");
        return 1 / (1 + k * L / (4 * E * A));
    }

    /// <summary>The tension in the spans while the band runs.</summary>
    /// <remarks>
    /// σ_T = σ₀ + η ρ v². σ₀ tension at rest, Pa, zero or above; η see Support, 0 to 1; ρ, kg/m³; v band speed, m/s, zero or above.
    /// The bending stress does not change with speed.
    /// </remarks>
    /// <source key="mote-1965" where="moving band under tension; from memory"/>
    public static Stress Running(Stress still, double support, Density density, Speed bandSpeed)
    {
        double sigma0 = Require.NotNegative(still, nameof(still), "tension at rest");
        double eta = Require.Between(support, 0, 1, nameof(support), "share of the centrifugal stress");
        double rho = Require.Positive(density, nameof(density), "density");
        double v = Require.NotNegative(bandSpeed, nameof(bandSpeed), "band speed");
        return new Stress(sigma0 + eta * rho * v * v);
    }
}
