using System.Text.RegularExpressions;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;

namespace BladeLog.Ui;

/// <summary>Tooth spacing; finest and coarsest differ on a variable-pitch blade.</summary>
/// <param name="Coarse">Widest spacing: governs teeth in the cut.</param>
/// <param name="Fine">Closest spacing.</param>
public readonly record struct ToothPitch(Length Coarse, Length Fine)
{
    /// <summary>One inch over the mean of the teeth per inch: governs bite and wear.</summary>
    public Length Mean => new(2 * Coarse.Metres * Fine.Metres / (Coarse.Metres + Fine.Metres));

    /// <summary>True when the spacing changes round the loop.</summary>
    public bool IsVariable => Coarse != Fine;

    internal static ToothPitch Between(double oneMetres, double otherMetres)
        => new(new Length(Math.Max(oneMetres, otherMetres)), new Length(Math.Min(oneMetres, otherMetres)));
}

/// <content>Tooth pitch: mm, inches, teeth per inch (TPI), points per inch, variable pitch.</content>
public sealed partial record ShopUnits
{
    private string PitchExamples => IsInch ? "3 TPI, 3-4 TPI or 7/8 in" : "8.5 mm, 3 TPI or 3-4 TPI";

    /// <summary>
    /// Reads a tooth pitch. Two numbers are a variable pitch; "3/4 TPI" is 3 to 4 teeth per inch. Points per inch are
    /// one more than teeth per inch. A bare number is mm in a metric shop and teeth per inch in an inch shop.
    /// </summary>
    public Parsed<ToothPitch> ReadPitch(string? text)
    {
        var typed = (text ?? "").Trim();
        var field = Fields.Pitch;
        var clean = Amount.Clean(text);
        if (Blank<ToothPitch>(typed, clean, field, PitchExamples) is { } blank)
            return blank;
        clean = Variable().Replace(clean, "").Trim();
        var points = Points().IsMatch(clean);
        var perInch = points || PerInch().IsMatch(clean);
        var pitchWord = PitchWord().IsMatch(clean);
        var bare = PitchWord().Replace(PerInch().Replace(Points().Replace(clean, ""), ""), "").Trim();

        var r = Range().Match(bare);
        var slash = r.Groups["mark"].Value == "/";
        var unit = r.Groups["unit"].Value;
        // With a unit of length behind it, or the word pitch, a slash is a part of an inch.
        if (r.Success && !(slash && !perInch && (unit.Length > 0 || pitchWord)))
        {
            if (slash && !perInch && AskOrInch(bare, typed) is { } asked)
                return asked;
            if (!Amount.TryReadAll(r.Groups["a"].Value, false, out var a) || !Amount.TryReadAll(r.Groups["b"].Value, false, out var b))
                return NotA<ToothPitch>(typed, field, PitchExamples);
            if (unit.Length == 0 && !pitchWord)
                return Teeth(a.Value, b.Value, points, typed);
            return Find(LengthFamily, field, unit) is { } u && !perInch
                ? Spaced(a.Value * u.Si, b.Value * u.Si, typed)
                : NotA<ToothPitch>(typed, field, PitchExamples);
        }

        var plain = Amount.TryRead(bare, _ => false, out var one, out var rest) && rest.Length == 0;
        var inchShopTeeth = plain && IsInch && !pitchWord && one.Written is (Written.Plain or Written.DecimalComma);
        if (perInch || inchShopTeeth)
            return plain ? Teeth(one.Value, one.Value, points, typed) : NotA<ToothPitch>(typed, field, PitchExamples);
        var length = ReadMetres(bare, field, ShowSpacing);
        return length.IsGood
            ? Spaced(length.Value, length.Value, typed)
            : Parsed<ToothPitch>.Refused(typed, Amount.IsNotFinite(bare) || plain ? PitchRange(typed) : NotA<ToothPitch>(typed, field, PitchExamples).Problem!);
    }

