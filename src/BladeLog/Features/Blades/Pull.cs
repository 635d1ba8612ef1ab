using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record PullForm : PostedForm
{
    public string? Saw { get; init; }

    public string? Tension { get; init; }

    public string? How { get; init; }

    public string? At { get; init; }
}

/// <summary>The pull as somebody measured it, on the body section.</summary>
internal static class Pull
{
    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new PullForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] PullForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is null)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var shop = await desk.Shop();
        var blade = shop.Blade(Tags.Read(tag))!;
        var saw = shop.Saws.FirstOrDefault(s => s.Saw.Id == blade.SawId) ?? shop.Saws.FirstOrDefault(s => s.Saw.Code == form.Saw);
        read.RefuseUnless(saw is not null, nameof(form.Saw), "Say on which saw it was measured.");
        var pa = read.Stress(nameof(form.Tension), form.Tension);
        read.Need(nameof(form.Tension), pa, form.Tension, "Write what was measured, such as 120 MPa.");
        read.RefuseUnless(!string.IsNullOrEmpty(form.How), nameof(form.How), "Say how it was measured.");
        var command = new RecordTension(saw?.Saw.Code ?? "", tag, pa ?? 0, form.Tension?.Trim() ?? "", form.How ?? "", read.Time(nameof(form.At), form.At));
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Reading of {Tags.Read(tag)}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string tag, PullForm form, FormState state) =>
        BladeForm.Show<PullPage, PullForm>(desk, tag, form, state, async model => model with { Names = [.. (await desk.Shop()).Saws.Select(s => s.Saw.Code)] });
}
