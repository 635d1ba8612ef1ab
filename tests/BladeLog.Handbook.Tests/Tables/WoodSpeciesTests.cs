using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tables;
using BladeLog.Handbook.Tests.Cutting;

namespace BladeLog.Handbook.Tests.Tables;

public sealed class WoodSpeciesTests
{
    [Theory] // Wood Handbook FPL-GTR-282, metric table 5-3a: gravity green and at 12 %, side hardness green and at 12 % in N, printed to the hundred
    [InlineData("red_alder", 0.37, 0.41, 2000, 2600)]
    [InlineData("quaking_aspen", 0.35, 0.38, 1300, 1600)]
    [InlineData("american_basswood", 0.32, 0.37, 1100, 1800)]
    [InlineData("american_beech", 0.56, 0.64, 3800, 5800)]
    [InlineData("paper_birch", 0.48, 0.55, 2500, 4000)]
    [InlineData("black_cherry", 0.47, 0.50, 2900, 4200)]
    [InlineData("american_elm", 0.46, 0.50, 2800, 3700)]
    [InlineData("shagbark_hickory", 0.64, 0.72, 6500, 8400)]
    [InlineData("sugar_maple", 0.56, 0.63, 4300, 6400)]
    [InlineData("northern_red_oak", 0.56, 0.63, 4400, 5700)]
    [InlineData("white_oak", 0.60, 0.68, 4700, 6000)]
    [InlineData("sweetgum", 0.46, 0.52, 2700, 3800)]
    [InlineData("yellow_poplar", 0.40, 0.42, 2000, 2400)]
    [InlineData("baldcypress", 0.42, 0.46, 1700, 2300)]
    [InlineData("balsam_fir", 0.33, 0.35, 1300, 1700)]
    [InlineData("longleaf_pine", 0.54, 0.59, 2600, 3900)]
    [InlineData("redwood_old_growth", 0.38, 0.40, 1800, 2100)]
    [InlineData("sitka_spruce", 0.37, 0.40, 1600, 2300)]
    public void American_woods_agree_with_the_metric_table(string key, double green, double dry, double greenN, double dryN)
    {
        WoodSpecies s = WoodSpeciesTable.Of(key);
        Assert.Equal((green, dry), (s.GreenGravity, s.Gravity12));
        Assert.Equal(greenN, s.GreenHardness!.Value.Newtons, 50.5);
        Assert.Equal(dryN, s.DryHardness!.Value.Newtons, 50.5);
    }

    [Theory] // Wood Handbook FPL-GTR-282, metric table 5-5a; each printing rounded by itself, so half a step of each
    [InlineData("greenheart", 0.80, 8400, 10500)]
    [InlineData("ipe", 0.92, 13600, 16400)]
    [InlineData("jarrah", 0.67, 5700, 8500)]
    [InlineData("kapur", 0.64, 4400, 5500)]
    [InlineData("keruing", 0.69, 4700, 5600)]
    [InlineData("true_mahogany", 0.45, 3300, 3600)]
    [InlineData("obeche", 0.30, 1900, 1900)]
    [InlineData("ramin", 0.52, 2800, 5800)]
    [InlineData("teak", 0.55, 4100, 4400)]
    [InlineData("dark_red_meranti", 0.46, 3100, 3500)]
    public void Imported_woods_agree_with_the_metric_table(string key, double green, double greenN, double dryN)
    {
        WoodSpecies s = WoodSpeciesTable.Of(key);
        Assert.Equal(green, s.GreenGravity);
        Assert.Equal(greenN, s.GreenHardness!.Value.Newtons, 72.5);
        Assert.Equal(dryN, s.DryHardness!.Value.Newtons, 72.5);
    }

