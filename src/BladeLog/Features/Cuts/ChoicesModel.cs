using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Cuts;

/// <summary>The answer to one cut.</summary>
public sealed record ChoicesModel
{
    private const int NextShown = 3;

    public required QueuedCut Cut { get; init; }

    public required CutAnswer Answer { get; init; }

    public required ShopAdvice Advice { get; init; }

    public required ShopUnits Units { get; init; }

    public required string Title { get; init; }

    public required string Lede { get; init; }

    public required IReadOnlyList<string> Why { get; init; }

    public required IReadOnlyList<string> Defaults { get; init; }

    public required IReadOnlyList<SaidCaution> Cautions { get; init; }

    public required Refusals Refusals { get; init; }

    public CutBecause? Because { get; init; }

    public OtherStock? Other { get; init; }

    public Choice? Best => Answer.First;

    /// <summary>Every other blade that cuts it, best first.</summary>
    public IReadOnlyList<Choice> Usable => [.. Answer.Choices.Skip(1).Where(c => c.Verdict != Verdict.No)];

    public IReadOnlyList<Choice> Next => [.. Usable.Take(NextShown)];

    public IReadOnlyList<Choice> Further => [.. Usable.Skip(NextShown)];

    internal static ChoicesModel Of(QueuedCut cut, ShopAdvice advice, ShopUnits units, OtherForm other)
    {
        ArgumentNullException.ThrowIfNull(advice);
        ArgumentNullException.ThrowIfNull(other);
        CutAnswer answer = advice.For(cut);
        Choice? best = answer.First, next = answer.Choices.Skip(1).FirstOrDefault(c => c.Verdict != Verdict.No);
        return new ChoicesModel
        {
            Cut = cut,
            Answer = answer,
            Advice = advice,
            Units = units,
            Title = CutSays.Title(answer, units),
            Lede = CutSays.Lede(cut, answer.Work, advice.Words, units),
            Why = best is null ? [] : WhyThis.Of(best, next, advice, units),
            Defaults = best is null ? [] : WhyThis.Defaults(best, advice, units),
            Cautions = best is null ? [] : CutCautions.Of(best, advice),
            Refusals = Refusals.Of(answer, advice, units),
            Because = best is null ? null : CutBecause.Of(best, advice, units),
            Other = best is not null && other.Wanted ? OtherStock.Of(other, best, advice, units) : null,
        };
    }

    public static IReadOnlyList<GateLimit> Limits(Gate gate)
    {
        ArgumentNullException.ThrowIfNull(gate);
        return [.. gate.Limits.Where(l => double.IsFinite(l.GreenMps) && double.IsFinite(l.AmberMps))
            .Select(l => new GateLimit(CutWords.LimitName(l.Kind), l.GreenMps * 60, l.AmberMps * 60))];
    }

    public static EdgeVerdict Edge(AtFeed at)
    {
        ArgumentNullException.ThrowIfNull(at);
        return at.Regime switch
        {
            Handbook.Cutting.BiteRegime.NoChip => EdgeVerdict.NoChip,
            Handbook.Cutting.BiteRegime.Rubbing => EdgeVerdict.Rubs,
            _ => EdgeVerdict.Cuts,
        };
    }
}
