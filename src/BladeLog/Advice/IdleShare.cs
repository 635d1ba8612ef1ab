namespace BladeLog.Advice;

/// <summary>Hours a saw ran against the hours its cut log accounts for: what turns without cutting bends the blade all the same.</summary>
/// <param name="Run">Hours run.</param>
/// <param name="Cut">Hours of cutting, length over feed.</param>
public readonly record struct IdleShare(double Run, double Cut)
{
    /// <summary>Share of the running that the cuts account for; null before it has run.</summary>
    public double? Accounted => Run > 0 ? Math.Min(1, Cut / Run) : null;

    public double IdleHours => Math.Max(0, Run - Cut);

    public static IdleShare Of(long runningMs, IEnumerable<(double LengthM, int Pieces, double FeedMps)> cuts)
    {
        ArgumentNullException.ThrowIfNull(cuts);
        return new IdleShare(runningMs / 3_600_000.0, cuts.Sum(c => c.LengthM * c.Pieces / c.FeedMps) / 3600);
    }

    public string? Says() => Accounted is { } share
        ? $"Ran {Wording.Hours(Run)}; the cuts logged account for {Wording.Number(share * 100, 0)} %."
        : null;
}
