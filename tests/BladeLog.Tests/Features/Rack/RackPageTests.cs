using System.Net;
using AngleSharp.Dom;

namespace BladeLog.Tests.Features.Rack;

public sealed class RackPageTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Fact]
    public async Task Blades_hang_in_the_order_a_person_walks()
    {
        string[] names = [.. (await sample.Page("/rack")).QuerySelectorAll(".hooks h2").Select(h => SampleApp.Text(h))];
        int saw = Array.FindIndex(names, n => n.StartsWith("On a saw", StringComparison.Ordinal));
        int[] racks = [.. Enumerable.Range(1, 5).Select(r => Array.FindIndex(names, n => n.StartsWith($"R{r} ", StringComparison.Ordinal)))];
        int away = Array.FindIndex(names, n => n.StartsWith("At the sharpener, B-031 back in 3 days, 5 blades", StringComparison.Ordinal));
        Assert.True(saw == 0 && racks[0] > saw && away > racks[4]);
        Assert.Equal(racks.Order(), racks);
        string[] r2 = [.. (await sample.Page("/rack")).QuerySelectorAll(".hooks section").First(s => SampleApp.Text(s.QuerySelector("h2")).StartsWith("R2 ", StringComparison.Ordinal)).QuerySelectorAll(".hang .t").Select(t => t.FirstChild!.TextContent)];
        Assert.Equal(["Q-04b", "Q-09", "Q-11", "Q-12", "Q-13", "Q-15", "Q-16"], r2);
    }

    [Fact]
    public async Task The_title_counts_what_the_filter_lists()
    {
        IDocument all = await sample.Page("/rack");
        IDocument ready = await sample.Page("/rack?show=ready");
        int rows = ready.QuerySelectorAll(".hang").Length;
        Assert.True(rows > 1);
        Assert.Equal($"{rows} blades are sharp and free", all.QuerySelector("h1")!.TextContent);
        Assert.Equal($"Ready {rows}", SampleApp.Text(ready.QuerySelector(".pick[aria-current]")));
    }

    [Fact]
    public async Task Every_chip_counts_its_rows()
    {
        foreach (IElement chip in (await sample.Page("/rack")).QuerySelectorAll("a.pick[href^='/rack']"))
        {
            IDocument page = await sample.Page(chip.GetAttribute("href")!);
            Assert.Equal(SampleApp.Text(chip).Split(' ')[^1], page.QuerySelectorAll(".hang").Length.ToString(System.Globalization.CultureInfo.InvariantCulture));
        }
    }

    [Theory]
    [InlineData("look", "look")]
    [InlineData("broken", "broken")]
    [InlineData("new", "new")]
    [InlineData("sharpen", "sharpen")]
    public async Task A_chip_opens_only_blades_marked_with_its_word(string chip, string word)
    {
        IDocument page = await sample.Page($"/rack?show={chip}");
        Assert.True(page.QuerySelectorAll(".hang").Length > 0);
        Assert.All(page.QuerySelectorAll(".hang .state"), s => Assert.Equal(word, SampleApp.Text(s)));
    }

    [Fact]
    public async Task The_chip_to_look_at_counts_what_the_bench_counts()
    {
        IDocument bench = await sample.Page("/bench");
        string look = SampleApp.Text(bench.QuerySelectorAll("h2").First(h => h.TextContent.StartsWith("To look at", StringComparison.Ordinal))).Split(' ')[^1];
        Assert.Equal($"Look {look}", SampleApp.Text((await sample.Page("/rack")).QuerySelector("a[href='/rack?show=look']")));
    }

    [Fact]
    public async Task A_sharp_blade_of_a_kind_that_is_not_ground_is_said_to_be_sharp()
    {
        foreach (IElement row in (await sample.Page("/rack?show=ready")).QuerySelectorAll(".hang"))
        {
            Assert.DoesNotContain("not worth", SampleApp.Text(row), StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task The_cracked_blade_has_no_band_and_the_unknown_one_a_range()
    {
        IDocument page = await sample.Page("/rack");
        IElement held = page.QuerySelector("a[href='/blades/Q-14']")!;
        Assert.Null(held.Closest(".banded")!.QuerySelector("svg.life"));
        Assert.Contains("crack 2.6 mm in a gullet", SampleApp.Text(held), StringComparison.Ordinal);
        IElement unknown = page.QuerySelector("a[href='/blades/Q-06']")!.Closest(".banded")!;
        Assert.Contains("used 0.2 to 0.6", unknown.QuerySelector("svg.life")!.GetAttribute("aria-label"), StringComparison.Ordinal);
        Assert.Empty(unknown.QuerySelectorAll("svg.life .used"));
    }

    [Theory]
    [InlineData("q-09", "/blades/Q-09")]
    [InlineData("http://shop.local/b/q-04B", "/blades/Q-04b")]
    public async Task A_whole_tag_or_a_scan_goes_to_the_blade(string typed, string to)
    {
        using HttpResponseMessage answer = await sample.App.Client.GetAsync($"/rack?q={Uri.EscapeDataString(typed)}");
        Assert.Equal(HttpStatusCode.Redirect, answer.StatusCode);
        Assert.Equal(to, answer.Headers.Location?.OriginalString);
    }

    [Fact]
    public async Task A_tag_that_is_none_offers_the_nearest()
    {
        IDocument page = await sample.Page("/rack?q=Q-99");
        Assert.Equal("No tag has Q-99 in it", page.QuerySelector("h1")!.TextContent);
        Assert.NotNull(page.QuerySelector("a[href='/blades/Q-09']"));
        Assert.Equal("Q-99", page.QuerySelector("#q")!.GetAttribute("value"));
    }

    [Fact]
    public async Task A_label_leads_to_its_blade()
    {
        using HttpResponseMessage answer = await sample.App.Client.GetAsync("/b/q-01");
        Assert.Equal("/blades/Q-01", answer.Headers.Location?.OriginalString);
    }
}
