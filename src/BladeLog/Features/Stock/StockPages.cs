using System.Globalization;
using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Stock;

/// <summary>What is there of each kind, and what to order when.</summary>
internal static class StockPages
{
    private const string EditAddress = "/specs/{code}/edit";

    public static void Map(WebApplication app)
    {
        app.MapGet("/stock", Get);
        app.MapPost("/stock", Post);
        app.MapGet("/stock/costs", CostPages.Get);
    }

    private static Task<IResult> Get(Desk desk, EndpointDataSource endpoints, string? lead, string? least) =>
        Show(desk, endpoints, new StockForm(), FormState.New, lead, least);

    private static async Task<IResult> Post([FromForm] StockForm? form, Desk desk, EndpointDataSource endpoints)
    {
        form ??= new();
        var read = new FormReading(await desk.Units(), desk.Now);
        read.RefuseUnless(!string.IsNullOrWhiteSpace(form.Spec), nameof(form.Spec), "Say of which kind.");
        read.RefuseUnless(form.Way is "came" or "went", nameof(form.Way), "Say whether they came or went.");
        long? count = read.Count(nameof(form.Count), form.Count, Fields.Count);
        read.Need(nameof(form.Count), count, form.Count, "Write how many.");
        read.RefuseUnless(count is not > 10_000, nameof(form.Count), "That is more than a shop holds.");
        if (!read.IsGood)
        {
            return await Show(desk, endpoints, form, read.State, null, null);
        }

        int signed = (int)(form.Way == "went" ? -count!.Value : count!.Value);
        return await desk.Send(
            new RecordStock(form.Spec!, signed, form.Reason ?? ""), form, "/stock", $"{form.Spec}: {(signed > 0 ? "+" : "")}{signed.ToString(CultureInfo.InvariantCulture)}",
            state => Show(desk, endpoints, form, state, null, null));
    }

    private static async Task<IResult> Show(Desk desk, EndpointDataSource endpoints, StockForm form, FormState state, string? lead, string? least)
    {
        ShopAdvice advice = await desk.Advice();
        ShopUnits units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        double leadDays = read.Number("lead", lead, "14") is { } l and >= 0 and <= 365 ? l : advice.Settings[StockSettings.LeadDays];
        double leastCount = read.Number("least", least, "1") is { } n and >= 0 and <= 100 ? Math.Floor(n) : advice.Settings[StockSettings.Least];
        double weeks = advice.Settings[StockSettings.RecentWeeks];
        bool canEdit = endpoints.Endpoints.OfType<RouteEndpoint>().Any(e => "/" + e.RoutePattern.RawText?.Trim('/') == EditAddress);
        IReadOnlyList<StockLine> lines = await StockNow.Of(desk, leadDays, leastCount);
        string forAll = least is not null && leastCount != advice.Settings[StockSettings.Least] ? "as asked below"
            : advice.Settings.Known(StockSettings.Least).IsDefault ? "default, not yours"
            : "yours, for every kind";
        StockRow[] rows = [.. lines.Select(s => Row(s, advice, units, desk.Now, canEdit, forAll)).OrderByDescending(r => r.Now).ThenByDescending(r => r.Order is not null)];
        int toOrder = lines.Count(s => s.OrderInDays <= leadDays);
        return await desk.Page<StockPage, StockModel>(
            new StockModel
            {
                Title = (rows.Count(r => r.Now), toOrder) switch
                {
                    ( > 0 and var now, _) => $"Stock: order {Said.Count(now, "kind", "kinds")} now",
                    (_, > 0 and var soon) => $"Stock: {Said.Count(soon, "kind", "kinds")} to order soon",
                    _ => "Stock: nothing to order",
                },
                Rows = rows,
                LeadDays = leadDays.ToString("0.##", CultureInfo.InvariantCulture),
                Least = leastCount.ToString("0", CultureInfo.InvariantCulture),
                Basis = $"Reckoned from the hours each kind ran in the last {weeks:0.#} weeks, shared by its blades at hand: a blade is gone once it passes its retire mark, and before that with its chance to break (handbook alone). Blades at the sharpener or on hold do not count. A kind without a least of its own has none while it does not run.",
                Form = form,
                State = state,
                Who = (await desk.Who())?.Initials,
                People = await desk.Db.People.AsNoTracking().Where(p => p.Active).OrderBy(p => p.Initials).Select(p => p.Initials).ToListAsync(),
            },
            state.Status);
    }

