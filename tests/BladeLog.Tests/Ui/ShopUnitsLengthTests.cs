using BladeLog.Ui;

namespace BladeLog.Tests.Ui;

/// <remarks>
/// Inch = 25.4 mm and pound = 0.45359237 kg exactly: international yard and pound agreement of 1959.
/// Expected figures are those definitions multiplied out by hand.
/// </remarks>
public class ShopUnitsLengthTests
{
    private static readonly ShopUnits _metric = new();
    private static readonly ShopUnits _inch = new() { Units = UnitSystem.Inch };

    /// <summary>Spellings that name their unit, or are inches by their shape: the same in every shop. Expected in mm.</summary>
    public static TheoryData<string, double> Lengths => new()
    {
        { "1/2", 12.7 }, { "1-1/4", 31.75 }, { "1 1/4", 31.75 }, { ".025", 0.635 }, { "13'2\"", 4013.2 },
        { "13 ft 2 in", 4013.2 }, { "13ft 2in", 4013.2 }, { "13ft2in", 4013.2 }, { "13' 2\"", 4013.2 }, { "13'-2\"", 4013.2 },
        { "13’2”", 4013.2 }, { "13′2″", 4013.2 }, { "13'2", 4013.2 }, { "13'2''", 4013.2 }, { "13 feet 2 inches", 4013.2 },
        { "13 ft. 2 in.", 4013.2 }, { "13' 2 1/2\"", 4025.9 }, { "13'2-1/2\"", 4025.9 }, { "13'2½\"", 4025.9 }, { "13' 2.5\"", 4025.9 }, { "13'0\"", 3962.4 },
        { "13'", 3962.4 }, { "13 ft", 3962.4 }, { "1 foot", 304.8 }, { "2 feet", 609.6 }, { "1.5 ft", 457.2 },
        { "105\"", 2667 }, { "105 in", 2667 }, { "105in", 2667 }, { "105 in.", 2667 }, { "105 inch", 2667 }, { "105 inches", 2667 }, { "105 IN", 2667 }, { "105”", 2667 },
        { "93 1/2\"", 2374.9 }, { "93-1/2 in", 2374.9 }, { "93½ in", 2374.9 }, { "½", 12.7 }, { "¾\"", 19.05 }, { "⅜ in", 9.525 }, { "1⅛", 28.575 },
        { "3/4", 19.05 }, { "3/8\"", 9.525 }, { "3 / 8", 9.525 }, { "3⁄8", 9.525 }, { "5/8 inch", 15.875 }, { "1/64", 0.396875 },
        { "1/2 mm", 0.5 }, { ".014", 0.3556 }, { ",025", 0.635 }, { ".5 mm", 0.5 }, { "0.025\"", 0.635 }, { "25 thou", 0.635 }, { "0,9 mm", 0.9 },
        { "13 mm", 13 }, { "13mm", 13 }, { "13 MM", 13 }, { "13\u00A0mm", 13 }, { "  13   mm ", 13 }, { "+13 mm", 13 }, { "13.0 mm", 13 }, { "1.3 cm", 13 }, { "1,3cm", 13 },
        { "0.013 m", 13 }, { "1.3e1 mm", 13 }, { "13 millimetres", 13 }, { "13 millimeter", 13 }, { "2.667 m", 2667 }, { "2,667 m", 2667 }, { "3 metres", 3000 }, { "3 meters", 3000 },
        { "12 µm", 0.012 }, { "12 μm", 0.012 }, { "12 um", 0.012 }, { "12 microns", 0.012 }, { "27,5 mm", 27.5 }, { "5 690 mm", 5690 }, { "1.234,5 mm", 1234.5 }, { "1,234.5 mm", 1234.5 },
        { "1.234.567 mm", 1234567 },
    };

    [Theory]
    [MemberData(nameof(Lengths))]
    public void A_length_that_names_its_unit_is_the_same_in_every_shop(string text, double mm)
    {
        var wide = Fields.AnyLength with { Most = 1e4 };
        foreach (var shop in new[] { _metric, _inch })
        {
            var read = shop.ReadLength(text, wide);
            Assert.True(read.IsGood, read.Problem);
            Assert.Equal(mm, read.Value.Millimetres, mm * 1e-12);
            Assert.Equal(text.Trim(), read.Typed.Text);
            Assert.False(string.IsNullOrEmpty(read.Understood));
        }
    }

