using System.Net;
using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Cuts;

public sealed class CutLogTests
{
    [Fact]
    public async Task A_cut_that_is_done_leaves_the_list_and_counts_for_the_edge_of_the_blade_on_the_saw()
    {
        using ShopApp app = await ShopApp.Sample();
        IDocument form = await app.GetPage("/cuts/2/done?blade=Q-08&saw=S2");
        Assert.Contains("counts for the edge of Q-08", SampleApp.Text(form.QuerySelector("main")), StringComparison.Ordinal);
        Assert.Contains("come from its hour meter", SampleApp.Text(form.QuerySelector("main")), StringComparison.Ordinal);
        long before = await Path(app, "Q-08");
        using HttpResponseMessage answer = await app.PostForm("/cuts/2/done", QueueTests.Fields(form));
        Assert.Equal("/cuts", answer.Headers.Location?.OriginalString);
        Assert.Null((await app.GetPage("/cuts")).QuerySelector("#cut-2"));

        // Raw wood path of a tooth: area times band speed over feed times loop. 6 x 1.2 m x 0.2 m at the 3.83 m/min advised, 23.5 m/s, 5.080 m.
        double metres = 6 * 1.2 * 0.2 * 23.5 / (0.8 * 4.79 / 60 * 5.080);
        Assert.Equal(metres, (await Path(app, "Q-08") - before) / 1000.0, 0.01 * metres);
    }

    [Fact]
    public async Task What_can_be_undone_names_the_saw_and_not_its_code()
    {
        using ShopApp app = await ShopApp.Sample();
        IDocument form = await app.GetPage("/saws/S2/cut");
        (await app.SendForm(form, "/saws/S2/cut", ("Species", "black cherry"), ("Height", "100"), ("Length", "1.2"), ("Pieces", "2"), ("Feed", "3"))).LeadsTo("/saws/S2/cut");
        Assert.Contains("black cherry on Osprey", SampleApp.Text((await app.GetPage("/saws/S2/cut")).QuerySelector(".undo")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_blade_that_is_not_on_the_saw_is_said_before_the_cut_is_counted_for_another()
    {
        using ShopApp app = await ShopApp.Sample();
        string page = SampleApp.Text((await app.GetPage("/cuts/3/done?blade=Q-13&saw=S2")).QuerySelector("main"));
        Assert.Contains("Q-13 is not on Osprey in the record. Record the swap first, or this counts for Q-08.", page, StringComparison.Ordinal);
    }

    [Fact]
    public async Task On_a_saw_without_an_hour_meter_the_cut_counts_for_hours_too()
    {
        using ShopApp app = await ShopApp.Sample();
        IDocument form = await app.GetPage("/saws/S3/cut");
        Assert.Contains("it counts for running hours too", SampleApp.Text(form.QuerySelector("main")), StringComparison.Ordinal);
        int before = await Runs(app);
        Dictionary<string, string> fields = QueueTests.Fields(form);
        fields["Pieces"] = "2";
        fields["Minutes"] = "3";
        using HttpResponseMessage answer = await app.PostForm("/saws/S3/cut", fields);
        Assert.Equal("/saws/S3/cut", answer.Headers.Location?.OriginalString);
        Assert.Equal(before + 1, await Runs(app));
        await using ShopDb db = app.NewContext();
        CutDone cut = await db.CutsDone.OrderByDescending(c => c.EntryId).FirstAsync();
        Assert.Equal(FeedGrade.Timed, cut.FeedGrade);
        Assert.Equal(cut.LengthM * 2 / 180, cut.FeedMps, 1e-12);
    }

    [Fact]
    public async Task The_last_cut_is_repeated_in_one_tap()
    {
        using ShopApp app = await ShopApp.Sample();
        IDocument page = await app.GetPage("/saws/S2/cut");
        IElement again = page.QuerySelector("main form")!;
        Assert.StartsWith("Again:", SampleApp.Text(again.QuerySelector("button")), StringComparison.Ordinal);
        Dictionary<string, string> fields = again.QuerySelectorAll("input[name]").Where(i => i.GetAttribute("name") != "__RequestVerificationToken")
            .ToDictionary(i => i.GetAttribute("name")!, i => i.GetAttribute("value") ?? "");
        await using ShopDb db = app.NewContext();
        int before = await db.CutsDone.CountAsync();
        using HttpResponseMessage answer = await app.PostForm("/saws/S2/cut", fields);
        using HttpResponseMessage twice = await app.PostForm("/saws/S2/cut", fields);
        Assert.Equal(HttpStatusCode.Redirect, answer.StatusCode);
        Assert.Equal(HttpStatusCode.Redirect, twice.StatusCode);
        Assert.Equal(before + 1, await db.CutsDone.CountAsync());
        CutDone[] last = await db.CutsDone.Where(c => c.Saw.Code == "S2").OrderByDescending(c => c.EntryId).Take(2).ToArrayAsync();
        Assert.Equal((last[1].SpeciesKey, last[1].Pieces), (last[0].SpeciesKey, last[0].Pieces));
        Assert.Equal(last[1].HeightM, last[0].HeightM, 1e-9);
    }

    [Theory]
    [InlineData("Species", "moonwood")]
    [InlineData("Species", "steel")]
    [InlineData("Feed", "quick")]
    [InlineData("Ended", "tomorrow-ish")]
    [InlineData("Pieces", "0")]
    public async Task Bad_input_keeps_its_text_and_records_nothing(string field, string typed)
    {
        using ShopApp app = await ShopApp.Sample();
        Dictionary<string, string> fields = QueueTests.Fields(await app.GetPage("/saws/S2/cut"));
        fields[field] = typed;
        await using ShopDb db = app.NewContext();
        int before = await db.CutsDone.CountAsync();
        using HttpResponseMessage answer = await app.PostForm("/saws/S2/cut", fields);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        IDocument page = ShopApp.Parse(await answer.Content.ReadAsStringAsync());
        Assert.Equal(typed, page.QuerySelector($"input[name={field}]")!.GetAttribute("value"));
        Assert.NotNull(page.QuerySelector($"#f-{field}-err"));
        Assert.Equal(before, await db.CutsDone.CountAsync());
    }

    [Fact]
    public async Task A_saw_that_is_not_there_is_not_found()
    {
        using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage answer = await app.Client.GetAsync("/saws/S9/cut");
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
    }

    private static async Task<long> Path(ShopApp app, string tag)
    {
        await using ShopDb db = app.NewContext();
        int blade = await db.Blades.Where(b => b.Tag == tag).Select(b => b.Id).SingleAsync();
        int[] mounts = await db.Mounts.Where(m => m.BladeId == blade).Select(m => m.EntryId).ToArrayAsync();
        return await db.WoodPaths.Where(p => mounts.Contains(p.MountId)).SumAsync(p => p.PathMm);
    }

    private static async Task<int> Runs(ShopApp app)
    {
        await using ShopDb db = app.NewContext();
        return await db.Runs.CountAsync(r => r.Source == RunSource.FromCuts && r.Entry.Void == null);
    }
}
