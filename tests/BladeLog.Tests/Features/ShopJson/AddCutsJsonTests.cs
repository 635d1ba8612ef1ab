using System.Net;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.ShopJson;

/// <summary>Cuts sent to the list by another program.</summary>
public sealed class AddCutsJsonTests : IAsyncLifetime
{
    private ShopApp _app = null!;

    public async Task InitializeAsync() => _app = await ShopApp.Sample();

    public async Task DisposeAsync() => await _app.DisposeAsync();

    [Fact]
    public async Task Cuts_go_on_the_list_with_what_their_wood_was_taken_as()
    {
        using var answer = await Post(Guid.NewGuid(), Cut(), Cut(("species", "oak"), ("job", "shelf")));
        var said = await answer.Content.ReadAsStringAsync();
        Assert.True(answer.StatusCode == HttpStatusCode.OK, said);
        var added = (await ShopApp.Json(answer)).GetProperty("cuts").EnumerateArray().ToArray();
        Assert.Equal([16, 17], added.Select(c => c.GetProperty("number").GetInt32()));
        Assert.Null(added[0].GetProperty("taken_as").GetString());
        Assert.Equal("European oak", added[1].GetProperty("taken_as").GetString());

        var last = (await _app.GetJson("/api/v1/cuts")).EnumerateArray().Last();
        Assert.Equal(17, last.GetProperty("number").GetInt32());
        Assert.Equal("oak", last.GetProperty("species").GetString());
        Assert.Equal("European oak", last.GetProperty("taken_as").GetString());
        Assert.Equal(45, last.GetProperty("height_mm").GetDouble(), 9);
        Assert.NotEmpty((await _app.GetJson("/api/v1/cuts/17/choices")).GetProperty("choices").EnumerateArray());
    }

    [Fact]
    public async Task Moisture_left_out_is_a_default_and_said_to_be()
    {
        using var answer = await Post(Guid.NewGuid(), Cut());
        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        var cautions = (await _app.GetJson("/api/v1/cuts/16/choices")).GetProperty("cautions").EnumerateArray().Select(c => c.GetString());
        Assert.Contains("Moisture taken as 10 %: default, not yours.", cautions);
    }

    [Fact]
    public async Task The_same_op_adds_once_and_another_body_under_it_is_refused()
    {
        var op = Guid.NewGuid();
        using var first = await Post(op, Cut(), Cut());
        using var again = await Post(op, Cut(), Cut());
        Assert.Equal(HttpStatusCode.OK, again.StatusCode);
        Assert.Equal(await first.Content.ReadAsStringAsync(), await again.Content.ReadAsStringAsync());
        using var other = await Post(op, Cut());
        Assert.Equal(HttpStatusCode.UnprocessableEntity, other.StatusCode);
        Assert.True((await ShopApp.Json(other)).GetProperty("errors").TryGetProperty("op", out _));
        Assert.Equal(17, await Count());
    }

    [Fact]
    public async Task The_same_job_may_be_sent_twice_on_purpose()
    {
        using var first = await Post(Guid.NewGuid(), Cut());
        using var second = await Post(Guid.NewGuid(), Cut());
        Assert.Equal(HttpStatusCode.OK, second.StatusCode);
        Assert.Equal(17, await Count());
    }

    [Theory]
    [InlineData("job", "", "is a text of 1 to 100 characters")]
    [InlineData("job", null, "Missing: what it is for.")]
    [InlineData("species", "cherrywod", "The nearest names are:")]
    [InlineData("height_mm", 0, "must be more than 0")]
    [InlineData("height_mm", "45", "is a number without quotes")]
    [InlineData("length_mm", null, "Missing: the length of one cut in mm.")]
    [InlineData("pieces", 1.5, "is a whole number")]
    [InlineData("pieces", 0, "must lie between 1 and 10000")]
    [InlineData("tightest_radius_mm", -5, "must be more than 0")]
    [InlineData("bevel_deg", 61, "must lie between 0 and 60")]
    [InlineData("moisture_pct", 301, "must lie between 0 and 300")]
    [InlineData("frozen", "no", "is true or false")]
    [InlineData("dirt", "muddy", "is one of: clean, bark_on, reclaimed.")]
    [InlineData("direction", "along", "is one of: rip, cross.")]
    [InlineData("kind", "plank", "is one of: board, resaw, beam, log.")]
    [InlineData("finish", "smooth", "is one of: fine, medium, rough.")]
    [InlineData("nail_chance", 1.1, "must lie between 0 and 1")]
    [InlineData("due", "tomorrow", "is a date such as 2026-05-04")]
    [InlineData("urgent", true, "There is no such field.")]
    public async Task One_bad_field_keeps_the_whole_list_out(string field, object? value, string sentence)
    {
        using var answer = await Post(Guid.NewGuid(), Cut(), Cut((field, value)));
        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
        var problem = await ShopApp.Json(answer);
        var only = Assert.Single(problem.GetProperty("errors").EnumerateObject());
        Assert.Equal($"cuts[1].{field}", only.Name);
        Assert.Contains(sentence, only.Value[0].GetString(), StringComparison.Ordinal);
        Assert.Equal(15, await Count());
    }

    private static Dictionary<string, object> Cut(params (string Field, object? Value)[] changes)
    {
        var cut = new Dictionary<string, object>
        {
            ["job"] = "stool legs",
            ["species"] = "European oak",
            ["height_mm"] = 45,
            ["length_mm"] = 800,
            ["pieces"] = 12,
            ["kind"] = "board",
            ["finish"] = "medium",
        };
        foreach (var (field, value) in changes)
        {
            cut.Remove(field);
            if (value is not null)
            {
                cut[field] = value;
            }
        }

        return cut;
    }

    private Task<HttpResponseMessage> Post(Guid op, params Dictionary<string, object>[] cuts) => _app.PostJson("/api/v1/cuts", new { op, cuts });

    private async Task<int> Count()
    {
        await using var db = _app.NewContext();
        return await db.QueuedCuts.CountAsync(c => c.DoneEntryId == null && c.DroppedUtc == null);
    }
}
