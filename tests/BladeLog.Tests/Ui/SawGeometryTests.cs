using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Tests.Ui;

public class SawGeometryTests
{
    [Theory]
    [InlineData(5080, 350, 350)]
    [InlineData(5080, 350, 300)]
    [InlineData(4000, 200, 280)]
    public void The_axles_stand_where_the_loop_is_tight(double loop, double r1, double r2)
    {
        // Derived: the length of an open belt, added up from its two tangents and two arcs.
        var a = SawGeometry.AxleDistance(loop, r1, r2);
        var lean = Math.Asin((r1 - r2) / a);
        var round = 2 * a * Math.Cos(lean) + r1 * (Math.PI + 2 * lean) + r2 * (Math.PI - 2 * lean);
        Assert.Equal(loop, round, 1e-6);
    }

    [Fact]
    public void A_drawn_loop_of_unequal_wheels_has_the_length_of_the_blade()
    {
        var drawing = SawGeometry.Of(new(SawKind.TwoWheels, 700, 5080, 560));
        var (low, top) = (drawing.Wheels[0], drawing.Wheels[1]);
        // Both wheels touch the upright strand.
        Assert.Equal(low.Centre.X - low.Radius, top.Centre.X - top.Radius, 1e-9);
        var a = (top.Centre - low.Centre).Length;
        Assert.Equal(SawGeometry.AxleDistance(5080, 350, 280), a, 1e-9);
        // Points: start, upper end of the strand, arc, right tangent on the upper wheel, the same on the lower one.
        var points = SvgCompare.Points(drawing.Loop);
        var (p, q) = (points[4], points[5]);
        Assert.Equal(top.Radius, (new Point(p.X, p.Y) - top.Centre).Length, 0.02);
        Assert.Equal(low.Radius, (new Point(q.X, q.Y) - low.Centre).Length, 0.02);
        Assert.Equal(points[0].Y - points[1].Y, (new Point(p.X, p.Y) - new Point(q.X, q.Y)).Length, 0.05);
    }

    [Theory]
    [InlineData(SawKind.TwoWheels, 700, 2500)]
    [InlineData(SawKind.ThreeWheels, 205, 800)]
    [InlineData(SawKind.Mill, 489, 2000)]
    [InlineData(SawKind.TwoWheels, 0, 2000)]
    public void A_loop_too_short_for_its_wheels_is_not_drawn(SawKind kind, double wheel, double loop)
    {
        var saw = new SawShape(kind, wheel, loop);
        Assert.False(saw.CanBeDrawn);
        Assert.Throws<ArgumentOutOfRangeException>(() => SawGeometry.Of(saw));
    }

    [Fact]
    public void All_saws_of_a_shop_share_one_height()
    {
        Assert.Equal(2530, SawShape.CommonHeight([new(SawKind.TwoWheels, 356, 2667), new(SawKind.Mill, 489, 4020)]));
        // Derived: axles (9000 − 1200 π)/2 apart, plus a wheel, the stand of 130, 40 of frame and 24 of air.
        Assert.Equal((9000 - 1200 * Math.PI) / 2 + 1200 + 130 + 40 + 24, SawShape.CommonHeight([new(SawKind.TwoWheels, 1200, 9000)]), 1e-9);
    }
}
