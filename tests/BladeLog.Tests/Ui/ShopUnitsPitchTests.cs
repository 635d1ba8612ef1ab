using BladeLog.Ui;

namespace BladeLog.Tests.Ui;

/// <remarks>Teeth per inch to mm by the inch of 25.4 mm (1959 agreement).</remarks>
public class ShopUnitsPitchTests
{
    private static readonly ShopUnits _metric = new();
    private static readonly ShopUnits _inch = new() { Units = UnitSystem.Inch };

    /// <summary>Coarse and fine in mm; the same in every shop.</summary>
    public static TheoryData<string, double, double> Pitches => new()
    {
        { "3 TPI", 25.4 / 3, 25.4 / 3 }, { "3TPI", 25.4 / 3, 25.4 / 3 }, { "3tpi", 25.4 / 3, 25.4 / 3 }, { "3 t.p.i.", 25.4 / 3, 25.4 / 3 }, { "TPI 3", 25.4 / 3, 25.4 / 3 },
        { "3 teeth per inch", 25.4 / 3, 25.4 / 3 }, { "3 teeth/in", 25.4 / 3, 25.4 / 3 }, { "3 t/in", 25.4 / 3, 25.4 / 3 }, { "4 PPI", 25.4 / 3, 25.4 / 3 }, { "4 points", 25.4 / 3, 25.4 / 3 },
        { "1.3 TPI", 25.4 / 1.3, 25.4 / 1.3 }, { "1,3 tpi", 25.4 / 1.3, 25.4 / 1.3 }, { "14 TPI", 25.4 / 14, 25.4 / 14 }, { "1-1/4 TPI", 25.4 / 1.25, 25.4 / 1.25 },
        { "7/8 pitch", 22.225, 22.225 }, { "7/8", 22.225, 22.225 }, { "7/8 in", 22.225, 22.225 }, { "7/8\" pitch", 22.225, 22.225 }, { "3/4 pitch", 19.05, 19.05 }, { "3/4 in", 19.05, 19.05 }, { "1-1/4 pitch", 31.75, 31.75 },
        { "22 mm", 22, 22 }, { "22mm pitch", 22, 22 }, { "8,5 mm", 8.5, 8.5 }, { "pitch 22 mm", 22, 22 }, { ".875", 22.225, 22.225 },
        { "3-4 TPI", 25.4 / 3, 25.4 / 4 }, { "3/4 TPI", 25.4 / 3, 25.4 / 4 }, { "2/3 TPI", 25.4 / 2, 25.4 / 3 }, { "2-3tpi", 25.4 / 2, 25.4 / 3 }, { "2-3", 25.4 / 2, 25.4 / 3 }, { "3–4 TPI", 25.4 / 3, 25.4 / 4 },
        { "4-3 TPI", 25.4 / 3, 25.4 / 4 }, { "3-4 var TPI", 25.4 / 3, 25.4 / 4 }, { "3 to 4 TPI", 25.4 / 3, 25.4 / 4 }, { "2/3", 25.4 / 2, 25.4 / 3 }, { "6/10", 25.4 / 6, 25.4 / 10 }, { "10/14 TPI", 25.4 / 10, 25.4 / 14 },
        { "19-25 mm", 25, 19 }, { "1.4-2 TPI", 25.4 / 1.4, 12.7 }, { "variable 3-4 TPI", 25.4 / 3, 25.4 / 4 },
    };

    [Theory]
    [MemberData(nameof(Pitches))]
    public void A_pitch_has_a_coarse_and_a_fine_spacing(string text, double coarse, double fine)
    {
        foreach (var shop in new[] { _metric, _inch })
        {
            var read = shop.ReadPitch(text);
            Assert.True(read.IsGood, read.Problem);
            Assert.Equal(coarse, read.Value.Coarse.Millimetres, 1e-9);
            Assert.Equal(fine, read.Value.Fine.Millimetres, 1e-9);
        }
    }

    // Printed digits of the acceptance table: 3 TPI 8.467; 3-4 TPI coarse 8.467, fine 6.35, mean 7.26 (one inch over 3.5).
    [Fact]
    public void The_mean_of_a_variable_pitch_is_one_inch_over_the_mean_teeth_per_inch()
    {
        var p = _metric.ReadPitch("3-4 TPI").Value;
        Assert.Equal(8.467, p.Coarse.Millimetres, 0.0005);
        Assert.Equal(6.35, p.Fine.Millimetres, 0.0005);
        Assert.Equal(7.26, p.Mean.Millimetres, 0.005);
        Assert.Equal(25.4 / 3.5, p.Mean.Millimetres, 1e-9);
        Assert.True(p.IsVariable);
        Assert.False(_metric.ReadPitch("3 TPI").Value.IsVariable);
    }

    [Fact]
    public void A_bare_number_is_mm_in_a_metric_shop_and_teeth_in_an_inch_shop()
    {
        Assert.Equal(3, _metric.ReadPitch("3").Value.Fine.Millimetres, 1e-9);
        Assert.Equal(25.4 / 3, _inch.ReadPitch("3").Value.Fine.Millimetres, 1e-9);
        Assert.Equal(25.4 / 1.3, _inch.ReadPitch("1,3").Value.Fine.Millimetres, 1e-9);
    }

    [Fact]
    public void Three_quarters_alone_is_asked_for_it_can_be_two_things()
        => Assert.Equal("\"3/4\" can be teeth per inch or a part of an inch. Write 3/4 TPI or 3/4 in.", _metric.ReadPitch("3/4").Problem);

