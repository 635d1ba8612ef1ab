using System.Text.RegularExpressions;

namespace BladeLog.Browser.Tests;

/// <summary>What a page answers to a hand: pressed at once, saved in words, read aloud once, nothing typed is lost.</summary>
public sealed partial class AnswerTests(Workbench bench) : IClassFixture<Workbench>
{
    /// <summary>WCAG 2.2, technique ARIA22: the place was there before its words, so the words are read.</summary>
    [BrowserFact]
    public async Task What_was_saved_is_read_aloud_from_the_one_place_no_answer_replaces()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await tablet.Open("/saws/S4/slack");
            await tablet.Page.EvaluateAsync("window.place = document.querySelector('[role=status]'); window.heard = []; new MutationObserver(() => heard.push(place.textContent)).observe(place, { childList: true, subtree: true, characterData: true })");
            await tablet.Tap(tablet.Button("Off: slack for the night"));
            await tablet.IsAt("/saws/S4");
            await Expect(tablet.Page.Locator("[role=status]")).ToHaveTextAsync("Saved 10:30 Tension off");
            await tablet.Tap(tablet.Foot.GetByRole(AriaRole.Link, new() { Name = "Rack" }));
            await tablet.IsAt("/rack");
            // The same place still, by its identity, and what is known is not read again.
            Assert.True(await tablet.Page.EvaluateAsync<bool>("document.querySelectorAll('[role=status]').length === 1 && document.querySelector('[role=status]') === window.place && place.getAttribute('aria-atomic') === 'true'"));
            Assert.Equal(["Saved 10:30 Tension off"], await tablet.Page.EvaluateAsync<string[]>("window.heard"));
        });
    }

    [BrowserFact]
    public async Task The_focus_goes_to_the_heading_of_a_new_page_and_to_what_is_wrong_with_a_form()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Lying, async tablet =>
        {
            tablet.Expects(422);
            await tablet.Open("/saws/S1");
            await tablet.Tap(tablet.Link("Hours"));
            await tablet.IsAt("/saws/S1/hours");
            await Expect(tablet.Title).ToBeFocusedAsync();
            Assert.Equal(0, await tablet.Page.EvaluateAsync<int>("scrollY"));

            var reading = tablet.Field("The meter shows");
            await reading.FillAsync("a lot");
            await reading.PressAsync("Enter");
            await Expect(tablet.Page.GetByRole(AriaRole.Alert)).ToBeFocusedAsync();
            await tablet.Tap(tablet.Page.GetByRole(AriaRole.Alert).GetByRole(AriaRole.Link).First);
            await Expect(reading).ToBeFocusedAsync();
            await Expect(reading).ToHaveValueAsync("a lot");

            await reading.FillAsync("7020.5");
            await reading.PressAsync("Enter");
            await tablet.IsAt("/saws/S1");
            await Expect(tablet.Title).ToBeFocusedAsync();
            await tablet.Page.GoBackAsync();
            await Expect(tablet.Title).ToContainTextAsync("hours");
            await Expect(tablet.Page.Locator("[role=status]")).ToHaveCountAsync(1);
        });
    }

    [BrowserTheory]
    [ClassData(typeof(Screens))]
    public async Task A_saved_entry_is_told_with_its_time_on_every_page_that_follows(string screen)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            await tablet.Open("/saws/S4/slack");
            await tablet.Tap(tablet.Button("Off: slack for the night"));
            await tablet.IsAt("/saws/S4");
            foreach (var path in new[] { "/saws/S4", "/", "/cuts", "/blades/Q-18" })
            {
                await tablet.Open(path);
                await Expect(tablet.Page.Locator("#saved")).ToBeVisibleAsync();
                await Expect(tablet.Page.Locator("#saved")).ToHaveTextAsync(Saved());
                Assert.InRange((await tablet.Page.Locator("#saved").BoundingBoxAsync())!.Width, 40, 400);
            }
        });
    }

    /// <summary>Pressed is a matter of the style sheet: no script, no waiting for the shop's network. 100 ms: Miller 1968, Nielsen 1993.</summary>
    [BrowserFact]
    public async Task A_button_shows_at_once_that_it_is_pressed_and_acts_on_release_only()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Lying, async tablet =>
        {
            await tablet.Open("/saws/S4/slack");
            var button = tablet.Button("Off: slack for the night");
            var box = (await button.BoundingBoxAsync())!;
            var plain = await Ground(button);
            await tablet.Page.Mouse.MoveAsync(box.X + 20, box.Y + 20);
            await tablet.Page.Mouse.DownAsync();
            var pressed = await tablet.Page.EvaluateAsync<double>(
                """
                plain => new Promise(done => {
                  const start = performance.now(), button = document.querySelector('button[value=yes]');
                  const look = () => getComputedStyle(button).backgroundColor !== plain || performance.now() - start > 1000 ? done(performance.now() - start) : requestAnimationFrame(look);
                  look();
                })
                """, plain);
            Assert.InRange(pressed, 0, 100);
            // The finger slides off: nothing was meant.
            await tablet.Page.Mouse.MoveAsync(box.X + 20, box.Y - 200);
            await tablet.Page.Mouse.UpAsync();
            await tablet.IsAt("/saws/S4/slack");
            Assert.False(await shop.Ask(db => Task.FromResult(db.Slacks.Any())));
        });
    }

    [BrowserFact]
    public async Task An_entry_on_its_way_says_so_in_words_and_one_that_does_not_arrive_too()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await tablet.Open("/saws/S4/slack");
            var hold = new TaskCompletionSource();
            await tablet.Page.RouteAsync("**/saws/S4/slack", async route =>
            {
                if (route.Request.Method == "POST")
                {
                    await hold.Task;
                }

                await route.ContinueAsync();
            });
            await tablet.Tap(tablet.Button("Off: slack for the night"));
            await Expect(tablet.Page.Locator("#saved")).ToContainTextAsync("Sending");
            hold.SetResult();
            await tablet.IsAt("/saws/S4");
            await Expect(tablet.Page.Locator("#saved")).ToHaveTextAsync(Saved());

            await tablet.Open("/saws/S4/slack");
            await tablet.Page.UnrouteAllAsync();
            // The browser says that nothing came, which is the story here.
            tablet.ExpectsLostRequests();
            await tablet.Page.RouteAsync("**/saws/S4/slack", route => route.Request.Method == "POST" ? route.AbortAsync() : route.ContinueAsync());
            await tablet.Tap(tablet.Button("On again"));
            await Expect(tablet.Page.Locator("#saved")).ToContainTextAsync("Not sent");
            await Expect(tablet.Page.Locator("[role=status]")).ToHaveTextAsync("Not sent. Tap again.");
            await tablet.Page.UnrouteAllAsync();
            await tablet.Page.WaitForTimeoutAsync(800);
            await tablet.Tap(tablet.Button("On again"));
            await tablet.IsAt("/saws/S4");
            await Expect(tablet.Page.Locator("#saved")).ToHaveTextAsync(Saved());
        });
    }

    [BrowserFact]
    public async Task A_half_filled_form_survives_a_reload_and_is_forgotten_once_it_is_recorded()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await tablet.Open("/blades/Q-18/inspect");
            await tablet.Tap(tablet.Answer("Found", "Crack"));
            await tablet.Tap(tablet.Answer("Place", "Weld"));
            await tablet.Fill("How long", "1.4");
            await tablet.Page.ReloadAsync();
            await Expect(tablet.Field("How long")).ToHaveValueAsync("1.4");
            await Expect(tablet.Page.Locator("input[name=Place][value=Weld]")).ToBeCheckedAsync();
            Assert.DoesNotContain("Token", await tablet.Page.EvaluateAsync<string>("JSON.stringify(localStorage)"), StringComparison.OrdinalIgnoreCase);

            // Away to another page and back: still there.
            await tablet.Open("/rack");
            await tablet.Open("/blades/Q-18/inspect");
            await Expect(tablet.Field("How long")).ToHaveValueAsync("1.4");
            await tablet.Tap(tablet.Button("Record the look"));
            await tablet.IsAt("/blades/Q-18");
            await tablet.Open("/blades/Q-18/inspect");
            Assert.Equal(0, await tablet.Page.Locator("main input:checked").CountAsync());
            Assert.Equal("", await tablet.Page.Locator("[name=CrackLength]").InputValueAsync());
        });
    }

    private static Task<string> Ground(ILocator what) => what.EvaluateAsync<string>("e => getComputedStyle(e).backgroundColor");

    [GeneratedRegex(@"^\s*Saved\s*10:3\d\s*$")]
    private static partial Regex Saved();
}
