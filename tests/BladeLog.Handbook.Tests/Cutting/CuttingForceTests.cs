using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using CsCheck;
using static BladeLog.Handbook.Tests.Cutting.Saws;

namespace BladeLog.Handbook.Tests.Cutting;

public sealed class CuttingForceTests
{
    public static TheoryData<double, double, double, double, string[]> Vectors => new()
    {
        // density, rake, moisture, edge radius; K, h_R, F_t, F_c, F_f, P, F_f/F_c, feed at 1500 W, feed at 70 N (independent program, cutting specification 4.8, T1 to T6);
        // one digit less at the dull edge's power limit: there a difference of near numbers magnifies the rounding of k_ρ to six digits eleven times
        { 520, 20, 12, 10, ["50.5802", "39.6209", "2.18768", "38.6061", "16.7665", "617.698", "0.434296", "8.34313", "71.9906"] },
        { 520, 0, 12, 10, ["73.6890", "26.6155", "2.61216", "46.0970", "41.0013", "737.552", "0.889457", "5.76249", "6.91010"] },
        { 520, 20, 12, 30, ["50.5802", "39.6209", "4.61553", "81.4505", "81.0331", "1303.21", "0.994875", "3.41479", "0.324261"] },
        { 705.6, 10, 12, 15, ["82.3174", "32.4991", "4.19643", "74.0546", "63.1098", "1184.87", "0.852206", "3.39206", "3.81750"] },
        { 705.6, 10, 60, 15, ["51.4484", "32.4991", "2.62277", "46.2841", "39.4436", "740.546", "0.852206", "7.36781", "14.8963"] },
        { 520, 20, 12, 40, ["50.5802", "39.6209", "5.82946", "102.873", "113.166", "1645.96", "1.10006", "0.95062", "0.307966"] },
    };

    [Theory, MemberData(nameof(Vectors))]
    public void The_shop_resaw_at_two_metres_a_minute(double density, double rake, double moisture, double edge, string[] printed)
    {
        CutCase c = A(edge, rake, density, moisture);
        Length bite = Kinematics.BitePerTooth(Feed(2), c.Pitch, c.BandSpeed);
        Force main = CuttingForce.Main(c, Feed(2)), thrust = CuttingForce.Thrust(c, Feed(2));
        Printed.Check(printed[0], CuttingForce.ShearFactor(c).Pascals / 1e6, "K");
        Printed.Check(printed[1], CuttingForce.ReferenceThickness(c.Rake).Micrometres, "h_R");
        Printed.Check(printed[2], CuttingForce.PerTooth(c, bite).Newtons, "F_t");
        Printed.Check(printed[3], main.Newtons, "F_c");
        Printed.Check(printed[4], thrust.Newtons, "F_f");
        Printed.Check(printed[5], CuttingForce.CuttingPower(c, Feed(2)).Watts, "P");
        Printed.Check(printed[6], thrust.Newtons / main.Newtons, "F_f/F_c");
        Printed.Check(printed[7], CuttingForce.FeedAtPower(c, new Power(1500)).MetresPerMinute, "feed at 1500 W");
        Printed.Check(printed[8], CuttingForce.FeedAtThrust(c, new Force(70))!.Value.MetresPerMinute, "feed at 70 N");
    }

    [Fact]
    public void A_dull_edge_below_the_least_chip_fades() // independent program, cutting specification 4.8, T7
    {
        CutCase c = A(40);
        Speed feed = Kinematics.FeedForBite(Length.FromMicrometres(4), c.Pitch, c.BandSpeed);
        Printed.Check("0.451765", feed.MetresPerMinute);
        Printed.Check("7.33", Bite.OverEdge(c, Length.FromMicrometres(4)).Micrometres);
        Printed.Check("4.66307", CuttingForce.PerTooth(c, Length.FromMicrometres(4)).Newtons);
        Printed.Check("82.2894", CuttingForce.Main(c, feed).Newtons);
        Printed.Check("102.685", CuttingForce.Thrust(c, feed).Newtons);
        Printed.Check("1316.63", CuttingForce.CuttingPower(c, feed).Watts);
    }

