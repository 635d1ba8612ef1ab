using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Saws;

public sealed record ClickingForm : PostedForm;

/// <summary>One tap when a blade clicks: it is on hold, and the page says what to do now.</summary>
internal static class Clicking
{
    public static Task<IResult> Get(Desk desk, string code) => SawForm.Show<ClickingPage, ClickingForm>(desk, code, new ClickingForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] ClickingForm? form, Desk desk, string code)
    {
        form ??= new();
        var shop = await desk.Shop();
        if (shop.Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var on = shop.Blades.FirstOrDefault(b => b.Blade.Id == saw.MountedBladeId);
        var card = $"/saws/{saw.Saw.Code}/clicking";

        // Tapped again in alarm: it is on hold already.
        return on is null || on.Hold is not null
            ? Results.Redirect(card)
            : await desk.Send(
                new RecordHold(on.Blade.Tag, HoldKind.Clicking), form, card, $"Hold of {on.Blade.Tag}",
                state => SawForm.Show<ClickingPage, ClickingForm>(desk, code, form, state));
    }
}
