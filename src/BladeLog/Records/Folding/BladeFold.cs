namespace BladeLog.Records.Folding;

/// <summary>A blade's events folded, in time order, to where and how it is now.</summary>
public static class BladeFold
{
    public static BladeNow Now(in BladeStart start, IEnumerable<BladeEvent> events)
    {
        var now = new BladeNow { BladeId = start.BladeId, Place = Place.Rack, WidthM = start.WidthM, LoopM = start.NewLoopM };
        var spot = Place.Rack;
        // A blade cut from another is there only while that cut stands.
        var gone = start.CutFromAnother;
        var mounted = new Dictionary<int, int>();
        var held = new List<int>();
        foreach (var e in InOrder(events))
        {
            switch (e.Kind)
            {
                case BladeEventKind.Mounted:
                    mounted[e.Id] = e.Reference;
                    (spot, now.Hook) = (Place.Rack, null);
                    break;
                case BladeEventKind.Dismounted:
                    mounted.Remove(e.Reference);
                    spot = e.Place;
                    break;
                case BladeEventKind.Hung:
                    (spot, now.Hook) = (e.Place, e.Hook);
                    break;
                case BladeEventKind.SentAway:
                    (spot, now.Hook) = (Place.AtSharpener, null);
                    break;
                case BladeEventKind.CameBack:
                    spot = e.Place;
                    now.WidthM = e.Number ?? now.WidthM;
                    break;
                case BladeEventKind.Sharpened or BladeEventKind.PriorUse:
                    now.WidthM = e.Number ?? now.WidthM;
                    break;
                case BladeEventKind.CutFromParent:
                    now.WidthM = e.Number ?? now.WidthM;
                    gone = false;
                    break;
                case BladeEventKind.Joined:
                    (now.LoopM, now.JointId) = (e.Number, e.Id);
                    break;
                case BladeEventKind.Held:
                    held.Add(e.Id);
                    break;
                case BladeEventKind.Cleared:
                    held.Remove(e.Reference);
                    break;
                case BladeEventKind.Retired or BladeEventKind.CutDown or BladeEventKind.Lost:
                    gone = true;
                    break;
                default:
                    throw new InvalidOperationException($"Unknown event {e.Kind}.");
            }
        }

        now.HoldId = held.Count > 0 ? held[^1] : null;
        now.SawId = mounted.Count > 0 ? mounted.Values.First() : null;
        // A blade on a saw is on the saw, whatever else is written of it.
        now.Place = now.SawId is not null ? Place.OnSaw : gone ? Place.Gone : spot;
        return now;
    }

    /// <summary>
    /// By the stated time, then in the order they were learned. A blade taken off and put away in one form carries one
    /// time, and so does a hold and its clearing, which the order of learning settles.
    /// </summary>
    public static IEnumerable<BladeEvent> InOrder(IEnumerable<BladeEvent> events) => events.OrderBy(e => e.At).ThenBy(e => e.Id);
}
