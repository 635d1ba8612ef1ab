using System.Globalization;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>What running cannot be: more than the clock allows, or counted twice by two meters.</summary>
internal static class RunRules
{
    /// <summary>A meter and a clock may differ by this much.</summary>
    public const double MeterTolerance = 0.02;

    /// <summary>Refuses running that, with all else known of its window, is more than the time elapsed.</summary>
    public static async Task Check(WriteSession w, string field, Saw saw, Run run, IReadOnlyCollection<int> without)
    {
        var others = await Overlapping(w, saw, run.FromUtc, run.UntilUtc, without);
        if (IsCounted(run.Source) && others.FirstOrDefault(o => IsCounted(o.Source)) is { } same)
        {
            w.Refuse(field, $"{saw.Name} has counted hours from {w.Say(same.FromUtc)} to {w.Say(same.UntilUtc)} already (entry {same.EntryId}).");
            return;
        }

        var elapsed = Milliseconds(run.FromUtc, run.UntilUtc);
        var sum = run.RunningMs + others.Sum(o => Within(o, run.FromUtc, run.UntilUtc));
        var metered = run.Source == RunSource.Meter || others.Any(o => o.Source == RunSource.Meter);
        if (sum > elapsed * (metered ? 1 + MeterTolerance : 1))
        {
            var and = others.Count == 0 ? "" : $" together with entry {string.Join(", ", others.Select(o => o.EntryId))}";
            w.Refuse(field, $"{saw.Name} would have run {Hours(sum)} in the {Hours(elapsed)} from {w.Say(run.FromUtc)} to {w.Say(run.UntilUtc)}{and}.");
        }
    }

    public static Task<List<Run>> Overlapping(WriteSession w, Saw saw, DateTime from, DateTime until, IReadOnlyCollection<int> without) =>
        w.Db.Runs.AsNoTracking()
            .Where(r => r.SawId == saw.Id && r.FromUtc < until && r.UntilUtc > from && !without.Contains(r.EntryId))
            .OrderBy(r => r.FromUtc).ThenBy(r => r.EntryId)
            .ToListAsync();

    /// <summary>
    /// Hours taken from cuts give way to hours counted or typed: those inside the window are struck out, what sticks out
    /// of it is entered again.
    /// </summary>
    public static async Task<IReadOnlyCollection<int>> GiveWay(WriteSession w, Saw saw, DateTime from, DateTime until)
    {
        var derived = (await Overlapping(w, saw, from, until, [])).Where(r => r.Source == RunSource.FromCuts).ToList();
        foreach (var run in derived)
        {
            w.Void(run.EntryId, "Counted hours took its place.");
            w.Touched.Window(saw.Id, run.FromUtc, run.UntilUtc);
            foreach (var (pieceFrom, pieceUntil) in Uncovered(run.FromUtc, run.UntilUtc, [(from, until)]))
            {
                AddFromCuts(w, saw, pieceFrom, pieceUntil, run.SpeedMps);
            }
        }

        return [.. derived.Select(r => r.EntryId)];
    }

    public static void AddFromCuts(WriteSession w, Saw saw, DateTime from, DateTime until, double speedMps)
    {
        w.Add(
            new Run
            {
                SawId = saw.Id,
                FromUtc = from,
                UntilUtc = until,
                RunningMs = Milliseconds(from, until),
                SpeedMps = speedMps,
                Grade = HoursGrade.E,
                Source = RunSource.FromCuts,
            },
            until);
        w.Touched.Window(saw.Id, from, until);
    }

    /// <summary>What is left of a window when others are taken out of it.</summary>
    public static List<(DateTime From, DateTime Until)> Uncovered(DateTime from, DateTime until, IEnumerable<(DateTime From, DateTime Until)> by)
    {
        var pieces = new List<(DateTime, DateTime)>();
        var cursor = from;
        foreach (var (start, end) in by.OrderBy(b => b.From))
        {
            if (start > cursor && cursor < until)
            {
                pieces.Add((cursor, start < until ? start : until));
            }

            cursor = end > cursor ? end : cursor;
        }

        if (cursor < until)
        {
            pieces.Add((cursor, until));
        }

        return pieces;
    }

    public static string Hours(long ms) => string.Create(CultureInfo.InvariantCulture, $"{ms / 3_600_000.0:#,0.##} h");

    public static long Milliseconds(DateTime from, DateTime until) => (until - from).Ticks / TimeSpan.TicksPerMillisecond;

    private static bool IsCounted(RunSource source) => source is RunSource.Meter or RunSource.Timer or RunSource.Logger;

    private static long Within(Run run, DateTime from, DateTime until)
    {
        var start = run.FromUtc > from ? run.FromUtc : from;
        var end = run.UntilUtc < until ? run.UntilUtc : until;
        return (long)((Int128)run.RunningMs * Milliseconds(start, end) / Milliseconds(run.FromUtc, run.UntilUtc));
    }
}
