using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>The stress of one place on the band over one turn of the loop, in Pa with the notch's factors in it.</summary>
/// <param name="SpanStress">Stress in the span that leads onto each wheel.</param>
/// <param name="Bending">What each wheel adds: above zero on the outer face, below it on the inner.</param>
/// <param name="Valley">How far the cut lowers the stress in the first span.</param>
/// <param name="Twists">What each twisted place before and after the cut adds.</param>
internal sealed record LoopHistory(double[] SpanStress, double[] Bending, double Valley, double[] Twists)
{
    /// <summary>The turn as the gullets feel it, on one face.</summary>
    public static LoopHistory Gullet(BandCase c, Stress running, IReadOnlyList<Stress> bending, bool outer)
    {
        (double Kft, double Kfb) = GulletFactors(c);
        double[] spans = Spans(c, running);
        return new LoopHistory(
            [.. spans.Select(s => Kft * s)],
            [.. bending.Select(b => (outer ? 1 : -1) * Kfb * b.Pascals)],
            Kft * Math.Min(c.CutValley?.Pascals ?? 0, spans[0]),
            [.. c.TwistPulls.Select(p => Kft * p.Pascals)]);
    }

    /// <summary>The tension in each span; a span cannot push.</summary>
    public static double[] Spans(BandCase c, Stress running)
    {
        double[] spans = [.. Enumerable.Range(0, c.Wheels.Count).Select(i => running.Pascals + (c.SpanOffsets?[i].Pascals ?? 0))];
        return spans.All(s => double.IsFinite(s) && s >= 0)
            ? spans
            : throw new ArgumentOutOfRangeException(nameof(c), "No span can have less than no tension.");
    }

    public static (double Tension, double Bending) GulletFactors(BandCase c)
    {
        if (c.Gullet is not { } known)
        {
            return (c.GulletTensionFactor, c.GulletBendingFactor);
        }

        Stress Su = Hardness.TensileStrength(Hardness.Brinell(c.BodyHrc));
        return (GulletNotch.TensionFactor(known.Pitch, known.Radius, Su), GulletNotch.BendingFactor(known.Pitch, known.Radius, Su));
    }

    /// <summary>The cycles of the turn: the greatest for each wheel, in the order of the wheels, and those that come beside them.</summary>
    public (StressCycle[] Wheels, StressCycle[] Beside) Cycles()
    {
        if (Valley == 0 && Twists.Length == 0 && Array.TrueForAll(SpanStress, s => s == SpanStress[0]))
        {
            return ([.. Bending.Select(b => new StressCycle(SpanStress[0] + Math.Max(b, 0), Math.Abs(b) / 2))], []);
        }

        RainflowCycle[] counted = [.. Rainflow.CountLoop(Nodes())
            .SelectMany(c => Enumerable.Repeat(c, (int)c.Count))
            .OrderByDescending(c => c.Range)
            .ThenByDescending(c => c.Greatest)];
        StressCycle[] wheels = new StressCycle[Bending.Length];
        int[] order = [.. Enumerable.Range(0, Bending.Length).OrderByDescending(i => Math.Abs(Bending[i]))];
        foreach ((RainflowCycle cycle, int wheel) in counted.Zip(order))
        {
            wheels[wheel] = new StressCycle(cycle.Greatest, cycle.Range / 2);
        }

        return (wheels, [.. counted.Skip(wheels.Length).Select(c => new StressCycle(c.Greatest, c.Range / 2))]);
    }

    private double[] Nodes()
    {
        List<double> nodes = [];
        for (int i = 0; i < Bending.Length; i++)
        {
            double span = SpanStress[i], next = SpanStress[(i + 1) % SpanStress.Length];
            nodes.Add(span);
            if (i == 0)
            {
                // Half of the twisted places lie before the cut and half behind it.
                int before = (Twists.Length + 1) / 2;
                nodes.AddRange(Twists.Take(before).SelectMany(t => new[] { span + t, span }));
                nodes.Add(span - Valley);
                nodes.AddRange(Twists.Skip(before).SelectMany(t => new[] { span, span + t }));
                nodes.Add(span);
            }

            // The pull changes from that of the one span to that of the next on the wheel.
            nodes.AddRange([span + Bending[i], next + Bending[i]]);
        }

        return [.. nodes];
    }
}
