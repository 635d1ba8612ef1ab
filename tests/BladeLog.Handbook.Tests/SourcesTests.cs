using System.Reflection;
using System.Text.RegularExpressions;
using System.Xml.Linq;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tests;

public partial class SourcesTests
{
    private static readonly string[] Exempt = ["BladeLog.Handbook.Quantities", "BladeLog.Handbook.Units", "BladeLog.Handbook.Tables"];

    private static readonly Assembly Handbook = typeof(Length).Assembly;

    private static readonly XElement[] Members =
        [.. XDocument.Load(Path.Combine(AppContext.BaseDirectory, "BladeLog.Handbook.xml")).Descendants("member")];

    [Fact]
    public void Every_formula_names_its_source()
    {
        var formulas = Handbook.GetExportedTypes()
            .Where(t => t.IsAbstract && t.IsSealed && !Exempt.Any(e => t.Namespace == e || t.Namespace!.StartsWith(e + ".", StringComparison.Ordinal)))
            .SelectMany(t => t.GetMethods(BindingFlags.Public | BindingFlags.Static | BindingFlags.DeclaredOnly))
            .Where(m => !m.IsSpecialName)
            .GroupBy(m => $"M:{m.DeclaringType!.FullName!.Replace('+', '.')}.{m.Name}")
            .ToList();

        Assert.NotEmpty(formulas);
        List<string> missing = [.. formulas.Where(g => SourcedMembers(g.Key) != g.Count()).Select(g => g.Key)];
        Assert.True(missing.Count == 0, "No <source key where> on: " + string.Join(", ", missing));
    }

    [Fact]
    public void Every_source_is_a_row_of_the_list()
    {
        HashSet<string> keys = [.. Row().Matches(File.ReadAllText(SourceList())).Select(m => m.Groups[1].Value)];
        Assert.Contains("derived", keys);
        List<string> unknown =
        [
            .. Members.Elements("source")
                .Select(s => (Key: (string?)s.Attribute("key") ?? "", Member: (string?)s.Parent!.Attribute("name")))
                .Where(s => !keys.Contains(s.Key))
                .Select(s => $"'{s.Key}' at {s.Member}"),
        ];
        Assert.True(unknown.Count == 0, "Not in docs/sources.md: " + string.Join(", ", unknown));
    }

    private static int SourcedMembers(string id) => Members.Count(m =>
    {
        string name = (string?)m.Attribute("name") ?? "";
        bool same = name == id || name.StartsWith(id + "(", StringComparison.Ordinal) || name.StartsWith(id + "`", StringComparison.Ordinal);
        return same && m.Elements("source").Any() && m.Elements("source").All(s => Filled(s, "key") && Filled(s, "where"));
    });

    private static bool Filled(XElement source, string attribute) => !string.IsNullOrWhiteSpace((string?)source.Attribute(attribute));

    private static string SourceList()
    {
        DirectoryInfo? folder = new(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "BladeLog.sln")))
        {
            folder = folder.Parent;
        }

        Assert.True(folder is not null, "BladeLog.sln is not above the test's folder.");
        return Path.Combine(folder.FullName, "docs", "sources.md");
    }

    [GeneratedRegex(@"^\| ([a-z0-9][a-z0-9-]*) \|", RegexOptions.Multiline)]
    private static partial Regex Row();
}
