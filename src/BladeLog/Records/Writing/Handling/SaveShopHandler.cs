using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class SaveShopHandler
{
    public static async Task Handle(WriteSession w, SaveShop c)
    {
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.Shop.Name), "Name", "Give the shop a name.");
        w.RefuseUnless(TimeZoneInfo.TryFindSystemTimeZoneById(c.Shop.Zone, out _), "Zone", $"There is no time zone {c.Shop.Zone}.");
        w.RefuseUnless(c.Shop.CurrencyDigits is >= 0 and <= 4, "CurrencyDigits", "An amount has 0 to 4 digits after the point.");
        w.RefuseUnless(c.Shop.RateMinorPerHour >= 0, "RateMinorPerHour", "The rate must not be below zero.");
        if (!w.Stands)
        {
            return;
        }

        w.NewEntry(nameof(SaveShop), w.Now);
        w.AnswerPath = "/setup";
        var shop = await w.Db.Shops.FirstOrDefaultAsync();
        if (shop is null)
        {
            w.Db.Shops.Add(c.Shop);
            return;
        }

        await Edits.Edit(w, shop, c.Version, c.Shop, "the shop");
    }
}
