using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Tests.Records;

namespace BladeLog.Tests.Advice;

/// <summary>
/// From the sample's files through the records to the advice: the same expected figures as for the shop in memory
/// (independent program, demo-shop specification; life and radii to 1 %, windows and money to 2 %).
/// </summary>
public sealed class SampleShopAnswersTests(SampleShopTests.Loaded loaded) : IClassFixture<SampleShopTests.Loaded>
{
    [Fact]
    public async Task Every_blade_shows_the_figures_expected_of_it()
    {
        ShopAdvice advice = await Advice();
        List<string> off = [];
        foreach (DemoShopExpected.BladeFigures expected in DemoShopExpected.Blades)
        {
            BladeAdvice blade = advice.Of(advice.Now.Blade(expected.Tag)!);
            LifeOfBlade life = blade.Record;
            Near("bending MPa", expected.Bending, life.Rate!.Result.Bending.Max(b => b.Megapascals));
            Near("million bends", expected.MegaBends, life.Bends / 1e6);
            Near("used at the gullets", expected.Gullet, life.Used.Gullet);
            Near("used at the weld", expected.Weld, life.Used.Weld);
            Near("life used", expected.Used, life.Used.Blade);
            Near("median h", expected.Median, life.MedianHours);
            Near("edge µm", expected.EdgeUm, blade.Edge.RadiusM * 1e6);
            Near("metres left", expected.Metres, blade.Edge.Left?.Metres);
            string governs = blade.Limits.GovernedBy == LimitKind.UnknownHistory ? "unknown history" : blade.Limits.GovernedBy.ToString().ToLowerInvariant();
            if (expected.Governs is { } kind && kind != governs)
            {
                off.Add($"{expected.Tag} governs: {kind} expected, {governs} found");
            }

            void Near(string what, string? printed, double? actual)
            {
                if (printed is not null && !(actual is { } value && Printed.Of(printed).Holds(value, 0.01)))
                {
                    off.Add($"{expected.Tag} {what}: {printed} expected, {actual:G6} found");
                }
            }
        }

        Assert.True(off.Count == 0, string.Join("\n", off));
    }

    [Fact]
    public async Task Every_queued_cut_gets_the_answer_expected_of_it()
    {
        ShopAdvice advice = await Advice();
        List<string> off = [];
        foreach (DemoShopExpected.CutFigures expected in DemoShopExpected.Cuts)
        {
            CutAnswer answer = advice.For(advice.Now.Cuts.Single(c => c.Number == expected.Number));
            Choice first = answer.First!;
            bool same = (expected.Tag, expected.Saw, expected.Speed) == (first.Tag, first.Saw.Saw.Code, first.SpeedMps)
                && Printed.Of(expected.Low).Holds(first.Gate!.LowMps!.Value * 60, 0.02)
                && Printed.Of(expected.High).Holds(first.Gate.HighMps!.Value * 60, 0.02)
                && Printed.Of(expected.Minutes).Holds(first.Job!.Minutes, 0.02)
                && Printed.Of(expected.Cost).Holds(first.Job.Cost.Total / 100, 0.02);
            if (!same)
            {
                off.Add($"cut {expected.Number}: {expected.Tag} on {expected.Saw} for {expected.Cost} expected, found\n{string.Join("\n", answer.Choices.Where(c => c.Tag == expected.Tag || c == first).Select(CutAnswersTests.Line))}");
            }
        }

        Assert.True(off.Count == 0, string.Join("\n", off));
    }

    private async Task<ShopAdvice> Advice()
    {
        await using ShopDb db = loaded.Shop.Db();
        return new ShopAdvice(await ShopNowReader.Read(db, SampleShopTests.Loaded.Now));
    }
}
