using BladeLog.Handbook.Fatigue;
using BladeLog.Records;

namespace BladeLog.Advice.Life;

/// <summary>Life used at the two places where a blade breaks, and both together. 1: half of such blades have broken.</summary>
/// <param name="Gullet">The worse face of the gullets.</param>
/// <param name="Weld">The present weld.</param>
/// <param name="Blade">Either, whichever breaks first.</param>
public readonly record struct UsedLife(double Gullet, double Weld, double Blade)
{
    public static UsedLife Of(double gullet, double weld, double shape) => new(gullet, weld, Miner.SystemUsed(gullet, weld, shape));

    /// <summary>After more hours at a damage rate.</summary>
    public UsedLife After(double hours, Damage rate, double shape)
    {
        ArgumentNullException.ThrowIfNull(rate);
        return Of(Gullet + (hours * rate.Gullet), Weld + (hours * rate.Weld), shape);
    }

    /// <summary>Hours until a mark is reached; none once past it.</summary>
    public double HoursTo(double mark, Damage rate, double shape)
    {
        ArgumentNullException.ThrowIfNull(rate);
        if (Blade >= mark)
        {
            return 0;
        }

        // Used life is convex in the hours, so Newton from the far side comes down on the root and never passes it.
        double h = Math.Min((mark - Gullet) / rate.Gullet, (mark - Weld) / rate.Weld);
        if (!double.IsFinite(h))
        {
            return double.PositiveInfinity;
        }

        for (int i = 0; i < 60; i++)
        {
            double g = Gullet + (h * rate.Gullet), w = Weld + (h * rate.Weld), u = Miner.SystemUsed(g, w, shape);
            double slope = ((rate.Gullet * Math.Pow(g / u, shape - 1)) + (rate.Weld * Math.Pow(w / u, shape - 1)));
            double step = (u - mark) / slope;
            h -= step;
            if (Math.Abs(step) <= 1e-12 * h)
            {
                break;
            }
        }

        return Math.Max(0, h);
    }
}

/// <summary>The life of a blade as its record tells it, and what is left on the saw it is asked on.</summary>
public sealed record LifeOfBlade
{
    /// <summary>From the record alone.</summary>
    public required UsedLife Used { get; init; }

    /// <summary>Both ends of the band that holds 80 of 100; of an unknown history, of what it may have used before.</summary>
    public required double UsedLow { get; init; }

    public required double UsedHigh { get; init; }

    /// <summary>Use before this record began is known only as a range: the bar is hatched.</summary>
    public required bool UnknownHistory { get; init; }

    /// <summary>Used life with the upper end of an unknown history: what the advice reckons with.</summary>
    public required UsedLife Reckoned { get; init; }

    public required double Hours { get; init; }

    public required double Bends { get; init; }

    /// <summary>The saw asked on; null where the blade fits none.</summary>
    public SawNow? On { get; init; }

    public double SpeedMps { get; init; }

    public BladeTension? Tension { get; init; }

    public Damage? Rate { get; init; }

    /// <summary>What rust in the gullets leaves of the median bends on the saw asked on; null: none was seen.</summary>
    public double? RustFactor { get; init; }

    /// <summary>What burrs in the gullets leave of them; null: none were seen.</summary>
    public double? BurrFactor { get; init; }

    public LifeVerdict? Verdict => Rate?.Result.Verdict;

    /// <summary>Hours are told between unsuitable and not limiting; outside them the ladder's word stands alone.</summary>
    public bool HoursShown => Verdict is LifeVerdict.Marginal or LifeVerdict.Finite;

    public double? MedianHours => HoursShown ? Rate!.Result.MedianHours : null;

    public double? OneInTenHours => HoursShown ? Rate!.Result.TenthPercentileBends / Rate.Result.BendsPerHour : null;

    public double? HoursLeft { get; init; }

    public double? HoursToWatch { get; init; }

    public double? HoursToRetire { get; init; }

