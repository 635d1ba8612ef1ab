using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui.Pictures.Geometry;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>Feeds against the edge and against the depth.</summary>
internal static class CutCurves
{
    public static IReadOnlyList<CurveFigure> Of(CutCase cut, CutLimitsAt limits, Shown shown)
    {
        CutLimitsAt At(CutCase changed) => CutLimitsAt.Of(changed, limits.Held);
        double r = cut.EdgeRadius.Micrometres, H = cut.CutHeight.Metres, per = shown.Small(1);
        AxisScale edge = AxisScale.Even(5, Math.Max(60, 1.2 * r)), depth = AxisScale.Even(shown.Small(0.2 * H), shown.Small(2 * H));
        CurveFigure byEdge = Figure("Feeds against the edge", edge, "edge radius, µm", x => At(cut with { EdgeRadius = Length.FromMicrometres(x) }), r, Micrometres(cut.EdgeRadius.Metres, 0));
        CurveFigure byDepth = Figure("Feeds against the depth", depth, $"height of the wood, {shown.SmallUnit}", x => At(cut with { CutHeight = new Length(x / per) }), shown.Small(H), shown.SmallText(H, 0));
        return
        [
            byEdge with { Lesson = "The gate closes from both sides as the edge rounds: it must be fed faster to bite, and takes more push and power." },
            byDepth with { Lesson = "The push the blade stands is kept as given; raised guides take some of it away." },
        ];

        CurveFigure Figure(string title, AxisScale x, string name, Func<double, CutLimitsAt> of, double here, string said)
        {
            CutLimitsAt[] sampled = [.. Points(x, v => v, 60).Select(p => of(p.X))];
            IReadOnlyList<Point> Line(Func<CutLimitsAt, double?> feed) =>
                [.. sampled.Select((l, i) => new Point(x.Value(100.0 * i / 60), shown.Feed(feed(l) ?? double.NaN)))];
            List<CurveLine> lines = [new("rubs below", Line(l => l.Rubbing)), new("no chip below", Line(l => l.NoChip)), new("chip room", Line(l => l.ChipRoom))];
            if (limits.Held.PowerW is not null)
            {
                lines.Add(new CurveLine("motor", Line(l => l.Power)));
            }

            if (limits.Held.PushN is not null)
            {
                lines.Add(new CurveLine(limits.Held.PowerFed ? "feeder" : "push", Line(l => l.Push)));
            }

            if (limits.Held.ThrustN is not null)
            {
                lines.Add(new CurveLine("blade bends", Line(l => l.Blade)));
            }

            AxisScale y = AxisScale.Log(shown.Feed(FeedGateGeometry.Low / 60), shown.Feed(FeedGateGeometry.High / 60));
            return new CurveFigure(title, x, name, y, $"feed, {shown.FeedUnit}", lines, new CurveHere(here, null, $"here: {said}"));
        }
    }
}
