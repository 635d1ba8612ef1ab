using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class RecordCutHandler
{
    // Asked about beyond these: engineering defaults.
    private const double Hair = 1e-6;
    private const double ThinM = 1e-3;
    private const double FastMps = 1;
    private const long LongMs = 12 * 3_600_000L;

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
        if (!c.AsTyped)
        {
            Ask(w, c, saw, setup);
        }

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

    /// <summary>A slip of a finger wears an edge out on paper: what the saw can hardly have done is asked about.</summary>
    private static void Ask(WriteSession w, RecordCut c, Saw saw, SawSetup setup)
    {
        const string Tap = "It was so: record it";
        if (c.HeightM > setup.CutHeightMostM + Hair)
        {
            w.Ask(nameof(c.HeightM), $"{saw.Name} opens to {w.Say(setup.CutHeightMostM)}; that is {w.Say(c.HeightM)}.", Tap);
        }
        else if (c.HeightM < ThinM)
        {
            w.Ask(nameof(c.HeightM), $"That is {w.Say(c.HeightM)} of wood along the blade.", Tap);
        }

        if (c.LengthM > (setup.LongestPieceM ?? double.PositiveInfinity) + Hair)
        {
            w.Ask(nameof(c.LengthM), $"The longest piece that goes past {saw.Name} is {w.Say(setup.LongestPieceM!.Value)}; that is {w.Say(c.LengthM)}.", Tap);
        }

        if (c.FeedMps > FastMps)
        {
            w.Ask(nameof(c.FeedMps), $"That is {c.FeedMps * 60:0} m a minute.", Tap);
        }

        if (CutSums.Milliseconds(c.LengthM, c.Pieces, c.FeedMps) is var ms && ms > LongMs)
        {
            w.Ask(nameof(c.Pieces), $"So many pieces at that feed are {ms / 3_600_000.0:0} hours of sawing.", Tap);
        }
    }
}
