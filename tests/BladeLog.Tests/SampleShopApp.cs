namespace BladeLog.Tests;

/// <summary>One copy of the sample shop for all tests of a class that only ask.</summary>
public sealed class SampleShopApp : IAsyncLifetime
{
    public ShopApp App { get; private set; } = null!;

    public async Task InitializeAsync() => App = await ShopApp.Sample();

    public async Task DisposeAsync() => await App.DisposeAsync();
}
