using System.Text.Json.Serialization;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui.Json;

namespace BladeLog.Features.Workings;

internal sealed record ThrustLimitsIn
{
    [Field("width_mm", "the width over the teeth in mm", Least = 1, Most = 500)]
    public required double Width { get; init; }

    [Field("thickness_mm", "the band's thickness in mm", Least = 0.05, Most = 5)]
    public required double Thickness { get; init; }

    [Field("gullet_mm", "the gullet depth in mm", Least = 0, Most = 100)]
    public required double Gullet { get; init; }

    [Field("tension_mpa", "the running tension on the body in MPa", Least = 0.1, Most = 600)]
    public required double Tension { get; init; }

    [Field("guide_span_mm", "the span between the guides in mm", Least = 5, Most = 5000)]
    public required double GuideSpan { get; init; }

    [Field("cut_height_mm", "the height of the wood along the blade in mm", Least = 1, Most = 5000)]
    public required double CutHeight { get; init; }

    [Field("cut_centre_mm", "the middle of the cut above the lower guide in mm", Over = 0, Most = 5000)]
    public double? CutCentre { get; init; }

    [Field("youngs_gpa", "the modulus of elasticity in GPa", Least = 50, Most = 700)]
    public double Youngs { get; init; } = 207;

    [Field("poisson", "Poisson's ratio", Least = 0, Most = 0.49)]
    public double Poisson { get; init; } = 0.30;

    [Field("band_speed_m_s", "the band speed in m/s", Least = 0, Most = 100)]
    public double BandSpeed { get; init; }

    [Field("tension_system", "the tension system")]
    public TensionSystem System { get; init; } = TensionSystem.Sprung;

    [Field("tension_guessed", "whether the tension is only guessed")]
    public bool Guessed { get; init; }
}

internal sealed record ThrustLimitsOut(
    [property: JsonPropertyName("front_edge_n")] double FrontEdge,
    [property: JsonPropertyName("buckling_n")] double Buckling,
    [property: JsonPropertyName("plate_buckling_n")] double? PlateBuckling,
    [property: JsonPropertyName("allowed_n")] double Allowed,
    [property: JsonPropertyName("stop_n")] double Stop,
    [property: JsonPropertyName("governed_by")] ThrustLimiter GovernedBy,
    [property: JsonPropertyName("tip_stiffness_n_per_mm")] double TipStiffness,
    [property: JsonPropertyName("tip_stiffness_at_allowed_n_per_mm")] double TipStiffnessAtAllowed,
    [property: JsonPropertyName("lateral_hz")] double Lateral,
    [property: JsonPropertyName("torsional_hz")] double Torsional,
    [property: JsonPropertyName("sources")] IReadOnlyList<string> Sources,
    [property: JsonPropertyName("cautions")] IReadOnlyList<string> Cautions);

internal static class ThrustLimitsWorking
{
    public static ThrustLimitsOut? Answer(ThrustLimitsIn body, BodyReader reader)
    {
        var centre = body.CutCentre ?? body.GuideSpan / 2;
        if (body.Gullet >= body.Width)
        {
            reader.Say("gullet_mm", $"A gullet {body.Gullet} mm deep leaves no body in a blade {body.Width} mm wide.");
        }

        if (body.Thickness >= body.Width - body.Gullet)
        {
            reader.Say("thickness_mm", $"A band {body.Thickness} mm thick is not a band on a body {body.Width - body.Gullet:0.##} mm wide. Check thickness, width and gullet.");
        }

        if (body.CutHeight > body.GuideSpan)
        {
            reader.Say("cut_height_mm", $"The wood is {body.CutHeight} mm high and the guides stand only {body.GuideSpan} mm apart.");
        }
        else if (centre - body.CutHeight / 2 < -1e-9 || centre + body.CutHeight / 2 > body.GuideSpan + 1e-9)
        {
            reader.Say("cut_centre_mm", "The cut reaches beyond a guide. Its middle must lie half its height from both guides.");
        }

        if (reader.Errors.Count > 0)
        {
            return null;
        }

        var band = new GuidedBand
        {
            Width = Length.FromMillimetres(body.Width),
            Thickness = Length.FromMillimetres(body.Thickness),
            GulletDepth = Length.FromMillimetres(body.Gullet),
            Tension = Stress.FromMegapascals(body.Tension),
            GuideSpan = Length.FromMillimetres(body.GuideSpan),
            CutHeight = Length.FromMillimetres(body.CutHeight),
            CutCentre = Length.FromMillimetres(centre),
            Steel = Steel.Carbon with { YoungsModulus = new Stress(body.Youngs * 1e9), Poisson = body.Poisson },
            BandSpeed = new Speed(body.BandSpeed),
            System = body.System,
        };
        var limits = ThrustLimit.Of(band, PlateUse.Always, body.Guessed ? 1.25 : 1.0);
        return new ThrustLimitsOut(
            limits.FrontEdge.Newtons,
            limits.BeamBuckling.Newtons,
            limits.PlateBuckling?.Newtons,
            limits.Allowed.Newtons,
            limits.Stop.Newtons,
            limits.GovernedBy,
            TipStiffness.AtPoint(band, new Force(0)).NewtonsPerMillimetre,
            TipStiffness.AtPoint(band, limits.Allowed).NewtonsPerMillimetre,
            BandFrequency.Lateral(band).Hertz,
            BandFrequency.Torsional(band).Hertz,
            AnswerSources.Thrust,
            ["Tension is the worst-known figure here: a fifth less tension is about a fifth less thrust."]);
    }
}
