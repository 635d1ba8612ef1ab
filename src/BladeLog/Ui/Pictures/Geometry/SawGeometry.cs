namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>How a saw stands.</summary>
public enum SawKind
{
    /// <summary>Two wheels, one above the other.</summary>
    TwoWheels,

    /// <summary>The same with a frame that tilts for bevels.</summary>
    TiltingFrame,

    /// <summary>Three equal wheels.</summary>
    ThreeWheels,

    /// <summary>Two wheels lying down over a log.</summary>
    Mill,
}

/// <summary>A saw as drawn, mm. The upper wheel differs from the lower one only when given.</summary>
/// <param name="Kind">How it stands.</param>
/// <param name="Wheel">Diameter of the (lower) wheel.</param>
/// <param name="Loop">Length of the blade.</param>
/// <param name="UpperWheel">Diameter of the upper wheel where it differs.</param>
/// <param name="TiltDegrees">Angle of the dashed blade on a tilting frame.</param>
public sealed record SawShape(SawKind Kind, double Wheel, double Loop, double? UpperWheel = null, double TiltDegrees = 22)
{
    public const double FloorHeight = 2530;

    /// <summary>The loop must go round the wheels without their touching.</summary>
    public bool CanBeDrawn => Wheel > 0 && (UpperWheel ?? Wheel) > 0 && double.IsFinite(Loop)
        && Span >= (Kind == SawKind.ThreeWheels ? Wheel : (Wheel + (UpperWheel ?? Wheel)) / 2);

    /// <summary>Distance of the axles; three wheels: the upright side of their triangle.</summary>
    public double Span => Kind == SawKind.ThreeWheels
        ? (Loop - Math.PI * Wheel) / (1 + 2 * Math.Sqrt(1.25))
        : SawGeometry.AxleDistance(Loop, Wheel / 2, (UpperWheel ?? Wheel) / 2);

    /// <summary>How tall it stands when drawn alone.</summary>
    public double OwnHeight => Kind switch
    {
        SawKind.Mill => Wheel + 420,
        SawKind.ThreeWheels => (Loop - Math.PI * Wheel) / (2 + Math.Sqrt(2)) + Wheel + 900,
        _ => Span + Math.Max(Wheel, UpperWheel ?? Wheel) + SawGeometry.Stand(Wheel) + 40,
    };

    public double OwnWidth => Kind switch
    {
        SawKind.Mill => Span + Wheel + 120,
        SawKind.ThreeWheels => (Loop - Math.PI * Wheel) / (2 + Math.Sqrt(2)) + Wheel + 260,
        _ => 1.55 * Wheel + 140,
    };

    /// <summary>One height for all saws of a shop, so that they stand on the Floor at one scale.</summary>
    public static double CommonHeight(IEnumerable<SawShape> saws) =>
        saws.Where(s => s.CanBeDrawn).Select(s => s.OwnHeight + 24).Append(FloorHeight).Max();
}

/// <summary>One wheel: rim, spokes, hub.</summary>
public sealed record WheelDrawing(Point Centre, double Radius)
{
    public string Spokes => string.Concat(Enumerable.Range(0, 5).Select(k =>
    {
        var q = double.DegreesToRadians(18 + 72 * k);
        return $"M{Svg.At(Centre)}L{Svg.At(Centre + 0.86 * Radius * new Point(Math.Cos(q), Math.Sin(q)))}";
    }));
}

/// <summary>An elevation in mm, standing on the lower edge of its window.</summary>
/// <param name="Width">Width of the window.</param>
/// <param name="Height">Height of the window.</param>
/// <param name="Frames">Doors, column, stand.</param>
/// <param name="Wheels">Wheels.</param>
/// <param name="Loop">The blade.</param>
/// <param name="Table">Table, where the picture shows one.</param>
/// <param name="Guides">The two guides.</param>
/// <param name="Tilted">The blade at the cut's angle.</param>
/// <param name="Stock">Left, top, width, height of the stock.</param>
/// <param name="Log">Centre and radius of the log under a mill.</param>
/// <param name="Cut">Where the stock is cut: the strand, the upper and the lower guide.</param>
public sealed record SawDrawing(
    double Width, double Height, IReadOnlyList<string> Frames, IReadOnlyList<WheelDrawing> Wheels, string Loop,
    string? Table, string? Guides, string? Tilted, (double X, double Y, double W, double H)? Stock, (Point Centre, double Radius)? Log,
    (double Strand, double UpperGuide, double LowerGuide)? Cut);

