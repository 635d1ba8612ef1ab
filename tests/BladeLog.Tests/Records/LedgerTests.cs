using BladeLog.Records;
using BladeLog.Records.Configuration;
using BladeLog.Records.Writing;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Records;

public class LedgerTests
{
    [Fact]
    public async Task No_migration_is_missing()
    {
        using var shop = await TempShop.Create();
        await using var db = shop.Db();
        Assert.False(db.Database.HasPendingModelChanges());
    }

    [Fact]
    public async Task Every_fact_table_refuses_update_and_delete()
    {
        using var shop = await TempShop.Create();
        await using var db = shop.Db();
        var tables = db.Model.GetEntityTypes().Select(e => e.ClrType)
            .Where(t => t.IsSubclassOf(typeof(Fact)) || t == typeof(SetupWheel) || t == typeof(SetupSpeed) || t == typeof(Entry))
            .Select(Naming.Table).ToList();
        Assert.True(tables.Count > 25);
        var triggers = await db.Database.SqlQueryRaw<string>("select name as Value from sqlite_master where type = 'trigger'").ToListAsync();
        foreach (var table in tables)
        {
            Assert.Contains($"{table}_no_update", triggers);
            Assert.Contains($"{table}_no_delete", triggers);
        }
    }

    [Theory]
    [InlineData("update mount set inside_out = 1", "a fact is written once")]
    [InlineData("delete from mount", "a fact is never deleted")]
    [InlineData("update entry set at_utc = '2020-01-01 00:00:00'", "written once")]
    [InlineData("delete from entry", "never shortened")]
    [InlineData("delete from blade", "never deleted")]
    [InlineData("update tag_used set blade_id = 2 where blade_id = 1", "never used again")]
    [InlineData("update blade set tag = 'Q-2' where tag = 'Q-1'", "never used again")]
    public async Task Raw_sql_cannot_rewrite_the_record(string sql, string because)
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await using var db = shop.Db();
        var error = await Assert.ThrowsAsync<SqliteException>(() => db.Database.ExecuteSqlRawAsync(sql));
        Assert.Contains(because, error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_hashes_of_an_entry_are_filled_once()
    {
        using var shop = await TempShop.WithSaws();
        await using var db = shop.Db();
        db.Entries.Add(new Entry { Id = 1000, Op = Guid.NewGuid(), Kind = nameof(Hang), AtUtc = TempShop.Day, EnteredUtc = TempShop.Day });
        await db.SaveChangesAsync();
        await db.Database.ExecuteSqlRawAsync("update entry set previous_hash = x'00', hash = x'01' where id = 1000");
        await Assert.ThrowsAsync<SqliteException>(() => db.Database.ExecuteSqlRawAsync("update entry set hash = x'02' where id = 1000"));
        await Assert.ThrowsAsync<SqliteException>(() => db.Database.ExecuteSqlRawAsync("update entry set hash = x'02' where id = 1"));
    }

    [Fact]
    public async Task A_context_refuses_to_change_a_fact_or_to_edit_without_knowing_who()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await using var db = shop.Db();
        (await db.Mounts.SingleAsync()).InsideOut = true;
        await Assert.ThrowsAsync<InvalidOperationException>(() => db.SaveChangesAsync());
        db.ChangeTracker.Clear();
        (await db.Saws.FirstAsync()).Name = "Another";
        await Assert.ThrowsAsync<InvalidOperationException>(() => db.SaveChangesAsync());
    }

