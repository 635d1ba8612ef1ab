using BladeLog.Advice.Life;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>Cost of a job, minor units, line by line.</summary>
/// <param name="Labour">Rate times minutes.</param>
/// <param name="Wear">The share of a sharpening that the path takes.</param>
/// <param name="Life">The share of the blade it takes, and the cost of a break times its chance.</param>
/// <param name="Timber">Wood turned to dust.</param>
/// <param name="Nail">Chance of a nail times what it would spoil.</param>
public sealed record CostLines(double Labour, double Wear, double Life, double Timber, double Nail)
{
    public double Total => Labour + Wear + Life + Timber + Nail;
}

/// <summary>A whole job with one blade at its working feed.</summary>
public sealed record JobCost
{
    public required double SawMinutes { get; init; }

    public required double Minutes { get; init; }

    public required double AreaM2 { get; init; }

    /// <summary>Equivalent path per tooth the job takes, km.</summary>
    public required double PathKm { get; init; }

    public required double EdgeAfterM { get; init; }

    public required double RunHours { get; init; }

    /// <summary>Life used by the job.</summary>
    public required double LifeSpent { get; init; }

    public required double BreakChance { get; init; }

    public required CostLines Cost { get; init; }

    public static JobCost Of(CutWork work, BladeAdvice blade, SawNow saw, double speedMps, double feedMps, bool relief, Damage rate, LevelPrior level, Shop shop, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(work);
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(saw);
        ArgumentNullException.ThrowIfNull(rate);
        ArgumentNullException.ThrowIfNull(level);
        ArgumentNullException.ThrowIfNull(shop);
        ArgumentNullException.ThrowIfNull(settings);
        BladeFile file = blade.File;
        double q = relief ? settings[CutSettings.ReliefFactor] : 1, n = work.Cuts, l = work.LengthM, loop = file.LoopM ?? saw.Setup.LoopM;
        double sawMinutes = q * n * l / feedMps / 60;
        bool mounted = saw.MountedBladeId == file.Blade.Id;
        double minutes = sawMinutes + (settings[CutSettings.Handling] * work.Pieces) + (mounted ? 0 : saw.Setup.ChangeMinutes);

        double area = q * n * l * work.HeightM;
        double path = Kinematics.WoodPathPerTooth(new Area(area), new Speed(feedMps), new Length(loop), new Speed(speedMps)).Metres
            * work.WoodFactor.Value * work.DirtFactor.Value / 1000;

        double hours = (sawMinutes + (settings[CutSettings.RunningBetween] * work.Pieces)) / 60;
        UsedLife now = blade.Record.Reckoned;
        double spent = now.After(hours, rate, settings[LifeSettings.Shape]).Blade - now.Blade;
        double chance = level.BreakChance(now.Blade, spent);

        double price = file.Spec.PriceMinor ?? 0, sharpening = file.Spec.MostSharpenings == 0 ? 0 : file.Spec.SharpeningPriceMinor ?? 0;
        double grinds = file.Spec.MostSharpenings ?? file.Sharpenings + blade.Grind.GrindsLeftByWidth;
        double edgeShare = path / blade.Edge.PathToDullKm, largest = blade.Limits.Largest;
        double ofBlade = largest >= settings[LifeSettings.RetireMark] ? 0 : price * Math.Max(spent, edgeShare / (grinds + 1));
        double atRisk = Math.Max(0, (price * (1 - largest)) - (sharpening * Math.Min(1, blade.Edge.Used)));
        return new JobCost
        {
            SawMinutes = sawMinutes,
            Minutes = minutes,
            AreaM2 = area,
            PathKm = path,
            EdgeAfterM = blade.Edge.RadiusAfter(path),
            RunHours = hours,
            LifeSpent = spent,
            BreakChance = chance,
            Cost = new CostLines(
                shop.RateMinorPerHour * minutes / 60,
                sharpening * edgeShare,
                ofBlade + (saw.Setup.BreakCostMinor * chance),
                work.TimberMinorPerM3 * area * blade.Body.Kerf.Value,
                work.Cut.NailChance * atRisk),
        };
    }
}
