using BladeLog.Records;

namespace BladeLog.Hosting;

/// <summary>What the program does besides serving. Each says on standard error what was wrong, and ends with 2.</summary>
internal static class Commands
{
    public static async Task<int> Run(Call call)
    {
        using var file = new ShopFile(DataPlace.Of(call.DataDir));
        try
        {
            return call.Verb switch
            {
                "verify" => await Verify(file),
                "backup" => await Backup(file, call.Operand!),
                _ => await Restore(file, call.Operand!),
            };
        }
        catch (Exception e) when (e is ShopFileException or IOException or UnauthorizedAccessException)
        {
            await Console.Error.WriteLineAsync(e.Message);
            return 2;
        }
    }

    private static async Task<int> Verify(ShopFile file)
    {
        await file.Open(TimeProvider.System.GetUtcNow().UtcDateTime);
        await using var db = file.NewContext();
        var differences = await Records.Folding.Verify.Run(db);
        foreach (var difference in differences)
        {
            Console.WriteLine(difference);
        }

        Console.WriteLine(differences.Count == 0 ? "Everything kept equals what the facts say." : $"{differences.Count} differences.");
        return differences.Count == 0 ? 0 : 1;
    }

    private static async Task<int> Backup(ShopFile file, string target)
    {
        if (File.Exists(target))
        {
            await Console.Error.WriteLineAsync($"There is already a file at {target}. Name another.");
            return 2;
        }

        if (!file.Exists)
        {
            await Console.Error.WriteLineAsync($"There is no shop in {file.Dir}. Say where it is with --data DIR.");
            return 2;
        }

        Console.WriteLine($"Copied to {await file.CopyTo(Path.GetFullPath(target))}.");
        return 0;
    }

    /// <summary>Checks the copy first, then puts it in place; the file that was there is kept beside it.</summary>
    private static async Task<int> Restore(ShopFile file, string source)
    {
        if (!File.Exists(source))
        {
            await Console.Error.WriteLineAsync($"There is no file {source}.");
            return 2;
        }

        file.TakeLock();
        var now = TimeProvider.System.GetUtcNow().UtcDateTime;
        var trial = Directory.CreateTempSubdirectory("bladelog-restore-");
        try
        {
            using (var copy = new ShopFile(trial.FullName))
            {
                File.Copy(source, copy.Path);
                await copy.Open(now);
                await using var db = copy.NewContext();
                if (await Records.Folding.Verify.Run(db) is { Count: > 0 } differences)
                {
                    await Console.Error.WriteLineAsync($"Not restored: {differences[0]}");
                    return 2;
                }
            }

            if (file.Exists)
            {
                var kept = $"{file.Path}.before-restore-{now:yyyyMMdd-HHmmss}";
                foreach (var part in new[] { "", "-wal", "-shm" }.Where(p => File.Exists(file.Path + p)))
                {
                    File.Move(file.Path + part, kept + part);
                }

                Console.WriteLine($"The shop that was there is kept as {kept}.");
            }

            File.Copy(source, file.Path);
            Console.WriteLine($"Restored {source} to {file.Path}.");
            return 0;
        }
        finally
        {
            trial.Delete(recursive: true);
        }
    }
}
