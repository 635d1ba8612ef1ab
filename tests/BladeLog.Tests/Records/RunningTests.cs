using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Records;

public class RunningTests
{
    private const long Hour = 3_600_000;

    [Fact]
    public async Task Readings_make_the_runs_between_them()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(Read(100, 0));
        await shop.Do(Read(103.5, 8));
        Assert.Equal([(long)(3.5 * Hour)], await RunsOf(shop));
    }

    [Fact]
    public async Task A_lower_reading_asks_and_stores_nothing_until_it_is_answered()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(Read(1842.6, 0));
        var entries = await shop.Ask(db => db.Entries.CountAsync());
        Assert.Equal(
            "The meter stood at 1,842.6 h on 2 Mar 2026 08:00: 3 h is lower. -> A typing error, a new meter, or did it roll over?",
            await shop.Asked(Read(3, 8)));
        Assert.Equal(entries, await shop.Ask(db => db.Entries.CountAsync()));

        await shop.Do(Read(3, 8) with { Answer = MeterAnswer.NewMeter });
        await shop.Do(Read(5, 16));
        Assert.Equal([3 * Hour, 2 * Hour], await RunsOf(shop));
    }

    [Fact]
    public async Task A_meter_that_rolled_over_counts_on()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(Read(9998, 0));
        await shop.Do(Read(1, 8) with { Answer = MeterAnswer.RolledOver, RollsOverAtMs = 10_000 * Hour });
        Assert.Equal([3 * Hour], await RunsOf(shop));
    }

    [Fact]
    public async Task A_meter_set_back_starts_again_without_running()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(Read(500, 0));
        await shop.Do(Read(0, 8) with { Answer = MeterAnswer.RolledBack });
        await shop.Do(Read(2, 12));
        Assert.Equal([2 * Hour], await RunsOf(shop));
    }

    [Fact]
    public async Task More_than_the_clock_allows_asks_beyond_two_per_cent()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(Read(0, 0));
        Assert.Equal(
            "That is 10.3 h in the 10 h since 2 Mar 2026 08:00. -> A typing error, a new meter, or did it roll over?", await shop.Asked(Read(10.3, 10)));
        await shop.Do(Read(10.2, 10));
    }

    [Fact]
    public async Task Typed_hours_beyond_the_clock_are_refused_and_summed_with_others()
    {
        using var shop = await TempShop.WithSaws();
        Assert.Equal("First would have run 5 h in the 4 h from 2 Mar 2026 08:00 to 2 Mar 2026 12:00.", await shop.Refused(Typed(0, 4, 5)));
        var first = await shop.Do(Typed(0, 4, 2));
        await shop.Do(Typed(0, 4, 2));
        Assert.StartsWith("First would have run 4.5 h in the 4 h", await shop.Refused(Typed(0, 4, 0.5)), StringComparison.Ordinal);
        Assert.Contains($"entry {first}", await shop.Refused(Typed(0, 4, 0.5)), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Two_counted_windows_must_not_overlap()
    {
        using var shop = await TempShop.WithSaws();
        var timer = await shop.Do(Typed(0, 4, 1) with { Source = RunSource.Timer });
        Assert.Equal(
            $"First has counted hours from 2 Mar 2026 08:00 to 2 Mar 2026 12:00 already (entry {timer}).",
            await shop.Refused(Typed(3, 6, 1) with { Source = RunSource.Logger }));
    }

    [Fact]
    public async Task A_reading_entered_between_two_splits_the_run_and_striking_it_out_joins_it_again()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(Read(100, 0));
        await shop.Do(Read(103, 8));
        var between = await shop.Do(Read(101, 4));
        Assert.Equal([Hour, 2 * Hour], await RunsOf(shop));
        await shop.Do(new VoidEntry(between, "typed wrongly"));
        Assert.Equal([3 * Hour], await RunsOf(shop));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task A_reading_typed_wrongly_and_put_right_changes_no_hours()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(Read(317, 0));
        var wrong = await shop.Do(Read(318.4, 70));
        await shop.Do(new VoidEntry(wrong, "381.4 was meant"));
        await shop.Do(Read(381.4, 70));
        Assert.Equal([(long)Math.Round(64.4 * Hour)], await RunsOf(shop));
    }

    [Fact]
    public async Task Hours_taken_from_cuts_give_way_to_counted_ones()
    {
        using var shop = await TempShop.WithSaws();
        // 12 m at 0.01 m/s: 20 minutes.
        await shop.Do(Cut(1) with { HoursFromCuts = true });
        Assert.Equal([Hour / 3], await RunsOf(shop));
        await shop.Do(Typed(0, 4, 2));
        Assert.Equal([2 * Hour], await RunsOf(shop));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task Cuts_divide_a_day_where_every_blade_of_it_has_cuts()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(SwapTests.On("S1", "Q-2", 1));
        await shop.Do(Typed(0, 8, 4));
        Assert.Equal([Hour / 2, (long)(3.5 * Hour)], await Exposures(shop));

        // 20 minutes by the first, 60 by the second: a quarter and three quarters, whatever the clock says.
        await shop.Do(Cut(1));
        await shop.Do(Cut(5) with { Pieces = 3 });
        Assert.Equal([Hour, 3 * Hour], await Exposures(shop));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task A_setup_change_splits_the_run_and_a_replaced_setup_takes_its_hours_along()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(Typed(0, 8, 4));
        var setup = TempShop.Setup();
        await shop.Do(new NewSetup("S1", setup, TempShop.Day.AddHours(2)));
        Assert.Equal([Hour, 3 * Hour], await Exposures(shop));
        var wrong = await shop.Ask(db => db.SawSetups.Where(s => s.Saw.Code == "S1").MaxAsync(s => s.EntryId));
        await shop.Do(new NewSetup("S1", TempShop.Setup(), Replaces: wrong, Reason: "wheel measured without its tyre"));
        Assert.Equal([Hour, 3 * Hour], await Exposures(shop));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task Time_without_a_known_blade_is_kept_as_a_question()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(Typed(0, 8, 4));
        Assert.Equal(4 * Hour, await shop.Ask(db => db.RunShares.Where(s => s.MountId == null).SumAsync(s => s.Ms)));
        await shop.Do(SwapTests.On("S1", "Q-1", 4));
        Assert.Equal(2 * Hour, await shop.Ask(db => db.RunShares.Where(s => s.MountId == null).SumAsync(s => s.Ms)));
    }

    [Fact]
    public async Task A_cut_from_the_list_closes_it_and_striking_it_out_opens_it_again()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new QueueCut(new QueuedCut { Job = "legs", SpeciesKey = "oak", SpeciesTyped = "oak", HeightM = 0.05, LengthM = 1 }));
        var cut = await shop.Do(Cut(1) with { CutNumber = 1, CutVersion = 1 });
        Assert.Equal(cut, await shop.Ask(db => db.QueuedCuts.Select(q => q.DoneEntryId).SingleAsync()));
        Assert.Equal($"Cut 1 is done already (entry {cut}).", await shop.Refused(Cut(2) with { CutNumber = 1 }));
        await shop.Do(new VoidEntry(cut, "another job"));
        Assert.Null(await shop.Ask(db => db.QueuedCuts.Select(q => q.DoneEntryId).SingleAsync()));
    }

    internal static RecordCut Cut(double hours) => new("S1")
    {
        At = TempShop.Day.AddHours(hours),
        SpeciesKey = "oak",
        SpeciesTyped = "oak",
        WoodClass = "A3",
        HeightM = 0.1,
        LengthM = 12,
        FeedMps = 0.01,
    };

    internal static RecordHours Typed(double from, double until, double running) =>
        new("S1", TempShop.Day.AddHours(from), TempShop.Day.AddHours(until), (long)(running * Hour), RunSource.Typed);

    private static ReadMeter Read(double reading, double hours) =>
        new("S1", (long)Math.Round(reading * Hour), $"{reading}") { At = TempShop.Day.AddHours(hours) };

    private static Task<List<long>> RunsOf(TempShop shop) => shop.Ask(db => db.Runs.OrderBy(r => r.FromUtc).Select(r => r.RunningMs).ToListAsync());

    private static Task<List<long>> Exposures(TempShop shop) => shop.Ask(db => db.Exposures.OrderBy(e => e.MountId).ThenBy(e => e.SetupId).Select(e => e.RunningMs).ToListAsync());
}