public static class SawGeometry
{
    public const double GuideAboveStock = 40;
    public const double GuideUnderTable = 45;
    private const double LogRadius = 190;

    /// <summary>A floor saw stands on its own casting; a small one on a bench or stand.</summary>
    public static double Stand(double wheel) => wheel > 500 ? 130 : 560;

    /// <summary>Distance a of two axles from the open-belt length L = 2 √(a² − δ²) + π (R₁+R₂) + 2 δ asin(δ/a), δ = R₁−R₂.</summary>
    public static double AxleDistance(double loop, double r1, double r2)
    {
        var d = r1 - r2;
        if (d == 0)
        {
            return (loop - 2 * Math.PI * r1) / 2;
        }

        double Length(double a) => 2 * Math.Sqrt(a * a - d * d) + Math.PI * (r1 + r2) + 2 * d * Math.Asin(d / a);
        var (low, high) = (Math.Abs(d), Math.Max(loop, Math.Abs(d)));
        if (loop <= Length(low))
        {
            return 0;
        }

        for (var i = 0; i < 80; i++)
        {
            var middle = (low + high) / 2;
            (low, high) = Length(middle) < loop ? (middle, high) : (low, middle);
        }

        return (low + high) / 2;
    }

    public static SawDrawing Of(SawShape saw, double? stock = null, double? height = null, double? width = null)
    {
        if (!saw.CanBeDrawn)
        {
            throw new ArgumentOutOfRangeException(nameof(saw), "The loop does not go round these wheels.");
        }

        var (h, w) = (height ?? saw.OwnHeight, width ?? saw.OwnWidth);
        return saw.Kind switch
        {
            SawKind.Mill => Mill(saw, h, w),
            SawKind.ThreeWheels => Three(saw, h, w),
            _ => Upright(saw, h, w, stock),
        };
    }

    private static SawDrawing Upright(SawShape saw, double h, double w, double? stock)
    {
        var (r, r2) = (saw.Wheel / 2, (saw.UpperWheel ?? saw.Wheel) / 2);
        var rise = Math.Sqrt(saw.Span * saw.Span - (r - r2) * (r - r2));
        var x = saw.Wheel / 2 + (w - saw.Wheel) * 0.25;
        var strand = x - r;
        var low = new Point(x, h - Stand(saw.Wheel) - r);
        var top = new Point(strand + r2, low.Y - rise);
        var table = low.Y - r * 1.16;

        var (left, right, q) = (x - 1.12 * r, x + 1.34 * r, r * 0.5);
        List<string> frames =
        [
            $"M{Svg.At(left, h)}V{Svg.N(low.Y - r * 1.04)}M{Svg.At(right, h)}V{Svg.N(top.Y - r2 * 1.1 + q)}"
            + $"a{Svg.N(q)} {Svg.N(q)} 0 0 0 {Svg.At(-q, -q)}H{Svg.N(left + q)}a{Svg.N(q)} {Svg.N(q)} 0 0 0 {Svg.At(-q, q)}"
            + $"V{Svg.N(top.Y + r2 * 1.04)}H{Svg.N(x + r * 1.1)}V{Svg.N(low.Y - r * 1.04)}H{Svg.N(left)}",
        ];
        if (Stand(saw.Wheel) > 500)
        {
            frames.Add($"M{Svg.At(left, low.Y + r * 1.12)}H{Svg.N(right)}");
        }

        var upper = table - (stock ?? 0.28 * saw.Span) - GuideAboveStock;
        var lower = table + GuideUnderTable;
        var half = saw.Wheel * 0.06;
        var t = double.DegreesToRadians(saw.TiltDegrees);
        return new(w, h, frames, [new(low, r), new(top, r2)], Loop(low, r, top, r2),
            $"M{Svg.At(strand - r * 0.75, table)}H{Svg.N(x + r * 0.4)}",
            $"M{Svg.At(strand - half, upper)}h{Svg.N(2 * half)}M{Svg.At(strand - half, lower)}h{Svg.N(2 * half)}",
            saw.Kind == SawKind.TiltingFrame
                ? $"M{Svg.At(strand, table)}L{Svg.At(strand - (table - top.Y) * Math.Sin(t), table - (table - top.Y) * Math.Cos(t))}" : null,
            stock is { } s ? (strand - r * 0.6, table - s, r * 0.6, s) : null, null, (strand, upper, lower));
    }

