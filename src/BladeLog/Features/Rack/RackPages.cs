using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Rack;

/// <summary>Every blade by where it is, and the way from a label to its blade.</summary>
internal static class RackPages
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/rack", Get);
        app.MapGet("/b/{tag}", Label);
    }

    private static async Task<IResult> Get(Desk desk, string? show, string? q)
    {
        // The number alone lists every tag it is part of; a whole tag, however typed, is its blade.
        if (!string.IsNullOrWhiteSpace(q) && TypedTag.Find(q, await desk.Shop()) is [var exact]
            && (!char.IsAsciiDigit(Tags.Read(q)[0]) || string.Equals(exact.Blade.Tag, Tags.Read(q), StringComparison.OrdinalIgnoreCase)))
        {
            return Results.Redirect($"/blades/{exact.Blade.Tag}");
        }

        return await desk.Page<RackPage, RackModel>(RackModel.Of(await desk.Advice(), await desk.Units(), show, q));
    }

    /// <summary>What a label points to: the blade, also by a tag it had before a clash was put right.</summary>
    private static async Task<IResult> Label(Desk desk, string tag)
    {
        string sought = Tags.Read(tag);
        ShopNow shop = await desk.Shop();
        if (shop.Blade(sought) is { } blade)
        {
            return Results.Redirect($"/blades/{blade.Blade.Tag}");
        }

        int? former = await desk.Db.TagsUsed.AsNoTracking().Where(t => t.Tag == sought).Select(t => (int?)t.BladeId).FirstOrDefaultAsync();
        string name = shop.Blades.FirstOrDefault(b => b.Blade.Id == former)?.Blade.Tag ?? sought;
        return Results.Redirect($"/blades/{Uri.EscapeDataString(name)}");
    }
}
