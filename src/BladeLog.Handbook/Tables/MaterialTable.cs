namespace BladeLog.Handbook.Tables;

/// <summary>Everything a cut can be entered for: woods, panels, and what is not wood.</summary>
public static class MaterialTable
{
    /// <summary>All rows: woods first, then panels, then the rest.</summary>
    public static IReadOnlyList<Material> All { get; } = [.. WoodSpeciesTable.All.Select(Material.Of), .. NonWoods.All];

    private static readonly NameIndex<Material> Index = new(All, m => m.Key, m => m.Name, m => m.Aliases);

    /// <summary>The row for what somebody typed, or null.</summary>
    /// <remarks>Key, name or alias, case and hyphens ignored. takenAs is the name of the row where an alias was typed, else null.</remarks>
    /// <source key="common-practice" where="names of the trade in the United Kingdom and the United States"/>
    public static Material? Find(string typed, out string? takenAs) => Index.Find(typed, out takenAs);

    /// <summary>The names most like an unknown word.</summary>
    /// <remarks>By <see cref="EditDistance"/> to key, name or any alias; three by default, nearest first; none where even the nearest differs in more than a third of the letters typed.</remarks>
    /// <source key="damerau-1964" where="errors of one letter: added, dropped, changed, swapped"/>
    public static IReadOnlyList<string> NearestNames(string typed, int count = 3) => Index.Nearest(typed, count);
}
