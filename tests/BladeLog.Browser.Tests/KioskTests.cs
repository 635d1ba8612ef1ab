using System.Text.Json;
using System.Text.RegularExpressions;

namespace BladeLog.Browser.Tests;

/// <summary>The tablet shows the program and nothing else: its own window, no box that pops up, nothing from elsewhere.</summary>
public sealed partial class KioskTests(Workbench bench) : IClassFixture<Workbench>
{
    /// <summary>Members and values: W3C, Web Application Manifest.</summary>
    [BrowserFact]
    public async Task The_browser_may_install_it_as_a_full_screen_program_of_its_own()
    {
        var at = await LookedAt.Get();
        await bench.At(at.Shop, Screen.Standing, async tablet =>
        {
            await tablet.Open("/");
            var href = await tablet.Page.Locator("link[rel=manifest]").GetAttributeAsync("href");
            var told = await tablet.Page.Context.NewCDPSessionAsync(tablet.Page);
            var read = (await told.SendAsync("Page.getAppManifest"))!.Value;
            Assert.Empty(read.GetProperty("errors").EnumerateArray().Select(e => e.GetProperty("message").GetString()));
            Assert.Equal(new Uri(at.Shop.Address, href).ToString(), read.GetProperty("url").GetString());

            var manifest = JsonDocument.Parse(read.GetProperty("data").GetString()!).RootElement;
            Assert.Equal("fullscreen", manifest.GetProperty("display").GetString());
            Assert.Equal("/", manifest.GetProperty("start_url").GetString());
            Assert.Equal("any", manifest.GetProperty("orientation").GetString());
            using var client = new HttpClient { BaseAddress = at.Shop.Address };
            foreach (var icon in manifest.GetProperty("icons").EnumerateArray())
            {
                using var answer = await client.GetAsync(icon.GetProperty("src").GetString());
                Assert.Equal(icon.GetProperty("type").GetString(), answer.Content.Headers.ContentType?.MediaType);
            }

            using var served = await client.GetAsync(href);
            Assert.Equal("application/manifest+json", served.Content.Headers.ContentType?.MediaType);
        });
    }

    [BrowserFact]
    public async Task No_page_pops_a_box_up_or_opens_a_window()
    {
        var at = await LookedAt.Get();
        using var client = new HttpClient { BaseAddress = at.Shop.Address };
        foreach (var path in at.Paths(1))
        {
            var page = await client.GetStringAsync(path);
            Assert.DoesNotContain("target=\"_blank\"", page, StringComparison.Ordinal);
            Assert.DoesNotContain("hx-confirm", page, StringComparison.Ordinal);
            // A file is asked for where a list is brought in, and nowhere in a day's work.
            Assert.True(path == "/import" || !page.Contains("type=\"file\"", StringComparison.Ordinal), path);
        }

        var own = await client.GetStringAsync("/js/sheet.js");
        Assert.False(Box().IsMatch(own), Box().Match(own).Value);
    }

    [BrowserFact]
    public async Task A_page_asks_nothing_of_any_other_machine()
    {
        var at = await LookedAt.Get();
        await bench.At(at.Shop, Screen.Lying, async tablet =>
        {
            var asked = new List<string>();
            tablet.Page.Request += (_, request) => asked.Add(request.Url);
            await tablet.Open("/");
            await tablet.Open("/blades/Q-09");
            Assert.NotEmpty(asked);
            Assert.All(asked, url => Assert.StartsWith(at.Shop.Address.ToString(), url, StringComparison.Ordinal));
        });
    }

    [GeneratedRegex(@"\b(alert|confirm|prompt|showModal|print)\s*\(|window\.open|onbeforeunload|beforeunload")]
    private static partial Regex Box();

    /// <summary>A lamp that went out between two people: what one left stands there, and says so.</summary>
    [BrowserFact]
    public async Task What_somebody_left_unsent_says_since_when_and_one_tap_clears_it()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await tablet.Open("/saws/S1/hours");
            var reading = tablet.Page.GetByLabel("The meter shows", new() { Exact = true });
            await Expect(tablet.Page.Locator(".draftnote")).ToHaveCountAsync(0);
            await reading.FillAsync("8025");
            await tablet.Open("/");
            await tablet.Open("/saws/S1/hours");
            await Expect(reading).ToHaveValueAsync("8025");
            await Expect(tablet.Page.Locator(".draftnote")).ToContainTextAsync("Left from ");
            await tablet.Tap(tablet.Button("Start clean"));
            await Expect(reading).ToHaveValueAsync("");
            await Expect(tablet.Page.Locator(".draftnote")).ToHaveCountAsync(0);
            await tablet.Open("/saws/S1/hours");
            await Expect(reading).ToHaveValueAsync("");
        });
    }
}
