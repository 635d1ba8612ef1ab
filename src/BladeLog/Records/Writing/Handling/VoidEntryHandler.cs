using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>
/// Strikes an entry out. What rests on it must go first and is named; what is nothing without it goes with it, in the
/// same group.
/// </summary>
internal static class VoidEntryHandler
{
    public static async Task Handle(WriteSession w, VoidEntry c)
    {
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.Reason), nameof(c.Reason), "Say why.");
        var entry = await w.Db.Entries.AsNoTracking().Include(e => e.Void).ThenInclude(v => v!.Entry).SingleOrDefaultAsync(e => e.Id == c.EntryId);
        w.RefuseUnless(entry is not null, nameof(c.EntryId), $"There is no entry {c.EntryId}.");
        if (entry is null || !w.Stands)
        {
            return;
        }

        w.AnswerPath = "/record";
        if (entry.Void is { } known)
        {
            w.Refuse(nameof(c.EntryId), $"Entry {entry.Id} was struck out by {await w.Who(known.Entry.PersonId)} on {w.Say(known.Entry.EnteredUtc)}.");
            return;
        }

        if (c.Together && entry.Kind is not (nameof(AddBlades) or nameof(CutDown)))
        {
            await StrikeGroup(w, c, entry);
        }
        else
        {
            await Strike(w, c, entry);
        }
    }

    /// <summary>What others of the group rest on goes last; a reading and a break take their own with them and go first.</summary>
    private static async Task StrikeGroup(WriteSession w, VoidEntry c, Entry entry)
    {
        var group = await w.Db.Entries.AsNoTracking().Where(e => e.Op == entry.Op).OrderByDescending(e => e.Part).ToListAsync();
        var plain = group.Where(e => e.Kind is not (nameof(AddBlades) or nameof(CutDown) or "Void")).ToList();
        // Hours that others gave way to bring those back by themselves.
        var hours = plain.Exists(e => e.Kind is nameof(MeterReading)) || plain.TrueForAll(e => e.Kind == nameof(Run));
        if (!hours && group.Find(e => e.Kind == "Void") is not null)
        {
            w.Refuse(nameof(c.EntryId), "This form also struck out what was there before: strike its lines out one by one.");
            return;
        }

        // A spell entered whole goes with its mount: its end alone could not go where another spell follows.
        var ids = plain.Select(e => e.Id).ToList();
        var ends = await w.Db.Dismounts.AsNoTracking().Where(d => ids.Contains(d.EntryId) && ids.Contains(d.MountId)).Select(d => d.EntryId).ToListAsync();
        var order = plain.OrderBy(e => ends.Contains(e.Id)
            ? 2
            : e.Kind is nameof(MeterReading) or nameof(Break) or nameof(BatchReturn) or nameof(Batch) or nameof(CutDone) or nameof(Split) or nameof(StartCheck) ? 0 : 1);
        foreach (var one in order)
        {
            await w.Save();
            if (!w.Stands)
            {
                return;
            }

            if (!await w.Db.Voids.AnyAsync(v => v.VoidedId == one.Id))
            {
                await Strike(w, c, one);
            }
        }
    }

    private static Task Strike(WriteSession w, VoidEntry c, Entry entry) => entry.Kind switch
    {
        nameof(Mount) => VoidSpell.Mount(w, entry, c.Reason),
        nameof(Dismount) => VoidSpell.Dismount(w, entry, c.Reason),
        nameof(MeterReading) => VoidRunning.Reading(w, entry, c.Reason),
        nameof(MeterEpoch) => VoidRunning.Epoch(w, entry, c.Reason),
        nameof(Run) => VoidRunning.Run(w, entry, c.Reason),
        nameof(CutDone) => VoidRunning.Cut(w, entry, c.Reason),
        nameof(SawSetup) => VoidRunning.Setup(w, entry, c.Reason),
        nameof(Hold) => VoidBladeWork.Hold(w, entry, c.Reason),
        nameof(HoldCleared) => VoidBladeWork.HoldCleared(w, entry, c.Reason),
        nameof(Break) => VoidBladeWork.Break(w, entry, c.Reason),
        nameof(Joint) => VoidBladeWork.Joint(w, entry, c.Reason),
        nameof(Split) => VoidBladeWork.Split(w, entry, c.Reason),
        nameof(Batch) => VoidBladeWork.Batch(w, entry, c.Reason),
        nameof(BatchLine) => VoidBladeWork.BatchLine(w, entry, c.Reason),
        nameof(BatchReturn) => VoidBladeWork.BatchReturn(w, entry, c.Reason),
        nameof(Sharpening) => VoidBladeWork.Plain<Sharpening>(w, entry, c.Reason, f => f.BladeId),
        nameof(PriorUse) => VoidBladeWork.Plain<PriorUse>(w, entry, c.Reason, f => f.BladeId),
        nameof(Hang) => VoidBladeWork.Plain<Hang>(w, entry, c.Reason, f => f.BladeId),
        nameof(Retirement) => VoidBladeWork.Plain<Retirement>(w, entry, c.Reason, f => f.BladeId),
        nameof(Inspection) => VoidBladeWork.Plain<Inspection>(w, entry, c.Reason, f => f.BladeId),
        nameof(TensionReading) => VoidBladeWork.Plain<TensionReading>(w, entry, c.Reason, f => f.BladeId),
        nameof(Drift) => VoidBladeWork.Plain<Drift>(w, entry, c.Reason, f => f.BladeId),
        nameof(StartCheck) => CheckSawHandler.Void(w, entry, c.Reason),
        nameof(TimerStarted) => TimerHandler.Void(w, entry, c.Reason),
        nameof(KerfReading) => VoidBladeWork.Plain<KerfReading>(w, entry, c.Reason, f => f.BladeId),
        nameof(Trained) => TrainingHandler.Void(w, entry, c.Reason),
        nameof(HandOver) => HandOverHandler.Void(w, entry, c.Reason),
        nameof(StockMove) or nameof(Slack) or nameof(HandOverRead) or nameof(LabelPrinted) => VoidBladeWork.Free(w, entry, c.Reason),
        "Void" => Never(w, "A line struck out stays struck out: enter it again."),
        nameof(Retag) => Never(w, "A label is put right by another label."),
        _ => Never(w, $"Entry {entry.Id} is an edit, not a fact: edit it again."),
    };

    private static Task Never(WriteSession w, string sentence)
    {
        w.Refuse(nameof(VoidEntry.EntryId), sentence);
        return Task.CompletedTask;
    }
}
