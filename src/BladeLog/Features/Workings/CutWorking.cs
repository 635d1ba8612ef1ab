using System.Text.Json.Serialization;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui.Json;

namespace BladeLog.Features.Workings;

internal sealed record CutIn
{
    [Field("width_mm", "the width over the teeth in mm", Over = 0, Most = 500)]
    public required double Width { get; init; }

    [Field("thickness_mm", "the band's thickness in mm", Over = 0, Most = 5)]
    public required double Thickness { get; init; }

    [Field("kerf_mm", "the kerf in mm", Over = 0, Most = 20)]
    public required double Kerf { get; init; }

    [Field("pitch_mm", "the mean pitch in mm", Over = 0, Most = 200)]
    public required double Pitch { get; init; }

    [Field("gullet_mm", "the gullet depth in mm", Over = 0, Most = 100)]
    public required double Gullet { get; init; }

    [Field("tooth_form", "the tooth form")]
    public required ToothForm Form { get; init; }

    [Field("rake_deg", "the hook angle in degrees", Least = -20, Most = 40)]
    public required double Rake { get; init; }

    [Field("tip", "the tip")]
    public required TipKind Tip { get; init; }

    [Field("edge_radius_um", "the edge radius in µm", Over = 0, Most = 1000)]
    public required double EdgeRadius { get; init; }

    [Field("loop_mm", "the length of the loop in mm", Over = 0, Most = 50000)]
    public required double Loop { get; init; }

    [Field("band_speed_m_s", "the band speed in m/s", Over = 0, Most = 100)]
    public required double BandSpeed { get; init; }

    [Field("cut_height_mm", "the height of the wood along the blade in mm", Over = 0, Most = 5000)]
    public required double CutHeight { get; init; }

    [Field("density12_kg_m3", "the density at 12 % moisture in kg/m³", Least = 50, Most = 2000)]
    public required double Density { get; init; }

    [Field("moisture_pct", "the moisture in per cent of dry weight", Least = 0, Most = 300)]
    public required double Moisture { get; init; }

    [Field("direction", "the direction of the cut")]
    public CutDirection Direction { get; init; } = CutDirection.Rip;

    [Field("frozen", "whether the wood is frozen")]
    public bool Frozen { get; init; }

    [Field("feed_m_min", "the feed in m/min", Over = 0, Most = 200)]
    public double? Feed { get; init; }

    [Field("band_power_w", "the power left for cutting at the band in W", Over = 0, Most = 1e6)]
    public double? BandPower { get; init; }

    [Field("push_limit_n", "the push limit in N", Over = 0, Most = 1e5)]
    public double? PushLimit { get; init; }

    [Field("thrust_limit_n", "the thrust the blade may take in N", Over = 0, Most = 1e5)]
    public double? ThrustLimit { get; init; }

    [Field("gullet_fill_limit", "the share of the gullet that may fill", Over = 0, Most = 1)]
    public double FillLimit { get; init; } = 0.40;
}

internal sealed record CutLimitsOut(
    [property: JsonPropertyName("gullet_m_min")] double Gullet,
    [property: JsonPropertyName("power_m_min")] double? Power,
    [property: JsonPropertyName("push_m_min")] double? Push,
    [property: JsonPropertyName("thrust_m_min")] double? Thrust,
    [property: JsonPropertyName("rubbing_m_min")] double Rubbing,
    [property: JsonPropertyName("no_chip_m_min")] double NoChip);

internal sealed record CutWindowOut(
    [property: JsonPropertyName("low_m_min")] double? Low,
    [property: JsonPropertyName("high_m_min")] double? High,
    [property: JsonPropertyName("hatched_low_m_min")] double HatchedLow,
    [property: JsonPropertyName("governed_by")] string GovernedBy);

internal sealed record CutCurveOut(
    [property: JsonPropertyName("min_radius_mm")] double Usual,
    [property: JsonPropertyName("hard_min_radius_mm")] double Hard);

internal sealed record CutOut(
    [property: JsonPropertyName("bite_um")] double? Bite,
    [property: JsonPropertyName("teeth_in_cut")] double TeethInCut,
    [property: JsonPropertyName("gullet_fill")] double? GulletFill,
    [property: JsonPropertyName("tooth_force_n")] double? ToothForce,
    [property: JsonPropertyName("cutting_force_n")] double? CuttingForce,
    [property: JsonPropertyName("thrust_n")] double? Thrust,
    [property: JsonPropertyName("cutting_power_w")] double? CuttingPower,
    [property: JsonPropertyName("regime")] BiteRegime? Regime,
    [property: JsonPropertyName("wear_path_m_per_m2")] double WearPath,
    [property: JsonPropertyName("limits")] CutLimitsOut Limits,
    [property: JsonPropertyName("window")] CutWindowOut Window,
    [property: JsonPropertyName("curve")] CutCurveOut Curve,
    [property: JsonPropertyName("shear_factor_mpa")] double ShearFactor,
    [property: JsonPropertyName("reference_thickness_um")] double ReferenceThickness,
    [property: JsonPropertyName("sources")] IReadOnlyList<string> Sources,
    [property: JsonPropertyName("cautions")] IReadOnlyList<string> Cautions);

