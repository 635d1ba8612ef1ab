using System.Text.Json;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.ChangeTracking;

namespace BladeLog.Records;

/// <summary>Facts are written once; things keep their history. The database's triggers hold the same rule against everybody else.</summary>
public static class RecordRules
{
    private static readonly HashSet<string> ChainColumns = [nameof(Entry.Hash), nameof(Entry.PreviousHash)];

    /// <summary>A time as it is stored: UTC, whole milliseconds. A local time here would be a mistake in the program.</summary>
    public static DateTime Store(DateTime time) => time.Kind == DateTimeKind.Local
        ? throw new ArgumentException("A time to be stored must be UTC.", nameof(time))
        : new DateTime(time.Ticks - time.Ticks % TimeSpan.TicksPerMillisecond, DateTimeKind.Utc);

    internal static void Guard(ShopDb db)
    {
        var histories = new List<ThingHistory>();
        foreach (var row in db.ChangeTracker.Entries())
        {
            switch (row.Entity)
            {
                case Entry or Fact or SetupWheel or SetupSpeed when row.State is EntityState.Modified or EntityState.Deleted:
                    if (!OnlyFillsTheChain(row))
                    {
                        throw new InvalidOperationException($"{row.Metadata.ClrType.Name} is written once: void it and enter it again.");
                    }

                    break;
                case Thing thing when row.State == EntityState.Added:
                    thing.Uid = thing.Uid == Guid.Empty ? Guid.NewGuid() : thing.Uid;
                    thing.Version = Math.Max(thing.Version, 1);
                    break;
                case Thing when row.State == EntityState.Deleted:
                    throw new InvalidOperationException($"{row.Metadata.ClrType.Name} is never deleted: it is put out of use.");
                case Thing thing when row.State == EntityState.Modified:
                    histories.AddRange(Edit(db, row, thing));
                    break;
                default:
                    break;
            }
        }

        db.AddRange(histories);
    }

    private static bool OnlyFillsTheChain(EntityEntry row) =>
        row is { State: EntityState.Modified, Entity: Entry }
        && row.Properties.All(p => !p.IsModified || (ChainColumns.Contains(p.Metadata.Name) && p.OriginalValue is null));

    private static IEnumerable<ThingHistory> Edit(ShopDb db, EntityEntry row, Thing thing)
    {
        var version = row.Property(nameof(Thing.Version));
        var before = (int)version.OriginalValue!;
        thing.Version = before + 1;
        var edited = row.Properties.Any(p => p.IsModified && p.Metadata.Name != nameof(Thing.Version) && !Equals(p.OriginalValue, p.CurrentValue));
        if (!edited)
        {
            // The version alone moves when something happens to a thing, such as a blade swapped on a saw.
            yield break;
        }

        var (at, person) = db.Editing ?? throw new InvalidOperationException("A thing is edited through the writer, which knows who and when.");
        yield return new ThingHistory
        {
            Thing = row.Metadata.ClrType.Name,
            ThingId = thing.Id,
            Version = before,
            EditedUtc = at,
            PersonId = person,
            Before = JsonSerializer.Serialize(row.Properties.ToDictionary(p => p.Metadata.Name, p => p.OriginalValue)),
        };
    }
}
