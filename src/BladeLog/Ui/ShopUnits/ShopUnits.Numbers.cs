using System.Globalization;

namespace BladeLog.Ui;

/// <content>Numbers without a dimension: percentages, moisture, wheel revolutions, whole counts.</content>
public sealed partial record ShopUnits
{
    private static readonly Family PercentFamily = new("percentage", "%", "12 or 12 %", "12 or 12 %", "%", "%", new()
    {
        ["%"] = new(1),
        ["percent"] = new(1),
        ["pct"] = new(1),
        ["%mc"] = new(1),
        ["mc"] = new(1),
    });

    private static readonly Family RevolutionsFamily = new("wheel speed", "rpm", "1000 or 1000 rpm", "1000 or 1000 rpm", "rpm", "rpm", new()
    {
        ["rpm"] = new(1, Thousands: true),
        ["r/min"] = new(1, Thousands: true),
        ["1/min"] = new(1, Thousands: true),
        ["min-1"] = new(1, Thousands: true),
    });

    /// <summary>Reads a percentage, in percent: "12 %" gives 12.</summary>
    public Parsed<double> ReadPercent(string? text, TypedField? field = null) => ReadOne(text, field ?? Fields.Percent, PercentFamily, ShowPercent);

    /// <summary>Reads a moisture content in percent of the dry weight.</summary>
    public Parsed<double> ReadMoisture(string? text) => ReadPercent(text, Fields.Moisture);

    /// <summary>Reads a wheel speed in revolutions a minute.</summary>
    public Parsed<double> ReadRevolutions(string? text) => ReadOne(text, Fields.Revolutions, RevolutionsFamily, ShowRevolutions);

    /// <summary>Reads a whole number; "1,200" and "1 200" are twelve hundred, "3 pcs" is three.</summary>
    public Parsed<long> ReadCount(string? text, TypedField? field = null)
    {
        field ??= Fields.Count;
        const string Examples = "12 or 1200";
        var typed = (text ?? "").Trim();
        var clean = Amount.Clean(text);
        if (Blank<long>(typed, clean, field, Examples) is { } blank)
            return blank;
        if (Amount.IsNotFinite(clean))
            return OutOfRange<long>(typed, field, ShowNumber);
        if (!Amount.TryRead(clean, _ => true, out var amount, out var rest) || rest is not ("" or "pcs" or "pc" or "pieces" or "piece" or "off"))
            return NotA<long>(typed, field, Examples);
        if (double.IsFinite(amount.Value) && amount.Value != Math.Floor(amount.Value))
            return Parsed<long>.Refused(typed, $"{Quote(typed)} is not a whole number. Write {Examples}.");
        return InRange(amount.Value, typed, field, ShowNumber).As(n => (long)n, Show);
    }

    /// <summary>12 %.</summary>
    public string ShowPercent(double percent) => With(percent, 1, "%");

    /// <summary>1000 rpm.</summary>
    public string ShowRevolutions(double perMinute) => With(perMinute, 1, "rpm");

    /// <summary>A whole number.</summary>
    public string Show(long count) => count.ToString(ForFields ? "0" : "#,##0", CultureInfo.InvariantCulture);

    private string ShowNumber(double n) => Num(n, 0);
}
