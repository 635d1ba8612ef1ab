using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;

namespace BladeLog.Features.Workings;

/// <summary>What holds a cut; null where nothing was given to hold it. In SI.</summary>
/// <param name="Fill">Gullet fill allowed.</param>
/// <param name="PowerW">Power at the band.</param>
/// <param name="PushN">Push of a hand or of the feeder.</param>
/// <param name="ThrustN">Push the blade stands.</param>
/// <param name="MostMps">Greatest feed that can be guided.</param>
/// <param name="BiteM">Greatest bite of the finish.</param>
/// <param name="PowerFed">A feeder pushes, not a hand.</param>
internal sealed record CutHeld(double Fill, double? PowerW, double? PushN, double? ThrustN, double? MostMps = null, double? BiteM = null, bool PowerFed = false);

/// <summary>Feeds in m/s that hold a cut; null where nothing was given to hold it.</summary>
internal sealed record CutLimitsAt(CutHeld Held, double ChipRoom, double? Power, double? Push, double? Blade, double? Finish, double Rubbing, double NoChip)
{
    /// <summary>What gives the upper edge, in the order the choices try them.</summary>
    public (string Name, double Feed) Least => new[] { ("chip room", (double?)ChipRoom), ("motor", Power), (Held.PowerFed ? "feeder" : "push", Push), ("blade bends", Blade), ("practical feed", Held.MostMps), ("finish", Finish) }
        .Where(l => l.Item2 is not null).Select(l => (l.Item1, l.Item2!.Value)).MinBy(l => l.Value);

    public static CutLimitsAt Of(CutCase cut, CutHeld held) => new(
        held,
        Gullet.FeedAtFill(cut, held.Fill).MetresPerSecond,
        held.PowerW is { } w ? CuttingForce.FeedAtPower(cut, new Power(w)).MetresPerSecond : null,
        held.PushN is { } n ? CuttingForce.FeedAtThrust(cut, new Force(n))?.MetresPerSecond : null,
        held.ThrustN is { } f ? CuttingForce.FeedAtThrust(cut, new Force(f))?.MetresPerSecond : null,
        held.BiteM is { } b ? Kinematics.FeedForBite(new Length(b), cut.Pitch, cut.BandSpeed).MetresPerSecond : null,
        Bite.RubbingFeed(cut).MetresPerSecond,
        Bite.NoChipFeed(cut).MetresPerSecond);

    /// <summary>The greatest height at a feed, and what stops it there.</summary>
    public (string Name, double HeightM) DeepestAt(CutCase cut, double feed, double? opens)
    {
        Speed at = new(feed);
        double thrust = CuttingForce.Thrust(cut, at).Newtons, high = cut.CutHeight.Metres;
        double? Pushed(double? n) => n is { } most ? thrust > 0 ? high * most / thrust : double.PositiveInfinity : null;
        double? Paced(double? most) => most is { } m ? feed <= m * (1 + 1e-9) ? double.PositiveInfinity : 0 : null;
        return new[]
        {
            ("chip room", high * ChipRoom / feed),
            ("motor", Held.PowerW is { } w ? high * w / CuttingForce.CuttingPower(cut, at).Watts : null),
            (Held.PowerFed ? "feeder" : "push", Pushed(Held.PushN)),
            ("bending of the blade", Pushed(Held.ThrustN)),
            ("practical feed", Paced(Held.MostMps)),
            ("finish", Paced(Finish)),
            ("what the saw opens to", opens),
        }.Where(l => l.Item2 is not null).Select(l => (l.Item1, l.Item2!.Value)).MinBy(l => l.Value);
    }

    /// <summary>The window: open, open with care, or only while it rubs.</summary>
    /// <param name="care">The same with every limit at its most.</param>
    /// <param name="shown">The shop's units.</param>
    public string Title(CutLimitsAt care, Shown shown)
    {
        (string name, double high) = Least;
        (string then, double most) = care.Least;
        string Between(double low, double up, string by) => $"{Figures.Feed(shown.Feed(low))} to {shown.FeedText(up)}, then {by}";
        return high >= Rubbing ? Between(Rubbing, high, name)
            : most >= Rubbing ? $"With care: {Between(Rubbing, most, then)}"
            : most >= NoChip ? $"Only rubbing: {Between(NoChip, most, then)}"
            : $"No feed works: {then} stops it at {shown.FeedText(most)}";
    }
}
