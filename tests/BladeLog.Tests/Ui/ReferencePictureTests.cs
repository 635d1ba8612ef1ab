using BladeLog.Handbook.Quantities;
using BladeLog.Ui.Pictures;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Tests.Ui;

/// <summary>Look reference geometry: our pictures have the points of the design's own drawing script.</summary>
public class ReferencePictureTests
{
    private static readonly ToothSpec Hook = new(35.4, [12.7], 5.0, ToothForm.Hook, 10, TipKind.Set);
    private static readonly ToothSpec Variable = new(38, [12.7, 11.6, 10.2, 8.6], 4.8, ToothForm.Hook, 10, TipKind.Tipped);
    private static readonly ToothSpec Skip = new(13, [6.35], 2.2, ToothForm.Skip, 0, TipKind.Set);
    private static readonly ToothSpec Regular = new(20, [4.23], 1.7, ToothForm.Regular, 0, TipKind.Set);
    private static readonly GateLimit[] FourLimits = [new("motor", 14.4, 14.4), new("push", 3.4, 3.4), new("blade bends", 5.1, 5.1), new("chip room", 9.3, 9.3)];

    [Fact]
    public void Tooth_strips_have_the_points_of_the_reference()
    {
        SvgCompare.Same(LookReference.HookStrip, Strip(Hook, "mini"));
        SvgCompare.Same(LookReference.VariablePitchStrip, Strip(Variable, "mini"));
        SvgCompare.Same(LookReference.SkipStrip, Strip(Skip, "thumb"));
        SvgCompare.Same(LookReference.RegularStrip, Strip(Regular, "thumb"));
        SvgCompare.Same(LookReference.WideStrip, Strip(Skip, "tall"));
    }

    [Fact]
    public void The_blade_drawing_has_the_points_of_the_reference() =>
        SvgCompare.Same(LookReference.Drawing, Rendered.Html<BladeDrawing>(
            ("Blade", new ToothSpec(20.6, [8.4667], 3.09, ToothForm.Hook, 10, TipKind.Set)), ("Tag", "Q-09"),
            ("NewWidth", 25.0), ("LeastWidth", 18.0), ("NewDepth", 3.18)));

    [Fact]
    public void End_views_have_the_points_of_the_reference()
    {
        SvgCompare.Same(LookReference.SetEnd, End(0.8, 1.4, 3, TipKind.Set));
        SvgCompare.Same(LookReference.SwagedEnd, End(1.0, 2.2, 7, TipKind.Swaged));
    }

    [Fact]
    public void Gates_with_one_edge_per_limit_have_the_points_of_the_reference()
    {
        SvgCompare.Same(LookReference.OpenGate, Gate(0.41, 2.0, FourLimits, true, true));
        SvgCompare.Same(LookReference.RubbingGate, Gate(0.47, 2.3, [new("blade bends", 1.9, 1.9), new("push", 4.0, 4.0)], false, false));
        SvgCompare.Same(LookReference.ShutGate, Gate(0.66, 2.2, [new("blade bends", 0.3, 0.3)], false, true));
    }

    [Fact]
    public void Life_bands_have_the_points_of_the_reference()
    {
        SvgCompare.Same(LookReference.HandbookLife, Life(new(64, 355, 138)));
        SvgCompare.Same(LookReference.TaughtLife, Life(new(14, 24, 9.4, Taught: true)));
        SvgCompare.Same(LookReference.UnknownLife, Life(new(26, 480, 187, Perhaps: 210)));
        SvgCompare.Same(LookReference.OverrunLife, Life(new(400, 352, 137, Perhaps: 500)));
        SvgCompare.Same(LookReference.CompactLife, Life(new(212, 1413, 551.2), compact: true));
        SvgCompare.Same(LookReference.Wear, Rendered.Html<WearLine>(("Share", 0.55), ("Description", "x")));
    }

    [Fact]
    public void Edges_have_the_points_of_the_reference()
    {
        SvgCompare.Same(LookReference.CuttingEdge, Edge(15, 62, EdgeVerdict.Cuts));
        SvgCompare.Same(LookReference.RubbingEdge, Edge(34, 14, EdgeVerdict.Rubs));
    }

    [Fact]
    public void Saws_have_the_points_of_the_reference()
    {
        SvgCompare.Same(LookReference.TiltingSaw, Saw(new(SawKind.TiltingFrame, 900, 5690)));
        SvgCompare.Same(LookReference.BenchSaw, Saw(new(SawKind.TwoWheels, 356, 2667)));
        SvgCompare.Same(LookReference.ThreeWheelSaw, Saw(new(SawKind.ThreeWheels, 205, 1510)));
        SvgCompare.Same(LookReference.MillSaw, Saw(new(SawKind.Mill, 489, 4020)));
        SvgCompare.Same(LookReference.StockSaw, Saw(new(SawKind.TwoWheels, 700, 5080), 200));
    }

    private static string Strip(ToothSpec blade, string size) =>
        Rendered.Html<ToothStrip>(("Blade", blade), ("Tag", "Q-01"), ("Size", size), ("Solid", false));

    private static string End(double body, double kerf, double depth, TipKind tip) =>
        Rendered.Html<EndView>(("Tag", "Q-01"), ("Body", body), ("Kerf", kerf), ("Depth", depth), ("Tip", tip));

    private static string Gate(double noChip, double rubs, GateLimit[] limits, bool full, bool axis) =>
        Rendered.Html<FeedGate>(("Tag", "Q-01"), ("NoChip", noChip), ("Rubs", rubs), ("Limits", limits), ("Full", full), ("Axis", axis));

    private static string Life(LifeFigures life, bool compact = false) => Rendered.Html<LifeBand>(("Life", life), ("Compact", compact));

    private static string Edge(double rounding, double bite, EdgeVerdict verdict) =>
        Rendered.Html<EdgePicture>(("Rounding", rounding), ("Bite", bite), ("Hook", 10.0), ("Verdict", verdict));

    private static string Saw(SawShape saw, double? stock = null) =>
        Rendered.Html<SawElevation>(("Saw", saw), ("Name", "Osprey"), ("Stock", stock));
}
