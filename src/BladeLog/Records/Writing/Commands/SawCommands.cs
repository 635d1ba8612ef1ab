namespace BladeLog.Records.Writing;

/// <summary>A saw and its first setup, in force from a time.</summary>
public sealed record AddSaw(string Code, string Name, bool HasHourMeter, SawSetup Setup, DateTime? From = null) : Command;

/// <summary>The saw as it is from a time on; or, where it replaces a setup that was typed wrongly, in that one's stead.</summary>
public sealed record NewSetup(string Saw, SawSetup Setup, DateTime? From = null, int? Replaces = null, string? Reason = null) : Command;

public sealed record EditSaw(string Code, int Version, string NewCode, string Name, bool Active, bool HasHourMeter) : Command;

/// <summary>
/// The check before a saw starts. Tension off then on is written too; a blade that clicks is on hold with it. Tension and
/// clicking are null where no blade is on.
/// </summary>
public sealed record CheckSaw(string Saw, bool Guards, bool? Tension, bool UnderTable, bool? Quiet, bool Brake) : Command
{
    public string? Note { get; init; }

    public DateTime? At { get; init; }
}

/// <summary>The tension let off at the end of the day, or put on again.</summary>
public sealed record SlackTension(string Saw, bool LetOff, DateTime? At = null) : Command;
