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

/// <summary>What a person is able at on one saw or on all: until when, short for the matrix, and the whole line with when and by whom.</summary>
public sealed record Able(string Until, bool Expired, string Line);

/// <summary>One task of a person: a cell for each saw, and one for what goes for all.</summary>
public sealed record TrainingRow(string Task, IReadOnlyList<Able?> Cells);

public sealed record TrainedPerson(string Person, IReadOnlyList<TrainingRow> Rows);

public sealed record TrainingModel(
    TrainingForm Form, FormState State, IReadOnlyList<string> Columns, IReadOnlyList<TrainedPerson> Trained, int Expired,
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
        var stand = trainings.GroupBy(t => (t.PersonId, t.SawId, t.Task)).Select(g => g.OrderBy(t => t.Entry.AtUtc).ThenBy(t => t.EntryId).Last()).ToList();
        List<(int? Id, string Name)> columns = [.. saws.Select(s => ((int?)s.Id, s.Name)), (null, "All saws")];
        var trained = stand.GroupBy(t => t.Person.Initials).OrderBy(g => g.Key, NaturalOrder.Instance).Select(person => new TrainedPerson(
            person.Key,
            [.. person.GroupBy(t => t.Task).OrderBy(g => g.Key).Select(task => new TrainingRow(
                Said.Capital(TaskWords.Of(task.Key)),
                [.. columns.Select(c => task.FirstOrDefault(t => t.SawId == c.Id) is { } able ? Words(able, c.Name, desk.Now, units) : null)]))])).ToList();
        return await desk.Page<TrainingPage, TrainingModel>(
            new(form, state, [.. columns.Select(c => c.Name)], trained, trained.Sum(p => p.Rows.Sum(r => r.Cells.Count(a => a is { Expired: true }))),
                [.. saws.Select(s => new Ui.Forms.Answer(s.Code, s.Name))], people, (await desk.Who())?.Initials),
            state.Status);
    }

    private static Able Words(Trained t, string on, DateTime now, Ui.ShopUnits units)
    {
        string Day(DateTime utc, string format) => Said.Local(utc, units).ToString(format, CultureInfo.InvariantCulture);
        var line = $"{Said.Capital(TaskWords.Of(t.Task))}, {(t.SawId is null ? "all saws" : on)}: {Day(t.Entry.AtUtc, "d MMM yyyy")} by {t.By.Initials}";
        return t.RefresherUtc is { } due
            ? new Able(Day(due, "MMM yyyy"), due <= now, $"{line}, to {Day(due, "d MMM yyyy")}")
            : new Able("for good", Expired: false, $"{line}, for good");
    }
}
