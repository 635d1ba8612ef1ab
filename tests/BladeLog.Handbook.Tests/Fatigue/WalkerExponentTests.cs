using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tests.Fatigue;

public sealed class WalkerExponentTests
{
    // Dowling, Calhoun and Arcari 2009, fit to steels: γ = 0.8818 - 0.000200 S_u, S_u in MPa. Worked by hand at round strengths.
    [Theory]
    [InlineData(500, 0.7818)]
    [InlineData(1000, 0.6818)]
    [InlineData(1490.4, 0.58372)]
    [InlineData(2000, 0.4818)]
    public void The_published_exponent_falls_with_strength(double su, double gamma) =>
        Assert.Equal(gamma, MeanStress.WalkerExponent(Stress.FromMegapascals(su)), 1e-9);

    [Fact]
    public void It_never_leaves_0_35_to_1()
    {
        Assert.Equal(0.35, MeanStress.WalkerExponent(Stress.FromMegapascals(4000)), 1e-12);
        Assert.InRange(MeanStress.WalkerExponent(Stress.FromMegapascals(1)), 0.88, 1);
    }
}
