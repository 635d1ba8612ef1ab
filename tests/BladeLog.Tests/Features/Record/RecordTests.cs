namespace BladeLog.Tests.Features.Record;

public sealed class RecordTests
{
    [Fact]
    public async Task The_newest_entry_stands_first_and_older_ones_are_a_page_away()
    {
        using var app = await ShopApp.Sample();
        await app.Be("JP");
        (await app.Fill("/blades/Q-11/hang", ("Place", "Bench"))).LeadsTo("/blades/Q-11");
        var page = await app.GetPage("/record");
        Assert.Contains("Q-11 put on the bench", page.QuerySelector(".entries li")!.TextContent, StringComparison.Ordinal);
        Assert.NotNull(page.QuerySelector("a[href='/record?page=2']"));
        Assert.NotNull((await app.GetPage("/record?page=2")).QuerySelector("a[href='/record?page=1']"));
    }

    [Fact]
    public async Task An_entry_struck_out_stays_with_who_and_why()
    {
        using var app = await ShopApp.Sample();
        await app.Be("JP");
        (await app.Fill("/blades/Q-11/hold", ("Kind", "Damage"))).LeadsTo("/blades/Q-11");
        var link = (await app.GetPage("/record")).QuerySelector(".entries a")!.GetAttribute("href")!;
        Assert.Contains("Say why", (await app.Fill(link)).Refused().Beside("Reason"), StringComparison.Ordinal);
        Assert.True(await app.IsHeld("Q-11"));

        (await app.Fill(link, ("Reason", "wrong blade"))).LeadsTo("/record");
        Assert.False(await app.IsHeld("Q-11"));
        var struck = (await app.GetPage("/record")).QuerySelector(".entries .struck")!.TextContent;
        Assert.Contains("struck out by JP", struck, StringComparison.Ordinal);
        Assert.Contains("wrong blade", struck, StringComparison.Ordinal);
        Assert.Contains("Struck out", (await app.GetPage(link)).QuerySelector("h1")!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_others_rest_on_is_refused_and_names_them()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/swap?on=Q-11", ("Reason", "Dull"))).LeadsTo("/saws/S2");
        var page = await app.GetPage("/record");
        var off = page.QuerySelectorAll(".entries a").First(a => a.TextContent.Contains("Q-08 off", StringComparison.Ordinal)).GetAttribute("href")!;
        Assert.Contains("Void first", (await app.Fill(off, ("Reason", "wrong time"))).Refused().Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_entry_that_is_not_there_is_not_found()
    {
        using var app = await ShopApp.Sample();
        using var answer = await app.Client.GetAsync("/record/99999999/void");
        Assert.Equal(System.Net.HttpStatusCode.NotFound, answer.StatusCode);
    }
}
