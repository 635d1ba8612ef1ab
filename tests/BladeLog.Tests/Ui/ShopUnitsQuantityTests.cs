using BladeLog.Ui;

namespace BladeLog.Tests.Ui;

/// <remarks>
/// Exact by definition: foot 0.3048 m and pound 0.45359237 kg (1959 agreement), standard gravity 9.80665 m/s².
/// psi = 0.45359237 x 9.80665 / 0.0254² = 6894.757293 Pa; lbf = 4.4482216152605 N; hp = 550 ft lbf/s = 745.69987158 W;
/// PS = 75 kgf m/s = 735.49875 W; lb/ft3 = 16.01846337 kg/m³.
/// </remarks>
public class ShopUnitsQuantityTests
{
    private static readonly ShopUnits _metric = new();
    private static readonly ShopUnits _inch = new() { Units = UnitSystem.Inch };

    public static TheoryData<string, string, double> Quantities => new()
    {
        { "stress", "103.4 MPa", 103.4e6 }, { "stress", "103,4 mpa", 103.4e6 }, { "stress", "103.4 N/mm2", 103.4e6 }, { "stress", "103.4 N/mm²", 103.4e6 },
        { "stress", "15,000 psi", 103421359.4 }, { "stress", "15000psi", 103421359.4 }, { "stress", "15 000 psi", 103421359.4 }, { "stress", "15 ksi", 103421359.4 }, { "stress", "15 kpsi", 103421359.4 },
        { "stress", "15.0 KSI", 103421359.4 }, { "stress", "1034 bar", 103.4e6 }, { "stress", "15000 lb/in2", 103421359.4 }, { "stress", "0.1 GPa", 1e8 },
        { "force", "1400 N", 1400 }, { "force", "1,400 N", 1400 }, { "force", "1.4 kN", 1400 }, { "force", "1,4 kN", 1400 }, { "force", "312.5 lbf", 1390.0692547689 }, { "force", "312.5 lb", 1390.0692547689 },
        { "force", "312,5 lbs", 1390.0692547689 }, { "force", "100 kgf", 980.665 }, { "force", "100 kg", 980.665 }, { "force", "140 daN", 1400 },
        { "band", "25.4 m/s", 25.4 }, { "band", "5000 fpm", 25.4 }, { "band", "5,000 fpm", 25.4 }, { "band", "5000 ft/min", 25.4 }, { "band", "5000 sfpm", 25.4 }, { "band", "5000 feet per minute", 25.4 }, { "band", "1524 m/min", 25.4 }, { "band", "15,2 m/s", 15.2 },
        { "feed", "3 m/min", 0.05 }, { "feed", "50 mm/s", 0.05 }, { "feed", "0.05 m/s", 0.05 }, { "feed", "10 fpm", 0.0508 }, { "feed", "10 ft/min", 0.0508 }, { "feed", "120 in/min", 0.0508 }, { "feed", "120 ipm", 0.0508 }, { "feed", "2,5 m/min", 0.0416666667 },
        { "power", "2.2 kW", 2200 }, { "power", "2,2 kw", 2200 }, { "power", "2200 W", 2200 }, { "power", "2,200 W", 2200 }, { "power", "3 hp", 2237.099615 }, { "power", "3HP", 2237.099615 }, { "power", "3 PS", 2206.49625 }, { "power", "1 1/2 hp", 1118.549807 },
        { "density", "650 kg/m3", 650 }, { "density", "650 kg/m³", 650 }, { "density", "650 kg/m^3", 650 }, { "density", "0.65 g/cm3", 650 }, { "density", "0,65 g/cm³", 650 }, { "density", "40 lb/ft3", 640.7385348 }, { "density", "1,050 kg/m3", 1050 },
        { "angle", "10", 0.1745329252 }, { "angle", "10°", 0.1745329252 }, { "angle", "10 deg", 0.1745329252 }, { "angle", "10 degrees", 0.1745329252 }, { "angle", "0.1745329252 rad", 0.1745329252 }, { "angle", "-5°", -0.0872664626 }, { "angle", "10°30'", 0.1832595715 }, { "angle", "10,5", 0.1832595715 }, { "angle", "-10°30'", -0.1832595715 },
        { "percent", "12", 12 }, { "percent", "12%", 12 }, { "percent", "12 %", 12 }, { "percent", "12,5 %", 12.5 }, { "percent", "12 percent", 12 },
        { "moisture", "80 % mc", 80 }, { "moisture", "120", 120 }, { "rpm", "1000 rpm", 1000 }, { "rpm", "1,000", 1000 }, { "rpm", "1420 1/min", 1420 },
        { "count", "1,200", 1200 }, { "count", "1 200", 1200 }, { "count", "12", 12 }, { "count", "12 pcs", 12 }, { "count", "0", 0 }, { "count", "3 pieces", 3 }, { "count", "12.0", 12 },
        { "hours", "1.5", 5400 }, { "hours", "1,5", 5400 }, { "hours", "1h30", 5400 }, { "hours", "1h30m", 5400 }, { "hours", "1:30", 5400 }, { "hours", "1:30:15", 5415 }, { "hours", "01:30", 5400 }, { "hours", "90 min", 5400 }, { "hours", "90min", 5400 },
        { "hours", "2 h 5 m", 7500 }, { "hours", "2h5", 7500 }, { "hours", "2 hrs 5 mins", 7500 }, { "hours", "1.5 h", 5400 }, { "hours", "1 1/2 h", 5400 }, { "hours", "1½ hours", 5400 }, { "hours", "45 m", 2700 }, { "hours", "30 s", 30 }, { "hours", "1 day 2 h", 93600 }, { "hours", "1,250", 4500 },
        { "meter", "1,234.5", 4444200 }, { "meter", "1,234", 4442400 }, { "meter", "1234,5 h", 4444200 }, { "meter", "1234.5", 4444200 }, { "minutes", "20", 1200 }, { "minutes", "1:30", 5400 }, { "seconds", "12", 12 },
        { "money", "46", 4600 }, { "money", "46.00", 4600 }, { "money", "46,00", 4600 }, { "money", "46.5", 4650 }, { "money", "1,200.50", 120050 }, { "money", "1.200,50", 120050 }, { "money", "1 200,50", 120050 }, { "money", "1,200", 120000 }, { "money", ".50", 50 }, { "money", "0", 0 }, { "money", "1,234,567.89", 123456789 }, { "money", "0.07", 7 },
    };

