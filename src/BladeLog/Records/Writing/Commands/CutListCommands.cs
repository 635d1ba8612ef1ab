using System.Text.Json.Serialization;

namespace BladeLog.Records.Writing;

/// <summary>A job for the list. Without a number it gets the next one.</summary>
public sealed record QueueCut(QueuedCut Cut) : Command;

public sealed record EditCut(int Number, int Version, QueuedCut Cut) : Command;

public sealed record DropCut(int Number, int Version) : Command;

/// <summary>The list's numbers in their new order.</summary>
public sealed record ReorderCuts(IReadOnlyList<int> Numbers) : Command;

/// <summary>A file's rows, all or none. The same file a second time says so.</summary>
public sealed record ImportRows(string Kind, string Sha256) : Command
{
    /// <summary>Stands for by the file's own hash.</summary>
    [JsonIgnore]
    public IReadOnlyList<ImportRow> Rows { get; init; } = [];
}

public sealed record ImportRow(int Line, Command Command);
