using System.Text.Json;

namespace BladeLog.Browser.Tests;

/// <summary>The colours of states stay apart for three kinds of colour vision, and their shapes stay apart without any colour.</summary>
public sealed class ColoursTests(Workbench bench) : IClassFixture<Workbench>
{
    /// <summary>Least distance in Lab, CIE 1976: the look's own figure; 2.3 is what an eye just tells apart (Mahy and others, 1994).</summary>
    private const double Apart = 15;

    /// <summary>Machado, Oliveira and Fernandes, IEEE TVCG 15(6), 2009: protan, deutan and tritan at full strength, on linear RGB.</summary>
    private static readonly (string Eye, double[] Matrix)[] Eyes =
    [
        ("every cone", [1, 0, 0, 0, 1, 0, 0, 0, 1]),
        ("no long cones", [0.152286, 1.052583, -0.204868, 0.114503, 0.786281, 0.099216, -0.003882, -0.048116, 1.051998]),
        ("no middle cones", [0.367322, 0.860646, -0.227968, 0.280085, 0.672501, 0.047413, -0.011820, 0.042940, 0.968881]),
        ("no short cones", [1.255528, -0.076749, -0.178779, -0.078411, 0.930809, 0.147602, 0.004733, 0.691367, 0.303900]),
    ];

    private static readonly string[] Vision = ["none", "achromatopsia", "protanopia", "deuteranopia", "tritanopia"];

    [BrowserTheory]
    [InlineData(ColorScheme.Light)]
    [InlineData(ColorScheme.Dark)]
    public async Task State_colours_stay_apart_for_every_kind_of_colour_vision(ColorScheme scheme)
    {
        var at = await LookedAt.Get();
        await bench.At(at.Shop, Screen.Standing, async tablet =>
        {
            await tablet.Page.EmulateMediaAsync(new() { ColorScheme = scheme });
            await tablet.Open("/");
            var names = new[] { "go", "look", "stop", "touch" };
            var colours = await tablet.Page.EvaluateAsync<string[]>("names => names.map(n => getComputedStyle(document.documentElement).getPropertyValue('--' + n).trim())", names);
            foreach (var (eye, matrix) in Eyes)
            {
                for (var i = 0; i < names.Length; i++)
                {
                    for (var j = i + 1; j < names.Length; j++)
                    {
                        var distance = Distance(Lab(colours[i], matrix), Lab(colours[j], matrix));
                        Assert.True(distance >= Apart, $"{names[i]} and {names[j]} are {distance:0.0} apart for an eye with {eye}.");
                    }
                }
            }
        });
    }

    /// <summary>Pictures of the marks as the browser draws them for each eye: no two states look alike, and each stands out from the paper.</summary>
    [BrowserFact]
    public async Task State_marks_are_told_apart_in_grey_and_by_every_kind_of_colour_vision()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await tablet.Open("/saws/S4/slack");
            await tablet.Tap(tablet.Button("Off: slack for the night"));
            await tablet.IsAt("/saws/S4");
            await tablet.Open("/saws/S3/swap");
            await tablet.Tap(tablet.Choice("Other work"));
            await tablet.Tap(tablet.Button("Only take Q-17 off"));
            await tablet.IsAt("/saws/S3");
            await tablet.Open("/saws/S2/clicking");
            await tablet.Tap(tablet.Button("It clicks: stop and hold Q-08"));
            await Expect(tablet.Title).ToContainTextAsync("Stop Osprey");
            await tablet.Open("/");
            foreach (var (saw, word) in new[] { ("S1", "runs"), ("S2", "hold"), ("S3", "empty"), ("S4", "slack"), ("S5", "sharpen") })
            {
                await Expect(tablet.Tile(saw).Locator(".state")).ToHaveTextAsync(word);
            }

            var eyes = await tablet.Page.Context.NewCDPSessionAsync(tablet.Page);
            foreach (var eye in Vision)
            {
                await eyes.SendAsync("Emulation.setEmulatedVisionDeficiency", new() { ["type"] = eye });
                var pictures = new List<string>();
                foreach (var saw in new[] { "S1", "S2", "S3", "S4", "S5" })
                {
                    pictures.Add(Convert.ToBase64String(await tablet.Tile(saw).Locator(".state .shape").ScreenshotAsync()));
                }

                var shares = await tablet.Page.EvaluateAsync<JsonElement>(Compare, pictures);
                foreach (var share in shares.GetProperty("between").EnumerateArray().Select(s => s.GetDouble()))
                {
                    Assert.True(share >= 0.10, $"Two marks differ in {share:P0} of their picture only ({eye}).");
                }

                foreach (var share in shares.GetProperty("drawn").EnumerateArray().Select(s => s.GetDouble()))
                {
                    Assert.True(share >= 0.08, $"A mark fills {share:P0} of its picture only ({eye}).");
                }
            }
        });
    }

    /// <summary>The share of dots whose lightness differs by more than a fifth of the scale: between two marks, and from a mark's own corner.</summary>
    private const string Compare =
        """
        async pictures => {
          const side = 40, greys = [];
          for (const picture of pictures) {
            const image = new Image();
            image.src = 'data:image/png;base64,' + picture;
            await image.decode();
            const pen = Object.assign(document.createElement('canvas'), { width: side, height: side }).getContext('2d');
            pen.drawImage(image, 0, 0, side, side);
            const d = pen.getImageData(0, 0, side, side).data;
            greys.push(Array.from({ length: side * side }, (_, i) => 0.2126 * d[4 * i] + 0.7152 * d[4 * i + 1] + 0.0722 * d[4 * i + 2]));
          }
          const share = (a, b) => a.filter((v, i) => Math.abs(v - b[i]) > 51).length / a.length;
          const between = [];
          for (let i = 0; i < greys.length; i++) for (let j = i + 1; j < greys.length; j++) between.push(share(greys[i], greys[j]));
          return { between, drawn: greys.map(g => share(g, g.map(() => g[0]))) };
        }
        """;

    private static double Distance((double L, double A, double B) x, (double L, double A, double B) y) =>
        Math.Sqrt(((x.L - y.L) * (x.L - y.L)) + ((x.A - y.A) * (x.A - y.A)) + ((x.B - y.B) * (x.B - y.B)));

    /// <summary>sRGB to linear (IEC 61966-2-1), the eye's matrix, XYZ at D65, CIE 1976 L*a*b*.</summary>
    private static (double L, double A, double B) Lab(string hex, double[] m)
    {
        var rgb = new[] { 1, 3, 5 }.Select(i => Convert.ToInt32(hex.Substring(i, 2), 16) / 255.0).Select(v => v <= 0.04045 ? v / 12.92 : Math.Pow((v + 0.055) / 1.055, 2.4)).ToArray();
        var seen = new[] { 0, 3, 6 }.Select(r => Math.Clamp((m[r] * rgb[0]) + (m[r + 1] * rgb[1]) + (m[r + 2] * rgb[2]), 0, 1)).ToArray();
        var x = ((0.4124564 * seen[0]) + (0.3575761 * seen[1]) + (0.1804375 * seen[2])) / 0.95047;
        var y = (0.2126729 * seen[0]) + (0.7151522 * seen[1]) + (0.0721750 * seen[2]);
        var z = ((0.0193339 * seen[0]) + (0.1191920 * seen[1]) + (0.9503041 * seen[2])) / 1.08883;
        static double F(double t) => t > 216.0 / 24389 ? Math.Cbrt(t) : ((24389.0 / 27 * t) + 16) / 116;
        return ((116 * F(y)) - 16, 500 * (F(x) - F(y)), 200 * (F(y) - F(z)));
    }
}