    /// <summary>Chance of a break in the next hours (see <see cref="LifeSettings.ChanceHours"/>), the blade known to be whole.</summary>
    public double? BreakChance { get; init; }

    public double? ThicknessToWheel { get; init; }

    public static LifeOfBlade Of(BladeFile file, BladeBody body, SawNow? on, DamageTable damage, LevelPrior level, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(damage);
        ArgumentNullException.ThrowIfNull(level);
        ArgumentNullException.ThrowIfNull(settings);
        double shape = settings[LifeSettings.Shape], faceA = 0, faceB = 0, weld = 0, bends = 0;

        // Over wheels to one side the inner face never governs, so a blade never turned needs no second face.
        bool turned = file.Exposures.Any(e => e.InsideOut);
        foreach (ExposureLine line in file.Exposures)
        {
            double tension = line.TensionPa ?? body.TensionOn(line.Setup, file with { TensionThisSpellPa = null }, settings).Stress.Value;
            Damage rate = damage.Of(body.With(line.Marks), file.Weld, line.Setup, line.SpeedMps, tension, line.LoopM);
            bends += line.Hours * rate.Result.BendsPerHour;
            faceA += line.Hours * (line.InsideOut ? rate.InnerFace : rate.Gullet);
            faceB += line.Hours * (line.InsideOut ? rate.Gullet : turned ? rate.InnerFace : 0);

            if (line.OnThisWeld)
            {
                weld += line.Hours * rate.Weld;
            }
        }

        UsedLife used = UsedLife.Of(Math.Max(faceA, faceB), weld, shape);
        bool unknown = file.PriorUse is not null;
        UsedLife reckoned = unknown ? UsedLife.Of(used.Gullet + file.PriorUse!.UsedHigh, used.Weld, shape) : used;
        double F = level.BandFactor;
        LifeOfBlade life = new()
        {
            Used = used,
            Reckoned = reckoned,
            UnknownHistory = unknown,
            UsedLow = unknown ? used.Blade + file.PriorUse!.UsedLow : used.Blade / F,
            UsedHigh = unknown ? used.Blade + file.PriorUse!.UsedHigh : used.Blade * F,
            Hours = file.Hours,
            Bends = bends,
        };
        return on is null ? life : life.AskedOn(file, body, on, damage, level, settings);
    }

    private LifeOfBlade AskedOn(BladeFile file, BladeBody body, SawNow on, DamageTable damage, LevelPrior level, AdviceSettings settings)
    {
        double shape = settings[LifeSettings.Shape], v = on.Setup.UsualSpeedMps;
        BladeTension tension = body.TensionOn(on.Setup, file, settings);
        Damage rate = damage.Of(body, file.Weld, on.Setup, v, tension.Stress.Value, file.LoopM ?? on.Setup.LoopM);
        double? Left(BladeBody without) => rate.Result.MedianBends / damage.Of(without, file.Weld, on.Setup, v, tension.Stress.Value, file.LoopM ?? on.Setup.LoopM).Result.MedianBends;
        LifeOfBlade asked = this with
        {
            RustFactor = body.Rusty ? Left(body with { Rusty = false }) : null,
            BurrFactor = body.GulletFinish == GulletFinish.Punched ? Left(body with { GulletFinish = GulletFinish.Ground }) : null,
            On = on,
            SpeedMps = v,
            Tension = tension,
            Rate = rate,
            ThicknessToWheel = body.Thickness.Value / on.Setup.Wheels.Min(w => w.DiameterM),
            BreakChance = level.BreakChance(Reckoned.Blade, Reckoned.After(settings[LifeSettings.ChanceHours], rate, shape).Blade - Reckoned.Blade),
        };
        return !asked.HoursShown ? asked : asked with
        {
            HoursLeft = Reckoned.HoursTo(1, rate, shape),
            HoursToWatch = Reckoned.HoursTo(settings.WatchMark, rate, shape),
            HoursToRetire = Reckoned.HoursTo(settings[LifeSettings.RetireMark], rate, shape),
        };
    }
}
