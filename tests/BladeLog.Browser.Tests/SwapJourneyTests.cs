using Microsoft.EntityFrameworkCore;

namespace BladeLog.Browser.Tests;

/// <summary>A blade is changed at the saw: two taps after a scan, three without; one tap takes it back for a minute.</summary>
public sealed class SwapJourneyTests(Workbench bench) : IClassFixture<Workbench>
{
    [BrowserTheory]
    [ClassData(typeof(TabletsWithAndWithoutScript))]
    public async Task Three_taps_change_the_blade_from_its_saw(string screen, bool script)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            await tablet.Open("/");
            await tablet.Tap(tablet.OnTile("S3", "Swap"));
            await Expect(tablet.Title).ToContainTextAsync("Wren: Q-17 off");

            var before = tablet.Taps;
            await tablet.Tap(tablet.Choice("Still sharp"));
            await tablet.Tap(tablet.Choice("Q-18"));
            await tablet.Tap(tablet.Button("Put it on"));
            await IsOn(tablet, "Q-18");
            Assert.Equal(3, tablet.Taps - before);
            Assert.Equal(["Q-18"], await MountsToday(shop));
        }, script);
    }

    [BrowserTheory]
    [ClassData(typeof(TabletsWithAndWithoutScript))]
    public async Task Two_taps_are_enough_after_a_scan(string screen, bool script)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            await tablet.Open("/saws/S3/swap");
            var scan = tablet.Field("Scan or type");
            // A scanner at hand types the label and ends with Enter.
            await scan.FillAsync("http://shop.local/b/q-18");
            await scan.PressAsync("Enter");
            await Expect(tablet.Title).ToContainTextAsync("Q-17 off, Q-18 on");

            var before = tablet.Taps;
            await tablet.Tap(tablet.Choice("Dull"));
            await tablet.Tap(tablet.Button("Put Q-18 on"));
            await IsOn(tablet, "Q-18");
            Assert.Equal(2, tablet.Taps - before);
            Assert.Equal(["Q-18"], await MountsToday(shop));
        }, script);
    }

    [BrowserTheory]
    [ClassData(typeof(TabletsWithAndWithoutScript))]
    public async Task One_tap_takes_it_back_within_the_minute(string screen, bool script)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            await Swap(tablet);
            var undo = tablet.Foot.GetByRole(AriaRole.Button, new() { Name = "Undo" });
            await Expect(undo).ToContainTextAsync("Q-18");
            var before = tablet.Taps;
            await tablet.Tap(undo);
            await Expect(tablet.Foot).ToContainTextAsync("Undone");
            await Expect(undo).ToHaveCountAsync(0);
            Assert.Equal(1, tablet.Taps - before);
            await tablet.Open("/");
            await Expect(tablet.Tile("S3").Locator(".on")).ToContainTextAsync("Q-17");
            Assert.Empty(await MountsToday(shop));
        }, script);
    }

    [BrowserFact]
    public async Task After_a_minute_the_undo_has_gone()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await Swap(tablet);
            await Expect(tablet.Foot.GetByRole(AriaRole.Button, new() { Name = "Undo" })).ToBeVisibleAsync();
            shop.Clock.Advance(TimeSpan.FromSeconds(61));
            await tablet.Open("/");
            await Expect(tablet.Foot.GetByRole(AriaRole.Button)).ToHaveCountAsync(0);
            await Expect(tablet.Page.Locator("#saved")).ToContainTextAsync("Saved");
        });
    }

    [BrowserTheory]
    [InlineData(true)]
    [InlineData(false)]
    public async Task A_double_tap_makes_one_fact(bool script)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await tablet.Open("/saws/S3/swap?on=Q-18");
            await tablet.Tap(tablet.Choice("Still sharp"));
            await tablet.DoubleTap(tablet.Button("Put Q-18 on"));
            await IsOn(tablet, "Q-18");
            Assert.Equal(["Q-18"], await MountsToday(shop));
        }, script);
    }

    [BrowserTheory]
    [ClassData(typeof(TabletsWithAndWithoutScript))]
    public async Task A_forgotten_answer_is_asked_for_and_nothing_is_lost(string screen, bool script)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            tablet.Expects(422);
            await tablet.Open("/saws/S3/swap?on=Q-18");
            await tablet.Tap(tablet.Button("Put Q-18 on"));
            await Expect(tablet.Page.GetByRole(AriaRole.Alert)).ToContainTextAsync("Say how Q-17 comes off.");
            Assert.Empty(await MountsToday(shop));
            var report = new Report();
            report.Add("the refused swap", await Look.Measured(tablet));
            report.MustBeEmpty();

            await tablet.Tap(tablet.Choice("Still sharp"));
            await tablet.Tap(tablet.Button("Put Q-18 on"));
            await IsOn(tablet, "Q-18");
            Assert.Equal(["Q-18"], await MountsToday(shop));
        }, script);
    }

    private static async Task Swap(Tablet tablet)
    {
        await tablet.Open("/saws/S3/swap?on=Q-18");
        await tablet.Tap(tablet.Choice("Still sharp"));
        await tablet.Tap(tablet.Button("Put Q-18 on"));
        await tablet.IsAt("/saws/S3");
    }

    /// <summary>The saw's own page says it at once, and the Floor says it too.</summary>
    private static async Task IsOn(Tablet tablet, string tag)
    {
        await tablet.IsAt("/saws/S3");
        await Expect(tablet.Page.Locator("main")).ToContainTextAsync(tag);
        await Expect(tablet.Page.Locator("#saved")).ToContainTextAsync("Saved");
        await tablet.Open("/");
        await Expect(tablet.Tile("S3").Locator(".on")).ToContainTextAsync(tag);
    }

    private static Task<string[]> MountsToday(ServedShop shop) => shop.Ask(db => db.Mounts
        .Where(m => m.Saw.Code == "S3" && m.Entry.Void == null && m.Entry.AtUtc >= ServedShop.Today.UtcDateTime)
        .Select(m => m.Blade.Tag).ToArrayAsync());
}
