using AngleSharp.Dom;
using BladeLog.Advice;
using BladeLog.Features.Floor;
using BladeLog.Records;
using BladeLog.Tests.Advice;
using BladeLog.Tests.Ui;
using BladeLog.Ui;

namespace BladeLog.Tests.Features.Floor;

public sealed class FloorPageTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Fact]
    public async Task Each_saw_stands_on_the_floor_with_its_blade_and_its_hands()
    {
        IDocument page = await sample.Page("/");
        (string Saw, string Tag)[] expected = [("S1", "Q-01"), ("S2", "Q-08"), ("S3", "Q-17"), ("S4", "Q-30"), ("S5", "Q-32")];
        Assert.Equal(expected.Length, page.QuerySelectorAll(".tile").Length);
        foreach ((string saw, string tag) in expected)
        {
            IElement tile = page.QuerySelector($"#saw-{saw}")!;
            Assert.Equal($"/blades/{tag}", tile.QuerySelector("a.on")!.GetAttribute("href"));
            Assert.NotNull(tile.QuerySelector($"a[href='/saws/{saw}/swap']"));

            // A saw without an hour meter is timed.
            Assert.NotNull(tile.QuerySelector(saw is "S3" or "S4" ? $"form[action='/saws/{saw}/timer/start'] button" : $"a[href='/saws/{saw}/hours']"));

            Assert.NotNull(tile.QuerySelector($"form[method=post][action='/saws/{saw}/clicking'] button"));
            Assert.Equal(2, tile.QuerySelectorAll(".fig").Length);
        }
    }

    // Hours and grinds of the invented shop's own table: Q-17 10.3 h to 1 in 10, run 9; Q-30 64.5, run 11.5; Q-01 9 of 12 sharpenings; Q-08 1 of 5.
    [Theory]
    [InlineData("S1", "3", "grinds left")]
    [InlineData("S2", "4", "grinds left")]
    [InlineData("S3", "1.3", "to look")]
    [InlineData("S4", "53", "to look")]
    public async Task The_second_figure_is_what_life_asks_for_next(string saw, string figure, string stop)
    {
        IElement shown = (await sample.Page("/")).QuerySelectorAll($"#saw-{saw} .fig p")[1];
        Assert.Equal(figure, SampleApp.Text(shown.QuerySelector("b")));
        Assert.EndsWith(stop.Replace(" ", "", StringComparison.Ordinal), SampleApp.Text(shown).Replace(" ", "", StringComparison.Ordinal), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_nearly_dull_blade_says_sharpen()
    {
        IElement tile = (await sample.Page("/")).QuerySelector("#saw-S5")!;
        Assert.NotNull(tile.QuerySelector(".s-sharpen"));
        Assert.Contains("to", SampleApp.Text(tile.QuerySelector(".fig span")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_floor_stands_while_a_blade_is_on_hold_for_a_reason_of_its_own()
    {
        await using ShopApp app = await ShopApp.Sample();
        (await app.Fill("/blades/Q-01/hold", ("Kind", "Other"), ("Note", "found on the floor"))).LeadsTo("/blades/Q-01");
        Assert.Contains("Do not run. Put on hold", SampleApp.Text((await app.GetPage("/")).QuerySelector("#saw-S1")), StringComparison.Ordinal);
    }

    [Fact]
    public void A_saw_on_hold_tells_no_figure_but_what_was_heard()
    {
        ShopNow shop = DemoShopFixture.Build();
        Hold hold = new() { Kind = HoldKind.Clicking, Entry = new Entry { Kind = "hold", AtUtc = shop.AsOf.AddMinutes(-5), PersonId = 7 } };
        shop = shop with { Blades = [.. shop.Blades.Select(b => b.Blade.Tag == "Q-01" ? b with { Hold = hold } : b)] };
        IDocument page = Page(shop, new Dictionary<int, string> { [7] = "JP" });
        IElement tile = page.QuerySelector("#saw-S1")!;
        Assert.NotNull(tile.QuerySelector(".s-hold"));
        Assert.Empty(tile.QuerySelectorAll(".fig"));
        Assert.Contains("Do not run. Clicking heard 07:55 by JP.", SampleApp.Text(tile), StringComparison.Ordinal);
        Assert.NotNull(tile.QuerySelector("a[href='/blades/Q-01/clear']"));
        Assert.Null(tile.QuerySelector("[action='/saws/S1/clicking']"));
    }

    [Fact]
    public void A_slack_saw_asks_for_its_tension_first()
    {
        ShopNow shop = DemoShopFixture.Build();
        shop = shop with { Saws = [.. shop.Saws.Select(s => s.Saw.Code == "S2" ? s with { Slack = true } : s)] };
        IElement tile = Page(shop).QuerySelector("#saw-S2")!;
        Assert.NotNull(tile.QuerySelector(".s-slack"));
        Assert.Contains("tension on first", SampleApp.Text(tile.QuerySelector(".next")), StringComparison.Ordinal);
    }

    [Fact]
    public void An_empty_saw_says_how_many_blades_are_ready_for_it()
    {
        ShopNow shop = DemoShopFixture.Build();
        shop = shop with { Saws = [.. shop.Saws.Select(s => s.Saw.Code == "S4" ? s with { MountedBladeId = null } : s)] };
        IElement tile = Page(shop).QuerySelector("#saw-S4")!;
        Assert.NotNull(tile.QuerySelector(".s-empty"));
        Assert.Contains("1 blade that fits is ready.", SampleApp.Text(tile), StringComparison.Ordinal);
        Assert.Contains("Put a blade on", SampleApp.Text(tile), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_shop_without_saws_is_led_to_its_first_one()
    {
        await using ShopApp app = await ShopApp.Empty();
        IDocument page = await app.GetPage("/");
        Assert.Equal("No saws yet", page.QuerySelector("h1")!.TextContent);
        Assert.NotNull(page.QuerySelector("a[href='/saws/new']"));
        Assert.NotNull(page.QuerySelector("a[href='/import']"));
    }

    private static IDocument Page(ShopNow shop, IReadOnlyDictionary<int, string>? initials = null) =>
        ShopApp.Parse(Rendered.Html<FloorPage>(("Model", FloorModel.Of(new ShopAdvice(shop), new ShopUnits(), initials)), ("Chrome", Chrome.Bare)));
}
