namespace BladeLog.Records.Folding;

/// <summary>Mounts and dismounts folded to spells.</summary>
public static class Spells
{
    public static List<Spell> Fold(
        IEnumerable<(int Id, int SawId, int BladeId, DateTime At)> mounts, IEnumerable<(int Id, int MountId, DateTime At)> dismounts)
    {
        var off = new Dictionary<int, (int Id, int MountId, DateTime At)>();
        foreach (var dismount in dismounts)
        {
            off[dismount.MountId] = dismount;
        }

        return
        [
            .. mounts
                .Select(m => off.TryGetValue(m.Id, out var d)
                    ? new Spell(m.Id, m.SawId, m.BladeId, m.At, d.At, d.Id)
                    : new Spell(m.Id, m.SawId, m.BladeId, m.At, null, null))
                .OrderBy(s => s.From).ThenBy(s => s.MountId),
        ];
    }

    /// <summary>Pairs that cannot both be true: two blades on one saw, or one blade on two saws, at the same time.</summary>
    public static IEnumerable<(Spell First, Spell Second)> Overlaps(IEnumerable<Spell> spells)
    {
        var all = spells.ToList();
        return Within(all, s => s.SawId).Concat(Within(all, s => s.BladeId)).Distinct();
    }

    private static IEnumerable<(Spell, Spell)> Within(List<Spell> spells, Func<Spell, int> by)
    {
        foreach (var group in spells.GroupBy(by))
        {
            var inOrder = group.OrderBy(s => s.From).ThenBy(s => s.MountId).ToList();
            for (var i = 1; i < inOrder.Count; i++)
            {
                if (inOrder[i].From < inOrder[i - 1].End)
                {
                    yield return (inOrder[i - 1], inOrder[i]);
                }
            }
        }
    }
}
