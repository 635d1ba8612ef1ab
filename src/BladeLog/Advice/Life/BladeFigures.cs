using BladeLog.Handbook.Quantities;

namespace BladeLog.Advice.Life;

/// <summary>The "because" rows of a blade: every figure behind its life and edge with its formula in words, its source and where it comes from.</summary>
public static class BladeFigures
{
    public static IReadOnlyList<Figure> Of(BladeAdvice blade, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(settings);
        return [.. OfBody(blade), .. OfLife(blade, settings), .. OfEdge(blade)];
    }

    private static IEnumerable<Figure> OfBody(BladeAdvice blade)
    {
        BladeBody body = blade.Body;
        yield return Given("width", body.Width, 1e3, "mm");
        yield return Given("least width", body.LeastWidth, 1e3, "mm");
        yield return Given("thickness", body.Thickness, 1e3, "mm");
        yield return Given("gullet depth", body.Gullet, 1e3, "mm");
        yield return new("body width", body.BodyWidth * 1e3, "mm", "width less gullet depth: the part that carries the tension", "derived", Provenance.Derived);
        yield return Given("kerf", body.Kerf, 1e3, "mm");
        yield return Given("hook", body.Rake, 180 / Math.PI, "°");
        yield return Given("hardness of the body", body.Hrc, 1, "HRC");
    }

    private static IEnumerable<Figure> OfLife(BladeAdvice blade, AdviceSettings settings)
    {
        if (blade.Life is not { } life)
        {
            yield break;
        }

        yield return new("bends", life.Bends, "", "hours run times wheels times band speed over loop, saw by saw", "derived", Provenance.Derived);
        yield return new("used at the gullets", life.Used.Gullet, "", "bends done over median bends, saw by saw, the worse face", "miner-1945", Provenance.EngineeringDefault);
        yield return new("used at the weld", life.Used.Weld, "", "the same since the weld was made", "miner-1945", Provenance.EngineeringDefault);
        yield return new("life used", life.Used.Blade, "", "both together, whichever breaks first; 1: half of such blades have broken", "derived", Provenance.EngineeringDefault);
        if (life.Rate is not { } rate)
        {
            yield break;
        }

        yield return new("bending stress", rate.Result.Bending.Max(b => b.Megapascals), "MPa", "stiffness times thickness over wheel and thickness", "derived", Provenance.Derived);
        yield return new("tension", life.Tension!.Stress.Value / 1e6, "MPa", $"on the body: {life.Tension.Stress.From}", "engineering-default", life.Tension.Stress.Provenance);
        yield return new("bends an hour", rate.Result.BendsPerHour, "", "wheels times band speed over loop", "derived", Provenance.Derived);
        yield return new("median bends", rate.Result.MedianBends, "", "stress-life line of the body's hardness with the factors of gullet and weld", "roessle-fatemi-2000", settings.ProvenanceOf(BladeSettings.GulletBending));
        if (life.RustFactor is { } rust)
        {
            yield return new("rust in the gullets: life", rust, "×", "median bends with the strength of the gullets times 0.7, over those without", "engineering-default", Provenance.EngineeringDefault);
        }

        if (life.BurrFactor is { } burrs)
        {
            yield return new("burrs in the gullets: life", burrs, "×", "median bends with the surface factor of a punched gullet, over those of a ground one", "noll-lipson-1946", Provenance.EngineeringDefault);
        }

        if (life.MedianHours is { } median)
        {
            yield return new("median life on this saw", median, "h", "median bends over bends an hour", "derived", Provenance.EngineeringDefault);
            yield return new("1 in 10 broken", life.OneInTenHours!.Value, "h", "from scatter alone", "derived", settings.ProvenanceOf(LifeSettings.Shape));
            yield return new("hours left", life.HoursLeft!.Value, "h", "until life used is 1", "derived", Provenance.EngineeringDefault);
        }

        if (life.BreakChance is { } chance)
        {
            yield return new($"chance of a break in {Wording.Hours(settings[LifeSettings.ChanceHours])}", chance, "", "over what is known of the shop's level of life, the blade known to be whole", "derived", Provenance.EngineeringDefault);
        }
    }

    private static IEnumerable<Figure> OfEdge(BladeAdvice blade)
    {
        Sharpness edge = blade.Edge;
        yield return new("edge radius", edge.RadiusM * 1e6, "µm", "radius after the last grind, running in, and wear times path", "engineering-default", edge.Wear.Provenance);
        yield return new("path since the last sharpening", edge.PathKm, "km", "wood path per tooth times the factors of wood and dirt", "derived", Provenance.EngineeringDefault);
        yield return new("path to dull", edge.PathToDullKm, "km", "edge law solved for the dull radius", "derived", edge.Wear.Provenance);
        if (edge.Left is { } left)
        {
            yield return new("metres left", left.Metres, "m", $"path left times feed times loop over band speed and depth, {Wording.Number(left.DepthM * 1e3, 0)} mm deep at {Wording.Number(left.FeedMps * 60, 1)} m/min", "derived", edge.Wear.Provenance);
        }
    }

    private static Figure Given(string name, Known known, double scale, string unit) => new(name, known.Value * scale, unit, known.From, Source(known.Provenance), known.Provenance);

    private static string Source(Provenance provenance) => provenance switch
    {
        Provenance.CommonPractice => "common-practice",
        Provenance.FromMemory => "from-memory",
        Provenance.Published => "spons",
        Provenance.Derived or Provenance.Yours => "derived",
        _ => "engineering-default",
    };
}
