namespace BladeLog.Records;

/// <summary>
/// What was looked at on a saw before it starts, each right or not right. Tension and clicking are asked only where a
/// blade is on: without one they are null.
/// </summary>
public sealed class StartCheck : Fact
{
    public int SawId { get; set; }

    public Saw Saw { get; set; } = null!;

    /// <summary>Blade guard, wheel guards and doors.</summary>
    public bool GuardsRight { get; set; }

    /// <summary>The tension is on.</summary>
    public bool? TensionRight { get; set; }

    /// <summary>The guard under the table and the mouthpiece.</summary>
    public bool UnderTableRight { get; set; }

    /// <summary>Nothing clicks when it is turned by hand or run up.</summary>
    public bool? QuietRight { get; set; }

    /// <summary>The brake, or how long the wheels coast.</summary>
    public bool BrakeRight { get; set; }

    public string? Note { get; set; }

    /// <summary>Something stays to be put right on the saw itself, until the next check finds it right.</summary>
    public bool SawNotRight => !(GuardsRight && UnderTableRight && BrakeRight);
}

/// <summary>A saw's timer was started. It runs while this is the saw's newest start and has neither a run nor a void.</summary>
public sealed class TimerStarted : Fact
{
    public int SawId { get; set; }

    public Saw Saw { get; set; } = null!;

    /// <summary>The speed it was started at, where the saw has several.</summary>
    public double? SpeedMps { get; set; }
}