    [Theory]
    [InlineData("12.7", 12.7, 322.58)]
    [InlineData("13", 13, 330.2)]
    [InlineData("0.9", 0.9, 22.86)]
    [InlineData("0,9", 0.9, 22.86)]
    [InlineData("27,5", 27.5, 698.5)]
    public void A_bare_number_is_in_the_unit_of_the_shop(string text, double metric, double inch)
    {
        Assert.Equal(metric, _metric.ReadLength(text).Value.Millimetres, 1e-9);
        Assert.Equal(inch, _inch.ReadLength(text).Value.Millimetres, 1e-9);
    }

    [Fact]
    public void A_comma_before_three_digits_is_thousands_in_a_loop_and_a_decimal_mark_in_a_width()
    {
        Assert.Equal(5690, _metric.ReadLength("5,690", Fields.Loop).Value.Millimetres, 1e-9);
        Assert.Equal(5690, _metric.ReadLength("5,690 mm", Fields.Loop).Value.Millimetres, 1e-9);
        Assert.Equal(5690, _metric.ReadLength("5,690 m", Fields.Loop).Value.Millimetres, 1e-9);
        Assert.Equal(105.125 * 25.4, _metric.ReadLength("105,125 in", Fields.Loop).Value.Millimetres, 1e-9);
        Assert.Equal(5.69, _metric.ReadLength("5,690", Fields.BladeWidth).Value.Millimetres, 1e-9);
        Assert.Equal(4013.2, _metric.ReadLength("4013,2", Fields.Loop).Value.Millimetres, 1e-9);
        Assert.Equal("5,690\u00A0mm", _metric.ReadLength("5,690", Fields.Loop).Understood);
    }

    [Fact]
    public void An_edge_radius_is_typed_in_micrometres()
    {
        Assert.Equal(12.5, _inch.ReadLength("12.5", Fields.EdgeRadius).Value.Micrometres, 1e-9);
        Assert.Equal(0.5, _metric.ReadLength(".5", Fields.EdgeRadius).Value.Micrometres, 1e-9);
        Assert.Equal("12.5\u00A0µm", _inch.Show(_inch.ReadLength("12.5", Fields.EdgeRadius).Value, Fields.EdgeRadius));
    }

    // Birmingham (Stubs) gauge in inches, as published tables print it: 14 = .083, 16 = .065, 18 = .049, 20 = .035, 22 = .028.
    // The mm are those of the same tables, rounded to the micrometre.
    [Theory]
    [InlineData("14 BWG", 2.108)]
    [InlineData("BWG 15", 1.829)]
    [InlineData("16 ga", 1.651)]
    [InlineData("17ga", 1.473)]
    [InlineData("18 gauge", 1.245)]
    [InlineData("BWG19", 1.067)]
    [InlineData("gauge 20", 0.889)]
    [InlineData("No. 21", 0.813)]
    [InlineData("22g", 0.711)]
    public void A_gauge_number_is_a_thickness(string text, double mm)
    {
        Assert.Equal(mm, _metric.ReadLength(text, Fields.Thickness).Value.Millimetres, 0.0005);
        Assert.False(_metric.ReadLength(text, Fields.BladeWidth).IsGood);
    }

    [Theory]
    [InlineData("3/0", "\"3/0\" is not a length. Write 12.7, 1/2 in or 13 mm.")]
    [InlineData("abc", "\"abc\" is not a length. Write 12.7, 1/2 in or 13 mm.")]
    [InlineData("1-5/4", "\"1-5/4\" is not a length. Write 12.7, 1/2 in or 13 mm.")]
    [InlineData("1,23,4 mm", "\"1,23,4 mm\" is not a length. Write 12.7, 1/2 in or 13 mm.")]
    [InlineData("12.", "\"12.\" is not a length. Write 12.7, 1/2 in or 13 mm.")]
    [InlineData("3-4", "\"3-4\" is not a length. Write 12.7, 1/2 in or 13 mm.")]
    [InlineData("", "Nothing is typed. Write a length such as 12.7, 1/2 in or 13 mm.")]
    [InlineData(null, "Nothing is typed. Write a length such as 12.7, 1/2 in or 13 mm.")]
    [InlineData("12 psi", "In \"12 psi\", \"psi\" is not a unit of length. Write mm, cm, m, in or ft.")]
    [InlineData("13'14\"", "In \"13'14\"\" the inches after the feet must be less than 12. Write 13'2\" or 158 in.")]
    public void A_refusal_says_what_is_wrong_and_what_would_be_right(string? text, string sentence)
        => Assert.Equal(sentence, _metric.ReadLength(text).Problem);

