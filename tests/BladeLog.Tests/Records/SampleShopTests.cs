using System.Diagnostics;
using BladeLog.Handbook.Tables;
using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Sample;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Records;

/// <summary>The invented shop, loaded from its files into a shop of its own.</summary>
public sealed class SampleShopTests(SampleShopTests.Loaded loaded) : IClassFixture<SampleShopTests.Loaded>
{
    // Run hours, sharpenings in the blade's own name, width now in mm, wood path since the last sharpening in km: as the
    // invented shop was laid out, before any file of it was made.
    private static readonly (string Tag, double Hours, int Sharpenings, double WidthMm, double PathKm)[] Blades =
    [
        ("Q-01", 212, 9, 35.4, 1.2), ("Q-02", 148, 6, 23.6, 0.4), ("Q-03", 61, 2, 12.6, 0.8), ("Q-04", 63, 4, 37.0, 0),
        ("Q-05", 305, 14, 43.0, 0.3), ("Q-06", 26, 1, 21.8, 2.0), ("Q-04b", 34, 2, 36.6, 1.0), ("Q-07", 118, 3, 37.4, 0),
        ("Q-08", 64, 1, 37.8, 0.5), ("Q-09", 310, 9, 20.6, 2.4), ("Q-10", 88, 4, 18.2, 0), ("Q-11", 45, 1, 12.8, 0.1),
        ("Q-12", 19, 0, 6, 1.0), ("Q-13", 72, 3, 24.4, 0.6), ("Q-14", 133, 5, 37.0, 2.0), ("Q-15", 0, 0, 25, 0),
        ("Q-16", 0, 0, 13, 0), ("Q-17", 9, 1, 12.8, 0.6), ("Q-18", 38, 2, 12.6, 1.5), ("Q-19", 8, 0, 10, 1.6),
        ("Q-20", 13.5, 0, 6, 0.8), ("Q-21", 6, 0, 3, 0.15), ("Q-22", 4.2, 0, 19, 1.0), ("Q-23", 29, 3, 12.4, 1.0),
        ("Q-24", 0, 0, 13, 0), ("Q-25", 4, 0, 10, 0.9), ("Q-26", 0.3, 0, 10, 0.1), ("Q-27", 0.5, 0, 10, 0.1),
        ("Q-28", 0.7, 0, 10, 0.1), ("Q-29", 1.1, 0, 10, 0.2), ("Q-30", 11.5, 0, 6, 0.9), ("Q-31", 0, 0, 6, 0),
        ("Q-32", 9.4, 5, 27.6, 10.9), ("Q-33", 11.9, 7, 26.4, 0), ("Q-34", 6.4, 3, 29.5, 0), ("Q-35", 8, 4, 28.6, 0),
        ("Q-36", 15.8, 7, 26.2, 5), ("Q-37", 18.9, 8, 25.2, 5), ("Q-38", 14, 8, 23.8, 5), ("Q-39", 3.1, 1, 31.2, 2),
        ("Q-40", 0, 0, 32, 0),
    ];

    [Fact]
    public async Task Every_blade_has_run_its_hours_to_the_millisecond()
    {
        await using var db = loaded.Shop.Db();
        var ran = await Tags(db.Exposures.Join(db.Mounts, e => e.MountId, m => m.EntryId, (e, m) => new Amount(m.Blade.Tag, e.RunningMs)));
        Assert.Equal(Blades.ToDictionary(b => b.Tag, b => (long)Math.Round(b.Hours * 3_600_000)), Blades.ToDictionary(b => b.Tag, b => ran.GetValueOrDefault(b.Tag)));
        Assert.False(await db.RunShares.AnyAsync(s => s.MountId == null), "All running is on a blade.");
    }

