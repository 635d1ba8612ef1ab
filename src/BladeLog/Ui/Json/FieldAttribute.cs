namespace BladeLog.Ui.Json;

/// <summary>
/// A field of a JSON body: its name with the unit in it, its bounds, and how to speak of it. One attribute serves the
/// reader, its sentences and the interface's description.
/// </summary>
[AttributeUsage(AttributeTargets.Property)]
internal sealed class FieldAttribute(string name, string says) : Attribute
{
    public string Name { get; } = name;

    /// <summary>What the field is, as a shop manager would say it: "the band's thickness in mm".</summary>
    public string Says { get; } = says;

    /// <summary>Smallest value allowed.</summary>
    public double Least { get; init; } = double.NegativeInfinity;

    /// <summary>The value must be greater than this.</summary>
    public double Over { get; init; } = double.NegativeInfinity;

    /// <summary>Greatest value allowed.</summary>
    public double Most { get; init; } = double.PositiveInfinity;

    /// <summary>Longest text or list.</summary>
    public int Longest { get; init; } = 200;
}
