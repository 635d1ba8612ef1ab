using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Fatigue;

namespace BladeLog.Tests.Advice;

/// <summary>Expected figures per blade: independent program, demo-shop specification; life, hours and radii to 1 %, or the last printed digit.</summary>
public sealed class BladeFiguresTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    private const double OnePercent = 0.01;

    public static TheoryData<string> Tags => [.. DemoShopExpected.Blades.Select(b => b.Tag)];

    [Theory]
    [MemberData(nameof(Tags))]
    public void Each_blade_shows_the_figures_expected_of_it(string tag)
    {
        DemoShopExpected.BladeFigures expected = DemoShopExpected.Blades.Single(b => b.Tag == tag);
        BladeAdvice blade = shop.Of(tag);
        LifeOfBlade life = blade.Record;

        List<string> off = [];
        void Near(string what, string? printed, double? actual)
        {
            if (printed is null)
            {
                return;
            }

            if (actual is not { } value || !Printed.Of(printed).Holds(value, OnePercent))
            {
                off.Add($"{what}: {printed} expected, {actual:G6} found");
            }
        }

        Near("bending MPa", expected.Bending, life.Rate!.Result.Bending.Max(b => b.Megapascals));
        Near("million bends", expected.MegaBends, life.Bends / 1e6);
        Near("used at the gullets", expected.Gullet, life.Used.Gullet);
        Near("used at the weld", expected.Weld, life.Used.Weld);
        Near("life used", expected.Used, life.Used.Blade);
        if (!life.UnknownHistory)
        {
            Near("band, low", expected.Low, life.UsedLow);
            Near("band, high", expected.High, life.UsedHigh);
        }

        Near("median h", expected.Median, life.MedianHours);
        Near("10 % h", expected.OneInTen, life.OneInTenHours);
        if (blade.Life is not null)
        {
            Near("hours left", expected.Left, life.HoursLeft);
        }

        if (expected.NotLimiting)
        {
            Assert.Equal(LifeVerdict.NotLimiting, life.Verdict);
            Assert.Null(life.MedianHours);
        }

        if (expected.Governs is { } governs)
        {
            Assert.Equal(governs, blade.Limits.GovernedBy switch
            {
                LimitKind.UnknownHistory => "unknown history",
                var other => other.ToString().ToLowerInvariant(),
            });
        }

        Near("edge µm", expected.EdgeUm, blade.Edge.RadiusM * 1e6);
        Near("metres left", expected.Metres, blade.Edge.Left!.Metres);
        Assert.True(off.Count == 0, $"{tag}: {string.Join("; ", off)}");
    }
}
