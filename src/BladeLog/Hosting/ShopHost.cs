using System.Text.Json.Serialization;
using System.Text.Json.Serialization.Metadata;
using BladeLog.Features;
using BladeLog.Records;
using BladeLog.Records.Sample;
using BladeLog.Ui;
using BladeLog.Ui.Json;
using Microsoft.AspNetCore.DataProtection;

namespace BladeLog.Hosting;

/// <summary>Builds the one program out of its parts.</summary>
internal static class ShopHost
{
    private const string Address = "http://127.0.0.1:5080";

    public static WebApplication Build(Call call)
    {
        // The program looks for its files beside itself, wherever it was started from.
        var builder = WebApplication.CreateBuilder(new WebApplicationOptions { Args = call.ForTheFramework, ContentRootPath = AppContext.BaseDirectory });
        if (string.IsNullOrEmpty(builder.Configuration["urls"]))
        {
            builder.WebHost.UseUrls(Address);
        }

        var sample = builder.Configuration["sample"] == "true";
        var file = new ShopFile(sample ? Directory.CreateTempSubdirectory("bladelog-sample-").FullName : DataPlace.Of(builder.Configuration["data"]));
        AddServices(builder, file);
        var app = builder.Build();
        Compose(app);
        app.Lifetime.ApplicationStopped.Register(() => Close(file, sample));
        return app;
    }

    /// <returns>What keeps the program from serving, in a sentence; null: nothing.</returns>
    public static async Task<string?> Open(WebApplication app)
    {
        var gate = app.Services.GetRequiredService<ShopGate>();
        if (app.Configuration["sample"] == "true")
        {
            try
            {
                await gate.MakeSample();
            }
            catch (SampleFileException e)
            {
                Close(gate.File, throwAway: true);
                return e.Message;
            }
        }
        else
        {
            await gate.TryOpen();
        }

        return null;
    }

    private static void AddServices(WebApplicationBuilder builder, ShopFile file)
    {
        builder.WebHost.ConfigureKestrel(kestrel =>
        {
            kestrel.AddServerHeader = false;
            kestrel.Limits.MaxRequestBodySize = 256 * 1024;
            kestrel.Limits.MaxConcurrentConnections = 200;
            kestrel.Limits.RequestHeadersTimeout = TimeSpan.FromSeconds(10);
        });
        var services = builder.Services;
        services.AddSingleton(TimeProvider.System);
        services.AddSingleton<ShopGate>();
        services.AddShopRecords(file);
        services.AddRazorComponents();
        services.AddAntiforgery(options => options.HeaderName = "X-CSRF");
        services.AddHttpContextAccessor();
        services.AddFeatures();
        services.AddOpenApi("v1", options =>
        {
            // Pages and their forms are for people; the description is of what other programs may call.
            options.ShouldInclude = call => call.RelativePath?.StartsWith("api/v1/", StringComparison.Ordinal) == true;
            options.AddDocumentTransformer((document, _, _) =>
            {
                document.Info.Title = "BladeLog";
                document.Info.Description = "Blades, saws, cuts and the workings behind the advice. Units stand in the names.";
                return Task.CompletedTask;
            });
        });
        services.ConfigureHttpJsonOptions(json =>
        {
            json.SerializerOptions.Converters.Add(new FiniteNumbers());
            json.SerializerOptions.Converters.Add(new JsonStringEnumConverter(System.Text.Json.JsonNamingPolicy.SnakeCaseLower));
            json.SerializerOptions.TypeInfoResolver = new DefaultJsonTypeInfoResolver { Modifiers = { BodyFields.Name } };
        });

        // Keys live with the data, so that a restart or a move leaves open forms good.
        services.AddDataProtection().SetApplicationName("BladeLog").PersistKeysToFileSystem(new DirectoryInfo(Path.Combine(file.Dir, "keys")));
        builder.Logging.AddFilter("Microsoft.AspNetCore.DataProtection", LogLevel.Error);
        builder.Logging.AddFilter("Microsoft.EntityFrameworkCore", LogLevel.Warning);
    }

    private static void Compose(WebApplication app)
    {
        app.UseShopHeaders();
        app.UseShopStaticFiles();
        app.UseShopGate();
        app.UseExceptionHandler("/trouble");
        app.UseStatusCodePagesWithReExecute("/trouble/{0}");
        app.UseAntiforgery();
        app.MapOpenApi();
        app.MapFeatures();
    }

    private static void Close(ShopFile file, bool throwAway)
    {
        file.Dispose();
        if (throwAway)
        {
            Directory.Delete(file.Dir, recursive: true);
        }
    }
}
