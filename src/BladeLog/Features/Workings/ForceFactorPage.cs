using System.Globalization;
using BladeLog.Advice;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>The shop's own force factor from what its ammeter shows in a cut that the handbook has reckoned.</summary>
internal static class ForceFactorPage
{
    public const string Path = "/workings/force-factor";

    /// <summary>Eight in ten lie within so many standard deviations.</summary>
    private const double EightInTen = 1.2816;

    public static WorkingModel Of(AskForm form, WorkingCase from)
    {
        AdviceSettings settings = from.Settings;
        SawSetup? setup = from.Saw?.Setup;
        double? feed = form.Feed("feed", "Feed it was read at", from.Choice?.Gate?.AdvisedMps is { } advised ? new Given(advised, "advised for the cut") : Given.Example(2.0 / 60));
        double? reckoned = from.Choice?.Case is { } cut && feed is { } f
            ? form.Try(() => new Box(CuttingForce.CuttingPower(cut with { Model = settings.Force with { FitFactor = 1 } }, new Speed(f)).Watts))?.Watts
            : null;
        double? model = form.Power("power", "Power at the band by the handbook alone", Given.Of(reckoned, "of the cut at that feed, force factor 1", 620));
        double? amps = form.Number("amps", "Ammeter, while it cuts", "a current", 0.1, 2000, "A", from.Any ? Given.None : Given.Example(2.2), optional: true);
        double? volts = form.Number("volts", "Voltage", "a voltage", 50, 1000, "V", Given.Example(400));
        Phases phases = form.Choose("phases", "Supply", Phases.Three, "example", (Phases.Three, "three", "three phases"), (Phases.One, "one", "one phase"));
        double? cos = form.Number("cos", "Power factor under load", "a power factor", 0.2, 1, "", new Given(0.8, "default, not yours: see the motor's plate"));
        double? idle = form.Power("idle", "Power while it idles", Given.Of(setup?.IdleW, "as the saw is set up", setup is null ? 150 : settings[CutSettings.Idle] * setup.MotorW));
        double? drive = form.Number("drive", "Share of the motor's power that reaches the blade", "a share", 0.1, 1, "", new Given(settings[CutSettings.Drive], settings.Known(CutSettings.Drive).From));
        IReadOnlyList<double>? earlier = form.Factors("earlier", "Factors of earlier readings", "may stay empty; with a semicolon between two");

        Shown shown = new(form.Units);
        string title = amps is null ? "What does your ammeter show in this cut?" : "What does your ammeter say of the force?";
        List<BecauseLine> lines = [];
        List<CurveFigure> curves = [];
        List<Worked> leads = [];
        double? own = null;
        if (amps is { } I && volts is { } U && cos is { } phi && form.Try(() => new Box(CuttingForce.FromCurrent(I, U, phi, phases == Phases.Three).Watts)) is { } taken)
        {
            lines.Add(Line("Power the motor takes", shown.Units.Show(new Power(taken.Watts)), phases == Phases.Three ? "root of three times voltage times current times power factor" : "voltage times current times power factor", "derived", Provenance.Derived));
            if (idle is { } still && taken.Watts <= still)
            {
                form.Refuse("amps", $"The motor takes {shown.Units.Show(new Power(taken.Watts))} of it, no more than idling. Read it in the middle of the cut.");
            }
            else if (idle is { } alone && model is { } p && drive is { } share)
            {
                own = form.Try(() => new Box(CuttingForce.FitFactorFrom(new Power(taken.Watts), new Power(alone), new Power(p), share)))?.Watts;
            }
        }

        if (own is { } q && earlier is not null)
        {
            double[] readings = [.. earlier, q];
            ForceFit fit = ForceUncertainty.Learn(readings);
            double low = fit.Median * Math.Exp(-EightInTen * fit.LnSd), high = fit.Median * Math.Exp(EightInTen * fit.LnSd);
            title = $"Force factor {Two(fit.Median)} from {Said.Count(readings.Length, "reading", "readings")}";
            lines.Add(Line("Factor of this reading", Two(q), "power taken less idling, times the share that reaches the blade, over the handbook's power", "derived", Provenance.Yours));
            lines.Add(Line("Factor to reckon with", Two(fit.Median), "all readings together with what was believed before them (1, spread 0.35; a reading's spread 0.15), in logarithms", "derived", Provenance.Derived));
            lines.Add(Line("8 of 10 lie between", $"{Two(low)} and {Two(high)}", "from the spread that is left", "derived", Provenance.EngineeringDefault));
            (double bandLow, double bandHigh) = ForceUncertainty.BandFor(readings.Length);
            lines.Add(Line("Band of force and power", $"×{Two(bandLow)} to ×{Two(bandHigh)}", "0.70 to 1.40 until there are five readings, then 0.87 to 1.15", "engineering-default", Provenance.EngineeringDefault));
            curves.Add(Curve(readings));
            leads.Add(new Worked("Set your own force factor", $"{CutSettings.Fit.Words}: {Two(settings[CutSettings.Fit])} now, {Two(fit.Median)} by these readings", $"/setup/{CutSettings.Fit.Key}", "set"));
            if (readings.Length >= 5)
            {
                leads.Add(new Worked("Set the low end of the force band", $"{Two(settings[CutSettings.LowEnd])} now, 0.87 after five readings", $"/setup/{CutSettings.LowEnd.Key}", "set"));
            }

            leads.Add(new Worked("Next reading", "keeps the factors so far", $"{Path}?earlier={Uri.EscapeDataString(string.Join("; ", readings.Select(Two)))}", "begin"));
        }

        return WorkingModel.Of(Path, "Your own force factor", title, form, from) with
        {
            Lines = lines,
            Curves = curves,
            Leads = leads,
            Range =
            [
                "Read in the middle of a cut whose wood, height, feed, edge and kerf are known, at a steady feed. One line of a three-phase supply is enough.",
                "The small power that throws the chips is left out. At light load the power factor falls and the current reads high: load the saw well.",
                "Readings in several cuts, woods and states of the edge teach more than many in one.",
            ],
            Cautions = ["Only a fixed ammeter or a clamp outside the cabinet. Nobody opens a live cabinet for a reading."],
        };
    }

