using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>A file's rows through the same handlers as the forms, in one transaction: all of them or none.</summary>
internal static class ImportRowsHandler
{
    private const int MostProblems = 100;

    public static async Task Handle(WriteSession w, ImportRows c)
    {
        var known = await w.Db.ImportFiles.AsNoTracking().Include(i => i.Entry).SingleOrDefaultAsync(i => i.Sha256 == c.Sha256);
        if (known is not null)
        {
            w.Refuse("File", $"This file was imported on {w.Say(known.Entry.EnteredUtc)} already, with {known.Rows} rows.");
        }

        w.RefuseUnless(c.Rows.Count > 0, "File", "The file has no rows.");
        if (!w.Stands)
        {
            return;
        }

        var entry = w.NewEntry(nameof(ImportRows), w.Now);
        w.AnswerPath = "/record";
        w.Db.ImportFiles.Add(new ImportFile { Sha256 = c.Sha256, Kind = c.Kind, Rows = c.Rows.Count, Entry = entry });
        await w.Save();
        foreach (var row in c.Rows)
        {
            w.BeginRow(row.Line);
            await One(w, row.Command);
            if (w.Refusals.Count >= MostProblems)
            {
                break;
            }
        }
    }

    private static async Task One(WriteSession w, Command row)
    {
        w.Db.ChangeTracker.Clear();
        await Handlers.Handle(w, row);
        if (w.ClashWith is { } clash)
        {
            w.ClashWith = null;
            w.Refuse("", $"{clash.Who} {clash.What} on {w.Say(clash.When)}.");
        }

        w.RefuseAsked();
        if (w.Stands)
        {
            try
            {
                await w.Db.SaveChangesAsync();
            }
            catch (DbUpdateException e) when (e.InnerException is SqliteException inner && ConstraintWords.Of(inner) is { } problem)
            {
                w.Refuse(problem.Field, problem.Sentence);
            }
        }

        // The next row may speak of what this one added.
        w.Db.ChangeTracker.Clear();
        if (w.Stands)
        {
            await Recount.Blades(w.Db, w.Touched.Blades);
            await Recount.OnSaws(w.Db, w.Touched.Mounts);
        }
    }
}
