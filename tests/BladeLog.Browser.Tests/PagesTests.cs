namespace BladeLog.Browser.Tests;

/// <summary>Every page of the sample shop, on every screen, as eyes, gloves and a screen reader meet it.</summary>
public abstract class PagesTests(Workbench bench, Screen screen, params string[] only) : IClassFixture<Workbench>, IAsyncLifetime
{
    private ServedShop? _shop;
    private PageList? _pages;

    private IEnumerable<string> Kinds => _pages!.ByKind.Keys.Where(k => only.Length == 0 || only.Contains(k));

    public async Task InitializeAsync()
    {
        if (Chromium.Path is not null)
        {
            _shop = await ServedShop.Sample();
            _pages = await PageList.Of(_shop);
        }
    }

    public async Task DisposeAsync()
    {
        if (_shop is not null)
        {
            await _shop.DisposeAsync();
        }
    }

    [BrowserFact]
    public Task Every_page_fits_the_screen_and_the_glove() => bench.At(_shop!, screen, async tablet =>
    {
        var report = new Report();
        foreach (var kind in Kinds)
        {
            foreach (var path in _pages!.Some(kind, 5))
            {
                await tablet.Open(path);
                report.Add(path, await Look.Measured(tablet));
            }
        }

        report.MustBeEmpty();
    });

    [BrowserFact]
    public Task A_reader_without_eyes_meets_no_obstacle() => bench.At(_shop!, screen, async tablet =>
    {
        var report = new Report();
        foreach (var kind in Kinds)
        {
            var path = _pages!.Some(kind, 1).First();
            await tablet.Open(path);
            report.Add(path, await Look.Scanned(tablet));
        }

        report.MustBeEmpty();
    });

    [BrowserFact]
    public void Every_page_the_tests_name_is_there() => Assert.Empty(only.Except(_pages!.ByKind.Keys));

    [BrowserFact]
    public void Every_link_leads_somewhere() => Assert.True(_pages!.Broken.Count == 0, string.Join('\n', _pages.Broken));
}

public sealed class PagesOnALyingTabletTests(Workbench bench) : PagesTests(bench, Screen.Lying);

public sealed class PagesOnAStandingTabletTests(Workbench bench) : PagesTests(bench, Screen.Standing);

public sealed class PagesOnAPhoneTests(Workbench bench) : PagesTests(
    bench, Screen.Phone, "/", "/rack", "/blades/{tag}", "/saws/{code}", "/saws/{code}/swap", "/saws/{code}/hours", "/saws/{code}/clicking",
    "/cuts", "/cuts/{number:int}", "/cuts/{number:int}/done", "/bench", "/more", "/who");
