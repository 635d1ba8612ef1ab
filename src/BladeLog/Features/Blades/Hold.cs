using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record HoldForm : PostedForm
{
    public string? Kind { get; init; }

    public string? CrackLength { get; init; }

    public string? Place { get; init; }

    public string? Note { get; init; }

    public string? At { get; init; }
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
        var command = new RecordHold(tag, kind ?? default)
        {
            CrackLengthM = read.Length(nameof(form.CrackLength), form.CrackLength, Fields.CrackLength),
            CrackTyped = form.CrackLength?.Trim(),
            Place = read.Choice<CrackPlace>(nameof(form.Place), form.Place, null),
            Note = string.IsNullOrWhiteSpace(form.Note) ? null : form.Note.Trim(),
            At = read.Time(nameof(form.At), form.At),
        };
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Hold of {Tags.Read(tag)}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string tag, HoldForm form, FormState state) =>
        BladeForm.Show<HoldPage, HoldForm>(desk, tag, form, state);
}
