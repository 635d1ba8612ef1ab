using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record RetireForm : PostedForm
{
    public string? Reason { get; init; }

    public string? CutUp { get; init; }

    public string? Note { get; init; }

    public string? At { get; init; }

    public string? TakeOff { get; init; }
}

/// <summary>The end of a blade: why, and whether it was cut up.</summary>
internal static class Retire
{
    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new RetireForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] RetireForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is null)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var reason = read.Choice<RetireReason>(nameof(form.Reason), form.Reason, "Say why it is retired.");
        var command = new RecordRetirement(tag, reason ?? default)
        {
            CutUp = form.CutUp is not null,
            Note = string.IsNullOrWhiteSpace(form.Note) ? null : form.Note.Trim(),
            At = read.Time(nameof(form.At), form.At),
            TakeOff = form.TakeOff is not null,
        };
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Retiring of {Tags.Read(tag)}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string tag, RetireForm form, FormState state) =>
        BladeForm.Show<RetirePage, RetireForm>(desk, tag, form, state);
}
