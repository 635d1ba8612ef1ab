using System.Text.Json.Serialization;
using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Records;

namespace BladeLog.Features.Cuts;

/// <summary>One upper limit of feed; null where nothing holds it.</summary>
internal sealed record LimitOut(
    [property: JsonPropertyName("name")] FeedLimitKind Name,
    [property: JsonPropertyName("green_m_min")] double? Green,
    [property: JsonPropertyName("amber_m_min")] double? Amber)
{
    public static LimitOut Of(FeedLimit limit) => new(limit.Kind, Finite(limit.GreenMps), Finite(limit.AmberMps));

    private static double? Finite(double mps) => double.IsFinite(mps) ? mps * 60 : null;
}

/// <summary>One blade on one saw. On "no" it has its reason and no figures.</summary>
internal sealed record ChoiceOut(
    [property: JsonPropertyName("tag")] string Tag,
    [property: JsonPropertyName("saw")] string Saw,
    [property: JsonPropertyName("speed_m_s")] double Speed,
    [property: JsonPropertyName("verdict")] Verdict Verdict,
    [property: JsonPropertyName("reason")] string Reason,
    [property: JsonPropertyName("feed_low_m_min")] double? FeedLow,
    [property: JsonPropertyName("feed_high_m_min")] double? FeedHigh,
    [property: JsonPropertyName("feed_advised_m_min")] double? FeedAdvised,
    [property: JsonPropertyName("governed_by")] FeedLimitKind? GovernedBy,
    [property: JsonPropertyName("limits")] IReadOnlyList<LimitOut> Limits,
    [property: JsonPropertyName("rubbing_m_min")] double? Rubbing,
    [property: JsonPropertyName("no_chip_m_min")] double? NoChip,
    [property: JsonPropertyName("minutes")] double? Minutes,
    [property: JsonPropertyName("cost_minor")] long? Cost,
    [property: JsonPropertyName("life_spent")] double? LifeSpent,
    [property: JsonPropertyName("break_chance")] double? BreakChance,
    [property: JsonPropertyName("swap_needed")] bool SwapNeeded,
    [property: JsonPropertyName("cautions")] IReadOnlyList<string> Cautions)
{
    public static ChoiceOut Of(Choice choice)
    {
        var gate = choice.Verdict == Verdict.No ? null : choice.Gate;
        var job = choice.Verdict == Verdict.No ? null : choice.Job;
        return new ChoiceOut(
            choice.Tag,
            choice.Saw.Saw.Code,
            choice.SpeedMps,
            choice.Verdict,
            choice.Reason.Sentence,
            gate?.LowMps * 60,
            gate?.HighMps * 60,
            gate?.AdvisedMps * 60,
            gate?.GovernedBy,
            gate is null ? [] : [.. gate.Limits.Select(LimitOut.Of)],
            gate?.RubbingMps * 60,
            gate?.NoChipMps * 60,
            job?.Minutes,
            job is null ? null : (long)Math.Round(job.Cost.Total),
            job?.LifeSpent,
            job?.BreakChance,
            choice.SwapNeeded,
            choice.Cautions);
    }
}

/// <summary>Which blade for this cut, best first.</summary>
internal sealed record ChoicesOut(
    [property: JsonPropertyName("cut")] QueuedCutOut Cut,
    [property: JsonPropertyName("choices")] IReadOnlyList<ChoiceOut> Choices,
    [property: JsonPropertyName("if_nothing_fits")] IReadOnlyList<string> IfNothingFits,
    [property: JsonPropertyName("sources")] IReadOnlyList<string> Sources,
    [property: JsonPropertyName("cautions")] IReadOnlyList<string> Cautions)
{
    public static ChoicesOut Of(ShopAdvice advice, QueuedCut cut)
    {
        var answer = advice.For(cut);
        string[] wood = answer.Work.Material is { } material ? [material.SourceKey] : [];
        List<string> cautions = ["Feeds, forces and costs are planning figures. A planning limit is no permission to run past the maker's limits."];
        if (cut.MoisturePct is null && answer.Work.IsWood)
        {
            cautions.Add($"Moisture taken as {answer.Work.Moisture.Value:0.#} %: default, not yours.");
        }

        return new ChoicesOut(
            QueuedCutOut.Of(cut),
            [.. answer.Choices.Select(ChoiceOut.Of)],
            [.. answer.Proposals.Select(p => p.Sentence)],
            [.. AnswerSources.Choice.Union(wood)],
            cautions);
    }
}
