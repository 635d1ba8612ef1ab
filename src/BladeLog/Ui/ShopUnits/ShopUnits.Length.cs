using System.Globalization;
using System.Text.RegularExpressions;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;

namespace BladeLog.Ui;

/// <content>Lengths: mm, cm, m, µm, inch, feet, feet and inches, thousandths, gauge numbers.</content>
public sealed partial record ShopUnits
{
    private const double Millimetre = 1e-3;
    private const double Micrometre = 1e-6;

    // In a field the nearest 64th stands where it is no further off than this: a caliper on a worn blade reads no better.
    private const double FractionSlack = 0.05 * Millimetre;

    // Elsewhere a fraction says that it is one: 25 mm is no 63/64 in.
    private const double FractionExact = 0.001 * Millimetre;
    private const int Sixtyfourths = 64;

    private static readonly Family LengthFamily = new("length", "mm, cm, m, in or ft", "12.7, 1/2 in or 13 mm", "1/2, 0.5 or 13 mm", "mm", "in", new()
    {
        ["mm"] = new(Millimetre),
        ["millimetre"] = new(Millimetre),
        ["millimetres"] = new(Millimetre),
        ["millimeter"] = new(Millimetre),
        ["millimeters"] = new(Millimetre),
        ["cm"] = new(1e-2),
        ["m"] = new(1),
        ["metre"] = new(1),
        ["metres"] = new(1),
        ["meter"] = new(1),
        ["meters"] = new(1),
        ["um"] = new(Micrometre, Thousands: true),
        ["micron"] = new(Micrometre, Thousands: true),
        ["microns"] = new(Micrometre, Thousands: true),
        ["in"] = new(Exact.Inch),
        ["inch"] = new(Exact.Inch),
        ["inches"] = new(Exact.Inch),
        ["\""] = new(Exact.Inch),
        ["ft"] = new(Exact.Foot),
        ["foot"] = new(Exact.Foot),
        ["feet"] = new(Exact.Foot),
        ["'"] = new(Exact.Foot),
        ["thou"] = new(Exact.Inch / 1000, Thousands: true),
    });

    /// <summary>Reads a length.</summary>
    public Parsed<Length> ReadLength(string? text, TypedField? field = null)
    {
        field ??= Fields.AnyLength;
        string Shown(double si) => Show(new Length(si), field);
        return ReadMetres(text, field, Shown).As(si => new Length(si), l => Show(l, field));
    }

    private Parsed<double> ReadMetres(string? text, TypedField field, Func<double, string> show)
    {
        var typed = (text ?? "").Trim();
        var clean = Amount.Clean(text);
        if (Blank<double>(typed, clean, field, Examples(LengthFamily)) is { } blank)
            return blank;
        if (field.Gauge && GaugeText().Match(clean) is { Success: true } g)
        {
            var number = int.Parse(g.Groups["a"].Value + g.Groups["b"].Value, CultureInfo.InvariantCulture);
            return BirminghamGauge.Thickness(number) is { } t
                ? InRange(t.Metres, typed, field, show)
                : Parsed<double>.Refused(typed, $"{Quote(typed)} is not a gauge of band steel. Write BWG {BirminghamGauge.Thickest} to {BirminghamGauge.Thinnest}, or the thickness such as 0.9 mm.");
        }

        if (FeetAndInches().Match(clean) is { Success: true } f)
        {
            if (!Amount.TryReadAll(f.Groups["feet"].Value, false, out var feet) || !Amount.TryReadAll(f.Groups["inches"].Value, false, out var inches))
                return NotA<double>(typed, field, "13'2\", 158 in or 4013 mm");
            if (inches.Value < 0 || inches.Value >= Fields.InchesInAFoot)
                return Parsed<double>.Refused(typed, $"In {Quote(typed)} the inches after the feet must be less than 12. Write 13'2\" or 158 in.");
            var size = (Math.Abs(feet.Value) * Exact.Foot) + (inches.Value * Exact.Inch);
            return InRange(clean[0] == '-' ? -size : size, typed, field, show);
        }

        // In large fields only the millimetre takes "5,690" as thousands: 5,690 m is 5.69 m and 105,125 in is 105 1/8.
        var family = field.Large ? LargeLengthFamily : LengthFamily;
        if (Amount.TryRead(clean, _ => false, out var amount, out var rest) && rest.Length == 0
            && amount.Written is Written.Fraction or Written.LeadingMark && field.Bare is null)
        {
            return InRange(amount.Value * Exact.Inch, typed, field, show);
        }

        return ReadOne(text, field, family, show);
    }