    [Theory] // independent program, cutting specification 4.8, mill B
    [InlineData(15, 10, "13.2517", "180.706", "75.8824", "4517.64")]
    [InlineData(40, 10, "17.3087", "236.028", "158.866", "5900.69")]
    [InlineData(15, 20, null, "332.367", "116.520", "8309.19")]
    public void The_narrow_mill_in_green_pine(double edge, double feed, string? perTooth, string main, string thrust, string power)
    {
        CutCase c = MillB(edge);
        Printed.Check("37.9155", CuttingForce.ShearFactor(c).Pascals / 1e6, "K");
        if (perTooth is not null)
        {
            Printed.Check("0.146667", Kinematics.BitePerTooth(Feed(feed), c.Pitch, c.BandSpeed).Millimetres, "c");
            Printed.Check(perTooth, CuttingForce.PerTooth(c, Kinematics.BitePerTooth(Feed(feed), c.Pitch, c.BandSpeed)).Newtons, "F_t");
        }

        Printed.Check(main, CuttingForce.Main(c, Feed(feed)).Newtons, "F_c");
        Printed.Check(thrust, CuttingForce.Thrust(c, Feed(feed)).Newtons, "F_f");
        Printed.Check(power, CuttingForce.CuttingPower(c, Feed(feed)).Watts, "P");
    }

    [Theory] // independent program, cutting specification 9
    [InlineData(10, "16.7665")]
    [InlineData(20, "48.8998")]
    [InlineData(30, "81.0331")]
    [InlineData(40, "113.166")]
    public void A_duller_blade_must_be_pushed_harder(double edge, string thrust) => Printed.Check(thrust, CuttingForce.Thrust(A(edge), Feed(2)).Newtons);

    [Theory] // cutting specification 4.4, after Loehnertz and Cooz: wet wood 1/1.6 of dry
    [InlineData(4, 1.125)]
    [InlineData(6, 1.125)]
    [InlineData(12, 1)]
    [InlineData(20, 0.8333333333)]
    [InlineData(30, 0.625)]
    [InlineData(80, 0.625)]
    public void Wetter_wood_cuts_easier_up_to_fibre_saturation(double moisture, double factor) =>
        Assert.Equal(factor, CuttingForce.ShearFactor(A(moisture: moisture)).Pascals / CuttingForce.ShearFactor(A()).Pascals, 1e-9);

    [Fact]
    public void Cross_cuts_frozen_wood_and_the_shops_own_factor_scale_the_force()
    {
        double rip = CuttingForce.Main(A(), Feed(2)).Newtons;
        Assert.Equal(0.7, CuttingForce.Main(A() with { Direction = CutDirection.Cross }, Feed(2)).Newtons / rip, 1e-12);
        Assert.Equal(1.3, CuttingForce.Main(A() with { Frozen = true }, Feed(2)).Newtons / rip, 1e-12);
        Assert.Equal(1.2, CuttingForce.Main(A() with { Model = CutModel.Default with { FitFactor = 1.2 } }, Feed(2)).Newtons / rip, 1e-12);
    }

    [Fact]
    public void No_feed_means_no_force()
    {
        Cases.Random.Sample(c =>
        {
            Assert.Equal(0, CuttingForce.Main(c, Feed(0)).Newtons);
            Assert.Equal(0, CuttingForce.Thrust(c, Feed(0)).Newtons);
            Assert.Equal(0, CuttingForce.FeedAtPower(c, new Power(0)).MetresPerSecond);
            Assert.Equal(0, CuttingForce.FeedAtThrust(c, new Force(0))!.Value.MetresPerSecond);
        });
    }

