using System.Net;
using System.Text;

namespace BladeLog.Tests.Features.Import;

/// <summary>Files bent in every way a spreadsheet, a mail or a disk can bend them: an answer in words, never a failure.</summary>
public sealed class MutatedFilesTests(SampleShopApp sample) : IClassFixture<SampleShopApp>
{
    private static readonly string[] Whole =
    [
        "Job,Wood,Height (mm),Length (m),Pieces,Radius,Bevel,Moisture,Nail,Timber value,Due\nfronts,black cherry,200,1.2,6,,,9,0.3,2500,2026-12-24\nbacks,\"oak, European\",45,0.8,12,90,22,10 %,,,\n",
        "Tag;Print;Hook;Kerf;Tension (MPa);Price;Inspect every\nB-01;13x0,65x3 TPI x2667;10;1,2;110;24,00;8\nB-02;1/2 x .025 x 3 x 105;;;;18;\n",
        "Code\tName\tWheels (mm)\tSpeeds (m/s)\tLoop\tWidest blade\tCut height\tMotor (kW)\tTakes\nT1\tTrial\t900|900\t20,7\t5690\t50\t500\t5,5\tbeam|board\n",
    ];

    private static readonly string[] Odd =
    [
        "\"", "\"\"", ",", ";", "\t", "\n", "\r", "\r\n\r\n", "\0", "\uFEFF", "NaN", "-1", "1e308", "1e999", "∞", "½", "''", "\u200f", "=cmd()", "💥", "\ud800", new('9', 400), new('x', 70_000), "-", "0", "/", "|", "%",
    ];

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(3)]
    public async Task A_mutated_file_is_read_or_refused_in_words(int seed)
    {
        Random random = new(seed);
        string token = await ImportTests.Token(sample.App);
        string[] kinds = ["", "blades", "saws", "cuts", "other"];
        for (int i = 0; i < 200; i++)
        {
            byte[] file = Mutated(Whole[random.Next(Whole.Length)], random);
            (HttpStatusCode status, _) = await ImportTests.Look(sample.App, file, token, kinds[random.Next(kinds.Length)]);
            Assert.True(status is HttpStatusCode.OK or HttpStatusCode.UnprocessableEntity, $"seed {seed}, file {i}: {(int)status}\n{Convert.ToBase64String(file)[..Math.Min(2000, file.Length)]}");
        }
    }

    private static byte[] Mutated(string whole, Random random)
    {
        StringBuilder text = new(whole);
        for (int n = random.Next(1, 6); n > 0; n--)
        {
            int at = random.Next(text.Length + 1), length = random.Next(0, Math.Min(12, text.Length - at) + 1);
            switch (random.Next(4))
            {
                case 0:
                    text.Remove(at, length);
                    break;
                case 1:
                    text.Insert(at, Odd[random.Next(Odd.Length)]);
                    break;
                case 2:
                    text.Insert(at, text.ToString(random.Next(text.Length), 1));
                    break;
                default:
                    string part = text.ToString(at, length);
                    text.Remove(at, length).Insert(random.Next(text.Length + 1), part);
                    break;
            }
        }

        byte[] bytes = (random.Next(4) switch { 0 => Encoding.Unicode, 1 => Encoding.Latin1, _ => Encoding.UTF8 }).GetBytes(text.ToString());
        for (int n = random.Next(3) == 0 ? random.Next(1, 20) : 0; n > 0 && bytes.Length > 0; n--)
        {
            bytes[random.Next(bytes.Length)] = (byte)random.Next(256);
        }

        return bytes;
    }
}
