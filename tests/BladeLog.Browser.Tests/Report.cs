using System.Text;

namespace BladeLog.Browser.Tests;

/// <summary>All findings of a walk in one message; the same finding on pages of one kind stands once.</summary>
internal sealed class Report
{
    private readonly Dictionary<(string Kind, string Finding), List<string>> _found = [];

    public void Add(string kind, string path, IEnumerable<string> findings)
    {
        foreach (var finding in findings)
        {
            if (!_found.TryGetValue((kind, finding), out var paths))
            {
                _found[(kind, finding)] = paths = [];
            }

            paths.Add(path);
        }
    }

    public void MustBeEmpty()
    {
        var text = new StringBuilder().AppendLine();
        foreach (var page in _found.GroupBy(f => f.Key.Kind))
        {
            text.AppendLine(page.Key);
            foreach (var (key, paths) in page)
            {
                text.Append("  ").Append(key.Finding).Append("  [").AppendJoin(", ", paths).AppendLine("]");
            }
        }

        Assert.True(_found.Count == 0, text.ToString());
    }
}
