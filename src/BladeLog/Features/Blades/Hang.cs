using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record HangForm : PostedForm
{
    public string? Place { get; init; }

    public string? Hook { get; init; }

    public string? At { get; init; }
}

/// <summary>Where a blade was put: a hook of the rack, or the bench.</summary>
internal static class Hang
{
    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new HangForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] HangForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is null)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var place = read.Choice<Place>(nameof(form.Place), form.Place, "Say where it is now.");
        var command = new HangUp(tag, place ?? default, form.Hook, read.Time(nameof(form.At), form.At));
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Place of {Tags.Read(tag)}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string tag, HangForm form, FormState state) =>
        BladeForm.Show<HangPage, HangForm>(desk, tag, form, state);
}
