namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>One limit on the feed, m/min: up to Green it is free, up to Amber with care.</summary>
/// <param name="Name">chip room, motor, push, feeder, blade bends, usual feed, finish.</param>
/// <param name="Green">Free up to here.</param>
/// <param name="Amber">With care up to here; equal to Green where there is no care.</param>
public sealed record GateLimit(string Name, double Green, double Amber);

public enum GateVerdict
{
    /// <summary>Open between the rubbing feed and the least green limit.</summary>
    Fits,

    /// <summary>The least green limit lies below the rubbing feed, the least amber one above it.</summary>
    CareByLimit,

    /// <summary>Every feed that still makes a chip rubs.</summary>
    CareByRubbing,

    /// <summary>No feed makes a chip within the limits.</summary>
    Shut,
}

/// <summary>The gate of feeds that work: one logarithmic axis, 0.1 to 20 m/min, always the same.</summary>
public sealed record FeedGateGeometry(GateVerdict Verdict, double From, double To, AxisPicture Picture)
{
    public const double Low = 0.1;
    public const double High = 20;
    private const int Row = 28;
    private const double ChannelHalf = 10;

    /// <summary>Position of a feed in percent of the axis; what lies outside stands at the end.</summary>
    public static double X(double feed) =>
        feed <= Low ? 0 : Math.Min(100, 100 * Math.Log(feed / Low) / Math.Log(High / Low));

    public static FeedGateGeometry Of(double noChip, double rubs, IReadOnlyList<GateLimit> limits, bool full, bool axis, Drafting? drafting = null)
    {
        var d = drafting ?? Drafting.Metric;
        var green = limits.MinBy(l => l.Green);
        var amber = limits.MinBy(l => l.Amber);
        var g = green?.Green ?? double.PositiveInfinity;
        var a = amber?.Amber ?? double.PositiveInfinity;
        var verdict = g >= rubs ? GateVerdict.Fits
            : a >= rubs ? GateVerdict.CareByLimit
            : a >= noChip ? GateVerdict.CareByRubbing
            : GateVerdict.Shut;
        var uppers = Uppers(verdict, limits, amber, g, a, full, d);
        var lowers = verdict == GateVerdict.Shut ? [("no chip below", noChip)]
            : full ? new[] { ("rubs below", rubs), ("no chip below", noChip) }
            : [("rubs below", rubs)];

        var band = new Band(Math.Max(1, uppers.Count) * Row + 6, full ? 64 : 44);
        var marks = new List<AxisMark>();
        Parts(marks, band, verdict, X(noChip), X(rubs), X(Math.Min(g, High)), X(Math.Min(a, High)));
        UpperLabels(marks, band, uppers, verdict == GateVerdict.Fits ? g : a, a);
        for (var i = 0; i < lowers.Length; i++)
        {
            var (name, feed) = lowers[i];
            var yt = band.Bottom + (i + 1) * Row;
            if (feed == rubs && verdict == GateVerdict.CareByRubbing)
            {
                marks.Add(new Upright("inwall dash", X(feed), band.Top, band.Bottom));
            }

            marks.Add(new Upright("lead", X(feed), band.Bottom, yt - 2));
            marks.Add(new Words(null, X(feed), 7, yt - 4, $"{name} {d.Feed(feed)}"));
        }

        marks.Add(new Bar("bandedge", 0, band.Top, 100, band.Height));
        var ya = band.Bottom + lowers.Length * Row + 12;
        if (axis)
        {
            AxisLine(marks, ya, d);
        }

        var (from, to) = verdict switch
        {
            GateVerdict.Fits => (rubs, g),
            GateVerdict.CareByLimit => (rubs, a),
            GateVerdict.CareByRubbing => (noChip, a),
            _ => (double.NaN, double.NaN),
        };
        return new(verdict, from, to, new(ya + (axis ? 34 : -10), marks));
    }

    /// <summary>The picture in words, for those who do not see it.</summary>
    public static string Describe(string tag, double noChip, double rubs, IReadOnlyList<GateLimit> limits, Drafting? drafting = null)
    {
        var d = drafting ?? Drafting.Metric;
        var gate = Of(noChip, rubs, limits, true, false);
        var ends = gate.Verdict == GateVerdict.Fits ? limits.MinBy(l => l.Green) : limits.MinBy(l => l.Amber);
        var range = gate.Verdict == GateVerdict.Shut ? ""
            : ends is null ? $"from {d.Feed(gate.From)} {d.FeedUnit} on, nothing closes it"
            : $"from {d.Feed(gate.From)} to {d.Feed(gate.To)} {d.FeedUnit}, then {ends.Name} closes it";
        var words = gate.Verdict switch
        {
            GateVerdict.Fits => $"open {range}",
            GateVerdict.CareByLimit => $"with care {range}",
            GateVerdict.CareByRubbing => $"rubbing, with care {range}",
            _ => $"shut, {ends!.Name} closes it at {d.Feed(ends.Amber)} {d.FeedUnit}",
        };
        var care = gate.Verdict == GateVerdict.Fits && limits.MinBy(l => l.Amber) is { } least && least.Amber > gate.To
            ? $", with care to {d.Feed(least.Amber)}" : "";
        var others = limits.Where(l => l != ends).OrderBy(l => l.Green).Select(l => $"; {l.Name} at {d.Feed(l.Green)}");
        return $"Feed gate of {tag}: no chip below {d.Feed(noChip)}, rubs below {d.Feed(rubs)}, {words}{care}{string.Concat(others)}";
    }

