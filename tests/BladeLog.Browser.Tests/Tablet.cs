using System.Collections.Concurrent;
using System.Text.RegularExpressions;

namespace BladeLog.Browser.Tests;

/// <summary>A tablet in a hand: it counts taps, and keeps what the browser complains about.</summary>
public sealed partial class Tablet
{
    private readonly ConcurrentQueue<string> _complaints = new();
    private readonly HashSet<int> _expected = [];
    private bool _mayLose;

    public Tablet(IPage page, Screen screen)
    {
        Page = page;
        Screen = screen;
        page.PageError += (_, error) => _complaints.Enqueue($"script: {error}");
        page.Console += (_, message) => Hear(message);
        page.RequestFailed += (_, request) =>
        {
            if (!_mayLose)
            {
                _complaints.Enqueue($"request: {request.Method} {request.Url} {request.Failure}");
            }
        };
        page.Response += (_, answer) =>
        {
            if (answer.Status >= 400 && !_expected.Contains(answer.Status))
            {
                _complaints.Enqueue($"answer: {answer.Status} {answer.Request.Method} {answer.Url}");
            }
        };
    }

    public IPage Page { get; }

    public Screen Screen { get; }

    public int Taps { get; private set; }

    public ILocator Title => Page.Locator("h1");

    /// <summary>The pages' cells at the foot.</summary>
    public ILocator Foot => Page.Locator("nav.block");

    /// <summary>An answer that is part of the story, such as 422 for a form that must be put right.</summary>
    public void Expects(int status) => _expected.Add(status);

    /// <summary>From here on a request that does not arrive is part of the story.</summary>
    public void ExpectsLostRequests() => _mayLose = true;

    public async Task Open(string path)
    {
        var answer = await Page.GotoAsync(path);
        Assert.True(answer is not null, $"{path} gave no answer.");
    }

    /// <summary>One tap of a finger, counted.</summary>
    public async Task Tap(ILocator what)
    {
        ArgumentNullException.ThrowIfNull(what);
        Taps++;
        await what.TapAsync();
    }

    /// <summary>Two taps as fast as a bouncing finger makes them, before the first one's answer.</summary>
    public async Task DoubleTap(ILocator what)
    {
        ArgumentNullException.ThrowIfNull(what);
        await what.ScrollIntoViewIfNeededAsync();
        var box = await what.BoundingBoxAsync();
        Assert.NotNull(box);
        Taps += 2;
        var (x, y) = (box.X + (box.Width / 2), box.Y + (box.Height / 2));
        await Task.WhenAll(Page.Touchscreen.TapAsync(x, y), Page.Touchscreen.TapAsync(x, y));
    }

    /// <summary>A field by its label; the keys beside it carry the label and more.</summary>
    public ILocator Field(string label) => Page.GetByLabel(label, new() { Exact = true });

    public Task Fill(string label, string text) => Field(label).FillAsync(text);

    /// <summary>A box to tick; the whole line is the target.</summary>
    public ILocator Box(string name) => Page.Locator("label.tick", new() { HasText = name });

    public ILocator Tile(string saw) => Page.Locator($"#saw-{saw}");

    public ILocator OnTile(string saw, string name) => Tile(saw).GetByRole(AriaRole.Link, new() { Name = name, Exact = true });

    public ILocator Link(string name) => Page.GetByRole(AriaRole.Link, new() { Name = name, Exact = true });

    public ILocator Button(string name) => Page.GetByRole(AriaRole.Button, new() { Name = name, Exact = true });

    public ILocator Button(Regex name) => Page.GetByRole(AriaRole.Button, new() { NameRegex = name });

    /// <summary>The box of a choice; the whole label is the target.</summary>
    public ILocator Choice(string name) => Page.Locator("label.opt", new() { HasText = name });

    /// <summary>The box of one answer to a question, by what it sends: for words that stand in several.</summary>
    public ILocator Answer(string name, string value) => Page.Locator($"label.opt:has(input[name={name}][value={value}])");

    public async Task IsAt(string path) => await Expect(Page).ToHaveURLAsync(new Regex(Regex.Escape(path) + "$", RegexOptions.IgnoreCase));

    public void MustBeQuiet() => Assert.True(_complaints.IsEmpty, "The browser complained:\n" + string.Join('\n', _complaints));

    private void Hear(IConsoleMessage message)
    {
        // The status of an answer is judged where it arrives.
        if (message.Type is "error" or "warning" && !(_mayLose && Lost().IsMatch(message.Text)) && !message.Text.StartsWith("Failed to load resource: the server responded", StringComparison.Ordinal))
        {
            _complaints.Enqueue($"console {message.Type}: {message.Text} {message.Location}");
        }
    }

    [GeneratedRegex("^(Failed to load resource: net::|htmx: htmx:error: Failed to fetch)")]
    private static partial Regex Lost();
}
