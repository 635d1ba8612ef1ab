using System.Globalization;
using AngleSharp.Dom;

namespace BladeLog.Tests.Features;

/// <summary>The figures of a what-if lead to workings that show them, filled in with what was asked.</summary>
public sealed class WorkedAskedTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Theory]
    [InlineData("/blades/Q-32/what-if?thickness=0.9+mm", "75 h")] // Demo story 10.
    [InlineData("/blades/Q-32/what-if?hrc=50&weld=best", null)]
    public async Task The_life_of_a_change_stands_on_its_working(string address, string? expected)
    {
        IDocument page = await sample.Page(address);
        string then = Text(page.QuerySelectorAll(".table-facts tbody tr").First(r => Text(r.QuerySelector("th")) == "Half of such blades broken").Children[2]);
        Assert.Equal(expected ?? then, then);
        Assert.Equal(then, Line(await sample.Page(Link(page, "band-life")), "Median life"));
    }

    [Fact]
    public async Task The_other_figures_of_a_change_stand_on_their_workings()
    {
        IDocument page = await sample.Page("/blades/Q-09/what-if?saw=S2&width=24+mm&thickness=0.8+mm&tension=120+MPa&height=180+mm");
        string Then(string begin) => Text(page.QuerySelectorAll(".table-facts tbody tr").First(r => Text(r.QuerySelector("th")).StartsWith(begin, StringComparison.Ordinal)).Children[2]);
        IDocument life = await sample.Page(Link(page, "band-life")), pull = await sample.Page(Link(page, "tension"));
        Assert.Equal(Then("Bending stress"), Line(life, "Bending stress"));
        Assert.Equal(Then("Thickness to wheel"), Line(life, "Thickness to wheel"));
        Assert.Equal(Then("Bends an hour"), Line(life, "Bends an hour"));
        Assert.StartsWith(Line(pull, "Tension"), Then("Tension"), StringComparison.Ordinal);
        Assert.Equal(Then("Pull in one strand"), Line(pull, "Pull in one strand"));
        Assert.Equal(Then("The saw can reach"), Line(pull, "The saw can reach"));
        Assert.Equal(Then("Push it stands"), Line(await sample.Page(Link(page, "thrust-limits")), "Allowed"));
        Assert.Equal(Number(Then("Tightest curve")), Number(Line(await sample.Page(Link(page, "curve")), "Turns without relief cuts")), 0.5);
    }

    [Theory]
    [InlineData("/saws/S1/what-if?wood=Scots+pine")]
    [InlineData("/saws/S2/what-if")]
    [InlineData("/saws/S2/what-if?blade=Q-13&moisture=60")]
    [InlineData("/saws/S3/what-if?edges=ground&feed=0.5")]
    [InlineData("/saws/S4/what-if")]
    [InlineData("/saws/S5/what-if?edges=ground")]
    public async Task What_a_saw_can_resaw_and_what_a_change_would_do_stand_on_their_workings(string address)
    {
        IDocument page = await sample.Page(address);
        int told = 0;
        foreach (IElement row in page.QuerySelectorAll("[aria-label='Deepest stock'] tbody tr"))
        {
            await Depth(row.Children[1], row.Children[2]);
            Assert.Equal(Number(Text(row.Children[3])), Feed((await Of(row.Children[1]))!), 0.051 * Number(Text(row.Children[3])));
            await Same(row.Children[4], "Allowed");
        }

        foreach (IElement row in page.QuerySelectorAll("[aria-label=Changes] tbody tr"))
        {
            await Depth(row.Children[1], row.Children[2]);
            await Same(row.Children[3], "Tension");
            await Same(row.Children[4], "Allowed");
            await Same(row.Children[5], "Median life");
        }

        Assert.True(told > 10, $"Only {told} figures were found on their workings.");

        async Task<IDocument?> Of(IElement cell)
        {
            if (cell.QuerySelector("a") is not { } link)
            {
                Assert.Equal("-", Text(cell));
                return null;
            }

            IDocument working = await sample.Page(link.GetAttribute("href")!);
            Assert.Empty(working.QuerySelectorAll(".problems"));
            return working;
        }

        async Task Same(IElement cell, string line)
        {
            if (await Of(cell) is { } working && char.IsAsciiDigit(Text(cell)[0]))
            {
                // What was typed into the address is rounded: half a unit may fall either way.
                double last = Text(cell).Contains('.', StringComparison.Ordinal) ? 0.1 : 1;
                Assert.Equal(Number(Text(cell)), Number(Line(working, line)), 1.01 * last);
                Assert.Equal(Text(cell).Split(' ')[1], Line(working, line).Split(' ')[1]);
                told++;
            }
        }

        // The depth itself, and as what stops it the limit that stands at just that feed.
        async Task Depth(IElement cell, IElement stop)
        {
            IDocument working = (await Of(cell))!;
            Assert.Equal(Text(cell), Line(working, "At this feed it goes as deep as"));
            string name = Text(stop).Split(", and then ")[^1] switch
            {
                "the chip room stops it" => "Chip room",
                "the motor stops it" => "Motor",
                "the push of a hand stops it" => "Push",
                "the feeder stops it" => "Feeder",
                "the blade bends" => "Blade bends",
                _ => "",
            };
            if (name.Length > 0 && Text(cell) != "none")
            {
                Assert.Equal(Feed(working), Number(Line(working, name)), 0.051 * Feed(working));
            }

            told++;
        }

        static double Feed(IDocument working) => Number(working.QuerySelector("#f-feed")!.GetAttribute("value")!);
    }

    private static string Text(IElement? element) => SampleApp.Text(element);

    private static string Link(IDocument page, string working) => page.QuerySelector($"a[href^='/workings/{working}?']")!.GetAttribute("href")!;

    private static string Line(IDocument working, string what) =>
        Text(working.QuerySelectorAll(".work > div").First(d => Text(d.QuerySelector("dt")) == what).QuerySelector("dd b"));

    private static double Number(string figure) => double.Parse(figure.Split(' ')[0].Replace(",", "", StringComparison.Ordinal), CultureInfo.InvariantCulture);
}
