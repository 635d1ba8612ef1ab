using BladeLog.Records;

namespace BladeLog.Features;

/// <summary>
/// A tag as a person types it in a hurry: without its hyphen, in small letters, without the noughts before its number, or
/// the number alone. It is one blade's where it is only that one's.
/// </summary>
internal static class TypedTag
{
    /// <summary>The blades it can mean: the one with exactly this tag, else all that read alike.</summary>
    public static IReadOnlyList<BladeFile> Find(string? typed, ShopNow shop)
    {
        ArgumentNullException.ThrowIfNull(shop);
        string tag = Tags.Read(typed ?? "");
        if (shop.Blade(tag) is { } exact)
        {
            return [exact];
        }

        string[] sought = Runs(tag);
        if (sought.Length == 0)
        {
            return [];
        }

        BladeFile[] all = [.. shop.Blades.Where(b => Alike(sought, Runs(b.Blade.Tag))).OrderBy(b => b.Blade.Tag, NaturalOrder.Instance)];
        BladeFile[] here = [.. all.Where(b => b.Place != Place.Gone)];
        return here.Length > 0 ? here : all;
    }

    /// <summary>Why it is no one blade, in a sentence.</summary>
    public static string Refusal(string? typed, IReadOnlyList<BladeFile> found)
    {
        ArgumentNullException.ThrowIfNull(found);
        string tag = Tags.Read(typed ?? "");
        return found.Count > 1
            ? $"{tag} can be {string.Join(", ", found.SkipLast(1).Select(b => b.Blade.Tag))} or {found[^1].Blade.Tag}: say which."
            : $"There is no blade {tag}.";
    }

    /// <summary>The number alone stands for a tag that ends so: "17" for Q-17, "4b" for Q-04b.</summary>
    private static bool Alike(string[] sought, string[] tag)
    {
        int from = char.IsAsciiDigit(sought[0][0]) ? Array.FindIndex(tag, r => char.IsAsciiDigit(r[0])) : 0;
        return from >= 0 && sought.AsSpan().SequenceEqual(tag.AsSpan(from));
    }

    /// <summary>Runs of letters and of digits, the noughts before a number left out.</summary>
    private static string[] Runs(string tag)
    {
        List<string> runs = [];
        int i = 0;
        while (i < tag.Length)
        {
            int start = i;
            if (char.IsAsciiDigit(tag[i]))
            {
                while (i < tag.Length && char.IsAsciiDigit(tag[i]))
                {
                    i++;
                }

                string number = tag[start..i].TrimStart('0');
                runs.Add(number.Length == 0 ? "0" : number);
            }
            else if (char.IsLetter(tag[i]))
            {
                while (i < tag.Length && char.IsLetter(tag[i]))
                {
                    i++;
                }

                runs.Add(tag[start..i].ToUpperInvariant());
            }
            else
            {
                i++;
            }
        }

        return [.. runs];
    }
}
