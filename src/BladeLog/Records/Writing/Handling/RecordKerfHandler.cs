namespace BladeLog.Records.Writing;

/// <summary>Kerf and set measured outside a sharpening.</summary>
internal static class RecordKerfHandler
{
    public static async Task Handle(WriteSession w, RecordKerf c)
    {
        var blade = await w.FindBlade(c.Tag);
        var saw = c.Saw is null ? null : await w.FindSaw(c.Saw);
        var at = w.At(c.At);
        var both = c.SetLeftM is { } l && c.SetRightM is { } r ? l + r : c.SetBothM;
        w.RefuseUnless(c.KerfM is not null || both is not null, nameof(c.KerfM), "Write the kerf, or the set.");
        w.RefuseUnless(c.SetLeftM is null == c.SetRightM is null, c.SetLeftM is null ? nameof(c.SetLeftM) : nameof(c.SetRightM), "Write the set of both sides, or both together.");
        w.RefuseUnless(c.SetLeftM is null or >= 0, nameof(c.SetLeftM), "The set must not be below zero.");
        w.RefuseUnless(c.SetRightM is null or >= 0, nameof(c.SetRightM), "The set must not be below zero.");
        w.RefuseUnless(both is null or > 0, nameof(c.SetBothM), "Teeth without set cut no wider than the body: write the set of one side at least.");
        if (blade is null || !w.Stands)
        {
            return;
        }

        var thickness = blade.MeasuredThicknessM ?? blade.Spec.ThicknessM;
        w.RefuseUnless(c.KerfM is null || c.KerfM > thickness, nameof(c.KerfM), $"The kerf must be wider than the body is thick, {w.Say(thickness)}.");
        if (w.Stands && !c.WideMeant && (c.KerfM ?? thickness + both!.Value) > GrindRules.WideInBodies * thickness)
        {
            w.Ask(c.KerfM is null ? nameof(c.SetBothM) : nameof(c.KerfM), $"That is a kerf of {w.Say(c.KerfM ?? thickness + both!.Value)} by a body of {w.Say(thickness)}.", "It is as wide as that: record it");
        }

        w.Add(
            new KerfReading
            {
                BladeId = blade.Id,
                SawId = saw?.Id,
                How = c.How,
                KerfM = c.KerfM,
                KerfTyped = c.KerfTyped,
                SetLeftM = c.SetLeftM,
                SetRightM = c.SetRightM,
                SetBothM = both,
                SetTyped = c.SetTyped,
                Note = string.IsNullOrWhiteSpace(c.Note) ? null : c.Note.Trim(),
            },
            at);
        w.Touched.Blades.Add(blade.Id);
        w.AnswerPath = $"/b/{blade.Tag}";
    }
}
