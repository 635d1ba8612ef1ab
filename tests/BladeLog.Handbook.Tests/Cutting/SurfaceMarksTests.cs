using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tests.Cutting;

public class SurfaceMarksTests
{
    // Geometry: of n teeth in the pattern one reaches a given face. Worked case A bites 17.7083 µm and leaves 35.4167 µm on an outer lane.
    [Theory]
    [InlineData(SetPattern.None, 17.7083)]
    [InlineData(SetPattern.Alternate, 35.4167)]
    [InlineData(SetPattern.Raker, 53.125)]
    public void The_marks_on_a_face_follow_the_pattern_of_the_set(SetPattern pattern, double expected_um)
    {
        Length bite = Kinematics.BitePerTooth(Speed.FromMetresPerMinute(2), Length.FromMillimetres(8.5), new Speed(16));
        Assert.Equal(expected_um, SurfaceMarks.Spacing(bite, pattern).Micrometres, 0.001);
    }

    [Fact]
    public void A_hand_fed_cut_shows_no_ripples_and_a_fast_mill_does()
    {
        Assert.False(SurfaceMarks.Seen(SurfaceMarks.Spacing(Length.FromMicrometres(18), SetPattern.Alternate)));
        Assert.True(SurfaceMarks.Seen(SurfaceMarks.Spacing(Length.FromMicrometres(293), SetPattern.Alternate)));
    }

    [Fact]
    public void A_bite_below_nothing_is_refused() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => SurfaceMarks.Spacing(new Length(-1e-6), SetPattern.Alternate));
}
