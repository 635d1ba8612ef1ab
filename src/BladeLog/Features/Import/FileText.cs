using System.Text;

namespace BladeLog.Features.Import;

/// <summary>The text of a file, or a sentence why it is none.</summary>
internal static class FileText
{
    public const int MostBytes = 10_000_000;
    public const string TooLarge = "The file is larger than 10 MB. Split it and import the parts one after the other.";

    private static readonly (byte[] Start, string What)[] Others =
    [
        ("PK"u8.ToArray(), "a workbook or an archive (.xlsx, .ods, .zip)"),
        ("%PDF"u8.ToArray(), "a PDF"),
        ([0xD0, 0xCF, 0x11, 0xE0], "an old workbook (.xls)"),
        ([0x89, 0x50, 0x4E, 0x47], "a picture"),
        ([0xFF, 0xD8, 0xFF], "a picture"),
        ("SQLite format 3"u8.ToArray(), "a database"),
        ([0x1F, 0x8B], "an archive"),
    ];

    public static (string? Text, string? Problem) Read(byte[] bytes)
    {
        if (bytes.Length > MostBytes)
        {
            return (null, TooLarge);
        }

        foreach (var (start, what) in Others)
        {
            if (bytes.AsSpan().StartsWith(start))
            {
                return (null, $"This is {what}, not a CSV file. Save the sheet as CSV and import that.");
            }
        }

        string text = Decode(bytes);
        if (text.Contains('\0', StringComparison.Ordinal))
        {
            return (null, "This is not a text file. Save the sheet as CSV and import that.");
        }

        string start1 = text.TrimStart();
        if (start1.Length == 0)
        {
            return (null, "The file is empty.");
        }

        return start1[0] is '<' or '{'
            ? (null, "This is a web page or a program's data, not a CSV file. Save the sheet as CSV and import that.")
            : (text, null);
    }

    /// <summary>By its byte order mark; else UTF-8 where it is that, else as older office programs of the West write it.</summary>
    private static string Decode(byte[] bytes)
    {
        foreach (Encoding marked in new Encoding[] { new UTF8Encoding(true), Encoding.Unicode, Encoding.BigEndianUnicode })
        {
            if (bytes.AsSpan().StartsWith(marked.Preamble))
            {
                return marked.GetString(bytes.AsSpan(marked.Preamble.Length));
            }
        }

        try
        {
            return new UTF8Encoding(false, throwOnInvalidBytes: true).GetString(bytes);
        }
        catch (DecoderFallbackException)
        {
            return Encoding.Latin1.GetString(bytes);
        }
    }
}
