using System.Text.RegularExpressions;
using AngleSharp.Html.Parser;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures;
using BladeLog.Ui.Pictures.Geometry;
using Microsoft.AspNetCore.Components;

namespace BladeLog.Tests.Ui;

/// <summary>What every piece promises the browser: no style, no script, no number that is none, a name for whom does not see it.</summary>
public partial class MarkupTests
{
    private static readonly ToothSpec Blade = new(25, [8.4667], 3.1, ToothForm.Hook, 10, TipKind.Set, SetPattern.Raker);
    private static readonly Answer[] Answers = [new("sharp", "Still sharp", "back to R2"), new("dull", "Dull")];

    public static TheoryData<string, string> Pieces()
    {
        var all = new TheoryData<string, string>();
        foreach (var size in (string[])["mini", "thumb", "wide", "tall"])
        {
            all.Add("strip " + size, Rendered.Html<ToothStrip>(("Blade", Blade), ("Tag", "Q-<1>"), ("Size", size)));
        }

        all.Add("strip that cannot be drawn", Rendered.Html<ToothStrip>(("Blade", Blade with { Depth = 40 }), ("Tag", "Q-01")));
        all.Add("drawing", Rendered.Html<BladeDrawing>(("Blade", Blade), ("Tag", "Q-01"), ("NewWidth", 26.0), ("LeastWidth", 18.0)));
        all.Add("drawing of a wide blade", Rendered.Html<BladeDrawing>(("Blade", Blade with { Width = 120 }), ("Tag", "W.1"), ("NewWidth", 130.0), ("LeastWidth", 90.0)));
        all.Add("end view", Rendered.Html<EndView>(("Tag", "Q-01"), ("Body", 0.9), ("Kerf", 1.45), ("Depth", 3.0), ("Tip", TipKind.Set)));
        all.Add("gate", Rendered.Html<FeedGate>(("Tag", "Q-01"), ("NoChip", 0.4), ("Rubs", 2.0), ("Limits", new[] { new GateLimit("push", 3, 5) }), ("Full", true), ("Axis", true)));
        all.Add("gate without limits", Rendered.Html<FeedGate>(("Tag", "Q-01"), ("NoChip", 0.4), ("Rubs", 2.0), ("Limits", Array.Empty<GateLimit>())));
        all.Add("life", Rendered.Html<LifeBand>(("Life", new LifeFigures(64, 355, 138, 90))));
        all.Add("wear", Rendered.Html<WearLine>(("Share", 0.4), ("Description", "Sharpness: 210 m left")));
        all.Add("edge", Rendered.Html<EdgePicture>(("Rounding", 15.0), ("Bite", 0.0), ("Hook", -6.0), ("Verdict", EdgeVerdict.NoChip)));
        all.Add("saw", Rendered.Html<SawElevation>(("Saw", new SawShape(SawKind.TwoWheels, 700, 5080, 600)), ("Name", "Osprey")));
        foreach (var kind in Enum.GetValues<SawKind>())
        {
            all.Add("saw picture " + kind, Rendered.Html<SawPicture>(
                ("Saw", new SawShape(kind, 480, 4000)), ("Name", "Finch & Co"), ("Shown", new SawFigures(0.9, 266, 285, 95)), ("Stock", 200.0)));
        }

        foreach (var state in StateShapes.Names)
        {
            all.Add("state " + state, Rendered.Html<StateMark>(("State", state)));
        }

        all.Add("field", Rendered.Html<Field>(("Name", "Width"), ("Label", "Width"), ("Value", "3/4\" <b>"), ("Unit", "mm"), ("Hint", "with teeth"), ("Error", "Give a width."), ("Offers", new[] { "20", "25" })));
        all.Add("choice", Rendered.Html<Choice>(("Name", "off"), ("Label", "Comes off"), ("Answers", Answers)));
        all.Add("select", Rendered.Html<Select>(("Name", "saw"), ("Label", "Saw"), ("Answers", Answers), ("Empty", "choose"), ("Error", "Choose one.")));
        all.Add("check", Rendered.Html<Check>(("Name", "weld"), ("Label", "It was welded"), ("Remark", "counts from now")));
        all.Add("summary", Rendered.Html<ProblemSummary>(("Problems", new[] { new Problem("Width", "Give a width."), new Problem(null, "Q-01 is on Osprey.") })));
        all.Add("caution", Rendered.Html<Caution>(("Sentence", "Let the blade stop."), ("Source", "practice")));
        all.Add("because", Rendered.Html<Because>(("Lines", new[] { new BecauseLine("Push", "90 N", "by hand", null, Provenance.EngineeringDefault) })));
        all.Add("sheet", Sheet());
        return all;
    }

