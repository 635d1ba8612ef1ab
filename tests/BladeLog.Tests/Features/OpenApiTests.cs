using System.Text.Json;
using BladeLog.Features.Cuts;
using BladeLog.Features.Saws;
using BladeLog.Features.Workings;
using BladeLog.Ui.Json;
using Microsoft.AspNetCore.Routing;
using Microsoft.Extensions.DependencyInjection;

namespace BladeLog.Tests.Features;

/// <summary>The interface describes itself, and speaks of its fields as the reader does.</summary>
public sealed class OpenApiTests(EmptyShop shop) : IClassFixture<EmptyShop>
{
    public static TheoryData<string, Type> Bodies => new()
    {
        { "/api/v1/workings/band-life", typeof(BandLifeIn) },
        { "/api/v1/workings/tension", typeof(TensionIn) },
        { "/api/v1/workings/thrust-limits", typeof(ThrustLimitsIn) },
        { "/api/v1/workings/cut", typeof(BladeLog.Features.Workings.CutIn) },
        { "/api/v1/runs", typeof(RunIn) },
        { "/api/v1/cuts", typeof(CutsIn) },
    };

    [Fact]
    public async Task Every_address_stands_in_the_description_with_what_it_takes_and_gives()
    {
        var paths = (await shop.App.GetJson("/openapi/v1.json")).GetProperty("paths");
        var routes = shop.App.Services.GetRequiredService<EndpointDataSource>().Endpoints.OfType<RouteEndpoint>()
            .Where(e => e.RoutePattern.RawText!.StartsWith("/api/v1/", StringComparison.Ordinal))
            .SelectMany(e => e.Metadata.GetMetadata<HttpMethodMetadata>()!.HttpMethods.Select(m => (Method: m.ToLowerInvariant(), Path: Plain(e.RoutePattern.RawText!))))
            .ToArray();
        Assert.True(routes.Length >= 11);
        Assert.All(paths.EnumerateObject(), p => Assert.StartsWith("/api/v1/", p.Name, StringComparison.Ordinal));
        foreach (var (method, path) in routes)
        {
            Assert.True(paths.TryGetProperty(path, out var at) && at.TryGetProperty(method, out _), $"{method} {path} is not described.");
            var said = paths.GetProperty(path).GetProperty(method);
            Assert.False(string.IsNullOrWhiteSpace(said.GetProperty("summary").GetString()));
            Assert.NotEqual(JsonValueKind.Undefined, Schema(said.GetProperty("responses").GetProperty("200")).ValueKind);
            if (method == "post")
            {
                Assert.NotEqual(JsonValueKind.Undefined, Schema(said.GetProperty("requestBody")).ValueKind);
                Assert.True(said.GetProperty("responses").TryGetProperty("400", out _), path);
            }
        }
    }

    [Theory]
    [MemberData(nameof(Bodies))]
    public async Task A_body_has_the_fields_its_reader_knows(string path, Type type)
    {
        var document = await shop.App.GetJson("/openapi/v1.json");
        var schema = Resolve(document, Schema(document.GetProperty("paths").GetProperty(path).GetProperty("post").GetProperty("requestBody")));
        var fields = BodyFields.Of(type);
        Assert.Equal(fields.Keys.Order(StringComparer.Ordinal), schema.GetProperty("properties").EnumerateObject().Select(p => p.Name).Order(StringComparer.Ordinal));
        var required = schema.GetProperty("required").EnumerateArray().Select(r => r.GetString()!);
        Assert.Equal(fields.Where(f => f.Value.Required).Select(f => f.Key).Order(StringComparer.Ordinal), required.Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task Names_are_snake_case_throughout()
    {
        var document = await shop.App.GetJson("/openapi/v1.json");
        var names = document.GetProperty("components").GetProperty("schemas").EnumerateObject()
            .Where(s => s.Value.TryGetProperty("properties", out _))
            .SelectMany(s => s.Value.GetProperty("properties").EnumerateObject().Select(p => p.Name)).ToArray();
        Assert.NotEmpty(names);
        Assert.All(names, n => Assert.Matches("^[a-z][a-z0-9_]*$", n));
    }

    private static JsonElement Schema(JsonElement body) =>
        body.GetProperty("content").GetProperty("application/json").GetProperty("schema");

    private static JsonElement Resolve(JsonElement document, JsonElement schema) => schema.TryGetProperty("$ref", out var at)
        ? document.GetProperty("components").GetProperty("schemas").GetProperty(at.GetString()!.Split('/')[^1])
        : schema;

    private static string Plain(string pattern) => pattern.Replace(":int", "", StringComparison.Ordinal).TrimEnd('/');
}
