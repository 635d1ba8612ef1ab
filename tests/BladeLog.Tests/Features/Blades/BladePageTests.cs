using System.Net;
using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Blades;

/// <summary>Figures are those of the invented shop's own table, which an independent program made.</summary>
public sealed class BladePageTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Fact]
    public async Task The_blade_near_its_end_is_used_up_and_scrapped()
    {
        IDocument page = await sample.Page("/blades/Q-09");
        Assert.Equal("Q-09: use up its present edge on rough work, then scrap it", SampleApp.Text(page.QuerySelector("h1")));
        string text = SampleApp.Text(page.Body);
        Assert.Contains("Used 0.86 (0.18 to 4.1)", text, StringComparison.Ordinal);
        Assert.Contains("Life: past its retire mark", text, StringComparison.Ordinal);
        Assert.Contains("What ends it: flexing", text, StringComparison.Ordinal);
        Assert.Contains("33,307 bends an hour", text, StringComparison.Ordinal);
        Assert.Contains("266 MPa over 700 mm", text, StringComparison.Ordinal);
        Assert.Contains("1/778", text, StringComparison.Ordinal);
        Assert.Contains("9 of 12", text, StringComparison.Ordinal);
        Assert.Contains("Teeth: 634 m left, then scrap", text, StringComparison.Ordinal);
        Assert.Equal("Life: run 310 h; 1 in 10 such blades broken at 140 h, half at 360 h; handbook alone", page.QuerySelector("svg.life")!.GetAttribute("aria-label")!.Replace('\u00a0', ' '));
    }

    [Fact]
    public async Task A_held_blade_tells_no_life_at_all()
    {
        IDocument page = await sample.Page("/blades/Q-14");
        string text = SampleApp.Text(page.Body);
        Assert.Contains("On hold: crack 2.6 mm in a gullet.", text, StringComparison.Ordinal);
        Assert.NotNull(page.QuerySelector(".caution.stop"));
        Assert.DoesNotContain("0.37", text, StringComparison.Ordinal);
        Assert.DoesNotContain("Life", text, StringComparison.Ordinal);
        Assert.DoesNotContain("to break in the next", text, StringComparison.Ordinal);
        Assert.Empty(page.QuerySelectorAll("svg.life .bandframe"));
        Assert.NotNull(page.QuerySelector("a.main[href='/blades/Q-14/clear']"));
        Assert.Null(page.QuerySelector("a[href^='/saws/'][href*='swap']"));
    }

    [Fact]
    public async Task An_unknown_history_is_a_range_without_a_point_in_it()
    {
        IDocument page = await sample.Page("/blades/Q-06");
        Assert.Contains("When it came it had used 0.20 to 0.60 of a life; 1 is where half of such blades have broken.", SampleApp.Text(page.Body), StringComparison.Ordinal);
        IElement band = page.QuerySelector("svg.life")!;
        Assert.Empty(band.QuerySelectorAll(".used"));
        Assert.Single(band.QuerySelectorAll(".hatched"));
        Assert.Contains("No proof of its history", SampleApp.Text(page.QuerySelector(".caution")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_blade_that_flexing_does_not_end_has_no_life_band()
    {
        IDocument page = await sample.Page("/blades/Q-01");
        Assert.Contains("Life: flexing will not end it", SampleApp.Text(page.Body), StringComparison.Ordinal);
        Assert.Empty(page.QuerySelectorAll("svg.life .bandframe"));
        Assert.Contains("What ends it: sharpenings", SampleApp.Text(page.Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_shortened_blade_shows_what_its_steel_ran_before()
    {
        string text = SampleApp.Text((await sample.Page("/blades/Q-04b")).Body);
        Assert.Contains("Old Heron, before it was cut down", text, StringComparison.Ordinal);
        Assert.Contains("Used 0.4 (0.08", text, StringComparison.Ordinal);
        Assert.Contains("2 welds, doubtful", text, StringComparison.Ordinal);
        Assert.Contains("What ends it: it has had its last weld", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Every_figure_has_a_because_with_its_mark()
    {
        IDocument page = await sample.Page("/blades/Q-17");
        IElement[] rows = [.. page.QuerySelectorAll(".because .work > div")];
        string[] named = [.. rows.Select(r => SampleApp.Text(r.QuerySelector("dt")))];
        foreach (string figure in (string[])["Width", "Thickness", "Body width", "Kerf", "Bends", "Life used", "Bending stress", "Tension", "Bends an hour", "Median bends", "Median life on this saw", "1 in 10 broken", "Hours left", "Edge radius", "Path to dull", "Metres left"])
        {
            Assert.Contains(figure, named);
        }

        Assert.All(rows, r => Assert.NotEqual("", SampleApp.Text(r.QuerySelector(".src"))));
        Assert.Contains(rows, r => SampleApp.Text(r).Contains("default, not yours", StringComparison.Ordinal));
        Assert.Contains(rows, r => SampleApp.Text(r).Contains("Roessle, Fatemi 2000", StringComparison.Ordinal));
    }

    [Fact]
    public async Task A_mounted_blade_offers_the_swap_and_the_alarm()
    {
        IDocument page = await sample.Page("/blades/Q-17");
        Assert.NotNull(page.QuerySelector("a.main[href='/saws/S3/swap']"));
        Assert.NotNull(page.QuerySelector("a.alarm[href='/saws/S3/clicking']"));
    }

    [Fact]
    public async Task An_unknown_tag_is_not_found_and_offers_the_nearest()
    {
        using HttpResponseMessage answer = await sample.App.Client.GetAsync("/blades/Q-O9");
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        IDocument page = ShopApp.Parse(await answer.Content.ReadAsStringAsync());
        Assert.Equal("No blade has the tag Q-O9", page.QuerySelector("h1")!.TextContent);
        Assert.Equal("/blades/Q-09", page.QuerySelector(".btns a")!.GetAttribute("href"));
    }

    [Fact]
    public async Task What_was_struck_out_stays_with_who_and_why()
    {
        await using ShopApp app = await ShopApp.Sample();
        int entry;
        await using (ShopDb db = app.NewContext())
        {
            Inspection last = await db.Inspections.Where(i => i.Blade.Tag == "Q-09" && i.Entry.Void == null).OrderByDescending(i => i.Entry.AtUtc).FirstAsync();
            int person = await db.People.Where(p => p.Initials == "OT").Select(p => p.Id).SingleAsync();
            entry = last.EntryId;
            DateTime now = ShopApp.Today.UtcDateTime;
            db.Voids.Add(new VoidFact
            {
                VoidedId = entry,
                Reason = "another blade was meant",
                Entry = new Entry { Op = Guid.NewGuid(), Kind = "void", AtUtc = now, EnteredUtc = now, PersonId = person },
            });
            await db.SaveChangesAsync();
        }

        IDocument page = await app.GetPage("/blades/Q-09?all=1");
        IElement[] struck = [.. page.QuerySelectorAll(".story s")];
        Assert.Contains(struck, s => SampleApp.Text(s.ParentElement).EndsWith("Struck out by OT: another blade was meant.", StringComparison.Ordinal));
    }

    [Fact]
    public async Task Every_blade_has_a_page_without_a_number_that_is_none()
    {
        string[] tags;
        await using (ShopDb db = sample.App.NewContext())
        {
            tags = await db.Blades.Select(b => b.Tag).ToArrayAsync();
        }

        Assert.True(tags.Length >= 40);
        foreach (string tag in tags)
        {
            string html = (await sample.Page($"/blades/{tag}")).DocumentElement.OuterHtml;
            Assert.DoesNotContain("NaN", html, StringComparison.Ordinal);
            Assert.DoesNotContain("∞", html, StringComparison.Ordinal);
            Assert.DoesNotContain(" style=", html, StringComparison.Ordinal);
        }
    }
}
