using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record LeadForm : PostedForm
{
    public string? Saw { get; init; }

    public string? Angle { get; init; }

    /// <summary>left or right.</summary>
    public string? Side { get; init; }

    public string? At { get; init; }
}

/// <summary>The angle a blade leads at on a saw, from a free cut along a line: for the fence, until it is sharpened.</summary>
internal static class Lead
{
    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new LeadForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] LeadForm? form, Desk desk, string tag)
    {
        form ??= new();
        var shop = await desk.Shop();
        if (shop.Blade(Tags.Read(tag)) is not { } blade)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var saw = shop.Saws.FirstOrDefault(s => s.MountedBladeId == blade.Blade.Id) ?? shop.Saws.FirstOrDefault(s => s.Saw.Code == form.Saw);
        read.RefuseUnless(saw is not null, nameof(form.Saw), "Say on which saw.");
        var angle = read.Angle(nameof(form.Angle), form.Angle);
        read.Need(nameof(form.Angle), angle, form.Angle, "Write the angle, such as 0.8; 0 where it runs true.");
        read.RefuseUnless(angle is null or >= 0, nameof(form.Angle), "Write the angle without a sign and say to which side.");
        read.RefuseUnless(angle is null or 0 || form.Side is "left" or "right", nameof(form.Side), "Say to which side it leads.");
        var command = new RecordDrift(saw?.Saw.Code ?? "", blade.Blade.Tag, form.Side == "right" ? -(angle ?? 0) : angle ?? 0, read.Time(nameof(form.At), form.At));
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Lead of {blade.Blade.Tag}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string tag, LeadForm form, FormState state) =>
        BladeForm.Show<LeadPage, LeadForm>(desk, tag, form, state);
}
