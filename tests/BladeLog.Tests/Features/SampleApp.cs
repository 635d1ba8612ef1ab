using AngleSharp.Dom;

namespace BladeLog.Tests.Features;

/// <summary>The sample shop for tests that only read its pages.</summary>
public sealed class SampleApp : IAsyncLifetime
{
    private readonly Dictionary<string, IDocument> pages = [];

    public ShopApp App { get; private set; } = null!;

    public async Task InitializeAsync() => App = await ShopApp.Sample();

    public async Task DisposeAsync() => await App.DisposeAsync();

    public async Task<IDocument> Page(string path)
    {
        if (!pages.TryGetValue(path, out IDocument? page))
        {
            pages[path] = page = await App.GetPage(path);
        }

        return page;
    }

    /// <summary>Text with every run of blanks as one blank.</summary>
    public static string Text(IElement? element) =>
        string.Join(' ', (element?.TextContent ?? "").Split((char[])[' ', '\n', '\r', '\t', '\u00a0'], StringSplitOptions.RemoveEmptyEntries));
}
