namespace BladeLog.Browser.Tests;

/// <summary>Every page of the sample shop, on every screen, as eyes, gloves and a screen reader meet it.</summary>
public abstract class PagesTests(Workbench bench, string screen) : IClassFixture<Workbench>, IAsyncLifetime
{
    private ServedShop? _shop;
    private PageList? _pages;

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
    public Task Every_page_fits_the_screen_and_the_glove() => bench.At(_shop!, Screen.Of(screen), async tablet =>
    {
        var report = new Report();
        foreach (var kind in _pages!.ByKind.Keys)
        {
            foreach (var path in _pages.Some(kind, 5))
            {
                await tablet.Open(path);
                report.Add(kind, path, await Look.Measured(tablet));
            }
        }

        report.MustBeEmpty();
    });

    [BrowserFact]
    public Task A_reader_without_eyes_meets_no_obstacle() => bench.At(_shop!, Screen.Of(screen), async tablet =>
    {
        var report = new Report();
        foreach (var kind in _pages!.ByKind.Keys)
        {
            var path = _pages.Some(kind, 1).First();
            await tablet.Open(path);
            report.Add(kind, path, await Look.Scanned(tablet));
        }

        report.MustBeEmpty();
    });

    [BrowserFact]
    public void Every_link_leads_somewhere() => Assert.True(_pages!.Broken.Count == 0, string.Join('\n', _pages.Broken));
}

public sealed class PagesOnALyingTabletTests(Workbench bench) : PagesTests(bench, Screen.Lying.Name);

public sealed class PagesOnAStandingTabletTests(Workbench bench) : PagesTests(bench, Screen.Standing.Name);

public sealed class PagesOnAPhoneTests(Workbench bench) : PagesTests(bench, Screen.Phone.Name);
