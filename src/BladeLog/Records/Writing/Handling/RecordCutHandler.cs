using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class RecordCutHandler
{
    public static async Task Handle(WriteSession w, RecordCut c)
    {
        var saw = await w.FindSaw(c.Saw);
        var at = w.At(c.At);
        w.RefuseUnless(c.HeightM > 0 && double.IsFinite(c.HeightM), nameof(c.HeightM), "The height must be above zero.");
        w.RefuseUnless(c.LengthM > 0 && double.IsFinite(c.LengthM), nameof(c.LengthM), "The length must be above zero.");
        w.RefuseUnless(c.FeedMps > 0 && double.IsFinite(c.FeedMps), nameof(c.FeedMps), "The feed must be above zero.");
        w.RefuseUnless(c.SpeedMps is null or > 0, nameof(c.SpeedMps), "The blade speed must be above zero.");
        w.RefuseUnless(c.Pieces > 0, nameof(c.Pieces), "At least one piece was cut.");
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.WoodClass), nameof(c.WoodClass), "Say which wood it was.");
        var queued = c.CutNumber is { } number ? await w.Db.QueuedCuts.SingleOrDefaultAsync(q => q.Number == number) : null;
        w.RefuseUnless(c.CutNumber is null || queued is not null, nameof(c.CutNumber), $"There is no cut {c.CutNumber} on the list.");
        if (saw is null || !w.Stands || (queued is not null && !await Edits.Guard(w, queued, c.CutVersion, $"cut {queued.Number}")))
        {
            return;
        }

        w.RefuseUnless(queued?.DoneEntryId is null, nameof(c.CutNumber), $"Cut {queued?.Number} is done already (entry {queued?.DoneEntryId}).");
        if (!w.Stands)
        {
            return;
        }

        w.AnswerPath = $"/saws/{saw.Code}";
        var setup = await w.SetupAt(saw.Id, at);
        var speed = c.SpeedMps ?? setup.UsualSpeedMps;
        var cut = w.Add(
            new CutDone
            {
                SawId = saw.Id,
                QueuedCutId = queued?.Id,
                Material = c.Material,
                SpeciesKey = c.SpeciesKey,
                SpeciesTyped = c.SpeciesTyped,
                WoodClass = c.WoodClass,
                HeightM = c.HeightM,
                HeightTyped = c.HeightTyped,
                LengthM = c.LengthM,
                LengthTyped = c.LengthTyped,
                Pieces = c.Pieces,
                FeedMps = c.FeedMps,
                FeedGrade = c.FeedGrade,
                SpeedMps = speed,
                MoisturePct = c.MoisturePct,
                Frozen = c.Frozen,
                Dirt = c.Dirt,
                Nail = c.Nail,
            },
            at);
        var cutMs = CutSums.Milliseconds(c.LengthM, c.Pieces, c.FeedMps);
        if (c.HoursFromCuts && cutMs > 0)
        {
            var from = at.AddMilliseconds(-cutMs);
            var others = await RunRules.Overlapping(w, saw, from, at, []);
            foreach (var (pieceFrom, pieceUntil) in RunRules.Uncovered(from, at, others.Select(o => (o.FromUtc, o.UntilUtc))))
            {
                RunRules.AddFromCuts(w, saw, pieceFrom, pieceUntil, speed);
            }
        }

        if (queued is not null && c.Finishes)
        {
            await w.Save();
            queued.DoneEntryId = cut.EntryId;
        }

        // A run that ends with the cut counts it, so the window reaches a millisecond to either side.
        w.Touched.Window(saw.Id, at.AddMilliseconds(-1), at.AddMilliseconds(1));
    }
}
