using System.Security.Cryptography;
using System.Text;
using System.Text.Json;
using System.Text.Json.Serialization;
using BladeLog.Records.Folding;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage;

namespace BladeLog.Records.Writing;

/// <summary>
/// The one way to write: one writer at a time, one immediate transaction, the op looked up first, the kept state
/// counted again before the commit. Nothing is stored unless everything is.
/// </summary>
public sealed class ShopWriter(IDbContextFactory<ShopDb> contexts) : IDisposable
{
    /// <summary>From here on a full rebuild is cheaper than counting window by window.</summary>
    private const int ManyRows = 200;

    private static readonly JsonSerializerOptions Canonical = new() { NumberHandling = JsonNumberHandling.AllowNamedFloatingPointLiterals };

    private readonly SemaphoreSlim _gate = new(1, 1);

    public async Task<WriteResult> Write(Command command, Sent sent, CancellationToken cancel = default)
    {
        var body = BodyHash(command, sent);
        await _gate.WaitAsync(cancel);
        try
        {
            await using var db = await contexts.CreateDbContextAsync(cancel);
            await using var transaction = await db.Database.BeginTransactionAsync(cancel);
            if (await Before(db, sent, body) is { } known)
            {
                return known;
            }

            db.Editing = (RecordRules.Store(sent.Now), sent.PersonId);
            var session = new WriteSession(db, sent, body);
            try
            {
                return await Record(session, command, transaction, cancel);
            }
            catch (DbUpdateException e) when (e.InnerException is SqliteException inner && ConstraintWords.Of(inner) is { } problem)
            {
                return new WriteResult.Refused([problem]);
            }
            finally
            {
                db.Editing = null;
            }
        }
        finally
        {
            _gate.Release();
        }
    }

    public void Dispose() => _gate.Dispose();

    private static async Task<WriteResult> Record(WriteSession session, Command command, IDbContextTransaction transaction, CancellationToken cancel)
    {
        await Handlers.Handle(session, command);
        if (session.ClashWith is { } clash)
        {
            return clash;
        }

        if (session.Refusals.Count > 0)
        {
            return new WriteResult.Refused([.. session.Refusals]);
        }

        if (session.Asks.Count > 0)
        {
            return new WriteResult.Ask([.. session.Asks], session.OneMoreTap);
        }

        var entry = session.First ?? throw new InvalidOperationException($"{command.GetType().Name} made no entry.");
        await session.Save();
        await session.Seal();
        var (id, path) = (entry.Id, entry.AnswerPath ?? "/");
        if (command is ImportRows { Rows.Count: > ManyRows })
        {
            await Kept.Rebuild(session.Db);
        }
        else
        {
            await Recount.Apply(session.Db, session.Touched);
        }

        await transaction.CommitAsync(cancel);
        return new WriteResult.Done(id, path);
    }

    /// <summary>The same form again gets the same answer; the same op with another body is refused.</summary>
    private static async Task<WriteResult?> Before(ShopDb db, Sent sent, byte[] body)
    {
        var entry = await db.Entries.AsNoTracking().SingleOrDefaultAsync(e => e.Op == sent.Op && e.Part == 0);
        if (entry is null)
        {
            return null;
        }

        return entry.BodySha256 is { } hash && hash.AsSpan().SequenceEqual(body)
            ? new WriteResult.Done(entry.Id, entry.AnswerPath ?? "/")
            : new WriteResult.Refused([new Problem("Op", "This form was recorded before with other values. Open it again.")]);
    }

    private static byte[] BodyHash(Command command, Sent sent)
    {
        var json = sent.Form ?? JsonSerializer.Serialize(command, command.GetType(), Canonical);
        return SHA256.HashData(Encoding.UTF8.GetBytes($"{command.GetType().Name}\n{sent.PersonId}\n{json}"));
    }
}
