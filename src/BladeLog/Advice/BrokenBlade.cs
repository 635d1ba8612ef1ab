using BladeLog.Advice.Life;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>What flexing has to do with a break.</summary>
public enum FlexingSays
{
    /// <summary>No saw known, or nothing run.</summary>
    Nothing,

    /// <summary>Even the high end of the band lies under the mark where 1 in 10 breaks.</summary>
    TooEarly,

    /// <summary>The band reaches that mark; the middle does not.</summary>
    Perhaps,

    /// <summary>Past the mark where 1 in 10 has broken.</summary>
    Due,
}

/// <summary>What a break cost, minor units.</summary>
/// <param name="Blade">The part of its price that its grinds had left.</param>
/// <param name="Time">Minutes lost at the shop's rate.</param>
/// <param name="Else">What else was entered.</param>
public sealed record BreakCost(long Blade, long Time, long Else)
{
    public long Total => Blade + Time + Else;
}

/// <summary>A broken blade as it was when it broke, asked on the saw it broke on.</summary>
public sealed record BrokenBlade
{
    public required Break Break { get; init; }

    public required BladeAdvice Blade { get; init; }

    /// <summary>The saw as it was set up then; null where it is not known.</summary>
    public SawNow? Saw { get; init; }

    /// <summary>Hours it ran before it broke: as told, else as its saws' hours add up.</summary>
    public required double HoursLow { get; init; }

    public required double HoursHigh { get; init; }

    public bool HoursUncertain => HoursHigh > HoursLow;

    /// <summary>Life used, at the low and the high end of the hours.</summary>
    public required double UsedAtLow { get; init; }

    public required double UsedAtHigh { get; init; }

    /// <summary>Both ends of the band that holds 80 of 100, over both ends of the hours.</summary>
    public required double BandLow { get; init; }

    public required double BandHigh { get; init; }

    /// <summary>Hours half of such blades reach on that saw; null where flexing does not limit or no saw is known.</summary>
    public double? MedianHours { get; init; }

    public double? OneInTenHours { get; init; }

    public required FlexingSays Flexing { get; init; }

    /// <summary>Chance that such a blade has broken by then: the handbook, with its doubt.</summary>
    public required double ChanceByThen { get; init; }

    public required BreakCost Cost { get; init; }

    /// <summary>What is still to be told of it.</summary>
    public bool ToComplete => Break.Site == BreakSite.Unknown || Break.MinutesLost is null;

    /// <param name="file">The blade as it stands now.</param>
    /// <param name="broke">The break.</param>
    /// <param name="joints">Times of its own joints.</param>
    /// <param name="advice">The shop's advice.</param>
    public static BrokenBlade Of(BladeFile file, Break broke, IEnumerable<DateTime> joints, ShopAdvice advice)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(broke);
        ArgumentNullException.ThrowIfNull(advice);
        BladeFile then = AtBreak(file, broke, joints);
        SawNow? saw = advice.Now.Saws.FirstOrDefault(s => s.Saw.Id == broke.SawId);
        if (saw is not null && then.Exposures.LastOrDefault(e => e.Setup.SawId == saw.Saw.Id) is { } last)
        {
            saw = saw with { Setup = last.Setup };
        }

