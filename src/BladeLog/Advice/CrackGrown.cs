using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>How a crack grew between two looks, by the bends the blade took between them. No life is told from it.</summary>
/// <param name="GrewM">Longer by; below zero where it measured shorter.</param>
/// <param name="Hours">Running between.</param>
/// <param name="Bends">Bends of each point of the band between.</param>
public sealed record CrackGrown(double GrewM, double Hours, double Bends)
{
    /// <summary>Growth for each bend; null where it did not measure longer, or no running is written between.</summary>
    public double? PerBendM => GrewM > 0 && Bends > 0 ? GrewM / Bends : null;

    public static CrackGrown Of(CrackTwice twice, double? loopM)
    {
        ArgumentNullException.ThrowIfNull(twice);
        return new CrackGrown(
            twice.After.LengthM - twice.Before.LengthM,
            twice.Runs.Sum(r => r.Hours),
            twice.Runs.Sum(r => r.Hours * LoopCycles.BendsPerHour(r.Setup.Wheels.Count, new Speed(r.SpeedMps), new Length(loopM ?? r.Setup.LoopM))));
    }
}
