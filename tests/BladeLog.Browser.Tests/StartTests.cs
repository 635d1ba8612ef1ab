namespace BladeLog.Browser.Tests;

/// <summary>The very first page, before there is a shop.</summary>
public sealed class StartTests(Workbench bench) : IClassFixture<Workbench>
{
    [BrowserTheory]
    [InlineData("1280x800")]
    [InlineData("800x1280")]
    [InlineData("360x740")]
    public async Task The_first_page_fits_the_screen_and_the_glove(string screen)
    {
        await using var shop = ServedShop.Unmade();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            var report = new Report();
            await tablet.Open("/");
            await tablet.IsAt("/start");
            report.Add("/start", await Look.Measured(tablet));
            report.Add("/start", await Look.Scanned(tablet));
            report.MustBeEmpty();
        });
    }
}