internal static class CutWorking
{
    public static CutOut? Answer(CutIn body, BodyReader reader)
    {
        if (body.Gullet >= body.Width)
        {
            reader.Say("gullet_mm", $"A gullet {body.Gullet} mm deep leaves no body in a blade {body.Width} mm wide.");
        }

        if (body.Kerf <= body.Thickness)
        {
            reader.Say("kerf_mm", $"A kerf of {body.Kerf} mm has no room for a body {body.Thickness} mm thick.");
        }

        if (body.Loop < 2 * body.Pitch)
        {
            reader.Say("loop_mm", $"A loop of {body.Loop} mm has no two teeth {body.Pitch} mm apart.");
        }

        if (reader.Errors.Count > 0)
        {
            return null;
        }

        var cut = new CutCase
        {
            Thickness = Length.FromMillimetres(body.Thickness),
            Kerf = Length.FromMillimetres(body.Kerf),
            Pitch = Length.FromMillimetres(body.Pitch),
            GulletDepth = Length.FromMillimetres(body.Gullet),
            Form = body.Form,
            Rake = Angle.FromDegrees(body.Rake),
            Tip = body.Tip,
            EdgeRadius = Length.FromMicrometres(body.EdgeRadius),
            BandSpeed = new Speed(body.BandSpeed),
            CutHeight = Length.FromMillimetres(body.CutHeight),
            Density12 = new Density(body.Density),
            MoisturePercent = body.Moisture,
            Direction = body.Direction,
            Frozen = body.Frozen,
        };
        var limits = new CutLimitsOut(
            Gullet.FeedAtFill(cut, body.FillLimit).MetresPerMinute,
            body.BandPower is { } power ? CuttingForce.FeedAtPower(cut, new Power(power)).MetresPerMinute : null,
            body.PushLimit is { } push ? CuttingForce.FeedAtThrust(cut, new Force(push))?.MetresPerMinute : null,
            body.ThrustLimit is { } thrust ? CuttingForce.FeedAtThrust(cut, new Force(thrust))?.MetresPerMinute : null,
            Bite.RubbingFeed(cut).MetresPerMinute,
            Bite.NoChipFeed(cut).MetresPerMinute);
        var (governs, high) = new[] { ("gullet", (double?)limits.Gullet), ("power", limits.Power), ("push", limits.Push), ("thrust", limits.Thrust) }
            .Where(l => l.Item2 is not null).Select(l => (l.Item1, l.Item2!.Value)).MinBy(l => l.Value);
        var open = high >= limits.Rubbing;
        var feed = body.Feed is { } given ? Speed.FromMetresPerMinute(given) : (Speed?)null;
        var bite = feed is { } f ? Kinematics.BitePerTooth(f, cut.Pitch, cut.BandSpeed) : (Length?)null;
        var wearFeed = feed ?? Speed.FromMetresPerMinute(high);
        Length width = Length.FromMillimetres(body.Width), loop = Length.FromMillimetres(body.Loop);
        return new CutOut(
            bite?.Micrometres,
            Kinematics.TeethInCut(cut.CutHeight, cut.Pitch),
            bite is { } c ? Gullet.Fill(c, cut.CutHeight, Gullet.AreaOf(cut)) : null,
            bite is { } b ? CuttingForce.PerTooth(cut, b).Newtons : null,
            feed is { } f1 ? CuttingForce.Main(cut, f1).Newtons : null,
            feed is { } f2 ? CuttingForce.Thrust(cut, f2).Newtons : null,
            feed is { } f3 ? CuttingForce.CuttingPower(cut, f3).Watts : null,
            feed is { } f4 ? Bite.RegimeOf(cut, f4) : null,
            wearFeed.MetresPerSecond > 0 ? Kinematics.WoodPathPerTooth(new Area(1), wearFeed, loop, cut.BandSpeed).Metres : double.NaN,
            limits,
            new CutWindowOut(open ? limits.Rubbing : null, open ? high : null, limits.NoChip, governs),
            new CutCurveOut(
                CurveRadius.Usual(width, cut.Kerf, cut.Thickness).Millimetres,
                CurveRadius.Hard(width, cut.Kerf, cut.Thickness).Millimetres),
            CuttingForce.ShearFactor(cut).Megapascals,
            CuttingForce.ReferenceThickness(cut.Rake).Micrometres,
            AnswerSources.Cut,
            [.. CutChecks.Cautions(cut, feed), "Forces and power hold within -30 to +40 per cent until the shop's own ammeter readings have taught the factor."]);
    }
}
