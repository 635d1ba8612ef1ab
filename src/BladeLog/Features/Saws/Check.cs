using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Saws;

/// <summary>Each row "yes" is right, "no" is not right; a row left empty is asked for.</summary>
public sealed record CheckForm : PostedForm
{
    public string? Guards { get; init; }

    public string? Tension { get; init; }

    public string? UnderTable { get; init; }

    public string? Quiet { get; init; }

    public string? Brake { get; init; }

    public string? Note { get; init; }

    public string? At { get; init; }
}

/// <summary>The check of one saw before it starts: nothing is ticked beforehand, and nothing is taken for granted.</summary>
internal static class Check
{
    public static Task<IResult> Get(Desk desk, string code) => Show(desk, code, new CheckForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] CheckForm? form, Desk desk, string code)
    {
        form ??= new();
        var shop = await desk.Shop();
        if (shop.Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        bool? Row(string field, string? text, string sentence)
        {
            read.RefuseUnless(text is "yes" or "no", field, sentence);
            return text switch { "yes" => true, "no" => false, _ => null };
        }

        var on = saw.MountedBladeId is not null;
        var guards = Row(nameof(form.Guards), form.Guards, "Guards and doors: right or not right?");
        var tension = on ? Row(nameof(form.Tension), form.Tension, $"Is the {(await desk.Units()).PullName} on?") : null;
        var under = Row(nameof(form.UnderTable), form.UnderTable, "Guard under the table and mouthpiece: right or not right?");
        var quiet = on ? Row(nameof(form.Quiet), form.Quiet, "Turn it by hand: does nothing click?") : null;
        var brake = Row(nameof(form.Brake), form.Brake, "Brake or run-down: right or not right?");
        read.RefuseUnless(form.Who is { Length: > 0 } || await desk.Who() is not null || !await desk.Db.People.AnyAsync(p => p.Active), nameof(form.Who), "Say who looked: tap your initials.");
        var command = new CheckSaw(saw.Saw.Code, guards == true, tension, under == true, quiet, brake == true)
        {
            Note = string.IsNullOrWhiteSpace(form.Note) ? null : form.Note.Trim(),
            At = read.Time(nameof(form.At), form.At),
        };

        // A blade that clicks leads to what to do now, all else to the next saw.
        var leadsTo = quiet == false ? $"/saws/{saw.Saw.Code}/clicking" : "/checks";
        return read.IsGood
            ? await desk.Send(command, form, leadsTo, $"Check of {saw.Saw.Name}", state => Show(desk, code, form, state))
            : await Show(desk, code, form, read.State with { Title = read.State.Problems.Count == 1 ? "One row is not answered" : null });
    }

    private static async Task<IResult> Show(Desk desk, string code, CheckForm form, FormState state)
    {
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var units = await desk.Units();
        string? hint = saw.LastCheck is { } last
            ? $"Last checked {Said.When(last.Entry.AtUtc, desk.Now, units)}{await By(desk, last)}: {CheckWords.Says(last, units)}."
            : "Not checked before.";
        return await SawForm.Show<CheckPage, CheckForm>(desk, code, form, state, hint);
    }

    private static async Task<string> By(Desk desk, StartCheck check) =>
        check.Entry.PersonId is { } id && await desk.Db.People.FindAsync(id) is { } person ? $" by {person.Initials}" : "";
}
