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
        var shop = await w.Db.Shops.OrderBy(s => s.Id).FirstOrDefaultAsync();
        if (shop is null)
        {
            w.Db.Shops.Add(c.Shop);
            return;
        }

        // The name on the network has a form of its own.
        c.Shop.LanName = shop.LanName;
        await Edits.Edit(w, shop, c.Version, c.Shop, "the shop");
    }

    public static async Task Handle(WriteSession w, SaveLanName c)
    {
        var name = c.LanName?.Trim() is { Length: > 0 } given ? given : null;
        w.RefuseUnless(
            name is null || (Uri.TryCreate($"http://{name}/", UriKind.Absolute, out var uri) && uri.PathAndQuery == "/" && uri.Fragment.Length == 0
                && uri.UserInfo.Length == 0 && uri.HostNameType != UriHostNameType.Unknown && name.All(ch => ch < 128) && name.Length <= 100),
            nameof(c.LanName),
            "Write the machine's name on the network, and its port: saws.local:5080.");
        var shop = await w.Db.Shops.OrderBy(s => s.Id).FirstOrDefaultAsync();
        w.RefuseUnless(shop is not null, nameof(c.LanName), "There is no shop yet.");
        if (!w.Stands || !await Edits.Guard(w, shop!, c.Version, "the shop"))
        {
            return;
        }

        w.NewEntry(nameof(SaveLanName), w.Now);
        w.AnswerPath = "/labels";
        shop!.LanName = name;
    }
}
