using System.Net;
using static BladeLog.Tests.Features.Workings.Bodies;

namespace BladeLog.Tests.Features.Workings;

/// <summary>What cannot be is refused with a sentence for the field it is about, and the answer is problem details.</summary>
public sealed class RefusalTests(EmptyShop shop) : IClassFixture<EmptyShop>
{
    [Theory]
    // Missing and null.
    [InlineData("band-life", "thickness_mm", null, "thickness_mm", "Missing: the band's thickness in mm.")]
    [InlineData("band-life", "thickness_mm", "null", "thickness_mm", "Missing: the band's thickness in mm.")]
    [InlineData("tension", "width_mm", null, "width_mm", "Missing: the width over the teeth in mm.")]
    [InlineData("thrust-limits", "guide_span_mm", "null", "guide_span_mm", "Missing: the span between the guides in mm.")]
    [InlineData("cut", "tip", null, "tip", "Missing: the tip.")]
    [InlineData("cut", "tooth_form", "null", "tooth_form", "Missing: the tooth form.")]
    // Not a number.
    [InlineData("band-life", "loop_mm", "\"2360\"", "loop_mm", "The length of the loop in mm is a number without quotes.")]
    [InlineData("band-life", "loop_mm", "\"NaN\"", "loop_mm", "The length of the loop in mm is a number without quotes.")]
    [InlineData("cut", "pitch_mm", "true", "pitch_mm", "The mean pitch in mm is a number without quotes.")]
    [InlineData("cut", "pitch_mm", "[8.5]", "pitch_mm", "The mean pitch in mm is a number without quotes.")]
    [InlineData("thrust-limits", "tension_mpa", "{}", "tension_mpa", "The running tension on the body in MPa is a number without quotes.")]
    [InlineData("tension", "wheel_load_n", "1e999", "wheel_load_n", "The load on the movable wheel in N is too large a number to work with.")]
    [InlineData("band-life", "tension_mpa", "-1e999", "tension_mpa", "The tension on the body at rest in MPa is too large a number to work with.")]
    // Out of bounds.
    [InlineData("band-life", "thickness_mm", "-0.6", "thickness_mm", "The band's thickness in mm must be more than 0.")]
    [InlineData("band-life", "thickness_mm", "0", "thickness_mm", "The band's thickness in mm must be more than 0.")]
    [InlineData("band-life", "thickness_mm", "6", "thickness_mm", "The band's thickness in mm must lie above 0 and at 5 at the most.")]
    [InlineData("band-life", "tension_mpa", "-1", "tension_mpa", "The tension on the body at rest in MPa must lie between 0 and 600.")]
    [InlineData("band-life", "body_hrc", "70", "body_hrc", "The hardness of the body in HRC must lie between 20 and 58.")]
    [InlineData("cut", "rake_deg", "-21", "rake_deg", "The hook angle in degrees must lie between -20 and 40.")]
    [InlineData("cut", "gullet_fill_limit", "1.01", "gullet_fill_limit", "at 1 at the most")]
    [InlineData("cut", "moisture_pct", "-1", "moisture_pct", "must lie between 0 and 300")]
    [InlineData("thrust-limits", "poisson", "0.5", "poisson", "must lie between 0 and 0.49")]
    // Unknown and wrong words.
    [InlineData("band-life", "thicknes_mm", "0.6", "thicknes_mm", "There is no such field. Did you mean thickness_mm?")]
    [InlineData("cut", "colour", "1", "colour", "There is no such field.")]
    [InlineData("cut", "tip", "\"brazed\"", "tip", "The tip is one of: set, swaged, tipped.")]
    [InlineData("cut", "tip", "2", "tip", "The tip is one of: set, swaged, tipped.")]
    [InlineData("cut", "tip", "\"\\ud800\"", "tip", "The tip is one of: set, swaged, tipped.")]
    [InlineData("cut", "tooth_form", "\"Hook\"", "tooth_form", "The tooth form is one of: regular, skip, hook.")]
    [InlineData("cut", "direction", "\"up\"", "direction", "The direction of the cut is one of: rip, cross.")]
    [InlineData("cut", "frozen", "\"yes\"", "frozen", "Whether the wood is frozen is true or false.")]
    [InlineData("band-life", "weld", "\"bad\"", "weld", "The weld is one of: good, doubtful, best.")]
    [InlineData("band-life", "tension_system", "\"loose\"", "tension_system", "The tension system is one of: sprung, locked.")]
    // Lists.
    [InlineData("band-life", "wheels_mm", "[]", "wheels_mm", "with at least one value")]
    [InlineData("band-life", "wheels_mm", "356", "wheels_mm", "is a list in [ ]")]
    [InlineData("band-life", "wheels_mm", "[356, null]", "wheels_mm[1]", "is a number without quotes")]
    [InlineData("band-life", "wheels_mm", "[356, -1]", "wheels_mm[1]", "must be more than 0")]
    [InlineData("band-life", "wheels_mm", "[1,2,3,4,5,6,7]", "wheels_mm", "has 7 values; 6 are the most")]
    // Together impossible.
    [InlineData("band-life", "wheels_mm", "[356, 10]", "wheels_mm[1]", "cannot lie on a wheel of 10 mm")]
    [InlineData("band-life", "loop_mm", "1000", "loop_mm", "shorter than the way round one wheel")]
    [InlineData("tension", "gullet_mm", "13", "gullet_mm", "leaves no body")]
    [InlineData("tension", "force_n", "700", "body", "Give one of: force_n, wheel_load_n")]
    [InlineData("tension", "wheel_load_n", null, "body", "Give one of: force_n, wheel_load_n")]
    [InlineData("tension", "stretch_mm", "0.1", "gauge_length_mm", "Missing: give both the stretch and the length it was measured over.")]
    [InlineData("tension", "free_span_mm", "400", "pluck_hz", "Missing: give both the note and the free span.")]
    [InlineData("tension", "free_span_mm", "149", "free_span_mm", "must lie between 150 and 10000")]
    [InlineData("thrust-limits", "gullet_mm", "25", "gullet_mm", "leaves no body")]
    [InlineData("thrust-limits", "thickness_mm", "5", "gullet_mm", null)]
    [InlineData("thrust-limits", "cut_height_mm", "201", "cut_height_mm", "the guides stand only 200 mm apart")]
    [InlineData("thrust-limits", "cut_centre_mm", "70", "cut_centre_mm", "reaches beyond a guide")]
    [InlineData("thrust-limits", "cut_centre_mm", "130", "cut_centre_mm", "reaches beyond a guide")]
    [InlineData("cut", "gullet_mm", "20", "gullet_mm", "leaves no body")]
    [InlineData("cut", "kerf_mm", "0.6", "kerf_mm", "has no room for a body 0.6 mm thick")]
    [InlineData("cut", "loop_mm", "16", "loop_mm", "has no two teeth 8.5 mm apart")]
    public async Task A_field_that_cannot_be_is_named_and_said(string working, string field, string? raw, string at, string? sentence)
    {
        var body = Of(working).With(field, raw);
        if (sentence is null)
        {
            // Thick against a body made narrow by its gullet.
            body = body.With("gullet_mm", "21");
            (at, sentence) = ("thickness_mm", "is not a band on a body 4 mm wide");
        }

        await Refused(working, body.Text(), at, sentence);
    }

