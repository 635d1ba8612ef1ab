using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>One band on one saw: all that its life in bending depends on.</summary>
public sealed record BandCase
{
    /// <summary>Body thickness.</summary>
    public required Length Thickness { get; init; }

    /// <summary>Diameter of each wheel the band runs over, with the tyre: a saw of three wheels has three.</summary>
    public required IReadOnlyList<Length> Wheels { get; init; }

    /// <summary>Speed of the band.</summary>
    public required Speed BandSpeed { get; init; }

    /// <summary>Loop length.</summary>
    public required Length Loop { get; init; }

    /// <summary>Tension at rest, on the body section.</summary>
    public required Stress Tension { get; init; }

    /// <summary>Hardness of the body (the back), HRC, 20 to 58.</summary>
    public required double BodyHrc { get; init; }

    /// <summary>Body width; only for the stiffening of wide bands at the weld. Left out: none.</summary>
    public Length? BodyWidth { get; init; }

    /// <summary>How well the loop was joined.</summary>
    public WeldQuality Weld { get; init; } = WeldQuality.Good;

    /// <summary>How the saw holds its wheel load.</summary>
    public TensionSystem System { get; init; } = TensionSystem.Sprung;

    /// <summary>K_ft, the gullet's factor on tension (engineering default 2.0, 1.5 to 2.5).</summary>
    public double GulletTensionFactor { get; init; } = 2.0;

    /// <summary>K_fb, the gullet's factor on bending (engineering default 1.4, 1.1 to 1.8).</summary>
    public double GulletBendingFactor { get; init; } = 1.4;

    /// <summary>Weibull shape of the scatter between blades of one kind (engineering default 2.0).</summary>
    public double WeibullShape { get; init; } = 2.0;

    /// <summary>How far the push of the wood lowers the gullet's stress once in each turn of the loop; held to the running tension. Left out: no such valley.</summary>
    public Stress? CutValley { get; init; }

    /// <summary>
    /// How far the tension of the span that leads onto each wheel lies over the running tension (under it: below zero), in the order of the wheels;
    /// the wood is cut in the span that leads onto the first. Left out: all spans alike.
    /// </summary>
    public IReadOnlyList<Stress>? SpanOffsets { get; init; }

    /// <summary>The pull along the edges at each place where tilted guides twist the band, on the way in and out of the cut. Each adds a cycle of the gullet to a turn of the loop.</summary>
    public IReadOnlyList<Stress> TwistPulls { get; init; } = [];

    /// <summary>The gullet's pitch and radius, where known: the two gullet factors then come from them. Left out: the factors above.</summary>
    public KnownGullet? Gullet { get; init; }

    /// <summary>The elastic constants and the density.</summary>
    public Steel Steel { get; init; } = Steel.Carbon;

    /// <summary>Bends at the knee of the stress-life line (engineering default 10⁷).</summary>
    public double KneeBends { get; init; } = 1e7;

    /// <summary>How the gullet was made or left.</summary>
    public GulletFinish Finish { get; init; } = GulletFinish.Ground;

    /// <summary>Rust in the gullets.</summary>
    public bool Rusty { get; init; }
}

/// <summary>A gullet whose shape was measured.</summary>
/// <param name="Pitch">Tooth to tooth.</param>
/// <param name="Radius">Radius at the bottom of the gullet, 0.06 to 0.29 of the pitch.</param>
public sealed record KnownGullet(Length Pitch, Length Radius);

/// <summary>The ladder by the blade's median bends.</summary>
public enum LifeVerdict
{
    /// <summary>Under 10⁴ bends: hours or less.</summary>
    Unsuitable,

    /// <summary>10⁴ to under 5·10⁵ bends.</summary>
    Marginal,

    /// <summary>5·10⁵ to 10⁸ bends.</summary>
    Finite,

    /// <summary>Over 10⁸ bends: something else retires the blade first, and no hours are shown.</summary>
    NotLimiting,
}

/// <summary>The life of one place on the band.</summary>
/// <param name="EquivalentAmplitude">The fully reversed amplitude of each wheel's bend.</param>
/// <param name="MedianBends">Bends by which half have broken: wheels times turns of the loop.</param>
/// <param name="MedianHours">The same in hours of running.</param>
/// <param name="DamagePerHour">The share of the median life an hour of running uses.</param>
public sealed record SiteLife(IReadOnlyList<Stress> EquivalentAmplitude, double MedianBends, double MedianHours, double DamagePerHour)
{
    /// <summary>The fully reversed amplitude of the cycles that come beside the wheels' bends, from twist and unequal spans; their damage is in the life.</summary>
    public IReadOnlyList<Stress> Beside { get; init; } = [];
}

/// <summary>The life of a band on a saw.</summary>
/// <param name="Bending">Bending stress on each wheel.</param>
/// <param name="RunningTension">Tension while the band runs.</param>
/// <param name="BendsPerHour">Bends in an hour of running.</param>
/// <param name="Gullet">Life at the gullets.</param>
/// <param name="Weld">Life at the weld.</param>
/// <param name="MedianBends">Bends by which half of such blades have broken, at either place.</param>
/// <param name="MedianHours">The same in hours of running.</param>
/// <param name="TenthPercentileBends">Bends by which one in ten has broken, from scatter alone.</param>
/// <param name="Verdict">The rung of the ladder.</param>
public sealed record BandLifeResult(
    IReadOnlyList<Stress> Bending,
    Stress RunningTension,
    double BendsPerHour,
    SiteLife Gullet,
    SiteLife Weld,
    double MedianBends,
    double MedianHours,
    double TenthPercentileBends,
    LifeVerdict Verdict)
{
    /// <summary>
    /// Whether tension and bending together reach the body's yield point (0.9 of its tensile strength) on some wheel: the band takes a set there.
    /// The life is still computed, with the local stress held at the yield point.
    /// </summary>
    public bool TakesSet { get; init; }
}
