using System.Globalization;
using System.Net;
using AngleSharp.Dom;

namespace BladeLog.Tests.Features.Cuts;

/// <summary>The answer page of each cut of the sample shop. Windows and reasons: the shop's own table of expected answers, from an independent program.</summary>
public sealed class ChoicesPageTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Theory]
    [InlineData(1, "Use Q-17: 0.76 to 2.0 m/min")]
    [InlineData(2, "Use Q-08: 1.8 to 4.8 m/min")]
    [InlineData(5, "Use Q-02: 0.97 to 2.0 m/min")]
    [InlineData(6, "Use Q-02: 0.97 to 4.0 m/min")]
    [InlineData(7, "Use Q-01: 0.89 to 5.9 m/min")]
    [InlineData(8, "Use Q-21 with care: 1.4 to 2.0 m/min")]
    [InlineData(9, "Use Q-21 with care: 1.4 to 2.0 m/min")]
    [InlineData(10, "Use Q-17: 0.76 to 2.0 m/min")]
    [InlineData(11, "Use Q-40: 0.29 to 9.6 m/min")]
    [InlineData(12, "Use Q-32: 1.5 to 14 m/min")]
    [InlineData(13, "Nothing fits: aluminium is not wood")]
    [InlineData(14, "Use Q-08: 1.8 to 4.5 m/min")]
    [InlineData(15, "Use Q-21 with care: 1.4 to 2.0 m/min")]
    public async Task The_title_is_the_answer(int cut, string title) =>
        Assert.Equal(title, SampleApp.Text((await Cut(cut)).QuerySelector("h1")));

    // Printed as 1.51 to 5.25 and 1.51 to 4.94: the upper ends lie on the edge of the last figure a page shows.
    [Theory]
    [InlineData(3, "Q-13", 1.51, 5.25)]
    [InlineData(4, "Q-13", 1.51, 4.94)]
    public async Task The_title_gives_blade_and_window(int cut, string tag, double low, double high)
    {
        string[] words = SampleApp.Text((await Cut(cut)).QuerySelector("h1")).Split(' ');
        Assert.Equal(["Use", tag + ":"], words[..2]);
        Assert.Equal(low, double.Parse(words[2], CultureInfo.InvariantCulture), 0.06);
        Assert.Equal(high, double.Parse(words[4], CultureInfo.InvariantCulture), 0.06);
    }

    [Theory]
    [InlineData(6, "Q-01", "2.2 teeth in the cut (3 needed)")]
    [InlineData(2, "Q-14", "on hold: crack 2.6 mm in a gullet")]
    [InlineData(7, "Q-14", "on hold: crack 2.6 mm in a gullet")]
    [InlineData(2, "Q-07", "at the sharpener, batch B-031")]
    [InlineData(7, "Q-32", "edge 39 µm, too dull for this (30 µm)")]
    [InlineData(15, "Q-30", "tightest curve 20 mm, hard bound 14")]
    [InlineData(2, "Q-12", "the push needed to make it cut would twist the blade")]
    [InlineData(1, "Q-02", "tightest curve 180 mm")]
    public async Task A_refusal_reads_well(int cut, string tag, string sentence)
    {
        IElement? row = (await Cut(cut)).QuerySelectorAll(".refused li").FirstOrDefault(li => SampleApp.Text(li).Contains(tag, StringComparison.Ordinal));
        Assert.Contains(sentence, SampleApp.Text(row), StringComparison.Ordinal);
    }

    /// <summary>3.83 m/min is four fifths of the upper edge of 4.79, as the invented shop's own table has it.</summary>
    [Fact]
    public async Task The_advised_feed_stands_right_below_the_answer() =>
        Assert.Contains("Feed it at 3.8 m/min.", SampleApp.Text((await Cut(2)).QuerySelector(".best .say")), StringComparison.Ordinal);

    [Fact]
    public async Task Every_blade_of_the_shop_is_told_of_once_or_counted()
    {
        IDocument page = await Cut(13);
        string refusals = SampleApp.Text(page.QuerySelector(".refused"));
        Assert.Contains("aluminium is not wood", refusals, StringComparison.Ordinal);
        Assert.Null(page.QuerySelector(".gate"));
        Assert.Null(page.QuerySelector("a[href*='/done?']"));
    }

    [Fact]
    public async Task A_mounted_blade_leads_to_the_cut_and_another_to_the_swap()
    {
        Assert.NotNull((await Cut(2)).QuerySelector("a.main[href='/cuts/2/done?blade=Q-08&saw=S2']"));
        Assert.NotNull((await Cut(3)).QuerySelector("a.main[href='/saws/S2/swap?on=Q-13']"));
    }

    [Fact]
    public async Task Where_nothing_fits_well_the_proposals_stand_with_their_figures()
    {
        // Two sheets: 5.7 teeth, 1.22 to 2.00 m/min on Finch with Q-30, 1.64 to 2.00 on Wren with Q-20.
        string page = SampleApp.Text((await Cut(8)).QuerySelector("main"));
        Assert.Contains("Stack two pieces: Q-30 on Finch then has 5.7 teeth in the cut and takes 1.2 to 2.0 m/min", page, StringComparison.Ordinal);
        Assert.Contains("Q-20 on Wren", page, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(12, "detector")]
    [InlineData(9, "Do not back out of a curve under power")]
    [InlineData(15, "only with a supervisor")]
    public async Task A_caution_stands_where_it_belongs(int cut, string words)
    {
        IDocument page = await Cut(cut);
        Assert.Contains(page.QuerySelectorAll(".caution"), c => SampleApp.Text(c).Contains(words, StringComparison.Ordinal));
    }

    [Fact]
    public async Task A_straight_cut_of_clean_wood_has_no_caution() => Assert.Empty((await Cut(2)).QuerySelectorAll(".caution"));

    [Fact]
    public async Task The_figures_behind_an_answer_carry_their_mark_of_origin()
    {
        // Check figures: worked example of the advice, Q-01 in 300 mm Douglas-fir.
        string because = string.Join(' ', (await Cut(7)).QuerySelectorAll(".because").Select(SampleApp.Text));
        Assert.Contains("Teeth in the cut23.6", because, StringComparison.Ordinal);
        Assert.Contains("Thrust that slackens the front edge388 N", because, StringComparison.Ordinal);
        Assert.Contains("default, not yours", because, StringComparison.Ordinal);
        Assert.Contains("published", because, StringComparison.Ordinal);
        Assert.Contains("Cost8.01", because, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("guide=60")]
    [InlineData("pull=60")]
    public async Task Raising_the_guide_or_slackening_the_blade_lowers_the_thrust_allowed(string ask)
    {
        (double now, double then) = await Thrust($"/cuts/7?{ask}");
        Assert.True(then < now, $"{then} N is not under {now} N.");
    }

    [Fact]
    public async Task A_wider_blade_stands_more_thrust()
    {
        (double now, double then) = await Thrust("/cuts/7?width=50");
        Assert.True(then > now, $"{then} N is not over {now} N.");
    }

    [Fact]
    public async Task Shallower_stock_fills_the_gullets_at_a_higher_feed()
    {
        // Chip room goes with the reverse of the height: 5.914 at 300 mm is 7.097 at 250 mm.
        IDocument page = await sample.Page("/cuts/7?height=250");
        Assert.EndsWith("7.1 m/min", Row(page, "Open from, to"), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("height=abc", "Height")]
    [InlineData("feed=-3", "Feed")]
    [InlineData("guide=NaN", "Guide")]
    [InlineData("pull=0", "Pull")]
    [InlineData("width=1", "Width")]
    public async Task What_cannot_be_reckoned_is_said_beside_its_field(string ask, string field)
    {
        using HttpResponseMessage answer = await sample.App.Client.GetAsync($"/cuts/7?{ask}");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        IDocument page = ShopApp.Parse(await answer.Content.ReadAsStringAsync());
        Assert.Equal(ask.Split('=')[1], page.QuerySelector($"input[name={field}]")!.GetAttribute("value"));
        Assert.NotNull(page.QuerySelector($"#f-{field}-err"));
    }

    [Fact]
    public async Task A_cut_that_is_not_there_is_not_found()
    {
        using HttpResponseMessage answer = await sample.App.Client.GetAsync("/cuts/99");
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
    }

    private Task<IDocument> Cut(int number) => sample.Page($"/cuts/{number}");

    private async Task<(double Now, double Then)> Thrust(string path)
    {
        IElement row = Find(await sample.Page(path), "Thrust allowed");
        double[] newtons = [.. row.QuerySelectorAll("td").Select(td => double.Parse(SampleApp.Text(td).Split(' ')[0], CultureInfo.InvariantCulture))];
        return (newtons[0], newtons[1]);
    }

    private static string Row(IDocument page, string what) => SampleApp.Text(Find(page, what));

    private static IElement Find(IDocument page, string what) =>
        page.QuerySelectorAll("#other tr").Single(tr => SampleApp.Text(tr.QuerySelector("th")) == what);
}
