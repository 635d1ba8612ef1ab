using System.Net;
using System.Text.RegularExpressions;
using Microsoft.AspNetCore.Routing;
using Microsoft.AspNetCore.Routing.Template;
using Microsoft.Extensions.DependencyInjection;

namespace BladeLog.Browser.Tests;

/// <summary>Every page a person can reach from the Floor by links, sorted by the kind of page it is.</summary>
internal sealed partial class PageList
{
    /// <summary>Of a kind that stands once for each blade, saw or cut, so many are opened to find links.</summary>
    private const int Opened = 48;
    private const int OpenedDeep = 6;

    private readonly List<TemplateMatcher> _matchers;
    private readonly Dictionary<string, List<string>> _byKind = [];
    private readonly List<string> _broken = [];

    private PageList(IEnumerable<RouteEndpoint> endpoints)
    {
        Kinds = [.. endpoints.Select(e => "/" + e.RoutePattern.RawText!.TrimStart('/')).Distinct().OrderByDescending(Literals)];
        _matchers = [.. Kinds.Select(k => new TemplateMatcher(TemplateParser.Parse(k), []))];
    }

    /// <summary>The addresses the program has for a visit, by their pattern.</summary>
    public IReadOnlyList<string> Kinds { get; }

    public IReadOnlyDictionary<string, List<string>> ByKind => _byKind;

    /// <summary>Links that led nowhere, with the page they stand on.</summary>
    public IReadOnlyList<string> Broken => _broken;

    public static async Task<PageList> Of(ServedShop shop)
    {
        var list = new PageList(shop.Services.GetServices<EndpointDataSource>().SelectMany(s => s.Endpoints).OfType<RouteEndpoint>().Where(IsPage));
        using var client = new HttpClient { BaseAddress = shop.Address };
        await list.Walk(client);
        return list;
    }

    /// <summary>A few of a kind that differ: the first, the last and some between.</summary>
    public IEnumerable<string> Some(string kind, int most)
    {
        var all = _byKind[kind];
        return all.Count <= most ? all : most == 1 ? all[..1] : Enumerable.Range(0, most).Select(i => all[i * (all.Count - 1) / (most - 1)]);
    }

    private static bool IsPage(RouteEndpoint endpoint) =>
        endpoint.Metadata.GetMetadata<HttpMethodMetadata>() is { } methods && methods.HttpMethods.Contains("GET")
        && endpoint.RoutePattern.RawText!.TrimStart('/') is var path
        && !path.StartsWith("api/", StringComparison.Ordinal) && !path.StartsWith("openapi", StringComparison.Ordinal);

    private static int Literals(string kind) => kind.Split('/').Count(s => s.Length > 0 && !s.Contains('{'));

    private async Task Walk(HttpClient client)
    {
        // What is led to only while it is asked: hours with no blade known.
        var waiting = new Queue<(string Path, string From)>([("/", "the start"), ("/saws/S2/then", "a question about hours")]);
        var seen = new HashSet<string> { "/", "/saws/S2/then" };
        var opened = new Dictionary<string, int>();
        while (waiting.TryDequeue(out var next))
        {
            var kind = Kind(next.Path);
            if (kind is not null && (opened[kind] = opened.GetValueOrDefault(kind) + 1) > (Literals(kind) > 1 ? OpenedDeep : Opened))
            {
                continue;
            }

            using var answer = await client.GetAsync(next.Path);
            if (answer.StatusCode != HttpStatusCode.OK)
            {
                _broken.Add($"{next.Path} on {next.From} answers {(int)answer.StatusCode}");
                continue;
            }

            if (kind is null || answer.Content.Headers.ContentType?.MediaType != "text/html")
            {
                continue;
            }

            if (!_byKind.TryGetValue(kind, out var pages))
            {
                _byKind[kind] = pages = [];
            }

            pages.Add(next.Path);
            foreach (var path in Href().Matches(await answer.Content.ReadAsStringAsync()).Select(m => WebUtility.HtmlDecode(m.Groups[1].Value).Split('#')[0]))
            {
                if (seen.Add(path))
                {
                    waiting.Enqueue((path, next.Path));
                }
            }
        }
    }

    private string? Kind(string path)
    {
        var bare = Uri.UnescapeDataString(path.Split('?')[0]);
        var at = _matchers.FindIndex(m => m.TryMatch(bare, []));
        return at < 0 ? null : Kinds[at];
    }

    [GeneratedRegex("<a [^>]*href=\"(/[^\"]*)\"")]
    private static partial Regex Href();
}
