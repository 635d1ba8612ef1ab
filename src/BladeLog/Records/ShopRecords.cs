using BladeLog.Records.Writing;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

public static class ShopRecords
{
    /// <summary>Registers the shop's file and pooled contexts on it, also as one context per request.</summary>
    public static IServiceCollection AddShopRecords(this IServiceCollection services, ShopFile file)
    {
        services.AddSingleton(file);
        services.AddPooledDbContextFactory<ShopDb>(file.Configure);
        services.AddScoped(s => s.GetRequiredService<IDbContextFactory<ShopDb>>().CreateDbContext());
        services.AddSingleton<ShopWriter>();
        return services;
    }
}
