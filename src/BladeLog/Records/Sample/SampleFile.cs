using CsvHelper;

namespace BladeLog.Records.Sample;

/// <summary>A sample file that cannot be read as it stands: names the file, the line and the column.</summary>
public sealed class SampleFileException(string message) : Exception(message);

/// <summary>One CSV file of the sample: a heading line, then rows asked by the name of the column.</summary>
internal static class SampleFile
{
    public static IReadOnlyList<SampleRow> Read(string folder, string name)
    {
        var path = Path.Combine(folder, name + ".csv");
        if (!File.Exists(path))
        {
            throw new SampleFileException($"The sample shop needs the file {name}.csv in {folder}.");
        }

        using var reader = CsvReader.FromFile(path, new CsvReaderOptions { HasHeader = false, TrackLineNumbers = true });
        try
        {
            return Rows(reader, name);
        }
        catch (CsvFormatException e)
        {
            throw new SampleFileException($"{name}.csv cannot be read: {e.Message}");
        }
    }

    private static List<SampleRow> Rows(CsvReader reader, string name)
    {
        if (!reader.Read())
        {
            throw new SampleFileException($"{name}.csv is empty: its first line must name the columns.");
        }

        var columns = Columns(name, Cells(reader));
        var rows = new List<SampleRow>();
        while (reader.Read())
        {
            var cells = Cells(reader);
            if (cells.Length != columns.Count)
            {
                throw new SampleFileException($"{name}.csv, line {reader.LineNumber}: {cells.Length} cells under {columns.Count} columns.");
            }

            rows.Add(new SampleRow(name, reader.LineNumber, columns, cells));
        }

        return rows;
    }

    private static string[] Cells(CsvReader reader) => [.. Enumerable.Range(0, reader.FieldCount).Select(reader.GetString)];

    private static Dictionary<string, int> Columns(string name, string[] headings)
    {
        var columns = new Dictionary<string, int>(StringComparer.Ordinal);
        for (var i = 0; i < headings.Length; i++)
        {
            if (!columns.TryAdd(headings[i], i))
            {
                throw new SampleFileException($"{name}.csv, line 1: two columns are named {headings[i]}.");
            }
        }

        return columns;
    }
}
