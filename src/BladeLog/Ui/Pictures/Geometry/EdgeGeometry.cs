namespace BladeLog.Ui.Pictures.Geometry;

public enum EdgeVerdict
{
    Cuts,
    Rubs,
    NoChip,
}

/// <summary>The tip's corner with its rounding against the bite: 1.9 px per micrometre, window 480 by 230, cut plane at 186.</summary>
public sealed record EdgeGeometry(
    string Wood, IReadOnlyList<string> Grain, string WoodLine, string Steel, Point Centre, double Radius,
    IReadOnlyList<string> Dimensions, string Arrows, double BiteLabelY, string RoundingLeader)
{
    public const double Width = 480;
    public const double Height = 230;
    public const double LabelRight = 396;
    public const double LabelLeft = 84;
    private const double Scale = 1.9;
    private const double Plane = 186;
    private const double Contact = 215;
    private const double BiteAt = 372;

    /// <summary>Rounding and bite in micrometres, hook and clearance in degrees.</summary>
    public static EdgeGeometry Of(double rounding, double bite, double hook, double clearance = 12)
    {
        if (!(rounding >= 0) || !(bite >= 0) || hook is not (> -45 and < 45) || clearance is not (> 0 and < 60))
        {
            throw new ArgumentOutOfRangeException(nameof(rounding), "A tip needs a rounding, a bite, a hook and a clearance that a tooth can have.");
        }

        // Larger ones are drawn at the window's limit; the figure tells the rest.
        var r = Math.Min(rounding, 40) * Scale;
        var c = Math.Min(bite, 75) * Scale;
        var g = double.DegreesToRadians(hook);
        var a = double.DegreesToRadians(clearance);
        var centre = new Point(Contact, Plane - r);
        var face = centre + r * new Point(Math.Cos(g), -Math.Sin(g));
        var flank = centre + r * new Point(-Math.Sin(a), Math.Cos(a));
        var top = face - (face.Y + 20) / Math.Cos(g) * new Point(Math.Sin(g), Math.Cos(g));
        var rear = flank - 260 * new Point(Math.Cos(a), Math.Sin(a));

        var surface = Plane - c;
        var meets = surface < face.Y
            ? face.X - (face.Y - surface) * Math.Tan(g)
            : centre.X + Math.Sqrt(Math.Max(0, r * r - (r - c) * (r - c)));
        var grain = new List<string>();
        for (var k = 1; k < 16 && surface + k * 13 <= Height - 4; k++)
        {
            var y = surface + k * 13;
            grain.Add($"M{Svg.N(y > Plane + 2 ? 0 : meets + 6)} {Svg.N(y)}H{Svg.N(Width)}");
        }

        var wide = c > 30;
        var s = Svg.N(surface);
        var elbow = centre + r * new Point(-0.5, -0.866);
        var bend = elbow.X - Math.Max(0, elbow.Y - 54) * 0.577;
        var knee = bend > 168 ? $"L{Svg.N(bend)} 54" : "L168 54";
        List<string> dims = [$"M{Svg.N(BiteAt - 24)} {Svg.N(Plane)}H{Svg.N(BiteAt + 24)}M{Svg.N(BiteAt)} {Svg.N(Plane)}V{s}"];
        if (!wide)
        {
            dims.Add($"M{Svg.N(BiteAt)} {s}v-24M{Svg.N(BiteAt)} {Svg.N(Plane)}v24");
        }

        return new(
            $"M0 {Svg.N(Plane)}H{Svg.N(Contact)}L{Svg.At(meets, surface)}H{Svg.N(Width)}V{Svg.N(Height)}H0Z",
            grain,
            $"M0 {Svg.N(Plane)}H{Svg.N(Contact)}M{Svg.At(meets, surface)}H{Svg.N(Width)}",
            $"M{Svg.At(top)}L{Svg.At(face)}A{Svg.N(r)} {Svg.N(r)} 0 0 1 {Svg.At(flank)}L{Svg.At(rear)}L-10 {Svg.N(rear.Y - 60)}V-20Z",
            centre, r, dims,
            wide ? $"M{Svg.N(BiteAt)} {s}l-4 11h8zM{Svg.N(BiteAt)} {Svg.N(Plane)}l-4 -11h8z"
                // Too thin for heads inside: they stand outside and point at the two planes.
                : $"M{Svg.N(BiteAt)} {s}l-4 -11h8zM{Svg.N(BiteAt)} {Svg.N(Plane)}l-4 11h8z",
            wide ? surface - 14 : surface - 34,
            $"M{Svg.At(centre)}L{Svg.At(elbow)}{knee}H{Svg.N(LabelLeft)}");
    }
}
