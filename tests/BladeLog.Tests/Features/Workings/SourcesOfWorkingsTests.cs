using System.Text.RegularExpressions;
using BladeLog.Features;
using BladeLog.Tests.House;
using static BladeLog.Tests.Features.Workings.Bodies;

namespace BladeLog.Tests.Features.Workings;

public sealed partial class SourcesOfWorkingsTests(EmptyShop shop) : IClassFixture<EmptyShop>
{
    public static TheoryData<string, string, string?> Asked => new()
    {
        { "band-life", "width_mm", "30" },
        { "band-life", "cut_valley_mpa", "20" },
        { "tension", "wheel_load_n", "900" },
        { "tension", "wheel_load_n", null },
        { "thrust-limits", "band_speed_m_s", "15" },
        { "cut", "band_power_w", "1500" },
    };

    [Theory]
    [MemberData(nameof(Asked))]
    public async Task Every_source_of_a_working_stands_in_the_list_of_sources(string working, string field, string? raw)
    {
        var body = Of(working).With(field, raw);
        if (raw is null)
        {
            body = body.With("pluck_hz", 120).With("free_span_mm", 450);
        }

        var keys = (await shop.App.Ask(working, body)).GetProperty("sources").EnumerateArray().Select(s => s.GetString()!).ToArray();
        Assert.NotEmpty(keys);
        Assert.Equal(keys.Distinct(), keys);
        Assert.Empty(keys.Except(Listed()));
    }

    [Fact]
    public void Every_source_of_a_blade_and_of_a_choice_stands_in_it_too()
    {
        Assert.Empty(AnswerSources.Blade.Concat(AnswerSources.Choice).Except(Listed()));
        Assert.Equal(AnswerSources.Choice.Distinct(), AnswerSources.Choice);
    }

    private static HashSet<string> Listed() =>
        [.. File.ReadLines(Path.Combine(Tree.Root, "docs/sources.md")).Select(l => Row().Match(l)).Where(m => m.Success).Select(m => m.Groups[1].Value)];

    [GeneratedRegex(@"^\| ([a-z0-9-]+) \|")]
    private static partial Regex Row();
}
