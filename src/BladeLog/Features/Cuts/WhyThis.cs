using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;

namespace BladeLog.Features.Cuts;

/// <summary>Why this blade and not the next: what must be minded first, then what saves most, then what sets the feed.</summary>
internal static class WhyThis
{
    private const double Small = 0.005;

    public static IReadOnlyList<string> Of(Choice best, Choice? next, ShopAdvice advice, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(best);
        ArgumentNullException.ThrowIfNull(advice);
        List<string> rows = [];
        if (best.Verdict == Verdict.WithCare)
        {
            rows.AddRange(best.Reasons.Select(r => Said.Capital(r.Sentence) + "."));
        }

        if (next is { Verdict: Verdict.WithCare } && best.Verdict == Verdict.Fits)
        {
            rows.Add($"{next.Tag}, the next, fits only with care: {next.Reason.Sentence}.");
        }

        if (best.Mounted)
        {
            rows.Add($"It is on {best.Saw.Saw.Name}: no swap." + (next is { SwapNeeded: true } ? $" {next.Tag} would take {Figures.Number(next.Saw.Setup.ChangeMinutes)} minutes to put on." : ""));
        }

        if (next is { Job: { } other })
        {
            rows.AddRange(Savings(best, next, other, units));
            rows.Add(Total(best, next, other, advice, units));
        }

        if (best.Work.RadiusM is null && Said.Leads(best.Blade.File, best.Saw.Saw.Id, units) is { } leads)
        {
            rows.Add($"{best.Tag} {leads}.");
        }

        rows.Add(Teeth(best));
        rows.Add(Edge(best, units));
        if (best is { UsualRadiusM: { } turns, Work.RadiusM: { } asked } && !best.Relief)
        {
            rows.Add($"It turns a curve of {advice.Words.Length(turns)}; the tightest here is {advice.Words.Length(asked)}.");
        }

        return rows;
    }

    /// <summary>The lines of cost in which this blade saves, the largest first.</summary>
    private static IEnumerable<string> Savings(Choice best, Choice next, JobCost other, ShopUnits units)
    {
        CostLines a = best.Job!.Cost, b = other.Cost;
        (double Saved, string Sentence)[] lines =
        [
            (b.Timber - a.Timber, $"A kerf of {Mm(best.Blade.Body.Kerf, units)} against {Mm(next.Blade.Body.Kerf, units)}: {CutSays.Money(b.Timber - a.Timber, units)} of timber saved."),
            (b.Nail - a.Nail, $"A nail would spoil less: {CutSays.Money(a.Nail, units)} at risk against {CutSays.Money(b.Nail, units)} with {next.Tag}."),
            (b.Labour - a.Labour, $"{Figures.Number(other.Minutes - best.Job.Minutes, 1)} minutes less than with {next.Tag}: {CutSays.Money(b.Labour - a.Labour, units)} of labour saved."),
            (b.Wear + b.Life - a.Wear - a.Life, $"It takes {CutSays.Money(a.Wear + a.Life, units)} out of the blade, {next.Tag} {CutSays.Money(b.Wear + b.Life, units)}."),
        ];
        return lines.Where(l => l.Saved > Small * a.Total && l.Saved >= 0.5).OrderByDescending(l => l.Saved).Select(l => l.Sentence);
    }

    private static string Total(Choice best, Choice next, JobCost other, ShopAdvice advice, ShopUnits units)
    {
        double a = best.Job!.Cost.Total, b = other.Cost.Total;
        string costs = $"{CutSays.Money(a, units)} for the job; {next.Tag} costs {CutSays.Money(b, units)}.";
        if (b >= a || best.Verdict != next.Verdict)
        {
            return costs;
        }

        double percent = (advice.Settings[CutSettings.Leader] - 1) * 100;
        string because = best.Mounted || !double.IsFinite(best.AtAdvised!.Reserve) || next.AtAdvised is not { } at || best.AtAdvised.Reserve <= at.Reserve
            ? "this one is mounted"
            : $"this one stands {Figures.Number(best.AtAdvised.Reserve, 1)} times its push, the other {Figures.Number(at.Reserve, 1)} times";
        return $"{costs} Within {Figures.Number(percent)} % money does not decide: {because}.";
    }

    private static string Teeth(Choice c) =>
        $"{Figures.Number(c.Work.HeightM / c.Blade.Body.PitchCoarse, 1)} teeth in the cut; the gullets are {Figures.Number(c.AtAdvised!.Fill * 100)} % full at the advised feed.";

    private static string Edge(Choice c, ShopUnits units)
    {
        Gate gate = c.Gate!;
        double high = gate.HighMps!.Value;
        return $"{Said.Capital(CutWords.LimitName(gate.UpperEdgeBy))} sets the upper feed, {CutSays.Feed(high, units)}; below {CutSays.Feed(gate.RubbingMps, units)} the edge rubs.";
    }

    private static string Mm(Known length, ShopUnits units) => units.Show(new Length(length.Value), Fields.Kerf);

    /// <summary>What the answer rests on that the shop has not said.</summary>
    public static IReadOnlyList<string> Defaults(Choice c, ShopAdvice advice, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(c);
        ArgumentNullException.ThrowIfNull(advice);
        BladeBody body = c.Blade.Body;
        (bool Default, string Row)[] all =
        [
            (body.Kerf.IsDefault, $"Kerf {Mm(body.Kerf, units)}: {body.Kerf.From}."),
            (body.Gullet.IsDefault, $"Gullet depth {Mm(body.Gullet, units)}: {body.Gullet.From}."),
            (body.Rake.IsDefault, $"Hook {Figures.Number(double.RadiansToDegrees(body.Rake.Value))}°: {body.Rake.From}."),
            (body.FreshEdge.IsDefault, $"Fresh edge {units.Show(new Length(body.FreshEdge.Value), Fields.EdgeRadius)}: {body.FreshEdge.From}."),
            (c.Tension is { Guessed: true }, $"{Said.Capital(advice.Words.Tension)} {units.Show(c.Tension?.Stress ?? default)}: {c.Tension?.Stress.From}."),
            (c.Work.Moisture.IsDefault, $"Moisture {units.ShowPercent(c.Work.Moisture.Value)}: {c.Work.Moisture.From}."),
        ];
        FeedLimit[] governing = c.Gate is { } gate ? [gate.Green, gate.Amber] : [];
        IEnumerable<string> limits = governing.DistinctBy(l => l.Kind)
            .Where(l => double.IsFinite(l.GreenMps) && l.Green.Provenance is Provenance.EngineeringDefault or Provenance.FromMemory)
            .Select(l => $"{Said.Capital(l.Green.Name)}, {l.Green.How.Split(':')[0]}: {Figures.Mark(l.Green.Provenance)}.");
        return [.. all.Where(a => a.Default).Select(a => a.Row), .. limits];
    }

    private static string Show(this ShopUnits units, Known stress) => units.Show(new Stress(stress.Value));
}
