using System.Net;
using BladeLog.Advice;
using BladeLog.Ui;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Setup;

public sealed class SetupTests
{
    [Fact]
    public async Task Initials_are_tapped_once_and_stand_in_the_title_block()
    {
        using var app = await ShopApp.Sample();
        Assert.Equal("Who?", (await app.GetPage("/setup")).QuerySelector("a.whois")!.TextContent);
        await app.Be("JP");
        Assert.Equal("WhoJP", (await app.GetPage("/setup")).QuerySelector("a.whois")!.TextContent);
        (await app.Fill("/who", ("Who", "ZZ"))).Refused();
    }

    [Fact]
    public async Task The_cookie_of_who_is_no_script_s_and_no_other_site_s()
    {
        using var app = await ShopApp.Sample();
        using var answer = await app.PostForm("/who", new() { ["Who"] = "JP", ["Back"] = "//elsewhere.example/x" });
        Assert.Equal("/", answer.Headers.Location?.OriginalString);
        var cookie = Assert.Single(answer.Headers.GetValues("Set-Cookie"), c => c.StartsWith("who=", StringComparison.Ordinal));
        Assert.Contains("httponly", cookie, StringComparison.OrdinalIgnoreCase);
        Assert.Contains("samesite=strict", cookie, StringComparison.OrdinalIgnoreCase);
    }

    [Fact]
    public async Task A_person_is_added_and_given_a_right()
    {
        using var app = await ShopApp.Empty();
        (await app.Fill("/people/new", ("Initials", "AB"), ("Name", "AB"), ("ClearHolds", "true"))).LeadsTo("/people");
        Assert.Contains("may clear a hold", (await app.GetPage("/people")).Body!.TextContent, StringComparison.Ordinal);
        (await app.Fill("/people/AB", ("ClearHolds", null))).LeadsTo("/people");
        Assert.DoesNotContain("may clear a hold", (await app.GetPage("/people")).Body!.TextContent, StringComparison.Ordinal);
        Assert.Contains("Give a name", (await app.Fill("/people/new", ("Initials", "CD"))).Refused().Beside("Name"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Every_setting_has_its_row_and_its_page()
    {
        using var app = await ShopApp.Sample();
        var page = await app.GetPage("/setup");
        Assert.All(SettingList.All, d => Assert.NotNull(page.QuerySelector($"a[href='/setup/{d.Key}']")));
        Assert.Contains("1 blade", SampleApp.Text(page.QuerySelector("a[href='/setup/stock.least']")), StringComparison.Ordinal);
        Assert.DoesNotContain("1 blades", SampleApp.Text(page.Body), StringComparison.Ordinal);
        Assert.Contains("1 in 4", (await app.GetPage("/setup/life.retire_mark")).Body!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_setting_is_the_shop_s_own_until_it_is_emptied()
    {
        using var app = await ShopApp.Sample();
        var outside = (await app.Fill("/setup/edge.dull", ("Value", "400"))).Refused();
        Assert.Contains("lies outside 15 to 100", outside.Beside("Value"), StringComparison.Ordinal);
        Assert.Equal("400", outside.Typed("Value"));
        (await app.Fill("/setup/edge.dull", ("Value", "35"))).LeadsTo("/setup#edge");
        Assert.Contains("yours", (await app.GetPage("/setup")).QuerySelector("a[href='/setup/edge.dull']")!.TextContent, StringComparison.Ordinal);
        (await app.Fill("/setup/edge.dull", ("Value", ""))).LeadsTo("/setup#edge");
        Assert.DoesNotContain("yours", (await app.GetPage("/setup")).QuerySelector("a[href='/setup/edge.dull']")!.TextContent.Replace("not yours", "", StringComparison.Ordinal), StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_shop_s_words_and_units_change_every_page()
    {
        using var app = await ShopApp.Sample();
        (await app.Fill("/setup", ("Lengths", "Inch"), ("PullWord", "Strain"), ("Rate", "52.50"))).LeadsTo("/setup");
        await using var db = app.NewContext();
        Assert.Equal(5250, (await db.Shops.SingleAsync()).RateMinorPerHour);
        Assert.Contains("strain", (await app.GetPage("/saws/S2/swap")).Body!.TextContent, StringComparison.Ordinal);
        Assert.Contains("Rate", (await app.Fill("/setup", ("Rate", "plenty"))).Refused().Page.QuerySelector("#f-Rate-err")!.Id!, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Two_tablets_that_change_the_setup_clash()
    {
        using var app = await ShopApp.Sample();
        var slow = await app.GetPage("/setup");
        (await app.Fill("/setup", ("Rate", "50"))).LeadsTo("/setup");
        Assert.Equal(HttpStatusCode.Conflict, (await app.SendForm(slow, "/setup", ("Timber", "900"))).Status);
    }

    [Fact]
    public async Task Every_caution_is_on_its_page_with_where_it_is_written()
    {
        using var app = await ShopApp.Empty();
        var text = (await app.GetPage("/cautions")).Body!.TextContent;
        Assert.All(CautionList.All, c =>
        {
            Assert.Contains(c.Sentence, text, StringComparison.Ordinal);
            Assert.Contains(c.Source, text, StringComparison.Ordinal);
        });
        Assert.Contains(CautionList.Deference, text, StringComparison.Ordinal);
    }
}
