using BladeLog.Handbook.Quantities;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Tests.Ui;

public class ToothPropertyTests
{
    [Fact]
    public void Twenty_thousand_random_teeth_give_a_sound_outline()
    {
        var random = new Random(17);
        for (var i = 0; i < 20_000; i++)
        {
            var pitch = 1.5 + 28.5 * random.NextDouble();
            var depth = pitch * (0.15 + 0.35 * random.NextDouble());
            var form = (ToothForm)random.Next(3);
            var hook = 25 * random.NextDouble();
            Assert.True(Gap.IsSound(pitch, depth, form, hook), $"{form} {pitch} {depth} {hook}");
            var gap = Gap.Of(pitch, depth, form, hook);

            // The floor touches the depth, and nothing lies below it or above the tips.
            Assert.Equal(depth, gap.Centre.Y + gap.Radius, 1e-9);
            Assert.All([gap.Foot, gap.ArcEnd, gap.Back, gap.FloorEnd], p => Assert.InRange(p.Y, 0, depth + 1e-9));
            // From left to right: face, gullet, back, next tip.
            Assert.True(gap.Foot.X < gap.Centre.X && gap.Centre.X <= gap.ArcEnd.X + 1e-9 && gap.Back.X < pitch, $"{form} {pitch} {depth} {hook}");
            // The face meets the arc as a tangent, and so does the back of hook and regular teeth.
            Assert.Equal(0, Across(gap.Centre - gap.Foot, gap.Foot), 1e-9 * pitch * pitch);
            Assert.Equal(gap.Radius, (gap.ArcEnd - gap.Centre).Length, 1e-9);
            if (form != ToothForm.Skip)
            {
                Assert.Equal(0, Across(gap.ArcEnd - gap.Centre, new Point(pitch, 0) - gap.ArcEnd), 1e-9 * pitch * pitch);
            }
            else
            {
                Assert.True(gap.ArcEnd.X <= gap.FloorEnd.X, $"{pitch} {depth} {hook}");
            }
        }
    }

    [Theory]
    [InlineData(10, 20, ToothForm.Regular, -40)]
    [InlineData(4, 12, ToothForm.Hook, -40)]
    [InlineData(6, 9, ToothForm.Skip, -20)]
    public void A_gullet_deeper_than_the_pitch_allows_is_refused(double pitch, double depth, ToothForm form, double hook)
    {
        var blade = new ToothSpec(40, [pitch], depth, form, hook, TipKind.Set);
        Assert.False(blade.CanBeDrawn);
        Assert.Throws<ArgumentOutOfRangeException>(() => Gap.Of(pitch, depth, form, hook));
    }

    [Fact]
    public void Every_variable_pitch_stands_where_the_specification_says()
    {
        double[] pitches = [12.7, 11.6, 10.2, 8.6];
        var edge = Profile.Of(new(38, pitches, 4.8, ToothForm.Hook, 10, TipKind.Tipped), 4.8, 0, 120, 1.2);
        var steps = edge.Tips.Zip(edge.Tips.Skip(1), (a, b) => b.X - a.X).ToList();
        Assert.True(steps.Count > 8);
        // The first tip that has both flanks is the second one drawn.
        for (var i = 0; i < steps.Count; i++)
        {
            Assert.Equal(pitches[(i + 1) % 4], steps[i], 1e-9);
        }
    }

    [Theory]
    [InlineData(SetPattern.Alternate, new[] { false, true, false, true, false, true })]
    [InlineData(SetPattern.Raker, new[] { false, true, false, false, true, false })]
    [InlineData(SetPattern.None, new[] { false, false, false, false, false, false })]
    public void Teeth_lean_in_the_order_of_their_set(SetPattern pattern, bool[] away) =>
        Assert.Equal(away, Enumerable.Range(0, 6).Select(i => ToothMarks.IsAway(pattern, i)));

    [Theory]
    [InlineData(25, 8.4667, ToothForm.Hook, 3.38668, 10)]
    [InlineData(13, 6.35, ToothForm.Skip, 1.5875, 0)]
    [InlineData(6, 10, ToothForm.Regular, 1.2, 0)]
    public void What_the_specification_does_not_say_is_assumed_as_decided(double width, double pitch, ToothForm form, double depth, double hook)
    {
        // Engineering default: depth min(0.40 p, w/5), skip min(0.25 p, w/5); hook 10° for hook teeth, else 0.
        var spec = ToothSpec.Assumed(width, [pitch], form, TipKind.Set);
        Assert.Equal(depth, spec.Depth, 1e-9);
        Assert.Equal(hook, spec.Hook);
    }

    private static double Across(Point a, Point b) => a.X * b.X + a.Y * b.Y;
}
