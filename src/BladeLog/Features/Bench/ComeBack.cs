using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Bench;

/// <summary>What became of one blade; no outcome: it is still away.</summary>
public sealed record ComeBackLine
{
    public string? Tag { get; init; }

    public string? Outcome { get; init; }

    public string? Width { get; init; }

    public string? Price { get; init; }

    public string? Retire { get; init; }
}

public sealed record ComeBackForm : PostedForm
{
    public List<ComeBackLine>? Lines { get; init; }

    public string? At { get; init; }
}

/// <summary>A blade of the batch that came back before.</summary>
public sealed record BackRow(string Tag, string Words);

public sealed record ComeBackModel(ComeBackForm Form, FormState State, string Number, string Service, string Sent, IReadOnlyList<BackRow> Back, ShopUnits Units)
{
    public IReadOnlyList<ComeBackLine> Lines => Form.Lines ?? [];
}

/// <summary>What comes back from the sharpener: all, some, rejected or lost. What is not named stays away.</summary>
internal static class ComeBack
{
    public static Task<IResult> Get(Desk desk, string number) => Show(desk, number, new ComeBackForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] ComeBackForm? form, Desk desk, string number)
    {
        form ??= new();
        var read = new FormReading(await desk.Units(), desk.Now);
        var lines = new List<BackLine>();
        var sent = form.Lines ?? [];
        for (var i = 0; i < sent.Count; i++)
        {
            if (read.Choice<ReturnOutcome>($"Lines[{i}].Outcome", sent[i].Outcome, null) is not { } outcome)
            {
                continue;
            }

            lines.Add(new BackLine(sent[i].Tag ?? "", outcome)
            {
                WidthM = read.Length($"Lines[{i}].Width", sent[i].Width, Fields.BladeWidth),
                PriceMinor = read.Money($"Lines[{i}].Price", sent[i].Price),
                Kind = GrindKind.FullProfile,
                Retire = sent[i].Retire is not null,
            });
        }

        read.RefuseUnless(lines.Count > 0, null, "Say of at least one blade what became of it.");
        var at = read.Time(nameof(form.At), form.At);
        if (!read.IsGood)
        {
            return await Show(desk, number, form, read.State);
        }

        // The command numbers the blades named; the form has a row for each that was away.
        var rows = Enumerable.Range(0, sent.Count).Where(i => !string.IsNullOrEmpty(sent[i].Outcome)).ToList();
        return await desk.Send(new TakeBack(number, lines, at), form, "/bench", $"Return of {number}", state => Show(desk, number, form, Renamed(state, rows)));
    }

    private static FormState Renamed(FormState state, List<int> rows) => state with
    {
        Problems =
        [
            .. state.Problems.Select(p => p.Field is { } f && f.StartsWith("Lines[", StringComparison.Ordinal) && int.TryParse(f[6..f.IndexOf(']')], out var n)
                ? p with { Field = $"Lines[{rows[n]}]{f[(f.IndexOf(']') + 1)..]}" }
                : p),
        ],
    };

    private static async Task<IResult> Show(Desk desk, string number, ComeBackForm form, FormState state)
    {
        var units = await desk.Units();
        var batch = await desk.Db.Batches.AsNoTracking().Include(b => b.Entry).FirstOrDefaultAsync(b => b.Number == number);
        if (batch is null)
        {
            return Results.NotFound();
        }

        var lines = await desk.Db.BatchLines.AsNoTracking().Where(l => l.BatchId == batch.EntryId).OrderBy(l => l.Blade.Tag).Select(l => new { l.EntryId, l.Blade.Tag }).ToListAsync();
        var back = (await desk.Db.BatchReturns.AsNoTracking().Where(r => r.Line.BatchId == batch.EntryId).ToListAsync()).ToDictionary(r => r.LineId);
        var away = lines.Where(l => !back.ContainsKey(l.EntryId)).Select(l => form.Lines?.Find(x => x.Tag == l.Tag) ?? new ComeBackLine { Tag = l.Tag }).ToList();
        var rows = lines.Where(l => back.ContainsKey(l.EntryId)).Select(l => new BackRow(l.Tag, Words(back[l.EntryId].Outcome)));
        return await desk.Page<ComeBackPage, ComeBackModel>(
            new(form with { Lines = away }, state, batch.Number, batch.Service, Said.When(batch.Entry.AtUtc, desk.Now, units), [.. rows], units), state.Status);
    }

    private static string Words(ReturnOutcome outcome) => outcome switch
    {
        ReturnOutcome.Sharpened => "back, sharpened",
        ReturnOutcome.Rejected => "back, rejected",
        ReturnOutcome.Unsharpened => "back, unsharpened",
        _ => "lost",
    };
}
