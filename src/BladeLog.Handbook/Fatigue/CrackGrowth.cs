using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;
using MathNet.Numerics.Integration;

namespace BladeLog.Handbook.Fatigue;

/// <summary>
/// How fast a crack in a gullet runs across the body. It is shown as the reason why a crack is a hold, and for nothing else:
/// it is never a life figure for a blade of the shop, whose crack is longer, sharper or not alone.
/// </summary>
public static class CrackGrowth
{
    /// <summary>The body share at which nothing is left to hold the pull.</summary>
    private const double Through = 0.98;

    /// <summary>The stress intensity of an edge crack in the body, per unit of stress and √(π a).</summary>
    /// <remarks>
    /// F = min(1.12 − 0.231 x + 10.55 x² − 21.72 x³ + 30.39 x⁴, 1.12/(1 − x)), x = a/b. a crack length, m; b body width, m; x under 1, else it throws.
    /// The first form holds for a strip free to bend to the crack (x to 0.6); the second for a band that its own pull keeps straight.
    /// </remarks>
    /// <source key="tada" where="single edge crack under tension; from memory"/>
    /// <source key="engineering-default" where="1.12/(1 − x) for a band kept straight by its tension"/>
    public static double Geometry(Length crack, Length bodyWidth)
    {
        double a = Require.NotNegative(crack.Metres, nameof(crack), "crack length");
        double b = Require.Positive(bodyWidth, nameof(bodyWidth), "body width");
        return a < b ? Shape(a / b) : throw new ArgumentOutOfRangeException(nameof(crack), a, "The crack must be shorter than the body is wide.");
    }

    /// <summary>The stress intensity of an edge crack in the body.</summary>
    /// <remarks>K = F σ √(π a). σ stress across the crack, Pa, zero or above; F by <see cref="Geometry"/>; a crack length, m. Elastic.</remarks>
    /// <source key="tada" where="definition of the stress intensity factor; from memory"/>
    public static StressIntensity Intensity(Stress across, Length crack, Length bodyWidth)
    {
        double sigma = Require.NotNegative(across, nameof(across), "stress across the crack");
        double F = Geometry(crack, bodyWidth);
        return new StressIntensity(F * sigma * Math.Sqrt(Math.PI * crack.Metres));
    }

    /// <summary>The constants of crack growth of a steel: growth in metres for each bend is C ΔK^m, ΔK in MPa√m.</summary>
    /// <remarks>Martensitic (hardened and tempered band): C = 1.36·10⁻¹⁰, m = 2.25. Ferritic-pearlitic: C = 6.9·10⁻¹², m = 3. Upper bounds of scatter, room air.</remarks>
    /// <source key="barsom-rolfe" where="crack growth of martensitic and of ferrite-pearlite steels; from memory, units changed from inch and ksi"/>
    public static (double C, double M) Paris(CrackSteel steel) => steel switch
    {
        CrackSteel.Martensitic => (1.36e-10, 2.25),
        CrackSteel.FerriticPearlitic => (6.9e-12, 3),
        _ => throw new ArgumentOutOfRangeException(nameof(steel), steel, "The band is martensitic or ferritic-pearlitic."),
    };

    /// <summary>The running left to a short crack if the body were endlessly wide: a check of the integration, in closed form.</summary>
    /// <remarks>
    /// N = (a_c^(1−m/2) − a₀^(1−m/2)) / ((1 − m/2) C (1.12 φ σ_b √π)^m), a_c = (K_c/(1.12 (σ_T + φ σ_b)))²/π. One wheel size; symbols as for <see cref="Run"/>.
    /// None where a₀ is at a_c already. The threshold is left out.
    /// </remarks>
    /// <source key="derived" where="Paris's law integrated with a constant geometry factor of 1.12"/>
    public static double ShortCrackBends(CrackCase c, Length firstLength)
    {
        Check(c, firstLength);
        (double C, double m) = Paris(c.Material);
        double bending = c.ThroughShare * c.Bending.Max(s => s.Pascals), greatest = c.RunningTension.Pascals + bending;
        double a0 = firstLength.Metres, ac = Math.Pow(c.Toughness.PascalRootMetres / (1.12 * greatest), 2) / Math.PI, power = 1 - m / 2;
        double rate = C * Math.Pow(1.12 * bending * 1e-6 * Math.Sqrt(Math.PI), m);
        return a0 >= ac ? 0 : (Math.Pow(ac, power) - Math.Pow(a0, power)) / (power * rate);
    }

