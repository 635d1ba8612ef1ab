using BladeLog.Advice.Life;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>Every sentence on a blade in a cut.</summary>
public static class CutWords
{
    public static string LimitName(FeedLimitKind kind) => kind switch
    {
        FeedLimitKind.ChipRoom => "chip room",
        FeedLimitKind.Power => "motor",
        FeedLimitKind.Push => "push",
        FeedLimitKind.Feeder => "feeder",
        FeedLimitKind.Beam => "blade bends",
        FeedLimitKind.Practical => "practical feed",
        _ => "finish",
    };

    public static string NotWood(CutWork work)
    {
        ArgumentNullException.ThrowIfNull(work);
        return work.Material is null
            ? $"\"{work.Cut.SpeciesTyped}\" is not a wood known here"
            : $"{LowerFirst(work.Material.Name)} is not wood: saws and speeds for wood only";
    }

    public static string WorkKind(SawNow saw, CutKind kind)
    {
        ArgumentNullException.ThrowIfNull(saw);
        string what = kind switch
        {
            CutKind.Board => "boards",
            CutKind.Resaw => "resawing",
            CutKind.Beam => "beams",
            _ => "logs",
        };
        return $"{saw.Saw.Name} does not take {what}";
    }

    public static string TooHigh(SawNow saw, CutWork work, Wording words) =>
        $"{words.Length(work.HeightM)} high, {saw.Saw.Name} opens to {words.BareLength(saw.Setup.CutHeightMostM)}";

    public static string TooLong(SawNow saw, CutWork work, Wording words) =>
        $"{words.Distance(work.LengthM)} long, {saw.Saw.Name} takes {words.Distance(saw.Setup.LongestPieceM ?? 0)}";

    public static string Bevel(SawNow saw)
    {
        ArgumentNullException.ThrowIfNull(saw);
        return saw.Setup.TiltMostRad > 0 ? $"{saw.Saw.Name} tilts to {Wording.Number(saw.Setup.TiltMostRad * 180 / Math.PI, 0)}° only" : $"{saw.Saw.Name} has no tilting frame";
    }

    public static string NoClass(SawNow saw)
    {
        ArgumentNullException.ThrowIfNull(saw);
        return $"no classes on {saw.Saw.Name}";
    }

    public static string KerfTooNarrow() => "its kerf is entered narrower than its body: measure both";

    public static string Unsuitable() => "the wheels are too small for its body: hours or less";

    public static string Teeth(double teeth, double least) => $"{Wording.Number(teeth, 1)} teeth in the cut ({Wording.Number(least, 0)} needed)";

    public static string Radius(double usual, double hard, Wording words) => $"tightest curve {words.Length(usual)}, hard bound {words.BareLength(hard)}";

    public static string Dull(double radius, double limit) => $"edge {Wording.Edge(radius)}, too dull for this ({Wording.Edge(limit)})";

    public static string OffAsDull() => $"{LifeWords.OffAsDull}: sharpen it first";

    /// <summary>The limit that shuts the gate: the feed it allows lies below the first chip.</summary>
    public static string Shut(FeedLimitKind kind) => kind switch
    {
        FeedLimitKind.ChipRoom => "the gullets are full before it cuts",
        FeedLimitKind.Power => "the motor stalls before it cuts",
        FeedLimitKind.Push => "the push needed to make it cut is too much for a hand",
        FeedLimitKind.Feeder => "the push needed to make it cut is too much for the feeder",
        FeedLimitKind.Beam => "the push needed to make it cut would twist the blade",
        FeedLimitKind.Practical => "it cuts only faster than the wood can be fed",
        _ => "it cuts only too coarse for this finish",
    };

    public static string Amber(FeedLimitKind kind, ThrustLimits? thrust) => kind switch
    {
        FeedLimitKind.ChipRoom => "gullets nearly full",
        FeedLimitKind.Power => "motor near its limit",
        FeedLimitKind.Push => "hard push",
        FeedLimitKind.Feeder => "feeder near its limit",
        FeedLimitKind.Beam => thrust?.GovernedBy == ThrustLimiter.FrontEdge ? "front edge goes slack: light hand" : "blade near twisting: light feed",
        FeedLimitKind.Practical => "fast feed",
        _ => "coarse for this finish",
    };

    public static string Fits(FeedLimitKind governed) => $"{LimitName(governed)} sets the feed";

    public static string UnknownHistory() => "history unknown: inspect it first";

    public static string Curve(double usual, Wording words)
    {
        ArgumentNullException.ThrowIfNull(words);
        return $"relief cuts needed: tightest curve without them {words.Length(usual)}";
    }

    public static string DullBeforeEnd() => "goes dull before the job ends";

    public static string Rubs(FeedLimitKind limit) => $"rubs: {LimitName(limit)} holds it below a clean bite";

    public static string LifeUsed() => "past its retire mark: rough work only";

    /// <summary>Overdue by its hours, or to be looked at before the next mount.</summary>
    public static string Inspect(bool byHours) => byHours ? "inspection overdue" : "inspect it before it goes on";

    public static string LastWeld() => "has had its last weld";

    public static string Supervisor() => "with a supervisor";

    public static string Spills() => "the bite is smaller than the side clearance: dust slips out past the body";

    public static string Nails() => "nails likely: go over the wood with a detector first";

    public static string OverPull(SawNow saw, BladeTension tension, Wording words)
    {
        ArgumentNullException.ThrowIfNull(saw);
        ArgumentNullException.ThrowIfNull(tension);
        ArgumentNullException.ThrowIfNull(words);
        return $"{saw.Saw.Name} may not reach this {words.Tension}: it asks {Wording.Number(tension.PullOverSaw!.Value * 100, 0)} % of the saw's greatest pull";
    }

    private static string LowerFirst(string name) => name.Length > 1 && char.IsLower(name[1]) ? char.ToLowerInvariant(name[0]) + name[1..] : name;
}
