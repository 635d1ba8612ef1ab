using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class RecordJointHandler
{
    public static async Task Handle(WriteSession w, RecordJoint c)
    {
        var blade = await w.FindBlade(c.Tag);
        var at = w.At(c.At);
        w.RefuseUnless(c.LoopM > 0 && double.IsFinite(c.LoopM), nameof(c.LoopM), "The loop must be above zero.");
        if (blade is null || !w.Stands)
        {
            return;
        }

        var loop = (await FactReader.Loops(w.Db, [blade.Id])).At(blade.Id, at);
        w.RefuseUnless(loop is null || c.LoopM <= loop, nameof(c.LoopM), $"{blade.Tag} is {w.Say(loop ?? 0)} long; a joint only makes it shorter.");
        await RefuseOnSaw(w, blade, at, nameof(c.Tag));
        if (w.Stands && !c.FitsNone && !await FitsAny(w, c.LoopM))
        {
            w.Ask(nameof(c.LoopM), $"No saw here takes a loop of {w.Say(c.LoopM)}.", "It is that long: record it");
        }

        w.Add(new Joint { BladeId = blade.Id, LoopM = c.LoopM, LoopTyped = c.LoopTyped, Quality = c.Quality, Method = c.Method }, at);
        w.Touched.Loop(blade.Id);
        w.AnswerPath = $"/b/{blade.Tag}";
    }

    private static async Task<bool> FitsAny(WriteSession w, double loop)
    {
        const double Hair = 1e-6;
        var setups = (await w.Db.SawSetups.AsNoTracking().Where(s => s.Saw.Active && s.Entry.Void == null).Select(s => new { s.SawId, s.LoopLeastM, s.LoopMostM, s.Entry.AtUtc, s.EntryId }).ToListAsync())
            .GroupBy(s => s.SawId).Select(g => g.OrderBy(s => s.AtUtc).ThenBy(s => s.EntryId).Last());
        return !setups.Any() || setups.Any(s => loop >= s.LoopLeastM - Hair && loop <= s.LoopMostM + Hair);
    }

    /// <summary>A loop is opened and closed off the saw.</summary>
    public static async Task RefuseOnSaw(WriteSession w, Blade blade, DateTime at, string field)
    {
        var spells = await FactReader.ReadSpells(w.Db, blade: blade.Id);
        if (spells.Cast<Spell?>().FirstOrDefault(s => s!.Value.From < at && at < s.Value.End) is { } on)
        {
            w.Refuse(field, $"{await SpellRules.Words(w, on)}: take it off first.");
        }
    }
}
