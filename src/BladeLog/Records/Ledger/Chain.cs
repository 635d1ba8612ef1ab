using System.Collections.Concurrent;
using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata;
using Microsoft.EntityFrameworkCore.Storage;

namespace BladeLog.Records;

/// <summary>
/// Each line of the ledger carries the hash of the line before it and its own: SHA-256 over the hash before and over what
/// the line and its facts say. What was changed or taken out behind the program's back no longer fits.
/// </summary>
/// <remarks>
/// What is null is left out, so that a later version may add columns. A line cut off at the very end cannot be told from
/// one that was never written; a copy kept elsewhere tells.
/// </remarks>
public static class Chain
{
    private static readonly ConcurrentDictionary<IEntityType, IReadOnlyList<Column>> Columns = new();

    /// <summary>The hashes of entries that have their numbers, with their facts, in the order of the chain.</summary>
    internal static IEnumerable<(Entry Entry, byte[]? Previous, byte[] Hash)> Links(ShopDb db, IEnumerable<Entry> entries, IEnumerable<Fact> made, byte[]? previous)
    {
        var facts = made.ToLookup(f => f.EntryId, f => Hash(db, f));
        foreach (var entry in entries.OrderBy(e => e.Id))
        {
            var hash = Hash(db, entry, previous, facts[entry.Id]);
            yield return (entry, previous, hash);
            previous = hash;
        }
    }

    /// <summary>Chains entries just saved to the line before them, in the transaction under way.</summary>
    /// <remarks>By plain commands: two more round trips of the change tracker would cost more than the write itself.</remarks>
    internal static async Task Seal(ShopDb db, IReadOnlyCollection<Entry> entries, IEnumerable<Fact> made)
    {
        await using var command = db.Database.GetDbConnection().CreateCommand();
        command.Transaction = db.Database.CurrentTransaction?.GetDbTransaction();
        var id = Parameter("@id");
        id.Value = entries.Min(e => e.Id);
        command.CommandText = "select hash from entry where id < @id order by id desc limit 1";
        var before = await command.ExecuteScalarAsync() as byte[];
        command.CommandText = "update entry set previous_hash = @previous, hash = @hash where id = @id";
        var (previous, hash) = (Parameter("@previous"), Parameter("@hash"));
        foreach (var link in Links(db, entries, made, before))
        {
            (id.Value, previous.Value, hash.Value) = (link.Entry.Id, link.Previous ?? (object)DBNull.Value, link.Hash);
            await command.ExecuteNonQueryAsync();
        }

        System.Data.Common.DbParameter Parameter(string name)
        {
            var parameter = command.CreateParameter();
            parameter.ParameterName = name;
            command.Parameters.Add(parameter);
            return parameter;
        }
    }

    /// <summary>The first line that does not fit, in a sentence; null where all fit.</summary>
    public static async Task<string?> FirstBreak(ShopDb db)
    {
        var hashes = new List<(int EntryId, byte[] Hash)>();
        foreach (var type in db.Model.GetEntityTypes().Where(t => t.ClrType.IsSubclassOf(typeof(Fact))))
        {
            var read = typeof(Chain).GetMethod(nameof(Hashes), System.Reflection.BindingFlags.NonPublic | System.Reflection.BindingFlags.Static)!;
            hashes.AddRange(await (Task<List<(int, byte[])>>)read.MakeGenericMethod(type.ClrType).Invoke(null, [db])!);
        }

        var facts = hashes.ToLookup(h => h.EntryId, h => h.Hash);
        byte[]? previous = null;
        await foreach (var entry in db.Entries.AsNoTracking().OrderBy(e => e.Id).AsAsyncEnumerable())
        {
            if (entry.Hash is null)
            {
                // Lines from before hashes were kept stand at the head.
                if (previous is not null)
                {
                    return $"Entry {entry.Id} has no place in the chain: it was not written by this program.";
                }

                continue;
            }

            if (!Same(entry.PreviousHash, previous))
            {
                return $"Entry {entry.Id} does not fit the one before it: an entry was taken out or put in there.";
            }

            if (!Same(entry.Hash, Hash(db, entry, previous, facts[entry.Id])))
            {
                return $"Entry {entry.Id} ({entry.Kind}) is not as it was written: it or its fact was changed afterwards.";
            }

            previous = entry.Hash;
        }

        return null;
    }

