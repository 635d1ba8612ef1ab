namespace BladeLog.Records.Writing;

/// <summary>Whose kept sums a write may have changed.</summary>
internal sealed class Touched
{
    private readonly Dictionary<int, (DateTime From, DateTime Until)> _windows = [];

    public IReadOnlyDictionary<int, (DateTime From, DateTime Until)> Windows => _windows;

    /// <summary>Blades whose place, width, loop or hold may have changed.</summary>
    public HashSet<int> Blades { get; } = [];

    /// <summary>Saws that may carry another blade.</summary>
    public HashSet<int> Mounts { get; } = [];

    /// <summary>Blades whose loop changed, and with it the wood path of all their cuts.</summary>
    public HashSet<int> Loops { get; } = [];

    /// <summary>Runs and cuts of a saw between two times are to be shared out again.</summary>
    public void Window(int sawId, DateTime from, DateTime until) =>
        _windows[sawId] = _windows.TryGetValue(sawId, out var w) ? (w.From < from ? w.From : from, w.Until > until ? w.Until : until) : (from, until);

    public void Loop(int bladeId)
    {
        Blades.Add(bladeId);
        Loops.Add(bladeId);
    }

    /// <summary>A spell came, went or changed its ends.</summary>
    public void Spell(int sawId, int bladeId, DateTime from, DateTime? until)
    {
        Mounts.Add(sawId);
        Blades.Add(bladeId);
        Window(sawId, from, until ?? DateTime.MaxValue);
    }
}
