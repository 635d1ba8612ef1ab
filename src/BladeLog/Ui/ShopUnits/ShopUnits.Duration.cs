using System.Globalization;
using System.Text.RegularExpressions;

namespace BladeLog.Ui;

/// <content>Durations: running hours, hour meters, minutes of cutting, seconds of run-down.</content>
public sealed partial record ShopUnits
{
    private const double Hour = 3600;
    private const double Minute = 60;

    private static readonly Dictionary<string, double> TimeNames = new()
    {
        ["d"] = 24 * Hour,
        ["day"] = 24 * Hour,
        ["days"] = 24 * Hour,
        ["h"] = Hour,
        ["hr"] = Hour,
        ["hrs"] = Hour,
        ["hour"] = Hour,
        ["hours"] = Hour,
        ["m"] = Minute,
        ["min"] = Minute,
        ["mins"] = Minute,
        ["minute"] = Minute,
        ["minutes"] = Minute,
        ["s"] = 1,
        ["sec"] = 1,
        ["secs"] = 1,
        ["second"] = 1,
        ["seconds"] = 1,
    };

    /// <summary>
    /// Reads a duration to the millisecond: 1.5, 1h30, 1:30, 90 min, 2 h 5 m. A bare number is in the field's unit,
    /// hours where it names none; 1:30 is always an hour and a half.
    /// </summary>
    public Parsed<TimeSpan> ReadDuration(string? text, TypedField? field = null)
    {
        field ??= Fields.RunHours;
        string Examples = field.Large ? "what it shows, such as 7019.3" : field.Bare == "min" ? "25, 25 min or 1:30" : "1.5, 1:30 or 90 min";
        var typed = (text ?? "").Trim();
        var clean = Amount.Clean(text);
        // A limit is told in the unit the field is typed in.
        string Shown(double s) => field.Bare == "min" ? With(s / Minute, 0, "min") : ShowSeconds(s, field);
        if (Blank<TimeSpan>(typed, clean, field, Examples) is { } blank)
            return blank;
        if (Amount.IsNotFinite(clean))
            return OutOfRange<TimeSpan>(typed, field, Shown);
        if (!TryClock(clean, out var seconds) && !TryParts(clean, field, out seconds))
            return NotA<TimeSpan>(typed, field, Examples);
        return InRange(seconds, typed, field, Shown).As(s => TimeSpan.FromMilliseconds((long)Math.Round(s * 1000)), t => Show(t, field));
    }

    /// <summary>1 h 30 min; an hour meter is shown in hours and hundredths.</summary>
    public string Show(TimeSpan time, TypedField? field = null) => ShowSeconds(time.TotalSeconds, field ?? Fields.RunHours);

    private string ShowSeconds(double total, TypedField field)
    {
        if (field.Large)
            return With(total / Hour, 2, "h");
        if (total < 0)
            return "-" + ShowSeconds(-total, field);
        if (total < Minute)
            return With(total, 1, "s");
        // Below an hour to the second, above it to the minute: nobody reads more off a clock on the wall.
        var seconds = total < Hour ? (long)Math.Round(total) : (long)Math.Round(total / Minute) * 60;
        var parts = new List<string>(3);
        if (seconds >= 3600)
            parts.Add(With(seconds / 3600, 0, "h"));
        if (seconds / 60 % 60 > 0)
            parts.Add(With(seconds / 60 % 60, 0, "min"));
        if (seconds % 60 > 0)
            parts.Add(With(seconds % 60, 0, "s"));
        return string.Join(Gap, parts);
    }

    private static bool TryClock(string clean, out double seconds)
    {
        seconds = 0;
        if (Clock().Match(clean) is not { Success: true } m)
            return false;
        double Of(string name) => m.Groups[name].Success ? double.Parse(m.Groups[name].Value, NumberStyles.None, CultureInfo.InvariantCulture) : 0;
        seconds = (Of("h") * Hour) + (Of("m") * Minute) + Of("s");
        return Of("m") < 60 && Of("s") < 60;
    }

    private static bool TryParts(string clean, TypedField field, out double seconds)
    {
        seconds = 0;
        var last = double.PositiveInfinity;
        var rest = clean;
        for (var part = 0; rest.Length > 0; part++)
        {
            if (!Amount.TryRead(rest, _ => field.Large, out var amount, out rest) || (part > 0 && amount.Value < 0))
                return false;
            var word = Word().Match(rest);
            rest = rest[word.Length..].Trim();
            double size;
            if (word.Groups["w"].Length > 0)
            {
                if (!TimeNames.TryGetValue(word.Groups["w"].Value, out size))
                    return false;
            }
            else if (part == 0 && rest.Length == 0)
            {
                size = TimeNames[field.Bare ?? "h"];
            }
            else
            {
                // The 30 of "1h30".
                if (last != Hour || rest.Length > 0 || amount.Value >= 60)
                    return false;
                size = Minute;
            }

            if (size >= last)
                return false;
            last = size;
            seconds += amount.Value * size;
        }

        return true;
    }

    [GeneratedRegex(@"^(?<h>\d{1,6}):(?<m>\d{2})(?::(?<s>\d{2}))?(?:\s*h)?$", RegexOptions.CultureInvariant)]
    private static partial Regex Clock();

    [GeneratedRegex(@"^(?<w>[a-z]*)\.?\s*", RegexOptions.CultureInvariant)]
    private static partial Regex Word();
}
