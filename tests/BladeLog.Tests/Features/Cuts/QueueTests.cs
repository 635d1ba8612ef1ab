using System.Net;
using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Cuts;

public sealed class QueueTests
{
    private static readonly Dictionary<string, string> Oak = new()
    {
        ["Job"] = "table tops",
        ["Species"] = "beech",
        ["Height"] = "45",
        ["Length"] = "1,8 m",
        ["Pieces"] = "4",
        ["Kind"] = "Board",
        ["Finish"] = "Medium",
        ["Dirt"] = "Clean",
        ["Direction"] = "Rip",
    };

    [Fact]
    public async Task The_list_names_the_blade_the_saw_and_the_feed_of_each_cut()
    {
        using ShopApp app = await ShopApp.Sample();
        IDocument page = await app.GetPage("/cuts");
        Assert.Equal("15 cuts wait, 11 have a blade that fits", SampleApp.Text(page.QuerySelector("h1")));
        string second = SampleApp.Text(page.QuerySelector("#cut-2"));
        Assert.Contains("2 drawer-front resaw", second, StringComparison.Ordinal);
        Assert.Contains("black cherry, 200 mm deep, 6 pieces of 1.2 m", second, StringComparison.Ordinal);
        Assert.Contains("on Osprey, 1.8 to 4.8 m/min", second, StringComparison.Ordinal);
    }

    [Fact]
    public async Task By_saw_the_day_needs_four_blade_changes_and_nine_as_listed()
    {
        // The order of the day as an independent program found it.
        using ShopApp app = await ShopApp.Sample();
        IDocument page = await app.GetPage("/cuts?view=saws");
        Assert.Contains("4 blade changes in this order; 9 blade changes as listed", SampleApp.Text(page.QuerySelector("main")), StringComparison.Ordinal);
        Assert.Equal(
            ["7", "5", "6", "2", "14", "3", "4", "1", "10", "8", "9", "15", "12", "11", "13"],
            page.QuerySelectorAll(".list a b:first-child").Where(b => b.Closest("a")!.GetAttribute("href")!.StartsWith("/cuts/", StringComparison.Ordinal)).Select(b => SampleApp.Text(b).Split(' ')[0]));
    }

    [Fact]
    public async Task An_empty_list_says_so_and_offers_to_add()
    {
        using ShopApp app = await ShopApp.Empty();
        IDocument page = await app.GetPage("/cuts");
        Assert.Equal("No cuts wait", SampleApp.Text(page.QuerySelector("h1")));
        Assert.NotNull(page.QuerySelector("a[href='/cuts/new']"));
    }

    [Fact]
    public async Task A_cut_is_added_with_its_wood_taken_as_the_handbook_names_it()
    {
        using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage answer = await app.PostForm("/cuts/new", Oak);
        Assert.Equal(HttpStatusCode.Redirect, answer.StatusCode);
        Assert.Equal("/cuts/16", answer.Headers.Location?.OriginalString);
        Assert.Contains("beech (taken as", SampleApp.Text((await app.GetPage("/cuts/16")).QuerySelector(".lede")), StringComparison.Ordinal);
        await using ShopDb db = app.NewContext();
        QueuedCut cut = await db.QueuedCuts.SingleAsync(c => c.Number == 16);
        Assert.Equal((0.045, 1.8, 4), (cut.HeightM, cut.LengthM, cut.Pieces));
        Assert.Null(cut.MoisturePct);
    }

    [Theory]
    [InlineData("Job", " ")]
    [InlineData("Species", "unobtainium")]
    [InlineData("Height", "tall")]
    [InlineData("Height", "-3")]
    [InlineData("Length", "1e999")]
    [InlineData("Pieces", "2.5")]
    [InlineData("Kind", "7")]
    [InlineData("Finish", "shiny")]
    [InlineData("Moisture", "wet")]
    [InlineData("Bevel", "90")]
    [InlineData("Nail", "140")]
    [InlineData("Due", "soon")]
    public async Task A_field_that_cannot_be_read_keeps_its_text_and_saves_nothing(string field, string typed)
    {
        using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage answer = await app.PostForm("/cuts/new", new(Oak) { [field] = typed });
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        IDocument page = ShopApp.Parse(await answer.Content.ReadAsStringAsync());
        Assert.NotNull(page.QuerySelector($"#f-{field}-err"));
        Assert.Equal("table tops", field == "Job" ? "table tops" : page.QuerySelector("input[name=Job]")!.GetAttribute("value"));
        if (page.QuerySelector($"input[name={field}]:not([type=radio])") is { } input)
        {
            Assert.Equal(typed, input.GetAttribute("value"));
        }

        await using ShopDb db = app.NewContext();
        Assert.Equal(15, await db.QueuedCuts.CountAsync());
    }

