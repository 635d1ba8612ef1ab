using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>How many bends over its wheels a band stands, at its gullets and at its weld.</summary>
public static class BandLife
{
    /// <summary>Searle's number above which the middle of the width is stiffer than a beam by enough to count.</summary>
    private const double WideBand = 15;

    /// <summary>The life of a band on a saw.</summary>
    /// <remarks>
    /// Each wheel bends every point of the band once in a turn of the loop, to the same side: at a site with factors K_ft and K_fb the stress goes
    /// from K_ft σ_T to σ_max = K_ft σ_T + K_fb σ_b and back, so σ_a = K_fb σ_b/2.
    /// σ_ar = min(σ_max, S_y)^(1−γ) σ_a^γ, S_y = 0.9 S_u, then N(σ_ar), and N = n / Σ 1/N_i over the n wheels. At the weld both factors are 1/k_w, the
    /// hardness is 40 HRC at most, and σ_b is multiplied by φ where the body width is known and b²/(R t) is over 15. A cut valley takes
    /// K_ft times its depth off one trough of the gullet's history, unequal spans lift or lower theirs, a twist adds K_ft times its pull; the turn is then
    /// counted by rainflow (the greatest bend gets the largest range), and N = n / Σ 1/N_i over all its cycles. A known gullet gives K_ft and K_fb.
    /// Meant for 10⁴ to 10⁹ bends. Where σ_T + σ_b reaches S_y the band takes a set: computed all the same and said in <see cref="BandLifeResult.TakesSet"/>.
    /// </remarks>
    /// <source key="dowling-2009" where="Walker equation and its exponent"/>
    /// <source key="roessle-fatemi-2000" where="stress-life line from hardness"/>
    /// <source key="haibach" where="slope 2k − 1 beyond the knee"/>
    /// <source key="miner-1945" where="damage summed over unequal wheels; from memory"/>
    /// <source key="astm-e1049" where="section 5.4.5, turn of the loop with a cut valley, unequal spans or twist"/>
    public static BandLifeResult Of(BandCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        Check(c);
        int n = c.Wheels.Count;
        double support = Band.Tension.Support(c.System);
        Stress running = Band.Tension.Running(c.Tension, support, c.Steel.Density, c.BandSpeed);
        Stress[] bending = [.. c.Wheels.Select(D => BendingStress.OverWheel(c.Thickness, D, c.Steel.YoungsModulus))];
        double bendsPerHour = LoopCycles.BendsPerHour(n, c.BandSpeed, c.Loop);

        SiteMaterial body = SiteMaterial.Of(c, c.BodyHrc);
        SiteLife gullet = Site(body, LoopHistory.Gullet(c, running, bending, outer: true).Cycles(), bendsPerHour);

        double kw = WeldSite.StrengthFactor(c.Weld);
        double[] weldBending = [.. c.Wheels.Select((D, i) => WideFactor(c, D) * bending[i].Pascals / kw)];
        double[] weldSpans = [.. LoopHistory.Spans(c, running).Select(s => s / kw)];
        SiteLife weld = Site(SiteMaterial.Of(c, WeldSite.Hrc(c.BodyHrc)), new LoopHistory(weldSpans, weldBending, 0, []).Cycles(), bendsPerHour);

        double median = Miner.SystemMedian(gullet.MedianBends, weld.MedianBends, c.WeibullShape);
        return new BandLifeResult(
            bending,
            running,
            bendsPerHour,
            gullet,
            weld,
            median,
            median / bendsPerHour,
            median * Miner.TenthPercentileFactor(c.WeibullShape),
            Verdict(median))
        {
            TakesSet = running.Pascals + bending.Max(b => b.Pascals) >= body.Yield,
        };
    }

    /// <summary>The rung of the ladder for a blade's median bends.</summary>
    /// <remarks>Unsuitable under 10⁴; marginal to under 5·10⁵; finite to 10⁸; not limiting above.</remarks>
    /// <source key="engineering-default" where="one ladder for the whole program"/>
    public static LifeVerdict Verdict(double medianBends) => medianBends switch
    {
        double.NaN or < 0 => throw new ArgumentOutOfRangeException(nameof(medianBends), medianBends, "The median bends must be zero or above."),
        < 1e4 => LifeVerdict.Unsuitable,
        < 5e5 => LifeVerdict.Marginal,
        <= 1e8 => LifeVerdict.Finite,
        _ => LifeVerdict.NotLimiting,
    };

    internal static void Check(BandCase c)
    {
        if (c.Wheels.Count == 0)
        {
            throw new ArgumentOutOfRangeException(nameof(c), "The band must run over at least one wheel.");
        }

        Require.Positive(c.BandSpeed, nameof(c.BandSpeed), "band speed");
        Require.NotNegative(c.Tension, nameof(c.Tension), "tension");
        Require.Between(c.GulletTensionFactor, 1, 10, nameof(c.GulletTensionFactor), "gullet's factor on tension");
        Require.Between(c.GulletBendingFactor, 1, 10, nameof(c.GulletBendingFactor), "gullet's factor on bending");
        Require.NotNegative(c.CutValley ?? default, nameof(c.CutValley), "valley of the cut");
        if (c.SpanOffsets is { } spans && spans.Count != c.Wheels.Count)
        {
            throw new ArgumentOutOfRangeException(nameof(c), "There must be one span for each wheel.");
        }

        foreach (Stress pull in c.TwistPulls)
        {
            Require.NotNegative(pull, nameof(c.TwistPulls), "pull at the edge from twist");
        }

        Require.Positive(c.KneeBends, nameof(c.KneeBends), "number of bends at the knee");
    }

    private static double WideFactor(BandCase c, Length wheel) =>
        c.BodyWidth is Length b && BendingStress.SearleNumber(b, c.Thickness, wheel) > WideBand
            ? BendingStress.PlaneStrainFactor(b, c.Thickness, wheel, c.Steel.Poisson)
            : 1;

    private static SiteLife Site(SiteMaterial m, (StressCycle[] Wheels, StressCycle[] Beside) turn, double bendsPerHour)
    {
        Stress[] equivalent = [.. turn.Wheels.Select(m.Equivalent)];
        Stress[] beside = [.. turn.Beside.Select(m.Equivalent)];
        double perLoop = equivalent.Concat(beside).Sum(s => 1 / m.Curve.Cycles(s));
        double bends = equivalent.Length / perLoop;
        return new SiteLife(equivalent, bends, bends / bendsPerHour, bendsPerHour / bends) { Beside = beside };
    }
}