    [Fact]
    public void More_feed_means_more_force_without_a_jump_where_the_chip_begins()
    {
        Cases.Random.Sample(c =>
        {
            double f = Bite.NoChipFeed(c).MetresPerSecond;
            double below = CuttingForce.Main(c, new Speed(f * (1 - 1e-9))).Newtons, above = CuttingForce.Main(c, new Speed(f * (1 + 1e-9))).Newtons;
            Assert.Equal(1, above / below, 1e-6);
            Assert.True(CuttingForce.Main(c, new Speed(0.5 * f)).Newtons < below && above < CuttingForce.Main(c, new Speed(2 * f)).Newtons);
        });
    }

    [Fact]
    public void A_mean_over_lanes_is_the_sum_over_lanes()
    {
        // Alternate set, lane by lane: the middle strip is cut with bite c by every tooth, the outer strips with 2c by every second one.
        CutCase c = A();
        double K = CuttingForce.ShearFactor(c).Pascals, h_R = CuttingForce.ReferenceThickness(c.Rake).Metres;
        double t = 0.6e-3, s = 0.25e-3, b = 17.7083333e-6;
        double oneTooth = K * ((t - 2 * s) * (b + h_R) + 2 * s * (2 * b + h_R));
        Assert.Equal(oneTooth, CuttingForce.PerTooth(c, new Length(b)).Newtons, 1e-9);
    }

    [Fact]
    public void Chips_thrown_cost_little_and_count_in_the_motor()
    {
        // Independent program: 0.704 W on saw A (a wood of 500 kg/m³); under 2 % of the cut even at 40 m/s.
        Printed.Check("0.704", CuttingForce.ChipPower(A(density: 500), Feed(2)).Watts);
        CutCase fast = A() with { BandSpeed = new Speed(40) };
        Assert.True(CuttingForce.ChipPower(fast, Feed(30)).Watts < 0.02 * CuttingForce.CuttingPower(fast, Feed(30)).Watts);
        double P = CuttingForce.CuttingPower(A(), Feed(2)).Watts, chips = CuttingForce.ChipPower(A(), Feed(2)).Watts;
        Assert.Equal(150 + (P + chips) / 0.85, CuttingForce.MotorLoad(A(), Feed(2), new Power(150)).Watts, 1e-9);
    }

    [Fact]
    public void Energy_per_volume_of_the_first_vector() => // independent program, cutting specification 4.8
        Printed.Check("112.309", CuttingForce.CuttingPower(A(), Feed(2)).Watts / Kinematics.KerfVolumeRate(Feed(2), Mm(150), Mm(1.1)) / 1e6);

    [Fact]
    public void An_ammeter_reading_of_the_model_itself_gives_a_factor_of_one()
    {
        Power model = CuttingForce.CuttingPower(A(), Feed(2));
        Assert.Equal(1.25, CuttingForce.FitFactorFrom(new Power(150 + 1.25 * model.Watts / 0.85), new Power(150), model), 1e-12);
        Assert.Throws<ArgumentOutOfRangeException>(() => CuttingForce.FitFactorFrom(new Power(100), new Power(150), model));
    }

    [Theory] // by hand: 4,000 W at the shaft over 0.85 and over √3 times 400 V times 0.82 is 8.2834 A; one phase at 230 V
    [InlineData(8.2833, 400, 0.82, true, 4000 / 0.85)]
    [InlineData(10, 230, 1, false, 2300)]
    [InlineData(10, 230, 0.8, false, 1840)]
    public void A_current_tells_the_power_a_motor_takes(double amperes, double volts, double factor, bool three, double watts)
    {
        Assert.Equal(watts, CuttingForce.FromCurrent(amperes, volts, factor, three).Watts, 1e-3 * watts);
        Assert.Throws<ArgumentOutOfRangeException>(() => CuttingForce.FromCurrent(amperes, volts, 1.1, three));
        Assert.Throws<ArgumentOutOfRangeException>(() => CuttingForce.FromCurrent(0, volts, factor, three));
    }
}
