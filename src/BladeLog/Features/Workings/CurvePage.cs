using BladeLog.Advice;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>How tight a blade turns.</summary>
internal static class CurvePage
{
    public const string Path = "/workings/curve";

    public static WorkingModel Of(AskForm form, WorkingCase from)
    {
        AdviceSettings settings = from.Settings;
        BladeBody? body = from.Blade?.Body;
        double? w = form.Length("width", "Width over the teeth, now", Fields.BladeWidth, Given.Of(body?.Width, 12.7e-3));
        double? t = form.Length("thickness", "Thickness", Fields.Thickness, Given.Of(body?.Thickness, 0.635e-3));
        double? k = form.Length("kerf", "Kerf", Fields.Kerf, Given.Of(body?.Kerf, 1.1e-3));
        double? wanted = form.Length("radius", "Radius wanted", Fields.CurveRadius, Given.Of(from.Cut?.RadiusM, "of the cut", null), optional: true);
        double a = settings[CutSettings.CurveFactor];

        Shown shown = new(form.Units);
        string title = "How tight a curve does it turn?";
        List<BecauseLine> lines = [];
        List<CurveFigure> curves = [];
        if (w is { } only)
        {
            lines.Add(Line("By the trade's tables, from the width alone", shown.SmallText(CurveRadius.PowerFit(new Length(only)).Metres, 0), "0.584 times width to the power 1.805, in mm, fitted to the tables", "radius-tables", Provenance.CommonPractice));
        }

        if (k is { } kerf && t is { } thick && kerf <= thick)
        {
            form.Refuse("kerf", $"A kerf of {shown.SmallText(kerf, 2)} leaves no play beside a body of {shown.SmallText(thick, 2)}: no curve can be cut.");
            k = null;
        }

        if (w is { } W && t is { } T && k is { } K)
        {
            Length width = new(W), thickness = new(T), slot = new(K);
            double hard = CurveRadius.Hard(width, slot, thickness).Metres, usual = CurveRadius.Usual(width, slot, thickness, a).Metres;
            title = wanted switch
            {
                null => $"Radius {shown.SmallText(usual, 0)}; under {shown.SmallText(hard, 0)} never",
                { } R when R >= usual => $"It turns {shown.SmallText(R, 0)}: its least is {shown.SmallText(usual, 0)}",
                { } R when R >= hard => $"{shown.SmallText(R, 0)} only with relief cuts: its least is {shown.SmallText(usual, 0)}",
                { } R => $"It cannot turn {shown.SmallText(R, 0)}: hard bound {shown.SmallText(hard, 0)}",
            };
            lines.Insert(0, Line("Impossible below", shown.SmallText(hard), "width squared over eight times the play, less half the thickness: the blade lies as a chord in its kerf", "derived", Provenance.Derived));
            lines.Insert(1, Line("Turns without relief cuts", shown.SmallText(usual), $"{a:0.##} times that, as the published tables have it", "radius-tables", settings.ProvenanceOf(CutSettings.CurveFactor)));
            if (wanted is { } radius)
            {
                lines.Add(Line("Widest blade for the radius wanted", shown.SmallText(CurveRadius.WidestBlade(new Length(radius), slot, thickness, a).Metres), "the same solved for the width, at this kerf and thickness", "derived", Provenance.Derived));
            }

            curves.Add(Curve(width, thickness, slot, usual, a, shown));
        }

        return WorkingModel.Of(Path, "Tightest curve", title, form, from) with
        {
            Lines = lines,
            Curves = curves,
            Range =
            [
                "The width now, and the kerf as measured where it is: set wears and the radius grows.",
                "Between the two radii it goes with relief cuts, twist and heavy wear on the sides.",
                "The tables were made for blades of 3 to 32 mm; they lie 1.3 to 1.7 times above the hard bound.",
            ],
            Leads = from is { Blade: { } on, Choice: { } choice } ? WorkedOut.Rows(WorkedOut.Cut(choice), WorkedOut.Grinding(on)) : [],
            Cautions = ["Do not back out of a curve with the saw running fast: it pulls the blade off its wheels."],
        };
    }

    private static CurveFigure Curve(Length width, Length thickness, Length kerf, double usual, double a, Shown shown)
    {
        double t = thickness.Metres, per = shown.Small(1);
        AxisScale x = AxisScale.Even(shown.Small(1.15 * t), shown.Small(Math.Max(2.2 * t, 1.15 * kerf.Metres)));
        double top = Math.Max(3 * CurveRadius.Usual(width, new Length(1.8 * t), thickness, a).Metres, 1.2 * usual);
        return new CurveFigure(
            "Radius against the kerf", x, $"kerf, {shown.SmallUnit}", AxisScale.FromNought(shown.Small(top)), $"radius, {shown.SmallUnit}",
            [
                new CurveLine("turns without relief cuts", Points(x, v => shown.Small(CurveRadius.Usual(width, new Length(v / per), thickness, a).Metres))),
                new CurveLine("impossible below", Points(x, v => shown.Small(CurveRadius.Hard(width, new Length(v / per), thickness).Metres))),
            ],
            new CurveHere(shown.Small(kerf.Metres), shown.Small(usual), $"kerf {shown.SmallText(kerf.Metres, 2)}: {shown.SmallText(usual, 0)}"))
        {
            Lesson = "A thin kerf cannot turn as tightly.",
        };
    }
}
