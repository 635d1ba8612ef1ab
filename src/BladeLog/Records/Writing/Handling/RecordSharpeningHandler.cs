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
        Check(w, blade, now, c.WidthM, c.GulletM, c.KerfM, "");
        if (c.WidthM > now.WidthM && !c.WiderMeant)
        {
            w.Ask(nameof(c.WidthM), $"{blade.Tag} was {w.Say(now.WidthM)} wide before; grinding does not make it wider.", "It was measured wrongly before: record it");
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

    /// <summary>What cannot be after a grind.</summary>
    public static void Check(WriteSession w, Blade blade, BladeNow now, double? widthM, double? gulletM, double? kerfM, string line)
    {
        var width = widthM ?? now.WidthM;
        w.RefuseUnless(widthM is null or > 0, $"{line}WidthM", "The width must be above zero.");
        w.RefuseUnless(gulletM is null || gulletM < width, $"{line}GulletM", "The gullet must be less deep than the blade is wide.");
        var thickness = blade.MeasuredThicknessM ?? blade.Spec.ThicknessM;
        w.RefuseUnless(kerfM is null || kerfM > thickness, $"{line}KerfM", "The kerf must be wider than the body is thick.");
    }
}
