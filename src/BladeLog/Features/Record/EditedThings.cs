using System.Text.Json;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Record;

/// <summary>What edits changed, read from the history the things keep: which thing, and each figure from what to what.</summary>
internal sealed class EditedThings(IReadOnlyDictionary<int, string> words)
{
    private const int MostTags = 12;

    private static readonly string[] Edits = [nameof(EditSaw), nameof(EditSpec), nameof(EditBlade), nameof(EditPerson), nameof(SaveShop), nameof(SaveSetting), nameof(EditCut), nameof(SaveLanName)];

    /// <summary>", Q-17: width 13 mm to 12.8 mm" of an entry; nothing where its history does not say.</summary>
    public string Of(int entryId) => words.GetValueOrDefault(entryId, "");

    public static async Task<EditedThings> Read(ShopDb db, IReadOnlyCollection<Entry> entries, ShopUnits units)
    {
        Dictionary<int, string> words = [];
        await Added(db, [.. entries.Where(e => e.Kind == nameof(AddBlades))], words);
        Entry[] edits = [.. entries.Where(e => Edits.Contains(e.Kind))];
        DateTime[] times = [.. edits.Select(e => e.EnteredUtc).Distinct()];
        if (times.Length == 0)
        {
            return new EditedThings(words);
        }

        List<ThingHistory> histories = await db.ThingHistories.AsNoTracking().Where(h => times.Contains(h.EditedUtc)).OrderBy(h => h.Id).ToListAsync();
        foreach (Entry entry in edits)
        {
            List<string> parts = [];
            foreach (ThingHistory h in histories.Where(h => h.EditedUtc == entry.EnteredUtc && h.PersonId == entry.PersonId && h.Thing == Thing(entry.Kind)))
            {
                JsonElement before = JsonDocument.Parse(h.Before).RootElement;
                if (await After(db, h, before) is { } after)
                {
                    parts.Add(ChangeWords.Of(h.Thing, before, after, units));
                }
            }

            words[entry.Id] = string.Join("; ", parts.Where(p => p.Length > 0)) is { Length: > 0 } said ? ": " + said : "";
        }

        return new EditedThings(words);
    }

    private static async Task Added(ShopDb db, IReadOnlyCollection<Entry> entries, Dictionary<int, string> words)
    {
        DateTime[] times = [.. entries.Select(e => e.AtUtc).Distinct()];
        if (times.Length == 0)
        {
            return;
        }

        var blades = await db.Blades.AsNoTracking().Where(b => times.Contains(b.AddedUtc)).OrderBy(b => b.Id).Select(b => new { b.Tag, b.AddedUtc }).ToListAsync();
        var same = await db.Entries.AsNoTracking().Where(e => e.Kind == nameof(AddBlades) && times.Contains(e.AtUtc)).OrderBy(e => e.Id).Select(e => new { e.Id, e.AtUtc }).ToListAsync();
        foreach (Entry entry in entries)
        {
            string[] tags = [.. blades.Where(b => b.AddedUtc == entry.AtUtc).Select(b => b.Tag)];
            int[] ids = [.. same.Where(e => e.AtUtc == entry.AtUtc).Select(e => e.Id)];
            // A file brings each blade in by an entry of its own, all of one moment.
            tags = ids.Length > 1 && ids.Length == tags.Length ? [tags[Array.IndexOf(ids, entry.Id)]] : tags;
            words[entry.Id] = tags.Length == 0 ? "" : ": " + string.Join(", ", tags.Take(MostTags)) + (tags.Length > MostTags ? $" and {tags.Length - MostTags} more" : "");
        }
    }

    private static string Thing(string kind) => kind switch
    {
        nameof(EditSaw) => nameof(Saw),
        nameof(EditSpec) => nameof(Spec),
        nameof(EditBlade) => nameof(Blade),
        nameof(EditPerson) => nameof(Person),
        nameof(EditCut) => nameof(QueuedCut),
        nameof(SaveSetting) => nameof(Setting),
        _ => nameof(Shop),
    };

    /// <summary>The next edit's before is this one's after; the last one's is the thing as it is.</summary>
    private static async Task<JsonElement?> After(ShopDb db, ThingHistory h, JsonElement before)
    {
        bool setting = h.Thing == nameof(Setting);
        string? key = setting ? before.GetProperty(nameof(Setting.Key)).GetString() : null;
        List<ThingHistory> later = await db.ThingHistories.AsNoTracking().Where(x => x.Thing == h.Thing && x.ThingId == h.ThingId && x.Id > h.Id).OrderBy(x => x.Id).ToListAsync();
        foreach (ThingHistory next in later)
        {
            JsonElement then = JsonDocument.Parse(next.Before).RootElement;
            if (!setting || then.GetProperty(nameof(Setting.Key)).GetString() == key)
            {
                return then;
            }
        }

        object? now = h.Thing switch
        {
            nameof(Saw) => await db.Saws.FindAsync(h.ThingId),
            nameof(Spec) => await db.Specs.FindAsync(h.ThingId),
            nameof(Blade) => await db.Blades.FindAsync(h.ThingId),
            nameof(Person) => await db.People.FindAsync(h.ThingId),
            nameof(QueuedCut) => await db.QueuedCuts.FindAsync(h.ThingId),
            nameof(Setting) => await db.Settings.FindAsync(key) ?? (object)new { Key = key, Value = (double?)null },
            _ => await db.Shops.FindAsync(h.ThingId),
        };
        return now switch
        {
            null => null,
            Thing thing => JsonSerializer.SerializeToElement(db.Entry(thing).Properties.ToDictionary(p => p.Metadata.Name, p => p.CurrentValue)),
            _ => JsonSerializer.SerializeToElement(now),
        };
    }
}
