using System.Text.RegularExpressions;

namespace BladeLog.Tests.House;

/// <summary>The arrows of DEVELOPERS.md, held by reading the source.</summary>
public sealed partial class ArrowTests
{
    [Fact]
    public void The_handbook_references_only_the_runtime_and_MathNet()
    {
        var foreign = typeof(Handbook.Quantities.Length).Assembly.GetReferencedAssemblies()
            .Select(a => a.Name!)
            .Where(n => !n.StartsWith("System", StringComparison.Ordinal) && n != "netstandard" && n != "MathNet.Numerics");
        Assert.Empty(foreign);
    }

    [Theory]
    [InlineData("Advice", "Microsoft.AspNetCore|Microsoft.EntityFrameworkCore|BladeLog.Features|BladeLog.Ui|ShopDb|HttpContext|IResult|RazorComponentResult")]
    [InlineData("Records", "Microsoft.AspNetCore|BladeLog.Features|BladeLog.Ui|BladeLog.Advice|HttpContext|IResult|RazorComponentResult")]
    [InlineData("Ui", "Microsoft.EntityFrameworkCore|BladeLog.Features|BladeLog.Advice|ShopDb")]
    public void A_folder_does_not_know_what_stands_above_it(string folder, string forbidden)
    {
        var bad = Tree.Files($"src/BladeLog/{folder}", ".cs", ".razor")
            .Where(f => !f.Contains("Migrations"))
            .SelectMany(f => File.ReadLines(f)
                .Where(l => !l.TrimStart().StartsWith("//", StringComparison.Ordinal))
                .Where(l => Regex.IsMatch(l, $@"\b({forbidden.Replace(".", "\\.")})\b"))
                .Select(l => $"{Tree.Relative(f)}: {l.Trim()}"));
        Assert.Empty(bad);
    }

    [Fact]
    public void Records_knows_of_the_handbook_only_its_quantities_and_units()
    {
        var bad = Tree.Files("src/BladeLog/Records", ".cs")
            .SelectMany(f => File.ReadLines(f)
                .Where(l => HandbookUse().IsMatch(l))
                .Select(l => $"{Tree.Relative(f)}: {l.Trim()}"));
        Assert.Empty(bad);
    }

    [Fact]
    public void Features_meet_by_address_not_by_name()
    {
        var root = Path.Combine(Tree.Root, "src/BladeLog/Features");
        if (!Directory.Exists(root))
        {
            Assert.Fail("There are no features.");
        }

        var folders = Directory.GetDirectories(root).Select(d => Path.GetFileName(d)!).ToArray();
        var bad = from folder in folders
                  from file in Tree.Files($"src/BladeLog/Features/{folder}", ".cs", ".razor")
                  from line in File.ReadLines(file)
                  from other in folders
                  where other != folder && Regex.IsMatch(line, $@"\bBladeLog\.Features\.{other}\b")
                  select $"{Tree.Relative(file)}: {line.Trim()}";
        Assert.Empty(bad);
    }

    [GeneratedRegex(@"BladeLog\.Handbook\.(?!Quantities|Units)")]
    private static partial Regex HandbookUse();
}
