using BladeLog.Ui.Json;

namespace BladeLog.Features.Workings;

/// <summary>The stateless workings by JSON: one published method each.</summary>
internal static class WorkingsJson
{
    public static void Map(RouteGroupBuilder api)
    {
        var workings = api.MapGroup("/workings").WithTags("Workings").DisableAntiforgery();
        Post<BandLifeIn, BandLifeOut>(workings, "/band-life", "Bends, hours and verdict of a band on its wheels", BandLifeWorking.Answer);
        Post<TensionIn, TensionOut>(workings, "/tension", "Tension on the body from a pull, a wheel load, a stretch or a plucked note", TensionWorking.Answer);
        Post<ThrustLimitsIn, ThrustLimitsOut>(workings, "/thrust-limits", "How hard the wood may push before the front edge goes slack or the band twists away", ThrustLimitsWorking.Answer);
        Post<CutIn, CutOut>(workings, "/cut", "Bite, chip room, forces, power and the feeds that work", CutWorking.Answer);
        Post<CurveIn, CurveAnswer>(workings, "/curve", "Tightest curve of a blade from its width, thickness and kerf", CurveWorking.Answer);
        Post<WearIn, WearOut>(workings, "/wear", "Rounding of an edge with the wood it has gone through, and what is left of it", WearWorking.Answer);
    }

    private static void Post<TIn, TOut>(RouteGroupBuilder group, string path, string summary, Func<TIn, BodyReader, TOut?> answer)
        where TIn : class
        where TOut : class
        => group.MapPost(path, async (HttpRequest request) =>
            {
                var reader = new BodyReader();
                if (await reader.Read<TIn>(request) is not { } body)
                {
                    return reader.Refusal();
                }

                try
                {
                    return answer(body, reader) is { } found ? Results.Ok(found) : reader.Refusal();
                }
                catch (ArgumentOutOfRangeException refused)
                {
                    // Each field was in its bounds; together they make something that cannot be. The handbook says what.
                    reader.Say("body", refused.Message.Split(" (Parameter", StringSplitOptions.None)[0].Split('\n')[0]);
                    return reader.Refusal();
                }
            })
            .Accepts<TIn>("application/json")
            .Produces<TOut>()
            .ProducesValidationProblem()
            .WithSummary(summary);
}
