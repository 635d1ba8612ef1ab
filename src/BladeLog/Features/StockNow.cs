using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Ui;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features;

/// <summary>The stock of every kind as it stands, reckoned in one way for every page that tells it.</summary>
internal static class StockNow
{
    /// <param name="desk">The request.</param>
    /// <param name="leadDays">From order to delivery; null: the shop's setting.</param>
    /// <param name="least">Least at hand of each kind in use; null: the shop's setting.</param>
    public static async Task<IReadOnlyList<StockLine>> Of(Desk desk, double? leadDays = null, double? least = null)
    {
        ShopAdvice advice = await desk.Advice();
        double weeks = advice.Settings[StockSettings.RecentWeeks];
        List<Spec> specs = await desk.Db.Specs.AsNoTracking().ToListAsync();
        Dictionary<int, int> moved = await desk.Db.StockMoves.AsNoTracking().GroupBy(m => m.SpecId).Select(g => new { g.Key, Sum = g.Sum(m => m.Count) }).ToDictionaryAsync(g => g.Key, g => g.Sum);
        return StockCount.Of(
            specs.OrderBy(s => s.Code, NaturalOrder.Instance),
            advice,
            await HoursPerWeek(desk, desk.Now.AddDays(-7 * weeks), weeks),
            moved,
            leadDays ?? advice.Settings[StockSettings.LeadDays],
            (int)(least ?? advice.Settings[StockSettings.Least]));
    }

    /// <summary>"Order 2 of E1 by 8 Dec"; null: nothing to order within a year.</summary>
    public static string? Order(StockLine line, DateTime now, ShopUnits units) => line.OrderInDays is { } days
        ? $"Order {line.Order} of {line.Spec.Code} {(days == 0 ? "now" : "by " + Said.Day(now.AddDays(days), now, units))}"
        : null;

    private static async Task<Dictionary<int, double>> HoursPerWeek(Desk desk, DateTime since, double weeks)
    {
        var shares = await desk.Db.RunShares.AsNoTracking().Where(s => s.MountId != null)
            .Join(desk.Db.Runs.Where(r => r.UntilUtc > since), s => s.RunId, r => r.EntryId, (s, r) => new { s.MountId, s.Ms })
            .Join(desk.Db.Mounts, s => s.MountId, m => m.EntryId, (s, m) => new { m.Blade.SpecId, s.Ms })
            .GroupBy(s => s.SpecId).Select(g => new { g.Key, Ms = g.Sum(s => s.Ms) }).ToListAsync();
        return shares.ToDictionary(s => s.Key, s => s.Ms / 3_600_000.0 / weeks);
    }
}
