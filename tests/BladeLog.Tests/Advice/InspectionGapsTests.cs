using BladeLog.Advice;
using BladeLog.Features.Prints;

namespace BladeLog.Tests.Advice;

public class InspectionGapsTests
{
    private static readonly DateTime Day = new(2026, 3, 2, 8, 0, 0, DateTimeKind.Utc);

    [Fact]
    public void A_look_in_time_leaves_no_gap() =>
        Assert.Empty(InspectionGaps.Of(8, false, [Run(1, 5), Run(2, 3), Run(3, 8)], [], [Day.AddHours(2.5), Day.AddHours(3)]));

    [Fact]
    public void Running_on_past_the_rule_is_one_gap_until_the_look()
    {
        var gap = Assert.Single(InspectionGaps.Of(8, false, [Run(1, 5), Run(2, 4), Run(3, 2)], [], [Day.AddHours(5)]));
        Assert.Equal((Day.AddHours(2), Day.AddHours(5), 11 * 3_600_000L, false), (gap.DueUtc, gap.LookedUtc, gap.RanMs, gap.ByMount));
    }

    [Fact]
    public void What_was_never_looked_at_stays_open()
    {
        var gap = Assert.Single(InspectionGaps.Of(8, false, [Run(1, 8.1)], [], []));
        Assert.Null(gap.LookedUtc);
    }

    [Fact]
    public void Exactly_the_hours_allowed_is_no_gap() => Assert.Empty(InspectionGaps.Of(8, false, [Run(1, 8)], [], []));

    [Fact]
    public void Each_late_look_is_its_own_gap() =>
        Assert.Equal(2, InspectionGaps.Of(8, false, [Run(1, 9), Run(3, 9)], [], [Day.AddHours(2), Day.AddHours(4)]).Count);

    [Fact]
    public void A_mount_wants_a_look_since_the_mount_before_it()
    {
        (DateTime, int)[] mounts = [(Day.AddHours(1), 1), (Day.AddHours(5), 1), (Day.AddHours(9), 2)];
        var gap = Assert.Single(InspectionGaps.Of(null, true, [], mounts, [Day, Day.AddHours(8), Day.AddHours(20)]));
        Assert.Equal((Day.AddHours(5), Day.AddHours(8), true), (gap.DueUtc, gap.LookedUtc, gap.ByMount));
    }

    [Fact]
    public void Without_a_rule_there_are_no_gaps() => Assert.Empty(InspectionGaps.Of(null, false, [Run(1, 100)], [(Day, 1)], []));

    /// <summary>The sample shop's own generator left out looks until 38 came late, and counts them again from its files.</summary>
    [Fact]
    public async Task The_sample_shop_forgot_38_looks()
    {
        await using var app = await ShopApp.Sample();
        await using var db = app.NewContext();
        var gaps = (await AuditFacts.Read(db)).Gaps().SelectMany(g => g.Gaps).ToList();
        Assert.Equal(38, gaps.Count);
        Assert.All(gaps, g => Assert.NotNull(g.LookedUtc));
    }

    private static RunUpTo Run(double hour, double hours) => new(Day.AddHours(hour), (long)(hours * 3_600_000), 1);
}
