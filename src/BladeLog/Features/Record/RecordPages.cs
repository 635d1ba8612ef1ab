using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Record;

public sealed record VoidForm : PostedForm
{
    public string? Reason { get; init; }

    /// <summary>Sent by the page that asks why; the undo in the title block has no such field.</summary>
    public string? Asked { get; init; }
}

/// <summary>One line of the ledger in words.</summary>
public sealed record EntryLine(int Id, string When, string Entered, string Who, string What, string? Struck, bool CanVoid);

public sealed record RecordModel(IReadOnlyList<EntryLine> Lines, int Page, bool Older);

public sealed record VoidModel(VoidForm Form, FormState State, EntryLine Line, bool Taken);

/// <summary>Everything that was entered, the newest first; what was struck out stays to be seen.</summary>
internal static class RecordPages
{
    private const int Lines = 50;
    private const string AtOnce = "undone at once";

    public static void Map(WebApplication app)
    {
        app.MapGet("/record", List);
        app.MapGet("/record/{entry:int}/void", (Desk desk, int entry) => Show(desk, entry, new VoidForm(), FormState.New));
        app.MapPost("/record/{entry:int}/void", Strike);
    }

    private static async Task<IResult> List(Desk desk, int? page)
    {
        var skip = Math.Max(0, (page ?? 1) - 1) * Lines;
        var past = await Past.OfShop(desk.Db, Lines, skip);
        var (story, units) = (await Story.Of(desk), await desk.Units());
        var edited = await EditedThings.Read(desk.Db, [.. past.Lines.Select(p => p.Entry)], units);
        return await desk.Page<RecordPage, RecordModel>(
            new([.. past.Lines.Select(p => EntryWords.Line(p, story, edited, desk.Now, units))], Math.Max(1, page ?? 1), past.More));
    }

    private static async Task<IResult> Strike([FromForm] VoidForm? form, Desk desk, int entry)
    {
        form ??= new();
        // The undo in the title block sends no reason: it takes back the whole form at once.
        var atOnce = form.Asked is null;
        var read = new FormReading(await desk.Units(), desk.Now);
        read.RefuseUnless(atOnce || !string.IsNullOrWhiteSpace(form.Reason), nameof(form.Reason), "Say why it is struck out.");
        if (!read.IsGood)
        {
            return await Show(desk, entry, form, read.State);
        }

        var leads = atOnce ? await desk.Db.Entries.AsNoTracking().Where(e => e.Id == entry).Select(e => e.AnswerPath).FirstOrDefaultAsync() ?? "/record" : "/record";
        return await desk.Send(
            new VoidEntry(entry, atOnce ? AtOnce : form.Reason!.Trim()) { Together = atOnce }, form, leads, atOnce ? desk.WhatWas(entry) : "struck out",
            state => Show(desk, entry, form, state), canUndo: false, undone: atOnce);
    }

    private static async Task<IResult> Show(Desk desk, int entry, VoidForm form, FormState state)
    {
        if (await Past.Of(desk.Db, entry) is not { } found)
        {
            return Results.NotFound();
        }

        var units = await desk.Units();
        var line = EntryWords.Line(found, await Story.Of(desk), await EditedThings.Read(desk.Db, [found.Entry], units), desk.Now, units);
        return await desk.Page<VoidPage, VoidModel>(new(form, state, line, !line.CanVoid), state.Status);
    }
}
