using BladeLog.Advice;
using BladeLog.Handbook.Band;
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
        List<string> range =
        [
            "Linear elastic fracture mechanics and the law of Paris: growth for each bend is a constant times the range of the stress intensity to a power.",
            "The shape factor of an edge crack, the constants of Paris and the share of bending are from memory, not checked against the book.",
        ];
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
            && form.Try(() => Case(B, T, W, V, loop, pull, steel, settings)) is { } asked
            && form.Try(() => CrackGrowth.Run(asked, new Length(seen))) is { } run)
        {
            title = Title(run, shown);
            lines.AddRange(Lines(asked, run, shown));
            range.AddRange(run.Assumptions);
            CrackRun half = CrackGrowth.Run(asked with { ThroughShare = 0.5 }, new Length(seen));
            lines.Add(Line("If only half the bending worked through the thickness", Minutes(half), "the same with the fall of the stress to the middle allowed for", "engineering-default", Provenance.EngineeringDefault));
            curves.Add(Curve(asked, run, shown));
        }

        return new WorkingModel
        {
            Path = Path,
            Name = "How fast a crack runs",
            Title = title,
            Fields = form.Fields,
            Picks = [],
            Problems = form.Problems,
            Example = form.Example,
            Lines = lines,
            Curves = curves,
            Range = range,
            Stopped = "Any crack is a hold, at once. This page says why; it gives no cracked blade another minute.",
            Cautions = ["A crack says that the rest is near its end too: look at every other gullet and at the weld."],
        };
    }

    private static CrackCase Case(double body, double thickness, IReadOnlyList<double> wheels, double speed, double loop, double tension, CrackSteel steel, AdviceSettings settings) => new()
    {
        BodyWidth = new Length(body),
        Bending = [.. wheels.Select(d => BendingStress.OverWheel(new Length(thickness), new Length(d), settings.Steel.YoungsModulus))],
        RunningTension = Tension.Running(new Stress(tension), Tension.Support(TensionSystem.Sprung), settings.Steel.Density, new Speed(speed)),
        BandSpeed = new Speed(speed),
        Loop = new Length(loop),
        Material = steel,
    };

    private static string Title(CrackRun run, Shown shown) => run.End switch
    {
        CrackEnd.AtOnce => $"A crack of {shown.SmallText(run.From.Metres)} parts the band at once",
        CrackEnd.DoesNotRun => "So small a crack does not run in dry air; it is a hold all the same",
        _ => $"A crack of {shown.SmallText(run.From.Metres)} parts the band in {Minutes(run)}",
    };

    private static string Minutes(CrackRun run) => run.End switch
    {
        CrackEnd.AtOnce => "no time",
        CrackEnd.DoesNotRun => "none reckoned",
        _ when run.Minutes < 1 => "less than a minute",
        _ when run.Minutes < 120 => $"about {Figures.Number(run.Minutes, 0)} min of running",
        _ => $"about {Figures.Number(run.Minutes / 60, run.Minutes < 570 ? 1 : 0)} h of running",
    };

    private static IEnumerable<BecauseLine> Lines(CrackCase asked, CrackRun run, Shown shown)
    {
        yield return Line("Bending stress", shown.StressText(asked.Bending.Max(s => s.Pascals)), "stiffness of the steel times thickness over wheel and thickness, smallest wheel", "derived", Provenance.Derived);
        yield return Line("Running tension", shown.StressText(asked.RunningTension.Pascals), "tension at rest and density times speed squared", "mote-1965", Provenance.FromMemory);
        yield return Line("Range of the stress intensity at first", Figures.With(Figures.Number(run.FirstRange.MegapascalRootMetres, 1), "MPa√m"), "shape factor times bending stress times root of pi and length", "tada", Provenance.FromMemory);
        yield return Line("Length at which the band parts", shown.SmallText(run.To.Metres), $"where tension and bending together reach {Figures.Number(asked.Toughness.MegapascalRootMetres, 0)} MPa√m", "engineering-default", Provenance.EngineeringDefault);
        if (run.End is CrackEnd.Parts or CrackEnd.Slack)
        {
            yield return Line("Bends until then", Figures.Number(Math.Round(run.Bends, 0)), "growth for each bend, summed over the wheels", "barsom-rolfe", Provenance.FromMemory);
            yield return Line("Running until then", Minutes(run), "bends over bends an hour", "barsom-rolfe", Provenance.FromMemory);
        }
    }

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
