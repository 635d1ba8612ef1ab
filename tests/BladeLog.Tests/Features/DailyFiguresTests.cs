using System.Globalization;
using System.Net;
using AngleSharp.Dom;
using BladeLog.Ui;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features;

/// <summary>On a daily job no figure needs the keyboard: steps of one unit and of ten, and the figure of last time.</summary>
public sealed class DailyFiguresTests
{
    private static readonly string[] OfBlade =
    [
        "sharpen", "kerf", "drift", "inspect", "hold", "clear", "join", "break", "hang", "retire", "edit",
        "tension?how=gauge", "tension?how=strand", "tension?how=wheel", "tension?how=stretch", "tension?how=pluck",
    ];

    private static readonly string[] OfSaw = ["cut", "hours", "hours?typed=1", "timer", "swap", "check", "slack", "then", "clicking"];

    [Theory]
    [InlineData("Millimetre")]
    [InlineData("Inch")]
    public async Task Every_figure_of_a_daily_job_has_its_keys(string lengths)
    {
        await using var app = await Shop(lengths);
        List<string> bare = [];
        var seen = new Dictionary<string, string[]>();
        foreach (var page in await Pages(app))
        {
            foreach (var field in Figures(await app.GetPage(page)))
            {
                string[] adds = [.. Keys(field).QuerySelectorAll("[data-add]").Select(k => k.GetAttribute("data-add")!)];
                if (adds.Length != 4 || Keys(field).GetAttribute("data-steps") != field.Id)
                {
                    bare.Add($"{page}: {field.Id}");
                }
                else
                {
                    var steps = adds.Select(a => decimal.Parse(a, CultureInfo.InvariantCulture)).ToList();
                    Assert.Equal([-10 * steps[2], -steps[2], steps[2], 10 * steps[2]], steps);
                    seen[field.Id!] = adds;
                }
            }
        }

        Assert.Empty(bare);
        Assert.Equal(lengths == "Inch" ? "0.001" : "0.01", seen["f-Kerf"][2]);
        Assert.Equal(lengths == "Inch" ? "0.1" : "1", seen["f-Height"][2]);
        Assert.Equal(lengths == "Inch" ? "100" : "1", seen["f-Tension"][2]);

        // These were all met, so that none goes missing with its page.
        foreach (var id in new[] { "f-Width", "f-SetLeft", "f-Angle", "f-CrackLength", "f-TeethMissing", "f-Force", "f-Stretch", "f-Note", "f-Span", "f-Loop", "f-MinutesLost", "f-HoursLow", "f-Reading", "f-Running", "f-Feed", "f-Moisture", "f-Pieces", "f-Lines-0-Width", "f-MeasuredThickness" })
        {
            Assert.Contains(id, seen.Keys);
        }
    }

    [Theory]
    [InlineData("Millimetre")]
    [InlineData("Inch")]
    public async Task The_figure_of_last_time_is_taken_as_it_stands(string lengths)
    {
        await using var app = await Shop(lengths);
        List<string> refused = [];
        var taken = new HashSet<string>();
        foreach (var page in await Pages(app))
        {
            var open = await app.GetPage(page);
            foreach (var form in open.QuerySelectorAll("main form[method=post]"))
            {
                var lasts = form.QuerySelectorAll("[data-set]").Select(k => (Field: k.Closest(".frow")!.QuerySelector("input")!, Text: k.GetAttribute("data-set")!)).ToList();
                if (lasts.Count == 0)
                {
                    continue;
                }

                // No such moment: the form comes back unrecorded, with a sentence for each figure that it could not read.
                var when = new[] { "At", "Until", "Latest", "Ended", "Due" }.Where(n => form.QuerySelector($"[name={n}]") is not null).Select(n => (n, (string?)"never"));
                var answer = await app.SendForm(open, form.GetAttribute("action")!, [.. lasts.Select(l => (l.Field.GetAttribute("name")!, (string?)l.Text)), .. when]);
                Assert.NotEqual(HttpStatusCode.InternalServerError, answer.Status);
                foreach (var (field, text) in lasts)
                {
                    taken.Add(field.Id!);
                    if (answer.Page.QuerySelector($"[id='{field.Id}-err']") is { } wrong)
                    {
                        refused.Add($"{page}: {field.Id} \"{text}\": {wrong.TextContent}");
                    }
                }
            }
        }

        Assert.Empty(refused);
        foreach (var id in new[] { "f-Width", "f-Kerf", "f-SetLeft", "f-Tension", "f-Force", "f-Loop", "f-Reading", "f-Height", "f-Length", "f-Pieces", "f-HoursLow", "f-Price", "f-CrackLength", "f-Angle", "f-Stretch", "f-Over", "f-Note", "f-Span", "f-Lines-0-Width" })
        {
            Assert.Contains(id, taken);
        }
    }

