using System.Globalization;
using System.Text.RegularExpressions;
using AngleSharp.Dom;
using BladeLog.Tests.House;

namespace BladeLog.Tests.Features;

/// <summary>A shop that measures in inches reads inches, feet, psi and lbf on every page and in every picture.</summary>
public sealed partial class InchPagesTests
{
    /// <summary>What stays metric, and why.</summary>
    private static readonly (string Page, string Words)[] Stays =
    [
        // Examples of what may be typed: both systems are always taken.
        ("", "3 TPI, 2-3 TPI or 8.5 mm"), ("", "27 x 0.9 x 8.5 mm x 4013 mm"), ("", "such as 4 kW or 5.5 hp"),
        // Typed by people, kept as it was said.
        ("", "face veneers 4 mm"), ("/handover", ""),
        // Other people's figures, as their source has them, and the range over which a published formula was checked.
        ("/cautions", ""), ("/saws/S3/check", "3 to 13 mm"), ("/saws/S3/check", "within 6 mm"), ("/workings", "4.25 HB + 225 MPa"), ("/workings", "Bite 0.003 to 1.5 mm, band speed 3 to 60 m/s, pitch 1 to 75 mm"),
        ("/workings", "up to a bite of 0.1 mm"), ("/workings", "a bite over 0.1 mm"), ("/workings", "blades of 3 to 32 mm"), ("/workings", "0.05 to 0.25 mm, common practice"), ("/workings", "from 40 mm of width on"),
        ("/workings", "at least 150 mm long"), ("/workings/crack", "MPa√m"),
        // A setting keeps the unit its value is kept in; the choice of units names both.
        ("/setup", ""),
        // What a file is taken to mean where a column is missing.
        ("/import", ""),
        // The line to lay a rule on.
        ("/rackcard", "50 mm"),
    ];

    [Fact]
    public async Task No_page_of_an_inch_shop_speaks_metric()
    {
        using ShopApp app = await ShopApp.Sample();
        (await app.Fill("/setup", ("Lengths", "Inch"))).LeadsTo("/setup");
        List<string> found = [];
        foreach (string path in File.ReadLines(Path.Combine(Tree.Root, "docs", "screens", "pages.txt")).Select(l => l.Split(' ', 2)).Where(l => l.Length == 2).Select(l => l[1].Trim()))
        {
            // The what-if of a thickness is asked in the shop's unit.
            IDocument page = await app.GetPage(path.Replace("thickness=0.5", "thickness=0.02", StringComparison.Ordinal));
            foreach (string text in Texts(page))
            {
                string left = Stays.Where(s => path.StartsWith(s.Page, StringComparison.Ordinal)).Aggregate(text, (t, s) => s.Words.Length == 0 ? "" : t.Replace(s.Words, "", StringComparison.Ordinal));
                found.AddRange(Metric().Matches(left).Select(m => $"{path}: {m.Value} in \"{(left.Length > 120 ? left[..120] : left)}\""));
            }
        }

        Assert.True(found.Count == 0, string.Join('\n', found.Distinct().Take(40)));
    }

    [Fact]
    public async Task An_inch_shop_reads_one_form_for_each_kind_of_figure()
    {
        using ShopApp app = await ShopApp.Sample();
        (await app.Fill("/setup", ("Lengths", "Inch"))).LeadsTo("/setup");
        // Q-17 is 13 mm by 0.635 mm, its loop 2667 mm: 0.512 by 0.025 by 105 inches.
        string blade = SampleApp.Text((await app.GetPage("/blades/Q-17")).QuerySelector("main"));
        Assert.Contains("0.025 in", blade, StringComparison.Ordinal);
        Assert.Contains("105 in", blade, StringComparison.Ordinal);
        foreach (string path in new[] { "/rack", "/saws/S3", "/blades/Q-17", "/cuts", "/stock", "/bench" })
        {
            string text = SampleApp.Text((await app.GetPage(path)).QuerySelector("main"));
            // Four decimals of an inch, thousands without a comma, 64ths that are none.
            Assert.DoesNotMatch(@"(?<![\d.])(?:[1-9]\d*\.\d{4,}|0\.[1-9]\d{3,}) in\b", text);
            Assert.DoesNotMatch(@"(?<![\d,./-])\d{4,} (?:in|ft|psi|lbf|ft/min|h)\b", text);
            Assert.DoesNotContain("/64 in", text, StringComparison.Ordinal);
        }
    }

    private static IEnumerable<string> Texts(IDocument page)
    {
        foreach (IElement element in page.QuerySelectorAll("[aria-label]"))
        {
            yield return Plain(element.GetAttribute("aria-label")!);
        }

        // A title and a cell are read by themselves, so that two of them never make a figure together.
        foreach (INode node in page.QuerySelector("main")!.GetDescendants().Where(n => n is IText && n.Parent is IElement { LocalName: not ("script" or "style" or "option" or "textarea") }))
        {
            yield return Plain(node.TextContent);
        }
    }

    private static string Plain(string text) => string.Join(' ', text.Replace('\u00a0', ' ').Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)).ToString(CultureInfo.InvariantCulture);

    // µm of an edge stays: no inch shop has another word for it. A metre of a price and kg are no figures of a picture.
    [GeneratedRegex(@"\d ?(?:mm|MPa|N|kN|m/min|m/s|km|cm|kW|m|mm²|m²)(?![\w/²³√])", RegexOptions.CultureInvariant)]
    private static partial Regex Metric();
}