    private enum Phases
    {
        One,
        Three,
    }

    private static string Two(double v) => v.ToString("0.00", CultureInfo.InvariantCulture);

    /// <summary>How the band narrows with readings like these.</summary>
    private static CurveFigure Curve(double[] readings)
    {
        double mean = Math.Exp(readings.Average(Math.Log));
        ForceFit[] fits = [.. Enumerable.Range(0, 13).Select(n => ForceUncertainty.Learn([.. Enumerable.Range(0, n).Select(i => i < readings.Length ? readings[i] : mean)]))];
        AxisScale x = AxisScale.Even(0, 12);
        IReadOnlyList<Point> Line(double sd) => [.. fits.Select((fit, n) => new Point(n, fit.Median * Math.Exp(sd * fit.LnSd)))];
        ForceFit now = fits[Math.Min(12, readings.Length)];
        return new CurveFigure(
            "Force factor against readings", x, "readings", AxisScale.FromNought(1.1 * fits.Max(fit => fit.Median * Math.Exp(EightInTen * fit.LnSd))), "force factor",
            [new CurveLine("factor to reckon with", Line(0)), new CurveLine("8 of 10 under it and over the next", Line(EightInTen)), new CurveLine("the lower end", Line(-EightInTen))],
            new CurveHere(Math.Min(12, readings.Length), now.Median, $"{Said.Count(readings.Length, "reading", "readings")}: {Two(now.Median)}"))
        {
            Lesson = "Beyond your readings it is drawn as if the next ones were like them.",
        };
    }

    private sealed record Box(double Watts);
}
