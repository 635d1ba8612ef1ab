using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record InspectForm : CrackForm
{
    public string? Found { get; init; }

    /// <summary>whole, or part with the ticks below.</summary>
    public string? LookedAt { get; init; }

    public string[]? Parts { get; init; }

    public string[]? Marks { get; init; }

    public string? TeethMissing { get; init; }

    /// <summary>Asked because a nail, a stone or grit was hit.</summary>
    public string? Nail { get; init; }
}

/// <summary>A look at gullets, weld and back edge; a crack found is a hold.</summary>
internal static class Inspect
{
    public static Task<IResult> Get(Desk desk, string tag, string? nail) => Show(desk, tag, new InspectForm { Nail = nail }, FormState.New);

    public static async Task<IResult> Post([FromForm] InspectForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is null)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var found = read.Choice<Found>(nameof(form.Found), form.Found, "Say what was found.");
        var said = form.Read(read);
        var parts = Flags<LookedAt>(form.Parts);
        var marks = Flags<BladeMarks>(form.Marks);

        // A crack is written at once: where it lies was looked at, the rest may stay unsaid.
        read.RefuseUnless(found == Records.Found.Crack || form.LookedAt is "whole" or "part", nameof(form.LookedAt), "Say whether the whole loop was looked at.");
        read.RefuseUnless(form.LookedAt != "part" || parts != 0, nameof(form.LookedAt), "Tick what was looked at.");
        var missing = read.Count(nameof(form.TeethMissing), form.TeethMissing, Fields.TeethMissing);
        var command = new RecordInspection(tag, found ?? default)
        {
            LookedAt = form.LookedAt switch { "whole" => Records.LookedAt.WholeLoop, "part" => parts, _ => null },
            Marks = missing > 0 ? marks | BladeMarks.TeethMissing : form.LookedAt is null && marks == 0 ? null : marks,
            TeethMissing = (int?)missing,
            CrackLengthM = said.LengthM,
            CrackTyped = said.Typed,
            Place = said.Place,
            Note = said.Note,
            At = said.At,
        };
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Look at {Tags.Read(tag)}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static T Flags<T>(string[]? names)
        where T : struct, Enum => Enum.TryParse<T>(string.Join(',', (names ?? []).Where(Enum.GetNames<T>().Contains)), out var flags) ? flags : default;

    private static Task<IResult> Show(Desk desk, string tag, InspectForm form, FormState state) =>
        BladeForm.Show<InspectPage, InspectForm>(desk, tag, form, state, async model => model with { LastTime = await CrackFacts.LastTime(desk.Db, model.File.Blade.Id, model.Units) });
}
