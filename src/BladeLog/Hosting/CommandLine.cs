namespace BladeLog.Hosting;

/// <summary>What the program was asked to do. No verb: serve. Wrong: what was wrong with the call, and what would be right.</summary>
internal sealed record Call(string? Verb, string? Operand, string? DataDir, bool Sample, string? Urls, string[] ForTheFramework, string? Wrong = null);

internal static class CommandLine
{
    private static readonly string[] Verbs = ["verify", "backup", "restore"];
    private static readonly string[] FrameworkOptions = ["environment", "contentroot", "applicationname", "samplefiles"];

    public static Call Read(string[] args)
    {
        string? verb = null, operand = null, data = null, urls = null;
        var sample = false;
        var passOn = new List<string>();
        for (var i = 0; i < args.Length; i++)
        {
            var (name, value) = Split(args[i]);
            if (name is null)
            {
                if (verb is null && Verbs.Contains(args[i], StringComparer.Ordinal))
                {
                    verb = args[i];
                }
                else if (verb is "backup" or "restore" && operand is null)
                {
                    operand = args[i];
                }
                else
                {
                    return Refuse($"'{args[i]}' is not a command. Known are: {string.Join(", ", Verbs)}; without one the program serves the shop.");
                }

                continue;
            }

            switch (name.ToLowerInvariant())
            {
                case "sample" when value is null or "true":
                    sample = true;
                    passOn.Add("--sample=true");
                    break;
                case "sample":
                    return Refuse("--sample takes no value: give it alone, or leave it out to serve the shop's own records.");
                case "data":
                    value ??= Next(args, ref i);
                    if (string.IsNullOrWhiteSpace(value))
                    {
                        return Refuse("--data needs a folder: --data /path/to/folder.");
                    }

                    data = value;
                    passOn.Add($"--data={value}");
                    break;
                case "urls":
                    value ??= Next(args, ref i);
                    if (value is null || value.Split(';').Any(u => !Uri.TryCreate(u.Replace("*", "any").Replace("+", "any"), UriKind.Absolute, out _)))
                    {
                        return Refuse("--urls needs an address such as http://127.0.0.1:5080.");
                    }

                    urls = value;
                    passOn.Add($"--urls={value}");
                    break;
                case var known when FrameworkOptions.Contains(known):
                    value ??= Next(args, ref i);
                    passOn.Add($"--{name}={value}");
                    break;
                default:
                    return Refuse($"'--{name}' is not an option. Known are: --sample, --data DIR, --urls ADDRESS.");
            }
        }

        if (sample && (urls ?? Environment.GetEnvironmentVariable("ASPNETCORE_URLS")) is { } asked && asked.Split(';').Any(u => !IsLoopback(u)))
        {
            return Refuse("--sample serves the invented shop with open access, so only to this machine: use an address such as http://127.0.0.1:5080.");
        }

        return verb is "backup" or "restore" && operand is null
            ? Refuse($"{verb} needs a file: {verb} shop-copy.db.")
            : new Call(verb, operand, data, sample, urls, [.. passOn]);
    }

    internal static bool IsLoopback(string address) =>
        Uri.TryCreate(address, UriKind.Absolute, out var uri) && uri.IsLoopback;

    private static Call Refuse(string sentence) => new(null, null, null, false, null, [], sentence);

    private static (string? Name, string? Value) Split(string arg)
    {
        if (!arg.StartsWith("--", StringComparison.Ordinal) || arg.Length == 2)
        {
            return (null, null);
        }

        var at = arg.IndexOf('=');
        return at < 0 ? (arg[2..], null) : (arg[2..at], arg[(at + 1)..]);
    }

    private static string? Next(string[] args, ref int i) =>
        i + 1 < args.Length && !args[i + 1].StartsWith("--", StringComparison.Ordinal) ? args[++i] : null;
}
