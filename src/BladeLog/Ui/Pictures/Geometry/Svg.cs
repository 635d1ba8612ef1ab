using System.Globalization;

namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>A point on a picture; y runs down, as on a screen.</summary>
public readonly record struct Point(double X, double Y)
{
    public double Length => Math.Sqrt(X * X + Y * Y);

    public static Point operator +(Point a, Point b) => new(a.X + b.X, a.Y + b.Y);

    public static Point operator -(Point a, Point b) => new(a.X - b.X, a.Y - b.Y);

    public static Point operator *(double k, Point a) => new(k * a.X, k * a.Y);
}

/// <summary>Numbers as an SVG attribute wants them.</summary>
public static class Svg
{
    /// <summary>At most two decimals, no trailing noughts, never minus nought.</summary>
    public static string N(double value, int decimals = 2)
    {
        if (!double.IsFinite(value))
        {
            throw new ArgumentOutOfRangeException(nameof(value), "A picture cannot show a number that is not finite.");
        }

        var text = value.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        if (text.Contains('.', StringComparison.Ordinal))
        {
            text = text.TrimEnd('0').TrimEnd('.');
        }

        return text == "-0" ? "0" : text;
    }

    /// <summary>A share of the axis: "37.5%".</summary>
    public static string Percent(double value) => N(value) + "%";

    /// <summary>"x y".</summary>
    public static string At(Point p) => $"{N(p.X)} {N(p.Y)}";

    /// <summary>"x y".</summary>
    public static string At(double x, double y) => $"{N(x)} {N(y)}";
}
