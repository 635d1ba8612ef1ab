using System.Globalization;
using System.Text.RegularExpressions;
using BladeLog.Ui.Pictures.Geometry;
using ZXing;
using ZXing.Common;
using ZXing.QrCode;
using ZXing.QrCode.Internal;

namespace BladeLog.Tests.Ui;

/// <summary>A printed code read back by an independent reader, clean and through dust.</summary>
public partial class QrCodeTests
{
    private const int Dots = 12;

    [Theory]
    [InlineData("Q-01")]
    [InlineData("Q-04B")]
    [InlineData("http://saws.local:5080/b/Q-04b")]
    [InlineData("http://sawshop.home.arpa/b/ABCDEFGH-1.2")]
    public void A_clean_code_reads_as_what_it_holds(string text) => Assert.Equal(text, Read(Raster(QrGeometry.Of(text))));

    /// <summary>Dust smaller than a module over a fifth of the print.</summary>
    [Theory]
    [InlineData("Q-08")]
    [InlineData("http://saws.local:5080/b/Q-04b")]
    public void A_code_is_read_through_specks_over_a_fifth_of_it(string text)
    {
        for (var seed = 0; seed < 25; seed++)
        {
            var dots = Raster(QrGeometry.Of(text));
            var share = Blot(dots, new Random(seed), 0.20, 0.15, 0.35, spareCorners: false);
            Assert.InRange(share, 0.20, 0.21);
            Assert.Equal(text, Decoded(dots));
        }
    }

    /// <summary>The fourth corner of the label worn white, a fifth of what lies outside the three corner squares.</summary>
    [Fact]
    public void A_code_is_read_with_a_fifth_of_it_worn_off()
    {
        foreach (var text in Enumerable.Range(1, 60).SelectMany(n => new[] { $"Q-{n:00}", $"http://saws.local:5080/b/Q-{n:00}" }))
        {
            var code = QrGeometry.Of(text);
            var dots = Raster(code);
            var (last, free) = ((code.Side - QrGeometry.QuietZone) * Dots, Free(code.Side));
            var worn = (int)Math.Ceiling(Math.Sqrt(0.20 * free));
            for (var y = last - worn; y < last; y++)
            {
                for (var x = last - worn; x < last; x++)
                {
                    dots[y, x] = false;
                }
            }

            Assert.True(Decoded(dots) == text, $"{text} is not read.");
        }
    }

    /// <summary>
    /// Oil and dust larger than a module, anywhere but on the corner squares. A blot spoils every code word it touches, so
    /// a fifth of the surface in such blots is beyond any level (level H mends under a third of the code words).
    /// </summary>
    [Theory]
    [InlineData("Q-08")]
    [InlineData("http://saws.local:5080/b/Q-04b")]
    public void A_code_is_read_through_large_blots_over_a_twentieth_of_it(string text)
    {
        var read = Enumerable.Range(0, 100).Count(seed =>
        {
            var dots = Raster(QrGeometry.Of(text));
            Blot(dots, new Random(seed), 0.05, 1, 2, spareCorners: true);
            return Decoded(dots) == text;
        });
        Assert.InRange(read, 95, 100);
    }

    [Fact]
    public void The_quiet_zone_is_four_modules_all_round()
    {
        var code = QrGeometry.Of("http://saws.local/b/Q-08");
        var modules = Modules(code);
        for (var y = 0; y < code.Side; y++)
        {
            for (var x = 0; x < code.Side; x++)
            {
                if (x < 4 || y < 4 || x >= code.Side - 4 || y >= code.Side - 4)
                {
                    Assert.False(modules[y, x]);
                }
            }
        }

        // The corners of the three finder squares are where the zone ends.
        Assert.True(modules[4, 4] && modules[4, code.Side - 5] && modules[code.Side - 5, 4]);
    }

    internal static string? Read(bool[,] dots)
    {
        var side = dots.GetLength(0);
        var grey = new byte[side * side];
        for (var i = 0; i < grey.Length; i++)
        {
            grey[i] = dots[i / side, i % side] ? (byte)0 : (byte)255;
        }

        var source = new RGBLuminanceSource(grey, side, side, RGBLuminanceSource.BitmapFormat.Gray8);
        var hints = new Dictionary<DecodeHintType, object> { [DecodeHintType.TRY_HARDER] = true };
        return new QRCodeReader().decode(new BinaryBitmap(new HybridBinarizer(source)), hints)?.Text
            ?? new QRCodeReader().decode(new BinaryBitmap(new GlobalHistogramBinarizer(source)), hints)?.Text;
    }

