using BladeLog.Handbook.Units;

namespace BladeLog.Ui;

/// <content>What stands beside a field: its unit, the step of its keys, and a known figure as it would be typed there.</content>
public sealed partial record ShopUnits
{
    /// <summary>mm, or in: of a bare number in a field for a length.</summary>
    public string SmallLengthUnit => IsInch ? "in" : "mm";

    /// <summary>MPa, or psi.</summary>
    public string StressUnit => IsInch ? "psi" : "MPa";

    /// <summary>N, or lbf.</summary>
    public string ForceUnit => IsInch ? "lbf" : "N";

    /// <summary>m/min, or ft/min.</summary>
    public string FeedUnit => IsInch ? "ft/min" : "m/min";

    /// <summary>Figures alone for lengths in mm; in inches the trade writes fractions and feet, which such keys have not.</summary>
    public string LengthKeys => IsInch ? "text" : "decimal";

    /// <summary>One step of the keys beside a field, in the unit shown there.</summary>
    public decimal Step(TypedField field)
    {
        ArgumentNullException.ThrowIfNull(field);
        return IsInch ? field.InchStep ?? field.Step : field.Step;
    }

    /// <summary>38.1, or 1 1/2: read back in the same field it is the same length.</summary>
    public string? BareLength(double? metres, TypedField field)
    {
        ArgumentNullException.ThrowIfNull(field);
        if (metres is not { } m)
            return null;
        if (field.Bare == "um")
            return Figures.Plain(m / Micrometre, 2);
        if (!IsInch)
            return Figures.Plain(m / Millimetre, Math.Abs(m) < 0.01 ? 3 : 2);
        var inches = m / Exact.Inch;
        return !field.Thousandths && Fraction(inches, FractionExact) is { } fraction
            ? fraction
            : Figures.Plain(inches, Math.Abs(inches) < 1 ? 4 : 3);
    }

    /// <summary>120, or 17405.</summary>
    public string? BareStress(double? pascals) => pascals is { } p
        ? IsInch ? Figures.Plain(p / Exact.Psi, 0) : Figures.Plain(p / Megapascal, 1)
        : null;

    /// <summary>1390, or 312.5.</summary>
    public string? BareForce(double? newtons) => newtons is { } n
        ? IsInch ? Figures.Plain(n / Exact.PoundForce, 1) : Figures.Plain(n, n < 100 ? 1 : 0)
        : null;

    /// <summary>2.5, or 8.2.</summary>
    public string? BareFeed(double? metresPerSecond) => metresPerSecond is { } v
        ? IsInch ? Figures.Plain(v / FootAMinute, v < FootAMinute ? 3 : 1) : Figures.Plain(v / PerMinute, v < PerMinute ? 3 : 2)
        : null;

    /// <summary>10.5, in degrees.</summary>
    public string? BareAngle(double? radians) => radians is { } r ? Figures.Plain(r * 180 / Math.PI, 2) : null;

    /// <summary>46.00 without the currency.</summary>
    public string? BareMoney(long? minor) => minor is { } m ? Typing.ShowMajor(m) : null;
}
