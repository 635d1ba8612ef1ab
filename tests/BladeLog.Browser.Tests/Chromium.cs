namespace BladeLog.Browser.Tests;

/// <summary>The browser the tests drive: the one BLADELOG_CHROMIUM names, else a chromium on the PATH.</summary>
internal static class Chromium
{
    public const string WhenMissing = "No Chromium here: install the package 'chromium', or set BLADELOG_CHROMIUM to one. tests/run does it.";

    public static string? Path { get; } = Find();

    public static BrowserTypeLaunchOptions Options => new()
    {
        ExecutablePath = Path,
        Args =
        [
            "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run",
            "--disable-background-networking", "--disable-component-update", "--disable-sync",
        ],
    };

    private static string? Find()
    {
        string[] names = [Environment.GetEnvironmentVariable("BLADELOG_CHROMIUM") ?? "", "chromium", "chromium-browser"];
        var folders = (Environment.GetEnvironmentVariable("PATH") ?? "").Split(System.IO.Path.PathSeparator, StringSplitOptions.RemoveEmptyEntries);
        return names.Where(n => n.Length > 0)
            .SelectMany(n => System.IO.Path.IsPathRooted(n) ? [n] : folders.Select(f => System.IO.Path.Combine(f, n)))
            .FirstOrDefault(File.Exists);
    }
}

/// <summary>A test that needs the browser; skipped, and said so, where there is none.</summary>
public sealed class BrowserFactAttribute : FactAttribute
{
    public BrowserFactAttribute() => Skip = Chromium.Path is null ? Chromium.WhenMissing : null;
}

/// <summary>The same for each of several cases.</summary>
public sealed class BrowserTheoryAttribute : TheoryAttribute
{
    public BrowserTheoryAttribute() => Skip = Chromium.Path is null ? Chromium.WhenMissing : null;
}
