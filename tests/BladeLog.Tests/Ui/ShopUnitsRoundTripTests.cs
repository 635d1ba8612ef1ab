using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using CsCheck;

namespace BladeLog.Tests.Ui;

/// <summary>What a form field shows, sent again, gives the same within the digits shown.</summary>
public class ShopUnitsRoundTripTests
{
    private static readonly Gen<ShopUnits> _shop = Gen.OneOf(new ShopUnits().Typing, new ShopUnits { Units = UnitSystem.Inch }.Typing);

    private static void Same<T>(Parsed<T> read, double was, Func<T, double> si, double slack)
    {
        Assert.True(read.IsGood, read.Problem);
        Assert.InRange(si(read.Value), was - slack, was + slack);
    }

    [Fact]
    public void Lengths_of_every_field_come_back()
    {
        TypedField[] fields = [Fields.BladeWidth, Fields.Thickness, Fields.Loop, Fields.Board, Fields.CutHeight, Fields.Kerf, Fields.EdgeRadius, Fields.CrackLength, Fields.GulletDepth];
        // Slack: half a tenth of a mm, or a 64th's share of the same size; fine fields half of the last thousandth shown.
        Gen.Select(_shop, Gen.OneOf(fields), Gen.Double[0, 1]).Sample((shop, field, share) =>
        {
            var metres = field.Least + (share * share * (field.Most - field.Least));
            var slack = field.Bare == "um" ? 0.051e-6 : field.Thousandths && (shop.Units == UnitSystem.Inch || metres < 0.0099) ? 0.0127e-3 : 0.0501e-3;
            Same(shop.ReadLength(shop.Show(new Length(metres), field), field with { Least = field.Least - slack, Most = field.Most + slack }), metres, l => l.Metres, slack);
        });
    }

    [Fact]
    public void Pitches_come_back()
        => Gen.Select(_shop, Gen.Double[0.8e-3, 0.15], Gen.Double[0.3, 1]).Sample((shop, coarse, share) =>
        {
            var p = new ToothPitch(new Length(coarse), new Length(Math.Max(0.6e-3, coarse * share)));
            var read = shop.ReadPitch(shop.Show(p));
            // Teeth per inch are shown to three digits or to the tenth they are within 0.2 % of.
            var slack = shop.Units == UnitSystem.Inch ? (0.0021 * coarse) + (0.0006 * coarse * coarse / 0.0254) : 0.6e-6;
            Same(read, p.Coarse.Metres, x => x.Coarse.Metres, slack);
            Same(read, p.Fine.Metres, x => x.Fine.Metres, slack);
        });

    [Fact]
    public void Stresses_forces_speeds_and_the_rest_come_back()
        => Gen.Select(_shop, Gen.Double[0, 1]).Sample((shop, share) =>
        {
            Same(shop.ReadStress(shop.Show(new Stress(share * 5e8))), share * 5e8, x => x.Pascals, 0.0501e6);
            Same(shop.ReadForce(shop.Show(new Force(share * 5e4))), share * 5e4, x => x.Newtons, 0.501);
            var band = 1 + (share * 60);
            Same(shop.ReadBandSpeed(shop.ShowBandSpeed(new Speed(band))), band, x => x.MetresPerSecond, 0.00501);
            var feed = 0.001 + (share * 2);
            Same(shop.ReadFeed(shop.ShowFeed(new Speed(feed))), feed, x => x.MetresPerSecond, 0.0003);
            var power = 100 + (share * 1e5);
            Same(shop.ReadPower(shop.Show(new Power(power))), power, x => x.Watts, 5.01);
            var density = 100 + (share * 1200);
            Same(shop.ReadDensity(shop.Show(new Density(density))), density, x => x.KilogramsPerCubicMetre, 0.81);
            Same(shop.ReadAngle(shop.Show(new Angle(share - 0.5))), share - 0.5, x => x.Radians, 0.0009);
            Same(shop.ReadPercent(shop.ShowPercent(share * 100)), share * 100, x => x, 0.0501);
            Same(shop.ReadRevolutions(shop.ShowRevolutions(10 + (share * 5000))), 10 + (share * 5000), x => x, 0.0501);
        });

    [Fact]
    public void Durations_come_back_to_the_minute_and_meters_to_the_hundredth()
        => Gen.Long[0, 9_000L * 3_600_000].Sample(ms =>
        {
            var shop = new ShopUnits().Typing;
            var time = TimeSpan.FromMilliseconds(ms);
            Same(shop.ReadDuration(shop.Show(time)), time.TotalSeconds, x => x.TotalSeconds, 30.01);
            Same(shop.ReadDuration(shop.Show(time, Fields.HourMeter), Fields.HourMeter), time.TotalSeconds, x => x.TotalSeconds, 18.01);
        });

    [Fact]
    public void Money_comes_back_to_the_last_minor_unit()
        => Gen.Select(Gen.Int[0, 4], Gen.Long[0, 10_000_000_000_000], Gen.OneOf("", "EUR", "kr")).Sample((digits, minor, currency) =>
        {
            var shop = new ShopUnits { CurrencyDigits = digits, Currency = currency };
            Assert.Equal(minor, shop.ReadMoney(shop.ShowMoney(minor)).Value);
        });

    [Fact]
    public void Times_come_back_to_the_minute_through_both_changes_of_the_clock()
        => Gen.Select(Gen.OneOf("Europe/Berlin", "America/New_York", "Australia/Lord_Howe"), Gen.Int[0, 366 * 24 * 60]).Sample((zone, minutes) =>
        {
            var shop = new ShopUnits { Zone = TimeZoneInfo.FindSystemTimeZoneById(zone) };
            var utc = new DateTime(2026, 1, 1, 0, 0, 0, DateTimeKind.Utc).AddMinutes(minutes);
            Assert.Equal(utc, shop.ReadTime(shop.ShowTime(utc), utc).Utc);
        });

    [Fact]
    public void No_text_whatever_throws()
        => Gen.Select(_shop, Gen.String[Gen.Char["0123456789.,-/'\" xetpimngbwho:°%"], 0, 14]).Sample((shop, text) =>
        {
            var now = new DateTime(2026, 4, 15, 12, 0, 0, DateTimeKind.Utc);
            string?[] problems =
            [
                shop.ReadLength(text, Fields.Thickness).Problem, shop.ReadLength(text, Fields.Loop).Problem, shop.ReadPitch(text).Problem,
                shop.ReadBladePrint(text).Problem, shop.ReadDuration(text).Problem, shop.ReadMoney(text).Problem, shop.ReadCount(text).Problem,
                shop.ReadAngle(text).Problem, shop.ReadStress(text).Problem, shop.ReadTime(text, now).Problem,
            ];
            Assert.All(problems, p => Assert.True(p is null || (p.EndsWith('.') && p.Length > 10)));
        }, iter: 20_000);
}
