using System.Text.RegularExpressions;

namespace BladeLog.Browser.Tests;

/// <summary>One finger, one tap: nothing on any page needs two hands, a long press, a double tap, a drag or a hover; keys alone do too.</summary>
public sealed partial class HandsTests(Workbench bench) : IClassFixture<Workbench>
{
    /// <summary>A swap by keys alone: Tab to it, Space to choose, Enter to send.</summary>
    [BrowserTheory]
    [InlineData(true)]
    [InlineData(false)]
    public async Task A_blade_is_changed_with_keys_alone(bool script)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Lying, async tablet =>
        {
            await tablet.Open("/");
            await TabTo(tablet, "a[href='/saws/S3/swap']");
            await tablet.Page.Keyboard.PressAsync("Enter");
            await Expect(tablet.Title).ToContainTextAsync("Wren: Q-17 off");
            await TabTo(tablet, "input[name=Reason]");
            await tablet.Page.Keyboard.PressAsync("Space");
            await TabTo(tablet, "input[name=OnTag]");
            await tablet.Page.Keyboard.PressAsync("Space");
            var tag = await tablet.Page.EvaluateAsync<string>("document.activeElement.value");
            await TabTo(tablet, "button.main");
            await tablet.Page.Keyboard.PressAsync("Enter");
            await tablet.IsAt("/saws/S3");
            await tablet.Open("/");
            await Expect(tablet.Tile("S3").Locator(".on")).ToContainTextAsync(tag);
            Assert.Equal(0, tablet.Taps);
        }, script);
    }

    /// <summary>The main action of the glove's pages lies in the lower half, where the thumb is.</summary>
    [BrowserTheory]
    [InlineData("/saws/S3/swap?on=Q-18", "button.main", "1280x800")]
    [InlineData("/saws/S3/swap?on=Q-18", "button.main", "800x1280")]
    [InlineData("/saws/S3/swap", "button.main", "1280x800")]
    [InlineData("/", ".hands .btn", "1280x800")]
    [InlineData("/blades/Q-18/inspect", "button.main", "1280x800")]
    [InlineData("/blades/Q-18/sharpen", "button.main", "1280x800")]
    public async Task The_main_action_lies_in_the_lower_half(string path, string action, string screen)
    {
        var at = await LookedAt.Get();
        await bench.At(at.Shop, Screen.Of(screen), async tablet =>
        {
            await tablet.Open(path);
            foreach (var box in await tablet.Page.EvaluateAsync<double[]>("which => [...document.querySelectorAll(which)].map(e => e.getBoundingClientRect()).map(b => (b.top + b.bottom) / 2)", action))
            {
                Assert.True(box > tablet.Screen.Height / 2.0, $"It stands at {box:0} of {tablet.Screen.Height}.");
            }
        });
    }

    /// <summary>Said once on the tablet, what is tapped often stands at the other side; the page fits as it did.</summary>
    [BrowserTheory]
    [InlineData("1280x800", false)]
    [InlineData("800x1280", true)]
    [InlineData("360x740", true)]
    public async Task What_is_tapped_often_stands_at_the_side_of_the_hand(string screen, bool script)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            async Task<double> Middle(string path, string which)
            {
                await tablet.Open(path);
                return await tablet.Page.EvaluateAsync<double>("which => { const b = document.querySelector(which).getBoundingClientRect(); return (b.left + b.right) / 2 }", which);
            }

            var (path, which) = screen == "1280x800" ? ("/saws/S3", ".cols>aside") : ("/", ".tile .hands");
            var right = await Middle(path, which);
            await tablet.Open("/more");
            await tablet.Tap(tablet.Button("Put it at the left"));
            await Expect(tablet.Button("Put it at the right")).ToBeVisibleAsync();
            var left = await Middle(path, which);
            Assert.True(!tablet.Screen.IsTablet || (right > tablet.Screen.Width / 2.0 && left < tablet.Screen.Width / 2.0), $"It stood at {right:0}, then at {left:0}.");
            var report = new Report();
            foreach (var page in (string[])["/", "/saws/S2", "/blades/Q-17", "/blades/Q-14", "/cuts/2", "/saws/S2/swap", "/more"])
            {
                await tablet.Open(page);
                report.Add(page, await Look.Measured(tablet));
            }

            report.MustBeEmpty();
        }, script);
    }

    [BrowserFact]
    public async Task No_page_asks_for_a_hover_a_drag_or_a_long_press()
    {
        var at = await LookedAt.Get();
        using var client = new HttpClient { BaseAddress = at.Shop.Address };
        foreach (var path in at.Paths(1))
        {
            var page = await client.GetStringAsync(path);
            Assert.False(Handler().IsMatch(page), $"{path} has {Handler().Match(page).Value}.");
            foreach (var file in File().Matches(page).Select(m => m.Groups[1].Value).Distinct())
            {
                var text = await client.GetStringAsync(file);
                Assert.DoesNotContain(":hover", text, StringComparison.Ordinal);
                if (!file.StartsWith("/lib/", StringComparison.Ordinal))
                {
                    Assert.False(Gesture().IsMatch(text), $"{file} has {Gesture().Match(text).Value}.");
                }
            }
        }
    }

    private static async Task TabTo(Tablet tablet, string which)
    {
        for (var i = 0; i < 80; i++)
        {
            await tablet.Page.Keyboard.PressAsync("Tab");
            if (await tablet.Page.EvaluateAsync<bool>("which => document.activeElement.matches(which)", which))
            {
                return;
            }
        }

        Assert.Fail($"No way with Tab to {which}.");
    }

    /// <summary>A handler in the page, a thing to drag, words that stand only in a hover.</summary>
    [GeneratedRegex("\\s(on[a-z]+|draggable|title|accesskey|hx-confirm)=\"[^\"]*\"", RegexOptions.IgnoreCase)]
    private static partial Regex Handler();

    [GeneratedRegex("(?:src|href)=\"(/(?:js|lib|css)/[^\"]+)\"")]
    private static partial Regex File();

    [GeneratedRegex("""'(dblclick|contextmenu|drag\w*|mouse\w+|pointer\w+|touch\w+|keydown|wheel)'""")]
    private static partial Regex Gesture();
}
