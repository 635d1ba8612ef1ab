using BladeLog.Features.Bench;
using BladeLog.Features.Blades;
using BladeLog.Features.Cautions;
using BladeLog.Features.People;
using BladeLog.Features.Record;
using BladeLog.Features.Saws;
using BladeLog.Features.Setup;
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
        SawForms.Map(app);
        BladeForms.Map(app);
        BenchPages.Map(app);
        RecordPages.Map(app);
        PeoplePages.Map(app);
        SetupPages.Map(app);
        CautionPages.Map(app);
        WorkingsJson.Map(app.MapGroup("/api/v1"));
    }
}
