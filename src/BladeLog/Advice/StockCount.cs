using BladeLog.Advice.Life;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>What is there of one specification, and when to order more.</summary>
public sealed record StockLine
{
    public required Spec Spec { get; init; }

    /// <summary>Never mounted: folded, or counted without a tag.</summary>
    public required int Spare { get; init; }

    /// <summary>Used and fit to go on, or to be looked at first.</summary>
    public required int Ready { get; init; }

    public required int ToSharpen { get; init; }

    public required int OnSaw { get; init; }

    public required int Away { get; init; }

    public required int OnHold { get; init; }

    /// <summary>Tags of all that are not gone.</summary>
    public required IReadOnlyList<BladeAdvice> Blades { get; init; }

    /// <summary>What counts as stock: at hand and not on hold. A blade at the sharpener does not.</summary>
    public int AtHand => Spare + Ready + ToSharpen + OnSaw;

    public required int Least { get; init; }

    /// <summary>The least is the kind's own, not the one for every kind.</summary>
    public required bool OwnLeast { get; init; }

    /// <summary>Hours a week the kind ran lately.</summary>
    public required double HoursPerWeek { get; init; }

    /// <summary>Blades expected to be gone within the supplier's lead time.</summary>
    public required double GoneInLeadTime { get; init; }

    /// <summary>Days until fewer than the least are likely to be at hand; null: not within a year.</summary>
    public int? DaysUntilShort { get; init; }

    /// <summary>Days until an order must be out; 0: now. Null: nothing to order within a year.</summary>
    public int? OrderInDays { get; init; }

    /// <summary>How many to order then.</summary>
    public int Order { get; init; }
}

/// <summary>
/// Stock of each kind of blade. The hours a kind ran lately go on; the blades of it that are at hand and in use share them
/// alike. A blade of used life U is gone within t weeks for certain once U + h d passes the retire mark, h its share of
/// hours and d its damage an hour; before that with its chance to break in those hours. The sum over the blades is the
/// number expected to be gone. Short is when what is at hand less that number lies nearer to one under the least than to
/// the least itself; an order must be out the lead time before.
/// </summary>
public static class StockCount
{
    private const int Horizon = 365;

    /// <param name="specs">All specifications.</param>
    /// <param name="advice">The shop's advice.</param>
    /// <param name="hoursPerWeek">Hours a week each specification ran lately, by its id.</param>
    /// <param name="uncounted">Spares without a tag, by specification.</param>
    /// <param name="leadDays">From order to delivery.</param>
    /// <param name="least">Least at hand of a kind that is in use and has no least of its own.</param>
    public static IReadOnlyList<StockLine> Of(
        IEnumerable<Spec> specs, ShopAdvice advice, IReadOnlyDictionary<int, double> hoursPerWeek, IReadOnlyDictionary<int, int> uncounted, double leadDays, int least)
    {
        ArgumentNullException.ThrowIfNull(specs);
        ArgumentNullException.ThrowIfNull(advice);
        ArgumentNullException.ThrowIfNull(hoursPerWeek);
        ArgumentNullException.ThrowIfNull(uncounted);
        ILookup<int, BladeAdvice> blades = advice.Now.Blades
            .Where(b => b.Place != Place.Gone && b.Break is null && b.Retirement is null)
            .Select(advice.Of).ToLookup(b => b.File.Blade.SpecId);
        return [.. specs.Select(s => Line(s, [.. blades[s.Id]], advice, hoursPerWeek.GetValueOrDefault(s.Id), uncounted.GetValueOrDefault(s.Id), leadDays, least))];
    }

    /// <summary>A blade that has never been on a saw: one line with its like.</summary>
    public static bool IsSpare(BladeAdvice blade)
    {
        ArgumentNullException.ThrowIfNull(blade);
        return blade.File.Blade.Folded && blade.File.LastSawId is null && blade.File.Place is (Place.Rack or Place.Bench) && blade.File.Hours == 0;
    }

    private static StockLine Line(Spec spec, IReadOnlyList<BladeAdvice> blades, ShopAdvice advice, double hours, int uncounted, double leadDays, int least)
    {
        BladeAdvice[] here = [.. blades.Where(b => b.File.Place != Place.AtSharpener && b.State != BladeState.Hold)];
        BladeAdvice[] used = [.. here.Where(b => !IsSpare(b))], off = [.. used.Where(b => b.File.Place != Place.OnSaw)];
        int spare = Math.Max(0, uncounted) + here.Count(IsSpare);
        BladeAdvice[] inUse = used.Length > 0 ? used : here;
        int needed = spec.LeastStock ?? (hours > 0 ? least : 0), atHand = used.Length + spare;
        double Gone(double days) => ExpectedGone(inUse, hours * days / 7, advice);
        int? shortIn = needed == 0 ? null : Enumerable.Range(0, Horizon + 1).Cast<int?>().FirstOrDefault(d => atHand - Gone(d!.Value) <= needed - 0.5);
        return new StockLine
        {
            Spec = spec,
            Blades = blades,
            Spare = spare,
            Ready = off.Count(b => b.State != BladeState.Sharpen),
            ToSharpen = off.Count(b => b.State == BladeState.Sharpen),
            OnSaw = used.Length - off.Length,
            Away = blades.Count(b => b.File.Place == Place.AtSharpener && b.State != BladeState.Hold),
            OnHold = blades.Count(b => b.State == BladeState.Hold),
            Least = needed,
            OwnLeast = spec.LeastStock is not null,
            HoursPerWeek = hours,
            GoneInLeadTime = Gone(leadDays),
            DaysUntilShort = shortIn,
            OrderInDays = shortIn is { } s ? Math.Max(0, (int)Math.Floor(s - leadDays)) : null,
            // What is short when the order, sent then, comes in.
            Order = shortIn is { } at ? Math.Max(1, (int)Math.Ceiling(needed + Gone(Math.Max(at, leadDays)) - atHand - 1e-9)) : 0,
        };
    }

    /// <summary>Blades expected to be gone after so many more hours of their kind.</summary>
    public static double ExpectedGone(IReadOnlyList<BladeAdvice> inUse, double hours, ShopAdvice advice)
    {
        ArgumentNullException.ThrowIfNull(inUse);
        ArgumentNullException.ThrowIfNull(advice);
        double mark = advice.Settings[LifeSettings.RetireMark], shape = advice.Settings[LifeSettings.Shape], share = inUse.Count > 0 ? hours / inUse.Count : 0;
        return inUse.Sum(b =>
        {
            if (b.Record.Rate is not { } rate)
            {
                return 0;
            }

            UsedLife now = b.Record.Reckoned;
            double after = now.After(share, rate, shape).Blade;
            return after >= mark ? 1 : advice.Level.BreakChance(now.Blade, after - now.Blade);
        });
    }
}
