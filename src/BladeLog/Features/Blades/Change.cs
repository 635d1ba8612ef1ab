using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Blades;

public sealed record ChangeForm : PostedForm
{
    public string? Version { get; init; }

    public string? Spec { get; init; }

    public string? Folded { get; init; }

    public string? MeasuredThickness { get; init; }

    public string? MeasuredHrc { get; init; }

    public string? InspectEvery { get; init; }

    public string? InspectEachMount { get; init; }

    /// <summary>A new label; then nothing else of the form is taken.</summary>
    public string? NewTag { get; init; }

    public string? Relabel { get; init; }
}

/// <summary>What is written of a blade, put right: its specification, what was measured, how often it is looked at, its label.</summary>
internal static class Change
{
    public static async Task<IResult> Get(Desk desk, string tag) => (await desk.Shop()).Blade(Tags.Read(tag)) is { } file
        ? await Show(desk, tag, FormOf(file, await desk.Units()), FormState.New)
        : Results.NotFound();

    public static async Task<IResult> Post([FromForm] ChangeForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is not { } file)
        {
            return Results.NotFound();
        }

        if (form.Relabel is not null)
        {
            var label = Tags.Read(form.NewTag ?? "");
            return await desk.Send(
                new RetagBlade(file.Blade.Tag, label), form, BladeForm.Of(label), $"{file.Blade.Tag} is now {label}", state => Show(desk, tag, form, state), canUndo: false);
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var command = new EditBlade(file.Blade.Tag, int.TryParse(form.Version, out var version) ? version : file.Blade.Version, form.Spec ?? "")
        {
            Folded = form.Folded is not null,
            MeasuredThicknessM = read.Length(nameof(form.MeasuredThickness), form.MeasuredThickness, Fields.Thickness),
            MeasuredHrc = read.Number(nameof(form.MeasuredHrc), form.MeasuredHrc, "a hardness such as 46"),
            InspectEveryH = read.Duration(nameof(form.InspectEvery), form.InspectEvery, Fields.RunHours)?.TotalHours,
            InspectEachMount = form.InspectEachMount is not null,
        };
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"{file.Blade.Tag} changed", state => Show(desk, tag, form, state), canUndo: false)
            : await Show(desk, tag, form, read.State);
    }

    private static ChangeForm FormOf(BladeFile file, ShopUnits units) => new()
    {
        Spec = file.Spec.Code,
        Folded = file.Blade.Folded ? "true" : null,
        MeasuredThickness = units.BareLength(file.Blade.MeasuredThicknessM, Fields.Thickness),
        MeasuredHrc = file.Blade.MeasuredHrc?.ToString(System.Globalization.CultureInfo.InvariantCulture),
        InspectEvery = file.Blade.InspectEveryH is { } h ? Figures.Plain(h, 4) : null,
        InspectEachMount = file.Blade.InspectEachMount ? "true" : null,
    };

    private static Task<IResult> Show(Desk desk, string tag, ChangeForm form, FormState state) => BladeForm.Show<ChangePage, ChangeForm>(
        desk, tag, form, state, async model => model with { Names = await desk.Db.Specs.AsNoTracking().OrderBy(s => s.Code).Select(s => s.Code).ToListAsync() });
}
