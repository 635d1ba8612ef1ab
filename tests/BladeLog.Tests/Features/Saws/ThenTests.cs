using System.Net;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Saws;

/// <summary>Today at 10:30 in the sample shop; Q-08 is on Osprey since two days.</summary>
public sealed class ThenTests
{
    [Fact]
    public async Task Hours_with_no_blade_known_move_to_the_blade_that_is_named()
    {
        using var app = await ShopApp.Sample();
        await app.Be("JP");
        await TakeOff(app);
        await Ran(app, "8:30", "10:00", "1.2");
        var before = await Hours(app, "Q-08");
        Assert.Equal(1.2, await Unknown(app), 9);
        var page = await app.GetPage("/saws/S2");
        Assert.Contains("1.2 h of them with no blade known", SampleApp.Text(page.Body), StringComparison.Ordinal);
        Assert.NotNull(page.QuerySelector("a.btn[href='/saws/S2/then']"));

        var then = await app.GetPage("/saws/S2/then");
        Assert.Equal("2026-12-01 08:30", then.QuerySelector("input[name=At]")!.GetAttribute("value"));
        Assert.Equal("2026-12-01 10:00", then.QuerySelector("input[name=Until]")!.GetAttribute("value"));
        // The one that came off before is offered first.
        Assert.Equal("Q-08", then.QuerySelector("input[name=OnTag]")!.GetAttribute("value"));
        (await app.SendForm(then, "/saws/S2/then", ("OnTag", "Q-08"))).LeadsTo("/saws/S2");
        Assert.Equal(0, await Unknown(app));
        Assert.Equal(before + 1.2, await Hours(app, "Q-08"), 9);
        Assert.DoesNotContain("no blade known", SampleApp.Text((await app.GetPage("/saws/S2")).Body), StringComparison.Ordinal);
        Assert.Null(await app.TagOn("S2"));
        await app.AssertKept();

        // A double tap is one spell.
        (await app.SendForm(then, "/saws/S2/then", ("OnTag", "Q-08"))).LeadsTo("/saws/S2");
        Assert.Equal(before + 1.2, await Hours(app, "Q-08"), 9);
        Assert.Contains("Every hour of Osprey has its blade.", SampleApp.Text((await app.GetPage("/saws/S2/then")).Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_spell_named_ends_where_the_next_blade_went_on_and_one_undo_takes_it_back()
    {
        using var app = await ShopApp.Sample();
        await app.Be("JP");
        await TakeOff(app);
        (await app.Fill("/saws/S2/swap", ("OnTag", "Q-11"), ("At", "9:45"))).LeadsTo("/saws/S2");
        await Ran(app, "8:30", "9:30", "0.9");
        var then = await app.GetPage("/saws/S2/then");
        var open = (await app.SendForm(then, "/saws/S2/then", ("OnTag", "Q-08"), ("Until", ""))).Refused();
        Assert.Contains("Another blade is on now", open.Beside("Until"), StringComparison.Ordinal);
        var late = (await app.SendForm(then, "/saws/S2/then", ("OnTag", "Q-08"), ("Until", "10:00"))).Refused();
        Assert.Contains("Q-11 is on Osprey since", late.Text, StringComparison.Ordinal);
        Assert.Equal("10:00", late.Typed("Until"));
        (await app.SendForm(late.Page, "/saws/S2/then", ("Until", "9:45"))).LeadsTo("/saws/S2");
        Assert.Equal(0, await Unknown(app));
        Assert.Equal("Q-11", await app.TagOn("S2"));

        var page = await app.GetPage("/saws/S2");
        (await app.SendForm(page, page.QuerySelector("form.undo")!.GetAttribute("action")!)).LeadsTo("/saws/S2");
        Assert.Equal(0.9, await Unknown(app), 9);
        await app.AssertKept();
    }

    [Fact]
    public async Task Without_an_answer_nothing_is_saved_and_a_blade_on_another_saw_then_is_not_offered()
    {
        using var app = await ShopApp.Sample();
        await app.Be("JP");
        await TakeOff(app);
        await Ran(app, "8:30", "10:00", "1.2");
        var before = await app.EntryCount();
        var answer = (await app.Fill("/saws/S2/then")).Refused();
        Assert.Contains("Say which blade was on", answer.Beside("OnTag"), StringComparison.Ordinal);
        Assert.Equal(before, await app.EntryCount());
        Assert.DoesNotContain("Q-01", answer.Page.QuerySelectorAll("input[name=OnTag]").Select(i => i.GetAttribute("value")));
        Assert.Equal(HttpStatusCode.NotFound, (await app.Client.GetAsync("/saws/Z9/then")).StatusCode);
    }

    [Fact]
    public async Task Timer_and_hours_ask_who_it_is_where_the_tablet_does_not_know()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/hours?typed=1", ("Running", "0.5"), ("From", "9:00"), ("Until", "10:00"), ("Who", "RU"))).LeadsTo("/saws/S2");
        var timer = await app.GetPage("/saws/S4/timer");
        await using var db = app.NewContext();
        Assert.Equal("RU", await db.Runs.OrderByDescending(r => r.EntryId).Select(r => r.Entry.Person!.Initials).FirstAsync());

        // Known from now on: not asked again.
        Assert.Empty(timer.QuerySelectorAll("input[name=Who]"));
        using var other = await ShopApp.Sample();
        (await other.SendForm(await other.GetPage("/saws/S4/timer"), "/saws/S4/timer/start")).LeadsTo("/saws/S4/timer");
        other.Clock.Advance(TimeSpan.FromMinutes(20));
        var page = await other.GetPage("/saws/S4/timer");
        Assert.NotEmpty(page.QuerySelectorAll("input[name=Who]"));
        (await other.SendForm(page, "/saws/S4/timer", ("Who", "JP"))).LeadsTo("/saws/S4");
        await using var after = other.NewContext();
        Assert.Equal("JP", await after.Runs.OrderByDescending(r => r.EntryId).Select(r => r.Entry.Person!.Initials).FirstAsync());
    }

    [Fact]
    public async Task The_saw_says_when_its_logger_was_last_heard_and_keeps_quiet_where_there_is_none()
    {
        using var app = await ShopApp.Sample();
        Assert.DoesNotContain("Last heard", SampleApp.Text((await app.GetPage("/saws/S3")).Body), StringComparison.Ordinal);
        using var answer = await app.PostJson("/api/v1/runs", new
        {
            saw = "S3",
            op = Guid.NewGuid(),
            from = "2026-12-01T08:00:00Z",
            until = "2026-12-01T09:00:00Z",
            hours = 0.5,
            speed_m_s = 15.2,
            source = "logger",
        });
        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.Contains("Last heard from the logger: 10:30.", SampleApp.Text((await app.GetPage("/saws/S3")).Body), StringComparison.Ordinal);
        Assert.DoesNotContain("Last heard", SampleApp.Text((await app.GetPage("/saws/S4")).Body), StringComparison.Ordinal);
    }

    private static async Task TakeOff(ShopApp app) =>
        (await app.Fill("/saws/S2/swap", ("Reason", "StillSharp"), ("At", "8:00"), ("OnlyOff", "1"))).LeadsTo("/saws/S2");

    private static async Task Ran(ShopApp app, string from, string until, string hours) =>
        (await app.Fill("/saws/S2/hours?typed=1", ("Running", hours), ("From", from), ("Until", until))).LeadsTo("/saws/S2");

    private static async Task<double> Unknown(ShopApp app)
    {
        await using var db = app.NewContext();
        var ms = await db.RunShares.Where(s => s.MountId == null).Join(db.Runs.Where(r => r.Saw.Code == "S2"), s => s.RunId, r => r.EntryId, (s, _) => s.Ms).SumAsync();
        return ms / 3_600_000.0;
    }

    private static async Task<double> Hours(ShopApp app, string tag)
    {
        await using var db = app.NewContext();
        var ms = await db.Exposures.Join(db.Mounts.Where(m => m.Blade.Tag == tag), e => e.MountId, m => m.EntryId, (e, _) => e.RunningMs).SumAsync();
        return ms / 3_600_000.0;
    }
}
