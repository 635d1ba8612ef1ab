using System.Globalization;
using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Saws;

public sealed record ThenForm : PostedForm
{
    public string? SawVersion { get; init; }

    public string? OnTag { get; init; }

    /// <summary>A blade that is not among those offered.</summary>
    public string? Other { get; init; }

    public string? At { get; init; }

    public string? Until { get; init; }

    /// <summary>The two moments as the page filled them in, to the millisecond: the fields show minutes.</summary>
    public string? Began { get; init; }

    public string? Ended { get; init; }

    public string? Although { get; init; }
}

public sealed record ThenModel(ThenForm Form, FormState State, string Code, string Name, int Version)
{
    /// <summary>The time in question in words; null: every hour has its blade.</summary>
    public string? When { get; init; }

    public IReadOnlyList<SwapOffer> Offers { get; init; } = [];

    public IReadOnlyList<string> Others { get; init; } = [];

    public bool StillEmpty { get; init; }

    public string? Who { get; init; }

    public IReadOnlyList<string> People { get; init; } = [];
}

/// <summary>Hours stand on no blade: which was on then? Its spell is entered late, and the hours find it.</summary>
internal static class Then
{
    private const int Offered = 6;

    public static async Task<IResult> Get(Desk desk, string code)
    {
        if ((await desk.Shop()).Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var units = await desk.Units();
        var form = await NoBladeKnown.First(desk.Db, saw.Saw.Id) is { } gap
            ? new ThenForm { At = units.ShowTime(gap.From), Until = units.ShowTime(gap.Until), Began = Written(gap.From), Ended = Written(gap.Until) }
            : new ThenForm();
        return await Show(desk, saw, form, FormState.New);
    }

    public static async Task<IResult> Post([FromForm] ThenForm? form, Desk desk, string code)
    {
        form ??= new();
        var shop = await desk.Shop();
        if (shop.Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        var units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        var tag = Tags.Read(string.IsNullOrWhiteSpace(form.Other) ? form.OnTag ?? "" : form.Other);
        read.RefuseUnless(tag.Length > 0, nameof(form.OnTag), "Say which blade was on: tap one, or choose another.");
        read.RefuseUnless(tag.Length == 0 || shop.Blade(tag) is not null, nameof(form.OnTag), $"There is no blade {tag}.");
        var at = Moment(read, units, nameof(form.At), form.At, form.Began);
        var until = Moment(read, units, nameof(form.Until), form.Until, form.Ended);
        read.RefuseUnless(at is not null || !string.IsNullOrWhiteSpace(form.At), nameof(form.At), "Say since when it was on, such as yesterday 7:15.");
        read.RefuseUnless(
            until is not null || !string.IsNullOrWhiteSpace(form.Until) || saw.MountedBladeId is null, nameof(form.Until),
            "Another blade is on now: say until when this one was.");
        if (!read.IsGood)
        {
            return await Show(desk, saw, form, read.State);
        }

        var command = new Records.Writing.Swap(saw.Saw.Code)
        {
            SawVersion = int.TryParse(form.SawVersion, CultureInfo.InvariantCulture, out var version) ? version : null,
            OnTag = tag,
            At = at,
            Until = until,
            UntilReason = OffReason.FoundOff,
            Although = form.Although,
        };
        return await desk.Send(command, form, $"/saws/{saw.Saw.Code}", $"{tag} on {saw.Saw.Name} then", state => Show(desk, saw, form, state));
    }

    /// <summary>A moment left as it was filled in is that moment exactly.</summary>
    private static DateTime? Moment(FormReading read, ShopUnits units, string field, string? text, string? exact) =>
        DateTime.TryParseExact(exact, "O", CultureInfo.InvariantCulture, DateTimeStyles.RoundtripKind, out var known) && units.ShowTime(known) == text?.Trim()
            ? known
            : read.Time(field, text);

    private static string Written(DateTime utc) => DateTime.SpecifyKind(utc, DateTimeKind.Utc).ToString("O", CultureInfo.InvariantCulture);

    private static async Task<IResult> Show(Desk desk, SawNow saw, ThenForm form, FormState state)
    {
        var advice = await desk.Advice();
        var units = await desk.Units();
        var model = new ThenModel(form, state, saw.Saw.Code, saw.Saw.Name, saw.Saw.Version)
        {
            Who = (await desk.Who())?.Initials,
            People = await Swap.Initials(desk),
        };
        if (await NoBladeKnown.First(desk.Db, saw.Saw.Id) is { } gap)
        {
            var offers = await Offers(desk, advice, saw, gap);
            model = model with
            {
                When = $"from {Said.When(gap.From, desk.Now, units)} until {Said.When(gap.Until, desk.Now, units)}",
                StillEmpty = gap.StillEmpty,
                Offers = [.. offers.Take(Offered)],
                Others = [.. advice.Now.Blades.Select(b => b.Blade.Tag).Except(offers.Take(Offered).Select(o => o.Tag)).Order(NaturalOrder.Instance)],
            };
        }

        return await desk.Page<ThenPage, ThenModel>(model, state.Status);
    }

    /// <summary>Blades that fit and were on no saw then, those on this saw before and after it first.</summary>
    private static async Task<List<SwapOffer>> Offers(Desk desk, ShopAdvice advice, SawNow saw, NoBladeKnown gap)
    {
        var spells = await FactReader.ReadSpells(desk.Db);
        var away = spells.Where(s => s.From < gap.Until && s.End > gap.From).Select(s => s.BladeId).ToHashSet();
        var here = spells.Where(s => s.SawId == saw.Saw.Id).ToList();
        int[] near = [.. here.Where(s => s.End <= gap.From).TakeLast(1).Concat(here.Where(s => s.From >= gap.Until).Take(1)).Select(s => s.BladeId)];
        return
        [
            .. advice.Now.Blades
                .Where(b => ShopAdvice.Fits(b, saw) && !away.Contains(b.Blade.Id) && b.Blade.AddedUtc < gap.Until)
                .OrderBy(b => Array.IndexOf(near, b.Blade.Id) is >= 0 and var i ? i : int.MaxValue)
                .ThenBy(b => b.Place == Place.Gone).ThenBy(b => b.Blade.Tag, NaturalOrder.Instance)
                .Select(b => new SwapOffer(b.Blade.Tag, $"{Said.Section(b, Desk.Units(advice.Now.Shop))}, {Said.Teeth(b.Spec, Desk.Units(advice.Now.Shop))}")),
        ];
    }
}
