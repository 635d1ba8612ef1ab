namespace BladeLog.Browser.Tests;

/// <summary>
/// Ink on its ground, every page in every dress: body text 15 to 1 so that dust and glare leave 10, no text under 7, parts 3.
/// </summary>
public sealed class ContrastTests(Workbench bench) : IClassFixture<Workbench>
{
    private const double Body = 15;
    private const double Text = 7;
    private const double Parts = 3;

    [BrowserFact]
    public async Task Every_word_and_part_stands_out_from_its_ground_in_every_dress()
    {
        var at = await LookedAt.Get();
        await bench.At(at.Shop, Screen.Standing, async tablet =>
        {
            var report = new Report();
            foreach (var path in at.Paths(2))
            {
                await tablet.Open(path);
                foreach (var (dress, media) in Dresses)
                {
                    await tablet.Page.EmulateMediaAsync(media);
                    // The reader's own colours are the reader's: there the words must be legible, 4.5 to 1.
                    var own = media.ForcedColors == ForcedColors.Active;
                    report.Add(path, (await Look.Contrast(tablet, own ? 4.5 : Body, own ? 4.5 : Text, Parts)).Select(f => $"{dress}, {f}"));
                }
            }

            report.MustBeEmpty();
        });
    }

    [BrowserTheory]
    [InlineData("body: ", "<p>grey on white</p>", "#5a5a5a")]
    [InlineData("text: ", "<p style='color:#666'>soft words</p>", "#000")]
    [InlineData("text: ", "<p style='background:#333'>dark on dark</p>", "#000")]
    [InlineData("part: frame", "<a class=btn style='border:3px solid #bbb;color:#000'>Swap</a>", "#000")]
    [InlineData("part: line", "<svg width=80 height=80><path class=axis d='M0 0H80' stroke='#ccc' stroke-width='2'/></svg>", "#000")]
    [InlineData(null, "<p>ink</p><a class=btn style='border:3px solid #0b3a8c;color:#0b3a8c'>Swap</a>", "#000")]
    public async Task The_measure_sees_what_it_is_there_to_see(string? rule, string fault, string ink)
    {
        var at = await LookedAt.Get();
        await bench.At(at.Shop, Screen.Standing, async tablet =>
        {
            await tablet.Page.SetContentAsync($"<!doctype html><style>html{{color:{ink};background:#fff}}</style>{fault}");
            var found = await Look.Contrast(tablet, Body, Text, Parts);
            if (rule is null)
            {
                Assert.Empty(found);
            }
            else
            {
                Assert.Contains(found, f => f.StartsWith(rule, StringComparison.Ordinal));
            }
        });
    }

    private static readonly (string Dress, PageEmulateMediaOptions Media)[] Dresses =
    [
        ("light", new() { ColorScheme = ColorScheme.Light, Contrast = Contrast.NoPreference, ForcedColors = ForcedColors.None }),
        ("dark", new() { ColorScheme = ColorScheme.Dark, Contrast = Contrast.NoPreference, ForcedColors = ForcedColors.None }),
        ("more contrast", new() { ColorScheme = ColorScheme.Light, Contrast = Contrast.More, ForcedColors = ForcedColors.None }),
        ("dark, more contrast", new() { ColorScheme = ColorScheme.Dark, Contrast = Contrast.More, ForcedColors = ForcedColors.None }),
        ("the reader's colours", new() { ColorScheme = ColorScheme.Light, Contrast = Contrast.NoPreference, ForcedColors = ForcedColors.Active }),
    ];
}
