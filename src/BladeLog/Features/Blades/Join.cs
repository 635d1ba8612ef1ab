using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record JoinForm : PostedForm
{
    public string? Loop { get; init; }

    public string? Quality { get; init; }

    public string? Method { get; init; }

    public string? ChildTag { get; init; }

    public string? FitsNone { get; init; }

    public string? At { get; init; }
}

/// <summary>A joint: the loop closed again, or a shorter blade with a tag of its own.</summary>
internal static class Join
{
    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new JoinForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] JoinForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is null)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var loop = read.Length(nameof(form.Loop), form.Loop, Fields.Loop);
        read.Need(nameof(form.Loop), loop, form.Loop, "Write how long the loop is now.");
        var quality = read.Choice<WeldQuality>(nameof(form.Quality), form.Quality, "Say how good the joint is.") ?? default;
        var at = read.Time(nameof(form.At), form.At);
        Command command = string.IsNullOrWhiteSpace(form.ChildTag)
            ? new RecordJoint(tag, loop ?? 0, form.Loop?.Trim(), quality, form.Method?.Trim(), at) { FitsNone = form.FitsNone is not null }
            : new CutDown(tag, form.ChildTag.Trim(), loop ?? 0, form.Loop?.Trim(), quality) { Method = form.Method?.Trim(), At = at };
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(string.IsNullOrWhiteSpace(form.ChildTag) ? tag : form.ChildTag), $"Joint of {Tags.Read(tag)}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string tag, JoinForm form, FormState state) =>
        BladeForm.Show<JoinPage, JoinForm>(desk, tag, form, state);
}
