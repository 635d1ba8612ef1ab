using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Bench;

public sealed class BenchTests
{
    [Fact]
    public async Task The_bench_says_what_to_do_today_and_what_is_away()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage("/bench");
        var text = page.Body!.TextContent;
        Assert.Contains("B-031", text, StringComparison.Ordinal);
        Assert.NotNull(page.QuerySelector("a[href='/blades/Q-14/clear']"));
        Assert.NotNull(page.QuerySelector("a[href='/bench/batches/B-031']"));
    }

    [Fact]
    public async Task The_title_of_the_bench_counts_holds_too()
    {
        using var app = await ShopApp.Sample();
        Assert.StartsWith("Bench: 1 on hold, ", SampleApp.Text((await app.GetPage("/bench")).QuerySelector("h1")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_dull_blade_on_a_saw_is_named_where_a_batch_is_put_together()
    {
        using var app = await ShopApp.Sample();
        Assert.Contains("Q-32", SampleApp.Text((await app.GetPage("/bench")).Body), StringComparison.Ordinal);
        var text = SampleApp.Text((await app.GetPage("/bench/batches/new")).Body);
        Assert.Contains("Dull and still on a saw: Q-32 on Longreach. Take it off first.", text, StringComparison.Ordinal);
        Assert.DoesNotContain("None is dull.", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_to_do_with_a_blade_on_the_bench_reads_as_something_to_tap()
    {
        using var app = await ShopApp.Sample();
        Assert.All((await app.GetPage("/bench")).QuerySelectorAll(".chapter .hang .t"), t => Assert.NotNull(t.QuerySelector(".act")));
    }

    [Fact]
    public async Task A_docket_says_that_it_prints_where_no_sheet_is_shown()
    {
        using var app = await ShopApp.Sample();
        Assert.Contains("On a tablet the sheet is not shown; it prints all the same.", SampleApp.Text((await app.GetPage("/bench/batches/B-031/docket")).QuerySelector(".ask")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_blade_that_came_off_dull_is_on_the_list_until_it_is_ground()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/swap?on=Q-11", ("Reason", "Dull"))).LeadsTo("/saws/S2");
        Assert.NotNull((await app.GetPage("/bench")).QuerySelector("a[href='/blades/Q-08/sharpen']"));
        app.Clock.Advance(TimeSpan.FromMinutes(5));
        (await app.Fill("/blades/Q-08/sharpen", ("Kind", "Face"))).LeadsTo("/blades/Q-08");
        Assert.Null((await app.GetPage("/bench")).QuerySelector("a[href='/blades/Q-08/sharpen']"));
    }

    [Fact]
    public async Task A_batch_goes_out_under_the_next_number_and_comes_back_in_parts()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/bench/batches/new", ("Tags", "Q-11 q-13"), ("Promised", "2026-12-10"))).LeadsTo("/bench");
        Assert.Contains("B-032", (await app.GetPage("/bench")).Body!.TextContent, StringComparison.Ordinal);

        app.Clock.Advance(TimeSpan.FromDays(2));
        (await app.Fill("/bench/batches/B-032", ("Lines[1].Outcome", "Sharpened"), ("Lines[1].Width", "24.2"))).LeadsTo("/bench");
        await using var db = app.NewContext();
        Assert.Equal(1, await db.BatchReturns.CountAsync(r => r.Line.Batch.Number == "B-032"));
        Assert.Contains("back, sharpened", (await app.GetPage("/bench/batches/B-032")).Body!.TextContent, StringComparison.Ordinal);
        (await app.Fill("/bench/batches/B-032", ("Lines[0].Outcome", "Rejected"), ("Lines[0].Retire", "true"))).LeadsTo("/bench");
        Assert.Contains("All of it is back", (await app.GetPage("/bench/batches/B-032")).Body!.TextContent, StringComparison.Ordinal);
        await app.AssertKept();
    }

    [Fact]
    public async Task A_batch_without_blades_and_a_return_without_a_word_are_refused()
    {
        using var app = await ShopApp.Sample();
        var before = await app.EntryCount();
        Assert.Contains("Tick or type", (await app.Fill("/bench/batches/new", ("Service", "the grinder in town"))).Refused().Beside("Tags"), StringComparison.Ordinal);
        Assert.Contains("what became of it", (await app.Fill("/bench/batches/B-031")).Refused().Text, StringComparison.Ordinal);
        var wide = (await app.Fill("/bench/batches/B-031", ("Lines[2].Outcome", "Sharpened"), ("Lines[2].Width", "wide"))).Refused();
        Assert.Contains("is not a blade width", wide.Page.GetElementById("f-Lines-2-Width-err")!.TextContent, StringComparison.Ordinal);
        Assert.Equal(before, await app.EntryCount());
    }

    [Fact]
    public async Task A_blade_on_a_saw_cannot_be_sent_away()
    {
        using var app = await ShopApp.Sample();
        Assert.Contains("take it off first", (await app.Fill("/bench/batches/new", ("Tags", "Q-08"))).Refused().Beside("Tags"), StringComparison.Ordinal);
    }
}
