using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using BladeLog.Tests.Features;
using BladeLog.Tests.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.EdgeCases;

/// <summary>Breaks told late or wrongly, and retired blades that turn up again.</summary>
public sealed class BreakAndRetireTests
{
    private static readonly DateTime Day = TempShop.Day;

    [Fact]
    public async Task Striking_out_a_completed_break_puts_the_blade_back_where_it_was()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        var told = await shop.Do(new RecordBreak("Q-1", BreakSite.Unknown) { LatestUtc = Day.AddHours(4) });
        var once = await shop.Do(new CompleteBreak(told, BreakSite.Weld) { MinutesLost = 10 });
        _ = once;
        var standing = await shop.Ask(db => db.Breaks.Select(b => b.EntryId).SingleAsync());
        await shop.Do(new CompleteBreak(standing, BreakSite.Gullet) { MinutesLost = 20 });
        standing = await shop.Ask(db => db.Breaks.Select(b => b.EntryId).SingleAsync());
        await shop.Do(new VoidEntry(standing, "it was another blade"));
        Assert.Equal(0, await shop.Ask(db => db.Breaks.CountAsync()));
        Assert.Equal(0, await shop.Ask(db => db.Dismounts.CountAsync()));
        Assert.Equal("Q-1", await shop.Ask(db => db.OnSaws.Join(db.Blades, o => o.BladeId, b => b.Id, (_, b) => b.Tag).SingleAsync()));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task Once_another_blade_has_gone_on_the_dismount_stays_although_the_break_is_struck_out()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        var told = await shop.Do(new RecordBreak("Q-1", BreakSite.Weld) { LatestUtc = Day.AddHours(4) });
        await shop.Do(SwapTests.On("S1", "Q-2", 5));
        await shop.Do(new VoidEntry(told, "it only came off"));
        Assert.Equal(0, await shop.Ask(db => db.Breaks.CountAsync()));
        Assert.Equal(1, await shop.Ask(db => db.Dismounts.CountAsync()));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task A_late_break_keeps_its_hours_as_a_range_and_ends_the_spell_at_its_own_time()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-08/break", ("Site", "Gullet"), ("Earliest", "3 h ago"), ("Latest", "1 h ago"), ("HoursLow", "310"), ("HoursHigh", "314"))).LeadsTo("/blades/Q-08");
        Assert.Null(await app.TagOn("S2"));
        await using var db = app.NewContext();
        var broke = await db.Breaks.Include(b => b.Entry).SingleAsync(b => b.Blade.Tag == "Q-08");
        Assert.Equal((310.0, 314.0), (broke.HoursLow, broke.HoursHigh));
        Assert.Equal(ShopApp.Today.UtcDateTime.AddHours(-1), broke.Entry.AtUtc);
        Assert.Equal(broke.Entry.AtUtc, (await db.Dismounts.Include(d => d.Entry).OrderByDescending(d => d.EntryId).FirstAsync()).Entry.AtUtc);
        Assert.Contains("310.0 to 314.0 h", SampleApp.Text((await app.GetPage("/breaks")).Body), StringComparison.Ordinal);
        await app.AssertKept();
    }

    [Fact]
    public async Task A_retirement_is_taken_back_within_a_day_from_the_blades_own_page()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-11/retire", ("Reason", "Uneconomic"))).LeadsTo("/blades/Q-11");
        app.Clock.Advance(TimeSpan.FromHours(23));
        var back = (await app.GetPage("/blades/Q-11")).QuerySelectorAll("a.btn").Single(a => a.TextContent == "Not retired after all").GetAttribute("href")!;
        (await app.Fill(back, ("Reason", "meant Q-12"))).LeadsTo("/record");
        Assert.Contains("Put on", SampleApp.Text((await app.GetPage("/blades/Q-11")).Body), StringComparison.Ordinal);
        await app.AssertKept();

        (await app.Fill("/blades/Q-11/retire", ("Reason", "Uneconomic"))).LeadsTo("/blades/Q-11");
        app.Clock.Advance(TimeSpan.FromHours(25));
        Assert.DoesNotContain("Not retired after all", (await app.GetPage("/blades/Q-11")).Body!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_retired_blade_found_on_a_saw_raises_an_alarm_on_the_floor_and_is_recommended_for_nothing()
    {
        using var app = await ShopApp.Sample();
        await app.Be("JP");
        (await app.Fill("/blades/Q-11/retire", ("Reason", "FatigueMark"))).LeadsTo("/blades/Q-11");
        app.Clock.Advance(TimeSpan.FromMinutes(30));
        var asked = (await app.Fill("/saws/S2/swap?on=Q-11", ("Reason", "Dull"))).Refused();
        (await app.SendForm(asked.Page, "/saws/S2/swap", ("Although", "somebody put it back on"))).LeadsTo("/saws/S2");
        var tile = (await app.GetPage("/")).QuerySelectorAll(".tile").Single(t => t.TextContent.Contains("Osprey", StringComparison.Ordinal));
        Assert.NotNull(tile.QuerySelector(".s-hold"));
        Assert.Contains("Do not run. Q-11 was retired", SampleApp.Text(tile), StringComparison.Ordinal);

        await using var db = app.NewContext();
        var advice = new ShopAdvice(await ShopNowReader.Read(db, app.Clock.GetUtcNow().UtcDateTime));
        Assert.DoesNotContain(
            advice.Now.Cuts.Where(c => c.DoneEntryId is null && c.DroppedUtc is null).SelectMany(c => advice.For(c).Choices),
            c => c.Tag == "Q-11" && c.Verdict != BladeLog.Advice.Cuts.Verdict.No);
    }

    /// <summary>Two h of a life of hundreds: no flexing explains that.</summary>
    [Fact]
    public async Task An_early_break_at_the_weld_blames_the_weld_not_the_life_model()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-11/join", ("Loop", "5078"), ("Quality", "Good"))).LeadsTo("/blades/Q-11");
        app.Clock.Advance(TimeSpan.FromMinutes(10));
        (await app.Fill("/saws/S2/swap?on=Q-11", ("Reason", "StillSharp"))).LeadsTo("/saws/S2");
        app.Clock.Advance(TimeSpan.FromHours(2));
        (await app.Fill("/blades/Q-11/break", ("Site", "Weld"), ("MinutesLost", "10"))).LeadsTo("/blades/Q-11");
        var address = (await app.GetPage("/breaks")).QuerySelectorAll("table tbody th a").Single(a => a.TextContent.Trim() == "Q-11").GetAttribute("href")!;
        var says = SampleApp.Text((await app.GetPage(address)).Body);
        Assert.True(says.Contains("blame the weld", StringComparison.Ordinal) || says.Contains("Its hours are not known", StringComparison.Ordinal), says);
    }
}
