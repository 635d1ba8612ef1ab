using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>How much a tooth itself gives sideways, beside the band it stands on.</summary>
public static class ToothCompliance
{
    /// <summary>Gives the stiffness of one tooth against a side force on its tip, the band held.</summary>
    /// <param name="pitch">Tooth to tooth.</param>
    /// <param name="gulletDepth">Height of the tooth.</param>
    /// <param name="thickness">Thickness of the body.</param>
    /// <param name="steel">Elastic constants.</param>
    /// <remarks>
    /// k_t = E (0.55 p) t³/(6 g³): a cantilever that tapers to a point, on a base of 0.55 of the pitch. p pitch m, g gullet depth m, t thickness m, E Pa.
    /// Above zero each. For 25 × 0.9, p 12, g 5 about 1320 N/mm against 20 to 40 of the band: it counts only where g³/(p t³) is large.
    /// </remarks>
    /// <source key="derived" where="tip load on a cantilever of linearly tapering width; the base of 0.55 p is an engineering default"/>
    public static Stiffness OfTooth(Length pitch, Length gulletDepth, Length thickness, Steel steel)
    {
        ArgumentNullException.ThrowIfNull(steel);
        double p = pitch.Metres, g = gulletDepth.Metres, t = thickness.Metres, E = steel.YoungsModulus.Pascals;
        BandSection.Refuse(!(p > 0 && double.IsFinite(p)), nameof(pitch), "The pitch must be greater than zero.");
        BandSection.Refuse(!(g > 0 && double.IsFinite(g)), nameof(gulletDepth), "The gullet depth must be greater than zero.");
        BandSection.Refuse(!(t > 0 && double.IsFinite(t)), nameof(thickness), "The thickness of the band must be greater than zero.");
        return new Stiffness(E * (0.55 * p) * t * t * t / (6 * g * g * g));
    }

    /// <summary>Gives the stiffness of the tip on its tooth on the band.</summary>
    /// <param name="band">Stiffness of the band at the tip, its teeth rigid; 0 for a buckled one.</param>
    /// <param name="tooth">Stiffness of the teeth that share the force.</param>
    /// <remarks>1/k = 1/k_band + 1/k_tooth. For a force on one tip take one tooth; spread over z tips in the cut, z times k_t.</remarks>
    /// <source key="derived" where="springs in a row"/>
    public static Stiffness InSeries(Stiffness band, Stiffness tooth)
    {
        double k_band = band.NewtonsPerMetre, k_tooth = tooth.NewtonsPerMetre;
        BandSection.Refuse(!(k_band >= 0), nameof(band), "A stiffness must not be negative.");
        BandSection.Refuse(!(k_tooth > 0), nameof(tooth), "The stiffness of a tooth must be greater than zero.");
        return new Stiffness(k_band == 0 ? 0 : 1 / ((1 / k_band) + (1 / k_tooth)));
    }
}