        BladeAdvice blade = advice.On(then, saw);
        LifeOfBlade life = blade.Record;
        double hours = then.Hours, low = broke.HoursLow ?? broke.HoursHigh ?? hours, high = broke.HoursHigh ?? broke.HoursLow ?? hours;
        // The hours told move the end of its life, not the saws it ran on: damage goes with the hours.
        double atLow = hours > 0 ? life.Used.Blade * low / hours : 0, atHigh = hours > 0 ? life.Used.Blade * high / hours : 0;
        double F = advice.Level.BandFactor, bandHigh = life.UnknownHistory ? life.UsedHigh : atHigh * F;
        return new BrokenBlade
        {
            Break = broke,
            Blade = blade,
            Saw = saw,
            HoursLow = low,
            HoursHigh = high,
            UsedAtLow = atLow,
            UsedAtHigh = atHigh,
            BandLow = life.UnknownHistory ? life.UsedLow : atLow / F,
            BandHigh = bandHigh,
            MedianHours = life.MedianHours,
            OneInTenHours = life.OneInTenHours,
            Flexing = saw is null || hours == 0 ? FlexingSays.Nothing
                : bandHigh < advice.Settings.WatchMark ? FlexingSays.TooEarly
                : (atLow + atHigh) / 2 < advice.Settings.WatchMark ? FlexingSays.Perhaps
                : FlexingSays.Due,
            ChanceByThen = hours > 0 ? advice.Level.BreakChance(0, (atLow + atHigh) / 2) : 0,
            Cost = CostOf(broke, blade, advice.Now.Shop),
        };
    }

    /// <summary>Spells that began before it broke, each on the weld of that time.</summary>
    private static BladeFile AtBreak(BladeFile file, Break broke, IEnumerable<DateTime> joints)
    {
        DateTime[] before = [.. joints.Where(j => j < broke.LatestUtc)];
        DateTime? weld = before.Length > 0 ? before.Max() : null;
        return file with
        {
            Exposures =
            [
                .. file.Exposures.Where(e => e.FromUtc < broke.LatestUtc)
                    .Select(e => e with { OnThisWeld = !e.OfAncestor && (weld is { } w ? e.FromUtc >= w : file.Blade.ParentId is null) }),
            ],
            Break = broke,
            Retirement = null,
            Hold = null,
        };
    }

    private static BreakCost CostOf(Break broke, BladeAdvice blade, Shop shop)
    {
        double ground = blade.Limits.Shares.Where(s => s.Kind is LimitKind.Width or LimitKind.Sharpenings).Select(s => Math.Min(1, s.Share)).DefaultIfEmpty(0).Max();
        return new BreakCost(
            (long)Math.Round((blade.File.Spec.PriceMinor ?? 0) * (1 - ground)),
            (long)Math.Round((broke.MinutesLost ?? 0) / 60 * shop.RateMinorPerHour),
            broke.CostMinor ?? 0);
    }
}

/// <summary>A fracture and what it usually comes from: common practice of the trade.</summary>
public static class FractureCauses
{
    public static IReadOnlyList<(BreakSite Site, string Looks, IReadOnlyList<string> Causes)> All { get; } =
    [
        (BreakSite.Gullet, "Straight across from a gullet", ["bent too often, or over too small a wheel", "dull, so it was pushed", "too much pull", "burned or sharp-cornered gullets"]),
        (BreakSite.GulletAngled, "From a gullet, then at an angle", ["twisted: guides far apart or out of line", "a tight curve forced"]),
        (BreakSite.BackEdge, "From the back edge", ["thrust bearing pressed on, or seized", "back running on a wheel flange", "dirt between wheel and blade"]),
        (BreakSite.Weld, "At the weld", ["weld left hard, not drawn back", "ends out of line", "a lump left on the weld"]),
        (BreakSite.Body, "Along the middle of the body", ["rounded wheel rim", "running too far forward on the wheels (wide blades)", "wavy or blue body: heat"]),
        (BreakSite.TeethStripped, "Torn, teeth stripped", ["nail, stone or grit", "too few teeth in the cut", "fed into the edge of thin stock"]),
    ];

    public static IReadOnlyList<string> Of(BreakSite site) => All.FirstOrDefault(c => c.Site == site).Causes ?? [];

    /// <summary>Where bending fatigue shows itself first.</summary>
    public static bool MayBeFlexing(BreakSite site) => site is BreakSite.Gullet or BreakSite.Weld or BreakSite.Unknown;

    public static string Flexing(BrokenBlade broken)
    {
        ArgumentNullException.ThrowIfNull(broken);
        bool here = MayBeFlexing(broken.Break.Site);
        return (broken.Flexing, here) switch
        {
            (FlexingSays.Due, true) => "It was due: its hours alone explain it.",
            (FlexingSays.Due, false) => "Its hours would explain a break, but not one that began here.",
            (FlexingSays.Perhaps, true) => "Earlier than most, but flexing may explain it.",
            (FlexingSays.Perhaps, false) => "Flexing is not the likely cause: it began elsewhere.",
            (FlexingSays.TooEarly, _) when broken.Break.Site == BreakSite.Weld => "Far too early for flexing: blame the weld.",
            (FlexingSays.TooEarly, _) => "Far too early for flexing: look for another cause.",
            _ => "Its hours are not known, so flexing says nothing.",
        };
    }
}
