using BladeLog.Advice;
using BladeLog.Records;

namespace BladeLog.Features.Cuts;

/// <summary>What waits to be cut, and which blade for it.</summary>
internal static class CutsPages
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/cuts/{number:int}", Choices);
    }

    internal static async Task<QueuedCut?> Find(Desk desk, int number) => (await desk.Shop()).Cuts.FirstOrDefault(c => c.Number == number);

    private static async Task<IResult> Choices(int number, [AsParameters] OtherQuery query, Desk desk)
    {
        if (await Find(desk, number) is not { } cut)
        {
            return Results.NotFound();
        }

        ShopAdvice advice = await desk.Advice();
        ChoicesModel model = ChoicesModel.Of(cut, advice, await desk.Units(), query.Form);
        return await desk.Page<ChoicesPage, ChoicesModel>(model, model.Other?.Problems.Count > 0 ? StatusCodes.Status422UnprocessableEntity : StatusCodes.Status200OK);
    }
}

/// <summary>The "other stock or feed" form out of the address.</summary>
internal sealed record OtherQuery(string? Other, string? Height, string? Feed, string? Guide, string? Pull, string? Width)
{
    public OtherForm Form => new() { Other = Other, Height = Height, Feed = Feed, Guide = Guide, Pull = Pull, Width = Width };
}
