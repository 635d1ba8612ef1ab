using BladeLog.Handbook.Quantities;

namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>A tooth strip in a window of mm: one outline and the marks on its teeth.</summary>
public sealed record StripGeometry(string Body, IReadOnlyList<string> Carbides, IReadOnlyList<string> AwayTeeth)
{
    /// <summary>Tips lie this far below the window's upper edge.</summary>
    public const double TipLine = 1.2;

    private const int Waves = 3;
    private const double WaveHeight = 0.55;

    /// <summary>Marks of teeth further outside the window than this are left out.</summary>
    private const double Overhang = 8;

    public static StripGeometry Of(ToothSpec blade, double width, double height, bool detail)
    {
        var edge = Profile.Of(blade, blade.Depth, 0, width, TipLine);
        var shown = edge.Tips.Where(t => t.X >= -Overhang && t.X <= width + Overhang).ToList();
        return new(
            edge.Path + Foot(edge, blade.Width, width, height),
            blade.Tip == TipKind.Tipped ? [.. shown.Select(t => ToothMarks.Carbide(t, TipLine, blade.Depth, blade.Pitches[0]))] : [],
            blade.Tip == TipKind.Set && detail
                ? [.. shown.Where(t => ToothMarks.IsAway(blade.Pattern, t.Index)).Select(t => ToothMarks.Away(t, TipLine, blade.Depth))]
                : []);
    }

    // The body ends at its back; if the window is lower than the blade, in a shallow wave: "goes on".
    private static string Foot(Profile edge, double bladeWidth, double width, double height)
    {
        var right = Svg.N(edge.Right);
        var left = Svg.N(edge.Left);
        if (TipLine + bladeWidth <= height - 0.6)
        {
            var back = Svg.N(TipLine + bladeWidth);
            return $"L{right} {back}L{left} {back}Z";
        }

        var y = height - 1.1;
        var step = width / Waves;
        var wave = $"L{right} {Svg.N(y)}L{Svg.N(width)} {Svg.N(y)}";
        for (var k = 0; k < Waves; k++)
        {
            var x = width - k * step;
            wave += $"C{Svg.At(x - step * 0.33, y - 2 * WaveHeight)} {Svg.At(x - step * 0.66, y + 2 * WaveHeight)} {Svg.At(x - step, y)}";
        }

        return wave + $"L{left} {Svg.N(y)}Z";
    }
}

/// <summary>A label on a drawing to scale.</summary>
public sealed record DrawnLabel(double X, double Y, string Text, bool Bold);

