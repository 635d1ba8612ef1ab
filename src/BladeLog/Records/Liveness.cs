using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>Whether the records can be read and written now.</summary>
public static class Liveness
{
    public static async Task<bool> CanReadAndWrite(ShopDb db)
    {
        try
        {
            _ = await db.Shops.AsNoTracking().AnyAsync();

            // Taking the write lock and letting it go again writes nothing, and fails where writing would.
            await using var trial = await db.Database.BeginTransactionAsync();
            await trial.RollbackAsync();
            return true;
        }
        catch (Exception e) when (e is Microsoft.Data.Sqlite.SqliteException or InvalidOperationException)
        {
            return false;
        }
    }
}
