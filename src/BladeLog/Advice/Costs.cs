using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>A blade on a saw from a time to a time; no end: it is still on.</summary>
public readonly record struct SpellOf(int SawId, int BladeId, DateTime From, DateTime? Until);

/// <summary>What was done.</summary>
/// <param name="Metres">Length sawn.</param>
/// <param name="AreaM2">Face sawn, one side of the cut.</param>
/// <param name="Cuts">Pieces.</param>
/// <param name="Hours">Hours run; not those of the blade it was cut from.</param>
public readonly record struct WorkDone(double Metres, double AreaM2, long Cuts, double Hours)
{
    /// <summary>Board feet of boards an inch thick: a square foot of face each.</summary>
    public double BoardFeet => AreaM2 / (Exact.Foot * Exact.Foot);

    public static WorkDone operator +(WorkDone a, WorkDone b) => new(a.Metres + b.Metres, a.AreaM2 + b.AreaM2, a.Cuts + b.Cuts, a.Hours + b.Hours);
}

/// <summary>What was spent, minor units.</summary>
/// <param name="Bought">Price of the blades; nothing for one cut from another.</param>
/// <param name="Sharpened">All sharpenings.</param>
/// <param name="Broke">Minutes lost in breaks and what else they cost, the blade itself apart.</param>
public readonly record struct MoneySpent(long Bought, long Sharpened, long Broke)
{
    public long Total => Bought + Sharpened + Broke;

    public static MoneySpent operator +(MoneySpent a, MoneySpent b) => new(a.Bought + b.Bought, a.Sharpened + b.Sharpened, a.Broke + b.Broke);
}

/// <summary>Money over work, minor units. Null where nothing of the kind was logged.</summary>
public sealed record CostSoFar(string Name, WorkDone Work, MoneySpent Spent)
{
    public double? PerMetre => Over(Work.Metres);

    public double? PerSquareMetre => Over(Work.AreaM2);

    public double? PerBoardFoot => Over(Work.BoardFeet);

    public double? PerCut => Over(Work.Cuts);

    public double? PerHour => Over(Work.Hours);

    private double? Over(double of) => of > 0 ? Spent.Total / of : null;
}

/// <summary>Sharpenings made in the shop or by a service.</summary>
public sealed record GrindCost(bool InHouse, int Count, long Spent)
{
    public double? Each => Count > 0 ? (double)Spent / Count : null;
}

/// <summary>Keep a blade on or retire it now: what either costs over the next hours, minor units.</summary>
/// <param name="Chance">Chance that it breaks in them.</param>
/// <param name="Hours">How many hours.</param>
/// <param name="Keep">That chance times the cost of a break on its saw.</param>
/// <param name="Retire">The unused part of its price, given up.</param>
/// <param name="BreakCost">The cost of a break on its saw.</param>
public sealed record KeepOrRetire(double Chance, double Hours, double Keep, double Retire, long BreakCost)
{
    public bool KeepIsCheaper => Keep <= Retire;

    /// <summary>Null for a held blade, of which no chance is told, and where no saw is known.</summary>
    public static KeepOrRetire? Of(BladeAdvice blade, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(settings);
        return blade.Life is { BreakChance: { } chance, On: { } saw } && blade.State is not (BladeState.Broken or BladeState.Retired)
            ? new KeepOrRetire(
                chance,
                settings[LifeSettings.ChanceHours],
                chance * saw.Setup.BreakCostMinor,
                (1 - blade.Limits.Largest) * (blade.File.Spec.PriceMinor ?? 0),
                saw.Setup.BreakCostMinor)
            : null;
    }
}

