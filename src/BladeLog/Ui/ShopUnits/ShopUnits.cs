using System.Globalization;

namespace BladeLog.Ui;

/// <summary>Unit of a number typed without one, and of every number shown.</summary>
public enum UnitSystem
{
    /// <summary>mm, MPa, m/s.</summary>
    Metric,

    /// <summary>Inches, psi, feet a minute.</summary>
    Inch,
}

/// <summary>The shop's word for the pull put on the blade by the wheels.</summary>
public enum PullWord
{
    /// <summary>Small shops.</summary>
    Tension,

    /// <summary>Wide-saw mills, where "tension" is the stretch rolled into the body.</summary>
    Strain,
}

/// <summary>
/// Typed text to quantity and quantity to text, by the shop's settings. The only place where typed text becomes SI.
/// Rule of the bare number: it is in the shop's unit, but a bare fraction (1/2, 1-1/4) or a number that begins with
/// its decimal mark (.025) is a length in inches, as the trade prints it. What was understood is always shown back.
/// Rule of the comma: see <see cref="TypedField.Large"/>; units so small that nobody writes three decimals of them
/// (psi, ft/min, N, lbf, W, kg/m³) take "15,000" as thousands.
/// </summary>
public sealed partial record ShopUnits
{
    internal const string Gap = "\u00A0";
    private const int LongestText = 80;

    public UnitSystem Units { get; init; } = UnitSystem.Metric;

    public bool UkSpelling { get; init; } = true;

    public PullWord Pull { get; init; } = PullWord.Tension;

    /// <summary>Digits after the mark in the shop's currency: 0 to 4.</summary>
    public int CurrencyDigits { get; init; } = 2;

    /// <summary>Sign or code of the currency; shown after the amount, taken before or after it.</summary>
    public string Currency { get; init; } = "";

    /// <summary>Where the shop's clock hangs.</summary>
    public TimeZoneInfo Zone { get; init; } = TimeZoneInfo.Utc;

    /// <summary>Numbers as a form field holds them: no comma between thousands, so many digits that saving again changes nothing.</summary>
    public bool ForFields { get; init; }

    /// <summary>The same shop, its numbers as they stand in a form field.</summary>
    public ShopUnits Typing => this with { ForFields = true };

    /// <summary>The same shop in the other system, for the second line under a number.</summary>
    public ShopUnits Other => this with { Units = IsInch ? UnitSystem.Metric : UnitSystem.Inch };

    /// <summary>"tension" or "strain".</summary>
    public string PullName => Pull == PullWord.Strain ? "strain" : "tension";

    /// <summary>The spelling the shop has chosen: <c>Spell("tyre", "tire")</c>.</summary>
    public string Spell(string uk, string us) => UkSpelling ? uk : us;

    /// <summary>The system and the place; <see cref="Other"/> would print itself without end.</summary>
    public override string ToString() => $"{Units}, {Zone.Id}";

    private bool IsInch => Units == UnitSystem.Inch;

    /// <summary>A unit: its size in SI, the sign it is shown with, and whether "15,000" of it is thousands.</summary>
    private sealed record Unit(double Si, bool Thousands = false);

    /// <summary>The units of one quantity, what to write, and the unit of a bare number.</summary>
    private sealed record Family(string Of, string Units, string ExamplesMetric, string ExamplesInch, string BareMetric, string BareInch, Dictionary<string, Unit> Names);

    private string Examples(Family family) => IsInch ? family.ExamplesInch : family.ExamplesMetric;

    private Unit BareUnit(Family family, TypedField field) => family.Names[field.Bare ?? (IsInch ? family.BareInch : family.BareMetric)];

    /// <summary>One number with a unit, in SI.</summary>
    private Parsed<double> ReadOne(string? text, TypedField field, Family family, Func<double, string> show)
    {
        var typed = (text ?? "").Trim();
        var clean = Amount.Clean(text);
        if (Blank<double>(typed, clean, field, Examples(family)) is { } blank)
            return blank;
        if (Amount.IsNotFinite(clean))
            return OutOfRange<double>(typed, field, show);

        bool Thousands(string unit) => Find(family, field, unit) is { } u && u.Thousands;
        if (!Amount.TryRead(clean, Thousands, out var amount, out var unitText))
            return NotA<double>(typed, field, Examples(family));
        if (Find(family, field, unitText) is not { } found)
        {
            return char.IsLetter(unitText[0]) || unitText[0] is '°' or '%'
                ? Parsed<double>.Refused(typed, $"In {Quote(typed)}, {Quote(unitText)} is not a unit of {family.Of}. Write {family.Units}.")
                : NotA<double>(typed, field, Examples(family));
        }

        return InRange(amount.Value * found.Si, typed, field, show);
    }

    private Unit? Find(Family family, TypedField field, string unitText)
        => unitText.Length == 0 ? BareUnit(family, field) : family.Names.GetValueOrDefault(UnitKey(unitText));

    private static string UnitKey(string unit) => unit
        .Replace(" per ", "/", StringComparison.Ordinal)
        .Replace("^", "", StringComparison.Ordinal)
        .Replace(" ", "", StringComparison.Ordinal)
        .TrimEnd('.');

    private static Parsed<double> InRange(double si, string typed, TypedField field, Func<double, string> show)
    {
        // A hair of tolerance, or an end of the range typed in another unit would fail its own limit.
        var slack = 1e-9 * Math.Abs(field.Most);
        return double.IsFinite(si) && si >= field.Least - (1e-9 * Math.Abs(field.Least)) && si <= field.Most + slack
            ? Parsed<double>.Good(si, typed, show(si))
            : OutOfRange<double>(typed, field, show);
    }

    private static Parsed<T>? Blank<T>(string typed, string clean, TypedField field, string examples)
    {
        if (clean.Length == 0)
            return Parsed<T>.Refused(typed, $"Nothing is typed. Write {field.Name} such as {examples}.");
        return typed.Length > LongestText ? NotA<T>(typed, field, examples) : null;
    }

    private static Parsed<T> NotA<T>(string typed, TypedField field, string examples)
        => Parsed<T>.Refused(typed, $"{Quote(typed)} is not {field.Name}. Write {examples}.");

    private static Parsed<T> OutOfRange<T>(string typed, TypedField field, Func<double, string> show)
        => Parsed<T>.Refused(typed, $"{Quote(typed)} cannot be right. {field.Capital} lies between {show(field.Least)} and {show(field.Most)}.");

    private static string Quote(string typed) => $"\"{(typed.Length > 40 ? typed[..40] + "…" : typed)}\"";

    /// <summary>A number with at most so many decimals and no zeros behind; a comma between thousands except in a form field.</summary>
    private string Num(double value, int decimals)
    {
        if (!double.IsFinite(value))
            return value.ToString(CultureInfo.InvariantCulture);
        var rounded = Math.Round(value, decimals, MidpointRounding.AwayFromZero);
        return (rounded == 0 ? 0 : rounded).ToString((ForFields ? "0." : "#,##0.") + new string('#', decimals), CultureInfo.InvariantCulture);
    }

    private string With(double value, int decimals, string unit) => Num(value, decimals) + Gap + unit;
}
