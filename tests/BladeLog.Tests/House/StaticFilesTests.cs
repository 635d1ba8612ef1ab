using System.Net;
using System.Security.Cryptography;
using System.Text.RegularExpressions;
using BladeLog.Ui;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.TestHost;
using Microsoft.Extensions.Hosting;

namespace BladeLog.Tests.House;

public partial class StaticFilesTests
{
    // SHA-256 of dist/htmx.min.js in the package htmx.org 4.0.1 of the npm registry.
    private const string Htmx = "a0abb04f2f45a1f89d1d4844023245537e5e6014c87b144553e0607b4cc32130";

    private static readonly string[] Sheets = ["css/sheet.css", "css/forms.css", "css/paper.css"];

    public static TheoryData<string> StyleSheets => [.. Sheets];

    [Fact]
    public void The_library_is_the_published_file_and_has_its_licence_beside_it()
    {
        Assert.Equal(Htmx, Convert.ToHexStringLower(SHA256.HashData(File.ReadAllBytes(Full("lib/htmx.min.js")))));
        Assert.Contains("Zero-Clause BSD", File.ReadAllText(Full("lib/htmx.LICENSE.txt")), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("css/sheet.css", "text/css")]
    [InlineData("css/forms.css", "text/css")]
    [InlineData("css/paper.css", "text/css")]
    [InlineData("js/sheet.js", "text/javascript")]
    [InlineData("lib/htmx.min.js", "text/javascript")]
    [InlineData("favicon.svg", "image/svg+xml")]
    public async Task A_file_asked_by_its_hash_may_be_kept_for_ever(string path, string type)
    {
        using var host = await Serve();
        var answer = await host.GetTestClient().GetAsync(StaticFile.Url(path));
        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.Equal(type, answer.Content.Headers.ContentType?.MediaType);
        Assert.True((await answer.Content.ReadAsByteArrayAsync()).Length > 100);
        Assert.Equal("public, max-age=31536000, immutable", answer.Headers.CacheControl?.ToString());
    }

    [Theory]
    [InlineData("/css/sheet.css")]
    [InlineData("/css/sheet.css?v=000000000000")]
    [InlineData("/css/sheet.css?v=")]
    public async Task A_file_asked_without_todays_hash_is_asked_for_again(string url)
    {
        using var host = await Serve();
        var answer = await host.GetTestClient().GetAsync(url);
        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.Equal("no-cache", answer.Headers.CacheControl?.ToString());
    }

    [Theory]
    [InlineData("/../BladeLog.dll")]
    [InlineData("/%2e%2e/BladeLog.dll")]
    [InlineData("/css/%2e%2e%2f%2e%2e%2fBladeLog.dll")]
    public async Task Nothing_outside_the_folder_is_served(string url)
    {
        using var host = await Serve();
        Assert.NotEqual(HttpStatusCode.OK, (await host.GetTestClient().GetAsync(url)).StatusCode);
    }

    [Theory]
    [MemberData(nameof(StyleSheets))]
    public void No_text_on_screen_is_smaller_than_the_body(string path)
    {
        var sizes = RemSize().Matches(File.ReadAllText(Full(path))).Select(m => decimal.Parse(m.Groups[1].Value, System.Globalization.CultureInfo.InvariantCulture)).ToList();
        Assert.All(sizes, s => Assert.True(s >= 1, $"{s}rem in {path} is under 20 px"));
    }

    [Theory]
    [MemberData(nameof(StyleSheets))]
    public void A_stylesheet_asks_nobody_else_and_its_braces_close(string path)
    {
        var css = File.ReadAllText(Full(path));
        Assert.DoesNotContain("url(", css, StringComparison.Ordinal);
        Assert.DoesNotContain("@import", css, StringComparison.Ordinal);
        Assert.Equal(css.Count(c => c == '{'), css.Count(c => c == '}'));
    }

    [Fact]
    public void Letters_set_in_px_are_those_of_pictures_drawn_in_mm_or_the_body_itself()
    {
        // In a drawing to scale one unit is a millimetre, so 3.8 units of --mm are 21 px; the large saw's window is 3000 units wide.
        var css = string.Concat(Sheets.Select(s => File.ReadAllText(Full(s))));
        var small = PxSize().Matches(css).Select(m => m.Groups[1].Value).Distinct().Order();
        Assert.Equal(["102", "20", "3.5", "3.8"], small);
        Assert.Contains("font:400 20px/1.4", css, StringComparison.Ordinal);
    }

    [GeneratedRegex(@"font-size:(\d*\.?\d+)px")]
    private static partial Regex PxSize();

    [GeneratedRegex(@"font-size:(\d*\.?\d+)rem")]
    private static partial Regex RemSize();

    private static string Full(string path) => Path.Combine(StaticFile.Root, path);

    private static Task<IHost> Serve() => new HostBuilder()
        .ConfigureWebHost(web => web.UseTestServer().Configure(app => app.UseShopStaticFiles()))
        .StartAsync();
}
