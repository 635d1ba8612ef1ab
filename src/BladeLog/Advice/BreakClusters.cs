using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>What one blade did on the saw it broke on or ran most on.</summary>
/// <param name="Tag">The blade.</param>
/// <param name="SawId">The saw.</param>
/// <param name="ThicknessToWheel">Its body over the smallest wheel there.</param>
/// <param name="FromHours">Hours it had run when it came under watch: above zero where it was cut from another blade.</param>
/// <param name="Hours">Hours run, or run until it broke.</param>
/// <param name="Broke">It broke; otherwise it was whole at those hours.</param>
public sealed record WatchedBlade(string Tag, int SawId, double ThicknessToWheel, double FromHours, double Hours, bool Broke);

/// <summary>Breaks on one saw with one thickness to wheel that are more, and earlier, than chance deals out.</summary>
/// <param name="SawId">The saw.</param>
/// <param name="OneOver">Wheel over thickness, whole: 323 for 1/323.</param>
/// <param name="Blades">Blades that ran so.</param>
/// <param name="Broken">Those that broke, the first to go first.</param>
/// <param name="BreaksOnSaw">All breaks on that saw.</param>
/// <param name="Expected">Breaks such hours would have brought in this shop as a whole.</param>
/// <param name="Chance">Chance that re-shuffled breaks show a group at least as striking anywhere in the shop.</param>
public sealed record BreakCluster(int SawId, int OneOver, int Blades, IReadOnlyList<WatchedBlade> Broken, int BreaksOnSaw, double Expected, double Chance)
{
    public double LongestHours => Broken[^1].Hours;

    /// <summary>The tenth of an hour they all stayed under.</summary>
    public double UnderHours => (Math.Floor((LongestHours * 10) + 1e-9) + 1) / 10;
}

/// <summary>
/// Do breaks gather on one saw and one thickness to wheel? Every blade scores its break, 1 or 0, less the breaks its hours
/// would bring if all blades of the shop were alike (log-rank scores of the Nelson-Aalen sum); a group's sum is held
/// against the same sum of re-shuffled scores. The greatest of all groups is taken in each shuffle, so that many groups
/// do not make a false alarm likelier.
/// </summary>
public static class BreakClusters
{
    /// <summary>Fewer breaks are not called a cluster.</summary>
    public const int LeastBreaks = 3;

    /// <summary>A group is told where chance alone would show one in fewer shops than this share.</summary>
    public const double Alpha = 0.01;

    public const int Shuffles = 4999;

    /// <summary>The blades that can be counted: run, and of known history.</summary>
    public static IReadOnlyList<WatchedBlade> Watched(IEnumerable<BladeAdvice> blades, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(blades);
        ArgumentNullException.ThrowIfNull(settings);
        List<WatchedBlade> watched = [];
        foreach (BladeAdvice blade in blades.Where(b => b.File.PriorUse is null))
        {
            ExposureLine[] own = [.. blade.File.Exposures.Where(e => !e.OfAncestor && e.RunningMs > 0)];
            if (own.Length == 0)
            {
                continue;
            }

            int saw = blade.File.Break?.SawId is { } broke && own.Any(e => e.Setup.SawId == broke)
                ? broke
                : own.GroupBy(e => e.Setup.SawId).MaxBy(g => g.Sum(e => e.RunningMs))!.Key;
            double before = blade.File.Exposures.Where(e => e.OfAncestor).Sum(e => e.Hours);
            double wheel = own.Last(e => e.Setup.SawId == saw).Setup.Wheels.Min(w => w.DiameterM);
            watched.Add(new WatchedBlade(
                blade.File.Blade.Tag, saw, blade.Body.Thickness.Value / wheel, before, before + own.Sum(e => e.Hours), Failed(blade.File)));
        }

        return watched;
    }

    /// <summary>It broke, or a look found its crack first: both are failures. A blade scrapped for anything else only stopped being watched.</summary>
    public static bool Failed(BladeFile file) => file.Break is not null || file.Retirement?.Reason is RetireReason.Crack or RetireReason.Broke;

