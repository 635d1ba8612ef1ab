using BladeLog.Records.Folding;
using BladeLog.Records.Sample;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>The invented shop, read from the CSV files beside the program.</summary>
public static class SampleShop
{
    public static string Folder { get; } = Path.Combine(AppContext.BaseDirectory, "sample-db");

    /// <summary>Fills an empty file in one transaction; day 0 of the files becomes the shop's date of <paramref name="now"/>.</summary>
    public static async Task Fill(ShopDb db, string folder, DateTime now)
    {
        var tracks = db.ChangeTracker.AutoDetectChangesEnabled;
        db.ChangeTracker.AutoDetectChangesEnabled = false;
        try
        {
            await using var transaction = await db.Database.BeginTransactionAsync();
            var things = SampleThings.Read(folder, now);
            db.AddRange(things.All);
            await db.SaveChangesAsync();

            var ledger = new SampleLedger();
            new SampleFacts(folder, things, ledger).Read();
            db.ChangeTracker.Clear();
            var facts = ledger.Close();
            db.AddRange(facts);
            foreach (var (entry, previous, hash) in Chain.Links(db, facts.Select(f => f.Entry), facts, null))
            {
                (entry.PreviousHash, entry.Hash) = (previous, hash);
            }

            await db.SaveChangesAsync();
            db.ChangeTracker.Clear();

            await Kept.Rebuild(db);
            await transaction.CommitAsync();
        }
        catch (DbUpdateException e)
        {
            throw new SampleFileException($"The sample files say what the records do not take: {(e.InnerException ?? e).Message}");
        }
        finally
        {
            db.ChangeTracker.AutoDetectChangesEnabled = tracks;
        }
    }
}
