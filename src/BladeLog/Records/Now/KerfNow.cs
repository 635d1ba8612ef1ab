namespace BladeLog.Records;

/// <summary>A length and when it was measured.</summary>
public readonly record struct MeasuredLength(double Metres, DateTime AtUtc);

/// <summary>The set of the teeth as measured last. The sides are null where only both together were measured.</summary>
public readonly record struct MeasuredSet(double? LeftM, double? RightM, double BothM, DateTime AtUtc);

/// <summary>What was measured of a blade's kerf and set, at the bench or between sharpenings. Setting the teeth again ends it.</summary>
/// <param name="Slot">Of the slot of a test cut: what the wood loses.</param>
/// <param name="OverTeeth">Over the set teeth or the tips.</param>
/// <param name="Set">Of the teeth against the body.</param>
public sealed record KerfNow(MeasuredLength? Slot, MeasuredLength? OverTeeth, MeasuredSet? Set)
{
    public static KerfNow Nothing { get; } = new(null, null, null);

    /// <summary>The latest measure of the kerf, whichever way it was taken.</summary>
    public double? LastM => (Slot, OverTeeth) switch
    {
        ({ } slot, { } teeth) => slot.AtUtc >= teeth.AtUtc ? slot.Metres : teeth.Metres,
        ({ } slot, null) => slot.Metres,
        (null, { } teeth) => teeth.Metres,
        _ => null,
    };

    /// <summary>Width over the set teeth, from the latest of a caliper over them and of body and set.</summary>
    public double? OverSet(double thicknessM) => (OverTeeth, Set) switch
    {
        ({ } teeth, { } set) => teeth.AtUtc > set.AtUtc ? teeth.Metres : thicknessM + set.BothM,
        ({ } teeth, null) => teeth.Metres,
        (null, { } set) => thicknessM + set.BothM,
        _ => null,
    };

    /// <summary>Both lists are of one blade, its ancestors' too; the sharpenings in order of time.</summary>
    public static KerfNow Of(IReadOnlyList<Sharpening> sharpenings, IEnumerable<KerfReading> readings)
    {
        ArgumentNullException.ThrowIfNull(sharpenings);
        ArgumentNullException.ThrowIfNull(readings);
        var set = sharpenings.LastOrDefault(s => s.SetAgain);
        var since = readings.Where(r => set is null || (r.Entry.AtUtc, r.EntryId).CompareTo((set.Entry.AtUtc, set.EntryId)) > 0)
            .OrderBy(r => r.Entry.AtUtc).ThenBy(r => r.EntryId).ToList();
        var ground = sharpenings.Where(s => s.KerfM is not null && (set is null || (s.Entry.AtUtc, s.EntryId).CompareTo((set.Entry.AtUtc, set.EntryId)) >= 0))
            .Select(s => ((DateTime At, int Id, double Metres)?)(s.Entry.AtUtc, s.EntryId, s.KerfM!.Value)).LastOrDefault();
        var over = since.Where(r => r.KerfM is not null && r.How != KerfHow.TestCut)
            .Select(r => ((DateTime At, int Id, double Metres)?)(r.Entry.AtUtc, r.EntryId, r.KerfM!.Value)).LastOrDefault();
        var teeth = over is { } o && (ground is not { } g || (o.At, o.Id).CompareTo((g.At, g.Id)) > 0) ? over : ground;
        var slot = since.LastOrDefault(r => r.KerfM is not null && r.How == KerfHow.TestCut);
        var sides = since.LastOrDefault(r => r.SetBothM is not null);
        return new KerfNow(
            slot is null ? null : new MeasuredLength(slot.KerfM!.Value, slot.Entry.AtUtc),
            teeth is { } t ? new MeasuredLength(t.Metres, t.At) : null,
            sides is null ? null : new MeasuredSet(sides.SetLeftM, sides.SetRightM, sides.SetBothM!.Value, sides.Entry.AtUtc));
    }
}
