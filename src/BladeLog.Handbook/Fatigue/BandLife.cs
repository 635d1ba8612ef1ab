using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>How many bends over its wheels a band stands, at its gullets and at its weld.</summary>
public static class BandLife
{
    /// <summary>Searle's number above which the middle of the width is stiffer than a beam by enough to count.</summary>
    private const double WideBand = 15;

    /// <summary>Yield point as a share of tensile strength: an engineering default.</summary>
    private const double YieldShare = 0.9;

    /// <summary>The life of a band on a saw.</summary>
    /// <remarks>
    /// Each wheel bends every point of the band once in a turn of the loop, to the same side: at a site with factors K_ft and K_fb the stress goes
    /// from K_ft σ_T to σ_max = K_ft σ_T + K_fb σ_b and back, so σ_a = K_fb σ_b/2.
    /// σ_ar = min(σ_max, S_y)^(1−γ) σ_a^γ, S_y = 0.9 S_u, then N(σ_ar), and N = n / Σ 1/N_i over the n wheels. At the weld both factors are 1/k_w, the
    /// hardness is 40 HRC at most, and σ_b is multiplied by φ where the body width is known and b²/(R t) is over 15. A cut valley takes
    /// K_ft times its depth off one trough of the gullet's history, which is then counted by rainflow: the greatest bend gets the larger range.
    /// Meant for 10⁴ to 10⁹ bends. Where σ_T + σ_b reaches S_y the band takes a set: computed all the same and said in <see cref="BandLifeResult.TakesSet"/>.
    /// </remarks>
    /// <source key="dowling-2009" where="Walker equation and its exponent"/>
    /// <source key="roessle-fatemi-2000" where="stress-life line from hardness"/>
    /// <source key="haibach" where="slope 2k − 1 beyond the knee"/>
    /// <source key="miner-1945" where="damage summed over unequal wheels; from memory"/>
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
        double[] gulletBending = [.. bending.Select(b => c.GulletBendingFactor * b.Pascals)];
        double gulletTension = c.GulletTensionFactor * running.Pascals;
        double valley = c.GulletTensionFactor * Math.Min(c.CutValley?.Pascals ?? 0, running.Pascals);
        SiteLife gullet = Site(body, History(gulletTension, gulletBending, valley), bendsPerHour);

        double kw = WeldSite.StrengthFactor(c.Weld);
        double[] weldBending = [.. c.Wheels.Select((D, i) => WideFactor(c, D) * bending[i].Pascals / kw)];
        SiteLife weld = Site(SiteMaterial.Of(c, WeldSite.Hrc(c.BodyHrc)), History(running.Pascals / kw, weldBending, 0), bendsPerHour);

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

    private static void Check(BandCase c)
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
        Require.Positive(c.KneeBends, nameof(c.KneeBends), "number of bends at the knee");
    }

    private static double WideFactor(BandCase c, Length wheel) =>
        c.BodyWidth is Length b && BendingStress.SearleNumber(b, c.Thickness, wheel) > WideBand
            ? BendingStress.PlaneStrainFactor(b, c.Thickness, wheel, c.Steel.Poisson)
            : 1;

    /// <summary>Greatest stress and amplitude of each wheel's cycle, in Pa, in the order of the wheels.</summary>
    private static (double Greatest, double Amplitude)[] History(double tension, double[] bending, double valley)
    {
        (double, double)[] cycles = [.. bending.Select(b => (tension + b, b / 2))];
        if (valley == 0)
        {
            return cycles;
        }

        double[] loop = [.. bending.SelectMany((b, i) => new[] { i == 0 ? tension - valley : tension, tension + b })];
        IEnumerable<RainflowCycle> counted = Rainflow.CountLoop(loop)
            .OrderByDescending(c => c.Greatest)
            .ThenByDescending(c => c.Range)
            .SelectMany(c => Enumerable.Repeat(c, (int)c.Count));
        IEnumerable<int> wheels = Enumerable.Range(0, bending.Length).OrderByDescending(i => bending[i]);
        foreach ((RainflowCycle cycle, int wheel) in counted.Zip(wheels))
        {
            cycles[wheel] = (cycle.Greatest, cycle.Range / 2);
        }

        return cycles;
    }

    private static SiteLife Site(SiteMaterial m, (double Greatest, double Amplitude)[] cycles, double bendsPerHour)
    {
        Stress[] equivalent = [.. cycles.Select(c =>
            MeanStress.Walker(new Stress(Math.Max(Math.Min(c.Greatest, m.Yield), c.Amplitude)), new Stress(c.Amplitude), m.WalkerExponent))];
        double perLoop = equivalent.Sum(s => 1 / m.Curve.Cycles(s));
        double bends = equivalent.Length / perLoop;
        return new SiteLife(equivalent, bends, bends / bendsPerHour, bendsPerHour / bends);
    }

    private sealed record SiteMaterial(double Yield, double WalkerExponent, SnCurve Curve)
    {
        public static SiteMaterial Of(BandCase c, double hrc)
        {
            double HB = Hardness.Brinell(hrc);
            Stress Su = Hardness.TensileStrength(HB);
            double Cs = Surface.Factor(c.Finish, Su, c.Rusty);
            SnCurve curve = new(Basquin.RoessleFatemi(HB).WithSurface(Cs, c.KneeBends), c.KneeBends);
            return new SiteMaterial(YieldShare * Su.Pascals, MeanStress.WalkerExponent(Su), curve);
        }
    }
}
