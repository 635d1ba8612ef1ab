using System.Globalization;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>The file is not one this program may open; the message says why and what to do.</summary>
public sealed class ShopFileException(string message) : Exception(message);

/// <summary>
/// The place of the shop's records: one folder with the database, its lock and the copies made before a change of its
/// tables. A file is made only by <see cref="Create"/>; opening never makes one.
/// </summary>
public sealed class ShopFile(string dir) : IDisposable
{
    /// <summary>"BLog" in ASCII: tells this program's files from any other SQLite file.</summary>
    public const int ApplicationId = 0x424C6F67;

    private readonly Pragmas _pragmas = new();
    /// <summary>Copies of a kind that are kept.</summary>
    private const int CopiesKept = 5;

    private FileStream? _lock;
    private bool _marked;

    public string Dir { get; } = System.IO.Path.GetFullPath(dir);

    public string Path => System.IO.Path.Combine(Dir, "bladelog.db");

    public string LockPath => System.IO.Path.Combine(Dir, "bladelog.lock");

    /// <summary>Stands while the file is open. Where it stands at a start, the last stop was no clean one.</summary>
    public string OpenMarkPath => System.IO.Path.Combine(Dir, "bladelog.open");

    public string CopiesDir => System.IO.Path.Combine(Dir, "copies");

    public bool Exists => File.Exists(Path);

    /// <summary>Never makes a file by itself: a mistyped folder is an error, not an empty shop.</summary>
    public string ConnectionString => Connection(SqliteOpenMode.ReadWrite);

    public void Configure(DbContextOptionsBuilder options) => options.UseSqlite(ConnectionString).AddInterceptors(_pragmas);

    public ShopDb NewContext()
    {
        var options = new DbContextOptionsBuilder<ShopDb>();
        Configure(options);
        return new ShopDb(options.Options);
    }

    /// <summary>Takes the folder for this process alone, until disposed.</summary>
    public void TakeLock()
    {
        if (_lock is not null)
        {
            return;
        }

        Directory.CreateDirectory(Dir);
        try
        {
            _lock = new FileStream(LockPath, FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
        }
        catch (IOException)
        {
            throw new ShopFileException($"Another BladeLog is running on {Dir}. Stop it first, or give this one another folder.");
        }
    }

    /// <summary>Makes the file, on the first start only.</summary>
    public async Task Create()
    {
        TakeLock();
        if (Exists)
        {
            throw new ShopFileException($"There is already a file at {Path}.");
        }

        await using (var connection = new SqliteConnection(Connection(SqliteOpenMode.ReadWriteCreate)))
        {
            await connection.OpenAsync();
            CheckSqlite(connection);
            Execute(connection, $"PRAGMA application_id={ApplicationId.ToString(CultureInfo.InvariantCulture)}; PRAGMA journal_mode=WAL;");
        }

        if (!OperatingSystem.IsWindows())
        {
            File.SetUnixFileMode(Path, UnixFileMode.UserRead | UnixFileMode.UserWrite);
        }

        MarkOpen();
        await using var db = NewContext();
        await db.Database.MigrateAsync();
        await MarkSchema(db);
    }

    /// <summary>Opens the file that is there: checks that it is ours and whole, and brings its tables up to date.</summary>
    /// <returns>The copy made before the tables were changed; null where nothing had to change.</returns>
    public async Task<string?> Open(DateTime now)
    {
        TakeLock();
        if (!Exists)
        {
            throw new ShopFileException($"There is no file at {Path}.");
        }

        if (new FileInfo(Path).Length == 0)
        {
            throw new ShopFileException($"The file {Path} is empty. Restore a copy over it.");
        }

        await using var db = NewContext();
        try
        {
            await db.Database.OpenConnectionAsync();
            var connection = (SqliteConnection)db.Database.GetDbConnection();
            CheckOurs(connection, db.Database.GetMigrations().Count());
            if (!_marked && File.Exists(OpenMarkPath))
            {
                CheckWhole(connection);
            }
        }
        catch (SqliteException e)
        {
            throw new ShopFileException($"The file {Path} cannot be read as a database ({e.Message}). Restore a copy over it.");
        }

        var known = db.Database.GetMigrations().ToHashSet();
        if ((await db.Database.GetAppliedMigrationsAsync()).Any(m => !known.Contains(m)))
        {
            throw Newer();
        }

        MarkOpen();
        if (!(await db.Database.GetPendingMigrationsAsync()).Any())
        {
            return null;
        }

        var copy = await CopyTo(Copy("upgrade", now));
        ClearStaleLock(db);
        await db.Database.MigrateAsync();
        await MarkSchema(db);
        return copy;
    }

    /// <summary>A copy beside the file before much is written at once; the newest few of a kind are kept.</summary>
    public async Task<string> CopyBefore(string what, DateTime now)
    {
        Directory.CreateDirectory(CopiesDir);
        var old = new DirectoryInfo(CopiesDir).GetFiles($"before-{what}-*.db").OrderByDescending(f => f.Name, StringComparer.Ordinal).Skip(CopiesKept - 1);
        foreach (var file in old)
        {
            file.Delete();
        }

        var target = Copy(what, now);
        for (var again = 2; File.Exists(target); again++)
        {
            target = Copy(what, now, $"-{again.ToString(CultureInfo.InvariantCulture)}");
        }

        return await CopyTo(target);
    }

    /// <summary>A compact copy in one file, taken while the shop works on.</summary>
    public async Task<string> CopyTo(string target)
    {
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(target)!);
        await using var db = NewContext();
        await db.Database.ExecuteSqlAsync($"VACUUM INTO {target}");
        if (!OperatingSystem.IsWindows())
        {
            File.SetUnixFileMode(target, UnixFileMode.UserRead | UnixFileMode.UserWrite);
        }

        return target;
    }

