using System.Net;
using System.Text.RegularExpressions;
using AngleSharp.Html.Dom;
using BladeLog.Tests.Features;
using Microsoft.AspNetCore.Routing;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace BladeLog.Tests.EdgeCases;

/// <summary>A double tap or a resent form makes one fact: every form of the shop is filled in and sent five times, two of them at once.</summary>
public sealed class ResentFormsTests
{
    /// <summary>Forms that record nothing in the ledger.</summary>
    private static readonly string[] Others = ["/who", "/more/hand", "/start", "/import"];

    /// <summary>Route, page, and what is typed.</summary>
    private static readonly (string Route, string Page, string Action, (string Name, string? Value)[] Typed)[] Forms =
    [
        Form("/cuts/new", "/cuts/new", ("Job", "legs"), ("Kind", "Board"), ("Finish", "Medium"), ("Species", "oak"), ("Height", "50"), ("Length", "1000"), ("Pieces", "1")),
        Action("/cuts/{number:int}/move", "/cuts?view=order", "/cuts/4/move", ("To", "down")),
        Form("/cuts/{number:int}/edit", "/cuts/3/edit", ("Pieces", "7")),
        Form("/cuts/{number:int}/done", "/cuts/1/done", ("Minutes", "2")),
        Form("/saws/{code}/cut", "/saws/S2/cut", ("Species", "oak"), ("Height", "50"), ("Length", "1000"), ("Minutes", "1")),
        Form("/blades/new", "/blades/new", ("Tags", "N-1 N-2"), ("Spec", "A1"), ("UsedLow", "0.2"), ("UsedHigh", "0.6")),
        Form("/blades/{tag}/edit", "/blades/Q-13/edit", ("InspectEvery", "6")),
        Form("/blades/{tag}/sharpen", "/blades/Q-13/sharpen", ("Kind", "Face")),
        Form("/blades/{tag}/inspect", "/blades/Q-13/inspect", ("Found", "NothingSeen"), ("LookedAt", "whole")),
        Form("/blades/{tag}/hold", "/blades/Q-11/hold", ("Kind", "Damage")),
        Form("/blades/{tag}/clear", "/blades/Q-11/clear", ("How", "no damage found")),
        Form("/blades/{tag}/hang", "/blades/Q-13/hang", ("Place", "Rack"), ("Hook", "R1-1")),
        Form("/blades/{tag}/tension", "/blades/Q-08/tension", ("Tension", "120"), ("How", "gauge")),
        Form("/blades/{tag}/drift", "/blades/Q-08/drift", ("Angle", "0.5"), ("Side", "left")),
        Form("/blades/{tag}/kerf", "/blades/Q-08/kerf", ("How", "TestCut"), ("Kerf", "1.5")),
        Form("/specs/{code}/edit", "/specs/A2/edit", ("Price", "41.50")),
        Form("/stock", "/stock", ("Spec", "A1"), ("Way", "came"), ("Count", "3"), ("Reason", "delivered")),
        Form("/bench/batches/new", "/bench/batches/new", ("Tags", "Q-13")),
        Form("/bench/batches/{number}", "/bench/batches/B-032", ("Lines[0].Outcome", "Sharpened")),
        Action("/labels", "/labels?show=unlabelled", "/labels"),
        Action("/labels/name", "/labels", "/labels/name", ("LanName", "saws.local")),
        Form("/people/new", "/people/new", ("Initials", "ZZ"), ("Name", "New hand")),
        Form("/people/{initials}", "/people/ZZ", ("Name", "Newer hand")),
        Form("/handover", "/handover", ("Text", "All is well.")),
        Action("/handover/{entry:int}/read", "/handover", null),
        Form("/training", "/training", ("Person", "ZZ"), ("Task", "Operate"), ("By", "OT")),
        Form("/setup", "/setup", ("Name", "Another name")),
        Form("/setup/{key}", "/setup/life.retire_mark", ("Value", "0.7")),
        Form("/saws/{code}/swap", "/saws/S2/swap?on=Q-13", ("Reason", "StillSharp")),
        Form("/blades/{tag}/two", "/blades/Q-13/two", ("OtherTag", "Q-13X"), ("From", "4 min ago")),
        Form("/saws/{code}/hours", "/saws/S3/hours", ("Running", "0:01"), ("From", "2 min ago")),
        Action("/saws/{code}/timer/start", "/saws/S3/timer", "/saws/S3/timer/start"),
        Form("/saws/{code}/timer", "/saws/S3/timer"),
        Action("/saws/{code}/timer/start", "/saws/S3/timer", "/saws/S3/timer/start"),
        Action("/saws/{code}/timer/never", "/saws/S3/timer", "/saws/S3/timer/never"),
        Form("/saws/{code}/check", "/saws/S2/check", ("Guards", "yes"), ("Tension", "yes"), ("UnderTable", "yes"), ("Quiet", "yes"), ("Brake", "yes")),
        Form("/saws/{code}/slack", "/saws/S2/slack", ("LetOff", "yes")),
        Form("/saws/{code}/edit", "/saws/S3/edit", ("Motor", "2 kW"), ("Do", "change")),
        Form("/saws/new", "/saws/new", ("Code", "S9"), ("Name", "New saw"), ("Wheel1", "400"), ("Wheel2", "400"), ("Loop", "3400"), ("WidthLeast", "6"), ("WidthMost", "25"), ("Speed1", "15"), ("Board", "true"), ("CutHeight", "200"), ("Motor", "2 kW")),
        Form("/saws/{code}/clicking", "/saws/S2/clicking"),
        Form("/blades/{tag}/break", "/blades/Q-11/break", ("Site", "Weld")),
        Form("/blades/{tag}/join", "/blades/Q-11/join", ("Loop", "5060"), ("Quality", "Good")),
        Form("/blades/{tag}/retire", "/blades/Q-11/retire", ("Reason", "TooManyJoints")),
        Action("/record/{entry:int}/void", null, null, ("Reason", "typed wrongly")),
        Action("/breaks/{entry:int}", null, null, ("Site", "Weld"), ("MinutesLost", "20")),
    ];