    [Theory]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    [InlineData(0)]
    [InlineData(-0.025)]
    public async Task A_width_that_is_no_width_is_refused_by_the_database(double width)
    {
        using var shop = await TempShop.WithSaws();
        await using var db = shop.Db();
        var sql = $"update spec set width_m = {(double.IsInfinity(width) ? width > 0 ? "9e999" : "-9e999" : width.ToString(System.Globalization.CultureInfo.InvariantCulture))}";
        var error = await Assert.ThrowsAsync<SqliteException>(() => db.Database.ExecuteSqlRawAsync(sql));
        Assert.Contains("CHECK", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Every_real_column_refuses_infinity()
    {
        using var shop = await TempShop.Create();
        await using var db = shop.Db();
        var design = Microsoft.EntityFrameworkCore.Infrastructure.AccessorExtensions
            .GetService<Microsoft.EntityFrameworkCore.Metadata.IDesignTimeModel>(db).Model;
        var unchecked_ = design.GetEntityTypes().SelectMany(e => e.GetProperties()
            .Where(p => (Nullable.GetUnderlyingType(p.ClrType) ?? p.ClrType) == typeof(double))
            .Where(p => !e.GetCheckConstraints().Any(c => c.Sql.Contains($"\"{p.GetColumnName()}\" < 1e300", StringComparison.Ordinal)))
            .Select(p => $"{e.GetTableName()}.{p.GetColumnName()}"));
        Assert.Empty(unchecked_);
    }

    [Fact]
    public async Task Numbers_the_database_refuses_come_back_in_words()
    {
        using var shop = await TempShop.WithSaws();
        var spec = TempShop.Spec("B");
        spec.NewLoopM = double.PositiveInfinity;
        Assert.Equal("The new loop must be a number above zero.", await shop.Refused(new AddSpec(spec)));
        var deep = TempShop.Spec("C");
        deep.GulletDepthM = deep.WidthM;
        Assert.Equal("The gullet must be less deep than the blade is wide.", await shop.Refused(new AddSpec(deep)));
    }

    [Theory]
    [InlineData("Q-1", "There is a blade Q-1 already.")]
    [InlineData("q-1", "There is a blade Q-1 already.")]
    [InlineData("Q 4", "A tag is made of A to Z, 0 to 9, hyphen and full stop.")]
    [InlineData("Q-12345678901", "A tag is 1 to 12 letters long.")]
    [InlineData("rack", "\"RACK\" is a word of the program itself: choose another tag.")]
    public async Task A_tag_that_cannot_be_used_is_refused_with_the_reason(string tag, string sentence)
    {
        using var shop = await TempShop.WithSaws();
        Assert.Equal(sentence, await shop.Refused(new AddBlades("A", [tag])));
    }

    [Fact]
    public async Task A_tag_once_painted_is_never_used_again()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RetagBlade("Q-1", "Q-9"));
        Assert.Equal("Q-1 was once painted on the blade that is now Q-9: a tag is never used again.", await shop.Refused(new AddBlades("A", ["Q-1"])));
        await shop.Do(new RetagBlade("Q-9", "Q-1"));
    }

    [Fact]
    public async Task The_same_form_sent_five_times_at_once_is_one_entry_with_one_answer()
    {
        using var shop = await TempShop.WithSaws();
        var op = Guid.NewGuid();
        var swap = SwapTests.On("S1", "Q-1", 0);
        var answers = await Task.WhenAll(Enumerable.Range(0, 5).Select(_ => Task.Run(() => shop.Write(swap, op: op))));
        var done = Assert.IsType<WriteResult.Done>(answers[0]);
        Assert.All(answers, a => Assert.Equal(done, a));
        Assert.Equal("/saws/S1", done.AnswerPath);
        Assert.Equal(1, await shop.Ask(db => db.Mounts.CountAsync()));

        var other = await shop.Write(swap with { OnTag = "Q-2" }, op: op);
        Assert.Equal("This form was recorded before with other values. Open it again.", TempShop.Words(other));
    }

    [Fact]
    public async Task An_edit_keeps_what_was_there_before_and_a_stale_form_sees_who_was_quicker()
    {
        using var shop = await TempShop.WithSaws();
        var saw = await shop.Ask(db => db.Saws.AsNoTracking().SingleAsync(s => s.Code == "S1"));
        var edit = new EditSaw("S1", saw.Version, "S1", "Heron", true, true);
        await shop.Do(edit, await shop.Person("OT"));
        var clash = Assert.IsType<WriteResult.Clash>(await shop.Write(edit with { Name = "Wren" }, await shop.Person("JP")));
        Assert.Equal(("OT", "changed S1"), (clash.Who, clash.What));
        var before = await shop.Ask(db => db.ThingHistories.SingleAsync(h => h.Thing == "Saw"));
        Assert.Contains("\"Name\":\"First\"", before.Before, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_connection_is_set_as_promised()
    {
        using var shop = await TempShop.Create();
        await using var db = shop.Db();
        await db.Database.OpenConnectionAsync();
        var settings = Pragmas.ReadBack(db.Database.GetDbConnection()).ToDictionary(s => s.Name, s => s.Value);
        Assert.Equal((2, 1, 5000, 0), (settings["synchronous"], settings["foreign_keys"], settings["busy_timeout"], settings["mmap_size"]));
        Assert.Equal("wal", (await db.Database.SqlQueryRaw<string>("select journal_mode as Value from pragma_journal_mode").ToListAsync())[0]);
    }
}
