using System.Globalization;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Blades;

public sealed record SpecEditForm : SpecFields
{
    public string? Version { get; init; }

    /// <summary>The blade whose page led here, to go back to.</summary>
    public string? Blade { get; init; }
}

public sealed record SpecEditModel(SpecEditForm Form, FormState State, Spec Spec, IReadOnlyList<string> Tags, ShopUnits Units)
{
    public string? Who { get; init; }

    public IReadOnlyList<string> People { get; init; } = [];

    /// <summary>Whose forecasts change with these figures.</summary>
    public string Changes => Tags.Count == 0
        ? "No blade here is of this kind, so no forecast changes."
        : $"This changes the forecasts of {Said.Count(Tags.Count, "blade", "blades")}: {string.Join(", ", Tags)}.";
}

/// <summary>The figures of a kind of blade put right, for all blades of it at once.</summary>
internal static class SpecEdit
{
    public static async Task<IResult> Get(Desk desk, string code, string? blade) => await Find(desk, code) is { } spec
        ? await Show(desk, spec, FormOf(spec, await desk.Units()) with { Blade = blade }, FormState.New)
        : Results.NotFound();

    public static async Task<IResult> Post([FromForm] SpecEditForm? form, Desk desk, string code)
    {
        form ??= new();
        if (await Find(desk, code) is not { } spec)
        {
            return Results.NotFound();
        }

        var units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        var typed = SpecReading.Read(form, read);
        if (!read.IsGood)
        {
            return await Show(desk, spec, form, read.State);
        }

        Keep(typed, spec, form, FormOf(spec, units));
        var leadsTo = (await desk.Shop()).Blade(Tags.Read(form.Blade ?? "")) is { } blade ? BladeForm.Of(blade.Blade.Tag) : "/stock";
        var command = new EditSpec(spec.Code, int.TryParse(form.Version, CultureInfo.InvariantCulture, out var version) ? version : spec.Version, typed);
        return await desk.Send(command, form, leadsTo, $"{typed.Code} changed", state => Show(desk, spec, form, state), canUndo: false);
    }

    /// <summary>The address of this page for a specification, whatever its code is written with.</summary>
    public static string Of(string code) => $"/specs/{Uri.EscapeDataString(code)}/edit";

    /// <summary>A stroke in a code stays escaped in the address.</summary>
    private static Task<Spec?> Find(Desk desk, string code)
    {
        var sought = code.Replace("%2F", "/", StringComparison.OrdinalIgnoreCase).Trim();
        return desk.Db.Specs.AsNoTracking().SingleOrDefaultAsync(s => s.Code == sought);
    }

    /// <summary>A figure shown is rounded; one left as it was shown stays what it was to the last digit. What the form does not ask stays too.</summary>
    private static void Keep(Spec typed, Spec was, SpecEditForm form, SpecEditForm shown)
    {
        static bool Same(string? a, string? b) => (a ?? "").Trim() == (b ?? "").Trim();
        (typed.WidthM, typed.WidthTyped) = Same(form.Width, shown.Width) ? (was.WidthM, was.WidthTyped) : (typed.WidthM, typed.WidthTyped);
        (typed.ThicknessM, typed.ThicknessTyped) = Same(form.Thickness, shown.Thickness) ? (was.ThicknessM, was.ThicknessTyped) : (typed.ThicknessM, typed.ThicknessTyped);
        (typed.NewLoopM, typed.NewLoopTyped) = Same(form.NewLoop, shown.NewLoop) ? (was.NewLoopM, was.NewLoopTyped) : (typed.NewLoopM, typed.NewLoopTyped);
        (typed.KerfM, typed.KerfTyped) = Same(form.Kerf, shown.Kerf) ? (was.KerfM, was.KerfTyped) : (typed.KerfM, typed.KerfTyped);
        (typed.TensionPa, typed.TensionTyped) = Same(form.Tension, shown.Tension) ? (was.TensionPa, was.TensionTyped) : (typed.TensionPa, typed.TensionTyped);
        if (Same(form.Pitch, shown.Pitch))
        {
            (typed.PitchCoarseM, typed.PitchFineM, typed.PitchTyped) = (was.PitchCoarseM, was.PitchFineM, was.PitchTyped);
        }

        typed.RakeRad = Same(form.Rake, shown.Rake) ? was.RakeRad : typed.RakeRad;
        typed.GulletDepthM = Same(form.GulletDepth, shown.GulletDepth) ? was.GulletDepthM : typed.GulletDepthM;
        typed.LeastWidthM = Same(form.LeastWidth, shown.LeastWidth) ? was.LeastWidthM : typed.LeastWidthM;
        typed.GulletAreaM2 = Same(form.GulletArea, shown.GulletArea) ? was.GulletAreaM2 : typed.GulletAreaM2;
        (typed.GulletRadiusM, typed.EdgeFreshM) = (was.GulletRadiusM, was.EdgeFreshM);
    }

