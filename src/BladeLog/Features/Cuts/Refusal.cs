using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features.Cuts;

/// <summary>One blade that is not for this cut: the strongest reason as a word, then the sentence.</summary>
public sealed record Refused(Choice Choice, string State, string Word, string Sentence);

/// <summary>Blades refused for one reason, counted.</summary>
public sealed record RefusedMany(IReadOnlyList<string> Tags, string Sentence);

public sealed record Refusals(IReadOnlyList<Refused> Each, IReadOnlyList<RefusedMany> Rest, int NoSaw)
{
    private const int MostShown = 10;

    public int Count => Each.Count + Rest.Sum(r => r.Tags.Count) + NoSaw;

    internal static Refusals Of(CutAnswer answer, ShopAdvice advice, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(answer);
        ArgumentNullException.ThrowIfNull(advice);
        HashSet<string> usable = [.. answer.Choices.Where(c => c.Verdict != Verdict.No).Select(c => c.Tag)];

        // A blade refused on two saws is told once, with the reason that came nearest to a cut.
        Choice[] refused = [.. answer.Choices.Where(c => !usable.Contains(c.Tag)).GroupBy(c => c.Tag).Select(g => g.MaxBy(c => c.Reason.Kind)!)];
        Choice[] each = [.. refused.Where(c => !IsOfTheSaw(c.Reason.Kind)).OrderBy(Weight).ThenBy(c => c.Tag, StringComparer.OrdinalIgnoreCase)];
        Choice[] shown = [.. each.Take(MostShown)];
        RefusedMany[] rest = [.. refused.Except(shown).GroupBy(c => c.Reason.Sentence)
            .Select(g => new RefusedMany([.. g.Select(c => c.Tag).Order(StringComparer.OrdinalIgnoreCase)], g.Key))
            .OrderByDescending(r => r.Tags.Count)];
        int noSaw = advice.Now.Blades.Count(b => b.Place != Place.Gone && b.Break is null && b.Retirement is null && answer.Choices.All(c => c.Blade.File.Blade.Id != b.Blade.Id));
        return new Refusals([.. shown.Select(c => One(c, units))], rest, noSaw);
    }

    private static bool IsOfTheSaw(ReasonKind kind) => kind is ReasonKind.Material or ReasonKind.WorkKind or ReasonKind.TooHigh
        or ReasonKind.TooLong or ReasonKind.Bevel or ReasonKind.ClassWork;

    /// <summary>A hold first; then what could be changed; then what the blade is.</summary>
    private static int Weight(Choice c) => c.Reason.Kind switch
    {
        ReasonKind.Hold => 0,
        ReasonKind.Dull => 1,
        ReasonKind.Shut => 2,
        ReasonKind.Radius => 3,
        ReasonKind.Teeth => 4,
        ReasonKind.Unsuitable => 5,
        _ => 6,
    };

    internal static Refused One(Choice c, ShopUnits units)
    {
        (string state, string word) = c.Reason.Kind switch
        {
            ReasonKind.Material => ("no", "Not wood"),
            ReasonKind.Hold => ("hold", "On hold"),
            ReasonKind.Away => ("away", "At the sharpener"),
            ReasonKind.WorkKind => ("no", "Not this work"),
            ReasonKind.TooHigh => ("no", "Will not go under the guides"),
            ReasonKind.TooLong => ("no", "Too long"),
            ReasonKind.Bevel => ("no", "Cannot tilt"),
            ReasonKind.ClassWork => ("no", "No classes"),
            ReasonKind.Unsuitable => ("no", "Wheels too small"),
            ReasonKind.Teeth => ("no", "Too few teeth"),
            ReasonKind.Radius => ("no", "Cannot turn it"),
            ReasonKind.Dull => ("sharpen", "Dull"),
            ReasonKind.Shut => ("no", Shut(c.Gate!, units)),
            _ => ("no", "Not this cut"),
        };
        string chip = c is { Reason.Kind: ReasonKind.Shut, Gate: { } gate } ? $"; no chip below {CutSays.Feed(gate.NoChipMps, units)}" : "";
        return new Refused(c, state, word, c.Reason.Sentence + chip);
    }

    private static string Shut(Gate gate, ShopUnits units)
    {
        string feed = CutSays.Feed(gate.Amber.AmberMps, units);
        return gate.Amber.Kind switch
        {
            FeedLimitKind.ChipRoom => $"Gullets fill at {feed}",
            FeedLimitKind.Power => $"Motor stalls at {feed}",
            FeedLimitKind.Push => $"Too hard a push at {feed}",
            FeedLimitKind.Feeder => $"Feeder stalls at {feed}",
            FeedLimitKind.Beam => $"Bends at {feed}",
            FeedLimitKind.Practical => $"Cannot be fed over {feed}",
            _ => $"Too coarse over {feed}",
        };
    }
}
