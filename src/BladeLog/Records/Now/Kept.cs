using BladeLog.Handbook.Quantities;

namespace BladeLog.Records;

/// <summary>Where a blade is.</summary>
public enum Place
{
    Rack,
    OnSaw,
    Bench,
    AtSharpener,
    Gone,
}

/// <summary>Kept state: at most one blade on a saw and one saw for a blade, held by two keys of this table.</summary>
public sealed class OnSaw
{
    public int SawId { get; set; }

    public int BladeId { get; set; }

    public int MountId { get; set; }
}

/// <summary>Kept state of a blade; can be rebuilt from the facts and is compared by verify.</summary>
public sealed class BladeNow
{
    public int BladeId { get; set; }

    public Place Place { get; set; }

    public int? SawId { get; set; }

    public string? Hook { get; set; }

    public double WidthM { get; set; }

    public double? LoopM { get; set; }

    public int? JointId { get; set; }

    public int? HoldId { get; set; }
}

/// <summary>Whole milliseconds of a run that belong to one spell; no spell: no blade known.</summary>
public sealed class RunShare
{
    public int Id { get; set; }

    public int RunId { get; set; }

    public int? MountId { get; set; }

    public int SetupId { get; set; }

    public long Ms { get; set; }
}

/// <summary>Running of one spell at one setup and speed, in whole milliseconds.</summary>
public sealed class Exposure
{
    public int Id { get; set; }

    public int MountId { get; set; }

    public int SetupId { get; set; }

    public double SpeedMps { get; set; }

    public long RunningMs { get; set; }
}

/// <summary>Wood path per tooth in one spell, raw, by wood class and dirt. Whole numbers, so that kept sums equal recounted ones.</summary>
public sealed class WoodPath
{
    public int Id { get; set; }

    public int MountId { get; set; }

    public required string WoodClass { get; set; }

    public Dirt Dirt { get; set; }

    public long PathMm { get; set; }

    public long AreaMm2 { get; set; }

    public long CutMs { get; set; }
}
