using System.Globalization;
using System.Text.RegularExpressions;
using BladeLog.Ui.Pictures.Geometry;
using ZXing;
using ZXing.Common;
using ZXing.QrCode;

namespace BladeLog.Tests.Ui;

/// <summary>A printed code read back by an independent reader, clean and through dust.</summary>
public partial class QrCodeTests
{
    private const int Dots = 6;

    [Theory]
    [InlineData("Q-01")]
    [InlineData("Q-04B")]
    [InlineData("http://saws.local:5080/b/Q-04b")]
    [InlineData("http://sawshop.home.arpa/b/ABCDEFGH-1.2")]
    public void A_clean_code_reads_as_what_it_holds(string text) => Assert.Equal(text, Read(Raster(QrGeometry.Of(text))));

    [Theory]
    [InlineData("Q-08")]
    [InlineData("http://saws.local:5080/b/Q-04b")]
    public void A_code_is_read_through_blots_over_a_fifth_of_it(string text)
    {
        // The three corner squares are spared: a camera finds a code by them, whatever the correction.
        for (var seed = 0; seed < 25; seed++)
        {
            var code = QrGeometry.Of(text);
            var dots = Raster(code);
            var share = Blot(dots, code.Side, new Random(seed));
            Assert.InRange(share, 0.20, 0.24);
            Assert.Equal(text, Read(dots));
        }
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

    /// <summary>Round blots, black as oil and white as dust, until a fifth of the code outside its corner squares is under them.</summary>
    private static double Blot(bool[,] dots, int side, Random random)
    {
        var (first, last) = (QrGeometry.QuietZone * Dots, (side - QrGeometry.QuietZone) * Dots);
        var corner = 8 * Dots;
        bool InCorner(int x, int y) => (x < first + corner && y < first + corner) || (x >= last - corner && y < first + corner) || (x < first + corner && y >= last - corner);
        var free = 0;
        for (var y = first; y < last; y++)
        {
            for (var x = first; x < last; x++)
            {
                free += InCorner(x, y) ? 0 : 1;
            }
        }

        var under = new bool[dots.GetLength(0), dots.GetLength(1)];
        var covered = 0;
        while (covered < 0.20 * free)
        {
            var radius = (1 + random.NextDouble()) * Dots;
            var (cx, cy, black) = (random.Next(first, last), random.Next(first, last), random.Next(2) == 0);
            for (var y = Math.Max(first, (int)(cy - radius)); y < Math.Min(last, cy + radius); y++)
            {
                for (var x = Math.Max(first, (int)(cx - radius)); x < Math.Min(last, cx + radius); x++)
                {
                    if (!InCorner(x, y) && ((x - cx) * (x - cx)) + ((y - cy) * (y - cy)) <= radius * radius)
                    {
                        covered += under[y, x] ? 0 : 1;
                        (under[y, x], dots[y, x]) = (true, black);
                    }
                }
            }
        }

        return (double)covered / free;
    }

    [GeneratedRegex(@"M(\d+) (\d+)h(\d+)v1h-\d+z")]
    private static partial Regex Run();
}
