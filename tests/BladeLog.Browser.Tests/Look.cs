using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;

namespace BladeLog.Browser.Tests;

/// <summary>What is wrong with a page for eyes and hands, one line for each finding.</summary>
internal static class Look
{
    private static readonly string Script = Read("Look.js");
    private static readonly string Ground = Read("Ground.js");

    /// <summary>Sizes, distances, words in their boxes; the rules stand in Look.js.</summary>
    public static async Task<IReadOnlyList<string>> Measured(Tablet tablet) =>
        await tablet.Page.EvaluateAsync<string[]>(Script, new { width = tablet.Screen.Width, height = tablet.Screen.Height, tablet = tablet.Screen.IsTablet });

    /// <summary>What a reader without eyes or with weak ones would meet, by the rules of axe.</summary>
    public static async Task<IReadOnlyList<string>> Scanned(Tablet tablet)
    {
        return Lines(await tablet.Page.RunAxe(new AxeRunOptions { ResultTypes = [ResultType.Violations] }));
    }

    /// <summary>Ink against its ground, from the computed styles; the limits stand in Ground.js.</summary>
    public static async Task<IReadOnlyList<string>> Contrast(Tablet tablet, double body, double text, double parts) =>
        await tablet.Page.EvaluateAsync<string[]>(Ground, new { body, text, parts });

    /// <summary>What the title block hides of a target that has the focus.</summary>
    public static async Task<IReadOnlyList<string>> Covered(Tablet tablet) => await tablet.Page.EvaluateAsync<string[]>(
        """
        () => {
          const found = [], foot = document.querySelector('.block');
          if (!foot || getComputedStyle(foot).position !== 'sticky') return found;
          for (const e of document.querySelectorAll('main :is(a[href],button,input:not([type=hidden]),select,textarea,summary,[tabindex="0"])')) {
            if (!e.checkVisibility()) continue;
            e.focus();
            if (document.activeElement !== e) continue;
            // A tall thing counts as seen when its upper part is.
            const b = e.getBoundingClientRect(), top = foot.getBoundingClientRect().top;
            if (Math.min(b.bottom, b.top + 64) > top + 1 && b.bottom < innerHeight + 400) found.push(`covered: ${e.tagName.toLowerCase()} "${(e.textContent || e.id || e.name).trim().slice(0, 30)}" stands at ${b.top.toFixed(0)} to ${b.bottom.toFixed(0)}, the title block at ${top.toFixed(0)}`);
          }
          scrollTo(0, 0);
          return found;
        }
        """);

    private static IReadOnlyList<string> Lines(AxeResult result) =>
        [.. result.Violations.SelectMany(v => v.Nodes.Select(n => $"axe {v.Id}: {n.Target} {v.Help}"))];

    private static string Read(string name)
    {
        using var stream = typeof(Look).Assembly.GetManifestResourceStream(name)!;
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd();
    }
}