    [Theory]
    [InlineData("NaN")]
    [InlineData("Infinity")]
    [InlineData("-inf")]
    [InlineData("∞")]
    [InlineData("1e999")]
    [InlineData("-3")]
    [InlineData("0")]
    [InlineData("-13'2\"")]
    [InlineData("700 mm")]
    public void An_impossible_width_is_refused_with_the_range_of_the_field(string text)
    {
        var read = _metric.ReadLength(text, Fields.BladeWidth);
        Assert.False(read.IsGood);
        Assert.Equal($"\"{text}\" cannot be right. A blade width lies between 0.5\u00A0mm and 600\u00A0mm.", read.Problem);
        Assert.Throws<InvalidOperationException>(() => read.Value);
    }

    [Fact]
    public void A_bad_gauge_number_names_the_gauges_taken()
        => Assert.Equal("\"BWG 40\" is not a gauge of band steel. Write BWG 10 to 28, or the thickness such as 0.9 mm.", _metric.ReadLength("BWG 40", Fields.Thickness).Problem);

    [Fact]
    public void A_long_text_is_refused_without_being_repeated_whole()
    {
        var read = _metric.ReadLength(new string('9', 5000));
        Assert.False(read.IsGood);
        Assert.InRange(read.Problem!.Length, 20, 120);
    }

    [Theory]
    [InlineData(12.7, "12.7 mm", "1/2 in")]
    [InlineData(31.75, "31.8 mm", "1 1/4 in")]
    [InlineData(25.4, "25.4 mm", "1 in")]
    [InlineData(13, "13 mm", "0.512 in")]
    [InlineData(12.74, "12.7 mm", "0.502 in")]
    [InlineData(12.76, "12.8 mm", "0.502 in")]
    [InlineData(25, "25 mm", "0.984 in")]
    [InlineData(50, "50 mm", "1.97 in")]
    [InlineData(900, "900 mm", "35.4 in")]
    [InlineData(2667, "2,667 mm", "105 in")]
    [InlineData(4013.2, "4,013.2 mm", "158 in")]
    public void A_length_is_shown_in_the_unit_of_the_shop_and_as_a_fraction_only_where_it_is_one(double mm, string metric, string inch)
    {
        var length = Handbook.Quantities.Length.FromMillimetres(mm);
        Assert.Equal(metric.Replace(' ', '\u00A0'), _metric.Show(length));
        Assert.Equal(inch.Replace(' ', '\u00A0'), _inch.Show(length));
        Assert.Equal(_inch.Show(length), _metric.Other.Show(length));
    }

    [Theory]
    [InlineData(12.74, "12.7 mm", "1/2 in")]
    [InlineData(12.76, "12.8 mm", "0.5024 in")]
    [InlineData(2667, "2667 mm", "105 in")]
    [InlineData(13, "13 mm", "0.5118 in")]
    public void In_a_form_field_a_length_has_no_comma_and_every_digit_it_needs_to_be_read_back(double mm, string metric, string inch)
    {
        var length = Handbook.Quantities.Length.FromMillimetres(mm);
        Assert.Equal(metric.Replace(' ', '\u00A0'), _metric.Typing.Show(length));
        Assert.Equal(inch.Replace(' ', '\u00A0'), _inch.Typing.Show(length));
    }

    [Fact]
    public void A_thickness_is_shown_in_thousandths_never_in_64ths()
    {
        var t = Handbook.Quantities.Length.FromMillimetres(0.8);
        Assert.Equal("0.031\u00A0in", _inch.Show(t, Fields.Thickness));
        Assert.Equal("0.8\u00A0mm (0.031\u00A0in)", _metric.ShowBoth(t, Fields.Thickness));
    }
}
