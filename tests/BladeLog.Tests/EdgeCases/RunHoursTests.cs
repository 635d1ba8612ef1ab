using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using BladeLog.Tests.Features;
using BladeLog.Tests.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.EdgeCases;

/// <summary>Running hours: meters, timers, two speeds, and hours derived from cuts.</summary>
public sealed class RunHoursTests
{
    private const long Hour = 3_600_000;
    private static readonly DateTime Day = TempShop.Day;

    [Fact]
    public async Task A_meter_that_counts_power_on_is_multiplied_by_the_saws_own_factor()
    {
        using var app = await ShopApp.Sample();
        var wrong = (await app.Fill("/saws/S2/edit", ("MeterFactor", "1.5"), ("Do", "change"))).Refused();
        Assert.Equal("Running hours for each metered hour: above 0, at most 1.", wrong.Beside("MeterFactor"));
        (await app.Fill("/saws/S2/edit", ("MeterFactor", "0.4"), ("Do", "change"))).LeadsTo("/saws/S2");
        app.Clock.Advance(TimeSpan.FromHours(6));
        double last;
        await using (var db = app.NewContext())
        {
            last = await db.MeterReadings.Where(r => db.Saws.Any(s => s.Id == r.SawId && s.Code == "S2"))
                .OrderByDescending(r => r.Entry.AtUtc).Select(r => r.ReadingMs / 3_600_000.0).FirstAsync();
        }

        (await app.Fill("/saws/S2/hours", ("Reading", (last + 5).ToString("0.0000", System.Globalization.CultureInfo.InvariantCulture)))).LeadsTo("/saws/S2");
        await using var after = app.NewContext();

        // 0.4 of 5 h.
        Assert.Equal(2 * Hour, (await after.Runs.OrderByDescending(r => r.EntryId).FirstAsync()).RunningMs, 1000d);
        await app.AssertKept();
    }

    [Fact]
    public async Task A_two_speed_saw_splits_the_hours_of_one_reading_over_its_speeds()
    {
        using var shop = await TwoSpeeds();
        await shop.Do(new Swap("S3") { OnTag = "Q-1", At = Day });
        await shop.Do(Read(100, 0));
        Assert.Contains("more than the 4 h it ran", await shop.Refused(Read(104, 8) with { SpeedMps = 15, OtherSpeedMps = 7.5, OtherSpeedMs = 5 * Hour }), StringComparison.Ordinal);
        var reading = await shop.Do(Read(104, 8) with { SpeedMps = 15, OtherSpeedMps = 7.5, OtherSpeedMs = Hour });
        Assert.Equal([(7.5, Hour), (15.0, 3 * Hour)], await Exposures(shop));

        // A reading in between divides what the later one had, in the same proportion; struck out, all is as it was.
        var between = await shop.Do(Read(102, 4) with { SpeedMps = 15 });
        Assert.Equal([(7.5, Hour / 2), (15.0, 2 * Hour + (3 * Hour / 2))], await Exposures(shop));
        await shop.Do(new VoidEntry(between, "another saw's"));
        Assert.Equal(4 * Hour, (await Exposures(shop)).Sum(e => e.Ms));
        await shop.Do(new VoidEntry(reading, "x"));
        Assert.Empty(await Exposures(shop));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task The_form_of_a_two_speed_saw_takes_both_and_remembers_the_last_one()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S3/edit", ("HasHourMeter", "true"), ("Do", "name"))).LeadsTo("/saws/S3");
        (await app.Fill("/saws/S3/hours", ("Reading", "10"))).LeadsTo("/saws/S3");
        app.Clock.Advance(TimeSpan.FromHours(5));
        var page = await app.GetPage("/saws/S3/hours");
        var fast = page.QuerySelectorAll("input[name=Speed]").Single(i => i.ParentElement!.TextContent.Contains("15.2", StringComparison.Ordinal)).GetAttribute("value");
        (await app.SendForm(page, "/saws/S3/hours", ("Reading", "13"), ("Speed", fast), ("OtherSpeed", "0:30"))).LeadsTo("/saws/S3");
        await using var db = app.NewContext();
        var runs = await db.Runs.OrderByDescending(r => r.EntryId).Take(2).ToListAsync();
        Assert.Equal([(7.6, Hour / 2), (15.2, 5 * Hour / 2)], runs.OrderBy(r => r.SpeedMps).Select(r => (Math.Round(r.SpeedMps, 3), r.RunningMs)));
        await app.AssertKept();
    }

