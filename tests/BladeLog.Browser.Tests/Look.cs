using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;

namespace BladeLog.Browser.Tests;

/// <summary>What is wrong with a page for eyes and hands, one line for each finding.</summary>
internal static class Look
{
    private static readonly string Script = ReadScript();

    /// <summary>Sizes, distances, words in their boxes; the rules stand in Look.js.</summary>
    public static async Task<IReadOnlyList<string>> Measured(Tablet tablet) =>
        await tablet.Page.EvaluateAsync<string[]>(Script, new { width = tablet.Screen.Width, height = tablet.Screen.Height, tablet = tablet.Screen.IsTablet });

    /// <summary>What a reader without eyes or with weak ones would meet, by the rules of axe.</summary>
    public static async Task<IReadOnlyList<string>> Scanned(Tablet tablet)
    {
        return Lines(await tablet.Page.RunAxe(new AxeRunOptions { ResultTypes = [ResultType.Violations] }));
    }

    /// <summary>Ink against paper: 7 to 1 for plain text, 4.5 to 1 for large.</summary>
    public static async Task<IReadOnlyList<string>> Contrast(Tablet tablet) =>
        Lines(await tablet.Page.RunAxe(new AxeRunOptions
        {
            RunOnly = new RunOnlyOptions { Type = "rule", Values = ["color-contrast", "color-contrast-enhanced"] },
            Rules = new Dictionary<string, RuleOptions> { ["color-contrast-enhanced"] = new() { Enabled = true } },
        }));

    private static IReadOnlyList<string> Lines(AxeResult result) =>
        [.. result.Violations.SelectMany(v => v.Nodes.Select(n => $"axe {v.Id}: {n.Target} {v.Help}"))];

    private static string ReadScript()
    {
        using var stream = typeof(Look).Assembly.GetManifestResourceStream("Look.js")!;
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd();
    }
}