    private static StockRow Row(StockLine s, ShopAdvice advice, ShopUnits units, DateTime now, bool canEdit, string forAll)
    {
        List<string> counts = [], besides = [];
        void Add(int n, string words, bool atHand = true)
        {
            if (n > 0)
            {
                (atHand ? counts : besides).Add($"{n}{Figures.Glue}{words}");
            }
        }

        Add(s.OnSaw, "on a saw");
        Add(s.Ready, "ready");
        Add(s.Spare, s.Spare == 1 ? "new spare" : "new spares");
        Add(s.ToSharpen, "to sharpen");
        DateTime? back = s.Blades.Select(b => b.File.Away?.PromisedUtc).Min();
        Add(s.Away, back is { } promised ? $"at the sharpener, promised {Said.Day(promised, now, units)}" : "at the sharpener", atHand: false);
        Add(s.OnHold, "on hold", atHand: false);
        BladeFile drawn = s.Blades.Count > 0 ? s.Blades[0].File with { WidthM = s.Spec.WidthM, GulletM = null } : new BladeFile { Blade = new Blade { Tag = s.Spec.Code, Spec = s.Spec }, Spec = s.Spec, Place = Place.Rack, WidthM = s.Spec.WidthM };
        return new StockRow
        {
            Code = s.Spec.Code,
            Section = Said.Section(drawn, units),
            Teeth = Said.Teeth(s.Spec, units),
            Strip = Drawn.Teeth(BladeBody.Of(drawn, advice.Settings), s.Spec),
            Counts = counts.Count == 0 ? besides.Count == 0 ? "none left" : "none here" : string.Join(", ", counts),
            Besides = besides.Count == 0 ? null : string.Join(", ", besides),
            AtHand = s.AtHand,
            Least = s.Least,
            LeastFrom = s.OwnLeast ? "yours" : forAll,
            Use = s.HoursPerWeek > 0
                ? $"{Figures.With(Figures.Hours(s.HoursPerWeek), "h")} a week; {(s.GoneInLeadTime < 0.05 ? "none is" : $"about {Wording.Number(s.GoneInLeadTime, 1)} are")} expected to be gone before an order is here"
                : "did not run lately",
            Order = StockNow.Order(s, now, units),
            Now = s.OrderInDays is 0,
            Blades = [.. s.Blades.Where(b => !StockCount.IsSpare(b)).OrderBy(b => b.File.Blade.Tag, NaturalOrder.Instance).Select(b => new StockBlade(b.File.Blade.Tag, Says(b, advice), WorkedOut.Life(b)))],
            Edit = canEdit ? $"/specs/{Uri.EscapeDataString(s.Spec.Code)}/edit" : null,
            Price = s.Spec.PriceMinor is { } price ? units.ShowMoney(price) : "price not told",
        };
    }

    private static string Says(BladeAdvice blade, ShopAdvice advice)
    {
        string where = blade.State == BladeState.Hold ? "on hold" : blade.File.Place switch
        {
            Place.OnSaw => "on " + advice.Now.Saws.FirstOrDefault(s => s.Saw.Id == blade.File.SawId)?.Saw.Name,
            Place.AtSharpener => blade.Grind.Pays ? "at the sharpener" : "at the sharpener, not worth the grind",
            Place.Bench => "bench",
            _ => blade.File.Hook ?? "rack",
        };
        return blade.Life is { UnknownHistory: false, HoursToRetire: { } left } ? $"{where}, {Figures.With(Figures.Hours(left), "h")} to retire" : where;
    }
}
