namespace BladeLog.Browser.Tests;

/// <summary>A screen in the shop, by its size in px.</summary>
public sealed record Screen(string Name, int Width, int Height)
{
    public static readonly Screen Lying = new("1280x800", 1280, 800);
    public static readonly Screen Standing = new("800x1280", 800, 1280);
    public static readonly Screen Phone = new("360x740", 360, 740);
    public static readonly Screen Narrow = new("320x600", 320, 600);

    /// <summary>The lying tablet zoomed to 200 %.</summary>
    public static readonly Screen Doubled = new("640x400", 640, 400);

    public bool IsTablet => this == Lying || this == Standing;

    public static Screen Of(string name) => new[] { Lying, Standing, Phone, Narrow, Doubled }.Single(s => s.Name == name);
}

/// <summary>Both ways a tablet hangs on the wall.</summary>
public sealed class Tablets : TheoryData<string>
{
    public Tablets()
    {
        Add(Screen.Lying.Name);
        Add(Screen.Standing.Name);
    }
}

/// <summary>A tablet both ways, and a phone.</summary>
public sealed class Screens : TheoryData<string>
{
    public Screens()
    {
        Add(Screen.Lying.Name);
        Add(Screen.Standing.Name);
        Add(Screen.Phone.Name);
    }
}

/// <summary>Both ways a tablet hangs, with script and without.</summary>
public sealed class TabletsWithAndWithoutScript : TheoryData<string, bool>
{
    public TabletsWithAndWithoutScript()
    {
        foreach (var screen in new[] { Screen.Lying, Screen.Standing })
        {
            Add(screen.Name, true);
            Add(screen.Name, false);
        }
    }
}
