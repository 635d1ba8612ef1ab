using System.Runtime.CompilerServices;

namespace BladeLog.Tests.House;

/// <summary>The source tree, for the tests that read it.</summary>
internal static class Tree
{
    public static string Root { get; } = FindRoot();

    public static IEnumerable<string> Files(string under, params string[] endings) =>
        Directory.EnumerateFiles(Path.Combine(Root, under), "*", SearchOption.AllDirectories)
            .Where(f => !f.Contains($"{Path.DirectorySeparatorChar}obj{Path.DirectorySeparatorChar}"))
            .Where(f => endings.Any(e => f.EndsWith(e, StringComparison.Ordinal)));

    public static string Relative(string file) => Path.GetRelativePath(Root, file).Replace('\\', '/');

    private static string FindRoot([CallerFilePath] string here = "")
    {
        var dir = Path.GetDirectoryName(here);
        while (dir is not null && !File.Exists(Path.Combine(dir, "BladeLog.sln")))
        {
            dir = Path.GetDirectoryName(dir);
        }

        return dir ?? throw new InvalidOperationException("BladeLog.sln was not found above the tests.");
    }
}
