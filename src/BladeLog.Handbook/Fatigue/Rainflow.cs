namespace BladeLog.Handbook.Fatigue;

/// <summary>One counted cycle of a stress history.</summary>
/// <param name="Range">Greatest less least stress of the cycle.</param>
/// <param name="Mean">The middle between them.</param>
/// <param name="Count">1, or 0.5 for a half cycle.</param>
public readonly record struct RainflowCycle(double Range, double Mean, double Count)
{
    /// <summary>Greatest stress of the cycle.</summary>
    public double Greatest => Mean + Range / 2;
}

/// <summary>Rainflow counting: takes a stress history apart into cycles.</summary>
public static class Rainflow
{
    /// <summary>The cycles of a history that is passed through once.</summary>
    /// <remarks>
    /// With X the last range and Y the one before it: while X ≥ Y, Y is one cycle, or half of one when it holds the start of the history;
    /// the ranges left at the end are halves. Points between the turning points are passed over. Any unit of stress.
    /// </remarks>
    /// <source key="astm-e1049" where="section 5.4.4"/>
    public static IReadOnlyList<RainflowCycle> Count(IReadOnlyList<double> history)
    {
        ArgumentNullException.ThrowIfNull(history);
        List<RainflowCycle> cycles = [];
        List<double> stack = [];
        foreach (double point in TurningPoints(history))
        {
            stack.Add(point);
            while (stack.Count >= 3)
            {
                double X = Math.Abs(stack[^1] - stack[^2]);
                double Y = Math.Abs(stack[^2] - stack[^3]);
                if (X < Y)
                {
                    break;
                }

                if (stack.Count == 3)
                {
                    cycles.Add(Cycle(stack[0], stack[1], 0.5));
                    stack.RemoveAt(0);
                }
                else
                {
                    cycles.Add(Cycle(stack[^3], stack[^2], 1));
                    stack.RemoveRange(stack.Count - 3, 2);
                }
            }
        }

        for (int i = 1; i < stack.Count; i++)
        {
            cycles.Add(Cycle(stack[i - 1], stack[i], 0.5));
        }

        return cycles;
    }

    /// <summary>The cycles of a history that repeats, such as one turn of the loop: whole cycles only.</summary>
    /// <remarks>The history is turned to begin and end at its greatest peak and counted once; the halves then meet in pairs.</remarks>
    /// <source key="astm-e1049" where="section 5.4.5, repeating histories"/>
    public static IReadOnlyList<RainflowCycle> CountLoop(IReadOnlyList<double> history)
    {
        ArgumentNullException.ThrowIfNull(history);
        if (history.Count == 0)
        {
            return [];
        }

        int peak = 0;
        for (int i = 1; i < history.Count; i++)
        {
            peak = history[i] > history[peak] ? i : peak;
        }

        double[] closed = [.. history.Skip(peak), .. history.Take(peak), history[peak]];
        return [.. Count(closed)
            .GroupBy(c => (c.Range, c.Mean))
            .Select(g => new RainflowCycle(g.Key.Range, g.Key.Mean, g.Sum(c => c.Count)))];
    }

    private static RainflowCycle Cycle(double from, double to, double count) => new(Math.Abs(to - from), (from + to) / 2, count);

    private static List<double> TurningPoints(IReadOnlyList<double> history)
    {
        List<double> points = [];
        foreach (double next in history)
        {
            if (!double.IsFinite(next))
            {
                throw new ArgumentOutOfRangeException(nameof(history), next, "Every point of a stress history must be a number.");
            }

            if (points.Count > 0 && points[^1] == next)
            {
                continue;
            }

            if (points.Count >= 2 && (points[^1] > points[^2]) == (next > points[^1]))
            {
                points[^1] = next;
            }
            else
            {
                points.Add(next);
            }
        }

        return points;
    }
}
