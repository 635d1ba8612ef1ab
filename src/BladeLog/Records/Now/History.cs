using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>A word of a line of the record and what it says: a text, or a number with its SI unit for the page to show in the shop's own.</summary>
public readonly record struct HistoryPart(string Word, string? Text = null, double? Value = null, string? Unit = null);

/// <summary>Who struck a line out, when and why.</summary>
public sealed record StruckOut(int EntryId, DateTime When, string? Person, string Reason);

/// <summary>One line of the record, struck out or not.</summary>
public sealed record HistoryRow(
    int EntryId,
    DateTime AtUtc,
    DateTime EnteredUtc,
    string Kind,
    string? Tag,
    string? Saw,
    IReadOnlyList<HistoryPart> Parts,
    string? Person,
    string? Device,
    StruckOut? StruckOut);

/// <summary>The record as it reads: newest first, what was struck out left to be seen.</summary>
public static class History
{
    public static Task<IReadOnlyList<HistoryRow>> OfBlade(ShopDb db, int bladeId, int take = 50, int skip = 0) =>
        Read(db, HistoryKinds.EntriesOfBlade(db, bladeId), take, skip);

    public static Task<IReadOnlyList<HistoryRow>> OfSaw(ShopDb db, int sawId, int take = 50, int skip = 0) =>
        Read(db, HistoryKinds.EntriesOfSaw(db, sawId), take, skip);

    public static Task<IReadOnlyList<HistoryRow>> All(ShopDb db, int take = 50, int skip = 0) => Read(db, null, take, skip);

    private static async Task<IReadOnlyList<HistoryRow>> Read(ShopDb db, IQueryable<int>? of, int take, int skip)
    {
        var entries = db.Entries.AsNoTracking().Where(e => e.Kind != "Void");
        if (of is not null)
        {
            entries = entries.Where(e => of.Contains(e.Id));
        }

        var page = await entries.OrderByDescending(e => e.AtUtc).ThenByDescending(e => e.Id).Skip(skip).Take(take)
            .Select(e => new
            {
                e.Id,
                e.AtUtc,
                e.EnteredUtc,
                e.Kind,
                Person = e.Person!.Initials,
                e.Device,
                VoidId = (int?)e.Void!.EntryId,
                VoidWhen = (DateTime?)e.Void.Entry.EnteredUtc,
                VoidWho = e.Void.Entry.Person!.Initials,
                VoidWhy = e.Void.Reason,
            })
            .ToListAsync();
        var said = new Dictionary<int, FactWords>();
        foreach (var kind in page.GroupBy(e => e.Kind))
        {
            foreach (var one in await HistoryKinds.Say(db, kind.Key, [.. kind.Select(e => e.Id)]))
            {
                said[one.EntryId] = one;
            }
        }

        return
        [
            .. page.Select(e =>
            {
                var one = said.GetValueOrDefault(e.Id);
                var struck = e.VoidId is { } id ? new StruckOut(id, e.VoidWhen!.Value, e.VoidWho, e.VoidWhy!) : null;
                return new HistoryRow(e.Id, e.AtUtc, e.EnteredUtc, e.Kind, one?.Tag, one?.Saw, one?.Parts ?? [], e.Person, e.Device, struck);
            }),
        ];
    }
}

/// <summary>What a fact says of itself.</summary>
internal sealed record FactWords(int EntryId, string? Tag, string? Saw, params HistoryPart[] Parts);
