using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Advice.Cuts;

/// <summary>The "why" rows of a choice: every figure behind it with its formula in words, its source and where it comes from.</summary>
public static class ChoiceFigures
{
    public static IReadOnlyList<Figure> Of(Choice c, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(c);
        ArgumentNullException.ThrowIfNull(settings);
        List<Figure> rows = [.. OfBlade(c)];
        if (c is { Case: { } cut, Gate: { } gate })
        {
            rows.AddRange(OfGate(c, cut, gate, settings));
        }

        if (c is { AtAdvised: { } at, Gate.AdvisedMps: { } feed })
        {
            rows.AddRange(OfFeed(at, feed, settings));
        }

        if (c.Job is { } job)
        {
            rows.AddRange(OfJob(c, job, settings));
        }

        return [.. rows.Where(r => double.IsFinite(r.Value))];
    }

    private static IEnumerable<Figure> OfBlade(Choice c)
    {
        BladeBody body = c.Blade.Body;
        yield return new("teeth in the cut", c.Work.HeightM / body.PitchCoarse, "", "height over the coarsest pitch", "common-practice", Provenance.CommonPractice);
        yield return new("edge radius", c.Blade.Edge.RadiusM * 1e6, "µm", "radius after the last grind, running in, and wear times equivalent path", "engineering-default", c.Blade.Edge.Wear.Provenance);
        yield return new("kerf", body.Kerf.Value * 1e3, "mm", body.Kerf.From, "engineering-default", body.Kerf.Provenance);
        if (c.Tension is { } tension)
        {
            yield return new("tension", tension.Stress.Value / 1e6, "MPa", $"on the body, thickness times width less gullet: {tension.Stress.From}", "engineering-default", tension.Stress.Provenance);
        }

        if (c is { HardRadiusM: { } hard, UsualRadiusM: { } usual })
        {
            yield return new("tightest curve", usual * 1e3, "mm", "hard bound times the curve factor", "radius-tables", Provenance.Published);
            yield return new("hard bound of a curve", hard * 1e3, "mm", "width squared over eight times kerf less body, less half the body", "derived", Provenance.Derived);
        }
    }

    private static IEnumerable<Figure> OfGate(Choice c, CutCase cut, Gate gate, AdviceSettings settings)
    {
        yield return new("rubs below", gate.RubbingMps * 60, "m/min", "edge radius times band speed times edge width over pitch times kerf", "blackman-2012", Provenance.EngineeringDefault);
        yield return new("no chip below", gate.NoChipMps * 60, "m/min", $"{Wording.Number(settings[CutSettings.Lambda], 2)} of the rubbing feed", "son-2005", settings.ProvenanceOf(CutSettings.Lambda));
        foreach (FeedLimit limit in gate.Limits)
        {
            yield return limit.Green;
            if (limit.AmberMps != limit.GreenMps)
            {
                yield return limit.Amber;
            }
        }

        yield return new("shear factor", CuttingForce.ShearFactor(cut).Pascals / 1e6, "MPa", "density times the factors of hook, moisture, direction, frost and the shop's own fit", "loehnertz-cooz", settings.ProvenanceOf(CutSettings.PerDensity));
        yield return new("gullet area", Gullet.AreaOf(cut).SquareMillimetres, "mm²", "shape times pitch times gullet depth", "gullet-capacity-note", Provenance.Published);
        if (gate.Thrust is { } thrust)
        {
            yield return new("guide span", Math.Max(c.Saw.Setup.LowerGuideM + c.Work.HeightM + c.Saw.Setup.ClearanceM, c.Saw.Setup.GuideSpanLeastM ?? 0) * 1e3, "mm", "lower guide under the table, height of the cut, clearance of the upper guide", "derived", Provenance.Yours);
            yield return new("thrust that slackens the front edge", thrust.FrontEdge.Newtons, "N", "tension times body section over the greatest moment between the guides", "derived", Provenance.Derived);
            yield return new("thrust that twists the blade over", thrust.Buckling.Newtons, "N", "stability of the tensioned blade between its guides", "derived", Provenance.Derived);
        }
    }

    private static IEnumerable<Figure> OfFeed(AtFeed at, double feed, AdviceSettings settings)
    {
        Provenance model = settings.ProvenanceOf(CutSettings.Eta);
        yield return new("working feed", feed * 60, "m/min", $"the lower edge, or {Wording.Number(settings[CutSettings.AdvisedShare], 1)} of the upper edge of the window", "engineering-default", settings.ProvenanceOf(CutSettings.AdvisedShare));
        yield return new("bite", at.BiteM * 1e6, "µm", "feed times pitch over band speed", "derived", Provenance.Derived);
        yield return new("chip over the edge", at.ChipM * 1e6, "µm", "bite times kerf over the width of a tooth's edge", "derived", Provenance.Derived);
        yield return new("gullet fill", at.Fill, "", "bite times height over gullet area", "gullet-capacity-note", Provenance.Published);
        yield return new("cutting force", at.ForceN, "N", "teeth in the cut times shear factor times chip and edge", "engineering-default", model);
        yield return new("push", at.ThrustN, "N", "the same with hook and rounding turned into thrust", "woodson-1979", model);
        yield return new("power at the blade", at.PowerW, "W", "cutting force times band speed", "derived", model);
        yield return new("thrust reserve", at.Reserve, "times", "thrust the blade stands over the push", "derived", Provenance.Derived);
    }

    private static IEnumerable<Figure> OfJob(Choice c, JobCost job, AdviceSettings settings)
    {
        yield return new("sawing", job.SawMinutes, "min", c.Relief ? "length of all cuts over feed, longer for relief cuts" : "length of all cuts over feed", "derived", Provenance.Derived);
        yield return new("minutes", job.Minutes, "min", "sawing, handling, and the blade change where it is needed", "engineering-default", settings.ProvenanceOf(CutSettings.Handling));
        yield return new("path per tooth", job.PathKm, "km", "area times band speed over feed times loop, times the factors of wood and dirt", "derived", c.Work.WoodFactor.Provenance);
        yield return new("edge after the job", job.EdgeAfterM * 1e6, "µm", "edge law at the longer path", "engineering-default", c.Blade.Edge.Wear.Provenance);
        yield return new("life spent", job.LifeSpent, "of a median life", "hours run times damage per hour, gullets and weld together", "miner-1945", Provenance.EngineeringDefault);
        yield return new("chance of a break", job.BreakChance, "", "over what is known of the shop's level of life, the blade known to be whole", "derived", Provenance.EngineeringDefault);
        yield return Money("labour", job.Cost.Labour, "shop rate times minutes");
        yield return Money("wear", job.Cost.Wear, "price of a sharpening times the share of the edge");
        yield return Money("blade", job.Cost.Life, "price times the share of the blade, and what a break costs times its chance");
        yield return Money("timber", job.Cost.Timber, "timber value times area times kerf");
        if (job.Cost.Nail > 0)
        {
            yield return Money("nail", job.Cost.Nail, "nail chance times what the blade is still worth");
        }

        yield return Money("cost", job.Cost.Total, "all lines together");
    }

    private static Figure Money(string name, double minor, string how) => new(name, minor, "minor units", how, "derived", Provenance.Yours);
}
