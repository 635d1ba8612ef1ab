using BladeLog.Records;
using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Saws;

/// <summary>A time in which a saw ran and no blade is written as on it.</summary>
/// <param name="From">When it begins.</param>
/// <param name="Until">When it ends: with the last such run, or where the next blade goes on.</param>
/// <param name="StillEmpty">No blade goes on after it.</param>
internal sealed record NoBladeKnown(DateTime From, DateTime Until, bool StillEmpty)
{
    /// <summary>The oldest such time; null: every hour has its blade.</summary>
    public static async Task<NoBladeKnown?> First(ShopDb db, int sawId)
    {
        var runs = await db.RunShares.AsNoTracking().Where(s => s.MountId == null)
            .Join(db.Runs.Where(r => r.SawId == sawId), s => s.RunId, r => r.EntryId, (_, r) => new { r.FromUtc, r.UntilUtc }).Distinct().ToListAsync();
        return runs.Count == 0
            ? null
            : First(runs.Select(r => (r.FromUtc, r.UntilUtc)), [.. (await FactReader.ReadSpells(db, sawId)).Where(s => s.SawId == sawId)]);
    }

    /// <summary>What of the windows lies outside every spell, from its beginning to the next spell at most.</summary>
    public static NoBladeKnown? First(IEnumerable<(DateTime From, DateTime Until)> windows, IReadOnlyList<Spell> spells)
    {
        var bare = windows.SelectMany(w => Outside(w, spells)).OrderBy(w => w.From).ToList();
        if (bare.Count == 0)
        {
            return null;
        }

        var from = bare[0].From;
        var next = spells.Where(s => s.From > from).Select(s => s.From).DefaultIfEmpty(DateTime.MaxValue).Min();
        return new NoBladeKnown(from, bare.Where(w => w.From < next).Max(w => w.Until), next == DateTime.MaxValue);
    }

    private static IEnumerable<(DateTime From, DateTime Until)> Outside((DateTime From, DateTime Until) window, IReadOnlyList<Spell> spells)
    {
        var at = window.From;
        foreach (var spell in spells.Where(s => s.From < window.Until && s.End > window.From).OrderBy(s => s.From))
        {
            if (spell.From > at)
            {
                yield return (at, spell.From);
            }

            at = spell.End > at ? spell.End : at;
        }

        if (at < window.Until)
        {
            yield return (at, window.Until);
        }
    }
}
