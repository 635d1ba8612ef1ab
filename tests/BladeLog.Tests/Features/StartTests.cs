using System.Net;
using BladeLog.Hosting;
using BladeLog.Records;
using Microsoft.Extensions.DependencyInjection;

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

    [Fact]
    public async Task Sample_files_that_cannot_be_read_are_told_on_the_start_page_and_nothing_is_made()
    {
        var folder = Directory.CreateTempSubdirectory("bladelog-bad").FullName;
        try
        {
            using var app = ShopApp.WithSampleFiles(folder);
            using var answer = await app.PostForm("/start", new() { ["Begin"] = "sample" });
            Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
            Assert.Contains("The sample shop needs the file", await answer.Content.ReadAsStringAsync(), StringComparison.Ordinal);
            Assert.Empty(Directory.EnumerateFiles(app.Dir, "*.db"));

            // The way stays open: the shop's own can be begun on the same folder.
            using var own = await app.PostForm("/start", new() { ["Begin"] = "empty", ["Name"] = "Mine", ["Zone"] = "UTC" });
            Assert.Equal(HttpStatusCode.Redirect, own.StatusCode);
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    [Fact]
    public async Task Sample_files_that_cannot_be_read_end_the_sample_with_one_sentence()
    {
        var folder = Directory.CreateTempSubdirectory("bladelog-bad").FullName;
        var call = new Call(null, null, null, true, null, ["--sample=true", $"--samplefiles={folder}"]);
        await using var app = ShopHost.Build(call);
        var place = app.Services.GetRequiredService<ShopFile>().Dir;
        Assert.StartsWith("The sample shop needs the file", await ShopHost.Open(app), StringComparison.Ordinal);
        Assert.False(Directory.Exists(place));
        Directory.Delete(folder);
    }
}
