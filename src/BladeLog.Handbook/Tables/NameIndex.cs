namespace BladeLog.Handbook.Tables;

/// <summary>Finds a row by what somebody typed.</summary>
internal sealed class NameIndex<T> where T : class
{
    private readonly Dictionary<string, T> direct = [];
    private readonly Dictionary<string, T> aliases = [];
    private readonly Func<T, string> nameOf;

    internal NameIndex(IEnumerable<T> rows, Func<T, string> keyOf, Func<T, string> nameOf, Func<T, string[]> aliasesOf)
    {
        this.nameOf = nameOf;
        foreach (T row in rows)
        {
            direct[Plain(keyOf(row))] = row;
            direct[Plain(nameOf(row))] = row;
            foreach (string alias in aliasesOf(row))
            {
                // Two rows may not claim one word: the choice would hang on their order.
                aliases.Add(Plain(alias), row);
            }
        }
    }

    internal T? Find(string typed, out string? takenAs)
    {
        ArgumentNullException.ThrowIfNull(typed);
        string word = Plain(typed);
        takenAs = null;
        if (direct.TryGetValue(word, out T? row))
        {
            return row;
        }

        if (aliases.TryGetValue(word, out row))
        {
            takenAs = nameOf(row);
        }

        return row;
    }

    internal IReadOnlyList<string> Nearest(string typed, int count)
    {
        ArgumentNullException.ThrowIfNull(typed);
        string word = Plain(typed);
        var near = direct.Concat(aliases)
            .Select(entry => (Name: nameOf(entry.Value), Distance: EditDistance.Between(word, entry.Key)))
            .GroupBy(x => x.Name, StringComparer.Ordinal)
            .Select(g => (Name: g.Key, Distance: g.Min(x => x.Distance)))
            .OrderBy(x => x.Distance).ThenBy(x => x.Name, StringComparer.Ordinal)
            .Take(count)
            .ToList();

        // A third of its letters wrong is a slip; more is another word.
        return near.Count > 0 && near[0].Distance <= Math.Max(1, word.Length / 3) ? [.. near.Select(x => x.Name)] : [];
    }

    /// <summary>Lower case; hyphens, underscores, brackets and runs of blanks are one blank.</summary>
    internal static string Plain(string typed) =>
        string.Join(' ', new string(typed.ToLowerInvariant().Select(c => char.IsLetterOrDigit(c) ? c : ' ').ToArray())
            .Split(' ', StringSplitOptions.RemoveEmptyEntries));
}

/// <summary>How many letters two words are apart.</summary>
public static class EditDistance
{
    /// <summary>Least number of letters to add, drop, change or swap with their neighbour to make one word of the other.</summary>
    /// <remarks>Levenshtein's distance with neighbouring swaps (Damerau, optimal string alignment); a count.</remarks>
    /// <source key="damerau-1964" where="errors of one letter: added, dropped, changed, swapped"/>
    public static double Between(string a, string b)
    {
        ArgumentNullException.ThrowIfNull(a);
        ArgumentNullException.ThrowIfNull(b);
        int[,] d = new int[a.Length + 1, b.Length + 1];
        for (int i = 0; i <= a.Length; i++)
        {
            for (int j = 0; j <= b.Length; j++)
            {
                if (i == 0 || j == 0)
                {
                    d[i, j] = i + j;
                    continue;
                }

                int change = a[i - 1] == b[j - 1] ? 0 : 1;
                d[i, j] = Math.Min(Math.Min(d[i - 1, j] + 1, d[i, j - 1] + 1), d[i - 1, j - 1] + change);
                if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
                {
                    d[i, j] = Math.Min(d[i, j], d[i - 2, j - 2] + 1);
                }
            }
        }

        return d[a.Length, b.Length];
    }
}
