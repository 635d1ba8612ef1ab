using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class BladeHandler
{
    public static async Task Handle(WriteSession w, AddBlades c)
    {
        var spec = await FindSpec(w, c.Spec);
        var at = w.At(c.At);
        var tags = c.Tags.Select(Tags.Read).ToList();
        w.RefuseUnless(tags.Count > 0, "Tags", "Give the blade a tag.");
        foreach (var tag in tags)
        {
            await CheckTag(w, "Tags", tag);
        }

        w.RefuseUnless(tags.Distinct().Count() == tags.Count, "Tags", "The same tag is there twice.");
        Check(w, spec, c.MeasuredThicknessM, c.MeasuredHrc);
        if (spec is null || !w.Stands)
        {
            return;
        }

        w.NewEntry(nameof(AddBlades), at);
        w.AnswerPath = tags.Count == 1 ? $"/b/{tags[0]}" : "/rack";
        foreach (var tag in tags)
        {
            var blade = new Blade
            {
                Tag = tag,
                Spec = spec,
                AddedUtc = at,
                Folded = c.Folded,
                MeasuredThicknessM = c.MeasuredThicknessM,
                MeasuredHrc = c.MeasuredHrc,
                InspectEveryH = c.InspectEveryH,
                InspectEachMount = c.InspectEachMount,
            };
            w.Db.Blades.Add(blade);
            await w.Save();
            w.Touched.Blades.Add(blade.Id);
        }
    }

    /// <summary>A body measured far from what is printed on the box is another blade, or a slip.</summary>
    private static void Check(WriteSession w, Spec? spec, double? thickness, double? hrc)
    {
        w.RefuseUnless(hrc is null or (>= 20 and <= 58), "MeasuredHrc", "The body of a band has 20 to 58 HRC.");
        w.RefuseUnless(spec is null || thickness is null || (thickness > spec.ThicknessM / 2 && thickness < spec.ThicknessM * 2), "MeasuredThicknessM", $"The box says {w.Say(spec?.ThicknessM ?? 0)}: {w.Say(thickness ?? 0)} is another kind of blade. Measure again, or give it that specification.");
    }

    public static async Task Handle(WriteSession w, EditBlade c)
    {
        var blade = await w.FindBlade(c.Tag);
        var spec = await FindSpec(w, c.Spec);
        Check(w, spec, c.MeasuredThicknessM, c.MeasuredHrc);
        if (blade is null || spec is null || !w.Stands || !await Edits.Guard(w, blade, c.Version, blade.Tag))
        {
            return;
        }

        w.NewEntry(nameof(EditBlade), w.Now);
        (blade.Spec, blade.Folded) = (spec, c.Folded);
        (blade.MeasuredThicknessM, blade.MeasuredHrc) = (c.MeasuredThicknessM, c.MeasuredHrc);
        (blade.InspectEveryH, blade.InspectEachMount) = (c.InspectEveryH, c.InspectEachMount);
        Edits.Bump(w, blade);
        w.Touched.Loop(blade.Id);
        w.AnswerPath = $"/b/{blade.Tag}";
    }

    /// <summary>Refuses a tag of the wrong form, of another blade, or one that was painted on any blade before.</summary>
    public static async Task CheckTag(WriteSession w, string field, string tag, int? bladeId = null)
    {
        if (Tags.Refusal(tag) is { } why)
        {
            w.Refuse(field, why);
            return;
        }

        var used = await w.Db.TagsUsed.AsNoTracking().SingleOrDefaultAsync(t => t.Tag == tag);
        if (used is null || used.BladeId == bladeId)
        {
            return;
        }

        var now = await w.Db.Blades.Where(b => b.Id == used.BladeId).Select(b => b.Tag).SingleAsync();
        w.Refuse(field, string.Equals(now, tag, StringComparison.OrdinalIgnoreCase)
            ? $"There is a blade {tag} already."
            : $"{tag} was once painted on the blade that is now {now}: a tag is never used again.");
    }

    public static async Task<Spec?> FindSpec(WriteSession w, string? code)
    {
        var text = (code ?? "").Trim();
        var spec = text.Length == 0 ? null : await w.Db.Specs.SingleOrDefaultAsync(s => s.Code == text);
        w.RefuseUnless(spec is not null, "Spec", text.Length == 0 ? "Say which specification." : $"There is no specification {text}.");
        return spec;
    }
}
