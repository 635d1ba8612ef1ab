using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Saws;

public sealed record SlackForm : PostedForm
{
    public string? LetOff { get; init; }

    public string? At { get; init; }
}

/// <summary>Tension let off at the end of the day, and on again before the saw starts.</summary>
internal static class Slack
{
    public static Task<IResult> Get(Desk desk, string code) => Show(desk, code, new SlackForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] SlackForm? form, Desk desk, string code)
    {
        form ??= new();
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        read.RefuseUnless(form.LetOff is "yes" or "no", nameof(form.LetOff), $"Say whether the {units.PullName} is off or on.");
        var command = new SlackTension(saw.Saw.Code, form.LetOff == "yes", read.Time(nameof(form.At), form.At));
        return read.IsGood
            ? await desk.Send(command, form, $"/saws/{saw.Saw.Code}", $"{Said.Capital(units.PullName)} {(command.LetOff ? "off" : "on")}", state => Show(desk, code, form, state))
            : await Show(desk, code, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string code, SlackForm form, FormState state) => SawForm.Show<SlackPage, SlackForm>(desk, code, form, state);
}
