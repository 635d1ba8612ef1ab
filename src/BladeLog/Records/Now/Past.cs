using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>
/// One line of the record with what it says; an edit of a thing says nothing beyond its kind. A struck-out line stays,
/// with who struck it out and why.
/// </summary>
public sealed record PastEntry(Entry Entry, Fact? Fact);

/// <summary>A stretch of the record, and whether older lines follow it.</summary>
public sealed record PastPage(IReadOnlyList<PastEntry> Lines, bool More);

/// <summary>What happened, read back, struck-out lines among the rest: the one reader of the past.</summary>
public static class Past
{
    private const string Void = "Void";

    /// <summary>Everything that was entered, what was entered last first.</summary>
    public static Task<PastPage> OfShop(ShopDb db, int most, int skip = 0) =>
        Page(db, Entries(db).Where(e => e.Kind != Void).OrderByDescending(e => e.Id), most, skip);

    /// <summary>What happened to a blade, the newest first.</summary>
    public static Task<PastPage> OfBlade(ShopDb db, int bladeId, int most) => Page(db, Newest(db, PastIds.OfBlade(db, bladeId)), most);

    /// <summary>What happened at a saw, the newest first. Hours that came of a meter reading are told by the reading.</summary>
    public static Task<PastPage> OfSaw(ShopDb db, int sawId, int most) => Page(db, Newest(db, PastIds.OfSaw(db, sawId)), most);

    /// <summary>One line; null where there is none.</summary>
    public static async Task<PastEntry?> Of(ShopDb db, int entryId) =>
        (await Page(db, Entries(db).Where(e => e.Id == entryId).OrderBy(e => e.Id), 1)).Lines.SingleOrDefault();

    /// <summary>The facts of one kind that stand, the oldest first, with who entered them.</summary>
    public static IOrderedQueryable<T> Standing<T>(IQueryable<T> facts)
        where T : Fact => facts.AsNoTracking().Include(f => f.Entry.Person).OrderBy(f => f.Entry.AtUtc).ThenBy(f => f.EntryId);

    private static IQueryable<Entry> Entries(ShopDb db) =>
        db.Entries.AsNoTracking().Include(e => e.Person).Include(e => e.Void!.Entry.Person);

    private static IOrderedQueryable<Entry> Newest(ShopDb db, IQueryable<int> ids) =>
        Entries(db).Where(e => ids.Contains(e.Id)).OrderByDescending(e => e.AtUtc).ThenByDescending(e => e.Id);

    private static async Task<PastPage> Page(ShopDb db, IOrderedQueryable<Entry> entries, int most, int skip = 0)
    {
        // One line beyond the page tells whether there are more.
        var read = await entries.Skip(skip).Take(Math.Min(most, int.MaxValue - 1) + 1).ToListAsync();
        var page = read.Take(most).ToList();
        var facts = new Dictionary<int, Fact>();
        foreach (var kind in page.GroupBy(e => e.Kind))
        {
            foreach (var fact in await PastFacts.Read(db, kind.Key, [.. kind.Select(e => e.Id)]))
            {
                facts[fact.EntryId] = fact;
            }
        }

        return new PastPage([.. page.Select(e => new PastEntry(e, facts.GetValueOrDefault(e.Id)))], read.Count > most);
    }
}
