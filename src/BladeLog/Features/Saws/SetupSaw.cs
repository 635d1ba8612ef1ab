using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Saws;

/// <summary>A saw's form; no code: a new saw.</summary>
public sealed record SetupModel(SetupForm Form, FormState State, string? Code, string? Name, int Version, string Since, ShopUnits Units);

/// <summary>A new saw, or one as it is from a date on; a typing error is struck out and replaced, and every figure follows.</summary>
internal static class SetupSaw
{
    public static Task<IResult> GetNew(Desk desk) => Show(desk, null, new SetupForm { Active = "true" }, FormState.New);

    public static async Task<IResult> PostNew([FromForm] SetupForm? form, Desk desk)
    {
        form ??= new();
        var read = new FormReading(await desk.Units(), desk.Now);
        var setup = SetupReading.Read(form, read);
        return read.IsGood
            ? await desk.Send(
                new AddSaw(form.Code ?? "", form.Name ?? "", form.HasHourMeter is not null, setup), form, "/", $"{form.Name} added",
                state => Show(desk, null, form, state), canUndo: false)
            : await Show(desk, null, form, read.State);
    }

    public static async Task<IResult> GetEdit(Desk desk, string code) => (await desk.Shop()).Saw(code) is { } saw
        ? await Show(desk, saw, SetupReading.FormOf(saw, await desk.Units()), FormState.New)
        : Results.NotFound();

    public static async Task<IResult> PostEdit([FromForm] SetupForm? form, Desk desk, string code)
    {
        form ??= new();
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var command = Command(form, read, saw);
        var leads = form.Do == "name" ? $"/saws/{form.Code?.Trim()}" : $"/saws/{saw.Saw.Code}";
        return read.IsGood
            ? await desk.Send(command, form, leads, $"{saw.Saw.Name} changed", state => Show(desk, saw, form, state), canUndo: false)
            : await Show(desk, saw, form, read.State);
    }

    private static Command Command(SetupForm form, FormReading read, SawNow saw)
    {
        if (form.Do == "name")
        {
            return new EditSaw(
                saw.Saw.Code, int.TryParse(form.Version, out var version) ? version : saw.Saw.Version, form.Code ?? "", form.Name ?? "", form.Active is not null, form.HasHourMeter is not null);
        }

        var setup = SetupReading.Read(form, read);
        if (form.Do == "error")
        {
            read.RefuseUnless(!string.IsNullOrWhiteSpace(form.Reason), nameof(form.Reason), "Say what was typed wrongly.");
            return new NewSetup(saw.Saw.Code, setup, null, saw.Setup.EntryId, form.Reason?.Trim());
        }

        read.RefuseUnless(form.Do == "change", nameof(form.From), "Say whether the saw was changed or something was typed wrongly.");
        return new NewSetup(saw.Saw.Code, setup, read.TimeOrDay(nameof(form.From), form.From));
    }

    private static async Task<IResult> Show(Desk desk, SawNow? saw, SetupForm form, FormState state)
    {
        var units = await desk.Units();
        var since = saw is null ? "" : Said.When(saw.Setup.Entry.AtUtc, desk.Now, units);
        return await desk.Page<SetupPage, SetupModel>(new(form, state, saw?.Saw.Code, saw?.Saw.Name, saw?.Saw.Version ?? 0, since, units), state.Status);
    }
}
