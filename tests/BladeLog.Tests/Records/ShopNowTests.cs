using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Diagnostics;

namespace BladeLog.Tests.Records;

public class ShopNowTests
{
    private const long Hour = 3_600_000;
    private static readonly DateTime Day = TempShop.Day;

    [Fact]
    public async Task A_blade_cut_down_carries_its_parents_hours_but_not_on_its_weld()
    {
        using var shop = await CutDownShop();
        var now = await shop.Ask(db => ShopNowReader.Read(db, shop.Now));
        var child = now.Blade("q-1b")!;
        Assert.Equal([(2 * Hour, false, true, 4.0), (Hour, true, false, 3.5)],
            child.Exposures.OrderBy(e => e.OnThisWeld).Select(e => (e.RunningMs, e.OnThisWeld, e.OfAncestor, e.LoopM)));
        Assert.Equal((2, WeldQuality.Doubtful, 1, 0.0248), (child.Welds, child.Weld, child.Sharpenings, child.WidthM));
        Assert.Equal((Place.Gone, true), (now.Blade("Q-1")!.Place, now.Blade("Q-1")!.Break is not null));
        Assert.Null(child.Break);
    }

    [Fact]
    public async Task Path_since_the_last_sharpening_starts_inside_a_spell_where_it_was_touched_up_on_the_saw()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Cut(1));
        await shop.Do(new RecordSharpening("Q-1", GrindKind.Face) { At = Day.AddHours(2) });
        await shop.Do(RunningTests.Cut(3) with { Pieces = 2 });
        var file = (await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade("Q-1")!;

        // A v/(f L) = 0.1 · 12 · 20/(0.01 · 4) = 600 m a piece.
        Assert.Equal([new PathLine("A3", Dirt.Clean, 1_200_000, 2_400_000)], file.SinceSharpening);
        Assert.Equal([new PathLine("A3", Dirt.Clean, 1_800_000, 3_600_000)], file.WholeLife);
    }

    [Fact]
    public async Task Running_since_the_last_inspection_counts_the_part_of_a_run_after_it()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Typed(0, 8, 4));
        await shop.Do(new RecordInspection("Q-1", Found.NothingSeen) { At = Day.AddHours(6) });
        await shop.Do(RunningTests.Typed(8, 10, 1));
        var file = (await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade("Q-1")!;
        Assert.Equal((2 * Hour, false), (file.MsSinceInspection, file.MountedSinceInspection));
        Assert.Equal(5, file.Hours);
    }

    [Fact]
    public async Task The_tension_of_a_spell_is_the_one_measured_in_it_else_the_last_on_that_saw()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0) with { TensionPa = 100e6, TensionKnown = TensionKnown.Target });
        await shop.Do(RunningTests.Typed(0, 1, 1));
        Assert.Null((await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade("Q-1")!.Exposures[0].TensionPa);
        await shop.Do(new RecordTension("S1", null, 120e6, "120 MPa", "gauge", Day.AddHours(2)));
        await shop.Do(new Swap("S1") { At = Day.AddHours(3) });
        await shop.Do(SwapTests.On("S1", "Q-1", 4));
        await shop.Do(RunningTests.Typed(4, 5, 1));
        var file = (await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade("Q-1")!;
        Assert.Equal([120e6, 120e6], file.Exposures.Select(e => e.TensionPa!.Value));
        Assert.Null(file.TensionThisSpellPa);
        Assert.Equal(120e6, Assert.Single(file.LastTensionPa).Value);
    }

    [Fact]
    public async Task A_saw_says_what_is_on_it_how_much_it_ran_and_whether_it_is_slack()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(RunningTests.Typed(0, 2, 1));
        await shop.Do(SwapTests.On("S1", "Q-1", 3));
        await shop.Do(new SlackTension("S1", true, Day.AddHours(4)));
        var now = await shop.Ask(db => ShopNowReader.Read(db, shop.Now));
        var saw = now.Saw("S1")!;
        Assert.Equal((Hour, Hour, true, Day.AddHours(3)), (saw.RunningMs, saw.NoBladeKnownMs, saw.Slack, saw.MountedSince!.Value));
        Assert.Equal("Q-1", now.Blades.Single(b => b.Blade.Id == saw.MountedBladeId).Blade.Tag);
        await shop.Do(SwapTests.On("S1", "Q-2", 5));
        Assert.False((await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Saw("S1")!.Slack);
    }

    [Fact]
    public async Task The_same_picture_is_given_until_something_is_written()
    {
        using var shop = await TempShop.WithSaws();
        var first = await shop.Ask(db => ShopNowReader.Read(db, shop.Now));
        var again = await shop.Ask(db => ShopNowReader.Read(db, shop.Now.AddMinutes(1)));
        Assert.Same(first.Blades, again.Blades);
        Assert.Equal(shop.Now.AddMinutes(1), again.AsOf);
        await shop.Do(new RecordHold("Q-1", HoldKind.Clicking));
        Assert.NotNull((await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade("Q-1")!.Hold);
    }

    [Fact]
    public async Task The_number_of_queries_does_not_grow_with_the_blades()
    {
        using var shop = await CutDownShop();
        var few = await Queries(shop);
        await shop.Do(new AddBlades("A", [.. Enumerable.Range(100, 60).Select(i => $"R-{i}")]));
        Assert.Equal(few, await Queries(shop));
        Assert.InRange(few, 10, 45);
    }

    [Fact]
    public async Task The_history_shows_what_was_struck_out_and_by_whom()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        var hold = await shop.Do(new RecordHold("Q-1", HoldKind.Crack) { CrackLengthM = 0.002, Place = CrackPlace.Gullet, At = Day.AddHours(1) });
        await shop.Do(new VoidEntry(hold, "a scratch"), await shop.Person("OT"));
        var blade = await shop.Ask(async db => await Past.OfBlade(db, await db.Blades.Where(b => b.Tag == "Q-1").Select(b => b.Id).SingleAsync(), 10));
        Assert.Equal(["Hold", "Mount"], blade.Lines.Select(r => r.Entry.Kind));
        var struck = blade.Lines[0].Entry.Void!;
        Assert.Equal(("OT", "a scratch", 0.002), (struck.Entry.Person!.Initials, struck.Reason, ((Hold)blade.Lines[0].Fact!).CrackLengthM));
        Assert.Null(blade.Lines[1].Entry.Void);
        Assert.False(blade.More);
    }

    [Fact]
    public async Task The_past_is_read_a_page_at_a_time_what_was_entered_last_first()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new HangUp("Q-1", Place.Bench, null) { At = Day });
        await shop.Do(new HangUp("Q-2", Place.Bench, null) { At = Day.AddDays(-1) });
        var first = await shop.Ask(db => Past.OfShop(db, 2));
        Assert.Equal(["Hang", "Hang"], first.Lines.Select(l => l.Entry.Kind));
        Assert.True(first.Lines[0].Entry.Id > first.Lines[1].Entry.Id && first.Lines[0].Entry.AtUtc < first.Lines[1].Entry.AtUtc);
        Assert.True(first.More);
        var rest = await shop.Ask(db => Past.OfShop(db, 500, 2));
        Assert.False(rest.More);
        Assert.True(rest.Lines[0].Entry.Id < first.Lines[1].Entry.Id);
        Assert.Null(await shop.Ask(db => Past.Of(db, 99_999)));
        Assert.Equal("Hang", (await shop.Ask(db => Past.Of(db, first.Lines[0].Entry.Id)))!.Entry.Kind);
    }

    /// <summary>A blade sharpened once, broken at its weld, cut down for a smaller saw and run there.</summary>
    internal static async Task<TempShop> CutDownShop()
    {
        var shop = await TempShop.WithSaws();
        await shop.Do(new AddSaw("S3", "Small", false, TempShop.Setup(3.5), Day.AddDays(-1)));
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Typed(0, 4, 2));
        await shop.Do(new RecordSharpening("Q-1", GrindKind.Face) { WidthM = 0.0248, At = Day.AddHours(3) });
        await shop.Do(new RecordBreak("Q-1", BreakSite.Weld) { LatestUtc = Day.AddHours(4) });
        await shop.Do(new CutDown("Q-1", "Q-1b", 3.5, "3500", WeldQuality.Doubtful) { At = Day.AddHours(6) });
        await shop.Do(SwapTests.On("S3", "Q-1B", 8));
        await shop.Do(RunningTests.Typed(8, 10, 1) with { Saw = "S3" });
        return shop;
    }

    private static async Task<int> Queries(TempShop shop)
    {
        var counter = new Counter();
        var options = new DbContextOptionsBuilder<ShopDb>().UseSqlite(shop.File.ConnectionString).AddInterceptors(counter).Options;
        await using var db = new ShopDb(options);
        await ShopNowReader.Read(db, shop.Now);
        return counter.Count;
    }

    private sealed class Counter : DbCommandInterceptor
    {
        public int Count { get; private set; }

        public override ValueTask<InterceptionResult<System.Data.Common.DbDataReader>> ReaderExecutingAsync(
            System.Data.Common.DbCommand command,
            CommandEventData eventData,
            InterceptionResult<System.Data.Common.DbDataReader> result,
            CancellationToken cancellationToken = default)
        {
            Count++;
            return ValueTask.FromResult(result);
        }
    }
}
