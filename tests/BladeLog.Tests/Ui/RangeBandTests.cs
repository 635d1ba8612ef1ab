using AngleSharp.Dom;
using BladeLog.Ui.Pictures;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Tests.Ui;

public sealed class RangeBandTests
{
    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void The_hatch_runs_from_the_low_end_to_the_high_one_and_nothing_is_used_for_certain(bool compact)
    {
        AxisPicture picture = RangeBandGeometry.Of(0.2, 0.6, 0.39, compact);
        Bar hatched = Assert.Single(picture.Marks.OfType<Bar>(), b => b.Css == "hatched");
        Assert.Equal(20, hatched.X, 9);
        Assert.Equal(40, hatched.Width, 9);
        Assert.DoesNotContain(picture.Marks.OfType<Bar>(), b => b.Css == "used");
    }

    [Fact]
    public void A_range_past_the_median_stops_at_the_frame()
    {
        Bar hatched = Assert.Single(RangeBandGeometry.Of(0.9, 3, 0.39, true).Marks.OfType<Bar>(), b => b.Css == "hatched");
        Assert.Equal(100, hatched.X + hatched.Width, 9);
    }

    [Fact]
    public void A_range_turned_round_is_refused() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => RangeBandGeometry.Of(0.6, 0.2, 0.39, true));

    [Fact]
    public void It_says_itself_in_words()
    {
        IElement picture = Rendered.Root(Rendered.Html<RangeBand>(("Low", 0.2), ("High", 0.6), ("OneInTen", 0.39)));
        Assert.Contains("used 0.2 to 0.6", picture.GetAttribute("aria-label"), StringComparison.Ordinal);
    }
}
