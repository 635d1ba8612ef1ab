namespace BladeLog.Handbook.BeamStrength;

/// <summary>A quick figure of the tip stiffness a thrust leaves, where the full solution of <see cref="TipStiffness"/> is not wanted.</summary>
public static class ThrustSoftening
{
    /// <summary>Gives the share of the twist in what a single tip at the middle of the cut gives, no thrust, 0 to 1.</summary>
    /// <param name="b">The band and its cut.</param>
    /// <remarks>
    /// s = e² tie(E Iw, G J + Tg r²)/[tie(E Iy, Tg) + e² tie(E Iw, G J + Tg r²)]; tie and symbols as for <see cref="TipStiffness.AtPoint"/>.
    /// </remarks>
    /// <source key="derived" where="band stability specification 5.1"/>
    public static double TwistShare(GuidedBand b)
    {
        BandSection s = BandSection.Of(b);
        double twist = s.e * s.e * TipStiffness.Tie(s.EIw, s.GJt, s.xc, s.S);
        return twist / (TipStiffness.Tie(s.EIy, s.Tg, s.xc, s.S) + twist);
    }

    /// <summary>Gives the share of the tip stiffness that is left under a thrust.</summary>
    /// <param name="loadShare">r = P/Pcr, thrust over the buckling thrust of the beam without the prebuckling term.</param>
    /// <param name="twistShare">s, by <see cref="TwistShare"/>.</param>
    /// <remarks>
    /// k(P)/k(0) = (1 − r)(1 + a r), a = 0.075/s. A fit to the exact solution: on the 26 reference bands within 2 % to r = 0.4 and 5.3 % to r = 0.7.
    /// r below zero throws; from 1 on nothing is left.
    /// </remarks>
    /// <source key="derived" where="fit to the exact solution over 26 bands, band stability specification 5.1"/>
    public static double Left(double loadShare, double twistShare)
    {
        double r = loadShare, s = twistShare;
        BandSection.Refuse(!(r >= 0), nameof(loadShare), "The thrust must not be negative.");
        BandSection.Refuse(!(s is > 0 and <= 1), nameof(twistShare), "The share of the twist must lie above zero and up to one.");
        double a = 0.075 / s;
        return r >= 1 ? 0 : (1 - r) * (1 + (a * r));
    }
}
