using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>One standing reading of a meter with its epoch, in time order.</summary>
internal sealed record MeterLine(int EntryId, DateTime At, long ReadingMs, int EpochId, EpochReason Reason)
{
    public static async Task<List<MeterLine>> Read(ShopDb db, int sawId)
    {
        var lines = await db.MeterReadings.AsNoTracking()
            .Where(r => r.SawId == sawId)
            .Join(db.MeterEpochs, r => r.EpochId, e => e.EntryId, (r, e) => new MeterLine(r.EntryId, r.Entry.AtUtc, r.ReadingMs, e.EntryId, e.Reason))
            .ToListAsync();
        return [.. lines.OrderBy(l => l.At).ThenBy(l => l.EntryId)];
    }
}
