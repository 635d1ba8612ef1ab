namespace BladeLog.Records;

/// <summary>One line of the ledger. Every fact hangs on one; the id is the order in which the shop learned it.</summary>
public sealed class Entry
{
    public int Id { get; set; }

    /// <summary>Made by the form. The same op sent again is the same entry; a form that makes several facts numbers them by <see cref="Part"/>.</summary>
    public Guid Op { get; set; }

    public int Part { get; set; }

    public required string Kind { get; set; }

    /// <summary>When it happened, as stated.</summary>
    public DateTime AtUtc { get; set; }

    public DateTime EnteredUtc { get; set; }

    public string? TypedAt { get; set; }

    public int? PersonId { get; set; }

    public Person? Person { get; set; }

    public string? Device { get; set; }

    public byte[]? BodySha256 { get; set; }

    /// <summary>Where the answer to this op was, so that a resent form gets the same one.</summary>
    public string? AnswerPath { get; set; }

    public byte[]? PreviousHash { get; set; }

    public byte[]? Hash { get; set; }

    /// <summary>The fact that struck this one out, if any.</summary>
    public VoidFact? Void { get; set; }
}

/// <summary>A fact belongs to exactly one entry and is never changed.</summary>
public abstract class Fact
{
    public int EntryId { get; set; }

    public Entry Entry { get; set; } = null!;
}

/// <summary>Strikes out another entry. It is itself a fact: nothing is ever taken away.</summary>
public sealed class VoidFact : Fact
{
    public int VoidedId { get; set; }

    public Entry Voided { get; set; } = null!;

    public required string Reason { get; set; }
}
