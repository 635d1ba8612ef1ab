using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class CutDownHandler
{
    public static async Task Handle(WriteSession w, CutDown c)
    {
        var parent = await w.FindBlade(c.ParentTag, nameof(c.ParentTag));
        var at = w.At(c.At);
        var tag = Tags.Read(c.ChildTag);
        await BladeHandler.CheckTag(w, nameof(c.ChildTag), tag);
        var spec = c.Spec is null ? parent?.Spec : await BladeHandler.FindSpec(w, c.Spec);
        w.RefuseUnless(c.LoopM > 0 && double.IsFinite(c.LoopM), nameof(c.LoopM), "The loop must be above zero.");
        if (parent is null || spec is null || !w.Stands)
        {
            return;
        }

        var now = await w.NowOf(parent);
        w.RefuseUnless(now.LoopM is null || c.LoopM < now.LoopM, nameof(c.LoopM), $"{parent.Tag} is {w.Say(now.LoopM ?? 0)} long; cut down it is shorter.");
        var known = await w.Db.Splits.Where(s => s.ParentId == parent.Id)
            .Join(w.Db.Blades, s => s.ChildId, b => b.Id, (_, b) => b.Tag).FirstOrDefaultAsync();
        w.RefuseUnless(known is null, nameof(c.ParentTag), $"{parent.Tag} was cut down to {known} already.");
        var later = (await FactReader.ReadSpells(w.Db, blade: parent.Id)).Cast<Spell?>().FirstOrDefault(s => s!.Value.End > at);
        if (later is { } on)
        {
            w.Refuse(nameof(c.ParentTag), $"{await SpellRules.Words(w, on)}: take it off first.");
        }

        if (!w.Stands)
        {
            return;
        }

        var entry = w.NewEntry(nameof(Split), at);
        w.AnswerPath = $"/b/{tag}";
        var child = new Blade
        {
            Tag = tag,
            Spec = spec,
            Parent = parent,
            AddedUtc = at,
            MeasuredThicknessM = parent.MeasuredThicknessM,
            MeasuredHrc = parent.MeasuredHrc,
            InspectEveryH = c.InspectEveryH ?? parent.InspectEveryH,
            InspectEachMount = c.InspectEachMount || parent.InspectEachMount,
        };
        w.Db.Blades.Add(child);
        await w.Save();
        w.Add(new Split { ParentId = parent.Id, ChildId = child.Id, WidthM = c.WidthM ?? now.WidthM }, entry);
        w.Add(new Joint { BladeId = child.Id, LoopM = c.LoopM, LoopTyped = c.LoopTyped, Quality = c.Quality, Method = c.Method }, at);
        w.Touched.Blades.Add(parent.Id);
        w.Touched.Blades.Add(child.Id);
    }
}