    /// <summary>Shows a pitch: 8.467 mm in a metric shop; 3 TPI, 3-4 TPI or 7/8 in in an inch shop.</summary>
    public string Show(ToothPitch pitch)
    {
        if (!IsInch)
        {
            return pitch.IsVariable
                ? $"{Num(pitch.Fine.Millimetres, 3)}-{With(pitch.Coarse.Millimetres, 3, "mm")}"
                : With(pitch.Fine.Millimetres, 3, "mm");
        }

        if (WholeTeeth(pitch.Coarse) is { } few && WholeTeeth(pitch.Fine) is { } many)
            return pitch.IsVariable ? $"{Num(few, 1)}-{With(many, 1, "TPI")}" : With(few, 1, "TPI");
        if (pitch.IsVariable)
            return $"{Num(Exact.Inch / pitch.Coarse.Metres, 3)}-{With(Exact.Inch / pitch.Fine.Metres, 3, "TPI")}";

        // A part of an inch only where it is that part, as near as whole teeth are taken.
        var parts = pitch.Fine.Metres / Exact.Inch * 64;
        return Math.Abs(Math.Round(parts) - parts) < 0.002 * parts ? Show(pitch.Fine, Fields.Pitch) : With(Exact.Inch / pitch.Fine.Metres, 3, "TPI");
    }

    private Parsed<ToothPitch>? AskOrInch(string bare, string typed)
    {
        if (!Amount.TryReadAll(bare, false, out var f))
            return null;
        if (bare.Replace(" ", "", StringComparison.Ordinal) is "1/2" or "3/4" or "5/8")
            return Parsed<ToothPitch>.Refused(typed, $"{Quote(typed)} can be teeth per inch or a part of an inch. Write {bare} TPI or {bare} in.");
        var bottom = bare[(bare.IndexOf('/', StringComparison.Ordinal) + 1)..].Trim();
        // Nobody divides an inch in thirds or tenths: 2/3 and 6/10 are variable pitches.
        return bottom is "2" or "4" or "8" or "16" or "32" or "64" ? Spaced(f.Value * Exact.Inch, f.Value * Exact.Inch, typed) : null;
    }

    private Parsed<ToothPitch> Teeth(double a, double b, bool points, string typed)
    {
        var less = points ? 1 : 0;
        return a > less && b > less
            ? Spaced(Exact.Inch / (a - less), Exact.Inch / (b - less), typed)
            : Parsed<ToothPitch>.Refused(typed, PitchRange(typed));
    }

    private Parsed<ToothPitch> Spaced(double a, double b, string typed)
    {
        var p = ToothPitch.Between(a, b);
        return InRange(p.Fine.Metres, typed, Fields.Pitch, ShowSpacing).IsGood && InRange(p.Coarse.Metres, typed, Fields.Pitch, ShowSpacing).IsGood
            ? Parsed<ToothPitch>.Good(p, typed, Show(p))
            : Parsed<ToothPitch>.Refused(typed, PitchRange(typed));
    }

    private string PitchRange(string typed) => OutOfRange<double>(typed, Fields.Pitch, ShowSpacing).Problem!;

    private string ShowSpacing(double metres) => Show(new Length(metres), Fields.AnyLength);

    private static double? WholeTeeth(Length spacing)
    {
        var n = Exact.Inch / spacing.Metres;
        var near = Math.Round(n, 1);
        return near > 0 && Math.Abs(near - n) < 0.002 * n ? near : null;
    }

    [GeneratedRegex(@"\b(?:variable|vari|var)\b\.?", RegexOptions.CultureInvariant)]
    private static partial Regex Variable();

    [GeneratedRegex(@"\s*(?:ppi|points per inch|points|pts?)\.?$|^ppi\s*", RegexOptions.CultureInvariant)]
    private static partial Regex Points();

    [GeneratedRegex(@"\s*(?:tpi|t\.p\.i\.?|teeth per inch|teeth/in(?:ch)?|teeth/""|t/in|teeth)\.?$|^tpi\s*", RegexOptions.CultureInvariant)]
    private static partial Regex PerInch();

    [GeneratedRegex(@"\s*\bpitch\b\s*", RegexOptions.CultureInvariant)]
    private static partial Regex PitchWord();

    [GeneratedRegex(@"^(?<a>\d[\d.,]*)\s*(?<mark>-|/|to)\s*(?<b>\d[\d.,]*)\s*(?<unit>[a-z""]*)$", RegexOptions.CultureInvariant)]
    private static partial Regex Range();
}
