using System.Text;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>The teeth of a blade as drawn: lengths in mm, hook in degrees.</summary>
/// <param name="Width">Overall width now, tips to back.</param>
/// <param name="Pitches">The pitches in their order, repeated along the blade.</param>
/// <param name="Depth">Gullet depth at the coarsest pitch.</param>
/// <param name="Form">Tooth form.</param>
/// <param name="Hook">Hook angle, degrees.</param>
/// <param name="Tip">What gives the side clearance.</param>
/// <param name="Pattern">The order in which set teeth lean.</param>
public sealed record ToothSpec(
    double Width, IReadOnlyList<double> Pitches, double Depth, ToothForm Form, double Hook, TipKind Tip,
    SetPattern Pattern = SetPattern.Alternate)
{
    /// <summary>The drawing's own values where the specification is silent; marked "assumed" on the page.</summary>
    public static ToothSpec Assumed(double width, IReadOnlyList<double> pitches, ToothForm form, TipKind tip, double? depth = null, double? hook = null)
    {
        var share = form == ToothForm.Skip ? 0.25 : 0.40;
        return new(width, pitches, depth ?? Math.Min(share * pitches.Max(), width / 5), form,
            hook ?? (form == ToothForm.Hook ? 10 : 0), tip);
    }

    /// <summary>Whether every gap can be drawn: a straight face is left, and the back is a tangent to the gullet.</summary>
    public bool CanBeDrawn => Width > 0 && Depth > 0 && Depth < Width && Pitches.Count > 0 && Pitches.All(p => p > 0)
        && Hook is > -45 and < 45 && Pitches.All(p => Gap.IsSound(p, Depth * p / Pitches.Max(), Form, Hook));
}

/// <summary>One gap between two tips, the first at (0, 0), the next at (pitch, 0); depth runs down.</summary>
/// <param name="Foot">Foot of the straight face.</param>
/// <param name="Centre">Centre of the gullet's arc.</param>
/// <param name="Radius">Gullet radius.</param>
/// <param name="ArcEnd">Where the arc ends: at the back (hook, regular) or on the floor (skip).</param>
/// <param name="Back">The lower end of the back's straight part.</param>
/// <param name="FloorEnd">Skip: end of the flat floor.</param>
/// <param name="Knee">Skip: the corner that is rounded.</param>
public readonly record struct Gap(Point Foot, Point Centre, double Radius, Point ArcEnd, Point Back, Point FloorEnd, Point Knee)
{
    public static double RadiusOf(double pitch, double depth, ToothForm form) => form switch
    {
        ToothForm.Skip => Math.Min(0.10 * pitch, 0.45 * depth),
        ToothForm.Regular => Math.Min(0.12 * pitch, 0.35 * depth),
        _ => Math.Min(0.22 * pitch, 0.55 * depth),
    };

    public static bool IsSound(double pitch, double depth, ToothForm form, double hook)
    {
        var (r, s, centre) = Face(pitch, depth, form, hook);
        return form == ToothForm.Skip
            ? s > 0 && centre.X < pitch / 2 - 0.11 * pitch
            : s > 0 && (new Point(pitch, 0) - centre).Length > r;
    }

    public static Gap Of(double pitch, double depth, ToothForm form, double hook)
    {
        if (!IsSound(pitch, depth, form, hook))
        {
            throw new ArgumentOutOfRangeException(nameof(depth), "The gullet is deeper than the pitch allows.");
        }

        var g = double.DegreesToRadians(hook);
        var (r, s, centre) = Face(pitch, depth, form, hook);
        var foot = new Point(-s * Math.Sin(g), s * Math.Cos(g));
        if (form == ToothForm.Skip)
        {
            var b = 0.5 * pitch;
            var knee = new Point(pitch - b, depth);
            var q = 0.22 * b;
            var back = knee + q / Math.Sqrt(b * b + depth * depth) * new Point(b, -depth);
            return new(foot, centre, r, new(centre.X, depth), back, knee - new Point(q, 0), knee);
        }

        var toTip = new Point(pitch, 0) - centre;
        var phi = Math.Atan2(toTip.Y, toTip.X);
        var beta = Math.Acos(Math.Min(1, r / toTip.Length));
        var one = centre + r * new Point(Math.Cos(phi + beta), Math.Sin(phi + beta));
        var other = centre + r * new Point(Math.Cos(phi - beta), Math.Sin(phi - beta));
        var tangent = one.Y >= other.Y ? one : other;
        return new(foot, centre, r, tangent, tangent, tangent, tangent);
    }

    private static (double R, double S, Point Centre) Face(double pitch, double depth, ToothForm form, double hook)
    {
        var g = double.DegreesToRadians(hook);
        var r = RadiusOf(pitch, depth, form);
        var s = (depth - r - r * Math.Sin(g)) / Math.Cos(g);
        return (r, s, new(-s * Math.Sin(g) + r * Math.Cos(g), s * Math.Cos(g) + r * Math.Sin(g)));
    }
}

