using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Tests.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Saws;

public sealed class SawFormTests
{
    [Fact]
    public async Task A_meter_reading_is_one_field_and_makes_the_hours_since_the_last()
    {
        using var app = await ShopApp.Sample();
        double last;
        await using (var db = app.NewContext())
        {
            last = await db.MeterReadings.Where(r => db.Saws.Any(s => s.Id == r.SawId && s.Code == "S2"))
                .OrderByDescending(r => r.Entry.AtUtc).Select(r => r.ReadingMs / 3_600_000.0).FirstAsync();
        }

        var reading = (last + 0.5).ToString("0.00", System.Globalization.CultureInfo.InvariantCulture);
        (await app.Fill("/saws/S2/hours", ("Reading", reading))).LeadsTo("/saws/S2");
        await using var after = app.NewContext();
        var run = await after.Runs.OrderByDescending(r => r.EntryId).FirstAsync();
        Assert.Equal((RunSource.Meter, HoursGrade.A), (run.Source, run.Grade));
        Assert.InRange(run.RunningMs, 0.49 * 3_600_000, 0.51 * 3_600_000);
        await app.AssertKept();
    }

    [Fact]
    public async Task Hours_with_no_blade_known_are_part_of_the_saws_hours_and_not_counted_twice()
    {
        using var app = await ShopApp.Empty();
        await using (var db = app.NewContext())
        {
            // Ten hours run, of which four fall into a spell of a blade and six into none.
            var day = ShopApp.Today.UtcDateTime.Date.AddDays(-3);
            var blade = new Blade { Tag = "Q-1", Spec = TempShop.Spec("A") };
            var saw = new Saw { Code = "S1", Name = "First" };
            Entry At(int hour, string kind) => new() { Op = Guid.NewGuid(), Kind = kind, AtUtc = day.AddHours(hour), EnteredUtc = day.AddHours(hour) };
            var setup = TempShop.Setup();
            (setup.Saw, setup.Entry) = (saw, At(0, nameof(SawSetup)));
            var mount = new Mount { Entry = At(6, nameof(Mount)), Saw = saw, Blade = blade };
            db.AddRange(setup, mount, new Run { Entry = At(10, nameof(Run)), Saw = saw, FromUtc = day, UntilUtc = day.AddHours(10), RunningMs = 36_000_000, SpeedMps = 20, Grade = HoursGrade.A });
            await db.SaveChangesAsync();
            await Kept.Rebuild(db);
        }

        var json = (await app.GetJson("/api/v1/saws/S1"));
        Assert.Equal((10.0, 6.0), (json.GetProperty("hours").GetDouble(), json.GetProperty("no_blade_known_hours").GetDouble()));
        var page = SampleApp.Text((await app.GetPage("/saws/S1")).Body);
        Assert.Contains("10 h run since this record began", page, StringComparison.Ordinal);
        Assert.Contains("6 h of them with no blade known", page, StringComparison.Ordinal);
        Assert.DoesNotContain("16 h", page, StringComparison.Ordinal);
        Assert.DoesNotContain("16 h", SampleApp.Text((await app.GetPage("/")).Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_reading_lower_than_the_last_asks_what_happened_and_stores_nothing_until_answered()
    {
        using var app = await ShopApp.Sample();
        var before = await app.EntryCount();
        var asked = (await app.Fill("/saws/S2/hours", ("Reading", "0.4"))).Refused();
        Assert.Contains("is lower", asked.Beside("Reading"), StringComparison.Ordinal);
        Assert.Equal("0.4", asked.Typed("Reading"));
        Assert.Equal(before, await app.EntryCount());

        (await app.SendForm(asked.Page, "/saws/S2/hours", ("Answer", "NewMeter"))).LeadsTo("/saws/S2");
        await using var db = app.NewContext();
        Assert.Equal(EpochReason.NewMeter, (await db.MeterEpochs.OrderByDescending(e => e.EntryId).FirstAsync()).Reason);
    }

    [Fact]
    public async Task A_reading_can_be_undone()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/hours", ("Reading", "0.4"), ("Answer", "NewMeter"))).LeadsTo("/saws/S2");
        var page = await app.GetPage("/saws/S2/hours");
        (await app.SendForm(page, page.QuerySelector("form.undo")!.GetAttribute("action")!)).LeadsTo("/saws/S2");
        (await app.Fill("/saws/S2/hours", ("Reading", "0.4"))).Refused();
        await app.AssertKept();
    }

    [Fact]
    public async Task A_saw_with_two_speeds_has_the_last_one_chosen_and_keeps_the_other_when_told()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage("/saws/S3/hours");
        Assert.NotNull(page.QuerySelector("input[name=Speed][checked]"));
        var slow = page.QuerySelectorAll("input[name=Speed]").Single(i => i.ParentElement!.TextContent.Contains("7.6", StringComparison.Ordinal)).GetAttribute("value");
        (await app.SendForm(page, "/saws/S3/hours", ("Running", "0:30"), ("From", "40 min ago"), ("Speed", slow))).LeadsTo("/saws/S3");
        await using var db = app.NewContext();
        Assert.Equal(7.6, (await db.Runs.OrderByDescending(r => r.EntryId).FirstAsync()).SpeedMps, 6);
    }

    [Fact]
    public async Task More_hours_than_the_clock_has_are_refused_and_stay_typed()
    {
        using var app = await ShopApp.Sample();
        var before = await app.EntryCount();
        var answer = (await app.Fill("/saws/S3/hours", ("Running", "9"), ("From", "1 h ago"))).Refused();
        Assert.Contains("would have run", answer.Beside("Running"), StringComparison.Ordinal);
        Assert.Equal("9", answer.Typed("Running"));
        Assert.Equal(before, await app.EntryCount());
    }

    [Fact]
    public async Task One_tap_on_clicking_holds_the_blade_and_says_stop()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/clicking")).LeadsTo("/saws/S2/clicking");
        Assert.True(await app.IsHeld("Q-08"));
        var card = await app.GetPage("/saws/S2/clicking");
        Assert.Equal("Stop Osprey and look", card.QuerySelector("h1")!.TextContent);
        Assert.Null(card.QuerySelector("form[action='/saws/S2/clicking']"));
    }

