using System.Text.RegularExpressions;
using Microsoft.Data.Sqlite;

namespace BladeLog.Records.Writing;

/// <summary>What the database refuses, in words: the last net under the forms' own checks.</summary>
internal static partial class ConstraintWords
{
    private static readonly Dictionary<string, Problem> Special = new()
    {
        ["ck_spec_gullet_in_width"] = new("GulletDepthM", "The gullet must be less deep than the blade is wide."),
        ["ck_spec_least_width"] = new("LeastWidthM", "The least width must not be more than the width when new."),
        ["ck_spec_pitch_order"] = new("PitchFineM", "The fine pitch must not be coarser than the coarse one."),
        ["ck_spec_kerf_over_body"] = new("KerfM", "The kerf must be wider than the body is thick."),
        ["ck_spec_body_in_width"] = new("ThicknessM", "The blade must be wider than it is thick."),
        ["ck_blade_tag"] = new("Tag", "A tag is 1 to 12 of A to Z, 0 to 9, hyphen and full stop."),
        ["ck_queued_cut_nail"] = new("NailChance", "The chance of a nail is between 0 and 1."),
        ["ck_queued_cut_bevel"] = new("BevelRad", "The bevel must be less than 90 degrees."),
        ["ck_saw_setup_loop"] = new("LoopM", "The loop must lie inside the take-up: shortest, nominal, longest."),
        ["ck_saw_setup_width"] = new("WidthMostM", "The widest blade must not be narrower than the narrowest."),
        ["ck_saw_setup_meter_factor_range"] = new("MeterFactor", "The meter factor is between 0 and 1."),
        ["ck_saw_setup_tilt"] = new("TiltMostRad", "The tilt must be less than 90 degrees."),
        ["ck_run_window"] = new("UntilUtc", "The end must be after the beginning."),
        ["ck_sharpening_gullet"] = new("GulletM", "The gullet must be less deep than the blade is wide."),
        ["ck_kerf_reading_says_something"] = new("KerfM", "Write the kerf, or the set."),
        ["ck_kerf_reading_both_sides"] = new("SetLeftM", "Write the set of both sides, or both together."),
        ["ck_prior_use_range"] = new("UsedHigh", "The upper end must not be below the lower one."),
        ["ck_break_window"] = new("LatestUtc", "The latest time must not be before the earliest."),
        ["ck_break_hours"] = new("HoursHigh", "The upper hours must not be below the lower ones."),
    };

    public static Problem? Of(SqliteException error)
    {
        if (error.SqliteErrorCode != 19)
        {
            return null;
        }

        if (CheckName().Match(error.Message) is { Success: true } check)
        {
            var name = check.Groups[1].Value;
            return Special.TryGetValue(name, out var known) ? known : Column(name);
        }

        if (UniqueName().Match(error.Message) is { Success: true } unique)
        {
            var field = Pascal(unique.Groups[2].Value);
            return new Problem(field, $"This {Words(unique.Groups[2].Value)} is taken already.");
        }

        return error.Message.Contains("never used again", StringComparison.Ordinal)
            ? new Problem("Tag", "This tag was used before, and a tag is never used again.")
            : null;
    }

    private static Problem Column(string check)
    {
        // The name is ck_<table>_<column>; the longest table name that fits leaves the column.
        var table = Configuration.Checks.Tables.Where(t => check.StartsWith($"ck_{t}_", StringComparison.Ordinal)).MaxBy(t => t.Length) ?? "";
        var column = check[$"ck_{table}_".Length..];
        var rule = Configuration.Checks.MayBeZeroOrLess(column) ? "a number" : "a number above zero";
        return new Problem(Pascal(column), $"The {Words(column)} must be {rule}.");
    }

    private static string Words(string column) =>
        UnitSuffix().Replace(column, "").Replace('_', ' ');

    private static string Pascal(string column) =>
        string.Concat(column.Split('_').Select(part => char.ToUpperInvariant(part[0]) + part[1..]));

    [GeneratedRegex("CHECK constraint failed: (\\w+)")]
    private static partial Regex CheckName();

    [GeneratedRegex("UNIQUE constraint failed: (\\w+)\\.(\\w+)")]
    private static partial Regex UniqueName();

    [GeneratedRegex("_(m|mps|pa|w|n|n_per_m|hrc|h|rad|ms|pct|minor|utc|id)$")]
    private static partial Regex UnitSuffix();
}
