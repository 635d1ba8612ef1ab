using System.Text;

namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>How a blade came apart, as the two ends show it.</summary>
public enum FractureKind
{
    StraightFromGullet,
    AngledFromGullet,
    BackEdge,
    Weld,
    Body,
    TeethStripped,
}

/// <summary>What a fracture picture is made of: pieces of steel, the crack or the tear, and where it began.</summary>
public sealed record FractureShapes(IReadOnlyList<string> Pieces, IReadOnlyList<string> Tears, IReadOnlyList<string> Seams, Point? Began);

/// <summary>A length of blade, teeth up, five teeth long, broken in six ways. Units of the picture, not of a blade.</summary>
public static class FractureGeometry
{
    public const double Width = 200;
    public const double Height = 100;
    private const double Pitch = 40;
    private const double Tip = 12;
    private const double Gullet = 34;
    private const double Back = 86;
    private const double Gap = 5;

    public static FractureShapes Of(FractureKind kind) => kind switch
    {
        // The line runs down from a gullet to the back edge; small steps as torn steel has them.
        FractureKind.StraightFromGullet => Apart([new(80, Gullet), new(82, 46), new(79, 58), new(81, 72), new(80, Back)], new(80, Gullet)),
        FractureKind.AngledFromGullet => Apart([new(80, Gullet), new(81, 44), new(92, 56), new(104, 70), new(120, Back)], new(80, Gullet)),
        FractureKind.BackEdge => Apart([new(80, Gullet), new(86, 46), new(90, 58), new(96, 70), new(100, Back)], new(100, Back)),
        FractureKind.Weld => Apart([new(80, Gullet), new(80, Back)], null) with
        {
            Seams = [$"M{Svg.N(60)} {Svg.N(24)}V{Svg.N(Back)}", $"M{Svg.N(98)} {Svg.N(24)}V{Svg.N(Back)}"],
        },
        FractureKind.Body => new([Outline(0, Width, [])], ["M52 62L74 58L96 63L120 59L148 62"], [], new(52, 62)),
        FractureKind.TeethStripped => new([Outline(0, Width, [1, 2, 3])], [], [], null),
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "No picture of this fracture."),
    };

    public static string Describe(FractureKind kind) => kind switch
    {
        FractureKind.StraightFromGullet => "Broken straight across from a gullet",
        FractureKind.AngledFromGullet => "Broken from a gullet, then on at an angle",
        FractureKind.BackEdge => "Broken from the back edge",
        FractureKind.Weld => "Broken at the weld",
        FractureKind.Body => "Cracked along the middle of the body",
        FractureKind.TeethStripped => "Torn, with teeth stripped",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "No picture of this fracture."),
    };

    /// <summary>Two ends along one line, drawn a little apart.</summary>
    private static FractureShapes Apart(Point[] line, Point? began)
    {
        var left = new StringBuilder($"M0 {Svg.N(Back)}V{Svg.N(Gullet)}").Append(Teeth(0, line[0].X, [], -Gap));
        foreach (var p in line)
        {
            left.Append($"L{Svg.N(p.X - Gap)} {Svg.N(p.Y)}");
        }

        var right = new StringBuilder($"M{Svg.N(line[0].X + Gap)} {Svg.N(line[0].Y)}").Append(Teeth(line[0].X, Width, [], Gap)).Append($"V{Svg.N(Back)}");
        foreach (var p in line.Reverse())
        {
            right.Append($"L{Svg.N(p.X + Gap)} {Svg.N(p.Y)}");
        }

        return new FractureShapes([left.Append('Z').ToString(), right.Append('Z').ToString()], [], [], began);
    }

    private static string Outline(double from, double to, int[] without) =>
        $"M{Svg.N(from)} {Svg.N(Back)}V{Svg.N(Gullet)}{Teeth(from, to, without, 0)}V{Svg.N(Back)}Z";

    /// <summary>Hook teeth from one gullet to another; a stripped tooth leaves a torn stump.</summary>
    private static string Teeth(double from, double to, int[] without, double shift)
    {
        var path = new StringBuilder();
        for (double x = from; x < to - 1; x += Pitch)
        {
            double at = x + shift;
            path.Append(without.Contains((int)Math.Round(x / Pitch))
                ? $"L{Svg.N(at + 6)} {Svg.N(Gullet - 3)}L{Svg.N(at + 13)} {Svg.N(Gullet + 3)}L{Svg.N(at + 20)} {Svg.N(Gullet - 4)}L{Svg.N(at + 29)} {Svg.N(Gullet + 2)}L{Svg.N(at + Pitch)} {Svg.N(Gullet)}"
                : $"Q{Svg.N(at + 7)} {Svg.N(Gullet)} {Svg.N(at + 5)} {Svg.N(Tip)}L{Svg.N(at + 18)} {Svg.N(Tip + 8)}Q{Svg.N(at + 28)} {Svg.N(Gullet)} {Svg.N(at + Pitch)} {Svg.N(Gullet)}");
        }

        return path.ToString();
    }
}
