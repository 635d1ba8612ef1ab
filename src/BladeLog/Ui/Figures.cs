using System.Globalization;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Ui;

/// <summary>How numbers are written: as few figures as the thing is known to, and never apart from their unit.</summary>
public static class Figures
{
    /// <summary>No-break space: a number and its unit stay on one line.</summary>
    public const char Glue = '\u00a0';

    private static readonly CultureInfo Invariant = CultureInfo.InvariantCulture;

    /// <summary>Feed: two figures below 1, one decimal below 10, none above.</summary>
    public static string Feed(double metresPerMinute)
    {
        var v = Checked(metresPerMinute);
        // Decided on the rounded number, so that 0.996 is written 1.0 and 9.96 is written 10.
        return TwoFigures(v) < 1 ? TwoFigures(v).ToString("0.##########", Invariant)
            : Half(v, 1) < 10 ? Half(v, 1).ToString("0.0", Invariant)
            : Half(v, 0).ToString("#,##0", Invariant);
    }

    /// <summary>Hours, and bends or metres on a life band: one decimal below 10, none above.</summary>
    public static string Hours(double hours)
    {
        var v = Checked(hours);
        return Half(v, 1) < 10 ? Half(v, 1).ToString("0.#", Invariant) : Half(v, 0).ToString("#,##0", Invariant);
    }

    /// <summary>A number with so many decimals and a comma between thousands.</summary>
    public static string Number(double value, int decimals = 0) =>
        Half(Checked(value), decimals).ToString("N" + decimals.ToString(Invariant), Invariant);

    /// <summary>A number as it is typed: no comma between thousands, no zeros behind, so that it reads back as itself.</summary>
    public static string Plain(double value, int decimals)
    {
        var rounded = Half(Checked(value), decimals);
        return (rounded == 0 ? 0 : rounded).ToString("0." + new string('#', decimals), Invariant);
    }

    /// <summary>A number and its unit, glued.</summary>
    public static string With(string figure, string unit) => $"{figure}{Glue}{unit}";

    /// <summary>At most three digits for the Floor: above 999 it says so.</summary>
    public static string Floor(double value)
    {
        var v = Half(Checked(value), 0);
        return v > 999 ? ">999" : v.ToString("0", Invariant);
    }

    /// <summary>The used part of a life with its band: "0.6 (0.15 to 2.5)"; nothing used has none.</summary>
    public static string Used(double used, double low, double high) => used == 0 && low == 0 && high == 0
        ? "0"
        : $"{TwoFigureText(used)} ({TwoFigureText(low)} to {TwoFigureText(high)})";

    /// <summary>A chance in words a shop counts in: "about 4 in 1,000".</summary>
    public static string Chance(double probability)
    {
        var p = Checked(probability);
        if (p is < 0 or > 1)
        {
            throw new ArgumentOutOfRangeException(nameof(probability), "A chance lies between 0 and 1.");
        }

        if (p < 1e-6)
        {
            return "less than 1 in 1,000,000";
        }

        if (p > 0.995)
        {
            return "almost certain";
        }

        // The smallest of these crowds in which at least one would be expected to break.
        var crowd = 100d;
        while (p * crowd < 0.95)
        {
            crowd *= 10;
        }

        return $"about {Half(p * crowd, 0).ToString("0", Invariant)} in {crowd.ToString("#,##0", Invariant)}";
    }

    /// <summary>The same at the head of a sentence: "About 4 in 1,000".</summary>
    public static string ChanceSentence(double probability)
    {
        var s = Chance(probability);
        return char.ToUpperInvariant(s[0]) + s[1..];
    }

    /// <summary>Where a figure comes from, in the words the screen uses.</summary>
    public static string Mark(Provenance provenance) => provenance switch
    {
        Provenance.Published => "published",
        Provenance.Derived => "worked out",
        Provenance.CommonPractice => "common practice",
        Provenance.FromMemory => "from memory, not checked",
        Provenance.EngineeringDefault => "default, not yours",
        Provenance.Yours => "your own figure",
        _ => throw new ArgumentOutOfRangeException(nameof(provenance), "Unknown mark of origin."),
    };

    private static string TwoFigureText(double v) =>
        Checked(v) == 0 ? "0" : TwoFigures(v).ToString("#,##0.############", Invariant);

    private static double TwoFigures(double v)
    {
        if (v == 0)
        {
            return 0;
        }

        var power = (int)Math.Floor(Math.Log10(Math.Abs(v)));
        var decimals = 1 - power;
        if (decimals >= 0)
        {
            return Half(v, Math.Min(decimals, 15));
        }

        var step = Math.Pow(10, -decimals);
        return Half(v / step, 0) * step;
    }

    private static double Half(double v, int decimals) => Math.Round(v, decimals, MidpointRounding.AwayFromZero);

    private static double Checked(double v) => double.IsFinite(v)
        ? v
        : throw new ArgumentOutOfRangeException(nameof(v), "A figure on a page must be a finite number.");
}