    [Theory]
    [MemberData(nameof(Pieces))]
    public void No_piece_styles_itself_runs_script_or_shows_what_is_not_a_number(string piece, string html)
    {
        Assert.True(html.Length > 20, piece);
        var page = new HtmlParser().ParseDocument(html);
        foreach (var element in page.All)
        {
            Assert.DoesNotContain(element.Attributes, a => a.Name == "style" || a.Name.StartsWith("on", StringComparison.Ordinal));
            Assert.DoesNotContain(element.Attributes, a => NotANumber().IsMatch(a.Value));
        }

        Assert.DoesNotContain(page.QuerySelectorAll("script"), s => s.TextContent.Length > 0);
        Assert.Empty(page.QuerySelectorAll("style"));
        Assert.DoesNotContain("<b>\"", html, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Pieces))]
    public void Every_picture_has_a_name_in_words(string piece, string html)
    {
        var pictures = new HtmlParser().ParseDocument(html).QuerySelectorAll("svg").Where(s => s.Closest("svg svg") is null && !s.HasAttribute("aria-hidden"));
        foreach (var picture in pictures)
        {
            Assert.Equal("img", picture.GetAttribute("role"));
            Assert.True(picture.GetAttribute("aria-label")?.Length > 5, piece);
        }
    }

    [Fact]
    public void An_error_stands_beside_its_field_and_the_summary_leads_to_it()
    {
        var field = Rendered.Root(Rendered.Html<Field>(("Name", "Width"), ("Label", "Width"), ("Value", "3/4\""), ("Error", "Give a width."), ("Unit", "mm")));
        var input = field.QuerySelector("input")!;
        Assert.Equal("3/4\"", input.GetAttribute("value"));
        Assert.Equal("true", input.GetAttribute("aria-invalid"));
        foreach (var id in input.GetAttribute("aria-describedby")!.Split(' '))
        {
            Assert.NotNull(field.QuerySelector("#" + id));
        }

        var summary = Rendered.Root(Rendered.Html<ProblemSummary>(("Problems", new[] { new Problem("Width", "Give a width.") })));
        Assert.Equal("alert", summary.GetAttribute("role"));
        Assert.Equal("#" + input.Id, summary.QuerySelector("a")!.GetAttribute("href"));
        Assert.Equal(input.Id, field.QuerySelector("label")!.GetAttribute("for"));
    }

    [Fact]
    public void Nothing_is_chosen_beforehand_unless_it_was_given()
    {
        var none = Rendered.Root(Rendered.Html<Choice>(("Name", "off"), ("Label", "Comes off"), ("Answers", Answers)));
        Assert.Equal(2, none.QuerySelectorAll("input[type=radio]").Length);
        Assert.Empty(none.QuerySelectorAll("input[checked]"));
        var dull = Rendered.Root(Rendered.Html<Choice>(("Name", "off"), ("Label", "Comes off"), ("Answers", Answers), ("Value", "dull")));
        Assert.Equal("dull", Assert.Single(dull.QuerySelectorAll("input[checked]")).GetAttribute("value"));
    }

    [Fact]
    public void The_sheet_carries_the_title_block_with_undo_saved_and_who()
    {
        var page = new HtmlParser().ParseDocument(Sheet());
        Assert.Equal("Rack: 30 blades", page.Title);
        Assert.Equal("Rack", Assert.Single(page.QuerySelectorAll("nav.block a[aria-current=page]")).TextContent);
        Assert.Equal(["Floor", "Rack", "Cuts", "Bench", "More"], page.QuerySelectorAll("nav.block a:not(.whois)").Select(a => a.TextContent));
        var undo = page.QuerySelector("nav.block form.undo")!;
        Assert.Equal("post", undo.GetAttribute("method"));
        Assert.Equal("/undo", undo.GetAttribute("action"));
        Assert.Equal("a-token", undo.QuerySelector("input[name=__RequestVerificationToken]")!.GetAttribute("value"));
        Assert.Equal("op-1", undo.QuerySelector("input[name=op]")!.GetAttribute("value"));
        Assert.Equal("Saved10:42", page.QuerySelector("#saved")!.TextContent.Trim());
        Assert.Null(page.QuerySelector("#page [role=status]"));
        Assert.Equal("true", page.QuerySelector("body > [role=status]")!.GetAttribute("aria-atomic"));
        Assert.Equal("true", page.Body!.GetAttribute("hx-boost:inherited"));
        Assert.Contains("\"defaultTimeout\":8000", page.QuerySelector("meta[name=htmx-config]")!.GetAttribute("content"), StringComparison.Ordinal);
        Assert.All(page.QuerySelectorAll("link[href],script[src]"), e => Assert.Contains("?v=", e.GetAttribute("href") ?? e.GetAttribute("src"), StringComparison.Ordinal));
    }

    [Fact]
    public void A_bare_sheet_has_a_status_place_and_offers_nothing()
    {
        var page = new HtmlParser().ParseDocument(Rendered.Html<Sheet>(("Title", "First start")));
        Assert.Equal("", page.QuerySelector("[role=status]")!.TextContent.Trim());
        Assert.Empty(page.QuerySelectorAll("form"));
        Assert.DoesNotContain(page.QuerySelectorAll("dt"), d => d.TextContent == "Who");
    }

    [Fact]
    public void Ids_inside_a_drawing_carry_the_tag()
    {
        var drawing = Rendered.Html<BladeDrawing>(("Blade", Blade), ("Tag", "Q-01"), ("NewWidth", 26.0), ("LeastWidth", 18.0));
        Assert.Contains("id=\"cut-Q-01\"", drawing, StringComparison.Ordinal);
        Assert.Contains("url(#cut-Q-01)", drawing, StringComparison.Ordinal);
    }

    private static string Sheet() => Rendered.Html<Sheet>(
        ("Title", "Rack: 30 blades"), ("Current", "rack"),
        ("Chrome", new Chrome("Quillmere & Sons", "JP", "10:42", new("Q-17 on Wren", "/undo", "op-1"))),
        ("ChildContent", (RenderFragment)(b => b.AddMarkupContent(0, "<h1>Rack</h1>"))));

    [GeneratedRegex(@"NaN|Infinity|∞|\d[eE]-\d")]
    private static partial Regex NotANumber();
}
