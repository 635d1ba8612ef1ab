using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata;

namespace BladeLog.Records.Configuration;

/// <summary>
/// CHECK constraints made from the columns' names. SQLite stores Infinity without a word, so every REAL column refuses
/// it; a length, speed, pull or power must be above zero unless it is listed as one that may be zero.
/// </summary>
public static class Checks
{
    private static readonly HashSet<string> MayBeZero =
    [
        "lower_guide_m", "clearance_m", "idle_w", "crack_length_m", "angle_rad", "bevel_rad", "set_left_m", "set_right_m",
    ];

    private static readonly string[] AboveZero = ["_m", "_m2", "_mps", "_pa", "_w", "_n", "_n_per_m", "_hrc", "_h"];

    private static readonly HashSet<string> AnySign = ["rake_rad", "angle_rad", "value", "start_reading_ms", "count"];

    /// <summary>Whole numbers that must be above zero.</summary>
    private static readonly HashSet<string> WholeAboveZero = ["running_ms", "ms", "pieces", "number", "version"];

    /// <summary>The tables that carry such constraints, to read a constraint's name again.</summary>
    internal static IReadOnlyCollection<string> Tables { get; } =
        [.. typeof(ShopDb).Assembly.GetTypes().Where(t => t.Namespace == typeof(ShopDb).Namespace && t is { IsClass: true, IsAbstract: false }).Select(Naming.Table)];

    internal static bool MayBeZeroOrLess(string column) =>
        MayBeZero.Contains(column) || AnySign.Contains(column) || !(IsAboveZero(column) || WholeAboveZero.Contains(column));

    public static void Apply(IMutableModel model)
    {
        foreach (var entity in model.GetEntityTypes())
        {
            foreach (var property in entity.GetProperties())
            {
                var rule = Rule(property.GetColumnName(), Nullable.GetUnderlyingType(property.ClrType) ?? property.ClrType);
                if (rule is not null)
                {
                    entity.AddCheckConstraint($"ck_{entity.GetTableName()}_{property.GetColumnName()}", rule);
                }
            }
        }
    }

    private static string? Rule(string column, Type type)
    {
        var quoted = $"\"{column}\"";
        if (type == typeof(double))
        {
            if (AnySign.Contains(column))
            {
                return $"{quoted} > -1e300 and {quoted} < 1e300";
            }

            return IsAboveZero(column)
                ? $"{quoted} > 0 and {quoted} < 1e300"
                : $"{quoted} >= 0 and {quoted} < 1e300";
        }

        if (type == typeof(long) || type == typeof(int))
        {
            if (AnySign.Contains(column) || column.EndsWith("id", StringComparison.Ordinal))
            {
                return null;
            }

            return WholeAboveZero.Contains(column) ? $"{quoted} > 0" : $"{quoted} >= 0";
        }

        return null;
    }

    private static bool IsAboveZero(string column) =>
        !MayBeZero.Contains(column) && (column == "meter_factor" || AboveZero.Any(s => column.EndsWith(s, StringComparison.Ordinal)));
}
