using System.Text;
using BladeLog.Hosting;
using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Import;

/// <summary>What can be imported, for the page.</summary>
public sealed record KnownKind(string Key, string Name, IReadOnlyList<Column> Columns, IReadOnlyList<string> Defaults, IReadOnlyList<string> Sample);

/// <param name="Kind">What was chosen.</param>
/// <param name="Text">What was pasted, kept where it was wrong.</param>
/// <param name="Problem">What is wrong with the form itself.</param>
/// <param name="Reading">What the file says, where it was read.</param>
/// <param name="Kinds">What can be imported.</param>
/// <param name="Op">Of the form that keeps it.</param>
public sealed record ImportModel(string? Kind, string? Text, string? Problem, Reading? Reading, IReadOnlyList<KnownKind> Kinds, string Op);

/// <summary>Two steps: what a file says, then keep it, all of it or nothing.</summary>
internal static class ImportPages
{
    /// <summary>More than a file may have, so that one somewhat too large is still refused in words.</summary>
    private const int MostBody = 3 * FileText.MostBytes;

    /// <summary>What is pasted comes back with its faults up to this size; a larger one is pasted again.</summary>
    private const int MostEchoed = 100_000;

    public static void Map(WebApplication app)
    {
        app.MapGet("/import", async (Desk desk) => await Page(desk, null, null, null, null));
        app.MapPost("/import", Look)
            .WithMetadata(new RequestSizeLimitAttribute(MostBody))
            .WithFormOptions(valueLengthLimit: MostBody, multipartBodyLengthLimit: MostBody);
        app.MapPost("/import/keep", Keep);
    }

    private static async Task<IResult> Look([FromForm] string? kind, [FromForm] string? text, IFormFile? file, Desk desk, ShopGate gate)
    {
        bool pasted = file is not { Length: > 0 };
        if (pasted && string.IsNullOrWhiteSpace(text))
        {
            return await Page(desk, kind, text, "Choose a file, or paste the rows with their headings.", null);
        }

        if (file?.Length > FileText.MostBytes || text?.Length > FileText.MostBytes)
        {
            return await Page(desk, kind, null, FileText.TooLarge, null);
        }

        byte[] bytes = pasted ? Encoding.UTF8.GetBytes(text!.Trim('\uFEFF')) : await Bytes(file!);
        Reading reading = Reading.Of(bytes, kind, await Kinds(desk), await desk.Units(), desk.Now);
        if (reading.Wrongs.Count == 0 && await Before(desk, reading.Sha256) is { } before)
        {
            reading = reading with { Wrongs = [new Wrong(0, null, null, before)] };
        }

        if (reading.Wrongs.Count == 0)
        {
            await WaitingFiles.Put(gate.File.Dir, reading.Sha256, bytes, desk.Now);
        }

        return await Page(desk, kind, pasted && text!.Length <= MostEchoed ? text : null, null, reading);
    }

    private static async Task<IResult> Keep([FromForm] string? hash, [FromForm] string? kind, [FromForm] string? op, Desk desk, ShopGate gate)
    {
        if (await WaitingFiles.Take(gate.File.Dir, hash) is not { } bytes)
        {
            return await Page(desk, kind, null, "That file is no longer waiting here. Choose it once more.", null);
        }

        IReadOnlyList<IImportKind> kinds = await Kinds(desk);
        Reading reading = Reading.Of(bytes, kind, kinds, await desk.Units(), desk.Now);
        if (reading.Wrongs.Count > 0 || reading.Kind is null)
        {
            return await Page(desk, kind, null, null, reading);
        }

        IImportKind chosen = kinds.First(k => k.Key == reading.Kind);
        string copy = await gate.File.CopyBefore("import", desk.Now);
        WriteResult result = await desk.Write(new ImportRows(chosen.Key, reading.Sha256) { Rows = reading.Commands }, op, chosen.Onwards);
        if (result is not WriteResult.Done)
        {
            // Nothing was kept, so the copy holds nothing the shop has not.
            File.Delete(copy);
        }

        switch (result)
        {
            case WriteResult.Done done:
                WaitingFiles.Drop(gate.File.Dir, reading.Sha256);
                return desk.Saved(done, $"{reading.Count} {chosen.Name.ToLowerInvariant()} imported", canUndo: false);
            case WriteResult.Refused refused:
                return await Page(desk, kind, null, null, reading with { Wrongs = [.. refused.Problems.Take(Reading.MostWrongs).Select(Told)] });
            default:
                return await Page(desk, kind, null, "Somebody else changed the record meanwhile. Look at the file once more.", null);
        }
    }

