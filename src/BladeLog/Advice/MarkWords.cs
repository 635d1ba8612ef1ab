using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>What was seen beside a crack, and what it means for the blade.</summary>
public static class MarkWords
{
    private static readonly (LookedAt At, string Word)[] Places =
    [
        (LookedAt.Teeth, "teeth"), (LookedAt.Gullets, "gullets"), (LookedAt.Weld, "weld"), (LookedAt.Body, "body"), (LookedAt.BackEdge, "back edge"),
        (LookedAt.HeatMarks, "heat marks"), (LookedAt.Level, "twist and level"),
    ];

    public static string Place(LookedAt one) => Places.First(p => p.At == one).Word;

    public static IEnumerable<LookedAt> EachPlace => Places.Select(p => p.At);

    /// <summary>"the whole loop", "only gullets and weld"; null: not said.</summary>
    public static string? Looked(LookedAt? at) => at switch
    {
        null => null,
        LookedAt.WholeLoop => "the whole loop",
        { } part => $"only {And([.. Places.Where(p => part.HasFlag(p.At)).Select(p => p.Word)])}",
    };

    public static string Name(BladeMarks one) => one switch
    {
        BladeMarks.Rust => "rust in the gullets",
        BladeMarks.Burrs => "burrs in the gullets",
        BladeMarks.BurnedGullets => "burned gullets",
        BladeMarks.KinkOrTwist => "kink or twist",
        _ => "teeth missing",
    };

    public static IEnumerable<BladeMarks> Each => [BladeMarks.Rust, BladeMarks.Burrs, BladeMarks.BurnedGullets, BladeMarks.KinkOrTwist, BladeMarks.TeethMissing];

    /// <summary>"rust in the gullets, 3 teeth missing"; empty: nothing was seen or said.</summary>
    public static string Seen(BladeMarks? marks, int? missing) => string.Join(", ", Each.Where(m => marks?.HasFlag(m) == true)
        .Select(m => m == BladeMarks.TeethMissing && missing is { } n ? n == 1 ? "1 tooth missing" : $"{n} teeth missing" : Name(m)));

    /// <summary>What each thing seen means, a sentence each.</summary>
    public static IEnumerable<string> Means(BladeAdvice blade)
    {
        ArgumentNullException.ThrowIfNull(blade);
        var marks = blade.File.Marks;
        if (marks.HasFlag(BladeMarks.BurnedGullets))
        {
            yield return "Burned (blue) gullets: cracks start there. Grind the blue away over the full profile, and look at those gullets before each mount.";
        }

        if (marks.HasFlag(BladeMarks.Rust))
        {
            yield return $"Rust in the gullets: pits start cracks.{Life(blade.Life?.RustFactor)}";
        }

        if (marks.HasFlag(BladeMarks.Burrs))
        {
            yield return $"Burrs in the gullets: cracks start at them, until a full-profile grind takes them away.{Life(blade.Life?.BurrFactor)}";
        }

        if (marks.HasFlag(BladeMarks.KinkOrTwist))
        {
            yield return "A kink or twist: it does not run true, and bends hardest at the kink. Level it or cut it out.";
        }

        if (marks.HasFlag(BladeMarks.TeethMissing))
        {
            yield return $"{(blade.File.TeethMissing is { } n ? n == 1 ? "1 tooth is missing: the next one bites" : $"{n} teeth are missing: the next ones bite" : "Teeth are missing: the next ones bite")} for them too and dull first. Feed it slower.";
        }
    }

    private static string Life(double? factor) => factor is { } f ? $" Life ×{f.ToString("0.00", System.Globalization.CultureInfo.InvariantCulture)}, engineering default." : "";

    private static string And(string[] words) => words.Length > 1 ? $"{string.Join(", ", words[..^1])} and {words[^1]}" : string.Concat(words);
}
