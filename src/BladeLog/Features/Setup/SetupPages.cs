using System.Globalization;
using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Setup;

public sealed record ShopForm : PostedForm
{
    public string? Version { get; init; }

    public string? Name { get; init; }

    public string? Zone { get; init; }

    public string? Lengths { get; init; }

    public string? Spelling { get; init; }

    public string? PullWord { get; init; }

    public string? Rate { get; init; }

    public string? CurrencyDigits { get; init; }

    public string? Timber { get; init; }
}

public sealed record SettingForm : PostedForm
{
    public string? Value { get; init; }
}

/// <summary>A setting as its row shows it.</summary>
public sealed record SettingRow(SettingDefinition Definition, Setting? Own);

public sealed record ShopSetupModel(ShopForm Form, FormState State, IReadOnlyList<IGrouping<string, SettingRow>> Chapters, IReadOnlyList<string> Zones);

public sealed record SettingModel(SettingForm Form, FormState State, SettingRow Row);

/// <summary>The shop's own figures, and every constant of the advice it may set for itself.</summary>
internal static class SetupPages
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/setup", Get);
        app.MapPost("/setup", Post);
        app.MapGet("/setup/{key}", GetSetting);
        app.MapPost("/setup/{key}", PostSetting);
    }

    private static async Task<IResult> Get(Desk desk) => await Show(desk, FormOf((await desk.Shop()).Shop, await desk.Units()), FormState.New);

    private static async Task<IResult> Post([FromForm] ShopForm? form, Desk desk)
    {
        form ??= new();
        var now = (await desk.Shop()).Shop;
        var read = new FormReading(await desk.Units(), desk.Now);
        var digits = read.Count(nameof(form.CurrencyDigits), form.CurrencyDigits) ?? now.CurrencyDigits;
        read.RefuseUnless(digits <= 4, nameof(form.CurrencyDigits), "An amount has 0 to 4 digits after the point.");

        // Amounts are read with the digits the same form sets.
        var money = new FormReading(Desk.Units(now) with { CurrencyDigits = (int)Math.Min(4, digits) }, desk.Now);
        var shop = new Shop
        {
            Name = form.Name?.Trim() ?? "",
            Zone = form.Zone?.Trim() ?? "",
            Lengths = read.Choice<LengthUnit>(nameof(form.Lengths), form.Lengths, "Say mm or inch.") ?? default,
            Spelling = read.Choice<Spelling>(nameof(form.Spelling), form.Spelling, "Say which spelling.") ?? default,
            PullWord = read.Choice<Records.PullWord>(nameof(form.PullWord), form.PullWord, "Say which word.") ?? default,
            RateMinorPerHour = money.Money(nameof(form.Rate), form.Rate) ?? 0,
            CurrencyDigits = (int)Math.Min(4, digits),
            TimberMinorPerM3 = money.Money(nameof(form.Timber), form.Timber) ?? 0,
            IsSample = now.IsSample,
        };
        if (!read.IsGood || !money.IsGood)
        {
            return await Show(desk, form, read.State with { Problems = [.. read.State.Problems, .. money.State.Problems] });
        }

        return await desk.Send(
            new SaveShop(shop, int.TryParse(form.Version, out var version) ? version : now.Version), form, "/setup", "Setup changed", state => Show(desk, form, state), canUndo: false);
    }

    private static async Task<IResult> GetSetting(Desk desk, string key) => SettingList.Find(key) is { } definition
        ? await ShowSetting(desk, definition, null, FormState.New)
        : Results.NotFound();

    private static async Task<IResult> PostSetting([FromForm] SettingForm? form, Desk desk, string key)
    {
        form ??= new();
        if (SettingList.Find(key) is not { } definition)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var value = read.Number(nameof(form.Value), form.Value, $"a number such as {definition.Default.ToString("0.######", CultureInfo.InvariantCulture)}");
        if (value is { } v && definition.Refuse(v) is { } why)
        {
            read.Refuse(nameof(form.Value), why);
        }

        return read.IsGood
            ? await desk.Send(
                new SaveSetting(definition.Key, value, form.Value?.Trim() ?? ""), form, "/setup#" + definition.Chapter, "Setting changed",
                state => ShowSetting(desk, definition, form, state), canUndo: false)
            : await ShowSetting(desk, definition, form, read.State);
    }

    private static ShopForm FormOf(Shop shop, ShopUnits units) => new()
    {
        Version = shop.Version.ToString(CultureInfo.InvariantCulture),
        Name = shop.Name,
        Zone = shop.Zone,
        Lengths = shop.Lengths.ToString(),
        Spelling = shop.Spelling.ToString(),
        PullWord = shop.PullWord.ToString(),
        Rate = units.Typing.ShowMoney(shop.RateMinorPerHour),
        CurrencyDigits = shop.CurrencyDigits.ToString(CultureInfo.InvariantCulture),
        Timber = units.Typing.ShowMoney(shop.TimberMinorPerM3),
    };

    private static async Task<IResult> Show(Desk desk, ShopForm form, FormState state)
    {
        var shop = await desk.Shop();
        var chapters = SettingList.All.Select(d => new SettingRow(d, shop.Settings.GetValueOrDefault(d.Key))).GroupBy(r => r.Definition.Chapter).ToList();
        string[] zones = [.. TimeZoneInfo.GetSystemTimeZones().Select(z => z.Id).Where(z => z.Contains('/')).Order(StringComparer.Ordinal)];
        var shown = form with { Version = shop.Shop.Version.ToString(CultureInfo.InvariantCulture) };
        return await desk.Page<ShopSetupPage, ShopSetupModel>(new(shown, state, chapters, zones), state.Status);
    }

    private static async Task<IResult> ShowSetting(Desk desk, SettingDefinition definition, SettingForm? form, FormState state)
    {
        var own = (await desk.Shop()).Settings.GetValueOrDefault(definition.Key);
        return await desk.Page<SettingPage, SettingModel>(new(form ?? new SettingForm { Value = own?.Typed }, state, new SettingRow(definition, own)), state.Status);
    }
}
