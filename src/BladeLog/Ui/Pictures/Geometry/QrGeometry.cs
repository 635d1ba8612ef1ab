using System.Text;
using QRCoder;

namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>A square code as one path: a module is one unit, the quiet zone of four modules (ISO/IEC 18004) is inside.</summary>
public sealed record QrGeometry(int Side, string Path)
{
    public const int QuietZone = 4;

    /// <summary>Level H: nearly a third of the code words may be under dust.</summary>
    public static QrGeometry Of(string text)
    {
        ArgumentException.ThrowIfNullOrEmpty(text);
        using var generator = new QRCodeGenerator();
        using var data = generator.CreateQrCode(text, QRCodeGenerator.ECCLevel.H);
        var rows = data.ModuleMatrix;
        var path = new StringBuilder();
        for (var y = 0; y < rows.Count; y++)
        {
            for (var x = 0; x < rows.Count; x++)
            {
                var run = x;
                while (run < rows.Count && rows[y][run])
                {
                    run++;
                }

                if (run > x)
                {
                    path.Append(System.Globalization.CultureInfo.InvariantCulture, $"M{x} {y}h{run - x}v1h-{run - x}z");
                    x = run;
                }
            }
        }

        return new QrGeometry(rows.Count, path.ToString());
    }
}
