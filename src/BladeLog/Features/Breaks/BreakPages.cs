using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Breaks;

/// <summary>What broke, and why.</summary>
internal static class BreakPages
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/breaks", Get);
        app.MapGet("/breaks/{entry:int}", GetOne);
        app.MapPost("/breaks/{entry:int}", Post);
    }

    private static async Task<IResult> Get(Desk desk)
    {
        var words = new BreakSays(await desk.Advice(), await desk.Units(), desk.Now);
        return await desk.Page<BreaksPage, BreaksModel>(words.List(await Broken(desk, null)));
    }

    private static async Task<IResult> GetOne(Desk desk, int entry) => await Show(desk, entry, null, FormState.New);

    private static async Task<IResult> Post([FromForm] CompleteForm? form, Desk desk, int entry)
    {
        form ??= new();
        var read = new FormReading(await desk.Units(), desk.Now);
        var command = new CompleteBreak(entry, read.Choice<BreakSite>(nameof(form.Site), form.Site, "Say how it broke; not known is an answer.") ?? default)
        {
            HoursLow = read.Duration(nameof(form.HoursLow), form.HoursLow, Fields.RunHours)?.TotalHours,
            HoursHigh = read.Duration(nameof(form.HoursHigh), form.HoursHigh, Fields.RunHours)?.TotalHours,
            MinutesLost = read.Duration(nameof(form.MinutesLost), form.MinutesLost, Fields.MinutesLost)?.TotalMinutes,
            CostMinor = read.Money(nameof(form.Cost), form.Cost),
            Note = form.Note,
        };
        return read.IsGood
            ? await desk.Send(command, form, "/breaks", "Break completed", state => Show(desk, entry, form, state), canUndo: false)
            : await Show(desk, entry, form, read.State);
    }

    private static async Task<IResult> Show(Desk desk, int entry, CompleteForm? form, FormState state)
    {
        if (await Broken(desk, entry) is not [var broken])
        {
            return Results.NotFound();
        }

        var units = await desk.Units();
        var words = new BreakSays(await desk.Advice(), units, desk.Now);
        var told = AsTold(broken.Break, units);
        return await desk.Page<BreakPage, BreakModel>(
            words.One(broken, form ?? told, state) with
            {
                Told = told,
                HoursKnown = Figures.Plain(broken.Blade.File.Hours, 1),
                Who = (await desk.Who())?.Initials,
                People = await desk.Db.People.AsNoTracking().Where(p => p.Active).OrderBy(p => p.Initials).Select(p => p.Initials).ToListAsync(),
            },
            state.Status);
    }

    private static CompleteForm AsTold(Break broke, ShopUnits units) => new()
    {
        Site = broke.Site == BreakSite.Unknown ? null : broke.Site.ToString(),
        HoursLow = Plain(broke.HoursLow),
        HoursHigh = Plain(broke.HoursHigh),
        MinutesLost = Plain(broke.MinutesLost),
        Cost = units.BareMoney(broke.CostMinor),
        Note = broke.Note,
    };

    private static string? Plain(double? value) => value is { } v ? Figures.Plain(v, 2) : null;

    /// <summary>Newest first.</summary>
    private static async Task<IReadOnlyList<BrokenBlade>> Broken(Desk desk, int? entry)
    {
        var shop = await desk.Shop();
        var advice = await desk.Advice();
        var breaks = await desk.Db.Breaks.AsNoTracking().Include(b => b.Entry.Person).Where(b => entry == null || b.EntryId == entry)
            .OrderByDescending(b => b.LatestUtc).ThenByDescending(b => b.EntryId).ToListAsync();
        var joints = (await desk.Db.Joints.AsNoTracking().Select(j => new { j.BladeId, j.Entry.AtUtc }).ToListAsync()).ToLookup(j => j.BladeId, j => j.AtUtc);
        return [.. breaks.Select(b => BrokenBlade.Of(shop.Blades.First(f => f.Blade.Id == b.BladeId), b, joints[b.BladeId], advice))];
    }
}
