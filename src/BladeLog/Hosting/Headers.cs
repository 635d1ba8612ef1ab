namespace BladeLog.Hosting;

/// <summary>The headers every answer carries, and the check that a form comes from our own page.</summary>
internal static class Headers
{
    private const string ContentPolicy =
        "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self' data:; connect-src 'self'; manifest-src 'self'; " +
        "form-action 'self'; base-uri 'none'; frame-ancestors 'none'; object-src 'none'";

    public static void UseShopHeaders(this WebApplication app) => app.Use(async (context, next) =>
    {
        var headers = context.Response.Headers;
        headers.ContentSecurityPolicy = ContentPolicy;
        headers.XContentTypeOptions = "nosniff";
        headers["Referrer-Policy"] = "same-origin";
        headers["Cross-Origin-Opener-Policy"] = "same-origin";
        headers["Permissions-Policy"] = "camera=(self), microphone=(), geolocation=()";
        headers.CacheControl = "no-store";
        if (IsForeign(context.Request))
        {
            context.Response.StatusCode = StatusCodes.Status403Forbidden;
            await context.Response.WriteAsync("This form came from another site. Open the page here and send it again.");
            return;
        }

        await next(context);
    });

    /// <summary>Browsers send Origin with every form and fetch that changes something; Sec-Fetch-Site only where the connection is trusted.</summary>
    private static bool IsForeign(HttpRequest request)
    {
        if (HttpMethods.IsGet(request.Method) || HttpMethods.IsHead(request.Method))
        {
            return false;
        }

        if (request.Headers["Sec-Fetch-Site"].FirstOrDefault() is { } site)
        {
            return site is not ("same-origin" or "none");
        }

        return request.Headers.Origin.FirstOrDefault() is { } origin
            && !(Uri.TryCreate(origin, UriKind.Absolute, out var from) && from.Authority.Equals(request.Host.Value, StringComparison.OrdinalIgnoreCase));
    }
}