    // Rising, so that label i hangs at level i from the top and its text passes above every leader to its right.
    private static List<(string Text, double Feed)> Uppers(
        GateVerdict verdict, IReadOnlyList<GateLimit> limits, GateLimit? amber, double g, double a, bool full, Drafting d)
    {
        List<(string Text, double Feed)> all = [];
        if (verdict == GateVerdict.Fits)
        {
            all.AddRange(limits.Select(l => ($"{l.Name} {Text(l.Green)}", l.Green)));
            if (a > g)
            {
                all.Add(($"with care to {Text(a)}", a));
            }
        }
        else
        {
            all.Add(($"{amber!.Name} {Text(a)}", a));
            all.AddRange(limits.Where(l => l != amber && l.Green > a).Select(l => ($"{l.Name} {Text(l.Green)}", l.Green)));
        }

        var seen = all.Where(l => l.Feed <= High).OrderBy(l => l.Feed).ToList();
        return full ? seen : [.. seen.Take(1)];

        string Text(double feed) => feed <= High ? d.Feed(feed) : "";
    }

    private static void Parts(List<AxisMark> marks, Band band, GateVerdict verdict, double xn, double xr, double xg, double xa)
    {
        void Wall(double from, double to)
        {
            if (to >= from)
            {
                marks.Add(new Bar("wall", from, band.Top, to - from, band.Height));
            }
        }

        void Hatch(double from, double to)
        {
            if (to > from)
            {
                marks.Add(new Bar("rubbase", from, band.Top, to - from, band.Height));
                marks.Add(new Bar("hatched", from, band.Top, to - from, band.Height, "url(#hatch)"));
            }
        }

        Wall(0, Math.Min(xn, xa));
        Wall(xa, 100);
        if (verdict == GateVerdict.Shut)
        {
            Wall(xa, xn);
            marks.Add(new Upright("inwall", xa, band.Top, band.Bottom));
            marks.Add(new Upright("inwall", xn, band.Top, band.Bottom));
            // The word stands right of the second seam, or where there is wall enough on a narrow screen.
            marks.Add(xn <= 64 ? new Words("onwall", xn, 14, band.Middle + 7, "shut")
                : xa >= 36 ? new Words("onwall", xa, -14, band.Middle + 7, "shut", "end")
                : new Words("onwall", (xa + xn) / 2, 0, band.Middle + 7, "shut", "middle"));
            return;
        }

        var start = verdict == GateVerdict.CareByRubbing ? xn : xr;
        var end = verdict == GateVerdict.Fits ? xg : xa;
        if (verdict == GateVerdict.Fits)
        {
            Hatch(xn, xr);
            marks.Add(new Bar("openpart", xr, band.Top, Math.Max(0, xg - xr), band.Height));
            Hatch(xg, xa);
        }
        else
        {
            Hatch(xn, xa);
            marks.Add(new Bar("rubbase", start, band.Middle - ChannelHalf, Math.Max(0, end - start), 2 * ChannelHalf));
        }

        marks.Add(new Level("gap", start, end, band.Middle));
        marks.Add(new Head(start, band.Middle, false));
        marks.Add(new Head(end, band.Middle, true));
        marks.Add(new Upright("jamb", start, band.Top, band.Bottom));
        marks.Add(new Upright("jamb", end, band.Top, band.Bottom));
    }

    private static void UpperLabels(List<AxisMark> marks, Band band, List<(string Text, double Feed)> uppers, double end, double amber)
    {
        for (var i = 0; i < uppers.Count; i++)
        {
            var (text, feed) = uppers[i];
            var yt = 4 + i * Row;
            marks.Add(new Upright("lead", X(feed), yt, band.Top));
            if (feed > amber)
            {
                marks.Add(new Upright("inwall", X(feed), band.Top, band.Bottom));
            }
            else if (feed > end)
            {
                marks.Add(new Upright("seam", X(feed), band.Top, band.Bottom));
            }

            marks.Add(new Words(feed == end ? "gov" : null, X(feed), 7, yt + 18, text));
        }
    }

    private static void AxisLine(List<AxisMark> marks, double y, Drafting d)
    {
        marks.Add(new Level("axis", 0, 100, y));
        foreach (var (words, at, css) in d.Ticks)
        {
            marks.Add(new Upright("axis", X(at), y, y + 7));
            marks.Add(new Words("num" + css, X(at), 0, y + 28, words, at == Low ? "start" : "middle"));
        }

        marks.Add(new Words("num", 100, 16, y + 28, d.FeedUnit));
    }

    private readonly record struct Band(double Top, double Height)
    {
        public double Bottom => Top + Height;

        public double Middle => Top + Height / 2;
    }
}
