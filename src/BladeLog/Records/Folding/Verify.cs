using System.Globalization;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Folding;

/// <summary>Compares what is kept with what the facts say, and asks SQLite about the file itself. Says every difference in words.</summary>
public static class Verify
{
    public static async Task<IReadOnlyList<string>> Run(ShopDb db)
    {
        var found = new List<string>();
        foreach (var (sql, what) in new[] { ("PRAGMA integrity_check", "The file"), ("PRAGMA foreign_key_check", "A reference") })
        {
            found.AddRange((await Pragma(db, sql)).Where(line => line != "ok").Select(line => $"{what} is damaged: {line}"));
        }

        if (await Chain.FirstBreak(db) is { } broken)
        {
            found.Add(broken);
        }

        found.AddRange(await Kept(db));
        return found;
    }

    /// <summary>The kept state alone, without the check of the file.</summary>
    public static async Task<IReadOnlyList<string>> Kept(ShopDb db)
    {
        var found = new List<string>();
        foreach (var (first, second) in Spells.Overlaps(await FactReader.ReadSpells(db)))
        {
            found.Add($"Entries {first.MountId} and {second.MountId} put a blade in two places or two blades on a saw at {second.From:O}.");
        }

        var should = await Folding.Kept.Recount(db);
        Compare(found, "Blade on saw", await db.OnSaws.AsNoTracking().ToListAsync(), should.OnSaws, o => $"{o.SawId}", o => $"blade {o.BladeId} by entry {o.MountId}");
        Compare(found, "State of blade", await db.BladesNow.AsNoTracking().ToListAsync(), should.BladesNow, b => $"{b.BladeId}", Words);
        Compare(found, "Share of run", await db.RunShares.AsNoTracking().ToListAsync(), should.Shares, s => $"{s.RunId}, spell {s.MountId}, setup {s.SetupId}", s => $"{s.Ms} ms");
        Compare(found, "Running of spell", await db.Exposures.AsNoTracking().ToListAsync(), should.Exposures,
            e => string.Create(CultureInfo.InvariantCulture, $"{e.MountId}, setup {e.SetupId}, {e.SpeedMps:R} m/s"), e => $"{e.RunningMs} ms");
        Compare(found, "Wood path of spell", await db.WoodPaths.AsNoTracking().ToListAsync(), should.Paths,
            p => $"{p.MountId}, wood {p.WoodClass}, {p.Dirt}", p => $"{p.PathMm} mm, {p.AreaMm2} mm², {p.CutMs} ms");
        return found;
    }

    private static string Words(BladeNow b) => string.Create(
        CultureInfo.InvariantCulture,
        $"{b.Place}, saw {b.SawId}, hook {b.Hook}, width {b.WidthM:R} m, loop {b.LoopM:R} m, joint {b.JointId}, hold {b.HoldId}");

    private static void Compare<T>(List<string> found, string what, IEnumerable<T> kept, IEnumerable<T> should, Func<T, string> key, Func<T, string> words)
    {
        var keptRows = Rows(kept, key, words);
        var shouldRows = Rows(should, key, words);
        foreach (var k in keptRows.Keys.Union(shouldRows.Keys).Order(StringComparer.Ordinal))
        {
            var has = keptRows.GetValueOrDefault(k);
            var wants = shouldRows.GetValueOrDefault(k);
            if (has != wants)
            {
                found.Add($"{what} {k}: kept {has ?? "nothing"}, the facts say {wants ?? "nothing"}.");
            }
        }
    }

    private static Dictionary<string, string> Rows<T>(IEnumerable<T> rows, Func<T, string> key, Func<T, string> words) =>
        rows.GroupBy(key).ToDictionary(g => g.Key, g => string.Join(" and ", g.Select(words)));

    private static async Task<List<string>> Pragma(ShopDb db, string sql)
    {
        await db.Database.OpenConnectionAsync();
        try
        {
            await using var command = db.Database.GetDbConnection().CreateCommand();
#pragma warning disable CA2100 // One of the two constants above.
            command.CommandText = sql;
#pragma warning restore CA2100
            await using var reader = await command.ExecuteReaderAsync();
            var lines = new List<string>();
            while (await reader.ReadAsync())
            {
                lines.Add(string.Join(" ", Enumerable.Range(0, reader.FieldCount).Select(i => Convert.ToString(reader.GetValue(i), CultureInfo.InvariantCulture))));
            }

            return lines;
        }
        finally
        {
            await db.Database.CloseConnectionAsync();
        }
    }
}
