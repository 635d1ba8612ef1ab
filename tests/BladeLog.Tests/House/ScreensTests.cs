using Microsoft.AspNetCore.Routing;
using Microsoft.AspNetCore.Routing.Template;
using Microsoft.Extensions.DependencyInjection;

namespace BladeLog.Tests.House;

/// <summary>The pictures in the docs are of every page there is.</summary>
public sealed class ScreensTests(SampleShopApp shop) : IClassFixture<SampleShopApp>
{
    /// <summary>Without a picture: no page of the sample shop, or one of an entry whose number is not known beforehand.</summary>
    private static readonly string[] Without =
        ["/health", "/start", "/trouble", "/b/{tag}", "/setup/{key}", "/breaks/{entry:int}", "/record/{entry:int}/void", "/openapi/{documentName}.json"];

    private static (string Name, string Path)[] Rows => [.. File.ReadLines(Path.Combine(Tree.Root, "docs", "screens", "pages.txt"))
        .Where(line => line.Length > 0).Select(line => line.Split(' ')).Select(row => (row[0], row[1]))];

    [Fact]
    public void Every_page_has_its_picture()
    {
        var without = shop.App.Services.GetServices<EndpointDataSource>().SelectMany(s => s.Endpoints).OfType<RouteEndpoint>()
            .Where(e => e.Metadata.GetMetadata<HttpMethodMetadata>() is { } methods && methods.HttpMethods.Contains("GET"))
            .Select(e => "/" + e.RoutePattern.RawText!.Trim('/')).Distinct()
            .Where(p => !p.StartsWith("/api/", StringComparison.Ordinal) && !Without.Contains(p))
            .Where(p => !Rows.Any(r => new TemplateMatcher(TemplateParser.Parse(p.TrimStart('/')), []).TryMatch(r.Path.Split('?')[0], [])));
        Assert.Empty(without);
    }

    [Fact]
    public async Task Every_picture_is_of_a_page_that_is_there()
    {
        foreach (var (name, path) in Rows)
        {
            using var answer = await shop.App.Client.GetAsync(path);
            Assert.True(answer.IsSuccessStatusCode, $"{name}: {path} answers {(int)answer.StatusCode}.");
            foreach (var size in new[] { "1280x800", "800x1280" })
            {
                Assert.True(File.Exists(Path.Combine(Tree.Root, "docs", "screens", $"{name}-{size}.png")), $"No picture of {name} at {size}: run docs/screens/take.");
            }
        }
    }
}
