using BladeLog.Handbook.Quantities;

namespace BladeLog.Records;

/// <summary>The shop at one moment, read in one go. Plain data: what the advice is given.</summary>
public sealed record ShopNow(
    DateTime AsOf,
    Shop Shop,
    IReadOnlyDictionary<string, Setting> Settings,
    IReadOnlyList<SawNow> Saws,
    IReadOnlyList<BladeFile> Blades,
    IReadOnlyList<QueuedCut> Cuts)
{
    public BladeFile? Blade(string tag) => Blades.FirstOrDefault(b => string.Equals(b.Blade.Tag, tag, StringComparison.OrdinalIgnoreCase));

    public SawNow? Saw(string code) => Saws.FirstOrDefault(s => string.Equals(s.Saw.Code, code, StringComparison.OrdinalIgnoreCase));
}

/// <summary>A saw with the setup in force and what is on it.</summary>
public sealed record SawNow(Saw Saw, SawSetup Setup, int? MountedBladeId, DateTime? MountedSince, long RunningMs, long NoBladeKnownMs)
{
    /// <summary>The tension is let off.</summary>
    public bool Slack { get; init; }

    /// <summary>The last start-of-shift check; null: never checked.</summary>
    public StartCheck? LastCheck { get; init; }

    /// <summary>The start of the timer that runs now; null: none runs.</summary>
    public TimerStarted? Timer { get; init; }
}

/// <summary>
/// Hours on one saw at one speed and tension. The tension is that of the spell where it was measured; null asks the
/// specification, then the defaults. OnThisWeld: after the blade's own present joint, so it counts for the weld.
/// OfAncestor: run before the blade was cut from its parent.
/// </summary>
public sealed record ExposureLine(SawSetup Setup, double SpeedMps, long RunningMs, double? TensionPa, double LoopM, bool InsideOut, bool OnThisWeld, bool OfAncestor)
{
    /// <summary>When the spell began.</summary>
    public DateTime FromUtc { get; init; }

    /// <summary>What was seen in the gullets by the end of the spell.</summary>
    public BladeMarks Marks { get; init; }

    public double Hours => RunningMs / 3_600_000.0;
}

/// <summary>Raw wood path per tooth since the last sharpening.</summary>
public sealed record PathLine(string WoodClass, Dirt Dirt, long PathMm, long AreaMm2);

/// <summary>A batch a blade is away in.</summary>
public sealed record AwayIn(string BatchNumber, string Service, DateTime SentUtc, DateTime? PromisedUtc);

/// <summary>Everything known of one blade, folded from its facts.</summary>
public sealed record BladeFile
{
    public required Blade Blade { get; init; }

    public required Spec Spec { get; init; }

    public required Place Place { get; init; }

    /// <summary>The saw it is on, or was last on.</summary>
    public int? SawId { get; init; }

    public int? LastSawId { get; init; }

    public string? Hook { get; init; }

    public required double WidthM { get; init; }

    public double? LoopM { get; init; }

    /// <summary>As measured at the last sharpening; null: the specification's.</summary>
    public double? GulletM { get; init; }

    /// <summary>What was measured of its kerf and set, and still holds.</summary>
    public KerfNow Kerf { get; init; } = KerfNow.Nothing;

    /// <summary>As measured last; null: never, or not since it was set again.</summary>
    public double? KerfM => Kerf.LastM;

    public double? EdgeAfterM { get; init; }

    public WeldQuality Weld { get; init; }

    /// <summary>Welds the loop has had, the first one counted.</summary>
    public int Welds { get; init; } = 1;

    public int Sharpenings { get; init; }

    public DateTime? LastSharpenedUtc { get; init; }

    public IReadOnlyList<ExposureLine> Exposures { get; init; } = [];

    public IReadOnlyList<PathLine> SinceSharpening { get; init; } = [];

    /// <summary>Path of its whole life by class, for the record.</summary>
    public IReadOnlyList<PathLine> WholeLife { get; init; } = [];

    /// <summary>Tension measured in the present spell.</summary>
    public double? TensionThisSpellPa { get; init; }

    /// <summary>Last measured tension of this blade on each saw.</summary>
    public IReadOnlyDictionary<int, double> LastTensionPa { get; init; } = new Dictionary<int, double>();

    /// <summary>The last angle it was found to lead at on each saw since it was last sharpened.</summary>
    public IReadOnlyDictionary<int, double> LeadsRad { get; init; } = new Dictionary<int, double>();

    public Hold? Hold { get; init; }

    public PriorUse? PriorUse { get; init; }

    public AwayIn? Away { get; init; }

    public Break? Break { get; init; }

    public Retirement? Retirement { get; init; }

    /// <summary>The blade this one was cut down to; null: it was not.</summary>
    public string? CutDownTo { get; init; }

    public Inspection? LastInspection { get; init; }

    /// <summary>What the last looks saw that stands still: a full-profile grind takes burrs away.</summary>
    public BladeMarks Marks { get; init; }

    /// <summary>Teeth that were missing at that look, where they were counted.</summary>
    public int? TeethMissing { get; init; }

    public DateTime? LastInspectedUtc { get; init; }

    /// <summary>Running since the last inspection.</summary>
    public long MsSinceInspection { get; init; }

    /// <summary>Mounted since the last inspection.</summary>
    public bool MountedSinceInspection { get; init; }

    public DateTime? MountedSinceUtc { get; init; }

    /// <summary>Lies here as the person at the saw took it off: dull, and neither ground nor put on again since.</summary>
    public bool OffAsDull { get; init; }

    public double Hours => Exposures.Sum(e => e.Hours);

    public double ThicknessM => Blade.MeasuredThicknessM ?? Spec.ThicknessM;
}
