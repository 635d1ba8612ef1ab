namespace BladeLog.Browser.Tests;

/// <summary>One running browser for the tests of a class.</summary>
public sealed class Workbench : IAsyncLifetime
{
    private IPlaywright? _driver;
    private IBrowser? _browser;

    public async Task InitializeAsync()
    {
        if (Chromium.Path is not null)
        {
            _driver = await Playwright.CreateAsync();
            _browser = await _driver.Chromium.LaunchAsync(Chromium.Options);
        }
    }

    /// <summary>Hands a tablet showing this shop to the test, and fails it if a page complained meanwhile.</summary>
    public async Task At(ServedShop shop, Screen screen, Func<Tablet, Task> work, bool script = true)
    {
        ArgumentNullException.ThrowIfNull(shop);
        ArgumentNullException.ThrowIfNull(screen);
        ArgumentNullException.ThrowIfNull(work);
        await using var context = await _browser!.NewContextAsync(new BrowserNewContextOptions
        {
            BaseURL = shop.Address.ToString(),
            ViewportSize = new ViewportSize { Width = screen.Width, Height = screen.Height },
            DeviceScaleFactor = 1,
            HasTouch = true,
            IsMobile = true,
            JavaScriptEnabled = script,
            Locale = "en-GB",
        });
        context.SetDefaultTimeout(10_000);
        var tablet = new Tablet(await context.NewPageAsync(), screen);
        await work(tablet);
        tablet.MustBeQuiet();
    }

    public async Task DisposeAsync()
    {
        if (_browser is not null)
        {
            await _browser.DisposeAsync();
        }

        _driver?.Dispose();
    }
}
