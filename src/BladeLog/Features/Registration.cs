using BladeLog.Features.Bench;
using BladeLog.Features.Blades;
using BladeLog.Features.Breaks;
using BladeLog.Features.Cautions;
using BladeLog.Features.Cuts;
using BladeLog.Features.Floor;
using BladeLog.Features.Import;
using BladeLog.Features.More;
using BladeLog.Features.People;
using BladeLog.Features.Prints;
using BladeLog.Features.Rack;
using BladeLog.Features.Record;
using BladeLog.Features.Saws;
using BladeLog.Features.Setup;
using BladeLog.Features.Shift;
using BladeLog.Features.Start;
using BladeLog.Features.Stock;
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
        SawForms.Map(app);
        FloorPages.Map(app);
        RackPages.Map(app);
        BladePages.Map(app);
        SawPages.Map(app);
        MorePages.Map(app);
        BladeForms.Map(app);
        BenchPages.Map(app);
        Docket.Map(app);
        LabelPages.Map(app);
        RackCardPages.Map(app);
        AuditPages.Map(app);
        HandOverPages.Map(app);
        TrainingPages.Map(app);
        RecordPages.Map(app);
        PeoplePages.Map(app);
        SetupPages.Map(app);
        CautionPages.Map(app);
        WhatIfBlade.Map(app);
        WhatIfSaw.Map(app);
        WorkingsPages.Map(app);
        BreakPages.Map(app);
        StockPages.Map(app);

        var api = app.MapGroup("/api/v1").DisableAntiforgery();
        WorkingsJson.Map(api);
        BladesJson.Map(api);
        SawsJson.Map(api);
        CutsJson.Map(api);
    }
}
