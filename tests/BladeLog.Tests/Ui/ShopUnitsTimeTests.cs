using BladeLog.Ui;

namespace BladeLog.Tests.Ui;

/// <remarks>Central European clock of 2026: forward on 29 March 02:00 to 03:00, back on 25 October 03:00 to 02:00 (Directive 2000/84/EC).</remarks>
public class ShopUnitsTimeTests
{
    private static readonly ShopUnits _shop = new() { Zone = TimeZoneInfo.FindSystemTimeZoneById("Europe/Berlin") };

    // Wednesday 15 April 2026, 14:00 on the wall.
    private static readonly DateTime _now = new(2026, 4, 15, 12, 0, 0, DateTimeKind.Utc);

    [Theory]
    [InlineData("10:42", "2026-04-15T08:42:00")]
    [InlineData("today 10:42", "2026-04-15T08:42:00")]
    [InlineData("Today, 10.42", "2026-04-15T08:42:00")]
    [InlineData("10:42 am", "2026-04-15T08:42:00")]
    [InlineData("7am", "2026-04-15T05:00:00")]
    [InlineData("12:15 am", "2026-04-14T22:15:00")]
    [InlineData("14:03", "2026-04-15T12:03:00")]
    [InlineData("yesterday 7:15", "2026-04-14T05:15:00")]
    [InlineData("yesterday at 7:15 pm", "2026-04-14T17:15:00")]
    [InlineData("tomorrow 7:15", "2026-04-16T05:15:00")]
    [InlineData("2026-03-28 14:30", "2026-03-28T13:30:00")]
    [InlineData("2026-03-28T14:30", "2026-03-28T13:30:00")]
    [InlineData("2026-03-28T14:30:15", "2026-03-28T13:30:15")]
    [InlineData("28.3.2026 14:30", "2026-03-28T13:30:00")]
    [InlineData("28 Mar 2026 14:30", "2026-03-28T13:30:00")]
    [InlineData("2026-03-28 14:30 +02:00", "2026-03-28T12:30:00")]
    [InlineData("2026-03-28T14:30Z", "2026-03-28T14:30:00")]
    [InlineData("20 min ago", "2026-04-15T11:40:00")]
    [InlineData("2 h ago", "2026-04-15T10:00:00")]
    [InlineData("now", "2026-04-15T12:00:00")]
    [InlineData("2026-03-29 01:59", "2026-03-29T00:59:00")]
    [InlineData("2026-03-29 03:00", "2026-03-29T01:00:00")]
    public void A_typed_local_time_becomes_utc(string text, string utc)
    {
        var read = _shop.ReadTime(text, _now);
        Assert.True(read.IsGood, read.Problem);
        Assert.Equal(DateTime.Parse(utc, System.Globalization.CultureInfo.InvariantCulture), read.Utc);
        Assert.Equal(DateTimeKind.Utc, read.Utc.Kind);
        Assert.Equal(text, read.Text);
    }

    [Fact]
    public void A_time_in_the_spring_gap_gets_a_sentence()
    {
        var read = _shop.ReadTime("2026-03-29 02:30", _now);
        Assert.Empty(read.Candidates);
        Assert.Equal("\"2026-03-29 02:30\" never was: the clocks went forward from 02:00 to 03:00. Write a time before 02:00 or from 03:00 on.", read.Problem);
    }

    [Fact]
    public void A_time_in_the_double_hour_is_a_choice_and_each_choice_reads_back_as_itself()
    {
        var read = _shop.ReadTime("2026-10-25 02:30", new DateTime(2026, 10, 25, 9, 0, 0, DateTimeKind.Utc));
        Assert.True(read.IsChoice);
        Assert.Equal([new DateTime(2026, 10, 25, 0, 30, 0), new DateTime(2026, 10, 25, 1, 30, 0)], read.Candidates.Select(c => c.Utc));
        Assert.Equal(["the first 02:30, before the clocks went back", "the second 02:30, after the clocks went back"], read.Candidates.Select(c => c.Words));
        Assert.All(read.Candidates, c => Assert.Equal(c.Utc, _shop.ReadTime(c.Text, _now).Utc));
        Assert.All(read.Candidates, c => Assert.Equal(c.Utc, _shop.ReadTime(_shop.ShowTime(c.Utc), _now).Utc));
        Assert.Throws<InvalidOperationException>(() => read.Utc);
    }

    [Theory]
    [InlineData("23:50", "\"23:50\" has not come yet today. Write yesterday 23:50, or today 23:50 if it lies ahead.")]
    [InlineData("25:00", "\"25:00\" is not a time. Write 10:42, yesterday 7:15 or 2026-03-28 14:30.")]
    [InlineData("7", "\"7\" is not a time. Write 10:42, yesterday 7:15 or 2026-03-28 14:30.")]
    [InlineData("10:75", "\"10:75\" is not a time. Write 10:42, yesterday 7:15 or 2026-03-28 14:30.")]
    [InlineData("soon", "\"soon\" is not a time. Write 10:42, yesterday 7:15 or 2026-03-28 14:30.")]
    [InlineData("", "Nothing is typed. Write a time such as 10:42, yesterday 7:15 or 2026-03-28 14:30.")]
    [InlineData("2026-02-30 10:00", "\"2026-02-30\" is not a date. Write today, yesterday or 2026-04-15.")]
    [InlineData("3/4/2026 10:00", "\"3/4/2026\" can be read with the month or the day first. Write the year first, as in 2026-04-15.")]
    public void A_refusal_says_what_is_wrong_and_what_would_be_right(string text, string sentence)
        => Assert.Equal(sentence, _shop.ReadTime(text, _now).Problem);

    [Theory]
    [InlineData("today", "2026-04-15")]
    [InlineData("yesterday", "2026-04-14")]
    [InlineData("2026-4-3", "2026-04-03")]
    [InlineData("3.4.2026", "2026-04-03")]
    [InlineData("3 april 2026", "2026-04-03")]
    public void A_date_may_be_a_word(string text, string date)
        => Assert.Equal(date, _shop.Show(_shop.ReadDate(text, _now).Value));

    [Fact]
    public void Today_is_the_day_on_the_wall_of_the_shop_not_in_Greenwich()
        => Assert.Equal(new DateOnly(2026, 4, 16), _shop.ReadDate("today", new DateTime(2026, 4, 15, 22, 30, 0, DateTimeKind.Utc)).Value);
}
