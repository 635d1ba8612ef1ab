using System.Globalization;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui.Json;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Saws;

/// <summary>The saws by JSON, and their running as a meter, timer or logger sends it.</summary>
internal static class SawsJson
{
    private static readonly Dictionary<string, string> SentAs = new()
    {
        ["Saw"] = "saw",
        ["FromUtc"] = "from",
        ["UntilUtc"] = "until",
        ["At"] = "until",
        ["RunningMs"] = "hours",
        ["ReadingMs"] = "meter_reading",
        ["Answer"] = "meter_reading",
        ["SpeedMps"] = "speed_m_s",
        ["Source"] = "source",
    };

    public static void Map(RouteGroupBuilder api)
    {
        var saws = api.MapGroup("/saws").WithTags("Saws");
        saws.MapGet("", All).Produces<List<SawOut>>().WithSummary("Every saw");
        saws.MapGet("/{code}", One).Produces<SawOut>().ProducesProblem(StatusCodes.Status404NotFound).WithSummary("One saw");
        api.MapPost("/runs", Run).WithTags("Saws")
            .Accepts<RunIn>("application/json")
            .Produces<RunsOut>()
            .ProducesValidationProblem()
            .ProducesValidationProblem(StatusCodes.Status422UnprocessableEntity)
            .WithSummary("Record running of a saw");
    }

    private static async Task<IResult> All(Desk desk)
    {
        var advice = await desk.Advice();
        return Results.Ok(advice.Now.Saws.Select(s => SawOut.Of(advice, s)).ToList());
    }

    private static async Task<IResult> One(string code, Desk desk)
    {
        var advice = await desk.Advice();
        return advice.Now.Saw(code) is { } saw ? Results.Ok(SawOut.Of(advice, saw)) : JsonAnswers.NotFound($"There is no saw {code} here.");
    }

    private static async Task<IResult> Run(HttpRequest request, Desk desk)
    {
        var reader = new BodyReader();
        if (await reader.Read<RunIn>(request) is not { } body)
        {
            return reader.Refusal();
        }

        var now = await desk.Shop();
        Check(body, now.Saw(body.Saw), now, reader);
        if (reader.Errors.Count > 0)
        {
            return reader.Refusal();
        }

        var code = now.Saw(body.Saw)!.Saw.Code;
        var result = await desk.Write(Command(body, code), body.Op.ToString(), $"/saws/{code}", device: Desk.ByJson);
        return result is WriteResult.Done done
            ? Results.Ok(new RunsOut(done.EntryId, code, await Recorded(desk.Db, body.Op)))
            : JsonAnswers.NotRecorded(result, field => SentAs.GetValueOrDefault(field, "body"));
    }

    private static void Check(RunIn body, SawNow? saw, ShopNow now, BodyReader reader)
    {
        if (saw is null)
        {
            reader.Say("saw", $"There is no saw {body.Saw}. Known are: {string.Join(", ", now.Saws.Select(s => s.Saw.Code))}.");
        }
        else if (body.Speed is null && saw.Setup.Speeds.Count > 1)
        {
            var speeds = string.Join(", ", saw.Setup.Speeds.Select(s => s.SpeedMps.ToString(CultureInfo.InvariantCulture)));
            reader.Say("speed_m_s", $"{saw.Saw.Name} has several speeds ({speeds} m/s). Say which it ran at.");
        }

        if (body.Hours is null == body.MeterReading is null)
        {
            reader.Say("body", "Give one of: hours, or meter_reading.");
        }
        else if (body.Hours is not null && body.From is null)
        {
            reader.Say("from", "Missing: when the window of these hours begins.");
        }

        if (body.MeterReading is not null != body.Source is RunSource.Meter && body.Hours is null != body.MeterReading is null)
        {
            reader.Say("source", body.MeterReading is null ? "A meter sends its meter_reading, not hours." : "A meter_reading comes from a meter: source \"meter\".");
        }
    }

    private static Command Command(RunIn body, string saw)
    {
        const double Hour = 3_600_000;
        return body.MeterReading is { } reading
            ? new ReadMeter(saw, (long)Math.Round(reading * Hour), Typed(reading)) { At = body.Until.UtcDateTime, SpeedMps = body.Speed }
            : new RecordHours(saw, body.From!.Value.UtcDateTime, body.Until.UtcDateTime, (long)Math.Round(body.Hours!.Value * Hour), body.Source)
            {
                RunningTyped = Typed(body.Hours.Value),
                SpeedMps = body.Speed,
            };
    }

    private static string Typed(double hours) => hours.ToString(CultureInfo.InvariantCulture) + " h";

    /// <summary>The runs this op made, struck out since or not: the same op has the same answer.</summary>
    private static async Task<IReadOnlyList<RecordedRun>> Recorded(ShopDb db, Guid op)
    {
        var runs = await db.Runs.AsNoTracking().IgnoreQueryFilters().Where(r => r.Entry.Op == op).OrderBy(r => r.FromUtc).ThenBy(r => r.EntryId).ToListAsync();
        return [.. runs.Select(r => new RecordedRun(JsonAnswers.Utc(r.FromUtc), JsonAnswers.Utc(r.UntilUtc), r.RunningMs / 3_600_000.0, r.SpeedMps, r.Source))];
    }
}