    /// <summary>How long a crack of a length would run until the band parts.</summary>
    /// <remarks>
    /// da/dN = C ΔK^m for each bend with ΔK = F φ σ_b √(π a) over the threshold, summed over the wheels, from a₀ to the length at which
    /// K_max = F (σ_T + φ σ_b) √(π a) on the smallest wheel reaches K_c, or at which 98 of 100 of the body are cracked through. By Simpson's rule in ln a.
    /// a₀ first length, m, above zero and under the body width; φ share of the bending stress that works through the thickness, above 0 up to 1.
    /// A crack whose ΔK lies under the threshold on every wheel does not run in dry air; the result says so.
    /// </remarks>
    /// <source key="barsom-rolfe" where="constants; from memory. Published measurements on blade steel exist but their figures could not be read"/>
    /// <source key="engineering-default" where="K_c 60 and threshold 3 MPa√m assumed, φ 1 as the safe side"/>
    public static CrackRun Run(CrackCase c, Length firstLength)
    {
        Check(c, firstLength);
        (double C, double m) = Paris(c.Material);
        double b = c.BodyWidth.Metres, a0 = firstLength.Metres;
        double[] bending = [.. c.Bending.Select(s => c.ThroughShare * s.Pascals)];
        double greatest = c.RunningTension.Pascals + bending.Max();
        double Range(double a, double sigma) => Shape(a / b) * sigma * Math.Sqrt(Math.PI * a);
        double first = Range(a0, bending.Max());

        double ac = LengthWhere(a => Range(a, greatest) >= c.Toughness.PascalRootMetres, Through * b);
        if (a0 >= ac)
        {
            return Result(c, firstLength, a0, first, 0, CrackEnd.AtOnce);
        }

        if (first <= c.Threshold.PascalRootMetres)
        {
            return Result(c, firstLength, a0, first, double.PositiveInfinity, CrackEnd.DoesNotRun);
        }

        double PerLoop(double a) => bending.Select(sigma => Range(a, sigma)).Where(dK => dK > c.Threshold.PascalRootMetres).Sum(dK => C * Math.Pow(dK * 1e-6, m));
        double loops = SimpsonRule.IntegrateComposite(x => Math.Exp(x) / PerLoop(Math.Exp(x)), Math.Log(a0), Math.Log(ac), 2000);
        return Result(c, firstLength, ac, first, loops * bending.Length, ac < Through * b ? CrackEnd.Parts : CrackEnd.Slack);
    }

    private static double Shape(double x) =>
        Math.Min(1.12 + x * (-0.231 + x * (10.55 + x * (-21.72 + x * 30.39))), 1.12 / (1 - x));

    private static double LengthWhere(Func<double, bool> reached, double longest)
    {
        if (!reached(longest))
        {
            return longest;
        }

        double low = 0, high = longest;
        while (high - low > 1e-13 * high)
        {
            double middle = (low + high) / 2;
            (low, high) = reached(middle) ? (low, middle) : (middle, high);
        }

        return high;
    }

    private static CrackRun Result(CrackCase c, Length from, double to, double first, double bends, CrackEnd end) =>
        new(from, new Length(to), new StressIntensity(first), bends, bends / LoopCycles.BendsPerHour(c.Bending.Count, c.BandSpeed, c.Loop) * 60, end, Assumptions(c));

    private static List<string> Assumptions(CrackCase c)
    {
        List<string> said =
        [
            "One straight crack from a gullet into the body, across the pull, sharp from the start.",
            c.Material == CrackSteel.Martensitic
                ? "Growth as of hardened and tempered steel in dry air, from memory; sap and rust make it faster."
                : "Growth as of unhardened steel in dry air, from memory; sap and rust make it faster.",
            FormattableString.Invariant($"The band parts at a stress intensity of {c.Toughness.MegapascalRootMetres:0.#} MPa√m: assumed."),
            FormattableString.Invariant($"Under {c.Threshold.MegapascalRootMetres:0.#} MPa√m a crack does not run: assumed."),
            c.ThroughShare == 1
                ? "The bending stress of the face is taken right through the thickness: the safe side."
                : FormattableString.Invariant($"{100 * c.ThroughShare:0} of 100 of the bending stress of the face are taken through the thickness: assumed."),
            "The thrust of the cut, heat and blows are left out: each would make it shorter.",
            "This is why a cracked blade comes off at once. It is not a time to go on sawing.",
        ];
        return said;
    }

    private static void Check(CrackCase c, Length firstLength)
    {
        ArgumentNullException.ThrowIfNull(c);
        if (c.Bending.Count == 0)
        {
            throw new ArgumentOutOfRangeException(nameof(c), "The band must run over at least one wheel.");
        }

        foreach (Stress bending in c.Bending)
        {
            Require.Positive(bending, nameof(c.Bending), "bending stress");
        }

        double b = Require.Positive(c.BodyWidth, nameof(c.BodyWidth), "body width");
        double a0 = Require.Positive(firstLength, nameof(firstLength), "crack length");
        Require.NotNegative(c.RunningTension, nameof(c.RunningTension), "tension");
        Require.Positive(c.BandSpeed, nameof(c.BandSpeed), "band speed");
        Require.Positive(c.ThroughShare, nameof(c.ThroughShare), "share of the bending stress");
        Require.Between(c.ThroughShare, 0, 1, nameof(c.ThroughShare), "share of the bending stress");
        Require.Positive(c.Toughness.PascalRootMetres, nameof(c.Toughness), "stress intensity at which the band parts");
        Require.NotNegative(c.Threshold.PascalRootMetres, nameof(c.Threshold), "threshold");
        if (a0 >= b)
        {
            throw new ArgumentOutOfRangeException(nameof(firstLength), a0, "The crack must be shorter than the body is wide.");
        }
    }
}
