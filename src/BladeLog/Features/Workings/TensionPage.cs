using BladeLog.Advice;
using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>Tension on the body from what a saw or a shop can measure.</summary>
internal static class TensionPage
{
    public const string Path = "/workings/tension";

    /// <summary>Length over which a stretch is read on a shop's gauge.</summary>
    private const double Gauge = 0.127;

    public static WorkingModel Of(AskForm form, WorkingCase from)
    {
        AdviceSettings settings = from.Settings;
        BladeBody? body = from.Blade?.Body;
        double? t = form.Length("thickness", "Thickness", Fields.Thickness, Given.Of(body?.Thickness, 0.64e-3));
        double? w = form.Length("width", "Width over the teeth", Fields.BladeWidth, Given.Of(body?.Width, 13e-3));
        double? g = form.Length("gullet", "Gullet depth", Fields.GulletDepth, Given.Of(body?.Gullet, 1.8e-3));
        double? now = from.Tension?.Stress.Value ?? (body is null ? null : settings.Tension(body.Steel).Value);
        double? given = now is { } pa ? pa * body!.Thickness.Value * body.BodyWidth : null;
        TensionMethod method = form.Choose("from", "Known is", TensionMethod.StrandForce, "as the page begins",
            (TensionMethod.StrandForce, "pull", "the pull in one strand"), (TensionMethod.WheelLoad, "load", "the load on the movable wheel"),
            (TensionMethod.Stretch, "stretch", "the stretch of a measured length"), (TensionMethod.Pluck, "note", "the note of a plucked span"));
        double? force = method switch
        {
            TensionMethod.StrandForce => form.Force("pull", "Pull in one strand", Given.Of(given, $"from the {form.Units.PullName} reckoned with", 717)),
            TensionMethod.WheelLoad => form.Force("load", "Load on the movable wheel", Given.Of(2 * given, $"from the {form.Units.PullName} reckoned with", 1434)),
            _ => null,
        };
        double? stretch = method == TensionMethod.Stretch ? form.Length("stretch", "Stretch", Fields.Deflection, Given.Of(now * Gauge / settings.Steel.YoungsModulus.Pascals, $"from the {form.Units.PullName} reckoned with", 0.0635e-3)) : null;
        double? gauge = method == TensionMethod.Stretch ? form.Length("gauge", "Measured over", Fields.Board, Given.Example(Gauge)) : null;
        double? note = method == TensionMethod.Pluck ? form.Number("note", "Note", "a note", 1, 20000, "Hz", Given.Example(90)) : null;
        double? span = method == TensionMethod.Pluck ? form.Length("span", "Free span between the wheels", Fields.Board, Given.Example(0.6)) : null;
        double? most = form.Force("most", "Greatest pull of the saw in one strand", Given.Of(from.Saw?.Setup.StrandForceMostN, "as the saw is set up", null), optional: true);

        Shown shown = new(form.Units);
        string title = $"What {form.Units.PullName} does this give?";
        List<BecauseLine> lines = [];
        List<CurveFigure> curves = [];
        if (w is { } over && g is { } deep && deep >= over)
        {
            form.Refuse("gullet", $"A gullet {shown.SmallText(deep)} deep leaves no body in a blade {shown.SmallText(over)} wide.");
            g = null;
        }

        if (t is { } T && w is { } W && g is { } G)
        {
            Length thick = new(T), b = new(W - G);
            lines.Add(Line("Body that carries it", $"{shown.SmallText(b.Metres)} by {shown.SmallText(T, 2)}", "width less gullet depth, times thickness; the teeth carry nothing", "derived", Provenance.Derived));
            Stress? found = form.Try(() => new Box(method switch
            {
                TensionMethod.StrandForce when force is { } F => Tension.FromStrandForce(new Force(F), thick, b),
                TensionMethod.WheelLoad when force is { } F => Tension.FromWheelLoad(new Force(F), thick, b),
                TensionMethod.Stretch when stretch is { } d && gauge is { } l => Tension.FromStretch(new Length(d), new Length(l), settings.Steel.YoungsModulus),
                TensionMethod.Pluck when note is { } f && span is { } l => Tension.FromPluck(new Frequency(f), new Length(l), thick, b, new Length(G), settings.Steel),
                _ => null,
            }))?.Value;
            if (found is { } tension)
            {
                TensionReading reading = TensionReading.Of(tension, method);
                double strand = Tension.StrandForce(tension, thick, b).Newtons;
                title = $"{shown.StressText(tension.Pascals)} on the body";
                lines.Add(Line(Said.Capital(form.Units.PullName), shown.StressText(tension.Pascals), How(method), method == TensionMethod.Pluck ? "fletcher-rossing" : "derived", method == TensionMethod.Pluck ? Provenance.FromMemory : Provenance.Derived));
                lines.Add(Line("The true one lies between", $"{shown.StressText(reading.Low.Pascals)} and {shown.StressText(reading.High.Pascals)}", method == TensionMethod.Pluck ? "8 of 100 either way for a plucked note" : "20 of 100 either way", "engineering-default", Provenance.EngineeringDefault));
                lines.Add(Line("Pull in one strand", shown.ForceText(strand), $"{form.Units.PullName} times thickness times width of the body", "derived", Provenance.Derived));
                lines.Add(Line("Load on the movable wheel", shown.ForceText(2 * strand), "two strands pull on it", "derived", Provenance.Derived));
                double reads = tension.Pascals * Gauge / settings.Steel.YoungsModulus.Pascals;
                lines.Add(Line($"Stretch over {shown.SmallText(Gauge, form.Units.Units == UnitSystem.Inch ? 0 : 0)}", form.Units.Units == UnitSystem.Inch ? shown.SmallText(reads, 3) : Micrometres(reads, 0), $"{form.Units.PullName} over the stiffness of the steel, times the length", "derived", Provenance.Derived));
                if (most is { } greatest)
                {
                    double reach = Tension.FromStrandForce(new Force(greatest), thick, b).Pascals;
                    lines.Add(Line("The saw can reach", shown.StressText(reach), "its greatest pull in one strand over the section of the body", "derived", Provenance.Derived));
                    if (strand > greatest)
                    {
                        form.Refuse(method == TensionMethod.StrandForce ? "pull" : "most", $"That is {shown.ForceText(strand)} in one strand; the saw pulls at most {shown.ForceText(greatest)}.");
                    }
                }

                curves.Add(Curve(T, b, strand, tension.Pascals, shown, form.Units.PullName));
            }
        }

        return WorkingModel.Of(Path, Said.Capital(form.Units.PullName), title, form, from) with
        {
            Lines = lines,
            Curves = curves,
            Range =
            [
                "Of one strand, on the section of the body. A gauge that says less for the same pull may divide by the full width.",
                "A stretch counts from where the slack has just gone. The frame and the tyre give way too, so wheel travel reads high.",
                "A plucked span is at least 150 mm long, free of guides, with the saw off and isolated.",
            ],
            Leads = from is { Blade: { } on, Saw: { } saw } ? WorkedOut.Rows(WorkedOut.Life(on, saw), WorkedOut.Push(on, saw)) : [],
            Cautions = [$"Do not exceed the {form.Units.PullName} the saw's maker states."],
        };
    }

