using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>A mode of the running band that the teeth pass a little faster than it swings.</summary>
/// <param name="Mode">Number of half-waves between the guides.</param>
/// <param name="Twisting">True for twist, false for sideways movement.</param>
/// <param name="Frequency">Of the running band.</param>
/// <param name="Above">How far the tooth-passing frequency lies above it, as a share of it.</param>
public sealed record WashboardMode(int Mode, bool Twisting, Frequency Frequency, double Above);

/// <summary>Where a washboard on the cut face may come from. An advisory: almost every setting lies near some high mode, so it never stops a cut.</summary>
public static class Washboard
{
    /// <summary>Most half-waves that are looked at.</summary>
    public const int MostModes = 8;

    /// <summary>Gives how many teeth pass a point of the wood in a second.</summary>
    /// <param name="bandSpeed">Speed of the band.</param>
    /// <param name="pitch">Tooth to tooth; for a variable pitch its mean, where the passing is spread and a washboard less likely.</param>
    /// <remarks>f_t = v/p. v m/s, p m, above zero each.</remarks>
    /// <source key="derived" where="speed over pitch"/>
    public static Frequency ToothPassing(Speed bandSpeed, Length pitch)
    {
        double v = Positive(bandSpeed.MetresPerSecond, nameof(bandSpeed), "The band speed");
        double p = Positive(pitch.Metres, nameof(pitch), "The pitch");
        return new Frequency(v / p);
    }

    /// <summary>Gives the modes that may swing up: those a little below the tooth-passing frequency, the nearest first.</summary>
    /// <param name="b">The band and its cut, with its speed.</param>
    /// <param name="pitch">Tooth to tooth.</param>
    /// <remarks>
    /// 0 &lt; (f_t − f_n)/f_n &lt; 0.05, n = 1 to 8, sideways and twisting, f_n by <see cref="BandFrequency"/> without thrust. What to do about one: change the speed
    /// by 5 to 10 %, change the span, or take a band of variable pitch. That the band swings of itself only above its own frequency is published;
    /// the width of the strip is not. Speed from above zero.
    /// </remarks>
    /// <source key="from-memory" where="tooth passing a few per cent above a natural frequency: Lehmann and Hutton 1997, Okai and others 1996; from memory"/>
    /// <source key="engineering-default" where="5 % and 8 half-waves"/>
    public static IReadOnlyList<WashboardMode> Possible(GuidedBand b, Length pitch)
    {
        ArgumentNullException.ThrowIfNull(b);
        double f_t = ToothPassing(b.BandSpeed, pitch).Hertz;
        List<WashboardMode> modes = [];
        for (int n = 1; n <= MostModes; n++)
        {
            foreach (bool twisting in new[] { false, true })
            {
                Frequency f_n = twisting ? BandFrequency.Torsional(b, n) : BandFrequency.Lateral(b, n);
                double above = (f_t - f_n.Hertz) / f_n.Hertz;
                if (above is > 0 and < 0.05)
                {
                    modes.Add(new WashboardMode(n, twisting, f_n, above));
                }
            }
        }

        return [.. modes.OrderBy(m => m.Above)];
    }

    /// <summary>Gives the length of the pattern along the band's path on the cut face.</summary>
    /// <param name="bandSpeed">Speed of the band.</param>
    /// <param name="swing">Frequency at which the band swings.</param>
    /// <remarks>λ = v/f_b. v m/s, f_b Hz, above zero each. It can be checked on the board, as can the length along the feed.</remarks>
    /// <source key="derived" where="kinematics of a swinging tooth row"/>
    public static Length AlongBand(Speed bandSpeed, Frequency swing)
    {
        double v = Positive(bandSpeed.MetresPerSecond, nameof(bandSpeed), "The band speed");
        double f_b = Positive(swing.Hertz, nameof(swing), "The frequency of the band");
        return new Length(v / f_b);
    }

    /// <summary>Gives the length of the pattern along the feed; without limit where every tooth meets the band in the same place of its swing.</summary>
    /// <param name="bite">Feed for each tooth.</param>
    /// <param name="swing">Frequency at which the band swings.</param>
    /// <param name="toothPassing">Teeth that pass in a second.</param>
    /// <remarks>λ = f_z/|1 − f_b/f_t|. f_z bite m, f_b, f_t Hz, above zero each. Near one swing for each tooth; for one near k swings a tooth take f_b/k.</remarks>
    /// <source key="derived" where="shift of the swing from tooth to tooth"/>
    public static Length AlongFeed(Length bite, Frequency swing, Frequency toothPassing)
    {
        double f_z = Positive(bite.Metres, nameof(bite), "The bite");
        double f_b = Positive(swing.Hertz, nameof(swing), "The frequency of the band");
        double f_t = Positive(toothPassing.Hertz, nameof(toothPassing), "The tooth-passing frequency");
        return new Length(f_z / Math.Abs(1 - (f_b / f_t)));
    }

    private static double Positive(double value, string name, string what)
    {
        BandSection.Refuse(!(value > 0 && double.IsFinite(value)), name, what + " must be greater than zero.");
        return value;
    }
}
