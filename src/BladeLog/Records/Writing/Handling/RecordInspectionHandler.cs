namespace BladeLog.Records.Writing;

internal static class RecordInspectionHandler
{
    public static async Task Handle(WriteSession w, RecordInspection c)
    {
        var blade = await w.FindBlade(c.Tag);
        var at = w.At(c.At);
        w.RefuseUnless(c.CrackLengthM is null or >= 0, nameof(c.CrackLengthM), "A length must not be below zero.");
        w.RefuseUnless(c.LookedAt != LookedAt.Nothing, nameof(c.LookedAt), "Tick what was looked at.");
        w.RefuseUnless(c.TeethMissing is null or > 0, nameof(c.TeethMissing), "Write how many teeth are missing, or leave it empty.");
        w.RefuseUnless(
            c.Found != Found.NothingSeen || c.Marks is null or BladeMarks.None,
            nameof(c.Found),
            "Something was seen: choose Worn or Other, or take the tick away.");
        if (blade is null || !w.Stands)
        {
            return;
        }

        w.Add(
            new Inspection
            {
                BladeId = blade.Id,
                Found = c.Found,
                LookedAt = Looked(c),
                Marks = c.Marks,
                TeethMissing = c.TeethMissing,
                CrackLengthM = c.CrackLengthM,
                Place = c.Place,
                Note = c.Note,
            },
            at);
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

    /// <summary>What was seen somewhere was looked at there.</summary>
    private static LookedAt? Looked(RecordInspection c)
    {
        var seen = c.Marks ?? BladeMarks.None;
        var there = ((seen & BladeMarks.InGullets) != 0 ? LookedAt.Gullets : LookedAt.Nothing)
            | (seen.HasFlag(BladeMarks.KinkOrTwist) ? LookedAt.Level : LookedAt.Nothing)
            | (seen.HasFlag(BladeMarks.TeethMissing) ? LookedAt.Teeth : LookedAt.Nothing)
            | c.Place switch
            {
                CrackPlace.Gullet => LookedAt.Gullets,
                CrackPlace.Weld => LookedAt.Weld,
                CrackPlace.BackEdge => LookedAt.BackEdge,
                CrackPlace.Body => LookedAt.Body,
                _ => LookedAt.Nothing,
            };
        return c.LookedAt is null && there == LookedAt.Nothing ? null : there | (c.LookedAt ?? LookedAt.Nothing);
    }
}