    private static (bool Good, double Si, string? Problem, string? Shown) Read(ShopUnits u, string what, string? text)
    {
        static (bool, double, string?, string?) R<T>(Parsed<T> p, Func<T, double> si) => (p.IsGood, p.IsGood ? si(p.Value) : 0, p.Problem, p.Understood);
        return what switch
        {
            "stress" => R(u.ReadStress(text), x => x.Pascals),
            "force" => R(u.ReadForce(text), x => x.Newtons),
            "band" => R(u.ReadBandSpeed(text), x => x.MetresPerSecond),
            "feed" => R(u.ReadFeed(text), x => x.MetresPerSecond),
            "power" => R(u.ReadPower(text), x => x.Watts),
            "density" => R(u.ReadDensity(text), x => x.KilogramsPerCubicMetre),
            "angle" => R(u.ReadAngle(text), x => x.Radians),
            "percent" => R(u.ReadPercent(text), x => x),
            "moisture" => R(u.ReadMoisture(text), x => x),
            "rpm" => R(u.ReadRevolutions(text), x => x),
            "count" => R(u.ReadCount(text), x => x),
            "hours" => R(u.ReadDuration(text), x => x.TotalSeconds),
            "meter" => R(u.ReadDuration(text, Fields.HourMeter), x => x.TotalSeconds),
            "minutes" => R(u.ReadDuration(text, Fields.Minutes), x => x.TotalSeconds),
            "seconds" => R(u.ReadDuration(text, Fields.Seconds), x => x.TotalSeconds),
            "money" => R(u.ReadMoney(text), x => x),
            _ => throw new ArgumentException(what),
        };
    }

