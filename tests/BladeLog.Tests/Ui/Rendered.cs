using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Forms;
using Microsoft.AspNetCore.Components.Web;
using Microsoft.Extensions.DependencyInjection;

namespace BladeLog.Tests.Ui;

/// <summary>Components as the browser gets them.</summary>
internal static class Rendered
{
    public static string Html<T>(params (string Name, object? Value)[] parameters)
        where T : IComponent
    {
        using var services = new ServiceCollection()
            .AddLogging()
            .AddSingleton<AntiforgeryStateProvider, FixedToken>()
            .BuildServiceProvider();
        using var renderer = new HtmlRenderer(services, services.GetRequiredService<Microsoft.Extensions.Logging.ILoggerFactory>());
        return renderer.Dispatcher.InvokeAsync(async () =>
        {
            var values = ParameterView.FromDictionary(parameters.ToDictionary(p => p.Name, p => p.Value));
            return (await renderer.RenderComponentAsync<T>(values)).ToHtmlString();
        }).GetAwaiter().GetResult();
    }

    public static IElement Root(string html) => new HtmlParser().ParseDocument(html).Body!.FirstElementChild!;

    private sealed class FixedToken : AntiforgeryStateProvider
    {
        public override AntiforgeryRequestToken GetAntiforgeryToken() => new("a-token", "__RequestVerificationToken");
    }
}
