using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;
using CsCheck;

namespace BladeLog.Handbook.Tests.Band;

public class TensionTests
{
    private static readonly Steel Carbon = Steel.Carbon;

    private static Length Mm(double mm) => Length.FromMillimetres(mm);

    private static Stress Mpa(double mpa) => Stress.FromMegapascals(mpa);

    // Independent program, band-life specification, section 1.3.
    [Fact]
    public void The_wheel_load_is_shared_by_two_strands() =>
        Printed.Significant(100.028, Tension.FromWheelLoad(new Force(1434), Mm(0.64), Mm(11.2)).Megapascals);

    [Fact]
    public void One_strand_with_half_the_wheel_load_has_the_same_tension()
    {
        Stress one = Tension.FromStrandForce(new Force(717), Mm(0.64), Mm(11.2));
        Printed.Significant(100.028, one.Megapascals);
        Assert.Equal(717, Tension.StrandForce(one, Mm(0.64), Mm(11.2)).Newtons, 9);
    }

    // Independent program, band-life specification, section 1.3.
    [Fact]
    public void An_eighth_of_a_millimetre_on_250_is_about_100_MPa() =>
        Printed.Significant(103.500, Tension.FromStretch(Mm(0.125), Mm(250), Carbon.YoungsModulus).Megapascals);

    // Independent program, band-life specification, section 1.3.
    [Fact]
    public void The_travel_of_the_wheel_stretches_both_strands() =>
        Printed.Significant(105.254, Tension.FromWheelTravel(Mm(0.6), Mm(2360), Carbon.YoungsModulus).Megapascals);

    // Independent program, band-life specification, section 1.4.
    [Theory]
    [InlineData(12, 1.13040)]
    [InlineData(15, 1.76625)]
    [InlineData(24, 4.52160)]
    [InlineData(30, 7.06500)]
    [InlineData(45, 15.8963)]
    public void Speed_adds_its_part_on_a_sprung_saw_and_nothing_on_a_locked_one(double v, double added)
    {
        Stress sprung = Tension.Running(Mpa(100), Tension.Support(TensionSystem.Sprung), Carbon.Density, new Speed(v));
        Printed.Significant(added, sprung.Megapascals - 100);
        Stress locked = Tension.Running(Mpa(100), Tension.Support(TensionSystem.Locked), Carbon.Density, new Speed(v));
        Assert.Equal(100, locked.Megapascals, 9);
    }

    // Independent program, band-life specification, section 1.4.
    [Theory]
    [InlineData(50, 0.980506)]
    [InlineData(500, 0.834156)]
    [InlineData(5000, 0.334653)]
    public void A_stiffer_wheel_mount_gives_the_span_less_of_the_speed(double newtonsPerMillimetre, double eta) =>
        Printed.Significant(eta, Tension.Support(new Stiffness(newtonsPerMillimetre * 1e3), Mm(2360), Mm(0.64), Mm(11.2), Carbon.YoungsModulus));

    // Independent program, band-life specification, section 1.3.
    [Fact]
    public void The_note_of_a_plucked_span()
    {
        Printed.Significant(125.623, Pluck.PinnedNote(Mpa(100), Mm(450), Mm(0.64), Carbon, 1).Hertz);
        Printed.Significant(130.483, Pluck.ClampedNote(Mpa(100), Mm(450), Mm(0.64), Carbon, 1).Hertz);
    }

    // Independent program, band-life specification, section 1.3.
    [Fact]
    public void The_tension_heard_in_a_note_of_120_hertz()
    {
        double m = Pluck.MassRatio(Mm(11.2), Mm(1.8));
        Frequency note = new(120);
        Printed.Significant(1.08036, m);
        Printed.Significant(91.2180, Pluck.PinnedTension(note, Mm(450), Mm(0.64), Carbon, 1).Megapascals);
        Printed.Significant(98.5757, Pluck.PinnedTension(note, Mm(450), Mm(0.64), Carbon, m).Megapascals);
        Printed.Significant(91.0038, Pluck.ClampedTension(note, Mm(450), Mm(0.64), Carbon, m).Megapascals);
    }

    [Fact]
    public void The_reading_of_a_plucked_span_lies_between_pinned_and_clamped_ends()
    {
        Frequency note = new(120);
        Stress reading = Tension.FromPluck(note, Mm(450), Mm(0.64), Mm(11.2), Mm(1.8), Carbon);
        Assert.InRange(reading.Megapascals, 91.0038, 98.5757);
        // Engineering default: 4 of 100 under the pinned 98.5757.
        Printed.Significant(0.96 * 98.5757, reading.Megapascals, 5);
        TensionReading band = TensionReading.Of(reading, TensionMethod.Pluck);
        Assert.InRange(91.0038, band.Low.Megapascals, band.High.Megapascals);
        Assert.InRange(98.5757, band.Low.Megapascals, band.High.Megapascals);
    }

    [Fact]
    public void Note_and_tension_undo_each_other() =>
        Gen.Select(Gen.Double[20, 300], Gen.Double[200, 1200], Gen.Double[0.4, 1.0], Gen.Double[1, 1.2]).Sample((sigma, l, t, m) =>
        {
            Frequency pinned = Pluck.PinnedNote(Mpa(sigma), Mm(l), Mm(t), Carbon, m);
            Frequency clamped = Pluck.ClampedNote(Mpa(sigma), Mm(l), Mm(t), Carbon, m);
            Assert.Equal(sigma, Pluck.PinnedTension(pinned, Mm(l), Mm(t), Carbon, m).Megapascals, 1e-6);
            Assert.Equal(sigma, Pluck.ClampedTension(clamped, Mm(l), Mm(t), Carbon, m).Megapascals, 1e-6);
        });

    [Theory]
    [InlineData(120, 149, 0.6)]
    [InlineData(120, 190, 1.0)]
    [InlineData(2, 450, 0.64)]
    [InlineData(0, 450, 0.64)]
    public void A_span_too_short_or_a_note_too_low_is_refused(double hertz, double span, double thickness) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Tension.FromPluck(new Frequency(hertz), Mm(span), Mm(thickness), Mm(11.2), Mm(1.8), Carbon));

    // Engineering default.
    [Fact]
    public void A_gauge_reading_is_trusted_to_a_fifth()
    {
        TensionReading reading = TensionReading.Of(Mpa(100), TensionMethod.WheelLoad);
        Assert.Equal(80, reading.Low.Megapascals, 9);
        Assert.Equal(120, reading.High.Megapascals, 9);
    }
}
