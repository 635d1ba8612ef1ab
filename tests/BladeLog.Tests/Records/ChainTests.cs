using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using Microsoft.EntityFrameworkCore;
using static BladeLog.Tests.Records.TempShop;

namespace BladeLog.Tests.Records;

/// <summary>The ledger's hashes: what is changed behind the program's back, with the triggers taken away, no longer fits.</summary>
public sealed class ChainTests
{
    [Fact]
    public async Task Every_entry_carries_the_hash_of_the_one_before()
    {
        using var shop = await Worked();
        var entries = await shop.Ask(db => db.Entries.AsNoTracking().OrderBy(e => e.Id).ToListAsync());
        Assert.Null(entries[0].PreviousHash);
        Assert.All(entries.Zip(entries.Skip(1)), pair => Assert.Equal(pair.First.Hash, pair.Second.PreviousHash));
        Assert.All(entries, e => Assert.Equal(32, e.Hash!.Length));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Theory]
    [InlineData("mount", "update mount set saw_id = 2 where entry_id = (select max(entry_id) from mount)", "is not as it was written")]
    [InlineData("entry", "update entry set at_utc = '2026-03-01 08:00:00' where id = (select max(entry_id) from mount)", "is not as it was written")]
    [InlineData("setup_wheel", "update setup_wheel set diameter_m = 0.61 where id = 1", "is not as it was written")]
    [InlineData("inspection", "insert into inspection (entry_id, blade_id, found) select max(entry_id), 1, 'NothingSeen' from mount", "is not as it was written")]
    [InlineData("hold", "delete from hold", "is not as it was written")]
    public async Task A_row_that_was_changed_is_found_and_its_entry_named(string table, string sql, string says)
    {
        using var shop = await Worked();
        var (touched, broken) = await shop.Ask(async db =>
        {
            var entry = table switch
            {
                "setup_wheel" => await db.SawSetups.MinAsync(s => s.EntryId),
                "hold" => await db.Holds.MaxAsync(h => h.EntryId),
                _ => await db.Mounts.MaxAsync(m => m.EntryId),
            };
            await Meddle(db, table, sql);
            return (entry, await Chain.FirstBreak(db));
        });
        Assert.StartsWith($"Entry {touched} ", broken, StringComparison.Ordinal);
        Assert.Contains(says, broken, StringComparison.Ordinal);
        Assert.Contains(broken, await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task An_entry_taken_out_or_put_in_is_found()
    {
        using var shop = await Worked();
        var last = await shop.Ask(db => db.Entries.MaxAsync(e => e.Id));
        await shop.Ask(async db =>
        {
            await Meddle(db, "hold", "delete from hold");
            await Meddle(db, "entry", $"delete from entry where id = {last - 1}");
            return 0;
        });
        Assert.Equal($"Entry {last} does not fit the one before it: an entry was taken out or put in there.", await shop.Ask(Chain.FirstBreak));

        using var other = await Worked();
        await other.Ask(async db =>
        {
            db.Entries.Add(new Entry { Op = Guid.NewGuid(), Kind = nameof(Hang), AtUtc = Day, EnteredUtc = Day });
            return await db.SaveChangesAsync();
        });
        Assert.Equal($"Entry {last + 1} has no place in the chain: it was not written by this program.", await other.Ask(Chain.FirstBreak));
    }

    [Fact]
    public async Task What_was_written_before_hashes_were_kept_stands_at_the_head()
    {
        using var shop = await Worked();
        await shop.Ask(async db =>
        {
            await Meddle(db, "entry", "update entry set hash = null, previous_hash = null");
            return 0;
        });
        await shop.Do(new HangUp("Q-3", Place.Bench, null));
        Assert.Null(await shop.Ask(Chain.FirstBreak));
        Assert.Equal(1, await shop.Ask(db => db.Entries.CountAsync(e => e.Hash != null)));
    }

    [Fact]
    public async Task The_sample_shop_is_chained_from_its_first_day()
    {
        await using var app = await ShopApp.Sample();
        await using var db = app.NewContext();
        Assert.False(await db.Entries.AnyAsync(e => e.Hash == null));
        Assert.Null(await Chain.FirstBreak(db));
    }

    private static async Task<TempShop> Worked()
    {
        var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(new RecordHold("Q-2", HoldKind.Crack) { CrackLengthM = 0.0021, Place = CrackPlace.Gullet, Note = "at the weld side, ½ deep" });
        await shop.Do(new HangUp("Q-3", Place.Rack, "R2-4"));
        return shop;
    }

    /// <summary>As somebody with the file and a database tool would: the triggers of the table go first.</summary>
    private static async Task Meddle(ShopDb db, string table, string sql)
    {
        await db.Database.OpenConnectionAsync();
        var names = await db.Database.SqlQueryRaw<string>("select name as Value from sqlite_master where type = 'trigger' and tbl_name = {0}", table).ToListAsync();
        await using var command = db.Database.GetDbConnection().CreateCommand();
#pragma warning disable CA2100 // The sentences of this test alone.
        command.CommandText = "PRAGMA foreign_keys = OFF;" + string.Concat(names.Select(n => $"drop trigger {n};")) + sql;
#pragma warning restore CA2100
        await command.ExecuteNonQueryAsync();
    }
}
