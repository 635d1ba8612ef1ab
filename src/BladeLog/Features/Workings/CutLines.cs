using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>Feeds in m/s that hold a cut; null where nothing was given to hold it.</summary>
internal sealed record CutLimitsAt(double Fill, double? PowerW, double? PushN, double? ThrustN, double ChipRoom, double? Power, double? Push, double? Blade, double Rubbing, double NoChip)
{
    /// <summary>What gives the upper edge.</summary>
    public (string Name, double Feed) Least => new[] { ("chip room", (double?)ChipRoom), ("motor", Power), ("push", Push), ("blade bends", Blade) }
        .Where(l => l.Item2 is not null).Select(l => (l.Item1, l.Item2!.Value)).MinBy(l => l.Value);

    public static CutLimitsAt Of(CutCase cut, double fill, double? power, double? push, double? thrust) => new(
        fill, power, push, thrust,
        Gullet.FeedAtFill(cut, fill).MetresPerSecond,
        power is { } w ? CuttingForce.FeedAtPower(cut, new Power(w)).MetresPerSecond : null,
        push is { } n ? CuttingForce.FeedAtThrust(cut, new Force(n))?.MetresPerSecond : null,
        thrust is { } f ? CuttingForce.FeedAtThrust(cut, new Force(f))?.MetresPerSecond : null,
        Bite.RubbingFeed(cut).MetresPerSecond,
        Bite.NoChipFeed(cut).MetresPerSecond);

    public string Title(Shown shown)
    {
        (string name, double high) = Least;
        return high >= Rubbing ? $"{Figures.Feed(shown.Feed(Rubbing))} to {shown.FeedText(high)}, then {name}"
            : high >= NoChip ? $"Only rubbing: {Figures.Feed(shown.Feed(NoChip))} to {shown.FeedText(high)}, then {name}"
            : $"No feed works: {name} stops it at {shown.FeedText(high)}";
    }
}

/// <summary>The lines of a cut.</summary>
internal static class CutLines
{
    /// <summary>What needs neither wood nor edge.</summary>
    public static IEnumerable<BecauseLine> OfGeometry(double? pitch, double? speed, double? height, double? feed, double? loop)
    {
        if (pitch is { } p && height is { } H)
        {
            yield return Line("Teeth in the cut", Figures.Number(H / p, 1), "height over pitch; three at least", "derived", Provenance.Derived);
        }

        if (pitch is { } p2 && speed is { } v && feed is { } f)
        {
            yield return Line("Bite", Micrometres(f * p2 / v), "feed times pitch over band speed", "derived", Provenance.Derived);
        }

        if (speed is { } v2 && feed is { } f2 && loop is { } L)
        {
            yield return Line("Wood path for a square metre", Figures.With(Figures.Number(v2 / (f2 * L), 1), "m"), "band speed over feed and loop: slow feeding wears the teeth more", "derived", Provenance.Derived);
        }
    }

    public static IEnumerable<BecauseLine> Of(CutCase cut, CutLimitsAt limits, double? feed, Shown shown)
    {
        yield return Line("No chip below", shown.FeedText(limits.NoChip), "the bite over the edge is a fifth of its radius", "engineering-default", Provenance.EngineeringDefault);
        yield return Line("Rubs below", shown.FeedText(limits.Rubbing), "the bite over the edge equals its radius", "derived", Provenance.Derived);
        yield return Line("Chip room", shown.FeedText(limits.ChipRoom), $"gullets filled to {limits.Fill:0.##}: fill times band speed times gullet area over pitch and height", "gullet-capacity-note", Provenance.Published);
        if (limits.PowerW is { } power)
        {
            yield return Line("Motor", shown.FeedText(limits.Power ?? double.PositiveInfinity), $"{Figures.Number(power)} W at the band, solved for the feed", "derived", Provenance.Derived);
        }

        if (limits.PushN is { } push)
        {
            yield return Line("Push", shown.FeedText(limits.Push ?? double.PositiveInfinity), $"{shown.ForceText(push)} of push, solved for the feed", "hse-l23", Provenance.EngineeringDefault);
        }

        if (limits.ThrustN is { } thrust)
        {
            yield return Line("Blade bends", shown.FeedText(limits.Blade ?? double.PositiveInfinity), $"{shown.ForceText(thrust)} of push, solved for the feed", "derived", Provenance.Derived);
        }

        yield return Line("Resistance of the wood", $"{Figures.Number(CuttingForce.ShearFactor(cut).Megapascals, 1)} MPa", "density times the factors of hook, moisture, direction and frost", "ettelt-1987", Provenance.FromMemory);
        yield return Line("Edge counts as", Micrometres(CuttingForce.ReferenceThickness(cut.Rake).Metres), "thickness of chip the splitting of a sharp edge is worth", "orlowski-2013", Provenance.FromMemory);
        if (feed is not { } f)
        {
            yield break;
        }

        Speed at = new(f);
        Length bite = Kinematics.BitePerTooth(at, cut.Pitch, cut.BandSpeed);
        yield return Line("Over its own edge a tooth bites", Micrometres(Bite.OverEdge(cut, bite).Metres), $"bite times kerf over the edge's width: {Words(Bite.RegimeOf(cut, at))}", "derived", Provenance.Derived);
        yield return Line("Gullet fill", Figures.Number(Gullet.Fill(bite, cut.CutHeight, Gullet.AreaOf(cut)), 2), "bite times height over gullet area", "gullet-capacity-note", Provenance.Published);
        Length marks = SurfaceMarks.Spacing(bite, cut.Tip == TipKind.Set ? SetPattern.Alternate : SetPattern.None);
        yield return Line(
            "Marks on the face",
            shown.Units.Show(marks, Fields.Kerf),
            $"every {(cut.Tip == TipKind.Set ? "second tooth of alternate set" : "tooth")} reaches a face: {(SurfaceMarks.Seen(marks) ? "seen as ripples" : "too close to be seen")}",
            "derived",
            Provenance.Derived);
        yield return Line("Force on a tooth", shown.ForceText(CuttingForce.PerTooth(cut, bite).Newtons), "resistance times chip section and what the edge adds", "derived", Provenance.Derived);
        yield return Line("Cutting force", shown.ForceText(CuttingForce.Main(cut, at).Newtons), "force on a tooth times teeth in the cut", "derived", Provenance.Derived);
        yield return Line("Push on the blade", shown.ForceText(CuttingForce.Thrust(cut, at).Newtons), "the same for the force against the feed", "engineering-default", Provenance.EngineeringDefault);
        yield return Line("Cutting power", shown.Units.Show(CuttingForce.CuttingPower(cut, at)), "cutting force times band speed", "derived", Provenance.Derived);
    }

    private static string Words(BiteRegime regime) => regime switch
    {
        BiteRegime.NoChip => "no chip",
        BiteRegime.Rubbing => "it rubs",
        BiteRegime.Cutting => "it cuts",
        _ => "it cuts freely",
    };
}
