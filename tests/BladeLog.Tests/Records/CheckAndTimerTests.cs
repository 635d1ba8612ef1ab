using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using static BladeLog.Tests.Records.TempShop;

namespace BladeLog.Tests.Records;

public class CheckAndTimerTests
{
    private const long Hour = 3_600_000;

    [Fact]
    public async Task A_check_writes_tension_only_where_it_was_the_other_way()
    {
        using var shop = await Mounted();
        await shop.Do(Right() with { At = Day.AddHours(1) });
        Assert.Equal(0, await shop.Ask(db => db.Slacks.CountAsync()));
        await shop.Do(Right() with { Tension = false, At = Day.AddHours(2) });
        await shop.Do(Right() with { Tension = false, At = Day.AddHours(3) });
        await shop.Do(Right() with { At = Day.AddHours(4) });
        Assert.Equal([true, false], await shop.Ask(db => db.Slacks.OrderBy(s => s.Entry.AtUtc).Select(s => s.LetOff).ToListAsync()));
        Assert.Contains("tension", await shop.Refused(Right() with { Tension = null }), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_check_struck_out_takes_its_tension_and_its_hold_along()
    {
        using var shop = await Mounted();
        var check = await shop.Do(Right() with { Tension = false, Quiet = false });
        Assert.NotNull((await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade("Q-1")!.Hold);
        await shop.Do(new VoidEntry(check, "the wrong saw"));
        var now = await shop.Ask(db => ShopNowReader.Read(db, shop.Now));
        Assert.Null(now.Blade("Q-1")!.Hold);
        Assert.False(now.Saw("S1")!.Slack);
        Assert.Null(now.Saw("S1")!.LastCheck);
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task A_blade_on_hold_already_gets_no_second_hold_from_a_check()
    {
        using var shop = await Mounted();
        await shop.Do(Right() with { Quiet = false });
        await shop.Do(Right() with { Quiet = false });
        Assert.Equal(1, await shop.Ask(db => db.Holds.CountAsync()));
    }

    [Theory]
    [InlineData("start_check")]
    [InlineData("timer_started")]
    [InlineData("run")]
    [InlineData("inspection")]
    public async Task Checks_timers_runs_and_looks_are_never_changed_nor_deleted(string table)
    {
        using var shop = await Mounted();
        await shop.Do(Right());
        await shop.Do(new RecordInspection("Q-2", Found.Worn) { LookedAt = LookedAt.WholeLoop, Marks = BladeMarks.TeethMissing, TeethMissing = 2 });
        await shop.Do(new StartTimer("S2"));
        shop.Now = shop.Now.AddHours(1);
        await shop.Do(await Stop(shop));
        await using var db = shop.Db();
        var (delete, update) = ($"delete from {table}", $"update {table} set entry_id = entry_id");
        Assert.Contains("never deleted", (await Assert.ThrowsAsync<SqliteException>(() => db.Database.ExecuteSqlRawAsync(delete))).Message, StringComparison.Ordinal);
        Assert.Contains("written once", (await Assert.ThrowsAsync<SqliteException>(() => db.Database.ExecuteSqlRawAsync(update))).Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_timer_runs_until_its_hours_or_its_striking_out()
    {
        using var shop = await Mounted();
        var first = await shop.Do(new StartTimer("S2"));
        Assert.Equal(first, await Running(shop));
        shop.Now = shop.Now.AddHours(1);
        await shop.Do(await Stop(shop));
        Assert.Null(await Running(shop));
        Assert.Contains("Void first", await shop.Refused(new VoidEntry(first, "never ran")), StringComparison.Ordinal);
        var second = await shop.Do(new StartTimer("S2"));
        await shop.Do(new VoidEntry(second, "never ran"));

        // The older start has its run: it does not come to life again.
        Assert.Null(await Running(shop));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task Of_two_stops_sent_at_once_one_is_recorded()
    {
        using var shop = await Mounted();
        await shop.Do(new StartTimer("S2"));
        shop.Now = shop.Now.AddHours(1);
        var stop = await Stop(shop);
        var results = await Task.WhenAll(Enumerable.Range(0, 6).Select(_ => shop.Write(stop)));
        Assert.Equal((1, 5), (results.Count(r => r is WriteResult.Done), results.Count(r => r is WriteResult.Clash)));
        Assert.Equal(1, await shop.Ask(db => db.Runs.CountAsync()));
    }

    [Fact]
    public async Task A_full_profile_grind_takes_burrs_away_and_leaves_rust()
    {
        using var shop = await Mounted();
        await shop.Do(new RecordInspection("Q-2", Found.Worn) { LookedAt = LookedAt.WholeLoop, Marks = BladeMarks.Rust | BladeMarks.Burrs, At = Day.AddDays(1) });
        Assert.Equal(BladeMarks.Rust | BladeMarks.Burrs, await Marks(shop));
        await shop.Do(new RecordSharpening("Q-2", GrindKind.Face) { At = Day.AddDays(2) });
        Assert.Equal(BladeMarks.Rust | BladeMarks.Burrs, await Marks(shop));
        await shop.Do(new RecordSharpening("Q-2", GrindKind.FullProfile) { At = Day.AddDays(3) });
        Assert.Equal(BladeMarks.Rust, await Marks(shop));

        // A look at the weld alone says nothing of the gullets; one at the gullets does.
        await shop.Do(new RecordInspection("Q-2", Found.NothingSeen) { LookedAt = LookedAt.Weld, Marks = BladeMarks.None, At = Day.AddDays(4) });
        Assert.Equal(BladeMarks.Rust, await Marks(shop));
        await shop.Do(new RecordInspection("Q-2", Found.NothingSeen) { LookedAt = LookedAt.Gullets, Marks = BladeMarks.None, At = Day.AddDays(5) });
        Assert.Equal(BladeMarks.None, await Marks(shop));
    }

    private static async Task<TempShop> Mounted()
    {
        var shop = await WithSaws();
        await shop.Do(new Swap("S1") { OnTag = "Q-1", At = Day });
        return shop;
    }

    private static CheckSaw Right() => new("S1", true, true, true, true, true);

    private static async Task<RecordHours> Stop(TempShop shop)
    {
        var id = (await Running(shop))!.Value;
        return new RecordHours("S2", shop.Now.AddHours(-1), shop.Now, Hour, RunSource.Timer) { TimerId = id };
    }

    private static Task<int?> Running(TempShop shop) => shop.Ask(async db => (await ShopNowReader.Read(db, shop.Now)).Saw("S2")!.Timer?.EntryId);

    private static Task<BladeMarks> Marks(TempShop shop) => shop.Ask(async db => (await ShopNowReader.Read(db, shop.Now)).Blade("Q-2")!.Marks);
}
