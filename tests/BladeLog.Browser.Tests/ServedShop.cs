using BladeLog.Records;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.AspNetCore.TestHost;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Logging;
using Microsoft.Extensions.Time.Testing;

namespace BladeLog.Browser.Tests;

/// <summary>The whole program behind a real port of this machine, on a folder and a clock of its own.</summary>
public sealed class ServedShop : WebApplicationFactory<Program>
{
    public static readonly DateTimeOffset Today = new(2026, 12, 1, 10, 30, 0, TimeSpan.Zero);

    private static readonly Lazy<Task<string>> Template = new(MakeTemplate);
    private readonly string _dir;

    private ServedShop(string dir)
    {
        _dir = dir;
        Clock = new FakeTimeProvider(Today);
        UseKestrel();
        StartServer();
        Address = ClientOptions.BaseAddress;
    }

    public FakeTimeProvider Clock { get; }

    public Uri Address { get; }

    /// <summary>As at the very first start: no file yet.</summary>
    public static ServedShop Unmade() => new(NewDir());

    /// <summary>The sample shop, its last day being the clock's. Built once for a test run, then copied.</summary>
    public static async Task<ServedShop> Sample()
    {
        var template = await Template.Value;
        var dir = NewDir();
        foreach (var part in Directory.EnumerateFiles(template, "bladelog.db*"))
        {
            File.Copy(part, Path.Combine(dir, Path.GetFileName(part)));
        }

        return new ServedShop(dir);
    }

    /// <summary>Asks the records, which is how a test knows that one tap made one fact.</summary>
    public async Task<T> Ask<T>(Func<ShopDb, Task<T>> question)
    {
        await using var db = Services.GetRequiredService<ShopFile>().NewContext();
        return await question(db);
    }

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseSetting("data", _dir);
        builder.UseSetting("urls", "http://127.0.0.1:0");
        builder.ConfigureLogging(log => log.SetMinimumLevel(LogLevel.Error));
        builder.ConfigureTestServices(services => services.AddSingleton<TimeProvider>(Clock));
    }

    public override async ValueTask DisposeAsync()
    {
        await base.DisposeAsync();
        if (Directory.Exists(_dir))
        {
            Directory.Delete(_dir, recursive: true);
        }
    }

    private static string NewDir() => Directory.CreateTempSubdirectory("bladelog-browser-").FullName;

    private static async Task<string> MakeTemplate()
    {
        var dir = NewDir();
        AppDomain.CurrentDomain.ProcessExit += (_, _) => Directory.Delete(dir, recursive: true);
        using var file = new ShopFile(dir);
        await file.Create();
        await using var db = file.NewContext();
        await SampleShop.Fill(db, SampleShop.Folder, Today.UtcDateTime);
        return dir;
    }
}
