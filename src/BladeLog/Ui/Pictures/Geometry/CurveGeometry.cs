using System.Text;

namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>One line of a curve picture, its points in the units of the axes; a point that is not finite breaks it.</summary>
public sealed record CurveLine(string Name, IReadOnlyList<Point> Points);

/// <summary>Where the case asked stands.</summary>
public sealed record CurveHere(double X, double? Y, string Text);

/// <summary>What a curve picture shows.</summary>
/// <param name="Title">What is drawn against what.</param>
/// <param name="X">The level axis.</param>
/// <param name="XName">Its name with unit.</param>
/// <param name="Y">The upright axis.</param>
/// <param name="YName">Its name with unit.</param>
/// <param name="Lines">At most six, each with a stroke of its own.</param>
/// <param name="Here">The case asked.</param>
public sealed record CurveFigure(string Title, AxisScale X, string XName, AxisScale Y, string YName, IReadOnlyList<CurveLine> Lines, CurveHere? Here)
{
    /// <summary>A sentence under the picture: what it teaches.</summary>
    public string? Lesson { get; init; }
}

/// <summary>A stroke inside the plot: x in percent of its width, y in px of its height.</summary>
public sealed record CurvePath(string Css, string Data);

/// <summary>Curves on two axes: x in percent of the page and y in px, so that text never scales.</summary>
public sealed record CurveGeometry(double Height, double Top, IReadOnlyList<CurvePath> Paths, IReadOnlyList<AxisMark> Marks, Point? Here)
{
    public const double Plot = 300;
    private const double Row = 28;

    public static CurveGeometry Of(CurveFigure figure)
    {
        ArgumentNullException.ThrowIfNull(figure);
        double top = figure.Here is null ? Row + 6 : (2 * Row) + 6, bottom = top + Plot;
        List<AxisMark> marks = [new Words("gov", 0, 0, 20, figure.YName)];
        foreach (Tick tick in figure.Y.Up(Plot))
        {
            double y = bottom - (tick.Percent / 100 * Plot);
            marks.Add(new Level("hair", 0, 100, y));
            marks.Add(new Words("num", 0, -10, y + 7, tick.Text, "end"));
        }

        marks.Add(new Upright("axis", 0, top, bottom));
        marks.Add(new Level("axis", 0, 100, bottom));
        foreach (Tick tick in figure.X.Across())
        {
            marks.Add(new Upright("axis", tick.Percent, bottom, bottom + 7));
            marks.Add(new Words(tick.Minor ? "num minor" : "num", tick.Percent, 0, bottom + 28, tick.Text, "middle"));
        }

        marks.Add(new Words("gov", 100, 0, bottom + 28 + Row, figure.XName, "end"));
        Numbers(marks, figure, top);
        return new(bottom + 40 + Row, top, [.. figure.Lines.Select((line, i) => new CurvePath($"cline c{i + 1}", Path(figure, line)))], marks, MarkHere(marks, figure, top));
    }

    /// <summary>The picture in words.</summary>
    public static string Describe(CurveFigure figure)
    {
        ArgumentNullException.ThrowIfNull(figure);
        return $"{figure.Title}: {string.Join(", ", figure.Lines.Select(l => l.Name))}{(figure.Here is { } here ? $". {here.Text}" : "")}";
    }

    private static Point? MarkHere(List<AxisMark> marks, CurveFigure figure, double top)
    {
        if (figure.Here is not { } here || !figure.X.Holds(here.X))
        {
            return null;
        }

        double x = figure.X.At(here.X);
        marks.Add(new Upright("lead dash", x, top - Row, top + Plot));
        marks.Add(x <= 50 ? new Words("asked", x, 8, top - 12, here.Text) : new Words("asked", x, -8, top - 12, here.Text, "end"));
        return here.Y is { } y && figure.Y.Holds(y) ? new Point(x, top + Y(figure, y)) : null;
    }

    /// <summary>The number of a line stands where it leaves the plot on the right; numbers keep their order and their room.</summary>
    private static void Numbers(List<AxisMark> marks, CurveFigure figure, double top)
    {
        if (figure.Lines.Count < 2)
        {
            return;
        }

        var ends = figure.Lines.Select((line, i) => (Number: i + 1, Last: line.Points[^1]))
            .Where(e => double.IsFinite(e.Last.Y) && figure.Y.Holds(e.Last.Y) && Math.Abs(figure.X.At(e.Last.X) - 100) < 1e-6).ToList();
        IReadOnlyList<double> y = AxisScale.Spread([.. ends.Select(e => Y(figure, e.Last.Y))], 24, 0, Plot);
        for (int i = 0; i < ends.Count; i++)
        {
            marks.Add(new Words("gov", 100, 8, top + y[i] + 7, Svg.N(ends[i].Number)));
        }
    }

    private static double Y(CurveFigure figure, double value) => Plot - (figure.Y.At(value) / 100 * Plot);

    /// <summary>The line as far as it lies in the plot; where it leaves, it is cut at the edge.</summary>
    private static string Path(CurveFigure figure, CurveLine line)
    {
        StringBuilder d = new();
        bool drawing = false;
        Point? before = null;
        foreach (Point p in line.Points)
        {
            Point? now = double.IsFinite(p.X) && double.IsFinite(p.Y) ? new Point(figure.X.At(p.X), Y(figure, p.Y)) : null;
            if (before is { } a && now is { } b && Clip(a, b) is var (from, to, any) && any)
            {
                d.Append(drawing ? "" : $"M{Svg.At(from)}").Append('L').Append(Svg.At(to));
                drawing = to == b;
            }
            else
            {
                drawing = false;
            }

            before = now;
        }

        return d.ToString();
    }

    private static (Point From, Point To, bool Any) Clip(Point a, Point b)
    {
        // A logarithm of nothing lies endlessly far below: such a piece is drawn to the edge, straight down.
        double ya = Math.Clamp(a.Y, -1e6, 1e6), yb = Math.Clamp(b.Y, -1e6, 1e6);
        (double low, double high) = (0, 1);
        double dy = yb - ya;
        if (dy == 0)
        {
            return (a, b, ya is >= 0 and <= Plot);
        }

        double t0 = (0 - ya) / dy, t1 = (Plot - ya) / dy;
        (low, high) = (Math.Max(low, Math.Min(t0, t1)), Math.Min(high, Math.Max(t0, t1)));
        Point On(double t) => t == 0 ? new(a.X, ya) : t == 1 ? new(b.X, yb) : new(a.X + (t * (b.X - a.X)), ya + (t * dy));
        return (On(low), On(high), low < high);
    }
}
