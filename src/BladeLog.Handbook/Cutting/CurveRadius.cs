using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>How tight a blade can turn.</summary>
public static class CurveRadius
{
    /// <summary>R_geo: no tighter curve is possible with this width in this kerf.</summary>
    /// <remarks>R_geo = w²/(8(k − t)) − t/2. w width now, m; k kerf, m; t body, m. The blade lies as a chord across its kerf and touches both walls; from
    /// (R − k/2 + t)² + (w/2)² = (R + k/2)². Zero where the blade can turn on the spot. Needs k &gt; t.</remarks>
    /// <source key="derived" where="chord of the body between the walls of a curved kerf"/>
    public static Length Hard(Length width, Length kerf, Length thickness)
    {
        double w = Require.Positive(width.Metres, "blade width");
        double t = Require.Positive(thickness.Metres, "blade thickness");
        double k = Require.Positive(kerf.Metres, "kerf");
        Require.Positive(k - t, "kerf less the blade thickness");
        return new Length(Math.Max(0, w * w / (8 * (k - t)) - t / 2));
    }

    /// <summary>R_min: the tightest curve that goes without relief cuts.</summary>
    /// <remarks>R_min = a·R_geo, a = 1.45 (range 1.3 to 1.65): the published tables are 1.33 to 1.62 times R_geo.</remarks>
    /// <source key="radius-tables" where="how-to article and machine manuals; the factor fitted here"/>
    public static Length Usual(Length width, Length kerf, Length thickness, double factor = 1.45)
    {
        double a = Require.Within(factor, 1, 10, "The curve factor must lie between 1 and 10.");
        return new Length(a * Hard(width, kerf, thickness).Metres);
    }

    /// <summary>The usual radius where thickness and kerf are not known.</summary>
    /// <remarks>R = 0.583659·w^1.80517, R and w in mm. Fitted to the published tables over 3 to 32 mm, rms 12 %.</remarks>
    /// <source key="radius-tables" where="how-to article and machine manuals; fitted here"/>
    public static Length PowerFit(Length width)
    {
        double w = Require.Positive(width.Millimetres, "blade width");
        return Length.FromMillimetres(0.583659 * Math.Pow(w, 1.80517));
    }

    /// <summary>The widest blade that takes a curve.</summary>
    /// <remarks>w = √(8(k − t)(R/a + t/2)), the inverse of <see cref="Usual"/>; R radius of the cut, m.</remarks>
    /// <source key="derived" where="chord of the body between the walls of a curved kerf, solved for the width"/>
    public static Length WidestBlade(Length radius, Length kerf, Length thickness, double factor = 1.45)
    {
        double R = Require.Positive(radius.Metres, "radius");
        double t = Require.Positive(thickness.Metres, "blade thickness");
        double k = Require.Positive(kerf.Metres, "kerf");
        double a = Require.Within(factor, 1, 10, "The curve factor must lie between 1 and 10.");
        Require.Positive(k - t, "kerf less the blade thickness");
        return new Length(Math.Sqrt(8 * (k - t) * (R / a + t / 2)));
    }

    /// <summary>The radius of a blade that could not yaw at all.</summary>
    /// <remarks>R_tan = w²/(k − t) − (k + t)/4: the body held tangent at the teeth, about 8 times R_geo. Shown only to explain why guides must leave the blade free to yaw.</remarks>
    /// <source key="derived" where="tangent of the body at the teeth"/>
    public static Length RigidlyGuided(Length width, Length kerf, Length thickness)
    {
        double w = Require.Positive(width.Metres, "blade width");
        double t = Require.Positive(thickness.Metres, "blade thickness");
        double k = Require.Positive(kerf.Metres, "kerf");
        Require.Positive(k - t, "kerf less the blade thickness");
        return new Length(w * w / (k - t) - (k + t) / 4);
    }

    /// <summary>How far the body turns out of the line of the cut in a curve.</summary>
    /// <remarks>ψ = asin(w/(2R)). w width, m; R radius, m, at least w/2.</remarks>
    /// <source key="derived" where="half chord over radius"/>
    public static Angle Yaw(Length width, Length radius)
    {
        double w = Require.Positive(width.Metres, "blade width");
        double R = Require.Positive(radius.Metres, "radius");
        Require.Within(R, w / 2, double.MaxValue, "The radius cannot be under half the blade width.");
        return new Angle(Math.Asin(w / (2 * R)));
    }
}
