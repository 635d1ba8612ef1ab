using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tables;

namespace BladeLog.Handbook.Tests.Tables;

public sealed class CutLimitsTests
{
    [Theory] // advice specification 5: the smallest that applies
    [InlineData(true, false, 10, false, false, 0.40)]
    [InlineData(true, false, 10, false, true, 0.50)]
    [InlineData(true, false, 60, false, false, 0.60)]
    [InlineData(true, false, 60, false, true, 0.60)]
    [InlineData(false, false, 60, false, true, 0.65)]
    [InlineData(true, true, 9, false, false, 0.40)]
    [InlineData(true, true, 9, false, true, 0.45)]
    [InlineData(true, true, 60, false, true, 0.45)]
    [InlineData(false, false, 60, true, true, 0.40)]
    [InlineData(true, true, 10, true, true, 0.40)]
    [InlineData(false, false, 20, false, false, 0.65)]
    [InlineData(false, false, 19.9, false, false, 0.40)]
    public void The_smallest_fill_that_applies(bool hardwood, bool stringy, double moisture, bool frozen, bool feeder, double fill) =>
        Assert.Equal(fill, CutLimits.FillFor(hardwood, stringy, moisture, frozen, feeder).Value);

    [Fact]
    public void Every_fill_lies_inside_what_was_published()
    {
        // Trade note on gullet capacity: 0.50 to 0.75 usable; loose dust fills it at 0.33 to 0.40, so nothing under 0.33 is asked for.
        Assert.All(CutLimits.Fills.Values, f => Assert.InRange(f.Value, 0.33, 0.75));
        Assert.Equal(0.75, CutLimits.AmberFill.Value);
    }

    [Theory] // common practice: three teeth; 12 mm plywood at 6 teeth an inch has 2.83, two sheets stacked 5.67
    [InlineData(12, 25.4 / 6, false)]
    [InlineData(24, 25.4 / 6, true)]
    [InlineData(6, 25.4 / 14, true)]
    [InlineData(12.4, 25.4 / 6, false)]
    [InlineData(12.5, 25.4 / 6, true)]
    public void Three_teeth_in_the_cut(double height, double pitch, bool enough) =>
        Assert.Equal(enough, CutLimits.EnoughTeeth(Length.FromMillimetres(height), Length.FromMillimetres(pitch)));

    [Fact]
    public void Plywood_on_six_teeth_an_inch_counts_as_the_worked_example()
    {
        Cutting.Printed.Check("2.83", Handbook.Cutting.Kinematics.TeethInCut(Length.FromMillimetres(12), Length.FromMillimetres(25.4 / 6)));
        Cutting.Printed.Check("5.67", Handbook.Cutting.Kinematics.TeethInCut(Length.FromMillimetres(24), Length.FromMillimetres(25.4 / 6)));
    }

    [Theory]
    [InlineData(Finish.Fine, 30, 0.03)]
    [InlineData(Finish.Medium, 30, 0.10)]
    [InlineData(Finish.Rough, 40, null)]
    public void Edge_and_bite_by_finish(Finish finish, double edge, double? bite)
    {
        Assert.Equal(edge, CutLimits.EdgeLimit(finish).Micrometres, 1e-9);
        Assert.Equal(bite is null, CutLimits.FinishBite(finish) is null);
        if (bite is { } mm)
        {
            Assert.Equal(mm, CutLimits.FinishBite(finish)!.Value.Millimetres, 1e-12);
        }
    }

    [Fact]
    public void Push_limits_are_the_published_guideline_figures() // HSE L23: to keep a load moving, 70 N women, 100 N men
    {
        Assert.Equal((70, 100), (CutLimits.PushGreen.Value, CutLimits.PushAmber.Value));
        Assert.Equal(Provenance.Published, CutLimits.PushGreen.Provenance);
    }

    [Fact]
    public void Push_to_start_a_load_is_the_published_guideline() // HSE L23: to start or stop a load, 150 N women, 200 N men
    {
        Assert.Equal((150, 200), (CutLimits.PushToStartGreen.Value, CutLimits.PushToStartAmber.Value));
        Assert.All([CutLimits.PushToStartGreen, CutLimits.PushToStartAmber], l => Assert.Equal((Provenance.Published, "hse-l23"), (l.Provenance, l.SourceKey)));
    }
}
