using System.Globalization;
using BladeLog.Advice.Cuts;

namespace BladeLog.Tests.Advice;

/// <summary>Expected answers for the queued cuts: independent program, demo-shop specification; windows and money to 2 %.</summary>
public sealed class CutAnswersTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    private const double TwoPercent = 0.02;

    public static TheoryData<int> Numbers => [.. DemoShopExpected.Cuts.Select(c => c.Number)];

    [Theory]
    [MemberData(nameof(Numbers))]
    public void Each_cut_gets_the_answer_expected_of_it(int number)
    {
        DemoShopExpected.CutFigures expected = DemoShopExpected.Cuts.Single(c => c.Number == number);
        CutAnswer answer = shop.Advice.For(shop.Cut(number));
        Choice first = answer.First!;
        string found = string.Join("\n", answer.Choices.Take(6).Select(Line));

        Assert.True(expected.Tag == first.Tag && expected.Saw == first.Saw.Saw.Code && expected.Speed == first.SpeedMps, $"first choice\n{found}");
        Assert.Equal(expected.Verdict, Word(first.Verdict));
        Assert.Equal(expected.SetBy, Word(first.Gate!.GovernedBy));
        Near("low", expected.Low, first.Gate.LowMps!.Value * 60);
        Near("high", expected.High, first.Gate.HighMps!.Value * 60);
        Near("minutes", expected.Minutes, first.Job!.Minutes);
        Near("cost", expected.Cost, first.Job.Cost.Total / 100);
        if (expected.Second is { } second)
        {
            Choice next = answer.Choices[1];
            Assert.True(second == next.Tag && expected.SecondVerdict == Word(next.Verdict), $"second choice\n{found}");
            Near("cost of the second", expected.SecondCost!, next.Job!.Cost.Total / 100);
        }
        else
        {
            Assert.True(answer.Choices[1].Verdict == Verdict.No, $"second choice\n{found}");
        }

        void Near(string what, string printed, double actual) =>
            Assert.True(Printed.Of(printed).Holds(actual, TwoPercent), $"{what}: {printed} expected, {actual.ToString("G6", CultureInfo.InvariantCulture)} found\n{found}");
    }

    internal static string Line(Choice c) => string.Create(
        CultureInfo.InvariantCulture,
        $"{c.Tag} {c.Saw.Saw.Code} {c.SpeedMps} {c.Verdict} [{c.Reason.Sentence}] {c.Gate?.LowMps * 60:G4} to {c.Gate?.HighMps * 60:G4} by {c.Gate?.GovernedBy}, {c.Job?.Minutes:G4} min, {c.Job?.Cost.Total:G6}");

    private static string Word(Verdict verdict) => verdict switch
    {
        Verdict.Fits => "fits",
        Verdict.WithCare => "with care",
        _ => "no",
    };

    private static string Word(FeedLimitKind kind) => kind == FeedLimitKind.ChipRoom ? "chip room" : kind.ToString().ToLowerInvariant();
}
