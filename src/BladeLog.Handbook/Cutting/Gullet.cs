using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>Chip room between the teeth.</summary>
public static class Gullet
{
    /// <summary>The share of pitch times depth that is empty.</summary>
    /// <remarks>κ = 0.50 for a triangular tooth over the full pitch; 1/1.75 for hook and other round gullets; 0.75 for a skip tooth that takes half
    /// the pitch. Dimensionless.</remarks>
    /// <source key="gullet-capacity-note" where="capacity = pitch × depth / 1.75 for the round gullet; the others by geometry"/>
    public static double ShapeFactor(ToothForm form) => form switch
    {
        ToothForm.Regular => 0.50,
        ToothForm.Hook => 1 / 1.75,
        ToothForm.Skip => 0.75,
        _ => throw new ArgumentOutOfRangeException(nameof(form), form, "The tooth form must be regular, skip or hook."),
    };

    /// <summary>Area of one gullet, seen from the side.</summary>
    /// <remarks>A_g = κ·p·d. κ of <see cref="ShapeFactor"/>; p pitch, m; d gullet depth, m. A measured area is better.</remarks>
    /// <source key="gullet-capacity-note" where="capacity = pitch × depth / 1.75 for the round gullet; the others by geometry"/>
    public static Area AreaOf(ToothForm form, Length pitch, Length depth)
    {
        double p = Require.Positive(pitch.Metres, "pitch");
        double d = Require.Positive(depth.Metres, "gullet depth");
        return new Area(ShapeFactor(form) * p * d);
    }

    /// <summary>Area of the gullet of a blade in a cut: the measured one if there is one.</summary>
    /// <remarks>A_g measured, else κ·p·d.</remarks>
    /// <source key="gullet-capacity-note" where="capacity = pitch × depth / 1.75 for the round gullet; the others by geometry"/>
    public static Area AreaOf(CutCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        return c.MeasuredGulletArea is { } measured
            ? new Area(Require.Positive(measured.SquareMetres, "gullet area"))
            : AreaOf(c.Form, c.Pitch, c.GulletDepth);
    }

    /// <summary>Gullet depth where the shop has not said.</summary>
    /// <remarks>d = min(0.40 p, w/5) for regular and hook, min(0.25 p, w/5) for skip. p pitch, m; w blade width, m. w/5 is the old workshop rule; the
    /// share of the pitch is an engineering default.</remarks>
    /// <source key="spons" where="filing and setting saws: depth one fifth of the width"/>
    public static Length DefaultDepth(ToothForm form, Length pitch, Length width)
    {
        double p = Require.Positive(pitch.Metres, "pitch");
        double w = Require.Positive(width.Metres, "blade width");
        return new Length(Math.Min((form == ToothForm.Skip ? 0.25 : 0.40) * p, w / 5));
    }

    /// <summary>How full the gullet is when it leaves the wood: solid wood over gullet area.</summary>
    /// <remarks>GFI = c·H/A_g. c bite, m; H cut height, m; A_g gullet area, m². The kerf cancels. Loose dust fills the gullet at 0.33 to 0.40; above
    /// 0.75 a saw wanders, above 1.0 the dust has no room.</remarks>
    /// <source key="gullet-capacity-note" where="gullet feed index"/>
    public static double Fill(Length bite, Length height, Area gullet)
    {
        double c = Require.NotNegative(bite.Metres, "bite");
        double H = Require.Positive(height.Metres, "cut height");
        double A_g = Require.Positive(gullet.SquareMetres, "gullet area");
        return c * H / A_g;
    }

    /// <summary>The feed at which the gullets reach a given fill.</summary>
    /// <remarks>f = φ·v·A_g/(p·H). φ fill, dimensionless; v band speed, m/s; A_g gullet area, m²; p pitch, m; H cut height, m. The inverse of
    /// <see cref="Fill"/>.</remarks>
    /// <source key="gullet-capacity-note" where="gullet feed index, solved for the feed"/>
    public static Speed FeedAtFill(double fill, Length height, Length pitch, Area gullet, Speed bandSpeed)
    {
        double phi = Require.NotNegative(fill, "gullet fill");
        double H = Require.Positive(height.Metres, "cut height");
        double p = Require.Positive(pitch.Metres, "pitch");
        double A_g = Require.Positive(gullet.SquareMetres, "gullet area");
        double v = Require.Positive(bandSpeed.MetresPerSecond, "band speed");
        return new Speed(phi * v * A_g / (p * H));
    }

    /// <summary>The feed at which a blade in a cut reaches a given fill.</summary>
    /// <remarks>f = φ·v·A_g/(p·H), with the blade's own gullet area.</remarks>
    /// <source key="gullet-capacity-note" where="gullet feed index, solved for the feed"/>
    public static Speed FeedAtFill(CutCase c, double fill) =>
        FeedAtFill(fill, c.CutHeight, c.Pitch, AreaOf(c), c.BandSpeed);
}
