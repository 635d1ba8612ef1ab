using Microsoft.EntityFrameworkCore;

namespace BladeLog.Browser.Tests;

/// <summary>Running hours at the end of the day: the meter's figure where there is one, else as they are known.</summary>
public sealed class HoursJourneyTests(Workbench bench) : IClassFixture<Workbench>
{
    private static readonly TimeSpan Added = TimeSpan.FromHours(1.5);

    [BrowserTheory]
    [ClassData(typeof(TabletsWithAndWithoutScript))]
    public async Task A_meter_reading_takes_two_taps_and_one_figure(string screen, bool script)
    {
        await using var shop = await ServedShop.Sample();
        var before = await RunningMs(shop, "S1");
        var reading = await shop.Ask(db => db.MeterReadings.Where(r => r.Entry.Void == null && r.SawId == db.Saws.Single(s => s.Code == "S1").Id)
            .OrderByDescending(r => r.Entry.AtUtc).Select(r => r.ReadingMs).FirstAsync());
        shop.Clock.Advance(TimeSpan.FromHours(5));
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            await tablet.Open("/");
            await tablet.Tap(tablet.OnTile("S1", "Hours"));
            await tablet.Field("The meter shows").FillAsync(Typed(TimeSpan.FromMilliseconds(reading) + Added));
            await tablet.Tap(tablet.Button("Record"));
            await tablet.IsAt("/saws/S1");
            await Expect(tablet.Foot.GetByRole(AriaRole.Button, new() { Name = "Undo" })).ToContainTextAsync("Old Heron");
            Assert.Equal(2, tablet.Taps);
        }, script);
        Assert.Equal(Added.TotalHours, TimeSpan.FromMilliseconds(await RunningMs(shop, "S1") - before).TotalHours, 0.06);
    }

    [BrowserTheory]
    [ClassData(typeof(TabletsWithAndWithoutScript))]
    public async Task A_saw_without_a_meter_takes_typed_hours(string screen, bool script)
    {
        await using var shop = await ServedShop.Sample();
        var before = await RunningMs(shop, "S4");
        shop.Clock.Advance(TimeSpan.FromHours(5));
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            // On the Floor stands its timer; the hours by hand are on its own page.
            await tablet.Open("/saws/S4");
            await tablet.Tap(tablet.Link("Hours"));
            await tablet.Field("The wheels turned for").FillAsync("1:30");
            await tablet.Tap(tablet.Button("Record"));
            await tablet.IsAt("/saws/S4");
            Assert.Equal(2, tablet.Taps);
        }, script);
        Assert.Equal((long)Added.TotalMilliseconds, await RunningMs(shop, "S4") - before);
    }

    [BrowserFact]
    public async Task A_double_tap_counts_the_hours_once_and_the_undo_takes_them_back()
    {
        await using var shop = await ServedShop.Sample();
        var before = await RunningMs(shop, "S4");
        shop.Clock.Advance(TimeSpan.FromHours(5));
        await bench.At(shop, Screen.Lying, async tablet =>
        {
            await tablet.Open("/saws/S4/hours");
            await tablet.Field("The wheels turned for").FillAsync("1.5");
            await tablet.DoubleTap(tablet.Button("Record"));
            await tablet.IsAt("/saws/S4");
            Assert.Equal((long)Added.TotalMilliseconds, await RunningMs(shop, "S4") - before);
            var undo = tablet.Foot.GetByRole(AriaRole.Button, new() { Name = "Undo" });
            await tablet.Tap(undo);
            await Expect(undo.GetByText("Finch")).ToHaveCountAsync(0);
            Assert.Equal(before, await RunningMs(shop, "S4"));
        });
    }

    [BrowserFact]
    public async Task Words_where_a_figure_belongs_are_answered_beside_the_field()
    {
        await using var shop = await ServedShop.Sample();
        var before = await RunningMs(shop, "S1");
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            tablet.Expects(422);
            await tablet.Open("/saws/S1/hours");
            var field = tablet.Field("The meter shows");
            await field.FillAsync("a lot");
            await tablet.Tap(tablet.Button("Record"));
            await Expect(tablet.Page.GetByRole(AriaRole.Alert)).ToBeVisibleAsync();
            await Expect(field).ToHaveValueAsync("a lot");
            await Expect(field).ToHaveAttributeAsync("aria-invalid", "true");
            Assert.Equal(before, await RunningMs(shop, "S1"));
        });
    }

    private static string Typed(TimeSpan reading) => reading.TotalHours.ToString("0.0", System.Globalization.CultureInfo.InvariantCulture);

    private static Task<long> RunningMs(ServedShop shop, string saw) =>
        shop.Ask(db => db.Runs.Where(r => r.Saw.Code == saw && r.Entry.Void == null).SumAsync(r => r.RunningMs));
}
