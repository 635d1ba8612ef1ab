namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>A life of which only a range is told: hatched from one end to the other, with no point in it.</summary>
public static class RangeBandGeometry
{
    private const int Row = 28;

    /// <param name="low">Least share of the life half of such blades reach.</param>
    /// <param name="high">Greatest share.</param>
    /// <param name="oneInTen">Share at which one in ten has broken.</param>
    /// <param name="compact">Bar and marks alone.</param>
    public static AxisPicture Of(double low, double high, double oneInTen, bool compact)
    {
        if (!(low >= 0) || !(high >= low) || oneInTen is not (> 0 and <= 1))
        {
            throw new ArgumentOutOfRangeException(nameof(low), "A range of used life runs from a lesser share to a greater one.");
        }

        var (x1, x2, xl) = (100 * Math.Min(1, low), 100 * Math.Min(1, high), 100 * oneInTen);
        double height = compact ? 18 : 44;
        double y = (compact ? 0 : 2 * Row + 6) + 1;
        List<AxisMark> marks =
        [
            new Bar("bandframe", 0, y, 100, height),
            new Bar("hatched", x1, y, x2 - x1, height, compact ? "url(#hatchs)" : "url(#hatch)"),
            new Bar("poss", x1, y, x2 - x1, height),
            new Upright("mark", xl, y, y + height),
            new Upright("mark", 100, y, y + height),
            new Bar("bandedge", 0, y, 100, height),
        ];
        if (compact)
        {
            return new(y + height + 1, marks);
        }

        marks.Add(new Upright("lead", 100, 4, y));
        marks.Add(new Words("gov", 100, -8, 22, "half of such blades broken", "end"));
        marks.Add(new Upright("lead", xl, Row + 4, y));
        var right = xl <= 44;
        marks.Add(new Words(null, xl, right ? 7 : -8, Row + 22, "1 in 10", right ? "start" : "end"));
        var left = x1 > 45;
        marks.Add(new Upright("lead", x1, y + height, y + height + Row - 2));
        marks.Add(new Words("gov", x1, left ? -8 : 7, y + height + Row - 5, Words(low, high), left ? "end" : "start"));
        return new(y + height + Row + 2, marks);
    }

    public static string Describe(double low, double high) =>
        $"Life: {Words(low, high)} of the life half of such blades reach; its history is unknown";

    private static string Words(double low, double high) => $"used {Figures.Number(low, 1)} to {Figures.Number(high, 1)}";
}
