namespace BladeLog.Advice;

/// <summary>Every constant the shop can set, in the order of the Setup page.</summary>
public static class SettingList
{
    public static IReadOnlyList<SettingDefinition> All { get; } = [.. BladeSettings.All, .. LifeSettings.All, .. CutSettings.All, .. StockSettings.All];

    private static readonly Dictionary<string, SettingDefinition> ByKey = All.ToDictionary(d => d.Key, StringComparer.Ordinal);

    /// <summary>The setting of a key; null where there is none.</summary>
    public static SettingDefinition? Find(string key) => ByKey.GetValueOrDefault(key);
}
