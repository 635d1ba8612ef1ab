using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Records;

public class BladeWorkTests
{
    private static readonly DateTime Day = TempShop.Day;

    [Fact]
    public async Task Only_a_person_who_may_clears_a_hold_and_the_others_are_told_whom_to_ask()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordInspection("Q-1", Found.Crack) { CrackLengthM = 0.0026, Place = CrackPlace.Gullet, At = Day });
        Assert.NotNull(await shop.Ask(db => db.BladesNow.Where(b => b.HoldId != null).Select(b => b.HoldId).SingleAsync()));
        Assert.Equal("Only some may clear a hold: OT.", await shop.Refused(new ClearHold("Q-1", "ground out"), await shop.Person("JP")));
        await shop.Do(new ClearHold("Q-1", "ground out"), await shop.Person("OT"));
        Assert.Equal(0, await shop.Ask(db => db.BladesNow.CountAsync(b => b.HoldId != null)));
        Assert.Equal("Q-1 is not on hold.", await shop.Refused(new ClearHold("Q-1", "again"), await shop.Person("OT")));
    }

    [Fact]
    public async Task A_sharpening_narrows_the_blade_and_asks_where_it_would_widen_it()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordSharpening("Q-1", GrindKind.Face) { WidthM = 0.0246, At = Day });
        Assert.Equal(0.0246, await shop.Ask(db => db.BladesNow.Where(b => b.BladeId == 1).Select(b => b.WidthM).SingleAsync()));
        Assert.StartsWith("Q-1 was 24.6 mm wide before", await shop.Asked(new RecordSharpening("Q-1", GrindKind.Face) { WidthM = 0.0248 }), StringComparison.Ordinal);
        Assert.Equal("The gullet must be less deep than the blade is wide.", await shop.Refused(new RecordSharpening("Q-1", GrindKind.Face) { GulletM = 0.0246 }));
    }

    [Fact]
    public async Task A_batch_goes_and_comes_back_line_by_line()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-3", 0));
        Assert.Contains("Q-3 is on First", await shop.Refused(new SendBatch("B-1", "a service", ["Q-1", "Q-3"], At: Day.AddHours(1))), StringComparison.Ordinal);
        await shop.Do(new SendBatch("B-1", "a service", ["Q-1", "Q-2"], At: Day.AddHours(1)));
        Assert.Equal("Q-1 is away in batch B-1 already.", await shop.Refused(new SendBatch("B-2", "another", ["Q-1"], At: Day.AddHours(2))));
        Assert.Equal("Q-3 was not in batch B-1: it is a stranger in the bundle.", await shop.Refused(new TakeBack("B-1", [new BackLine("Q-3", ReturnOutcome.Sharpened)])));
        Assert.Contains("at the sharpener", await shop.Asked(SwapTests.On("S2", "Q-1", 3)), StringComparison.Ordinal);

        await shop.Do(new TakeBack("B-1", [new BackLine("Q-1", ReturnOutcome.Sharpened) { WidthM = 0.0247, PriceMinor = 900 }], Day.AddDays(2)));
        Assert.Equal((Place.Rack, 0.0247), await Now(shop, "Q-1"));
        Assert.Equal(Place.AtSharpener, (await Now(shop, "Q-2")).Place);
        Assert.Equal("Q-1 is back from batch B-1 already.", await shop.Refused(new TakeBack("B-1", [new BackLine("Q-1", ReturnOutcome.Sharpened)])));
        await shop.Do(new TakeBack("B-1", [new BackLine("Q-2", ReturnOutcome.Rejected) { Retire = true }], Day.AddDays(3)));
        Assert.Equal(Place.Gone, (await Now(shop, "Q-2")).Place);
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task Break_cutting_down_and_what_must_be_struck_out_first()
    {
        using var shop = await TempShop.WithSaws();
        var mount = await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Typed(0, 4, 2));
        var broke = await shop.Do(new RecordBreak("Q-1", BreakSite.Weld) { EarliestUtc = Day.AddHours(3), LatestUtc = Day.AddHours(4) });
        Assert.Equal(Place.Bench, (await Now(shop, "Q-1")).Place);
        Assert.StartsWith($"Void first: entry {broke}, the break", await shop.Refused(new VoidEntry(mount, "x")), StringComparison.Ordinal);

        var split = await shop.Do(new CutDown("Q-1", "Q-1B", 3.5, "3500", WeldQuality.Doubtful) { At = Day.AddHours(6) });
        Assert.Equal(Place.Gone, (await Now(shop, "Q-1")).Place);
        Assert.Equal((Place.Rack, 0.025), await Now(shop, "Q-1B"));
        Assert.Equal($"Void first: entry {split}, the cutting down to Q-1B with its joint.", await shop.Refused(new VoidEntry(broke, "x")));

        await shop.Do(new AddSaw("S3", "Small", false, TempShop.Setup(3.5), Day.AddDays(-1)));
        var later = await shop.Do(SwapTests.On("S3", "Q-1B", 8));
        Assert.Equal($"Void first: entry {later}, what happened to the blade cut down.", await shop.Refused(new VoidEntry(split, "x")));
        await shop.Do(new VoidEntry(later, "x"));
        await shop.Do(new VoidEntry(split, "x"));
        await shop.Do(new VoidEntry(broke, "x"));
        Assert.Equal(Place.Gone, (await Now(shop, "Q-1B")).Place);
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task Striking_out_a_mount_takes_its_dismount_along_and_leaves_the_hours_as_a_question()
    {
        using var shop = await TempShop.WithSaws();
        var mount = await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(SwapTests.On("S1", "Q-2", 4));
        await shop.Do(RunningTests.Typed(0, 8, 4));
        await shop.Do(RunningTests.Cut(2));
        await shop.Do(new VoidEntry(mount, "never was on"));
        Assert.Equal(2, await shop.Ask(db => db.Voids.CountAsync()));
        Assert.Equal(2 * 3_600_000, await shop.Ask(db => db.RunShares.Where(s => s.MountId == null).SumAsync(s => s.Ms)));
        Assert.Equal(0, await shop.Ask(db => db.WoodPaths.CountAsync()));
        Assert.Contains("was struck out by", await shop.Refused(new VoidEntry(mount, "again")), StringComparison.Ordinal);
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task A_dismount_cannot_go_while_another_blade_stands_where_it_would_be()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        var swap = await shop.Do(SwapTests.On("S1", "Q-2", 4));
        Assert.Equal(
            $"Void first: entry {swap + 1}, Q-2 is on First since 2 Mar 2026 12:00 (entry {swap + 1}).",
            await shop.Refused(new VoidEntry(swap, "x")));
    }

    [Fact]
    public async Task A_new_loop_changes_the_path_of_the_cuts_after_it_only()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Cut(1));
        await shop.Do(new Swap("S1") { At = Day.AddHours(2) });
        await shop.Do(new RecordJoint("Q-1", 3.98, "3980", WeldQuality.Good, At: Day.AddHours(3)));
        await shop.Do(SwapTests.On("S1", "Q-1", 4));
        await shop.Do(RunningTests.Cut(5));

        // A v/(f L) = 0.1 · 12 · 20 / (0.01 · L).
        var paths = await shop.Ask(db => db.WoodPaths.OrderBy(p => p.MountId).Select(p => p.PathMm).ToListAsync());
        Assert.Equal([600_000, (long)Math.Round(2400 / 3.98 * 1000)], paths);
        Assert.Equal("Q-1 is 3,980 mm long; a joint only makes it shorter. | Q-1 is on First since 2 Mar 2026 12:00 (entry " +
            $"{await shop.Ask(db => db.Mounts.MaxAsync(m => m.EntryId))}): take it off first.", await shop.Refused(new RecordJoint("Q-1", 3.99, null, WeldQuality.Good, At: Day.AddHours(6))));
    }

    [Fact]
    public async Task A_file_is_taken_whole_or_not_at_all_and_once()
    {
        using var shop = await TempShop.WithSaws();
        var good = new ImportRow(2, RunningTests.Cut(1));
        var bad = new ImportRow(3, RunningTests.Cut(2) with { Saw = "S9", FeedMps = 0 });
        var result = await shop.Write(new ImportRows("cuts", "ab") { Rows = [good, bad] });
        var refused = Assert.IsType<WriteResult.Refused>(result);
        Assert.Equal([new Problem("line 3: Saw", "There is no saw S9."), new Problem("line 3: FeedMps", "The feed must be above zero.")], refused.Problems);
        Assert.Equal(0, await shop.Ask(db => db.CutsDone.CountAsync()));

        await shop.Do(new ImportRows("cuts", "ab") { Rows = [good, new ImportRow(3, SwapTests.On("S1", "Q-1", 0))] });
        Assert.Equal("This file was imported on 1 Apr 2026 09:00 already, with 2 rows.", await shop.Refused(new ImportRows("cuts", "ab") { Rows = [good] }));
        Assert.Equal(1, await shop.Ask(db => db.WoodPaths.CountAsync()));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    private static Task<(Place Place, double WidthM)> Now(TempShop shop, string tag) => shop.Ask(async db =>
    {
        var now = await db.BladesNow.SingleAsync(n => db.Blades.Any(b => b.Id == n.BladeId && b.Tag == tag));
        return (now.Place, now.WidthM);
    });
}
