using System.Net;

namespace BladeLog.Tests.Features;

public sealed class StartTests
{
    [Fact]
    public async Task Before_there_is_a_shop_every_page_leads_to_the_first_start()
    {
        using var app = ShopApp.Unmade();
        using var floor = await app.Client.GetAsync("/");
        Assert.Equal("/start", floor.Headers.Location?.OriginalString);
        using var health = await app.Client.GetAsync("/health");
        Assert.Equal(HttpStatusCode.ServiceUnavailable, health.StatusCode);
        Assert.Empty(Directory.EnumerateFiles(app.Dir, "*.db"));
        Assert.NotNull((await app.GetPage("/start")).QuerySelector("form[action='/start']"));
    }

    [Fact]
    public async Task The_form_makes_an_empty_shop()
    {
        using var app = await ShopApp.Empty();
        using var health = await app.Client.GetAsync("/health");
        Assert.Equal(HttpStatusCode.OK, health.StatusCode);
        using var again = await app.Client.GetAsync("/start");
        Assert.Equal("/", again.Headers.Location?.OriginalString);
    }

    [Fact]
    public async Task A_form_with_no_name_comes_back_with_what_was_typed_and_makes_nothing()
    {
        using var app = ShopApp.Unmade();
        using var answer = await app.PostForm("/start", new() { ["Begin"] = "empty", ["Name"] = "  ", ["Zone"] = "Europe/Berlin" });
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        var page = ShopApp.Parse(await answer.Content.ReadAsStringAsync());
        Assert.Equal("Europe/Berlin", page.QuerySelector("input[name=Zone]")?.GetAttribute("value"));
        Assert.Contains("Give the shop a name", page.Body!.TextContent, StringComparison.Ordinal);
        Assert.Empty(Directory.EnumerateFiles(app.Dir, "*.db"));
    }

    [Fact]
    public async Task The_sample_shop_opens()
    {
        using var app = await ShopApp.Sample();
        using var health = await app.Client.GetAsync("/health");
        Assert.Equal(HttpStatusCode.OK, health.StatusCode);
    }
}
