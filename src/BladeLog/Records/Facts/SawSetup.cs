using System.Text.Json.Serialization;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Records;

public enum ClassWork
{
    No,
    Supervised,
    Yes,
}

/// <summary>The kinds of work a saw is set up for.</summary>
[Flags]
public enum Takes
{
    None = 0,
    Board = 1,
    Resaw = 2,
    Beam = 4,
    Log = 8,
}

/// <summary>
/// The saw as it is from a date. Never edited: a real change is a new setup; a typing error is voided and replaced,
/// and every figure follows.
/// </summary>
public sealed class SawSetup : Fact
{
    public int SawId { get; set; }

    public Saw Saw { get; set; } = null!;

    /// <summary>Nominal loop and the shortest and longest the take-up reaches.</summary>
    public double LoopM { get; set; }

    public double LoopLeastM { get; set; }

    public double LoopMostM { get; set; }

    public double WidthLeastM { get; set; }

    public double WidthMostM { get; set; }

    public double? GuideSpanLeastM { get; set; }

    public double? GuideSpanMostM { get; set; }

    /// <summary>Lower guide below the table.</summary>
    public double LowerGuideM { get; set; }

    /// <summary>Upper guide above the work.</summary>
    public double ClearanceM { get; set; }

    public double CutHeightMostM { get; set; }

    public double? LongestPieceM { get; set; }

    public Takes Takes { get; set; }

    public ClassWork ClassWork { get; set; }

    /// <summary>Greatest pull of ONE strand.</summary>
    public double? StrandForceMostN { get; set; }

    public TensionSystem TensionSystem { get; set; }

    public double? TensionStiffnessNPerM { get; set; }

    public double MotorW { get; set; }

    /// <summary>Power drawn idling; null: 0.10 of the motor, a default.</summary>
    public double? IdleW { get; set; }

    /// <summary>Null: fed by hand.</summary>
    public double? FeederN { get; set; }

    public double? FeederLeastMps { get; set; }

    public double? FeederMostMps { get; set; }

    public double ChangeMinutes { get; set; }

    public long BreakCostMinor { get; set; }

    public double TiltMostRad { get; set; }

    /// <summary>Running hours per metered hour: below 1 where the meter counts power-on.</summary>
    public double MeterFactor { get; set; } = 1;

    public List<SetupWheel> Wheels { get; } = [];

    public List<SetupSpeed> Speeds { get; } = [];

    [JsonIgnore]
    public double UsualSpeedMps => (Speeds.FirstOrDefault(s => s.Usual) ?? Speeds[0]).SpeedMps;
}

public sealed class SetupWheel
{
    public int Id { get; set; }

    public int SetupId { get; set; }

    public int Position { get; set; }

    /// <summary>Over the tyre.</summary>
    public double DiameterM { get; set; }

    public string? DiameterTyped { get; set; }

    public bool Driven { get; set; }
}

public sealed class SetupSpeed
{
    public int Id { get; set; }

    public int SetupId { get; set; }

    public int Position { get; set; }

    public double SpeedMps { get; set; }

    public string? SpeedTyped { get; set; }

    /// <summary>The speed used for wood unless said otherwise.</summary>
    public bool Usual { get; set; }
}
