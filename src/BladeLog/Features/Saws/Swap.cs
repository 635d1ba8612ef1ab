using System.Globalization;
using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Saws;

/// <summary>Off with one blade, on with another: two taps after a scan, three without.</summary>
internal static class Swap
{
    /// <summary>The answer that the blade written was never on the saw.</summary>
    public const string Never = "Never";

    public static async Task<IResult> Get(Desk desk, string code, string? on, string? found) =>
        (await desk.Shop()).Saw(code) is { } saw
            ? await Asked(desk, saw, on, found)
            : Results.NotFound();

    private static async Task<IResult> Asked(Desk desk, SawNow saw, string? on, string? found)
    {
        var blades = TypedTag.Find(on, await desk.Shop());
        return await Show(desk, saw, new SwapForm { OnTag = blades is [var one] ? one.Blade.Tag : on, Found = found }, OnState(on, blades));
    }

    public static async Task<IResult> Post([FromForm] SwapForm? form, Desk desk, string code)
    {
        form ??= new();
        var shop = await desk.Shop();
        if (shop.Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var advice = await desk.Advice();
        var read = new FormReading(await desk.Units(), desk.Now);
        var onlyOff = form.OnlyOff == "1";
        var tag = onlyOff ? "" : Tags.Read(form.OnTag ?? "");
        read.RefuseUnless(onlyOff || tag.Length > 0, nameof(form.OnTag), "Say which blade goes on: tap one, or type its tag.");
        var meant = TypedTag.Find(tag, shop);
        var on = meant is [var one] ? one : null;
        read.RefuseUnless(tag.Length == 0 || on is not null, nameof(form.OnTag), TypedTag.Refusal(tag, meant));
        var reason = saw.MountedBladeId is null
            ? OffReason.OtherWork
            : form.Reason == Never
                ? OffReason.FoundOff
                : read.Choice<OffReason>(nameof(form.Reason), form.Reason, $"Say how {Tag(shop, saw)} comes off.") ?? default;
        var at = read.Time(nameof(form.At), form.At);
        var tension = read.Stress(nameof(form.Tension), form.Tension);
        read.RefuseUnless(tension is null or > 0, nameof(form.Tension), "The tension must be above zero.");
        if (!read.IsGood)
        {
            return await Show(desk, saw, form, read.State);
        }

        if (form.Reason == Never && on is not null)
        {
            var mount = await desk.Db.OnSaws.AsNoTracking().Where(o => o.SawId == saw.Saw.Id).Select(o => o.MountId).SingleAsync();
            return await desk.Send(
                new MoveSpell(mount, on.Blade.Tag, $"It was never {Tag(shop, saw)}."), form, $"/saws/{saw.Saw.Code}", $"{on.Blade.Tag} on {saw.Saw.Name}",
                state => Show(desk, saw, form, state), canUndo: false);
        }

        var command = new Records.Writing.Swap(saw.Saw.Code)
        {
            SawVersion = int.TryParse(form.SawVersion, CultureInfo.InvariantCulture, out var version) ? version : null,
            OnTag = onlyOff ? null : on!.Blade.Tag,
            Reason = reason,
            At = at,
            TensionPa = tension,
            TensionTyped = tension is null ? null : form.Tension!.Trim(),
            TensionKnown = tension is null ? TensionKnown.Unknown : form.Measured is null ? TensionKnown.Target : TensionKnown.Measured,
            InsideOut = form.InsideOut is not null,
            Although = form.Although,
            Unfit = on is null ? [] : SwapChecks.Unfit(advice, saw, on),
        };
        var what = onlyOff ? $"{Tag(shop, saw)} off {saw.Saw.Name}" : $"{on!.Blade.Tag} on {saw.Saw.Name}";
        return await desk.Send(command, form, $"/saws/{saw.Saw.Code}", what, state => Show(desk, saw, form, state));
    }

    private static async Task<IResult> Show(Desk desk, SawNow saw, SwapForm form, FormState state)
    {
        var model = SwapModel.Of(await desk.Advice(), saw, form, state, await desk.Units());
        return await desk.Page<SwapPage, SwapModel>(
            model with { Who = (await desk.Who())?.Initials, People = await Initials(desk) },
            state.Status);
    }

    public static Task<List<string>> Initials(Desk desk) =>
        desk.Db.People.AsNoTracking().Where(p => p.Active).OrderBy(p => p.Initials).Select(p => p.Initials).ToListAsync();

    private static FormState OnState(string? on, IReadOnlyList<BladeFile> blades) => Tags.Read(on ?? "").Length == 0 || blades.Count == 1
        ? FormState.New
        : FormState.New with
        {
            Problems = [new(nameof(SwapForm.OnTag), TypedTag.Refusal(on, blades) + (blades.Count == 0 ? " Scan again, or tap one." : ""))],
            Title = blades.Count > 1 ? "More than one blade is called so" : "That tag is not known",
        };

    private static string Tag(ShopNow shop, SawNow saw) => shop.Blades.FirstOrDefault(b => b.Blade.Id == saw.MountedBladeId)?.Blade.Tag ?? "the blade";
}
