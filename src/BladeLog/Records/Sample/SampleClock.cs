using System.Globalization;

namespace BladeLog.Records.Sample;

/// <summary>Moves the sample's days so that day 0 is today in the shop's zone.</summary>
internal sealed class SampleClock
{
    private readonly TimeZoneInfo _zone;
    private readonly DateOnly _today;

    public SampleClock(string zone, DateTime nowUtc)
    {
        _zone = TimeZoneInfo.FindSystemTimeZoneById(zone);
        _today = DateOnly.FromDateTime(TimeZoneInfo.ConvertTimeFromUtc(DateTime.SpecifyKind(nowUtc, DateTimeKind.Utc), _zone));
    }

    public DateOnly Day(int day) => _today.AddDays(day);

    /// <summary>The time in the columns day and time, or in those with a prefix such as off_.</summary>
    public DateTime At(SampleRow row, string prefix = "") => Utc(row, row.Whole(prefix + "day"), prefix + "time", row.Text(prefix + "time"));

    public DateTime? OptionalAt(SampleRow row, string prefix) => row.Optional(prefix + "day") is null ? null : At(row, prefix);

    public DateTime StartOf(SampleRow row, string dayColumn) => Utc(row, row.Whole(dayColumn), dayColumn, "00:00");

    private DateTime Utc(SampleRow row, int day, string column, string time)
    {
        if (!TimeOnly.TryParseExact(time, "HH:mm", CultureInfo.InvariantCulture, DateTimeStyles.None, out var clock))
        {
            throw row.Wrong(column, $"'{time}' is not a time such as 08:30");
        }

        var local = Day(day).ToDateTime(clock, DateTimeKind.Unspecified);

        // An hour the clocks skipped in spring is taken as the hour after it.
        return TimeZoneInfo.ConvertTimeToUtc(_zone.IsInvalidTime(local) ? local.AddHours(1) : local, _zone);
    }
}
