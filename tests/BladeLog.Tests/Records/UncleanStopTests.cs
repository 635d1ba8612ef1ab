using System.Globalization;
using BladeLog.Records;
using Microsoft.Data.Sqlite;

namespace BladeLog.Tests.Records;

/// <summary>After a stop that was no clean one the whole file is checked before anything is served from it.</summary>
public sealed class UncleanStopTests : IDisposable
{
    private readonly string _dir = Directory.CreateTempSubdirectory("bladelog-unclean").FullName;

    [Fact]
    public async Task A_clean_stop_leaves_no_mark_and_a_start_makes_one()
    {
        using var file = new ShopFile(_dir);
        await file.Create();
        Assert.True(File.Exists(file.OpenMarkPath));
        file.Dispose();
        Assert.False(File.Exists(file.OpenMarkPath));
    }

    [Fact]
    public async Task A_whole_file_opens_after_an_unclean_stop()
    {
        await PulledOut();
        using var file = new ShopFile(_dir);
        await file.Open(TempShop.Day);
    }

    [Fact]
    public async Task A_damaged_page_is_found_after_an_unclean_stop_and_the_way_back_is_told()
    {
        await PulledOut();
        using var file = new ShopFile(_dir);
        Damage(file.Path);
        for (var start = 0; start < 2; start++)
        {
            var error = await Assert.ThrowsAsync<ShopFileException>(() => file.Open(TempShop.Day));
            Assert.Contains("is damaged", error.Message, StringComparison.Ordinal);
            Assert.Contains($"restore COPY --data {_dir}", error.Message, StringComparison.Ordinal);
            file.Dispose();
            Assert.True(File.Exists(file.OpenMarkPath));
        }
    }

    [Fact]
    public async Task The_trouble_page_tells_it()
    {
        using var app = await ShopApp.OnFolder(async dir =>
        {
            await PulledOut(dir);
            Damage(Path.Combine(dir, "bladelog.db"));
        });
        using var floor = await app.Client.GetAsync("/");
        Assert.Equal("/trouble", floor.Headers.Location?.OriginalString);
        using var trouble = await app.Client.GetAsync("/trouble");
        Assert.Equal(System.Net.HttpStatusCode.ServiceUnavailable, trouble.StatusCode);
        Assert.Contains("was not stopped cleanly", await trouble.Content.ReadAsStringAsync(), StringComparison.Ordinal);
    }

    public void Dispose() => Directory.Delete(_dir, recursive: true);

    private Task PulledOut() => PulledOut(_dir);

    /// <summary>The folder as it stands when the plug is pulled: copied while the shop is open.</summary>
    private static async Task PulledOut(string dir)
    {
        using var shop = await TempShop.WithSaws();
        foreach (var part in Directory.EnumerateFiles(shop.File.Dir).Where(p => p != shop.File.LockPath))
        {
            File.Copy(part, Path.Combine(dir, Path.GetFileName(part)));
        }
    }

    /// <summary>Four hundred bytes of a page of entries become zeros, once what stood beside the file is in it.</summary>
    private static void Damage(string path)
    {
        long page, size;
        using (var connection = new SqliteConnection($"Data Source={path};Pooling=False"))
        {
            connection.Open();
            using var command = connection.CreateCommand();
            command.CommandText = "PRAGMA wal_checkpoint(TRUNCATE)";
            command.ExecuteNonQuery();
            command.CommandText = "select rootpage from sqlite_master where name = 'spec'";
            page = Convert.ToInt64(command.ExecuteScalar(), CultureInfo.InvariantCulture);
            command.CommandText = "PRAGMA page_size";
            size = Convert.ToInt64(command.ExecuteScalar(), CultureInfo.InvariantCulture);
        }

        using var file = File.OpenWrite(path);
        file.Position = (page - 1) * size;
        file.Write(new byte[400]);
    }
}
