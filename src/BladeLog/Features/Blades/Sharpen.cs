using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Blades;

public sealed record SharpenForm : PostedForm
{
    public string? Kind { get; init; }

    public string? SetAgain { get; init; }

    public string? Width { get; init; }

    public string? Gullet { get; init; }

    public string? Kerf { get; init; }

    public string? EdgeAfter { get; init; }

    public string? Price { get; init; }

    public string? At { get; init; }

    public string? WiderMeant { get; init; }
}

/// <summary>A grind in the shop: it counts, and what it took is measured after it.</summary>
internal static class Sharpen
{
    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new SharpenForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] SharpenForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is null)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var kind = read.Choice<GrindKind>(nameof(form.Kind), form.Kind, "Say what was ground.");
        var command = new RecordSharpening(tag, kind ?? default)
        {
            SetAgain = form.SetAgain is not null,
            WidthM = read.Length(nameof(form.Width), form.Width, Fields.BladeWidth),
            WidthTyped = form.Width?.Trim(),
            GulletM = read.Length(nameof(form.Gullet), form.Gullet, Fields.GulletDepth),
            KerfM = read.Length(nameof(form.Kerf), form.Kerf, Fields.Kerf),
            EdgeAfterM = read.Length(nameof(form.EdgeAfter), form.EdgeAfter, Fields.EdgeRadius),
            PriceMinor = read.Money(nameof(form.Price), form.Price),
            At = read.Time(nameof(form.At), form.At),
            WiderMeant = form.WiderMeant is not null,
        };
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Grind of {Tags.Read(tag)}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string tag, SharpenForm form, FormState state) =>
        BladeForm.Show<SharpenPage, SharpenForm>(desk, tag, form, state, async model => model with
        {
            LastTime = new Dictionary<string, string?>
            {
                [nameof(form.Price)] = model.Units.BareMoney(await desk.Db.Sharpenings.AsNoTracking().Where(f => f.BladeId == model.File.Blade.Id && f.PriceMinor != null)
                    .OrderByDescending(f => f.Entry.AtUtc).ThenByDescending(f => f.EntryId).Select(f => f.PriceMinor).FirstOrDefaultAsync()),
            },
        });
}
