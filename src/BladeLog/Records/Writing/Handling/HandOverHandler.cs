using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class HandOverHandler
{
    public static Task Handle(WriteSession w, SaveHandOver c)
    {
        var text = c.Text.ReplaceLineEndings("\n").Trim();
        var at = w.At(c.At);
        w.RefuseUnless(text.Length > 0, nameof(c.Text), "Write what the next shift must know.");
        w.RefuseUnless(text.Length <= 4000, nameof(c.Text), $"The note has {text.Length} letters; 4,000 fit.");
        w.RefuseUnless(w.Sent.PersonId is not null, "Person", "Say who hands over: tap your initials.");
        if (w.Stands)
        {
            w.Add(new HandOver { Text = text }, at);
            w.AnswerPath = "/handover";
        }

        return Task.CompletedTask;
    }

    public static async Task Handle(WriteSession w, ReadHandOver c)
    {
        var note = await w.Db.HandOvers.AsNoTracking().SingleOrDefaultAsync(h => h.EntryId == c.EntryId);
        w.RefuseUnless(note is not null, nameof(c.EntryId), "That note was struck out.");
        w.RefuseUnless(w.Sent.PersonId is not null, "Person", "Say who has read it: tap your initials.");
        w.RefuseUnless(
            !await w.Db.HandOversRead.AnyAsync(r => r.HandOverId == c.EntryId && r.Entry.PersonId == w.Sent.PersonId),
            "Person",
            $"{await w.Who(w.Sent.PersonId)} has ticked this note already.");
        if (w.Stands)
        {
            w.Add(new HandOverRead { HandOverId = note!.EntryId }, w.Now);
            w.AnswerPath = "/handover";
        }
    }

    /// <summary>The ticks on a note go with it.</summary>
    public static async Task Void(WriteSession w, Entry entry, string reason)
    {
        foreach (var read in await w.Db.HandOversRead.Where(r => r.HandOverId == entry.Id).Select(r => r.EntryId).ToListAsync())
        {
            w.Void(read, reason);
        }

        w.Void(entry.Id, reason);
    }
}
