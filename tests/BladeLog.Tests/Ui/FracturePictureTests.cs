using System.Globalization;
using System.Text.RegularExpressions;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Tests.Ui;

public sealed partial class FracturePictureTests
{
    public static TheoryData<FractureKind> Kinds => [.. Enum.GetValues<FractureKind>()];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void A_fracture_stays_on_its_picture_and_says_what_it_is(FractureKind kind)
    {
        FractureShapes drawn = FractureGeometry.Of(kind);
        Assert.NotEmpty(FractureGeometry.Describe(kind));
        Assert.All(drawn.Pieces, p => Assert.EndsWith("Z", p, StringComparison.Ordinal));
        // Ends may run a gap over the sides, where the picture cuts them off.
        double[] all = [.. drawn.Pieces.SelectMany(p => Number().Matches(p)).Select(m => double.Parse(m.Value, CultureInfo.InvariantCulture))];
        Assert.All(all, n => Assert.InRange(n, -5, FractureGeometry.Width + 5));
    }

    [Fact]
    public void No_two_fractures_look_alike() =>
        Assert.Equal(6, Enum.GetValues<FractureKind>().Select(k => FractureGeometry.Of(k)).Select(d => string.Join('|', [.. d.Pieces, .. d.Tears, .. d.Seams])).Distinct().Count());

    [Theory]
    [InlineData(FractureKind.BackEdge, 86)]
    [InlineData(FractureKind.StraightFromGullet, 34)]
    [InlineData(FractureKind.AngledFromGullet, 34)]
    public void The_ring_stands_where_the_fracture_began(FractureKind kind, double y) => Assert.Equal(y, FractureGeometry.Of(kind).Began!.Value.Y);

    [GeneratedRegex(@"-?\d+(\.\d+)?")]
    private static partial Regex Number();
}
