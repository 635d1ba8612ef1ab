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

    /// <summary>Over the set or tips, where the service set them another way.</summary>
    public string? Kerf { get; init; }

    public string? Retire { get; init; }
}

public sealed record ComeBackForm : PostedForm
{
    public List<ComeBackLine>? Lines { get; init; }

    public string? At { get; init; }

    /// <summary>One more tap: narrower than the least width, and meant.</summary>
    public string? NarrowMeant { get; init; }
}

/// <summary>A blade of the batch that came back before.</summary>
public sealed record BackRow(string Tag, string Words);

/// <summary>Of one blade as it went, each figure as it is typed: width and what was measured last; what is reckoned with where nothing was.</summary>
public sealed record BeforeSent
{
    public string? Width { get; init; }

    public string? Kerf { get; init; }

    public string? KerfFrom { get; init; }

    public string? Price { get; init; }

    public string? PriceFrom { get; init; }
}

public sealed record ComeBackModel(ComeBackForm Form, FormState State, string Number, string Service, string Sent, IReadOnlyList<BackRow> Back, ShopUnits Units)
{
    /// <summary>What was known of each before it went, by tag.</summary>
    public IReadOnlyDictionary<string, BeforeSent> Before { get; init; } = new Dictionary<string, BeforeSent>();

    /// <summary>Tags of those written as lost: they can come back after all.</summary>
    public IReadOnlyList<string> Lost { get; init; } = [];

    /// <summary>A tag found in the bundle that is not on the list, and what is known of it.</summary>
    public string? Stranger { get; init; }

    public string? StrangerWords { get; init; }

    public IReadOnlyList<ComeBackLine> Lines => Form.Lines ?? [];
}

/// <summary>What comes back from the sharpener: all, some, rejected or lost. What is not named stays away.</summary>
internal static class ComeBack
{
    public static Task<IResult> Get(Desk desk, string number, string? stranger) => Show(desk, number, new ComeBackForm(), FormState.New, stranger);

    public static async Task<IResult> Post([FromForm] ComeBackForm? form, Desk desk, string number)
    {
        form ??= new();
        var read = new FormReading(await desk.Units(), desk.Now);
        var advice = await desk.Advice();
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
                KerfM = read.Length($"Lines[{i}].Kerf", sent[i].Kerf, Fields.Kerf),
                PriceMinor = read.Money($"Lines[{i}].Price", sent[i].Price),
                Kind = GrindKind.FullProfile,
                Retire = sent[i].Retire is not null,
                NarrowMeant = form.NarrowMeant is not null,
                LeastWidthM = advice.Now.Blade(sent[i].Tag ?? "") is { } file ? advice.Of(file).Body.LeastWidth.Value : null,
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

    private static async Task<IResult> Show(Desk desk, string number, ComeBackForm form, FormState state, string? stranger = null)
    {
        var units = await desk.Units();
        var batch = await desk.Db.Batches.AsNoTracking().Include(b => b.Entry).FirstOrDefaultAsync(b => b.Number == number);
        if (batch is null)
        {
            return Results.NotFound();
        }

        var lines = await desk.Db.BatchLines.AsNoTracking().Where(l => l.BatchId == batch.EntryId).OrderBy(l => l.Blade.Tag).Select(l => new { l.EntryId, l.Blade.Tag }).ToListAsync();
        var back = (await desk.Db.BatchReturns.AsNoTracking().Where(r => r.Line.BatchId == batch.EntryId).ToListAsync()).ToDictionary(r => r.LineId);
        bool IsLost(int line) => back.TryGetValue(line, out var r) && r.Outcome == ReturnOutcome.Lost;
        var away = lines.Where(l => !back.ContainsKey(l.EntryId) || IsLost(l.EntryId)).OrderBy(l => IsLost(l.EntryId)).Select(l => form.Lines?.Find(x => x.Tag == l.Tag) ?? new ComeBackLine { Tag = l.Tag }).ToList();
        var rows = lines.Where(l => back.ContainsKey(l.EntryId)).Select(l => new BackRow(l.Tag, Words(back[l.EntryId].Outcome)));
        return await desk.Page<ComeBackPage, ComeBackModel>(
            new(form with { Lines = away }, state, batch.Number, batch.Service, Said.When(batch.Entry.AtUtc, desk.Now, units), [.. rows], units)
            {
                Before = await Before(desk, [.. lines.Select(l => l.Tag)], units),
                Lost = [.. lines.Where(l => IsLost(l.EntryId)).Select(l => l.Tag)],
                Stranger = stranger?.Trim(),
                StrangerWords = string.IsNullOrWhiteSpace(stranger) ? null : await Of(desk, batch, Tags.Read(stranger)),
            },
            state.Status);
    }

    private static async Task<Dictionary<string, BeforeSent>> Before(Desk desk, string[] tags, ShopUnits units)
    {
        var advice = await desk.Advice();
        var paid = (await desk.Db.Sharpenings.AsNoTracking().Where(s => s.PriceMinor != null && tags.Contains(s.Blade.Tag))
            .OrderBy(s => s.Entry.AtUtc).ThenBy(s => s.EntryId).Select(s => new { s.BladeId, s.PriceMinor }).ToListAsync()).ToLookup(s => s.BladeId, s => s.PriceMinor);
        return advice.Now.Blades.Where(b => tags.Contains(b.Blade.Tag)).ToDictionary(b => b.Blade.Tag, b => new BeforeSent
        {
            Width = units.BareLength(b.WidthM, Fields.BladeWidth),
            Kerf = units.BareLength(b.KerfM, Fields.Kerf),
            KerfFrom = units.BareLength(advice.Of(b).Body.Kerf.Value, Fields.Kerf),
            Price = units.BareMoney(paid[b.Blade.Id].LastOrDefault()),
            PriceFrom = units.BareMoney(b.Spec.SharpeningPriceMinor),
        });
    }

    /// <summary>A blade in the bundle that the docket does not name. Nothing is recorded of it before somebody knows whose it is.</summary>
    private static async Task<string> Of(Desk desk, Batch batch, string tag)
    {
        if ((await desk.Shop()).Blade(tag) is not { } file)
        {
            return $"{tag} is no blade of this shop. Lay it aside and tell {batch.Service}; whose it is, only they know.";
        }

        return file switch
        {
            { Away: { } away } when away.BatchNumber == batch.Number => $"{tag} is in this batch: say above what became of it.",
            { Away: { } away } => $"{tag} went out in batch {away.BatchNumber} to {away.Service}: take it back there.",
            { Place: Place.Gone } => $"{tag} is written as gone. If this is it, its label is on another blade, or it was struck off too soon: look before it hangs on the rack.",
            { Place: Place.OnSaw } => $"{tag} is written as on a saw. One of the two wears the wrong label: measure width and length.",
            _ => $"{tag} was not sent out, so far as is written. One of the two wears the wrong label, or its going was never written: measure width and length.",
        };
    }

    private static string Words(ReturnOutcome outcome) => outcome switch
    {
        ReturnOutcome.Sharpened => "back, sharpened",
        ReturnOutcome.Rejected => "back, rejected",
        ReturnOutcome.Unsharpened => "back, unsharpened",
        _ => "lost",
    };
}
