using BladeLog.Advice;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>The few minutes a crack takes: the reason why any crack is a hold. Takes no blade of the shop.</summary>
internal static class CrackPage
{
    public const string Path = "/workings/crack";

    public static WorkingModel Of(AskForm form, AdviceSettings settings)
    {
        double? a0 = form.Length("crack", "Crack when it is seen", Fields.CrackLength, Given.Example(1e-3));
        double? b = form.Length("body", "Width of the body", Fields.BladeWidth, Given.Example(11.2e-3));
        double? t = form.Length("thickness", "Thickness", Fields.Thickness, Given.Example(0.64e-3));
        IReadOnlyList<double>? wheels = form.Wheels("wheels", "Wheels, over the tyre", [0.356, 0.356], "example");
        double? v = form.BandSpeed("speed", "Band speed", Given.Example(15));
        double? L = form.Length("loop", "Loop", Fields.Loop, Given.Example(2.36));
        double? tension = form.Stress("tension", $"{Said.Capital(form.Units.PullName)} on the body", Given.Example(100e6));
        CrackSteel steel = form.Choose("steel", "Steel", CrackSteel.Martensitic, "example", (CrackSteel.Martensitic, "hardened", "hardened and tempered"), (CrackSteel.FerriticPearlitic, "soft", "not hardened"));

        Shown shown = new(form.Units);
        string title = "Why is any crack a hold?";
        List<BecauseLine> lines = [];
        List<CurveFigure> curves = [];
        List<string> range = [.. Cracked.Method];
        if (t is { } thick && wheels is { } w && w.Any(d => thick * 20 > d))
        {
            form.Refuse("wheels", $"A band {shown.SmallText(thick, 2)} thick cannot lie on a wheel of {shown.SmallText(w.Min(), 0)}. Check both figures.");
            t = null;
        }

        if (a0 is { } long0 && b is { } wide && long0 >= wide)
        {
            form.Refuse("crack", "The crack must be shorter than the body is wide.");
            a0 = null;
        }

        if (a0 is { } seen && b is { } B && t is { } T && wheels is { } W && v is { } V && L is { } loop && tension is { } pull
            && form.Try(() => Cracked.Case(B, T, W, V, loop, pull, steel, settings)) is { } asked
            && form.Try(() => CrackGrowth.Run(asked, new Length(seen))) is { } run)
        {
            title = Title(run, shown);
            lines.AddRange(Cracked.Lines(asked, run, shown));
            range.AddRange(run.Assumptions);
            CrackRun half = CrackGrowth.Run(asked with { ThroughShare = 0.5 }, new Length(seen));
            lines.Add(Line("If only half the bending worked through the thickness", Cracked.Minutes(half), "the same with the fall of the stress to the middle allowed for", "engineering-default", Provenance.EngineeringDefault));
            curves.Add(Curve(asked, run, shown));
        }

        return WorkingModel.Of(Path, "How fast a crack runs", title, form, null) with
        {
            Lines = lines,
            Curves = curves,
            Range = range,
            Stopped = "Any crack is a hold, at once. This page says why; it gives no cracked blade another minute.",
            Cautions = ["A crack says that the rest is near its end too: look at every other gullet and at the weld."],
        };
    }

    private static string Title(CrackRun run, Shown shown) => run.End switch
    {
        CrackEnd.AtOnce => $"A crack of {shown.SmallText(run.From.Metres)} parts the band at once",
        CrackEnd.DoesNotRun => "So small a crack does not run in dry air; it is a hold all the same",
        _ => $"A crack of {shown.SmallText(run.From.Metres)} parts the band in {Cracked.Minutes(run)}",
    };

    private static CurveFigure Curve(CrackCase asked, CrackRun run, Shown shown)
    {
        double b = asked.BodyWidth.Metres, per = shown.Small(1);
        AxisScale x = AxisScale.Even(shown.Small(0.02 * b), shown.Small(Math.Max(0.4 * b, 1.1 * run.From.Metres)));
        double? At(double v)
        {
            CrackRun r = CrackGrowth.Run(asked, new Length(v / per));
            return r.End is CrackEnd.Parts or CrackEnd.Slack ? r.Minutes : null;
        }

        return new CurveFigure(
            "Minutes of running against the crack seen", x, $"crack, {shown.SmallUnit}", AxisScale.Log(0.1, 1000), "minutes of running",
            [new CurveLine("until the band parts", Points(x, At, 40))],
            new CurveHere(shown.Small(run.From.Metres), run.End is CrackEnd.Parts or CrackEnd.Slack ? run.Minutes : null, shown.SmallText(run.From.Metres)));
    }
}
