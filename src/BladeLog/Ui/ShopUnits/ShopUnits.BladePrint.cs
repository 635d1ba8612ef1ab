using System.Text.RegularExpressions;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;

namespace BladeLog.Ui;

/// <content>The one-line print of a blade: 1/2 x .025 x 3 x 105, 13'2" x 27x0,9.</content>
public sealed partial record ShopUnits
{
    // What any band has, wide or narrow: used only to tell which number of the line is which, and in which unit.
    private const double LeastLoop = 0.6;
    private const double MostLoop = 40;
    private const double LeastWidth = 1.5e-3;
    private const double MostWidth = 0.5;
    private const double LeastThickness = 0.2e-3;
    private const double MostThickness = 2.6e-3;

    private const string PrintExamples = "1/2 x .025 x 3 TPI x 105 in, or 27 x 0.9 x 4013 mm";

    private sealed record Item(string Text, Amount Amount, double? Metres)
    {
        /// <summary>A fraction is always inches; anything else without a unit follows the line.</summary>
        public double In(double unit) => Metres ?? (Amount.Value * (Amount.Written == Written.Fraction ? Exact.Inch : unit));
    }

    /// <summary>
    /// Reads the print of a blade. The two short dimensions are width and thickness, the smaller being the thickness;
    /// a dimension over 0.6 m is the loop. Numbers without a unit are read in one unit for the whole line: inches
    /// where any is a fraction or begins with its decimal mark, mm where any has a decimal comma, else the shop's;
    /// where that gives no possible blade, the other. A third bare number is teeth per inch in an inch line; in a
    /// line in mm it is asked, for it may be mm.
    /// </summary>
    public Parsed<BladePrint> ReadBladePrint(string? text)
    {
        var typed = (text ?? "").Trim();
        var print = new TypedField("a blade print", 0, 0);
        var clean = Amount.Clean(text);
        if (Blank<BladePrint>(typed, clean, print, PrintExamples) is { } blank)
            return blank;
        ToothPitch? pitch = null;
        var items = new List<Item>();
        foreach (var part in Times().Split(clean))
        {
            if (SaysPitch().IsMatch(part))
            {
                var read = ReadPitch(part);
                if (!read.IsGood || pitch is not null)
                    return Parsed<BladePrint>.Refused(typed, read.Problem ?? $"{Quote(typed)} names two pitches. Write {PrintExamples}.");
                pitch = read.Value;
            }
            else if (ReadItem(part) is { } item)
            {
                items.Add(item);
            }
            else
            {
                return Parsed<BladePrint>.Refused(typed, $"In {Quote(typed)}, {Quote(part)} is not a size. Write {PrintExamples}.");
            }
        }

        if (items.Count is 0 or > 4 || items.Count + (pitch is null ? 0 : 1) < 2)
            return NotA<BladePrint>(typed, print, PrintExamples);
        foreach (var inch in InchFirst(items) ? new[] { true, false } : [false, true])
        {
            if (TryLine(items, pitch, inch, out var blade, out var ask))
                return Parsed<BladePrint>.Good(blade, typed, Show(blade));
            if (ask is not null)
                return Parsed<BladePrint>.Refused(typed, ask);
        }

        return Parsed<BladePrint>.Refused(typed, $"{Quote(typed)} is not a possible blade. Write width x thickness x pitch x length with units: {PrintExamples}.");
    }

    /// <summary>Shows what is there, joined by a times sign: 12.7 mm × 0.635 mm × 8.467 mm × 2667 mm.</summary>
    public string Show(BladePrint blade)
    {
        string?[] parts =
        [
            blade.Width is { } w ? Show(w, Fields.BladeWidth) : null,
            blade.Thickness is { } t ? Show(t, Fields.Thickness) : null,
            blade.Pitch is { } p ? Show(p) : null,
            blade.Loop is { } l ? Show(l, Fields.Loop) : null,
        ];
        return string.Join(" × ", parts.Where(x => x is not null));
    }

    private Item? ReadItem(string part)
    {
        // "5,690" in a line is a loop; no band is made to a thousandth of a millimetre.
        if (Amount.TryReadAll(part, commaIsThousands: true, out var bare))
            return double.IsFinite(bare.Value) && bare.Value > 0 ? new(part, bare, null) : null;
        var field = Fields.AnyLength with { Gauge = true, Large = true };
        return ReadMetres(part, field, m => Show(new Length(m))) is { IsGood: true, Value: > 0 } read ? new(part, default, read.Value) : null;
    }

    private bool InchFirst(List<Item> items)
    {
        var bare = items.Where(i => i.Metres is null).Select(i => i.Amount.Written).ToList();
        if (bare.Any(w => w is Written.Fraction or Written.LeadingMark))
            return true;
        return !bare.Contains(Written.DecimalComma) && IsInch;
    }

    private static bool TryLine(List<Item> items, ToothPitch? pitch, bool inch, out BladePrint blade, out string? ask)
    {
        blade = new(null, null, pitch, null);
        ask = null;
        var unit = inch ? Exact.Inch : Millimetre;
        var rest = items.ToList();
        // With no pitch named, the third short number is the pitch: it may look long (22 in an inch line is 0.56 m).
        Item? third = null;
        if (pitch is null && items.Count >= 3)
        {
            var longest = items.MaxBy(i => i.In(unit))!;
            var shorts = items.Where(i => i != longest || items.Count == 3 && longest.In(unit) < LeastLoop).ToList();
            third = shorts.Count == 3 ? shorts[2] : null;
        }

        if (third is not null)
            rest.Remove(third);
        var loops = rest.Where(i => i.In(unit) >= LeastLoop).Select(i => i.In(unit)).ToList();
        var sizes = rest.Select(i => i.In(unit)).Where(x => x < LeastLoop).OrderDescending().ToList();
        if (loops.Count > 1 || loops.Exists(l => l > MostLoop) || sizes.Count is 0 or > 2
            || sizes[0] is < LeastWidth or > MostWidth
            || (sizes.Count == 2 && sizes[1] is < LeastThickness or > MostThickness))
        {
            return false;
        }

        if (third is not null)
        {
            if (third.Metres is null && (!inch || third.Amount.Written == Written.Fraction))
            {
                ask = $"The {Quote(third.Text)} of this line can be teeth per inch or {(inch ? "inches" : "mm")}. Write {third.Text} TPI or {third.Text} {(inch ? "in" : "mm")}.";
                return false;
            }

            var spacing = third.Metres ?? (third.Amount.Written == Written.LeadingMark ? third.In(unit) : Exact.Inch / third.Amount.Value);
            if (spacing < Fields.Pitch.Least || spacing > Fields.Pitch.Most)
                return false;
            pitch = ToothPitch.Between(spacing, spacing);
        }

        blade = new(
            new Length(sizes[0]),
            sizes.Count == 2 ? new Length(sizes[1]) : null,
            pitch,
            loops.Count == 1 ? new Length(loops[0]) : null);
        return true;
    }

    [GeneratedRegex(@"\s*[x*]\s*|\s+by\s+", RegexOptions.CultureInvariant)]
    private static partial Regex Times();

    [GeneratedRegex(@"tpi|t\.p\.i|ppi|pitch|points|teeth|^\d[\d.]*\s*-\s*\d[\d.]*$", RegexOptions.CultureInvariant)]
    private static partial Regex SaysPitch();
}
