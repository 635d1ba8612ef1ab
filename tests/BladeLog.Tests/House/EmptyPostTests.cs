using Microsoft.AspNetCore.Routing;
using Microsoft.Extensions.DependencyInjection;

namespace BladeLog.Tests.House;

/// <summary>A form sent with nothing filled in is answered in words, never with a failure of the program.</summary>
public sealed class EmptyPostTests(SampleShopApp shop) : IClassFixture<SampleShopApp>
{
    private static readonly Dictionary<string, string> Example = new(StringComparer.OrdinalIgnoreCase)
    {
        ["tag"] = "Q-09",
        ["code"] = "S2",
        ["entry"] = "1",
        ["initials"] = "OT",
        ["key"] = "life.retire_mark",
    };

    [Fact]
    public async Task Every_form_takes_an_empty_post()
    {
        var app = shop.App;
        var routes = app.Services.GetRequiredService<EndpointDataSource>().Endpoints.OfType<RouteEndpoint>()
            .Where(e => e.Metadata.GetMetadata<IHttpMethodMetadata>()?.HttpMethods.Contains("POST") == true)
            .Select(e => e.RoutePattern)
            .Where(p => p.RawText?.StartsWith("/api/", StringComparison.Ordinal) == false)
            .ToList();
        Assert.True(routes.Count > 20, "The forms were not found.");
        var failed = new List<string>();
        foreach (var route in routes)
        {
            var path = route.RawText!;
            foreach (var part in route.Parameters)
            {
                var value = Example.GetValueOrDefault(part.Name) ?? (path.Contains("batches", StringComparison.Ordinal) ? "B-031" : "2");
                path = System.Text.RegularExpressions.Regex.Replace(path, $@"\{{\*?{part.Name}[^}}]*\}}", value);
            }

            var answer = await app.PostForm(path, new Dictionary<string, string>(), "/cuts/new");
            if ((int)answer.StatusCode >= 500)
            {
                failed.Add($"{path}: {(int)answer.StatusCode}");
            }
        }

        Assert.Empty(failed);
    }
}
