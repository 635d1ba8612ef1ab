using BladeLog.Advice;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;
using static BladeLog.Features.Shown;
using Sharpening = BladeLog.Handbook.Wear.Sharpening;

namespace BladeLog.Features.Workings;

/// <summary>What sharpening takes away: width, and the set of the teeth.</summary>
internal static class GrindingPage
{
    public const string Path = "/workings/grinding";

    /// <summary>Grinds drawn.</summary>
    private const int Most = 30;

    public static WorkingModel Of(AskForm form, WorkingCase from)
    {
        AdviceSettings settings = from.Settings;
        BladeBody? body = from.Blade?.Body;
        BladeFile? file = from.Blade?.File;
        double? fresh = form.Length("new", "Width when new", Fields.BladeWidth, Given.Of(body?.NewWidth, 38e-3));
        double? now = form.Length("width", "Width now", Fields.BladeWidth, Given.Of(body?.Width, 38e-3));
        double? least = form.Length("least", "Least width", Fields.BladeWidth, Given.Of(body?.LeastWidth, settings[BladeSettings.LeastWidth] * 38e-3));
        double? off = form.Length("off", "Width lost in one sharpening", Fields.Bite, Given.Of(from.Blade?.Grind.GrindM, file?.Sharpenings > 0 ? "as this blade has lost so far" : "default, not yours", settings[BladeSettings.Grind] * 1e-3));
        double? allowed = form.Number("most", "Sharpenings its teeth stand", "a number of sharpenings", 0, 200, "", Given.Of(file?.Spec.MostSharpenings, "specification", null), optional: true);
        double? done = form.Number("done", "Sharpenings it has had", "a number of sharpenings", 0, 200, "", Given.Of(file?.Sharpenings, "as recorded", 0));
        TipKind tip = form.Choose("tip", "Tip", body?.Tip ?? TipKind.Set, body is null ? "example" : "specification", (TipKind.Set, "set", "set"), (TipKind.Swaged, "swaged", "swaged"), (TipKind.Tipped, "tipped", "tipped"));
        double? t = form.Length("thickness", "Thickness", Fields.Thickness, Given.Of(body?.Thickness, 0.9e-3));
        double? k = form.Length("kerf", tip == TipKind.Set ? "Kerf when it was last set" : "Kerf", Fields.Kerf, Given.Of(body?.Kerf, 1.62e-3));
        double? bend = tip == TipKind.Set ? form.Length("bend", "Bend of the tooth below its tip", Fields.GulletDepth, new Given(2e-3, "default, not yours")) : null;

        Shown shown = new(form.Units);
        string title = "What does sharpening take away?";
        List<BecauseLine> lines = [];
        List<CurveFigure> curves = [];
        List<string> cautions = [];
        if (k is { } kerf && t is { } thick && kerf <= thick)
        {
            form.Refuse("kerf", $"A kerf of {shown.SmallText(kerf, 2)} leaves no clearance beside a body of {shown.SmallText(thick, 2)}.");
            k = null;
        }

        if (fresh is { } f && least is { } low && low >= f)
        {
            form.Refuse("least", $"The least width must lie under the {Said.Width(f, form.Units)} of the new blade.");
            least = null;
        }

        if (now is { } w && least is { } end && off is { } each)
        {
            double grinds = Sharpening.GrindsLeft(new Length(w), new Length(end), new Length(each));
            double? byTeeth = allowed is { } a && done is { } d ? Math.Max(0, a - d) : null;
            double left = Math.Min(grinds, byTeeth ?? grinds);
            title = left == 0 ? "No sharpening is left" : $"{Said.Count((int)left, "sharpening", "sharpenings")} left, then {(byTeeth < grinds ? "its teeth are spent" : "it is too narrow")}";
            lines.Add(Line("Width left", Said.Width(Math.Max(0, w - end), form.Units), "width now less the least width", "derived", Provenance.Derived));
            lines.Add(Line("Sharpenings left by width", Figures.Number(grinds), "whole times that the width lost in one goes into the width left", "derived", Provenance.Derived));
            if (byTeeth is { } teeth)
            {
                lines.Add(Line("Sharpenings left by teeth", Figures.Number(teeth), "those its teeth stand less those it has had", "derived", Provenance.Derived));
            }

            lines.Add(Line("Width after the next", Said.Width(Sharpening.WidthAfter(new Length(w), 1, new Length(each)).Metres, form.Units), "width now less the width lost in one", "common-practice", Provenance.CommonPractice));
            lines.Add(Line("Least width", Said.Width(end, form.Units), "by default three quarters of the new width; 0.65 on wide mill bands; US law for wide head saws: not under 60 of 100", "common-practice", body?.LeastWidth.Provenance ?? Provenance.CommonPractice));
            curves.Add(OfWidth(w, end, each, shown, form.Units));
        }

        if (k is { } wide && t is { } T && off is { } g)
        {
            Length body0 = new(T), set = Kerf.SetPerSide(new Length(wide), body0);
            if (tip == TipKind.Set && bend is { } h)
            {
                Length below = new(h), gone = new(g);
                double again = Kerf.GrindsToSetting(gone, below);
                lines.Add(Line("Set a side when last set", shown.SmallText(set.Metres, 2), "half of what the kerf is wider than the body", "derived", Provenance.Derived));
                lines.Add(Line("Set a side after one sharpening", shown.SmallText(Kerf.SetAfter(set, 1, gone, below).Metres, 3), "the tooth is bent on a line below its tip: the set falls with what is ground off that height", "derived", Provenance.Derived));
                lines.Add(Line("Set it again at sharpening", Figures.Number(again), "when less than 0.8 of the set is left; the trade says every third at least", "common-practice", Provenance.CommonPractice));
                lines.Add(Line("Set to aim at, a side", $"{shown.SmallText(Kerf.SetToAimAt(body0, hardwood: true, green: false, curves: false).Metres, 2)} in dry hardwood to {shown.SmallText(Kerf.SetToAimAt(body0, hardwood: false, green: true, curves: false).Metres, 2)} in green or resinous softwood and for curves", "0.30 to 0.45 of the body; alternate set cannot pass 0.50", "common-practice", Provenance.CommonPractice));
                if (Kerf.SetTooWide(set, body0, SetPattern.Alternate))
                {
                    cautions.Add("The set is over 0.45 of the body a side: alternate teeth this wide nearly leave a core standing in the kerf.");
                }

                curves.Add(OfSet(set, gone, below, shown));
            }
            else if (tip != TipKind.Set)
            {
                Length dry = Kerf.LeastForTips(body0, green: false), green = Kerf.LeastForTips(body0, green: true);
                lines.Add(Line("Least kerf before the body rubs", $"{shown.SmallText(dry.Metres, 2)} dry, {shown.SmallText(green.Metres, 2)} green", "body and 0.10 mm a side in dry wood, 0.15 mm in green", "engineering-default", Provenance.EngineeringDefault));
                if (wide < dry.Metres)
                {
                    cautions.Add("The tips are ground so narrow that the body rubs.");
                }
            }
        }

        return WorkingModel.Of(Path, "Width and set", title, form, from) with
        {
            Lines = lines,
            Curves = curves,
            Range =
            [
                "Sharpened by grinding face and gullet: the tip goes back, the width with it. A blade filed on the face alone loses less.",
                "Width lost in one sharpening: 0.05 to 0.25 mm, common practice.",
                "How far below the tip a tooth is bent is seldom told: measure it on the blade.",
            ],
            Cautions = cautions,
            Leads = from.Blade is { } on ? WorkedOut.Rows(WorkedOut.Life(on, from.Saw), WorkedOut.Edge(on, from.Saw)) : [],
        };
    }

