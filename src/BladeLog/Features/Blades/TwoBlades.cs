using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Blades;

public sealed record TwoBladesForm : PostedForm
{
    /// <summary>The label the other blade wears now.</summary>
    public string? OtherTag { get; init; }

    public string? Spec { get; init; }

    /// <summary>From when on it was the other one.</summary>
    public string? From { get; init; }

    public string? Reason { get; init; }
}

/// <summary>A stretch on a saw under the label, to find the time by.</summary>
public sealed record SpellLine(string Saw, string From, string Until);

public sealed record TwoBladesModel(
    TwoBladesForm Form, FormState State, BladeFile File, string Size, string Now, string? OtherSize, IReadOnlyList<SpellLine> Spells, IReadOnlyList<(string Code, string Size)> Specs, ShopUnits Units);

/// <summary>Two blades wore one label: which is which, and from when on the record speaks of the other.</summary>
internal static class TwoBlades
{
    private const int Shown = 12;

    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new TwoBladesForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] TwoBladesForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is not { } file)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var other = Tags.Read(form.OtherTag ?? "");
        read.RefuseUnless(other.Length > 0, nameof(form.OtherTag), "Paint another tag on one of the two, and write it here.");
        var from = read.TimeOrDay(nameof(form.From), form.From);
        read.RefuseUnless(from is not null || !string.IsNullOrWhiteSpace(form.From), nameof(form.From), "Say from when on it was the other blade, such as yesterday 7:15, or a date alone for that day's beginning.");
        var command = new SplitLabel(file.Blade.Tag, other, from ?? default, string.IsNullOrWhiteSpace(form.Reason) ? $"Two blades wore the label {file.Blade.Tag}." : form.Reason.Trim())
        {
            Spec = string.IsNullOrWhiteSpace(form.Spec) ? file.Spec.Code : form.Spec,
        };
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(other), $"{file.Blade.Tag} and {other} told apart", state => Show(desk, tag, form, state), canUndo: false)
            : await Show(desk, tag, form, read.State);
    }

    private static async Task<IResult> Show(Desk desk, string tag, TwoBladesForm form, FormState state)
    {
        var shop = await desk.Shop();
        if (shop.Blade(Tags.Read(tag)) is not { } file)
        {
            return Results.NotFound();
        }

        var units = await desk.Units();
        var off = await desk.Db.Dismounts.AsNoTracking().Where(d => d.Mount.BladeId == file.Blade.Id).Select(d => new { d.MountId, d.Entry.AtUtc }).ToDictionaryAsync(d => d.MountId, d => d.AtUtc);
        var mounts = await desk.Db.Mounts.AsNoTracking().Where(m => m.BladeId == file.Blade.Id).OrderByDescending(m => m.Entry.AtUtc).Take(Shown)
            .Select(m => new { m.EntryId, m.Saw.Name, m.Entry.AtUtc }).ToListAsync();
        var spells = mounts.ConvertAll(m => new SpellLine(
            m.Name, Said.When(m.AtUtc, desk.Now, units), off.TryGetValue(m.EntryId, out var until) ? Said.When(until, desk.Now, units) : "on it still"));
        var other = string.IsNullOrWhiteSpace(form.OtherTag) ? null : shop.Blade(Tags.Read(form.OtherTag));
        var specs = (await desk.Db.Specs.AsNoTracking().OrderBy(s => s.Code).ToListAsync()).Select(s => (s.Code, Of(s, units)));
        return await desk.Page<TwoBladesPage, TwoBladesModel>(
            new(form, state, file, Of(file.Spec, units), $"{Said.Width(file.WidthM, units)} wide now{Loop(file.LoopM, units)}", other is null ? null : $"{other.Blade.Tag}: {Of(other.Spec, units)}, {Said.Width(other.WidthM, units)} wide now{Loop(other.LoopM, units)}", spells, [.. specs], units),
            state.Status);
    }

    private static string Of(Spec s, ShopUnits units) => $"{units.Show(new Length(s.WidthM), Fields.BladeWidth)} × {units.Show(new Length(s.ThicknessM), Fields.Thickness)}, {Said.Teeth(s, units)}";

    private static string Loop(double? loop, ShopUnits units) => loop is { } l ? $", loop {units.Show(new Length(l), Fields.Loop)}" : "";
}
