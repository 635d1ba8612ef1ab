using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>When the plate value is worked out, and when it rules.</summary>
public enum PlateUse
{
    /// <summary>Not worked out.</summary>
    Never,

    /// <summary>Worked out, and rules where lower, for a band of 40 mm or more, or wider than a fifth of its span.</summary>
    WhereItMatters,

    /// <summary>Worked out, and rules where lower, for a band of 40 mm or more.</summary>
    WideBandsOnly,

    /// <summary>Always worked out; rules only where <see cref="WhereItMatters"/> says.</summary>
    Always,
}

/// <summary>What sets the thrust allowed.</summary>
public enum ThrustLimiter
{
    /// <summary>The front edge goes slack first.</summary>
    FrontEdge,

    /// <summary>The band would lie over and twist first.</summary>
    Buckling,
}

/// <summary>How hard the wood may push on a band: totals over all teeth in the cut.</summary>
/// <param name="FrontEdge">P₁, front edge slack.</param>
/// <param name="BeamBuckling">Buckling thrust as a beam, prebuckling taken in.</param>
/// <param name="PlateBuckling">Buckling thrust as a plate, where worked out.</param>
/// <param name="Buckling">Pcr, the buckling thrust that rules.</param>
/// <param name="Allowed">min(P₁/SF₁, Pcr/SF₂).</param>
/// <param name="Stop">Pcr/SF₂.</param>
/// <param name="GovernedBy">Which of the two set what is allowed.</param>
public sealed record ThrustLimits(
    Force FrontEdge,
    Force BeamBuckling,
    Force? PlateBuckling,
    Force Buckling,
    Force Allowed,
    Force Stop,
    ThrustLimiter GovernedBy);

/// <summary>The thrust a band may be given in a cut.</summary>
public static class ThrustLimit
{
    private const double WideBand = 0.040;

    /// <summary>Gives both limits of thrust, and what is allowed under them.</summary>
    /// <param name="b">The band and its cut.</param>
    /// <param name="plate">When the plate value is worked out and rules.</param>
    /// <param name="frontEdgeFactor">SF₁: 1, or 1.25 when the tension is only guessed.</param>
    /// <param name="bucklingFactor">SF₂: 2; 3 where the straightest cut is wanted.</param>
    /// <param name="terms">N of the beam series.</param>
    /// <remarks>
    /// P_allowed = min(P₁/SF₁, Pcr/SF₂); P_stop = Pcr/SF₂; Pcr the beam value, or the plate value where that is lower and
    /// w ≥ 40 mm or w/S &gt; 0.2; 8 terms along and 4 across, 20 along where it rules and the cut is shorter than an eighth of the span. P₁ by <see cref="BeamStrength.FrontEdge.SlackThrust"/>, Pcr by <see cref="LateralBuckling"/> and
    /// <see cref="BeamStrength.PlateBuckling"/>; w width over all m, S guide span m. At half of Pcr a band keeps 53 to 65 % of its tip stiffness.
    /// Range: as for those. Factors under 1 throw. Tension is the worst-known input: P₁ follows it one to one.
    /// </remarks>
    /// <source key="engineering-default" where="safety factors 1, 1.25 and 2; band stability specification 0 and 9"/>
    public static ThrustLimits Of(GuidedBand b, PlateUse plate, double frontEdgeFactor = 1.0, double bucklingFactor = 2.0, int terms = 12)
    {
        Factor(frontEdgeFactor, nameof(frontEdgeFactor));
        Factor(bucklingFactor, nameof(bucklingFactor));
        LateralBuckling.CheckTerms(terms);
        BandSection s = BandSection.Of(b);
        var plane = new InPlane(s);
        double P1 = BeamStrength.FrontEdge.Slack(s, plane, 0);
        double beam = LateralBuckling.Critical(s, plane, terms, prebuckling: true);

        bool wide = s.w >= WideBand * (1 - 1e-12), stout = s.w > 0.2 * s.S;
        bool rules = plate switch
        {
            PlateUse.Never => false,
            PlateUse.WideBandsOnly => wide,
            _ => wide || stout,
        };
        double? asPlate = rules || plate == PlateUse.Always ? BeamStrength.PlateBuckling.Critical(s, plane, rules ? BeamStrength.PlateBuckling.TermsFor(s) : 8) : null;
        double Pcr = rules && asPlate < beam ? asPlate.Value : beam;

        double slack = P1 / frontEdgeFactor, stop = Pcr / bucklingFactor;
        return new ThrustLimits(
            new Force(P1),
            new Force(beam),
            asPlate is { } p ? new Force(p) : null,
            new Force(Pcr),
            new Force(Math.Min(slack, stop)),
            new Force(stop),
            slack <= stop ? ThrustLimiter.FrontEdge : ThrustLimiter.Buckling);
    }

    private static void Factor(double factor, string name)
    {
        if (!(factor >= 1 && double.IsFinite(factor)))
        {
            throw new ArgumentOutOfRangeException(name, "A safety factor must be at least one.");
        }
    }
}
