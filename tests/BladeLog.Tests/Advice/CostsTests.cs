using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Advice;

/// <summary>Hand sums are added up here from the invented shop's CSV files in whole numbers, apart from the program's own way.</summary>
public sealed class CostsTests(SampleShopApp sample) : IClassFixture<SampleShopApp>
{
    [Theory]
    [InlineData("Q-09")]
    [InlineData("Q-01")]
    [InlineData("Q-07")]
    [InlineData("Q-32")]
    public async Task Cost_per_square_metre_is_the_hand_sum(string tag)
    {
        Dictionary<string, string> blade = Csv("blades.csv").Single(b => b["tag"] == tag);
        long price = long.Parse(Csv("specs.csv").Single(s => s["spec"] == blade["spec"])["price_minor"]);
        long sharpened = Csv("sharpenings.csv").Where(s => s["tag"] == tag).Sum(s => long.Parse(s["price_minor"]));
        decimal m2 = Csv("cuts.csv").Where(c => c["tag"] == tag).Sum(Mm2) / 1_000_000;
        CostSoFar cost = (await OfBlades()).Values.Single(c => c.Name == tag);
        Assert.Equal(price, cost.Spent.Bought);
        Assert.Equal(sharpened, cost.Spent.Sharpened);
        Assert.Equal(0, cost.Spent.Broke);
        Assert.Equal((double)m2, cost.Work.AreaM2, 6);
        Assert.Equal((double)((price + sharpened) / m2), cost.PerSquareMetre!.Value, 6);
    }

    /// <summary>The hand sum written out: 41.00 and nine sharpenings of 63.00 together over 656.99 m².</summary>
    [Fact]
    public async Task The_old_resaw_blade_costs_sixteen_cents_a_square_metre()
    {
        CostSoFar cost = (await OfBlades()).Values.Single(c => c.Name == "Q-09");
        Assert.Equal(10_400, cost.Spent.Total);
        Assert.Equal(0.16, Math.Round(cost.PerSquareMetre!.Value / 100, 2));
    }

    [Fact]
    public async Task All_cuts_of_the_shop_are_on_some_blade()
    {
        CostSoFar all = Costs.Together("all", (await OfBlades()).Values);
        List<Dictionary<string, string>> cuts = Csv("cuts.csv");
        Assert.Equal((double)(cuts.Sum(Mm2) / 1_000_000), all.Work.AreaM2, 5);
        Assert.Equal(cuts.Sum(c => long.Parse(c["pieces"])), all.Work.Cuts);
        // Nine breaks, 255 minutes at 48.00 an hour, each rounded to the cent by itself.
        Assert.Equal(Csv("breaks.csv").Sum(b => (long)Math.Round(decimal.Parse(b["minutes_lost"]) / 60 * 4800)), all.Spent.Broke);
    }

    [Fact]
    public async Task A_blade_cut_from_another_was_not_bought_again_and_brings_its_own_hours_only()
    {
        CostSoFar cost = (await OfBlades()).Values.Single(c => c.Name == "Q-04b");
        Assert.Equal(0, cost.Spent.Bought);
        Assert.Equal(34, cost.Work.Hours, 2);
    }

    [Fact]
    public void A_blade_with_no_cut_logged_is_told_by_the_hour()
    {
        var cost = new CostSoFar("x", new WorkDone(0, 0, 0, 5), new MoneySpent(2_000, 500, 0));
        Assert.Null(cost.PerSquareMetre);
        Assert.Null(cost.PerCut);
        Assert.Equal(500, cost.PerHour!.Value, 9);
    }

    [Fact]
    public void A_square_foot_of_face_is_a_board_foot_of_inch_boards() => Assert.Equal(1, new WorkDone(1, 0.09290304, 1, 0).BoardFeet, 12);

    /// <summary>Figures of the invented shop's story on steel against carbide: independent program.</summary>
    [Theory]
    [InlineData(900, 4_100, 12, 11.2, 7.5)]
    [InlineData(4_500, 21_000, 5, 104, 5.3)]
    public void Steel_teeth_cost_more_than_carbide_ones_in_the_same_wood(long sharpening, long price, int grinds, double km, double cents) =>
        Assert.Equal(cents, Costs.ToothCost(sharpening, price, grinds, km, new Speed(4 / 60.0), new Length(5.080), new Speed(23.5)), 1);