    [Fact]
    public async Task Every_blade_has_its_sharpenings_its_width_and_the_wood_since()
    {
        await using var db = loaded.Shop.Db();
        var grinds = (await db.Sharpenings.Select(s => new { s.Blade.Tag, s.Entry.AtUtc }).ToListAsync()).ToLookup(s => s.Tag, s => s.AtUtc);
        var now = await db.BladesNow.Join(db.Blades, n => n.BladeId, b => b.Id, (n, b) => new { b.Tag, n.WidthM }).ToDictionaryAsync(n => n.Tag, n => n.WidthM);
        var paths = (await db.WoodPaths.Join(db.Mounts, p => p.MountId, m => m.EntryId, (p, m) => new { m.Blade.Tag, m.Entry.AtUtc, p.PathMm }).ToListAsync())
            .ToLookup(p => p.Tag);
        Assert.All(Blades, b =>
        {
            Assert.Equal(b.Sharpenings, grinds[b.Tag].Count());
            Assert.Equal(b.WidthMm, now[b.Tag] * 1000, 1e-9);
            var last = grinds[b.Tag].DefaultIfEmpty(DateTime.MinValue).Max();

            // Within 0.2 %: lengths are whole millimetres, and one blade's loop is 5 mm under its saw's.
            Assert.Equal(b.PathKm, paths[b.Tag].Where(p => p.AtUtc > last).Sum(p => p.PathMm) / 1e6, 0.002 * b.PathKm + 1e-12);
        });
    }

    [Fact]
    public async Task The_counts_are_those_of_eighteen_months()
    {
        await using var db = loaded.Shop.Db();
        Assert.Equal((5, 22, 41, 15), (await db.Saws.CountAsync(), await db.Specs.CountAsync(), await db.Blades.CountAsync(), await db.QueuedCuts.CountAsync()));
        Assert.Equal((113, 40), (await db.Sharpenings.CountAsync(), await db.Sharpenings.CountAsync(s => s.BatchId == null)));
        Assert.Equal((655, 212), (await db.Inspections.CountAsync(), await db.TensionReadings.CountAsync()));
        Assert.Equal((9, 2, 2, 1), (await db.Breaks.CountAsync(), await db.Retirements.CountAsync(), await db.Holds.CountAsync(), await db.HoldsCleared.CountAsync()));
        Assert.Equal((14, 4, 1), (await db.Batches.CountAsync(), await db.Joints.CountAsync(), await db.Splits.CountAsync()));
        Assert.InRange(await db.Mounts.CountAsync(), 530, 550);
        Assert.InRange(await db.CutsDone.CountAsync(), 2870, 2930);
    }

    [Fact]
    public async Task Nothing_overlaps_and_what_is_kept_is_what_the_facts_say()
    {
        await using var db = loaded.Shop.Db();
        Assert.Empty(Spells.Overlaps(await FactReader.ReadSpells(db)));
        Assert.Empty(await Verify.Run(db));
    }

    [Fact]
    public async Task The_saws_carry_the_blades_of_today()
    {
        await using var db = loaded.Shop.Db();
        var on = await db.OnSaws.Join(db.Saws, o => o.SawId, s => s.Id, (o, s) => new { s.Code, o.BladeId })
            .Join(db.Blades, o => o.BladeId, b => b.Id, (o, b) => new { o.Code, b.Tag }).OrderBy(o => o.Code).ToListAsync();
        Assert.Equal(["S1 Q-01", "S2 Q-08", "S3 Q-17", "S4 Q-30", "S5 Q-32"], on.Select(o => $"{o.Code} {o.Tag}"));
        var away = await db.BladesNow.Where(n => n.Place == Place.AtSharpener).Join(db.Blades, n => n.BladeId, b => b.Id, (_, b) => b.Tag).Order().ToListAsync();
        Assert.Equal(["Q-07", "Q-10", "Q-33", "Q-34", "Q-35"], away);
        var held = await db.BladesNow.Where(n => n.HoldId != null).Join(db.Blades, n => n.BladeId, b => b.Id, (_, b) => b.Tag).ToListAsync();
        Assert.Equal(["Q-14"], held);
    }

