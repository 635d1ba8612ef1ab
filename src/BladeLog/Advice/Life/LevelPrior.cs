namespace BladeLog.Advice.Life;

/// <summary>How well the level of life is known: one guess of the spread between kinds of blades.</summary>
public readonly record struct GroupSpread(double Spread, double Weight);

/// <summary>
/// What is known of the shop's level of life: how many handbook lives its blades last (θ, the characteristic life) and
/// how they scatter (β). The handbook alone at first; the shop's own breaks put another in its place.
/// </summary>
public sealed class LevelPrior(double lnLevel, double lnLevelSd, double shape, double lnShapeSd, IReadOnlyList<GroupSpread> groups)
{
    // Nodes of the double integral over level and shape, weight included. Found once for each level.
    private readonly Lazy<(double LnTheta, double Beta, double Weight)[]> nodes = new(() => Nodes(lnLevel, lnLevelSd, shape, lnShapeSd, groups));

    /// <summary>Mean of ln θ.</summary>
    public double LnLevel { get; } = lnLevel;

    /// <summary>Its standard deviation, shop against handbook.</summary>
    public double LnLevelSd { get; } = lnLevelSd;

    /// <summary>Median of β.</summary>
    public double Shape { get; } = shape;

    /// <summary>Standard deviation of ln β.</summary>
    public double LnShapeSd { get; } = lnShapeSd;

    /// <summary>Spread between kinds of blades, weighted.</summary>
    public IReadOnlyList<GroupSpread> Groups { get; } = groups;

    private const double NinetyOfHundred = 1.2815515655446004;

    /// <summary>The handbook's word: medians right within the factor of the settings, used life 1 the median.</summary>
    public static LevelPrior Handbook(AdviceSettings s)
    {
        ArgumentNullException.ThrowIfNull(s);
        double beta0 = s[LifeSettings.Shape];
        GroupSpread[] groups =
        [
            new(s[LifeSettings.Spread1], s[LifeSettings.Weight1]), new(s[LifeSettings.Spread2], s[LifeSettings.Weight2]),
            new(s[LifeSettings.Spread3], s[LifeSettings.Weight3]), new(s[LifeSettings.Spread4], s[LifeSettings.Weight4]),
        ];
        double sum = groups.Sum(g => g.Weight);
        return new LevelPrior(
            -Math.Log(Math.Log(2)) / beta0, Math.Log(s[LifeSettings.Trust]), beta0, s[LifeSettings.ShapeSpread],
            [.. groups.Select(g => g with { Weight = g.Weight / sum })]);
    }

    /// <summary>Factor by which used life is divided and multiplied for the band that holds 80 of 100.</summary>
    public double BandFactor => Math.Exp(NinetyOfHundred * Math.Sqrt((LnLevelSd * LnLevelSd) + Groups.Sum(g => g.Weight * g.Spread * g.Spread)));

    /// <summary>Chance that a blade known to be whole at used life U breaks before U + ΔU.</summary>
    /// <remarks>1 − E[exp(−((U+ΔU)/θ)^β)]/E[exp(−(U/θ)^β)], over ln θ and ln β; summed as differences, so that small chances keep their digits.</remarks>
    public double BreakChance(double used, double more)
    {
        if (!(used >= 0) || !(more >= 0))
        {
            throw new ArgumentOutOfRangeException(nameof(used), "Used life must be zero or above.");
        }

        if (more == 0)
        {
            return 0;
        }

        double lnU = Math.Log(used), lnV = Math.Log(used + more), whole = 0, breaking = 0;
        foreach ((double lnTheta, double beta, double weight) in nodes.Value)
        {
            double a = Math.Exp(beta * (lnU - lnTheta)), b = Math.Exp(beta * (lnV - lnTheta));
            double survives = weight * Math.Exp(-a);
            whole += survives;
            breaking += survives * LessExp(b - a);
        }

        return whole > 0 ? Math.Min(1, breaking / whole) : 1;
    }

    /// <summary>1 − e^−x without loss for small x.</summary>
    private static double LessExp(double x) => x < 1e-5 ? x * (1 - (x / 2)) : 1 - Math.Exp(-x);

    private static (double LnTheta, double Beta, double Weight)[] Nodes(double mean, double sd, double shape, double shapeSd, IReadOnlyList<GroupSpread> groups)
    {
        // The trapezoid rule on a smooth density that dies off at both ends converges faster than any power of the step.
        double[] spreads = [.. groups.Select(g => Math.Sqrt((sd * sd) + (g.Spread * g.Spread)))];
        double reach = 8 * spreads.Max(), step = Math.Min(0.3, 0.3 * spreads.Min());
        int m = (int)Math.Ceiling(reach / step);
        const double ShapeStep = 0.75;
        List<(double, double, double)> nodes = [];
        for (int j = -7; j <= 7; j++)
        {
            double y = j * ShapeStep, beta = shape * Math.Exp(shapeSd * y), wy = ShapeStep * Math.Exp(-y * y / 2) / Math.Sqrt(2 * Math.PI);
            for (int i = -m; i <= m; i++)
            {
                double d = i * step, density = 0;
                for (int k = 0; k < spreads.Length; k++)
                {
                    double x = d / spreads[k];
                    density += groups[k].Weight * Math.Exp(-x * x / 2) / (spreads[k] * Math.Sqrt(2 * Math.PI));
                }

                double weight = wy * step * density;
                if (weight > 1e-15)
                {
                    nodes.Add((mean + d, beta, weight));
                }
            }
        }

        return [.. nodes];
    }
}
