using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using BladeLog.Tests.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.EdgeCases;

/// <summary>Two tablets at once: released together, so that neither knows of the other.</summary>
public sealed class TwoTabletsTests
{
    private const int Pairs = 500;

    [Fact]
    public async Task Of_a_thousand_pairs_of_conflicting_writes_exactly_one_wins_each_and_the_loser_learns_who_when_and_what()
    {
        using var shop = await TempShop.WithSaws();
        var contexts = new Unsynced(shop.File.Path);
        using var writer = new ShopWriter(contexts);
        var tablets = new[] { (Who: "OT", Id: await shop.Person("OT")), (Who: "JP", Id: await shop.Person("JP")) };
        var on = "";
        for (var i = 0; i < Pairs; i++)
        {
            var now = TempShop.Day.AddMinutes((2 * i) + 1);
            int saw, spec;
            await using (var db = contexts.CreateDbContext())
            {
                saw = await db.Saws.Where(s => s.Code == "S1").Select(s => s.Version).SingleAsync();
                spec = await db.Specs.Where(s => s.Code == "A").Select(s => s.Version).SingleAsync();
            }

            string[] waiting = [.. new[] { "Q-1", "Q-2", "Q-3" }.Where(t => t != on)];
            on = await Pair(
                now,
                n => new Swap("S1") { OnTag = waiting[n], SawVersion = saw, At = now },
                n => $"put {waiting[n]} on First",
                n => waiting[n]);
            var price = await Pair(
                now.AddMinutes(1),
                n => new EditSpec("A", spec, Priced((2 * i) + n)),
                _ => "changed specification A",
                n => $"{(2 * i) + n}");
            await using var after = contexts.CreateDbContext();
            Assert.Equal(on, await after.OnSaws.Join(after.Blades, o => o.BladeId, b => b.Id, (_, b) => b.Tag).SingleAsync());
            Assert.Equal(price, (await after.Specs.Where(s => s.Code == "A").Select(s => s.PriceMinor).SingleAsync())!.Value.ToString(System.Globalization.CultureInfo.InvariantCulture));
        }

        await using var last = contexts.CreateDbContext();
        Assert.Equal(Pairs, await last.Mounts.CountAsync());
        Assert.Equal(Pairs - 1, await last.Dismounts.CountAsync());
        Assert.Empty(await Verify.Run(last));

        async Task<string> Pair(DateTime now, Func<int, Command> command, Func<int, string> what, Func<int, string> won)
        {
            using var barrier = new Barrier(2);
            var answers = await Task.WhenAll(Enumerable.Range(0, 2).Select(n => Task.Run(async () =>
            {
                barrier.SignalAndWait();
                return await writer.Write(command(n), new Sent(Guid.NewGuid(), now, tablets[n].Id, $"tablet {n}"));
            })));
            var winner = Array.FindIndex(answers, a => a is WriteResult.Done);
            Assert.True(winner >= 0, $"Neither was recorded: {TempShop.Words(answers[0])} / {TempShop.Words(answers[1])}");
            var clash = Assert.IsType<WriteResult.Clash>(answers[1 - winner]);
            Assert.Equal((tablets[winner].Who, now, what(winner)), (clash.Who, clash.When, clash.What));
            return won(winner);
        }
    }

    private static Spec Priced(long minor)
    {
        var spec = TempShop.Spec("A");
        spec.PriceMinor = minor;
        return spec;
    }

    /// <summary>The same file without waiting for the disk.</summary>
    private sealed class Unsynced(string path) : IDbContextFactory<ShopDb>
    {
        private readonly DbContextOptions<ShopDb> _options = new DbContextOptionsBuilder<ShopDb>()
            .UseSqlite($"Data Source={path}").AddInterceptors(new Pragmas(synchronous: false)).Options;

        public ShopDb CreateDbContext() => new(_options);
    }
}
