using System.Text.Json.Serialization;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui.Json;

namespace BladeLog.Features.Workings;

internal sealed record BandLifeIn
{
    [Field("thickness_mm", "the band's thickness in mm", Over = 0, Most = 5)]
    public required double Thickness { get; init; }

    [Field("wheels_mm", "the wheel diameters over the tyre in mm, one for each wheel", Over = 0, Most = 5000, Longest = 6)]
    public required List<double> Wheels { get; init; }

    [Field("band_speed_m_s", "the band speed in m/s", Over = 0, Most = 100)]
    public required double BandSpeed { get; init; }

    [Field("loop_mm", "the length of the loop in mm", Over = 0, Most = 50000)]
    public required double Loop { get; init; }

    [Field("tension_mpa", "the tension on the body at rest in MPa", Least = 0, Most = 600)]
    public required double Tension { get; init; }

    [Field("body_hrc", "the hardness of the body in HRC", Least = 20, Most = 58)]
    public required double BodyHrc { get; init; }

    [Field("width_mm", "the width of the body in mm", Over = 0, Most = 500)]
    public double? Width { get; init; }

    [Field("weld", "the weld")]
    public WeldQuality Weld { get; init; } = WeldQuality.Good;

    [Field("tension_system", "the tension system")]
    public TensionSystem System { get; init; } = TensionSystem.Sprung;

    [Field("gullet_tension_factor", "the gullet's factor on tension", Least = 1, Most = 10)]
    public double GulletTensionFactor { get; init; } = 2.0;

    [Field("gullet_bending_factor", "the gullet's factor on bending", Least = 1, Most = 10)]
    public double GulletBendingFactor { get; init; } = 1.4;

    [Field("weibull_shape", "the Weibull shape", Least = 0.2, Most = 20)]
    public double WeibullShape { get; init; } = 2.0;

    [Field("cut_valley_mpa", "the valley of the loop in the cut in MPa", Least = 0, Most = 600)]
    public double? CutValley { get; init; }
}

internal sealed record SiteOut(
    [property: JsonPropertyName("equivalent_amplitude_mpa")] IReadOnlyList<double> EquivalentAmplitude,
    [property: JsonPropertyName("median_bends")] double MedianBends,
    [property: JsonPropertyName("median_hours")] double MedianHours);

internal sealed record BladeOut(
    [property: JsonPropertyName("median_bends")] double MedianBends,
    [property: JsonPropertyName("median_hours")] double MedianHours,
    [property: JsonPropertyName("tenth_percentile_bends")] double TenthPercentileBends);

internal sealed record BandLifeOut(
    [property: JsonPropertyName("bending_mpa")] IReadOnlyList<double> Bending,
    [property: JsonPropertyName("running_tension_mpa")] double RunningTension,
    [property: JsonPropertyName("bends_per_hour")] double BendsPerHour,
    [property: JsonPropertyName("gullet")] SiteOut Gullet,
    [property: JsonPropertyName("weld")] SiteOut Weld,
    [property: JsonPropertyName("blade")] BladeOut Blade,
    [property: JsonPropertyName("verdict")] LifeVerdict Verdict,
    [property: JsonPropertyName("sources")] IReadOnlyList<string> Sources,
    [property: JsonPropertyName("cautions")] IReadOnlyList<string> Cautions);

internal static class BandLifeWorking
{
    public static BandLifeOut? Answer(BandLifeIn body, BodyReader reader)
    {
        for (var i = 0; i < body.Wheels.Count; i++)
        {
            if (body.Thickness * 20 > body.Wheels[i])
            {
                reader.Say($"wheels_mm[{i}]", $"A band {body.Thickness} mm thick cannot lie on a wheel of {body.Wheels[i]} mm. Check both figures.");
            }
        }

        var round = body.Wheels.Sum() / body.Wheels.Count * Math.PI;
        if (body.Loop < round)
        {
            reader.Say("loop_mm", $"A loop of {body.Loop:0.#} mm is shorter than the way round one wheel ({round:0} mm).");
        }

        if (reader.Errors.Count > 0)
        {
            return null;
        }

        var life = BandLife.Of(new BandCase
        {
            Thickness = Length.FromMillimetres(body.Thickness),
            Wheels = [.. body.Wheels.Select(Length.FromMillimetres)],
            BandSpeed = new Speed(body.BandSpeed),
            Loop = Length.FromMillimetres(body.Loop),
            Tension = Stress.FromMegapascals(body.Tension),
            BodyHrc = body.BodyHrc,
            BodyWidth = body.Width is { } w ? Length.FromMillimetres(w) : null,
            Weld = body.Weld,
            System = body.System,
            GulletTensionFactor = body.GulletTensionFactor,
            GulletBendingFactor = body.GulletBendingFactor,
            WeibullShape = body.WeibullShape,
            CutValley = body.CutValley is { } valley ? Stress.FromMegapascals(valley) : null,
        });
        return new BandLifeOut(
            [.. life.Bending.Select(b => b.Megapascals)],
            life.RunningTension.Megapascals,
            life.BendsPerHour,
            Site(life.Gullet),
            Site(life.Weld),
            new BladeOut(life.MedianBends, life.MedianHours, life.TenthPercentileBends),
            life.Verdict,
            [.. AnswerSources.BandLife, .. body.Width is null ? (string[])[] : ["ashwell-1950"], .. body.CutValley is null ? (string[])[] : ["astm-e1049"]],
            Cautions(life));
    }

    private static List<string> Cautions(BandLifeResult life)
    {
        List<string> said = ["A planning figure. Look at the blade before use; it cannot see cracks, burns or a bad weld."];
        if (life.TakesSet)
        {
            said.Add("This band takes a set on the wheel: tension and bending together pass what the body springs back from.");
        }

        return said;
    }

    private static SiteOut Site(SiteLife site) =>
        new([.. site.EquivalentAmplitude.Select(a => a.Megapascals)], site.MedianBends, site.MedianHours);
}
