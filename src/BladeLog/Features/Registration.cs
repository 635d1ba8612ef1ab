using BladeLog.Features.Cuts;
using BladeLog.Features.Import;
using BladeLog.Features.Start;
using BladeLog.Features.Workings;

namespace BladeLog.Features;

/// <summary>The table of contents: what each page brings and where it answers.</summary>
internal static class Registration
{
    public static void AddFeatures(this IServiceCollection services)
    {
        services.AddScoped<Desk>();
    }

    public static void MapFeatures(this WebApplication app)
    {
        StartPages.Map(app);
        CutsPages.Map(app);
        ImportPages.Map(app);
        WorkingsJson.Map(app.MapGroup("/api/v1"));
    }
}
