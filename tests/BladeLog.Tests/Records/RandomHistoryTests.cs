using System.Globalization;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using CsCheck;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using Xunit.Abstractions;

namespace BladeLog.Tests.Records;

/// <summary>
/// Random histories of two saws and three blades, entered out of order and struck out at random. What was kept entry by
/// entry must be what the facts say when they are all counted again.
/// </summary>
public class RandomHistoryTests(ITestOutputHelper output)
{
    private const int Batches = 40;
    private const int HistoriesInBatch = 25;
    private const int Kinds = 21;

    private static readonly Gen<Step[]> History = Gen.Select(Gen.Int[0, Kinds - 1], Gen.Int[0, 2], Gen.Int[0, 999], Gen.Int[0, 480], Gen.Int[1, 60])
        .Select((kind, which, pick, at, length) => new Step(kind, which, pick, at, length)).Array[18];

    [Fact]
    public async Task A_thousand_random_histories_keep_what_a_recount_finds()
    {
        var template = await TempShop.WithSaws();
        var copies = Directory.CreateTempSubdirectory("bladelog-histories");
        try
        {
            var files = Enumerable.Range(0, Batches).Select(i => Path.Combine(copies.FullName, $"{i}.db")).ToList();
            var first = await template.File.CopyTo(Path.Combine(copies.FullName, "template.db"));
            var counts = new Dictionary<string, int>();
            await Parallel.ForEachAsync(Enumerable.Range(0, Batches), new ParallelOptions { MaxDegreeOfParallelism = 2 }, async (batch, _) =>
            {
                File.Copy(first, files[batch]);
                await RunBatch(batch, new Unsynced(files[batch]), counts);
            });

            output.WriteLine(string.Join(", ", counts.OrderBy(c => c.Key, StringComparer.Ordinal).Select(c => $"{c.Key} {c.Value}")));

            // The test is worth something only where much is taken, of every kind.
            Assert.True(counts["taken"] > Batches * HistoriesInBatch * 6, $"Only {counts["taken"]} entries were taken.");
            Assert.True(counts["taken VoidEntry"] > Batches * HistoriesInBatch / 2);
            Assert.True(counts["taken CutDown"] > Batches);
            Assert.True(counts["taken TakeBack"] > Batches / 2);
            Assert.True(counts["shares"] > Batches * HistoriesInBatch * 2);
        }
        finally
        {
            SqliteConnection.ClearAllPools();
            copies.Delete(recursive: true);
            template.Dispose();
        }
    }

    private static async Task RunBatch(int batch, Unsynced contexts, Dictionary<string, int> counts)
    {
        // One stream for each batch, so that the order in which batches run changes nothing.
        var random = new PCG((uint)batch + 1, 20260302);
        using var writer = new ShopWriter(contexts);
        for (var h = 0; h < HistoriesInBatch; h++)
        {
            var steps = History.Generate(random, null, out var _);
            var player = new Player(writer, contexts, $"{h:00}");
            await player.Prepare();
            foreach (var step in steps)
            {
                var (command, result) = await player.Play(step);
                lock (counts)
                {
                    var taken = result is WriteResult.Done ? "taken" : result is WriteResult.Ask ? "asked" : "refused";
                    foreach (var key in new[] { taken, $"{taken} {command.GetType().Name}" })
                    {
                        counts[key] = counts.GetValueOrDefault(key) + 1;
                    }
                }
            }
        }

        await using var db = contexts.CreateDbContext();
        var found = await Verify.Kept(db);
        Assert.True(found.Count == 0, $"Batch {batch}: {string.Join("\n", found.Take(10))}");
        await RunsAddUp(db);
        lock (counts)
        {
            counts["shares"] = counts.GetValueOrDefault("shares") + db.RunShares.Count(s => s.MountId != null);
        }
    }

