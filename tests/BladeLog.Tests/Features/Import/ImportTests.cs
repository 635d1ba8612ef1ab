using System.Net;
using System.Text;
using AngleSharp.Dom;
using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.Import;

public sealed class ImportTests
{
    private const string Blades = "Tag;Width (mm);Thickness (mm);Pitch;Loop (mm);Tooth form;Price;Colour\nB-01;13;0,65;3 TPI;2667;hook;24,00;red\nB-02;6;0,65;6 TPI;2667;regular;18,00;\n";
    private const string Cuts = "Job,Wood,Height (mm),Length (m),Pieces\ndrawer fronts,black cherry,200,1.2,6\nchair backs,beech,45,0.8,12\n";

    [Fact]
    public async Task Blades_are_shown_as_understood_and_kept_only_when_told()
    {
        using ShopApp app = await ShopApp.Sample();
        (HttpStatusCode status, IDocument page) = await Look(app, Blades);
        Assert.Equal(HttpStatusCode.OK, status);
        Assert.Equal("2 blades understood", SampleApp.Text(page.QuerySelector("h1")));
        string text = SampleApp.Text(page.QuerySelector("main"));
        Assert.Equal(["2", "B-01", "13 mm", "0.65 mm", "8.467 mm", "2667 mm", "hook", "24.00"], page.QuerySelector("tbody tr")!.Children.Select(SampleApp.Text));
        Assert.Contains("mean nothing here: Colour", text, StringComparison.Ordinal);
        await using ShopDb db = app.NewContext();
        Assert.False(await db.Blades.AnyAsync(b => b.Tag == "B-01"));

        using HttpResponseMessage kept = await Keep(app, page);
        Assert.Equal("/rack", kept.Headers.Location?.OriginalString);
        Blade blade = await db.Blades.Include(b => b.Spec).SingleAsync(b => b.Tag == "B-01");
        Assert.Equal(0.013, blade.Spec.WidthM, 1e-12);
        Assert.Equal(0.00065, blade.Spec.ThicknessM, 1e-12);
        Assert.Equal(2.667, blade.Spec.NewLoopM!.Value, 1e-12);
        Assert.Equal(2400, blade.Spec.PriceMinor);
        Assert.Equal(0.0254 / 3, blade.Spec.PitchCoarseM, 1e-12);
    }

    [Fact]
    public async Task Cuts_and_saws_are_told_apart_by_their_headings()
    {
        using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage cuts = await Keep(app, (await Look(app, Cuts)).Page);
        Assert.Equal("/cuts", cuts.Headers.Location?.OriginalString);
        string saws = "code,name,wheel_diameters_mm,speeds_m_s,loop_mm,greatest_blade_width_mm,greatest_cut_height_mm,motor_kw,takes,has_hour_meter\nT1,Trial saw,356|356,15.2|7.6,2667,19,300,1.1,board|resaw,no\n";
        (_, IDocument page) = await Look(app, saws);
        Assert.Equal("1 saw understood", SampleApp.Text(page.QuerySelector("h1")));
        using HttpResponseMessage kept = await Keep(app, page);
        Assert.Equal(HttpStatusCode.Redirect, kept.StatusCode);
        await using ShopDb db = app.NewContext();
        SawSetup setup = await db.SawSetups.Include(s => s.Wheels).Include(s => s.Speeds).SingleAsync(s => s.Saw.Code == "T1");
        Assert.Equal((2, 0.356, 15.2, 1100d), (setup.Wheels.Count, setup.Wheels[0].DiameterM, setup.UsualSpeedMps, setup.MotorW));
        Assert.Equal(2.667, setup.LoopM, 1e-9);
        QueuedCut beech = await db.QueuedCuts.SingleAsync(c => c.Job == "chair backs");
        Assert.Equal(0.045, beech.HeightM, 1e-12);
        Assert.NotNull(beech.TakenAs);
    }

    [Theory]
    [InlineData("Job,Wood,Height (mm),Length (mm)\na,European oak,200,1200\n")]
    [InlineData("JOB;TIMBER;cut_height_in;Length [m]\na;European oak;7.874015748;1,2\n")]
    [InlineData("name\tmaterial\tdepth, cm\tcut length\na\tEuropean oak\t20\t1200 mm\n")]
    [InlineData("sep=;\r\n\"Job\";\"Wood\";\"Height\";\"Length\"\r\n\"a\";\"European oak\";\"200 mm\";\"1,2 m\"\r\n")]
    [InlineData("\uFEFFJob,Wood,Height mm,Length in m\n\na,European oak,200,1.2\n,,,\n")]
    public async Task One_job_in_many_spellings_is_the_same_job(string file)
    {
        using ShopApp app = await ShopApp.Sample();
        (HttpStatusCode status, IDocument page) = await Look(app, file);
        Assert.True(status == HttpStatusCode.OK, SampleApp.Text(page.QuerySelector("main")));
        using HttpResponseMessage kept = await Keep(app, page);
        await using ShopDb db = app.NewContext();
        QueuedCut cut = await db.QueuedCuts.SingleAsync(c => c.Job == "a");
        Assert.Equal(0.2, cut.HeightM, 1e-9);
        Assert.Equal(1.2, cut.LengthM, 1e-9);
    }

