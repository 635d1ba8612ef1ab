using System.Collections.Concurrent;
using System.Security.Cryptography;
using Microsoft.Extensions.FileProviders;

namespace BladeLog.Ui;

/// <summary>Addresses of our own files, with a hash of their content so that a browser may keep them for ever.</summary>
public static class StaticFile
{
    private static readonly ConcurrentDictionary<string, string> Urls = new(StringComparer.Ordinal);

    /// <summary>The folder that is served; it stands beside the program, wherever that was started from.</summary>
    public static string Root { get; } = Path.Combine(AppContext.BaseDirectory, "wwwroot");

    /// <summary>Gives "/css/sheet.css?v=1a2b3c4d5e6f" for "css/sheet.css". The file must exist.</summary>
    public static string Url(string path) => Urls.GetOrAdd(path, static p =>
    {
        using var file = File.OpenRead(Path.Combine(Root, p));
        return $"/{p}?v={Convert.ToHexStringLower(SHA256.HashData(file).AsSpan(0, 6))}";
    });

    internal static bool IsCurrent(string requestPath, string? version) =>
        version is not null && Url(requestPath.TrimStart('/')).EndsWith($"?v={version}", StringComparison.Ordinal);
}

/// <summary>Serving of wwwroot.</summary>
public static class StaticFiles
{
    private const string Forever = "public, max-age=31536000, immutable";

    public static IApplicationBuilder UseShopStaticFiles(this IApplicationBuilder app) =>
        app.UseStaticFiles(new StaticFileOptions
        {
            FileProvider = new PhysicalFileProvider(StaticFile.Root),
            OnPrepareResponse = answer =>
            {
                // Only an address that names today's content may be kept: an old or made-up hash must ask again.
                var request = answer.Context.Request;
                var kept = StaticFile.IsCurrent(request.Path.Value ?? "", request.Query["v"]);
                answer.Context.Response.Headers.CacheControl = kept ? Forever : "no-cache";
            },
        });
}
