using AngleSharp.Dom;

namespace BladeLog.Tests.Features.Record;

/// <summary>The record tells of an edit which thing it was and what became of what; of an undo, that it is undone.</summary>
public sealed class EditedThingsTests
{
    [Fact]
    public async Task An_edit_names_the_thing_and_each_figure_before_and_after()
    {
        using ShopApp app = await ShopApp.Sample();
        await app.Be("MI");
        Done(await app.Fill("/specs/C1/edit", ("Kerf", "1.15 mm")));
        app.Clock.Advance(TimeSpan.FromMinutes(1));
        Done(await app.Fill("/specs/C1/edit", ("Kerf", "1.2 mm")));
        string[] lines = await Lines(app);
        Assert.Contains(lines, l => l.StartsWith("A specification was changed: C1, kerf 1.1 mm to 1.15 mm", StringComparison.Ordinal));
        Assert.Contains(lines, l => l.StartsWith("A specification was changed: C1, kerf 1.15 mm to 1.2 mm", StringComparison.Ordinal));
    }

    [Fact]
    public async Task A_setting_is_named_with_what_it_was_and_is()
    {
        using ShopApp app = await ShopApp.Sample();
        Done(await app.Fill("/setup/blade.grind", ("Value", "0.3")));
        Done(await app.Fill("/setup", ("Rate", "52.50")));
        string[] lines = await Lines(app);
        Assert.Contains(lines, l => l.StartsWith("A setting was changed: Width lost in one sharpening, the default of 0.2 mm to 0.3 mm", StringComparison.Ordinal));
        Assert.Contains(lines, l => l.StartsWith("The shop's own figures were changed: shop rate an hour 48.00 to 52.50", StringComparison.Ordinal));
    }

    [Fact]
    public async Task Blades_that_were_added_are_named()
    {
        using ShopApp app = await ShopApp.Sample();
        Done(await app.Fill("/blades/new", ("Tags", "N-1 N-2"), ("Spec", "C1")));
        Assert.Contains(await Lines(app), l => l.StartsWith("Blades were added: N-1, N-2", StringComparison.Ordinal));
        Assert.Contains("tap the entry", SampleApp.Text((await app.GetPage("/record")).QuerySelector(".lede")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task After_an_undo_the_title_block_says_undone_and_what()
    {
        using ShopApp app = await ShopApp.Sample();
        await app.Be("JP");
        Done(await app.Fill("/blades/Q-11/hold", ("Kind", "Damage")));
        IDocument page = await app.GetPage("/blades/Q-11");
        string what = SampleApp.Text(page.QuerySelector(".block .undo span"));
        Assert.StartsWith("Saved", SampleApp.Text(page.QuerySelector("#saved")), StringComparison.Ordinal);
        Done(await app.SendForm(page, page.QuerySelector(".block .undo")!.GetAttribute("action")!));
        page = await app.GetPage("/blades/Q-11");
        Assert.Equal("Undone 10:30", SampleApp.Text(page.QuerySelector("#saved dt")));
        Assert.Equal(what, SampleApp.Text(page.QuerySelector("#saved dd")));
        Assert.True(what.Length > 0);
        // What stands there is read aloud by the script from #saved into the one place with the role of a status.
        Assert.Equal("status", page.QuerySelector("#told")!.GetAttribute("role"));
        Assert.Null(page.QuerySelector(".block .undo"));
        Done(await app.Fill("/blades/Q-11/hold", ("Kind", "Damage")));
        Assert.Equal("Saved", SampleApp.Text((await app.GetPage("/")).QuerySelector("#saved dt")));
    }

    private static void Done(Answered answer) => Assert.True(answer.Status == System.Net.HttpStatusCode.Redirect, answer.Text);

    private static async Task<string[]> Lines(ShopApp app) => [.. (await app.GetPage("/record")).QuerySelectorAll(".entries li").Take(6).Select(SampleApp.Text)];
}
