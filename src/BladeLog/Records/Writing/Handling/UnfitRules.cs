using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>Why a blade does not belong on a saw. Never a reason to refuse the record that it is there.</summary>
internal static class UnfitRules
{
    /// <summary>Lengths that differ by less than this are the same length typed in two units.</summary>
    private const double Hair = 1e-6;

    public static async Task<List<string>> Of(WriteSession w, Saw saw, Blade blade, DateTime at)
    {
        var found = new List<string>();
        var setup = await w.SetupAt(saw.Id, at);
        var now = await w.NowOf(blade);
        if (now.LoopM is { } loop && (loop < setup.LoopLeastM - Hair || loop > setup.LoopMostM + Hair))
        {
            found.Add($"{blade.Tag} is {w.Say(loop)} long; {saw.Name} takes {w.Say(setup.LoopLeastM)} to {w.Say(setup.LoopMostM)}.");
        }

        // A ground blade is let off the lower end by what grinding takes away: the saw's range speaks of the width it was sold as.
        if (blade.Spec.WidthM < setup.WidthLeastM - Hair || now.WidthM > setup.WidthMostM + Hair)
        {
            found.Add($"{blade.Tag} is {w.Say(now.WidthM)} wide; {saw.Name} takes {w.Say(setup.WidthLeastM)} to {w.Say(setup.WidthMostM)}.");
        }

        if (now.HoldId is { } holdId)
        {
            var hold = await w.Db.Holds.AsNoTracking().Include(h => h.Entry).SingleAsync(h => h.EntryId == holdId);
            found.Add($"{blade.Tag} is on hold since {w.Say(hold.Entry.AtUtc)}.");
        }

        if (now.Place == Place.AtSharpener)
        {
            found.Add($"{blade.Tag} is written as at the sharpener.");
        }

        if (now.Place == Place.Gone)
        {
            found.Add($"{blade.Tag} is written as gone.");
        }

        return found;
    }
}
