using BladeLog.Records;

namespace BladeLog.Tests.Records;

/// <summary>A new shop in a folder of its own, on a real SQLite file.</summary>
public sealed class TempShop : IDisposable
{
    private TempShop(ShopFile file) => File = file;

    public ShopFile File { get; }

    public static async Task<TempShop> Create()
    {
        var shop = new TempShop(new ShopFile(Directory.CreateTempSubdirectory("bladelog").FullName));
        await shop.File.Create();
        return shop;
    }

    public ShopDb Db() => File.NewContext();

    public void Dispose()
    {
        File.Dispose();
        Directory.Delete(File.Dir, recursive: true);
    }
}
