namespace BladeLog.Records.Folding;

/// <summary>Whole parts of a whole.</summary>
public static class Apportion
{
    /// <summary>Parts in proportion to the weights that add up to the total exactly: floors first, what is left to the largest remainders, the earlier one on a tie.</summary>
    public static long[] LargestRemainder(long total, IReadOnlyList<long> weights)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(total);
        var sum = weights.Aggregate((Int128)0, (s, w) => s + w);
        if (sum <= 0 || weights.Any(w => w < 0))
        {
            throw new ArgumentOutOfRangeException(nameof(weights), "Weights must not be negative, and one must be above zero.");
        }

        var parts = new long[weights.Count];
        var remainders = new Int128[weights.Count];
        var left = total;
        for (var i = 0; i < parts.Length; i++)
        {
            var product = (Int128)total * weights[i];
            parts[i] = (long)(product / sum);
            remainders[i] = product % sum;
            left -= parts[i];
        }

        foreach (var i in Enumerable.Range(0, parts.Length).OrderByDescending(i => remainders[i]).ThenBy(i => i).Take((int)left))
        {
            parts[i]++;
        }

        return parts;
    }
}