    [Fact]
    public async Task An_unknown_wood_offers_the_nearest_names_and_a_tap_on_one_saves()
    {
        using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage wrong = await app.PostForm("/cuts/new", new(Oak) { ["Species"] = "black chery" });
        IDocument page = ShopApp.Parse(await wrong.Content.ReadAsStringAsync());
        Assert.Contains("Black cherry", page.QuerySelectorAll("button[name=Pick]").Select(b => b.GetAttribute("value")));
        using HttpResponseMessage tapped = await app.PostForm("/cuts/new", new(Oak) { ["Species"] = "black chery", ["Pick"] = "Black cherry" });
        Assert.Equal(HttpStatusCode.Redirect, tapped.StatusCode);
    }

    [Fact]
    public async Task An_edit_keeps_what_was_not_touched_and_a_second_tablet_is_told()
    {
        using ShopApp app = await ShopApp.Sample();
        IDocument form = await app.GetPage("/cuts/5/edit");
        Dictionary<string, string> fields = Fields(form);
        fields["Pieces"] = "20";
        using HttpResponseMessage saved = await app.PostForm("/cuts/5/edit", fields);
        Assert.Equal("/cuts/5", saved.Headers.Location?.OriginalString);
        await using ShopDb db = app.NewContext();
        QueuedCut cut = await db.QueuedCuts.SingleAsync(c => c.Number == 5);
        Assert.Equal((20, 0.05, 0.4, 18d), (cut.Pieces, cut.HeightM, cut.RadiusM!.Value, cut.MoisturePct!.Value));
        Assert.Equal(22, double.RadiansToDegrees(cut.BevelRad), 1e-9);

        fields["Op"] = Guid.NewGuid().ToString();
        fields["Pieces"] = "30";
        using HttpResponseMessage late = await app.PostForm("/cuts/5/edit", fields);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, late.StatusCode);
    }

    [Fact]
    public async Task A_cut_moves_up_and_comes_off_the_list()
    {
        using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage up = await app.PostForm("/cuts/2/move", new() { ["To"] = "up" }, on: "/cuts?view=order");
        Assert.Equal("/cuts?view=order&from=0#cut-2", up.Headers.Location?.OriginalString);
        Assert.Equal(["2", "1", "3"], (await Numbers(app))[..3]);
        string version = (await app.GetPage("/cuts?view=order")).QuerySelector("#cut-13 input[name=Version]")!.GetAttribute("value")!;
        using HttpResponseMessage off = await app.PostForm("/cuts/13/move", new() { ["To"] = "off", ["Version"] = version }, on: "/cuts?view=order");
        Assert.Equal(HttpStatusCode.Redirect, off.StatusCode);
        Assert.DoesNotContain("13", await Numbers(app));
    }

    [Fact]
    public async Task Moving_what_is_no_longer_there_changes_nothing()
    {
        using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage first = await app.PostForm("/cuts/1/move", new() { ["To"] = "up" }, on: "/cuts?view=order");
        using HttpResponseMessage none = await app.PostForm("/cuts/77/move", new() { ["To"] = "down" }, on: "/cuts?view=order");
        Assert.Equal("/cuts?view=order", none.Headers.Location?.OriginalString);
        Assert.Equal("1", (await Numbers(app))[0]);
    }

    internal static Dictionary<string, string> Fields(IDocument page)
    {
        IElement form = page.QuerySelector("main form[method=post]:last-of-type")!;
        Dictionary<string, string> fields = [];
        foreach (IElement input in form.QuerySelectorAll("input[name], select[name]"))
        {
            string name = input.GetAttribute("name")!;
            bool counts = input.GetAttribute("type") is not ("radio" or "checkbox") || input.HasAttribute("checked");
            if (name != "__RequestVerificationToken" && counts)
            {
                fields[name] = (input.LocalName == "select" ? input.QuerySelector("option[selected]")?.GetAttribute("value") : input.GetAttribute("value")) ?? "";
            }
        }

        return fields;
    }

    private static async Task<string[]> Numbers(ShopApp app) =>
        [.. (await app.GetPage("/cuts")).QuerySelectorAll(".list li").Select(li => li.Id!["cut-".Length..])];
}
