using System.Globalization;
using System.Net;
using System.Text.Json;
using BladeLog.Features.Workings;
using BladeLog.Ui.Json;
using static BladeLog.Tests.Features.Workings.Bodies;

namespace BladeLog.Tests.Features.Workings;

/// <summary>Ten thousand bodies, sound, nearly sound and nonsense: each is answered or refused in sentences, never with a breakdown.</summary>
public sealed class RandomBodiesTests(EmptyShop shop) : IClassFixture<EmptyShop>
{
    private static readonly string[] Nonsense =
    [
        "null", "true", "false", "\"\"", "\"NaN\"", "\"12\"", "[]", "[[]]", "[null]", "{}", "{\"a\":1}", "0", "-0", "-1", "1e999", "-1e999", "1e-320",
        "1e308", "1e-300", "1e6", "0.1e-9", "\"\\ud800\"", "\"\\u0000\"", "[1,2,3,4,5,6,7,8]", "[0]", "[-5]", "[1e999]", "123456789012345678901234567890",
    ];

    private static readonly string[] Broken = ["", " ", "{", "}", "[", "null", "{\"a\":}", "{]", "\"", "{\"thickness_mm\":0.6", "\u0000", "{\"\\udc00\":1}", "[{}]", "nan"];

    [Theory]
    [InlineData("band-life", typeof(BandLifeIn), 11)]
    [InlineData("tension", typeof(TensionIn), 12)]
    [InlineData("thrust-limits", typeof(ThrustLimitsIn), 13)]
    [InlineData("cut", typeof(CutIn), 14)]
    public async Task Two_thousand_five_hundred_bodies_never_break_a_working(string working, Type type, int seed)
    {
        var random = new Random(seed);
        int answered = 0, refused = 0;
        for (var i = 0; i < 2500; i++)
        {
            var text = Body(random, working, type);
            using var answer = await shop.App.PostText($"/api/v1/workings/{working}", text);
            var said = await answer.Content.ReadAsStringAsync();
            Assert.True(answer.StatusCode is HttpStatusCode.OK or HttpStatusCode.BadRequest, $"{(int)answer.StatusCode} to {text}: {said}");
            Assert.DoesNotContain("NaN", said, StringComparison.Ordinal);
            Assert.DoesNotContain("Infinity", said, StringComparison.Ordinal);
            using var document = JsonDocument.Parse(said);
            if (answer.StatusCode == HttpStatusCode.OK)
            {
                answered++;
                AllFinite(document.RootElement, text);
                continue;
            }

            refused++;
            var errors = document.RootElement.GetProperty("errors").EnumerateObject().ToArray();
            Assert.NotEmpty(errors);
            Assert.All(errors, e => Assert.All(e.Value.EnumerateArray(), s => Assert.Matches(@"^\p{Lu}.*[.?]$", s.GetString())));
        }

        // Both kinds must have come up in plenty, or the test would show nothing.
        Assert.True(answered > 400 && refused > 400, $"{answered} answered, {refused} refused.");
    }

    private static string Body(Random random, string working, Type type)
    {
        var kind = random.Next(10);
        if (kind == 0)
        {
            return random.Next(2) == 0 ? Broken[random.Next(Broken.Length)] : Noise(random);
        }

        var body = Scattered(random, working, type, wild: kind is 1 or 2);
        if (kind >= 7)
        {
            for (var n = random.Next(1, 4); n > 0; n--)
            {
                var field = random.Next(4) == 0 ? Noise(random) : body.Keys.ElementAt(random.Next(body.Count));
                body[JsonEncodedText.Encode(field).ToString()] = Nonsense[random.Next(Nonsense.Length)];
            }
        }

        return body.Text();
    }

    /// <summary>A sound body with its numbers scattered, or (wild) each drawn anywhere from its bounds, ends included.</summary>
    private static Dictionary<string, string> Scattered(Random random, string working, Type type, bool wild)
    {
        var body = Of(working);
        foreach (var (name, field) in BodyFields.Of(type))
        {
            if (field.Type.IsEnum)
            {
                if (field.Required || random.Next(2) == 0)
                {
                    var words = BodyFields.WordsOf(field.Type).Keys.ToArray();
                    body[name] = $"\"{words[random.Next(words.Length)]}\"";
                }
            }
            else if (field.Type == typeof(bool))
            {
                body[name] = random.Next(2) == 0 ? "true" : "false";
            }
            else if (field.Type == typeof(List<double>))
            {
                body[name] = $"[{string.Join(",", Enumerable.Range(0, random.Next(1, 4)).Select(_ => Text(356 * Spread(random))))}]";
            }
            else if (field.Type == typeof(double) && (wild && (field.Required || random.Next(4) == 0)))
            {
                body[name] = Text(Drawn(random, field.Attribute));
            }
            else if (field.Type == typeof(double) && body.TryGetValue(name, out var sound))
            {
                body[name] = Text(double.Parse(sound, CultureInfo.InvariantCulture) * Spread(random));
            }
        }

        return body;
    }

    private static double Drawn(Random random, FieldAttribute field)
    {
        var low = double.IsFinite(field.Least) ? field.Least : field.Over;
        return random.Next(6) switch
        {
            0 => field.Most,
            1 => double.IsFinite(field.Least) ? field.Least : double.Epsilon,
            2 => low + 1e-9,
            3 => low + (field.Most - low) * Math.Pow(10, -6 * random.NextDouble()),
            _ => low + (field.Most - low) * random.NextDouble(),
        };
    }

    private static double Spread(Random random) => Math.Exp(0.25 * (random.NextDouble() + random.NextDouble() - 1));

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    private static string Noise(Random random) =>
        new([.. Enumerable.Range(0, random.Next(1, 20)).Select(_ => (char)random.Next(32, 127))]);

    private static void AllFinite(JsonElement element, string asked)
    {
        switch (element.ValueKind)
        {
            case JsonValueKind.Number:
                Assert.True(double.IsFinite(element.GetDouble()), asked);
                break;
            case JsonValueKind.Object:
                foreach (var p in element.EnumerateObject())
                {
                    AllFinite(p.Value, asked);
                }

                break;
            case JsonValueKind.Array:
                foreach (var item in element.EnumerateArray())
                {
                    AllFinite(item, asked);
                }

                break;
        }
    }
}
