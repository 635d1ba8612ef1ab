using System.Text.Json.Serialization;
using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Features.Saws;

internal sealed record WheelOut(
    [property: JsonPropertyName("diameter_mm")] double Diameter,
    [property: JsonPropertyName("driven")] bool Driven);

/// <summary>The saw as it is set up now. Greatest strand force is that of one strand.</summary>
internal sealed record SetupOut(
    [property: JsonPropertyName("loop_mm")] double Loop,
    [property: JsonPropertyName("loop_least_mm")] double LoopLeast,
    [property: JsonPropertyName("loop_most_mm")] double LoopMost,
    [property: JsonPropertyName("width_least_mm")] double WidthLeast,
    [property: JsonPropertyName("width_most_mm")] double WidthMost,
    [property: JsonPropertyName("wheels")] IReadOnlyList<WheelOut> Wheels,
    [property: JsonPropertyName("speeds_m_s")] IReadOnlyList<double> Speeds,
    [property: JsonPropertyName("usual_speed_m_s")] double UsualSpeed,
    [property: JsonPropertyName("guide_span_least_mm")] double? GuideSpanLeast,
    [property: JsonPropertyName("guide_span_most_mm")] double? GuideSpanMost,
    [property: JsonPropertyName("lower_guide_mm")] double LowerGuide,
    [property: JsonPropertyName("clearance_mm")] double Clearance,
    [property: JsonPropertyName("cut_height_most_mm")] double CutHeightMost,
    [property: JsonPropertyName("longest_piece_m")] double? LongestPiece,
    [property: JsonPropertyName("takes")] IReadOnlyList<CutKind> Takes,
    [property: JsonPropertyName("class_work")] ClassWork ClassWork,
    [property: JsonPropertyName("strand_force_most_n")] double? StrandForceMost,
    [property: JsonPropertyName("tension_system")] TensionSystem TensionSystem,
    [property: JsonPropertyName("tension_stiffness_n_per_mm")] double? TensionStiffness,
    [property: JsonPropertyName("motor_w")] double Motor,
    [property: JsonPropertyName("idle_w")] double? Idle,
    [property: JsonPropertyName("feeder_n")] double? Feeder,
    [property: JsonPropertyName("feeder_least_m_min")] double? FeederLeast,
    [property: JsonPropertyName("feeder_most_m_min")] double? FeederMost,
    [property: JsonPropertyName("change_minutes")] double ChangeMinutes,
    [property: JsonPropertyName("break_cost_minor")] long BreakCost,
    [property: JsonPropertyName("tilt_most_deg")] double TiltMost,
    [property: JsonPropertyName("meter_factor")] double MeterFactor)
{
    private static readonly (Takes Flag, CutKind Kind)[] Kinds =
        [(Records.Takes.Board, CutKind.Board), (Records.Takes.Resaw, CutKind.Resaw), (Records.Takes.Beam, CutKind.Beam), (Records.Takes.Log, CutKind.Log)];

    public static SetupOut Of(SawSetup s) => new(
        s.LoopM * 1e3,
        s.LoopLeastM * 1e3,
        s.LoopMostM * 1e3,
        s.WidthLeastM * 1e3,
        s.WidthMostM * 1e3,
        [.. s.Wheels.OrderBy(w => w.Position).Select(w => new WheelOut(w.DiameterM * 1e3, w.Driven))],
        [.. s.Speeds.OrderBy(v => v.Position).Select(v => v.SpeedMps)],
        s.UsualSpeedMps,
        JsonAnswers.Mm(s.GuideSpanLeastM),
        JsonAnswers.Mm(s.GuideSpanMostM),
        s.LowerGuideM * 1e3,
        s.ClearanceM * 1e3,
        s.CutHeightMostM * 1e3,
        s.LongestPieceM,
        [.. Kinds.Where(k => s.Takes.HasFlag(k.Flag)).Select(k => k.Kind)],
        s.ClassWork,
        s.StrandForceMostN,
        s.TensionSystem,
        s.TensionStiffnessNPerM * 1e-3,
        s.MotorW,
        s.IdleW,
        s.FeederN,
        s.FeederLeastMps * 60,
        s.FeederMostMps * 60,
        s.ChangeMinutes,
        s.BreakCostMinor,
        new Angle(s.TiltMostRad).Degrees,
        s.MeterFactor);
}

internal sealed record MountedOut(
    [property: JsonPropertyName("tag")] string Tag,
    [property: JsonPropertyName("since")] DateTime? Since);

internal sealed record SawOut(
    [property: JsonPropertyName("code")] string Code,
    [property: JsonPropertyName("name")] string Name,
    [property: JsonPropertyName("active")] bool Active,
    [property: JsonPropertyName("has_hour_meter")] bool HasHourMeter,
    [property: JsonPropertyName("setup")] SetupOut Setup,
    [property: JsonPropertyName("mounted")] MountedOut? Mounted,
    [property: JsonPropertyName("tension_let_off")] bool Slack,
    [property: JsonPropertyName("hours")] double Hours,
    [property: JsonPropertyName("no_blade_known_hours")] double NoBladeKnownHours,
    [property: JsonPropertyName("next_cut")] int? NextCut,
    [property: JsonPropertyName("sources")] IReadOnlyList<string> Sources,
    [property: JsonPropertyName("cautions")] IReadOnlyList<string> Cautions)
{
    public static SawOut Of(ShopAdvice advice, SawNow saw)
    {
        const double Hour = 3_600_000;
        var mounted = advice.Now.Blades.FirstOrDefault(b => b.Blade.Id == saw.MountedBladeId);
        return new SawOut(
            saw.Saw.Code,
            saw.Saw.Name,
            saw.Saw.Active,
            saw.Saw.HasHourMeter,
            SetupOut.Of(saw.Setup),
            mounted is null ? null : new MountedOut(mounted.Blade.Tag, JsonAnswers.Utc(saw.MountedSince)),
            saw.Slack,
            saw.RunningMs / Hour,
            saw.NoBladeKnownMs / Hour,
            advice.NextCut(saw)?.Cut.Number,
            AnswerSources.Choice,
            saw.NoBladeKnownMs > 0 ? ["Part of the running is of no known blade: it flexed one that is not counted."] : []);
    }
}
