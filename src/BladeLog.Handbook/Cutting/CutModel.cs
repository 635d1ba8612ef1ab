using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>The settings of the cutting-force model. Every one can be set by the shop.</summary>
public sealed record CutModel
{
    /// <summary>λ: the least chip a rounded edge lifts, as a share of its radius (published for metals; the value for wood is an engineering default).</summary>
    public double Lambda { get; init; } = 0.20;

    /// <summary>r_s: edge radius already contained in the published force figures (engineering default).</summary>
    public Length ReferenceRadius { get; init; } = Length.FromMicrometres(10);

    /// <summary>η: chip thickness that one unit of rounding beyond r_s is worth, range 2 to 8 (engineering default).</summary>
    public double Eta { get; init; } = 4;

    /// <summary>ξ: thrust per main force of the rounding, range 1.0 to 2.1 (engineering default).</summary>
    public double Xi { get; init; } = 1.5;

    /// <summary>e₀: thrust of the reference edge, as a chip thickness (engineering default).</summary>
    public Length ThrustOffset { get; init; } = Length.FromMicrometres(25);

    /// <summary>β_t: rake at which the thrust of the chip changes sign (published: between 20° and 30°).</summary>
    public Angle ThrustAngle { get; init; } = Angle.FromDegrees(25);

    /// <summary>μ: friction of chip on tooth face (published for dry pine).</summary>
    public double Friction { get; init; } = 0.6;

    /// <summary>R: fracture toughness of the reference pine, J/m² (from memory).</summary>
    public double FractureToughness { get; init; } = 1295;

    /// <summary>τ: shear yield stress of the reference pine (from memory).</summary>
    public Stress ShearYield { get; init; } = new(20.861e6);

    /// <summary>k_ρ: shear factor per density at 20° rake and 12 % moisture, Pa per kg/m³ (derived: 50.5802 MPa over 520 kg/m³).</summary>
    public double StiffnessPerDensity { get; init; } = 97269.7;

    /// <summary>Share of the dry force that is lost from 12 % to 30 % moisture (derived from a published ratio).</summary>
    public double MoistureDrop { get; init; } = 0.375;

    /// <summary>K_dir of a cross-cut; a rip cut is 1 (derived from a published pair).</summary>
    public double CrossFactor { get; init; } = 0.7;

    /// <summary>Frozen wood over thawed, range 1.0 to 1.8 (engineering default).</summary>
    public double FrozenFactor { get; init; } = 1.3;

    /// <summary>q: the shop's own factor from ammeter readings; 1 until there are any.</summary>
    public double FitFactor { get; init; } = 1;

    /// <summary>The least edge radius the formulas take; a smaller one is taken as this (engineering default).</summary>
    public Length LeastRadius { get; init; } = Length.FromMicrometres(3);

    /// <summary>The handbook's own settings.</summary>
    public static CutModel Default { get; } = new();
}
