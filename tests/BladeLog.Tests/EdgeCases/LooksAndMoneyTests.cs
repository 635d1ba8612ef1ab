using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Tests.Features;
using BladeLog.Tests.Records;

namespace BladeLog.Tests.EdgeCases;

/// <summary>Cracks measured twice, looks that are overdue, leads that end, slack saws, blades for nothing.</summary>
public sealed class LooksAndMoneyTests
{
    private static readonly DateTime Day = TempShop.Day;

    /// <summary>2 wheels · 3600 · 20 m/s / 4 m = 36,000 bends an hour; two hours; 0.6 mm over 72 thousand bends are 8.33 µm for each thousand.</summary>
    [Fact]
    public async Task A_crack_measured_twice_tells_its_growth_for_each_thousand_flexes()
    {
        using var shop = await TempShop.WithSaws();
        var who = await shop.Person("OT");
        await shop.Do(new RecordInspection("Q-1", Found.Crack) { CrackLengthM = 0.002, Place = CrackPlace.Gullet, At = Day });
        await shop.Do(SwapTests.On("S1", "Q-1", 1) with { Although = "found on the saw" }, who);
        await shop.Do(RunningTests.Typed(1, 4, 2));
        await shop.Do(new Swap("S1") { At = Day.AddHours(4) });
        await shop.Do(new RecordInspection("Q-1", Found.Crack) { CrackLengthM = 0.0026, Place = CrackPlace.Gullet, At = Day.AddHours(5) });
        var file = (await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade("Q-1")!;
        CrackSeen[] seen = [new(Day, 0.002, CrackPlace.Gullet), new(Day.AddHours(5), 0.0026, CrackPlace.Gullet)];
        var grown = Assert.Single(CrackGrown.Of(file, seen, [(Day.AddHours(1), Day.AddHours(4))]));
        Assert.Equal(72_000, grown.Bends, 6);
        Assert.Equal(0.0006 / 72, grown.PerThousandBendsM!.Value, 12);

        // Measured while it was on, its bends before and after the look are not known apart.
        Assert.Null(Assert.Single(CrackGrown.Of(file, seen, [(Day.AddHours(-1), Day.AddHours(4))])).PerThousandBendsM);
        Assert.Empty(CrackGrown.Of(file, [seen[0], seen[1] with { Place = CrackPlace.Weld }], []));
    }

    [Fact]
    public async Task The_page_of_a_cracked_blade_tells_its_growth_and_no_life()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-14/inspect", ("Found", "Crack"), ("LookedAt", "whole"), ("Place", "Gullet"), ("CrackLength", "3.1"))).LeadsTo("/blades/Q-14");
        var page = await app.GetPage("/blades/Q-14");
        var facts = SampleApp.Text(page.QuerySelector("dl.facts"));
        Assert.Matches(@"Crack ?2\.6 mm to 3\.1 mm in a gullet ?no running between the two", facts);
        Assert.DoesNotContain("Life", SampleApp.Text(page.Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_overdue_inspection_stops_the_recommendation_and_never_the_mount()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new AddBlades("A", ["I-1"]) { InspectEveryH = 1, At = Day });
        await shop.Do(SwapTests.On("S1", "I-1", 1));
        await shop.Do(RunningTests.Typed(1, 4, 2));
        await shop.Do(new Swap("S1") { At = Day.AddHours(4) });
        var advice = new ShopAdvice(await shop.Ask(db => ShopNowReader.Read(db, shop.Now)));
        Assert.True(advice.Of(advice.Now.Blade("I-1")!).InspectionOverdue);
        await shop.Do(SwapTests.On("S1", "I-1", 5));
    }

    [Fact]
    public async Task A_lead_is_good_only_until_the_saw_is_set_up_anew()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(new RecordDrift("S1", "Q-1", 0.01, Day.AddHours(1)));
        async Task<int> Leads() => (await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Blade("Q-1")!.LeadsRad.Count;
        Assert.Equal(1, await Leads());
        await shop.Do(new NewSetup("S1", TempShop.Setup(), Day.AddHours(2)));
        Assert.Equal(0, await Leads());
    }

    [Fact]
    public async Task A_slack_saw_that_was_started_and_lost_its_blade_is_told_as_found_off()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/slack", ("LetOff", "yes"))).LeadsTo("/saws/S2");
        var tile = (await app.GetPage("/")).QuerySelectorAll(".tile").Single(t => t.TextContent.Contains("Osprey", StringComparison.Ordinal));
        Assert.NotNull(tile.QuerySelector(".s-slack"));
        app.Clock.Advance(TimeSpan.FromMinutes(5));
        (await app.Fill("/saws/S2/swap?found=1", ("Reason", "FoundOff"), ("OnlyOff", "1"))).LeadsTo("/saws/S2");
        Assert.Null(await app.TagOn("S2"));
        tile = (await app.GetPage("/")).QuerySelectorAll(".tile").Single(t => t.TextContent.Contains("Osprey", StringComparison.Ordinal));
        Assert.Null(tile.QuerySelector(".s-slack"));
    }

    [Fact]
    public void A_blade_pulled_for_its_crack_is_a_failure_and_one_scrapped_for_anything_else_is_not()
    {
        BladeFile Retired(RetireReason? why) => new()
        {
            Blade = new Blade { Tag = "X", Spec = TempShop.Spec("A") },
            Spec = TempShop.Spec("A"),
            Place = Place.Gone,
            WidthM = 0.025,
            Retirement = why is { } reason ? new Retirement { Reason = reason } : null,
        };
        Assert.Equal([RetireReason.Crack, RetireReason.Broke], Enum.GetValues<RetireReason>().Where(r => BreakClusters.Failed(Retired(r))));
        Assert.False(BreakClusters.Failed(Retired(null)));
    }

    /// <summary>One hour and 14.4 m² by hand: 12 m of 0.1 m, twelve times; nothing paid but one grind of 6.00.</summary>
    [Fact]
    public async Task A_blade_given_for_nothing_costs_its_sharpenings_alone()
    {
        using var shop = await TempShop.WithSaws();
        var gift = TempShop.Spec("GIFT");
        gift.PriceMinor = 0;
        await shop.Do(new AddSpec(gift));
        await shop.Do(new AddBlades("GIFT", ["G-1"]) { At = Day.AddDays(-1) });
        await shop.Do(SwapTests.On("S1", "G-1", 0));
        await shop.Do(RunningTests.Typed(0, 8, 1));
        await shop.Do(RunningTests.Cut(5) with { Pieces = 12 });
        await shop.Do(new RecordSharpening("G-1", GrindKind.Face) { PriceMinor = 600, At = Day.AddHours(9) });
        var now = await shop.Ask(db => ShopNowReader.Read(db, shop.Now));
        await using var db = shop.Db();
        var cost = Costs.OfBlades(
            now.Blades,
            [new SpellOf(now.Saw("S1")!.Saw.Id, now.Blade("G-1")!.Blade.Id, Day, null)],
            [.. Microsoft.EntityFrameworkCore.EntityFrameworkQueryableExtensions.Include(db.CutsDone, c => c.Entry)],
            [.. db.Sharpenings],
            [],
            now.Shop)[now.Blade("G-1")!.Blade.Id];
        Assert.Equal((0L, 600L), (cost.Spent.Bought, cost.Spent.Sharpened));
        Assert.Equal(600 / 14.4, cost.PerSquareMetre!.Value, 6);
        Assert.Equal(600, cost.PerHour!.Value, 6);
    }
}
