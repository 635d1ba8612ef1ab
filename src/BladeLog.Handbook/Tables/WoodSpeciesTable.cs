namespace BladeLog.Handbook.Tables;

/// <summary>Woods: density, hardness, wear class and names.</summary>
public static partial class WoodSpeciesTable
{
    /// <summary>All rows, American, imported, European.</summary>
    public static IReadOnlyList<WoodSpecies> All { get; } = [.. American(), .. Imported(), .. European()];

    private static readonly NameIndex<WoodSpecies> Index = new(All, s => s.Key, s => s.Name, s => s.Aliases);

    /// <summary>The wood for what somebody typed, or null.</summary>
    /// <remarks>Key, name or alias, case and hyphens ignored. takenAs is the name of the row where an alias was typed, else null. A bare word that covers several
    /// woods stands for one of them: the one a European or American shop most likely means, the denser where that is open, so that advice errs on the safe side.</remarks>
    /// <source key="common-practice" where="names of the trade in the United Kingdom and the United States"/>
    public static WoodSpecies? Find(string typed, out string? takenAs) => Index.Find(typed, out takenAs);

    /// <summary>The wood of a key.</summary>
    /// <remarks>Exact key of a row; an unknown one is refused.</remarks>
    /// <source key="common-practice" where="names of the trade"/>
    public static WoodSpecies Of(string key) => All.FirstOrDefault(s => s.Key == key)
        ?? throw new ArgumentOutOfRangeException(nameof(key), key, $"There is no wood with the key \"{key}\".");

    /// <summary>The names most like an unknown word.</summary>
    /// <remarks>By <see cref="EditDistance"/> to key, name or any alias; three by default, nearest first; none where even the nearest differs in more than a third of the letters typed.</remarks>
    /// <source key="damerau-1964" where="errors of one letter: added, dropped, changed, swapped"/>
    public static IReadOnlyList<string> NearestNames(string typed, int count = 3) => Index.Nearest(typed, count);
}
