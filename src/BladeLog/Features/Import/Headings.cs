using System.Text.RegularExpressions;

namespace BladeLog.Features.Import;

/// <summary>A column that can be imported: its own name, other spellings, whether a row is nothing without it.</summary>
public sealed record Column(string Key, string Name, bool Needed, string Says, params string[] Also);

/// <summary>A column found in a file, with the unit its heading names.</summary>
internal sealed record Found(int Index, Column Column, string? Unit, string Heading);

internal static partial class Headings
{
    /// <summary>The columns of a file as this kind understands them, and the headings that mean nothing to it.</summary>
    public static (IReadOnlyList<Found> Found, IReadOnlyList<string> Ignored, Wrong? Twice) Match(string[] headings, IReadOnlyList<Column> columns)
    {
        Dictionary<string, Column> names = [];
        foreach (Column column in columns)
        {
            foreach (string name in column.Also.Prepend(column.Name).Prepend(column.Key))
            {
                names.TryAdd(Plain(name), column);
            }
        }

        List<Found> found = [];
        List<string> ignored = [];
        Wrong? twice = null;
        for (int i = 0; i < headings.Length; i++)
        {
            if (headings[i].Length == 0)
            {
                continue;
            }

            (string name, string? unit) = Split(headings[i]);
            if (names.TryGetValue(Plain(headings[i]), out Column? column))
            {
                // The whole heading is a name: the end of "teeth per inch" is no unit of its own.
                (name, unit) = (headings[i], null);
            }
            else
            {
                names.TryGetValue(Plain(name), out column);
            }

            if (column is null)
            {
                ignored.Add(headings[i]);
            }
            else if (found.FirstOrDefault(f => f.Column == column) is { } first)
            {
                twice ??= new Wrong(1, headings[i], null, $"The headings \"{first.Heading}\" and \"{headings[i]}\" both mean {column.Name.ToLowerInvariant()}. Leave one out.");
            }
            else
            {
                found.Add(new Found(i, column, OwnUnit(name) ?? unit, headings[i]));
            }
        }

        return (found, ignored, twice);
    }

    /// <summary>"Width (mm)", "width_mm", "Width, mm", "width in mm": the name and the unit.</summary>
    private static (string Name, string? Unit) Split(string heading)
    {
        Match m = Bracketed().Match(heading);
        if (!m.Success)
        {
            m = Trailing().Match(heading);
        }

        return m.Success && m.Groups["name"].Value.Trim().Length > 0
            ? (m.Groups["name"].Value, Unit(m.Groups["unit"].Value))
            : (heading, null);
    }

    /// <summary>A name that is a unit itself decides what its bare numbers mean: 3 under "TPI" is 3 TPI in every shop.</summary>
    private static string? OwnUnit(string name) => Plain(name) switch
    {
        "tpi" or "teeth" or "teethperinch" or "finetpi" or "coarsetpi" => "tpi",
        "ppi" or "points" or "pointsperinch" => "ppi",
        "psi" => "psi",
        "mpa" => "MPa",
        "kw" => "kW",
        "hp" => "hp",
        _ => null,
    };

    private static string Unit(string text) => text.Trim().ToLowerInvariant().Replace('_', '/') switch
    {
        "pct" or "percent" => "%",
        "deg" or "degrees" => "°",
        "minor/per/m3" or "cents" => "minor",
        "millimetres" or "millimeters" => "mm",
        "inch" or "inches" => "in",
        "teeth per inch" or "teeth/inch" or "teeth/in" or "t/in" => "tpi",
        "points per inch" or "points/in" => "ppi",
        var unit => unit,
    };

    private static string Plain(string text) => new([.. text.ToLowerInvariant().Where(char.IsLetterOrDigit)]);

    [GeneratedRegex(@"^(?<name>.*?)\s*[\(\[](?<unit>[^)\]]{1,24})[\)\]]\s*$", RegexOptions.CultureInvariant)]
    private static partial Regex Bracketed();

    [GeneratedRegex(@"^(?<name>.*?)(?:\s+in\s+|[_,\s]+)(?<unit>minor_per_m3|minor|cents|mm|cm|m|in|inch|inches|ft|um|µm|deg|degrees|°|%|pct|percent|mpa|n/mm2|psi|kpsi|ksi|n|kn|lbf|kw|w|hp|m[_/]min|ft[_/]min|fpm|m[_/]s|h|hours|min|minutes|tpi|teeth per inch|ppi|points per inch)$", RegexOptions.CultureInvariant | RegexOptions.IgnoreCase)]
    private static partial Regex Trailing();
}