/// <summary>A blade at true size with its dimensions, in a window 120 mm wide; the steel ends at 92, labels stand right of it.</summary>
public sealed record BladeDrawingGeometry(
    int Height, string Clip, string Ghost, string Steel, IReadOnlyList<string> AwayTeeth, IReadOnlyList<string> Carbides,
    string Least, string BreakLine, IReadOnlyList<string> Leaders, string PitchLines, string PitchArrows,
    IReadOnlyList<DrawnLabel> Labels, double ShownPitch)
{
    public const double Window = 120;
    private const double Edge = 92;
    private const double LabelStep = 4.7;
    private static readonly int[] Heights = [14, 22, 32, 44, 56];

    /// <summary>Blades wider than the tallest window are drawn down to its edge and go on.</summary>
    public static BladeDrawingGeometry Of(ToothSpec now, double newWidth, double leastWidth, double newDepth, Drafting? drafting = null)
    {
        var d = drafting ?? Drafting.Metric;
        var worn = Math.Max(0, newWidth - now.Width);
        var y0 = 2.6 + worn;
        var back = y0 + now.Width;
        var height = Heights.FirstOrDefault(h => h >= back + 2.4, Heights[^1]);
        var foot = Math.Min(back, height - 2.4);
        var ghost = Profile.Of(now, newDepth, 0, Edge, y0 - worn);
        var edge = Profile.Of(now, now.Depth, 0, Edge, y0);

        var leaders = new List<string>();
        var labels = new List<DrawnLabel>();
        var last = -9d;
        (double Y, string Text, bool Bold)[] widths =
        [
            (back - newWidth, $"{d.Length(newWidth, 1)} new", false),
            (back - now.Width, $"{d.Length(now.Width, 1)} now", true),
            (back - leastWidth, $"{d.Length(leastWidth, 1)} least", false),
        ];
        foreach (var (y, text, bold) in widths.OrderBy(w => w.Y))
        {
            var at = Math.Max(y, last + LabelStep);
            last = at;
            leaders.Add($"M{Svg.N(Edge + 0.8)} {Svg.N(y)}h1.6l2.2 {Svg.N(at - y)}h1");
            labels.Add(new(Edge + 6.4, at + 1.2, text, bold));
        }

        leaders.Add($"M{Svg.N(Edge + 0.8)} {Svg.N(foot)}h4.8");
        labels.Add(new(Edge + 6.4, Math.Max(foot, last + LabelStep) + 1.2, foot < back ? "goes on" : "back", false));

        var pair = edge.Tips.Where(t => t.X > 30).Take(2).ToArray();
        var (x1, x2) = (pair[0].X, pair[1].X);
        var yd = y0 + Math.Min(now.Width, foot - y0) * 0.62;
        labels.Add(new(x2 + 1.2, yd + 1.2, $"pitch {d.Length(x2 - x1, 2)}", false));

        return new(height,
            $"M0 0H{Svg.N(Edge)}C{Svg.At(Edge - 1.6, height * 0.25)} {Svg.At(Edge + 1.6, height * 0.6)} {Svg.At(Edge - 0.4, height)}H0Z",
            ghost.Path, $"{edge.Path}V{Svg.N(foot)}H{Svg.N(edge.Left)}Z",
            now.Tip == TipKind.Set ? [.. edge.Tips.Where(t => ToothMarks.IsAway(now.Pattern, t.Index)).Select(t => ToothMarks.Away(t, y0, now.Depth))] : [],
            now.Tip == TipKind.Tipped ? [.. edge.Tips.Select(t => ToothMarks.Carbide(t, y0, now.Depth, now.Pitches[0]))] : [],
            $"M0 {Svg.N(back - leastWidth)}H{Svg.N(Edge)}",
            $"M{Svg.N(Edge)} {Svg.N(y0 - worn)}C{Svg.At(Edge - 1.2, height * 0.25)} {Svg.At(Edge + 1.2, height * 0.6)} {Svg.At(Edge - 0.4, foot)}",
            leaders,
            $"M{Svg.N(x1)} {Svg.N(y0 + 0.6)}V{Svg.N(yd + 1)}M{Svg.N(x2)} {Svg.N(y0 + 0.6)}V{Svg.N(yd + 1)}M{Svg.N(x1)} {Svg.N(yd)}H{Svg.N(x2)}",
            $"M{Svg.At(x1, yd)}l1.9 -.7v1.4zM{Svg.At(x2, yd)}l-1.9 -.7v1.4z",
            labels, x2 - x1);
    }
}

/// <summary>Teeth seen end-on at ten to one; window 52 by 40.</summary>
public sealed record EndViewGeometry(string? AwayTooth, string Tooth, string KerfLine, string KerfArrows, string BodyLine, string BodyArrows, double KerfLabelX, double BodyLabelX)
{
    public const double Width = 52;
    public const double Height = 40;
    private const double Scale = 10;
    private const double Middle = 20;
    private const double TipLine = 8;
    private const double Bottom = Height - 2;
    private const double LongestBend = 22;

    public static EndViewGeometry Of(double body, double kerf, double depth, TipKind tip)
    {
        // A kerf or body beyond the window is drawn at its edge; the figure beside it tells the truth.
        var t = Math.Min(body * Scale, 24);
        var k = Math.Clamp(kerf * Scale, t, 36);
        var bend = Math.Min((tip == TipKind.Set ? 0.55 : 0.25) * depth * Scale, LongestBend);
        var off = (k - t) / 2;
        var (l, r) = (Middle - t / 2, Middle + t / 2);
        var shoulder = TipLine + bend;
        string Outline(double left, double right) =>
            $"M{Svg.At(l, Bottom)}V{Svg.N(shoulder)}L{Svg.At(left, TipLine)}H{Svg.N(right)}L{Svg.At(r, shoulder)}V{Svg.N(Bottom)}Z";
        var (a, b) = (Middle - k / 2, Middle + k / 2);
        return new(
            tip == TipKind.Set ? Outline(l - off, r - off) : null,
            tip == TipKind.Set ? Outline(l + off, r + off) : Outline(l - off, r + off),
            $"M{Svg.N(a)} 1V{Svg.N(TipLine - 1)}M{Svg.N(b)} 1V{Svg.N(TipLine - 1)}M{Svg.N(a)} 3H{Svg.N(b)}",
            $"M{Svg.N(a)} 3l2 -.7v1.4zM{Svg.N(b)} 3l-2 -.7v1.4z",
            $"M{Svg.At(l, Bottom - 4)}h-6M{Svg.At(r, Bottom - 4)}h6",
            $"M{Svg.At(l, Bottom - 4)}l-2 -.7v1.4zM{Svg.At(r, Bottom - 4)}l2 -.7v1.4z",
            b + 2, r + 7);
    }
}
