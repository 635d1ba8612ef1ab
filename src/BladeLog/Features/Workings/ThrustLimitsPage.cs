using BladeLog.Advice;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>How hard the wood may push.</summary>
internal static class ThrustLimitsPage
{
    public const string Path = "/workings/thrust-limits";

    public static WorkingModel Of(AskForm form, WorkingCase from)
    {
        AdviceSettings settings = from.Settings;
        BladeBody? body = from.Blade?.Body;
        SawSetup? setup = from.Saw?.Setup;
        BladeTension? tensioned = from.Tension;
        double? w = form.Length("width", "Width over the teeth", Fields.BladeWidth, Given.Of(body?.Width, 25e-3));
        double? t = form.Length("thickness", "Thickness", Fields.Thickness, Given.Of(body?.Thickness, 0.9e-3));
        double? g = form.Length("gullet", "Gullet depth", Fields.GulletDepth, Given.Of(body?.Gullet, 5e-3));
        double? tension = form.Stress("tension", $"{Said.Capital(form.Units.PullName)} on the body, running", Given.Of(tensioned?.Stress ?? (body is null ? null : settings.Tension(body.Steel)), 100e6));
        double? H = form.Length("height", "Height of the wood along the blade", Fields.CutHeight, Given.Of(from.Cut?.HeightM ?? (setup is null ? null : Sharpness.Reference(setup, settings).DepthM), from.Cut is null ? "depth for metres left" : "of the cut", 0.150));
        double? below = form.Length("below", "Lower guide under the wood", Fields.CutHeight, Given.Of(setup?.LowerGuideM, "as the saw is set up", 0.040));
        double? above = form.Length("above", "Upper guide over the wood", Fields.CutHeight, Given.Of(setup?.ClearanceM, "as the saw is set up", 0.010));
        TensionSystem system = form.Choose("system", "Wheel held by", setup?.TensionSystem ?? TensionSystem.Sprung, setup is null ? "example" : "as the saw is set up",
            (TensionSystem.Sprung, "sprung", "spring, weight, air or oil"), (TensionSystem.Locked, "locked", "a locked screw"));
        double? v = form.BandSpeed("speed", "Band speed", from.Speed(15));
        Sure sure = form.Choose("sure", $"The {form.Units.PullName} is", tensioned?.Guessed == true ? Sure.Guessed : Sure.Measured, tensioned is null ? "example" : "as recorded",
            (Sure.Measured, "measured", "measured or set to a target"), (Sure.Guessed, "guessed", "only guessed"));

        Shown shown = new(form.Units);
        string title = "How hard may the wood push?";
        List<BecauseLine> lines = [];
        List<CurveFigure> curves = [];
        if (w is { } over && g is { } deep && deep >= over)
        {
            form.Refuse("gullet", $"A gullet {shown.SmallText(deep)} deep leaves no body in a blade {shown.SmallText(over)} wide.");
            g = null;
        }
        else if (w is { } wide && g is { } gul && t is { } thick && thick >= wide - gul)
        {
            form.Refuse("thickness", $"A band {shown.SmallText(thick, 2)} thick is not a band on a body {shown.SmallText(wide - gul)} wide. Check thickness, width and gullet.");
            t = null;
        }

        if (below is { } lo && above is { } hi && H is { } high)
        {
            double span = Math.Max(lo + high + hi, setup?.GuideSpanLeastM ?? 0);
            lines.Add(Line("Span between the guides", shown.SmallText(span, 0), span > lo + high + hi ? "as close as the guides of this saw come" : "lower guide under the wood, height, upper guide over the wood", "derived", Provenance.Derived));
            if (w is { } W && t is { } T && g is { } G && tension is { } pull && v is { } speed)
            {
                GuidedBand band = new()
                {
                    Width = new Length(W),
                    Thickness = new Length(T),
                    GulletDepth = new Length(G),
                    Tension = new Stress(pull),
                    GuideSpan = new Length(span),
                    CutHeight = new Length(high),
                    CutCentre = new Length(lo + (high / 2)),
                    Steel = settings.Steel,
                    BandSpeed = new Speed(speed),
                    System = system,
                };
                double front = settings[sure == Sure.Guessed ? BladeSettings.FrontEdgeGuessed : BladeSettings.FrontEdge];
                if (form.Try(() => Limits(band, front, settings)) is { } limits)
                {
                    title = $"{shown.ForceText(limits.Allowed.Newtons)} in all, over every tooth in the cut";
                    lines.AddRange(Lines(band, limits, front, shown, settings));
                    curves.Add(OfGuide(band, limits, front, hi, shown, settings));
                    curves.Add(OfTension(band, limits, front, shown, settings, form.Units.PullName));
                }
            }
        }

        return WorkingModel.Of(Path, "Push a blade stands", title, form, from) with
        {
            Stopped = from.Blade?.File.Hold is null ? null : $"{from.Blade.File.Blade.Tag} is on hold: it cuts nothing until it is cleared.",
            Lines = lines,
            Curves = curves,
            Range =
            [
                "A straight, whole, evenly tensioned band held at both guides, pushed evenly over the height of the wood; the wall of the kerf does not help.",
                "The plate value rules from 40 mm of width on.",
                "Guides that hold the back; where the back bearing stands away from the side guides the blade stands a half to a third.",
                "The front edge may go slack before anything else happens: that is the comfortable limit. Half the buckling push is where to stop.",
            ],
            Leads = from is { Blade: { } on, Saw: { } saw } ? WorkedOut.Rows(from.Choice is { } choice ? WorkedOut.Cut(choice) : null, WorkedOut.Tension(on, saw, from.Advice.Words)) : [],
            Cautions = [$"{Said.Capital(form.Units.PullName)} is the worst-known figure here: a fifth less is about a fifth less push."],
        };
    }

