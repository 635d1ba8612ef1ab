using BladeLog.Records;
using BladeLog.Tests.Features;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.EdgeCases;

/// <summary>What goes to a sharpener and what comes back of it.</summary>
public sealed class SendOutTests
{
    [Fact]
    public async Task One_blade_missing_keeps_the_batch_open()
    {
        using var app = await Sent();
        (await Back(app, ("Lines[0].Outcome", "Sharpened"), ("Lines[0].Width", "12.6"))).LeadsTo("/bench");
        Assert.Contains("B-032", (await app.GetPage("/bench")).Body!.TextContent, StringComparison.Ordinal);
        Assert.Equal(Place.AtSharpener, await PlaceOf(app, "Q-13"));
        Assert.Equal(Place.Rack, await PlaceOf(app, "Q-11"));
    }

    [Fact]
    public async Task A_whole_bundle_comes_back_in_one_tap_but_for_what_is_said_otherwise()
    {
        using var app = await Sent();
        (await Back(app, ("Lines[1].Outcome", "Rejected"), ("Lines[0].Width", "12.5"), ("All", "1"))).LeadsTo("/bench");
        await using var db = app.NewContext();
        Assert.Equal(ReturnOutcome.Sharpened, (await db.BatchReturns.SingleAsync(r => r.Line.Blade.Tag == "Q-11" && r.Line.Batch.Number == "B-032")).Outcome);
        Assert.Equal(ReturnOutcome.Rejected, (await db.BatchReturns.SingleAsync(r => r.Line.Blade.Tag == "Q-13" && r.Line.Batch.Number == "B-032")).Outcome);
        Assert.Equal(0.0125, (await db.BladesNow.SingleAsync(n => db.Blades.Any(b => b.Id == n.BladeId && b.Tag == "Q-11"))).WidthM, 9);
    }

    [Theory]
    [InlineData("Z-77", "Z-77 is no blade of this shop. Lay it aside")]
    [InlineData("q-09", "Q-09 was not sent out, so far as is written.")]
    [InlineData("Q-08", "Q-08 is written as on a saw. One of the two wears the wrong label")]
    [InlineData("Q-07", "Q-07 went out in batch B-031")]
    public async Task One_foreign_blade_in_the_bundle_is_told_whose_it_may_be_and_nothing_is_recorded(string tag, string words)
    {
        using var app = await Sent();
        var before = await app.EntryCount();
        var page = await app.GetPage($"/bench/batches/B-032?stranger={tag}");
        Assert.Contains(words, SampleApp.Text(page.Body), StringComparison.Ordinal);
        Assert.Equal(before, await app.EntryCount());
    }

    [Fact]
    public async Task One_rejected_by_the_service_goes_straight_to_retire_with_that_reason()
    {
        using var app = await Sent();
        (await Back(app, ("Lines[0].Outcome", "Rejected"), ("Lines[0].Retire", "true"))).LeadsTo("/bench");
        await using var db = app.NewContext();
        Assert.Equal(RetireReason.Rejected, (await db.Retirements.SingleAsync(r => r.Blade.Tag == "Q-11")).Reason);
        Assert.Equal(Place.Gone, await PlaceOf(app, "Q-11"));
        Assert.Equal(0, await db.Sharpenings.CountAsync(s => s.Blade.Tag == "Q-11" && s.BatchId != null && s.Entry.AtUtc > ShopApp.Today.UtcDateTime));
    }

