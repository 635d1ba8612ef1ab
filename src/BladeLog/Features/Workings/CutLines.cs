using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tables;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>The lines of a cut.</summary>
internal static class CutLines
{
    /// <summary>What needs neither wood nor edge.</summary>
    public static IEnumerable<BecauseLine> OfGeometry(double? pitch, double? speed, double? height, double? feed, double? loop, Shown shown)
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
            yield return Line("Wood path for a square metre", shown.FarText(v2 / (f2 * L)), "band speed over feed and loop: slow feeding wears the teeth more", "derived", Provenance.Derived);
        }
    }

    public static IEnumerable<BecauseLine> Of(CutCase cut, CutLimitsAt limits, CutLimitsAt care, SetPattern pattern, double? feed, Shown shown)
    {
        yield return Line("No chip below", shown.FeedText(limits.NoChip), "the bite over the edge is a fifth of its radius", "engineering-default", Provenance.EngineeringDefault);
        yield return Line("Rubs below", shown.FeedText(limits.Rubbing), "the bite over the edge equals its radius", "derived", Provenance.Derived);
        yield return Line("Chip room", shown.FeedText(limits.ChipRoom), $"gullets filled to {limits.Held.Fill:0.##}: fill times band speed times gullet area over pitch and height", "gullet-capacity-note", Provenance.Published);
        if (limits.Held.PowerW is { } power)
        {
            yield return Line("Motor", shown.FeedText(limits.Power ?? double.PositiveInfinity), $"{Figures.Number(power)} W at the band, solved for the feed", "derived", Provenance.Derived);
        }

        if (limits.Held.PushN is { } push)
        {
            yield return limits.Held.PowerFed
                ? Line("Feeder", shown.FeedText(limits.Push ?? double.PositiveInfinity), $"{shown.ForceText(push)} of push, solved for the feed", "derived", Provenance.Derived)
                : Line("Push", shown.FeedText(limits.Push ?? double.PositiveInfinity), $"{shown.ForceText(push)} of push, solved for the feed; guidelines: {Guide(CutLimits.PushGreen, CutLimits.PushAmber, shown)} to keep a load moving, {Guide(CutLimits.PushToStartGreen, CutLimits.PushToStartAmber, shown)} to start it (women and men)", "hse-l23", Provenance.Published);
        }

        if (limits.Held.ThrustN is { } thrust)
        {
            yield return Line("Blade bends", shown.FeedText(limits.Blade ?? double.PositiveInfinity), $"{shown.ForceText(thrust)} of push, solved for the feed", "derived", Provenance.Derived);
        }

        if (limits.Held.MostMps is { } guided)
        {
            yield return Line("Practical feed", shown.FeedText(guided), limits.Held.PowerFed ? "greatest feed of the feeder" : "what hands can guide", "common-practice", limits.Held.PowerFed ? Provenance.Yours : Provenance.CommonPractice);
        }

        if (limits.Finish is { } fine)
        {
            yield return Line("Finish", shown.FeedText(fine), $"greatest bite of {shown.Units.Show(new Length(limits.Held.BiteM!.Value), Fields.Kerf)} times band speed over pitch", "engineering-default", Provenance.EngineeringDefault);
        }

        yield return Line("With care up to", shown.FeedText(care.Least.Feed), $"{care.Least.Name}, every limit at its most and the force at the low end of its band", "engineering-default", Provenance.EngineeringDefault);
        yield return Line("Resistance of the wood", shown.Units.Show(CuttingForce.ShearFactor(cut)), "density times the factors of hook, moisture, direction and frost", "ettelt-1987", Provenance.FromMemory);
        yield return Line("Edge counts as", Micrometres(CuttingForce.ReferenceThickness(cut.Rake).Metres), "thickness of chip the splitting of a sharp edge is worth", "orlowski-2013", Provenance.FromMemory);
        if (feed is not { } f)
        {
            yield break;
        }

        Speed at = new(f);
        Length bite = Kinematics.BitePerTooth(at, cut.Pitch, cut.BandSpeed);
        yield return Line("Over its own edge a tooth bites", Micrometres(Bite.OverEdge(cut, bite).Metres), $"bite times kerf over the edge's width: {Words(Bite.RegimeOf(cut, at))}", "derived", Provenance.Derived);
        yield return Line("Gullet area", shown.GulletText(Gullet.AreaOf(cut)), cut.MeasuredGulletArea is null ? "shape times pitch times gullet depth" : "as measured", "gullet-capacity-note", cut.MeasuredGulletArea is null ? Provenance.Published : Provenance.Yours);
        yield return Line("Gullet fill", Figures.Number(Gullet.Fill(bite, cut.CutHeight, Gullet.AreaOf(cut)), 2), "bite times height over gullet area", "gullet-capacity-note", Provenance.Published);
        if (limits.Held.PowerFed)
        {
            Length side = Kerf.SetPerSide(cut.Kerf, cut.Thickness);
            yield return Line("Bite over side clearance", side.Metres > 0 ? Figures.Number(Kerf.SpillRatio(bite, side), 2) : "no clearance", "on power-fed mills a bite over 0.1 mm should be no less than the side clearance, or dust slips out past the body", "from-memory", Provenance.FromMemory);
        }

        if (pattern != SetPattern.None)
        {
            yield return Line("Bite in the outer lanes of the kerf", Micrometres(Kerf.OuterLaneBite(bite, pattern).Metres), $"where only every {(pattern == SetPattern.Raker ? "third" : "second")} tooth cuts", "derived", Provenance.Derived);
        }

        Length marks = SurfaceMarks.Spacing(bite, pattern);
        yield return Line(
            "Marks on the face",
            shown.Units.Show(marks, Fields.Kerf),
            $"every {(pattern switch { SetPattern.Raker => "third tooth of raker set", SetPattern.Alternate => "second tooth of alternate set", _ => "tooth" })} reaches a face: {(SurfaceMarks.Seen(marks) ? "seen as ripples" : "too close to be seen")}",
            "derived",
            Provenance.Derived);
        yield return Line("Force on a tooth", shown.ForceText(CuttingForce.PerTooth(cut, bite).Newtons), "resistance times chip section and what the edge adds", "derived", Provenance.Derived);
        yield return Line("Cutting force", shown.ForceText(CuttingForce.Main(cut, at).Newtons), "force on a tooth times teeth in the cut", "derived", Provenance.Derived);
        yield return Line("Push on the blade", shown.ForceText(CuttingForce.Thrust(cut, at).Newtons), "the same for the force against the feed", "engineering-default", Provenance.EngineeringDefault);
        yield return Line("Cutting power", shown.Units.Show(CuttingForce.CuttingPower(cut, at)), "cutting force times band speed", "derived", Provenance.Derived);
    }

    /// <summary>How deep it goes at this feed, and what stops it there.</summary>
    public static BecauseLine Deepest(CutCase cut, CutLimitsAt limits, double feed, double? opens, double least, Shown shown)
    {
        (string name, double height) = limits.DeepestAt(cut, feed, opens);
        return Line(
            "At this feed it goes as deep as",
            height < least ? "none" : shown.SmallText(height, 0),
            $"{name} stops it: gullet fill, power and push grow as the height does; the push the blade stands is taken as at this height",
            "derived",
            Provenance.Derived);
    }

    private static string Guide(Limit women, Limit men, Shown shown) => $"{shown.ForceText(women.Value)} and {shown.ForceText(men.Value)}";

    private static string Words(BiteRegime regime) => regime switch
    {
        BiteRegime.NoChip => "no chip",
        BiteRegime.Rubbing => "it rubs",
        BiteRegime.Cutting => "it cuts",
        _ => "it cuts freely",
    };
}
