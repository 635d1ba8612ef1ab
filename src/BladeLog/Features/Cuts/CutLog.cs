using System.Text.Json;
using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;
using Choice = BladeLog.Advice.Cuts.Choice;
using Problem = BladeLog.Ui.Forms.Problem;

namespace BladeLog.Features.Cuts;

/// <summary>Cuts that were made: one of the list, or any at a saw.</summary>
internal static class CutLog
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/cuts/{number:int}/done", Done);
        app.MapPost("/cuts/{number:int}/done", SaveDone);
        app.MapGet("/saws/{code}/cut", AtSaw);
        app.MapPost("/saws/{code}/cut", SaveAtSaw);
    }

    private static async Task<IResult> Done(int number, string? blade, string? saw, Desk desk)
    {
        if (await CutsPages.Find(desk, number) is not { } cut)
        {
            return Results.NotFound();
        }

        ShopAdvice advice = await desk.Advice();
        CutAnswer answer = advice.For(cut);
        Choice? choice = answer.Choices.FirstOrDefault(c => c.Verdict != Verdict.No
            && (blade is null || string.Equals(c.Tag, blade, StringComparison.OrdinalIgnoreCase))
            && (saw is null || string.Equals(c.Saw.Saw.Code, saw, StringComparison.OrdinalIgnoreCase)));
        SawNow? on = (saw is null ? null : advice.Now.Saw(saw)) ?? choice?.Saw;
        LogForm form = LogForm.Of(cut, on, choice?.SpeedMps, choice?.Gate?.AdvisedMps, await desk.Units());
        return await Page(desk, cut, null, form, [], blade ?? choice?.Tag);
    }

    private static async Task<IResult> SaveDone(int number, [FromForm] LogForm? form, Desk desk) =>
        await CutsPages.Find(desk, number) is { } cut ? await Save(desk, cut, null, form ?? new()) : Results.NotFound();

    private static async Task<IResult> AtSaw(string code, Desk desk)
    {
        ShopNow shop = await desk.Shop();
        if (shop.Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        LogForm form = await Last(desk, saw) is { } last
            ? LogForm.Of(last, saw, await desk.Units())
            : LogForm.Empty(saw, (await desk.Advice()).Settings[LifeSettings.ReferenceFeed] / 60);
        return await Page(desk, null, saw, form, []);
    }

    private static async Task<IResult> SaveAtSaw(string code, [FromForm] LogForm? form, Desk desk) =>
        (await desk.Shop()).Saw(code) is { } saw ? await Save(desk, null, saw, (form ?? new()) with { Saw = saw.Saw.Code }) : Results.NotFound();

    private static async Task<IResult> Save(Desk desk, QueuedCut? cut, SawNow? saw, LogForm form)
    {
        form = string.IsNullOrWhiteSpace(form.Pick) ? form : form with { Species = form.Pick, Pick = null };
        FormReader read = new(await desk.Units(), desk.Now);
        if (form.Read(read, await desk.Shop(), cut?.Number) is not { } command)
        {
            return await Page(desk, cut, saw, form, read.Problems);
        }

        // From a saw back to it; from the list on to what comes next.
        string? hit = command.Nail && (await desk.Shop()).Saw(command.Saw)?.MountedBladeId is { } on ? (await desk.Shop()).Blades.First(b => b.Blade.Id == on).Blade.Tag : null;
        string onwards = hit is not null ? $"/blades/{hit}/inspect?nail=1" : saw is not null ? $"/saws/{saw.Saw.Code}/cut" : "/cuts";
        WriteResult result = await desk.Write(command, form.Op, onwards, form.Ended, form: JsonSerializer.Serialize(form));
        string what = cut is null ? $"{command.SpeciesTyped} on {command.Saw}" : $"cut {cut.Number} done";
        return result is WriteResult.Done done ? desk.Saved(done, what) : await Page(desk, cut, saw, form, Unwritten.Of(result, read.Units, Field));
    }

    /// <summary>The field of the page that a recorded figure came from.</summary>
    private static string? Field(string recorded) => recorded switch
    {
        nameof(RecordCut.HeightM) => nameof(LogForm.Height),
        nameof(RecordCut.LengthM) => nameof(LogForm.Length),
        nameof(RecordCut.FeedMps) => nameof(LogForm.Feed),
        nameof(RecordCut.Pieces) => nameof(LogForm.Pieces),
        nameof(RecordCut.SpeedMps) => nameof(LogForm.Speed),
        nameof(RecordCut.WoodClass) => nameof(LogForm.Species),
        nameof(RecordCut.Saw) => nameof(LogForm.Saw),
        nameof(RecordCut.At) => nameof(LogForm.Ended),
        _ => null,
    };

    private static Task<CutDone?> Last(Desk desk, SawNow saw) => desk.Db.CutsDone.AsNoTracking()
        .Where(c => c.SawId == saw.Saw.Id && c.Entry.Void == null)
        .OrderByDescending(c => c.Entry.AtUtc).ThenByDescending(c => c.EntryId)
        .FirstOrDefaultAsync();

    private static async Task<IResult> Page(Desk desk, QueuedCut? cut, SawNow? saw, LogForm form, IReadOnlyList<Problem> problems, string? blade = null)
    {
        ShopUnits units = await desk.Units();
        CutDone? last = saw is null ? null : await Last(desk, saw);
        LogModel model = new(cut, saw, form, problems, await desk.Shop(), units)
        {
            BladeAsked = blade,
            // A feed that was only assumed is no figure of last time.
            Before = cut is not null ? LogForm.Of(cut, null, null, null, units)
                : last is not null ? LogForm.Of(last, saw!, units) with { Feed = last.FeedGrade == FeedGrade.Assumed ? null : units.BareFeed(last.FeedMps) }
                : null,
            MoistureReckoned = Figures.Plain((await desk.Advice()).Settings[CutSettings.Moisture], 1),
            Last = last is null ? null : LogForm.Of(last, saw!, units),
            LastSays = last is null ? null : $"{last.SpeciesTyped} {units.Show(new Handbook.Quantities.Length(last.HeightM), Fields.CutHeight)}, {CutSays.Piece(last.LengthM, units)} × {last.Pieces} at {CutSays.Feed(last.FeedMps, units)}",
        };
        return await desk.Page<LogPage, LogModel>(model, problems.Count > 0 ? StatusCodes.Status422UnprocessableEntity : StatusCodes.Status200OK);
    }
}