    [Fact]
    public async Task Mounts_under_the_wrong_label_are_struck_out_with_their_dismounts()
    {
        await using var db = loaded.Shop.Db();
        var all = await db.Mounts.IgnoreQueryFilters().Where(m => m.Blade.Tag == "Q-24").Select(m => new { m.EntryId, Struck = m.Entry.Void != null }).ToListAsync();
        Assert.NotEmpty(all);
        Assert.All(all, m => Assert.True(m.Struck));
        Assert.Empty(await db.Dismounts.Where(d => all.Select(m => m.EntryId).Contains(d.MountId)).ToListAsync());
    }

    [Fact]
    public async Task Everything_lies_in_the_past_even_just_after_midnight()
    {
        await using var db = loaded.Shop.Db();
        var last = await db.Entries.MaxAsync(e => e.EnteredUtc);
        Assert.True(last < Loaded.Now.Date, $"{last:O} is not before the day began.");
        Assert.True(last > Loaded.Now.Date.AddDays(-2), $"{last:O} is not from yesterday.");
        Assert.Equal(await db.Entries.CountAsync(), await db.Entries.MaxAsync(e => e.Id));
    }

    [Fact]
    public void Its_woods_are_rows_of_the_handbook()
    {
        Assert.All(SampleFile.Read(SampleShop.Folder, "species").Select(SampleSpecies.Read), s =>
        {
            var row = MaterialTable.Find(s.Name, out _);
            Assert.NotNull(row);
            Assert.Equal((s.Key, s.Material.ToString()), (row.Key, row.Kind.ToString()));
            Assert.True(s.WoodClass is null || s.WoodClass == row.WearClass, s.Name);
        });
    }

    [Fact]
    public void It_loads_in_a_few_seconds() => Assert.True(loaded.Took < TimeSpan.FromSeconds(15), $"Took {loaded.Took}.");

    [Theory]
    [InlineData("mounts", "S1", "S9", "mounts.csv, line 2, column saw: there is no saw S9.")]
    [InlineData("cuts", ",no,", ",perhaps,", "cuts.csv, line 2, column frozen: 'perhaps' must be yes or no.")]
    [InlineData("runs", "timer", "sundial", "column source: 'sundial' is not one of Meter, Timer, Logger, Typed, FromCuts.")]
    public async Task A_file_that_cannot_be_read_names_the_place(string file, string was, string put, string says)
    {
        using var shop = await TempShop.Create();
        var folder = Directory.CreateDirectory(Path.Combine(shop.File.Dir, "sample")).FullName;
        foreach (var path in Directory.EnumerateFiles(SampleShop.Folder, "*.csv"))
        {
            File.Copy(path, Path.Combine(folder, Path.GetFileName(path)));
        }

        var spoilt = Path.Combine(folder, file + ".csv");
        var text = await File.ReadAllTextAsync(spoilt);
        var at = text.IndexOf(was, StringComparison.Ordinal);
        await File.WriteAllTextAsync(spoilt, text[..at] + put + text[(at + was.Length)..]);
        await using var db = shop.Db();
        var error = await Assert.ThrowsAsync<SampleFileException>(() => SampleShop.Fill(db, folder, Loaded.Now));
        Assert.Contains(says, error.Message, StringComparison.Ordinal);
        await using var after = shop.Db();
        Assert.False(await after.Shops.AnyAsync(), "Nothing of a spoilt file stays.");
    }

    private static async Task<Dictionary<string, long>> Tags(IQueryable<Amount> rows) =>
        (await rows.ToListAsync()).GroupBy(r => r.Tag).ToDictionary(g => g.Key, g => g.Sum(r => r.Ms));

    private sealed record Amount(string Tag, long Ms);

    public sealed class Loaded : IAsyncLifetime
    {
        public static readonly DateTime Now = new(2026, 3, 4, 0, 0, 30, DateTimeKind.Utc);

        public TempShop Shop { get; private set; } = null!;

        public TimeSpan Took { get; private set; }

        public async Task InitializeAsync()
        {
            Shop = await TempShop.Create();
            await using var db = Shop.Db();
            var watch = Stopwatch.StartNew();
            await SampleShop.Fill(db, SampleShop.Folder, Now);
            Took = watch.Elapsed;
        }

        public Task DisposeAsync()
        {
            Shop.Dispose();
            return Task.CompletedTask;
        }
    }
}