    [Fact]
    public async Task A_double_tap_or_a_resent_form_makes_one_fact_whichever_form_it_is()
    {
        using var app = await ShopApp.Sample();
        await app.Be("OT");
        var wrong = new List<string>();
        foreach (var form in Forms)
        {
            app.Clock.Advance(TimeSpan.FromMinutes(3));
            var (page, action, typed) = await Where(app, form);
            if (await Sent(app, page, action, typed) is { } problem)
            {
                wrong.Add($"{form.Route}: {problem}");
            }
        }

        Assert.True(wrong.Count == 0, string.Join("\n", wrong));
        await app.AssertKept();
    }

    [Fact]
    public async Task No_form_is_left_out_of_the_walk()
    {
        using var app = await ShopApp.Sample();
        var routes = app.Services.GetRequiredService<EndpointDataSource>().Endpoints.OfType<RouteEndpoint>()
            .Where(e => e.Metadata.GetMetadata<IHttpMethodMetadata>()?.HttpMethods.Contains("POST") == true)
            .Select(e => e.RoutePattern.RawText!)
            .Where(p => !p.StartsWith("/api/", StringComparison.Ordinal));

        // The blade that was on then needs hours first and has its own test; an import is known again by the file itself.
        Assert.Empty(routes.Except(Forms.Select(f => f.Route)).Except(Others).Except(["/saws/{code}/then", "/import/keep"]));
    }

    private static (string, string, string, (string, string?)[]) Form(string route, string page, params (string, string?)[] typed) => (route, page, page.Split('?')[0], typed);

    private static (string, string, string, (string, string?)[]) Action(string route, string? page, string? action, params (string, string?)[] typed) => (route, page ?? "", action ?? "", typed);

    /// <summary>Where a form stands on an entry's own page, the entry is looked up.</summary>
    private static async Task<(string Page, string Action, (string Name, string? Value)[] Typed)> Where(ShopApp app, (string Route, string Page, string Action, (string, string?)[] Typed) form)
    {
        await using var db = app.NewContext();
        switch (form.Route)
        {
            case "/handover/{entry:int}/read":
                var note = await db.HandOvers.OrderBy(h => h.EntryId).Select(h => h.EntryId).LastAsync();
                await app.Be("JP");
                return ("/handover", $"/handover/{note}/read", form.Typed);
            case "/record/{entry:int}/void":
                await app.Be("OT");
                var look = await db.Inspections.OrderBy(h => h.EntryId).Select(h => h.EntryId).LastAsync();
                return ($"/record/{look}/void", $"/record/{look}/void", form.Typed);
            case "/breaks/{entry:int}":
                var broke = await db.Breaks.OrderBy(h => h.EntryId).Select(h => h.EntryId).LastAsync();
                return ($"/breaks/{broke}", $"/breaks/{broke}", form.Typed);
            default:
                return (form.Page, form.Action, form.Typed);
        }
    }

    /// <summary>Once, twice at once, and twice more; what is wrong with it, or null.</summary>
    private static async Task<string?> Sent(ShopApp app, string path, string action, (string Name, string? Value)[] typed)
    {
        var page = await app.GetPage(path);
        var form = page.QuerySelectorAll("form[method=post]").OfType<IHtmlFormElement>().FirstOrDefault(f => f.GetAttribute("action") == action);
        if (form is null)
        {
            return $"no form on {path} is sent to {action}";
        }

        var before = await app.EntryCount();
        var first = await app.SendForm(page, action, typed);
        if (first.Status != HttpStatusCode.Redirect)
        {
            return $"answered {(int)first.Status}: {Regex.Match(first.Text, "(?<=<h1>|put right|recorded).{0,300}").Value}{string.Join(" | ", first.Page.QuerySelectorAll(".err, .problems li").Select(e => e.TextContent.Trim()))}";
        }

        var once = await app.EntryCount();

        // What means "now" or "so long ago" means another moment by then, and is the same form all the same.
        app.Clock.Advance(TimeSpan.FromSeconds(2));
        var again = await Task.WhenAll(app.SendForm(page, action, typed), app.SendForm(page, action, typed));
        Answered[] all = [.. again, await app.SendForm(page, action, typed), await app.SendForm(page, action, typed)];
        return once == before ? "recorded nothing"
            : await app.EntryCount() != once ? $"made {await app.EntryCount() - once} more entries when it was sent again"
            : all.FirstOrDefault(a => a.Status != HttpStatusCode.Redirect || a.Location != first.Location) is { } other ? $"answered {(int)other.Status} {other.Location} when it was sent again, {first.Location} before"
            : null;
    }
}
