using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>One cut in its place of the day.</summary>
public sealed record PlannedCut(QueuedCut Cut, Choice Choice, bool ChangeBefore);

/// <summary>The cuts of one saw in the order that needs fewest blade changes.</summary>
public sealed record SawPlan(SawNow Saw, IReadOnlyList<PlannedCut> Cuts)
{
    public int Changes => Cuts.Count(c => c.ChangeBefore);

    public PlannedCut? Next => Cuts.Count > 0 ? Cuts[0] : null;
}

/// <summary>The order of the day, each cut with its first choice.</summary>
public sealed record DayPlan(IReadOnlyList<SawPlan> Saws, IReadOnlyList<QueuedCut> WithoutBlade, int ChangesInQueueOrder)
{
    public int Changes => Saws.Sum(s => s.Changes);

    public static DayPlan Of(IReadOnlyList<SawNow> saws, IEnumerable<CutAnswer> answers)
    {
        ArgumentNullException.ThrowIfNull(saws);
        CutAnswer[] queue = [.. answers.OrderBy(a => a.Work.Cut.Order).ThenBy(a => a.Work.Cut.Number)];
        List<SawPlan> plans = [];
        int inQueueOrder = 0;
        foreach (SawNow saw in saws)
        {
            Choice[] cuts = [.. queue.Select(a => a.First).OfType<Choice>().Where(c => c.Saw == saw)];
            inQueueOrder += Planned(saw, cuts).Count(c => c.ChangeBefore);
            plans.Add(new SawPlan(saw, Planned(saw, FewestChanges(saw, cuts))));
        }

        return new DayPlan(plans, [.. queue.Where(a => a.First is null).Select(a => a.Work.Cut)], inQueueOrder);
    }

    private static List<PlannedCut> Planned(SawNow saw, IEnumerable<Choice> cuts)
    {
        int? on = saw.MountedBladeId;
        List<PlannedCut> planned = [];
        foreach (Choice c in cuts)
        {
            planned.Add(new PlannedCut(c.Work.Cut, c, c.Blade.File.Blade.Id != on));
            on = c.Blade.File.Blade.Id;
        }

        return planned;
    }

    /// <summary>
    /// Cuts of one blade go together and the mounted blade first: that order has the fewest changes there can be. Among
    /// such orders the one that turns the fewest pairs of the queue round, found by trying all where they are few.
    /// </summary>
    private static IEnumerable<Choice> FewestChanges(SawNow saw, Choice[] cuts)
    {
        List<Choice[]> groups = [.. cuts.GroupBy(c => c.Blade.File.Blade.Id).Select(g => g.ToArray())];
        Choice[]? first = groups.Find(g => g[0].Mounted);
        if (first is not null)
        {
            groups.Remove(first);
        }

        Dictionary<Choice, int> place = [];
        for (int i = 0; i < cuts.Length; i++)
        {
            place[cuts[i]] = Urgency(cuts, i);
        }

        IReadOnlyList<Choice[]> best = groups.Count <= 7
            ? Orders(groups).MinBy(order => Turned(order, place))!
            : [.. groups.OrderBy(g => g.Min(c => place[c]))];
        return [.. first ?? [], .. best.SelectMany(g => g)];
    }

    /// <summary>Place in the queue, a due date before none.</summary>
    private static int Urgency(Choice[] cuts, int i) => cuts.Count(other =>
        Earlier(other.Work.Cut, cuts[i].Work.Cut));

    private static bool Earlier(QueuedCut a, QueuedCut b)
    {
        int due = (a.Due ?? DateOnly.MaxValue).CompareTo(b.Due ?? DateOnly.MaxValue);
        return due != 0 ? due < 0 : a.Order != b.Order ? a.Order < b.Order : a.Number < b.Number;
    }

    private static int Turned(IReadOnlyList<Choice[]> order, Dictionary<Choice, int> place)
    {
        int[] sequence = [.. order.SelectMany(g => g).Select(c => place[c])];
        int turned = 0;
        for (int i = 0; i < sequence.Length; i++)
        {
            for (int j = i + 1; j < sequence.Length; j++)
            {
                turned += sequence[i] > sequence[j] ? 1 : 0;
            }
        }

        return turned;
    }

    private static IEnumerable<IReadOnlyList<Choice[]>> Orders(List<Choice[]> groups)
    {
        if (groups.Count == 0)
        {
            yield return [];
            yield break;
        }

        for (int i = 0; i < groups.Count; i++)
        {
            List<Choice[]> rest = [.. groups];
            rest.RemoveAt(i);
            foreach (IReadOnlyList<Choice[]> tail in Orders(rest))
            {
                yield return [groups[i], .. tail];
            }
        }
    }
}
