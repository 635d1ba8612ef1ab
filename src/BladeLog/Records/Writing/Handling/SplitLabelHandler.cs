using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>
/// Divides the history of a label that two blades wore: what happened from a time on is struck out and entered again for
/// the other blade, each at its own time, in one group.
/// </summary>
internal static class SplitLabelHandler
{
    public static async Task Handle(WriteSession w, SplitLabel c)
    {
        var blade = await w.FindBlade(c.Tag);
        var from = w.At(c.FromUtc, nameof(c.FromUtc));
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.Reason), nameof(c.Reason), "Say why.");
        if (blade is null || !w.Stands || await Other(w, c, from) is not { } other)
        {
            return;
        }

        w.RefuseUnless(other.Id != blade.Id, nameof(c.OtherTag), "Write the label of the other blade.");
        await RefuseWhatCannotMove(w, blade, from);
        if (!w.Stands)
        {
            return;
        }

        await Spells(w, blade, other, from, c.Reason);
        await Move<Sharpening>(w, blade, from, c.Reason, f => new Sharpening
        {
            BladeId = other.Id,
            Kind = f.Kind,
            SetAgain = f.SetAgain,
            WidthM = f.WidthM,
            WidthTyped = f.WidthTyped,
            GulletM = f.GulletM,
            KerfM = f.KerfM,
            EdgeAfterM = f.EdgeAfterM,
            PriceMinor = f.PriceMinor,
        });
        await Move<Inspection>(w, blade, from, c.Reason, f => new Inspection { BladeId = other.Id, Found = f.Found, CrackLengthM = f.CrackLengthM, Place = f.Place, Note = f.Note });
        await Move<Hold>(w, blade, from, c.Reason, f => new Hold { BladeId = other.Id, Kind = f.Kind, CrackLengthM = f.CrackLengthM, CrackTyped = f.CrackTyped, Place = f.Place, Note = f.Note });
        await Move<Hang>(w, blade, from, c.Reason, f => new Hang { BladeId = other.Id, Place = f.Place, Hook = f.Hook });
        await Move<TensionReading>(w, blade, from, c.Reason, f => new TensionReading { BladeId = other.Id, SawId = f.SawId, TensionPa = f.TensionPa, Typed = f.Typed, How = f.How });
        await Move<Drift>(w, blade, from, c.Reason, f => new Drift { BladeId = other.Id, SawId = f.SawId, AngleRad = f.AngleRad });
        await Move<KerfReading>(w, blade, from, c.Reason, f => new KerfReading
        {
            BladeId = other.Id,
            SawId = f.SawId,
            How = f.How,
            KerfM = f.KerfM,
            KerfTyped = f.KerfTyped,
            SetLeftM = f.SetLeftM,
            SetRightM = f.SetRightM,
            SetBothM = f.SetBothM,
            SetTyped = f.SetTyped,
            Note = f.Note,
        });
        w.RefuseUnless(w.Moved, nameof(c.FromUtc), $"Nothing is written of {blade.Tag} from {w.Say(from)} on.");
        other.Folded = false;
        w.Touched.Blades.Add(blade.Id);
        w.Touched.Blades.Add(other.Id);
        w.AnswerPath = $"/b/{other.Tag}";
    }

    private static async Task<Blade?> Other(WriteSession w, SplitLabel c, DateTime from)
    {
        var tag = Tags.Read(c.OtherTag);
        if (await w.Db.Blades.Include(b => b.Spec).SingleOrDefaultAsync(b => b.Tag == tag) is { } known)
        {
            return known;
        }

        await BladeHandler.CheckTag(w, nameof(c.OtherTag), tag);
        var spec = await BladeHandler.FindSpec(w, c.Spec);
        if (spec is null || !w.Stands)
        {
            return null;
        }

        w.NewEntry(nameof(AddBlades), from);
        var made = new Blade { Tag = tag, Spec = spec, AddedUtc = from };
        w.Db.Blades.Add(made);
        await w.Save();
        return made;
    }

    /// <summary>What changed the steel itself was seen on one of the two: which, only a person can say.</summary>
    private static async Task RefuseWhatCannotMove(WriteSession w, Blade blade, DateTime from)
    {
        var kinds = new[] { nameof(BatchLine), nameof(Joint), nameof(Split), nameof(Break), nameof(Retirement), nameof(HoldCleared), nameof(PriorUse) };
        var ids = (await BladeEvents.Read(w.Db, [blade.Id])).Where(e => e.BladeId == blade.Id && e.At >= from).Select(e => e.Id)
            .Concat(await w.Db.Breaks.AsNoTracking().Where(b => b.BladeId == blade.Id && b.LatestUtc >= from).Select(b => b.EntryId).ToListAsync()).ToList();
        var stuck = await w.Db.Entries.AsNoTracking().Where(e => ids.Contains(e.Id) && kinds.Contains(e.Kind)).OrderBy(e => e.Id).Select(e => e.Id).ToListAsync();
        w.RefuseUnless(stuck.Count == 0, "FromUtc", $"Void first, and enter again for the blade it happened to: entry {string.Join(", ", stuck)}.");
        var open = (await FactReader.ReadSpells(w.Db, blade: blade.Id)).Cast<Spell?>().FirstOrDefault(s => s!.Value.From < from && s.Value.End > from);
        if (open is { } across)
        {
            w.Refuse("FromUtc", $"{await SpellRules.Words(w, across)}: choose a time before it went on, or after it came off.");
        }
    }

    private static async Task Spells(WriteSession w, Blade blade, Blade other, DateTime from, string reason)
    {
        var mounts = await w.Db.Mounts.AsNoTracking().Include(m => m.Saw).Include(m => m.Entry)
            .Where(m => m.BladeId == blade.Id && m.Entry.AtUtc >= from).OrderBy(m => m.EntryId).ToListAsync();
        foreach (var mount in mounts)
        {
            var dismount = await w.Db.Dismounts.AsNoTracking().Include(d => d.Entry).SingleOrDefaultAsync(d => d.MountId == mount.EntryId);
            var (on, off) = (mount.Entry.AtUtc, dismount?.Entry.AtUtc);
            await SpellRules.RefuseOverlaps(w, nameof(SplitLabel.OtherTag), mount.Saw, other, on, off, [.. mounts.Select(m => m.EntryId)]);
            if (!w.Stands)
            {
                return;
            }

            MoveSpellHandler.Move(w, mount, dismount, other, reason);
            Edits.Bump(w, await w.Db.Saws.SingleAsync(s => s.Id == mount.SawId));
            w.Touched.Spell(mount.SawId, blade.Id, on, off);
            w.Touched.Spell(mount.SawId, other.Id, on, off);
            w.Moved = true;
        }
    }

    private static async Task Move<T>(WriteSession w, Blade blade, DateTime from, string reason, Func<T, T> again)
        where T : Fact
    {
        var facts = await w.Db.Set<T>().AsNoTracking().Include(f => f.Entry)
            .Where(f => EF.Property<int>(f, "BladeId") == blade.Id && f.Entry.AtUtc >= from).OrderBy(f => f.EntryId).ToListAsync();
        foreach (var fact in facts)
        {
            w.Void(fact.EntryId, reason);
            w.Add(again(fact), fact.Entry.AtUtc);
            w.Moved = true;
        }
    }
}
