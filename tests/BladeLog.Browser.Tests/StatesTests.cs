namespace BladeLog.Browser.Tests;

/// <summary>A state is told by a word and a shape; whoever sees no colour misses nothing.</summary>
public sealed class StatesTests(Workbench bench) : IClassFixture<Workbench>
{
    private const string ReadStates = """
        () => [...document.querySelectorAll('.state')].filter(s => s.checkVisibility()).map(s => {
          const word = s.querySelector('b'), shape = s.querySelector('svg.shape');
          const box = e => e ? e.getBoundingClientRect() : { width: 0, height: 0 };
          return {
            kind: [...s.classList].find(c => c.startsWith('s-')) ?? '',
            word: word?.textContent.trim() ?? '',
            shape: shape?.innerHTML.replace(/\s+/g, ' ').trim() ?? '',
            wordSeen: box(word).width > 20 && box(word).height > 15,
            shapeSeen: box(shape).width >= 20 && box(shape).height >= 20,
            where: s.parentElement.textContent.replace(/\s+/g, ' ').trim().slice(0, 40),
          };
        })
        """;

    [BrowserTheory]
    [InlineData("/", "1280x800")]
    [InlineData("/", "800x1280")]
    [InlineData("/rack", "800x1280")]
    [InlineData("/rack?show=gone", "800x1280")]
    public async Task Each_state_has_its_own_word_and_shape(string path, string screen)
    {
        var at = await LookedAt.Get();
        await bench.At(at.Shop, Screen.Of(screen), async tablet =>
        {
            await tablet.Open(path);
            var states = await tablet.Page.EvaluateAsync<Seen[]>(ReadStates);
            Assert.NotEmpty(states);
            Assert.All(states, s => Assert.True(s.WordSeen && s.Word.Length > 0 && s.ShapeSeen && s.Shape.Length > 0, $"{s.Kind} at \"{s.Where}\" lacks a word or a shape."));
            // What is coloured differently must also be worded and drawn differently.
            foreach (var (a, b) in states.SelectMany(a => states.Where(b => string.CompareOrdinal(a.Kind, b.Kind) < 0).Select(b => (a, b))))
            {
                Assert.True(a.Word != b.Word, $"{a.Kind} and {b.Kind} both say \"{a.Word}\".");
                Assert.True(a.Shape != b.Shape || (a.Kind, b.Kind) is ("s-care", "s-look") or ("s-gone", "s-no"), $"{a.Kind} and {b.Kind} are drawn alike.");
            }
        });
    }

    [BrowserTheory]
    [ClassData(typeof(Tablets))]
    public async Task A_floor_in_trouble_says_so_without_colour(string screen)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            await tablet.Open("/saws/S3/clicking");
            await tablet.Tap(tablet.Button("It clicks: stop and hold Q-17"));
            await Expect(tablet.Title).ToContainTextAsync("Stop Wren");
            await tablet.Open("/saws/S4/slack");
            await tablet.Tap(tablet.Button("Off: slack for the night"));
            await Expect(tablet.Foot.GetByRole(AriaRole.Button)).ToContainTextAsync("Tension off");
            await tablet.Open("/saws/S5/swap");
            await tablet.Tap(tablet.Choice("Other work"));
            await tablet.Tap(tablet.Button("Only take Q-32 off"));
            await tablet.IsAt("/saws/S5");

            await tablet.Open("/");
            foreach (var (saw, word) in new[] { ("S1", "runs"), ("S3", "hold"), ("S4", "slack"), ("S5", "empty") })
            {
                await Expect(tablet.Tile(saw).Locator(".state")).ToHaveTextAsync(word);
            }

            Assert.Equal(4, (await tablet.Page.EvaluateAsync<Seen[]>(ReadStates)).Where(s => s.Word is "runs" or "hold" or "slack" or "empty").Select(s => s.Shape).Distinct().Count());
            await Expect(tablet.Tile("S3")).ToContainTextAsync("Do not run");
            await Expect(tablet.OnTile("S3", "Clear it")).ToBeVisibleAsync();
            var report = new Report();
            report.Add("the floor in trouble", await Look.Measured(tablet));
            report.MustBeEmpty();
        });
    }

    private sealed record Seen
    {
        public string Kind { get; init; } = "";

        public string Word { get; init; } = "";

        public string Shape { get; init; } = "";

        public bool WordSeen { get; init; }

        public bool ShapeSeen { get; init; }

        public string Where { get; init; } = "";
    }
}