    private static async Task<List<(int EntryId, byte[] Hash)>> Hashes<T>(ShopDb db)
        where T : Fact
    {
        IQueryable<T> facts = db.Set<T>().AsNoTracking().IgnoreQueryFilters();
        if (facts is IQueryable<SawSetup> setups)
        {
            facts = (IQueryable<T>)setups.Include(s => s.Wheels).Include(s => s.Speeds).AsSplitQuery();
        }

        var hashes = new List<(int, byte[])>();
        await foreach (var fact in facts.AsAsyncEnumerable())
        {
            hashes.Add((fact.EntryId, Hash(db, fact)));
        }

        return hashes;
    }

    private static byte[] Hash(ShopDb db, Entry entry, byte[]? previous, IEnumerable<byte[]> facts)
    {
        using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        hash.AppendData(previous ?? []);
        hash.AppendData(Encoding.UTF8.GetBytes(Text(db, entry)));
        foreach (var fact in facts.OrderBy(Convert.ToHexString, StringComparer.Ordinal))
        {
            hash.AppendData(fact);
        }

        return hash.GetHashAndReset();
    }

    private static byte[] Hash(ShopDb db, Fact fact)
    {
        var text = Text(db, fact);
        if (fact is SawSetup setup)
        {
            text += string.Concat(setup.Wheels.OrderBy(w => w.Position).Select(w => Text(db, w)).Concat(setup.Speeds.OrderBy(s => s.Position).Select(s => Text(db, s))));
        }

        return SHA256.HashData(Encoding.UTF8.GetBytes(text));
    }

    /// <summary>The row as it is stored: its table, then each column that holds something, by name, with the length of its value so that no two rows read alike.</summary>
    private static string Text(ShopDb db, object row)
    {
        var type = db.Model.FindEntityType(row.GetType())!;
        var text = new StringBuilder(type.GetTableName()).Append('\n');
        foreach (var column in Columns.GetOrAdd(type, Of))
        {
            if (column.Read(row) is { } value)
            {
                text.Append(column.Name).Append(' ').Append(value.Length).Append(' ').Append(value).Append('\n');
            }
        }

        return text.ToString();
    }

    private static IReadOnlyList<Column> Of(IEntityType type) =>
    [
        .. type.GetProperties()
            .Where(p => p.PropertyInfo is not null && p.Name is not (nameof(Entry.Hash) or nameof(Entry.PreviousHash)))
            .Where(p => type.ClrType == typeof(Entry) || !p.IsPrimaryKey() || p.Name == nameof(Fact.EntryId))
            .OrderBy(p => p.GetColumnName(), StringComparer.Ordinal)
            .Select(p => new Column(p.GetColumnName(), p)),
    ];

    private static bool Same(byte[]? one, byte[]? other) => (one ?? []).AsSpan().SequenceEqual(other ?? []);

    private sealed record Column(string Name, IProperty Property)
    {
        public string? Read(object row)
        {
            var value = Property.PropertyInfo!.GetValue(row);
            return (value is null ? null : Property.GetTypeMapping().Converter?.ConvertToProvider(value) ?? value) switch
            {
                null => null,
                double number => number.ToString("R", CultureInfo.InvariantCulture),
                DateTime time => (time.Ticks / TimeSpan.TicksPerMillisecond).ToString(CultureInfo.InvariantCulture),
                byte[] bytes => Convert.ToHexString(bytes),
                IFormattable other => other.ToString(null, CultureInfo.InvariantCulture),
                var other => other.ToString(),
            };
        }
    }
}
