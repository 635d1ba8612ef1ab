using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using CsCheck;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>Which modes of the band the teeth may swing up (band stability specification 6).</summary>
public class WashboardTests
{
    // 25 x 0.9, 100 MPa, span 300 at 20 m/s: first sideways mode 183.678 Hz, first twist 503.902 Hz (independent program, table B, A12).
    private static readonly GuidedBand A12 = Guided(25, 0.9, 5, 100, 300, 150, 150) with { BandSpeed = new Speed(20) };

    [Theory]
    [InlineData(1.02, true)]
    [InlineData(1.049, true)]
    [InlineData(1.051, false)]
    [InlineData(0.99, false)]
    public void A_mode_is_named_when_the_teeth_pass_a_little_faster_than_it_swings(double ratio, bool named)
    {
        var pitch = new Length(20 / (503.902 * ratio));
        WashboardMode? twist = Washboard.Possible(A12, pitch).SingleOrDefault(m => m.Twisting && m.Mode == 1);
        Assert.Equal(named, twist is not null);
        if (twist is not null)
        {
            Assert.Equal(503.902, twist.Frequency.Hertz, 1e-3);
            Assert.Equal(ratio - 1, twist.Above, 1e-5);
        }
    }

    [Fact]
    public void The_nearest_mode_comes_first_and_every_one_lies_just_below_the_teeth() =>
        Gen.Double[4e-3, 40e-3].Sample(p =>
        {
            double f_t = Washboard.ToothPassing(A12.BandSpeed, new Length(p)).Hertz;
            IReadOnlyList<WashboardMode> modes = Washboard.Possible(A12, new Length(p));
            Assert.All(modes, m => Assert.True(f_t > m.Frequency.Hertz && f_t < 1.05 * m.Frequency.Hertz && m.Mode is >= 1 and <= 8));
            Assert.Equal(modes.OrderBy(m => m.Above), modes);
        });

    // Teeth slower than the first mode or far above the eighth twist cannot swing any.
    [Fact]
    public void Coarse_slow_teeth_name_no_mode()
    {
        Assert.Empty(Washboard.Possible(A12, Length.FromMillimetres(20 * 1000 / 150.0)));
        Assert.Empty(Washboard.Possible(A12, Length.FromMillimetres(0.5)));
    }

    // A tooth row swinging at f_b, sampled tooth by tooth: the phase steps by 2π f_b/f_t, so the pattern repeats after |1/(1 − f_b/f_t)| bites.
    [Fact]
    public void The_pattern_on_the_board()
    {
        Assert.Equal(20 / 500.0, Washboard.AlongBand(new Speed(20), new Frequency(500)).Metres, 1e-12);
        Frequency teeth = new(525), swing = new(500);
        double along = Washboard.AlongFeed(Length.FromMillimetres(0.1), swing, teeth).Millimetres;
        Assert.Equal(2.1, along, 1e-9);
        double bites = along / 0.1;
        Assert.Equal(0, Math.Sin(2 * Math.PI * swing.Hertz / teeth.Hertz * bites), 1e-9);
        Assert.Equal(double.PositiveInfinity, Washboard.AlongFeed(Length.FromMillimetres(0.1), teeth, teeth).Metres);
    }

    [Fact]
    public void Impossible_numbers_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Washboard.Possible(A12 with { BandSpeed = default }, new Length(0.01)));
        Assert.Throws<ArgumentOutOfRangeException>(() => Washboard.ToothPassing(new Speed(1), default));
        Assert.Throws<ArgumentOutOfRangeException>(() => Washboard.AlongBand(new Speed(1), default));
        Assert.Throws<ArgumentOutOfRangeException>(() => Washboard.AlongFeed(default, new Frequency(1), new Frequency(2)));
    }
}
