using System.Net;
using System.Text.RegularExpressions;
using AngleSharp.Dom;

namespace BladeLog.Tests.House;

/// <summary>Walks the sample shop from the Floor through every link and every form that only asks.</summary>
public sealed partial class CrawlerTests(SampleShopApp shop) : IClassFixture<SampleShopApp>
{
    private const int MostPages = 2500;

    /// <summary>Of each working and of what every blade is asked in the same words: the addresses go on for thousands, all of one kind.</summary>
    private const int MostOfAWorking = 40;

    [Fact]
    public async Task Every_page_that_can_be_reached_is_whole()
    {
        var seen = new HashSet<string>(StringComparer.Ordinal) { "/" };
        var waiting = new Queue<(string Path, string From)>([("/", "the start")]);
        var wrong = new List<string>();
        var workings = new Dictionary<string, int>(StringComparer.Ordinal);
        while (waiting.TryDequeue(out var next))
        {
            using var answer = await shop.App.Client.GetAsync(next.Path);
            if (answer.StatusCode is HttpStatusCode.Redirect or HttpStatusCode.Found && answer.Headers.Location is { } to)
            {
                Add(to.OriginalString, next.Path);
                continue;
            }

            if (answer.StatusCode != HttpStatusCode.OK)
            {
                wrong.Add($"{next.Path} (from {next.From}) answered {(int)answer.StatusCode}");
                continue;
            }

            if (answer.Content.Headers.ContentType?.MediaType != "text/html")
            {
                continue;
            }

            var text = await answer.Content.ReadAsStringAsync();
            var page = ShopApp.Parse(text);
            wrong.AddRange(Faults(page, text).Select(fault => $"{next.Path}: {fault}"));
            foreach (var path in Asked(page))
            {
                Add(path, next.Path);
            }
        }

        Assert.True(seen.Count < MostPages, $"The links do not end: {string.Join(", ", seen.TakeLast(5))}");
        Assert.True(wrong.Count == 0, $"{wrong.Count} faults on {seen.Count} pages:\n{string.Join("\n", wrong.Take(40))}");
        Assert.True(seen.Count > 50, $"Only {seen.Count} pages were reached from the Floor.");

        void Add(string path, string from)
        {
            // The record's older pages go on for thousands of entries, all of one kind: two of them speak for the rest.
            if (Inside(path, from) is { } inside && (!inside.StartsWith("/record?page=", StringComparison.Ordinal) || inside.EndsWith("=2", StringComparison.Ordinal)) && seen.Count < MostPages && !seen.Contains(inside) && Wanted(inside))
            {
                seen.Add(inside);
                waiting.Enqueue((inside, from));
            }
        }

        bool Wanted(string path)
        {
            var page = path.Split('?')[0];

            // One blade's ways to measure its tension speak for all.
            page = path.EndsWith("/two", StringComparison.Ordinal) ? "/workings/two" : path.Contains("/tension?how=", StringComparison.Ordinal) ? "/workings/how" : page;
            return !page.StartsWith("/workings/", StringComparison.Ordinal) || (workings[page] = workings.GetValueOrDefault(page) + 1) <= MostOfAWorking;
        }
    }

    private static IEnumerable<string> Faults(IDocument page, string text)
    {
        if (page.QuerySelectorAll("h1").Length != 1)
        {
            yield return $"{page.QuerySelectorAll("h1").Length} first headings";
        }

        if (string.IsNullOrWhiteSpace(page.Title))
        {
            yield return "no title";
        }

        if (page.QuerySelector("[style]") is { } styled)
        {
            yield return $"a style attribute on {styled.LocalName}";
        }

        if (page.QuerySelectorAll("script").Any(s => !s.HasAttribute("src")))
        {
            yield return "an inline script";
        }

        if (page.All.FirstOrDefault(e => e.Attributes.Any(a => a.Name.StartsWith("on", StringComparison.Ordinal))) is { } handler)
        {
            yield return $"an inline handler on {handler.LocalName}";
        }

        if (NotANumber().Match(text) is { Success: true } found)
        {
            yield return $"\"{text[Math.Max(0, found.Index - 40)..Math.Min(text.Length, found.Index + 40)]}\"";
        }

        if (page.QuerySelectorAll("[id]").GroupBy(e => e.Id).FirstOrDefault(g => g.Count() > 1) is { } twice)
        {
            yield return $"the id {twice.Key} stands twice";
        }
    }

    /// <summary>Where the page's links lead, and what its asking forms send when sent as they stand.</summary>
    private static IEnumerable<string> Asked(IDocument page)
    {
        foreach (var href in page.QuerySelectorAll("a[href], area[href]").Select(a => a.GetAttribute("href")!))
        {
            yield return href;
        }

        foreach (var form in page.QuerySelectorAll("form").Where(f => !string.Equals(f.GetAttribute("method"), "post", StringComparison.OrdinalIgnoreCase)))
        {
            var fields = form.QuerySelectorAll("input[name], select[name]")
                .Where(f => f.GetAttribute("type") is not ("radio" or "checkbox") || f.HasAttribute("checked"))
                .Select(f => (Name: f.GetAttribute("name")!, Value: ValueOf(f)));
            var query = string.Join("&", fields.Select(f => $"{Uri.EscapeDataString(f.Name)}={Uri.EscapeDataString(f.Value)}"));
            yield return $"{form.GetAttribute("action")}?{query}";
        }
    }

    private static string ValueOf(IElement field) => field.LocalName == "select"
        ? (field.QuerySelector("option[selected]") ?? field.QuerySelector("option"))?.GetAttribute("value") ?? ""
        : field.GetAttribute("value") ?? "";

    /// <summary>The address inside the shop, without its fragment; null where it leads out.</summary>
    private static string? Inside(string link, string from)
    {
        var origin = new Uri("http://localhost");
        return Uri.TryCreate(new Uri(origin, from.StartsWith('/') ? from : "/"), link, out var at) && at.Host == "localhost" && at.Scheme == "http"
            ? at.PathAndQuery
            : null;
    }

    [GeneratedRegex(@"\bNaN\b|\bInfinity\b|∞")]
    private static partial Regex NotANumber();
}