    private static readonly Family LargeLengthFamily = LengthFamily with
    {
        ExamplesMetric = "2667, 105 in or 13'2\"",
        ExamplesInch = "105, 13'2\" or 2667 mm",
        Names = new(LengthFamily.Names) { ["mm"] = new(Millimetre, Thousands: true) },
    };

    /// <summary>Shows a length in the shop's unit: 12.7 mm, or 1/2 in.</summary>
    public string Show(Length length, TypedField? field = null)
    {
        field ??= Fields.AnyLength;
        if (!double.IsFinite(length.Metres))
            return "no length";
        if (field.Bare == "um")
            return With(length.Micrometres, Math.Abs(length.Micrometres) < 10 ? 2 : 1, "µm");
        if (!IsInch)
            return With(length.Millimetres, Math.Abs(length.Millimetres) < 10 ? 3 : 1, "mm");
        var inches = length.Metres / Exact.Inch;
        return field.Thousandths || Fraction(inches, ForFields ? FractionSlack : FractionExact) is not { } fraction
            ? With(inches, InchDecimals(Math.Abs(inches), field), "in")
            : fraction + Gap + "in";
    }

    /// <summary>As many as the thing is held to: a body or a width to the thousandth, a loop to the tenth.</summary>
    private int InchDecimals(double inches, TypedField field) => ForFields ? inches < 1 ? 4 : 3
        : inches < 0.01 ? 4
        : inches < 1 || field.Thousandths || field == Fields.BladeWidth || field == Fields.Pitch ? 3
        : inches < 10 ? 2
        : 1;

    /// <summary>Both systems: 12.7 mm (1/2 in).</summary>
    public string ShowBoth(Length length, TypedField? field = null) => $"{Show(length, field)} ({Other.Show(length, field)})";

    private static string? Fraction(double inches, double slack)
    {
        var parts = Math.Round(Math.Abs(inches) * Sixtyfourths);
        if (parts == 0 || Math.Abs((parts / Sixtyfourths) - Math.Abs(inches)) * Exact.Inch > slack || parts > 1e9)
            return null;
        var whole = (long)parts / Sixtyfourths;
        var top = (long)parts % Sixtyfourths;
        var bottom = (long)Sixtyfourths;
        while (top > 0 && top % 2 == 0)
        {
            top /= 2;
            bottom /= 2;
        }

        var sign = inches < 0 ? "-" : "";
        var part = top == 0 ? "" : string.Create(CultureInfo.InvariantCulture, $"{top}/{bottom}");
        return (whole, top) switch
        {
            (0, _) => sign + part,
            (_, 0) => sign + whole.ToString(CultureInfo.InvariantCulture),
            _ => sign + whole.ToString(CultureInfo.InvariantCulture) + Gap + part,
        };
    }

    [GeneratedRegex(@"^(?:(?:bwg|gauge|ga|no\.?)\s*\.?\s*(?<a>\d{1,2})(?:\s*(?:bwg|ga))?|(?<b>\d{1,2})\s*(?:bwg|gauge|ga|g)\.?)$", RegexOptions.CultureInvariant)]
    private static partial Regex GaugeText();

    [GeneratedRegex("^(?<feet>[^'a-z]+?)\\s*(?:'|ft\\.?|feet|foot)\\s*-?\\s*(?<inches>[\\d.,][^\"a-z']*?)\\s*(?:\"|in\\.?|inch|inches)?$", RegexOptions.CultureInvariant)]
    private static partial Regex FeetAndInches();
}
