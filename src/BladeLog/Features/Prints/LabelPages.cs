using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Prints;

public sealed record LabelForm : PostedForm
{
    public string? Tags { get; init; }
}

public sealed record LanForm : PostedForm
{
    public string? LanName { get; init; }

    public string? Version { get; init; }
}

/// <summary>Labels to print: chosen by what they lack, or by tag. Looking and printing change nothing; sticking them on is told.</summary>
internal static class LabelPages
{
    private static readonly char[] Between = [' ', ',', ';', '\n', '\r'];

    public static void Map(WebApplication app)
    {
        app.MapGet("/labels", (Desk desk, string? show, string[]? tags) => Show(desk, show, Split(tags), new LanForm(), FormState.New));
        app.MapPost("/labels", Stuck);
        app.MapPost("/labels/name", Name);
    }

    private static async Task<IResult> Stuck([FromForm] LabelForm? form, Desk desk)
    {
        form ??= new();
        var tags = Split([form.Tags ?? ""]);
        return await desk.Send(
            new RecordLabels(tags), form, "/labels", Said.Count(tags.Count, "label", "labels"), state => Show(desk, null, tags, new LanForm(), state));
    }

    private static async Task<IResult> Name([FromForm] LanForm? form, Desk desk)
    {
        form ??= new();
        return await desk.Send(
            new SaveLanName(form.LanName, int.TryParse(form.Version, out var version) ? version : null), form, "/labels", "Name on the network",
            state => Show(desk, null, [], form, state), canUndo: false);
    }

    private static List<string> Split(string[]? tags) =>
        [.. (tags ?? []).SelectMany(t => t.Split(Between, StringSplitOptions.RemoveEmptyEntries)).Select(Tags.Read).Distinct(StringComparer.OrdinalIgnoreCase)];

    private static async Task<IResult> Show(Desk desk, string? show, List<string> tags, LanForm form, FormState state)
    {
        var advice = await desk.Advice();
        var units = await desk.Units();
        var shop = advice.Now.Shop;
        var labelled = (await desk.Db.LabelsPrinted.AsNoTracking().Select(l => new { l.BladeId, l.Tag }).ToListAsync()).ToHashSet();
        var here = advice.Now.Blades.Where(b => b.Place != Place.Gone && b.Break is null && b.Retirement is null).OrderBy(b => b.Blade.Tag, NaturalOrder.Instance).ToList();
        var isNew = here.Where(b => b.Hours == 0 && b.MountedSinceUtc is null && b.LastSawId is null && b.PriorUse is null).ToList();
        var without = here.Where(b => !labelled.Contains(new { BladeId = b.Blade.Id, b.Blade.Tag })).ToList();
        IReadOnlyList<BladeFile> chosen = tags.Count > 0 ? [.. tags.Select(advice.Now.Blade).OfType<BladeFile>()]
            : show == "new" ? isNew
            : show == "unlabelled" ? without
            : [];
        return await desk.Page<LabelPage, LabelModel>(
            new()
            {
                Sheets = Labels.Sheets(chosen.Select(b => Labels.Row(advice.Of(b), shop, units, advice.Words))),
                Blades = [.. here.Select(b => new LabelPick(b.Blade.Tag, $"{Said.Section(b, units)}, {Said.Teeth(b.Spec, units)}{(without.Contains(b) ? ", no label yet" : "")}", chosen.Contains(b)))],
                New = isNew.Count,
                WithoutLabel = without.Count,
                Show = tags.Count > 0 ? "tags" : show ?? "",
                Typed = string.Join(' ', tags.Where(t => advice.Now.Blade(t) is null)),
                Unknown = [.. tags.Where(t => advice.Now.Blade(t) is null)],
                LanName = shop.LanName,
                ShopVersion = shop.Version,
                When = Printing.When(desk.Now, units),
                State = state,
                Form = form,
            },
            state.Status);
    }
}
