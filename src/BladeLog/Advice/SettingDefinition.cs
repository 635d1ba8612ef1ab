using System.Globalization;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Advice;

/// <summary>A constant of the advice that the shop can set for itself. Its value is kept in the unit named here.</summary>
public sealed class SettingDefinition(
    string key, string words, double standard, string unit, double low, double high, Provenance provenance, string acts, string source = "engineering-default")
{
    public string Key { get; } = key;

    public string Words { get; } = words;

    /// <summary>The value where the shop has not said.</summary>
    public double Default { get; } = standard;

    public string Unit { get; } = unit;

    public double Low { get; } = low;

    public double High { get; } = high;

    /// <summary>Where the default comes from.</summary>
    public Provenance Provenance { get; } = provenance;

    /// <summary>Where it acts, in words.</summary>
    public string Acts { get; } = acts;

    /// <summary>Row of docs/sources.md.</summary>
    public string Source { get; } = source;

    /// <summary>The chapter of the Setup page: the part of the key before the full stop.</summary>
    public string Chapter => Key[..Key.IndexOf('.', StringComparison.Ordinal)];

    /// <summary>"14 days", "1 blade": a value with its unit.</summary>
    public string Say(double value) => string.Create(
        CultureInfo.InvariantCulture, $"{value:0.######} {(value == 1 && Unit is "blades" or "days" or "weeks" ? Unit[..^1] : Unit)}").Trim();

    /// <summary>Why a value cannot be taken; null when it can.</summary>
    public string? Refuse(double value) => value >= Low && value <= High
        ? null
        : string.Create(CultureInfo.InvariantCulture, $"{Words}: {value:0.######} {Unit} lies outside {Low:0.######} to {High:0.######}.").Replace("  ", " ", StringComparison.Ordinal);
}
