using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features;

/// <summary>What a start-of-shift check found, in the words every page uses.</summary>
internal static class CheckWords
{
    /// <summary>Letters that fit a tile beside "Not right".</summary>
    private const int OneLine = 14;

    /// <summary>What stays to be put right on the saw until the next check; empty: nothing that was looked at.</summary>
    public static string ToPutRight(StartCheck? check) => check is null ? "" : string.Join(", ", OnTheSaw(check));

    /// <summary>The same on a tile of the Floor, in one line; null: nothing that was looked at.</summary>
    public static string? OnTile(StartCheck? check)
    {
        if (check?.SawNotRight != true)
        {
            return null;
        }

        string[] found = [.. new[] { check.GuardsRight ? null : "guards", check.UnderTableRight ? null : "under table", check.BrakeRight ? null : "brake" }.OfType<string>()];
        string all = string.Join(", ", found);
        return $"Not right: {(all.Length <= OneLine ? all : $"{found.Length} things")}";
    }

    /// <summary>Everything found not right, tension and clicking too.</summary>
    public static IReadOnlyList<string> NotRight(StartCheck check, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(check);
        List<string> found = [.. OnTheSaw(check)];
        if (check.TensionRight == false)
        {
            found.Add(units.PullName);
        }

        if (check.QuietRight == false)
        {
            found.Add("it clicks");
        }

        return found;
    }

    /// <summary>"nothing found not right", or what was.</summary>
    public static string Says(StartCheck check, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(check);
        var found = NotRight(check, units);
        string note = check.Note is { } n ? $"; {n.TrimEnd('.')}" : "";
        return (found.Count == 0 ? "all that was looked at was right" : $"not right: {string.Join(", ", found)}") + note;
    }

    private static IEnumerable<string> OnTheSaw(StartCheck check)
    {
        if (!check.GuardsRight)
        {
            yield return "guards or doors";
        }

        if (!check.UnderTableRight)
        {
            yield return "guard under the table or mouthpiece";
        }

        if (!check.BrakeRight)
        {
            yield return "brake or run-down";
        }
    }
}