    public void Dispose()
    {
        using (var connection = new SqliteConnection(ConnectionString))
        {
            SqliteConnection.ClearPool(connection);
        }

        if (_marked)
        {
            File.Delete(OpenMarkPath);
            _marked = false;
        }

        _lock?.Dispose();
        _lock = null;
    }

    private string Connection(SqliteOpenMode mode) =>
        new SqliteConnectionStringBuilder { DataSource = Path, Mode = mode, ForeignKeys = true, Pooling = mode == SqliteOpenMode.ReadWrite }.ToString();

    private void CheckOurs(SqliteConnection connection, int migrations)
    {
        CheckSqlite(connection);
        if (Scalar(connection, "PRAGMA application_id") != ApplicationId)
        {
            throw new ShopFileException($"The file {Path} was not made by BladeLog.");
        }

        if (Scalar(connection, "PRAGMA user_version") > migrations)
        {
            throw Newer();
        }
    }

    private void MarkOpen()
    {
        File.WriteAllBytes(OpenMarkPath, []);
        _marked = true;
    }

    /// <summary>SQLite may answer wrongly from a damaged page without an error, and the check reports in rows: only the one word "ok" is good.</summary>
    private void CheckWhole(SqliteConnection connection)
    {
        using var command = connection.CreateCommand();
        command.CommandText = "PRAGMA quick_check(1)";
        var said = command.ExecuteScalar() as string;
        if (said != "ok")
        {
            throw new ShopFileException(
                $"BladeLog was not stopped cleanly, and the file {Path} is damaged ({said?.ReplaceLineEndings(" ") ?? "no answer"}). "
                + $"Nothing was changed. Stop BladeLog and put the last good copy back: restore COPY --data {Dir}. Copies made before an upgrade lie in {CopiesDir}.");
        }
    }

    private ShopFileException Newer() =>
        new($"The file {Path} was written by a newer BladeLog. Install that version again, or restore a copy made before it.");

    private static void CheckSqlite(SqliteConnection connection)
    {
        if (Version.Parse(connection.ServerVersion) < Pragmas.LeastSqlite)
        {
            throw new ShopFileException($"SQLite {connection.ServerVersion} is too old: {Pragmas.LeastSqlite} or later is needed.");
        }
    }

    /// <summary>A process killed while migrating leaves this row behind for ever; the lock file says that no other one is at work.</summary>
    private static void ClearStaleLock(ShopDb db)
    {
        var connection = (SqliteConnection)db.Database.GetDbConnection();
        if (Scalar(connection, "select count(*) from sqlite_master where name = '__EFMigrationsLock'") > 0)
        {
            Execute(connection, "delete from \"__EFMigrationsLock\"");
        }
    }

    private static async Task MarkSchema(ShopDb db)
    {
        await db.Database.OpenConnectionAsync();
        var applied = db.Database.GetMigrations().Count();
        Execute((SqliteConnection)db.Database.GetDbConnection(), $"PRAGMA user_version={applied.ToString(CultureInfo.InvariantCulture)}");
    }

#pragma warning disable CA2100 // Constants and whole numbers only.
    private static void Execute(SqliteConnection connection, string sql)
    {
        using var command = connection.CreateCommand();
        command.CommandText = sql;
        command.ExecuteNonQuery();
    }

    private static long Scalar(SqliteConnection connection, string sql)
    {
        using var command = connection.CreateCommand();
        command.CommandText = sql;
        return Convert.ToInt64(command.ExecuteScalar(), CultureInfo.InvariantCulture);
    }
#pragma warning restore CA2100

    private string Copy(string what, DateTime now, string more = "") =>
        System.IO.Path.Combine(CopiesDir, $"before-{what}-{now.ToString("yyyyMMdd-HHmmss", CultureInfo.InvariantCulture)}{more}.db");
}
