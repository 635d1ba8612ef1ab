using System.Globalization;
using System.Text.RegularExpressions;

namespace BladeLog.Ui;

/// <content>Money, kept in minor units; read digit by digit, never through a floating number.</content>
public sealed partial record ShopUnits
{
    /// <summary>Reads an amount of money to minor units. More digits than the currency has are refused, not rounded.</summary>
    public Parsed<long> ReadMoney(string? text, TypedField? field = null)
    {
        field ??= Fields.Money;
        var typed = (text ?? "").Trim();
        var clean = Amount.Clean(text);
        var examples = CurrencyDigits == 0 ? "46 or 1200" : $"46 or {ShowMajor(46 * Scale)}";
        if (Blank<long>(typed, clean, field, examples) is { } blank)
            return blank;
        if (Amount.IsNotFinite(clean))
            return OutOfRange<long>(typed, field, ShowMinor);
        if (Currency.Length > 0)
        {
            var sign = Amount.Clean(Currency);
            if (clean.StartsWith(sign, StringComparison.Ordinal))
                clean = clean[sign.Length..].Trim();
            else if (clean.EndsWith(sign, StringComparison.Ordinal))
                clean = clean[..^sign.Length].Trim();
        }

        if (MoneyDigits().Match(clean) is not { Success: true } m)
            return NotA<long>(typed, field, examples);
        var digits = m.Groups["digits"].Value.Replace(" ", "", StringComparison.Ordinal);
        // With three digits in the currency a lone comma before three digits can be read both ways.
        if (CurrencyDigits >= 3 && Lone().IsMatch(digits) && digits.Contains(',', StringComparison.Ordinal))
        {
            return Parsed<long>.Refused(typed, $"{Quote(typed)} can be read in two ways. Write {digits.Replace(",", "", StringComparison.Ordinal)} or {digits.Replace(',', '.')}.");
        }

        if (!Amount.TryMarks(digits, commaIsThousands: true, out var plain, out _))
            return NotA<long>(typed, field, examples);
        var parts = plain.Split('.');
        var after = parts.Length > 1 ? parts[1] : "";
        if (after.Length > CurrencyDigits)
        {
            var most = CurrencyDigits == 0 ? "no digits" : CurrencyDigits == 1 ? "one digit" : $"{CurrencyDigits.ToString(CultureInfo.InvariantCulture)} digits";
            return Parsed<long>.Refused(typed, $"{Quote(typed)} has {after.Length.ToString(CultureInfo.InvariantCulture)} digits after the mark; this shop's money has {most} there. Write {examples}.");
        }

        var all = (parts[0] + after.PadRight(CurrencyDigits, '0')).TrimStart('0');
        var minor = all.Length == 0 ? 0 : all.Length > 17 ? long.MaxValue : long.Parse(all, NumberStyles.None, CultureInfo.InvariantCulture);
        if (m.Groups["sign"].Value == "-")
            minor = -minor;
        return minor < field.Least || minor > field.Most
            ? OutOfRange<long>(typed, field, ShowMinor)
            : Parsed<long>.Good(minor, typed, ShowMoney(minor));
    }

    /// <summary>46.00, with the currency behind it where the shop has named one.</summary>
    public string ShowMoney(long minor) => ShowMajor(minor) + (Currency.Length > 0 ? Gap + Currency : "");

    private string ShowMinor(double minor) => ShowMoney((long)minor);

    private string ShowMajor(long minor)
    {
        var scale = (UInt128)Scale;
        var size = minor < 0 ? (UInt128)(-(Int128)minor) : (UInt128)minor;
        var whole = (size / scale).ToString(ForFields ? "0" : "#,##0", CultureInfo.InvariantCulture);
        var sign = minor < 0 ? "-" : "";
        return CurrencyDigits == 0
            ? sign + whole
            : $"{sign}{whole}.{(size % scale).ToString(CultureInfo.InvariantCulture).PadLeft(CurrencyDigits, '0')}";
    }

    private long Scale => CurrencyDigits switch
    {
        0 => 1,
        1 => 10,
        2 => 100,
        3 => 1_000,
        4 => 10_000,
        _ => throw new InvalidOperationException("A currency has 0 to 4 digits after the mark."),
    };

    [GeneratedRegex(@"^(?<sign>[+-])?\s*(?<digits>\d{1,3}(?: \d{3})+(?:[.,]\d+)?|\d[\d.,]*|[.,]\d+)$", RegexOptions.CultureInvariant)]
    private static partial Regex MoneyDigits();

    [GeneratedRegex(@"^[1-9]\d{0,2}[.,]\d{3}$", RegexOptions.CultureInvariant)]
    private static partial Regex Lone();
}
