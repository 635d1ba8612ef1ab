using System.Text.RegularExpressions;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Browser.Tests;

/// <summary>Which blade for the next cut: three taps from the Floor to the form that records it.</summary>
public sealed class CutJourneyTests(Workbench bench) : IClassFixture<Workbench>
{
    [BrowserTheory]
    [ClassData(typeof(TabletsWithAndWithoutScript))]
    public async Task Three_taps_choose_the_blade_for_a_cut(string screen, bool script)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            await tablet.Open("/");
            await tablet.Tap(tablet.Foot.GetByRole(AriaRole.Link, new() { Name = "Cuts" }));
            await Expect(tablet.Title).ToContainTextAsync("15 cuts wait");
            await tablet.Tap(tablet.Page.Locator("main a[href='/cuts/7']"));

            // The sample shop's expected answer for cut 7: Q-01, which is on Old Heron; chip room ends its window.
            var best = tablet.Page.Locator("article.best");
            await Expect(best).ToContainTextAsync("Q-01");
            await Expect(best.Locator(".state")).ToContainTextAsync("fits");
            await Expect(best.GetByRole(AriaRole.Img, new() { NameRegex = new Regex("chip room") })).ToBeVisibleAsync();
            await tablet.Tap(tablet.Link("Cut it with Q-01"));
            await Expect(tablet.Title).ToContainTextAsync("Cut 7 done");
            Assert.True(tablet.Taps <= 3, $"It took {tablet.Taps} taps.");

            await tablet.Tap(tablet.Button("It is cut"));
            await Expect(tablet.Page.Locator("#saved")).ToContainTextAsync("Saved");
            await tablet.Open("/cuts");
            await Expect(tablet.Title).ToContainTextAsync("14 cuts wait");
        }, script);
        Assert.Equal(1, await shop.Ask(db => db.CutsDone.CountAsync(c => c.QueuedCutId != null && c.Entry.Void == null && c.Entry.AtUtc >= ServedShop.Today.UtcDateTime.AddHours(-12))));
    }

    [BrowserTheory]
    [ClassData(typeof(TabletsWithAndWithoutScript))]
    public async Task A_better_blade_from_the_rack_is_put_on_from_the_answer(string screen, bool script)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            // Cut 3 is for the thin kerf of Q-13, which hangs on the rack.
            await tablet.Open("/cuts");
            await tablet.Tap(tablet.Page.Locator("main a[href='/cuts/3']"));
            await tablet.Tap(tablet.Link("Put Q-13 on Osprey"));
            await Expect(tablet.Title).ToContainTextAsync("Q-08 off, Q-13 on");
            Assert.Equal(2, tablet.Taps);
            await tablet.Tap(tablet.Choice("Still sharp"));
            await tablet.Tap(tablet.Button("Put Q-13 on"));
            await tablet.IsAt("/saws/S2");
            await tablet.Open("/");
            await Expect(tablet.Tile("S2").Locator(".on")).ToContainTextAsync("Q-13");
        }, script);
    }

    [BrowserTheory]
    [ClassData(typeof(Tablets))]
    public async Task A_cut_no_blade_is_for_says_why_and_offers_no_blade(string screen)
    {
        var at = await LookedAt.Get();
        await bench.At(at.Shop, Screen.Of(screen), async tablet =>
        {
            await tablet.Open("/cuts/13");
            await Expect(tablet.Page.Locator("article.best")).ToHaveCountAsync(0);
            await Expect(tablet.Page.Locator("main")).ToContainTextAsync("aluminium");
            await Expect(tablet.Page.GetByRole(AriaRole.Link, new() { NameRegex = new Regex("^Cut it with") })).ToHaveCountAsync(0);
        });
    }
}
