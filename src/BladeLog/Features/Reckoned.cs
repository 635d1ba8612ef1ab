using System.Globalization;
using System.Text.RegularExpressions;
using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;
using BladeLog.Ui;
using BladeLog.Ui.Forms;

namespace BladeLog.Features;

/// <summary>Figures of the advice as rows under "because", in the shop's units.</summary>
internal static partial class Reckoned
{
    /// <summary>Keys that say what a figure is worth, not where it is written: the mark says it.</summary>
    private static readonly HashSet<string> Marks = new(StringComparer.Ordinal) { "derived", "common-practice", "from-memory", "engineering-default" };

    public static IReadOnlyList<BecauseLine> Lines(IEnumerable<Figure> figures, ShopUnits units) =>
        [.. figures.Select(f => new BecauseLine(Said.Capital(f.Name), Value(f, units), InWords(Said.Capital(f.How), units), Source(f.Source), f.Provenance))];

    private static string Value(Figure f, ShopUnits units) => f.Unit switch
    {
        _ when !double.IsFinite(f.Value) => "no limit",
        "mm" => units.Show(new Length(f.Value * 1e-3), Fields.AnyLength with { Thousandths = true }),
        "MPa" => units.Show(Stress.FromMegapascals(f.Value)),
        "m/min" => units.ShowFeed(new Speed(f.Value / 60)),
        "N" => units.Show(new Force(f.Value)),
        "W" => units.Show(new Power(f.Value)),
        "km" or "m" or "mm²" => Far(f, units),
        "" => Number(f.Value),
        "×" => "×" + f.Value.ToString("0.00", CultureInfo.InvariantCulture),
        "°" => Number(f.Value) + "°",
        _ => Figures.With(Number(f.Value), f.Unit),
    };

    /// <summary>A path, a length of cut or the area of a gullet.</summary>
    internal static string Far(Figure f, ShopUnits units) => units.Units != UnitSystem.Inch ? Figures.With(Number(f.Value), f.Unit)
        : f.Unit switch
        {
            "km" => Said.Path(f.Value, units, f.Value < 9.95 ? 2 : 1),
            "m" => Figures.With(Number(f.Value / Exact.Foot), "ft"),
            _ => Figures.With(Number(f.Value * 1e-6 / (Exact.Inch * Exact.Inch)), "in²"),
        };

    /// <summary>Reasons are worded in SI where they are reckoned; an inch shop reads their figures in its own units.</summary>
    internal static string InWords(string how, ShopUnits units) => units.Units != UnitSystem.Inch ? how : Si().Replace(how, m =>
    {
        double v = double.Parse(m.Groups["v"].Value, NumberStyles.Number, CultureInfo.InvariantCulture);
        return m.Groups["u"].Value switch
        {
            "N" => units.Show(new Force(v)),
            "mm" => units.Show(new Length(v * 1e-3), Fields.AnyLength),
            _ => Figures.With(Figures.Feed(v / Exact.Foot), "ft/min"),
        };
    });

    [GeneratedRegex(@"(?<![\w.])(?<v>\d[\d,]*(?:\.\d+)?) (?<u>N|mm|m/min)(?![\w/])", RegexOptions.CultureInvariant)]
    private static partial Regex Si();

    /// <summary>Three figures, thousands grouped; whole from a thousand on.</summary>
    public static string Number(double value)
    {
        if (value == 0)
        {
            return "0";
        }

        int power = (int)Math.Floor(Math.Log10(Math.Abs(value)));
        return power >= 2 ? value.ToString("N0", CultureInfo.InvariantCulture)
            : power >= -4 ? value.ToString("0." + new string('#', 2 - power), CultureInfo.InvariantCulture)
            : value.ToString("0.##E0", CultureInfo.InvariantCulture);
    }

    /// <summary>"Roessle, Fatemi 2000" of a key of the list of sources.</summary>
    public static string? Source(string key)
    {
        if (Marks.Contains(key))
        {
            return null;
        }

        string[] parts = key.Split('-');
        bool year = parts.Length > 1 && parts[^1].Length == 4 && parts[^1].All(char.IsAsciiDigit);
        string[] names = year ? parts[..^1] : parts;
        return (year ? string.Join(", ", names.Select(Said.Capital)) : Said.Capital(string.Join(' ', names))) + (year ? " " + parts[^1] : "");
    }
}
