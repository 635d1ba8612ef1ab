using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Band;

/// <summary>What turning the band about its own length, from wheel to guide, does to it.</summary>
public static class GuideTwist
{
    /// <summary>The shear stress in the faces of a band that is twisted over a free length.</summary>
    /// <remarks>τ = G t θ/l. θ twist, rad, either way; l length over which it is twisted, m; t thickness, m; G, Pa. Thin strip, elastic.</remarks>
    /// <source key="derived" where="torsion of a thin strip"/>
    public static Stress Shear(Angle twist, Length over, Length bandThickness, Steel steel)
    {
        ArgumentNullException.ThrowIfNull(steel);
        double theta = Twist(twist);
        double l = Require.Positive(over, nameof(over), "length of the twist");
        double t = Require.Positive(bandThickness, nameof(bandThickness), "band thickness");
        double G = steel.ShearModulus.Pascals;
        return new Stress(G * t * theta / l);
    }

    /// <summary>The pull that twisting adds along both edges of a band, which follow a longer path than its middle.</summary>
    /// <remarks>
    /// σ = E (θ/l)² b²/12. b width of the body, m; θ, l, E as for the shear. The middle of the width is relieved by half as much.
    /// Elastic, and for edges that lean little: b θ/l well under 1.
    /// </remarks>
    /// <source key="derived" where="strain y²θ²/(2 l²) of a helix, less its mean over the width"/>
    public static Stress EdgePull(Angle twist, Length over, Length bodyWidth, Stress youngsModulus)
    {
        double theta = Twist(twist);
        double l = Require.Positive(over, nameof(over), "length of the twist");
        double b = Require.Positive(bodyWidth, nameof(bodyWidth), "body width");
        double E = Require.Positive(youngsModulus, nameof(youngsModulus), "Young's modulus");
        double rate = theta / l;
        return new Stress(E * rate * rate * b * b / 12);
    }

    /// <summary>How many cycles the twist adds to one turn of the loop.</summary>
    /// <remarks>
    /// One for each place where the band is twisted, such as the way from a wheel into tilted guides and the way out, from 20° of twist; under that none, as the pull is
    /// a fraction of a megapascal (5° over 300 mm: 0.18 MPa). places from zero.
    /// </remarks>
    /// <source key="engineering-default" where="20° as the least twist that is counted; one cycle each time the edges are stretched and let go"/>
    public static int ExtraCycles(Angle twist, int places)
    {
        double theta = Twist(twist);
        int n = places >= 0 ? places : throw new ArgumentOutOfRangeException(nameof(places), places, "The number of twisted places must be zero or above.");
        return theta >= 20 * Math.PI / 180 ? n : 0;
    }

    private static double Twist(Angle twist) =>
        double.IsFinite(twist.Radians) ? Math.Abs(twist.Radians) : throw new ArgumentOutOfRangeException(nameof(twist), twist.Radians, "The twist must be a number.");
}
