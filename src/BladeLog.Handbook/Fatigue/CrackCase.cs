using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>A stress intensity: stress times the root of a length, in Pa√m.</summary>
public readonly record struct StressIntensity(double PascalRootMetres)
{
    /// <summary>From MPa√m.</summary>
    public static StressIntensity FromMegapascalRootMetres(double value) => new(value * 1e6);

    /// <summary>In MPa√m.</summary>
    public double MegapascalRootMetres => PascalRootMetres * 1e-6;
}

/// <summary>How the steel of the band is built; decides how fast a crack runs in it.</summary>
public enum CrackSteel
{
    /// <summary>Hardened and tempered, as bands are.</summary>
    Martensitic,

    /// <summary>Not hardened.</summary>
    FerriticPearlitic,
}

/// <summary>How the run of a crack ends.</summary>
public enum CrackEnd
{
    /// <summary>The band parts when the stress intensity reaches what the steel bears.</summary>
    Parts,

    /// <summary>The crack goes right across: nothing is left to hold the pull.</summary>
    Slack,

    /// <summary>The crack is already longer than the band bears.</summary>
    AtOnce,

    /// <summary>Under the threshold on every wheel.</summary>
    DoesNotRun,
}

/// <summary>A cracked band on a saw.</summary>
public sealed record CrackCase
{
    /// <summary>Body width, which the crack has to cross.</summary>
    public required Length BodyWidth { get; init; }

    /// <summary>Bending stress on each wheel.</summary>
    public required IReadOnlyList<Stress> Bending { get; init; }

    /// <summary>Tension while the band runs.</summary>
    public required Stress RunningTension { get; init; }

    /// <summary>Speed of the band.</summary>
    public required Speed BandSpeed { get; init; }

    /// <summary>Loop length.</summary>
    public required Length Loop { get; init; }

    /// <summary>How the steel is built.</summary>
    public CrackSteel Material { get; init; } = CrackSteel.Martensitic;

    /// <summary>φ, share of the bending stress of the face that works through the thickness: 1 is the safe side, 0.5 allows for the fall to the middle (engineering default 1).</summary>
    public double ThroughShare { get; init; } = 1;

    /// <summary>K_c, the stress intensity at which the band parts (engineering default 60 MPa√m).</summary>
    public StressIntensity Toughness { get; init; } = StressIntensity.FromMegapascalRootMetres(60);

    /// <summary>The range of stress intensity under which a crack does not run (engineering default 3 MPa√m).</summary>
    public StressIntensity Threshold { get; init; } = StressIntensity.FromMegapascalRootMetres(3);
}

/// <summary>The run of a crack. The reason for a hold, never a life figure for a blade of the shop.</summary>
/// <param name="From">Length of the crack when it is seen.</param>
/// <param name="To">Length at which the band parts.</param>
/// <param name="FirstRange">Range of the stress intensity at the first length, on the smallest wheel.</param>
/// <param name="Bends">Bends between the two; endless where the crack does not run.</param>
/// <param name="Minutes">The same in minutes of running.</param>
/// <param name="End">How it ends.</param>
/// <param name="Assumptions">What was assumed, a sentence each.</param>
public sealed record CrackRun(Length From, Length To, StressIntensity FirstRange, double Bends, double Minutes, CrackEnd End, IReadOnlyList<string> Assumptions);
