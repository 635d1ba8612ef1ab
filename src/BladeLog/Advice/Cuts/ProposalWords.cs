using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>Every sentence that proposes something where nothing fits.</summary>
public static class ProposalWords
{
    public static string Stack(Choice c, Wording words)
    {
        ArgumentNullException.ThrowIfNull(c);
        return $"Stack {Number(c.Work.Stack)} pieces: {Named(c)} then has {Wording.Number(c.Work.HeightM / c.Blade.Body.PitchCoarse, 1)} teeth in the cut and takes {Window(c, words)}{Care(c)}.";
    }

    public static string SharpenFirst(Choice c, Wording words) => $"Sharpen {c.Tag} first: {Named(c)} then takes {Window(c, words)}{Care(c)}.";

    public static string SlowerSpeed(Choice c, Wording words)
    {
        ArgumentNullException.ThrowIfNull(c);
        return $"Set {c.Saw.Saw.Name} to {Wording.Number(c.SpeedMps, 1)} m/s: {c.Tag} then takes {Window(c, words)}{Care(c)}.";
    }

    public static string ReliefCuts(Choice c, Wording words) => $"Make relief cuts: {Named(c)} then takes the curve, {Window(c, words)}.";

    public static string Buy(Choice c, double coarsest, double? widest, Wording words)
    {
        ArgumentNullException.ThrowIfNull(c);
        ArgumentNullException.ThrowIfNull(words);
        string pitch = $"a pitch of {words.Width(coarsest)} or finer";
        string width = widest is { } w ? $" and {words.Width(w)} wide or narrower" : "";
        return $"Buy for {c.Saw.Saw.Name}: {pitch}{width}. New, at {words.Width(c.Blade.Body.PitchMean)} pitch and {words.Width(c.Blade.Body.Width.Value)} wide, it would take {Window(c, words)}{Care(c)}.";
    }

    public static string ComesBack(Choice c, AwayIn? away, Wording words)
    {
        string batch = away is null ? "from the sharpener" : $"in batch {away.BatchNumber}";
        return $"Wait for {c.Tag}, {batch}: sharp, it takes {Window(c, words)}{Care(c)}.";
    }

    private static string Named(Choice c) => $"{c.Tag} on {c.Saw.Saw.Name}";

    private static string Window(Choice c, Wording words) => $"{Feed(c.Gate!.LowMps!.Value, words)} to {words.Feed(c.Gate.HighMps!.Value)}";

    private static string Feed(double mps, Wording words) => words.Feed(mps).Split(' ')[0];

    private static string Care(Choice c) => c.Verdict == Verdict.WithCare ? $", with care ({c.Reason.Sentence})" : "";

    private static string Number(int n) => n switch { 2 => "two", 3 => "three", 4 => "four", 5 => "five", _ => Wording.Number(n, 0) };
}
