using System.Globalization;
using BladeLog.Advice;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Forms;

namespace BladeLog.Features.Cautions;

/// <summary>The minutes a crack of a millimetre leaves in one case, and what they rest on.</summary>
/// <param name="Says">The answer.</param>
/// <param name="Whose">Whose figures it was reckoned with.</param>
/// <param name="Lines">Each figure of it.</param>
/// <param name="Rests">Its assumptions.</param>
/// <param name="Working">The same case as a working.</param>
public sealed record CrackExample(string Says, string Whose, IReadOnlyList<BecauseLine> Lines, IReadOnlyList<string> Rests, Worked Working)
{
    private const double Seen = 1e-3;

    /// <summary>Of the sections that run in the shop now the one in which a crack leaves least time; with nothing on a saw, a common blade.</summary>
    internal static CrackExample Of(ShopAdvice advice, ShopUnits units)
    {
        Section[] running = [.. advice.Now.Saws.Where(s => s.Saw.Active).Select(s => Section.Of(s, advice)).OfType<Section>()];
        Section common = new(null, 11.2e-3, 0.64e-3, [0.356, 0.356], 15, 2.36, 100e6);
        (Section section, CrackCase asked, CrackRun run) = running.Append(common)
            .Select(s => (s, Asked: s.Case(advice.Settings)))
            .Select(x => (x.s, x.Asked, Run: CrackGrowth.Run(x.Asked, new Length(Seen))))
            .Where(x => x.s.Saw is not null || running.Length == 0)
            .OrderBy(x => x.Run.End == CrackEnd.DoesNotRun).ThenBy(x => x.Run.Minutes).First();
        Shown shown = new(units);
        string says = run.End switch
        {
            CrackEnd.AtOnce => $"A crack of {shown.SmallText(Seen)} parts such a blade at once.",
            CrackEnd.DoesNotRun => $"A crack of {shown.SmallText(Seen)} does not run in such a blade in dry air; it is a hold all the same.",
            _ => $"A crack of {shown.SmallText(Seen)} parts such a blade in {Cracked.Minutes(run)}.",
        };
        string body = $"a body {shown.SmallText(section.BodyM)} by {shown.SmallText(section.ThicknessM, 2)} over wheels of {shown.SmallText(section.Wheels.Min(), 0)} at {units.ShowBandSpeed(new Speed(section.SpeedMps))}";
        return new CrackExample(
            says,
            section.Saw is { } saw ? $"Reckoned for a whole blade of the section that is on {saw} now: {body}. It is told of no blade that may be cracked." : $"Reckoned for a common blade: {body}. No blade is on a saw here.",
            [.. Cracked.Lines(asked, run, shown)],
            [.. Cracked.Method, .. run.Assumptions],
            new Worked("How few minutes a crack leaves", "the same case with its curve, to change", section.Href()));
    }

    /// <summary>A blade's section on its saw, in figures short enough for an address.</summary>
    private sealed record Section(string? Saw, double BodyM, double ThicknessM, IReadOnlyList<double> Wheels, double SpeedMps, double LoopM, double TensionPa)
    {
        public static Section? Of(SawNow saw, ShopAdvice advice)
        {
            if (advice.Now.Blades.FirstOrDefault(b => b.Blade.Id == saw.MountedBladeId) is not { Hold: null } file)
            {
                return null;
            }

            BladeAdvice blade = advice.On(file, saw);
            return new Section(
                saw.Saw.Name,
                Math.Round(blade.Body.BodyWidth, 4),
                Math.Round(blade.Body.Thickness.Value, 6),
                [.. saw.Setup.Wheels.OrderBy(w => w.Position).Select(w => Math.Round(w.DiameterM, 4))],
                Math.Round(saw.Setup.UsualSpeedMps, 2),
                Math.Round(file.LoopM ?? saw.Setup.LoopM, 3),
                1e6 * Math.Round((blade.Record.Tension?.Stress.Value ?? advice.Settings.Tension(blade.Body.Steel).Value) / 1e6));
        }

        public CrackCase Case(AdviceSettings settings) => Cracked.Case(BodyM, ThicknessM, Wheels, SpeedMps, LoopM, TensionPa, CrackSteel.Martensitic, settings);

        public string Href()
        {
            static string Mm(double m) => (m * 1e3).ToString("0.###", CultureInfo.InvariantCulture) + " mm";
            (string Name, string Value)[] fields =
            [
                ("crack", Mm(Seen)), ("body", Mm(BodyM)), ("thickness", Mm(ThicknessM)), ("wheels", string.Join("; ", Wheels.Select(Mm))),
                ("speed", SpeedMps.ToString("0.##", CultureInfo.InvariantCulture) + " m/s"), ("loop", Mm(LoopM)), ("tension", (TensionPa / 1e6).ToString("0", CultureInfo.InvariantCulture) + " MPa"),
            ];
            return "/workings/crack?" + string.Join('&', fields.Select(f => $"{f.Name}={Uri.EscapeDataString(f.Value)}"));
        }
    }
}
