using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>What follows from speeds and lengths alone.</summary>
public static class Kinematics
{
    /// <summary>How far the wood moves on between one tooth and the next.</summary>
    /// <remarks>c = f·p/v. c bite, m; f feed, m/s; p pitch, m; v band speed, m/s. Exact; the chip's thickness across the tooth's true path is
    /// c·cos(atan(f/v)), less than 0.13 % under c while f/v &lt; 0.05.</remarks>
    /// <source key="derived" where="feed per tooth of a band in straight motion"/>
    public static Length BitePerTooth(Speed feed, Length pitch, Speed bandSpeed)
    {
        double f = Require.NotNegative(feed.MetresPerSecond, "feed");
        double p = Require.Positive(pitch.Metres, "pitch");
        double v = Require.Positive(bandSpeed.MetresPerSecond, "band speed");
        return new Length(f * p / v);
    }

    /// <summary>The feed at which each tooth takes a given bite.</summary>
    /// <remarks>f = c·v/p. Exact; the inverse of <see cref="BitePerTooth"/>.</remarks>
    /// <source key="derived" where="feed per tooth of a band in straight motion"/>
    public static Speed FeedForBite(Length bite, Length pitch, Speed bandSpeed)
    {
        double c = Require.NotNegative(bite.Metres, "bite");
        double p = Require.Positive(pitch.Metres, "pitch");
        double v = Require.Positive(bandSpeed.MetresPerSecond, "band speed");
        return new Speed(c * v / p);
    }

    /// <summary>Teeth in the wood at once, as a mean.</summary>
    /// <remarks>z = H/p; at any moment the count is the whole number below or above. H cut height, m; p pitch, m. Exact.</remarks>
    /// <source key="derived" where="count of teeth over a height"/>
    public static double TeethInCut(Length height, Length pitch)
    {
        double H = Require.Positive(height.Metres, "cut height");
        double p = Require.Positive(pitch.Metres, "pitch");
        return H / p;
    }

    /// <summary>Teeth on the whole loop.</summary>
    /// <remarks>Z = L/p, to the nearest whole tooth. L loop length, m; p pitch, m.</remarks>
    /// <source key="derived" where="count of teeth over a loop"/>
    public static double TeethOnBand(Length loop, Length pitch)
    {
        double L = Require.Positive(loop.Metres, "loop length");
        double p = Require.Positive(pitch.Metres, "pitch");
        return Math.Round(L / p);
    }

    /// <summary>How much wood each tooth goes through while an area is sawn: what wears it.</summary>
    /// <remarks>S = A·v/(f·L). A sawn area of one face, m²; v band speed, m/s; f feed, m/s; L loop, m. Exact. The pitch cancels: slow feed wears
    /// teeth more for the same area, a longer loop less.</remarks>
    /// <source key="derived" where="loops in the cut times cut height"/>
    public static Length WoodPathPerTooth(Area sawn, Speed feed, Length loop, Speed bandSpeed)
    {
        double A = Require.NotNegative(sawn.SquareMetres, "sawn area");
        double f = Require.Positive(feed.MetresPerSecond, "feed");
        double L = Require.Positive(loop.Metres, "loop length");
        double v = Require.Positive(bandSpeed.MetresPerSecond, "band speed");
        return new Length(A * v / (f * L));
    }

    /// <summary>How often the loop goes round during one cut.</summary>
    /// <remarks>N = T·v/L with T = l/f. l cut length, m; f feed, m/s; v band speed, m/s; L loop, m. Exact.</remarks>
    /// <source key="derived" where="cutting time over time of one loop"/>
    public static double LoopsInCut(Length cutLength, Speed feed, Length loop, Speed bandSpeed)
    {
        double l = Require.NotNegative(cutLength.Metres, "cut length");
        double f = Require.Positive(feed.MetresPerSecond, "feed");
        double L = Require.Positive(loop.Metres, "loop length");
        double v = Require.Positive(bandSpeed.MetresPerSecond, "band speed");
        return l / f * v / L;
    }

    /// <summary>The area that a path of wood per tooth stands for.</summary>
    /// <remarks>A = S·f·L/v, the inverse of <see cref="WoodPathPerTooth"/>. Exact.</remarks>
    /// <source key="derived" where="loops in the cut times cut height"/>
    public static Area SawnAreaForPath(Length path, Speed feed, Length loop, Speed bandSpeed)
    {
        double S = Require.NotNegative(path.Metres, "wood path");
        double f = Require.Positive(feed.MetresPerSecond, "feed");
        double L = Require.Positive(loop.Metres, "loop length");
        double v = Require.Positive(bandSpeed.MetresPerSecond, "band speed");
        return new Area(S * f * L / v);
    }

    /// <summary>Wood turned to dust in a second, m³/s.</summary>
    /// <remarks>V̇ = f·H·k. f feed, m/s; H cut height, m; k kerf, m. Exact.</remarks>
    /// <source key="derived" where="volume swept by the kerf"/>
    public static double KerfVolumeRate(Speed feed, Length height, Length kerf)
    {
        double f = Require.NotNegative(feed.MetresPerSecond, "feed");
        double H = Require.Positive(height.Metres, "cut height");
        double k = Require.Positive(kerf.Metres, "kerf");
        return f * H * k;
    }
}
