namespace BladeLog.Hosting;

/// <summary>Where the shop's file lives: never beside the program, where the next publish would delete it.</summary>
internal static class DataPlace
{
    public static string Of(string? asked)
    {
        if (!string.IsNullOrWhiteSpace(asked))
        {
            return Path.GetFullPath(asked);
        }

        if (Environment.GetEnvironmentVariable("BLADELOG_DATA") is { Length: > 0 } named)
        {
            return Path.GetFullPath(named);
        }

        var user = Environment.GetFolderPath(Environment.SpecialFolder.LocalApplicationData, Environment.SpecialFolderOption.DoNotVerify);
        return Path.Combine(user.Length > 0 ? user : Path.GetTempPath(), "BladeLog");
    }
}