    [Theory]
    [MemberData(nameof(Quantities))]
    public void A_quantity_that_names_its_unit_is_the_same_in_every_shop(string what, string text, double si)
    {
        foreach (var shop in new[] { _metric, _inch })
        {
            var (good, value, problem, shown) = Read(shop, what, text);
            Assert.True(good, problem);
            Assert.Equal(si, value, Math.Abs(si) * 1e-9);
            Assert.False(string.IsNullOrEmpty(shown));
        }
    }

    [Theory]
    [InlineData("stress", "120", 120e6, 120 * 6894.757293)]
    [InlineData("force", "100", 100, 444.82216152605)]
    [InlineData("band", "15", 15, 15 * 0.00508)]
    [InlineData("feed", "3", 0.05, 3 * 0.00508)]
    [InlineData("power", "3", 3000, 2237.099615)]
    [InlineData("density", "60", 60, 60 * 16.01846337)]
    public void A_bare_number_is_in_the_unit_of_the_shop(string what, string text, double metric, double inch)
    {
        Assert.Equal(metric, Read(_metric, what, text).Si, metric * 1e-9);
        // 15 ft/min is no band speed, so the refusal is the right answer there.
        if (what == "band")
            Assert.Equal("\"15\" cannot be right. A band speed lies between 20\u00A0ft/min and 19,685\u00A0ft/min.", Read(_inch, what, text).Problem);
        else
            Assert.Equal(inch, Read(_inch, what, text).Si, inch * 1e-9);
    }

    [Fact]
    public void More_than_two_hundred_spellings_are_tried()
        => Assert.True(Quantities.Count + ShopUnitsLengthTests.Lengths.Count + ShopUnitsPitchTests.Pitches.Count + ShopUnitsPitchTests.Prints.Count >= 200);

    [Theory]
    [InlineData("stress", "-1 MPa")]
    [InlineData("stress", "NaN")]
    [InlineData("force", "1e999")]
    [InlineData("band", "0")]
    [InlineData("band", "500 m/s")]
    [InlineData("feed", "0 m/min")]
    [InlineData("power", "-2 kW")]
    [InlineData("density", "0.65")]
    [InlineData("angle", "900")]
    [InlineData("percent", "101 %")]
    [InlineData("moisture", "400")]
    [InlineData("rpm", "0")]
    [InlineData("count", "-1")]
    [InlineData("count", "1e400")]
    [InlineData("count", "infinity")]
    [InlineData("hours", "-1")]
    [InlineData("hours", "inf")]
    [InlineData("meter", "1e300")]
    [InlineData("money", "-5")]
    [InlineData("money", "99999999999999999999")]
    [InlineData("money", "NaN")]
    public void An_impossible_number_is_refused_with_the_range_of_the_field(string what, string text)
    {
        var (good, _, problem, _) = Read(_metric, what, text);
        Assert.False(good);
        Assert.Matches("^\".+\" cannot be right\\. An? .+ lies between .+ and .+\\.$", problem);
    }

    [Theory]
    [InlineData("stress", "120 furlongs", "In \"120 furlongs\", \"furlongs\" is not a unit of stress. Write MPa, N/mm2, psi, ksi or bar.")]
    [InlineData("force", "heavy", "\"heavy\" is not a force. Write 1400, 1.4 kN or 312 lbf.")]
    [InlineData("count", "12.5", "\"12.5\" is not a whole number. Write 12 or 1200.")]
    [InlineData("hours", "1:75", "\"1:75\" is not a running time. Write 1.5, 1:30 or 90 min.")]
    [InlineData("hours", "5 min 2 h", "\"5 min 2 h\" is not a running time. Write 1.5, 1:30 or 90 min.")]
    [InlineData("hours", "", "Nothing is typed. Write a running time such as 1.5, 1:30 or 90 min.")]
    [InlineData("angle", "10°75'", "In \"10°75'\" the minutes must be less than 60. Write 10°30' or 10.5°.")]
    [InlineData("money", "46.005", "\"46.005\" has 3 digits after the mark; this shop's money has 2 digits there. Write 46 or 46.00.")]
    [InlineData("money", "1e3", "\"1e3\" is not an amount of money. Write 46 or 46.00.")]
    [InlineData("money", "46 XYZ", "\"46 XYZ\" is not an amount of money. Write 46 or 46.00.")]
    public void A_refusal_says_what_is_wrong_and_what_would_be_right(string what, string text, string sentence)
        => Assert.Equal(sentence, Read(_metric, what, text).Problem);

