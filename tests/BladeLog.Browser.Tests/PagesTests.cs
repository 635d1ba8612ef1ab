namespace BladeLog.Browser.Tests;

/// <summary>
/// Every page of the sample shop, on every screen, as eyes, gloves and a screen reader meet it: sizes and gaps of targets,
/// risky ones apart, sizes of type, nothing sideways, nothing under the title block, no obstacle by the rules of axe.
/// </summary>
public abstract class PagesTests(Workbench bench, Screen screen, int ofEach) : IClassFixture<Workbench>
{
    [BrowserFact]
    public async Task Every_page_fits_the_screen_the_glove_and_a_reader_without_eyes()
    {
        var at = await LookedAt.Get();
        await bench.At(at.Shop, screen, async tablet =>
        {
            var report = new Report();
            foreach (var kind in at.Pages.ByKind.Keys)
            {
                var first = true;
                foreach (var path in at.Pages.Some(kind, ofEach))
                {
                    await tablet.Open(path);
                    report.Add(path, await Look.Measured(tablet));
                    if (first)
                    {
                        report.Add(path, await Look.Scanned(tablet));
                        report.Add(path, await Look.Covered(tablet));
                    }

                    first = false;
                }
            }

            report.MustBeEmpty();
        });
    }
}

public sealed class PagesOnALyingTabletTests(Workbench bench) : PagesTests(bench, Screen.Lying, 2);

public sealed class PagesOnAStandingTabletTests(Workbench bench) : PagesTests(bench, Screen.Standing, 3);

public sealed class PagesOnAPhoneTests(Workbench bench) : PagesTests(bench, Screen.Phone, 2);

/// <summary>A very narrow screen, and the lying tablet at twice its size.</summary>
public sealed class NarrowPagesTests(Workbench bench) : IClassFixture<Workbench>
{
    [BrowserTheory]
    [InlineData("320x600")]
    [InlineData("640x400")]
    public async Task No_page_scrolls_sideways_and_nothing_covers_what_has_the_focus(string screen)
    {
        var at = await LookedAt.Get();
        await bench.At(at.Shop, Screen.Of(screen), async tablet =>
        {
            var report = new Report();
            foreach (var path in at.Paths(1))
            {
                await tablet.Open(path);
                report.Add(path, (await Look.Measured(tablet)).Where(f => f.StartsWith("sideways", StringComparison.Ordinal)));
                report.Add(path, await Look.Covered(tablet));
            }

            report.MustBeEmpty();
        });
    }
}

/// <summary>The walk itself: what is reached, and that every link leads somewhere.</summary>
public sealed class PageListTests
{
    [BrowserFact]
    public async Task Every_link_leads_somewhere()
    {
        var pages = (await LookedAt.Get()).Pages;
        Assert.True(pages.Broken.Count == 0, string.Join('\n', pages.Broken));
    }

    /// <summary>What is left over is no page of the shop's own: first start, a scanned label's way in, files and answers for machines.</summary>
    [BrowserFact]
    public async Task Every_page_the_program_has_is_among_those_looked_at()
    {
        var pages = (await LookedAt.Get()).Pages;
        Assert.Empty(pages.Kinds.Except(pages.ByKind.Keys).Except(["/start", "/health", "/b/{tag}"]));
    }
}
