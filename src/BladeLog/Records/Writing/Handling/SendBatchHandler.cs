using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class SendBatchHandler
{
    public static async Task Handle(WriteSession w, SendBatch c)
    {
        var at = w.At(c.At);
        var number = c.Number.Trim();
        w.RefuseUnless(number.Length > 0, nameof(c.Number), "Give the batch a number.");
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.Service), nameof(c.Service), "Say who sharpens them.");
        w.RefuseUnless(c.Tags.Count > 0, nameof(c.Tags), "Choose at least one blade.");
        w.RefuseUnless(!await w.Db.Batches.AnyAsync(b => b.Number == number), nameof(c.Number), $"There is a batch {number} already.");
        var blades = new List<Blade>();
        foreach (var tag in c.Tags)
        {
            if (await w.FindBlade(tag, nameof(c.Tags)) is { } blade)
            {
                w.RefuseUnless(!blades.Contains(blade), nameof(c.Tags), $"{blade.Tag} is in the batch twice.");
                blades.Add(blade);
                await CheckCanGo(w, blade, at);
            }
        }

        if (!w.Stands)
        {
            return;
        }

        var batch = w.Add(new Batch { Number = number, Service = c.Service.Trim(), PromisedUtc = c.PromisedUtc }, at);
        foreach (var blade in blades)
        {
            w.Add(new BatchLine { Batch = batch, BladeId = blade.Id }, at);
            w.Touched.Blades.Add(blade.Id);
        }

        w.AnswerPath = "/bench";
    }

    private static async Task CheckCanGo(WriteSession w, Blade blade, DateTime at)
    {
        var spell = (await FactReader.ReadSpells(w.Db, blade: blade.Id)).Cast<Spell?>().FirstOrDefault(s => s!.Value.End > at);
        if (spell is { } on)
        {
            w.Refuse("Tags", $"{await SpellRules.Words(w, on)}: take it off first.");
        }

        if (await w.Db.BatchLines.Where(l => l.BladeId == blade.Id && !w.Db.BatchReturns.Any(r => r.LineId == l.EntryId)).Select(l => l.Batch.Number).FirstOrDefaultAsync() is { } away)
        {
            w.Refuse("Tags", $"{blade.Tag} is away in batch {away} already.");
        }
    }
}
