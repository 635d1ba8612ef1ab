namespace BladeLog.Records;

/// <summary>What one shift tells the next, as it was saved.</summary>
public sealed class HandOver : Fact
{
    public required string Text { get; set; }
}

/// <summary>Somebody of the next shift has read it; who is the entry's person.</summary>
public sealed class HandOverRead : Fact
{
    public int HandOverId { get; set; }

    public HandOver HandOver { get; set; } = null!;
}

public enum TrainedTask
{
    Operate,
    ChangeBlade,
    Sharpen,
    Weld,
    ClearHold,
}

/// <summary>A person was shown a task and found able. Without a saw it holds for all of them.</summary>
public sealed class Trained : Fact
{
    public int PersonId { get; set; }

    public Person Person { get; set; } = null!;

    public int? SawId { get; set; }

    public Saw? Saw { get; set; }

    public TrainedTask Task { get; set; }

    /// <summary>Who trained, which need not be who entered it.</summary>
    public int ById { get; set; }

    public Person By { get; set; } = null!;

    /// <summary>When a refresher is due; null: never.</summary>
    public DateTime? RefresherUtc { get; set; }
}

/// <summary>A label with this tag was printed for the blade and put on.</summary>
public sealed class LabelPrinted : Fact
{
    public int BladeId { get; set; }

    public Blade Blade { get; set; } = null!;

    /// <summary>As printed: a blade whose tag was put right since needs another label.</summary>
    public required string Tag { get; set; }
}
