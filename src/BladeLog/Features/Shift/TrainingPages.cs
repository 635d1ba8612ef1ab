using System.Globalization;
using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Shift;

public sealed record TrainingForm : PostedForm
{
    public string? Person { get; init; }

    public string? Task { get; init; }

    public string? Saw { get; init; }

    public string? By { get; init; }

    public string? Refresher { get; init; }

    public string? At { get; init; }
}

/// <summary>One task a person is able at, on one saw or on all.</summary>
public sealed record Able(string Task, string Since, string By, string? Due, bool Expired);

/// <summary>A person's row: a cell for each saw, and one for what goes for all.</summary>
public sealed record TrainingRow(string Person, IReadOnlyList<IReadOnlyList<Able>> Cells);

public sealed record TrainingModel(
    TrainingForm Form, FormState State, IReadOnlyList<string> Columns, IReadOnlyList<TrainingRow> Rows, int Expired,
    IReadOnlyList<Ui.Forms.Answer> Saws, IReadOnlyList<string> People, string? Who);

/// <summary>Who was found able at which task on which saw, by whom, and until when.</summary>
internal static class TrainingPages
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/training", (Desk desk) => Show(desk, new TrainingForm(), FormState.New));
        app.MapPost("/training", Post);
    }

    private static async Task<IResult> Post([FromForm] TrainingForm? form, Desk desk)
    {
        form ??= new();
        var units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        var task = read.Choice<TrainedTask>(nameof(form.Task), form.Task, "Say what the person was trained at.");
        var due = read.Date(nameof(form.Refresher), form.Refresher);
        var command = new RecordTraining(form.Person ?? "", task ?? default, form.By ?? "")
        {
            Saw = form.Saw,
            RefresherUtc = due is { } day ? TimeZoneInfo.ConvertTimeToUtc(day.ToDateTime(new TimeOnly(12, 0)), units.Zone) : null,
            At = read.Time(nameof(form.At), form.At),
        };
        return read.IsGood
            ? await desk.Send(command, form, "/training", $"{form.Person}: {TaskWords.Of(command.Task)}", state => Show(desk, form, state))
            : await Show(desk, form, read.State);
    }

    private static async Task<IResult> Show(Desk desk, TrainingForm form, FormState state)
    {
        var units = await desk.Units();
        var saws = (await desk.Shop()).Saws.Where(s => s.Saw.Active).Select(s => s.Saw).OrderBy(s => s.Code, NaturalOrder.Instance).ToList();
        var people = await desk.Db.People.AsNoTracking().Where(p => p.Active).OrderBy(p => p.Initials).Select(p => p.Initials).ToListAsync();
        var trainings = await desk.Db.Trainings.AsNoTracking().Include(t => t.Entry).Include(t => t.Person).Include(t => t.By).Where(t => t.Person.Active).ToListAsync();

        // What was taught again stands for what was taught before.
        var stand = trainings.GroupBy(t => (t.PersonId, t.SawId, t.Task)).Select(g => g.OrderBy(t => t.Entry.AtUtc).ThenBy(t => t.EntryId).Last()).ToLookup(t => (t.Person.Initials, t.SawId));
        List<int?> columns = [.. saws.Select(s => (int?)s.Id), null];
        var rows = people.Where(p => columns.Exists(c => stand[(p, c)].Any())).Select(p => new TrainingRow(
            p, [.. columns.Select(c => (IReadOnlyList<Able>)[.. stand[(p, c)].OrderBy(t => t.Task).Select(t => Words(t, desk.Now, units))])])).ToList();
        return await desk.Page<TrainingPage, TrainingModel>(
            new(form, state, [.. saws.Select(s => s.Name), "All saws"], rows, rows.Sum(r => r.Cells.Sum(c => c.Count(a => a.Expired))),
                [.. saws.Select(s => new Ui.Forms.Answer(s.Code, s.Name))], people, (await desk.Who())?.Initials),
            state.Status);
    }

    private static Able Words(Trained t, DateTime now, Ui.ShopUnits units)
    {
        string Day(DateTime utc) => Said.Local(utc, units).ToString("d MMM yyyy", CultureInfo.InvariantCulture);
        return new Able(Said.Capital(TaskWords.Of(t.Task)), Day(t.Entry.AtUtc), t.By.Initials, t.RefresherUtc is { } due ? Day(due) : null, t.RefresherUtc <= now);
    }
}
