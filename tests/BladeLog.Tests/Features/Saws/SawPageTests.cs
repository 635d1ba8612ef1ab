using System.Net;
using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Saws;

/// <summary>Bends an hour are those of the invented shop's own table, which an independent program made.</summary>
public sealed class SawPageTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Theory]
    [InlineData("S1", "26,193")]
    [InlineData("S2", "33,307")]
    [InlineData("S3", "41,035")]
    [InlineData("S3", "20,517")]
    [InlineData("S4", "90,947")]
    [InlineData("S5", "44,854")]
    public async Task Each_speed_shows_its_bends_an_hour(string saw, string bends)
    {
        IDocument page = await sample.Page($"/saws/{saw}");
        Assert.Contains(bends, page.QuerySelectorAll("td.n").Select(c => SampleApp.Text(c)));
    }

    [Fact]
    public async Task Each_wheel_shows_bending_and_thickness_of_the_mounted_blade()
    {
        IDocument page = await sample.Page("/saws/S2");
        IElement[] wheels = [.. page.QuerySelectorAll("tr").Where(r => SampleApp.Text(r).Contains("700 mm", StringComparison.Ordinal))];
        Assert.Equal(2, wheels.Length);
        Assert.All(wheels, w => Assert.Contains("266 MPa", SampleApp.Text(w), StringComparison.Ordinal));
        Assert.All(wheels, w => Assert.Contains("1/778", SampleApp.Text(w), StringComparison.Ordinal));
        Assert.Contains("bends 266", page.QuerySelector("svg.sawbig")!.GetAttribute("aria-label"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Blades_that_fit_tell_how_long_they_last_here()
    {
        IDocument page = await sample.Page("/saws/S3");
        Assert.Contains("243 h left of 281 h here", SampleApp.Text(page.QuerySelector(".hooks a[href='/blades/Q-18']")), StringComparison.Ordinal);
        IDocument osprey = await sample.Page("/saws/S2");
        Assert.Contains("on hold: no hours are told", SampleApp.Text(osprey.QuerySelector(".hooks a[href='/blades/Q-14']")), StringComparison.Ordinal);
        Assert.Contains("flexing will not end it here", SampleApp.Text(osprey.QuerySelector(".hooks a[href='/blades/Q-08']")), StringComparison.Ordinal);
        Assert.Null(osprey.QuerySelector(".hooks a[href='/blades/Q-17']"));
    }

    [Fact]
    public async Task Actions_lead_to_the_forms_of_the_saw()
    {
        IDocument page = await sample.Page("/saws/S3");
        foreach (string verb in (string[])["swap", "hours", "cut", "clicking", "slack", "edit"])
        {
            Assert.NotNull(page.QuerySelector($"a[href='/saws/S3/{verb}']"));
        }
    }

    [Fact]
    public async Task Hours_with_no_blade_known_are_asked_about()
    {
        await using ShopApp app = await ShopApp.Sample();
        long unknown;
        await using (ShopDb db = app.NewContext())
        {
            unknown = await db.RunShares.Where(s => s.MountId == null).Join(db.Runs, s => s.RunId, r => r.EntryId, (s, r) => new { s.Ms, r.Saw.Code }).Where(x => x.Code == "S2").SumAsync(x => x.Ms);
        }

        IDocument page = await app.GetPage("/saws/S2");
        Assert.Equal(unknown > 0, SampleApp.Text(page.Body).Contains("with no blade known. Which blade was on?", StringComparison.Ordinal));
    }

    [Fact]
    public async Task An_unknown_code_is_not_found_and_names_the_saws()
    {
        using HttpResponseMessage answer = await sample.App.Client.GetAsync("/saws/S9");
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        IDocument page = ShopApp.Parse(await answer.Content.ReadAsStringAsync());
        Assert.NotNull(page.QuerySelector("a[href='/saws/S1']"));
    }

    [Fact]
    public async Task More_lists_only_pages_that_answer()
    {
        foreach (IElement link in (await sample.Page("/more")).QuerySelectorAll(".list a"))
        {
            using HttpResponseMessage answer = await sample.App.Client.GetAsync(link.GetAttribute("href"));
            Assert.NotEqual(HttpStatusCode.NotFound, answer.StatusCode);
        }
    }
}
