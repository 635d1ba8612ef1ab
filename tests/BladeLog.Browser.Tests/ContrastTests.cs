namespace BladeLog.Browser.Tests;

/// <summary>Ink on paper in the light of the shop and in the dark: 7 to 1 for plain text.</summary>
public sealed class ContrastTests(Workbench bench) : IClassFixture<Workbench>
{
    private static readonly string[] Paths =
    [
        "/", "/rack", "/cuts", "/cuts/7", "/cuts/13", "/blades/Q-09", "/blades/Q-14", "/saws/S3", "/saws/S3/swap?on=Q-14", "/saws/S3/clicking",
    ];

    [BrowserTheory]
    [InlineData(ColorScheme.Light)]
    [InlineData(ColorScheme.Dark)]
    public async Task Every_word_stands_out_from_its_ground(ColorScheme scheme)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await tablet.Page.EmulateMediaAsync(new PageEmulateMediaOptions { ColorScheme = scheme });
            var report = new Report();
            foreach (var path in Paths)
            {
                await tablet.Open(path);
                report.Add(path, await Look.Contrast(tablet));
            }

            report.MustBeEmpty();
        });
    }
}
