namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>A life: used for certain, used perhaps, and the marks where 1 in 10 and half of such blades have broken.</summary>
/// <param name="Used">Used for certain, in the unit of the axis.</param>
/// <param name="Median">Half of such blades have broken here.</param>
/// <param name="OneInTen">1 in 10 has broken here.</param>
/// <param name="Perhaps">High estimate of the use where the history is not known.</param>
/// <param name="Taught">Whether the shop's own breaks have taught the level.</param>
/// <param name="Unit">h, or bends.</param>
public sealed record LifeFigures(double Used, double Median, double OneInTen, double? Perhaps = null, bool Taught = false, string Unit = "h");

/// <summary>Life on a linear axis that ends where half of such blades have broken.</summary>
public static class LifeBandGeometry
{
    private const int Row = 28;

    /// <summary>The axis' end: the median stays in the right-hand eighth, so that its label meets no other.</summary>
    public static double End(LifeFigures life) =>
        Math.Max(life.Median, Math.Min(1.12 * life.Median, Math.Max(1.08 * life.Used, 1.04 * (life.Perhaps ?? 0))));

    public static AxisPicture Of(LifeFigures life, bool compact)
    {
        if (!(life.Median > 0) || !(life.OneInTen > 0) || !(life.Used >= 0) || life.OneInTen > life.Median)
        {
            throw new ArgumentOutOfRangeException(nameof(life), "A life needs a median, and a 1-in-10 point before it.");
        }

        var end = End(life);
        double X(double v) => Math.Min(100, 100 * v / end);
        var (xu, xl, xm) = (X(life.Used), X(life.OneInTen), X(life.Median));
        var xp = life.Perhaps is { } p ? X(p) : (double?)null;
        double height = compact ? 18 : 44;
        double y = (compact ? 0 : 2 * Row + 6) + 1;
        double inset = compact ? 5 : 12;
        var ym = y + height / 2;
        List<AxisMark> marks =
        [
            new Bar("bandframe", 0, y, 100, height),
            new Bar(life.Taught ? "taught" : "rubbase", xl, y, xm - xl, height),
        ];
        if (!life.Taught)
        {
            marks.Add(new Bar("hatched", xl, y, xm - xl, height, compact ? "url(#hatchs)" : "url(#hatch)"));
        }

        if (xp is { } upTo)
        {
            marks.Add(new Bar("poss", xu, y + inset, Math.Max(0, upTo - xu), height - 2 * inset));
        }

        marks.Add(new Bar("used", 0, y + inset, xu, height - 2 * inset));
        marks.Add(new Upright("mark", xl, y, y + height));
        marks.Add(new Upright("mark", xm, y, y + height));
        marks.Add(new Bar("bandedge", 0, y, 100, height));
        if (Math.Max(life.Used, life.Perhaps ?? 0) > end)
        {
            marks.Add(new Beyond(100, ym, height / 2, Math.Round(height / 2.4)));
        }

        if (xp is null && xl - xu > 9)
        {
            marks.Add(new Level("reach", xu, xl, ym));
            if (!compact)
            {
                marks.Add(new Head(xu, ym, false));
            }

            marks.Add(new Head(xl, ym, true));
        }

        if (compact)
        {
            return new(y + height + 1, marks);
        }

        Above(marks, y, xm, 0, $"half of such blades broken: {Text(life.Median, life.Unit)}", right: false, "gov");
        Above(marks, y, xl, 1, $"1 in 10: {Text(life.OneInTen, life.Unit)}", right: xl <= 44, null);
        var run = $"run {Text(life.Used, life.Unit)}";
        if (xp is not { } x)
        {
            Below(marks, y + height, xu, 1, run, right: xu <= 45, "gov");
            return new(y + height + Row + 2, marks);
        }

        var perhaps = $"perhaps {Figures.Hours(life.Perhaps!.Value)}";
        if (x <= 60)
        {
            Below(marks, y + height, x, 1, perhaps, right: true, null);
            Below(marks, y + height, xu, 2, run, right: true, "gov");
        }
        else
        {
            Below(marks, y + height, xu, 1, run, right: xu <= 30, "gov");
            Below(marks, y + height, x, 2, perhaps, right: false, null);
        }

        return new(y + height + 2 * Row + 2, marks);
    }

    public static string Describe(LifeFigures life) =>
        $"Life: run {Text(life.Used, life.Unit)}{(life.Perhaps is { } p ? $", perhaps {Text(p, life.Unit)}" : "")}; "
        + $"1 in 10 such blades broken at {Text(life.OneInTen, life.Unit)}, half at {Text(life.Median, life.Unit)}; "
        + (life.Taught ? "taught by the shop's own breaks" : "handbook alone");

    private static string Text(double v, string unit) => Figures.With(Figures.Hours(v), unit);

    private static void Above(List<AxisMark> marks, double top, double x, int level, string text, bool right, string? css)
    {
        marks.Add(new Upright("lead", x, level * Row + 4, top));
        marks.Add(new Words(css, x, right ? 7 : -8, level * Row + 22, text, right ? "start" : "end"));
    }

    private static void Below(List<AxisMark> marks, double bottom, double x, int level, string text, bool right, string? css)
    {
        var yt = bottom + level * Row;
        marks.Add(new Upright("lead", x, bottom, yt - 2));
        marks.Add(new Words(css, x, right ? 7 : -8, yt - 5, text, right ? "start" : "end"));
    }
}

/// <summary>The part cut is solid, the part left is a dimension line up to the stop; no frame and no hatch, so that it is never taken for life.</summary>
public static class WearLineGeometry
{
    public static AxisPicture Of(double share)
    {
        if (!(share >= 0))
        {
            throw new ArgumentOutOfRangeException(nameof(share), "What is used cannot be less than nothing.");
        }

        var used = 100 * Math.Min(1, share);
        List<AxisMark> marks = [new Level("base", 0, 100, 19), new Bar("used", 0, 5, used, 10)];
        if (used < 91)
        {
            marks.Add(new Level("reach", used, 100, 10));
            marks.Add(new Head(100, 10, true));
        }

        marks.Add(new Upright("mark", 100, 1, 19.6));
        return new(20, marks);
    }
}
