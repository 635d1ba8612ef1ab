namespace BladeLog.Records.Writing;

/// <summary>The note one shift leaves the next.</summary>
public sealed record SaveHandOver(string Text, DateTime? At = null) : Command;

/// <summary>The person at the tablet has read the note.</summary>
public sealed record ReadHandOver(int EntryId) : Command;

/// <summary>
/// A person was found able at a task, on one saw or on all. Training to clear holds gives the right to it until the
/// refresher is due, so only somebody who has that right may enter it.
/// </summary>
public sealed record RecordTraining(string Person, TrainedTask Task, string By) : Command
{
    public string? Saw { get; init; }

    public DateTime? RefresherUtc { get; init; }

    public DateTime? At { get; init; }
}

/// <summary>Labels printed and put on these blades.</summary>
public sealed record RecordLabels(IReadOnlyList<string> Tags) : Command;
