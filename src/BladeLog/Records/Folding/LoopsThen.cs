namespace BladeLog.Records.Folding;

/// <summary>
/// The loop a blade had at a time: by its last joint before then, else as its specification came; a blade cut from
/// another has none before its own joint.
/// </summary>
public sealed class LoopsThen
{
    private readonly Dictionary<int, double?> _new;
    private readonly ILookup<int, LoopFrom> _joints;

    public LoopsThen(Dictionary<int, double?> asNew, IEnumerable<LoopFrom> joints)
    {
        _new = asNew;
        _joints = joints.OrderBy(j => j.At).ThenBy(j => j.Id).ToLookup(j => j.BladeId);
    }

    public double? At(int bladeId, DateTime at)
    {
        var loop = _new.GetValueOrDefault(bladeId);
        foreach (var joint in _joints[bladeId])
        {
            if (joint.At <= at)
            {
                loop = joint.LoopM;
            }
        }

        return loop;
    }
}
