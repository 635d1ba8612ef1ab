using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Life;

/// <summary>What a blade has run on one saw at one speed.</summary>
/// <param name="SawId">The saw.</param>
/// <param name="SpeedMps">Band speed.</param>
/// <param name="Hours">Running.</param>
/// <param name="Bends">Times each point of the band was bent.</param>
/// <param name="BendingPa">Greatest bending stress: over the smallest wheel.</param>
/// <param name="WheelM">The smallest wheel.</param>
/// <param name="ThicknessToWheel">Thickness of the body over it.</param>
/// <param name="OfAncestor">Run before the blade was cut from its parent.</param>
public sealed record RunOnSaw(int SawId, double SpeedMps, double Hours, double Bends, double BendingPa, double WheelM, double ThicknessToWheel, bool OfAncestor)
{
    public static IReadOnlyList<RunOnSaw> Of(BladeFile file, BladeBody body, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(settings);
        Length t = new(body.Thickness.Value);
        return
        [
            .. file.Exposures
                .GroupBy(e => (e.Setup.SawId, e.SpeedMps, Wheel: e.Setup.Wheels.Min(w => w.DiameterM), e.OfAncestor))
                .Select(g => new RunOnSaw(
                    g.Key.SawId,
                    g.Key.SpeedMps,
                    g.Sum(e => e.Hours),
                    g.Sum(e => e.Hours * LoopCycles.BendsPerHour(e.Setup.Wheels.Count, new Speed(e.SpeedMps), new Length(e.LoopM))),
                    BendingStress.OverWheel(t, new Length(g.Key.Wheel), settings.Steel.YoungsModulus).Pascals,
                    g.Key.Wheel,
                    body.Thickness.Value / g.Key.Wheel,
                    g.Key.OfAncestor))
                .OrderByDescending(r => r.Bends),
        ];
    }
}
