using System.Net;

namespace BladeLog.Tests.Features.Shift;

public sealed class ShiftPageTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Fact]
    public async Task The_note_is_drafted_from_what_stands()
    {
        var draft = (await sample.Page("/handover")).QuerySelector("textarea")!.TextContent;
        Assert.Contains("Hold: Q-14, crack 2.6 mm", draft, StringComparison.Ordinal);
        Assert.Contains("on H-1", draft, StringComparison.Ordinal);
        Assert.Contains("At the sharpener: B-031 (Q-07 Q-10 Q-33 Q-34 Q-35)", draft, StringComparison.Ordinal);
        Assert.Contains("Longreach has one sharp spare (Q-40)", draft, StringComparison.Ordinal);

        // An auto-draft is at most one screen.
        Assert.DoesNotContain("Q-22", draft, StringComparison.Ordinal);
        Assert.InRange(draft.Split('\n').Length, 3, 12);
    }

    [Fact]
    public async Task The_note_orders_what_the_stock_page_orders_in_its_words()
    {
        var draft = (await sample.Page("/handover")).QuerySelector("textarea")!.TextContent.Split('\n').Single(l => l.StartsWith("Stock: ", StringComparison.Ordinal));
        string[] noted = [.. draft["Stock: ".Length..].TrimEnd('.').Split(", ")];
        string[] now = [.. (await sample.Page("/stock")).QuerySelectorAll("section .state").Select(s => SampleApp.Text(s)).Where(s => s.StartsWith("Order ", StringComparison.Ordinal))];
        Assert.Equal(now.Count(n => n.EndsWith(" now", StringComparison.Ordinal)), noted.Count(n => n.EndsWith(" now", StringComparison.Ordinal)));
        Assert.All(noted, n => Assert.Contains("O" + n[1..], now));
    }

    [Fact]
    public async Task The_sample_shop_has_eleven_notes_and_the_last_was_read_by_JP()
    {
        var notes = (await sample.Page("/handover")).QuerySelectorAll(".list>li");
        Assert.Equal(11, notes.Length);
        Assert.Contains("read by JP", SampleApp.Text(notes[0]), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_saved_note_stands_first_until_somebody_ticks_it()
    {
        await using var app = await ShopApp.Sample();
        using var saved = await app.PostForm("/handover", new() { ["Text"] = "The hose is leaking.\nOT knows.", ["Who"] = "RU" });
        Assert.Equal(HttpStatusCode.Redirect, saved.StatusCode);
        var first = (await app.GetPage("/handover")).QuerySelector(".list>li")!;
        Assert.Contains("RUThe hose is leaking.OT knows.", SampleApp.Text(first), StringComparison.Ordinal);
        Assert.Contains("not read yet", SampleApp.Text(first), StringComparison.Ordinal);
        var read = first.ParentElement!.QuerySelector("form[action$='/read']") ?? throw new InvalidOperationException("no tick");
        Assert.DoesNotContain("I have read it", SampleApp.Text(first), StringComparison.Ordinal);

        var id = await Entry(app);
        using var ticked = await app.PostForm($"/handover/{id}/read", new() { ["Who"] = "JP" }, "/handover");
        Assert.Equal(HttpStatusCode.Redirect, ticked.StatusCode);
        Assert.Contains("read by JP", SampleApp.Text((await app.GetPage("/handover")).QuerySelector(".list>li")), StringComparison.Ordinal);
        using var twice = await app.PostForm($"/handover/{id}/read", new() { ["Who"] = "JP" }, "/handover");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, twice.StatusCode);
        Assert.NotNull(read);
    }

    [Fact]
    public async Task An_empty_note_and_a_note_from_nobody_are_refused()
    {
        await using var app = await ShopApp.Sample();
        using var nobody = await app.PostForm("/handover", new() { ["Text"] = "x" });
        Assert.Equal(HttpStatusCode.UnprocessableEntity, nobody.StatusCode);
        using var empty = await app.PostForm("/handover", new() { ["Text"] = " ", ["Who"] = "RU" });
        Assert.Equal(HttpStatusCode.UnprocessableEntity, empty.StatusCode);
    }

    [Fact]
    public async Task The_matrix_is_six_people_by_five_saws_and_two_have_expired()
    {
        var page = await sample.Page("/training");
        Assert.Equal("Training: 2 have expired", page.QuerySelector("h1")!.TextContent);
        Assert.Equal(["Able until", "Old Heron", "Osprey", "Wren", "Finch", "Longreach", "All saws"], page.QuerySelectorAll(".matrix thead th").Select(h => h.TextContent));
        Assert.Equal(["IC", "JP", "MI", "OT", "PR", "RU"], page.QuerySelectorAll(".matrix th[scope=rowgroup]").Select(h => h.TextContent));
        Assert.Equal(2, page.QuerySelectorAll(".matrix .state").Length);
    }

    private static async Task<int> Entry(ShopApp app)
    {
        await using var db = app.NewContext();
        return db.HandOvers.OrderByDescending(h => h.EntryId).Select(h => h.EntryId).First();
    }
}
