using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;

namespace BladeLog.Ui;

/// <summary>How a number was written; the trade prints fractions and leading dots in inches.</summary>
internal enum Written
{
    Plain,
    DecimalComma,
    LeadingMark,
    Fraction,
}

/// <summary>
/// The number at the front of a text. Marks: a point is always the decimal mark unless there are several;
/// where both stand, the last is the decimal mark; a comma before exactly three digits is thousands only where the
/// caller says so; a blank before exactly three digits is thousands.
/// </summary>
internal readonly partial record struct Amount(double Value, Written Written)
{
    /// <summary>Splits off the number. False when there is none, or it is malformed or divides by nothing.</summary>
    public static bool TryRead(string clean, Func<string, bool> commaIsThousands, out Amount amount, out string rest)
    {
        amount = default;
        var m = Shape().Match(clean);
        rest = m.Success ? clean[m.Length..].Trim() : clean;
        if (!m.Success)
            return false;
        var sign = m.Groups["sign"].Value == "-" ? -1 : 1;
        if (m.Groups["top"].Success)
        {
            var whole = m.Groups["whole"].Success ? Whole(m.Groups["whole"].Value) : 0;
            var top = Whole(m.Groups["top"].Value);
            var bottom = Whole(m.Groups["bottom"].Value);
            // A whole with an improper fraction (1-5/4) is a slip, or a range of two pitches.
            if (bottom == 0 || (m.Groups["whole"].Success && top >= bottom))
                return false;
            amount = new(sign * (whole + (top / bottom)), Written.Fraction);
            return true;
        }

        var digits = m.Groups["digits"].Value.Replace(" ", "", StringComparison.Ordinal);
        if (!TryMarks(digits, commaIsThousands(rest), out var plain, out var written))
            return false;
        amount = new(sign * double.Parse(plain + m.Groups["exp"].Value, NumberStyles.Float, CultureInfo.InvariantCulture), written);
        return true;
    }

    /// <summary>The same where the whole text must be one number.</summary>
    public static bool TryReadAll(string clean, bool commaIsThousands, out Amount amount)
        => TryRead(clean, _ => commaIsThousands, out amount, out var rest) && rest.Length == 0;

    /// <summary>Turns the marks of "1,200.50", "1.200,50", "0,9" into one point. Exact: money is read from it digit by digit.</summary>
    public static bool TryMarks(string digits, bool commaIsThousands, out string plain, out Written written)
    {
        written = digits[0] is '.' or ',' ? Written.LeadingMark : Written.Plain;
        plain = digits;
        var commas = digits.Count(c => c == ',');
        var points = digits.Count(c => c == '.');
        if (commas == 0 && points <= 1)
            return !digits.EndsWith('.');
        char? group = null;
        if (commas > 0 && points > 0)
            group = digits.LastIndexOf(',') > digits.LastIndexOf('.') ? '.' : ',';
        else if (commas > 1)
            group = ',';
        else if (points > 1)
            group = '.';
        else if (commaIsThousands && OneThousands().IsMatch(digits))
            group = ',';

        var mark = group == ',' ? '.' : ',';
        var parts = digits.Split(mark);
        if (parts.Length > 2 || (parts.Length == 2 && (parts[1].Length == 0 || parts[1].Contains(group ?? mark, StringComparison.Ordinal))))
            return false;
        if (group is { } g)
        {
            var groups = parts[0].Split(g);
            if (groups[0].Length is 0 or > 3 || groups[0][0] == '0' || groups.Skip(1).Any(x => x.Length != 3))
                return false;
            parts[0] = string.Concat(groups);
        }

        if (mark == ',' && parts.Length == 2 && written == Written.Plain)
            written = Written.DecimalComma;
        plain = string.Join('.', parts);
        return true;
    }

    /// <summary>One spelling for each sign: blanks, quotes, dashes, fractions, the times sign; lower case.</summary>
    public static string Clean(string? text)
    {
        var b = new StringBuilder();
        foreach (var c in (text ?? "").Trim())
        {
            _ = c switch
            {
                '\u00A0' or '\u2009' or '\u202F' or '\t' => b.Append(' '),
                '\u2019' or '\u2018' or '\u2032' or '\u00B4' or '`' => b.Append('\''),
                '\u201C' or '\u201D' or '\u2033' => b.Append('"'),
                '\u2212' or '\u2013' or '\u2014' or '\u2010' or '\u2011' => b.Append('-'),
                '\u00D7' => b.Append('x'),
                '\u2044' => b.Append('/'),
                '\u00B5' or '\u03BC' => b.Append('u'),
                '\u00B2' => b.Append('2'),
                '\u00B3' => b.Append('3'),
                '\u00BA' => b.Append('°'),
                '½' => b.Append(" 1/2"),
                '¼' => b.Append(" 1/4"),
                '¾' => b.Append(" 3/4"),
                '⅛' => b.Append(" 1/8"),
                '⅜' => b.Append(" 3/8"),
                '⅝' => b.Append(" 5/8"),
                '⅞' => b.Append(" 7/8"),
                _ => b.Append(char.ToLowerInvariant(c)),
            };
        }

        return Blanks().Replace(b.Replace("''", "\"").ToString(), " ").Trim();
    }

    /// <summary>Words for "no number" and "without end".</summary>
    public static bool IsNotFinite(string clean) => NotFinite().IsMatch(clean);

    private static double Whole(string digits) => double.Parse(digits, NumberStyles.None, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^(?<sign>[+-])?\s*(?:(?:(?<whole>\d{1,9})(?:\s+|\s*-\s*))?(?<top>\d{1,9})\s*/\s*(?<bottom>\d{1,9})(?![\d.,])|(?<digits>\d{1,3}(?: \d{3})+(?![\d/])(?:[.,]\d+)?|\d[\d.,]*|[.,]\d+)(?<exp>e[+-]?\d{1,4})?)", RegexOptions.CultureInvariant)]
    private static partial Regex Shape();

    [GeneratedRegex(@"^[1-9]\d{0,2},\d{3}$", RegexOptions.CultureInvariant)]
    private static partial Regex OneThousands();

    [GeneratedRegex(@"^[+-]?\s*(?:nan|inf|infinity|\u221E)\b|^[+-]?\s*\u221E", RegexOptions.CultureInvariant)]
    private static partial Regex NotFinite();

    [GeneratedRegex(" +", RegexOptions.CultureInvariant)]
    private static partial Regex Blanks();
}