    [Theory]
    [InlineData(UnitSystem.Metric, "38.1")]
    [InlineData(UnitSystem.Metric, "1 1/2 in")]
    [InlineData(UnitSystem.Metric, "0.035 in")]
    [InlineData(UnitSystem.Metric, "0.9")]
    [InlineData(UnitSystem.Metric, "4013")]
    [InlineData(UnitSystem.Metric, "1200")]
    [InlineData(UnitSystem.Inch, "1 1/2")]
    [InlineData(UnitSystem.Inch, "1-15/32")]
    [InlineData(UnitSystem.Inch, "0.035")]
    [InlineData(UnitSystem.Inch, "37.34 mm")]
    [InlineData(UnitSystem.Inch, "13'2\"")]
    [InlineData(UnitSystem.Inch, "12000")]
    public void A_known_length_reads_back_as_itself(UnitSystem system, string typed)
    {
        var units = new ShopUnits { Units = system };
        foreach (var field in new[] { Fields.AnyLength, Fields.Board with { Least = 0 } })
        {
            var length = units.ReadLength(typed, field with { Most = 1000 }).Value.Metres;
            var again = units.ReadLength(units.BareLength(length, field), field with { Most = 1000 }).Value.Metres;

            // Half of the last digit shown: a hundredth of a millimetre or a thousandth of an inch, which is what a caliper reads.
            Assert.Equal(length, again, system == UnitSystem.Inch ? 0.0005 * 0.0254 : 0.5e-5);
        }
    }

    private static async Task<ShopApp> Shop(string lengths)
    {
        var app = await ShopApp.Sample();
        if (lengths == "Inch")
        {
            (await app.Fill("/setup", ("Lengths", lengths))).LeadsTo("/setup");
        }

        // A crack, a lead, a stretch and a note that were measured, so that there is a last time to tell of each.
        var on = await app.TagOn("S1");
        var inch = lengths == "Inch";
        (await app.Fill($"/blades/{on}/tension?how=stretch", ("Stretch", inch ? "0.0032" : "0.08"), ("Over", inch ? "5" : "127"))).LeadsTo($"/blades/{on}");
        (await app.Fill($"/blades/{on}/tension?how=pluck", ("Note", "92"), ("Span", inch ? "24" : "600"))).LeadsTo($"/blades/{on}");
        (await app.Fill($"/blades/{on}/drift", ("Angle", "0.8"), ("Side", "left"))).LeadsTo($"/blades/{on}");
        (await app.Fill("/blades/Q-02/inspect", ("Found", "Crack"), ("Place", "Gullet"), ("CrackLength", inch ? "0.12" : "3.1"))).LeadsTo("/blades/Q-02");
        return app;
    }

    private static async Task<IReadOnlyList<string>> Pages(ShopApp app)
    {
        await using var db = app.NewContext();
        var on = await app.TagOn("S1");

        // Of the blades each fourth, and those of which more was measured.
        var tags = (await db.Blades.OrderBy(b => b.Tag).Select(b => b.Tag).ToListAsync()).Where((t, i) => i % 4 == 0 || t is "Q-02" or "Q-18" or "Q-37" || t == on).ToList();
        var saws = await db.Saws.Select(s => s.Code).ToListAsync();
        var cuts = await db.QueuedCuts.Select(c => c.Number).ToListAsync();
        var batches = await db.Batches.Select(b => b.Number).ToListAsync();
        var breaks = await db.Breaks.Select(b => b.EntryId).ToListAsync();
        return
        [
            "/cuts/new", "/bench/batches/new", "/stock",
            .. cuts.SelectMany(c => new[] { $"/cuts/{c}/edit", $"/cuts/{c}/done" }),
            .. saws.SelectMany(s => OfSaw.Select(p => $"/saws/{s}/{p}")),
            .. tags.SelectMany(t => OfBlade.Select(p => $"/blades/{t}/{p}")),
            .. batches.Select(b => $"/bench/batches/{b}"),
            .. breaks.Select(b => $"/breaks/{b}"),
        ];
    }

    /// <summary>Fields for figures in what a person sends: those that call up the keys of figures, and those with a unit behind them.</summary>
    private static IEnumerable<IElement> Figures(IDocument page) => page.QuerySelectorAll("main form[method=post] .frow")
        .Where(r => r.QuerySelector("input[inputmode=decimal],input[inputmode=numeric]") is not null || r.QuerySelector(".unit") is not null)
        .Select(r => r.QuerySelector("input")!);

    private static IElement Keys(IElement field) => field.Closest(".frow")!.QuerySelector(".steps") ?? field;
}