    /// <summary>The same from the shop's own blades: path to dull by the handbook.</summary>
    [Theory]
    [InlineData("Q-09", 0.075)]
    [InlineData("Q-07", 0.053)]
    public async Task The_shop_s_own_blades_give_the_same(string tag, double money)
    {
        ShopNow shop = await Shop();
        BladeAdvice blade = new ShopAdvice(shop).Of(shop.Blade(tag)!);
        Spec spec = blade.File.Spec;
        double minor = Costs.ToothCost(spec.SharpeningPriceMinor!.Value, spec.PriceMinor!.Value, spec.MostSharpenings!.Value, blade.Edge.PathToDullKm, new Speed(4 / 60.0), new Length(5.080), new Speed(23.5));
        Assert.Equal(money, minor / 100, 3);
    }

    /// <summary>Story of the blade near its end: giving it up early costs (1 - 0.862) x 41.00 = 5.66.</summary>
    [Fact]
    public async Task Retiring_the_old_resaw_blade_early_costs_what_is_unused_of_its_price()
    {
        ShopNow shop = await Shop();
        var advice = new ShopAdvice(shop);
        KeepOrRetire choice = KeepOrRetire.Of(advice.Of(shop.Blade("Q-09")!), advice.Settings)!;
        Assert.Equal(5.66, choice.Retire / 100, 2);
        Assert.Equal(choice.Chance * 75, choice.Keep / 100, 9);
        Assert.Equal(10, choice.Hours);
    }

    [Fact]
    public async Task Nothing_is_told_of_keeping_a_held_blade()
    {
        ShopNow shop = await Shop();
        var advice = new ShopAdvice(shop);
        Assert.Null(KeepOrRetire.Of(advice.Of(shop.Blade("Q-14")!), advice.Settings));
    }

    /// <summary>Story of the idle saw: Osprey ran 883 h, its cut log accounts for 41 %.</summary>
    [Fact]
    public async Task The_resaw_ran_more_than_twice_as_long_as_it_cut()
    {
        await using ShopDb db = sample.App.NewContext();
        SawNow saw = (await Shop()).Saw("S2")!;
        var cuts = await db.CutsDone.Where(c => c.SawId == saw.Saw.Id).Select(c => new { c.LengthM, c.Pieces, c.FeedMps }).ToListAsync();
        IdleShare idle = IdleShare.Of(saw.RunningMs, cuts.Select(c => (c.LengthM, c.Pieces, c.FeedMps)));
        Assert.Equal(883, idle.Run, 1);
        Assert.Equal(0.41, idle.Accounted!.Value, 2);
        Assert.Equal("Ran 883 h; the cuts logged account for 41 %.", idle.Says());
        Assert.Null(new IdleShare(0, 0).Says());
    }

    private static decimal Mm2(Dictionary<string, string> cut) => decimal.Parse(cut["height_mm"]) * decimal.Parse(cut["length_mm"]) * int.Parse(cut["pieces"]);

    private static List<Dictionary<string, string>> Csv(string file)
    {
        string[] lines = File.ReadAllLines(Path.Combine(SampleShop.Folder, file));
        string[] names = lines[0].Split(',');
        return [.. lines.Skip(1).Select(l => l.Split(',')).Select(cells => names.Zip(cells).ToDictionary(p => p.First, p => p.Second))];
    }

    private async Task<ShopNow> Shop()
    {
        await using ShopDb db = sample.App.NewContext();
        return await ShopNowReader.Read(db, ShopApp.Today.UtcDateTime);
    }

    private async Task<IReadOnlyDictionary<int, CostSoFar>> OfBlades()
    {
        await using ShopDb db = sample.App.NewContext();
        ShopNow shop = await ShopNowReader.Read(db, ShopApp.Today.UtcDateTime);
        var off = await db.Dismounts.Select(d => new { d.MountId, d.Entry.AtUtc }).ToDictionaryAsync(d => d.MountId, d => d.AtUtc);
        var on = await db.Mounts.Select(m => new { m.EntryId, m.SawId, m.BladeId, m.Entry.AtUtc }).ToListAsync();
        return Costs.OfBlades(
            shop.Blades,
            on.Select(m => new SpellOf(m.SawId, m.BladeId, m.AtUtc, off.TryGetValue(m.EntryId, out DateTime at) ? at : null)),
            await db.CutsDone.Include(c => c.Entry).ToListAsync(),
            await db.Sharpenings.ToListAsync(),
            await db.Breaks.ToListAsync(),
            shop.Shop);
    }
}
