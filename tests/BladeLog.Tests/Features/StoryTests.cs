using BladeLog.Features;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Tests.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features;

public sealed class StoryTests
{
    private static readonly string[] Kinds =
        [.. typeof(Fact).Assembly.GetTypes().Where(t => t.IsSubclassOf(typeof(Fact)) && t != typeof(VoidFact)).Select(t => t.Name)];

    [Fact]
    public async Task Every_kind_of_fact_is_read_back_and_has_its_wording()
    {
        using var shop = await ShopOfEveryFact();
        var (story, lines) = await Read(shop);
        Assert.All(Kinds, kind => Assert.Contains(lines, l => l.Entry.Kind == kind));
        Assert.All(lines.Where(l => Kinds.Contains(l.Entry.Kind)), l =>
        {
            Assert.NotNull(l.Fact);
            foreach (var about in Enum.GetValues<About>())
            {
                var says = story.Says(l.Fact, about);
                Assert.Contains(' ', says);
                Assert.Matches("^[A-Z]", says);
                Assert.DoesNotContain("..", says, StringComparison.Ordinal);
            }
        });
    }

    [Theory]
    [InlineData(About.Shop, "Q-1 on First", "Q-1 sharpened, faces, width now 24.8 mm")]
    [InlineData(About.Blade, "Put on First", "Sharpened, faces, width now 24.8 mm")]
    [InlineData(About.Saw, "Q-1 on", "Q-1 sharpened, faces, width now 24.8 mm")]
    internal async Task A_line_does_not_name_again_what_its_page_names(About about, string mounted, string ground)
    {
        using var shop = await ShopNowTests.CutDownShop();
        var (story, lines) = await Read(shop);
        string Said<T>()
            where T : Fact => story.Says(lines.Last(l => l.Fact is T).Fact!, about).Replace('\u00a0', ' ');
        Assert.Equal(mounted, Said<Mount>());
        Assert.Equal(ground, Said<Sharpening>());
    }

    private static async Task<(Story Story, IReadOnlyList<PastEntry> Lines)> Read(TempShop shop)
    {
        await using var db = shop.CreateDbContext();
        var now = await ShopNowReader.Read(db, shop.Now);
        var specs = await db.Specs.ToDictionaryAsync(s => s.Id, s => s.Code);
        return (new Story(now, Desk.Units(now.Shop), specs), (await Past.OfShop(db, 500)).Lines);
    }

    private static async Task<TempShop> ShopOfEveryFact()
    {
        var shop = await ShopNowTests.CutDownShop();
        await shop.Do(new RecordDrift("S1", "Q-2", 0.02));
        await shop.Do(new RecordTension("S1", "Q-2", 1e8, "100", "gauge"));
        await shop.Do(new RecordStock("A", 3, "bought"));
        await shop.Do(new HangUp("Q-2", Place.Rack, "R2-4"));
        await shop.Do(new RetagBlade("Q-2", "Q-7"));
        await shop.Do(new RecordPriorUse("Q-7", 0.2, 0.6));
        await shop.Do(new SendBatch("B-1", "a service", ["Q-7"]));
        await shop.Do(new TakeBack("B-1", [new BackLine("Q-7", ReturnOutcome.Sharpened)]));
        await shop.Do(new RecordRetirement("Q-7", RetireReason.Sold));
        await shop.Do(new RecordInspection("Q-3", Found.Crack));
        await shop.Do(new ClearHold("Q-3", "ground out"), await shop.Person("OT"));
        await shop.Do(new SlackTension("S1", true));
        await shop.Do(new ReadMeter("S1", 0, "0"));
        await shop.Do(RunningTests.Cut(1));
        await shop.Do(new ReadHandOver(await shop.Do(new SaveHandOver("Q-3 hangs on H-1."), await shop.Person("OT"))), await shop.Person("JP"));
        await shop.Do(new RecordTraining("JP", TrainedTask.Sharpen, "OT"));
        await shop.Do(new RecordLabels(["Q-3"]));
        await shop.Do(new RecordKerf("Q-3", KerfHow.TestCut) { KerfM = 0.0013 });
        await shop.Do(new CheckSaw("S1", Guards: true, Tension: null, UnderTable: true, Quiet: null, Brake: false));
        await shop.Do(new StartTimer("S1"));
        return shop;
    }
}
