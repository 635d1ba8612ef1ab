using System.Net;

namespace BladeLog.Tests.Features.Saws;

public sealed class LeadTests
{
    [Fact]
    public async Task A_lead_is_told_at_the_swap_and_at_the_cut_until_the_blade_is_sharpened()
    {
        await using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage told = await app.PostForm("/blades/Q-08/drift", new() { ["Angle"] = "0.8", ["Side"] = "left", ["Who"] = "JP" });
        Assert.Equal(HttpStatusCode.Redirect, told.StatusCode);
        Assert.Contains("Q-08 leads 0.8° left: set the fence", SampleApp.Text((await app.GetPage("/cuts/2")).Body), StringComparison.Ordinal);
        Assert.Contains("Leads 0.8° left", SampleApp.Text((await app.GetPage("/blades/Q-08")).Body), StringComparison.Ordinal);

        using HttpResponseMessage rack = await app.PostForm("/blades/Q-09/drift", new() { ["Angle"] = "1.2", ["Side"] = "right", ["Saw"] = "S2" });
        Assert.Equal(HttpStatusCode.Redirect, rack.StatusCode);
        Assert.Contains("Leads 1.2° right: set the fence", SampleApp.Text((await app.GetPage("/saws/S2/swap?on=Q-09")).Body), StringComparison.Ordinal);
        app.Clock.Advance(TimeSpan.FromMinutes(5));
        using HttpResponseMessage sharp = await app.PostForm("/blades/Q-09/sharpen", new() { ["Kind"] = "Face", ["Width"] = "20.4", ["Who"] = "OT" });
        Assert.Equal(HttpStatusCode.Redirect, sharp.StatusCode);
        Assert.DoesNotContain("set the fence", SampleApp.Text((await app.GetPage("/saws/S2/swap?on=Q-09")).Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_lead_needs_its_side()
    {
        await using ShopApp app = await ShopApp.Sample();
        using HttpResponseMessage wrong = await app.PostForm("/blades/Q-08/drift", new() { ["Angle"] = "0.8" });
        Assert.Equal(HttpStatusCode.UnprocessableEntity, wrong.StatusCode);
    }

    /// <summary>Story of the idle saw.</summary>
    [Fact]
    public async Task The_saw_page_says_how_much_of_its_running_was_cutting()
    {
        await using ShopApp app = await ShopApp.Sample();
        Assert.Contains("883 h run since this record began. The cuts logged account for 41 %.", SampleApp.Text((await app.GetPage("/saws/S2")).Body), StringComparison.Ordinal);
    }
}
