using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Design;

namespace BladeLog.Records;

/// <summary>Lets <c>dotnet ef</c> see the model without starting the program.</summary>
public sealed class ShopDbDesign : IDesignTimeDbContextFactory<ShopDb>
{
    public ShopDb CreateDbContext(string[] args) =>
        new(new DbContextOptionsBuilder<ShopDb>().UseSqlite("Data Source=design.db").Options);
}
