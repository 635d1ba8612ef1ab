using BladeLog.Records;

namespace BladeLog.Features.Blades;

/// <summary>The page of one blade.</summary>
internal static class BladePages
{
    private const int Shown = 8;

    public static void Map(WebApplication app) => app.MapGet("/blades/{tag}", Get);

    private static async Task<IResult> Get(Desk desk, string tag, string? all)
    {
        ShopNow shop = await desk.Shop();
        if (shop.Blade(tag) is not { } blade)
        {
            string sought = Tags.Read(tag);
            return await desk.Page<NoBladePage, NoBladeModel>(new NoBladeModel(sought.Length > 20 ? sought[..20] + "…" : sought, NearestTags.To(sought.Length > 20 ? sought[..20] : sought, shop)), StatusCodes.Status404NotFound);
        }

        PastPage past = await Past.OfBlade(desk.Db, blade.Blade.Id, all is null ? Shown : int.MaxValue);
        return await desk.Page<BladePage, BladeModel>(BladePageModel.Of(blade, await desk.Advice(), await desk.Units(), past, await CrackFacts.Read(desk.Db, blade.Blade.Id), await Story.Of(desk)));
    }
}
