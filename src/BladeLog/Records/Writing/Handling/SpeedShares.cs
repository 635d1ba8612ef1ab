using BladeLog.Records.Folding;

namespace BladeLog.Records.Writing;

/// <summary>How the hours of one reading lie on a saw's speeds.</summary>
internal static class SpeedShares
{
    /// <summary>So much running, shared out over the speeds of the runs it stands for; where there are none, at the usual speed.</summary>
    public static List<(double SpeedMps, long Ms)> Of(IReadOnlyList<Run> runs, long running, double usual)
    {
        var speeds = runs.GroupBy(r => r.SpeedMps).Select(g => (Speed: g.Key, Ms: g.Sum(r => r.RunningMs))).ToList();
        return speeds.Count == 0 || speeds.Sum(s => s.Ms) == 0 ? [(usual, running)] : Of(speeds, running);
    }

    /// <summary>As told: so much at the other speed, the rest at the one chosen.</summary>
    public static List<(double SpeedMps, long Ms)> Of(double speed, long running, double? other, long otherMs) =>
        other is not { } second || otherMs == 0 ? [(speed, running)]
        : otherMs >= running ? [(second, running)]
        : [(speed, running - otherMs), (second, otherMs)];

    private static List<(double SpeedMps, long Ms)> Of(List<(double Speed, long Ms)> speeds, long running)
    {
        var parts = Apportion.LargestRemainder(running, speeds.ConvertAll(s => s.Ms));
        return [.. speeds.Select((s, i) => (s.Speed, parts[i])).Where(s => s.Item2 > 0)];
    }
}
