using Microsoft.AspNetCore.Components;

namespace BladeLog.Ui.Pictures;

/// <summary>The shape, the word and the colour class of each state; shapes on a field of 40 by 40.</summary>
public static class StateShapes
{
    public sealed record Look(string Css, string Word, MarkupString Shape);

    private const string Warning = """<path d="M20 4L37 35H3Z" class="out"/><path d="M20 15v10M20 28.5v3.5" class="out"/>""";
    private const string Cross = """<path d="M5 5L35 35M35 5L5 35" class="out"/>""";
    private const string OnAHook = """<path d="M20 3V12M8 12H32" class="out"/><circle cx="20" cy="25" r="11" class="out"/>""";

    private static readonly Dictionary<string, Look> All = new(StringComparer.Ordinal)
    {
        ["runs"] = new("runs", "runs", new("""<circle cx="20" cy="20" r="15"/>""")),
        ["look"] = new("look", "look", new(Warning)),
        ["sharpen"] = new("sharpen", "sharpen", new("""<path d="M3 36L15 6V28L27 6V28L38 6V36Z"/>""")),
        ["hold"] = new("hold", "hold", new("""<path d="M12 2H28L38 12V28L28 38H12L2 28V12Z"/><path d="M10 20H30" class="cutout"/>""")),
        ["slack"] = new("slack", "slack", new("""<path d="M3 14C11 4 15 24 22 14S33 6 37 14M3 28C11 18 15 38 22 28S33 20 37 28" class="out"/>""")),
        ["empty"] = new("empty", "empty", new("""<circle cx="20" cy="20" r="15" class="out dash"/>""")),
        ["ready"] = new("rack", "ready", new(OnAHook)),
        ["rack"] = new("rack", "on the rack", new(OnAHook)),
        ["new"] = new("new", "new", new("""<circle cx="14" cy="16" r="10" class="out"/><circle cx="26" cy="16" r="10" class="out"/><circle cx="20" cy="26" r="10" class="out"/>""")),
        ["away"] = new("away", "at the sharpener", new("""<path d="M4 20H34M24 9L35 20L24 31" class="out"/>""")),
        ["broken"] = new("gone", "broken", new(Cross)),
        ["retired"] = new("gone", "retired", new("""<circle cx="20" cy="20" r="16" class="out"/><path d="M9 9L31 31" class="out"/>""")),
        ["gone"] = new("gone", "gone", new(Cross)),
        ["fits"] = new("fits", "fits", new("""<path d="M4 22L15 33L36 8" class="out"/>""")),
        ["care"] = new("care", "with care", new(Warning)),
        ["no"] = new("no", "no", new(Cross)),
    };

    public static IEnumerable<string> Names => All.Keys;

    public static Look Of(string state) => All.TryGetValue(state, out var look)
        ? look
        : throw new ArgumentOutOfRangeException(nameof(state), state, "No such state.");
}