    /// <summary>The clusters, the least likely by chance first.</summary>
    public static IReadOnlyList<BreakCluster> Find(IReadOnlyList<WatchedBlade> blades, int shuffles = Shuffles, int seed = 1)
    {
        ArgumentNullException.ThrowIfNull(blades);
        ArgumentOutOfRangeException.ThrowIfLessThan(shuffles, 99);
        if (blades.Count(b => b.Broke) < LeastBreaks)
        {
            return [];
        }

        double[] expected = Expected(blades);
        var all = new Groups(blades, expected);
        double[] seen = all.Strength([.. Enumerable.Range(0, blades.Count)]);
        int[] asStrong = new int[seen.Length], order = [.. Enumerable.Range(0, blades.Count)];
        var random = new Random(seed);
        for (int i = 0; i < shuffles; i++)
        {
            random.Shuffle(order);
            double greatest = all.Strength(order).Max();
            for (int g = 0; g < seen.Length; g++)
            {
                asStrong[g] += greatest >= seen[g] - 1e-12 ? 1 : 0;
            }
        }

        return
        [
            .. Enumerable.Range(0, seen.Length)
                .Where(g => seen[g] > double.NegativeInfinity)
                .Select(g => all.Told(g, (1.0 + asStrong[g]) / (shuffles + 1)))
                .Where(c => c.Chance < Alpha)
                .OrderBy(c => c.Chance),
        ];
    }

    /// <summary>Breaks each blade's hours would have brought at the shop's common rate: the Nelson-Aalen sum over its hours.</summary>
    public static double[] Expected(IReadOnlyList<WatchedBlade> blades)
    {
        ArgumentNullException.ThrowIfNull(blades);
        double[] expected = new double[blades.Count];
        foreach (var at in blades.Where(b => b.Broke).GroupBy(b => b.Hours))
        {
            int[] atRisk = [.. Enumerable.Range(0, blades.Count).Where(i => blades[i].FromHours < at.Key && at.Key <= blades[i].Hours)];
            foreach (int i in atRisk)
            {
                expected[i] += (double)at.Count() / atRisk.Length;
            }
        }

        return expected;
    }

    private sealed class Groups
    {
        private readonly IReadOnlyList<WatchedBlade> blades;
        private readonly double[] expected;
        private readonly double[] scores;
        private readonly (int SawId, int OneOver)[] keys;
        private readonly int[] of;
        private readonly int[] size;
        private readonly double[] spread;

        public Groups(IReadOnlyList<WatchedBlade> blades, double[] expected)
        {
            this.blades = blades;
            this.expected = expected;
            scores = [.. blades.Select((b, i) => (b.Broke ? 1 : 0) - expected[i])];
            (int, int)[] each = [.. blades.Select(b => (b.SawId, (int)Math.Round(1 / b.ThicknessToWheel)))];
            keys = [.. each.Distinct()];
            of = [.. each.Select(k => Array.IndexOf(keys, k))];
            size = [.. keys.Select((_, g) => of.Count(o => o == g))];
            // Variance of a sum of so many of the scores, drawn without putting back; the scores sum to zero.
            double n = blades.Count, square = scores.Sum(s => s * s);
            spread = [.. size.Select(k => Math.Sqrt(k * (n - k) / (n * Math.Max(1, n - 1)) * square))];
        }

        /// <summary>How many spreads each group's sum lies above zero when its places are filled in this order; without bound below where it has too few breaks.</summary>
        public double[] Strength(int[] order)
        {
            double[] sum = new double[keys.Length];
            int[] broke = new int[keys.Length];
            for (int place = 0; place < order.Length; place++)
            {
                sum[of[place]] += scores[order[place]];
                broke[of[place]] += blades[order[place]].Broke ? 1 : 0;
            }

            for (int g = 0; g < sum.Length; g++)
            {
                sum[g] = broke[g] >= LeastBreaks && spread[g] > 0 ? sum[g] / spread[g] : double.NegativeInfinity;
            }

            return sum;
        }

        public BreakCluster Told(int g, double chance)
        {
            int[] members = [.. Enumerable.Range(0, blades.Count).Where(i => of[i] == g)];
            return new BreakCluster(
                keys[g].SawId,
                keys[g].OneOver,
                members.Length,
                [.. members.Select(i => blades[i]).Where(b => b.Broke).OrderBy(b => b.Hours)],
                blades.Count(b => b.Broke && b.SawId == keys[g].SawId),
                members.Sum(i => expected[i]),
                chance);
        }
    }
}
