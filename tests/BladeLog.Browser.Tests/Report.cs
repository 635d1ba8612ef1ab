using System.Text;

namespace BladeLog.Browser.Tests;

/// <summary>All findings of a walk in one message; what is found on many pages stands once, with where.</summary>
internal sealed class Report
{
    private const int Named = 6;

    private readonly SortedDictionary<string, List<string>> _found = new(StringComparer.Ordinal);

    public void Add(string path, IEnumerable<string> findings)
    {
        foreach (var finding in findings)
        {
            if (!_found.TryGetValue(finding, out var paths))
            {
                _found[finding] = paths = [];
            }

            paths.Add(path);
        }
    }

    public void MustBeEmpty()
    {
        var text = new StringBuilder();
        foreach (var (finding, paths) in _found)
        {
            text.AppendLine().Append(finding).Append("  [").AppendJoin(", ", paths.Take(Named));
            text.Append(paths.Count > Named ? $" and {paths.Count - Named} more]" : "]");
        }

        Assert.True(_found.Count == 0, text.ToString());
    }
}