/// <summary>What blades cost for what they cut.</summary>
public static class Costs
{
    /// <summary>Each blade that was bought here or cut here, by what it cut so far.</summary>
    public static IReadOnlyDictionary<int, CostSoFar> OfBlades(
        IReadOnlyList<BladeFile> blades,
        IEnumerable<SpellOf> spells,
        IEnumerable<CutDone> cuts,
        IEnumerable<Sharpening> sharpenings,
        IEnumerable<Break> breaks,
        Shop shop)
    {
        ArgumentNullException.ThrowIfNull(blades);
        ArgumentNullException.ThrowIfNull(shop);
        ILookup<int, SpellOf> onSaw = spells.OrderBy(s => s.From).ToLookup(s => s.SawId);
        Dictionary<int, WorkDone> work = [];
        foreach (CutDone cut in cuts)
        {
            // A cut's time is when it ended: the blade that was on until then made it.
            SpellOf? made = onSaw[cut.SawId].Cast<SpellOf?>().LastOrDefault(s => s!.Value.From < cut.Entry.AtUtc && (s.Value.Until is not { } until || cut.Entry.AtUtc <= until));
            if (made is { } spell)
            {
                double metres = cut.LengthM * cut.Pieces;
                work[spell.BladeId] = work.GetValueOrDefault(spell.BladeId) + new WorkDone(metres, metres * cut.HeightM, cut.Pieces, 0);
            }
        }

        ILookup<int, Sharpening> ground = sharpenings.ToLookup(s => s.BladeId);
        ILookup<int, Break> broke = breaks.ToLookup(b => b.BladeId);
        return blades.ToDictionary(b => b.Blade.Id, b => new CostSoFar(
            b.Blade.Tag,
            work.GetValueOrDefault(b.Blade.Id) with { Hours = b.Exposures.Where(e => !e.OfAncestor).Sum(e => e.Hours) },
            new MoneySpent(
                b.Blade.ParentId is null ? b.Spec.PriceMinor ?? 0 : 0,
                ground[b.Blade.Id].Sum(s => s.PriceMinor ?? b.Spec.SharpeningPriceMinor ?? 0),
                broke[b.Blade.Id].Sum(x => (long)Math.Round((x.MinutesLost ?? 0) / 60 * shop.RateMinorPerHour) + (x.CostMinor ?? 0)))));
    }

    /// <summary>Several as one.</summary>
    public static CostSoFar Together(string name, IEnumerable<CostSoFar> costs)
    {
        ArgumentNullException.ThrowIfNull(costs);
        return costs.Aggregate(new CostSoFar(name, default, default), (a, b) => a with { Work = a.Work + b.Work, Spent = a.Spent + b.Spent });
    }

    public static IReadOnlyList<GrindCost> Grinds(IEnumerable<Sharpening> sharpenings, IReadOnlyList<BladeFile> blades)
    {
        ArgumentNullException.ThrowIfNull(sharpenings);
        Dictionary<int, long> price = blades.ToDictionary(b => b.Blade.Id, b => b.Spec.SharpeningPriceMinor ?? 0);
        return
        [
            .. sharpenings.GroupBy(s => s.BatchId is null).OrderByDescending(g => g.Key)
                .Select(g => new GrindCost(g.Key, g.Count(), g.Sum(s => s.PriceMinor ?? price.GetValueOrDefault(s.BladeId)))),
        ];
    }

    /// <summary>What teeth alone cost for a square metre of reference wood, minor units.</summary>
    /// <remarks>(S + P/(n + 1))/x_max times the path of a tooth in a square metre, v/(f L): a sharpening and its share of the price for each edge.</remarks>
    public static double ToothCost(double sharpeningMinor, double priceMinor, int grinds, double pathToDullKm, Speed feed, Length loop, Speed bandSpeed)
    {
        if (!(pathToDullKm > 0) || grinds < 0)
        {
            throw new ArgumentOutOfRangeException(nameof(pathToDullKm), "An edge must last some path, and grinds cannot be below none.");
        }

        double km = Kinematics.WoodPathPerTooth(new Area(1), feed, loop, bandSpeed).Metres / 1000;
        return (sharpeningMinor + (priceMinor / (grinds + 1))) / pathToDullKm * km;
    }
}