    private static string How(TensionMethod method) => method switch
    {
        TensionMethod.StrandForce => "pull over thickness times width of the body",
        TensionMethod.WheelLoad => "half the load over thickness times width of the body",
        TensionMethod.Stretch => "stiffness of the steel times stretch over the measured length",
        _ => "mass of the band times twice span times note, squared, less the share of its own stiffness",
    };

    private static CurveFigure Curve(double t, Length body, double strand, double pascals, Shown shown, string pull)
    {
        AxisScale x = AxisScale.Even(shown.Small(0.5 * t), shown.Small(2 * t));
        double per = shown.Small(1);
        return new CurveFigure(
            "The same scale mark on other blades", x, $"thickness, {shown.SmallUnit}", AxisScale.FromNought(shown.Stress(2.1 * pascals)), $"{pull}, {shown.StressUnit}",
            [new CurveLine($"{pull} at this pull", Points(x, v => shown.Stress(Tension.FromStrandForce(new Force(strand), new Length(v / per), body).Pascals)))],
            new CurveHere(shown.Small(t), shown.Stress(pascals), $"{shown.SmallText(t, 2)}: {shown.StressText(pascals)}"))
        {
            Lesson = "A thicker blade of the same width gets less from the same pull.",
        };
    }

    private sealed record Box(Stress? Value);
}