    [Fact]
    public async Task Returned_narrower_than_its_least_width_is_asked_about_and_then_to_be_retired()
    {
        using var app = await Sent();
        var before = await app.EntryCount();
        var asked = (await Back(app, ("Lines[0].Outcome", "Sharpened"), ("Lines[0].Width", "9"))).Refused();
        Assert.Contains("its least width is", asked.Page.GetElementById("f-Lines-0-Width-err")!.TextContent, StringComparison.Ordinal);
        Assert.Equal(before, await app.EntryCount());
        (await app.SendForm(asked.Page, "/bench/batches/B-032", ("AsMeasured", "1"))).LeadsTo("/bench");
        Assert.Equal(Place.Rack, await PlaceOf(app, "Q-11"));
        Assert.Contains("retire it", SampleApp.Text((await app.GetPage("/blades/Q-11")).QuerySelector("h1")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Came_back_with_another_set_the_measured_kerf_wins()
    {
        using var app = await Sent();
        (await Back(app, ("Lines[0].Outcome", "Sharpened"), ("Lines[0].Kerf", "1.85"))).LeadsTo("/bench");
        Assert.Contains("1.85", SampleApp.Text((await app.GetPage("/blades/Q-11")).Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Two_services_at_once_have_each_their_own_batch()
    {
        using var app = await Sent();
        (await app.Fill("/bench/batches/new", ("Tags", "Q-09"), ("Service", "the other grinder"))).LeadsTo("/bench");
        var bench = SampleApp.Text((await app.GetPage("/bench")).Body);
        Assert.Contains("B-032", bench, StringComparison.Ordinal);
        Assert.Contains("B-033", bench, StringComparison.Ordinal);
        Assert.Contains("the other grinder", bench, StringComparison.Ordinal);
        Assert.Contains("Q-09 is away in batch B-033 already", (await app.Fill("/bench/batches/new", ("Tags", "Q-09"))).Refused().Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Lost_in_the_post_is_gone_and_comes_back_after_all()
    {
        using var app = await Sent();
        (await Back(app, ("Lines[0].Outcome", "Lost"))).LeadsTo("/bench");
        Assert.Equal(Place.Gone, await PlaceOf(app, "Q-11"));
        await using (var db = app.NewContext())
        {
            Assert.Equal(RetireReason.Lost, (await db.Retirements.SingleAsync(r => r.Blade.Tag == "Q-11")).Reason);
        }

        app.Clock.Advance(TimeSpan.FromDays(20));
        Assert.Contains("Q-11, written as lost", SampleApp.Text((await app.GetPage("/bench/batches/B-032")).Body), StringComparison.Ordinal);
        (await Back(app, ("Lines[1].Outcome", "Sharpened"), ("Lines[1].Width", "12.6"))).LeadsTo("/bench");
        Assert.Equal(Place.Rack, await PlaceOf(app, "Q-11"));
        await using var after = app.NewContext();
        Assert.False(await after.Retirements.AnyAsync(r => r.Blade.Tag == "Q-11"));
        Assert.Contains("It came back after all.", await after.Voids.Select(v => v.Reason).ToListAsync());
        await app.AssertKept();
    }

    [Fact]
    public async Task A_blade_returned_after_it_was_written_off_is_on_the_rack_again()
    {
        using var app = await Sent();
        (await app.Fill("/blades/Q-11/retire", ("Reason", "Lost"))).LeadsTo("/blades/Q-11");
        Assert.Equal(Place.Gone, await PlaceOf(app, "Q-11"));
        app.Clock.Advance(TimeSpan.FromDays(30));
        (await Back(app, ("Lines[0].Outcome", "Unsharpened"))).LeadsTo("/bench");
        Assert.Equal(Place.Rack, await PlaceOf(app, "Q-11"));
        await app.AssertKept();
    }

    /// <summary>Q-11 and Q-13 are away in B-032.</summary>
    private static async Task<ShopApp> Sent()
    {
        var app = await ShopApp.Sample();
        (await app.Fill("/bench/batches/new", ("Tags", "Q-11 Q-13"))).LeadsTo("/bench");
        app.Clock.Advance(TimeSpan.FromDays(2));
        return app;
    }

    private static Task<Answered> Back(ShopApp app, params (string, string?)[] typed) => app.Fill("/bench/batches/B-032", typed);

    private static async Task<Place> PlaceOf(ShopApp app, string tag)
    {
        await using var db = app.NewContext();
        return (await db.BladesNow.SingleAsync(n => db.Blades.Any(b => b.Id == n.BladeId && b.Tag == tag))).Place;
    }
}
