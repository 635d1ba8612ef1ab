namespace BladeLog.Records.Writing;

/// <summary>A sentence beside the field it is about.</summary>
public readonly record struct Problem(string Field, string Sentence);

/// <summary>What became of a form.</summary>
public abstract record WriteResult
{
    private WriteResult()
    {
    }

    /// <summary>Recorded, or recorded before by the same form.</summary>
    public sealed record Done(int EntryId, string AnswerPath) : WriteResult;

    /// <summary>Not recorded: it cannot be so.</summary>
    public sealed record Refused(IReadOnlyList<Problem> Problems) : WriteResult;

    /// <summary>Not recorded yet: it is unusual, and one more tap records it.</summary>
    public sealed record Ask(IReadOnlyList<Problem> Problems, string OneMoreTap) : WriteResult;

    /// <summary>Somebody else was there first.</summary>
    public sealed record Clash(string Who, DateTime When, string What) : WriteResult;
}

/// <summary>
/// A form as it was sent. The op is made with the form, so that a form sent twice is recorded once; the answer path is
/// where its sender is to be taken, the handler's own where it is null.
/// </summary>
public sealed record Sent(Guid Op, DateTime Now, int? PersonId = null, string? Device = null, string? TypedAt = null, string? AnswerPath = null)
{
    /// <summary>The form as it was typed, by which it is known again; null: by the command. "Now" and "20 min ago" mean another moment when it is sent again.</summary>
    public string? Form { get; init; }
}

/// <summary>What is to be recorded. A time left out means now.</summary>
public abstract record Command;
