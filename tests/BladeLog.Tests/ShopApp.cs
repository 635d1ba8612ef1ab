using System.Net;
using System.Text;
using System.Text.Json;
using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using BladeLog.Records;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.AspNetCore.TestHost;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Time.Testing;

namespace BladeLog.Tests;

/// <summary>The whole program on a folder of its own, as a browser or another program meets it. Redirects are not followed.</summary>
public sealed class ShopApp : WebApplicationFactory<Program>
{
    public static readonly DateTimeOffset Today = new(2026, 12, 1, 10, 30, 0, TimeSpan.Zero);

    private static readonly Lazy<Task<string>> Template = new(MakeTemplate);
    private readonly HttpClient _client;
    private readonly string? _sampleFiles;

    private ShopApp(string dir, DateTimeOffset? now, string? sampleFiles = null)
    {
        _sampleFiles = sampleFiles;
        Dir = dir;
        Clock = new FakeTimeProvider(now ?? Today);
        _client = CreateClient(new WebApplicationFactoryClientOptions { AllowAutoRedirect = false });
    }

    public string Dir { get; }

    public FakeTimeProvider Clock { get; }

    public HttpClient Client => _client;

    /// <summary>As at the very first start: no file yet.</summary>
    public static ShopApp Unmade(DateTimeOffset? now = null) => new(NewDir(), now);

    /// <summary>As it starts on a folder that somebody else filled.</summary>
    public static async Task<ShopApp> OnFolder(Func<string, Task> fill)
    {
        var dir = NewDir();
        await fill(dir);
        return new(dir, Today);
    }

    /// <summary>No file yet, and sample files from another folder.</summary>
    public static ShopApp WithSampleFiles(string folder) => new(NewDir(), Today, folder);

    /// <summary>A shop with nothing in it, made by the first start's own form.</summary>
    public static async Task<ShopApp> Empty(DateTimeOffset? now = null)
    {
        var app = Unmade(now);
        using var answer = await app.PostForm("/start", new() { ["Begin"] = "empty", ["Name"] = "Test shop", ["Zone"] = "Europe/London" });
        Assert.Equal(HttpStatusCode.Redirect, answer.StatusCode);
        return app;
    }

    /// <summary>The sample shop, its last day being the clock's. Built once for a test run, then copied.</summary>
    public static async Task<ShopApp> Sample()
    {
        var template = await Template.Value;
        var dir = NewDir();
        foreach (var part in Directory.EnumerateFiles(template, "bladelog.db*"))
        {
            File.Copy(part, Path.Combine(dir, Path.GetFileName(part)));
        }

        return new ShopApp(dir, Today);
    }

    /// <summary>The page at this address, which must be there.</summary>
    public async Task<IDocument> GetPage(string path)
    {
        using var answer = await _client.GetAsync(path);
        Assert.True(answer.StatusCode == HttpStatusCode.OK, $"{path} answered {(int)answer.StatusCode}.");
        return Parse(await answer.Content.ReadAsStringAsync());
    }

    /// <summary>Sends a form as a browser does, with the token of the page it stands on (its own address unless named).</summary>
    public async Task<HttpResponseMessage> PostForm(string path, Dictionary<string, string> fields, string? on = null)
    {
        var page = await GetPage(on ?? path);
        var token = page.QuerySelector("input[name=__RequestVerificationToken]")?.GetAttribute("value");
        Assert.True(token is not null, $"{on ?? path} has no form with a token.");
        using var form = new FormUrlEncodedContent([.. fields, new("__RequestVerificationToken", token!)]);
        return await _client.PostAsync(path, form);
    }

    public Task<HttpResponseMessage> PostJson(string path, object body) => PostText(path, JsonSerializer.Serialize(body));

    /// <summary>Sends the text as it stands, so that it may be no JSON at all.</summary>
    public async Task<HttpResponseMessage> PostText(string path, string json)
    {
        using var content = new StringContent(json, Encoding.UTF8, "application/json");
        return await _client.PostAsync(path, content);
    }

    public async Task<JsonElement> GetJson(string path)
    {
        using var answer = await _client.GetAsync(path);
        Assert.True(answer.StatusCode == HttpStatusCode.OK, $"{path} answered {(int)answer.StatusCode}.");
        return await Json(answer);
    }

    public static async Task<JsonElement> Json(HttpResponseMessage answer)
    {
        using var document = JsonDocument.Parse(await answer.Content.ReadAsStringAsync());
        return document.RootElement.Clone();
    }

    public static IDocument Parse(string html) => new HtmlParser().ParseDocument(html);

    /// <summary>A context on the shop's own file.</summary>
    public ShopDb NewContext() => Services.GetRequiredService<ShopFile>().NewContext();

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseSetting("data", Dir);
        if (_sampleFiles is not null)
        {
            builder.UseSetting("samplefiles", _sampleFiles);
        }

        builder.ConfigureTestServices(services => services.AddSingleton<TimeProvider>(Clock));
    }

    protected override void Dispose(bool disposing)
    {
        base.Dispose(disposing);
        if (disposing && Directory.Exists(Dir))
        {
            Directory.Delete(Dir, recursive: true);
        }
    }

    public override async ValueTask DisposeAsync()
    {
        await base.DisposeAsync();
        if (Directory.Exists(Dir))
        {
            Directory.Delete(Dir, recursive: true);
        }
    }

    private static string NewDir() => Directory.CreateTempSubdirectory("bladelog-test-").FullName;

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
