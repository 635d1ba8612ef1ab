using System.Net;
using AngleSharp.Dom;

namespace BladeLog.Tests.Features.Workings;

/// <summary>The workings as pages: a form is an address, a result can be shared, bad input keeps the rest.</summary>
public sealed class WorkingsPagesTests
{
    private static readonly string[] Pages = ["band-life", "tension", "thrust-limits", "cut", "curve", "wear", "grinding", "force-factor", "crack"];

    [Fact]
    public async Task The_list_leads_to_every_group_by_whole_rows()
    {
        using var app = await ShopApp.Empty();
        IDocument list = await app.GetPage("/workings");
        string?[] rows = [.. list.QuerySelectorAll(".list > li > a").Select(a => a.GetAttribute("href"))];
        Assert.Equal(Pages.Select(p => "/workings/" + p).Order(StringComparer.Ordinal), rows.Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task An_empty_form_shows_a_marked_example_with_lines_and_curves()
    {
        using var app = await ShopApp.Empty();
        foreach (string name in Pages)
        {
            IDocument page = await app.GetPage("/workings/" + name);
            Assert.Contains("An example, not one of your blades", page.Body!.TextContent, StringComparison.Ordinal);
            Assert.NotEmpty(page.QuerySelectorAll(".because .work > div"));
            Assert.NotEmpty(page.QuerySelectorAll("figure.curve svg[role=img] path.cline"));
            Assert.All(page.QuerySelectorAll("form[method=get]"), f => Assert.Equal("/workings/" + name, f.GetAttribute("action")));
            Assert.Empty(page.QuerySelectorAll("[style]"));
            Assert.All(page.QuerySelectorAll(".because .src"), s => Assert.NotEqual("", s.TextContent.Trim()));
        }
    }

    [Fact]
    public async Task The_form_sent_as_it_stands_gives_the_same_answer_at_an_address()
    {
        using var app = await ShopApp.Sample();
        foreach (string start in (string[])["band-life", "tension", "thrust-limits?blade=Q-01&saw=S1&cut=7", "cut?blade=Q-09&saw=S2&cut=2", "curve?blade=Q-17", "wear?blade=Q-09", "grinding?blade=Q-09", "force-factor", "crack"])
        {
            IDocument page = await app.GetPage("/workings/" + start);
            var form = page.QuerySelectorAll("form[method=get]")[^1];
            IEnumerable<string> fields = form.QuerySelectorAll("input[name],select[name]")
                .Select(f => $"{f.GetAttribute("name")}={Uri.EscapeDataString(f.TagName == "SELECT" ? f.QuerySelector("option[selected]")?.GetAttribute("value") ?? "" : f.GetAttribute("value") ?? "")}");
            IDocument again = await app.GetPage($"/workings/{start.Split('?')[0]}?{string.Join('&', fields)}");
            Assert.Equal(Title(page), Title(again));
        }
    }

    [Fact]
    public async Task The_worked_numbers_of_a_blade_in_a_cut_stand_on_its_page()
    {
        using var app = await ShopApp.Sample();
        // Worked example of the choices specification: 0.89 to 5.9 m/min, then chip room.
        IDocument cut = await app.GetPage("/workings/cut?blade=Q-01&saw=S1&cut=7");
        Assert.StartsWith("0.89 to 5.9 m/min, then chip room", Title(cut), StringComparison.Ordinal);
        Assert.Contains("Q-01 on Old Heron, cut 7", cut.Body!.TextContent, StringComparison.Ordinal);
        // The same: Pcr/2 = 318.45 N.
        Assert.StartsWith("318 N", Title(await app.GetPage("/workings/thrust-limits?blade=Q-01&saw=S1&cut=7")), StringComparison.Ordinal);
        // Independent program, band-life specification: 113.240 h.
        Assert.Equal("Half of such blades broken at 113 h", Title(await app.GetPage("/workings/band-life")));
        // Published radius table: 63.5 mm for half an inch; the chord gives 62.41.
        Assert.StartsWith("Radius 62 mm", Title(await app.GetPage("/workings/curve")), StringComparison.Ordinal);
        // Band-life specification 1.3: 1434 N on the wheel give 100.028 MPa.
        Assert.StartsWith("100 MPa", Title(await app.GetPage("/workings/tension?from=load&thickness=0.64&width=13&gullet=1.8&load=1434")), StringComparison.Ordinal);
        // Band-life specification 9: 5 minutes from 1 mm.
        Assert.Contains("about 5 min", Title(await app.GetPage("/workings/crack")), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("band-life?thickness=thick", "thickness", "Bends an hour")]
    [InlineData("tension?pull=-3", "pull", "Body that carries it")]
    [InlineData("thrust-limits?tension=lots", "tension", "Span between the guides")]
    [InlineData("cut?edge=NaN", "edge", "Teeth in the cut")]
    [InlineData("curve?kerf=0.3&thickness=0.6", "kerf", "By the trade's tables")]
    [InlineData("wear?path=1e999", "path", "Wood path for a square metre")]
    [InlineData("crack?crack=50", "crack", "Any crack is a hold")]
    public async Task Bad_input_is_told_beside_its_field_and_the_rest_is_still_answered(string address, string field, string kept)
    {
        using var app = await ShopApp.Empty();
        using var answer = await app.Client.GetAsync("/workings/" + address);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        IDocument page = ShopApp.Parse(await answer.Content.ReadAsStringAsync());
        Assert.NotNull(page.QuerySelector($"#f-{field}-err"));
        Assert.NotNull(page.QuerySelector($".problems a[href='#f-{field}']"));
        Assert.Contains(kept, page.Body!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_blade_saw_or_cut_that_is_not_there_is_told_and_the_example_stays()
    {
        using var app = await ShopApp.Sample();
        using var answer = await app.Client.GetAsync("/workings/cut?blade=Z-99&saw=S9&cut=400");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        IDocument page = ShopApp.Parse(await answer.Content.ReadAsStringAsync());
        Assert.NotNull(page.QuerySelector("#f-blade-err"));
        Assert.NotNull(page.QuerySelector("#f-saw-err"));
        Assert.NotNull(page.QuerySelector("#f-cut-err"));
        Assert.NotEmpty(page.QuerySelectorAll(".because .work > div"));
    }

    [Fact]
    public async Task No_life_is_told_of_a_held_blade_whatever_is_typed()
    {
        using var app = await ShopApp.Sample();
        foreach (string address in (string[])["band-life?blade=Q-14", "band-life?blade=q-14&thickness=0.5&hrc=50"])
        {
            IDocument page = await app.GetPage("/workings/" + address);
            Assert.Contains("Q-14 is on hold", page.Body!.TextContent, StringComparison.Ordinal);
            Assert.Empty(page.QuerySelectorAll("figure.curve"));
            Assert.DoesNotContain("Median life", page.Body.TextContent, StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task The_page_on_cracks_takes_no_blade_of_the_shop()
    {
        using var app = await ShopApp.Sample();
        IDocument page = await app.GetPage("/workings/crack?blade=Q-14");
        Assert.Null(page.QuerySelector("[name=blade]"));
        Assert.DoesNotContain("Q-14", page.Body!.TextContent, StringComparison.Ordinal);
        Assert.Contains("from memory", page.Body.TextContent, StringComparison.Ordinal);
    }

    private static string Title(IDocument page) => page.QuerySelector("h1")!.TextContent.Replace('\u00a0', ' ');
}