/// <summary>A tip on the outline with the directions of its two flanks.</summary>
/// <param name="X">Position along the blade.</param>
/// <param name="Face">From the tip to the foot of its face.</param>
/// <param name="Back">From the tip to the lower end of its back.</param>
/// <param name="Index">Counted from the left end of the outline; says how the tooth leans.</param>
public readonly record struct Tip(double X, Point Face, Point Back, int Index);

/// <summary>The toothed edge from left to right, overrunning the window on both sides.</summary>
/// <param name="Path">SVG path, open.</param>
/// <param name="Left">Where it starts.</param>
/// <param name="Right">Where it ends.</param>
/// <param name="Tips">All tips that have both flanks on the outline.</param>
public sealed record Profile(string Path, double Left, double Right, IReadOnlyList<Tip> Tips)
{
    /// <summary>Draws the edge with the tips on y0, from three pitches left of x0 to one right of x1.</summary>
    public static Profile Of(ToothSpec blade, double depth, double x0, double x1, double y0)
    {
        var coarsest = blade.Pitches.Max();
        var left = x0 - 3 * coarsest;
        var x = left;
        var path = new StringBuilder("M").Append(Svg.At(x, y0));
        var tips = new List<Tip>();
        Point? back = null;
        var count = 0;
        for (var i = 0; x < x1 + coarsest; i++)
        {
            var pitch = blade.Pitches[i % blade.Pitches.Count];
            var gap = Gap.Of(pitch, depth * pitch / coarsest, blade.Form, blade.Hook);
            var here = new Point(x, y0);
            var r = Svg.N(gap.Radius);
            path.Append('L').Append(Svg.At(here + gap.Foot)).Append('A').Append(r).Append(' ').Append(r).Append(" 0 0 0 ").Append(Svg.At(here + gap.ArcEnd));
            if (blade.Form == ToothForm.Skip)
            {
                path.Append('L').Append(Svg.At(here + gap.FloorEnd)).Append('Q').Append(Svg.At(here + gap.Knee)).Append(' ').Append(Svg.At(here + gap.Back));
            }

            path.Append('L').Append(Svg.At(x + pitch, y0));
            if (back is { } b)
            {
                tips.Add(new(x, gap.Foot, b, count++));
            }

            back = gap.Back - new Point(pitch, 0);
            x += pitch;
        }

        return new(path.ToString(), left, x, tips);
    }
}

/// <summary>Pieces drawn on single teeth.</summary>
public static class ToothMarks
{
    /// <summary>The hard tip: a parallelogram from the tip, 0.34 of the depth down the face, 0.16 pitch along the back.</summary>
    public static string Carbide(Tip tip, double y0, double depth, double firstPitch)
    {
        var down = 0.34 * depth / tip.Face.Length * tip.Face;
        var along = 0.16 * firstPitch / tip.Back.Length * tip.Back;
        return $"M{Svg.At(tip.X, y0)}l{Svg.At(down)}l{Svg.At(along)}L{Svg.At(tip.X + along.X, y0 + along.Y)}Z";
    }

    /// <summary>The part of a tooth that is set away from the beholder: its upper 0.55 of the depth.</summary>
    public static string Away(Tip tip, double y0, double depth)
    {
        var face = 1 / tip.Face.Length * tip.Face;
        var back = 1 / tip.Back.Length * tip.Back;
        var a = Math.Min(0.55 * depth / face.Y, tip.Face.Length);
        var h = a * face.Y;
        var c = back.Y > 0.05 ? h / back.Y : 1;
        return $"M{Svg.At(tip.X, y0)}l{Svg.At(a * face)}L{Svg.At(tip.X + c * back.X, y0 + c * back.Y)}Z";
    }

    /// <summary>Whether this tooth leans away: every second one, or every third where one stays straight.</summary>
    public static bool IsAway(SetPattern pattern, int index) => pattern switch
    {
        SetPattern.Alternate => index % 2 == 1,
        SetPattern.Raker => index % 3 == 1,
        _ => false,
    };
}