    [Theory]
    [InlineData("0 TPI")]
    [InlineData("1 PPI")]
    [InlineData("3-0 TPI")]
    [InlineData("300 TPI")]
    [InlineData("900 mm")]
    [InlineData("NaN")]
    [InlineData("-3")]
    [InlineData("three")]
    [InlineData("3 mm TPI")]
    [InlineData("")]
    public void An_impossible_pitch_is_refused_in_a_sentence(string text)
    {
        var read = _metric.ReadPitch(text);
        Assert.False(read.IsGood);
        Assert.EndsWith(".", read.Problem, StringComparison.Ordinal);
        Assert.Contains("tooth pitch", read.Problem, StringComparison.OrdinalIgnoreCase);
    }

    [Theory]
    [InlineData("3 TPI", "8.467 mm", "3 TPI")]
    [InlineData("7/8 in", "22.225 mm", "7/8 in")]
    [InlineData("3-4 TPI", "6.35-8.467 mm", "3-4 TPI")]
    public void A_pitch_is_shown_as_the_shop_speaks(string text, string metric, string inch)
    {
        var p = _metric.ReadPitch(text).Value;
        Assert.Equal(metric.Replace(' ', '\u00A0'), _metric.Show(p));
        Assert.Equal(inch.Replace(' ', '\u00A0'), _inch.Show(p));
    }

    /// <summary>Width, thickness, coarse pitch, loop in mm; 0 where the line does not say.</summary>
    public static TheoryData<string, double, double, double, double> Prints => new()
    {
        { "1/2 x .025 x 3 x 105", 12.7, 0.635, 25.4 / 3, 2667 },
        { "13'2\" x 27x0,9", 27, 0.9, 0, 4013.2 },
        { "27x0,9", 27, 0.9, 0, 0 },
        { "1/2 x .025 x 3tpi x 105\"", 12.7, 0.635, 25.4 / 3, 2667 },
        { "1/2 × .025 × 3 TPI × 105", 12.7, 0.635, 25.4 / 3, 2667 },
        { "1/2\" by .025\" by 3 TPI by 105\"", 12.7, 0.635, 25.4 / 3, 2667 },
        { "1-1/4 x .042 x 7/8 pitch x 13'2\"", 31.75, 1.0668, 22.225, 4013.2 },
        { "0,9x27", 27, 0.9, 0, 0 },
        { "27 x 0.9 x 22 mm x 4013", 27, 0.9, 22, 4013 },
        { "13 x 0.65 x 4 TPI x 2667 mm", 13, 0.65, 6.35, 2667 },
        { "13 mm x 0.65 x 2-3 x 2667", 13, 0.65, 12.7, 2667 },
        { "1 x .035 x 1.3 TPI x 158", 25.4, 0.889, 25.4 / 1.3, 4013.2 },
        { "1 x 0.035 x 158", 25.4, 0.889, 0, 4013.2 },
        { "5,690 x 34 x 1,1", 34, 1.1, 0, 5690 },
        { "1/2 x 0.5 x 3 TPI", 12.7, 0.5, 25.4 / 3, 0 },
        { "1/2 x 3 TPI x 105\"", 12.7, 0, 25.4 / 3, 2667 },
        { "105 in x 1/2 x .025", 12.7, 0.635, 0, 2667 },
        { "100 mm x BWG 19 x 1 3/4 pitch", 100, 1.0668, 44.45, 0 },
        { "3/4 X .032 X 3", 19.05, 0.8128, 25.4 / 3, 0 },
    };

    [Theory]
    [MemberData(nameof(Prints))]
    public void The_printed_strip_of_a_blade_is_read_whole(string text, double width, double thickness, double pitch, double loop)
    {
        foreach (var shop in new[] { _metric, _inch })
        {
            var read = shop.ReadBladePrint(text);
            Assert.True(read.IsGood, read.Problem);
            Assert.Equal(width, read.Value.Width?.Millimetres ?? 0, 1e-9);
            Assert.Equal(thickness, read.Value.Thickness?.Millimetres ?? 0, 1e-9);
            Assert.Equal(pitch, read.Value.Pitch?.Coarse.Millimetres ?? 0, 1e-9);
            Assert.Equal(loop, read.Value.Loop?.Millimetres ?? 0, 1e-9);
        }
    }

    [Theory]
    [InlineData("13x0.65x4x2667", "The \"4\" of this line can be teeth per inch or mm. Write 4 TPI or 4 mm.")]
    [InlineData("1/2 x .025 x 3/4 x 105", "The \"3/4\" of this line can be teeth per inch or inches. Write 3/4 TPI or 3/4 in.")]
    [InlineData("27 x parrot", "In \"27 x parrot\", \"parrot\" is not a size. Write 1/2 x .025 x 3 TPI x 105 in, or 27 x 0.9 x 4013 mm.")]
    [InlineData("27", "\"27\" is not a blade print. Write 1/2 x .025 x 3 TPI x 105 in, or 27 x 0.9 x 4013 mm.")]
    [InlineData("900 x 800", "\"900 x 800\" is not a possible blade. Write width x thickness x pitch x length with units: 1/2 x .025 x 3 TPI x 105 in, or 27 x 0.9 x 4013 mm.")]
    public void A_line_that_cannot_be_read_is_asked_about(string text, string sentence)
        => Assert.Equal(sentence, _metric.ReadBladePrint(text).Problem);

    [Fact]
    public void A_blade_print_is_shown_back()
        => Assert.Equal("12.7\u00A0mm × 0.635\u00A0mm × 8.467\u00A0mm × 2,667\u00A0mm", _metric.ReadBladePrint("1/2 x .025 x 3 x 105").Understood);
}
