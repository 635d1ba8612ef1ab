using System.Text.Json.Serialization;
using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Features.Blades;

/// <summary>A blade as it is now. A field named in defaults was not said by the shop: it is the handbook's.</summary>
internal sealed record BladeOut
{
    [JsonPropertyName("tag")]
    public required string Tag { get; init; }

    [JsonPropertyName("place")]
    public required Place Place { get; init; }

    [JsonPropertyName("state")]
    public required BladeState State { get; init; }

    [JsonPropertyName("hook")]
    public required string? Hook { get; init; }

    [JsonPropertyName("saw")]
    public required string? Saw { get; init; }

    [JsonPropertyName("batch")]
    public required string? Batch { get; init; }

    [JsonPropertyName("specification")]
    public required string Specification { get; init; }

    [JsonPropertyName("width_mm")]
    public required double Width { get; init; }

    [JsonPropertyName("new_width_mm")]
    public required double NewWidth { get; init; }

    [JsonPropertyName("least_width_mm")]
    public required double LeastWidth { get; init; }

    [JsonPropertyName("thickness_mm")]
    public required double Thickness { get; init; }

    [JsonPropertyName("pitch_mm")]
    public required double Pitch { get; init; }

    [JsonPropertyName("pitch_coarse_mm")]
    public required double PitchCoarse { get; init; }

    [JsonPropertyName("tooth_form")]
    public required ToothForm Form { get; init; }

    [JsonPropertyName("rake_deg")]
    public required double Rake { get; init; }

    [JsonPropertyName("gullet_mm")]
    public required double Gullet { get; init; }

    [JsonPropertyName("gullet_area_mm2")]
    public double? GulletArea { get; init; }

    [JsonPropertyName("kerf_mm")]
    public required double Kerf { get; init; }

    [JsonPropertyName("set_pattern")]
    public required SetPattern SetPattern { get; init; }

    [JsonPropertyName("tip")]
    public required TipKind Tip { get; init; }

    [JsonPropertyName("tip_material")]
    public required TipMaterial TipMaterial { get; init; }

    [JsonPropertyName("body_steel")]
    public required BodySteel Steel { get; init; }

    [JsonPropertyName("body_hrc")]
    public required double BodyHrc { get; init; }

    [JsonPropertyName("loop_mm")]
    public required double? Loop { get; init; }

    [JsonPropertyName("target_tension_mpa")]
    public required double? TargetTension { get; init; }

    [JsonPropertyName("fresh_edge_um")]
    public required double FreshEdge { get; init; }

    [JsonPropertyName("price_minor")]
    public required long? Price { get; init; }

    [JsonPropertyName("sharpening_price_minor")]
    public required long? SharpeningPrice { get; init; }

    [JsonPropertyName("most_sharpenings")]
    public required int? MostSharpenings { get; init; }

    [JsonPropertyName("sharpenings")]
    public required int Sharpenings { get; init; }

    [JsonPropertyName("welds")]
    public required int Welds { get; init; }

    [JsonPropertyName("weld")]
    public required WeldQuality Weld { get; init; }

    [JsonPropertyName("hours")]
    public required double Hours { get; init; }

    [JsonPropertyName("exposures")]
    public required IReadOnlyList<ExposureOut> Exposures { get; init; }

    [JsonPropertyName("total_bends")]
    public required double TotalBends { get; init; }

    [JsonPropertyName("life")]
    public required LifeOut? Life { get; init; }

    [JsonPropertyName("sharpness")]
    public required SharpnessOut Sharpness { get; init; }

    [JsonPropertyName("advice")]
    public required AdviceOut Advice { get; init; }

    [JsonPropertyName("defaults")]
    public required IReadOnlyList<string> Defaults { get; init; }

    [JsonPropertyName("sources")]
    public required IReadOnlyList<string> Sources { get; init; }

    [JsonPropertyName("cautions")]
    public required IReadOnlyList<string> Cautions { get; init; }

    public static BladeOut Of(ShopAdvice advice, BladeFile file, ILookup<int, (int SawId, long PathMm)> paths)
    {
        var blade = advice.Of(file);
        var body = blade.Body;
        (string Name, Known Figure)[] known =
        [
            ("least_width_mm", body.LeastWidth), ("thickness_mm", body.Thickness), ("rake_deg", body.Rake), ("gullet_mm", body.Gullet),
            ("kerf_mm", body.Kerf), ("body_hrc", body.Hrc), ("fresh_edge_um", body.FreshEdge),
        ];
        return new BladeOut
        {
            Tag = file.Blade.Tag,
            Place = file.Place,
            State = blade.State,
            Hook = file.Hook,
            Saw = file.Place == Place.OnSaw ? advice.Now.Saws.FirstOrDefault(s => s.Saw.Id == file.SawId)?.Saw.Code : null,
            Batch = file.Away?.BatchNumber,
            Specification = file.Spec.Code,
            Width = body.Width.Value * 1e3,
            NewWidth = body.NewWidth.Value * 1e3,
            LeastWidth = body.LeastWidth.Value * 1e3,
            Thickness = body.Thickness.Value * 1e3,
            Pitch = body.PitchMean * 1e3,
            PitchCoarse = body.PitchCoarse * 1e3,
            Form = body.Form,
            Rake = new Angle(body.Rake.Value).Degrees,
            Gullet = body.Gullet.Value * 1e3,
            GulletArea = body.GulletAreaM2 * 1e6,
            Kerf = body.Kerf.Value * 1e3,
            SetPattern = file.Spec.SetPattern,
            Tip = body.Tip,
            TipMaterial = body.TipMaterial,
            Steel = body.Steel,
            BodyHrc = body.Hrc.Value,
            Loop = JsonAnswers.Mm(file.LoopM ?? file.Spec.NewLoopM),
            TargetTension = body.TargetPa * 1e-6,
            FreshEdge = body.FreshEdge.Value * 1e6,
            Price = file.Spec.PriceMinor,
            SharpeningPrice = file.Spec.SharpeningPriceMinor,
            MostSharpenings = file.Spec.MostSharpenings,
            Sharpenings = file.Sharpenings,
            Welds = file.Welds,
            Weld = file.Weld,
            Hours = file.Exposures.Sum(e => e.RunningMs) / 3_600_000.0,
            Exposures = ExposureOut.Of(advice.Now, file, paths[file.Blade.Id]),
            TotalBends = blade.Record.Bends,
            Life = LifeOut.Of(advice, blade),
            Sharpness = SharpnessOut.Of(advice, blade),
            Advice = new AdviceOut(blade.Advice.Do, blade.Advice.Because),
            Defaults = [.. known.Where(k => k.Figure.IsDefault).Select(k => k.Name)],
            Sources = AnswerSources.Blade,
            Cautions = ["Used life is a planning figure. Look at the blade before use; no figure sees cracks, burns or a bad weld."],
        };
    }
}
