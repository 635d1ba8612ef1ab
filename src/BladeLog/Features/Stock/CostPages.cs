using System.Globalization;
using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;
using BladeLog.Records;
using BladeLog.Ui;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Stock;

/// <summary>What blades cost for what they cut.</summary>
internal static class CostPages
{
    public static async Task<IResult> Get(Desk desk, string? blade)
    {
        ShopNow shop = await desk.Shop();
        ShopAdvice advice = await desk.Advice();
        ShopUnits units = await desk.Units();
        ShopDb db = desk.Db;
        var off = await db.Dismounts.AsNoTracking().Select(d => new { d.MountId, d.Entry.AtUtc }).ToDictionaryAsync(d => d.MountId, d => (DateTime?)d.AtUtc);
        var spells = (await db.Mounts.AsNoTracking().Select(m => new { m.EntryId, m.SawId, m.BladeId, m.Entry.AtUtc }).ToListAsync())
            .Select(m => new SpellOf(m.SawId, m.BladeId, m.AtUtc, off.GetValueOrDefault(m.EntryId)));
        List<CutDone> cuts = await db.CutsDone.AsNoTracking().Include(c => c.Entry).ToListAsync();
        List<Sharpening> sharpenings = await db.Sharpenings.AsNoTracking().ToListAsync();
        IReadOnlyDictionary<int, CostSoFar> costs = Costs.OfBlades(shop.Blades, spells, cuts, sharpenings, await db.Breaks.AsNoTracking().ToListAsync(), shop.Shop);
        // A foot or a metre sawn, and its square.
        double side = units.Units == UnitSystem.Inch ? Exact.Foot : 1;
        string Money(double? minor, int digits) => minor is { } m ? Figures.Number(m / Math.Pow(10, shop.Shop.CurrencyDigits), digits) : "";
        CostRow Row(CostSoFar c, string? href) => new(
            c.Name, href, units.ShowMoney(c.Spent.Bought), units.ShowMoney(c.Spent.Sharpened), units.ShowMoney(c.Spent.Broke),
            Money(c.PerMetre * side, 3),
            Money(c.PerSquareMetre * side * side, 3),
            Money(c.PerBoardFoot, 4), Money(c.PerCut, 2), Money(c.PerHour, 2));
        BladeFile[] ran = [.. shop.Blades.Where(b => costs[b.Blade.Id].Work.Hours > 0).OrderBy(b => b.Blade.Tag, NaturalOrder.Instance)];
        BladeAdvice? asked = blade is not null && shop.Blade(Tags.Read(blade)) is { } file ? advice.Of(file) : null;
        KeepOrRetire? keep = asked is null ? null : KeepOrRetire.Of(asked, advice.Settings);
        SawNow? saw = shop.Saws.FirstOrDefault(s => s.Setup.Takes.HasFlag(Takes.Resaw)) ?? (shop.Saws.Count > 0 ? shop.Saws[0] : null);
        CostSoFar all = Costs.Together("All", costs.Values);
        return await desk.Page<CostsPage, CostsModel>(new CostsModel
        {
            Title = all.PerSquareMetre is { } each ? $"Costs: {Money(each * side * side, 3)} for each {(units.Units == UnitSystem.Inch ? "square foot" : "square metre")} sawn" : "Costs: no cut is logged yet",
            Specs = [.. ran.GroupBy(b => b.Spec.Code).OrderBy(g => g.Key, NaturalOrder.Instance).Select(g => Row(Costs.Together($"{g.Key}: {Said.Section(g.First(), units)}, {Said.Teeth(g.First().Spec, units)}", g.Select(b => costs[b.Blade.Id])), null))],
            Blades = [.. ran.Select(b => Row(costs[b.Blade.Id], $"/blades/{b.Blade.Tag}"))],
            Grinds = [.. Costs.Grinds(sharpenings, shop.Blades).Select(g => (g.InHouse ? "Ground in the shop" : "Ground by a service", Money(g.Each, 2), $"{Said.Count(g.Count, "sharpening", "sharpenings")}, {units.ShowMoney(g.Spent)} together"))],
            Teeth = saw is null ? [] : [.. Teeth(shop, advice, saw, units).OrderBy(t => t.Minor).Select(t => (t.Code, t.Teeth, Money(t.Minor * side * side, 3)))],
            TeethOn = saw is null ? "" : $"On {saw.Saw.Name}, {units.ShowFeed(new Speed(4 / 60.0))}, clean medium wood: a sharpening and the share of the price that goes with each edge, over the metres an edge lasts.",
            Tags = [.. shop.Blades.Where(b => b.Break is null && b.Retirement is null && b.Place != Place.Gone).Select(b => b.Blade.Tag).Order(NaturalOrder.Instance)],
            Tag = asked?.File.Blade.Tag,
            Keep = keep is null ? null : Keep(asked!, keep, shop, units),
            NoKeep = asked is null || keep is not null ? null : asked.State == BladeState.Hold ? $"{asked.File.Blade.Tag} is on hold: no chance is told of it." : $"Nothing can be told of {asked.File.Blade.Tag}.",
            Inch = units.Units == UnitSystem.Inch,
        });
    }

    private static KeepPart Keep(BladeAdvice blade, KeepOrRetire k, ShopNow shop, ShopUnits units)
    {
        string tag = blade.File.Blade.Tag, hours = Figures.With(k.Hours.ToString("0.#", CultureInfo.InvariantCulture), "h");
        string keep = units.ShowMoney((long)Math.Round(k.Keep)), retire = units.ShowMoney((long)Math.Round(k.Retire));
        return new KeepPart(
            k.KeepIsCheaper ? $"{tag}: keep it for the next {hours}" : $"{tag}: retire it now",
            $"Keeping it for {hours}: {keep}, the chance of a break times {units.ShowMoney(k.BreakCost)}, what a break costs on {blade.Record.On!.Saw.Name}.",
            $"Retiring it now: {retire}, the unused part of its price of {units.ShowMoney(blade.File.Spec.PriceMinor ?? 0)}.",
            $"{Figures.ChanceSentence(k.Chance)} such blades break in those {hours}{(blade.Record.UnknownHistory ? "; its history is unknown, so the worse end is taken" : "")} (handbook alone).{(blade.PastRetireMark ? " It is past its retire mark: rough work only." : "")}",
            WorkedOut.Rows(WorkedOut.Life(blade)));
    }

    /// <summary>Kinds that can be sharpened and fit the saw, at reference feed.</summary>
    private static IEnumerable<(string Code, string Teeth, double Minor)> Teeth(ShopNow shop, ShopAdvice advice, SawNow saw, ShopUnits units) => shop.Blades
        .Where(b => b.Spec is { MostSharpenings: > 0, PriceMinor: not null, SharpeningPriceMinor: not null } && b.Spec.NewLoopM is { } loop && loop >= saw.Setup.LoopLeastM && loop <= saw.Setup.LoopMostM)
        .GroupBy(b => b.Spec.Code)
        .Select(g => (g.Key, One: advice.Of(g.First())))
        .Where(g => g.One.Edge.PathToDullKm > 0)
        .Select(g =>
        {
            BladeAdvice one = g.One;
            Spec spec = one.File.Spec;
            return ($"{g.Key}: {Said.Section(one.File, units)}", Said.Teeth(spec, units), Costs.ToothCost(
                spec.SharpeningPriceMinor!.Value, spec.PriceMinor!.Value, spec.MostSharpenings!.Value, one.Edge.PathToDullKm, new Speed(4 / 60.0), new Length(saw.Setup.LoopM), new Speed(saw.Setup.UsualSpeedMps)));
        });
}
