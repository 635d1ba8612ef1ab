using System.Text.RegularExpressions;
using BladeLog.Ui;

namespace BladeLog.Features.Import;

/// <summary>One row asked by column: what was understood, and what is wrong, are kept as they come.</summary>
internal sealed partial class RowReader(CsvRow row, IReadOnlyList<Found> found, ShopUnits units, DateTime now, List<Wrong> wrongs)
{
    private readonly int _before = wrongs.Count;

    public int Line => row.Line;

    public ShopUnits Units => units;

    public bool Stands => wrongs.Count == _before;

    /// <summary>By column key, as it is shown back.</summary>
    public Dictionary<string, string> Understood { get; } = [];

    public string? Text(string key) => Cell(key) is { } cell ? Note(key, cell.Text, cell.Text) : null;

    public double? Length(string key, TypedField field) => Quantity(key, t => units.ReadLength(t, field))?.Metres;

    public double? Stress(string key) => Quantity(key, t => units.ReadStress(t))?.Pascals;

    public double? Force(string key) => Quantity(key, t => units.ReadForce(t))?.Newtons;

    public double? Power(string key) => Quantity(key, t => units.ReadPower(t))?.Watts;

    public double? Feed(string key) => Quantity(key, t => units.ReadFeed(t))?.MetresPerSecond;

    public double? Speed(string key, string text) => Part(key, text, t => units.ReadBandSpeed(t))?.MetresPerSecond;

    public double? Angle(string key, TypedField field) => Quantity(key, t => units.ReadAngle(t, field))?.Radians;

    public ToothPitch? Pitch(string key) => Quantity(key, units.ReadPitch);

    public BladePrint? Print(string key)
    {
        if (Cell(key) is not { } cell)
        {
            return null;
        }

        Parsed<BladePrint> read = units.ReadBladePrint(cell.Text);
        if (!read.IsGood)
        {
            Refuse(key, read.Problem!);
            return null;
        }

        return Note(key, read.Value, read.Understood ?? cell.Text);
    }

    public double? Wheel(string key, string text) => Part(key, text, t => units.ReadLength(t, Fields.WheelDiameter))?.Metres;

    public double? Moisture(string key) => Quantity(key, units.ReadMoisture);

    public double? Hours(string key) => Quantity(key, t => units.ReadDuration(t, Fields.RunHours))?.TotalHours;

    public double? Minutes(string key) => Quantity(key, t => units.ReadDuration(t, Fields.Minutes))?.TotalMinutes;

    public int? Count(string key, TypedField field) => (int?)Quantity(key, t => units.ReadCount(t, field));

    public DateOnly? Date(string key) => Quantity(key, t => units.ReadDate(t, now));

    /// <summary>In minor units; a heading in minor units takes whole numbers of them.</summary>
    public long? Money(string key)
    {
        if (Cell(key) is not { } cell)
        {
            return null;
        }

        if (cell.Unit != "minor")
        {
            return Take(key, units.ReadMoney(cell.Text));
        }

        Parsed<long> minor = units.ReadCount(cell.Text);
        return minor.IsGood ? Note(key, minor.Value, units.ShowMoney(minor.Value)) : Take(key, minor);
    }

    /// <summary>A chance: a percentage where heading or cell says so or it is above 1, else a share.</summary>
    public double? Share(string key)
    {
        if (Cell(key) is not { } cell || Quantity(key, t => units.ReadPercent(t)) is not { } typed)
        {
            return null;
        }

        bool percent = cell.Unit == "%" || cell.Text.Contains('%', StringComparison.Ordinal) || typed > 1;
        double share = percent ? typed / 100 : typed;
        return Note(key, share, Figures.Chance(share));
    }

    public bool? Yes(string key)
    {
        if (Cell(key) is not { } cell)
        {
            return null;
        }

        switch (cell.Text.ToLowerInvariant())
        {
            case "yes" or "y" or "true" or "1" or "x" or "ja" or "oui":
                return Note(key, true, "yes");
            case "no" or "n" or "false" or "0" or "-" or "nein" or "non":
                return Note(key, false, "no");
            default:
                Refuse(key, $"\"{cell.Text}\" is neither yes nor no.");
                return null;
        }
    }

    /// <summary>One word out of a list of words for each answer.</summary>
    public T? OneOf<T>(string key, params (T Value, string[] Words)[] answers)
        where T : struct
    {
        if (Cell(key) is not { } cell)
        {
            return null;
        }

        string word = Letters(cell.Text);
        foreach ((T value, string[] words) in answers)
        {
            if (words.Any(w => Letters(w) == word))
            {
                return Note(key, value, words[0]);
            }
        }

        Refuse(key, $"\"{cell.Text}\" is not one of these: {string.Join(", ", answers.Select(a => a.Words[0]))}.");
        return null;
    }

    /// <summary>A cell that may hold several: "900|900", "15.2 / 7.6".</summary>
    public string[] Several(string key) => Cell(key) is { } cell
        ? [.. cell.Text.Split(['|', ';', '/', '+', '&'], StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries)]
        : [];

    public void Need(string key, string sentence)
    {
        if (Cell(key) is null)
        {
            wrongs.Add(new Wrong(row.Line, Heading(key), null, sentence));
        }
    }

    public void Refuse(string key, string sentence) => wrongs.Add(new Wrong(row.Line, Heading(key), Cell(key)?.Text, sentence));

    public void Say(string key, string understood) => Understood[key] = understood;

    private string? Heading(string key) => found.FirstOrDefault(f => f.Column.Key == key)?.Heading;

    private (string Text, string? Unit)? Cell(string key)
    {
        Found? f = found.FirstOrDefault(f => f.Column.Key == key);
        return f is not null && f.Index < row.Cells.Length && row.Cells[f.Index] is { Length: > 0 } text ? (text, f.Unit) : null;
    }

    private T? Quantity<T>(string key, Func<string, Parsed<T>> read)
        where T : struct => Cell(key) is { } cell ? Take(key, read(WithUnit(cell.Text, cell.Unit))) : null;

    private T? Part<T>(string key, string text, Func<string, Parsed<T>> read)
        where T : struct
    {
        Parsed<T> parsed = read(WithUnit(text, Cell(key)?.Unit));
        if (parsed.IsGood)
        {
            Understood[key] = Understood.TryGetValue(key, out string? before) ? $"{before}, {parsed.Understood}" : parsed.Understood ?? text;
            return parsed.Value;
        }

        Refuse(key, parsed.Problem!);
        return null;
    }

    private T? Take<T>(string key, Parsed<T> read)
        where T : struct
    {
        if (read.IsGood)
        {
            return Note(key, read.Value, read.Understood ?? read.Text);
        }

        Refuse(key, read.Problem!);
        return null;
    }

    private T Note<T>(string key, T value, string understood)
    {
        Understood[key] = understood;
        return value;
    }

    /// <summary>The heading's unit goes with a bare number; a cell that names its own keeps it.</summary>
    private static string WithUnit(string text, string? unit) => unit is null or "minor" || !Bare().IsMatch(text) ? text : $"{text} {unit}";

    private static string Letters(string text) => new([.. text.ToLowerInvariant().Where(char.IsLetterOrDigit)]);

    [GeneratedRegex(@"^[\d\s.,/+\-½¼¾⅛⅜⅝⅞]+$", RegexOptions.CultureInvariant)]
    private static partial Regex Bare();
}
