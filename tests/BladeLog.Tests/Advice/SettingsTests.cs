using System.Globalization;
using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Tests.House;

namespace BladeLog.Tests.Advice;

public sealed class SettingsTests
{
    public static TheoryData<string> Keys => [.. SettingList.All.Select(d => d.Key)];

    [Theory]
    [MemberData(nameof(Keys))]
    public void Each_setting_stands_in_the_operating_manual_as_it_is(string key)
    {
        string manual = File.ReadAllText(Path.Combine(Tree.Root, "docs", "operating.md"));
        Assert.Contains(Row(SettingList.Find(key)!), manual, StringComparison.Ordinal);
    }

    [Fact]
    public void The_manual_lists_no_setting_that_does_not_exist()
    {
        string[] lines = File.ReadAllLines(Path.Combine(Tree.Root, "docs", "operating.md"));
        Assert.Equal(
            SettingList.All.Select(d => d.Key),
            lines.Where(l => l.StartsWith("| `", StringComparison.Ordinal) && l.Contains('.', StringComparison.Ordinal)).Select(l => l.Split('`')[1]).Where(k => SettingList.All.Select(d => d.Chapter).Contains(k.Split('.')[0])));
    }

    [Theory]
    [MemberData(nameof(Keys))]
    public void Each_default_lies_within_its_bounds_and_names_a_source(string key)
    {
        SettingDefinition d = SettingList.Find(key)!;
        Assert.Null(d.Refuse(d.Default));
        Assert.NotNull(d.Refuse(d.Low - 1e-3 - Math.Abs(d.Low)));
        Assert.NotNull(d.Refuse(double.NaN));
        Assert.Contains($"| {d.Source} |", File.ReadAllText(Path.Combine(Tree.Root, "docs", "sources.md")), StringComparison.Ordinal);
        Assert.NotEqual(Provenance.Yours, d.Provenance);
    }

    [Fact]
    public void A_shop_that_sets_a_value_gets_it_with_its_own_mark()
    {
        AdviceSettings own = AdviceSettings.From(Own(LifeSettings.RetireMark, 0.64));
        Assert.Equal(0.64, own[LifeSettings.RetireMark]);
        Assert.Equal(Provenance.Yours, own.ProvenanceOf(LifeSettings.RetireMark));
        Assert.Equal(Provenance.EngineeringDefault, own.ProvenanceOf(LifeSettings.Trust));
        Assert.Equal("default, not yours", own.Known(LifeSettings.Trust).From);
    }

    [Fact]
    public void A_stored_value_out_of_bounds_is_said_and_the_default_acts()
    {
        AdviceSettings own = AdviceSettings.From(Own(LifeSettings.RetireMark, 7));
        Assert.Equal(0.80, own[LifeSettings.RetireMark]);
        Assert.Contains("lies outside 0.1 to 1", Assert.Single(own.Refused), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(2)]
    [InlineData(3)]
    [InlineData(5)]
    public void The_less_the_handbook_is_trusted_the_wider_the_band(double factor)
    {
        double narrower = AdviceSettings.From(Own(LifeSettings.Trust, factor)).Level.BandFactor;
        Assert.True(AdviceSettings.From(Own(LifeSettings.Trust, factor + 1)).Level.BandFactor > narrower);
    }

    [Fact]
    public void An_own_setting_reaches_the_answer()
    {
        ShopAdvice early = new(DemoShopFixture.Build(Own(LifeSettings.RetireMark, 0.39)));
        Assert.Equal(BladeLog.Advice.Life.GrindRefusal.LifeUsed, early.Of(early.Now.Blade("Q-34")!).Grind.Refusal);
        ShopAdvice gentle = new(DemoShopFixture.Build(Own(CutSettings.FeedOnCurve, 1)));
        Assert.Equal(1, gentle.For(gentle.Now.Cuts[0]).First!.Gate!.HighMps!.Value * 60, 9);
    }

    internal static string Row(SettingDefinition d) => string.Create(
        CultureInfo.InvariantCulture,
        $"| `{d.Key}` | {d.Words} | {d.Default:0.######} {d.Unit} | {d.Low:0.######} to {d.High:0.######} | {Marks[d.Provenance]} | {d.Acts} |").Replace("  |", " |", StringComparison.Ordinal);

    private static readonly Dictionary<Provenance, string> Marks = new()
    {
        [Provenance.Published] = "published",
        [Provenance.Derived] = "derived",
        [Provenance.CommonPractice] = "common practice",
        [Provenance.FromMemory] = "from memory",
        [Provenance.EngineeringDefault] = "engineering default",
    };

    private static Dictionary<string, Setting> Own(SettingDefinition definition, double value) => new()
    {
        [definition.Key] = new Setting { Key = definition.Key, Value = value, Typed = value.ToString(CultureInfo.InvariantCulture) },
    };
}