    [Fact]
    public void Money_follows_the_digits_of_the_currency()
    {
        var none = new ShopUnits { CurrencyDigits = 0 };
        Assert.Equal(1200, none.ReadMoney("1,200").Value);
        Assert.Equal("\"46.00\" has 2 digits after the mark; this shop's money has no digits there. Write 46 or 1200.", none.ReadMoney("46.00").Problem);
        Assert.Equal("46", none.ShowMoney(46));
        var three = new ShopUnits { CurrencyDigits = 3, Currency = "BHD" };
        Assert.Equal(46005, three.ReadMoney("46.005 BHD").Value);
        Assert.Equal(46005, three.ReadMoney("BHD 46.005").Value);
        Assert.Equal("\"46,005\" can be read in two ways. Write 46005 or 46.005.", three.ReadMoney("46,005").Problem);
        Assert.Equal("46.005\u00A0BHD", three.ShowMoney(46005));
        Assert.Equal("-0.05", new ShopUnits().ShowMoney(-5));
    }

    [Fact]
    public void The_shop_chooses_its_words()
    {
        var mill = new ShopUnits { Pull = PullWord.Strain, UkSpelling = false };
        Assert.Equal("strain", mill.PullName);
        Assert.Equal("tire", mill.Spell("tyre", "tire"));
        Assert.StartsWith("\"-1\" cannot be right. A strain lies", mill.ReadStress("-1").Problem, StringComparison.Ordinal);
        Assert.Equal("tension", _metric.PullName);
    }

    [Fact]
    public void Every_outcome_can_be_printed()
    {
        Assert.Equal("Metric, UTC", _metric.ToString());
        Assert.Equal("120\u00A0MPa", _metric.ReadStress("120").ToString());
        Assert.Equal("\"x\" is not a tension. Write 120, 120 MPa or 15000 psi.", _metric.ReadStress("x").ToString());
        Assert.Equal("Nothing is typed.", default(Parsed<long>).ToString());
        Assert.Contains("is not a time", _metric.ReadTime("x", DateTime.UnixEpoch).ToString(), StringComparison.Ordinal);
        Assert.False(_metric.ReadStress("x").TryGet(out _, out var problem) || problem.Length == 0);
    }

    [Theory]
    [InlineData("stress", "15 ksi", "103.4 MPa", "15,000 psi")]
    [InlineData("force", "312.5 lbf", "1,390 N", "312.5 lbf")]
    [InlineData("band", "5000 fpm", "25.4 m/s", "5,000 ft/min")]
    [InlineData("feed", "3 m/min", "3 m/min", "9.8 ft/min")]
    [InlineData("power", "3 hp", "2.24 kW", "3 hp")]
    [InlineData("density", "650 kg/m3", "650 kg/m³", "40.6 lb/ft³")]
    [InlineData("hours", "1:30", "1 h 30 min", "1 h 30 min")]
    [InlineData("hours", "45 s", "45 s", "45 s")]
    [InlineData("meter", "1234.5", "1,234.5 h", "1,234.5 h")]
    public void A_quantity_is_shown_in_the_unit_of_the_shop(string what, string text, string metric, string inch)
    {
        Assert.Equal(metric.Replace(' ', '\u00A0'), Read(_metric, what, text).Shown);
        Assert.Equal(inch.Replace(' ', '\u00A0'), Read(_inch, what, text).Shown);
    }
}
