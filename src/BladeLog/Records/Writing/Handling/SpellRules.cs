using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>A blade is on one saw and a saw carries one blade: what is in the way of a spell, named.</summary>
internal static class SpellRules
{
    /// <summary>Refuses a spell that would share time with another on its saw or of its blade. Some may be left out, where they go in the same group.</summary>
    public static async Task RefuseOverlaps(WriteSession w, string field, Saw saw, Blade blade, DateTime from, DateTime? until, IReadOnlyCollection<int> without)
    {
        var spells = await FactReader.ReadSpells(w.Db, saw.Id, blade.Id, from, until);
        var end = until ?? DateTime.MaxValue;
        foreach (var spell in spells.Where(s => !without.Contains(s.MountId) && s.From < end && s.End > from))
        {
            w.Refuse(field, $"{await Words(w, spell)}: put that right first.");
        }
    }

    /// <summary>"Q-02 is on Osprey since 2 Mar 2026 08:00 (entry 12)".</summary>
    public static async Task<string> Words(WriteSession w, Spell spell)
    {
        var tag = await w.Db.Blades.Where(b => b.Id == spell.BladeId).Select(b => b.Tag).SingleAsync();
        var saw = await w.Db.Saws.Where(s => s.Id == spell.SawId).Select(s => s.Name).SingleAsync();
        return spell.Until is { } until
            ? $"{tag} was on {saw} from {w.Say(spell.From)} to {w.Say(until)} (entry {spell.MountId})"
            : $"{tag} is on {saw} since {w.Say(spell.From)} (entry {spell.MountId})";
    }
}
