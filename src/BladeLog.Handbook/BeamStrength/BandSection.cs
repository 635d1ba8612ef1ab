using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>The band of a <see cref="GuidedBand"/> in SI, with the section properties the formulas share. Symbols as in docs/nomenclature.md.</summary>
internal readonly struct BandSection
{
    public readonly double w, g, t, b, E, G, nu, rho, sigma, v;
    public readonly double S, h, xc, below, above;
    public readonly bool clamped;

    /// <summary>Section, pull of one strand, and the part of it that straightens the band (pull less centrifugal tension on a locked saw).</summary>
    public readonly double A, T, Tg;

    /// <summary>In-plane and lateral second moments, torsion, secondary warping, polar radius squared, lever of the tooth tip.</summary>
    public readonly double Iz, Iy, J, Iw, r2, e;

    /// <summary>In-plane tie parameter √(T/(E Iz)).</summary>
    public readonly double beta;

    public double EIy => E * Iy;

    public double GJ => G * J;

    public double EIw => E * Iw;

    public double x1 => Math.Max(0, xc - (h / 2));

    public double x2 => Math.Min(S, xc + (h / 2));

    /// <summary>Torsional stiffness with the share of the tension.</summary>
    public double GJt => GJ + (Tg * r2);

    public static BandSection Of(GuidedBand band)
    {
        ArgumentNullException.ThrowIfNull(band);
        return new BandSection(band);
    }

    private BandSection(GuidedBand band)
    {
        w = Positive(band.Width.Metres, "The width of the band");
        t = Positive(band.Thickness.Metres, "The thickness of the band");
        g = NotNegative(band.GulletDepth.Metres, "The gullet depth");
        sigma = Positive(band.Tension.Pascals, "The tension of the band");
        S = Positive(band.GuideSpan.Metres, "The span between the guides");
        h = Positive(band.CutHeight.Metres, "The height of the cut");
        xc = Positive(band.CutCentre.Metres, "The middle of the cut above the lower guide");
        v = NotNegative(band.BandSpeed.MetresPerSecond, "The band speed");
        below = NotNegative(band.BackSupportBelow.Metres, "The distance from the lower guide to the back support");
        above = NotNegative(band.BackSupportAbove.Metres, "The distance from the upper guide to the back support");
        E = Positive(band.Steel.YoungsModulus.Pascals, "Young's modulus");
        rho = Positive(band.Steel.Density.KilogramsPerCubicMetre, "The density of the band");
        nu = band.Steel.Poisson;
        clamped = band.BackClamped;
        Refuse(!(nu > -1 && nu < 0.5), nameof(Steel), "Poisson's ratio must lie between -1 and 0.5.");
        Refuse(g >= w, nameof(GuidedBand.GulletDepth), "The gullet must be less deep than the band is wide.");
        b = w - g;
        Refuse(t > b, nameof(GuidedBand.Thickness), "The band must be no thicker than its body is wide.");
        Refuse(h > S * (1 + 1e-9), nameof(GuidedBand.CutHeight), "The cut is higher than the span between the guides.");
        Refuse(xc - (h / 2) < -1e-9 * S || xc + (h / 2) > S * (1 + 1e-9), nameof(GuidedBand.CutCentre), "The cut must lie between the guides.");

        A = b * t;
        T = sigma * A;
        double centrifugal = rho * A * v * v;
        Tg = band.System == TensionSystem.Locked ? T - centrifugal : T;
        Refuse(!(Tg > 0), nameof(GuidedBand.BandSpeed), "At this speed the band throws off all of its tension.");
        Iz = t * b * b * b / 12;
        Iy = b * t * t * t / 12;
        double slender = t / b;
        J = b * t * t * t / 3 * (1 - (0.63 * slender * (1 - (slender * slender * slender * slender / 12))));
        Iw = t * t * t * b * b * b / 144;
        r2 = ((b * b) + (t * t)) / 12;
        e = w - (b / 2);
        G = E / (2 * (1 + nu));
        beta = Math.Sqrt(T / (E * Iz));
    }

    private static double Positive(double value, string what)
    {
        if (!(double.IsFinite(value) && value > 0))
        {
            Refuse(true, "band", what + " must be greater than zero.");
        }

        return value;
    }

    private static double NotNegative(double value, string what)
    {
        if (!(double.IsFinite(value) && value >= 0))
        {
            Refuse(true, "band", what + " must not be negative.");
        }

        return value;
    }

    internal static void Refuse(bool impossible, string name, string sentence)
    {
        if (impossible)
        {
            throw new ArgumentOutOfRangeException(name, sentence);
        }
    }
}