    /// <summary>The path of the picture, module by module: "M4 4h7v1h-7z" is a run of seven.</summary>
    internal static bool[,] Modules(QrGeometry code)
    {
        var modules = new bool[code.Side, code.Side];
        foreach (Match run in Run().Matches(code.Path))
        {
            int Part(int n) => int.Parse(run.Groups[n].ValueSpan, CultureInfo.InvariantCulture);
            for (var i = 0; i < Part(3); i++)
            {
                modules[Part(2), Part(1) + i] = true;
            }
        }

        return modules;
    }

    private static bool[,] Raster(QrGeometry code)
    {
        var modules = Modules(code);
        var dots = new bool[code.Side * Dots, code.Side * Dots];
        for (var y = 0; y < dots.GetLength(0); y++)
        {
            for (var x = 0; x < dots.GetLength(1); x++)
            {
                dots[y, x] = modules[y / Dots, x / Dots];
            }
        }

        return dots;
    }

    /// <summary>
    /// What a reader that has found the grid makes of the print: each module dark or light by its greater part, then the
    /// independent decoder. A camera gets many tries at finding the grid; how much dirt a code stands is its correction's affair.
    /// </summary>
    private static string? Decoded(bool[,] dots)
    {
        var side = (dots.GetLength(0) / Dots) - (2 * QrGeometry.QuietZone);
        var modules = new bool[side][];
        for (var y = 0; y < side; y++)
        {
            modules[y] = new bool[side];
            for (var x = 0; x < side; x++)
            {
                var dark = 0;
                for (var i = 0; i < Dots * Dots; i++)
                {
                    dark += dots[((y + QrGeometry.QuietZone) * Dots) + (i / Dots), ((x + QrGeometry.QuietZone) * Dots) + (i % Dots)] ? 1 : 0;
                }

                modules[y][x] = 2 * dark > Dots * Dots;
            }
        }

        return new Decoder().decode(modules, new Dictionary<DecodeHintType, object>())?.Text;
    }

    private static bool InCorner(int x, int y, int side)
    {
        var (first, last, corner) = (QrGeometry.QuietZone * Dots, (side - QrGeometry.QuietZone) * Dots, 8 * Dots);
        return (x < first + corner && y < first + corner) || (x >= last - corner && y < first + corner) || (x < first + corner && y >= last - corner);
    }

    /// <summary>Dots of the code outside its three corner squares.</summary>
    private static int Free(int side)
    {
        var (size, corner) = ((side - (2 * QrGeometry.QuietZone)) * Dots, 8 * Dots);
        return (size * size) - (3 * corner * corner);
    }

    /// <summary>Round blots, black as oil or white as dust, of so many modules' radius, until this share of the code is under them.</summary>
    private static double Blot(bool[,] dots, Random random, double share, double least, double most, bool spareCorners)
    {
        var side = dots.GetLength(0) / Dots;
        var (first, last) = (QrGeometry.QuietZone * Dots, (side - QrGeometry.QuietZone) * Dots);
        var all = spareCorners ? Free(side) : (last - first) * (last - first);
        var under = new bool[dots.GetLength(0), dots.GetLength(1)];
        var covered = 0;
        while (covered < share * all)
        {
            var radius = (least + ((most - least) * random.NextDouble())) * Dots;
            var (cx, cy, black) = (first + (random.NextDouble() * (last - first)), first + (random.NextDouble() * (last - first)), random.Next(2) == 0);
            for (var y = Math.Max(first, (int)(cy - radius)); y < Math.Min(last, cy + radius); y++)
            {
                for (var x = Math.Max(first, (int)(cx - radius)); x < Math.Min(last, cx + radius); x++)
                {
                    if (((x + 0.5 - cx) * (x + 0.5 - cx)) + ((y + 0.5 - cy) * (y + 0.5 - cy)) <= radius * radius && !(spareCorners && InCorner(x, y, side)))
                    {
                        covered += under[y, x] ? 0 : 1;
                        (under[y, x], dots[y, x]) = (true, black);
                    }
                }
            }
        }

        return (double)covered / all;
    }

    [GeneratedRegex(@"M(\d+) (\d+)h(\d+)v1h-\d+z")]
    private static partial Regex Run();
}
