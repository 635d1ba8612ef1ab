using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>What an edge does with the wood it meets.</summary>
public enum BiteRegime
{
    /// <summary>The edge rides and burnishes: heat, burn marks, very fast wear.</summary>
    NoChip,

    /// <summary>Mostly ploughing; it cuts, hot, and dulls fast.</summary>
    Rubbing,

    /// <summary>A clean chip.</summary>
    Cutting,

    /// <summary>A chip of twice the edge radius or more.</summary>
    Free,
}

/// <summary>The chip a tooth takes over its own edge, and the feeds below which it rubs.</summary>
public static class Bite
{
    /// <summary>Width of cutting edge of one tooth.</summary>
    /// <remarks>w_e = t for set teeth (a bent tooth is as wide as the body), k for swaged and tipped ones. m. Exact as a mean over any set pattern.</remarks>
    /// <source key="derived" where="lanes of a set tooth across the kerf"/>
    public static Length EdgeWidth(CutCase c)
    {
        CutChecks.Refuse(c);
        return c.Tip == TipKind.Set ? c.Thickness : c.Kerf;
    }

    /// <summary>Mean chip thickness over a tooth's own edge.</summary>
    /// <remarks>c_e = c·k/w_e. c bite per tooth, m; k kerf, m; w_e of <see cref="EdgeWidth"/>. For swaged and tipped teeth c_e = c.</remarks>
    /// <source key="derived" where="lanes of a set tooth across the kerf"/>
    public static Length OverEdge(CutCase c, Length bite)
    {
        double w_e = EdgeWidth(c).Metres;
        double k = c.Kerf.Metres;
        return new Length(Require.NotNegative(bite.Metres, "bite") * k / w_e);
    }

    /// <summary>The edge radius the formulas use: that of the case, never under the model's least.</summary>
    /// <remarks>r = max(r, 3 µm): the force model has no data for a keener edge.</remarks>
    /// <source key="engineering-default" where="guard of the force model"/>
    public static Length RadiusUsed(CutCase c)
    {
        CutChecks.Refuse(c);
        return new Length(Math.Max(c.EdgeRadius.Metres, c.Model.LeastRadius.Metres));
    }

    /// <summary>The feed at which the chip over the edge equals the edge radius: the low end of clean cutting.</summary>
    /// <remarks>f_r = r·v·w_e/(p·k). r edge radius, m; v band speed, m/s; w_e edge width, m; p pitch, m; k kerf, m. The test c_e = r is an engineering
    /// default in line with published ploughing studies.</remarks>
    /// <source key="blackman-2012" where="ploughing once the tip radius exceeds the process zone"/>
    public static Speed RubbingFeed(CutCase c)
    {
        double r = RadiusUsed(c).Metres;
        double w_e = EdgeWidth(c).Metres;
        double v = c.BandSpeed.MetresPerSecond, p = c.Pitch.Metres, k = c.Kerf.Metres;
        return new Speed(r * v * w_e / (p * k));
    }

    /// <summary>The feed below which no chip forms at all.</summary>
    /// <remarks>f₀ = λ·f_r, λ = 0.20 by default: least chip over edge radius, 0.13 to 0.20 for friction 0.6 to 0.3 in metals; no ratio for wood was found.</remarks>
    /// <source key="son-2005" where="least chip thickness of a round edge (from memory)"/>
    public static Speed NoChipFeed(CutCase c) => new(c.Model.Lambda * RubbingFeed(c).MetresPerSecond);

    /// <summary>What the edge does at a feed.</summary>
    /// <remarks>No chip: c_e &lt; λr. Rubbing: λr ≤ c_e &lt; r. Cutting: r ≤ c_e &lt; 2r. Free: c_e ≥ 2r.</remarks>
    /// <source key="son-2005" where="least chip thickness of a round edge (from memory); the steps are engineering defaults"/>
    public static BiteRegime RegimeOf(CutCase c, Speed feed)
    {
        double f = Require.NotNegative(feed.MetresPerSecond, "feed");
        // Compared as feeds, so that the edges shown to the user and the regime can never disagree by a rounding.
        double f_r = RubbingFeed(c).MetresPerSecond;
        return f < NoChipFeed(c).MetresPerSecond ? BiteRegime.NoChip
            : f < f_r ? BiteRegime.Rubbing
            : f < 2 * f_r ? BiteRegime.Cutting
            : BiteRegime.Free;
    }

    /// <summary>The least chip a round edge lifts, as a share of its radius.</summary>
    /// <remarks>λ = 1 − cos(π/4 − β/2), β = atan μ. μ friction, dimensionless, 0 to 1.</remarks>
    /// <source key="son-2005" where="least chip thickness of a round edge (from memory)"/>
    public static double LeastChipShare(double friction)
    {
        double beta = Math.Atan(Require.NotNegative(friction, "friction"));
        return 1 - Math.Cos(Math.PI / 4 - beta / 2);
    }

    /// <summary>The rake the chip really meets where it leaves a round edge.</summary>
    /// <remarks>g_e = min(g, asin(c/r − 1)), c chip thickness, m, 0 to any; r edge radius, m; g rake. It is zero at c = r and negative below; from
    /// c = r(1 + sin g) on the ground rake rules.</remarks>
    /// <source key="derived" where="tangent of a circle at the height of the chip"/>
    public static Angle RakeAtEdge(Length chip, Length radius, Angle rake)
    {
        double c = Require.NotNegative(chip.Metres, "chip thickness");
        double r = Require.Positive(radius.Metres, "edge radius");
        double g = rake.Radians;
        return new Angle(c >= r * (1 + Math.Sin(g)) ? g : Math.Asin(c / r - 1));
    }
}
