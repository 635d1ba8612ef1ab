using System.Globalization;
using System.Security.Cryptography;
using System.Text.Json;
using System.Text.RegularExpressions;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui.Json;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Cuts;

/// <summary>The list of cuts by JSON, and which blade for each.</summary>
internal static partial class CutsJson
{
    private static readonly Dictionary<string, string> SentAs = new()
    {
        ["Job"] = "job",
        ["Species"] = "species",
        ["Height"] = "height_mm",
        ["Length"] = "length_mm",
        ["Pieces"] = "pieces",
        ["Radius"] = "tightest_radius_mm",
        ["Bevel"] = "bevel_deg",
        ["Moisture"] = "moisture_pct",
        ["NailChance"] = "nail_chance",
    };

    public static void Map(RouteGroupBuilder api)
    {
        var cuts = api.MapGroup("/cuts").WithTags("Cuts");
        cuts.MapGet("", All).Produces<List<QueuedCutOut>>().WithSummary("The list of cuts, in its order");
        cuts.MapGet("/{number:int}/choices", Choices).Produces<ChoicesOut>().ProducesProblem(StatusCodes.Status404NotFound).WithSummary("Which blade for a cut, best first");
        cuts.MapPost("", Add)
            .Accepts<CutsIn>("application/json")
            .Produces<CutsAdded>()
            .ProducesValidationProblem()
            .ProducesValidationProblem(StatusCodes.Status422UnprocessableEntity)
            .WithSummary("Put cuts on the list, all of them or none");
    }

    private static async Task<IResult> All(Desk desk)
    {
        var now = await desk.Shop();
        return Results.Ok(now.Cuts.Where(c => c.DroppedUtc is null).Select(QueuedCutOut.Of).ToList());
    }

    private static async Task<IResult> Choices(int number, Desk desk)
    {
        var advice = await desk.Advice();
        return advice.Now.Cuts.FirstOrDefault(c => c.Number == number) is { } cut
            ? Results.Ok(ChoicesOut.Of(advice, cut))
            : JsonAnswers.NotFound($"There is no cut {number} on the list.");
    }

    private static async Task<IResult> Add(HttpRequest request, Desk desk)
    {
        var reader = new BodyReader();
        if (await reader.Read<CutsIn>(request) is not { } body)
        {
            return reader.Refusal();
        }

        // Each row's own id follows from the op, so that the same op finds the same rows again.
        var rows = body.Cuts.Select((cut, i) => cut.Queued(Uid(body.Op, i), $"cuts[{i}]", reader)).ToList();
        if (reader.Errors.Count > 0)
        {
            return reader.Refusal();
        }

        var command = new ImportRows("cuts", Sha256(body)) { Rows = [.. rows.Select((row, i) => new ImportRow(i, new QueueCut(row!)))] };
        var result = await desk.Write(command, body.Op.ToString(), "/cuts");
        return result is WriteResult.Done ? Results.Ok(await Added(desk.Db, rows!)) : JsonAnswers.NotRecorded(result, NameOf);
    }

    private static async Task<CutsAdded> Added(ShopDb db, List<QueuedCut> rows)
    {
        var uids = rows.Select(r => r.Uid).ToList();
        var numbers = await db.QueuedCuts.AsNoTracking().Where(c => uids.Contains(c.Uid)).ToDictionaryAsync(c => c.Uid, c => c.Number);
        return new CutsAdded([.. rows.Select(r => new AddedCut(numbers[r.Uid], r.SpeciesTyped, r.TakenAs))]);
    }

    private static Guid Uid(Guid op, int row) =>
        new(SHA256.HashData([.. op.ToByteArray(), .. BitConverter.GetBytes(row)]).AsSpan(0, 16));

    private static string Sha256(CutsIn body) => Convert.ToHexStringLower(SHA256.HashData(JsonSerializer.SerializeToUtf8Bytes(body)));

    /// <summary>"line 2: Height" was sent as cuts[2].height_mm.</summary>
    private static string NameOf(string field) =>
        Row().Match(field) is { Success: true } row
            ? string.Create(CultureInfo.InvariantCulture, $"cuts[{row.Groups[1].Value}].{SentAs.GetValueOrDefault(row.Groups[2].Value, "job")}")
            : "body";

    [GeneratedRegex(@"^line (\d+): (.*)$")]
    private static partial Regex Row();
}
