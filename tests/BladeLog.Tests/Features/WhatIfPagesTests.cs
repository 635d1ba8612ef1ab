using System.Net;
using AngleSharp.Dom;

namespace BladeLog.Tests.Features;

public sealed class WhatIfPagesTests
{
    [Fact]
    public async Task A_shortened_blade_is_compared_before_the_weld_is_made()
    {
        using var app = await ShopApp.Sample();
        // Demo story 3: 207 -> 266 MPa.
        IDocument page = await app.GetPage("/blades/Q-04/what-if?saw=S2&loop=5075");
        string row = Plain(page.QuerySelector(".table-facts tbody tr")!.TextContent);
        Assert.Contains("207 MPa", row, StringComparison.Ordinal);
        Assert.Contains("266 MPa", row, StringComparison.Ordinal);
        Assert.Contains("Cut and welded again", page.Body!.TextContent, StringComparison.Ordinal);
        IDocument whole = await app.GetPage("/blades/Q-04/what-if?saw=S2");
        Assert.Contains("does not go on Osprey", whole.Body!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_thinner_blade_for_the_mill_is_compared_before_it_is_bought()
    {
        using var app = await ShopApp.Sample();
        // Demo story 10.
        IDocument page = await app.GetPage("/blades/Q-32/what-if?thickness=0.9+mm");
        Assert.Equal("75 h instead of 16 h", Plain(page.QuerySelector("h1")!.TextContent));
    }

    [Fact]
    public async Task A_held_blade_shows_no_life()
    {
        using var app = await ShopApp.Sample();
        IDocument page = await app.GetPage("/blades/Q-14/what-if");
        Assert.Contains("on hold", page.Body!.TextContent, StringComparison.Ordinal);
        Assert.DoesNotContain("Half of such blades broken", page.Body.TextContent, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("/blades/Q-08/what-if?thickness=x", "thickness")]
    [InlineData("/blades/Q-08/what-if?saw=S9", "saw")]
    [InlineData("/saws/S2/what-if?feed=fast", "feed")]
    [InlineData("/saws/S2/what-if?wood=oka", "wood")]
    public async Task Bad_input_is_told_beside_its_field(string address, string field)
    {
        using var app = await ShopApp.Sample();
        using var answer = await app.Client.GetAsync(address);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        Assert.NotNull(ShopApp.Parse(await answer.Content.ReadAsStringAsync()).QuerySelector($"#f-{field}-err"));
    }

    [Fact]
    public async Task A_saw_lists_each_blade_with_what_stops_it_and_what_a_change_does()
    {
        using var app = await ShopApp.Sample();
        foreach (string saw in (string[])["S1", "S2", "S3", "S4", "S5"])
        {
            IDocument page = await app.GetPage($"/saws/{saw}/what-if");
            var tables = page.QuerySelectorAll(".table-facts");
            Assert.Equal(2, tables.Length);
            Assert.All(tables[0].QuerySelectorAll("tbody tr"), r => Assert.NotEqual("", r.Children[2].TextContent.Trim()));
            Assert.Equal("as it is", tables[1].QuerySelector("tbody th")!.TextContent);
            Assert.InRange(tables[1].QuerySelectorAll("tbody tr").Length, 5, 6);
        }

        IDocument chosen = await app.GetPage("/saws/S2/what-if?blade=Q-13");
        Assert.Contains("with Q-13", chosen.Body!.TextContent, StringComparison.Ordinal);
        Assert.Contains("it costs", chosen.Body.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_is_not_there_is_not_found()
    {
        using var app = await ShopApp.Sample();
        foreach (string address in (string[])["/blades/Z-1/what-if", "/saws/S9/what-if"])
        {
            using var answer = await app.Client.GetAsync(address);
            Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        }
    }

    private static string Plain(string text) => text.Replace('\u00a0', ' ');
}
