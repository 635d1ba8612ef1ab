namespace BladeLog.Tests;

/// <summary>One empty shop for all tests of a class that only ask.</summary>
public sealed class EmptyShop : IAsyncLifetime
{
    public ShopApp App { get; private set; } = null!;

    public async Task InitializeAsync() => App = await ShopApp.Empty();

    public async Task DisposeAsync() => await App.DisposeAsync();
}