    private static CurveFigure OfWidth(double now, double least, double off, Shown shown, ShopUnits units)
    {
        double grinds = Math.Clamp(Math.Ceiling((now - least) / off) + 2, 4, Most);
        AxisScale x = AxisScale.Even(0, grinds);
        double top = shown.Small(now), bottom = shown.Small(Math.Min(least, now - (grinds * off)));
        return new CurveFigure(
            "Width against sharpenings from now", x, "sharpenings from now", AxisScale.Even(Math.Max(0, bottom - (0.1 * (top - bottom))), top + (0.15 * (top - bottom))), $"width, {shown.SmallUnit}",
            [
                new CurveLine("width", Points(x, n => shown.Small(Sharpening.WidthAfter(new Length(now), n, new Length(off)).Metres))),
                new CurveLine("least width", Points(x, _ => shown.Small(least), 1)),
            ],
            new CurveHere(0, shown.Small(now), $"now: {Said.Width(now, units)}"));
    }

    private static CurveFigure OfSet(Length set, Length off, Length bend, Shown shown)
    {
        AxisScale x = AxisScale.Even(0, Math.Clamp(Math.Ceiling(bend.Metres / off.Metres), 4, Most));
        return new CurveFigure(
            "Set against sharpenings since it was set", x, "sharpenings since it was set", AxisScale.FromNought(shown.Small(1.15 * set.Metres)), $"set a side, {shown.SmallUnit}",
            [
                new CurveLine("set", Points(x, n => shown.Small(Kerf.SetAfter(set, n, off, bend).Metres))),
                new CurveLine("set it again", Points(x, _ => shown.Small(0.8 * set.Metres), 1)),
            ],
            new CurveHere(0, shown.Small(set.Metres), $"just set: {shown.SmallText(set.Metres, 2)}"));
    }
}
