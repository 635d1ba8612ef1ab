using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record HoldForm : CrackForm
{
    public string? Kind { get; init; }
}

/// <summary>Do not use it until a named person clears it.</summary>
internal static class Hold
{
    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new HoldForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] HoldForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is null)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var kind = read.Choice<HoldKind>(nameof(form.Kind), form.Kind, "Say why it is put on hold.");
        var said = form.Read(read);
        var command = new RecordHold(tag, kind ?? default)
        {
            CrackLengthM = said.LengthM,
            CrackTyped = said.Typed,
            Place = said.Place,
            Note = said.Note,
            At = said.At,
        };
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Hold of {Tags.Read(tag)}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string tag, HoldForm form, FormState state) =>
        BladeForm.Show<HoldPage, HoldForm>(desk, tag, form, state, async model => model with { LastTime = await CrackFacts.LastTime(desk.Db, model.File.Blade.Id, model.Units) });
}
