using System.Data.Common;
using System.Globalization;
using Microsoft.EntityFrameworkCore.Diagnostics;

namespace BladeLog.Records;

/// <summary>
/// What every connection is set to, and read back: foreign keys enforced, each commit on the disk before it is
/// acknowledged, five seconds of patience with another writer. None of this is kept in the file.
/// </summary>
public sealed class Pragmas(bool synchronous = true) : DbConnectionInterceptor
{
    /// <summary>Older releases (3.7.0 to 3.51.2) can spoil the file when a checkpoint and a commit race on two connections.</summary>
    public static readonly Version LeastSqlite = new(3, 51, 3);

    private static readonly (string Name, string Set, long Read)[] Settings =
    [
        ("busy_timeout", "5000", 5000),
        ("foreign_keys", "ON", 1),
        ("synchronous", "FULL", 2),
        ("trusted_schema", "OFF", 0),
        ("cell_size_check", "ON", 1),
        ("cache_size", "-32000", -32000),
        ("mmap_size", "0", 0),
    ];

    public override void ConnectionOpened(DbConnection connection, ConnectionEndEventData eventData) => Apply(connection);

    public override Task ConnectionOpenedAsync(DbConnection connection, ConnectionEndEventData eventData, CancellationToken cancellationToken = default)
    {
        Apply(connection);
        return Task.CompletedTask;
    }

    /// <summary>Every setting read back from an open connection, as name and value.</summary>
    public static IReadOnlyList<(string Name, long Value)> ReadBack(DbConnection connection) =>
        [.. Settings.Select(s => (s.Name, Read(connection, s.Name)))];

    internal void Apply(DbConnection connection)
    {
        using var command = connection.CreateCommand();
        command.CommandText = synchronous ? SetAll : SetAll + "PRAGMA synchronous=OFF;";
        command.ExecuteNonQuery();
        foreach (var (name, _, wanted) in Settings)
        {
            var got = Read(connection, name);
            if (got != wanted && (synchronous || name != "synchronous"))
            {
                throw new InvalidOperationException($"SQLite did not take the setting {name}: wanted {wanted}, got {got}.");
            }
        }
    }

    private static readonly string SetAll = string.Concat(Settings.Select(s => $"PRAGMA {s.Name}={s.Set};"));

    private static long Read(DbConnection connection, string name)
    {
        using var command = connection.CreateCommand();
#pragma warning disable CA2100 // The names are the constants above.
        command.CommandText = $"PRAGMA {name}";
#pragma warning restore CA2100
        return command.ExecuteScalar() is { } value ? Convert.ToInt64(value, CultureInfo.InvariantCulture) : 0;
    }
}
