using BladeLog.Advice;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>Life of a band on its wheels.</summary>
internal static class BandLifePage
{
    public const string Path = "/workings/band-life";

    private const double Least = 1e4;
    private const double Most = 1e8;

    public static WorkingModel Of(AskForm form, WorkingCase from)
    {
        AdviceSettings settings = from.Settings;
        BladeBody? body = from.Blade?.Body;
        var setup = from.Saw?.Setup;
        double? t = form.Length("thickness", "Thickness", Fields.Thickness, Given.Of(body?.Thickness, 0.64e-3));
        IReadOnlyList<double>? wheels = form.Wheels("wheels", "Wheels, over the tyre", setup is null ? [0.356, 0.356] : [.. setup.Wheels.OrderBy(w => w.Position).Select(w => w.DiameterM)], setup is null ? "example" : "as the saw is set up");
        double? v = form.BandSpeed("speed", "Band speed", Given.Of(setup?.UsualSpeedMps, "usual speed of the saw", 15));
        double? L = form.Length("loop", "Loop", Fields.Loop, Given.Of(from.Blade?.File.LoopM ?? setup?.LoopM, "of the blade", 2.36));
        double? tension = form.Stress("tension", $"{Said.Capital(form.Units.PullName)} on the body", Given.Of(from.Tension?.Stress ?? (body is null ? null : settings.Tension(body.Steel)), 100e6));
        double? hrc = form.Number("hrc", "Hardness of the body", "a hardness", 20, 58, "HRC", Given.Of(body?.Hrc, 46));
        double? b = form.Length("body", "Width of the body", Fields.BladeWidth, Given.Of(body?.BodyWidth, "width less gullet", null), optional: true);
        WeldQuality weld = form.Choose("weld", "Weld", from.Blade?.File.Weld ?? WeldQuality.Good, body is null ? "example" : "as recorded",
            (WeldQuality.Good, "good", "good: dressed and tempered"), (WeldQuality.Doubtful, "doubtful", "doubtful"), (WeldQuality.Best, "best", "best"));
        TensionSystem system = form.Choose("system", "Wheel held by", setup?.TensionSystem ?? TensionSystem.Sprung, setup is null ? "example" : "as the saw is set up",
            (TensionSystem.Sprung, "sprung", "spring, weight, air or oil"), (TensionSystem.Locked, "locked", "a locked screw"));

        Shown shown = new(form.Units);
        List<BecauseLine> lines = [];
        BandCase? asked = null;
        if (t is { } thick && wheels is { } w && w.Any(d => thick * 20 > d))
        {
            form.Refuse("wheels", $"A band {shown.SmallText(thick, 2)} thick cannot lie on a wheel of {shown.SmallText(w.Min(), 0)}. Check both figures.");
            t = null;
        }

        if (wheels is { } round && L is { } loop && loop < round.Average() * Math.PI)
        {
            form.Refuse("loop", $"A loop of {shown.SmallText(loop, 0)} is shorter than the way round one wheel ({shown.SmallText(round.Average() * Math.PI, 0)}).");
            L = null;
        }

        if (t is { } T && wheels is { } W)
        {
            double D = W.Min();
            form.Try(() =>
            {
                double bending = Handbook.Band.BendingStress.OverWheel(new Length(T), new Length(D), settings.Steel.YoungsModulus).Pascals;
                lines.Add(Line("Bending stress", shown.StressText(bending), "stiffness of the steel times thickness over wheel and thickness, smallest wheel", "derived", Provenance.Derived));
                lines.Add(Line("Thickness to wheel", $"1/{Figures.Number(D / T)}", "1/1,000 is the trade's rule for long life", "common-practice", Provenance.CommonPractice));
                return lines;
            });
        }

        if (wheels is { } n && v is { } speed && L is { } length)
        {
            lines.Add(Line("Bends an hour", Figures.Number(3600 * n.Count * speed / length), "3,600 times wheels times band speed over loop", "derived", Provenance.Derived));
        }

        string title = "How long does a band last on its wheels?";
        List<CurveFigure> curves = [];
        List<string> cautions = ["A planning figure. Look at the blade before use; it cannot see cracks, burns or a bad weld."];
        if (t is { } thickness && wheels is { } wheel && v is { } band && L is { } whole && tension is { } pull && hrc is { } hard)
        {
            asked = new BandCase
            {
                Thickness = new Length(thickness),
                Wheels = [.. wheel.Select(d => new Length(d))],
                BandSpeed = new Speed(band),
                Loop = new Length(whole),
                Tension = new Stress(pull),
                BodyHrc = hard,
                BodyWidth = b is { } width ? new Length(width) : null,
                Weld = weld,
                System = system,
                GulletTensionFactor = settings[BladeSettings.GulletTension],
                GulletBendingFactor = settings[BladeSettings.GulletBending],
                KneeBends = settings[BladeSettings.Knee],
                WeibullShape = settings[LifeSettings.Shape],
                Steel = settings.Steel,
            };
            if (from.Held is null && form.Try(() => BandLife.Of(asked)) is { } life)
            {
                title = Title(life);
                lines.AddRange(BandLifeLines.Of(life, shown, settings));
                lines.AddRange(BandLifeLines.OfRecord(life, from));
                if (life.TakesSet)
                {
                    cautions.Add("This band takes a set on the wheel: tension and bending together pass what the body springs back from.");
                }

                curves.Add(Curve(asked, life, shown, wheelDrawn: false));
                curves.Add(Curve(asked, life, shown, wheelDrawn: true));
            }
        }

        return WorkingModel.Of(Path, "Life of a band", title, form, from) with
        {
            Stopped = from.Held,
            Leads = from is { Blade: { } on, Saw: { } saw } ? WorkedOut.Rows(WorkedOut.Tension(on, saw, from.Advice.Words), WorkedOut.Push(on, saw), WorkedOut.Edge(on, saw), WorkedOut.Grinding(on)) : [],
            Lines = lines,
            Curves = curves,
            Range =
            [
                "Between 10,000 and 100 million bends. Below stands unsuitable, above not limiting, and no hours are told.",
                "Half of such blades have broken at the median. The handbook is trusted within a factor of 3 either way: an engineering default until your own breaks teach it.",
                "The gullet's factors 2.0 on tension and 1.4 on bending and the weld's 0.75, 0.60 or 0.85 are engineering defaults between measured and computed values.",
                "Hardness 20 to 58 HRC. Elastic: tension and bending together under the yield point.",
            ],
            Cautions = cautions,
        };
    }

