using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>What happens in the cut at one feed.</summary>
/// <param name="BiteM">Bite of a tooth.</param>
/// <param name="ChipM">Chip over its own edge.</param>
/// <param name="Regime">Whether it cuts, rubs or makes no chip.</param>
/// <param name="Fill">Fill of the gullets.</param>
/// <param name="ForceN">Main force of all teeth.</param>
/// <param name="ThrustN">Push.</param>
/// <param name="PowerW">Power at the blade.</param>
/// <param name="Reserve">Thrust the blade stands over the thrust it gets; endless where it pulls itself in.</param>
public sealed record AtFeed(double BiteM, double ChipM, BiteRegime Regime, double Fill, double ForceN, double ThrustN, double PowerW, double Reserve);

/// <summary>One blade on one saw for one cut. Figures are null where it is refused before they are reckoned.</summary>
public sealed record Choice
{
    public required CutWork Work { get; init; }

    public required BladeAdvice Blade { get; init; }

    public required SawNow Saw { get; init; }

    public required double SpeedMps { get; init; }

    public required Verdict Verdict { get; init; }

    /// <summary>The strongest reason first; others after it.</summary>
    public required IReadOnlyList<CutReason> Reasons { get; init; }

    public CutReason Reason => Reasons[0];

    public CutCase? Case { get; init; }

    public Gate? Gate { get; init; }

    public BladeTension? Tension { get; init; }

    /// <summary>At the advised feed.</summary>
    public AtFeed? AtAdvised { get; init; }

    public JobCost? Job { get; init; }

    /// <summary>Tightest curve without relief cuts and the hard bound, m; null where the kerf leaves no room.</summary>
    public double? UsualRadiusM { get; init; }

    public double? HardRadiusM { get; init; }

    public IReadOnlyList<string> Cautions { get; init; } = [];

    public string Tag => Blade.File.Blade.Tag;

    public bool Mounted => Saw.MountedBladeId == Blade.File.Blade.Id;

    public bool SwapNeeded => !Mounted;

    /// <summary>Whether the sawing goes with relief cuts.</summary>
    public bool Relief { get; init; }

    /// <summary>Metres to dull at this cut's depth and working feed; null where it is refused.</summary>
    public MetresLeft? MetresLeft => Gate?.AdvisedMps is { } feed
        ? Blade.Edge.LeftAt(Work.HeightM, feed, Blade.File.LoopM ?? Saw.Setup.LoopM, SpeedMps, Work.WoodFactor.Value, Work.DirtFactor.Value, Work.Cut.Number)
        : null;

    public double TeethInCut => Kinematics.TeethInCut(new Length(Work.HeightM), new Length(Blade.Body.PitchMean));
}

/// <summary>The answer to "which blade for this cut": best first.</summary>
public sealed record CutAnswer
{
    public required CutWork Work { get; init; }

    public required IReadOnlyList<Choice> Choices { get; init; }

    /// <summary>Where nothing fits: what would help, in the order to try it.</summary>
    public required IReadOnlyList<Proposal> Proposals { get; init; }

    public Choice? First => Choices.Count > 0 && Choices[0].Verdict != Verdict.No ? Choices[0] : null;

    public bool NothingFits => First is not { Verdict: Verdict.Fits };
}
