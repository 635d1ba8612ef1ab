namespace BladeLog.Ui.Forms;

/// <summary>Ids of fields and of the words that belong to them, the same for fields and for links from the summary.</summary>
internal static class FieldId
{
    public static string Of(string name) => "f-" + name.Replace('.', '-').Replace('[', '-').Replace("]", "", StringComparison.Ordinal);

    public static string? DescribedBy(string id, bool hint, bool unit, bool error)
    {
        var parts = new[] { hint ? id + "-hint" : null, unit ? id + "-unit" : null, error ? id + "-err" : null };
        var all = string.Join(' ', parts.Where(p => p is not null));
        return all.Length == 0 ? null : all;
    }
}
