using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>The thrust that takes all tension out of the tooth side of the body.</summary>
public static class FrontEdge
{
    /// <summary>Gives the total thrust at which the gullet roots in the cut lose their tension.</summary>
    /// <param name="b">The band and its cut.</param>
    /// <param name="bias">Extra tension at the tooth edge, linear across the body (wheel tilt, back crown); negative when the edge is slacker.</param>
    /// <remarks>
    /// P₁ = (σ + σ_bias) t b² / (6 m_max), with m_max the greatest moment per unit of thrust in the band's own plane, by
    /// <see cref="GreatestMoment"/>. σ tension on the body Pa, t thickness m, b = w − g body width m. The teeth carry no tension.
    /// Range: bias above −σ. It is a margin of comfort, not a cliff: the band goes on carrying beyond it. It does not depend on band speed.
    /// </remarks>
    /// <source key="derived" where="tied beam; checked by an independent finite-element program, band stability specification 2.1"/>
    public static Force SlackThrust(GuidedBand b, Stress bias = default)
    {
        BandSection s = BandSection.Of(b);
        CheckBias(s, bias);
        return new Force(Slack(s, new InPlane(s), bias.Pascals));
    }

    /// <summary>Gives the greatest moment in the band's own plane per unit of total thrust, a length.</summary>
    /// <remarks>
    /// E Iz Y⁗ − T Y″ = q, so M″ − β²M = −q, β = √(T/(E Iz)), over the length on which the back is carried; its ends free to turn,
    /// or clamped where the band wraps on the wheels. m_max for a cut at mid-span and free ends: [1 − cosh(βx₁)/cosh(βS/2)]/(β²h).
    /// x₁ lower end of the cut m, S length carried m, h height of the cut m, T pull of one strand N.
    /// Range: any tension above zero; towards none it becomes the plain beam, (2S − h)/8.
    /// </remarks>
    /// <source key="derived" where="tied beam; band stability specification 2.2 to 2.4"/>
    public static Length GreatestMoment(GuidedBand b)
    {
        var plane = new InPlane(BandSection.Of(b));
        return new Length(plane.At(plane.Peak()));
    }

    /// <summary>Gives where the moment is greatest, above the lower guide; always inside the cut.</summary>
    /// <remarks>
    /// m′(x*) = 0 inside the cut: tanh(βx*) = [m′(0) + sinh(βx₁)/(βh)]/[cosh(βx₁)/(βh) − m(0)β]. Symbols and range as for <see cref="GreatestMoment"/>.
    /// </remarks>
    /// <source key="derived" where="tied beam; band stability specification 2.2"/>
    public static Length WeakestPoint(GuidedBand b) => new(new InPlane(BandSection.Of(b)).Peak());

    internal static void CheckBias(in BandSection s, Stress bias)
    {
        if (!(s.sigma + bias.Pascals > 0 && double.IsFinite(bias.Pascals)))
        {
            throw new ArgumentOutOfRangeException(nameof(bias), "The tooth edge must have some tension before the cut.");
        }
    }

    internal static double Slack(in BandSection s, in InPlane plane, double sigma_bias)
    {
        double m_max = plane.At(plane.Peak());
        return (s.sigma + sigma_bias) * s.t * s.b * s.b / (6 * m_max);
    }
}
