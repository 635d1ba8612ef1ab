using BladeLog.Tests.Features;

namespace BladeLog.Tests.EdgeCases;

/// <summary>What the person at the saw says of an edge counts, whatever the path of wood says.</summary>
public sealed class DullBladeTests
{
    [Fact]
    public async Task A_blade_that_came_off_as_dull_is_offered_for_nothing_until_it_is_ground()
    {
        using var app = await ShopApp.Sample();
        Assert.Contains("Q-17", SampleApp.Text((await app.GetPage("/cuts/1")).QuerySelector("h1")), StringComparison.Ordinal);
        (await app.Fill("/saws/S3/swap", ("Reason", "Dull"), ("OnlyOff", "1"))).LeadsTo("/saws/S3");

        Assert.DoesNotContain("Q-17", SampleApp.Text((await app.GetPage("/cuts/1")).QuerySelector("h1")), StringComparison.Ordinal);
        Assert.Contains("came off as dull", SampleApp.Text((await app.GetPage("/cuts/1")).Body), StringComparison.Ordinal);
        Assert.Null((await app.GetPage("/saws/S3/swap")).QuerySelector("input[name=OnTag][value='Q-17']"));
        Assert.Contains("Q-17", SampleApp.Text((await app.GetPage("/rack?show=sharpen")).Body), StringComparison.Ordinal);
        Assert.Contains("Sharpen it", (await app.GetPage("/blades/Q-17")).Body!.TextContent, StringComparison.OrdinalIgnoreCase);

        app.Clock.Advance(TimeSpan.FromMinutes(10));
        (await app.Fill("/blades/Q-17/sharpen", ("Kind", "Face"))).LeadsTo("/blades/Q-17");
        Assert.Contains("Q-17", SampleApp.Text((await app.GetPage("/cuts/1")).QuerySelector("main")), StringComparison.Ordinal);
        Assert.DoesNotContain("came off as dull", SampleApp.Text((await app.GetPage("/cuts/1")).Body), StringComparison.Ordinal);
    }
}
