using BladeLog.Advice;
using BladeLog.Advice.Changes;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Tests.Advice;

/// <summary>Before a mount, a weld or a purchase. Figures: demo-shop specification, stories 3 and 10.</summary>
public sealed class BladeWhatIfTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    [Fact]
    public void Shortening_a_blade_for_smaller_wheels_bends_it_harder_and_starts_the_weld_anew()
    {
        // Story 3: 207 MPa on Old Heron, 266 MPa on Osprey; the gullets keep what they have lived through.
        BladeFile parent = Parent();
        BladeComparison told = Compare(parent, "S1", new BladeChange(shop.Saw("S2"), LoopM: 5.075));
        Holds("207", told.Today!.Bending.Megapascals);
        Holds("266", told.Then.Bending.Megapascals);
        Assert.True(told.Rewelded);
        Assert.False(told.AnotherBlade);
        Assert.True(told.Then.LoopFits);
        Assert.Equal(told.Today.Life.Used.Gullet, told.Then.Life.Used.Gullet, 1e-12);
        Assert.True(told.Today.Life.Used.Weld > 0);
        Assert.Equal(0, told.Then.Life.Used.Weld);
        Assert.Equal((1, 2), (told.Today.File.Welds, told.Then.File.Welds));
        Assert.False(Compare(parent, "S1", new BladeChange(shop.Saw("S2"))).Then.LoopFits);
    }

    [Fact]
    public void A_thinner_blade_on_the_mill_lasts_five_times_as_long_and_stands_a_fifth_less_push()
    {
        // Story 10: 380 MPa instead of 452, 75 h instead of 16 h, 235 against 290 N, both new, 300 mm.
        BladeComparison told = BladeWhatIf.Compare(shop.Blade("Q-32"), shop.Saw("S5"), new BladeChange(ThicknessM: 0.9e-3, AsNew: true), 0.300, shop.Advice.Level, AdviceSettings.Handbook);
        BladeComparison asNew = BladeWhatIf.Compare(shop.Blade("Q-32"), shop.Saw("S5"), new BladeChange(AsNew: true), 0.300, shop.Advice.Level, AdviceSettings.Handbook);
        Holds("452", asNew.Then.Bending.Megapascals);
        Holds("380", told.Then.Bending.Megapascals);
        Holds("16", asNew.Then.Result.MedianHours);
        Holds("75", told.Then.Result.MedianHours);
        Holds("290", asNew.Then.Thrust.Allowed.Newtons);
        Holds("235", told.Then.Thrust.Allowed.Newtons);
        Assert.True(told.AnotherBlade);
        Assert.Equal(0, told.Then.Life.Used.Blade);
    }

    [Fact]
    public void Thicker_bends_harder_lasts_no_longer_and_is_pulled_to_less()
    {
        foreach (BladeFile blade in Blades())
        {
            SawNow saw = On(blade);
            BladeStand[] stands = [.. new[] { 0.8, 0.9, 1.0, 1.1, 1.25 }.Select(k => BladeWhatIf.Compare(blade, saw, new BladeChange(ThicknessM: k * blade.ThicknessM, AsNew: true), 0.1, shop.Advice.Level, AdviceSettings.Handbook).Then)];
            foreach ((BladeStand thin, BladeStand thick) in stands.Zip(stands.Skip(1)))
            {
                Assert.True(thick.Bending.Pascals > thin.Bending.Pascals);
                Assert.True(thick.ReachPa is null || thick.ReachPa < thin.ReachPa);
                // Where the saw cannot pull the thicker one as hard, less tension may win back a little life.
                Assert.True(thick.WishedPa is not null || thick.Result.MedianBends <= thin.Result.MedianBends * (1 + 1e-9));
            }
        }
    }

    [Fact]
    public void More_tension_stands_no_less_push_and_lasts_no_longer()
    {
        foreach (BladeFile blade in Blades())
        {
            SawNow saw = On(blade);
            BladeStand[] stands = [.. new[] { 40e6, 70e6, 100e6, 140e6 }.Select(t => BladeWhatIf.Compare(blade, saw, new BladeChange(TensionPa: t), 0.1, shop.Advice.Level, AdviceSettings.Handbook).Then)];
            foreach ((BladeStand low, BladeStand high) in stands.Zip(stands.Skip(1)))
            {
                Assert.True(high.Thrust.Allowed.Newtons >= low.Thrust.Allowed.Newtons - 1e-9);
                Assert.True(high.Result.MedianBends <= low.Result.MedianBends * (1 + 1e-9));
                Assert.True(high.PullN <= saw.Setup.StrandForceMostN * (1 + 1e-9) || saw.Setup.StrandForceMostN is null);
            }
        }
    }

    [Fact]
    public void No_life_is_told_of_a_held_blade()
    {
        BladeFile cracked = shop.Blade("Q-14");
        Assert.False(Compare(cracked, "S2", new BladeChange()).Then.LifeTold);
        Assert.True(Compare(cracked, "S2", new BladeChange(AsNew: true)).Then.LifeTold);
    }

    [Fact]
    public void Nothing_changed_is_the_same_twice()
    {
        foreach (BladeFile blade in Blades())
        {
            BladeComparison same = BladeWhatIf.Compare(blade, On(blade), new BladeChange(), 0.1, shop.Advice.Level, AdviceSettings.Handbook);
            Assert.Equal(same.Today!.Result.MedianBends, same.Then.Result.MedianBends);
            Assert.Equal(same.Today.Life.Used, same.Then.Life.Used);
            Assert.Equal(same.Today.Thrust, same.Then.Thrust);
        }
    }

    private BladeComparison Compare(BladeFile blade, string saw, BladeChange change) =>
        BladeWhatIf.Compare(blade, shop.Saw(saw), change, 0.1, shop.Advice.Level, AdviceSettings.Handbook);

    /// <summary>The blade before it was shortened: the part of its story that ran on Old Heron, on its first weld.</summary>
    private BladeFile Parent()
    {
        BladeFile child = shop.Blade("Q-04b");
        return child with
        {
            SawId = shop.Saw("S1").Saw.Id,
            LoopM = 5.690,
            Welds = 1,
            Weld = WeldQuality.Good,
            Exposures = [.. child.Exposures.Where(e => e.OfAncestor).Select(e => e with { OnThisWeld = true, OfAncestor = false })],
        };
    }

    private IEnumerable<BladeFile> Blades() => shop.Now.Blades.Where(b => b.Place != Place.Gone && shop.Advice.Fitting(b).Any());

    private SawNow On(BladeFile blade) => shop.Advice.Fitting(blade).First();

    private static void Holds(string printed, double actual) => Assert.True(Printed.Of(printed).Holds(actual, 0.01), $"{printed} expected, {actual:G6} found");
}
