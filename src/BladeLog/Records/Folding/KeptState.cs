using BladeLog.Handbook.Quantities;

namespace BladeLog.Records.Folding;

/// <summary>All kept state, as the facts say it should be.</summary>
public sealed record KeptState(
    IReadOnlyList<OnSaw> OnSaws,
    IReadOnlyList<BladeNow> BladesNow,
    IReadOnlyList<RunShare> Shares,
    IReadOnlyList<Exposure> Exposures,
    IReadOnlyList<WoodPath> Paths)
{
    public static List<OnSaw> OnSawsOf(IEnumerable<Spell> spells) =>
        [.. spells.Where(s => s.Until is null).Select(s => new OnSaw { SawId = s.SawId, BladeId = s.BladeId, MountId = s.MountId }).OrderBy(o => o.SawId)];

    /// <summary>Shares of known spells summed by spell, setup and speed.</summary>
    public static List<Exposure> ExposuresOf(IEnumerable<RunShare> shares, IReadOnlyDictionary<int, double> speedOfRun)
    {
        var sums = new SortedDictionary<(int Mount, int Setup, double Speed), long>();
        foreach (var share in shares)
        {
            if (share.MountId is { } mount)
            {
                var key = (mount, share.SetupId, speedOfRun[share.RunId]);
                sums[key] = sums.GetValueOrDefault(key) + share.Ms;
            }
        }

        return [.. sums.Select(s => new Exposure { MountId = s.Key.Mount, SetupId = s.Key.Setup, SpeedMps = s.Key.Speed, RunningMs = s.Value })];
    }

    /// <summary>Wood path of every spell that has cuts, by wood class and dirt.</summary>
    public static List<WoodPath> PathsOf(SawFold saw, LoopsThen loops)
    {
        var sums = new Dictionary<(int Mount, string WoodClass, Dirt Dirt), WoodPath>();
        foreach (var cut in saw.AllCuts)
        {
            if (saw.SpellOfCut(cut.At) is not { } spell)
            {
                continue;
            }

            var key = (spell.MountId, cut.WoodClass, cut.Dirt);
            if (!sums.TryGetValue(key, out var path))
            {
                path = new WoodPath { MountId = spell.MountId, WoodClass = cut.WoodClass, Dirt = cut.Dirt };
                sums.Add(key, path);
            }

            // Where nobody knows the loop, the saw's own is as near as the record can say.
            var loop = loops.At(spell.BladeId, cut.At) ?? saw.SetupAt(cut.At).LoopM;
            path.PathMm += CutSums.PathMm(cut, loop);
            path.AreaMm2 += CutSums.AreaMm2(cut.HeightM, cut.LengthM, cut.Pieces);
            path.CutMs += cut.CutMs;
        }

        return [.. sums.Values];
    }
}
