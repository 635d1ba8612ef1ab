using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record InspectForm : CrackForm
{
    public string? Found { get; init; }

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
        var command = new RecordInspection(tag, found ?? default)
        {
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

    private static Task<IResult> Show(Desk desk, string tag, InspectForm form, FormState state) =>
        BladeForm.Show<InspectPage, InspectForm>(desk, tag, form, state);
}