    /// <summary>Independent of the folds: no millisecond of a run is lost or made.</summary>
    private static async Task RunsAddUp(ShopDb db)
    {
        var runs = await db.Runs.AsNoTracking().ToDictionaryAsync(r => r.EntryId, r => r.RunningMs);
        var shares = (await db.RunShares.AsNoTracking().ToListAsync()).GroupBy(s => s.RunId).ToDictionary(g => g.Key, g => g.Sum(s => s.Ms));
        Assert.Equal(runs.OrderBy(r => r.Key), shares.OrderBy(s => s.Key));
        Assert.Equal(
            await db.RunShares.Where(s => s.MountId != null).SumAsync(s => s.Ms),
            await db.Exposures.SumAsync(e => e.RunningMs));
    }

    private sealed record Step(int Kind, int Which, int Pick, int At, int Length);

    private sealed class Unsynced(string path) : IDbContextFactory<ShopDb>
    {
        private readonly DbContextOptions<ShopDb> _options = new DbContextOptionsBuilder<ShopDb>()
            .UseSqlite($"Data Source={path}").AddInterceptors(new Pragmas(synchronous: false)).Options;

        public ShopDb CreateDbContext() => new(_options);
    }

    /// <summary>Turns a step's numbers into a command that has a fair chance of being taken.</summary>
    private sealed class Player(ShopWriter writer, Unsynced contexts, string name)
    {
        private static readonly DateTime Start = TempShop.Day;
        private readonly DateTime _now = TempShop.Day.AddDays(60);
        private int _from;
        private int _children;
        private int _batches;
        private int _ot;

        public async Task Prepare()
        {
            await using var db = contexts.CreateDbContext();
            _from = await db.Entries.MaxAsync(e => e.Id) + 1;
            _ot = await db.People.Where(p => p.Initials == "OT").Select(p => p.Id).SingleAsync();
            foreach (var command in new Command[]
            {
                new AddSaw($"X{name}", "First", true, TempShop.Setup(), Start.AddDays(-1)),
                new AddSaw($"Y{name}", "Second", false, TempShop.Setup(), Start.AddDays(-1)),
                new AddSpec(TempShop.Spec($"P{name}")),
                new AddBlades($"P{name}", Enumerable.Range(0, 3).Select(i => $"B{name}.{i}").ToList()) { At = Start.AddDays(-1) },
                new Swap($"X{name}") { OnTag = $"B{name}.0", At = Start },
                new Swap($"Y{name}") { OnTag = $"B{name}.1", At = Start },
                new SendBatch($"{name}-first", "a service", [$"B{name}.2"], At: Start),
            })
            {
                Assert.IsType<WriteResult.Done>(await writer.Write(command, new Sent(Guid.NewGuid(), _now, _ot)));
            }
        }

        public async Task<(Command Command, WriteResult Result)> Play(Step step)
        {
            await using var db = contexts.CreateDbContext();
            var command = await Make(db, step);
            return (command, await writer.Write(command, new Sent(Guid.NewGuid(), _now, _ot)));
        }

        private async Task<Command> Make(ShopDb db, Step s)
        {
            var at = Start.AddMilliseconds(s.At * 450_000L + s.Pick);
            var until = at.AddMilliseconds(s.Length * 450_000L);
            var saw = (s.Pick % 2 == 0 ? "X" : "Y") + name;
            var blade = $"B{name}.{s.Which}";
            return s.Kind switch
            {
                0 or 1 or 2 => new Swap(saw) { OnTag = blade, At = at, Although = "as it is", InsideOut = s.Pick % 5 == 0 },
                3 => new Swap(saw) { OnTag = blade, At = at, Until = until, Although = "entered late" },
                4 => new Swap(saw) { At = at, Reason = (OffReason)(s.Pick % 4) },
                5 or 6 => new ReadMeter(saw, s.At * 300_000L + s.Pick, "typed") { At = at },
                7 => new ReadMeter(saw, s.Pick * 1000L, "typed") { At = at, Answer = (MeterAnswer)(1 + s.Pick % 3), RollsOverAtMs = 400_000_000 },
                8 or 9 => new RecordHours(saw, at, until, s.Length * 100_000L + s.Pick, RunSource.Typed),
                10 or 11 or 12 => Cut(saw, s, at),
                13 => new NewSetup(saw, TempShop.Setup(), at),
                14 => await ReplaceSetup(db, saw) ?? new NewSetup(saw, TempShop.Setup(), at),
                15 => new RecordSharpening(blade, GrindKind.Face) { At = at, WidthM = 0.025 - s.Pick * 1e-6, AsMeasured = true },
                16 => (s.Pick % 3) switch
                {
                    0 => new RecordHold(blade, HoldKind.Crack) { At = at },
                    1 => new RecordInspection(blade, Found.Crack) { At = at },
                    _ => new ClearHold(blade, "ground out", _now),
                },
                17 or 18 => await BladeWork(db, s, blade, at),
                _ => await Strike(db, s) ?? Cut(saw, s, at),
            };
        }

