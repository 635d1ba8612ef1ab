using BladeLog.Advice.Life;

namespace BladeLog.Tests.Advice;

public sealed class RunOnSawTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    // Hours and millions of bends of the invented shop's own table (independent program).
    [Theory]
    [InlineData("Q-09", 310, 10.325)]
    [InlineData("Q-30", 11.5, 1.046)]
    [InlineData("Q-32", 9.4, 0.422)]
    public void Hours_on_a_saw_become_bends(string tag, double hours, double millionBends)
    {
        RunOnSaw run = Assert.Single(RunOnSaw.Of(shop.Blade(tag), shop.Of(tag).Body, shop.Advice.Settings));
        Assert.Equal(hours, run.Hours, 6);
        Assert.Equal(millionBends, run.Bends / 1e6, 3);
    }

    [Fact]
    public void What_the_parent_ran_stays_apart()
    {
        IReadOnlyList<RunOnSaw> runs = RunOnSaw.Of(shop.Blade("Q-04b"), shop.Of("Q-04b").Body, shop.Advice.Settings);
        Assert.Equal(2, runs.Count);
        Assert.Equal(63, Assert.Single(runs, r => r.OfAncestor).Hours, 6);
        Assert.Equal(34, Assert.Single(runs, r => !r.OfAncestor).Hours, 6);
        // The table reckons the shortened loop at its saw's nominal 5,080 mm, a thousandth longer than it is.
        Assert.InRange(runs.Sum(r => r.Bends) / 1e6, 2.783, 2.783 * 1.001);
    }
}
