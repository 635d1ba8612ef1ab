using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Cutting;

namespace BladeLog.Advice.Cuts;

/// <summary>What holds the feed down.</summary>
public enum FeedLimitKind
{
    ChipRoom,
    Power,
    Push,
    Feeder,
    Beam,
    Practical,
    Finish,
}

/// <summary>One upper limit of feed, m/s: comfortable up to green, not at all beyond amber. Endless where nothing holds it.</summary>
public sealed record FeedLimit(FeedLimitKind Kind, double GreenMps, double AmberMps, Figure Green, Figure Amber);

/// <summary>How a gate stands.</summary>
public enum GateState
{
    /// <summary>Open between the rubbing feed and the least green limit.</summary>
    Open,

    /// <summary>The channel runs through an amber limit.</summary>
    Amber,

    /// <summary>It cuts only while rubbing.</summary>
    Rubbing,

    Shut,
}

/// <summary>The window of feed of a blade in a cut. Feeds in m/s.</summary>
public sealed record Gate
{
    public required GateState State { get; init; }

    /// <summary>Below it no chip forms.</summary>
    public required double NoChipMps { get; init; }

    /// <summary>Below it the edge rubs.</summary>
    public required double RubbingMps { get; init; }

    public required IReadOnlyList<FeedLimit> Limits { get; init; }

    /// <summary>Least green limit and least amber limit.</summary>
    public required FeedLimit Green { get; init; }

    public required FeedLimit Amber { get; init; }

    public ThrustLimits? Thrust { get; init; }

    /// <summary>Lower and upper edge; null when shut.</summary>
    public double? LowMps => State switch
    {
        GateState.Shut => null,
        GateState.Rubbing => NoChipMps,
        _ => RubbingMps,
    };

    public double? HighMps => State switch
    {
        GateState.Shut => null,
        GateState.Open => Green.GreenMps,
        _ => Amber.AmberMps,
    };

    /// <summary>The feed to work at.</summary>
    public double? AdvisedMps { get; init; }

    /// <summary>The limit behind the verdict: what gave the green edge, or, when rubbing or shut, what gave the amber one.</summary>
    public FeedLimitKind GovernedBy => State is GateState.Open or GateState.Amber ? Green.Kind : Amber.Kind;

    /// <summary>What sets the upper edge of the window.</summary>
    public FeedLimitKind UpperEdgeBy => State == GateState.Open ? Green.Kind : Amber.Kind;

    public static Gate Of(CutCase cut, IReadOnlyList<FeedLimit> limits, ThrustLimits? thrust, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(limits);
        ArgumentNullException.ThrowIfNull(settings);
        double rubbing = Bite.RubbingFeed(cut).MetresPerSecond, noChip = Bite.NoChipFeed(cut).MetresPerSecond;
        FeedLimit green = limits.MinBy(l => l.GreenMps)!, amber = limits.MinBy(l => l.AmberMps)!;
        double G = green.GreenMps, A = amber.AmberMps;
        Gate gate = new()
        {
            State = G >= rubbing ? GateState.Open : A >= rubbing ? GateState.Amber : A >= noChip ? GateState.Rubbing : GateState.Shut,
            NoChipMps = noChip,
            RubbingMps = rubbing,
            Limits = limits,
            Green = green,
            Amber = amber,
            Thrust = thrust,
        };
        return gate.State == GateState.Shut ? gate : gate with
        {
            AdvisedMps = Math.Max(gate.LowMps!.Value, settings[CutSettings.AdvisedShare] * gate.HighMps!.Value),
        };
    }
}
