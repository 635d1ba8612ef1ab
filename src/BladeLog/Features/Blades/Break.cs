using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Blades;

public sealed record BreakForm : PostedForm
{
    public string? Site { get; init; }

    public string? Earliest { get; init; }

    public string? Latest { get; init; }

    public string? HoursLow { get; init; }

    public string? HoursHigh { get; init; }

    public string? MinutesLost { get; init; }

    public string? Cost { get; init; }

    public string? Note { get; init; }
}

/// <summary>A break: where, between which hours, and what it cost. Only what is known need be said.</summary>
internal static class Break
{
    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new BreakForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] BreakForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is null)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var site = read.Choice<BreakSite>(nameof(form.Site), form.Site, "Say where it broke; not known is an answer.");
        var command = new RecordBreak(tag, site ?? default)
        {
            EarliestUtc = read.TimeOrDay(nameof(form.Earliest), form.Earliest),
            LatestUtc = read.TimeOrDay(nameof(form.Latest), form.Latest, ends: true),
            HoursLow = read.Duration(nameof(form.HoursLow), form.HoursLow, Fields.RunHours)?.TotalHours,
            HoursHigh = read.Duration(nameof(form.HoursHigh), form.HoursHigh, Fields.RunHours)?.TotalHours,
            MinutesLost = read.Duration(nameof(form.MinutesLost), form.MinutesLost, Fields.MinutesLost)?.TotalMinutes,
            CostMinor = read.Money(nameof(form.Cost), form.Cost),
            Note = string.IsNullOrWhiteSpace(form.Note) ? null : form.Note.Trim(),
        };
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Break of {Tags.Read(tag)}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string tag, BreakForm form, FormState state) =>
        BladeForm.Show<BreakPage, BreakForm>(desk, tag, form, state, async model => model with { LastTime = await LastTime(desk, model.Units) });

    /// <summary>What the shop's last break cost, of which that was told.</summary>
    private static async Task<IReadOnlyDictionary<string, string?>> LastTime(Desk desk, ShopUnits units)
    {
        var told = desk.Db.Breaks.AsNoTracking().OrderByDescending(b => b.LatestUtc).ThenByDescending(b => b.EntryId);
        var minutes = await told.Where(b => b.MinutesLost != null).Select(b => b.MinutesLost).FirstOrDefaultAsync();
        var cost = await told.Where(b => b.CostMinor != null).Select(b => b.CostMinor).FirstOrDefaultAsync();
        return new Dictionary<string, string?>
        {
            [nameof(BreakForm.MinutesLost)] = minutes is { } m ? Figures.Plain(m, 1) : null,
            [nameof(BreakForm.Cost)] = units.BareMoney(cost),
        };
    }
}
