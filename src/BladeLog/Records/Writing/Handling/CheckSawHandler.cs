using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>The check before a saw starts, with what it changes: tension written as on or off, a clicking blade on hold.</summary>
internal static class CheckSawHandler
{
    public static async Task Handle(WriteSession w, CheckSaw c)
    {
        var saw = await w.FindSaw(c.Saw);
        var at = w.At(c.At);
        if (saw is null || !w.Stands)
        {
            return;
        }

        var on = await w.Db.Mounts.AsNoTracking().Include(m => m.Entry).Include(m => m.Blade)
            .Where(m => m.SawId == saw.Id && m.Entry.AtUtc <= at && !w.Db.Dismounts.Any(d => d.MountId == m.EntryId && d.Entry.AtUtc <= at))
            .OrderByDescending(m => m.Entry.AtUtc).ThenByDescending(m => m.EntryId).FirstOrDefaultAsync();
        w.RefuseUnless(on is null || c.Tension is not null, nameof(c.Tension), "Say whether the tension is on.");
        w.RefuseUnless(on is null || c.Quiet is not null, nameof(c.Quiet), "Say whether it is quiet.");
        if (!w.Stands)
        {
            return;
        }

        w.Add(
            new StartCheck
            {
                SawId = saw.Id,
                GuardsRight = c.Guards,
                TensionRight = on is null ? null : c.Tension,
                UnderTableRight = c.UnderTable,
                QuietRight = on is null ? null : c.Quiet,
                BrakeRight = c.Brake,
                Note = c.Note,
            },
            at);
        if (on is not null)
        {
            if (await IsSlack(w, on, at) == c.Tension)
            {
                w.Add(new Slack { SawId = saw.Id, LetOff = c.Tension == false }, at);
            }

            if (c.Quiet == false && (await w.NowOf(on.Blade)).HoldId is null)
            {
                w.Add(new Hold { BladeId = on.BladeId, Kind = HoldKind.Clicking }, at);
                w.Touched.Blades.Add(on.BladeId);
            }
        }

        w.AnswerPath = "/checks";
    }

    /// <summary>A check goes with the tension and the hold it brought.</summary>
    public static async Task Void(WriteSession w, Entry entry, string reason)
    {
        foreach (var slack in await w.Db.Slacks.AsNoTracking().Where(s => s.Entry.Op == entry.Op).Select(s => s.EntryId).ToListAsync())
        {
            w.Void(slack, reason);
        }

        foreach (var hold in await w.Db.Holds.AsNoTracking().Include(h => h.Entry).Where(h => h.Entry.Op == entry.Op).ToListAsync())
        {
            await VoidBladeWork.Hold(w, hold.Entry, reason);
        }

        w.Void(entry.Id, reason);
    }

    /// <summary>Let off at that time, and nothing mounted since.</summary>
    private static async Task<bool> IsSlack(WriteSession w, Mount on, DateTime at)
    {
        var last = await w.Db.Slacks.AsNoTracking().Include(s => s.Entry)
            .Where(s => s.SawId == on.SawId && s.Entry.AtUtc <= at)
            .OrderByDescending(s => s.Entry.AtUtc).ThenByDescending(s => s.EntryId).FirstOrDefaultAsync();
        return last is { LetOff: true } && last.Entry.AtUtc >= on.Entry.AtUtc;
    }
}