    [Fact]
    public async Task Undoing_typed_hours_that_took_the_place_of_hours_from_cuts_brings_those_back()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));

        // 12 m at 0.01 m/s are 20 minutes, up to 9:00.
        await shop.Do(RunningTests.Cut(1) with { HoursFromCuts = true });
        var typed = await shop.Do(RunningTests.Typed(0.9, 4, 2));
        Assert.Equal((2 * Hour) + (14 * 60_000), await Total(shop));
        await shop.Do(new VoidEntry(typed, "undone at once") { Together = true });
        Assert.Equal(Hour / 3, await Total(shop));

        // One by one is the same, and a cut struck out meanwhile is not brought back.
        var again = await shop.Do(RunningTests.Typed(0, 4, 2));
        await shop.Do(new VoidEntry(again, "typed wrongly"));
        Assert.Equal(Hour / 3, await Total(shop));
        var third = await shop.Do(RunningTests.Typed(0, 4, 2));
        var cut = await shop.Ask(db => db.CutsDone.Select(c => c.EntryId).SingleAsync());
        await shop.Do(new VoidEntry(cut, "another saw"));
        await shop.Do(new VoidEntry(third, "typed wrongly"));
        Assert.Equal(0, await Total(shop));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task A_cut_struck_out_leaves_its_time_to_the_cut_that_shared_it()
    {
        using var shop = await TempShop.WithSaws();
        var first = await shop.Do(RunningTests.Cut(1) with { HoursFromCuts = true });

        // Ten minutes later, and twenty minutes long: ten of them were counted by the first.
        await shop.Do(RunningTests.Cut(1 + (1 / 6.0)) with { HoursFromCuts = true });
        Assert.Equal(Hour / 2, await Total(shop), 1d);
        await shop.Do(new VoidEntry(first, "written twice"));
        Assert.Equal(Hour / 3, await Total(shop), 1d);
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task Hours_before_and_after_the_phase_inverter_was_turned_up_keep_their_own_speed()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(SwapTests.On("S1", "Q-1", 0));
        await shop.Do(RunningTests.Typed(0, 2, 1));
        var faster = TempShop.Setup();
        faster.Speeds[0].SpeedMps = 25;
        await shop.Do(new NewSetup("S1", faster, Day.AddHours(3)));
        await shop.Do(RunningTests.Typed(4, 8, 2));
        Assert.Equal([(20.0, Hour), (25.0, 2 * Hour)], await Exposures(shop));
    }

    [Fact]
    public async Task A_meter_read_at_the_change_to_a_new_one_counts_both_meters()
    {
        using var shop = await TempShop.WithSaws();
        ReadMeter At(double reading, double hours) => new("S1", (long)(reading * Hour), $"{reading}") { At = Day.AddHours(hours) };
        await shop.Do(At(9990, 0));
        await shop.Do(At(9995, 10));
        Assert.Contains("is lower", await shop.Asked(At(3, 20)), StringComparison.Ordinal);
        await shop.Do(At(3, 20) with { Answer = MeterAnswer.NewMeter, NewMeterAt = Day.AddHours(12), NewMeterStartMs = Hour });

        // 5 h on the old one, 3 - 1 on the new one; what ran between 10 and 12 nobody knows.
        Assert.Equal(7 * Hour, await Total(shop));
        Assert.Equal(2, await shop.Ask(db => db.MeterEpochs.CountAsync()));
    }

    [Fact]
    public async Task A_reading_that_would_give_negative_or_impossible_hours_is_asked_about_and_never_stored_as_it_is()
    {
        using var app = await ShopApp.Sample();
        var before = await app.EntryCount();
        foreach (var reading in new[] { "0.4", "99999" })
        {
            var asked = (await app.Fill("/saws/S2/hours", ("Reading", reading))).Refused();
            Assert.Contains("What happened?", asked.Text, StringComparison.Ordinal);

            // Saying that it was a typing error and sending the same figure again is no answer.
            (await app.SendForm(asked.Page, "/saws/S2/hours", ("Answer", "TypingError"))).Refused();
        }

        (await app.Fill("/saws/S2/hours", ("Reading", "-3"))).Refused();
        Assert.Equal(before, await app.EntryCount());
    }

    private static async Task<TempShop> TwoSpeeds()
    {
        var shop = await TempShop.WithSaws();
        var setup = TempShop.Setup();
        setup.Speeds[0].SpeedMps = 15;
        setup.Speeds.Add(new SetupSpeed { Position = 1, SpeedMps = 7.5 });
        await shop.Do(new AddSaw("S3", "Two speeds", true, setup, Day.AddDays(-1)));
        return shop;
    }

    private static ReadMeter Read(double reading, double hours) => new("S3", (long)(reading * Hour), $"{reading}") { At = Day.AddHours(hours) };

    private static Task<long> Total(TempShop shop) => shop.Ask(db => db.Runs.SumAsync(r => r.RunningMs));

    private static Task<List<(double Speed, long Ms)>> Exposures(TempShop shop) => shop.Ask(async db =>
        (await db.Exposures.GroupBy(e => e.SpeedMps).Select(g => new { g.Key, Ms = g.Sum(e => e.RunningMs) }).ToListAsync()).OrderBy(e => e.Key).Select(e => (e.Key, e.Ms)).ToList());
}
