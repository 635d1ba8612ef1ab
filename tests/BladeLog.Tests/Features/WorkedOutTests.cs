using AngleSharp.Dom;

namespace BladeLog.Tests.Features;

/// <summary>Every kind of page with a figure from the handbook leads to its working, and the working shows that same figure.</summary>
public sealed class WorkedOutTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Theory]
    [InlineData("/", "a.fig")]
    [InlineData("/rack", "a.band")]
    [InlineData("/blades/Q-08", ".worked a")]
    [InlineData("/saws/S2", ".worked a")]
    [InlineData("/saws/S2/swap?on=Q-09", ".worked a")]
    [InlineData("/cuts", "a.how-to")]
    [InlineData("/cuts?view=saws", "a.how-to")]
    [InlineData("/cuts/2", ".worked a")]
    [InlineData("/breaks", "td a")]
    [InlineData("/stock", "a.how-to")]
    [InlineData("/stock/costs?blade=Q-08", ".worked a")]
    [InlineData("/bench", "a.how-to")]
    [InlineData("/cautions", ".worked a")]
    public async Task A_page_with_a_figure_leads_to_its_working_and_the_link_answers(string address, string selector)
    {
        string[] links = [.. (await sample.Page(address)).QuerySelectorAll(selector).Select(a => a.GetAttribute("href")!)];
        Assert.NotEmpty(links);
        Assert.All(links, l => Assert.StartsWith("/workings/", l, StringComparison.Ordinal));
        foreach (string link in links.Distinct().Take(12))
        {
            IDocument working = await sample.Page(link);
            Assert.NotEmpty(working.QuerySelectorAll(".because .work > div"));
            Assert.Empty(working.QuerySelectorAll(".problems"));
        }
    }

    [Fact]
    public async Task A_link_to_a_working_never_stands_inside_a_sentence()
    {
        foreach (string address in (string[])["/", "/rack", "/blades/Q-08", "/saws/S2", "/cuts", "/cuts/2", "/breaks", "/stock", "/bench", "/cautions"])
        {
            Assert.Empty((await sample.Page(address)).QuerySelectorAll("p a[href^='/workings/'], li > span a[href^='/workings/'], dd a[href^='/workings/']"));
        }
    }

    [Fact]
    public async Task The_figures_of_the_floor_stand_on_their_workings()
    {
        foreach (IElement figure in (await sample.Page("/")).QuerySelectorAll("a.fig"))
        {
            string number = Text(figure.QuerySelector("p b")), unit = Text(figure.QuerySelector("p i")), way = Text(figure.QuerySelector("p span"));
            IDocument working = await sample.Page(figure.GetAttribute("href")!);
            string value = way switch
            {
                _ when way.EndsWith("look", StringComparison.Ordinal) => Line(working, "Hours to where 1 in 10 has broken"),
                _ when way.EndsWith("retire", StringComparison.Ordinal) => Line(working, "Hours to its retire mark"),
                _ when way.StartsWith("grind", StringComparison.Ordinal) => Line(working, "Sharpenings left by teeth"),
                _ when way.Contains("width", StringComparison.Ordinal) => Line(working, "Width left"),
                _ => Line(working, "Metres left"),
            };
            if (number == ">999")
            {
                Assert.True(double.Parse(value.Split(' ')[0].Replace(",", "", StringComparison.Ordinal), System.Globalization.CultureInfo.InvariantCulture) > 999, value);
            }
            else
            {
                Assert.Equal($"{number} {unit}".Trim(), value);
            }
        }
    }

    [Fact]
    public async Task The_bands_of_the_rack_stand_on_their_workings()
    {
        int lives = 0;
        foreach (IElement band in (await sample.Page("/rack")).QuerySelectorAll("a.band"))
        {
            string said = Text(band.QuerySelector("svg title")) + " " + band.QuerySelector("svg")?.GetAttribute("aria-label");
            if (!said.Contains("half at ", StringComparison.Ordinal))
            {
                continue;
            }

            string median = said.Split("half at ")[1].Split(';')[0].Replace('\u00a0', ' ').Trim();
            Assert.Equal(median, Line(await sample.Page(band.GetAttribute("href")!), "Median life"));
            lives++;
        }

        Assert.True(lives > 5, $"Only {lives} bands of life were found.");
    }

    [Theory]
    [InlineData("Q-17")]
    [InlineData("Q-30")]
    public async Task The_figures_of_a_blade_stand_on_their_workings(string tag)
    {
        IDocument page = await sample.Page($"/blades/{tag}");
        string life = Heading(page, "Life: "), teeth = Heading(page, "Teeth: ");
        Assert.Equal(life.Split(" to where")[0], Line(await sample.Page(Link(page, "band-life")), "Hours to where 1 in 10 has broken"));
        Assert.Equal(teeth.Split(" left")[0], Line(await sample.Page(Link(page, "wear")), "Metres left"));
        string width = Text(page.QuerySelectorAll(".limits > div").First(d => Text(d.QuerySelector("dt")) == "Width").QuerySelector("dd"));
        Assert.Equal(width.Split(" left")[0], Line(await sample.Page(Link(page, "grinding")), "Width left"));
        Assert.Equal(Because(page, "Tension"), Line(await sample.Page(Link(page, "tension")), "Tension"));
    }

    [Fact]
    public async Task The_figures_of_a_saw_stand_on_their_workings()
    {
        IDocument page = await sample.Page("/saws/S2");
        IDocument life = await sample.Page(Link(page, "band-life"));
        Assert.Equal(Text(page.QuerySelector("[aria-label=Speeds] tbody td")), Line(life, "Bends an hour"));
        Assert.Equal(Text(page.QuerySelectorAll("[aria-label=Wheels] tbody td")[1]), Line(life, "Bending stress"));
        Assert.Equal(Because(page, "Distance of the guides"), Line(await sample.Page(Link(page, "thrust-limits")), "Span between the guides"));
        Assert.Equal(Whole(Because(page, "Thrust of the next cut")), Whole(Line(await sample.Page(Link(page, "cut")), "Push on the blade")));
    }

    [Fact]
    public async Task The_figures_of_a_swap_stand_on_their_workings()
    {
        IDocument page = await sample.Page("/saws/S2/swap?on=Q-09");
        string checks = Text(page.QuerySelector("ul.check"));
        Assert.Contains($"is {Line(await sample.Page(Link(page, "band-life")), "Thickness to wheel")} of the wheel", checks, StringComparison.Ordinal);
        Assert.Contains($"Tension {Line(await sample.Page(Link(page, "tension")), "Tension")} in the body", checks, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_feeds_of_every_cut_that_waits_stand_on_their_workings()
    {
        IElement[] rows = [.. (await sample.Page("/cuts")).QuerySelectorAll("li.two")];
        Assert.True(rows.Length > 8);
        foreach (IElement row in rows)
        {
            string window = Text(row.QuerySelector("a:first-child > span:last-child")).Split(", ")[^1];
            string title = Text((await sample.Page(row.QuerySelector("a.how-to")!.GetAttribute("href")!)).QuerySelector("h1"));
            Assert.Contains(window, title, StringComparison.Ordinal);
            Assert.Equal(Text(row).Contains("with care", StringComparison.Ordinal) && !title.StartsWith(window, StringComparison.Ordinal), title.StartsWith("With care", StringComparison.Ordinal) || title.StartsWith("Only rubbing", StringComparison.Ordinal));
        }
    }

    [Fact]
    public async Task The_figures_of_a_choice_stand_on_their_workings()
    {
        IDocument page = await sample.Page("/cuts/2"), cut = await sample.Page(Link(page, "cut"));
        Assert.Contains(Text(cut.QuerySelector("h1")).Split(',')[0], Text(page.QuerySelector("h1")), StringComparison.Ordinal);
        foreach ((string here, string there) in ((string, string)[])[("Gullet fill", "Gullet fill"), ("Cutting force", "Cutting force"), ("Push", "Push on the blade"), ("Motor", "Motor"), ("Chip room", "Chip room"), ("Rubs below", "Rubs below"), ("No chip below", "No chip below")])
        {
            Assert.Equal(Whole(Because(page, here)), Whole(Line(cut, there)));
        }

        Assert.Equal(Whole(Because(page, "Tightest curve")), Whole(Line(await sample.Page(Link(page, "curve")), "Turns without relief cuts")));
        Assert.Equal(Whole(Because(page, "Thrust that slackens the front edge")), Whole(Line(await sample.Page(Link(page, "thrust-limits")), "Front edge goes slack at")));
        foreach (IElement next in page.QuerySelectorAll("article.choice:not(.best) .say b").Where(b => Text(b).EndsWith("m/min", StringComparison.Ordinal)))
        {
            string link = next.Closest("article")!.QuerySelector(".worked a")!.GetAttribute("href")!;
            Assert.Contains(Text(next), Text((await sample.Page(link)).QuerySelector("h1")), StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task The_figures_of_breaks_stand_on_their_workings()
    {
        IDocument list = await sample.Page("/breaks");
        int told = 0;
        foreach (IElement row in list.QuerySelectorAll("tbody tr").Where(r => Text(r.Children[2]).Contains("; half of such by ", StringComparison.Ordinal)))
        {
            IDocument working = await sample.Page(row.QuerySelector("td a")!.GetAttribute("href")!);
            Assert.Equal(Text(row.Children[2]).Split("; half of such by ")[1], Line(working, "Median life"));
            Assert.StartsWith(Line(working, "Bending stress"), Text(row.Children[4]), StringComparison.Ordinal);
            if (!Text(row.Children[3]).Contains("band", StringComparison.Ordinal))
            {
                // Where its hours are known only within a range the list tells that range.
                Assert.Equal(Text(row.Children[3]), Line(working, "Life used so far"));
            }

            IDocument one = await sample.Page(row.QuerySelector("th a")!.GetAttribute("href")!);
            Assert.Equal(Because(one, "Bends an hour"), Line(await sample.Page(Link(one, "band-life")), "Bends an hour"));
            told++;
        }

        Assert.True(told > 3, $"Only {told} breaks told of a life.");
    }

    [Fact]
    public async Task The_hours_behind_an_order_stand_on_their_workings()
    {
        int told = 0;
        foreach (IElement row in (await sample.Page("/stock")).QuerySelectorAll("li.two").Where(r => Text(r).Contains("to retire", StringComparison.Ordinal)))
        {
            string hours = Text(row.QuerySelector("a > span")).Split(", ")[^1].Replace(" to retire", "", StringComparison.Ordinal);
            Assert.Equal(hours, Line(await sample.Page(row.QuerySelector("a.how-to")!.GetAttribute("href")!), "Hours to its retire mark"));
            told++;
        }

        Assert.True(told > 3, $"Only {told} blades of the stock told of hours.");
    }

    [Fact]
    public async Task The_edge_on_the_bench_and_the_chance_of_keeping_on_stand_on_their_workings()
    {
        IElement dull = (await sample.Page("/bench")).QuerySelectorAll("li.two").First(r => Text(r).Contains("Edge ", StringComparison.Ordinal));
        string edge = Text(dull).Split("Edge ")[1].Split('.')[0];
        Assert.StartsWith(edge, Text((await sample.Page(dull.QuerySelector("a.how-to")!.GetAttribute("href")!)).QuerySelector("h1")), StringComparison.Ordinal);
        IDocument costs = await sample.Page("/stock/costs?blade=Q-17"), life = await sample.Page(Link(costs, "band-life"));
        string chance = Text(life.QuerySelectorAll(".work > div").First(d => Text(d.QuerySelector("dt")).StartsWith("To break in the next", StringComparison.Ordinal)).QuerySelector("dd b"));
        Assert.Contains(chance, Text(costs.QuerySelector("main")), StringComparison.OrdinalIgnoreCase);
    }

    [Fact]
    public async Task The_minutes_a_crack_leaves_are_told_on_the_cautions_page_with_what_they_rest_on()
    {
        IDocument page = await sample.Page("/cautions");
        string said = Text(page.QuerySelectorAll("p.key b")[^1]);
        string minutes = Text((await sample.Page(Link(page, "crack"))).QuerySelector("h1")).Split(" in ")[1];
        Assert.Contains(minutes, said, StringComparison.Ordinal);
        Assert.Equal(minutes, Line(page, "Running until then"));
        Assert.Contains("law of Paris", page.Body!.TextContent, StringComparison.Ordinal);
        Assert.Contains("from memory", page.Body.TextContent, StringComparison.Ordinal);
        Assert.DoesNotContain("Q-14", page.Body.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task No_life_is_led_to_from_a_held_blade()
    {
        Assert.Empty((await sample.Page("/blades/Q-14")).QuerySelectorAll("a[href*='band-life']"));
        Assert.DoesNotContain((await sample.Page("/rack")).QuerySelectorAll("a[href*='band-life']"), a => a.GetAttribute("href")!.Contains("Q-14", StringComparison.Ordinal));
    }

    private static string Text(IElement? element) => SampleApp.Text(element);

    private static string Link(IDocument page, string working) =>
        page.QuerySelector($"a[href^='/workings/{working}?']")?.GetAttribute("href") ?? throw new InvalidOperationException($"No link to {working}.");

    /// <summary>The figure of a line of a working.</summary>
    private static string Line(IDocument working, string what) =>
        Text((working.QuerySelectorAll(".work > div").FirstOrDefault(d => Text(d.QuerySelector("dt")) == what) ?? throw new InvalidOperationException($"No line \"{what}\" in \"{Text(working.QuerySelector("h1"))}\".")).QuerySelector("dd b"));

    private static string Because(IDocument page, string what) => Line(page, what);

    private static string Heading(IDocument page, string begin) =>
        page.QuerySelectorAll("h2").Select(Text).First(t => t.StartsWith(begin, StringComparison.Ordinal))[begin.Length..];

    /// <summary>Pages write a figure to as many digits as they have room for: compared to two of them.</summary>
    private static string Whole(string figure)
    {
        string[] parts = figure.Split(' ');
        double value = double.Parse(parts[0].Replace(",", "", StringComparison.Ordinal), System.Globalization.CultureInfo.InvariantCulture);
        return $"{value.ToString("G2", System.Globalization.CultureInfo.InvariantCulture)} {string.Join(' ', parts.Skip(1))}";
    }
}
