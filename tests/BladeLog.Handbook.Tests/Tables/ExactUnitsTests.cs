using BladeLog.Handbook.Units;

namespace BladeLog.Handbook.Tests.Tables;

/// <summary>Conversions that are exact by definition, against the printed factors.</summary>
public sealed class ExactUnitsTests
{
    [Fact]
    public void Inch_pound_and_gravity_are_exact_by_definition()
    {
        // International yard and pound agreement of 1959: 1 yard 0.9144 m, 1 pound 0.45359237 kg; standard gravity: 3rd CGPM 1901.
        Assert.Equal(0.0254, Exact.Inch);
        Assert.Equal(0.9144, 3 * Exact.Foot, 1e-15);
        Assert.Equal(0.45359237, Exact.Pound);
        Assert.Equal(9.80665, Exact.StandardGravity);
    }

    [Theory]
    [InlineData(Exact.PoundForce, 4.448222, 0.5e-6)]
    [InlineData(Exact.KilogramForce, 9.80665, 0.5e-9)]
    [InlineData(Exact.Psi, 6.894757e3, 0.5e-3)]
    [InlineData(Exact.BoardFoot, 2.359737e-3, 0.5e-9)]
    [InlineData(Exact.Horsepower, 7.456999e2, 0.5e-4)]
    [InlineData(Exact.MetricHorsepower, 7.354988e2, 0.5e-4)]
    public void The_others_follow_and_agree_with_the_printed_factors(double si, double printed, double half) =>
        // NIST Special Publication 811 (2008), appendix B.8, factors printed to seven digits. From memory, redone by hand from the definitions.
        Assert.InRange(si, printed - half, printed + half);
}