    private static SpecEditForm FormOf(Spec s, ShopUnits units)
    {
        string? Metres(double? metres, TypedField field) => metres is { } m ? units.Typing.Show(new Length(m), field) : null;
        return new SpecEditForm
        {
            Code = s.Code,
            Width = Metres(s.WidthM, Fields.BladeWidth),
            Thickness = Metres(s.ThicknessM, Fields.Thickness),
            Pitch = units.Typing.Show(new ToothPitch(new Length(s.PitchCoarseM), new Length(s.PitchFineM))),
            NewLoop = Metres(s.NewLoopM, Fields.Loop),
            ToothForm = s.ToothForm.ToString(),
            TipKind = s.TipKind.ToString(),
            TipMaterial = s.TipMaterial.ToString(),
            BodySteel = s.BodySteel.ToString(),
            BodyHrc = s.BodyHrc?.ToString(CultureInfo.InvariantCulture),
            Rake = s.RakeRad is { } rake ? units.Typing.Show(new Angle(rake)) : null,
            GulletDepth = Metres(s.GulletDepthM, Fields.GulletDepth),
            GulletArea = (s.GulletAreaM2 * 1e6)?.ToString("0.##", CultureInfo.InvariantCulture),
            SetPattern = s.SetPattern == Handbook.Quantities.SetPattern.Raker ? nameof(Handbook.Quantities.SetPattern.Raker) : nameof(Handbook.Quantities.SetPattern.Alternate),
            Kerf = Metres(s.KerfM, Fields.Kerf),
            Tension = s.TensionPa is { } pa ? units.Typing.Show(new Stress(pa)) : null,
            LeastWidth = Metres(s.LeastWidthM, Fields.BladeWidth),
            SharpeningPrice = s.SharpeningPriceMinor is { } price ? units.Typing.ShowMoney(price) : null,
            MostSharpenings = s.MostSharpenings?.ToString(CultureInfo.InvariantCulture),
            Price = s.PriceMinor is { } costs ? units.Typing.ShowMoney(costs) : null,
            LeastStock = s.LeastStock?.ToString(CultureInfo.InvariantCulture),
        };
    }

    private static async Task<IResult> Show(Desk desk, Spec spec, SpecEditForm form, FormState state)
    {
        var shop = await desk.Shop();
        var model = new SpecEditModel(
            form,
            state,
            // After a clash this is the version that stands.
            await desk.Db.Specs.AsNoTracking().SingleAsync(s => s.Id == spec.Id),
            [.. shop.Blades.Where(b => b.Blade.SpecId == spec.Id && b.Place != Place.Gone && b.Retirement is null && b.Break is null).Select(b => b.Blade.Tag).Order(NaturalOrder.Instance)],
            await desk.Units())
        {
            Who = (await desk.Who())?.Initials,
            People = await desk.Db.People.AsNoTracking().Where(p => p.Active).OrderBy(p => p.Initials).Select(p => p.Initials).ToListAsync(),
        };
        return await desk.Page<SpecEditPage, SpecEditModel>(model, state.Status);
    }
}
