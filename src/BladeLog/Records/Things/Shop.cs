namespace BladeLog.Records;

/// <summary>Edited, with a history row for each edit; the version guards against two tablets editing at once.</summary>
public abstract class Thing
{
    public int Id { get; set; }

    public Guid Uid { get; set; }

    public int Version { get; set; }
}

public enum LengthUnit
{
    Millimetre,
    Inch,
}

public enum Spelling
{
    Uk,
    Us,
}

/// <summary>The word for the pull on the blade: shop saws say tension, wide-saw mills say strain.</summary>
public enum PullWord
{
    Tension,
    Strain,
}

/// <summary>One database is one shop: one row.</summary>
public sealed class Shop : Thing
{
    public required string Name { get; set; }

    /// <summary>IANA zone of the shop's clock.</summary>
    public required string Zone { get; set; }

    public LengthUnit Lengths { get; set; }

    public Spelling Spelling { get; set; }

    public PullWord PullWord { get; set; }

    public long RateMinorPerHour { get; set; }

    public int CurrencyDigits { get; set; } = 2;

    /// <summary>Timber value where a cut does not say, minor units per m³.</summary>
    public long TimberMinorPerM3 { get; set; }

    /// <summary>What the shop's network calls the machine this runs on, with its port where it has one; printed in the square code of a label.</summary>
    public string? LanName { get; set; }

    public bool IsSample { get; set; }
}

/// <summary>A default of the handbook or of the advice that the shop has set for itself.</summary>
public sealed class Setting
{
    public required string Key { get; set; }

    public double Value { get; set; }

    public required string Typed { get; set; }
}

public sealed class Person : Thing
{
    public required string Initials { get; set; }

    public required string Name { get; set; }

    public bool Active { get; set; } = true;

    public List<PersonRole> Roles { get; } = [];
}

public enum Role
{
    ClearHolds,
    Sharpen,
    Weld,
}

public sealed class PersonRole
{
    public int Id { get; set; }

    public int PersonId { get; set; }

    public Role Role { get; set; }

    public DateTime FromUtc { get; set; }

    public DateTime? UntilUtc { get; set; }

    /// <summary>The training that gave it; null where it was given in person.</summary>
    public int? TrainedId { get; set; }
}

/// <summary>What a thing was before an edit.</summary>
public sealed class ThingHistory
{
    public int Id { get; set; }

    public required string Thing { get; set; }

    public int ThingId { get; set; }

    public int Version { get; set; }

    public DateTime EditedUtc { get; set; }

    public int? PersonId { get; set; }

    /// <summary>The row before the edit, as JSON.</summary>
    public required string Before { get; set; }
}

public sealed class ImportFile
{
    public int Id { get; set; }

    public required string Sha256 { get; set; }

    public required string Kind { get; set; }

    public int Rows { get; set; }

    public int EntryId { get; set; }

    public Entry Entry { get; set; } = null!;
}