    private static string Title(BandLifeResult life) => life.Verdict switch
    {
        LifeVerdict.Unsuitable => "Unsuitable: hours or less",
        LifeVerdict.NotLimiting => "Flexing will not end it",
        LifeVerdict.Marginal => $"Marginal: half of such blades broken at {Figures.Hours(life.MedianHours)}{Figures.Glue}h",
        _ => $"Half of such blades broken at {Figures.Hours(life.MedianHours)}{Figures.Glue}h",
    };

    private static CurveFigure Curve(BandCase asked, BandLifeResult life, Shown shown, bool wheelDrawn)
    {
        double now = shown.Small(wheelDrawn ? asked.Wheels.Min(w => w.Metres) : asked.Thickness.Metres);
        double perUnit = shown.Small(1);
        double share = asked.Wheels.Min(w => w.Metres);
        AxisScale x = AxisScale.Even(0.5 * now, 1.6 * now);
        double perHour = life.BendsPerHour;
        BandLifeResult At(double value)
        {
            double si = value / perUnit;
            return BandLife.Of(wheelDrawn
                ? asked with { Wheels = [.. asked.Wheels.Select(w => new Length(w.Metres / share * si))] }
                : asked with { Thickness = new Length(si) });
        }

        AxisScale y = AxisScale.Log(Least / perHour, Most / perHour);
        return new CurveFigure(
            wheelDrawn ? "Life against the wheel" : "Life against the thickness",
            x, $"{(wheelDrawn ? "smallest wheel" : "thickness")}, {shown.SmallUnit}", y, "running hours",
            [
                new CurveLine("half of such blades broken", Points(x, v => At(v).MedianHours)),
                new CurveLine("1 in 10 broken, by scatter alone", Points(x, v => At(v) is var r ? r.TenthPercentileBends / r.BendsPerHour : null)),
            ],
            new CurveHere(now, life.MedianHours, $"{Figures.Number(now, wheelDrawn ? 0 : 2)} {shown.SmallUnit}: {(life.Verdict is LifeVerdict.Marginal or LifeVerdict.Finite ? Figures.Hours(life.MedianHours) + " h" : Title(life).Split(':')[0].ToLowerInvariant())}"))
        {
            Lesson = wheelDrawn
                ? "The axis of hours begins where a blade is unsuitable and ends where flexing no longer ends it. All wheels changed alike, loop and speed kept."
                : "The axis of hours begins where a blade is unsuitable and ends where flexing no longer ends it. Tension kept.",
        };
    }
}
