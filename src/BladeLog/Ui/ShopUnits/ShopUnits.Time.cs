using System.Globalization;
using System.Text.RegularExpressions;

namespace BladeLog.Ui;

/// <summary>One moment a typed local time can mean.</summary>
/// <param name="Utc">The moment.</param>
/// <param name="Text">Text that means this moment and no other, to be sent when it is chosen.</param>
/// <param name="Words">What to show on the choice.</param>
public sealed record Moment(DateTime Utc, string Text, string Words);

/// <summary>What came of reading a time: one moment, a choice of two, or a sentence.</summary>
public sealed record TypedMoment(IReadOnlyList<Moment> Candidates, string? Problem, string Text)
{
    /// <summary>True when there is exactly one moment.</summary>
    public bool IsGood => Candidates.Count == 1;

    /// <summary>True in the double hour of autumn: the person must choose.</summary>
    public bool IsChoice => Candidates.Count > 1;

    /// <summary>The moment, UTC. Ask <see cref="IsGood"/> first.</summary>
    public DateTime Utc => IsGood ? Candidates[0].Utc : throw new InvalidOperationException(Problem ?? "Two moments carry this time.");

    /// <summary>The moments, or the sentence.</summary>
    public override string ToString() => Problem ?? string.Join(" or ", Candidates.Select(c => c.Words));
}

/// <content>Dates and times typed on the shop's clock.</content>
public sealed partial record ShopUnits
{
    private const string TimeExamples = "10:42, yesterday 7:15 or 2026-03-28 14:30";
    private const int FirstYear = 1950;
    private const int LastYear = 2150;

    // A clock on the wall may run ahead of the computer's by so much.
    private static readonly TimeSpan _clockSlack = TimeSpan.FromMinutes(5);

    /// <summary>
    /// Reads a local time: 10:42, today 10:42, yesterday 7:15, 2026-03-28 14:30, 28.3.2026 14:30, 20 min ago, now.
    /// A time in the spring gap is refused; one in the double hour of autumn comes back as a choice of two.
    /// A bare time that has not come yet today is refused, never moved to yesterday.
    /// </summary>
    public TypedMoment ReadTime(string? text, DateTime nowUtc)
    {
        var typed = (text ?? "").Trim();
        var clean = Amount.Clean(text);
        if (clean.Length == 0)
            return Refuse(typed, $"Nothing is typed. Write a time such as {TimeExamples}.");
        if (typed.Length > LongestText)
            return Refuse(typed, NotATime(typed));
        var now = DateTime.SpecifyKind(nowUtc, DateTimeKind.Utc);
        var local = TimeZoneInfo.ConvertTimeFromUtc(now, Zone);
        if (clean == "now")
            return One(now, typed);
        if (clean.EndsWith(" ago", StringComparison.Ordinal))
        {
            var back = ReadDuration(clean[..^4], Fields.Minutes);
            return back.IsGood ? One(now - back.Value, typed) : Refuse(typed, NotATime(typed));
        }

        var m = When().Match(clean);
        if (!m.Success || !TryClockTime(m, out var clock))
            return Refuse(typed, NotATime(typed));
        DateOnly date;
        if (m.Groups["date"].Value.Length == 0)
            date = DateOnly.FromDateTime(local);
        else if (ReadDate(m.Groups["date"].Value, nowUtc) is { IsGood: true } d)
            date = d.Value;
        else
            return Refuse(typed, ReadDate(m.Groups["date"].Value, nowUtc).Problem!);

        var at = date.ToDateTime(clock);
        if (m.Groups["zone"].Success)
            return One(DateTime.SpecifyKind(at, DateTimeKind.Utc) - Offset(m.Groups["zone"].Value), typed);
        if (m.Groups["date"].Value.Length == 0 && at > local + _clockSlack)
            return Refuse(typed, $"{Quote(typed)} has not come yet today. Write yesterday {clean}, or today {clean} if it lies ahead.");
        return OnTheClock(at, typed);
    }

    /// <summary>Reads a date: today, yesterday, 2026-03-28, 28.3.2026, 28 Mar 2026. One that lies ahead is refused with such for an example.</summary>
    public Parsed<DateOnly> ReadDate(string? text, DateTime nowUtc, bool ahead = false)
    {
        var typed = (text ?? "").Trim();
        var clean = Amount.Clean(text);
        var today = DateOnly.FromDateTime(TimeZoneInfo.ConvertTimeFromUtc(DateTime.SpecifyKind(nowUtc, DateTimeKind.Utc), Zone));
        DateOnly? date = clean switch
        {
            "today" => today,
            "yesterday" => today.AddDays(-1),
            "tomorrow" => today.AddDays(1),
            _ => null,
        };
        if (date is null && Slashed().IsMatch(clean))
            return Parsed<DateOnly>.Refused(typed, $"{Quote(typed)} can be read with the month or the day first. Write the year first, as in {Show(today)}.");
        if (date is null && DateOnly.TryParseExact(clean, ["yyyy-M-d", "d.M.yyyy", "d MMM yyyy", "d MMMM yyyy", "MMM d yyyy", "MMM d, yyyy"], CultureInfo.InvariantCulture, DateTimeStyles.None, out var exact))
            date = exact;
        return date is { Year: >= FirstYear and <= LastYear } found
            ? Parsed<DateOnly>.Good(found, typed, Show(found))
            : Parsed<DateOnly>.Refused(typed, $"{Quote(typed)} is not a date. Write {(ahead ? $"tomorrow or {Show(today.AddDays(7))}" : $"today, yesterday or {Show(today)}")}.");
    }

