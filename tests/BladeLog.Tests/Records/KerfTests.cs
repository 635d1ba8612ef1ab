using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Records;

/// <summary>The blade of these tests is 25 x 0.8 mm.</summary>
public sealed class KerfTests
{
    private static readonly DateTime Day = TempShop.Day;

    [Fact]
    public async Task The_latest_measure_of_the_kerf_is_the_one_that_counts()
    {
        using var shop = await TempShop.WithSaws();
        Assert.Null((await File(shop)).KerfM);
        await shop.Do(new RecordSharpening("Q-1", GrindKind.FullProfile) { SetAgain = true, KerfM = 0.00144, At = Day });
        Assert.Equal(0.00144, (await File(shop)).KerfM);
        await shop.Do(new RecordKerf("Q-1", KerfHow.TestCut) { KerfM = 0.00152, At = Day.AddDays(2) });
        Assert.Equal(0.00152, (await File(shop)).KerfM);

        // Entered later, measured earlier: it does not displace the later measure.
        await shop.Do(new RecordKerf("Q-1", KerfHow.OverTeeth) { KerfM = 0.00140, At = Day.AddDays(1) });
        Assert.Equal(0.00152, (await File(shop)).KerfM);
        await shop.Do(new RecordSharpening("Q-1", GrindKind.Face) { KerfM = 0.00138, At = Day.AddDays(3) });
        Assert.Equal(0.00138, (await File(shop)).KerfM);
    }

    [Fact]
    public async Task A_measure_holds_through_a_grind_and_ends_when_the_teeth_are_set_again()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordKerf("Q-1", KerfHow.TestCut) { KerfM = 0.0015, SetLeftM = 0.0003, SetRightM = 0.00034, At = Day });
        await shop.Do(new RecordSharpening("Q-1", GrindKind.Face) { At = Day.AddDays(1) });
        var before = (await File(shop)).Kerf;
        Assert.Equal((0.0015, 0.0003, 0.00034), (before.Slot!.Value.Metres, before.Set!.Value.LeftM, before.Set.Value.RightM));
        var set = await shop.Do(new RecordSharpening("Q-1", GrindKind.FullProfile) { SetAgain = true, At = Day.AddDays(2) });
        Assert.Equal(KerfNow.Nothing, (await File(shop)).Kerf);

        // Struck out, the setting never was, and the measure holds again.
        await shop.Do(new VoidEntry(set, "another blade was set"));
        Assert.Equal(0.0015, (await File(shop)).KerfM);
    }

    [Fact]
    public async Task A_reading_struck_out_leaves_the_one_before_it()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordKerf("Q-1", KerfHow.OverTeeth) { KerfM = 0.00144, At = Day });
        var wrong = await shop.Do(new RecordKerf("Q-1", KerfHow.OverTeeth) { KerfM = 0.0019, At = Day.AddDays(1) });
        await shop.Do(new VoidEntry(wrong, "the caliper was not at nought"));
        Assert.Equal(0.00144, (await File(shop)).KerfM);
        await using var db = shop.Db();
        Assert.Empty(await BladeLog.Records.Folding.Verify.Run(db));
    }

    [Fact]
    public async Task A_blade_cut_down_keeps_the_kerf_its_teeth_had()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordKerf("Q-1", KerfHow.TestCut) { KerfM = 0.00147, At = Day });
        await shop.Do(new CutDown("Q-1", "Q-1B", 3, null, WeldQuality.Good) { At = Day.AddDays(1) });
        Assert.Equal(0.00147, (await File(shop, "Q-1B")).KerfM);
    }

    [Fact]
    public async Task What_cannot_be_is_refused_and_what_is_far_too_wide_is_asked_about()
    {
        using var shop = await TempShop.WithSaws();
        Assert.Equal("Write the kerf, or the set.", await shop.Refused(new RecordKerf("Q-1", KerfHow.TestCut)));
        Assert.Equal("The kerf must be wider than the body is thick, 0.8 mm.", await shop.Refused(new RecordKerf("Q-1", KerfHow.TestCut) { KerfM = 0.0008 }));
        Assert.Equal("Write the set of both sides, or both together.", await shop.Refused(new RecordKerf("Q-1", KerfHow.DialGauge) { SetLeftM = 0.0003, SetBothM = 0.0006 }));
        var wide = new RecordKerf("Q-1", KerfHow.OverTeeth) { KerfM = 0.012 };
        Assert.StartsWith("That is a kerf of 12 mm by a body of 0.8 mm.", await shop.Asked(wide), StringComparison.Ordinal);
        await shop.Do(wide with { WideMeant = true });
        Assert.Equal(0.012, (await File(shop)).KerfM);
    }

    [Fact]
    public async Task A_reading_is_written_once()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordKerf("Q-1", KerfHow.TestCut) { KerfM = 0.0015, At = Day });
        foreach (var sql in new[] { "UPDATE kerf_reading SET kerf_m = 0.002", "DELETE FROM kerf_reading" })
        {
            await using var db = shop.Db();
            var error = await Assert.ThrowsAsync<SqliteException>(() => db.Database.ExecuteSqlRawAsync(sql));
            Assert.Contains("a fact is", error.Message, StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task The_kinds_of_blade_still_cannot_be_deleted_after_they_got_a_least_of_their_own()
    {
        using var shop = await TempShop.WithSaws();
        await using var db = shop.Db();
        Assert.Contains("never deleted", (await Assert.ThrowsAsync<SqliteException>(() => db.Database.ExecuteSqlRawAsync("DELETE FROM spec"))).Message, StringComparison.Ordinal);
        Assert.Contains("ck_spec_least_stock", (await Assert.ThrowsAsync<SqliteException>(() => db.Database.ExecuteSqlRawAsync("UPDATE spec SET least_stock = -1"))).Message, StringComparison.Ordinal);
    }

    private static async Task<BladeFile> File(TempShop shop, string tag = "Q-1")
    {
        await using var db = shop.Db();
        return (await ShopNowReader.Read(db, shop.Now)).Blade(tag)!;
    }
}
