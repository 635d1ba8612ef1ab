using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features;

/// <summary>What the person at the saw said of a blade that came off, which no hours tell.</summary>
internal static class DullBlades
{
    /// <summary>Came off as dull, and neither ground nor put on again since.</summary>
    public static async Task<IReadOnlySet<int>> OffAsDull(ShopDb db) => (await db.Dismounts.AsNoTracking()
        .Where(d => d.Reason == OffReason.Dull
            && !db.Sharpenings.Any(s => s.BladeId == d.Mount.BladeId && s.Entry.AtUtc >= d.Entry.AtUtc)
            && !db.Mounts.Any(m => m.BladeId == d.Mount.BladeId && m.Entry.AtUtc >= d.Entry.AtUtc))
        .Select(d => d.Mount.BladeId).ToListAsync()).ToHashSet();
}
