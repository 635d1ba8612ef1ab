using CsvHelper;

namespace BladeLog.Features.Import;

/// <summary>One line of a file that cannot be taken.</summary>
/// <param name="Line">As an editor counts lines.</param>
/// <param name="Column">Its heading; null where the whole line is meant.</param>
/// <param name="Value">What stands there.</param>
/// <param name="Sentence">What is wrong and what would be right.</param>
public sealed record Wrong(int Line, string? Column, string? Value, string Sentence);

internal sealed record CsvRow(int Line, string[] Cells);

/// <summary>Headings and rows of a file.</summary>
internal sealed record CsvTable(string[] Headings, IReadOnlyList<CsvRow> Rows, IReadOnlyList<Wrong> Wrongs)
{
    public const int MostRows = 50_000;

    private const int LongestRecord = 64 * 1024;
    private const int MostColumns = 200;

    public static CsvTable Read(string text)
    {
        (char separator, string body, int skipped) = Separated(text);
        CsvReaderOptions options = new()
        {
            HasHeader = false,
            TrackLineNumbers = true,
            Separator = separator,
            MaxRecordSize = LongestRecord,
            TrimWhitespace = true,
        };
        List<CsvRow> rows = [];
        int line = 1;
        try
        {
            using CsvReader reader = CsvReader.FromText(body, options);
            while (reader.Read())
            {
                line = (int)reader.LineNumber + skipped;
                if (reader.FieldCount > MostColumns)
                {
                    return Broken(line, $"There are more than {MostColumns} columns.");
                }

                string[] cells = new string[reader.FieldCount];
                for (int i = 0; i < cells.Length; i++)
                {
                    cells[i] = reader.GetString(i).Trim();
                }

                if (cells.All(c => c.Length == 0))
                {
                    continue;
                }

                if (rows.Count > MostRows)
                {
                    return Broken(line, "There are more than 50,000 rows. Split the file and import the parts one after the other.");
                }

                rows.Add(new CsvRow(line, cells));
            }
        }
        catch (CsvFormatException e)
        {
            return Broken(e.LineNumber > 0 ? (int)e.LineNumber + skipped : line, "This line cannot be read: a quotation mark is missing or stands in the middle of a cell, or the line is longer than 64 kB.");
        }

        return rows.Count == 0 ? Broken(1, "The file is empty.") : new CsvTable(rows[0].Cells, rows[1..], []);
    }

    private static CsvTable Broken(int line, string sentence) => new([], [], [new Wrong(line, null, null, sentence)]);

    /// <summary>The mark that parts the headings: of comma, semicolon and tab the one that is there most often, or the one the file names itself.</summary>
    private static (char Separator, string Body, int SkippedLines) Separated(string text)
    {
        int end = text.IndexOfAny(['\r', '\n']);
        string first = end < 0 ? text : text[..end];
        if (first.StartsWith("sep=", StringComparison.OrdinalIgnoreCase) && first.Length == 5 && first[4] is ',' or ';' or '\t')
        {
            int next = end < 0 ? text.Length : end + (text[end] == '\r' && end + 1 < text.Length && text[end + 1] == '\n' ? 2 : 1);
            return (first[4], text[next..], 1);
        }

        string heading = text.TrimStart('\r', '\n');
        end = heading.IndexOfAny(['\r', '\n']);
        heading = end < 0 ? heading : heading[..end];
        char best = ',';
        int most = 0;
        foreach (char mark in ";\t,")
        {
            int count = Outside(heading, mark);
            if (count > most)
            {
                (best, most) = (mark, count);
            }
        }

        return (best, text, 0);
    }

    private static int Outside(string heading, char mark)
    {
        bool quoted = false;
        int count = 0;
        foreach (char c in heading)
        {
            quoted ^= c == '"';
            count += !quoted && c == mark ? 1 : 0;
        }

        return count;
    }
}
