using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Life;

/// <summary>A crack as it was measured.</summary>
public sealed record CrackSeen(DateTime AtUtc, double LengthM, CrackPlace? Place);

/// <summary>
/// The same crack measured twice, and how often the band was bent in between. It is a record, not a forecast: no hours
/// are reckoned from it.
/// </summary>
/// <param name="First">The earlier measurement.</param>
/// <param name="Last">The later one.</param>
/// <param name="Bends">Times each point of the band was bent in between.</param>
/// <param name="Known">Both were measured off the saw, so the bends between them are known.</param>
public sealed record CrackGrown(CrackSeen First, CrackSeen Last, double Bends, bool Known)
{
    /// <summary>Growth over bends, for each thousand; null where none are known.</summary>
    public double? PerThousandBendsM => Known && Bends > 0 ? (Last.LengthM - First.LengthM) / (Bends / 1000) : null;

    /// <summary>The last two measurements at each place that grew. One ground out in between is another crack.</summary>
    /// <param name="file">The blade.</param>
    /// <param name="seen">Every measurement of a crack.</param>
    /// <param name="spells">When it was on a saw.</param>
    public static IReadOnlyList<CrackGrown> Of(BladeFile file, IEnumerable<CrackSeen> seen, IReadOnlyList<(DateTime From, DateTime Until)> spells)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(seen);
        ArgumentNullException.ThrowIfNull(spells);
        var found = new List<CrackGrown>();
        foreach (var place in seen.GroupBy(s => s.Place))
        {
            // A look and the hold it makes carry one time and one length.
            CrackSeen[] each = [.. place.DistinctBy(s => (s.AtUtc, s.LengthM)).OrderBy(s => s.AtUtc)];
            if (each.Length < 2 || each[^1].LengthM <= each[^2].LengthM)
            {
                continue;
            }

            var (first, last) = (each[^2], each[^1]);
            bool OffSaw(CrackSeen s) => !spells.Any(x => x.From < s.AtUtc && s.AtUtc < x.Until);
            double bends = file.Exposures.Where(e => e.FromUtc >= first.AtUtc && e.FromUtc < last.AtUtc)
                .Sum(e => e.Hours * LoopCycles.BendsPerHour(e.Setup.Wheels.Count, new Speed(e.SpeedMps), new Length(e.LoopM)));
            found.Add(new CrackGrown(first, last, bends, OffSaw(first) && OffSaw(last)));
        }

        return found;
    }
}
