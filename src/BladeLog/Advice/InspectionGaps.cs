namespace BladeLog.Advice;

/// <summary>Running of a blade up to a time, on a saw.</summary>
public readonly record struct RunUpTo(DateTime UntilUtc, long Ms, int SawId);

/// <summary>A look that was due and did not come in time.</summary>
/// <param name="DueUtc">When the running passed what the rule allows, or the mount that wanted a look before it.</param>
/// <param name="LookedUtc">When the look came; null: never.</param>
/// <param name="RanMs">Running since the look before, up to the late one or to the last run.</param>
/// <param name="SawId">The saw it was on then.</param>
/// <param name="ByMount">The look before a mount was missed, not the hours.</param>
public sealed record InspectionGap(DateTime DueUtc, DateTime? LookedUtc, long RanMs, int SawId, bool ByMount);

/// <summary>
/// Where the shop's own rule of inspection was not kept: more running since the last look than the blade is allowed, or
/// a mount without a look since the mount before it. A run counts at its end; a look at the same moment comes after it.
/// </summary>
public static class InspectionGaps
{
    private const double MsPerHour = 3_600_000;

    /// <param name="everyHours">Look after so many running hours; null: no such rule.</param>
    /// <param name="eachMount">Look before each mount.</param>
    /// <param name="runs">Running of the blade.</param>
    /// <param name="mounts">When it was put on, and on which saw.</param>
    /// <param name="looks">When it was looked at.</param>
    public static IReadOnlyList<InspectionGap> Of(
        double? everyHours, bool eachMount, IEnumerable<RunUpTo> runs, IEnumerable<(DateTime AtUtc, int SawId)> mounts, IEnumerable<DateTime> looks)
    {
        ArgumentNullException.ThrowIfNull(runs);
        ArgumentNullException.ThrowIfNull(mounts);
        ArgumentNullException.ThrowIfNull(looks);
        DateTime[] seen = [.. looks.Order()];
        var gaps = new List<InspectionGap>();
        if (everyHours is { } every)
        {
            gaps.AddRange(ByHours(every, runs, seen));
        }

        if (eachMount)
        {
            gaps.AddRange(ByMounts(mounts, seen));
        }

        return [.. gaps.OrderBy(g => g.DueUtc)];
    }

    private static IEnumerable<InspectionGap> ByHours(double everyHours, IEnumerable<RunUpTo> runs, DateTime[] looks)
    {
        var allowed = (long)Math.Round(everyHours * MsPerHour);
        var (since, due, next) = (0L, (RunUpTo?)null, 0);
        foreach (var run in runs.OrderBy(r => r.UntilUtc))
        {
            for (; next < looks.Length && looks[next] < run.UntilUtc; next++)
            {
                if (due is { } late)
                {
                    yield return new InspectionGap(late.UntilUtc, looks[next], since, late.SawId, ByMount: false);
                }

                (since, due) = (0, null);
            }

            since += run.Ms;
            due ??= since > allowed ? run : null;
        }

        if (due is { } open)
        {
            yield return new InspectionGap(open.UntilUtc, next < looks.Length ? looks[next] : null, since, open.SawId, ByMount: false);
        }
    }

    private static IEnumerable<InspectionGap> ByMounts(IEnumerable<(DateTime AtUtc, int SawId)> mounts, DateTime[] looks)
    {
        var before = DateTime.MinValue;
        foreach (var (at, saw) in mounts.OrderBy(m => m.AtUtc))
        {
            if (!looks.Any(l => l > before && l <= at))
            {
                var later = looks.Where(l => l > at).Select(l => (DateTime?)l).FirstOrDefault();
                yield return new InspectionGap(at, later, 0, saw, ByMount: true);
            }

            before = at;
        }
    }
}
