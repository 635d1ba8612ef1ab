using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using Choice = BladeLog.Advice.Cuts.Choice;

namespace BladeLog.Features.Cuts;

/// <summary>The figures behind a choice as rows, in four groups.</summary>
public sealed record CutBecause(IReadOnlyList<BecauseLine> Blade, IReadOnlyList<BecauseLine> Limits, IReadOnlyList<BecauseLine> Forces, IReadOnlyList<BecauseLine> Job)
{
    internal static CutBecause Of(Choice choice, ShopAdvice advice, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(advice);
        List<Figure> all = [.. ChoiceFigures.Of(choice, advice.Settings).Where(f => double.IsFinite(f.Value))];
        int gate = From(all, "rubs below", 0), feed = From(all, "working feed", gate), job = From(all, "sawing", feed);
        List<BecauseLine> rows = [.. all.Select(f => Line(f, advice.Words, units))];
        return new CutBecause(rows[..gate], rows[gate..feed], rows[feed..job], rows[job..]);
    }

    private static int From(List<Figure> all, string name, int least)
    {
        int i = all.FindIndex(f => f.Name == name);
        return i < 0 ? Math.Max(least, all.Count) : i;
    }

    private static BecauseLine Line(Figure f, Wording words, ShopUnits units) => new(
        Said.Capital(f.Name == "tension" ? words.Tension : f.Name),
        Value(f, units),
        Reckoned.InWords(f.How, units),
        Reckoned.Source(f.Source),
        f.Provenance);

    private static string Value(Figure f, ShopUnits units) => f.Unit switch
    {
        "m/min" => CutSays.Feed(f.Value / 60, units),
        "mm" => units.Show(new Length(f.Value / 1e3), Fields.Kerf),
        "µm" => units.Show(new Length(f.Value / 1e6), Fields.EdgeRadius),
        "MPa" => units.Show(new Stress(f.Value * 1e6)),
        "N" => units.Show(new Force(f.Value)),
        "W" => units.Show(new Power(f.Value)),
        "km" or "m" or "mm²" => Reckoned.Far(f, units),
        "minor units" => CutSays.Money(f.Value, units),
        "" when f.Name == "chance of a break" => Figures.Chance(f.Value),
        "" => Digits(f.Value),
        _ => Figures.With(Digits(f.Value), f.Unit),
    };

    /// <summary>Three figures: no more is known.</summary>
    private static string Digits(double value)
    {
        if (value == 0)
        {
            return "0";
        }

        int decimals = Math.Clamp(2 - (int)Math.Floor(Math.Log10(Math.Abs(value))), 0, 12);
        return value.ToString("#,##0." + new string('#', decimals), System.Globalization.CultureInfo.InvariantCulture);
    }
}
