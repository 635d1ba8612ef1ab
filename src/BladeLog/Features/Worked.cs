using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Advice.Life;
using BladeLog.Records;

namespace BladeLog.Features;

/// <summary>The way from a figure to the page that works it out, filled in with its blade, saw and cut.</summary>
/// <param name="What">What is worked out there: "Life of Q-08 on Osprey".</param>
/// <param name="Gives">The figures of this page that stand there.</param>
/// <param name="Href">Its address.</param>
/// <param name="Verb">What the row does.</param>
public sealed record Worked(string What, string Gives, string Href, string Verb = "worked out");

/// <summary>A figure and the way to its working; none where nothing is told.</summary>
public sealed record Led(string Text, Worked? Worked);

/// <summary>The workings that answer for the figures of a page. Null where nothing is told of a blade: then nothing leads there.</summary>
internal static class WorkedOut
{
    /// <summary>Bending, bends an hour, life and hours left.</summary>
    public static Worked? Life(BladeAdvice blade, SawNow? saw = null)
    {
        ArgumentNullException.ThrowIfNull(blade);
        SawNow? on = saw ?? blade.Record.On;
        return blade.File.Hold is not null || on is null ? null
            : new($"Life of {Of(blade, on)}", "bending, bends an hour, hours to each mark", At("band-life", blade, on));
    }

    /// <summary>Bends of a saw with nothing on it.</summary>
    public static Worked Bends(SawNow saw) => new($"Bends an hour on {saw.Saw.Name}", "wheels, speed and loop", At("band-life", null, saw));

    public static Worked? Tension(BladeAdvice blade, SawNow? saw, Wording words)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(words);
        SawNow? on = saw ?? blade.Record.On;
        return on is null ? null : new($"{Said.Capital(words.Tension)} of {Of(blade, on)}", "on the body, and the pull it means", At("tension", blade, on));
    }

    public static Worked? Push(BladeAdvice blade, SawNow? saw, int? cut = null)
    {
        ArgumentNullException.ThrowIfNull(blade);
        SawNow? on = saw ?? blade.Record.On;
        return blade.File.Hold is not null || on is null ? null : new($"Push {Of(blade, on)} stands{In(cut)}", "span of the guides, slack front edge, twisting away", At("thrust-limits", blade, on, cut));
    }

    /// <summary>Rounding of the edge and what it can still cut; the cut only where the metres are of that cut.</summary>
    public static Worked Edge(BladeAdvice blade, SawNow? saw = null, int? cut = null)
    {
        ArgumentNullException.ThrowIfNull(blade);
        SawNow? on = saw ?? blade.Record.On;
        return new($"Edge of {blade.File.Blade.Tag}{In(cut)}", "rounding now, length of cut left", At("wear", blade, on, cut));
    }

    public static Worked Grinding(BladeAdvice blade)
    {
        ArgumentNullException.ThrowIfNull(blade);
        return new($"Width and set of {blade.File.Blade.Tag}", "grinds left, width left, when to set again", At("grinding", blade, null));
    }

    /// <summary>The shop's own force factor from its ammeter.</summary>
    public static Worked Ammeter(BladeAdvice blade, SawNow saw, int? cut) => new("Your own force factor", "from the ammeter, so that force and power are yours", At("force-factor", blade, saw, cut));

    /// <summary>Gate of feeds, force, push and power of a blade in a cut.</summary>
    public static Worked Cut(Choice choice)
    {
        ArgumentNullException.ThrowIfNull(choice);
        return new($"Feeds of {Of(choice.Blade, choice.Saw)}{In(choice.Work.Cut.Number)}", "bite, chip room, force, push, power", At("cut", choice.Blade, choice.Saw, choice.Work.Cut.Number));
    }

    public static Worked Curve(Choice choice)
    {
        ArgumentNullException.ThrowIfNull(choice);
        return new($"Tightest curve of {choice.Tag}{In(choice.Work.Cut.Number)}", "from its width and kerf", At("curve", choice.Blade, choice.Saw, choice.Work.Cut.Number));
    }

    /// <summary>Everything reckoned for a blade in a cut.</summary>
    public static IReadOnlyList<Worked> All(Choice choice, Wording words)
    {
        ArgumentNullException.ThrowIfNull(choice);
        int cut = choice.Work.Cut.Number;
        return Rows(
            Cut(choice), Push(choice.Blade, choice.Saw, cut), Tension(choice.Blade, choice.Saw, words),
            choice.UsualRadiusM is null ? null : Curve(choice), Edge(choice.Blade, choice.Saw, cut), Life(choice.Blade, choice.Saw));
    }

    /// <summary>What the band beside a blade shows.</summary>
    public static Worked? Band(BladeAdvice blade, SmallBand shown, SawNow? saw = null)
    {
        ArgumentNullException.ThrowIfNull(shown);
        return shown.Worn is not null
            ? blade.Limits.Shares is [{ Kind: LimitKind.Edge }, ..] ? Edge(blade, saw) : Grinding(blade)
            : shown.Life is not null || shown.Range is not null ? Life(blade, saw) : null;
    }

    public static IReadOnlyList<Worked> Rows(params Worked?[] rows) => [.. rows.OfType<Worked>()];

    private static string Of(BladeAdvice blade, SawNow saw) => $"{blade.File.Blade.Tag} on {saw.Saw.Name}";

    private static string In(int? cut) => cut is { } n ? $" in cut {n}" : "";

    private static string At(string working, BladeAdvice? blade, SawNow? saw, int? cut = null)
    {
        string[] asked =
        [
            .. blade is null ? (string[])[] : [$"blade={Uri.EscapeDataString(blade.File.Blade.Tag)}"],
            .. saw is null ? (string[])[] : [$"saw={Uri.EscapeDataString(saw.Saw.Code)}"],
            .. cut is { } n ? (string[])[FormattableString.Invariant($"cut={n}")] : [],
        ];
        return $"/workings/{working}?{string.Join('&', asked)}";
    }
}
