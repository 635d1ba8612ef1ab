using BladeLog.Records.Folding;

namespace BladeLog.Records.Writing;

internal static class HangUpHandler
{
    public static async Task Handle(WriteSession w, HangUp c)
    {
        var blade = await w.FindBlade(c.Tag);
        var at = w.At(c.At);
        w.RefuseUnless(c.Place is Place.Rack or Place.Bench, nameof(c.Place), "A blade is hung on the rack or laid on the bench; the other places follow from what happens to it.");
        if (blade is null || !w.Stands)
        {
            return;
        }

        var spells = await FactReader.ReadSpells(w.Db, blade: blade.Id);
        if (spells.Cast<Spell?>().FirstOrDefault(s => s!.Value.From < at && at < s.Value.End) is { } on)
        {
            w.Refuse(nameof(c.Tag), $"{await SpellRules.Words(w, on)}: take it off first.");
        }

        w.Add(new Hang { BladeId = blade.Id, Place = c.Place, Hook = string.IsNullOrWhiteSpace(c.Hook) ? null : c.Hook.Trim() }, at);
        w.Touched.Blades.Add(blade.Id);
        w.AnswerPath = $"/b/{blade.Tag}";
    }
}
