using BladeLog.Records;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Records;

public sealed class ShopFileTests : IDisposable
{
    private readonly string _dir = Directory.CreateTempSubdirectory("bladelog-file").FullName;

    [Fact]
    public async Task Opening_never_makes_a_file()
    {
        using var file = new ShopFile(_dir);
        var error = await Assert.ThrowsAsync<ShopFileException>(() => file.Open(TempShop.Day));
        Assert.StartsWith("There is no file at", error.Message, StringComparison.Ordinal);
        Assert.False(file.Exists);
    }

    [Fact]
    public async Task A_file_is_made_once_and_opened_as_it_is()
    {
        using (var file = new ShopFile(_dir))
        {
            await file.Create();
            await Assert.ThrowsAsync<ShopFileException>(file.Create);
        }

        using var again = new ShopFile(_dir);
        Assert.Null(await again.Open(TempShop.Day));
        if (!OperatingSystem.IsWindows())
        {
            Assert.Equal(UnixFileMode.UserRead | UnixFileMode.UserWrite, File.GetUnixFileMode(again.Path));
        }
    }

    [Fact]
    public async Task A_second_program_on_the_same_folder_is_refused()
    {
        using var first = new ShopFile(_dir);
        await first.Create();
        using var second = new ShopFile(_dir);
        var error = await Assert.ThrowsAsync<ShopFileException>(() => second.Open(TempShop.Day));
        Assert.StartsWith("Another BladeLog is running", error.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("", "is empty")]
    [InlineData("this is no database, but it is long enough to be read as the head of one, one hundred bytes and some more of them", "cannot be read as a database")]
    public async Task A_file_that_is_no_database_is_said_to_be_so(string content, string because)
    {
        using var file = new ShopFile(_dir);
        await File.WriteAllTextAsync(file.Path, content);
        var error = await Assert.ThrowsAsync<ShopFileException>(() => file.Open(TempShop.Day));
        Assert.Contains(because, error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Another_programs_database_is_left_alone()
    {
        using var file = new ShopFile(_dir);
        Run(file.Path, "create table other (x)");
        var error = await Assert.ThrowsAsync<ShopFileException>(() => file.Open(TempShop.Day));
        Assert.Contains("was not made by BladeLog", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_file_of_a_newer_program_is_left_alone()
    {
        using (var file = new ShopFile(_dir))
        {
            await file.Create();
        }

        using var again = new ShopFile(_dir);
        Run(again.Path, "PRAGMA user_version = 999");
        var error = await Assert.ThrowsAsync<ShopFileException>(() => again.Open(TempShop.Day));
        Assert.Contains("newer BladeLog", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_first_start_cut_short_is_finished_by_the_next_although_its_lock_was_left_behind()
    {
        using var file = new ShopFile(_dir);
        Run(file.Path, $"""
            PRAGMA application_id = {ShopFile.ApplicationId};
            create table "__EFMigrationsLock" ("Id" integer not null primary key, "Timestamp" text not null);
            insert into "__EFMigrationsLock" values (1, '2026-03-02 08:00:00');
            """);
        var copy = await file.Open(TempShop.Day).WaitAsync(TimeSpan.FromSeconds(30));
        Assert.True(File.Exists(copy));
        await using var db = file.NewContext();
        Assert.Empty(await db.Database.GetPendingMigrationsAsync());
    }

    [Fact]
    public async Task A_copy_taken_while_writing_is_whole()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        var copy = await shop.File.CopyTo(Path.Combine(_dir, "copy.db"));
        await using var db = new ShopDb(new DbContextOptionsBuilder<ShopDb>().UseSqlite($"Data Source={copy};Pooling=False").Options);
        Assert.Empty(await BladeLog.Records.Folding.Verify.Run(db));
        Assert.Equal(1, await db.Mounts.CountAsync());
    }

    public void Dispose() => Directory.Delete(_dir, recursive: true);

    private static void Run(string path, string sql)
    {
        using var connection = new SqliteConnection($"Data Source={path};Pooling=False");
        connection.Open();
        using var command = connection.CreateCommand();
        command.CommandText = sql;
        command.ExecuteNonQuery();
    }
}
