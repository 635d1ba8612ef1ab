using System.Net;

namespace BladeLog.Tests.Features.Saws;

/// <summary>A tag typed with gloves on: no hyphen, no capitals, no nought, or the number alone.</summary>
public sealed class TypedTagTests(SampleApp sample) : IClassFixture<SampleApp>
{
    [Theory]
    [InlineData("q13", "Q-13")]
    [InlineData("Q13", "Q-13")]
    [InlineData("13", "Q-13")]
    [InlineData("q-13", "Q-13")]
    [InlineData("http://shop.local/b/Q-13", "Q-13")]
    [InlineData("9", "Q-09")]
    [InlineData("q9", "Q-09")]
    [InlineData("4b", "Q-04b")]
    public async Task The_swap_finds_the_one_blade_that_reads_so(string typed, string tag)
    {
        var page = await sample.Page($"/saws/S2/swap?on={Uri.EscapeDataString(typed)}");
        Assert.Equal(tag, page.QuerySelector("input[type=hidden][name=OnTag]")?.GetAttribute("value"));
    }

    [Theory]
    [InlineData("99")]
    [InlineData("x13")]
    [InlineData("-")]
    public async Task What_no_tag_reads_like_is_refused_in_a_sentence(string typed)
    {
        var page = await sample.Page($"/saws/S2/swap?on={typed}");
        Assert.Contains($"There is no blade {typed.ToUpperInvariant()}. Scan again, or tap one.", SampleApp.Text(page.Body), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Two_tags_that_read_alike_are_named()
    {
        await using var app = await ShopApp.Sample();
        await using (var db = app.NewContext())
        {
            var like = db.Blades.First(b => b.Tag == "Q-13");
            db.Blades.Add(new BladeLog.Records.Blade { Tag = "P-13", SpecId = like.SpecId, AddedUtc = ShopApp.Today.UtcDateTime });
            await db.SaveChangesAsync();
        }

        var text = SampleApp.Text((await app.GetPage("/saws/S2/swap?on=13")).Body);
        Assert.Contains("13 can be P-13 or Q-13: say which.", text, StringComparison.Ordinal);
        Assert.Equal("Q-13", (await app.GetPage("/saws/S2/swap?on=q13")).QuerySelector("input[type=hidden][name=OnTag]")?.GetAttribute("value"));
    }

    [Fact]
    public async Task The_rack_goes_to_a_whole_tag_however_it_is_typed_and_lists_for_a_number()
    {
        using var whole = await sample.App.Client.GetAsync("/rack?q=q13");
        Assert.Equal(HttpStatusCode.Redirect, whole.StatusCode);
        Assert.Equal("/blades/Q-13", whole.Headers.Location?.OriginalString);
        using var part = await sample.App.Client.GetAsync("/rack?q=3");
        Assert.Equal(HttpStatusCode.OK, part.StatusCode);
    }
}
