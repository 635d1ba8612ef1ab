namespace BladeLog.Records.Writing;

internal static class RecordSharpeningHandler
{
    public static async Task Handle(WriteSession w, RecordSharpening c)
    {
        var blade = await w.FindBlade(c.Tag);
        var at = w.At(c.At);
        if (blade is null || !w.Stands)
        {
            return;
        }

        var now = await w.NowOf(blade);
        var ground = new Ground(c.WidthM, c.GulletM, c.KerfM, c.EdgeAfterM, c.LeastWidthM ?? blade.Spec.LeastWidthM);
        await GrindRules.Refuse(w, blade, now, ground, "");
        if (w.Stands && !c.AsMeasured)
        {
            GrindRules.Ask(w, blade, now, ground, "");
        }

        w.Add(
            new Sharpening
            {
                BladeId = blade.Id,
                Kind = c.Kind,
                SetAgain = c.SetAgain,
                WidthM = c.WidthM,
                WidthTyped = c.WidthTyped,
                GulletM = c.GulletM,
                KerfM = c.KerfM,
                EdgeAfterM = c.EdgeAfterM,
                PriceMinor = c.PriceMinor,
            },
            at);
        w.Touched.Blades.Add(blade.Id);
        w.AnswerPath = $"/b/{blade.Tag}";
    }
}
