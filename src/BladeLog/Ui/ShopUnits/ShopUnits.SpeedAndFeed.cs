using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;

namespace BladeLog.Ui;

/// <content>Speed of the band and feed of the wood: the same quantity, spoken of in different units.</content>
public sealed partial record ShopUnits
{
    private const double PerMinute = 1.0 / 60;
    private const double FootAMinute = Exact.Foot / 60;

    private static readonly Dictionary<string, Unit> SpeedNames = new()
    {
        ["m/s"] = new(1),
        ["mps"] = new(1),
        ["m/min"] = new(PerMinute),
        ["mpm"] = new(PerMinute),
        ["mm/s"] = new(1e-3, Thousands: true),
        ["mm/min"] = new(1e-3 * PerMinute, Thousands: true),
        ["fpm"] = new(FootAMinute, Thousands: true),
        ["sfpm"] = new(FootAMinute, Thousands: true),
        ["sfm"] = new(FootAMinute, Thousands: true),
        ["ft/min"] = new(FootAMinute, Thousands: true),
        ["feet/min"] = new(FootAMinute, Thousands: true),
        ["ft/minute"] = new(FootAMinute, Thousands: true),
        ["feet/minute"] = new(FootAMinute, Thousands: true),
        ["ft/s"] = new(Exact.Foot),
        ["in/min"] = new(Exact.Inch * PerMinute, Thousands: true),
        ["ipm"] = new(Exact.Inch * PerMinute, Thousands: true),
        ["in/s"] = new(Exact.Inch),
    };

    private static readonly Family BandSpeedFamily = new("speed", "m/s, m/min or ft/min", "15.2, 15.2 m/s or 3000 ft/min", "3000, 3000 ft/min or 15.2 m/s", "m/s", "fpm", SpeedNames);

    private static readonly Family FeedFamily = BandSpeedFamily with
    {
        Units = "m/min, mm/s, ft/min or in/min",
        ExamplesMetric = "2.5, 2.5 m/min or 8 ft/min",
        ExamplesInch = "8, 8 ft/min or 2.5 m/min",
        BareMetric = "m/min",
    };

    /// <summary>Reads a band speed; a bare number is m/s or ft/min.</summary>
    public Parsed<Speed> ReadBandSpeed(string? text, TypedField? field = null)
        => ReadOne(text, field ?? Fields.BandSpeed, BandSpeedFamily, si => ShowBandSpeed(new Speed(si))).As(si => new Speed(si), ShowBandSpeed);

    /// <summary>Reads a feed; a bare number is m/min or ft/min.</summary>
    public Parsed<Speed> ReadFeed(string? text, TypedField? field = null)
        => ReadOne(text, field ?? Fields.Feed, FeedFamily, si => ShowFeed(new Speed(si))).As(si => new Speed(si), ShowFeed);

    /// <summary>15.2 m/s, or 2992 ft/min.</summary>
    public string ShowBandSpeed(Speed speed) => IsInch
        ? With(speed.MetresPerSecond / FootAMinute, 0, "ft/min")
        : With(speed.MetresPerSecond, 2, "m/s");

    /// <summary>2.5 m/min, or 8.2 ft/min.</summary>
    public string ShowFeed(Speed feed) => IsInch
        ? With(feed.MetresPerSecond / FootAMinute, feed.MetresPerSecond < FootAMinute ? 3 : 1, "ft/min")
        : With(feed.MetresPerMinute, feed.MetresPerMinute < 1 ? 3 : 2, "m/min");
}
