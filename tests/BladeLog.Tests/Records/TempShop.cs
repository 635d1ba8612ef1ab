using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Records;

/// <summary>A new shop in a folder of its own, on a real SQLite file.</summary>
public sealed class TempShop : IDisposable, IDbContextFactory<ShopDb>
{
    /// <summary>The shop's clock, moved on by the tests.</summary>
    public static readonly DateTime Day = new(2026, 3, 2, 8, 0, 0, DateTimeKind.Utc);

    private TempShop(ShopFile file)
    {
        File = file;
        Writer = new ShopWriter(this);
    }

    public ShopFile File { get; }

    public ShopWriter Writer { get; }

    public DateTime Now { get; set; } = Day.AddDays(30);

    public static async Task<TempShop> Create()
    {
        var shop = new TempShop(new ShopFile(Directory.CreateTempSubdirectory("bladelog").FullName));
        await shop.File.Create();
        return shop;
    }

    /// <summary>Two saws, two blades that fit both, and a person who may clear holds.</summary>
    public static async Task<TempShop> WithSaws()
    {
        var shop = await Create();
        await shop.Do(new SaveShop(new Shop { Name = "A shop", Zone = "Europe/London" }));
        await shop.Do(new AddPerson("OT", "Saw doctor", [Role.ClearHolds]));
        await shop.Do(new AddPerson("JP", "Machinist", []));
        await shop.Do(new AddSaw("S1", "First", true, Setup(), Day.AddDays(-1)));
        await shop.Do(new AddSaw("S2", "Second", false, Setup(), Day.AddDays(-1)));
        await shop.Do(new AddSpec(Spec("A")));
        await shop.Do(new AddBlades("A", ["Q-1", "Q-2", "Q-3"]) { At = Day.AddDays(-1) });
        return shop;
    }

    public static SawSetup Setup(double loopM = 4) => new()
    {
        LoopM = loopM,
        LoopLeastM = loopM - 0.02,
        LoopMostM = loopM + 0.02,
        WidthLeastM = 0.006,
        WidthMostM = 0.05,
        LowerGuideM = 0.05,
        ClearanceM = 0.01,
        CutHeightMostM = 0.4,
        MotorW = 3000,
        Takes = Takes.Board | Takes.Resaw,
        Wheels = { new SetupWheel { DiameterM = 0.6, Driven = true }, new SetupWheel { Position = 1, DiameterM = 0.6 } },
        Speeds = { new SetupSpeed { SpeedMps = 20, Usual = true } },
    };

    public static Spec Spec(string code) => new()
    {
        Code = code,
        WidthM = 0.025,
        ThicknessM = 0.0008,
        PitchCoarseM = 0.008,
        PitchFineM = 0.008,
        GulletDepthM = 0.003,
        NewLoopM = 4,
    };

    public ShopDb Db() => File.NewContext();

    public ShopDb CreateDbContext() => Db();

    public Task<WriteResult> Write(Command command, int? person = null, Guid? op = null) =>
        Writer.Write(command, new Sent(op ?? Guid.NewGuid(), Now, person, "tablet 1"));

    /// <summary>Writes what must be taken, and gives its entry.</summary>
    public async Task<int> Do(Command command, int? person = null)
    {
        var result = await Write(command, person);
        return result is WriteResult.Done done ? done.EntryId : throw new InvalidOperationException($"{command} was not recorded: {Words(result)}");
    }

    /// <summary>Writes what must be refused, and gives the sentences.</summary>
    public async Task<string> Refused(Command command, int? person = null)
    {
        var result = await Write(command, person);
        Assert.IsType<WriteResult.Refused>(result);
        return Words(result);
    }

    public async Task<string> Asked(Command command, int? person = null)
    {
        var result = await Write(command, person);
        Assert.IsType<WriteResult.Ask>(result);
        return Words(result);
    }

    public async Task<int> Person(string initials)
    {
        await using var db = Db();
        return await db.People.Where(p => p.Initials == initials).Select(p => p.Id).SingleAsync();
    }

    public async Task<T> Ask<T>(Func<ShopDb, Task<T>> question)
    {
        await using var db = Db();
        return await question(db);
    }

    public static string Words(WriteResult result) => result switch
    {
        WriteResult.Refused r => string.Join(" | ", r.Problems.Select(p => p.Sentence)),
        WriteResult.Ask a => string.Join(" | ", a.Problems.Select(p => p.Sentence)) + " -> " + a.OneMoreTap,
        WriteResult.Clash c => $"{c.Who} {c.What}",
        _ => result.ToString(),
    };

    public void Dispose()
    {
        Writer.Dispose();
        File.Dispose();
        Directory.Delete(File.Dir, recursive: true);
    }
}