    /// <summary>2026-03-28 14:30 on the shop's clock; with its offset inside the double hour, so it reads back as itself.</summary>
    public string ShowTime(DateTime utc)
    {
        var local = TimeZoneInfo.ConvertTimeFromUtc(DateTime.SpecifyKind(utc, DateTimeKind.Utc), Zone);
        var text = local.ToString("yyyy-MM-dd HH:mm", CultureInfo.InvariantCulture);
        return Zone.IsAmbiguousTime(local) ? text + " " + OffsetText(local - DateTime.SpecifyKind(utc, DateTimeKind.Unspecified)) : text;
    }

    /// <summary>2026-03-28.</summary>
    public string Show(DateOnly date) => date.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture);

    private TypedMoment OnTheClock(DateTime at, string typed)
    {
        if (Zone.IsInvalidTime(at))
        {
            var from = at;
            var to = at;
            var minute = TimeSpan.FromMinutes(1);
            for (from = Floor(at); Zone.IsInvalidTime(from - minute); from -= minute) { }
            for (to = Floor(at) + minute; Zone.IsInvalidTime(to); to += minute) { }
            return Refuse(typed, $"{Quote(typed)} never was: the clocks went forward from {Clockwise(from)} to {Clockwise(to)}. Write a time before {Clockwise(from)} or from {Clockwise(to)} on.");
        }

        if (!Zone.IsAmbiguousTime(at))
            return One(TimeZoneInfo.ConvertTimeToUtc(at, Zone), typed);
        // The greater offset is the earlier moment: summer time is still running.
        var offsets = Zone.GetAmbiguousTimeOffsets(at).OrderDescending().ToList();
        return new(
            offsets.Select((o, i) => new Moment(
                DateTime.SpecifyKind(at - o, DateTimeKind.Utc),
                at.ToString("yyyy-MM-dd HH:mm:ss", CultureInfo.InvariantCulture) + " " + OffsetText(o),
                $"the {(i == 0 ? "first" : "second")} {Clockwise(at)}, {(i == 0 ? "before" : "after")} the clocks went back")).ToList(),
            $"{Clockwise(at)} came twice that night, because the clocks went back. Choose the first or the second.",
            typed);
    }

    private TypedMoment One(DateTime utc, string typed)
        => utc.Year is < FirstYear or > LastYear ? Refuse(typed, NotATime(typed)) : new([new Moment(utc, typed, ShowTime(utc))], null, typed);

    private static TypedMoment Refuse(string typed, string problem) => new([], problem, typed);

    private static string NotATime(string typed) => $"{Quote(typed)} is not a time. Write {TimeExamples}.";

    private static DateTime Floor(DateTime t) => t.AddTicks(-(t.Ticks % TimeSpan.TicksPerMinute));

    private static string Clockwise(DateTime t) => t.ToString("HH:mm", CultureInfo.InvariantCulture);

    private static string OffsetText(TimeSpan o)
        => (o < TimeSpan.Zero ? "-" : "+") + o.Duration().ToString(@"hh\:mm", CultureInfo.InvariantCulture);

    private static TimeSpan Offset(string zone)
    {
        if (zone == "z")
            return TimeSpan.Zero;
        var size = TimeSpan.ParseExact(zone[1..], @"hh\:mm", CultureInfo.InvariantCulture);
        return zone[0] == '-' ? -size : size;
    }

    private static bool TryClockTime(Match m, out TimeOnly clock)
    {
        int Of(string name) => m.Groups[name].Success ? int.Parse(m.Groups[name].Value, CultureInfo.InvariantCulture) : 0;
        clock = default;
        var (hour, half) = (Of("h"), m.Groups["half"].Value);
        // A lone number is an hour only with am or pm behind it.
        if (hour > 23 || Of("m") > 59 || Of("s") > 59 || (half.Length > 0 && hour is 0 or > 12) || (half.Length == 0 && !m.Groups["m"].Success))
            return false;
        if (half.Length > 0)
            hour = (hour % 12) + (half[0] == 'p' ? 12 : 0);
        clock = new TimeOnly(hour, Of("m"), Of("s"));
        return true;
    }

    [GeneratedRegex(@"^(?:(?<date>.*?\S)(?:\s+at\s+|\s*,\s*|\s+|(?<=\d)t(?=\d)))?(?<h>\d{1,2})(?:[:.](?<m>\d{2})(?::(?<s>\d{2})(?:\.0+)?)?)?\s*(?<half>am|pm)?(?:\s*(?<zone>z|[+-](?:0\d|1[0-4]):[0-5]\d))?$", RegexOptions.CultureInvariant)]
    private static partial Regex When();

    [GeneratedRegex(@"^\d{1,4}/\d{1,2}/\d{1,4}$", RegexOptions.CultureInvariant)]
    private static partial Regex Slashed();
}
