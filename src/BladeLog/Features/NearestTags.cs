using BladeLog.Handbook.Tables;
using BladeLog.Records;

namespace BladeLog.Features;

/// <summary>The tags a mistyped one may have meant.</summary>
internal static class NearestTags
{
    public static IReadOnlyList<string> To(string typed, ShopNow shop)
    {
        string sought = typed.ToUpperInvariant();
        return [.. shop.Blades.Select(b => b.Blade.Tag)
            .OrderBy(t => EditDistance.Between(sought, t.ToUpperInvariant())).ThenBy(t => t, NaturalOrder.Instance).Take(6)];
    }
}
