namespace BladeLog.Advice.Cuts;

/// <summary>Best first.</summary>
public static class Ranking
{
    /// <summary>
    /// By verdict, cost, tag. Then the leader rule: among blades of the best verdict that cost hardly more than the cheapest, a
    /// mounted one, else the one with the greatest thrust reserve, goes to the top; the rest keep their order.
    /// </summary>
    public static IReadOnlyList<Choice> Order(IEnumerable<Choice> choices, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(settings);
        List<Choice> sorted = [.. choices
            .OrderBy(c => c.Verdict)
            .ThenBy(c => c.Job?.Cost.Total ?? double.MaxValue)
            .ThenBy(c => c.Tag, StringComparer.OrdinalIgnoreCase)];
        if (sorted.Count == 0 || sorted[0].Job is not { } cheapest)
        {
            return sorted;
        }

        Choice leader = sorted
            .Where(c => c.Verdict == sorted[0].Verdict && c.Job!.Cost.Total <= settings[CutSettings.Leader] * cheapest.Cost.Total)
            .OrderByDescending(c => c.Mounted)
            .ThenByDescending(c => c.AtAdvised!.Reserve)
            .First();
        sorted.Remove(leader);
        sorted.Insert(0, leader);
        return sorted;
    }
}
