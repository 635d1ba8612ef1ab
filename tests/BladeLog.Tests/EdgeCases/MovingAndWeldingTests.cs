using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Tests.Features;
using BladeLog.Tests.Records;

namespace BladeLog.Tests.EdgeCases;

/// <summary>A blade on more than one saw, shortened, welded again; and what each of it carries on.</summary>
public sealed class MovingAndWeldingTests
{
    private static readonly DateTime Day = TempShop.Day;

    /// <summary>Half the speed, half the bends in an hour: n · 3600 · v / L with two wheels and 4 m.</summary>
    [Fact]
    public async Task A_blade_moved_between_saws_sums_its_damage_saw_by_saw()
    {
        using var shop = await TempShop.WithSaws();
        var small = TempShop.Setup();
        small.Wheels[1].DiameterM = 0.4;
        small.Speeds[0].SpeedMps = 10;
        await shop.Do(new AddSaw("S3", "Small wheels, slow", false, small, Day.AddDays(-1)));
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Typed(0, 4, 2));
        await shop.Do(new Swap("S1") { At = Day.AddHours(4) });
        var once = (await Advice(shop)).Record;
        await shop.Do(SwapTests.On("S3", "Q-1", 5));
        await shop.Do(RunningTests.Typed(5, 9, 2) with { Saw = "S3" });
        var both = await Advice(shop);

        Assert.Equal([36_000.0 * 2, 18_000.0 * 2], RunOnSaw.Of(both.File, both.Body, new ShopAdvice(await shop.Ask(db => ShopNowReader.Read(db, shop.Now))).Settings).Select(r => Math.Round(r.Bends, 6)));
        Assert.True(both.Record.Used.Blade > once.Used.Blade);

        // Bent harder over the smaller wheel, so the second saw used more than half of what the first did with twice the bends.
        Assert.True(both.Record.Used.Gullet - once.Used.Gullet > once.Used.Gullet / 2);
    }

    [Fact]
    public async Task A_three_wheel_saw_bends_the_blade_three_times_a_loop()
    {
        using var shop = await TempShop.WithSaws();
        var three = TempShop.Setup();
        three.Wheels.Add(new SetupWheel { Position = 2, DiameterM = 0.6 });
        await shop.Do(new AddSaw("S3", "Three wheels", false, three, Day.AddDays(-1)));
        await shop.Do(SwapTests.On("S3", "Q-1", 0));
        await shop.Do(RunningTests.Typed(0, 2, 1) with { Saw = "S3" });
        Assert.Equal(3 * 3600 * 20 / 4.0, (await Advice(shop)).Record.Bends, 6);
    }

    [Fact]
    public async Task Each_reweld_shortens_the_blade_until_it_no_longer_fits_the_take_up()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordJoint("Q-1", 3.985, "3985", WeldQuality.Good, At: Day));
        await shop.Do(SwapTests.On("S1", "Q-1", 1));
        await shop.Do(new Swap("S1") { At = Day.AddHours(2) });
        var shorter = new RecordJoint("Q-1", 3.97, "3970", WeldQuality.Good, At: Day.AddHours(3));
        Assert.Contains("No saw here takes a loop of 3,970 mm", await shop.Asked(shorter), StringComparison.Ordinal);
        await shop.Do(shorter with { FitsNone = true });
        Assert.StartsWith("Q-1 is 3,970 mm long; First takes 3,980 mm to 4,020 mm.", await shop.Asked(SwapTests.On("S1", "Q-1", 4)), StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_joint_count_limit_is_what_ends_a_blade_and_the_shop_may_set_it()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(new Swap("S1") { At = Day.AddHours(1) });
        await shop.Do(new RecordJoint("Q-1", 3.995, null, WeldQuality.Good, At: Day.AddHours(2)));
        await shop.Do(SwapTests.On("S1", "Q-1", 3));
        await shop.Do(new Swap("S1") { At = Day.AddHours(4) });
        await shop.Do(new RecordJoint("Q-1", 3.99, null, WeldQuality.Good, At: Day.AddHours(5)));
        var blade = await Advice(shop);
        Assert.Equal((3, LimitKind.Welds), (blade.File.Welds, blade.Limits.GovernedBy));
        await shop.Do(new SaveSetting("blade.most_welds", 4, "4"));
        Assert.NotEqual(LimitKind.Welds, (await Advice(shop)).Limits.GovernedBy);
    }

    [Fact]
    public async Task The_weld_has_its_own_clock_from_its_date_and_the_rest_of_the_blade_keeps_its_damage()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Typed(0, 4, 3));
        await shop.Do(new Swap("S1") { At = Day.AddHours(4) });
        var before = (await Advice(shop)).Record.Used;
        await shop.Do(new RecordJoint("Q-1", 3.995, null, WeldQuality.Good, At: Day.AddHours(5)));
        var after = (await Advice(shop)).Record.Used;
        Assert.True(before.Weld > 0);
        Assert.Equal(0, after.Weld);
        Assert.Equal(before.Gullet, after.Gullet, 9);
    }

    /// <summary>A magazine repair article says the same: another place will fail soon.</summary>
    [Fact]
    public async Task A_blade_worn_out_by_flexing_is_not_worth_joining_again()
    {
        using var app = await ShopApp.Sample();
        Assert.Contains("joined again, it will soon fail at another place", SampleApp.Text((await app.GetPage("/blades/Q-09/join")).Body), StringComparison.Ordinal);
        Assert.DoesNotContain("another place", SampleApp.Text((await app.GetPage("/blades/Q-11/join")).Body), StringComparison.Ordinal);
    }

    private static async Task<BladeAdvice> Advice(TempShop shop)
    {
        var advice = new ShopAdvice(await shop.Ask(db => ShopNowReader.Read(db, shop.Now)));
        return advice.Of(advice.Now.Blade("Q-1")!);
    }
}
