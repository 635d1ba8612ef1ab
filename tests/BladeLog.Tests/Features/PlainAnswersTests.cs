using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features;

/// <summary>What a form says when it cannot take what was typed: in the words and the unit of its own field.</summary>
public sealed class PlainAnswersTests(SampleShopApp shop) : IClassFixture<SampleShopApp>
{
    [Fact]
    public async Task A_meter_that_is_no_number_is_told_how_a_reading_looks() =>
        Assert.Contains("such as 7019.3", (await shop.App.Fill("/saws/S1/hours", ("Reading", "abc"))).Refused().Beside("Reading"), StringComparison.Ordinal);

    [Fact]
    public async Task Minutes_lost_are_limited_in_minutes() =>
        Assert.Contains("The time lost lies between 0\u00a0min and 6,000\u00a0min.", (await shop.App.Fill("/blades/Q-11/break", ("MinutesLost", "99999"))).Refused().Beside("MinutesLost"), StringComparison.Ordinal);

    [Fact]
    public async Task The_length_of_a_cut_is_called_by_its_name() =>
        Assert.Contains("The length of one cut lies between", (await shop.App.Fill("/cuts/new", ("Length", "900000"))).Refused().Beside("Length"), StringComparison.Ordinal);

    [Fact]
    public async Task A_promised_date_is_not_answered_with_yesterday()
    {
        string? beside = (await shop.App.Fill("/bench/batches/new", ("Tags", "Q-11"), ("Promised", "soon"))).Refused().Beside("Promised");
        Assert.Contains("tomorrow or 2026-12-08", beside, StringComparison.Ordinal);
        Assert.DoesNotContain("yesterday", beside, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_wood_nobody_knows_is_not_said_to_be_near_another()
    {
        string? beside = (await shop.App.Fill("/cuts/new", ("Species", "kryptonite"))).Refused().Beside("Species");
        Assert.Contains("lists them all", beside, StringComparison.Ordinal);
        Assert.DoesNotContain("Brass", beside, StringComparison.Ordinal);
        Assert.Contains("Black cherry", (await shop.App.Fill("/cuts/new", ("Species", "chery"))).Refused().Beside("Species"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_date_alone_is_the_beginning_of_that_day_where_nobody_remembers_the_hour()
    {
        using ShopApp app = await ShopApp.Sample();
        await app.Be("MI");
        (await app.Fill("/blades/Q-11/break", ("Site", "Unknown"), ("Earliest", "2026-11-30"), ("Latest", "2026-11-30"))).LeadsTo("/blades/Q-11");
        await using ShopDb db = app.NewContext();
        Break broke = await db.Breaks.Include(b => b.Entry).OrderByDescending(b => b.EntryId).FirstAsync();
        // The shop's clock is UTC.
        Assert.Equal(new DateTime(2026, 11, 30, 0, 0, 0, DateTimeKind.Utc), broke.EarliestUtc);
        Assert.Equal(new DateTime(2026, 11, 30, 23, 59, 0, DateTimeKind.Utc), broke.LatestUtc);
    }

    [Fact]
    public async Task From_when_on_it_was_the_other_blade_takes_a_date_alone()
    {
        Answered answer = await shop.App.Fill("/blades/Q-13/two", ("OtherTag", "Q-99"), ("From", "2026-11-25"));
        // It is taken for that day's beginning, after which this label was on no saw.
        Assert.Contains("from 25 Nov 2026 00:00", answer.Refused().Beside("From"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_time_of_a_run_still_wants_its_hour() =>
        Assert.Contains("is not a time", (await shop.App.Fill("/saws/S3/hours", ("Running", "1"), ("From", "2026-11-30"))).Refused().Beside("From"), StringComparison.Ordinal);
}
