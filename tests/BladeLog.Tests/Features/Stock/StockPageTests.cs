using System.Net;
using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Stock;

/// <summary>The invented shop's blades: three of the four mill blades are at the sharpener.</summary>
public sealed class StockPageTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Fact]
    public async Task Blades_at_the_sharpener_are_no_stock()
    {
        string mill = await Row("E1");
        Assert.Contains("1 at hand, least 1 (default, not yours): 1 on a saw. Not at hand: 3 at the sharpener, promised", mill, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_last_mill_blade_is_ordered_for_before_it_is_due()
    {
        string mill = await Row("E1");
        Assert.Matches("Order [12] of E1 (now|by [0-9]+ Dec)", mill);
    }

    [Fact]
    public async Task New_folded_blades_are_one_line()
    {
        string kind = await Row("E3");
        Assert.Contains("1 new spare", kind, StringComparison.Ordinal);
        Assert.DoesNotContain("Q-40", kind, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_held_blade_is_counted_apart_so_that_what_is_at_hand_adds_up() =>
        Assert.Matches(@"2 at hand.*: 1 on a saw, 1 ready\. Not at hand: 1 on hold\.", await Row("A1"));

    [Fact]
    public async Task A_kind_that_did_not_run_is_not_ordered()
    {
        string kind = await Row("E2");
        Assert.DoesNotContain("Order", kind, StringComparison.Ordinal);
        Assert.Contains("none left", kind, StringComparison.Ordinal);
    }

    [Fact]
    public async Task With_a_longer_lead_time_the_order_is_due_now()
    {
        IDocument page = await sample.Page("/stock?lead=120&least=1");
        Assert.Contains("of E1 now", SampleApp.Text(page.Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Delivered_spares_count_and_the_order_is_off()
    {
        await using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage wrong = await app.PostForm("/stock", new() { ["Spec"] = "E1", ["Way"] = "came", ["Count"] = "6", ["Reason"] = "", ["Who"] = "MI" });
        Assert.Equal(HttpStatusCode.UnprocessableEntity, wrong.StatusCode);
        using HttpResponseMessage done = await app.PostForm("/stock", new() { ["Spec"] = "E1", ["Way"] = "came", ["Count"] = "6", ["Reason"] = "delivered", ["Who"] = "MI" });
        Assert.Equal(HttpStatusCode.Redirect, done.StatusCode);
        IDocument page = await app.GetPage("/stock");
        string mill = SampleApp.Text(page.QuerySelectorAll("section").First(s => SampleApp.Text(s.QuerySelector("h2")).StartsWith("E1:", StringComparison.Ordinal)));
        Assert.Contains("7 at hand", mill, StringComparison.Ordinal);
        Assert.DoesNotContain("Order", mill, StringComparison.Ordinal);
        await using ShopDb db = app.NewContext();
        Assert.Equal(6, (await db.StockMoves.SingleAsync()).Count);
    }

    [Fact]
    public async Task Costs_are_told_for_each_kind_and_each_blade()
    {
        IDocument page = await sample.Page("/stock/costs");
        IElement row = page.QuerySelectorAll("tr").First(r => SampleApp.Text(r.QuerySelector("th")) == "Q-09");
        // 41.00, nine sharpenings for 63.00, 656.99 m²: 0.158 a square metre.
        Assert.Equal(["41.00", "63.00", "0.00"], row.QuerySelectorAll("td").Take(3).Select(SampleApp.Text));
        Assert.Equal("0.158", SampleApp.Text(row.QuerySelectorAll("td")[4]));
        string text = SampleApp.Text(page.Body);
        Assert.Contains("Ground in the shop", text, StringComparison.Ordinal);
        Assert.Contains("40 sharpenings", text, StringComparison.Ordinal);
        Assert.Contains("B1: 38 × 0.9, 19.5 mm tipped", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Keeping_and_retiring_are_held_against_each_other_in_money()
    {
        string text = SampleApp.Text((await sample.Page("/stock/costs?blade=Q-09")).Body);
        Assert.Contains("Retiring it now: 5.66", text, StringComparison.Ordinal);
        Assert.Contains("75.00, what a break costs on Osprey", text, StringComparison.Ordinal);
        Assert.Matches("About [0-9]+ in (100|1,000) such blades break in those 10 h", text);
        Assert.Contains("Q-14 is on hold: no chance is told of it.", SampleApp.Text((await sample.Page("/stock/costs?blade=Q-14")).Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_least_of_the_kind_wins_over_that_of_every_kind_and_says_whose_it_is()
    {
        await using ShopApp app = await ShopApp.Sample();
        async Task<string> Kind(string code, string path = "/stock") => SampleApp.Text(
            (await app.GetPage(path)).QuerySelectorAll("section").First(s => SampleApp.Text(s.QuerySelector("h2")).StartsWith(code + ":", StringComparison.Ordinal)));

        // Three of the four mill blades are away: one at hand, and three are wanted.
        await using (ShopDb db = app.NewContext())
        {
            await db.Database.ExecuteSqlRawAsync("update spec set least_stock = 3 where code = 'E1'");
            await db.Database.ExecuteSqlRawAsync("update spec set least_stock = 2 where code = 'E2'");
            await db.Database.ExecuteSqlRawAsync("update spec set least_stock = 0 where code = 'B3'");
        }

        string mill = await Kind("E1");
        Assert.Contains("1 at hand, least 3 (yours)", mill, StringComparison.Ordinal);
        Assert.Matches("Order [2-9] of E1 now", mill);
        Assert.Contains("least 3 (yours)", await Kind("E1", "/stock?lead=14&least=7"), StringComparison.Ordinal);
        Assert.Contains("(as asked below)", await Kind("B4", "/stock?lead=14&least=7"), StringComparison.Ordinal);

        // It did not run lately, and is wanted all the same.
        Assert.Contains("Order 2 of E2 now", await Kind("E2"), StringComparison.Ordinal);
        string none = await Kind("B3");
        Assert.Contains("least 0 (yours)", none, StringComparison.Ordinal);
    }

    private async Task<string> Row(string code)
    {
        IDocument page = await sample.Page("/stock");
        return SampleApp.Text(page.QuerySelectorAll("section").First(s => SampleApp.Text(s.QuerySelector("h2")).StartsWith(code + ":", StringComparison.Ordinal)));
    }
}
