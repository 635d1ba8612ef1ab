using BladeLog.Advice;
using BladeLog.Handbook.Band;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using static BladeLog.Features.Shown;

namespace BladeLog.Features;

/// <summary>How few minutes a crack leaves, worded: the reason why any crack is a hold. Never of a blade that may be cracked.</summary>
internal static class Cracked
{
    /// <summary>What the reckoning rests on.</summary>
    public static IReadOnlyList<string> Method { get; } =
    [
        "Linear elastic fracture mechanics and the law of Paris: growth for each bend is a constant times the range of the stress intensity to a power.",
        "The shape factor of an edge crack, the constants of Paris and the share of bending are from memory, not checked against the book.",
    ];

    public static CrackCase Case(double body, double thickness, IReadOnlyList<double> wheels, double speed, double loop, double tension, CrackSteel steel, AdviceSettings settings) => new()
    {
        BodyWidth = new Length(body),
        Bending = [.. wheels.Select(d => BendingStress.OverWheel(new Length(thickness), new Length(d), settings.Steel.YoungsModulus))],
        RunningTension = Tension.Running(new Stress(tension), Tension.Support(TensionSystem.Sprung), settings.Steel.Density, new Speed(speed)),
        BandSpeed = new Speed(speed),
        Loop = new Length(loop),
        Material = steel,
    };

    public static string Minutes(CrackRun run) => run.End switch
    {
        CrackEnd.AtOnce => "no time",
        CrackEnd.DoesNotRun => "none reckoned",
        _ when run.Minutes < 1 => "less than a minute",
        _ when run.Minutes < 120 => $"about {Figures.Number(run.Minutes, 0)} min of running",
        _ => $"about {Figures.Number(run.Minutes / 60, run.Minutes < 570 ? 1 : 0)} h of running",
    };

    public static IEnumerable<BecauseLine> Lines(CrackCase asked, CrackRun run, Shown shown)
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
}
