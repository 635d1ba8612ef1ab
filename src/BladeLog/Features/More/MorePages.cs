using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.More;

public sealed record MoreRow(string Name, string Says, string Href);

public sealed record HandForm : PostedForm
{
    public string? Hand { get; init; }
}

public sealed record MoreModel(IReadOnlyList<MoreRow> Rows);

/// <summary>The pages that are not needed every hour, each a whole row. Only those that answer.</summary>
internal static class MorePages
{
    private static readonly MoreRow[] All =
    [
        new("Checks", "Which saws were looked at today before they started", "/checks"),
        new("Breaks", "What broke, where, and whether it was due", "/breaks"),
        new("Stock", "What is left of each kind, and what to order", "/stock"),
        new("Record", "Everything entered, newest first", "/record"),
        new("Setup", "The shop, its people, its units and its own figures", "/setup"),
        new("Workings", "One published method each, to try with your own numbers", "/workings"),
        new("Cautions", "What may go wrong, and where that is written", "/cautions"),
        new("Labels", "To print and stick on the blades", "/labels"),
        new("Rack card", "The rack on paper, for when the tablet is dead", "/rackcard"),
        new("Hand-over", "What the next shift must know", "/handover"),
        new("Training", "Who may use which saw", "/training"),
        new("Audit", "The record on paper", "/audit"),
        new("Bring in a list", "Blades, saws and hours from a table", "/import"),
    ];

    public static void Map(WebApplication app)
    {
        app.MapGet("/more", Get);
        app.MapPost("/more/hand", SayHand);
    }

    /// <summary>Of this tablet alone: nothing is recorded.</summary>
    private static IResult SayHand([FromForm] HandForm? form, Desk desk)
    {
        desk.SayHand(form?.Hand == "left");
        return Results.Redirect("/more");
    }

    private static async Task<IResult> Get(Desk desk, EndpointDataSource endpoints)
    {
        HashSet<string> there = [.. endpoints.Endpoints.OfType<RouteEndpoint>()
            .Where(e => e.Metadata.GetMetadata<HttpMethodMetadata>() is { } m && m.HttpMethods.Contains("GET"))
            .Select(e => "/" + e.RoutePattern.RawText?.Trim('/'))];
        return await desk.Page<MorePage, MoreModel>(new MoreModel([.. All.Where(r => there.Contains(r.Href))]));
    }
}
