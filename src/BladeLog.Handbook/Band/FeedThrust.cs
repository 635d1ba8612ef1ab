using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Band;

/// <summary>What pushing the wood does to the band in its own plane: the tooth edge is pressed together, the back stretched.</summary>
public static class FeedThrust
{
    /// <summary>The in-plane bending stress at the edges of the body from a push at one point of mid-span, without the help of the tension.</summary>
    /// <remarks>
    /// σ_ip = 6 M / (t b²), M = F l / 4. F push, N, zero or above; l span between the guides, m; t thickness, m; b body width, m.
    /// An upper bound: the tension straightens the band, see <see cref="TensionRelief"/>.
    /// </remarks>
    /// <source key="derived" where="simply supported beam, load at mid-span"/>
    public static Stress InPlaneStress(Force push, Length guideSpan, Length bandThickness, Length bodyWidth)
    {
        double F = Require.NotNegative(push.Newtons, nameof(push), "push");
        double l = Require.Positive(guideSpan, nameof(guideSpan), "guide span");
        double t = Require.Positive(bandThickness, nameof(bandThickness), "band thickness");
        double b = Require.Positive(bodyWidth, nameof(bodyWidth), "body width");
        double M = F * l / 4;
        return new Stress(6 * M / (t * b * b));
    }

    /// <summary>The in-plane bending stress from a push spread evenly over the height of the wood.</summary>
    /// <remarks>
    /// σ_ip = 6 M / (t b²), M = F (2 l − h) / 8. h height of the wood, m, above zero and no more than the span l; the rest as for a push at one point.
    /// No tension relief in it.
    /// </remarks>
    /// <source key="derived" where="simply supported beam, even load over h about mid-span"/>
    public static Stress InPlaneStressSpread(Force push, Length guideSpan, Length workHeight, Length bandThickness, Length bodyWidth)
    {
        double F = Require.NotNegative(push.Newtons, nameof(push), "push");
        double l = Require.Positive(guideSpan, nameof(guideSpan), "guide span");
        double h = Require.Positive(workHeight, nameof(workHeight), "height of the wood");
        if (h > l)
        {
            throw new ArgumentOutOfRangeException(nameof(workHeight), h, "The wood must not be higher than the span between the guides.");
        }

        double t = Require.Positive(bandThickness, nameof(bandThickness), "band thickness");
        double b = Require.Positive(bodyWidth, nameof(bodyWidth), "body width");
        double M = F * (2 * l - h) / 8;
        return new Stress(6 * M / (t * b * b));
    }

    /// <summary>The share of the in-plane bending moment of a push at mid-span that is left when the band is under tension, 0 to 1.</summary>
    /// <remarks>
    /// tanh(u)/u, u = (l/2) √(T/(E I)), T = σ t b, I = t b³/12. l guide span, m; σ tension on the body, Pa, zero or above; b body width, m; E, Pa.
    /// The thickness falls out. For a push at one point of mid-span between guides that hold the band but do not clamp it.
    /// </remarks>
    /// <source key="timoshenko" where="beam under axial pull with a load at mid-span; from memory"/>
    public static double TensionRelief(Length guideSpan, Stress tension, Length bodyWidth, Stress youngsModulus)
    {
        double l = Require.Positive(guideSpan, nameof(guideSpan), "guide span");
        double sigma = Require.NotNegative(tension, nameof(tension), "tension");
        double b = Require.Positive(bodyWidth, nameof(bodyWidth), "body width");
        double E = Require.Positive(youngsModulus, nameof(youngsModulus), "Young's modulus");
        double u = l / 2 * Math.Sqrt(12 * sigma / (E * b * b));
        return u < 1e-4 ? 1 - u * u / 3 : Math.Tanh(u) / u;
    }
}
