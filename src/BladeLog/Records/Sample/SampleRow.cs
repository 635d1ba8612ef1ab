using System.Globalization;

namespace BladeLog.Records.Sample;

/// <summary>One row of a sample file. Every reading that fails says where and why.</summary>
internal sealed class SampleRow(string file, long line, Dictionary<string, int> columns, string[] cells)
{
    public string? Optional(string column)
    {
        if (!columns.TryGetValue(column, out var i))
        {
            throw new SampleFileException($"{file}.csv has no column {column}.");
        }

        return cells[i].Length == 0 ? null : cells[i];
    }

    public string Text(string column) => Optional(column) ?? throw Wrong(column, "something must stand here");

    public double? OptionalNumber(string column) => Optional(column) is null ? null : Number(column);

    public double Number(string column) => Number(column, Text(column));

    /// <summary>A column in millimetres, in metres.</summary>
    public double Metres(string column) => Number(column) / 1000;

    public double? OptionalMetres(string column) => OptionalNumber(column) / 1000;

    public IReadOnlyList<double> Numbers(string column) => [.. Text(column).Split('|').Select(part => Number(column, part))];

    public int? OptionalWhole(string column) => Optional(column) is null ? null : Whole(column);

    public int Whole(string column) =>
        int.TryParse(Text(column), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out var whole)
            ? whole
            : throw Wrong(column, $"'{Text(column)}' is not a whole number");

    public long? OptionalMoney(string column) => Optional(column) is null ? null : Whole(column);

    public bool Yes(string column) => Text(column) switch
    {
        "yes" => true,
        "no" => false,
        var other => throw Wrong(column, $"'{other}' must be yes or no"),
    };

    /// <summary>A word such as back_edge for one of the named cases.</summary>
    public T Case<T>(string column)
        where T : struct, Enum => Case<T>(column, Text(column));

    public T? OptionalCase<T>(string column)
        where T : struct, Enum => Optional(column) is { } word ? Case<T>(column, word) : null;

    /// <summary>Several words parted by upright strokes, for cases that can hold together.</summary>
    public T Cases<T>(string column)
        where T : struct, Enum => Case<T>(column, Text(column).Replace('|', ','));

    /// <summary>What a name in this column stands for.</summary>
    public T Of<T>(string column, IReadOnlyDictionary<string, T> known, string what) =>
        known.TryGetValue(Text(column), out var found) ? found : throw Wrong(column, $"there is no {what} {Text(column)}");

    public SampleFileException Wrong(string column, string why) => new($"{file}.csv, line {line}, column {column}: {why}.");

    private double Number(string column, string text) =>
        double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var number) && double.IsFinite(number)
            ? number
            : throw Wrong(column, $"'{text}' is not a number");

    private T Case<T>(string column, string words)
        where T : struct, Enum
    {
        var spelt = words.Replace("_", "", StringComparison.Ordinal);
        return !char.IsAsciiDigit(spelt[0]) && Enum.TryParse<T>(spelt, ignoreCase: true, out var found)
            ? found
            : throw Wrong(column, $"'{words}' is not one of {string.Join(", ", Enum.GetNames<T>())}");
    }
}