    [Fact]
    public async Task Clicking_tapped_again_adds_nothing()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage("/saws/S2/clicking");
        (await app.SendForm(page, "/saws/S2/clicking", ("Op", null))).LeadsTo("/saws/S2/clicking");
        var after = await app.EntryCount();
        (await app.SendForm(page, "/saws/S2/clicking", ("Op", null))).LeadsTo("/saws/S2/clicking");
        Assert.Equal(after, await app.EntryCount());
    }

    [Fact]
    public async Task Tension_is_let_off_and_put_on_again_by_one_button()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/slack", ("LetOff", "yes"))).LeadsTo("/saws/S2");
        Assert.Contains("off. Hang the notice", (await app.GetPage("/saws/S2/slack")).Body!.TextContent, StringComparison.Ordinal);
        Assert.Contains("Say whether", (await app.Fill("/saws/S2/slack")).Refused().Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_saw_is_added_by_its_rims_and_tyres()
    {
        using var app = await ShopApp.Empty();
        (await app.Fill(
            "/saws/new", ("Code", "S9"), ("Name", "Plover"), ("Rim", "690"), ("Tyre", "5"), ("Loop", "5080"), ("WidthLeast", "6"), ("WidthMost", "38"),
            ("Speed1", "22"), ("CutHeight", "400"), ("Board", "true"), ("Motor", "4 kW"))).LeadsTo("/");
        await using var db = app.NewContext();
        var setup = await db.SawSetups.Include(s => s.Wheels).SingleAsync();

        // Rim and twice the tyre: 690 + 2 x 5.
        Assert.Equal([0.700, 0.700], setup.Wheels.Select(w => Math.Round(w.DiameterM, 9)));
    }

    [Fact]
    public async Task A_saw_without_a_motor_comes_back_with_what_was_typed()
    {
        using var app = await ShopApp.Empty();
        var answer = (await app.Fill("/saws/new", ("Code", "S9"), ("Name", "Plover"), ("Loop", "much"))).Refused();
        Assert.Contains("motor", answer.Beside("Motor"), StringComparison.Ordinal);
        Assert.Contains("is not a loop length", answer.Beside("Loop"), StringComparison.Ordinal);
        Assert.Equal("much", answer.Typed("Loop"));
        await using var db = app.NewContext();
        Assert.Equal(0, await db.Saws.CountAsync());
    }

    [Fact]
    public async Task A_wheel_typed_wrongly_is_replaced_and_a_real_change_begins_at_its_time()
    {
        using var app = await ShopApp.Sample();
        int setups;
        await using (var db = app.NewContext())
        {
            setups = await db.SawSetups.CountAsync(s => s.Saw.Code == "S2");
        }

        var unsaid = (await app.Fill("/saws/S2/edit", ("Wheel1", "702"), ("Do", "error"))).Refused();
        Assert.Contains("typed wrongly", unsaid.Beside("Reason"), StringComparison.Ordinal);
        (await app.Fill("/saws/S2/edit", ("Wheel1", "702"), ("Do", "error"), ("Reason", "digits turned round"))).LeadsTo("/saws/S2");
        (await app.Fill("/saws/S2/edit", ("Speed1", "25"), ("Do", "change"), ("From", "1 h ago"))).LeadsTo("/saws/S2");
        await using var after = app.NewContext();
        Assert.Equal(setups + 1, await after.SawSetups.CountAsync(s => s.Saw.Code == "S2"));
        await app.AssertKept();
    }
}
