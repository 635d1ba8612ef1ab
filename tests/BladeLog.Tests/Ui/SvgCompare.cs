using System.Globalization;
using System.Text.RegularExpressions;
using AngleSharp.Dom;

namespace BladeLog.Tests.Ui;

/// <summary>Compares two pictures element by element: the same shapes in the same order at the same points.</summary>
internal static partial class SvgCompare
{
    // Two decimals are written; a relative step may carry one rounding more.
    private const double Near = 0.03;
    private static readonly string[] Numeric = ["x", "y", "x1", "x2", "y1", "y2", "width", "height", "cx", "cy", "r", "dx"];

    public static void Same(string expected, string actual)
    {
        var wanted = Shapes(Rendered.Root(expected));
        var got = Shapes(Rendered.Root(actual));
        Assert.Equal(wanted.Select(Name), got.Select(Name));
        foreach (var (w, g) in wanted.Zip(got))
        {
            foreach (var attribute in Numeric)
            {
                Assert.Equal(Number(w, attribute), Number(g, attribute), Near);
            }

            Assert.Equal(w.GetAttribute("text-anchor") ?? "start", g.GetAttribute("text-anchor") ?? "start");
            Assert.Equal(w.GetAttribute("fill"), g.GetAttribute("fill"));
            if (w.GetAttribute("d") is { } path)
            {
                SamePoints(path, g.GetAttribute("d")!);
            }
        }
    }

    /// <summary>All points of a path in absolute coordinates, arc radii included.</summary>
    public static List<(double X, double Y)> Points(string path)
    {
        var points = new List<(double X, double Y)>();
        var (x, y) = (0d, 0d);
        foreach (Match m in Command().Matches(path))
        {
            var c = m.Groups[1].Value[0];
            var n = Figure().Matches(m.Groups[2].Value).Select(f => double.Parse(f.Value, CultureInfo.InvariantCulture)).ToArray();
            var relative = char.IsLower(c);
            var (ox, oy) = relative ? (x, y) : (0, 0);
            switch (char.ToUpperInvariant(c))
            {
                case 'H':
                    points.Add((x = ox + n[0], y));
                    break;
                case 'V':
                    points.Add((x, y = oy + n[0]));
                    break;
                case 'A':
                    points.Add((n[0], n[1]));
                    points.Add((n[3], n[4]));
                    points.Add((x = ox + n[5], y = oy + n[6]));
                    break;
                case 'Z':
                    break;
                default:
                    for (var i = 0; i < n.Length; i += 2)
                    {
                        points.Add((ox + n[i], oy + n[i + 1]));
                    }

                    (x, y) = points[^1];
                    break;
            }
        }

        return points;
    }

    private static void SamePoints(string expected, string actual)
    {
        // A line may be written as H, V or L; a step of no length says nothing.
        var wanted = Distinct(Points(expected));
        var got = Distinct(Points(actual));
        Assert.True(wanted.Count == got.Count, $"Not the same points:\n{expected}\n{actual}");
        foreach (var (w, g) in wanted.Zip(got))
        {
            Assert.True(Math.Abs(w.X - g.X) <= Near && Math.Abs(w.Y - g.Y) <= Near, $"{w} became {g} in\n{expected}\n{actual}");
        }
    }

    private static List<(double X, double Y)> Distinct(List<(double X, double Y)> points) =>
        [.. points.Where((p, i) => i == 0 || Math.Abs(p.X - points[i - 1].X) + Math.Abs(p.Y - points[i - 1].Y) > 0.011)];

    // Ink lines, arrow heads and words cover nothing, so among themselves their order is free.
    private static List<IElement> Shapes(IElement root) =>
        [.. root.QuerySelectorAll("rect,line,circle,path,text,svg,clipPath,g").Where(e => e.ParentElement is not null && (e.TagName != "svg" || e.ClassList.Contains("pin")))
            .OrderBy(e => e.TagName == "text" ? 3 : e.ClassList.Contains("arrow") ? 2 : e.ClassList.Contains("dim") ? 1 : 0)];

    private static string Name(IElement e) =>
        $"{e.TagName} {(e.GetAttribute("fill")?.StartsWith("url", StringComparison.Ordinal) == true ? "" : e.GetAttribute("class"))} {(e.TagName == "text" ? e.TextContent.Replace('\u00a0', ' ') : "")}";

    private static double Number(IElement e, string attribute) =>
        e.GetAttribute(attribute) is { } text ? double.Parse(text.TrimEnd('%'), CultureInfo.InvariantCulture) : 0;

    [GeneratedRegex("([MLHVACQZmlhvacqz])([^MLHVACQZmlhvacqz]*)")]
    private static partial Regex Command();

    [GeneratedRegex(@"-?(\d+\.?\d*|\.\d+)")]
    private static partial Regex Figure();
}
