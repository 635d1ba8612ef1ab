using System.Text.RegularExpressions;

namespace BladeLog.Tests.House;

/// <summary>The house rules that can be seen in the text.</summary>
public sealed partial class HouseRuleTests
{
    [Fact]
    public void Nothing_reads_the_wall_clock_but_the_injected_one()
    {
        var bad = Lines("src", ".cs", ".razor").Where(l => WallClock().IsMatch(l.Text));
        Assert.Empty(bad);
    }

    [Fact]
    public void No_style_attribute_and_no_inline_script_stand_in_a_component()
    {
        var bad = Lines("src", ".razor", ".cs").Where(l => StyleOrScript().IsMatch(l.Text));
        Assert.Empty(bad);
    }

    [Fact]
    public void Every_form_that_posts_says_where_and_carries_a_token()
    {
        var bad = new List<string>();
        foreach (var file in Tree.Files("src/BladeLog", ".razor"))
        {
            var text = File.ReadAllText(file);
            foreach (Match form in PostForm().Matches(text))
            {
                if (!form.Value.Contains("action=", StringComparison.Ordinal) || !form.Value.Contains("<AntiforgeryToken", StringComparison.Ordinal))
                {
                    bad.Add($"{Tree.Relative(file)}: {form.Value[..Math.Min(80, form.Value.Length)]}");
                }
            }
        }

        Assert.Empty(bad);
    }

    [Fact]
    public void No_SQL_is_built_from_text()
    {
        var bad = Lines("src", ".cs").Where(l => !l.File.Contains("Migrations") && BuiltSql().IsMatch(l.Text));
        Assert.Empty(bad);
    }

    [Fact]
    public void A_file_fits_on_two_or_three_screens()
    {
        var bad = Tree.Files("src", ".cs", ".razor").Concat(Tree.Files("tests", ".cs"))
            .Where(f => !f.Contains("Migrations"))
            .Select(f => (File: Tree.Relative(f), Lines: File.ReadLines(f).Count()))
            .Where(f => f.Lines > 300);
        Assert.Empty(bad);
    }

    [Fact]
    public void The_top_of_the_tree_is_as_decided()
    {
        string[] decided = ["BladeLog.sln", "DEVELOPERS.md", "README.md", "docs", "sample-db", "src", "tests", "wwwroot"];
        var seen = Directory.GetFileSystemEntries(Tree.Root).Select(e => Path.GetFileName(e)!)
            .Where(n => !n.StartsWith('.') && n != "artifacts").Order(StringComparer.Ordinal);
        Assert.Equal(decided.Order(StringComparer.Ordinal), seen);
    }

    [Fact]
    public void Attributes_of_the_front_end_library_are_those_of_the_version_shipped()
    {
        // The shipped version inherits only attributes marked so, and renamed a few: older spellings would silently do nothing.
        var bad = Lines("src", ".razor").Where(l => OldAttributes().IsMatch(l.Text));
        Assert.Empty(bad);
    }

    private static IEnumerable<(string File, string Text)> Lines(string under, params string[] endings) =>
        Tree.Files(under, endings).SelectMany(f => File.ReadLines(f).Select(l => (Tree.Relative(f), l.Trim())))
            .Where(l => !l.Item2.StartsWith("//", StringComparison.Ordinal));

    [GeneratedRegex(@"Date(Time|TimeOffset)\.(Now|UtcNow|Today)|Stopwatch\.GetTimestamp")]
    private static partial Regex WallClock();

    [GeneratedRegex(@"\sstyle=""|<script(?![^>]*\ssrc=)|\son(click|change|load|submit|input)=", RegexOptions.IgnoreCase)]
    private static partial Regex StyleOrScript();

    [GeneratedRegex(@"<form\b[^>]*method=""post"".*?</form>", RegexOptions.Singleline | RegexOptions.IgnoreCase)]
    private static partial Regex PostForm();

    [GeneratedRegex(@"(FromSqlRaw|ExecuteSqlRaw|SqlQueryRaw)(Async)?\(\s*\$""")]
    private static partial Regex BuiltSql();

    [GeneratedRegex(@"hx-ext=|hx-disabled-elt|htmx:afterSwap|hx-vars|hx-params|hx-on:")]
    private static partial Regex OldAttributes();
}
