namespace BladeLog.Records;

/// <summary>What may be painted on a blade: 1 to 12 of A to Z, 0 to 9, hyphen and full stop, and not a word of the program's own addresses.</summary>
public static class Tags
{
    private static readonly HashSet<string> Reserved = new(StringComparer.OrdinalIgnoreCase)
    {
        ".", "..", "new", "add", "edit", "all", "none", "saw", "saws", "blade", "blades", "floor", "rack", "cuts", "bench",
        "breaks", "stock", "record", "setup", "workings", "cautions", "scan", "label", "labels", "print", "import", "export",
    };

    /// <summary>What a scan or a typed field means as a tag: what follows the last slash, without spaces, in capitals.</summary>
    public static string Read(string text)
    {
        var trimmed = text.Trim().TrimEnd('/');
        return trimmed[(trimmed.LastIndexOf('/') + 1)..].Trim().ToUpperInvariant();
    }

    /// <summary>Why a tag cannot be used, in words; null: it can.</summary>
    public static string? Refusal(string tag)
    {
        if (tag.Length is < 1 or > 12)
        {
            return "A tag is 1 to 12 letters long.";
        }

        if (!tag.All(c => char.IsAsciiLetterOrDigit(c) || c is '-' or '.'))
        {
            return "A tag is made of A to Z, 0 to 9, hyphen and full stop.";
        }

        return Reserved.Contains(tag) ? $"\"{tag}\" is a word of the program itself: choose another tag." : null;
    }
}
