namespace BladeLog.Records.Writing;

internal static class RecordInspectionHandler
{
    public static async Task Handle(WriteSession w, RecordInspection c)
    {
        var blade = await w.FindBlade(c.Tag);
        var at = w.At(c.At);
        w.RefuseUnless(c.CrackLengthM is null or >= 0, nameof(c.CrackLengthM), "A length must not be below zero.");
        if (blade is null || !w.Stands)
        {
            return;
        }

        w.Add(new Inspection { BladeId = blade.Id, Found = c.Found, CrackLengthM = c.CrackLengthM, Place = c.Place, Note = c.Note }, at);
        if (c.Found == Found.Crack)
        {
            // Any crack that can be seen is a hold.
            w.Add(
                new Hold { BladeId = blade.Id, Kind = HoldKind.Crack, CrackLengthM = c.CrackLengthM, CrackTyped = c.CrackTyped, Place = c.Place, Note = c.Note },
                at);
            w.Touched.Blades.Add(blade.Id);
        }

        w.AnswerPath = $"/b/{blade.Tag}";
    }
}
