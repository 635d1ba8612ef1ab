namespace BladeLog.Tests.Features.Saws;

/// <summary>What a saw's page says where the blade on it is not the one of the next cut, or cannot run as it is.</summary>
public sealed class SawWordsTests
{
    [Fact]
    public async Task A_slack_saw_says_tension_first_in_its_title_and_beside_its_blade()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/slack", ("LetOff", "yes"))).LeadsTo("/saws/S2");
        var page = await app.GetPage("/saws/S2");
        Assert.Equal("Osprey: tension on first, then Q-08 for cut 2, black cherry 200 mm", SampleApp.Text(page.QuerySelector("h1")));
        var mounted = page.QuerySelector("a.hang[href='/blades/Q-08']")!;
        Assert.Equal("slack", SampleApp.Text(mounted.QuerySelector(".state")));
        Assert.Contains("Tension off now; when on, 150 MPa on the body", SampleApp.Text(mounted), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_picture_of_a_held_blade_says_whose_it_is_where_the_next_cut_wants_another()
    {
        await using var app = await ShopApp.Sample();
        using var held = await app.PostForm("/saws/S1/clicking", []);
        var caption = SampleApp.Text((await app.GetPage("/saws/S1")).QuerySelector("figcaption"));
        Assert.StartsWith("Body and bending are of Q-01, on hold here. Cut", caption, StringComparison.Ordinal);
        Assert.Matches("with Q-0[23] once it is on, at [0-9.]+ m/min", caption);
    }

    [Fact]
    public async Task A_blade_that_stays_on_needs_no_such_words()
    {
        await using var app = await ShopApp.Sample();
        var caption = SampleApp.Text((await app.GetPage("/saws/S2")).QuerySelector("figcaption"));
        Assert.StartsWith("Cut 2, black cherry 200 mm:", caption, StringComparison.Ordinal);
        Assert.DoesNotContain("once it is on", caption, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_bevel_tells_the_height_along_the_blade_wherever_its_height_is_told()
    {
        // 50 mm at 22 degrees: 50 / cos 22 = 53.9 mm.
        await using var app = await ShopApp.Sample();
        foreach (var path in (string[])["/saws/S1", "/cuts", "/cuts?view=saws", "/cuts/5"])
        {
            Assert.Contains("50 mm, 54 mm along the blade at this bevel", SampleApp.Text((await app.GetPage(path)).Body), StringComparison.Ordinal);
        }

        using var held = await app.PostForm("/saws/S1/clicking", []);
        Assert.Contains("50 mm bevel", SampleApp.Text((await app.GetPage("/")).QuerySelector("#saw-S1 .next")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_what_if_of_a_saw_offers_no_blade_that_cannot_run()
    {
        await using var app = await ShopApp.Sample();
        var offered = (await app.GetPage("/saws/S3/what-if")).QuerySelectorAll("select[name='blade'] option").Select(o => o.GetAttribute("value")).ToArray();
        Assert.Contains("Q-17", offered);
        Assert.DoesNotContain("Q-22", offered);
        Assert.DoesNotContain("Q-23", offered);
    }

    [Fact]
    public async Task A_saw_is_called_by_its_name_where_something_is_in_the_way()
    {
        await using var app = await ShopApp.Sample();
        var refused = await app.Fill("/saws/S3/hours", ("Running", "9"), ("From", "1 h ago"));
        Assert.StartsWith("Wren would have run", refused.Refused().Beside("Running"), StringComparison.Ordinal);
        var leads = (await app.GetPage("/blades/Q-18/drift")).QuerySelectorAll("select[name='Saw'] option").Select(o => SampleApp.Text(o)).ToArray();
        Assert.Contains("Wren", leads);
        Assert.DoesNotContain("S3", leads);
        Assert.DoesNotContain("Old Heron", leads);
    }

    [Fact]
    public async Task A_check_that_finds_the_tension_off_says_it_once()
    {
        await using var app = await ShopApp.Sample();
        (await app.Fill("/saws/S2/check", ("Guards", "yes"), ("Tension", "no"), ("UnderTable", "yes"), ("Quiet", "yes"), ("Brake", "yes"), ("Who", "JP"))).LeadsTo("/checks");
        var text = SampleApp.Text((await app.GetPage("/checks")).Body);
        Assert.Contains("Not right: tension", text, StringComparison.Ordinal);
        Assert.DoesNotContain("was found off", text, StringComparison.Ordinal);
        Assert.Equal("slack", SampleApp.Text((await app.GetPage("/saws/S2")).QuerySelector(".lede .state")));
    }
}
