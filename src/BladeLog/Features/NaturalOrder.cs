namespace BladeLog.Features;

/// <summary>The order in which a person counts: R2-9 before R2-10, without regard to case.</summary>
internal sealed class NaturalOrder : IComparer<string?>
{
    public static NaturalOrder Instance { get; } = new();

    public int Compare(string? x, string? y)
    {
        if (x is null || y is null)
        {
            return (x is null ? 1 : 0) - (y is null ? 1 : 0);
        }

        int i = 0, j = 0;
        while (i < x.Length && j < y.Length)
        {
            if (char.IsAsciiDigit(x[i]) && char.IsAsciiDigit(y[j]))
            {
                ReadOnlySpan<char> a = Digits(x, ref i), b = Digits(y, ref j);
                int byNumber = a.Length != b.Length ? a.Length - b.Length : a.SequenceCompareTo(b);
                if (byNumber != 0)
                {
                    return byNumber;
                }

                continue;
            }

            int byLetter = char.ToUpperInvariant(x[i]) - char.ToUpperInvariant(y[j]);
            if (byLetter != 0)
            {
                return byLetter;
            }

            i++;
            j++;
        }

        return (x.Length - i) - (y.Length - j);
    }

    private static ReadOnlySpan<char> Digits(string text, ref int at)
    {
        int from = at;
        while (at < text.Length && char.IsAsciiDigit(text[at]))
        {
            at++;
        }

        return text.AsSpan(from, at - from).TrimStart('0');
    }
}
