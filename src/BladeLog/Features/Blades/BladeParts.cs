using System.Text.Json.Serialization;
using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Band;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Features.Blades;

/// <summary>Running on one saw; that of the blade it was cut from counts for its body, not for its teeth.</summary>
internal sealed record ExposureOut(
    [property: JsonPropertyName("saw")] string Saw,
    [property: JsonPropertyName("hours")] double Hours,
    [property: JsonPropertyName("bends")] double Bends,
    [property: JsonPropertyName("wood_path_km")] double WoodPathKm)
{
    public static List<ExposureOut> Of(ShopNow now, BladeFile file, IEnumerable<(int SawId, long PathMm)> paths)
    {
        var path = paths.ToDictionary(p => p.SawId, p => p.PathMm);
        return
        [
            .. file.Exposures.GroupBy(e => e.Setup.SawId).Select(g => new ExposureOut(
                now.Saws.Single(s => s.Saw.Id == g.Key).Saw.Code,
                g.Sum(e => e.RunningMs) / 3_600_000.0,
                g.Sum(e => e.Hours * LoopCycles.BendsPerHour(e.Setup.Wheels.Count, new Speed(e.SpeedMps), new Length(e.LoopM))),
                path.GetValueOrDefault(g.Key) * 1e-6)),
        ];
    }
}

internal sealed record LifeOut(
    [property: JsonPropertyName("used")] double Used,
    [property: JsonPropertyName("used_low")] double UsedLow,
    [property: JsonPropertyName("used_high")] double UsedHigh,
    [property: JsonPropertyName("used_gullet")] double UsedGullet,
    [property: JsonPropertyName("used_weld")] double UsedWeld,
    [property: JsonPropertyName("median_hours")] double? MedianHours,
    [property: JsonPropertyName("hours_left")] double? HoursLeft,
    [property: JsonPropertyName("break_chance_next_10h")] double? BreakChance,
    [property: JsonPropertyName("governed_by")] LimitKind GovernedBy,
    [property: JsonPropertyName("verdict")] LifeVerdict? Verdict)
{
    private const double HoursAhead = 10;

    public static LifeOut? Of(ShopAdvice advice, BladeAdvice blade)
    {
        if (blade.Life is not { } life)
        {
            return null;
        }

        double? chance = life.Rate is { } rate
            ? advice.Level.BreakChance(
                life.Reckoned.Blade,
                life.Reckoned.After(HoursAhead, rate, advice.Settings[LifeSettings.Shape]).Blade - life.Reckoned.Blade)
            : null;
        return new LifeOut(
            life.Used.Blade,
            life.UsedLow,
            life.UsedHigh,
            life.Used.Gullet,
            life.Used.Weld,
            life.MedianHours,
            life.HoursLeft,
            chance,
            blade.Limits.GovernedBy,
            life.Verdict);
    }
}

/// <summary>The edge. Metres left are of the saw's next cut where it is for this blade, else at the saw's reference depth and feed.</summary>
internal sealed record SharpnessOut(
    [property: JsonPropertyName("edge_radius_um")] double EdgeRadius,
    [property: JsonPropertyName("path_since_km")] double PathSinceKm,
    [property: JsonPropertyName("metres_left")] double? MetresLeft,
    [property: JsonPropertyName("metres_left_of")] int? MetresLeftOf,
    [property: JsonPropertyName("metres_left_depth_mm")] double? Depth,
    [property: JsonPropertyName("metres_left_feed_m_min")] double? Feed,
    [property: JsonPropertyName("due")] bool Due)
{
    public static SharpnessOut Of(ShopAdvice advice, BladeAdvice blade)
    {
        var left = OfNextCut(advice, blade) ?? blade.Edge.Left;
        return new SharpnessOut(
            blade.Edge.RadiusM * 1e6,
            blade.Edge.PathKm,
            left?.Metres,
            left?.CutNumber,
            left?.DepthM * 1e3,
            left?.FeedMps * 60,
            blade.Edge.Due);
    }

    private static MetresLeft? OfNextCut(ShopAdvice advice, BladeAdvice blade)
    {
        if (blade.File.Place != Place.OnSaw
            || advice.Now.Saws.FirstOrDefault(s => s.MountedBladeId == blade.File.Blade.Id) is not { } saw
            || advice.NextCut(saw) is not { } next
            || next.Choice.Blade.File.Blade.Id != blade.File.Blade.Id
            || next.Choice.Gate?.AdvisedMps is not { } feed)
        {
            return null;
        }

        var work = next.Choice.Work;
        return blade.Edge.LeftAt(
            work.HeightM, feed, blade.File.LoopM ?? saw.Setup.LoopM, next.Choice.SpeedMps, work.WoodFactor.Value, work.DirtFactor.Value, next.Cut.Number);
    }
}

internal sealed record AdviceOut(
    [property: JsonPropertyName("do")] string Do,
    [property: JsonPropertyName("because")] IReadOnlyList<string> Because);