        private static RecordCut Cut(string saw, Step s, DateTime at) => new(saw)
        {
            At = at,
            SpeciesKey = "oak",
            SpeciesTyped = "oak",
            WoodClass = $"A{1 + s.Which}",
            Dirt = (Dirt)(s.Pick % 2),
            HeightM = 0.05 + s.Pick / 5000.0,
            LengthM = 0.7 + s.Pick / 300.0,
            Pieces = 1 + s.Length,
            FeedMps = 0.01 + s.Pick / 20000.0,
            HoursFromCuts = s.Pick % 3 == 0,
        };

        private async Task<Command> BladeWork(ShopDb db, Step s, string blade, DateTime at)
        {
            switch (s.Pick % 6)
            {
                case 0:
                    return new RecordBreak(blade, BreakSite.Weld) { LatestUtc = at };
                case 1:
                    return new RecordJoint(blade, 3.99 - s.Pick * 1e-6, "typed", WeldQuality.Doubtful, At: at);
                case 2:
                    return new CutDown(blade, string.Create(CultureInfo.InvariantCulture, $"C{name}.{_children++}"), 3.5, null, WeldQuality.Good) { At = at };
                case 3:
                    return new SendBatch($"{name}-{_batches++}", "a service", [blade], At: at);
                case 4:
                    var away = await db.BatchLines
                        .Where(l => l.EntryId >= _from && !db.BatchReturns.Any(r => r.LineId == l.EntryId))
                        .Select(l => new { l.Batch.Number, l.Blade.Tag }).FirstOrDefaultAsync();
                    return away is null
                        ? new HangUp(blade, Place.Bench, At: at)
                        : new TakeBack(away.Number, [new BackLine(away.Tag, (ReturnOutcome)(s.Pick / 6 % 4)) { WidthM = 0.0249 - s.Pick * 1e-6 }], _now);
                default:
                    return new RecordRetirement(blade, RetireReason.Uneconomic) { At = at, TakeOff = true };
            }
        }

        private async Task<Command?> Strike(ShopDb db, Step s)
        {
            var standing = await db.Entries.Where(e => e.Id >= _from && e.Void == null && !e.Kind.StartsWith("Add")).OrderBy(e => e.Id).Select(e => new { e.Id, e.Kind }).ToListAsync();
            if (standing.Count == 0)
            {
                return null;
            }

            var entry = standing[s.Pick % standing.Count];
            return entry.Kind == nameof(Mount) && s.Which == 0
                ? new MoveSpell(entry.Id, $"B{name}.{(s.At + 1) % 3}", "another label")
                : new VoidEntry(entry.Id, "typed wrongly");
        }

        private static async Task<Command?> ReplaceSetup(ShopDb db, string saw)
        {
            var last = await db.SawSetups.Where(x => x.Saw.Code == saw).OrderByDescending(x => x.EntryId).Select(x => x.EntryId).FirstOrDefaultAsync();
            return last == 0 ? null : new NewSetup(saw, TempShop.Setup(), Replaces: last, Reason: "typed wrongly");
        }
    }
}
