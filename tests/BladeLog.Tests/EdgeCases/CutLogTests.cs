using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using BladeLog.Tests.Features;
using BladeLog.Tests.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.EdgeCases;

/// <summary>Cuts: nails, dirt, several blades on one job, none at all, and times out of order.</summary>
public sealed class CutLogTests
{
    private static readonly DateTime Day = TempShop.Day;

    [Fact]
    public async Task A_nail_strike_is_one_tap_and_asks_for_the_teeth_lost()
    {
        using var app = await ShopApp.Sample();
        var done = await app.Fill("/saws/S2/cut", ("Species", "oak"), ("Height", "50"), ("Length", "1000"), ("Minutes", "1"), ("Nail", "true"));
        Assert.Equal("/blades/Q-08/inspect?nail=1", done.Location);
        var look = await app.GetPage(done.Location!);
        Assert.Contains("count the teeth lost", SampleApp.Text(look.Body), StringComparison.Ordinal);
        (await app.SendForm(look, "/blades/Q-08/inspect", ("Found", "Worn"), ("LookedAt", "whole"), ("Note", "2 teeth gone"))).LeadsTo("/blades/Q-08");
        await using var db = app.NewContext();
        Assert.True((await db.CutsDone.OrderByDescending(c => c.EntryId).FirstAsync()).Nail);
    }

    [Fact]
    public async Task Frozen_and_dirty_wood_is_kept_apart_in_the_path_of_the_teeth()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Cut(1));
        await shop.Do(RunningTests.Cut(2) with { Dirt = Dirt.BarkOn, Frozen = true });

        // A v/(f L) = 0.1 · 12 · 20/(0.01 · 4) = 600 m each.
        var file = (await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade("Q-1")!;
        Assert.Equal([(Dirt.Clean, 600_000L), (Dirt.BarkOn, 600_000L)], file.SinceSharpening.OrderBy(p => p.Dirt).Select(p => (p.Dirt, p.PathMm)));
        Assert.True(await shop.Ask(db => db.CutsDone.OrderByDescending(c => c.EntryId).Select(c => c.Frozen).FirstAsync()));
    }

    [Fact]
    public async Task Several_blades_on_one_job_each_get_their_own_wood_and_the_last_one_closes_it()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new QueueCut(new QueuedCut { Job = "legs", SpeciesKey = "oak", SpeciesTyped = "oak", HeightM = 0.1, LengthM = 12, Pieces = 3 }));
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Cut(1) with { CutNumber = 1, Finishes = false });
        Assert.Null(await shop.Ask(db => db.QueuedCuts.Select(q => q.DoneEntryId).SingleAsync()));
        await shop.Do(SwapTests.On("S1", "Q-2", 2));
        var last = await shop.Do(RunningTests.Cut(3) with { CutNumber = 1, Pieces = 2 });
        Assert.Equal(last, await shop.Ask(db => db.QueuedCuts.Select(q => q.DoneEntryId).SingleAsync()));
        var now = await shop.Ask(db => ShopNowReader.Read(db, shop.Now));
        Assert.Equal((600_000L, 1_200_000L), (now.Blade("Q-1")!.SinceSharpening.Sum(p => p.PathMm), now.Blade("Q-2")!.SinceSharpening.Sum(p => p.PathMm)));
    }

    [Fact]
    public async Task A_cut_logged_to_a_saw_without_a_blade_waits_and_goes_to_the_blade_that_is_written_later()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(RunningTests.Cut(1));
        Assert.Equal(0, await shop.Ask(db => db.WoodPaths.CountAsync()));
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        Assert.Equal(600_000L, await shop.Ask(db => db.WoodPaths.SumAsync(p => p.PathMm)));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task A_cut_after_sharpening_but_logged_before_the_sharpening_entry_counts_by_real_time()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Cut(1));
        await shop.Do(RunningTests.Cut(5));

        // Ground at the third hour, between the two, and entered after both.
        await shop.Do(new RecordSharpening("Q-1", GrindKind.Face) { At = Day.AddHours(3) });
        var file = (await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade("Q-1")!;
        Assert.Equal((600_000L, 1_200_000L), (file.SinceSharpening.Sum(p => p.PathMm), file.WholeLife.Sum(p => p.PathMm)));
    }

    [Fact]
    public async Task Glued_stock_wears_as_a_panel_and_not_as_its_wood()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/cut", ("Species", "plywood"), ("Height", "50"), ("Length", "1000"), ("Minutes", "1"))).LeadsTo("/saws/S2/cut");
        await using var db = app.NewContext();
        var cut = await db.CutsDone.OrderByDescending(c => c.EntryId).FirstAsync();
        Assert.Equal((MaterialKind.Panel, "P"), (cut.Material, cut.WoodClass));
    }
}
