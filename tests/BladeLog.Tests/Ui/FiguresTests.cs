using BladeLog.Ui;

namespace BladeLog.Tests.Ui;

public class FiguresTests
{
    [Theory]
    [InlineData(0.4123, "0.41")]
    [InlineData(0.3, "0.3")]
    [InlineData(0.0456, "0.046")]
    [InlineData(0.996, "1.0")]
    [InlineData(2, "2.0")]
    [InlineData(3.44, "3.4")]
    [InlineData(9.96, "10")]
    [InlineData(14.4, "14")]
    [InlineData(0, "0")]
    public void A_feed_has_as_many_figures_as_a_hand_can_keep(double feed, string text) => Assert.Equal(text, Figures.Feed(feed));

    [Theory]
    [InlineData(9.4, "9.4")]
    [InlineData(9.96, "10")]
    [InlineData(5, "5")]
    [InlineData(138.7, "139")]
    [InlineData(1413, "1,413")]
    public void Hours_have_one_decimal_below_ten(double hours, string text) => Assert.Equal(text, Figures.Hours(hours));

    [Theory]
    [InlineData(0.07, "about 7 in 100")]
    [InlineData(0.00425, "about 4 in 1,000")]
    [InlineData(0.4, "about 40 in 100")]
    [InlineData(0.01, "about 1 in 100")]
    [InlineData(0.0000234, "about 2 in 100,000")]
    [InlineData(0, "less than 1 in 1,000,000")]
    [InlineData(1, "almost certain")]
    public void A_chance_is_a_count_out_of_a_crowd(double chance, string text) => Assert.Equal(text, Figures.Chance(chance));

    [Theory]
    [InlineData(-0.1)]
    [InlineData(1.1)]
    [InlineData(double.NaN)]
    public void What_is_no_chance_is_refused(double chance) => Assert.Throws<ArgumentOutOfRangeException>(() => Figures.Chance(chance));

    [Fact]
    public void Used_life_is_written_with_its_band() => Assert.Equal("0.6 (0.15 to 2.5)", Figures.Used(0.6, 0.15, 2.5));

    [Fact]
    public void A_number_never_leaves_its_unit() => Assert.Equal("20.6\u00a0mm", Figures.With(Figures.Number(20.6, 1), "mm"));

    [Theory]
    [InlineData(339.4, "339")]
    [InlineData(999.4, "999")]
    [InlineData(1000, ">999")]
    public void The_floor_shows_three_digits_at_most(double value, string text) => Assert.Equal(text, Figures.Floor(value));
}