    // The cutting strand is upright on the left; the other one leaves the wheels where the strand mirrored on the line of axles does.
    private static string Loop(Point low, double r, Point top, double r2)
    {
        var along = 1 / (top - low).Length * (top - low);
        var back = -2 * along.X * along + new Point(1, 0);
        var (bigTop, bigLow) = (r2 > r ? 1 : 0, r > r2 ? 1 : 0);
        return $"M{Svg.At(low.X - r, low.Y)}V{Svg.N(top.Y)}A{Svg.N(r2)} {Svg.N(r2)} 0 {bigTop} 1 {Svg.At(top + r2 * back)}"
            + $"L{Svg.At(low + r * back)}A{Svg.N(r)} {Svg.N(r)} 0 {bigLow} 1 {Svg.At(low.X - r, low.Y)}Z";
    }

    private static SawDrawing Three(SawShape saw, double h, double w)
    {
        var (r, side) = (saw.Wheel / 2, saw.Span);
        var legs = (saw.Loop - Math.PI * saw.Wheel) / (2 + Math.Sqrt(2));
        var low = new Point(w / 2 - legs / 2, h > 900 ? h - r - 560 : h - r - 40);
        var top = low - new Point(0, side);
        var far = low + new Point(side, -side / 2);
        var foot = low.Y + r + 24;
        var n = r / Math.Sqrt(1.25);
        var (nx, ny) = (n / 2, n);
        var rr = $"{Svg.N(r)} {Svg.N(r)}";
        return new(w, h,
            [
                $"M{Svg.At(low.X - r, foot)}H{Svg.N(far.X + r)}V{Svg.N(top.Y - r)}H{Svg.N(low.X - r * 0.4)}M{Svg.At(low.X - r, foot)}V{Svg.N(h)}"
                + $"M{Svg.At(far.X + r, foot)}V{Svg.N(h)}M{Svg.At(low.X - r - 60, foot)}H{Svg.N(far.X + r + 60)}",
            ],
            [new(low, r), new(top, r), new(far, r)],
            $"M{Svg.At(low.X - r, low.Y)}V{Svg.N(top.Y)}A{rr} 0 0 1 {Svg.At(top.X + nx, top.Y - ny)}L{Svg.At(far.X + nx, far.Y - ny)}"
            + $"A{rr} 0 0 1 {Svg.At(far.X + nx, far.Y + ny)}L{Svg.At(low.X + nx, low.Y + ny)}A{rr} 0 0 1 {Svg.At(low.X - r, low.Y)}Z",
            null, null, null, null, null, null);
    }

    private static SawDrawing Mill(SawShape saw, double h, double w)
    {
        var (r1, r2) = (saw.Wheel / 2, (saw.UpperWheel ?? saw.Wheel) / 2);
        var r = Math.Max(r1, r2);
        var run = Math.Sqrt(saw.Span * saw.Span - (r1 - r2) * (r1 - r2));
        var y = h < 1000 ? h - 250 - r : h - 420;
        // The lower strand cuts and lies level.
        var left = new Point(w / 2 - run / 2, y + r - r1);
        var right = new Point(w / 2 + run / 2, y + r - r2);
        var along = 1 / (right - left).Length * (right - left);
        var up = 2 * along.Y * along + new Point(0, -1);
        var beam = y - r * 1.25;
        var (bigL, bigR) = (r1 > r2 ? 1 : 0, r2 > r1 ? 1 : 0);
        return new(w, h,
            [
                $"M{Svg.At(left.X - r * 0.3, beam)}H{Svg.N(right.X + r * 0.3)}M{Svg.At(left.X + r * 1.15, beam)}V{Svg.N(h - 30)}"
                + $"M{Svg.At(right.X - r * 1.15, beam)}V{Svg.N(h - 30)}M{Svg.At(w / 2 - saw.Span * 0.62, h - 30)}H{Svg.N(w / 2 + saw.Span * 0.62)}",
            ],
            [new(left, r1), new(right, r2)],
            $"M{Svg.At(left + r1 * up)}L{Svg.At(right + r2 * up)}A{Svg.N(r2)} {Svg.N(r2)} 0 {bigR} 1 {Svg.At(right.X, right.Y + r2)}"
            + $"H{Svg.N(left.X)}A{Svg.N(r1)} {Svg.N(r1)} 0 {bigL} 1 {Svg.At(left + r1 * up)}Z",
            null, null, null, null, (new(w / 2, h - 30 - LogRadius), LogRadius), null);
    }
}
