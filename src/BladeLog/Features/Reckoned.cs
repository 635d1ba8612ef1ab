using System.Globalization;
using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;

namespace BladeLog.Features;

/// <summary>Figures of the advice as rows under "because", in the shop's units.</summary>
internal static class Reckoned
{
    /// <summary>Keys that say what a figure is worth, not where it is written: the mark says it.</summary>
    private static readonly HashSet<string> Marks = new(StringComparer.Ordinal) { "derived", "common-practice", "from-memory", "engineering-default" };

    public static IReadOnlyList<BecauseLine> Lines(IEnumerable<Figure> figures, ShopUnits units) =>
        [.. figures.Select(f => new BecauseLine(Said.Capital(f.Name), Value(f, units), Said.Capital(f.How), Source(f.Source), f.Provenance))];

    private static string Value(Figure f, ShopUnits units) => f.Unit switch
    {
        _ when !double.IsFinite(f.Value) => "no limit",
        "mm" => units.Show(new Length(f.Value * 1e-3), Fields.AnyLength with { Thousandths = true }),
        "MPa" => units.Show(Stress.FromMegapascals(f.Value)),
        "m/min" => units.ShowFeed(new Speed(f.Value / 60)),
        "N" => units.Show(new Force(f.Value)),
        "W" => units.Show(new Power(f.Value)),
        "" => Number(f.Value),
        "×" => "×" + f.Value.ToString("0.00", CultureInfo.InvariantCulture),
        "°" => Number(f.Value) + "°",
        _ => Figures.With(Number(f.Value), f.Unit),
    };

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
