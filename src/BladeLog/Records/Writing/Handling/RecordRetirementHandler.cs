using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class RecordRetirementHandler
{
    public static async Task Handle(WriteSession w, RecordRetirement c)
    {
        var blade = await w.FindBlade(c.Tag);
        var at = w.At(c.At);
        if (blade is null || !w.Stands)
        {
            return;
        }

        var known = await w.Db.Retirements.AsNoTracking().Include(r => r.Entry).FirstOrDefaultAsync(r => r.BladeId == blade.Id);
        w.RefuseUnless(known is null, nameof(c.Tag), $"{blade.Tag} was retired on {w.Say(known?.Entry.AtUtc ?? at)} (entry {known?.EntryId}).");
        var open = (await FactReader.ReadSpells(w.Db, blade: blade.Id)).Cast<Spell?>().FirstOrDefault(s => s!.Value.Until is null);
        if (open is { } on && w.Stands)
        {
            if (!c.TakeOff)
            {
                w.Ask(nameof(c.Tag), $"{await SpellRules.Words(w, on)}.", "Take it off and retire it");
            }

            w.RefuseUnless(on.From < at, nameof(c.At), $"{await SpellRules.Words(w, on)}: it cannot have been retired before that.");
            w.Add(new Dismount { MountId = on.MountId, Reason = OffReason.OtherWork }, at);
            w.Touched.Spell(on.SawId, blade.Id, at, null);
            Edits.Bump(w, (await w.Db.Saws.FindAsync(on.SawId))!);
        }

        w.Add(new Retirement { BladeId = blade.Id, Reason = c.Reason, CutUp = c.CutUp, Note = c.Note }, at);
        w.Touched.Blades.Add(blade.Id);
        w.AnswerPath = $"/b/{blade.Tag}";
    }
}
