using BladeLog.Features.Blades;
using BladeLog.Features.Saws;
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
        WhatIfBlade.Map(app);
        WhatIfSaw.Map(app);
        WorkingsPages.Map(app);
        WorkingsJson.Map(app.MapGroup("/api/v1"));
    }
}
