using System.Net;
using System.Text.Json;
using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Records;

namespace BladeLog.Tests.Features.ShopJson;

/// <summary>The list of cuts, the saws and the choices for all cuts of the sample shop by JSON.</summary>
public sealed class ChoicesJsonTests(SampleShopApp shop) : IClassFixture<SampleShopApp>
{
    public static TheoryData<int> Numbers => [.. Enumerable.Range(1, 15)];

    [Fact]
    public async Task The_list_has_the_fifteen_cuts_in_order()
    {
        var cuts = (await shop.App.GetJson("/api/v1/cuts")).EnumerateArray().Where(c => !c.GetProperty("done").GetBoolean()).ToArray();
        Assert.Equal(Enumerable.Range(1, 15), cuts.Select(c => c.GetProperty("number").GetInt32()));
        Assert.Equal(22, cuts[4].GetProperty("bevel_deg").GetDouble(), 9);
        Assert.Equal(5, cuts[8].GetProperty("tightest_radius_mm").GetDouble(), 9);
        Assert.Equal("log", cuts[10].GetProperty("kind").GetString());
        Assert.True(cuts[14].GetProperty("for_class").GetBoolean());
    }

    [Theory]
    [MemberData(nameof(Numbers))]
    public async Task The_choices_are_those_of_the_advice(int number)
    {
        await using var db = shop.App.NewContext();
        var advice = new ShopAdvice(await ShopNowReader.Read(db, ShopApp.Today.UtcDateTime));
        var expected = advice.For(advice.Now.Cuts.Single(c => c.Number == number));
        var answer = await shop.App.GetJson($"/api/v1/cuts/{number}/choices");
        var choices = answer.GetProperty("choices").EnumerateArray().ToArray();
        Assert.Equal(expected.Choices.Count, choices.Length);
        Assert.Equal(expected.Proposals.Select(p => p.Sentence), answer.GetProperty("if_nothing_fits").EnumerateArray().Select(s => s.GetString()));
        foreach (var (choice, json) in expected.Choices.Zip(choices))
        {
            Assert.Equal((choice.Tag, choice.Saw.Saw.Code), (json.GetProperty("tag").GetString(), json.GetProperty("saw").GetString()));
            Assert.Equal(choice.Reason.Sentence, json.GetProperty("reason").GetString());
            Assert.Equal(choice.SwapNeeded, json.GetProperty("swap_needed").GetBoolean());
            var no = choice.Verdict == Verdict.No;
            Assert.Equal(no ? "no" : choice.Verdict == Verdict.Fits ? "fits" : "with_care", json.GetProperty("verdict").GetString());
            Same(no ? null : choice.Gate!.LowMps * 60, json.GetProperty("feed_low_m_min"));
            Same(no ? null : choice.Gate!.HighMps * 60, json.GetProperty("feed_high_m_min"));
            Same(no ? null : choice.Gate!.AdvisedMps * 60, json.GetProperty("feed_advised_m_min"));
            Same(no ? null : choice.Job!.Minutes, json.GetProperty("minutes"));
            Same(no ? null : choice.Job!.LifeSpent, json.GetProperty("life_spent"));
            Same(no ? null : Math.Round(choice.Job!.Cost.Total), json.GetProperty("cost_minor"));
            Assert.Equal(no ? 0 : choice.Gate!.Limits.Count, json.GetProperty("limits").GetArrayLength());
        }
    }

    [Theory]
    [InlineData(1, "Q-17", "S3", "fits", 0.76, 2.00, "practical", 1036)]
    [InlineData(3, "Q-13", "S2", "fits", 1.51, 5.25, "power", 10263)]
    [InlineData(7, "Q-01", "S1", "fits", 0.89, 5.91, "chip_room", 801)]
    [InlineData(9, "Q-21", "S3", "with_care", 1.43, 2.00, "beam", 2913)]
    public async Task The_first_choice_is_that_of_the_independent_program(int number, string tag, string saw, string verdict, double low, double high, string by, double cost)
    {
        // Demo-shop specification section 7; windows and money to 2 %.
        var first = (await shop.App.GetJson($"/api/v1/cuts/{number}/choices")).GetProperty("choices")[0];
        Assert.Equal(tag, first.GetProperty("tag").GetString());
        Assert.Equal(saw, first.GetProperty("saw").GetString());
        Assert.Equal(verdict, first.GetProperty("verdict").GetString());
        Assert.Equal(by, first.GetProperty("governed_by").GetString());
        Assert.Equal(low, first.GetProperty("feed_low_m_min").GetDouble(), 0.02 * low);
        Assert.Equal(high, first.GetProperty("feed_high_m_min").GetDouble(), 0.02 * high);
        Assert.Equal(cost, first.GetProperty("cost_minor").GetDouble(), 0.02 * cost);
    }

    [Fact]
    public async Task Aluminium_is_refused_for_every_blade()
    {
        var answer = await shop.App.GetJson("/api/v1/cuts/13/choices");
        Assert.NotEmpty(answer.GetProperty("choices").EnumerateArray());
        Assert.All(answer.GetProperty("choices").EnumerateArray(), c => Assert.Equal("no", c.GetProperty("verdict").GetString()));
    }

    [Fact]
    public async Task A_cut_that_is_not_on_the_list_is_not_found()
    {
        using var answer = await shop.App.Client.GetAsync("/api/v1/cuts/999/choices");
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        Assert.Equal("There is no cut 999 on the list.", (await ShopApp.Json(answer)).GetProperty("title").GetString());
    }

    [Fact]
    public async Task The_saws_say_what_is_on_them_and_what_comes_next()
    {
        var saws = (await shop.App.GetJson("/api/v1/saws")).EnumerateArray().ToArray();
        Assert.Equal(["S1", "S2", "S3", "S4", "S5"], saws.Select(s => s.GetProperty("code").GetString()));

        // Demo-shop specification section 7: order of the day S1 7.., S2 2.., S3 1.., S5 12...
        Assert.Equal([7, 2, 1, null, 12], saws.Select(s => s.GetProperty("next_cut").ValueKind == JsonValueKind.Null ? (int?)null : s.GetProperty("next_cut").GetInt32()));
        Assert.Equal("Q-17", saws[2].GetProperty("mounted").GetProperty("tag").GetString());
        Assert.Equal(3, saws[3].GetProperty("setup").GetProperty("wheels").GetArrayLength());
        Assert.Equal([7.6, 15.2], saws[2].GetProperty("setup").GetProperty("speeds_m_s").EnumerateArray().Select(v => v.GetDouble()).Order());
        using var answer = await shop.App.Client.GetAsync("/api/v1/saws/S9");
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
    }

    private static void Same(double? expected, JsonElement actual)
    {
        if (expected is { } figure)
        {
            Assert.Equal(figure, actual.GetDouble(), 1e-9 * Math.Abs(figure));
        }
        else
        {
            Assert.Equal(JsonValueKind.Null, actual.ValueKind);
        }
    }
}