    [Theory]
    [InlineData("", "The body is not JSON.")]
    [InlineData("thickness=0.9", "The body is not JSON.")]
    [InlineData("{\"thickness_mm\": NaN}", "The body is not JSON.")]
    [InlineData("{\"thickness_mm\": Infinity}", "The body is not JSON.")]
    [InlineData("{\"thickness_mm\": 0.9,}", "The body is not JSON.")]
    [InlineData("{\"thickness_mm\": 0.9", "The body is not JSON.")]
    [InlineData("{} {}", "The body is not JSON.")]
    [InlineData("[1, 2]", "Send an object with named fields in { }.")]
    [InlineData("[]", "Send an object with named fields in { }.")]
    [InlineData("null", "Send an object with named fields in { }.")]
    [InlineData("7", "Send an object with named fields in { }.")]
    [InlineData("\"band\"", "Send an object with named fields in { }.")]
    [InlineData("{\"\\ud800\": 1}", "A field's name has a character that cannot be read.")]
    public async Task A_body_that_is_no_object_is_refused_by_every_working(string text, string sentence)
    {
        foreach (var working in new[] { "band-life", "tension", "thrust-limits", "cut" })
        {
            await Refused(working, text, "body", sentence);
        }
    }

    [Fact]
    public async Task A_field_that_stands_twice_is_refused() =>
        await Refused("band-life", Of("band-life").Text()[..^1] + ",\"thickness_mm\":0.7}", "thickness_mm", "This field stands twice. Send it once.");

    [Fact]
    public async Task A_note_too_low_for_any_tension_is_refused_in_the_handbooks_words() =>
        await Refused("tension", Of("tension").With("wheel_load_n", null).With("pluck_hz", 2).With("free_span_mm", 450).Text(), "body", "A note this low means a slack band");

    [Fact]
    public async Task Every_wrong_field_is_said_at_once()
    {
        using var answer = await shop.App.PostText("/api/v1/workings/band-life", "{}");
        var errors = (await ShopApp.Json(answer)).GetProperty("errors").EnumerateObject().Select(e => e.Name).Order(StringComparer.Ordinal);
        Assert.Equal(["band_speed_m_s", "body_hrc", "loop_mm", "tension_mpa", "thickness_mm", "wheels_mm"], errors);
    }

    private async Task Refused(string working, string text, string at, string sentence)
    {
        using var answer = await shop.App.PostText($"/api/v1/workings/{working}", text);
        var said = await answer.Content.ReadAsStringAsync();
        Assert.True(answer.StatusCode == HttpStatusCode.BadRequest, $"{working} answered {(int)answer.StatusCode} to {text}: {said}");
        Assert.Equal("application/problem+json", answer.Content.Headers.ContentType?.MediaType);
        var problem = await ShopApp.Json(answer);
        Assert.Equal(400, problem.GetProperty("status").GetInt32());
        Assert.True(problem.GetProperty("errors").TryGetProperty(at, out var sentences), said);
        Assert.Contains(sentences.EnumerateArray(), s => s.GetString()!.Contains(sentence, StringComparison.Ordinal));
    }
}
