using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features;

/// <summary>From what is known of a blade or a saw to what the pictures are given: plain numbers in mm, degrees and hours.</summary>
internal static class Drawn
{
    public static ToothSpec Teeth(BladeBody body, Spec spec)
    {
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(spec);
        double[] pitches = spec.PitchCoarseM == spec.PitchFineM
            ? [spec.PitchCoarseM * 1e3]
            // A variable pitch runs from coarse to fine and back again.
            : [spec.PitchCoarseM * 1e3, spec.PitchMeanM * 1e3, spec.PitchFineM * 1e3, spec.PitchMeanM * 1e3];
        return new ToothSpec(body.Width.Value * 1e3, pitches, body.Gullet.Value * 1e3, body.Form, double.RadiansToDegrees(body.Rake.Value), body.Tip, spec.SetPattern);
    }

    public static SawShape Saw(SawSetup setup)
    {
        ArgumentNullException.ThrowIfNull(setup);
        double[] wheels = [.. setup.Wheels.OrderBy(w => w.Position).Select(w => w.DiameterM * 1e3)];
        SawKind kind = wheels.Length >= 3 ? SawKind.ThreeWheels
            : setup.Takes.HasFlag(Takes.Log) ? SawKind.Mill
            : setup.TiltMostRad > 0 ? SawKind.TiltingFrame
            : SawKind.TwoWheels;
        double? upper = kind != SawKind.ThreeWheels && wheels.Length == 2 && wheels[1] != wheels[0] ? wheels[1] : null;
        return new SawShape(kind, wheels[0], setup.LoopM * 1e3, upper);
    }

    /// <summary>The life band in hours on the saw asked; null where no hours are told: held, not limiting, unsuitable.</summary>
    public static LifeFigures? Life(BladeAdvice blade)
    {
        ArgumentNullException.ThrowIfNull(blade);
        return blade.Life is { MedianHours: { } median, OneInTenHours: { } tenth } life
            ? new LifeFigures(
                (life.UnknownHistory ? life.UsedLow : life.Used.Blade) * median,
                median,
                tenth,
                life.UnknownHistory ? life.UsedHigh * median : null)
            : null;
    }

    /// <summary>What is used of the limit that comes first where flexing does not: grinds, width or edge.</summary>
    public static LimitShare? OtherLimit(BladeAdvice blade)
    {
        ArgumentNullException.ThrowIfNull(blade);
        return blade.Limits.Shares.FirstOrDefault(s => s.Kind != LimitKind.Fatigue);
    }
}