    [Theory] // density, wear and stringiness the sample shop's cuts stand on
    [InlineData("European oak", 710, 1.5)]
    [InlineData("black cherry", 560, 1)]
    [InlineData("Indian rosewood", 954, 3)]
    [InlineData("Norway spruce", 455, 0.7)]
    [InlineData("European larch", 590, 1)]
    [InlineData("Douglas-fir (coast)", 538, 1)]
    [InlineData("sugar maple", 706, 1.5)]
    [InlineData("black walnut", 616, 1)]
    [InlineData("European ash", 690, 1.5)]
    [InlineData("Scots pine", 515, 0.7)]
    [InlineData("yellow-poplar", 470, 0.7)]
    public void Woods_of_the_sample_shop(string typed, double density, double wear)
    {
        WoodSpecies? s = WoodSpeciesTable.Find(typed, out string? takenAs);
        Assert.NotNull(s);
        Assert.Null(takenAs);
        Assert.Equal(density, s.Density12);
        Assert.Equal(wear, s.WearFactor);
    }

    [Fact]
    public void Density_follows_from_the_printed_gravity()
    {
        foreach (WoodSpecies s in WoodSpeciesTable.All.Where(s => s.GreenGravity is not null))
        {
            double gravity = s.Gravity12 ?? WoodDensity.GravityAt(s.GreenGravity!.Value, 12);
            Assert.Equal(WoodDensity.FromGravity(gravity, 12).KilogramsPerCubicMetre, s.Density12, 0.51);
        }
    }

    [Theory] // independent program, cutting specification 5.2, last column: at 20 degrees, 12 %, rip
    [InlineData("white_ash", "65.4")]
    [InlineData("western_redcedar", "34.9")]
    [InlineData("ipe", "117.4")]
    [InlineData("indian_rosewood", "92.8")]
    public void Shear_factor_of_a_wood(string key, string megapascals) =>
        Printed.Check(megapascals, CuttingForce.ShearFactor(Saws.A(density: WoodSpeciesTable.Of(key).Density12)).Pascals / 1e6);

    [Fact]
    public void Every_row_is_whole()
    {
        Assert.Equal(WoodSpeciesTable.All.Count, WoodSpeciesTable.All.Select(s => s.Key).Distinct().Count());
        Assert.Equal(WoodSpeciesTable.All.Count, WoodSpeciesTable.All.Select(s => s.Name).Distinct().Count());
        Assert.All(WoodSpeciesTable.All, s =>
        {
            Assert.Matches("^[a-z]+(_[a-z]+)*$", s.Key);
            Assert.InRange(s.Density12, 200, 1300);
            Assert.InRange(s.WearFactor, 0.7, 8);
            Assert.True(s.Provenance is Provenance.Published or Provenance.FromMemory);
            Assert.Equal(s.Provenance == Provenance.Published ? "wood-handbook-282" : "from-memory", s.SourceKey);
            Assert.True(s.DryHardness is null || s.GreenHardness is null || s.DryHardness.Value.Newtons >= s.GreenHardness.Value.Newtons);
        });
    }

    [Fact]
    public void Woods_with_silica_wear_most()
    {
        // Wood Handbook chapter 2: keruing and mersawa dull saws severely. Cristovao 2011: silica, not density, rules.
        Assert.True(WoodSpeciesTable.Of("mersawa").WearFactor > WoodSpeciesTable.Of("ipe").WearFactor);
        Assert.True(WoodSpeciesTable.Of("keruing").WearFactor > WoodSpeciesTable.Of("karri").WearFactor);
    }

    [Fact]
    public void Poplars_are_stringy_and_cedars_when_wet()
    {
        Assert.True(WoodSpeciesTable.Of("yellow_poplar").IsStringyAt(9));
        Assert.True(WoodSpeciesTable.Of("poplar").IsStringyAt(9));
        Assert.False(WoodSpeciesTable.Of("western_redcedar").IsStringyAt(12));
        Assert.True(WoodSpeciesTable.Of("western_redcedar").IsStringyAt(40));
        Assert.False(WoodSpeciesTable.Of("european_oak").IsStringyAt(60));
    }
}
