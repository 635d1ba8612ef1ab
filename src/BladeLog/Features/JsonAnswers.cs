using BladeLog.Records.Writing;
using BladeLog.Ui.Json;

namespace BladeLog.Features;

/// <summary>What the shop's JSON addresses share: how they refuse, and how they say times and lengths.</summary>
internal static class JsonAnswers
{
    public static IResult NotFound(string sentence) => Results.Problem(title: sentence, statusCode: StatusCodes.Status404NotFound);

    /// <summary>A form that was not recorded, as problem details. Fields keep the names they were sent under.</summary>
    public static IResult NotRecorded(WriteResult result, Func<string, string> sentAs)
    {
        switch (result)
        {
            case WriteResult.Refused { Problems: [{ Field: "Op" } reused, ..] }:
                return Problem([reused], _ => "op", "This op was used before. Nothing was done.", StatusCodes.Status422UnprocessableEntity);
            case WriteResult.Refused refused:
                return Problem(refused.Problems, sentAs, "Some fields are not right. Nothing was done.", StatusCodes.Status400BadRequest);
            case WriteResult.Ask ask:
                return Problem(ask.Problems, sentAs, "This is unusual. Nothing was done: enter it on the saw's page, which asks about it.", StatusCodes.Status422UnprocessableEntity);
            case WriteResult.Clash clash:
                return Results.Problem(title: $"{clash.Who} was there first: {clash.What}. Nothing was done.", statusCode: StatusCodes.Status409Conflict);
            default:
                throw new ArgumentOutOfRangeException(nameof(result), "This was recorded.");
        }
    }

    /// <summary>A stored time as JSON says it, with its Z.</summary>
    public static DateTime Utc(DateTime stored) => DateTime.SpecifyKind(stored, DateTimeKind.Utc);

    public static DateTime? Utc(DateTime? stored) => stored is { } time ? Utc(time) : null;

    public static double? Mm(double? metres) => metres * 1e3;

    private static IResult Problem(IReadOnlyList<Problem> problems, Func<string, string> sentAs, string title, int status)
    {
        var reader = new BodyReader();
        foreach (var problem in problems)
        {
            reader.Say(sentAs(problem.Field), problem.Sentence);
        }

        return Results.ValidationProblem(reader.Errors.ToDictionary(e => e.Key, e => e.Value.ToArray()), title: title, statusCode: status);
    }
}
