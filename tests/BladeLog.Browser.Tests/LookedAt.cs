namespace BladeLog.Browser.Tests;

/// <summary>One sample shop for all tests that only look: nothing is written in it, so it is served and walked once.</summary>
internal sealed record LookedAt(ServedShop Shop, PageList Pages)
{
    private static readonly Lazy<Task<LookedAt>> One = new(Make);

    public static Task<LookedAt> Get() => One.Value;

    /// <summary>A page of each kind, and of the kinds that differ in what they show a few more.</summary>
    public IEnumerable<string> Paths(int ofEach) => Pages.ByKind.Keys.SelectMany(kind => Pages.Some(kind, ofEach));

    private static async Task<LookedAt> Make()
    {
        var shop = await ServedShop.Sample();
        AppDomain.CurrentDomain.ProcessExit += (_, _) => shop.DisposeAsync().AsTask().Wait(TimeSpan.FromSeconds(5));
        return new LookedAt(shop, await PageList.Of(shop));
    }
}
