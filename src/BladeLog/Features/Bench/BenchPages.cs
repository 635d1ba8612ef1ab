namespace BladeLog.Features.Bench;

/// <summary>What the person at the bench has to do today, and what is away.</summary>
internal static class BenchPages
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/bench", Get);
        app.MapGet("/bench/batches/new", SendOut.Get);
        app.MapPost("/bench/batches/new", SendOut.Post);
        app.MapGet("/bench/batches/{number}", ComeBack.Get);
        app.MapPost("/bench/batches/{number}", ComeBack.Post);
    }

    private static async Task<IResult> Get(Desk desk) =>
        await desk.Page<BenchPage, BenchModel>(BenchModel.Of(await desk.Advice(), await desk.Units()));
}
