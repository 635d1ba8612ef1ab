using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Band;

/// <summary>The stress a band takes from lying on a wheel.</summary>
public static class BendingStress
{
    /// <summary>The bending stress in the outer face of a band that lies on a wheel.</summary>
    /// <remarks>
    /// σ_b = E t / (D + t). t band thickness, m; D diameter the band really lies on, m, with the tyre (two tyre thicknesses); E, Pa.
    /// Exact for an elastic strip whose inner face has the radius D/2. Linear only while σ_T + σ_b stays under the yield
    /// point of the band: above it the band takes a set, and this is the stress an elastic band would have had.
    /// </remarks>
    /// <source key="derived" where="strain (t/2)/((D + t)/2) at the outer face"/>
    public static Stress OverWheel(Length bandThickness, Length wheelDiameter, Stress youngsModulus)
    {
        double t = Require.Positive(bandThickness, nameof(bandThickness), "band thickness");
        double D = Require.Positive(wheelDiameter, nameof(wheelDiameter), "wheel diameter");
        double E = Require.Positive(youngsModulus, nameof(youngsModulus), "Young's modulus");
        return new Stress(E * t / (D + t));
    }

    /// <summary>Searle's number: how far the wheel keeps a wide band from curving across its width.</summary>
    /// <remarks>
    /// S = b² / (R t), R = D/2. b width of the body, m; t, m; D, m. Under 2 the band bends as a narrow beam, over 100 as a wide plate,
    /// between them lies the transition of <see cref="PlaneStrainFactor"/>.
    /// </remarks>
    /// <source key="ashwell-1950" where="whole paper: the strip as a beam on an elastic foundation across its width"/>
    public static double SearleNumber(Length bandWidth, Length bandThickness, Length wheelDiameter)
    {
        double b = Require.Positive(bandWidth, nameof(bandWidth), "band width");
        double t = Require.Positive(bandThickness, nameof(bandThickness), "band thickness");
        double R = Require.Positive(wheelDiameter, nameof(wheelDiameter), "wheel diameter") / 2;
        return b * b / (R * t);
    }

    /// <summary>How much stiffer a wide band bends over its wheel than a narrow beam of the same section, 1 to 1/(1 − ν²).</summary>
    /// <remarks>
    /// φ = (1 − ν² F) / (1 − ν²), F = (2/x)(cosh x − cos x)/(sinh x + sin x), x = b [3(1 − ν²)]^¼ / √(R t), R = D/2.
    /// b width of the body, m; t, m; D, m; ν Poisson's ratio, 0 to 0.5. Holds for the middle of the width; at a gullet edge, which
    /// is free, the factor is 1. Under x = 0.001 F is 1 and above x = 40 it is 2/x, both to the last digit.
    /// </remarks>
    /// <source key="ashwell-1950" where="strip equation, averaged over the width"/>
    public static double PlaneStrainFactor(Length bandWidth, Length bandThickness, Length wheelDiameter, double poisson)
    {
        double S = SearleNumber(bandWidth, bandThickness, wheelDiameter);
        double nu = Require.Poisson(poisson);
        double x = Math.Sqrt(S) * Math.Pow(3 * (1 - nu * nu), 0.25);
        double F = x switch
        {
            < 1e-3 => 1,
            > 40 => 2 / x,
            _ => 2 / x * (Math.Cosh(x) - Math.Cos(x)) / (Math.Sinh(x) + Math.Sin(x)),
        };
        return (1 - nu * nu * F) / (1 - nu * nu);
    }
}
