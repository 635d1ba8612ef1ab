using System.Globalization;
using System.Net;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features.ShopJson;

/// <summary>Running sent by a meter, a timer or a logger.</summary>
public sealed class RunsJsonTests : IAsyncLifetime
{
    private ShopApp _app = null!;

    public async Task InitializeAsync() => _app = await ShopApp.Sample();

    public async Task DisposeAsync() => await _app.DisposeAsync();

    [Fact]
    public async Task A_run_goes_to_the_blade_that_was_on()
    {
        var before = await Hours("Q-01");
        var sawBefore = (await _app.GetJson("/api/v1/saws/S1")).GetProperty("hours").GetDouble();
        using var answer = await _app.PostJson("/api/v1/runs", Run(Guid.NewGuid(), "s1", 0.4));
        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        var run = (await ShopApp.Json(answer)).GetProperty("runs")[0];
        Assert.Equal(0.4, run.GetProperty("hours").GetDouble(), 9);
        Assert.Equal(20.7, run.GetProperty("speed_m_s").GetDouble(), 9);
        Assert.Equal(before + 0.4, await Hours("Q-01"), 6);
        Assert.Equal(sawBefore + 0.4, (await _app.GetJson("/api/v1/saws/S1")).GetProperty("hours").GetDouble(), 6);
    }

    [Fact]
    public async Task The_same_op_is_recorded_once_and_answered_alike()
    {
        var op = Guid.NewGuid();
        using var first = await _app.PostJson("/api/v1/runs", Run(op, "S1", 0.4));
        using var other = await _app.PostJson("/api/v1/runs", Run(Guid.NewGuid(), "S2", 0.1));
        Assert.Equal(HttpStatusCode.OK, other.StatusCode);
        var hours = await Hours("Q-01");
        using var again = await _app.PostJson("/api/v1/runs", Run(op, "S1", 0.4));
        Assert.Equal(HttpStatusCode.OK, again.StatusCode);
        Assert.Equal(await first.Content.ReadAsStringAsync(), await again.Content.ReadAsStringAsync());
        Assert.Equal(hours, await Hours("Q-01"));

        using var changed = await _app.PostJson("/api/v1/runs", Run(op, "S1", 0.3));
        Assert.Equal(HttpStatusCode.UnprocessableEntity, changed.StatusCode);
        Assert.Contains("recorded before with other values", await changed.Content.ReadAsStringAsync(), StringComparison.Ordinal);
        Assert.Equal(hours, await Hours("Q-01"));
    }

    [Fact]
    public async Task A_meter_counts_from_the_reading_before_it_and_asks_when_it_is_lower()
    {
        double last;
        await using (var db = _app.NewContext())
        {
            var saw = await db.Saws.SingleAsync(s => s.Code == "S2");
            last = await db.MeterReadings.Where(r => r.SawId == saw.Id).OrderByDescending(r => r.Entry.AtUtc).Select(r => r.ReadingMs).FirstAsync() / 3_600_000.0;
        }

        var before = await Hours("Q-08");
        using var answer = await _app.PostJson("/api/v1/runs", Meter(last + 0.2));
        var said = await answer.Content.ReadAsStringAsync();
        Assert.True(answer.StatusCode == HttpStatusCode.OK, said);
        Assert.Equal(before + 0.2, await Hours("Q-08"), 6);

        _app.Clock.Advance(TimeSpan.FromHours(1));
        using var lower = await _app.PostJson("/api/v1/runs", Meter(last - 5));
        Assert.Equal(HttpStatusCode.UnprocessableEntity, lower.StatusCode);
        Assert.Contains("is lower", (await ShopApp.Json(lower)).GetProperty("errors").GetProperty("meter_reading")[0].GetString(), StringComparison.Ordinal);
        Assert.Equal(before + 0.2, await Hours("Q-08"), 6);
    }

