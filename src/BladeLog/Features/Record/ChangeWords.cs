using System.Globalization;
using System.Text.Json;
using System.Text.RegularExpressions;
using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features.Record;

/// <summary>A thing before and after an edit, in words: "E1: kerf 2 mm to 2.1 mm".</summary>
internal static partial class ChangeWords
{
    /// <summary>What tells the thing apart, and what is no figure of it.</summary>
    private static readonly HashSet<string> Silent = ["Id", "Uid", "Version", "Key", "AddedUtc", "DoneEntryId", "DroppedUtc", "Order", "IsSample", "SpecId", "ParentId", "SpeciesKey", "Number"];

    public static string Of(string thing, JsonElement before, JsonElement after, ShopUnits units)
    {
        string[] changes = [.. before.EnumerateObject()
            .Where(p => !Silent.Contains(p.Name) && !p.Name.EndsWith("Typed", StringComparison.Ordinal) && after.TryGetProperty(p.Name, out JsonElement then) && p.Value.ToString() != then.ToString())
            .Select(p => Change(p.Name, p.Value, after.GetProperty(p.Name), units))];
        string name = Name(thing, before);
        if (thing == nameof(Setting))
        {
            return Settings(before, after);
        }

        return changes.Length == 0 ? name : name.Length == 0 ? string.Join(", ", changes) : $"{name}, {string.Join(", ", changes)}";
    }

    private static string Name(string thing, JsonElement before) => thing switch
    {
        nameof(Spec) or nameof(Saw) => Text(before, "Code"),
        nameof(Blade) => Text(before, "Tag"),
        nameof(Person) => Text(before, "Initials"),
        nameof(QueuedCut) => $"cut {Text(before, "Number")}, {Text(before, "Job")}",
        _ => "",
    };

    private static string Settings(JsonElement before, JsonElement after)
    {
        string key = Text(before, nameof(Setting.Key));
        SettingDefinition? known = SettingList.All.FirstOrDefault(s => s.Key == key);
        string Value(JsonElement e) => e.TryGetProperty(nameof(Setting.Value), out JsonElement v) && v.ValueKind == JsonValueKind.Number
            ? Figures.With(v.GetDouble().ToString("#,##0.######", CultureInfo.InvariantCulture), known?.Unit ?? "").TrimEnd(Figures.Glue)
            : known is null ? "the default" : $"the default of {Figures.With(known.Default.ToString("#,##0.######", CultureInfo.InvariantCulture), known.Unit).TrimEnd(Figures.Glue)}";
        return $"{known?.Words ?? key}, {Value(before)} to {Value(after)}";
    }

    private static string Change(string name, JsonElement from, JsonElement to, ShopUnits units)
    {
        (string words, Func<JsonElement, string> show) = Kind(name, units);
        return $"{words} {Shown(from, show)} to {Shown(to, show)}";
    }

    private static string Shown(JsonElement value, Func<JsonElement, string> show) => value.ValueKind switch
    {
        JsonValueKind.Null or JsonValueKind.Undefined => "not told",
        JsonValueKind.True => "yes",
        JsonValueKind.False => "no",
        JsonValueKind.String when value.GetString() is { Length: 0 } => "nothing",
        _ => show(value),
    };

    /// <summary>The column's name as words, and how its figure is shown: the end of the name is its unit.</summary>
    private static (string Words, Func<JsonElement, string> Show) Kind(string name, ShopUnits units)
    {
        if (Enumerated(name) is { } answers)
        {
            return (Split(name), e => e.ValueKind == JsonValueKind.Number && Enum.GetName(answers, e.GetInt32()) is { } word ? Split(word) : e.ToString());
        }

        string Length(JsonElement e) => units.Show(new Length(e.GetDouble()), FieldOf(name));
        return name switch
        {
            "InspectEveryH" => ("inspect every", e => Figures.With(Figures.Hours(e.GetDouble()), "h")),
            "BodyHrc" or "MeasuredHrc" => ("hardness", e => Figures.With(e.GetDouble().ToString("0.#", CultureInfo.InvariantCulture), "HRC")),
            "GulletAreaM2" => ("gullet area", e => Figures.With(Figures.Number(e.GetDouble() * 1e6, 1), "mm²")),
            "EdgeFreshM" => ("fresh edge", e => units.Show(new Length(e.GetDouble()), Fields.EdgeRadius)),
            "MoisturePct" => ("moisture", e => units.ShowPercent(e.GetDouble())),
            "NailChance" => ("chance of a nail", e => units.ShowPercent(e.GetDouble() * 100)),
            "RateMinorPerHour" => ("shop rate an hour", e => units.ShowMoney(e.GetInt64())),
            "TimberMinorPerM3" => ("timber value of a m³", e => units.ShowMoney(e.GetInt64())),
            "RakeRad" => ("hook angle", e => units.Show(new Angle(e.GetDouble()))),
            _ when name.EndsWith("Rad", StringComparison.Ordinal) => (Split(name[..^3]), e => units.Show(new Angle(e.GetDouble()))),
            _ when name.EndsWith("Pa", StringComparison.Ordinal) => (Split(name[..^2]), e => units.Show(new Stress(e.GetDouble()))),
            _ when name.EndsWith("Minor", StringComparison.Ordinal) => (Split(name[..^5]), e => units.ShowMoney(e.GetInt64())),
            _ when name.EndsWith('M') => (Split(name[..^1]), Length),
            _ => (Split(name), e => e.ToString()),
        };
    }

    private static TypedField FieldOf(string name) => name switch
    {
        "ThicknessM" or "MeasuredThicknessM" => Fields.Thickness,
        "KerfM" => Fields.Kerf,
        "GulletDepthM" => Fields.GulletDepth,
        "WidthM" or "LeastWidthM" => Fields.BladeWidth,
        "NewLoopM" => Fields.Loop,
        "LengthM" => Fields.Board,
        _ => Fields.AnyLength,
    };

    private static Type? Enumerated(string name) => name switch
    {
        nameof(Shop.Lengths) => typeof(LengthUnit),
        nameof(Shop.Spelling) => typeof(Spelling),
        nameof(Shop.PullWord) => typeof(Records.PullWord),
        nameof(Spec.ToothForm) => typeof(ToothForm),
        nameof(Spec.SetPattern) => typeof(SetPattern),
        nameof(Spec.TipKind) => typeof(TipKind),
        nameof(Spec.TipMaterial) => typeof(TipMaterial),
        nameof(Spec.BodySteel) => typeof(BodySteel),
        nameof(QueuedCut.Kind) => typeof(CutKind),
        nameof(QueuedCut.Finish) => typeof(Finish),
        nameof(QueuedCut.Dirt) => typeof(Dirt),
        nameof(QueuedCut.Direction) => typeof(CutDirection),
        nameof(QueuedCut.Material) => typeof(MaterialKind),
        _ => null,
    };

    private static string Text(JsonElement row, string name) => row.TryGetProperty(name, out JsonElement value) ? value.ToString() : "";

    private static string Split(string name) => Capital().Replace(name, " $0").Trim().ToLowerInvariant();

    [GeneratedRegex("[A-Z]", RegexOptions.CultureInvariant)]
    private static partial Regex Capital();
}
