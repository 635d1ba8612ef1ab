namespace BladeLog.Handbook.BeamStrength;

/// <summary>A quick figure of how much lower a wide band buckles as a plate than as a beam.</summary>
public static class PlateFit
{
    /// <summary>Gives the buckling thrust as a plate over that as a beam.</summary>
    /// <param name="b">The band and its cut.</param>
    /// <remarks>
    /// η_p = 1/(1 + 0.617 (w/S)^2.03 (σ w²/(E t²))^0.805 (h/S)^−0.225). w width over all m, S guide span m, σ tension on the body Pa, t thickness m,
    /// h height of the cut m. Fitted over S 100 to 600 mm, σ 70 to 200 MPa, w/S to 0.55, without gullets: 2 % as a mean, 9 % at worst; with gullets on the reference
    /// bands within 2.5 %, 5 % where the cut lies a quarter of the span off the middle, a little high. Use it where the plate would rule: w from 40 mm, or w/S over 0.2. w/S over 0.55 throws.
    /// </remarks>
    /// <source key="derived" where="fit to the plate solution at 468 points, band stability specification 4"/>
    public static double Share(GuidedBand b)
    {
        BandSection s = BandSection.Of(b);
        double w_S = s.w / s.S;
        BandSection.Refuse(w_S > 0.55 * (1 + 1e-9), nameof(b), "The quick figure holds for a band up to 0.55 of the guide span wide.");
        double slender = s.sigma * s.w * s.w / (s.E * s.t * s.t);
        return 1 / (1 + (0.617 * Math.Pow(w_S, 2.03) * Math.Pow(slender, 0.805) * Math.Pow(s.h / s.S, -0.225)));
    }
}
