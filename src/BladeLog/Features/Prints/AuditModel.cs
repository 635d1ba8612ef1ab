using BladeLog.Advice;
using BladeLog.Records;

namespace BladeLog.Features.Prints;

public sealed record AuditForm
{
    public string? From { get; init; }

    public string? To { get; init; }
}

/// <summary>One line of the audit: when it happened, what, and who answers for it.</summary>
/// <param name="At">To sort by.</param>
/// <param name="When">As printed.</param>
/// <param name="What">In words.</param>
/// <param name="Who">Initials, with the day of entry where that was another.</param>
/// <param name="Gap">A look that was missing.</param>
public sealed record AuditRow(DateTime At, string When, string What, string Who, bool Gap = false);

/// <summary>A blade or a saw with its lines.</summary>
public sealed record AuditPart(string Name, string Says, IReadOnlyList<AuditRow> Rows);

public sealed record AuditModel
{
    public required AuditForm Form { get; init; }

    public required FormState State { get; init; }

    public required string From { get; init; }

    public required string To { get; init; }

    public required IReadOnlyList<(string Name, string Figure)> Sums { get; init; }

    public required IReadOnlyList<AuditPart> Saws { get; init; }

    public required IReadOnlyList<AuditPart> Blades { get; init; }

    public required IReadOnlyList<AuditRow> Trainings { get; init; }

    /// <summary>Late or missing looks that were open within the days printed.</summary>
    public required int Gaps { get; init; }

    /// <summary>The same since the first record, whatever days are printed.</summary>
    public required int AllGaps { get; init; }

    /// <summary>The day of the first record; null: there is none yet.</summary>
    public required string? FirstRecord { get; init; }

    /// <summary>The days printed reach back to the first record.</summary>
    public required bool Whole { get; init; }

    public required string When { get; init; }
}

/// <summary>A blade's rule of inspection against what was done.</summary>
internal sealed record BladeGaps(Blade Blade, IReadOnlyList<InspectionGap> Gaps);
