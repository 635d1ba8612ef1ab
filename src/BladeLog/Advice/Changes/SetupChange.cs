using BladeLog.Records;

namespace BladeLog.Advice.Changes;

/// <summary>A saw as it might be. Null leaves it as it is. In SI.</summary>
/// <param name="WheelM">Smallest wheel; the others grow alike.</param>
/// <param name="StrandForceMostN">Greatest pull of one strand.</param>
/// <param name="MotorW">Motor.</param>
/// <param name="CutHeightMostM">What it opens to.</param>
/// <param name="ClearanceM">Upper guide above the work.</param>
public sealed record SetupChange(double? WheelM = null, double? StrandForceMostN = null, double? MotorW = null, double? CutHeightMostM = null, double? ClearanceM = null)
{
    public SawNow On(SawNow saw)
    {
        ArgumentNullException.ThrowIfNull(saw);
        return saw with { Setup = On(saw.Setup) };
    }

    /// <summary>A copy with the change; the setup itself is a fact and stays.</summary>
    public SawSetup On(SawSetup setup)
    {
        ArgumentNullException.ThrowIfNull(setup);
        double motor = MotorW ?? setup.MotorW;
        SawSetup copy = new()
        {
            EntryId = setup.EntryId,
            Entry = setup.Entry,
            SawId = setup.SawId,
            Saw = setup.Saw,
            LoopM = setup.LoopM,
            LoopLeastM = setup.LoopLeastM,
            LoopMostM = setup.LoopMostM,
            WidthLeastM = setup.WidthLeastM,
            WidthMostM = setup.WidthMostM,
            GuideSpanLeastM = setup.GuideSpanLeastM,
            GuideSpanMostM = setup.GuideSpanMostM,
            LowerGuideM = setup.LowerGuideM,
            ClearanceM = ClearanceM ?? setup.ClearanceM,
            CutHeightMostM = CutHeightMostM ?? setup.CutHeightMostM,
            LongestPieceM = setup.LongestPieceM,
            Takes = setup.Takes,
            ClassWork = setup.ClassWork,
            StrandForceMostN = StrandForceMostN ?? setup.StrandForceMostN,
            TensionSystem = setup.TensionSystem,
            TensionStiffnessNPerM = setup.TensionStiffnessNPerM,
            MotorW = motor,
            // A larger motor idles in proportion.
            IdleW = setup.IdleW * motor / setup.MotorW,
            FeederN = setup.FeederN,
            FeederLeastMps = setup.FeederLeastMps,
            FeederMostMps = setup.FeederMostMps,
            ChangeMinutes = setup.ChangeMinutes,
            BreakCostMinor = setup.BreakCostMinor,
            TiltMostRad = setup.TiltMostRad,
            MeterFactor = setup.MeterFactor,
        };
        double smallest = setup.Wheels.Min(w => w.DiameterM);
        copy.Wheels.AddRange(setup.Wheels.Select(w => new SetupWheel { Id = w.Id, SetupId = w.SetupId, Position = w.Position, DiameterM = w.DiameterM * (WheelM ?? smallest) / smallest, Driven = w.Driven }));
        copy.Speeds.AddRange(setup.Speeds);
        return copy;
    }
}