    /// <summary>"line 7: Tags" becomes line 7.</summary>
    private static Wrong Told(Problem problem)
    {
        string[] parts = problem.Field.Split(": ", 2);
        bool named = parts.Length == 2 && parts[0].StartsWith("line ", StringComparison.Ordinal);
        return new Wrong(named && int.TryParse(parts[0].AsSpan(5), out int line) ? line : 0, null, null, problem.Sentence);
    }

    private static async Task<byte[]> Bytes(IFormFile file)
    {
        await using Stream stream = file.OpenReadStream();
        using MemoryStream all = new();
        await stream.CopyToAsync(all);
        return all.ToArray();
    }

    private static async Task<string?> Before(Desk desk, string sha) =>
        await desk.Db.ImportFiles.AsNoTracking().Include(i => i.Entry).FirstOrDefaultAsync(i => i.Sha256 == sha) is { } known
            ? $"This file was imported on {Said.Moment(known.Entry.EnteredUtc, await desk.Units())} already, with {known.Rows} lines. Nothing is imported twice."
            : null;

    private static async Task<IReadOnlyList<IImportKind>> Kinds(Desk desk)
    {
        ShopNow shop = await desk.Shop();
        HashSet<string> tags = new(await desk.Db.TagsUsed.AsNoTracking().Select(t => t.Tag).ToListAsync(), StringComparer.OrdinalIgnoreCase);
        Dictionary<string, Spec> specs = (await desk.Db.Specs.AsNoTracking().ToListAsync()).ToDictionary(s => s.Code, StringComparer.OrdinalIgnoreCase);
        return [new BladeRows(tags, specs), new SawRows(shop), new CutRows(shop)];
    }

    private static async Task<IResult> Page(Desk desk, string? kind, string? text, string? problem, Reading? reading)
    {
        KnownKind[] kinds = [.. (await Kinds(desk)).Select(k => new KnownKind(k.Key, k.Name, k.Columns, k.Defaults, k.Sample))];
        bool wrong = problem is not null || reading?.Wrongs.Count > 0;
        return await desk.Page<ImportPage, ImportModel>(
            new(kind, text, problem, reading, kinds, Guid.NewGuid().ToString()),
            wrong ? StatusCodes.Status422UnprocessableEntity : StatusCodes.Status200OK);
    }
}

/// <summary>Files looked at and not kept yet, beside the records by their hash. Nothing of them is in the records.</summary>
internal static class WaitingFiles
{
    private const int Most = 20;
    private static readonly TimeSpan For = TimeSpan.FromDays(1);

    public static async Task Put(string dir, string hash, byte[] bytes, DateTime now)
    {
        DirectoryInfo folder = Directory.CreateDirectory(Path.Combine(dir, "waiting"));
        FileInfo[] old = [.. folder.GetFiles("*.csv").OrderByDescending(f => f.LastWriteTimeUtc)];
        foreach (FileInfo file in old.Where((f, i) => i >= Most - 1 || now - f.LastWriteTimeUtc > For))
        {
            file.Delete();
        }

        string path = Of(dir, hash);
        await File.WriteAllBytesAsync(path, bytes);
        File.SetLastWriteTimeUtc(path, now);
    }

    /// <summary>Only a hash names a file here, so no path can be asked for.</summary>
    public static async Task<byte[]?> Take(string dir, string? hash) =>
        hash is { Length: 64 } && hash.All(char.IsAsciiHexDigitLower) && File.Exists(Of(dir, hash)) ? await File.ReadAllBytesAsync(Of(dir, hash)) : null;

    public static void Drop(string dir, string hash) => File.Delete(Of(dir, hash));

    private static string Of(string dir, string hash) => Path.Combine(dir, "waiting", hash + ".csv");
}