    [Fact]
    public async Task What_is_wrong_is_named_by_line_and_column_and_nothing_is_kept()
    {
        using ShopApp app = await ShopApp.Sample();
        (HttpStatusCode status, IDocument page) = await Look(app, "Job,Wood,Height (mm),Length (m),Pieces\nfronts,black chery,200,1.2,6\n\"two\nlines\",European oak,abc,0.8,12\nx,European oak,45,0.8,12,extra\n,European oak,45,0.8,1.5\n");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, status);
        string[] wrongs = [.. page.QuerySelectorAll(".problems li").Select(SampleApp.Text)];
        Assert.Equal(5, wrongs.Length);
        Assert.StartsWith("Line 2, Wood: \"black chery\" is not a wood known here.", wrongs[0], StringComparison.Ordinal);
        Assert.StartsWith("Line 3, Height (mm): \"abc\" is not a cut height.", wrongs[1], StringComparison.Ordinal);
        Assert.StartsWith("Line 5: There are 6 cells under 5 headings.", wrongs[2], StringComparison.Ordinal);
        Assert.StartsWith("Line 6, Job: Say what it is for.", wrongs[3], StringComparison.Ordinal);
        Assert.StartsWith("Line 6, Pieces: \"1.5\" is not a whole number.", wrongs[4], StringComparison.Ordinal);
        Assert.Null(page.QuerySelector("form[action='/import/keep']"));
    }

    [Fact]
    public async Task One_bad_line_in_a_thousand_keeps_all_of_them_out_and_at_most_a_hundred_are_named()
    {
        using ShopApp app = await ShopApp.Sample();
        string rows = string.Concat(Enumerable.Range(0, 1000).Select(i => $"job {i},European oak,{(i == 700 ? "x" : "45")},0.8,1\n"));
        (_, IDocument one) = await Look(app, "Job,Wood,Height,Length (m),Pieces\n" + rows);
        Assert.StartsWith("Line 702, Height", SampleApp.Text(one.QuerySelectorAll(".problems li").Single()), StringComparison.Ordinal);
        (_, IDocument many) = await Look(app, "Job,Wood,Height,Length (m),Pieces\n" + rows.Replace(",45,", ",y,", StringComparison.Ordinal));
        Assert.Equal(100, many.QuerySelectorAll(".problems li").Length);
        await using ShopDb db = app.NewContext();
        Assert.Equal(15, await db.QueuedCuts.CountAsync());
    }

    [Fact]
    public async Task Before_an_import_a_copy_is_kept_that_knows_nothing_of_it()
    {
        using ShopApp app = await ShopApp.Sample();
        (_, IDocument page) = await Look(app, Cuts);
        using HttpResponseMessage first = await Keep(app, page);
        Assert.Equal(HttpStatusCode.Redirect, first.StatusCode);
        string copy = Assert.Single(Directory.GetFiles(Path.Combine(app.Dir, "copies"), "before-import-*.db"));
        await using ShopDb before = new(new DbContextOptionsBuilder<ShopDb>().UseSqlite($"Data Source={copy};Mode=ReadOnly;Pooling=False").Options);
        Assert.Equal(15, await before.QueuedCuts.CountAsync());
    }

    [Fact]
    public async Task The_same_file_a_second_time_says_when_it_was_imported()
    {
        using ShopApp app = await ShopApp.Sample();
        (_, IDocument page) = await Look(app, Cuts);
        using HttpResponseMessage first = await Keep(app, page);
        (HttpStatusCode status, IDocument again) = await Look(app, Cuts);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, status);
        Assert.Contains("This file was imported on 1 Dec 2026 10:30 already, with 2 lines.", SampleApp.Text(again.QuerySelector(".problems")), StringComparison.Ordinal);
        await using ShopDb db = app.NewContext();
        Assert.Equal(17, await db.QueuedCuts.CountAsync());
    }

    [Fact]
    public async Task A_tag_twice_or_used_before_is_named_and_a_job_twice_is_told()
    {
        using ShopApp app = await ShopApp.Sample();
        (_, IDocument tags) = await Look(app, "Tag,Width (mm),Thickness (mm),TPI\nB-1,13,0.65,3 TPI\nb-1,13,0.65,3 TPI\nQ-08,13,0.65,3 TPI\n");
        string[] wrongs = [.. tags.QuerySelectorAll(".problems li").Select(SampleApp.Text)];
        Assert.Equal(["Line 3, Tag: B-1 stands on line 2 already.", "Line 4, Tag: Q-08 is or was painted on another blade: a tag is never used again."], wrongs);
        (_, IDocument jobs) = await Look(app, Cuts + "drawer fronts,black cherry,200,1.2,6\n");
        Assert.Contains("Line 4 is the same job as line 2", SampleApp.Text(jobs.QuerySelector(".caution")), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("PK\u0003\u0004xl/workbook.xml", "a workbook or an archive")]
    [InlineData("%PDF-1.7", "a PDF")]
    [InlineData("a\0b,c", "not a text file")]
    [InlineData("<html><body>", "a web page")]
    [InlineData("   \n", "The file is empty")]
    [InlineData("this is a letter\nDear all\n", "does not name columns known here")]
    [InlineData("Job,Wood,Height\na,oak,5\n", "does not name columns known here")]
    [InlineData("Job,Wood,Height,Length\n", "no rows under them")]
    [InlineData("Job,Wood,Height,Depth,Length\na,European oak,5,5,5\n", "both mean height")]
    public async Task A_file_that_is_no_list_is_refused_in_words(string file, string words)
    {
        using ShopApp app = await ShopApp.Sample();
        (HttpStatusCode status, IDocument page) = await Look(app, file);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, status);
        Assert.Contains(words, SampleApp.Text(page.QuerySelector(".problems")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_file_over_ten_megabytes_is_refused_in_words()
    {
        using ShopApp app = await ShopApp.Sample();
        (HttpStatusCode status, IDocument page) = await Look(app, new string('a', 10_000_001));
        Assert.Equal(HttpStatusCode.UnprocessableEntity, status);
        Assert.Contains("larger than 10 MB", SampleApp.Text(page.QuerySelector(".problems")), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("../../bladelog.db")]
    [InlineData("")]
    [InlineData("aaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaa")]
    public async Task Only_a_file_that_waits_can_be_kept(string hash)
    {
        using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage answer = await app.PostForm("/import/keep", new() { ["hash"] = hash, ["kind"] = "cuts" }, on: "/import");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        Assert.Contains("no longer waiting here", await answer.Content.ReadAsStringAsync(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Each_sample_file_on_the_page_can_be_imported_as_it_stands()
    {
        using ShopApp app = await ShopApp.Sample();
        IDocument page = await app.GetPage("/import");
        string[] samples = [.. page.QuerySelectorAll("pre").Select(p => p.TextContent)];
        Assert.Equal(3, samples.Length);
        foreach (string sample in samples)
        {
            (HttpStatusCode status, IDocument read) = await Look(app, sample.Replace("S1,", "T8,", StringComparison.Ordinal).Replace("S2,", "T9,", StringComparison.Ordinal));
            Assert.True(status == HttpStatusCode.OK, SampleApp.Text(read.QuerySelector("main")));
        }
    }

    internal static async Task<(HttpStatusCode Status, IDocument Page)> Look(ShopApp app, string text, string kind = "") =>
        await Look(app, Encoding.UTF8.GetBytes(text), await Token(app), kind);

    internal static async Task<(HttpStatusCode Status, IDocument Page)> Look(ShopApp app, byte[] bytes, string token, string kind = "")
    {
        using MultipartFormDataContent form = new()
        {
            { new StringContent(token), "__RequestVerificationToken" },
            { new StringContent(kind), "kind" },
            { new StringContent(""), "text" },
            { new ByteArrayContent(bytes), "file", "list.csv" },
        };
        using HttpResponseMessage answer = await app.Client.PostAsync("/import", form);
        return (answer.StatusCode, ShopApp.Parse(await answer.Content.ReadAsStringAsync()));
    }

    internal static async Task<string> Token(ShopApp app) =>
        (await app.GetPage("/import")).QuerySelector("input[name=__RequestVerificationToken]")!.GetAttribute("value")!;

    private static async Task<HttpResponseMessage> Keep(ShopApp app, IDocument page)
    {
        string Of(string name) => page.QuerySelector($"form[action='/import/keep'] input[name={name}]")!.GetAttribute("value")!;
        return await app.PostForm("/import/keep", new() { ["hash"] = Of("hash"), ["kind"] = Of("kind"), ["op"] = Of("op") }, on: "/import");
    }
}
