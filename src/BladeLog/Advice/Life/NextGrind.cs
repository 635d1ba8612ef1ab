using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Life;

public enum GrindRefusal
{
    /// <summary>The next interval would carry it past the retire mark.</summary>
    LifeUsed,

    /// <summary>It would be narrower than the least width.</summary>
    TooNarrow,

    /// <summary>The teeth have had all the grinds they allow.</summary>
    TeethSpent,

    /// <summary>It never was worth sharpening.</summary>
    NeverWorth,
}

/// <summary>From where the usual interval between sharpenings is taken.</summary>
public enum IntervalFrom
{
    /// <summary>The target of saws that take logs.</summary>
    MillTarget,

    /// <summary>Hours of this blade over its sharpenings and the part of its present edge that is used.</summary>
    OwnHistory,

    /// <summary>Path to dull at the reference depth and feed.</summary>
    ReferenceFeed,
}

/// <summary>Whether to pay for another grind, decided while the blade may still be away.</summary>
public sealed record NextGrind
{
    /// <summary>Null: it pays.</summary>
    public GrindRefusal? Refusal { get; init; }

    public bool Pays => Refusal is null;

    public double IntervalHours { get; init; }

    public IntervalFrom From { get; init; }

    /// <summary>Life used at the end of the next interval.</summary>
    public double UsedAfter { get; init; }

    /// <summary>Chance of a break in that interval.</summary>
    public double BreakChance { get; init; }

    public double WidthAfterM { get; init; }

    public double GrindM { get; init; }

    /// <summary>Whole grinds the width still allows.</summary>
    public double GrindsLeftByWidth { get; init; }

    public static NextGrind Of(BladeFile file, BladeBody body, LifeOfBlade life, Sharpness edge, LevelPrior level, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(life);
        ArgumentNullException.ThrowIfNull(edge);
        ArgumentNullException.ThrowIfNull(level);
        ArgumentNullException.ThrowIfNull(settings);
        double grind = GrindOf(file, body, settings), width = body.Width.Value - grind;
        (double hours, IntervalFrom from) = Interval(file, life, edge, settings);
        double more = life.Rate is { } rate ? hours * rate.Blade : 0, after = life.Reckoned.Blade + more;
        return new NextGrind
        {
            IntervalHours = hours,
            From = from,
            UsedAfter = after,
            BreakChance = level.BreakChance(life.Reckoned.Blade, more),
            GrindM = grind,
            WidthAfterM = width,
            GrindsLeftByWidth = Handbook.Wear.Sharpening.GrindsLeft(new Length(body.Width.Value), new Length(body.LeastWidth.Value), new Length(grind)),
            Refusal = file.Spec.MostSharpenings == 0 ? GrindRefusal.NeverWorth
                : after >= settings[LifeSettings.RetireMark] ? GrindRefusal.LifeUsed
                : width < body.LeastWidth.Value - 1e-9 ? GrindRefusal.TooNarrow
                : file.Spec.MostSharpenings is int most && file.Sharpenings >= most ? GrindRefusal.TeethSpent
                : null,
        };
    }

    /// <summary>Width lost in one grind: what this blade has lost so far in each, else the setting.</summary>
    public static double GrindOf(BladeFile file, BladeBody body, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(settings);
        // What a blade lost before this record began was lost in grinds nobody counted.
        double from = file.PriorUse is null ? body.NewWidth.Value : file.PriorUse.WidthM ?? body.Width.Value, lost = from - body.Width.Value;
        double counted = file.Sharpenings - (file.PriorUse?.Sharpenings ?? 0);
        return counted > 0 && lost > 0 ? lost / counted : settings[BladeSettings.Grind] * 1e-3;
    }

    private static (double Hours, IntervalFrom From) Interval(BladeFile file, LifeOfBlade life, Sharpness edge, AdviceSettings settings)
    {
        if (life.On is { } mill && mill.Setup.Takes.HasFlag(Takes.Log))
        {
            return (settings[LifeSettings.MillInterval], IntervalFrom.MillTarget);
        }

        double own = file.Exposures.Where(e => !e.OfAncestor).Sum(e => e.Hours);
        if (file.Sharpenings > 0 && own > 0)
        {
            return (own / (file.Sharpenings + Math.Min(1, edge.Used)), IntervalFrom.OwnHistory);
        }

        if (life.On is not { } saw)
        {
            return (0, IntervalFrom.ReferenceFeed);
        }

        (double depth, double feed) = Sharpness.Reference(saw.Setup, settings);
        MetresLeft whole = (edge with { PathKm = 0 }).LeftAt(depth, feed, file.LoopM ?? saw.Setup.LoopM, life.SpeedMps);
        return (whole.Metres / feed / 3600, IntervalFrom.ReferenceFeed);
    }
}
