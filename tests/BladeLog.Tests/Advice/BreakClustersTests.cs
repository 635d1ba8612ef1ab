using BladeLog.Advice;
using BladeLog.Records;

namespace BladeLog.Tests.Advice;

/// <summary>The planted cluster is the invented shop's first story: four thick blades on the three-wheel saw.</summary>
public sealed class BreakClustersTests(SampleShopApp sample) : IClassFixture<SampleShopApp>
{
    [Fact]
    public async Task The_four_thick_blades_on_the_three_wheel_saw_are_found_and_nothing_else()
    {
        (IReadOnlyList<WatchedBlade> blades, ShopNow shop) = await Watched();
        BreakCluster found = Assert.Single(BreakClusters.Find(blades));
        Assert.Equal(shop.Saw("S4")!.Saw.Id, found.SawId);
        Assert.Equal(323, found.OneOver);
        Assert.Equal(4, found.Blades);
        Assert.Equal(["Q-26", "Q-27", "Q-28", "Q-29"], found.Broken.Select(b => b.Tag));
        Assert.Equal(4, found.BreaksOnSaw);
        Assert.Equal(1.2, found.UnderHours, 6);
        Assert.True(found.Expected < 1, $"{found.Expected} breaks expected.");
    }

    [Fact]
    public async Task Re_shuffled_breaks_show_a_cluster_in_fewer_than_five_of_a_hundred()
    {
        (IReadOnlyList<WatchedBlade> blades, _) = await Watched();
        var random = new Random(20261201);
        int alarms = 0;
        for (int i = 0; i < 200; i++)
        {
            WatchedBlade[] fates = [.. blades];
            random.Shuffle(fates);
            WatchedBlade[] shuffled = [.. blades.Zip(fates, (place, fate) => place with { FromHours = fate.FromHours, Hours = fate.Hours, Broke = fate.Broke })];
            alarms += BreakClusters.Find(shuffled, 999, i).Count > 0 ? 1 : 0;
        }

        Assert.True(alarms < 10, $"{alarms} false alarms in 200.");
    }

    /// <summary>By hand: breaks at 1 h (3 at risk) and 3 h (1 at risk); the blade whole at 2 h saw only the first.</summary>
    [Fact]
    public void Expected_breaks_add_up_the_share_of_each_break_among_those_at_risk()
    {
        WatchedBlade[] blades = [Blade("a", 1, true), Blade("b", 2, false), Blade("c", 3, true)];
        double[] expected = BreakClusters.Expected(blades);
        Assert.Equal(1 / 3.0, expected[0], 12);
        Assert.Equal(1 / 3.0, expected[1], 12);
        Assert.Equal(4 / 3.0, expected[2], 12);
    }

    /// <summary>Log-rank scores sum to nothing, whoever came under watch late.</summary>
    [Fact]
    public async Task Expected_breaks_of_all_blades_are_the_breaks()
    {
        (IReadOnlyList<WatchedBlade> blades, _) = await Watched();
        Assert.Equal(blades.Count(b => b.Broke), BreakClusters.Expected(blades).Sum(), 9);
    }

    [Fact]
    public void A_blade_cut_from_another_is_not_at_risk_before_it_was_cut()
    {
        WatchedBlade[] blades = [Blade("a", 1, true), Blade("b", 5, false) with { FromHours = 2 }];
        Assert.Equal(0, BreakClusters.Expected(blades)[1]);
    }

    [Fact]
    public void Two_breaks_are_no_cluster() =>
        Assert.Empty(BreakClusters.Find([Blade("a", 0.1, true), Blade("b", 0.2, true), .. Enumerable.Range(0, 40).Select(i => Blade($"w{i}", 100, false) with { SawId = 2 })]));

    [Fact]
    public void Three_early_breaks_among_forty_long_lived_blades_are_one() =>
        Assert.Single(BreakClusters.Find([Blade("a", 0.1, true), Blade("b", 0.2, true), Blade("c", 0.3, true), .. Enumerable.Range(0, 40).Select(i => Blade($"w{i}", 100, false) with { SawId = 2 })]));

    private static WatchedBlade Blade(string tag, double hours, bool broke) => new(tag, 1, 1 / 323.0, 0, hours, broke);

    private async Task<(IReadOnlyList<WatchedBlade> Blades, ShopNow Shop)> Watched()
    {
        await using ShopDb db = sample.App.NewContext();
        ShopNow shop = await ShopNowReader.Read(db, ShopApp.Today.UtcDateTime);
        var advice = new ShopAdvice(shop);
        return (BreakClusters.Watched(shop.Blades.Select(advice.Of), advice.Settings), shop);
    }
}