    private enum Sure
    {
        Measured,
        Guessed,
    }

    private static ThrustLimits Limits(GuidedBand band, double front, AdviceSettings settings) =>
        ThrustLimit.Of(band, PlateUse.WideBandsOnly, front, settings[BladeSettings.Buckling]);

    private static IEnumerable<BecauseLine> Lines(GuidedBand band, ThrustLimits limits, double front, Shown shown, AdviceSettings settings)
    {
        double two = settings[BladeSettings.Buckling];
        yield return Line("Front edge goes slack at", shown.ForceText(limits.FrontEdge.Newtons), "tension on the body against the bending of the band in its own plane, as a beam held by its own pull", "derived", Provenance.Derived);
        yield return Line("Twists away at, as a beam", shown.ForceText(limits.BeamBuckling.Newtons), "least push at which lying over and twisting together stay up by themselves", "timoshenko-gere", Provenance.Derived);
        if (limits.PlateBuckling is { } plate)
        {
            yield return Line("Twists away at, as a plate", shown.ForceText(plate.Newtons), "the same with the band free to bend across its width", "lengoc-1990", Provenance.Derived);
        }

        yield return Line("Allowed", shown.ForceText(limits.Allowed.Newtons), $"the smaller of the first over {front:0.##} and the buckling push over {two:0.##}", "engineering-default", Provenance.EngineeringDefault);
        yield return Line("Stop at", shown.ForceText(limits.Stop.Newtons), $"the buckling push over {two:0.##}", "engineering-default", Provenance.EngineeringDefault);
        double k0 = TipStiffness.AtPoint(band, new Force(0)).NewtonsPerMillimetre, k = TipStiffness.AtPoint(band, limits.Allowed).NewtonsPerMillimetre;
        yield return Line("Side stiffness at a tooth", $"{shown.StiffText(k0)} unloaded, {shown.StiffText(k)} at the allowed push", "give of the tensioned band sideways and in twist, in the middle of the cut", "lehmann-1993", Provenance.Derived);
        yield return Line("Own notes of the span", $"{Figures.Number(BandFrequency.Lateral(band).Hertz, 0)} Hz sideways, {Figures.Number(BandFrequency.Torsional(band).Hertz, 0)} Hz in twist", "moving band between its guides", "wickert-mote", Provenance.FromMemory);
    }

    private static CurveFigure OfGuide(GuidedBand band, ThrustLimits now, double front, double above, Shown shown, AdviceSettings settings)
    {
        double low = band.GuideSpan.Metres - above, per = shown.Small(1);
        AxisScale x = AxisScale.Even(0, shown.Small(Math.Max(0.3, 2 * above)));
        ThrustLimits At(double v) => Limits(band with { GuideSpan = new Length(low + (v / per)) }, front, settings);
        return new CurveFigure(
            "Push allowed against the upper guide", x, $"guide over the wood, {shown.SmallUnit}", AxisScale.FromNought(1.05 * shown.Force(At(0).Allowed.Newtons)), $"push, {shown.ForceUnit}",
            [new CurveLine("allowed", Points(x, v => shown.Force(At(v).Allowed.Newtons), 40))],
            new CurveHere(shown.Small(above), shown.Force(now.Allowed.Newtons), $"guide {shown.SmallText(above, 0)} up: {shown.ForceText(now.Allowed.Newtons)}"))
        {
            Lesson = "Keep the guide down: every bit of span costs push.",
        };
    }

    private static CurveFigure OfTension(GuidedBand band, ThrustLimits now, double front, Shown shown, AdviceSettings settings, string pull)
    {
        double per = shown.Stress(1), here = band.Tension.Pascals;
        AxisScale x = AxisScale.Even(shown.Stress(0.25 * here), shown.Stress(2 * here));
        ThrustLimits At(double v) => Limits(band with { Tension = new Stress(v / per) }, front, settings);
        IReadOnlyList<Point> Line(Func<ThrustLimits, double> of) => Points(x, v => shown.Force(of(At(v))), 40);
        ThrustLimits most = At(x.To);
        return new CurveFigure(
            $"Push against the {pull}", x, $"{pull}, {shown.StressUnit}", AxisScale.FromNought(1.02 * shown.Force(Math.Max(most.Allowed.Newtons, most.Stop.Newtons))), $"push, {shown.ForceUnit}",
            [new CurveLine("allowed", Line(l => l.Allowed.Newtons)), new CurveLine("stop", Line(l => l.Stop.Newtons))],
            new CurveHere(shown.Stress(here), shown.Force(now.Allowed.Newtons), $"{shown.StressText(here)}: {shown.ForceText(now.Allowed.Newtons)}"));
    }
}
