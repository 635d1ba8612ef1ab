using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Ui;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Blades;

/// <summary>Cracks that were measured more than once.</summary>
internal static class CrackFacts
{
    /// <summary>The blade's measured cracks and, where there are two to compare, its time on the saws.</summary>
    public static async Task<IReadOnlyList<Fact>> Read(ShopDb db, int bladeId)
    {
        List<Fact> facts =
        [
            .. await Past.Standing(db.Inspections.Where(f => f.BladeId == bladeId && f.CrackLengthM > 0)).ToListAsync(),
            .. await Past.Standing(db.Holds.Where(f => f.BladeId == bladeId && f.CrackLengthM > 0)).ToListAsync(),
        ];
        if (facts.Count > 1)
        {
            facts.AddRange(await Past.Standing(db.Mounts.Where(f => f.BladeId == bladeId)).ToListAsync());
            facts.AddRange(await Past.Standing(db.Dismounts.Where(f => f.Mount.BladeId == bladeId)).ToListAsync());
        }

        return facts;
    }

    /// <summary>How long the blade's crack was when it was measured last, for the field that asks it again.</summary>
    public static async Task<IReadOnlyDictionary<string, string?>> LastTime(ShopDb db, int bladeId, ShopUnits units)
    {
        var looks = db.Inspections.Where(f => f.BladeId == bladeId && f.CrackLengthM > 0).Select(f => new { f.EntryId, f.Entry.AtUtc, f.CrackLengthM });
        var holds = db.Holds.Where(f => f.BladeId == bladeId && f.CrackLengthM > 0).Select(f => new { f.EntryId, f.Entry.AtUtc, f.CrackLengthM });
        var last = await looks.Concat(holds).OrderByDescending(f => f.AtUtc).ThenByDescending(f => f.EntryId).Select(f => f.CrackLengthM).FirstOrDefaultAsync();
        return new Dictionary<string, string?> { [nameof(CrackForm.CrackLength)] = units.BareLength(last, Fields.CrackLength) };
    }

    /// <summary>What a crack grew by between two measurements. No life is reckoned from it: any crack that can be seen is a hold.</summary>
    public static IEnumerable<BladeFact> Of(BladeFile file, IReadOnlyList<Fact> facts, Wording words)
    {
        IEnumerable<CrackSeen> seen = facts.OfType<Inspection>().Select(f => new CrackSeen(f.Entry.AtUtc, f.CrackLengthM!.Value, f.Place))
            .Concat(facts.OfType<Records.Hold>().Select(f => new CrackSeen(f.Entry.AtUtc, f.CrackLengthM!.Value, f.Place)));
        Dictionary<int, DateTime> off = facts.OfType<Dismount>().ToDictionary(f => f.MountId, f => f.Entry.AtUtc);
        IEnumerable<(DateTime, DateTime)> spells = facts.OfType<Mount>().Select(f => (f.Entry.AtUtc, off.GetValueOrDefault(f.EntryId, DateTime.MaxValue)));
        foreach (CrackGrown growth in CrackGrown.Of(file, seen, [.. spells]))
        {
            yield return new(
                "Crack",
                $"{words.Length(growth.First.LengthM)} to {words.Length(growth.Last.LengthM)}{In(growth.Last.Place)}",
                growth.PerThousandBendsM is { } rate
                    ? $"{Growth(rate)} for each 1,000 bends, over {BladeParts.Millions(growth.Bends)} bends"
                    : growth.Bends == 0 ? "no running between the two" : "measured on the saw: its bends between the two are not known apart");
        }
    }

    /// <summary>Of a hundredth of a micrometre up to whole ones: a tenth is enough.</summary>
    private static string Growth(double metres) => Figures.With(Figures.Number(metres * 1e6, metres < 1e-5 ? 2 : 1), "µm");

    private static string In(CrackPlace? place) => place switch
    {
        CrackPlace.Gullet => " in a gullet",
        CrackPlace.Weld => " at the weld",
        CrackPlace.BackEdge => " at the back edge",
        CrackPlace.Body => " in the body",
        _ => "",
    };
}
