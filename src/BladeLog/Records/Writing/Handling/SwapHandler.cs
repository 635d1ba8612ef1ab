using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class SwapHandler
{
    private const string OneMoreTap = "It is on the saw: record it";

    public static async Task Handle(WriteSession w, Swap c)
    {
        var saw = await w.FindSaw(c.Saw);
        var blade = string.IsNullOrWhiteSpace(c.OnTag) ? null : await w.FindBlade(c.OnTag, nameof(c.OnTag));
        var at = w.At(c.At);
        var until = c.Until is { } u ? w.At(u, nameof(c.Until)) : (DateTime?)null;
        w.RefuseUnless(until is null || until > at, nameof(c.Until), "The blade must come off after it went on.");
        if (saw is null || !w.Stands || await Clashes(w, saw, c.SawVersion))
        {
            return;
        }

        var spells = await FactReader.ReadSpells(w.Db, saw.Id, from: at, until: at);
        var off = spells.Cast<Spell?>().FirstOrDefault(s => s!.Value.Until is null && s.Value.From <= at);
        if (off is { } closing)
        {
            await TakeOff(w, c, saw, blade, closing, at);
        }
        else if (blade is null)
        {
            w.Refuse(nameof(c.Saw), $"No blade was on {saw.Name} at {w.Say(at)}.");
        }

        if (blade is not null && w.Stands)
        {
            await PutOn(w, c, saw, blade, at, until, off?.MountId);
        }

        Edits.Bump(w, saw);
        w.AnswerPath = $"/saws/{saw.Code}";
    }

    private static async Task<bool> Clashes(WriteSession w, Saw saw, int? version)
    {
        if (version is null || version == saw.Version)
        {
            return false;
        }

        var mounts = await w.Db.Mounts.AsNoTracking().Where(m => m.SawId == saw.Id).OrderByDescending(m => m.EntryId)
            .Select(m => new { m.EntryId, m.Blade.Tag, m.Entry.EnteredUtc, m.Entry.PersonId }).FirstOrDefaultAsync();
        var dismounts = await w.Db.Dismounts.AsNoTracking().Where(d => d.Mount.SawId == saw.Id).OrderByDescending(d => d.EntryId)
            .Select(d => new { d.EntryId, d.Mount.Blade.Tag, d.Entry.EnteredUtc, d.Entry.PersonId }).FirstOrDefaultAsync();
        if (mounts is null && dismounts is null)
        {
            return !await Edits.Guard(w, saw, version, saw.Name);
        }

        var on = mounts is not null && mounts.EntryId > (dismounts?.EntryId ?? 0);
        var last = on ? mounts : dismounts;
        w.ClashWith = new WriteResult.Clash(
            await w.Who(last!.PersonId), last.EnteredUtc, on ? $"put {last.Tag} on {saw.Name}" : $"took {last.Tag} off {saw.Name}");
        return true;
    }

    private static async Task TakeOff(WriteSession w, Swap c, Saw saw, Blade? blade, Spell closing, DateTime at)
    {
        if (blade is not null && blade.Id == closing.BladeId)
        {
            w.Refuse(nameof(c.OnTag), $"{blade.Tag} is on {saw.Name} already.");
            return;
        }

        if (closing.From >= at)
        {
            w.Refuse(nameof(c.At), $"{await SpellRules.Words(w, closing)}: it cannot have come off at {w.Say(at)}.");
            return;
        }

        w.Add(new Dismount { MountId = closing.MountId, Reason = c.Reason }, at);
        if (c.Reason == OffReason.CrackOrClicking)
        {
            // What may be cracked is held as cracked until a named person has looked.
            w.Add(new Hold { BladeId = closing.BladeId, Kind = HoldKind.Crack, Note = "a crack was seen or clicking heard as it came off" }, at);
        }

        w.Touched.Spell(saw.Id, closing.BladeId, at, null);
    }

    private static async Task PutOn(WriteSession w, Swap c, Saw saw, Blade blade, DateTime at, DateTime? until, int? closing)
    {
        await SpellRules.RefuseOverlaps(w, nameof(c.OnTag), saw, blade, at, until, closing is { } id ? [id] : []);
        if (!w.Stands)
        {
            return;
        }

        var unfit = await UnfitRules.Of(w, saw, blade, at);
        unfit.AddRange(c.Unfit);
        var although = string.IsNullOrWhiteSpace(c.Although) ? null : c.Although.Trim();
        if (unfit.Count > 0)
        {
            if (although is null)
            {
                unfit.ForEach(sentence => w.Ask(nameof(c.OnTag), sentence, OneMoreTap));
            }
            else
            {
                w.RefuseUnless(w.Sent.PersonId is not null, "Person", "Say who records it although it does not fit.");
            }
        }

        var mount = w.Add(
            new Mount
            {
                SawId = saw.Id,
                BladeId = blade.Id,
                TensionPa = c.TensionPa,
                TensionTyped = c.TensionTyped,
                TensionKnown = c.TensionPa is null ? TensionKnown.Unknown : c.TensionKnown,
                InsideOut = c.InsideOut,
                Although = unfit.Count > 0 ? although : null,
            },
            at);
        if (until is { } end)
        {
            w.Add(new Dismount { Mount = mount, Reason = c.UntilReason }, end);
        }

        if (blade.Folded)
        {
            // Once mounted it is a blade of its own, no longer one of a stock line.
            blade.Folded = false;
        }

        w.Touched.Spell(saw.Id, blade.Id, at, until);
    }
}