    [Fact]
    public async Task A_saw_with_several_speeds_must_be_told_which()
    {
        using var without = await _app.PostJson("/api/v1/runs", Run(Guid.NewGuid(), "S3", 0.1));
        Assert.Contains("has several speeds", await Error(without, "speed_m_s"), StringComparison.Ordinal);
        var body = Run(Guid.NewGuid(), "S3", 0.1);
        body["speed_m_s"] = 7.6;
        using var with = await _app.PostJson("/api/v1/runs", body);
        Assert.Equal(HttpStatusCode.OK, with.StatusCode);
    }

    [Theory]
    [InlineData("saw", "S9", "saw", "There is no saw S9. Known are: S1, S2, S3, S4, S5.")]
    [InlineData("saw", null, "saw", "Missing: the saw's code.")]
    [InlineData("saw", 1, "saw", "The saw's code is a text in quotes.")]
    [InlineData("op", "seven", "op", "is a GUID")]
    [InlineData("op", null, "op", "Missing: the op")]
    [InlineData("from", "yesterday", "from", "is a date and time such as")]
    [InlineData("from", null, "from", "Missing: when the window of these hours begins.")]
    [InlineData("until", null, "until", "Missing: when the window ends.")]
    [InlineData("until", "2026-12-01T09:59:00Z", "until", "The end must be after the beginning.")]
    [InlineData("until", "2026-12-02T09:00:00Z", "until", "has not come yet")]
    [InlineData("hours", -1, "hours", "The running hours must be more than 0.")]
    [InlineData("hours", "0.4", "hours", "The running hours is a number without quotes.")]
    [InlineData("hours", null, "body", "Give one of: hours, or meter_reading.")]
    [InlineData("hours", 0.6, "hours", "would have run")]
    [InlineData("meter_reading", 12.5, "body", "Give one of: hours, or meter_reading.")]
    [InlineData("source", "guess", "source", "is one of: meter, timer, logger, typed, from_cuts.")]
    [InlineData("source", "meter", "source", "A meter sends its meter_reading, not hours.")]
    [InlineData("source", "from_cuts", "source", "hours from cuts come with the cuts")]
    [InlineData("speed_m_s", 0, "speed_m_s", "must be more than 0")]
    [InlineData("speed", 20.7, "speed", "There is no such field. Did you mean speed_m_s?")]
    public async Task Each_bad_field_has_its_sentence_and_nothing_is_recorded(string field, object? value, string at, string sentence)
    {
        var before = await Entries();
        var body = Run(Guid.NewGuid(), "S1", 0.4);
        if (value is null)
        {
            body.Remove(field);
        }
        else
        {
            body[field] = value;
        }

        using var answer = await _app.PostJson("/api/v1/runs", body);
        Assert.Contains(sentence, await Error(answer, at), StringComparison.Ordinal);
        Assert.Equal(before, await Entries());
    }

    private static Dictionary<string, object> Run(Guid op, string saw, double hours) => new()
    {
        ["saw"] = saw,
        ["op"] = op,
        ["from"] = "2026-12-01T10:00:00Z",
        ["until"] = "2026-12-01T10:30:00Z",
        ["hours"] = hours,
        ["source"] = "typed",
    };

    private Dictionary<string, object> Meter(double reading) => new()
    {
        ["saw"] = "S2",
        ["op"] = Guid.NewGuid(),
        ["until"] = _app.Clock.GetUtcNow().ToString("O", CultureInfo.InvariantCulture),
        ["meter_reading"] = reading,
        ["source"] = "meter",
    };

    private static async Task<string> Error(HttpResponseMessage answer, string field)
    {
        var said = await answer.Content.ReadAsStringAsync();
        Assert.True(answer.StatusCode == HttpStatusCode.BadRequest, $"{(int)answer.StatusCode}: {said}");
        Assert.True((await ShopApp.Json(answer)).GetProperty("errors").TryGetProperty(field, out var sentences), said);
        return string.Join(" ", sentences.EnumerateArray().Select(s => s.GetString()));
    }

    private async Task<double> Hours(string tag) => (await _app.GetJson($"/api/v1/blades/{tag}")).GetProperty("hours").GetDouble();

    private async Task<int> Entries()
    {
        await using var db = _app.NewContext();
        return await db.Entries.CountAsync();
    }
}
