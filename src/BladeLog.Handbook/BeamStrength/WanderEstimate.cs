using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>How far a cut may wander sideways, and what a measured wander says of the teeth.</summary>
public static class WanderEstimate
{
    /// <summary>ψ of sharp teeth with an even set: side force over cutting force (no published table was found).</summary>
    public const double SharpShare = 0.03;

    /// <summary>ψ of dull teeth or an uneven set (no published table was found).</summary>
    public const double DullShare = 0.10;

    /// <summary>Gives the mean wander of the teeth in the cut; without limit where the band is buckled.</summary>
    /// <param name="sideShare">ψ, net side force as a share of the cutting force; learnt for the blade, or 0.03 sharp and 0.10 dull.</param>
    /// <param name="cutting">Main cutting force of all teeth in the cut.</param>
    /// <param name="overCut">Stiffness over the cut under its thrust, by <see cref="TipStiffness.OverCut"/>.</param>
    /// <remarks>
    /// δ = ψ Fc / k_cut(P). Fc N, k_cut N/m, ψ 0 to 1. No steering by a bent band path or by the grain, no help from the kerf walls:
    /// an estimate of size, not a promise.
    /// </remarks>
    /// <source key="engineering-default" where="0.03 and 0.10; that side force is random in sign and tip stiffness decides is in pahlitzsch-puttkammer-1974 and lehmann-1993"/>
    public static Length Mean(double sideShare, Force cutting, Stiffness overCut)
    {
        double psi = Share(sideShare), Fc = Cutting(cutting), k_cut = overCut.NewtonsPerMetre;
        BandSection.Refuse(!(k_cut >= 0), nameof(overCut), "A stiffness must not be negative.");
        return new Length(psi * Fc == 0 ? 0 : psi * Fc / k_cut);
    }

    /// <summary>Gives the side share of a blade from a wander that was measured on a board.</summary>
    /// <param name="measured">Wander, to either side.</param>
    /// <param name="cutting">Main cutting force of all teeth in that cut.</param>
    /// <param name="overCut">Stiffness over that cut under its thrust.</param>
    /// <remarks>ψ = δ k_cut(P)/Fc. δ m, its side does not matter. Where ψ rises on one blade its set is uneven or one side wears. May come out above 1: then something else steered.</remarks>
    /// <source key="derived" where="wander estimate solved for the share"/>
    public static double LearntShare(Length measured, Force cutting, Stiffness overCut)
    {
        double delta = Math.Abs(measured.Metres), Fc = Cutting(cutting), k_cut = overCut.NewtonsPerMetre;
        BandSection.Refuse(!double.IsFinite(delta), nameof(measured), "The wander must be a number.");
        BandSection.Refuse(!(k_cut > 0 && double.IsFinite(k_cut)), nameof(overCut), "The stiffness of the band in the cut must be greater than zero.");
        BandSection.Refuse(Fc == 0, nameof(cutting), "The cutting force must be greater than zero.");
        return delta * k_cut / Fc;
    }

    private static double Share(double psi)
    {
        BandSection.Refuse(!(psi is >= 0 and <= 1), "sideShare", "The side force must lie between nothing and all of the cutting force.");
        return psi;
    }

    private static double Cutting(Force cutting)
    {
        BandSection.Refuse(!(cutting.Newtons >= 0 && double.IsFinite(cutting.Newtons)), nameof(cutting), "The cutting force must not be negative.");
        return cutting.Newtons;
    }
}
